import type { Descriptor } from '../../model/index.ts';
import { formManual } from '../common/formManual.ts';

const { check } = formManual('composite-box');
const moments = ['span*SagDesignKNm', 'pier*HogDesignKNm'] as const;
const plates = ['boxHeightM', 'midspanBottomPlateM', 'pier*BottomPlateM', 'topFlangeWidthM'] as const;
const fy = ['yield of the plate', 'midspanBottomPlateM', 'pier*BottomPlateM'] as const;

/** Limit states of a composite box. */
export const boxGirderCheckFigures: readonly Descriptor[] = [
  ...check(
    'casting',
    [
      'stress of the top flange under steel, wet slab and working load on the bare tub, buckling between frames',
      'spans',
      'topFlangeWidthM',
      'midspanTopFlangeM',
      'framePitchM',
    ],
    fy,
    'EN 1993-2 6.3.4.2 (from memory)',
  ),
  ...check(
    'bending-spans',
    ['stresses summed over the stages', ...moments, ...plates],
    fy,
    'EN 1994-2 6.2.1.5 (from memory)',
  ),
  ...check(
    'bending-piers',
    [
      'stresses summed over the stages, slab cracked; bottom plate over its share for buckling and shear lag',
      ...moments,
      ...plates,
      'pier*PressedShare',
    ],
    fy,
    'EN 1994-2 6.2.1.5, EN 1993-1-5 3.3 and 4.5 (from memory)',
  ),
  ...check(
    'service-stress',
    ['bottom plate under characteristic loads with shrinkage', ...moments, ...plates],
    fy,
    'EN 1994-2 7.2.2 (from memory)',
  ),
  ...check(
    'fatigue',
    ['stress range of one lorry brought to the whole traffic', 'spans', ...plates],
    [
      'category / gamma',
      'data/composite-i/fatigue/:standard/categoryMPa',
      'data/composite-i/fatigue/:standard/gammaM',
    ],
    'EN 1993-1-9, EN 1993-2 9.5, AASHTO LRFD 6.6.1.2 (from memory)',
  ),
  ...check(
    'shear',
    [
      'shear of one web along its slope, torsion included',
      'pier*ShearDesignKN',
      'torqueDesignKNm',
      'webSlope',
    ],
    ['shear buckling between frames', 'boxHeightM', 'midspanWebM', 'pier*WebM', 'framePitchM'],
    'EN 1993-1-5 5.2 (from memory)',
  ),
  ...check(
    'web-slenderness',
    ['height over thickness', 'boxHeightM', 'midspanWebM'],
    ['most without ribs along the web', 'data/composite-i/web/mostHeightOverThickness'],
  ),
  ...check(
    'bending-shear',
    ['M / Mpl + (1 - Mf / Mpl) (2 V / Vb - 1)2', ...moments, 'pier*ShearDesignKN', ...plates],
    ['1 by definition'],
    'EN 1993-1-5 7.1 (from memory)',
  ),
  ...check(
    'deflection',
    [
      'traffic deflection in the middle of the worst span, by influence line',
      'midspanCompositeInertiaM4',
      'halfVehicles',
      'spans',
    ],
    ['span / limit', 'spans', 'data/:standard/deflection/limitRatio'],
  ),
  ...check(
    'girder-depth',
    ['least height of a girder', 'data/composite-i/leastGirderM'],
    ['structural depth - slab over the webs', './task/depthM', 'slabAtWebM'],
  ),
  ...check(
    'bearing-uplift',
    [
      'torque of eccentric traffic, of the curve and of skew ends by the distance of the bearings, less the least load that makes it',
      'torqueDesignKNm',
      'curveTorqueKNm',
      './task/skewDeg?',
      'bottomPlateWidthM',
      'data/composite-box/bearings/fromWebsM',
    ],
    [
      'lasting reaction on one bearing, its favourable factor on it',
      'spans',
      './task/deck/superimposedKNm',
      'slabMeanM',
    ],
  ),
];
