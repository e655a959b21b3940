import type { DeckSpec } from '../model/index.ts';

/** Crossfall of the carriageway to both sides, as a ratio. Common practice, no source. */
export const CROSSFALL = 0.025;

/**
 * Construction depth, m: from the road level on the centre line down to the soffit, for a structural depth, m.
 * It adds the surfacing and the fall of the carriageway to its edge, where the soffit of a deck that follows the
 * crossfall is lowest.
 */
export function constructionDepth(
  deck: Pick<DeckSpec, 'surfacingM' | 'carriagewayM'>,
  structuralDepthM: number,
): number {
  return structuralDepthM + deck.surfacingM + (CROSSFALL * deck.carriagewayM) / 2;
}
