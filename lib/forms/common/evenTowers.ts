import { supportPositions } from './supports.ts';

/**
 * Where temporary towers stand that part each span evenly, m from the first support.
 * @param countIn towers under a span of some length, m, by its index
 */
export function evenTowers(
  spansM: readonly number[],
  countIn: (spanM: number, span: number) => number,
): number[] {
  const starts = supportPositions(spansM);
  return spansM.flatMap((spanM, i) => {
    const count = countIn(spanM, i);
    return Array.from({ length: count }, (_, k) => starts[i]! + (spanM * (k + 1)) / (count + 1));
  });
}
