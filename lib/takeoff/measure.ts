import type { Design, MeasuredLine, RoadProfile, Site, Support } from '../model/index.ts';
import { approachLines } from './approachLines.ts';
import { furnitureLines } from './furnitureLines.ts';
import { itemOf } from './items.ts';
import { methodLines } from './methodLines.ts';
import { possessionLines } from './possessionLines.ts';

/**
 * Every measured line of a crossing except the foundations, which depend on the ground class, and the preliminaries,
 * which come from the programme: the superstructures as designed (each line marked with its unit), the supports, deck
 * furniture, approaches, possessions and the set-up of the methods.
 * `designs` has one design per unit, in order along the crossing; `supports` all supports in order of chainage.
 * Throws a RangeError when a line names an item that does not exist or a quantity is not a number >= 0.
 */
export function measure(
  site: Site,
  designs: readonly Design[],
  supports: readonly Support[],
  profile: RoadProfile,
): MeasuredLine[] {
  const lines = [
    ...deckLines(designs),
    ...supports.flatMap((support) => support.lines),
    ...furnitureLines(site),
    ...approachLines(site, profile),
    ...possessionLines(site, designs, supports),
    ...methodLines(designs),
  ];
  for (const { item, quantity, what } of lines) {
    itemOf(item);
    if (!(quantity >= 0)) {
      throw new RangeError(
        `${what}, ${item}: expected a quantity of 0 or more, received ${quantity}; check its design`,
      );
    }
  }
  return lines;
}

/** Lines of the designs with the unit they came from and their supports counted along the crossing. */
function deckLines(designs: readonly Design[]): MeasuredLine[] {
  let first = 0;
  return designs.flatMap((design, unit) => {
    const offset = first;
    // Neighbouring units share a support.
    first += design.task.spansM.length;
    return design.lines.map((line) => ({
      ...line,
      unit,
      ...(line.support === undefined ? {} : { support: line.support + offset }),
    }));
  });
}
