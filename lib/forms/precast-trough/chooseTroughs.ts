import type { UnitTask } from '../../model/index.ts';
import type { BeamChoice, BeamLayout } from '../common/precast/beamChoice.ts';
import { countsWithin } from '../common/precast/countsWithin.ts';
import { deepestWithin } from '../common/precast/beamShape.ts';
import { evenLayout } from '../common/precast/evenLayout.ts';
import { pretensioned } from '../common/precast/pretensioned.ts';
import { rankChoices, type RankedChoice } from '../common/precast/rankChoices.ts';
import { designSlab, type SlabDesign } from '../common/slab/designSlab.ts';
import { troughData } from './troughData.ts';
import { troughShapes, webAxisM } from './troughShape.ts';

/** Every number of troughs within practice with the deepest that fit under its slab, cheapest first. */
export function troughChoices(task: UnitTask): RankedChoice[] {
  const haunchM = pretensioned.haunchM.value;
  const { leastSpacingM, mostSpacingM } = troughData.layout;
  const choices = countsWithin(task, leastSpacingM, mostSpacingM).map((count): BeamChoice => {
    const layout = { ...evenLayout(task.deck.widthM, count), overhangM: task.deck.widthM / count / 2 };
    // The webs lean: the slab is laid on the webs of the depth asked for, and the beam is what fits under it.
    const slab = slabOnWebs(task, layout, webAxisM(task.depthM, task.standard));
    const [shape] = deepestWithin(troughShapes(task.standard), task.depthM - slab.rootM - haunchM);
    return { layout, slab, shape: shape!, haunchM };
  });
  return rankChoices(task, choices);
}

/** Slab over webs in pairs: it spans the wider of the two gaps, and past the outer web. */
function slabOnWebs(task: UnitTask, layout: BeamLayout, axisM: number): SlabDesign {
  const span = Math.max(2 * axisM, layout.spacingM - 2 * axisM);
  return designSlab({
    standard: task.standard,
    deck: task.deck,
    direction: 'across',
    spacingM: span,
    overhangM: Math.max(0, layout.overhangM - axisM),
    continuous: true,
    uniform: true,
  });
}
