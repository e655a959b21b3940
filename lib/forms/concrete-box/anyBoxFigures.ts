import type { Descriptor } from '../../model/index.ts';
import type { formManual } from '../common/formManual.ts';

/** Limit states that are those of every concrete box, in the manual of one of them. */
export const anyBoxFigures = ({ check }: ReturnType<typeof formManual>): readonly Descriptor[] => [
  ...check(
    'web-stirrups',
    [
      'stirrups of the outer web over its section, shear and torsion',
      'shearDesignKN',
      'webTrafficShare',
      'webAtSupportsM',
      'data/concrete-box/shear/designCot',
    ],
    ['most that can be placed', 'data/concrete-box/stirrupRatioMost'],
    'EN 1992-1-1 6.2.3, 6.3.2 (from memory)',
  ),
  ...check(
    'inner-height',
    ['least height for striking the forms', 'data/concrete-box/leastInnerM'],
    ['clear height inside', 'boxInnerHeightM'],
  ),
  ...check(
    'deflection',
    [
      'traffic deflection in the middle of the worst span, by influence line',
      'inertiaM4',
      'spans',
      './task/deck/carriagewayM',
    ],
    ['span / limit', 'spans', 'data/concrete-box/deflectionRatio'],
  ),
  ...check(
    'bearing-uplift',
    [
      'torque of eccentric traffic, of M / R of the curve, of vehicles that push outwards and of skew ends by the distance of the bearings, less the least load that makes it',
      'spans',
      './task/skewDeg?',
      './task/deck/carriagewayM',
      './task/planRadiusM',
      'bearingsApartM',
      'data/concrete-box/centrifugal/:standard/mostShare',
      'data/concrete-box/centrifugal/:standard/radiusOfOneM',
    ],
    [
      'lasting reaction on one bearing, its favourable factor on it',
      'spans',
      'areaM2',
      './task/deck/superimposedKNm',
    ],
    'EN 1991-2 4.4.2, AASHTO LRFD 3.6.3 (from memory)',
  ),
  ...check(
    'overturning',
    [
      'eccentric traffic on the whole deck, one row of vehicles, and M / R of the curve about the bearings of one side, all supports together',
      'spans',
      './task/deck/carriagewayM',
      './task/planRadiusM',
      'bearingsApartM',
    ],
    [
      'lasting reactions at half of the distance of the bearings',
      'spans',
      'areaM2',
      './task/deck/superimposedKNm',
      'bearingsApartM',
    ],
  ),
];
