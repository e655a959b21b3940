import { described, type At, type Descriptor } from '../model/index.ts';

const kept = (at: At): number => at.study.options.kept.findIndex(({ number }) => number === at.option.number);
const isTyped = (at: At): boolean =>
  typeof at.study.options.kept[kept(at)]?.variant?.haunchRatio === 'number';
const unit = (steps: string): string => `options/:option/designs/:unit/${steps}`;
const path = 'options/:option/variant/haunchRatio';
const label = 'depth over the inner supports over that at midspan';

/** Figures of a variant that a unit is asked for as they stand: steps, label (`*` is the span) and unit. */
const asGiven = [
  ['boxWidthM', 'width asked of the box between the axes of its outer webs', 'm'],
  ['strengthMPa', 'strength asked of the concrete', 'MPa'],
  ['light/densityKgM3', 'oven-dry density of the lightweight concrete', 'kg/m3'],
  ['light/middleM/:s', 'length of lightweight concrete about the middle of span *', 'm'],
  ['ballastKNm/:s', 'ballast of span *', 'kN/m'],
  ['castInPiers', 'piers that the deck is asked to be cast in with', 'no'],
] as const;

/** Steps of such a figure at a place, `light/middleM/1`. */
const filled = (steps: string, at: At): string =>
  steps.includes(':s') ? steps.replace(':s', at.name('s')) : steps;

/** A label with the number of its span. */
const ofSpan = (words: string, at: At): string =>
  words.includes('*') ? words.replace('*', String(at.index('s') + 1)) : words;

/** How the main unit of an option is made where its form leaves a choice, and what the haunched unit is sized for. */
export const variantFigures: readonly Descriptor[] = [
  described({
    path,
    when: isTyped,
    label,
    unit: '',
    method: 'set by hand',
    formula: 'as typed',
    inputs: (at) => ({ typed: `kept/${kept(at)}/variant/haunchRatio` }),
    compute: ({ typed }) => typed,
  }),
  described({
    path,
    label,
    unit: '',
    method: 'least cost',
    formula:
      'of constant depth and the published ratios of pier to midspan depth, the cheapest crossing; constant unless another saves more than 1 %',
    inputs: (at) => ({
      ratios: [`data/${at.option.form}/haunch/ratios/0`, `data/${at.option.form}/haunch/ratios/1`],
      from: `data/${at.option.form}/haunch/fromSpanM`,
    }),
  }),
  ...asGiven.flatMap(([steps, what, unitOf]) => [
    described({
      path: `options/:option/variant/${steps}`,
      label: (at) => ofSpan(what, at),
      unit: unitOf,
      method: 'set by hand',
      formula: 'as typed',
      inputs: (at) => ({ typed: `kept/${kept(at)}/variant/${filled(steps, at)}` }),
      compute: ({ typed }) => typed,
    }),
    described({
      path: unit(`task/${steps}`),
      label: (at) => ofSpan(what, at),
      unit: unitOf,
      method: 'as asked',
      formula: 'choice of the option for its main unit',
      inputs: (at) => ({ asked: `${at.root}/variant/${filled(steps, at)}` }),
      compute: ({ asked }) => asked,
    }),
  ]),
  described({
    path: unit('task/haunch/pierDepthM'),
    label: 'structural depth asked for over the inner supports',
    unit: 'm',
    method: 'ratio',
    formula: 'depth at midspan x ratio of the haunch, to 50 mm',
    inputs: (at) => ({ depth: `${at.unit}/task/depthM`, ratio: `${at.root}/variant/haunchRatio` }),
    compute: ({ depth, ratio }) => Math.round(depth * ratio * 20) / 20,
  }),
  described({
    path: unit('depthM/support'),
    when: (at) =>
      at.design.task.haunch !== undefined && at.design.depthM.support !== at.design.depthM.midspan,
    label: 'structural depth over the inner supports',
    unit: 'm',
    method: 'as asked',
    formula: 'depth the unit is sized for over its inner supports',
    inputs: (at) => ({ asked: `${at.unit}/task/haunch/pierDepthM` }),
    compute: ({ asked }) => asked,
  }),
];
