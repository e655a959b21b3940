import { ratesFor, type Obstacle, type Study } from '../../../lib/index.ts';
import { h, type HtmlChild } from '../../html.ts';
import {
  putAt,
  standing,
  type Fields,
  type Figure,
  type FigureSpec,
  type Made,
  type Path,
  type StudyStore,
} from '../../page/index.ts';
import type { Graph } from '../../reactive/index.ts';
import { fixedEndChoices, fromYesNo, loadingChoices, yesNoOf, type YesNo } from './briefChoices.ts';
import {
  budgetAmount,
  envelopeWidth,
  groundProved,
  laneCount,
  obstacleWidth,
  planShape,
  planShapeOf,
  provedOf,
  radiusOfCurve,
} from './madeFields.ts';
import { problemBeside } from './problemBeside.ts';

type Rules = Partial<Omit<FigureSpec, 'value' | 'label' | 'places' | 'unit'>>;

/** Fields as the sentences use them: a level or a headroom in hundredths, a chainage in tenths or whole. */
function inWords(fields: Fields) {
  return {
    fields,
    /** A chainage, m. */
    chainage: (path: Path, label: string, places = 0): HTMLElement =>
      fields.figure(path, { label, places, unit: 'm' }),
    /** A level or a height, m. */
    height: (path: Path, label: string, rules: Rules = {}): HTMLElement =>
      fields.figure(path, { label, places: 2, unit: 'm', step: 0.1, ...rules }),
  };
}
type InWords = ReturnType<typeof inWords>;

const place = (name: string): HTMLElement => h('i', {}, name);

/** The stretch whose width decides the main opening: the widest that bars supports; -1 where none does. */
function widestBarred(obstacles: readonly Obstacle[]): number {
  const widths = obstacles.map(({ supports, fromM, toM }) => (supports === 'hard' ? toM - fromM : -1));
  const widest = Math.max(...widths);
  return widest > 0 ? widths.indexOf(widest) : -1;
}

function lineSentence({ fields, chainage }: InWords, { brief }: Study): HtmlChild {
  const footways = brief.deck.filter(({ kind }) => kind === 'footway').length;
  const footwayWords =
    ['', ' with a footway', ' with two footways'][footways] ?? ` with ${footways} footways`;
  const crossed = brief.obstacles.filter(({ supports }) => supports !== 'none').map(({ name }) => name);
  const lanes = brief.deck.filter(({ kind }) => kind === 'lane').length;
  return [
    'A road of ',
    fields.figure(laneCount, { label: 'lanes', places: 0, min: { value: 1 }, max: { value: 20 } }),
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

const listedPlaces = (names: readonly string[]): HtmlChild =>
  names.map((name, i) => [i === 0 ? '' : i === names.length - 1 ? ' and ' : ', ', place(name)]);

function supportsSentence(
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

function envelopeSentence(
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

const presetUntilConfirmed = (index: number) => ({
  isPreset: (draft: unknown): boolean =>
    (draft as Study).brief.obstacles[index]?.clearance?.confirmed === false,
});

function waterSentence({ fields, height }: InWords, { brief }: Study, index: number): HtmlChild {
  const water = brief.waters[index]!;
  const at = (key: string): Path => ['brief', 'waters', index, key];
  const isKnown = water.floodLevelM !== 'unknown';
  return [
    place(water.name),
    ' stands at ',
    height(at('levelM'), 'water level'),
    ' and floods to ',
    height(at('floodLevelM'), 'flood level', { unknown: 'an unknown level', from: water.levelM }),
    isKnown && [
      ' once in ',
      fields.figure(at('floodReturnYears'), {
        label: 'return period',
        places: 0,
        unit: 'years',
        step: 10,
        unknown: 'an unknown number of',
        from: 100,
        min: { value: 1 },
        max: { value: 100_000 },
      }),
      ' years',
    ],
    '; the soffit stays ',
    height(at('freeboardM'), 'freeboard', { min: { value: 0 }, max: { value: 50 } }),
    ' m above the flood. ',
  ];
}

function roadSentence({ fields, height }: InWords, { brief }: Study): HtmlChild {
  return [
    'The road is proposed at ',
    height(['brief', 'road', 'startLevelM'], 'road level at the start'),
    ' at the start and ',
    height(['brief', 'road', 'endLevelM'], 'road level at the end'),
    ' at the end; ',
    fields.choice(['brief', 'road', 'fixedEnd'], { label: 'ends that may rise', choices: fixedEndChoices }),
    ' may rise',
    brief.road.fixedEnd !== 'both' && [
      ' by up to ',
      height(['brief', 'road', 'mayRiseM'], 'rise allowed', { min: { value: 0 }, max: { value: 200 } }),
      ' m',
    ],
    '. It is nowhere steeper than ',
    fields.figure(['brief', 'road', 'maxGradient'], {
      label: 'steepest gradient',
      places: 1,
      unit: '%',
      per: 100,
      step: 0.5,
      min: { value: 0.1 },
      max: { value: 25 },
    }),
    ' %, and its fill slopes at ',
    fields.figure(['brief', 'road', 'fillSideSlope'], {
      label: 'side slope of fill, horizontal to vertical',
      places: 1,
      step: 0.1,
      min: { value: 0 },
      max: { value: 10 },
    }),
    ' to 1. It carries ',
    fields.choice(['brief', 'loading'], { label: 'load standard', choices: loadingChoices }),
    ' on ',
    fields.figure(['brief', 'surfacingM'], {
      label: 'surfacing',
      places: 0,
      unit: 'mm',
      per: 1000,
      step: 10,
      min: { value: 0 },
      max: { value: 1000 },
    }),
    ' mm of surfacing. ',
  ];
}

function yesNo({ fields }: InWords, key: 'crane' | 'barge'): HTMLElement {
  const path: Path = ['brief', 'access', key];
  return fields.choice<YesNo>(
    {
      key: path.join('.'),
      get: ({ brief }) => yesNoOf(brief.access[key]),
      put: (study, value) => putAt(study, path, fromYesNo(value)),
      owns: [path],
    },
    {
      label: key,
      choices: [
        { value: 'yes', words: 'can' },
        { value: 'no', words: 'cannot' },
        { value: 'unknown', words: 'may or may not' },
      ],
    },
  );
}

function accessSentence(words: InWords): HtmlChild {
  const { fields } = words;
  const limit = (key: string, label: string, unit: string, from: number, most: number): HTMLElement =>
    fields.figure(['brief', 'access', key], {
      label,
      places: 0,
      unit,
      unknown: 'unknown',
      from,
      min: { value: 1 },
      max: { value: most },
    });
  return [
    'The longest piece that comes by road is ',
    limit('haulLengthM', 'longest piece', 'm', 25, 1000),
    ' m, the heaviest ',
    limit('haulMassT', 'heaviest piece', 't', 40, 1e5),
    ' t. A crane ',
    yesNo(words, 'crane'),
    ' stand beside the bridge, a barge ',
    yesNo(words, 'barge'),
    ' come to it. ',
  ];
}

function groundSentence({ fields }: InWords, study: Study): HtmlChild {
  return [
    'The ground is ',
    fields.choice(groundProved, {
      label: 'ground',
      choices: [
        { value: 'unknown', words: 'not proved' },
        { value: 'known', words: 'proved' },
        ...(provedOf(study) === 'part' ? [{ value: 'part' as const, words: 'proved in part' }] : []),
      ],
    }),
    provedOf(study) === 'known' ? '. ' : ': each stretch carries its odds. ',
  ];
}

function budgetSentence({ fields }: InWords, { brief, books }: Study, amount: Made<Figure>): HtmlChild {
  const isKnown = brief.budget !== 'unknown';
  return [
    'The budget is ',
    fields.figure(amount, {
      label: 'budget',
      places: 2,
      unit: `M${books.currency}`,
      per: 1e-6,
      step: 0.1,
      unknown: 'not given',
      from: 1,
      min: { value: 0, open: true },
      max: { value: 1e7 },
    }),
    isKnown && [
      ` million ${books.currency} at `,
      fields.words(['brief', 'budget', 'priceDate'], { label: 'price date', most: 500 }),
      ' prices, for: ',
      fields.words(['brief', 'budget', 'includes'], { label: 'what the budget includes', most: 20_000 }),
    ],
    '. ',
  ];
}

/** Keeps a comma, stop or sign on the line of the figure before it, where lines are broken. */
function glued(paragraph: HTMLElement): HTMLElement {
  for (const field of Array.from(paragraph.querySelectorAll(':scope > .entry'))) {
    const next = field.nextSibling;
    const mark = /^[.,;:°]/u.exec(next?.nodeValue ?? '');
    if (next === null || mark === null) continue;
    next.nodeValue = (next.nodeValue ?? '').slice(1);
    const glue = h('span', { class: 'glue' });
    field.replaceWith(glue);
    glue.append(field, mark[0]);
  }
  return paragraph;
}

/** What the words of the sentences hang on besides the figures in them. */
function shape(study: Study): unknown {
  const { brief, books } = study;
  return [
    brief.deck.map(({ kind }) => kind),
    planShapeOf(brief.crossing),
    brief.obstacles.map(({ kind, name, supports, clearance }) => [kind, name, supports, clearance !== null]),
    widestBarred(brief.obstacles),
    brief.waters.map(({ name, floodLevelM }) => [name, floodLevelM === 'unknown']),
    brief.road.fixedEnd,
    provedOf(study),
    brief.budget === 'unknown',
    books.currency,
  ];
}

/** The brief in prose, with every figure, choice and name to be changed where it stands. */
export function briefSentences(graph: Graph, store: StudyStore): HTMLElement {
  // One for the life of the page: it remembers what a budget said before it became unknown.
  const amount = budgetAmount(ratesFor(store.valid().books).pack.priceDate);
  return standing(graph, store, {
    say: problemBeside,
    shape,
    build(study, fields) {
      const words = inWords(fields);
      const { obstacles, waters } = study.brief;
      const main = widestBarred(obstacles);
      const paragraphs = [
        [
          lineSentence(words, study),
          obstacles.map((obstacle, index) => [
            supportsSentence(words, obstacle, index, index === main),
            envelopeSentence(words, store, obstacle, index),
          ]),
        ],
        [waters.map((_, index) => waterSentence(words, study, index)), roadSentence(words, study)],
        [groundSentence(words, study), accessSentence(words), budgetSentence(words, study, amount)],
      ];
      return h(
        'div',
        { class: 'prose' },
        paragraphs.map((sentences) => glued(h('p', {}, sentences))),
      );
    },
  }).element;
}
