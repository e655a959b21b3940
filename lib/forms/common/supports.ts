/**
 * Positions of the supports of a unit from its first support, m.
 * `spansM` n spans, m; returns n + 1 positions, the first 0.
 */
export function supportPositions(spansM: readonly number[]): number[] {
  const positions = [0];
  let x = 0;
  for (const span of spansM) {
    x += span;
    positions.push(x);
  }
  return positions;
}

/** Length of a unit, m: sum of its spans. */
export function totalLength(spansM: readonly number[]): number {
  return spansM.reduce((sum, span) => sum + span, 0);
}
