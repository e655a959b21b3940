import type { Descriptor } from '../../model/index.ts';
import { formManual } from '../common/formManual.ts';

const { check } = formManual('portal-frame');

const actions = [
  'spans',
  './task/depthM',
  'kneeDepthM',
  'wallTopM',
  'firstHeightM',
  'middleHeightM',
  'lastHeightM',
  './task/deck/superimposedKNm',
] as const;
const design =
  'worst of stiff and soft feet: own weight, superimposed load, fill (least, at rest or K*), temperature, shrinkage, surcharge, traffic of the heaviest metre x width, braking, each where it adds; or a middle wall struck either way beside permanent loads, fill and half of the temperature, without traffic, factors of 1; or an earthquake either way beside permanent loads and fill, factors of 1';

/** What the frame is bent by in an earthquake; nothing without one. */
const quake = 'quake*';

const bending = (id: string, ...own: readonly string[]): Descriptor[] => [
  ...check(
    `bending-${id}`,
    [design, ...actions, ...own, 'pressedEarth', 'vehicleWidthM', quake],
    [
      'strands and the most bars that fit at their design strength x lever, with the thrust that comes with the moment',
      './task/depthM',
      'data/slab-deck/bars/closestM',
      'data/portal-frame/bars/layers',
    ],
    'EN 1992-1-1 6.1 (from memory)',
  ),
  ...check(
    `bars-${id}`,
    [
      'bars over the whole width for the ultimate moment and, where nothing is prestressed, stress and cracks in service',
      ...actions,
      ...own,
      'data/slab-deck/crack/widthMm',
    ],
    [
      'bars of the size found in as many layers, at their closest',
      'data/slab-deck/bars/closestM',
      'data/portal-frame/bars/layers',
    ],
    'EN 1992-1-1 7.3.4, AASHTO LRFD 5.6.7 (from memory)',
  ),
];

/** Limit states of a portal frame. */
export const portalChecks: readonly Descriptor[] = [
  ...bending('midspan', 'midspanOwnKNm', 'midspanOwnSoftKNm'),
  ...bending('knee', 'kneeOwnKNm', 'kneeOwnSoftKNm'),
  ...bending('wall', 'kneeOwnKNm', 'kneeOwnSoftKNm'),
  ...bending('wall-inner', 'thrustOwnKN'),
  ...bending('wall-middle', 'middleOwnKNm', 'middleOwnSoftKNm', 'middleStruck*'),
  ...check(
    'wall-across',
    [
      'force of the vessel x its height over the footing, the wall a cantilever',
      'middleHeightM',
      'data/substructure/vessel/factor',
      'data/portal-frame/leg/belowGroundM',
    ],
    [
      'half of the upright bars on a lever of their own, with the weight on the wall',
      'wallTopM',
      './task/deck/widthM',
    ],
    'EN 1992-1-1 6.1 (from memory)',
  ),
  ...check(
    'quake-across',
    [
      'share of the weight x (own weight of the wall and what rests on it) x its height over the footing, the wall a cantilever',
      'quakeKN',
      'firstHeightM',
      'middleHeightM',
      'lastHeightM',
    ],
    [
      'half of the upright bars on a lever of their own, with the weight on the wall',
      'wallFootM',
      './task/deck/widthM',
    ],
    'EN 1998-2 4.1.6, EN 1992-1-1 6.1 (from memory)',
  ),
  ...['shear', 'shear-walls'].flatMap((id) =>
    check(
      id,
      [id === 'shear' ? `${design}; an effective depth off the walls` : design, ...actions, quake],
      [
        'the more of the concrete alone and the most links',
        './task/depthM',
        'wallFootM',
        'data/slab-deck/shear/crd',
        'data/slab-deck/shear/linkRatioMost',
      ],
      'EN 1992-1-1 6.2, AASHTO LRFD 5.7.3 (from memory)',
    ),
  ),
  ...check(
    'bars-across',
    [
      'wheels on a plate between the zero moments (AASHTO: share of the steel along), at least a quarter of the bars along',
      'spans',
      './task/depthM',
      'barsLowM2PerM',
    ],
    ['bars at their closest', 'data/slab-deck/bars/closestM'],
  ),
  ...check(
    'deflection',
    [
      'all lanes on the frame, on stiff or soft feet, its stiffness halved where it cracks',
      ...actions,
      'data/portal-frame/cracked/share',
    ],
    ['span over the ratio of the standard', 'spans', 'data/:standard/deflection/limitRatio'],
  ),
  ...check(
    'service-tension',
    [
      'force with which the deck stays compressed round its tendons (EN) or within its tension (AASHTO), restraint by the walls counted',
      ...actions,
      'thrustLostShare',
      'data/concrete-box/serviceTensionMPa/:standard',
    ],
    ['lasting force of the tendons', 'tendonForceKN'],
    'EN 1992-2 7.3.1, AASHTO LRFD 5.9.2 (from memory)',
  ),
  ...check(
    'tendon-room',
    ['strands', 'strandCount'],
    [
      'largest tendons side by side at their closest',
      './task/deck/widthM',
      'wingM',
      'data/slab-deck/tendons/closestM',
    ],
  ),
  ...check(
    'compression',
    ['P / A + (P e + M) / W where it is greatest', ...actions, 'tendonForceKN'],
    ['share of the strength', 'data/concrete-box/compression/total'],
  ),
  ...check(
    'stressing',
    ['own weight against the fresh force', ...actions, 'tendonForceKN'],
    ['tensile strength on that day', 'data/concrete-box/compression/strengthAtTransfer'],
  ),
];
