import type { DeckSpec, Variant } from '../../model/index.ts';
import { cellsFor } from './boxLayout.ts';

/** Ways of making a concrete box besides a plain top slab: tendons across it, where they save a cell. */
export function boxVariants(_spansM: readonly number[], { widthM }: DeckSpec): readonly Variant[] {
  return cellsFor(widthM, true) < cellsFor(widthM, false) ? [{ transverse: true }] : [];
}
