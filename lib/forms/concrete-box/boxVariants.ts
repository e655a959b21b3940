import type { DeckSpec, MethodId, Variant } from '../../model/index.ts';
import { boxData } from './boxData.ts';
import { cellsFor, cellsUnder } from './boxLayout.ts';
import { strutPlan } from './strutPlan.ts';

/** What can be chosen of a concrete box. */
export const boxChoices = [
  'transverse',
  'struts',
  'ribs',
  'boxWidthM',
  'strengthMPa',
  'light',
  'ballastKNm',
  'squareEnds',
] as const satisfies readonly (keyof Variant)[];

/** Ways of making a concrete box besides a plain top slab: tendons across it, where they save a cell. */
export function boxVariants(_spansM: readonly number[], { widthM }: DeckSpec): readonly Variant[] {
  return cellsFor(widthM, true) < cellsFor(widthM, false) ? [{ transverse: true }] : [];
}

/**
 * The same, and ribs under the slab or wings on struts, with a plain slab or tendons across it, where one cell without them
 * no longer carries the deck and they save a cell. A launched box is pushed out without its wings, and has none.
 * @param mostOverSpan greatest least depth of the published band over the longest span
 */
export function wideBoxVariants(
  spansM: readonly number[],
  deck: DeckSpec,
  method: MethodId,
  mostOverSpan: number,
): readonly Variant[] {
  const { widthM } = deck;
  const made: Variant[] = [...boxVariants(spansM, deck)];
  if (method === 'launch' || cellsFor(widthM, true) === 1) return made;
  const depthM = mostOverSpan * Math.max(...spansM);
  if (cellsUnder(widthM, boxData.ribs.mostWebSpacingM) < cellsFor(widthM, false)) made.push({ ribs: true });
  const strutted = strutPlan(widthM, depthM, false).cells;
  if (strutted < cellsFor(widthM, false)) made.push({ struts: true });
  if (strutPlan(widthM, depthM, true).cells < Math.min(strutted, cellsFor(widthM, true)))
    made.push({ transverse: true, struts: true });
  return made;
}
