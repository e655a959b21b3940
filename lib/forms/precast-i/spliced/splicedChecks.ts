import type { Check } from '../../../model/index.ts';
import { check } from '../../common/checks.ts';
import { liftingSafety } from '../../common/precast/liftingStability.ts';
import { deflection, heaviestBeam } from '../../common/precast/precastChecks.ts';
import { pretensioned } from '../../common/precast/pretensioned.ts';
import type { Use } from '../../common/precast/spanUse.ts';
import type { SizedSpliced } from './sizedSpliced.ts';
import type { SplicedModel } from './splicedModel.ts';

/** Every limit state of spliced beams at the stages of building and in service, and of the slab on them. */
export function splicedChecks(model: SplicedModel, { sized, shears, piers }: SizedSpliced): Check[] {
  const { use } = sized;
  const stress = (id: string, label: string, { demand, capacity }: Use): Check =>
    check(id, label, demand, capacity, 'MPa');
  const greatest = (values: readonly number[]): number => Math.max(0, ...values);
  const { haul, lifting, continuity } = pretensioned;
  const piece = heaviestBeam(model);
  const checks = [
    stress('first-compression', 'beams pressed by the first tendons, towers away', use.firstCompression),
    stress('first-tension', 'beams pulled after the first tendons, towers away', use.firstTension),
    stress('slab-compression', 'beams pressed under the wet slab', use.slabCompression),
    stress('slab-tension', 'beams pulled under the wet slab', use.slabTension),
    stress('second-compression', 'beams pressed by the second tendons', use.secondCompression),
    stress('service-tension', 'soffit in service, after losses', use.serviceSoffit),
    stress('service-top', 'top of the beam in service, after losses', use.serviceTop),
    stress('service-compression', 'beam pressed in service', use.serviceCompression),
    check('bending', 'bending in the spans', use.bending.demand, use.bending.capacity, 'kNm'),
    check('web-struts', 'shear: struts in the web', greatest(shears.map((s) => s.crushing)), 1, '1'),
    check('web-links', 'shear: links that fit in the web', greatest(shears.map((s) => s.crowding)), 1, '1'),
    check('deflection', 'deflection under traffic', ...deflection(model), 'm'),
    check(
      'lifting',
      'piece stable while it hangs',
      lifting.leastSafety,
      liftingSafety(model, piece.lengthM),
      '1',
    ),
    check('hauled-length', 'length of a piece on the road', piece.lengthM, haul.lengthM, 'm'),
    check('hauled-mass', 'mass of a piece on the road', piece.massT, haul.massT, 't'),
    ...model.slab.checks,
  ];
  if (piers.length > 0)
    checks.push(
      check(
        'pier-bars',
        'bars of the slab over the piers',
        greatest(piers.map((p) => p.ratio)),
        continuity.mostRatio,
        '1',
      ),
      check(
        'pier-compression',
        'bottom flange pressed at the piers',
        greatest(piers.map((p) => p.pressed)),
        1,
        '1',
      ),
    );
  return checks;
}
