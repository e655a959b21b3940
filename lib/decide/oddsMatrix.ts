/**
 * Share of draws in which option a is cheaper than option b, by number; a draw in which they cost the same counts half to
 * either side, so the two odds of a pair sum to 1. An option has no odds against itself.
 */
export function oddsMatrix(
  options: readonly { readonly number: number; readonly totals: Float64Array }[],
): Record<number, Record<number, number>> {
  const odds: Record<number, Record<number, number>> = {};
  for (const { number } of options) odds[number] = {};
  for (let i = 0; i < options.length; i++) {
    for (let j = i + 1; j < options.length; j++) {
      const a = options[i]!;
      const b = options[j]!;
      const share = cheaperShare(a.totals, b.totals);
      odds[a.number]![b.number] = share;
      odds[b.number]![a.number] = 1 - share;
    }
  }
  return odds;
}

function cheaperShare(A: Float64Array, B: Float64Array): number {
  let halves = 0;
  for (let k = 0; k < A.length; k++) halves += A[k]! < B[k]! ? 2 : A[k]! === B[k]! ? 1 : 0;
  return halves / (2 * A.length);
}
