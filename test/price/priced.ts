import type { MeasuredLine, Support } from '../../lib/model/index.ts';
import type { Priceable } from '../../lib/price/index.ts';
import { unitOn } from '../substructure/crossing.ts';

export const lineOf = (item: string, quantity: number, more: Partial<MeasuredLine> = {}): MeasuredLine => ({
  part: 'deck',
  item,
  quantity,
  what: item,
  how: 'given',
  ...more,
});

/** An option of nothing but the lines it is given. */
export const optionOf = (lines: readonly MeasuredLine[], supports: readonly Support[] = []): Priceable => ({
  units: [unitOn([0, 200])],
  lines,
  supports,
  months: { p10: 10, p50: 12, p90: 16 },
});

/** Correlation of the logarithms of two sets of costs, and their spreads. */
export function logStatistics(A: Float64Array, B: Float64Array): { sA: number; sB: number; rho: number } {
  const [a, b] = [A.map(Math.log), B.map(Math.log)];
  const mean = (v: Float64Array): number => v.reduce((s, x) => s + x, 0) / v.length;
  const [ma, mb] = [mean(a), mean(b)];
  let [aa, bb, ab] = [0, 0, 0];
  for (let k = 0; k < a.length; k++) {
    aa += (a[k]! - ma) ** 2;
    bb += (b[k]! - mb) ** 2;
    ab += (a[k]! - ma) * (b[k]! - mb);
  }
  return { sA: Math.sqrt(aa / a.length), sB: Math.sqrt(bb / b.length), rho: ab / Math.sqrt(aa * bb) };
}
