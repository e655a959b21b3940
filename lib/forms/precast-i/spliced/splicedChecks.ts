import type { Check } from '../../../model/index.ts';
import { check } from '../../common/checks.ts';
import { beamChecks } from '../../common/precast/precastChecks.ts';
import type { Use } from '../../common/precast/spanUse.ts';
import type { SizedSpliced } from './sizedSpliced.ts';
import type { SplicedModel } from './splicedModel.ts';

/** Every limit state of spliced beams at the stages of building and in service, and of the slab on them. */
export function splicedChecks(model: SplicedModel, spliced: SizedSpliced): Check[] {
  const { use } = spliced.sized;
  const stress = (id: string, label: string, { demand, capacity }: Use): Check =>
    check(id, label, demand, capacity, 'MPa');
  return [
    stress('first-compression', 'beams pressed by the first tendons, towers away', use.firstCompression),
    stress('first-tension', 'beams pulled after the first tendons, towers away', use.firstTension),
    stress('slab-compression', 'beams pressed under the wet slab', use.slabCompression),
    stress('slab-tension', 'beams pulled under the wet slab', use.slabTension),
    stress('second-compression', 'beams pressed by the second tendons', use.secondCompression),
    stress('service-tension', 'soffit in service, after losses', use.serviceSoffit),
    stress('service-top', 'top of the beam in service, after losses', use.serviceTop),
    stress('service-compression', 'beam pressed in service', use.serviceCompression),
    check('bending', 'bending in the spans', use.bending.demand, use.bending.capacity, 'kNm'),
    ...beamChecks(model, spliced, { piece: 'piece', pressed: 'bottom flange pressed at the piers' }),
  ];
}
