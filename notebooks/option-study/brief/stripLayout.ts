/** Where the words of each strip of a deck stand under its drawing, px from the left edge of the deck. */
export interface StripLayout {
  /** Edges of the strips, one more than there are strips. */
  readonly edges: readonly number[];
  /** Middle of each strip and the tier its words stand in, 0 the nearest. */
  readonly places: readonly { readonly middle: number; readonly tier: number }[];
  readonly tiers: number;
}

/**
 * Sets the words of strips under their strips, each in the first tier where it stands clear of its neighbours.
 * @param widths widths of the strips, px
 * @param words widths of their words, px, the air between two included
 */
export function stripLayout(widths: readonly number[], words: readonly number[]): StripLayout {
  const edges = [0];
  for (const width of widths) edges.push(edges.at(-1)! + width);
  /** Right end of the words in each tier so far. */
  const ends: number[] = [];
  const places = widths.map((width, i) => {
    const middle = edges[i]! + width / 2;
    const half = (words[i] ?? 0) / 2;
    const free = ends.findIndex((end) => middle - half >= end);
    const tier = free < 0 ? ends.length : free;
    ends[tier] = middle + half;
    return { middle, tier };
  });
  return { edges, places, tiers: ends.length };
}
