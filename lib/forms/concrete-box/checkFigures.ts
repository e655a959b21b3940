import type { Descriptor } from '../../model/index.ts';
import { formManual } from '../common/formManual.ts';
import { anyBoxFigures } from './anyBoxFigures.ts';

const manual = formManual('concrete-box');
const { check } = manual;
const moments = ['span*OwnKNm', 'span*TrafficKNm', 'pier*OwnKNm', 'pier*TrafficKNm'];
/** What shear lag leaves of the flanges. */
const working = ['workingWidthM', 'workingWidthAtPiersM'] as const;

/** Limit states of a concrete box. */
export const boxCheckFigures: readonly Descriptor[] = [
  ...check(
    'service-tension',
    [
      'force with which P / A + P e / W balances the moments in service, round the tendons and, less the tension allowed there, at the faces, W with what works of the flanges',
      ...moments,
      ...working,
      'areaM2',
      'inertiaM4',
      'eccentricityMidspanM',
      'data/concrete-box/serviceTensionMPa/:standard',
    ],
    [
      'lasting force of the tendons, on its low side',
      'tendonForceKN',
      'data/concrete-box/prestressSpread/:standard',
    ],
    'EN 1992-2 7.3.1, EN 1992-1-1 7.1(2), AASHTO LRFD 5.9.2 (from memory)',
  ),
  ...check(
    'bending-spans',
    [
      'gamma G permanent + gamma Q traffic + parasitic moment',
      'span*OwnKNm',
      'span*TrafficKNm',
      'pier*ParasiticKNm',
    ],
    [
      'strand at its design strength x lever to the pressed slab',
      'strandCount',
      'eccentricityMidspanM',
      'topSlabMidM',
    ],
    'EN 1992-1-1 6.1 (from memory)',
  ),
  ...check(
    'bending-piers',
    [
      'gamma G permanent + gamma Q traffic - parasitic moment',
      'pier*OwnKNm',
      'pier*TrafficKNm',
      'pier*ParasiticKNm',
    ],
    [
      'strand at its design strength x lever to the bottom slab',
      'strandCount',
      'eccentricityPierM',
      'bottomSlabAtPiersM',
    ],
    'EN 1992-1-1 6.1 (from memory)',
  ),
  ...['compression-spans', 'compression-piers', 'compression-top'].flatMap((id) =>
    check(
      id,
      [
        'P / A + P e / W + M / W at the fibre, W with what works of the flanges, greatest of stressing and service',
        ...moments,
        ...working,
        'tendonForceKN',
        'areaM2',
        'inertiaM4',
        'pierAreaM2',
        'pierInertiaM4',
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
    'web-struts',
    ['shear and torsion of the outer web', 'shearDesignKN', 'webTrafficShare', 'enclosedAreaM2'],
    [
      'struts of the web, ducts taken off',
      'webAtSupportsM',
      'webM',
      'data/concrete-box/shear/ductShare/:standard',
    ],
    'EN 1992-1-1 6.2.3, 6.3.2 (from memory)',
  ),
  ...check(
    'tendon-room',
    ['strands of one web', 'strandCount', 'webs'],
    [
      'ducts that fit into a web, two abreast, in its rows',
      './task/depthM',
      'data/concrete-box/tendonRows/mostOverDepth',
      'data/concrete-box/tendonRows/abreast',
    ],
  ),
  ...check(
    'launching',
    [
      'compression of the concrete while launching',
      'launchingHogKNm',
      'launchingSagKNm',
      'launchingForceKN',
      'areaM2',
      'inertiaM4',
    ],
    [
      'share of the strength on the day',
      'data/concrete-box/compression/transfer',
      'data/concrete-box/launching/strengthShare',
    ],
  ),
  ...anyBoxFigures(manual),
];
