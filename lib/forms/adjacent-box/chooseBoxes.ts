import type { UnitTask } from '../../model/index.ts';
import type { BeamChoice, BeamLayout } from '../common/precast/beamChoice.ts';
import { rankChoices, type RankedChoice } from '../common/precast/rankChoices.ts';
import { adjacentData } from './adjacentData.ts';
import { boxBeam } from './boxBeam.ts';
import { topping } from './topping.ts';

/** Beams of one width that fill the deck, the deepest that fit under the topping; cheapest number first. */
export function boxChoices(task: UnitTask): RankedChoice[] {
  const toppingM = adjacentData.topping[task.standard];
  const { depthsM } = adjacentData.box[task.standard];
  const depthM = depthsM.findLast((one) => one <= task.depthM - toppingM + 1e-6) ?? depthsM[0]!;
  const choices = boxCounts(task).map((count): BeamChoice => {
    const layout = boxLayout(task.deck.widthM, count);
    const widthM = layout.spacingM - adjacentData.layout.jointM;
    const shape = boxBeam(widthM, depthM, task.standard);
    return { layout, shape, slab: topping(task, shape), haunchM: 0 };
  });
  return rankChoices(task, choices);
}

function boxLayout(widthM: number, count: number): BeamLayout {
  const spacingM = widthM / count;
  return {
    count,
    spacingM,
    // Half a beam stands beyond its axis: the topping ends with it.
    overhangM: 0,
    offsetsM: Array.from({ length: count }, (_, i) => (i - (count - 1) / 2) * spacingM),
  };
}

/**
 * Numbers of beams whose width lies within practice, fewest first; `task.girders` overrides.
 * @throws RangeError when fewer than two beams or part of one are asked for
 */
function boxCounts(task: UnitTask): readonly number[] {
  const asked = task.girders;
  if (asked !== undefined) {
    if (!(Number.isInteger(asked) && asked >= 2))
      throw new RangeError(
        `girders: expected a whole number, 2 or more, received ${asked}; leave it out for the cheapest count`,
      );
    return [asked];
  }
  const { leastWidthM, mostWidthM, jointM } = adjacentData.layout;
  const fewest = Math.max(2, Math.ceil(task.deck.widthM / (mostWidthM[task.standard] + jointM) - 1e-9));
  const most = Math.max(fewest, Math.floor(task.deck.widthM / (leastWidthM + jointM) + 1e-9));
  // Narrower beams only have more webs: one number more than the fewest is tried for their strands.
  return Array.from({ length: Math.min(2, most - fewest + 1) }, (_, i) => fewest + i);
}
