import type { UnitTask } from '../../../model/index.ts';

/**
 * Numbers of beams whose part of the deck, m, lies between two widths, fewest first; `beyond` spacings of deck lie outside the
 * outer axes besides (1 where each beam stands in the middle of its part). `task.girders` overrides.
 * @throws RangeError when fewer than two beams or part of one are asked for
 */
export function countsWithin(task: UnitTask, leastM: number, mostM: number, beyond = 1): readonly number[] {
  const asked = task.girders;
  if (asked !== undefined) {
    if (!(Number.isInteger(asked) && asked >= 2))
      throw new RangeError(
        `girders: expected a whole number, 2 or more, received ${asked}; leave it out for the cheapest count`,
      );
    return [asked];
  }
  const at = (spacingM: number): number => task.deck.widthM / spacingM + 1 - beyond;
  const fewest = Math.max(2, Math.ceil(at(mostM) - 1e-9));
  const most = Math.max(fewest, Math.floor(at(leastM) + 1e-9));
  return Array.from({ length: most - fewest + 1 }, (_, i) => fewest + i);
}
