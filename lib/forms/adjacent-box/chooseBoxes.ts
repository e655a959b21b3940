import type { UnitTask } from '../../model/index.ts';
import type { BeamChoice } from '../common/precast/beamChoice.ts';
import { countsWithin } from '../common/precast/countsWithin.ts';
import { evenLayout } from '../common/precast/evenLayout.ts';
import { rankChoices, type RankedChoice } from '../common/precast/rankChoices.ts';
import { adjacentData } from './adjacentData.ts';
import { boxBeam } from './boxBeam.ts';
import { topping } from './topping.ts';

/** Beams of one width that fill the deck, the deepest that fit under the topping; cheapest number first. */
export function boxChoices(task: UnitTask): RankedChoice[] {
  const toppingM = adjacentData.topping[task.standard];
  const { depthsM } = adjacentData.box[task.standard];
  const depthM = depthsM.findLast((one) => one <= task.depthM - toppingM + 1e-6) ?? depthsM[0]!;
  const { leastWidthM, mostWidthM, jointM } = adjacentData.layout;
  // Narrower beams only have more webs: one number more than the fewest is tried for their strands.
  const counts = countsWithin(task, leastWidthM + jointM, mostWidthM[task.standard] + jointM).slice(0, 2);
  const choices = counts.map((count): BeamChoice => {
    // Half a beam stands beyond its axis: the topping ends with it.
    const layout = evenLayout(task.deck.widthM, count);
    const widthM = layout.spacingM - jointM;
    const shape = boxBeam(widthM, depthM, task.standard);
    return { layout, shape, slab: topping(task, shape), haunchM: 0 };
  });
  return rankChoices(task, choices);
}
