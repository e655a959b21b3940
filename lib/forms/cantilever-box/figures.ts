import type { Descriptor } from '../../model/index.ts';
import { formManual } from '../common/formManual.ts';
import { slabCheckFigures } from '../common/slab/slabFigures.ts';
import { acrossFigures } from '../concrete-box/acrossFigures.ts';
import { concreteFigures } from '../concrete-box/concreteFigures.ts';
import { ribFigures } from '../concrete-box/ribFigures.ts';
import { strutFigures } from '../concrete-box/strutFigures.ts';
import { cantileverCheckFigures } from './checkFigures.ts';
import { stages, tendons, type Row } from './stageFigures.ts';

const manual = formManual('cantilever-box');
const { sized } = manual;
const depths = ['./task/depthM', './depthM/support'] as const;

const section: readonly Row[] = [
  [
    'cells',
    'cells of the box',
    'no',
    'as few as keep the webs within their practical spacing, which is wider where tendons run across the slab',
    './task/deck/widthM',
    './task/boxWidthM?',
  ],
  ['webs', 'webs of the box', 'no', 'cells + 1', 'cells'],
  [
    'webSpacingM',
    'spacing of the webs',
    'm',
    'width asked of the box over its cells; where none is, deck width over cells and overhangs',
    './task/deck/widthM',
    './task/boxWidthM?',
    'cells',
  ],
  [
    'overhangM',
    'overhang beyond the outer web, or beyond its strut heads',
    'm',
    'what webs and strut heads leave of half the deck width',
    './task/deck/widthM',
    'cells',
    'webSpacingM',
  ],
  [
    'topSlabMidM',
    'top slab between the webs',
    'm',
    'least thickness with practical bars or tendons',
    'webSpacingM',
  ],
  [
    'topSlabRootM',
    'top slab over the webs',
    'm',
    'least thickness with practical bars or tendons',
    'overhangM',
  ],
  [
    'webM',
    'web in the spans',
    'm',
    'least practical; thicker by shear and torsion',
    ...depths,
    'spans',
    'span*TrafficKNm',
    'data/concrete-box/webLeastM/:standard',
  ],
  [
    'webAtSupportsM',
    'web at the supports',
    'm',
    'thicker in steps until struts and stirrups hold',
    'spans',
    './depthM/support',
    'pier*TrafficKNm',
    'data/concrete-box/stirrupRatioMost',
  ],
  [
    'bottomSlabM',
    'bottom slab in the spans',
    'm',
    'two layers of bars and its clear span; thicker by compression',
    'webSpacingM',
  ],
  [
    'bottomSlabAtPiersM',
    'bottom slab at the piers',
    'm',
    'thicker in steps until it holds the compression of all stages and of ultimate bending',
    'spans',
    './depthM/support',
    'pier*TrafficKNm',
    'data/concrete-box/compression/total',
  ],
  [
    'skewTorqueKNm',
    'torque of skew ends, design',
    'kNm',
    'tan of the skew x slope of the end / (sum l / GJ + tan^2 x flexibility of the end)',
    'spans',
    './task/skewDeg?',
    'webSpacingM',
    'cells',
  ],
  [
    'skewBearingKN',
    'what skew ends shift from the acute bearing to the obtuse',
    'kN',
    'torque of skew ends / distance of the bearings there',
    'skewTorqueKNm',
    'webSpacingM',
  ],
  [
    'bearingsApartM',
    'distance of the two bearings under the box, the least',
    'm',
    'width of the soffit over the piers, less what they stand inside its edges, at least half of it',
    'webSpacingM',
    'cells',
    './depthM/support',
    'data/concrete-box/bearings/fromEdgesM',
  ],
  [
    'boxInnerHeightM',
    'clear height inside the box at midspan',
    'm',
    'depth - top slab - bottom slab',
    './task/depthM',
    'bottomSlabM',
    'topSlabMidM',
  ],
  ...(
    [
      ['areaM2', 'area at midspan', 'm2', 'webM', 'bottomSlabM'],
      ['inertiaM4', 'inertia at midspan', 'm4', 'webM', 'bottomSlabM'],
      ['centroidFromTopM', 'centroid at midspan below the top', 'm', 'webM', 'bottomSlabM'],
      ['pierAreaM2', 'area over the piers', 'm2', 'webAtSupportsM', 'bottomSlabAtPiersM'],
      ['pierInertiaM4', 'inertia over the piers', 'm4', 'webAtSupportsM', 'bottomSlabAtPiersM'],
      [
        'pierCentroidFromTopM',
        'centroid over the piers below the top',
        'm',
        'webAtSupportsM',
        'bottomSlabAtPiersM',
      ],
    ] as const
  ).map(([name, label, unit, ...from]): Row => [
    name,
    label,
    unit,
    'polygon of the outline less its cells',
    ...depths,
    ...from,
  ]),
];

/** Cantilevered box: section, stages, tendons, and the checks of its top slab. */
export const cantileverFigures: readonly Descriptor[] = [
  ...[...section, ...stages, ...tendons].map((row) => sized(...row)),
  ...cantileverCheckFigures,
  ...slabCheckFigures(manual, 'topSlabMidM'),
  ...acrossFigures(manual),
  ...concreteFigures(manual),
  ...strutFigures(manual),
  ...ribFigures(manual),
];
