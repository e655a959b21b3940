import type { Obstacle, Study } from '../../../lib/index.ts';
import type { HtmlChild } from '../../html.ts';
import { putAt, type Made, type Path, type StudyStore } from '../../page/index.ts';
import { place, type InWords } from './inWords.ts';
import {
  envelopeWidth,
  laneCount,
  obstacleWidth,
  planShape,
  planShapeOf,
  radiusOfCurve,
} from './madeFields.ts';

const listedPlaces = (names: readonly string[]): HtmlChild =>
  names.map((name, i) => [i === 0 ? '' : i === names.length - 1 ? ' and ' : ', ', place(name)]);

/** The road and its line: lanes, what it crosses, from where to where, how it lies in plan. */
export function lineSentence({ fields, chainage }: InWords, { brief }: Study): HtmlChild {
  const footways = brief.deck.filter(({ kind }) => kind === 'footway').length;
  const footwayWords =
    ['', ' with a footway', ' with two footways'][footways] ?? ` with ${footways} footways`;
  const crossed = brief.obstacles.filter(({ supports }) => supports !== 'none').map(({ name }) => name);
  const lanes = brief.deck.filter(({ kind }) => kind === 'lane').length;
  return [
    'A road of ',
    fields.figure(laneCount, {
      label: 'lanes',
      places: 0,
      whole: true,
      min: { value: 1 },
      max: { value: 20 },
    }),
    ` ${lanes === 1 ? 'lane' : 'lanes'}${footwayWords} has to cross `,
    crossed.length === 0 ? 'open ground' : listedPlaces(crossed),
    ' from chainage ',
    chainage(['brief', 'crossing', 'startM'], 'start'),
    ' to ',
    chainage(['brief', 'crossing', 'endM'], 'end'),
    ', on ',
    fields.choice(planShape, {
      label: 'line in plan',
      choices: [
        { value: 'straight', words: 'a straight line' },
        { value: 'curve', words: 'a curve' },
        { value: 'unknown', words: 'a line not known yet' },
      ],
    }),
    planShapeOf(brief.crossing) === 'curve' && [
      ' of radius ',
      fields.figure(radiusOfCurve, {
        label: 'plan radius',
        places: 0,
        unit: 'm',
        step: 10,
        min: { value: 10 },
        max: { value: 1e6 },
      }),
      ' m',
    ],
    ', ',
    fields.figure(['brief', 'crossing', 'skewDeg'], {
      label: 'skew',
      places: 0,
      unit: 'deg',
      unknown: 'unknown',
      min: { value: -75 },
      max: { value: 75 },
    }),
    '° off square. ',
  ];
}

/** The innermost place of an abutment: a chainage of the brief, or not known where the abutment is fixed. */
const innermost = (which: 'startLatestM' | 'endEarliestM'): Made<number | 'unknown'> => ({
  key: `brief.crossing.${which}`,
  get: ({ brief }) => brief.crossing[which] ?? 'unknown',
  put: (study, value) => putAt(study, ['brief', 'crossing'], { ...study.brief.crossing, [which]: value }),
  owns: [['brief', 'crossing', which]],
});

/** How far in from the ends of the crossing its abutments may stand. */
export function windowsSentence({ fields }: InWords, { brief }: Study): HtmlChild {
  const { startM, endM } = brief.crossing;
  return [
    'The start abutment may stand as far along as ',
    fields.figure(innermost('startLatestM'), {
      label: 'innermost place of the start abutment',
      places: 0,
      unit: 'm',
      unknown: 'the start',
      isSaid: true,
      from: startM,
    }),
    ' and the end abutment as far back as ',
    fields.figure(innermost('endEarliestM'), {
      label: 'innermost place of the end abutment',
      places: 0,
      unit: 'm',
      unknown: 'the end',
      isSaid: true,
      from: endM,
    }),
    '. ',
  ];
}

const presetUntilConfirmed = (index: number) => ({
  isPreset: (draft: unknown): boolean =>
    (draft as Study).brief.obstacles[index]?.clearance?.confirmed === false,
});

/** Where supports may not stand, or only at a price; nothing of a stretch that is free. */
export function supportsSentence(
  { fields, chainage }: InWords,
  obstacle: Obstacle,
  index: number,
  isMain: boolean,
): HtmlChild {
  const { kind, name, supports, clearance } = obstacle;
  if (supports === 'none') return null;
  const path: Path = ['brief', 'obstacles', index];
  const who = kind === 'river' ? 'pier' : 'support';
  const where = kind === 'river' ? 'in' : 'on';
  return [
    supports === 'hard' ? `No ${who} may stand ${where} ` : `A ${who} may stand ${where} `,
    place(name),
    isMain && [
      ', over ',
      fields.figure(obstacleWidth(index), {
        label: 'no-pier width',
        places: 1,
        unit: 'm',
        min: { value: 0, open: true },
        max: { value: 2000 },
      }),
      ' m',
    ],
    ' between ',
    chainage([...path, 'fromM'], `${name}, from`, 1),
    ' and ',
    chainage([...path, 'toM'], `${name}, to`, 1),
    supports === 'soft' && ', at a price',
    clearance === null ? '. ' : ', where ',
  ];
}

/** What must stay clear over an obstacle; follows the sentence on its supports where there is one. */
export function envelopeSentence(
  { fields, height }: InWords,
  store: StudyStore,
  obstacle: Obstacle,
  index: number,
): HtmlChild {
  const { kind, name, clearance, supports } = obstacle;
  if (clearance === null) return null;
  const path: Path = ['brief', 'obstacles', index, 'clearance'];
  const datum = kind === 'railway' ? 'rail level' : 'level';
  return [
    supports === 'none' && ['For ', place(name), ', '],
    fields.figure(envelopeWidth(index), {
      label: `envelope width over ${name}`,
      places: 1,
      unit: 'm',
      min: { value: 0, open: true },
      max: { value: 2000 },
    }),
    ' × ',
    height([...path, 'headroomM'], `headroom over ${name}`, {
      min: { value: 0, open: true },
      max: { value: 200 },
      confirm: () =>
        store.edit((study) => putAt(study, [...path, 'confirmed'], true), { what: `confirming ${name}` }),
      ...presetUntilConfirmed(index),
    }),
    ` m must stay clear above ${datum} `,
    height([...path, 'datumLevelM'], `${name}, level`),
    '. ',
  ];
}
