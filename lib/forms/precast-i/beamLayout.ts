import type { UnitTask } from '../../model/index.ts';
import type { BeamLayout } from '../common/precast/beamChoice.ts';
import { precastData } from './precastData.ts';

/** `count` beams evenly across a deck, the overhang a share of the spacing. */
export function beamLayout(widthM: number, count: number): BeamLayout {
  const spacingM = widthM / (count - 1 + 2 * precastData.layout.overhangOverSpacing);
  return {
    count,
    spacingM,
    overhangM: (widthM - (count - 1) * spacingM) / 2,
    offsetsM: Array.from({ length: count }, (_, i) => (i - (count - 1) / 2) * spacingM),
  };
}

/**
 * Numbers of beams that keep their spacing within practice, fewest first; `task.girders` overrides.
 * @throws RangeError when fewer than two beams or part of one are asked for
 */
export function beamCounts(task: UnitTask): readonly number[] {
  const asked = task.girders;
  if (asked !== undefined) {
    if (!(Number.isInteger(asked) && asked >= 2))
      throw new RangeError(
        `girders: expected a whole number, 2 or more, received ${asked}; leave it out for the cheapest count`,
      );
    return [asked];
  }
  const { leastSpacingM, mostSpacingM, overhangOverSpacing } = precastData.layout;
  const at = (spacingM: number): number => task.deck.widthM / spacingM + 1 - 2 * overhangOverSpacing;
  const fewest = Math.max(2, Math.ceil(at(mostSpacingM) - 1e-9));
  const most = Math.max(fewest, Math.floor(at(leastSpacingM) + 1e-9));
  return Array.from({ length: most - fewest + 1 }, (_, i) => fewest + i);
}
