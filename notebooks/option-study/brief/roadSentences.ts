import type { Road, Study } from '../../../lib/index.ts';
import { capitalised } from '../../format.ts';
import type { HtmlChild } from '../../html.ts';
import { putAt, type Made, type Path } from '../../page/index.ts';
import { approachSideChoices, fixedEndChoices, loadingChoices, tieInChoices } from './briefChoices.ts';
import { place, type InWords } from './inWords.ts';

/** A water, its flood, and what the soffit keeps clear of it. */
export function waterSentence({ fields, height }: InWords, { brief }: Study, index: number): HtmlChild {
  const water = brief.waters[index]!;
  const at = (key: string): Path => ['brief', 'waters', index, key];
  const isKnown = water.floodLevelM !== 'unknown';
  return [
    place(capitalised(water.name)),
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
    ' m above the flood. The flood runs at ',
    fields.figure(at('flowM3s'), {
      label: 'flow of the flood',
      places: 0,
      unit: 'm3/s',
      step: 10,
      unknown: 'an unknown number of',
      from: 100,
      min: { value: 0, open: true },
      max: { value: 1e6 },
    }),
    ' m³/s over a bed of ',
    fields.figure(at('grainMm'), {
      label: 'median grain of the bed',
      places: 2,
      unit: 'mm',
      step: 0.1,
      unknown: 'an unknown number of',
      from: 1,
      min: { value: 0, open: true },
      max: { value: 1000 },
    }),
    ' mm grain; it may rise by ',
    height(at('allowedAffluxM'), 'allowed afflux', {
      unknown: 'an unknown number of',
      from: 0.2,
      min: { value: 0 },
      max: { value: 10 },
    }),
    ' m before the bridge. ',
  ];
}

type End = 'start' | 'end';

/** Gradient of the existing road behind an end, rising with the chainage. */
const held = (road: Road, end: End): number | 'unknown' => road[`${end}Gradient`] ?? 'unknown';

const heldFigure = (end: End): Made<number | 'unknown'> => ({
  key: `brief.road.${end}Gradient`,
  get: ({ brief }) => held(brief.road, end),
  put: (study, value) => putAt(study, ['brief', 'road'], { ...study.brief.road, [`${end}Gradient`]: value }),
  owns: [['brief', 'road', `${end}Gradient`]],
});

/** What the words about the road hang on besides its figures. */
export const roadShape = (road: Road): unknown => [
  road.crestRadiusM === 'unknown',
  road.sagRadiusM === 'unknown',
  road.startTieIn,
  road.endTieIn,
  road.startApproachM === 'unknown',
  road.endApproachM === 'unknown',
  held(road, 'start') === 'unknown',
  held(road, 'end') === 'unknown',
];

/** A least radius, which follows from the design speed until it is given. */
const radius = (
  fields: InWords['fields'],
  key: 'crestRadiusM' | 'sagRadiusM',
  label: string,
  from: number,
): HTMLElement =>
  fields.figure(['brief', 'road', key], {
    label,
    places: 0,
    unit: 'm',
    step: 100,
    unknown: 'the usual radius',
    from,
    min: { value: 0 },
    max: { value: 1e6 },
  });

/** The existing road behind an end that is fixed, and how much of it may be regraded. */
function heldSentence(fields: InWords['fields'], road: Road, end: End): HtmlChild {
  const isKnown = held(road, end) !== 'unknown';
  return [
    `Behind the ${end}, which stays, the existing road runs at `,
    fields.figure(heldFigure(end), {
      label: `gradient of the existing road behind the ${end}`,
      places: 1,
      unit: '%',
      per: 100,
      step: 0.5,
      unknown: 'a gradient that is not known',
      from: 0,
      min: { value: -25 },
      max: { value: 25 },
    }),
    isKnown && [
      ' %, rising with the chainage; ',
      approachLength(fields, road, end, 'an unknown length'),
      ' of it may be regraded',
    ],
    '. ',
  ];
}

/** Length of an approach with its unit, where it is known. */
const approachLength = (fields: InWords['fields'], road: Road, end: End, unknown: string): HtmlChild => [
  fields.figure(['brief', 'road', `${end}ApproachM`], {
    label: `length of the ${end} approach`,
    places: 0,
    unit: 'm',
    step: 10,
    unknown,
    from: 150,
    min: { value: 1 },
    max: { value: 5000 },
  }),
  road[`${end}ApproachM`] !== 'unknown' && ' m',
];

/** How the road is joined to what lies behind each end, and how its fill is held. */
export function approachSentence({ fields }: InWords, { brief }: Study): HtmlChild {
  const { road } = brief;
  return [
    (['start', 'end'] as const).map((end) => {
      if (road.fixedEnd === end || road.fixedEnd === 'both') return heldSentence(fields, road, end);
      const stays = road[`${end}TieIn`] === 'fixed';
      return [
        `Behind the ${end} its tie-in `,
        fields.choice(['brief', 'road', `${end}TieIn`], {
          label: `tie-in behind the ${end}`,
          choices: tieInChoices,
        }),
        stays ? (road[`${end}ApproachM`] === 'unknown' ? ' ' : ' at ') : ' within ',
        approachLength(
          fields,
          road,
          end,
          stays ? 'where the proposed road meets the ground' : 'any distance',
        ),
        '. ',
      ];
    }),
    'The approaches ',
    fields.choice(['brief', 'road', 'approachSides'], {
      label: 'sides of the approaches',
      choices: approachSideChoices,
    }),
    '; fill lies at ',
    fields.figure(['brief', 'road', 'fillSideSlope'], {
      label: 'side slope of fill, horizontal to vertical',
      places: 1,
      step: 0.1,
      min: { value: 0 },
      max: { value: 10 },
    }),
    ' to 1. ',
  ];
}

/** The road's levels, what may rise, its gradient and curves, and what it carries. */
export function roadSentence({ fields, height }: InWords, { brief }: Study): HtmlChild {
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
    ' %; its curves suit ',
    fields.figure(['brief', 'road', 'designSpeedKmh'], {
      label: 'design speed',
      places: 0,
      unit: 'km/h',
      step: 10,
      unknown: 'an unknown number of',
      from: 70,
      min: { value: 10 },
      max: { value: 200 },
    }),
    ' km/h, with crests of ',
    radius(fields, 'crestRadiusM', 'least radius of a crest', 3000),
    brief.road.crestRadiusM !== 'unknown' && ' m',
    ' and sags of ',
    radius(fields, 'sagRadiusM', 'least radius of a sag', 2000),
    brief.road.sagRadiusM !== 'unknown' && ' m',
    ' or more. It carries ',
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
