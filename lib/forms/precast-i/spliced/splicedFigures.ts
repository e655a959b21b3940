import type { Descriptor } from '../../../model/index.ts';
import { formManual } from '../../common/formManual.ts';

const { sized, figure, check } = formManual('precast-i');

/** What spliced beams tell beside other precast beams: pieces, tendons, stages. */
export const splicedManual: readonly Descriptor[] = [
  sized(
    'splices',
    'splices in a line of beams',
    'no',
    'pieces over the piers, the rest of a span in as many as the road asks for',
    'spans',
    'data/spliced/splices/atOverSpan',
    'data/pretensioned/haul/lengthM',
  ),
  sized('longestPieceM', 'longest piece', 'm', 'pieces over the piers and between them', 'spans', 'splices'),
  sized(
    'pieceStrands',
    'straight strands of a piece',
    'no',
    'fewest that carry it, more where tendons do not do',
    'ownKNm',
    'longestPieceM',
  ),
  figure('tendonStages', {
    label: 'stages in which tendons are stressed',
    unit: 'no',
    method: 'by definition',
    formula: 'before the slab and after it',
    inputs: () => ({}),
    compute: () => 2,
  }),
  sized(
    'tendons',
    'tendons of a beam',
    'no',
    'strands over those of a tendon, rounded up',
    'tendonStrands',
    'data/spliced/tendons/strands',
  ),
  sized(
    'tendonStrands',
    'strands in the tendons of a beam',
    'no',
    'fewest that hold at every stage and at ultimate',
    'ownKNm',
    'wetKNm',
    'superimposedKNm',
    'laneVehicles',
    'beamHeightM',
  ),
  sized(
    'firstStageStrands',
    'strands stressed before the slab',
    'no',
    'part with which every stage holds',
    'tendonStrands',
    'data/spliced/stages/firstShares/0',
  ),
  sized(
    'tendonLowM',
    'tendons above the soffit at midspan',
    'm',
    'axis + half the stack of ducts',
    'tendons',
    'data/spliced/tendons/axisM',
    'data/spliced/tendons/pitchM',
  ),
  sized(
    'tendonHighM',
    'tendons above the soffit over a pier',
    'm',
    'beam - axis - half the stack of ducts',
    'tendons',
    'beamHeightM',
    'data/spliced/tendons/axisM',
  ),
  sized(
    'tendonInitialMPa',
    'stress of the tendons when stressed',
    'MPa',
    'jack less friction, draw-in and shortening',
    'tendonStrands',
    'data/concrete-box/losses/frictionPerRad',
    'data/concrete-box/losses/wobbleRadPerM',
  ),
  sized(
    'tendonLastingMPa',
    'stress of the tendons in the end',
    'MPa',
    'less shrinkage, creep and relaxation',
    'tendonInitialMPa',
    'data/concrete-box/losses/longTerm',
  ),
  sized(
    'towerHeightM',
    'highest tower under a splice',
    'm',
    'mean height of the road at both supports less the depth',
    'beamHeightM',
  ),
  ...(
    [
      ['first-compression', 'stress under first tendons and beam'],
      ['slab-compression', 'stress under first tendons, beam and wet slab'],
      ['second-compression', 'stress under all tendons, beam and slab'],
    ] as const
  ).flatMap(([id, formula]) =>
    check(
      id,
      [formula, 'ownKNm', 'wetKNm', 'tendonStrands', 'firstStageStrands'],
      ['share of the cylinder strength', 'data/pretensioned/service/compression/:standard'],
    ),
  ),
  ...(
    [
      ['first-tension', 'pull under first tendons and beam'],
      ['slab-tension', 'pull under first tendons, beam and wet slab'],
    ] as const
  ).flatMap(([id, formula]) =>
    check(
      id,
      [formula, 'ownKNm', 'wetKNm', 'tendonStrands', 'firstStageStrands'],
      ['tension where no bars cross a joint', 'data/spliced/stages/tensionMPa'],
      'AASHTO LRFD 5.9.2.3.1b (from memory)',
    ),
  ),
  ...check(
    'service-top',
    ['hogging over the piers, service share of traffic, cool top', 'superimposedKNm', 'laneVehicles'],
    [
      'press of the tendons at its lower value + tension allowed',
      'tendonStrands',
      'tendonLastingMPa',
      'data/pretensioned/service/tensionMPa/:standard',
    ],
  ),
];
