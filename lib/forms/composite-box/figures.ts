import type { At, Descriptor } from '../../model/index.ts';
import { formManual, linesOf, spansOf, steelLinesOf } from '../common/formManual.ts';
import { slabCheckFigures } from '../common/slab/slabFigures.ts';
import { boxGirderCheckFigures } from './checkFigures.ts';

const manual = formManual('composite-box');
const { figure, sized } = manual;

const sum = (values: readonly number[]): number => values.reduce((total, value) => total + value, 0);
const area = (at: At) => ({ spans: spansOf(at), width: `${at.unit}/task/deck/widthM` }) as const;
const moments = ['span*SagDesignKNm', 'pier*HogDesignKNm'] as const;

/** Composite boxes: layout, plates and statics of half a box, torsion of a whole one, steel of the deck, checks. */
export const compositeBoxFigures: readonly Descriptor[] = [
  sized(
    'boxes',
    'boxes side by side',
    'no',
    'one up to its widest deck, else as many as it takes',
    './task/deck/widthM',
    'data/composite-box/layout/mostWidthPerBoxM',
  ),
  figure('webSpacingM', {
    label: 'spacing of the webs at the top',
    unit: 'm',
    method: 'layout',
    formula: 'deck width / (2 boxes - 1 + 2 x overhang over spacing)',
    inputs: (at) => ({
      width: `${at.unit}/task/deck/widthM`,
      boxes: `${at.unit}/figures/boxes`,
      ratio: 'data/composite-box/layout/overhangOverSpacing',
    }),
    compute: ({ width, boxes, ratio }) => width / (2 * boxes - 1 + 2 * ratio),
  }),
  figure('overhangM', {
    label: 'overhang beyond the outer web',
    unit: 'm',
    method: 'product',
    formula: 'overhang over spacing x spacing of the webs',
    inputs: (at) => ({
      ratio: 'data/composite-box/layout/overhangOverSpacing',
      spacing: `${at.unit}/figures/webSpacingM`,
    }),
    compute: ({ ratio, spacing }) => ratio * spacing,
  }),
  figure('boxHeightM', {
    label: 'height of the steel box',
    unit: 'm',
    method: 'difference',
    formula: 'structural depth - slab over the webs, at least the least girder',
    inputs: (at) => ({
      depth: `${at.unit}/task/depthM`,
      slab: `${at.unit}/figures/slabAtWebM`,
      least: 'data/composite-i/leastGirderM',
    }),
    compute: ({ depth, slab, least }) => Math.max(least, depth - slab),
  }),
  ...(
    [
      ['bottomPlateWidthM', 'width of the bottom plate', 'm', 'spacing of the webs - 2 slope x height'],
      [
        'webSlope',
        'horizontal over vertical of the webs',
        '',
        'as far as the bottom plate stays wide enough',
      ],
    ] as const
  ).map(([name, label, unit, formula]) =>
    sized(
      name,
      label,
      unit,
      formula,
      'webSpacingM',
      'boxHeightM',
      'data/composite-box/web/slope',
      'data/composite-box/web/bottomOverTop',
    ),
  ),
  ...(
    [
      ['slabMeanM', 'mean thickness of the slab'],
      ['slabAtWebM', 'slab over the webs'],
    ] as const
  ).map(([name, label]) =>
    sized(
      name,
      label,
      'm',
      'least thickness in steps at which its bars stay within a practical ratio',
      'webSpacingM',
      'overhangM',
      'data/slab/steelRatioMost',
      'data/slab/leastThicknessM/:standard',
    ),
  ),
  sized(
    'boxInnerHeightM',
    'clear height inside the steel box',
    'm',
    'height of the box - thickest bottom plate',
    'boxHeightM',
    'midspanBottomPlateM',
    'pier*BottomPlateM',
  ),
  ...(
    [
      ['topFlangeWidthM', 'width of each top flange', 'm'],
      ['midspanTopFlangeM', 'top flange at midspan', 'm'],
      ['midspanBottomPlateM', 'bottom plate at midspan', 'm'],
      ['pier*TopFlangeM', 'top flange at pier *', 'm'],
      ['pier*BottomPlateM', 'bottom plate at pier *', 'm'],
    ] as const
  ).map(([name, label, unit]) =>
    sized(
      name,
      label,
      unit,
      'plates that the stages ask for: steel alone, lasting loads, traffic; fatigue; buckling where pressed',
      ...moments,
      'boxHeightM',
      'data/composite-i/longTermRatio',
      'data/composite-box/bottomPlate/leastM',
    ),
  ),
  ...(
    [
      ['midspanWebM', 'web at midspan'],
      ['pier*WebM', 'web at pier *'],
    ] as const
  ).map(([name, label]) =>
    sized(
      name,
      label,
      'm',
      'thinnest that shear with torsion and slenderness allow',
      'boxHeightM',
      'webSlope',
      'torqueDesignKNm',
      'spans',
      'data/composite-i/web/mostHeightOverThickness',
    ),
  ),
  sized(
    'midspanCompositeInertiaM4',
    'inertia of a whole box with its slab, short loads, in steel',
    'm4',
    'plates and slab over the ratio of moduli',
    'boxHeightM',
    'midspanBottomPlateM',
    'midspanWebM',
    'midspanTopFlangeM',
    'slabMeanM',
  ),
  sized(
    'ribPitchM',
    'distance of the ribs where the plate is pressed',
    'm',
    'bottom plate / (ribs + 1)',
    'bottomPlateWidthM',
    'data/composite-box/bottomPlate/stiffenerPitchM',
  ),
  sized(
    'ribHeightM',
    'height of the ribs',
    'm',
    'lowest with which the strut between frames keeps its share',
    'ribPitchM',
    'framePitchM',
    'data/composite-box/stiffener/aimReduction',
  ),
  sized(
    'framePitchM',
    'distance of the frames',
    'm',
    'equal bays of each span',
    'spans',
    'data/composite-box/frames/spacingM',
  ),
  sized(
    'shearLagAtPiers',
    'share of the bottom plate that acts at the piers',
    '',
    'beta 2 to the power kappa',
    'bottomPlateWidthM',
    'spans',
    'data/composite-box/shearLag/atSupport',
  ),
  sized(
    'pier*PressedShare',
    'share of yield the bottom plate may have at pier *',
    '',
    'shear lag x panel between ribs x rib as a strut',
    'shearLagAtPiers',
    'ribPitchM',
    'ribHeightM',
    'framePitchM',
    'pier#BottomPlateM',
  ),
  sized(
    'enclosedAreaM2',
    'area enclosed by one box',
    'm2',
    'trapezoid from the bottom plate to the middle of the slab',
    'webSpacingM',
    'bottomPlateWidthM',
    'boxHeightM',
    'slabMeanM',
  ),
  sized(
    'torsionConstantM4',
    'torsion constant of one closed box, in steel',
    'm4',
    '4 A2 / sum (s / t), slab by its shear modulus',
    'enclosedAreaM2',
    'slabMeanM',
    'midspanWebM',
    'midspanBottomPlateM',
  ),
  sized(
    'closedOverOpen',
    'torsion constant of the box over that of its plates and slab cut open',
    '',
    'closed box / sum (s t3 / 3)',
    'torsionConstantM4',
    'slabMeanM',
    'midspanWebM',
    'midspanBottomPlateM',
  ),
  sized(
    'torqueDesignKNm',
    'greatest design torque of one box',
    'kNm',
    'gamma Q eccentric traffic on a span held at its supports + M / R of the curve',
    'spans',
    './task/deck/carriagewayM',
    './task/deck/carriagewayOffsetM',
    'curveTorqueKNm',
  ),
  sized(
    'curveTorqueKNm',
    'greatest torque that curvature in plan makes',
    'kNm',
    'M / R along the span',
    'spans',
    './task/planRadiusM',
  ),
  sized(
    'skewTorqueKNm',
    'torque of skew ends, design, of all boxes',
    'kNm',
    'tan of the skew x slope of the end under superimposed load, shrinkage and traffic / (sum l / GJ + tan^2 x flexibility of the end)',
    'spans',
    './task/skewDeg?',
    './task/deck/superimposedKNm',
    'midspanCompositeInertiaM4',
    'torsionConstantM4',
  ),
  sized(
    'skewBearingKN',
    'what skew ends shift from the acute bearing to the obtuse',
    'kN',
    'torque of skew ends x farthest bearing / sum of squares of the distances of all from the middle',
    'skewTorqueKNm',
    'boxes',
    'webSpacingM',
    'bottomPlateWidthM',
    'data/composite-box/bearings/fromWebsM',
  ),
  sized(
    'halfVehicles',
    'lane-1 vehicles on half a box',
    'no',
    'lanes of the deck, or of the worst box by lever rule, halved',
    'boxes',
    './task/deck/carriagewayM',
  ),
  sized(
    'halfUniformKNm',
    'uniform traffic on half a box',
    'kN/m',
    'lanes of the deck, or of the worst box by lever rule, halved',
    'boxes',
    './task/deck/carriagewayM',
  ),
  ...(
    [
      ['span*SagDesignKNm', 'greatest design sagging of half a box in span *', 'kNm'],
      ['pier*HogDesignKNm', 'design hogging of half a box at pier *', 'kNm'],
      ['pier*ShearDesignKN', 'design shear of one web at pier *, torsion included', 'kN'],
    ] as const
  ).map(([name, label, unit]) =>
    sized(
      name,
      label,
      unit,
      'stages of an unpropped girder by their own stiffness, partial factors on each; shear of a skew deck at its obtuse corner',
      './task/skewDeg?',
      'spans',
      'halfVehicles',
      'halfUniformKNm',
      './task/deck/superimposedKNm',
      'slabMeanM',
    ),
  ),
  figure('steelKgM2', {
    label: 'structural steel per m2 of deck',
    unit: 'kg/m2',
    method: 'ratio',
    formula: 'all lines of steel / (length x deck width)',
    inputs: (at) => ({ steel: steelLinesOf(at), ...area(at) }),
    compute: ({ steel, spans, width }) => sum(steel) / (sum(spans) * width),
  }),
  figure('plateKgM2', {
    label: 'webs, top flanges and bottom plates per m2 of deck',
    unit: 'kg/m2',
    method: 'ratio',
    formula: 'plates / (length x deck width)',
    inputs: (at) => ({ steel: linesOf(at, 'webs', 'top flanges', 'bottom plates'), ...area(at) }),
    compute: ({ steel, spans, width }) => sum(steel) / (sum(spans) * width),
  }),
  sized(
    'studs',
    'shear studs',
    'no',
    'longitudinal shear V S / I over one stud, at least their least density',
    ...moments,
    'data/composite-i/studs/resistanceKN',
  ),
  ...boxGirderCheckFigures,
  ...slabCheckFigures(manual, 'slabAtWebM'),
];
