import type { At, Descriptor } from '../../model/index.ts';
import { formManual } from '../common/formManual.ts';
import { slabCheckFigures } from '../common/slab/slabFigures.ts';
import { floorCheckFigures } from '../floor/floorFigures.ts';

const manual = formManual('truss');
const { figure, sized, check } = manual;

const longest = (at: At): string => {
  const { spansM } = at.design.task;
  return `${at.unit}/task/spansM/${spansM.indexOf(Math.max(...spansM))}`;
};

const force = (name: string, label: string, statics: string): Descriptor =>
  sized(
    name,
    label,
    'kN',
    `${statics}; gamma G permanent + gamma Q traffic over the influence line, wind with it`,
    'spans',
    'trussHeightM',
    'panelM',
    'trussOwnKNm',
    'windTopKNm',
    'windBottomKNm',
  );
const area = (name: string, label: string, of: string): Descriptor =>
  sized(
    name,
    label,
    'm2',
    'lightest box of market plates that passes tension, buckling and fatigue',
    of,
    'memberWidthM',
  );
const memberCheck = (id: string, of: string): Descriptor[] =>
  check(
    id,
    ['greatest force of the member', of],
    ['force at which what governs (yield, net section, buckling or fatigue) is used up', of, 'memberWidthM'],
    'EN 1993-1-1, EN 1993-1-9 (from memory)',
  );

/** Through truss: geometry, member forces and steel of the longest span. */
export const trussFigures: readonly Descriptor[] = [
  sized(
    'trussHeightM',
    'height of the truss between chord axes',
    'm',
    'least steel of the heights in the usual range',
    'spans',
    'data/truss/heightOverSpan/least',
    'data/truss/heightOverSpan/most',
  ),
  figure('trussHeightOverSpan', {
    label: 'height of the truss over its span',
    unit: '',
    method: 'ratio',
    formula: 'height / span',
    inputs: (at) => ({ height: `${at.unit}/figures/trussHeightM`, span: longest(at) }),
    compute: ({ height, span }) => height / span,
  }),
  sized(
    'panels',
    'floor panels',
    'no',
    'least steel of the panel lengths in the usual range',
    'spans',
    'data/truss/panelM/least',
    'data/truss/panelM/most',
  ),
  figure('panelM', {
    label: 'length of a floor panel',
    unit: 'm',
    method: 'ratio',
    formula: 'span / panels',
    inputs: (at) => ({ span: longest(at), panels: `${at.unit}/figures/panels` }),
    compute: ({ span, panels }) => span / panels,
  }),
  sized(
    'hangers',
    'hangers halve the main panels (1) or not (0)',
    '',
    'least steel of both',
    'spans',
    'data/truss/diagonalSlopeDeg/least',
    'data/truss/diagonalSlopeDeg/most',
  ),
  sized(
    'planesM',
    'distance between the trusses',
    'm',
    'deck width + two gaps + widest member',
    './task/deck/widthM',
    'data/truss/planeGapM',
    'data/truss/memberWidth/ofSpan',
  ),
  sized(
    'memberWidthM',
    'width of the members',
    'm',
    'least steel of the widths up to a share of the span',
    'spans',
    'data/truss/memberWidth/ofSpan',
  ),
  area('bottomChordAreaM2', 'largest bottom chord', 'bottomChordTensionKN'),
  area('topChordAreaM2', 'largest top chord', 'topChordCompressionKN'),
  force('bottomChordTensionKN', 'greatest tension of the bottom chord', 'M / h about the node opposite'),
  force('topChordCompressionKN', 'greatest compression of the top chord', 'M / h about the node opposite'),
  force('endPostCompressionKN', 'greatest compression of the end posts', 'V / sine of the slope'),
  sized(
    'trussOwnKNm',
    'own weight of one truss',
    'kN/m',
    'members and connections x 9.81 / span, found again until it stands still',
    'steel',
  ),
  sized(
    'windTopKNm',
    'wind at the top chords',
    'kN/m',
    'pressure x drag of both planes x face per m / 2',
    'data/truss/wind/pressureKNm2',
    'data/truss/wind/dragBothPlanes',
    'memberWidthM',
    'trussHeightM',
  ),
  figure('windBottomKNm', {
    label: 'wind at the bottom chords',
    unit: 'kN/m',
    method: 'sum',
    formula: 'wind on the trusses as at the top + pressure x (1.3 x floor depth + height of vehicles)',
    inputs: (at) => ({
      top: `${at.unit}/figures/windTopKNm`,
      pressure: 'data/truss/wind/pressureKNm2',
      floor: `${at.unit}/task/depthM`,
      vehicles: 'data/truss/wind/vehicleHeightM',
    }),
    compute: (v) => v.top + v.pressure * 1.3 * v.floor + v.pressure * v.vehicles,
  }),
  sized(
    'bracingKg',
    'bracing and portals of the longest span',
    'kg',
    'members by wind force and slenderness, with connections; struts and portals along the supports',
    './task/skewDeg?',
    'windTopKNm',
    'windBottomKNm',
    'planesM',
    'data/truss/bracing/slenderness',
  ),
  sized(
    'deflectionM',
    'deflection of midspan under traffic',
    'm',
    'virtual work: sum N n l / (E A)',
    'spans',
    'bottomChordAreaM2',
    'topChordAreaM2',
    'trussHeightM',
  ),
  sized(
    'slabM',
    'mean thickness of the slab',
    'm',
    'least thickness over the stringers at which its bars stay within a practical ratio',
    './task/deck/widthM',
    'data/floor/stringerSpacingM/most',
  ),
  sized(
    'floorSteelKgM2',
    'cross-girders and stringers per m2 of deck',
    'kg/m2',
    'their mass per m x length / deck area; cross-girders along the supports',
    './task/skewDeg?',
    'planesM',
    'panelM',
    'spans',
    './task/deck/widthM',
  ),
  sized(
    'steelKgM2',
    'structural steel per m2 of deck',
    'kg/m2',
    'members, bracing and floor of all spans / deck area',
    'steel',
    'spans',
    './task/deck/widthM',
  ),
  sized(
    'spanSteelT',
    'structural steel of the longest span',
    't',
    'members, bracing and floor / 1000',
    'steel',
  ),
  ...memberCheck('bottom-chord', 'bottomChordTensionKN'),
  ...memberCheck('top-chord', 'topChordCompressionKN'),
  ...memberCheck('end-post', 'endPostCompressionKN'),
  ...memberCheck('diagonal', 'trussOwnKNm'),
  ...memberCheck('hanger', 'trussOwnKNm'),
  ...floorCheckFigures(manual),
  ...check(
    'deflection',
    ['deflection of midspan under traffic, by virtual work', 'deflectionM'],
    ['span / limit of the standard', 'spans', 'data/:standard/deflection/limitRatio'],
  ),
  ...slabCheckFigures(manual, 'slabM'),
];
