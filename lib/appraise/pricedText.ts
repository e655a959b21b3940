import type { Support } from '../model/index.ts';
import type { Priceable } from '../price/index.ts';

/** Supports told apart by what they are, not by what they say: one that stands as before is the very same. */
const numbers = new WeakMap<Support, number>();
let numbered = 0;

function numberOf(support: Support): number {
  const known = numbers.get(support);
  if (known !== undefined) return known;
  numbered += 1;
  numbers.set(support, numbered);
  return numbered;
}

/** Text of all that pricing reads of an option, beside draws and rates: what it says of two options that differ, differs. */
export const pricedText = ({ units, lines, supports, months }: Priceable): string =>
  JSON.stringify([
    units.map(({ form }) => form),
    lines.map(({ part, item, unit, quantity }) => [part, item, unit, quantity]),
    supports.map(numberOf),
    months,
  ]);
