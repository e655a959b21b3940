import type { At, Descriptor } from '../../model/index.ts';
import { formManual, linesOf, spansOf } from '../common/formManual.ts';
import { slabCheckFigures } from '../common/slab/slabFigures.ts';
import { compositeChecks } from './checkFigures.ts';
import { staticsFigures } from './staticsFigures.ts';

const manual = formManual('composite-i');
const { figure, sized, line } = manual;

const sum = (values: readonly number[]): number => values.reduce((total, value) => total + value, 0);
const plates = ['webs', 'top flanges', 'bottom flanges'] as const;
const otherSteel = [
  'cross-girders',
  'bracing',
  'bracing in plan',
  'substringers',
  'stiffeners',
  'shear studs',
  'welds and bolts',
  'field splices',
] as const;
const area = (at: At) => ({ spans: spansOf(at), width: `${at.unit}/task/deck/widthM` }) as const;

const midPlates = (at: At) =>
  ({
    height: `${at.unit}/figures/${at.design.figures['middleHeightM'] === undefined ? 'girderHeightM' : 'middleHeightM'}`,
    topWidth: `${at.unit}/figures/topFlangeWidthM`,
    bottomWidth: `${at.unit}/figures/bottomFlangeWidthM`,
    top: `${at.unit}/figures/midspanTopFlangeM`,
    bottom: `${at.unit}/figures/midspanBottomFlangeM`,
    web: `${at.unit}/figures/midspanWebM`,
  }) as const;

/** Composite I-girders: layout, statics and plates of one girder, and the steel of the deck. */
export const compositeFigures: readonly Descriptor[] = [
  sized(
    'girders',
    'girders',
    'no',
    'two up to the widest deck of a twin, else by the widest span of the slab between girders and substringers; or as asked',
    './task/deck/widthM',
    'data/composite-i/twin/mostWidthM',
    'data/composite-i/multi/mostSpacingM',
  ),
  figure('spacingM', {
    label: 'spacing of the girders',
    unit: 'm',
    method: 'layout',
    formula: 'deck width / (girders - 1 + 2 x overhang over spacing)',
    inputs: (at) => ({
      width: `${at.unit}/task/deck/widthM`,
      girders: `${at.unit}/figures/girders`,
      ratio: `data/composite-i/${at.design.figures['girders'] === 2 ? 'twin' : 'multi'}/overhangOverSpacing`,
    }),
    compute: ({ width, girders, ratio }) => width / (girders - 1 + 2 * ratio),
  }),
  figure('girderHeightM', {
    label: 'height of the girder over both flanges',
    unit: 'm',
    method: 'difference',
    formula: 'structural depth - slab over the girder, at least the least girder',
    inputs: (at) => ({
      depth: `${at.unit}/task/depthM`,
      slab: `${at.unit}/figures/slabAtGirderM`,
      least: 'data/composite-i/leastGirderM',
    }),
    compute: ({ depth, slab, least }) => Math.max(least, depth - slab),
  }),
  sized(
    'middleHeightM',
    'height of the girder over the middle stretch of the longest span',
    'm',
    'height at midspan and the rise of the haunch towards the end of the stretch, mean',
    'girderHeightM',
    'pierGirderHeightM',
  ),
  sized(
    'pierGirderHeightM',
    'height of the girder over its piers',
    'm',
    'pier depth asked for - slab over the girder',
    'slabAtGirderM',
    './depthM/support',
  ),
  sized(
    'substringerKgM',
    'mass of a substringer',
    'kg/m',
    'lightest composite beam between cross-frames that passes casting, bending, shear, fatigue and stiffness',
    'spacingM',
    'slabAtGirderM',
    'data/composite-i/bracing/mostM',
    'data/floor/stringerDepthOverSpan',
  ),
  sized(
    'slabMeanM',
    'mean thickness of the slab',
    'm',
    'concrete / deck width, haunches over a quarter of the spacing, overhangs tapered',
    'slabAtGirderM',
    'spacingM',
    './task/deck/widthM',
  ),
  sized(
    'slabAtGirderM',
    'slab over the girder',
    'm',
    'least thickness in steps at which the bars of the overhang and over the girder stay within a practical ratio',
    'spacingM',
    'data/slab/steelRatioMost',
    'data/slab/stepM',
  ),
  sized(
    'modularRatio',
    'ratio of moduli for short loads',
    '',
    'E of steel / Ecm of the slab',
    'data/materials/concreteDefaultMPa/:standard/slab',
    'data/materials/steel/S355/eMPa',
  ),
  {
    ...sized(
      'curvatureFactor',
      'what curvature in plan adds to the outer girder',
      '',
      '1 + n Le^2 / (pi^2 C R D), D between the outer girders, C for those between; 1 on a straight',
      './task/planRadiusM',
      'girders',
      'spacingM',
      'spans',
    ),
    sources: ['V-load method (from memory)'],
  },
  sized(
    'laneVehicles',
    'vehicles on the girder that carries most',
    'no',
    'lanes at their worst place across the deck: lever rule, under AASHTO LRFD distribution factors, less on a skew; with curvature',
    './task/skewDeg?',
    'girders',
    'spacingM',
    'site/deck/carriagewayM',
    'site/deck/carriagewayOffsetM',
    'curvatureFactor',
  ),
  sized(
    'trafficUniformKNm',
    'uniform traffic on the girder that carries most',
    'kN/m',
    'lane loads over the influence line across the deck; with curvature',
    'girders',
    'spacingM',
    'site/deck/carriagewayM',
    'site/deck/carriagewayOffsetM',
    'curvatureFactor',
  ),
  ...(['top', 'bottom'] as const).map((side) =>
    sized(
      `${side}FlangeWidthM`,
      `width of the ${side} flange`,
      'm',
      'one width along the girder, by its height, its bracing and the thickest plate',
      'girderHeightM',
      'data/composite-i/flange/leastWidthM',
      'data/composite-i/flange/mostWidthM',
    ),
  ),
  ...(
    [
      ['TopFlangeM', 'top flange'],
      ['BottomFlangeM', 'bottom flange'],
      ['WebM', 'web'],
    ] as const
  ).flatMap(([key, word]) => [
    sized(
      `midspan${key}`,
      `${word} in the middle of the longest span`,
      'm',
      'thinnest plate on the market that passes every check there',
      'sagDesignKNm',
      'girderHeightM',
      'laneVehicles',
      'trafficUniformKNm',
    ),
    sized(
      `pier*${key}`,
      `${word} at pier *`,
      'm',
      'thinnest plate on the market that passes every check; the thicker beside the pier',
      'pier#HogDesignKNm',
      'pier#ShearDesignKN',
      'girderHeightM',
    ),
  ]),
  figure('midspanSteelAreaM2', {
    label: 'steel area of the girder in the middle of the longest span',
    unit: 'm2',
    method: 'section',
    formula: 'top flange + bottom flange + web',
    inputs: midPlates,
    compute: (v) => v.topWidth * v.top + v.bottomWidth * v.bottom + (v.height - v.top - v.bottom) * v.web,
  }),
  figure('midspanSteelInertiaM4', {
    label: 'inertia of the steel girder in the middle of the longest span',
    unit: 'm4',
    method: 'section',
    formula: 'sum A (z - zs)^2 + own inertias of the three plates',
    inputs: midPlates,
    compute: (v) => {
      const web = v.height - v.top - v.bottom;
      const parts = [
        { area: v.topWidth * v.top, at: v.height - v.top / 2, high: v.top },
        { area: v.bottomWidth * v.bottom, at: v.bottom / 2, high: v.bottom },
        { area: web * v.web, at: v.bottom + web / 2, high: web },
      ];
      const centroid = sum(parts.map((part) => part.area * part.at)) / sum(parts.map((part) => part.area));
      return sum(parts.map((part) => part.area * ((part.at - centroid) ** 2 + part.high ** 2 / 12)));
    },
  }),
  sized(
    'midspanCompositeInertiaM4',
    'inertia of girder and slab in the middle of the longest span, short loads',
    'm4',
    'steel girder, and effective slab / ratio of moduli, about their common axis',
    'midspanSteelInertiaM4',
    'midspanSteelAreaM2',
    'slabMeanM',
    'modularRatio',
    'spacingM',
  ),
  sized(
    'pier*CrackedInertiaM4',
    'inertia of girder and bars at pier *, slab cracked',
    'm4',
    'steel girder and bars of the effective slab, about their common axis',
    'pier#TopFlangeM',
    'pier#BottomFlangeM',
    'pier#WebM',
    'girderHeightM',
    'data/composite-i/barsOverPiers/:standard',
  ),
  ...staticsFigures,
  sized(
    'studs',
    'shear studs',
    'no',
    'along the girders the greater of V S / I / resistance of a stud, and the least number',
    'girders',
    'midspanCompositeInertiaM4',
    'topFlangeWidthM',
    'data/composite-i/studs/resistanceKN',
    'data/composite-i/studs/leastPerM2',
  ),
  ...(
    [
      ['steelKgM2', 'structural steel per m2 of deck', [...plates, ...otherSteel]],
      ['plateKgM2', 'webs and flanges per m2 of deck', plates],
    ] as const
  ).map(([name, label, what]) =>
    figure(name, {
      label,
      unit: 'kg/m2',
      method: 'ratio',
      formula: 'lines of the unit / (length x deck width)',
      inputs: (at) => ({ lines: linesOf(at, ...what), ...area(at) }),
      compute: ({ lines, spans, width }) => sum(lines) / (sum(spans) * width),
    }),
  ),
  line('deck slab', {
    label: 'deck slab',
    unit: 'm3',
    method: 'volume',
    formula: 'mean thickness x length x deck width',
    inputs: (at) => ({ mean: `${at.unit}/figures/slabMeanM`, ...area(at) }),
    compute: ({ mean, spans, width }) => mean * sum(spans) * width,
  }),
  line('shear studs', {
    label: 'shear studs',
    unit: 'kg',
    method: 'product',
    formula: 'studs x mass of one',
    inputs: (at) => ({ studs: `${at.unit}/figures/studs`, each: 'data/composite-i/studs/kgEach' }),
    compute: ({ studs, each }) => studs * each,
  }),
  line('welds and bolts', {
    label: 'welds and bolts',
    unit: 'kg',
    method: 'share',
    formula: 'share x (webs + flanges + cross-girders or bracing + stiffeners)',
    inputs: (at) => ({
      share: 'data/composite-i/weldsAndBoltsShare',
      steel: linesOf(at, ...plates, 'cross-girders', 'bracing', 'bracing in plan', 'stiffeners'),
    }),
    compute: ({ share, steel }) => share * sum(steel),
  }),
  line('field splices', {
    label: 'field splices',
    unit: 'kg',
    method: 'sizing',
    formula:
      'at each joint of the pieces plates on both faces of flanges and web with the bolts that carry their yield',
    inputs: (at) => ({
      plates: linesOf(at, ...plates),
      girders: `${at.unit}/figures/girders`,
      piece: 'data/composite-i/pieceLengthM',
      bolt: 'data/composite-i/fieldSplice/boltKN',
    }),
  }),
  ...compositeChecks,
  ...slabCheckFigures(manual, 'slabMeanM'),
];
