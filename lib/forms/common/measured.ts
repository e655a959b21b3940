import type { BillPart, MeasuredLine } from '../../model/index.ts';

/** One measured line of the take-off; see `MeasuredLine`. Quantities are not negative. */
export function measured(
  part: BillPart,
  item: string,
  quantity: number,
  what: string,
  how: string,
): MeasuredLine {
  return { part, item, quantity: Math.max(0, quantity), what, how };
}

/** Sum of the lines of one item, in the unit of the item. */
export function quantityOf(lines: readonly MeasuredLine[], item: string): number {
  return lines.reduce((sum, line) => (line.item === item ? sum + line.quantity : sum), 0);
}
