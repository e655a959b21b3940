import type { At, Descriptor } from '../../model/index.ts';
import { figuresOf, formManual, linesOf, spansOf } from '../common/formManual.ts';
import { slabCheckFigures } from '../common/slab/slabFigures.ts';

const manual = formManual('truss');
const { figure, check } = manual;

const longest = (at: At): string => {
  const { spansM } = at.design.task;
  return `${at.unit}/task/spansM/${spansM.indexOf(Math.max(...spansM))}`;
};
const deckArea = (at: At) => ({ spans: spansOf(at), width: `${at.unit}/task/deck/widthM` }) as const;
const steelLines = (at: At): string[] =>
  at.design.lines.flatMap((line, i) =>
    line.item.endsWith('-steel') ? [`${at.unit}/lines/${i}/quantity`] : [],
  );

const forces = (label: string, what: string) => ({
  label,
  unit: 'kN',
  method: 'method of sections',
  formula: `${what}; gamma G permanent + gamma Q traffic over the influence line, wind with it`,
  inputs: (at: At) => ({
    geometry: [longest(at), ...figuresOf(at, 'trussHeightM', 'panelM')],
    loads: figuresOf(at, 'trussOwnKNm', 'windTopKNm', 'windBottomKNm'),
  }),
});
const member = (label: string, from: string) => ({
  label,
  unit: 'm2',
  method: 'sizing',
  formula: 'lightest box of market plates that passes tension, buckling and fatigue',
  inputs: (at: At) => ({ force: figuresOf(at, from, 'memberWidthM') }),
});
const memberCheck = (id: string, from: string): Descriptor[] =>
  check(id, {
    demand: 'greatest force of the member',
    capacity: 'force at which what governs (yield, net section, buckling or fatigue) is used up',
    demandFrom: (at) => figuresOf(at, from),
    capacityFrom: (at) => figuresOf(at, from, 'memberWidthM'),
    sources: ['EN 1993-1-1, EN 1993-1-9 (from memory)'],
  });

/** Through truss: geometry, member forces and steel of the longest span. */
export const trussFigures: readonly Descriptor[] = [
  figure('trussHeightM', {
    label: 'height of the truss between chord axes',
    unit: 'm',
    method: 'least steel',
    formula: 'heights in the usual range tried in turn',
    inputs: (at) => ({
      span: longest(at),
      range: ['data/truss/heightOverSpan/least', 'data/truss/heightOverSpan/most'],
    }),
  }),
  figure('trussHeightOverSpan', {
    label: 'height of the truss over its span',
    unit: '',
    method: 'ratio',
    formula: 'height / span',
    inputs: (at) => ({ height: `${at.unit}/figures/trussHeightM`, span: longest(at) }),
    compute: ({ height, span }) => height / span,
  }),
  figure('panels', {
    label: 'floor panels',
    unit: 'no',
    method: 'least steel',
    formula: 'panel lengths in the usual range tried in turn',
    inputs: (at) => ({ span: longest(at), range: ['data/truss/panelM/least', 'data/truss/panelM/most'] }),
  }),
  figure('panelM', {
    label: 'length of a floor panel',
    unit: 'm',
    method: 'ratio',
    formula: 'span / panels',
    inputs: (at) => ({ span: longest(at), panels: `${at.unit}/figures/panels` }),
    compute: ({ span, panels }) => span / panels,
  }),
  figure('hangers', {
    label: 'hangers halve the main panels (1) or not (0)',
    unit: '',
    method: 'least steel',
    formula: 'both tried',
    inputs: (at) => ({
      slope: ['data/truss/diagonalSlopeDeg/least', 'data/truss/diagonalSlopeDeg/most'],
      span: [longest(at)],
    }),
  }),
  figure('planesM', {
    label: 'distance between the trusses',
    unit: 'm',
    method: 'sum',
    formula: 'deck width + two gaps + widest member',
    inputs: (at) => ({
      width: `${at.unit}/task/deck/widthM`,
      gap: 'data/truss/planeGapM',
      member: 'data/truss/memberWidth/ofSpan',
    }),
  }),
  figure('memberWidthM', {
    label: 'width of the members',
    unit: 'm',
    method: 'least steel',
    formula: 'widths up to a share of the span tried in turn',
    inputs: (at) => ({ span: longest(at), share: 'data/truss/memberWidth/ofSpan' }),
  }),
  figure('bottomChordAreaM2', member('largest bottom chord', 'bottomChordTensionKN')),
  figure('topChordAreaM2', member('largest top chord', 'topChordCompressionKN')),
  figure(
    'bottomChordTensionKN',
    forces('greatest tension of the bottom chord', 'M / h about the node opposite'),
  ),
  figure(
    'topChordCompressionKN',
    forces('greatest compression of the top chord', 'M / h about the node opposite'),
  ),
  figure('endPostCompressionKN', forces('greatest compression of the end posts', 'V / sin of the slope')),
  figure('trussOwnKNm', {
    label: 'own weight of one truss',
    unit: 'kN/m',
    method: 'take-off',
    formula: 'members and connections x 9.81 / span, found again until it stands still',
    inputs: (at) => ({ steel: steelLines(at) }),
  }),
  figure('windTopKNm', {
    label: 'wind at the top chords',
    unit: 'kN/m',
    method: 'product',
    formula: 'pressure x drag of both planes x face per m / 2',
    inputs: (at) => ({
      pressure: 'data/truss/wind/pressureKNm2',
      drag: 'data/truss/wind/dragBothPlanes',
      member: figuresOf(at, 'memberWidthM', 'trussHeightM'),
    }),
  }),
  figure('windBottomKNm', {
    label: 'wind at the bottom chords',
    unit: 'kN/m',
    method: 'sum',
    formula: 'as above + pressure x (1.3 x floor depth + height of vehicles)',
    inputs: (at) => ({
      top: `${at.unit}/figures/windTopKNm`,
      pressure: 'data/truss/wind/pressureKNm2',
      floor: `${at.unit}/task/depthM`,
      vehicles: 'data/truss/wind/vehicleHeightM',
    }),
    compute: (v) => v.top + v.pressure * 1.3 * v.floor + v.pressure * v.vehicles,
  }),
  figure('bracingKg', {
    label: 'bracing and portals of the longest span',
    unit: 'kg',
    method: 'sizing',
    formula: 'members by wind force and slenderness, with connections',
    inputs: (at) => ({ wind: figuresOf(at, 'windTopKNm', 'windBottomKNm', 'planesM') }),
  }),
  figure('deflectionM', {
    label: 'deflection of midspan under traffic',
    unit: 'm',
    method: 'virtual work',
    formula: 'sum N n l / (E A)',
    inputs: (at) => ({
      span: longest(at),
      areas: figuresOf(at, 'bottomChordAreaM2', 'topChordAreaM2', 'trussHeightM'),
    }),
  }),
  figure('slabM', {
    label: 'mean thickness of the slab',
    unit: 'm',
    method: 'slab over the stringers',
    formula: 'least thickness at which its bars stay within a practical ratio',
    inputs: (at) => ({ width: `${at.unit}/task/deck/widthM`, stringers: 'data/floor/stringerSpacingM/most' }),
  }),
  figure('floorSteelKgM2', {
    label: 'cross-girders and stringers per m2 of deck',
    unit: 'kg/m2',
    method: 'ratio',
    formula: 'mass of cross-girders and stringers per m x length / deck area',
    inputs: (at) => ({ steel: linesOf(at, 'cross-girders', 'stringers'), ...deckArea(at) }),
  }),
  figure('steelKgM2', {
    label: 'structural steel per m2 of deck',
    unit: 'kg/m2',
    method: 'ratio',
    formula: 'steel of all spans / deck area',
    inputs: (at) => ({ steel: steelLines(at), ...deckArea(at) }),
  }),
  figure('spanSteelT', {
    label: 'structural steel of the longest span',
    unit: 't',
    method: 'take-off',
    formula: 'members, bracing and floor / 1000',
    inputs: (at) => ({ steel: steelLines(at) }),
  }),
  ...memberCheck('bottom-chord', 'bottomChordTensionKN'),
  ...memberCheck('top-chord', 'topChordCompressionKN'),
  ...memberCheck('end-post', 'endPostCompressionKN'),
  ...memberCheck('diagonal', 'trussOwnKNm'),
  ...memberCheck('hanger', 'trussOwnKNm'),
  ...(['cross-girder', 'stringer'] as const).flatMap((id) =>
    check(id, {
      demand: 'highest share used of bending, shear, fatigue and stiffness as a simple composite beam',
      capacity: '1',
      demandFrom: (at) => figuresOf(at, 'panelM', 'planesM', 'slabM'),
      capacityFrom: () => [],
      sources: ['EN 1993-1-1, EN 1994-2 (from memory)'],
    }),
  ),
  ...check('floor-room', {
    demand: 'least height of a cross-girder',
    capacity: 'floor depth - slab',
    demandFrom: () => [],
    capacityFrom: (at) => [`${at.unit}/task/depthM`, ...figuresOf(at, 'slabM')],
  }),
  ...check('deflection', {
    demand: 'deflection of midspan under traffic, virtual work',
    capacity: 'span / limit of the standard',
    demandFrom: (at) => figuresOf(at, 'deflectionM'),
    capacityFrom: (at) => [longest(at), `data/${at.appraisal.site.standard}/deflection/limitRatio`],
  }),
  ...slabCheckFigures(manual, 'slabM'),
];
