import type { Descriptor } from '../../model/index.ts';
import { formManual } from '../common/formManual.ts';

const { check } = formManual('steel-box');
const moments = ['span*SagDesignKNm', 'pier*HogDesignKNm'] as const;
const bottom = ['midspanBottomPlateM', 'pier*BottomPlateM'] as const;
const plates = [...bottom, 'midspanDeckPlateM', 'pier*DeckPlateM', 'midspanWebM', 'pier*WebM'] as const;
const whole = ['1 by definition'] as const;

/** Limit states of a steel box. */
export const steelBoxCheckFigures: readonly Descriptor[] = [
  ...check(
    'bending-spans',
    [
      'elastic stress over yield: deck with its local stress under wheels and as a strut between crossbeams, bottom plate in tension',
      ...moments,
      ...plates,
      'ribStressMPa',
      'data/steel-box/rib/localShare',
    ],
    whole,
    'EN 1993-1-5 4, EN 1993-2 annex E (from memory)',
  ),
  ...check(
    'bending-piers',
    [
      'elastic stress of the deck in tension over yield less the local stress under wheels, shear lag on both plates',
      ...moments,
      ...plates,
      'ribStressMPa',
    ],
    whole,
    'EN 1993-1-5 3.3, EN 1993-2 annex E (from memory)',
  ),
  ...check(
    'bottom-buckling',
    [
      'elastic stress of the bottom plate over the share of yield it keeps between its stiffeners and frames',
      ...moments,
      ...bottom,
      'pier*PressedShare',
    ],
    whole,
    'EN 1993-1-5 4.4 and 4.5 (from memory)',
  ),
  ...check(
    'shear',
    [
      'shear of one web along its slope, torsion included',
      'pier*ShearDesignKN',
      'torqueDesignKNm',
      'webSlope',
    ],
    [
      'shear buckling between posts and the stiffeners along the web',
      'midspanWebM',
      'pier*WebM',
      'crossbeamPitchM',
      'data/steel-box/web/panelM',
    ],
    'EN 1993-1-5 5.2 and A.3 (from memory)',
  ),
  ...check(
    'bending-shear',
    ['bending + share of the webs x (2 V / Vb - 1)2', ...moments, 'pier*ShearDesignKN', ...plates],
    whole,
    'EN 1993-1-5 7.1 (from memory)',
  ),
  ...check(
    'fatigue',
    ['stress range of one lorry equivalent to the whole traffic over its limit', 'spans', ...bottom],
    whole,
    'EN 1993-1-9, EN 1993-2 9.5, AASHTO LRFD 6.6.1.2 (from memory)',
  ),
  ...check(
    'erection',
    [
      'stress under the moments of building over what the plates keep',
      'stageHogKNm',
      'stageSagKNm',
      ...plates,
    ],
    whole,
    'EN 1993-1-5 4 (from memory)',
  ),
  ...check(
    'launch-bearing',
    ['greatest reaction on the way / webs', 'launchReactionKN', 'webs'],
    [
      'web over a launching bearing',
      'midspanWebM',
      'midspanBottomPlateM',
      'crossbeamPitchM',
      'data/steel-box/launch/bearingM',
    ],
    'EN 1993-1-5 6 (from memory)',
  ),
  ...check(
    'deck-plate',
    [
      'least thickness under its surfacing',
      './task/deck/surfacingM',
      'data/steel-box/deckPlate/leastM',
      'data/steel-box/deckPlate/thinSurfacingM',
    ],
    ['thickness given', 'deckPlateM'],
    'EN 1993-2 annex C (from memory)',
  ),
  ...check(
    'rib',
    ['stress at the bottom of a rib under wheels and weight', 'ribStressMPa'],
    ['yield of its walls', 'ribWallM'],
    'EN 1993-2 annex C (from memory)',
  ),
  ...check(
    'rib-fatigue',
    ['stress range at the bottom of a rib under one lorry', 'ribRangeMPa'],
    ['limit of endless life', 'data/steel-box/deckFatigue/rangeMPa/:standard'],
    'EN 1993-1-9 table 8.8, AASHTO LRFD table 6.6.1.2.5-3 (from memory)',
  ),
  ...check(
    'rib-deflection',
    ['deflection under one vehicle over the span between crossbeams', 'ribInertiaM4', 'crossbeamPitchM'],
    ['most', 'data/steel-box/rib/deflectionOverSpan'],
    'AASHTO LRFD 2.5.2.6.2 (from memory)',
  ),
  ...check(
    'crossbeam',
    [
      'highest share used of bending, shear and endless life, between webs and as a bracket',
      'crossbeamDepthM',
      'crossbeamFlangeM2',
      'bracketFlangeM2',
      'crossbeamPitchM',
      'webSpacingM',
      'overhangM',
    ],
    whole,
    'EN 1993-1-1, EN 1993-1-9 (from memory)',
  ),
  ...check(
    'strut',
    ['force of a strut over its resistance to buckling', 'strutDiameterM', 'webSpacingM', './task/depthM'],
    whole,
    'EN 1993-1-1 6.3.1 (from memory)',
  ),
  ...check(
    'deflection',
    [
      'traffic deflection of the worst span, by influence line',
      'midspanInertiaM4',
      'pier*InertiaM4',
      'spans',
    ],
    ['span / limit', 'spans', 'data/:standard/deflection/limitRatio'],
  ),
  ...check(
    'bearing-uplift',
    [
      'torque of eccentric traffic, of the curve and of skew ends over half of what lasting loads and that traffic press',
      'torqueDesignKNm',
      'curveTorqueKNm',
      './task/skewDeg?',
      'spans',
      './task/deck/superimposedKNm',
    ],
    ['width of the box at the deck', 'webSpacingM', 'cells'],
  ),
  ...check(
    'box-depth',
    ['least depth in which is welded and inspected', 'data/steel-box/leastDepthM'],
    ['structural depth', './task/depthM'],
  ),
];
