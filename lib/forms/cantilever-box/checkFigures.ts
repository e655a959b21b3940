import type { Descriptor } from '../../model/index.ts';
import { formManual } from '../common/formManual.ts';
import { anyBoxFigures } from '../concrete-box/anyBoxFigures.ts';

const manual = formManual('cantilever-box');
const { check } = manual;
const weight = ['span*OwnKNm', 'span*OpenKNm', 'pier*OwnKNm', 'pier*OpenKNm'] as const;
const traffic = ['span*TrafficKNm', 'pier*TrafficKNm', 'span*RestraintKNm', 'pulled*KN'] as const;
const pierSection = ['pierAreaM2', 'pierInertiaM4', 'pierCentroidFromTopM', 'workingWidthAtPiersM'] as const;
const midSection = ['areaM2', 'inertiaM4', 'centroidFromTopM', 'workingWidthM'] as const;
const overPier = [
  'strands over the pier at their design strength x lever to the bottom slab',
  'topStrandCount',
  './depthM/support',
  'bottomSlabAtPiersM',
] as const;
const strength = 'data/materials/concreteDefaultMPa/:standard/box';

/** Limit states of a haunched concrete box. */
export const cantileverCheckFigures: readonly Descriptor[] = [
  ...check('balance', ['piers that arms stand on: one at least'], ['inner supports of the unit', 'spans']),
  ...check(
    'stage-bending',
    ['gamma G moment of a free arm with its traveller', 'pier*CantileverKNm', 'travellerKN'],
    overPier,
    'EN 1992-1-1 6.1 (from memory)',
  ),
  ...check(
    'hold-down',
    ['uplift where the longer arm of a pier comes nearest to lifting a support', 'upliftKN'],
    ['weight that stands on that support', 'holdingKN'],
    'EN 1990 table A2.4(A) (from memory)',
  ),
  ...check(
    'bending-piers',
    [
      'gamma G weight + gamma Q traffic + parasitic moment, just joined or after creep, whichever is more',
      ...weight,
      ...traffic,
      'span*ParasiticKNm',
    ],
    overPier,
    'EN 1992-1-1 6.1 (from memory)',
  ),
  ...check(
    'bending-spans',
    [
      'gamma G weight + gamma Q traffic + parasitic moment, just joined or after creep, whichever is more',
      ...weight,
      ...traffic,
      'span*ParasiticKNm',
    ],
    [
      'strands of the span at their design strength x lever to the top slab',
      'bottomStrandCount',
      './task/depthM',
      'topSlabMidM',
    ],
    'EN 1992-1-1 6.1 (from memory)',
  ),
  ...check(
    'service-top',
    [
      'strands with which the top slab stays within the tension allowed, cantilevering and in service',
      'pier*CantileverKNm',
      ...weight,
      ...traffic,
      ...pierSection,
      'data/concrete-box/serviceTensionMPa/:standard',
    ],
    ['strands there', 'topStrandCount'],
    'EN 1992-2 7.3.1, AASHTO LRFD 5.9.2 (from memory)',
  ),
  ...check(
    'service-bottom',
    [
      'strands with which the bottom slab stays within the tension allowed after creep',
      ...weight,
      ...traffic,
      'span*ParasiticKNm',
      ...midSection,
      'data/concrete-box/serviceTensionMPa/:standard',
    ],
    ['strands there', 'bottomStrandCount'],
    'EN 1992-2 7.3.1, AASHTO LRFD 5.9.2 (from memory)',
  ),
  ...['compression-piers', 'compression-spans', 'compression-top'].flatMap((id) =>
    check(
      id,
      [
        'P / A + P e / W + M / W at the fibre, greatest of all stages and service',
        ...weight,
        ...traffic,
        'topStrandCount',
        'bottomStrandCount',
        ...pierSection,
        ...midSection,
      ],
      [
        'share of the strength of the concrete',
        'data/concrete-box/compression/permanent',
        'data/concrete-box/compression/total',
        strength,
      ],
      'EN 1992-1-1 7.2 (from memory)',
    ),
  ),
  ...check(
    'web-struts',
    [
      'shear and torsion of the outer web, less what the inclined bottom slab carries',
      'shearDesignKN',
      'webTrafficShare',
    ],
    [
      'struts of the web, ducts taken off',
      'webAtSupportsM',
      'webM',
      'data/concrete-box/shear/ductShare/:standard',
    ],
    'EN 1992-1-1 6.2.3, 6.3.2 (from memory)',
  ),
  ...check(
    'top-room',
    ['most strands over a pier', 'topStrandCount'],
    [
      'ducts that fit into the top slab in their layers x largest tendon',
      './task/deck/widthM',
      'data/cantilever-box/topTendons/widthShare',
      'data/cantilever-box/topTendons/spacingM',
      'data/cantilever-box/topTendons/layers',
    ],
  ),
  ...check(
    'bottom-room',
    ['most strands of a span', 'bottomStrandCount'],
    [
      'ducts that fit into the bottom slab x largest tendon',
      'webSpacingM',
      'data/cantilever-box/bottomTendons/widthShare',
      'data/cantilever-box/bottomTendons/spacingM',
      'data/cantilever-box/bottomTendons/layers',
    ],
  ),
  ...check(
    'ballast-room',
    [
      'ballast of the span that is filled most x its length / weight per m3',
      'ballast',
      'spans',
      'data/concrete-box/ballast/weightKNm3',
    ],
    ['area of the cells along that span', 'spans', './task/depthM', './depthM/support', 'webSpacingM'],
  ),
  ...anyBoxFigures(manual),
];
