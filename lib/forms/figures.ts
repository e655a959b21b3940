import { described, type At, type Descriptor } from '../model/index.ts';
import { depthWindow } from '../rules/figures.ts';
import { squareEndFigures } from './common/squareEnds.ts';
import { variantFigures } from './variantFigures.ts';

const kept = (at: At): number => at.study.options.kept.findIndex(({ number }) => number === at.option.number);
const role = (at: At): 'main' | 'approach' => at.option.units[at.index('unit')]!.role;
const isMain = (at: At): boolean => {
  const { units } = at.option;
  const main = units.findIndex((unit) => unit.role === 'main');
  return at.index('unit') === Math.max(0, main);
};
const typedDepth = (at: At): boolean =>
  isMain(at) && (at.study.options.kept[kept(at)]?.depthM ?? null) !== null;
const mainOf = (at: At): string => {
  const main = at.option.units.findIndex((unit) => unit.role === 'main');
  return `${at.root}/designs/${Math.max(0, main)}`;
};
const spans = (at: At): string[] => at.design.task.spansM.map((_, i) => `${at.unit}/task/spansM/${i}`);
const name = (at: At): string =>
  at.option.units.length > 1 ? ` of the ${role(at)} unit ${at.index('unit') + 1}` : '';
const checkOf = (at: At) => at.design.checks.find(({ id }) => id === at.name('check'))!;

const unit = (steps: string): string => `options/:option/designs/:unit/${steps}`;

const deckWords: Readonly<Record<string, readonly [label: string, unit: string]>> = {
  widthM: ['deck width', 'm'],
  carriagewayM: ['width between kerbs', 'm'],
  carriagewayOffsetM: ['middle of the carriageway from the middle of the deck', 'm'],
  lanes: ['marked lanes', 'no'],
  footwayM: ['width of footways', 'm'],
  surfacingM: ['surfacing', 'm'],
  superimposedKNm: ['superimposed dead load', 'kN/m'],
};

const loadWords: Readonly<Record<string, string>> = {
  permanentKN: 'permanent',
  trafficMaxKN: 'greatest traffic',
  trafficMinKN: 'least traffic',
};

const figureWords = (id: string): string =>
  id.replace(/(?<=[a-z0-9])[A-Z]/gu, (capital) => ` ${capital.toLowerCase()}`);

/** What a unit is sized for, and what every form reports of it. What only one form reports stands beside that form. */
export const designFigures: readonly Descriptor[] = [
  ...variantFigures,
  ...squareEndFigures,
  described({
    path: unit('task/spansM/:i'),
    label: (at) => `span ${at.index('i') + 1}${name(at)}`,
    unit: 'm',
    method: 'difference',
    formula: 'chainage of the next support - chainage of this one',
    inputs: (at) => {
      const supports = `${at.root}/units/${at.name('unit')}/supportsM`;
      return { to: `${supports}/${at.index('i') + 1}`, from: `${supports}/${at.index('i')}` };
    },
    compute: ({ to, from }) => to - from,
  }),
  described({
    path: unit('task/deck/:field'),
    label: (at) => deckWords[at.name('field')]![0],
    unit: (at) => deckWords[at.name('field')]![1],
    method: 'as given',
    formula: 'deck of the crossing',
    inputs: (at) => ({ deck: `site/deck/${at.name('field')}` }),
    compute: ({ deck }) => deck,
  }),
  described({
    path: unit('task/planRadiusM'),
    label: 'plan radius of the unit',
    unit: 'm',
    method: 'as given',
    formula: 'radius of the road; infinite on a straight and where it is unknown',
    inputs: () => ({ radius: 'site/planRadiusM' }),
  }),
  described({
    path: unit('task/skewDeg'),
    label: 'skew the unit is sized for',
    unit: 'deg',
    method: 'as given',
    formula: 'skew of the supports, either way',
    inputs: () => ({ skew: 'site/skewDeg' }),
    compute: ({ skew }) => Math.abs(skew),
  }),
  described({
    path: unit('task/clearUnderM/:s'),
    label: (at) => `height under the deck at support ${at.index('s') + 1}${name(at)}`,
    unit: 'm',
    method: 'difference, to 0.25 m',
    formula: 'road level of the first guess at the road - construction depth - ground level',
    inputs: (at) => ({
      depth: `${at.unit}/task/depthM`,
      at: `${at.root}/units/${at.name('unit')}/supportsM/${at.name('s')}`,
      road: ['site/road/startLevelM', 'site/road/endLevelM'],
    }),
  }),
  ...(
    [
      [
        'alongKN',
        'force along the road of what may strike',
        'kN',
        'the nearest vehicle or train; of a vessel a share of its force',
      ],
      ['acrossKN', 'force across the road of what may strike', 'kN', 'of a vessel, 120 V sqrt(DWT); else 0'],
      [
        'aboveGroundM',
        'height of what may strike',
        'm',
        'of a vehicle or train; of a vessel the water level',
      ],
    ] as const
  ).map(([field, label, measure, formula]) =>
    described({
      path: unit(`task/strikes/:s/:k/${field}`),
      label: (at) => `${label} support ${at.index('s') + 1}${name(at)}`,
      unit: measure,
      method: 'what runs or sails within reach of the support',
      formula,
      inputs: (at) => ({
        at: `${at.root}/units/${at.name('unit')}/supportsM/${at.name('s')}`,
        reach: ['data/substructure/impact/road/reachM', 'data/substructure/impact/railway/reachM'],
        figures: {
          alongKN: [
            'data/substructure/impact/road/forceKN',
            'data/substructure/impact/railway/forceKN',
            'data/substructure/vessel/alongShare',
          ],
          acrossKN: ['data/substructure/vessel/factor', 'data/substructure/vessel/presetSpeedMs'],
          aboveGroundM: ['data/substructure/impact/road/heightM', 'data/substructure/impact/railway/heightM'],
        }[field],
      }),
    }),
  ),
  described({
    path: unit('task/quakeShare'),
    label: (at) => `horizontal force of an earthquake, share of the weight${name(at)}`,
    unit: '',
    method: 'product',
    formula: 'acceleration x soil x amplification / behaviour, on the plateau of the spectrum',
    inputs: (at) => ({
      acceleration: 'site/seismic/groundAccelerationG',
      soil: `data/substructure/seismic/soil${at.site.seismic!.siteClass ?? 'E'}`,
      amplification: 'data/substructure/seismic/amplification',
      behaviour: 'data/substructure/seismic/behaviour',
    }),
    compute: (v) => (v.acceleration * v.soil * v.amplification) / v.behaviour,
    sources: ['EN 1998-1 3.2.2.2, EN 1998-2 table 4.1 (from memory)'],
  }),
  described({
    path: unit('task/girders'),
    label: `girders asked for`,
    unit: 'no',
    kind: 'typed',
    method: 'typed',
    formula: 'as asked',
    sources: ['brief'],
  }),
  described({
    path: unit('task/depthM'),
    when: typedDepth,
    label: (at) => `structural depth at midspan${name(at)}`,
    unit: 'm',
    method: 'set by hand',
    formula: 'as typed',
    inputs: (at) => ({ typed: `kept/${kept(at)}/depthM` }),
    compute: ({ typed }) => typed,
  }),
  described({
    path: unit('task/depthM'),
    label: (at) => `structural depth at midspan${name(at)}`,
    unit: 'm',
    method: 'least cost',
    formula: (at) =>
      isMain(at)
        ? 'shallowest depth, in steps of 50 mm, within 1 % of the least cost of the crossing inside the published band, or the least that can be made where that is deeper; checks and headroom hold where they can'
        : 'read off the cost table at the longest span, to 50 mm',
    inputs: (at) => {
      const { task } = at.design;
      const { paths, by } = depthWindow(task, task.haunch !== undefined);
      return { band: paths, of: by === 'span' ? spans(at) : ['site/deck/widthM'] };
    },
  }),
  described({
    path: 'options/:option/depthM/:where',
    label: (at) => `structural depth at ${at.name('where')}`,
    unit: 'm',
    method: 'as sized',
    formula: 'depth of the main unit',
    inputs: (at) => ({ main: `${mainOf(at)}/depthM/${at.name('where')}` }),
    compute: ({ main }) => main,
  }),
  described({
    path: unit('depthM/midspan'),
    label: (at) => `structural depth at midspan${name(at)}`,
    unit: 'm',
    method: 'as asked',
    formula: 'depth the unit is sized for',
    inputs: (at) => ({ asked: `${at.unit}/task/depthM` }),
    compute: ({ asked }) => asked,
  }),
  described({
    path: unit('depthM/support'),
    when: (at) => at.design.depthM.support === at.design.depthM.midspan,
    label: (at) => `structural depth at the supports${name(at)}`,
    unit: 'm',
    method: 'same along the unit',
    formula: 'depth at midspan',
    inputs: (at) => ({ midspan: `${at.unit}/depthM/midspan` }),
    compute: ({ midspan }) => midspan,
  }),
  described({
    path: unit('depthM/support'),
    label: (at) => `structural depth at the supports${name(at)}`,
    unit: 'm',
    method: 'haunch',
    formula: 'depth over the supports that goes with the depth at midspan',
    inputs: (at) => ({ midspan: `${at.unit}/depthM/midspan` }),
  }),
  described({
    path: unit('obtuseCorner'),
    label: (at) => `traffic on the bearing at an obtuse corner over that of a square deck${name(at)}`,
    unit: '',
    method: 'factor by kind of deck',
    formula:
      'AASHTO LRFD table 4.6.2.2.3c-1: 1 + share by span, depth and girders x tan of the skew, at most 60 degrees',
    inputs: (at) => ({
      skew: `${at.unit}/task/skewDeg`,
      spans: spans(at),
      depth: `${at.unit}/task/depthM`,
    }),
    sources: ['AASHTO LRFD 4.6.2.2.3c (from memory)'],
  }),
  described({
    path: unit('skewPressKN'),
    label: (at) => `what skew ends press on all bearings of an end${name(at)}`,
    unit: 'kN',
    method: 'product',
    formula: 'bearings under the boxes x what skew ends shift to the obtuse one of them',
    inputs: (at) => ({
      boxes: at.design.figures['boxes'] === undefined ? [] : [`${at.unit}/figures/boxes`],
      shifted: `${at.unit}/figures/skewBearingKN`,
    }),
    compute: ({ boxes, shifted }) => 2 * (boxes[0] ?? 1) * shifted,
  }),
  described({
    path: unit('reactions/:s/:field'),
    label: (at) => `${loadWords[at.name('field')]} reaction at support ${at.index('s') + 1}${name(at)}`,
    unit: 'kN',
    method: 'statics of the unit',
    formula: (at) =>
      at.name('field') === 'permanentKN'
        ? 'reaction under own weight, surfacing, edges and barriers; whole deck width'
        : 'area of the reaction influence line x lane load + axles at their worst place; whole deck width',
    inputs: (at) => ({
      spans: spans(at),
      superimposed: [`${at.unit}/task/deck/superimposedKNm`],
      weights:
        at.name('field') === 'permanentKN'
          ? at.design.lines.map((_, i) => `${at.unit}/lines/${i}/quantity`)
          : [],
      road: ['site/deck/carriagewayM', 'brief/loading'],
    }),
  }),
  described({
    path: unit('checks/:check/utilisation'),
    label: (at) => `${checkOf(at).label}${name(at)}`,
    unit: '',
    method: 'ratio',
    formula: 'demand / capacity',
    inputs: (at) => ({
      demand: `${at.unit}/checks/${at.name('check')}/demand`,
      capacity: `${at.unit}/checks/${at.name('check')}/capacity`,
    }),
    compute: ({ demand, capacity }) => (demand <= 0 ? 0 : capacity > 0 ? demand / capacity : Infinity),
  }),
  ...(['demand', 'capacity'] as const).map((side) =>
    described({
      path: unit(`checks/:check/${side}`),
      label: (at) => `${side} of ${checkOf(at).label}${name(at)}`,
      unit: (at) => (checkOf(at).unit === '1' ? '' : checkOf(at).unit),
      method: 'statics of the unit',
      formula: (at) => `${side} of the check '${checkOf(at).label}' at its worst place`,
      inputs: (at) => ({ spans: spans(at), depth: `${at.unit}/depthM/midspan` }),
    }),
  ),
  ...(['demand', 'capacity', 'utilisation'] as const).map((side) =>
    described({
      path: unit(`limitingCheck/${side}`),
      label: (at) => `${side} of the limiting check, ${at.design.limitingCheck.label}${name(at)}`,
      unit: (at) =>
        side === 'utilisation' || at.design.limitingCheck.unit === '1' ? '' : at.design.limitingCheck.unit,
      method: 'check with the highest utilisation',
      formula: 'that of the check that limits the unit',
      inputs: (at) => ({ check: `${at.unit}/checks/${at.design.limitingCheck.id}/${side}` }),
      compute: ({ check }) => check,
    }),
  ),
  described({
    path: 'options/:option/limitingCheck/utilisation',
    label: (at) => `limiting check: ${at.option.limitingCheck.label}`,
    unit: '',
    method: 'highest utilisation',
    formula: 'that of the main unit; of an approach only where it fails and is worse',
    inputs: (at) => ({
      main: `${mainOf(at)}/limitingCheck/utilisation`,
      others: at.option.designs.flatMap((_, i) =>
        mainOf(at).endsWith(`/${i}`) ? [] : [`${at.root}/designs/${i}/limitingCheck/utilisation`],
      ),
    }),
    compute: ({ main, others }) => others.reduce((most, one) => (one > Math.max(1, most) ? one : most), main),
  }),
  described({
    path: unit('ownWeightShare'),
    label: (at) => `own weight in the governing moment or force${name(at)}`,
    unit: '',
    method: 'ratio',
    formula: 'moment or force from own weight / from everything, characteristic, where the whole is greatest',
    inputs: (at) => ({ spans: spans(at), superimposed: `${at.unit}/task/deck/superimposedKNm` }),
  }),
  described({
    path: unit('heaviestPiece/:field'),
    label: (at) =>
      `${at.name('field') === 'massT' ? 'mass' : 'length'} of the heaviest piece brought to site${name(at)}`,
    unit: (at) => (at.name('field') === 'massT' ? 't' : 'm'),
    method: 'take-off',
    formula: 'unit cut into pieces of the usual length; the heaviest',
    inputs: (at) => ({
      spans: spans(at),
      lines: at.design.lines.flatMap((line, i) =>
        line.item.endsWith('-steel') ? [`${at.unit}/lines/${i}/quantity`] : [],
      ),
    }),
  }),
  // A form that has no manual of its own yet still says what it is and what it hangs on.
  described({
    path: unit('figures/:figure'),
    label: (at) => `${figureWords(at.name('figure'))}${name(at)}`,
    unit: '',
    method: 'sizing',
    formula: 'worked out where the unit was sized; its unit stands at the end of its name',
    inputs: (at) => ({ spans: spans(at), depth: `${at.unit}/task/depthM` }),
  }),
];
