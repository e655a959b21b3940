import type { UnitTask } from '../../model/index.ts';
import { pretensioned } from '../common/precast/pretensioned.ts';
import { rankChoices, type RankedChoice } from '../common/precast/rankChoices.ts';
import { designSlab } from '../common/slab/designSlab.ts';
import { beamCounts, beamLayout } from './beamLayout.ts';
import { beamsFor } from './beamShapes.ts';

/**
 * Every number of beams within practice with the deepest beams that fit under its slab, cheapest first by concrete and an
 * estimate of the strand. `shapesFor` gives the deepest beams no deeper than a depth. The beams take `task.depthM` less slab and fill; the shallowest there is where that is not enough.
 */
export function rankedChoices(task: UnitTask, shapesFor: typeof beamsFor = beamsFor): RankedChoice[] {
  const haunchM = pretensioned.haunchM.value;
  const choices = beamCounts(task).flatMap((count) => {
    const layout = beamLayout(task.deck.widthM, count);
    const slab = designSlab({
      standard: task.standard,
      deck: task.deck,
      direction: 'across',
      spacingM: layout.spacingM,
      overhangM: layout.overhangM,
      continuous: count > 2,
      uniform: true,
    });
    return shapesFor(task.standard, task.depthM - slab.rootM - haunchM).map((shape) => ({
      layout,
      slab,
      shape,
      haunchM,
    }));
  });
  return rankChoices(task, choices);
}
