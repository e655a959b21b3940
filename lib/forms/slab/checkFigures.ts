import type { Descriptor } from '../../model/index.ts';
import { formManual } from '../common/formManual.ts';

const { check } = formManual('slab');
const moments = ['span*OwnKNm', 'span*TrafficKNm', 'pier*OwnKNm', 'pier*TrafficKNm'] as const;
const design = 'gamma G permanent + gamma Q traffic of the heaviest metre x width + parasitic moment';

/** Limit states of a slab bridge. */
export const slabBridgeChecks: readonly Descriptor[] = [
  ...['spans', 'piers'].flatMap((where) => [
    ...check(
      `bending-${where}`,
      [design, ...moments, 'pier*ParasiticKNm'],
      [
        'strands and the most bars that fit at their design strength x lever',
        './task/depthM',
        'data/slab-deck/bars/closestM',
        'strandCount',
      ],
      'EN 1992-1-1 6.1 (from memory)',
    ),
    ...check(
      `bars-${where}`,
      [
        'bars per metre for the ultimate moment and, without tendons, stress and cracks in service',
        ...moments,
        './task/depthM',
        'data/slab-deck/crack/widthMm',
      ],
      [
        'bars of the size found at their closest',
        'data/slab-deck/bars/closestM',
        'data/slab-deck/bars/coverM',
      ],
      'EN 1992-1-1 7.3.4, AASHTO LRFD 5.6.7 (from memory)',
    ),
  ]),
  ...check(
    'service-tension',
    [
      'force with which P / A + P e / W balances the moments in service, round the tendons and, less the tension allowed there, at the faces',
      ...moments,
      'areaM2',
      'inertiaM4',
      'eccentricityMidspanM',
      'data/concrete-box/serviceTensionMPa/:standard',
    ],
    ['lasting force of the tendons', 'tendonForceKN'],
    'EN 1992-2 7.3.1, EN 1992-1-1 7.1(2), AASHTO LRFD 5.9.2 (from memory)',
  ),
  ...check(
    'tendon-room',
    ['strands where they are most', 'strandCount'],
    [
      'largest tendons at their closest; two in every rib between voids',
      'soffitWidthM',
      'voids',
      'data/slab-deck/tendons/closestM',
    ],
  ),
  ...['compression-spans', 'compression-piers', 'compression-top'].flatMap((id) =>
    check(
      id,
      [
        'P / A + P e / W + M / W at the fibre, greatest of stressing and service',
        ...moments,
        'tendonForceKN',
        'areaM2',
        'inertiaM4',
      ],
      [
        'share of the strength of the concrete',
        'data/concrete-box/compression/permanent',
        'data/concrete-box/compression/total',
        'data/materials/concreteDefaultMPa/:standard/box',
      ],
      'EN 1992-1-1 7.2 (from memory)',
    ),
  ),
  ...check(
    'stressing',
    [
      'tension at the far fibre under own weight and the tendons before their losses',
      'tendonForceKN',
      'span*OwnKNm',
      'pier*OwnKNm',
    ],
    ['tensile strength of the concrete on the day', 'data/concrete-box/compression/strengthAtTransfer'],
  ),
  ...check(
    'shear',
    [
      'gamma G permanent + gamma Q traffic in its strip - what inclined tendons carry, an effective depth off the support; traffic of a skew slab at its obtuse corner',
      './task/skewDeg?',
      'vehicleShearWidthM',
      ...moments,
    ],
    [
      'greater of the concrete alone and the most links that can be placed',
      './task/depthM',
      'soffitWidthM',
      'data/slab-deck/shear/crd',
      'data/slab-deck/shear/linkRatioMost',
      'data/slab-deck/shear/designCot',
    ],
    'EN 1992-1-1 6.2.2 and 6.2.3, AASHTO LRFD 5.7.3 (from memory)',
  ),
  ...check(
    'bars-across',
    ['bars across in the soffit', 'barsAcrossM2PerM'],
    ['25 mm bars at their closest', 'data/slab-deck/bars/closestM'],
  ),
  ...check(
    'punching',
    [
      'design reaction of the worst pier / bearings x uneven share x beta',
      'bearingsPerPier',
      ...moments,
      'data/slab-deck/punching/eccentricity',
      'data/slab-deck/punching/unevenShare',
    ],
    [
      'stress without links x control perimeter x effective depth, more with links',
      './task/depthM',
      'data/slab-deck/punching/plateM',
      'data/slab-deck/punching/linkedOverPlain',
    ],
    'EN 1992-1-1 6.4, AASHTO LRFD 5.12.8.6.3 (from memory)',
  ),
  ...check(
    'deflection',
    [
      'traffic deflection of the whole deck in the middle of the worst span, cracked where bars carry it',
      'inertiaM4',
      'spans',
      './task/deck/carriagewayM',
    ],
    ['span / limit', 'spans', 'data/:standard/deflection/limitRatio'],
  ),
  ...check(
    'deflection-lasting',
    [
      'deflection under own weight and superimposed load, cracked and with creep',
      'inertiaM4',
      'spans',
      'data/slab-deck/lastingDeflection/creep',
    ],
    ['span / limit', 'spans', 'data/slab-deck/lastingDeflection/overSpan'],
    'EN 1992-1-1 7.4 (from memory)',
  ),
];
