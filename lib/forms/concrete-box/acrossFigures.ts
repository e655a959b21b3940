import type { Descriptor } from '../../model/index.ts';
import type { formManual } from '../common/formManual.ts';

/** Tendons across the top slab of a concrete box, and the checks of a slab that has them. */
export function acrossFigures({ sized, check }: ReturnType<typeof formManual>): Descriptor[] {
  return [
    sized(
      'acrossForceKNm',
      'lasting force of the tendons across the top slab',
      'kN/m',
      'least force that keeps the slab over and between the webs within the tension allowed under its service moments',
      'topSlabMidM',
      'topSlabRootM',
      'webSpacingM',
      'overhangM',
      'data/concrete-box/across/axisM',
      'data/concrete-box/serviceTensionMPa/:standard',
    ),
    sized(
      'acrossStrandKgM2',
      'strand of the tendons across the top slab',
      'kg/m2',
      'force / lasting stress, with stressing tails',
      'acrossForceKNm',
      'data/concrete-box/strandSlack',
    ),
    ...check(
      'slab-tendons',
      ['lasting force per metre of deck', 'acrossForceKNm'],
      [
        'strands of a tendon x lasting stress / closest spacing',
        'data/concrete-box/across/strandsPerTendon',
        'data/concrete-box/across/closestM',
        'data/concrete-box/strandAreaMm2/:standard',
      ],
    ),
    ...check(
      'slab-pressure',
      ['N / A + M / W of tendons and all loads at the pressed face', 'acrossForceKNm', 'topSlabRootM'],
      ['share of the strength of the concrete', 'data/concrete-box/compression/total'],
      'EN 1992-1-1 (from memory)',
    ),
    ...check(
      'slab-stressing',
      [
        'tendons before lasting losses against the weight of the slab alone',
        'acrossForceKNm',
        'topSlabRootM',
      ],
      ['tensile strength of the concrete', 'topSlabRootM'],
      'EN 1992-1-1 (from memory)',
    ),
  ];
}
