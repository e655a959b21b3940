import type { At, Descriptor } from '../../model/index.ts';
import { formManual, linesOf, spansOf } from '../common/formManual.ts';
import { slabBridgeChecks } from './checkFigures.ts';
import { slabStatics } from './staticsFigures.ts';

const { figure, sized } = formManual('slab');

const sum = (values: readonly number[]): number => values.reduce((total, value) => total + value, 0);
const bars = [
  'soffit along',
  'top along',
  'across',
  'links',
  'top at the obtuse corners',
  'chairs and details',
];
const area = (at: At) => ({ spans: spansOf(at), width: `${at.unit}/task/deck/widthM` }) as const;

/** Slab bridges: section, quantities of the whole deck, strips of the wheels, steel, checks. */
export const slabBridgeFigures: readonly Descriptor[] = [
  sized(
    'wingM',
    'length of each wing',
    'm',
    'grows with the depth past the one of a plain slab, to the longest',
    './task/depthM',
    './task/deck/widthM',
    'data/slab-deck/wings/fromDepthM',
    'data/slab-deck/wings/lengthPerDepth',
    'data/slab-deck/wings/mostM',
    'data/slab-deck/wings/mostOverWidth',
  ),
  sized(
    'wingRootM',
    'thickness of the wing at the side',
    'm',
    'least in steps at which its bars stay within a practical ratio; the whole depth without wings',
    'wingM',
    './task/depthM',
    'data/slab/steelRatioMost',
  ),
  sized(
    'soffitWidthM',
    'width of the soffit',
    'm',
    'deck width - 2 (wing + side slope x (depth - root of the wing))',
    './task/deck/widthM',
    'wingM',
    'wingRootM',
    'data/slab-deck/wings/sideSlope',
  ),
  sized(
    'voidDiameterM',
    'diameter of the voids',
    'm',
    'depth - concrete above and below, at most the largest; 0 where the slab is solid',
    './task/depthM',
    'data/slab-deck/voids/fromDepthM',
    'data/slab-deck/voids/aboveM',
    'data/slab-deck/voids/belowM',
    'data/slab-deck/voids/mostDiameterM',
  ),
  sized(
    'voids',
    'voids side by side',
    'no',
    'as many as fit into the soffit with their ribs',
    'soffitWidthM',
    'voidDiameterM',
    'data/slab-deck/voids/ribM',
    'data/slab-deck/voids/edgeM',
  ),
  ...(
    [
      ['areaM2', 'area of the section in the spans', 'm2'],
      ['inertiaM4', 'inertia of the section in the spans', 'm4'],
      ['centroidFromTopM', 'centroid of the section below the top', 'm'],
    ] as const
  ).map(([name, label, unit]) =>
    sized(
      name,
      label,
      unit,
      'polygon of the outline less its voids',
      './task/depthM',
      './task/deck/widthM',
      'wingM',
      'wingRootM',
      'voids',
      'voidDiameterM',
    ),
  ),
  ...slabStatics,
  figure('concreteM3M2', {
    label: 'concrete per m2 of deck',
    unit: 'm3/m2',
    method: 'ratio',
    formula: 'slab / (length x deck width)',
    inputs: (at) => ({ lines: linesOf(at, 'slab'), ...area(at) }),
    compute: ({ lines, spans, width }) => sum(lines) / (sum(spans) * width),
  }),
  figure('barsKgM3', {
    label: 'bars per m3 of concrete',
    unit: 'kg/m3',
    method: 'ratio',
    formula: 'all bars / concrete of the slab',
    inputs: (at) => ({ bars: linesOf(at, ...bars), concrete: linesOf(at, 'slab') }),
    compute: (v) => sum(v.bars) / sum(v.concrete),
  }),
  figure('strandKgM3', {
    label: 'strand per m3 of concrete',
    unit: 'kg/m3',
    method: 'ratio',
    formula: 'tendons / concrete of the slab; 0 where none is measured',
    inputs: (at) => ({ strand: linesOf(at, 'tendons'), concrete: linesOf(at, 'slab') }),
    compute: (v) => sum(v.strand) / sum(v.concrete),
  }),
  ...slabBridgeChecks,
];
