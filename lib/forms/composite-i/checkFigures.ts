import type { Descriptor } from '../../model/index.ts';
import { formManual } from '../common/formManual.ts';

const { check } = formManual('composite-i');
const yieldOf = (...plates: string[]): [string, ...string[]] => ['yield of the plate', ...plates];

/** Limit states of composite I-girders. */
export const compositeChecks: readonly Descriptor[] = [
  ...check(
    'casting',
    [
      'M / W of the steel girder under steel, wet slab and working load, raised by 1 / chi of the flange between bracings',
      'spans',
      'slabMeanM',
      'girderHeightM',
      'topFlangeWidthM',
      'data/composite-i/casting/constructionKNm2',
    ],
    yieldOf('midspanTopFlangeM'),
    'EN 1991-1-6 table 4.2, EN 1993-2 6.3.4.2 (from memory)',
  ),
  ...check(
    'bending-spans',
    [
      'sum over the stages of M (z - zs) / I at the flanges, greatest in the spans',
      'span*SagDesignKNm',
      'midspanSteelInertiaM4',
      'midspanCompositeInertiaM4',
    ],
    yieldOf('midspanBottomFlangeM'),
    'EN 1994-2 6.2.1.5 (from memory)',
  ),
  ...check(
    'bending-piers',
    [
      'sum over the stages of M (z - zs) / I, slab cracked; compressed flange raised by 1 / chi between bracings',
      'pier*HogDesignKNm',
      'pier*CrackedInertiaM4',
    ],
    yieldOf('pier*BottomFlangeM'),
    'EN 1994-2 6.2.1.5, EN 1993-2 6.3.4.2 (from memory)',
  ),
  ...check(
    'service-stress',
    [
      'characteristic stress of the bottom flange over the stages, with shrinkage',
      'span*SagDesignKNm',
      'midspanCompositeInertiaM4',
    ],
    yieldOf('midspanBottomFlangeM'),
    'EN 1994-2 7.2 (from memory)',
  ),
  ...check(
    'fatigue',
    [
      'stress range at the flanges of the moment range that equals the whole traffic',
      'laneVehicles',
      'midspanCompositeInertiaM4',
    ],
    [
      'range of the detail / its factor',
      'data/composite-i/fatigue/:standard/categoryMPa',
      'data/composite-i/fatigue/:standard/gammaM',
    ],
    'EN 1993-1-9, EN 1993-2 9.5 (from memory)',
  ),
  ...check(
    'shear',
    [
      'gamma G permanent + gamma Q traffic of one girder at the worst place',
      'spans',
      'pier*ShearDesignKN',
      'laneVehicles',
      'trafficUniformKNm',
    ],
    ['shear buckling of the web between stiffeners', 'midspanWebM', 'pier*WebM', 'girderHeightM'],
    'EN 1993-1-5 5 (from memory)',
  ),
  ...check(
    'bending-shear',
    [
      'M / Mpl + (1 - Mf / Mpl) (2 V / Vb - 1)^2 at the piers',
      'pier*HogDesignKNm',
      'pier*ShearDesignKN',
      'pier*WebM',
    ],
    ['1 by definition'],
    'EN 1993-1-5 7.1 (from memory)',
  ),
  ...check(
    'deflection',
    [
      'traffic deflection in the middle of the worst span, by influence line on the composite girder',
      'laneVehicles',
      'trafficUniformKNm',
      'midspanCompositeInertiaM4',
    ],
    ['span / limit of the standard', 'spans', 'data/:standard/deflection/limitRatio'],
  ),
  ...check(
    'launching',
    [
      'gamma G x moment of the bare girder over the longest span just before the nose lands / W',
      'spans',
      'plateKgM2',
      'data/composite-i/launching/noseOverSpan',
      'data/composite-i/launching/noseOverDeckWeight',
    ],
    yieldOf('midspanBottomFlangeM'),
  ),
  ...check(
    'substringers',
    ['highest share used of casting, bending, shear, fatigue and stiffness', 'substringerKgM'],
    ['1 by definition'],
    'EN 1993-1-1, EN 1993-1-9, EN 1994-2 (from memory)',
  ),
  ...check(
    'girder-depth',
    ['least height of a plate girder', 'data/composite-i/leastGirderM'],
    ['structural depth - slab over the girder', './task/depthM', 'slabAtGirderM'],
  ),
];
