import type { Descriptor } from '../../model/index.ts';
import type { formManual } from '../common/formManual.ts';

/** Checks of the edge girders and their frames, both sides. */
export function halfThroughCheckFigures({ check }: ReturnType<typeof formManual>): Descriptor[] {
  return [
    ...check(
      'bending-spans',
      [
        'greatest share used of a flange, bare steel, web reduced where it buckles, x fy',
        'sagDesignKNm',
        'edgeGirderM',
        'flangeWidthM',
        'midspanBottomFlangeM',
      ],
      ['yield of the plate'],
      'EN 1993-1-5 4.4, EN 1993-2 (from memory)',
    ),
    ...check(
      'top-flange',
      [
        'share used of the top flange as a bar on the bed of its frames, curve d, x fy',
        'topForceKN',
        'criticalKN',
      ],
      ['yield of the plate'],
      'EN 1993-2 6.3.4.2 (from memory)',
    ),
    ...check(
      'u-frame',
      [
        '(force that holds the flange + force of its own cross-girder) x post + wind',
        'holdingKN',
        'turningKN',
        'edgeGirderM',
        'data/half-through/windKNm2',
      ],
      ['section modulus of the post x fy', 'postInertiaM4'],
      'EN 1993-2 6.3.4.2, BS 5400-3 9.12.2 (from memory)',
    ),
    ...check(
      'fatigue',
      ['range of the fatigue lorry made equivalent to the traffic, at the flange', 'spans', 'edgeGirderM'],
      ['range of a flange with a stiffener', 'data/fatigue/:standard/rangeMPa/stiffener'],
      'EN 1993-1-9, AASHTO LRFD 6.6.1.2 (from memory)',
    ),
    ...check(
      'shear',
      ['gamma G permanent + gamma Q traffic, where it uses most', 'spans', 'ownKNm', 'laneVehicles'],
      ['shear buckling of the web between posts', 'midspanWebM', 'edgeGirderM', 'crossSpacingM'],
      'EN 1993-1-5 5.2 (from memory)',
    ),
    ...check(
      'impact',
      [
        'vehicle force x share that one frame keeps x height over the cross-girder',
        'data/half-through/impact/:standard/forceKN',
        'data/half-through/impact/:standard/heightM',
        'frameKNm',
      ],
      ['the weaker of post and bare cross-girder x fy', 'postInertiaM4', 'crossGirderM'],
      'EN 1991-2 4.7.2.4, AASHTO LRFD A13.2 (from memory)',
    ),
    ...check(
      'deflection',
      [
        'deflection under traffic in the middle of the worst span',
        'spans',
        'edgeGirderM',
        'midspanBottomFlangeM',
      ],
      ['span / limit of the standard', 'spans', 'data/:standard/deflection/limitRatio'],
    ),
    ...check(
      'bending-piers',
      ['greatest share used of a flange over piers x fy', 'hogDesignKNm', 'edgeGirderM', 'flangeWidthM'],
      ['yield of the plate'],
      'EN 1993-1-5 4.4 (from memory)',
    ),
    ...check(
      'bending-shear',
      ['M / Mpl + (1 - Mf / Mpl) (2 V / Vw - 1)^2 where V is over half of Vw', 'hogDesignKNm', 'midspanWebM'],
      ['1 by definition'],
      'EN 1993-1-5 7.1 (from memory)',
    ),
    ...check(
      'web-slenderness',
      ['height of the web over its thickness', 'edgeGirderM', 'midspanWebM'],
      ['most without stiffeners along the web', 'data/half-through/web/mostHeightOverThickness'],
    ),
    ...check(
      'launching',
      [
        'gamma G x own weight of the steel on the cantilever before the nose lands / modulus',
        'spans',
        'steel',
        'edgeGirderM',
        'data/half-through/launching/noseOverSpan',
        'data/half-through/launching/noseOverDeckWeight',
      ],
      ['yield of the plate'],
    ),
  ];
}
