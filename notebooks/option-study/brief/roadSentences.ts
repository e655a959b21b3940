import type { Study } from '../../../lib/index.ts';
import type { HtmlChild } from '../../html.ts';
import type { Path } from '../../page/index.ts';
import { fixedEndChoices, loadingChoices } from './briefChoices.ts';
import { place, type InWords } from './inWords.ts';

/** A water, its flood, and what the soffit keeps clear of it. */
export function waterSentence({ fields, height }: InWords, { brief }: Study, index: number): HtmlChild {
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

/** The road's levels, what may rise, its gradient and fill, and what it carries. */
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
