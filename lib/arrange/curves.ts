import type { CostTable, FormId, Unit } from '../model/index.ts';
import type { Frame } from './frame.ts';

/** Even spans are preferred among equals: weight of the square of a span against the cost of the deck. */
const EVEN = 1e-7;

/**
 * Equal spans are preferred: what a span of an approach costs more in the search when it is shorter than the
 * longest of its unit, per square metre of that difference, as a share of a metre of deck. A quarter of a 36 m span is
 * then worth 8 % of itself. Common practice, no source: one girder, one falsework, one look.
 */
const UNEVEN = 0.01;

/**
 * The same of an inner span of a main unit against a longest span that an obstacle forces: that is longer by right, and the
 * preference decides only between what costs about as much. Common practice, no source.
 */
const UNEVEN_BY_RIGHT = 0.001;

/**
 * That preference for one span, money. In a main unit the longest span is held against the others only by what it is
 * longer than the site forces; its end spans are shorter by right, and so are those beside pylons.
 * @param worksAs inner span, as a multiple of this one, that it works like
 */
export function unevenCost(
  table: CostTable,
  { form, role, pylons }: Pick<Unit, 'form' | 'role' | 'pylons'>,
  spanM: number,
  governingM: number,
  worksAs: number,
): number {
  const shorter = governingM - spanM;
  let square = UNEVEN * shorter ** 2;
  if (role === 'main') {
    const { forcedSpanM } = table;
    if (forcedSpanM === undefined || worksAs !== 1 || pylons !== undefined) return 0;
    const unforced = Math.max(0, governingM - Math.max(spanM, forcedSpanM));
    square = UNEVEN * unforced ** 2 + UNEVEN_BY_RIGHT * shorter ** 2;
  }
  return square * table.deckPerM(form, governingM, governingM);
}

/** Cost of one span by its length, money, at each whole metre, for one governing span. */
export type SpanCosts = Float64Array;

/** Inner span, as a multiple of an end span of a continuous unit, that this works like. */
export const endWorksAs = (table: CostTable, form: FormId, governingM: number): number =>
  table.endWorksAs?.(form, governingM) ?? 1;

/** Inner span, as a multiple of the one span of a unit that has no other, that this works like. */
export const aloneWorksAs = (table: CostTable, form: FormId, governingM: number): number =>
  table.aloneWorksAs?.(form, governingM) ?? 1;

/**
 * Cost of spans of one form read off the table once per governing span; of end spans where `worksAs` is what
 * `endWorksAs` gives.
 */
export function spanCosts(
  table: CostTable,
  unit: Pick<Unit, 'form' | 'role' | 'pylons'>,
  governingM: number,
  worksAs = 1,
): SpanCosts {
  const { form } = unit;
  const last = Math.ceil(governingM) + 1;
  const stride = Math.max(1, Math.ceil(last / 100));
  const costs = new Float64Array(last + 1);
  const even = EVEN * table.deckPerM(form, governingM, governingM);
  let before = 0;
  let rateBefore = 0;
  for (let s = 1; s <= last; s = s === last ? last + 1 : Math.min(s + stride, last)) {
    const rate = table.deckPerM(form, worksAs * Math.min(s, governingM), governingM);
    for (let t = before + 1; t <= s; t += 1) {
      const share = before === 0 ? 1 : (t - before) / (s - before);
      costs[t] =
        t * (rateBefore + share * (rate - rateBefore)) +
        even * t * t +
        (t < governingM ? unevenCost(table, unit, t, governingM, worksAs) : 0);
    }
    before = s;
    rateBefore = rate;
  }
  return costs;
}

/** Reads `spanCosts` between whole metres. */
export function spanCostAt(costs: SpanCosts, spanM: number): number {
  const i = spanM | 0;
  return costs[i]! + (spanM - i) * (costs[i + 1]! - costs[i]!);
}

/** Half the cost of a support as the cost of one adjoining span ends on it: A + B x span, per candidate position. */
export interface HalfCosts {
  readonly A: Float64Array;
  readonly B: Float64Array;
}

/** Costs of a support of one form at every candidate position for a few equal spans on both sides. */
export interface SupportCosts {
  readonly knots: readonly number[];
  readonly C: readonly Float64Array[];
}

/** Reads the support costs of one form off the table, at four spans from `leastM` to `mostM`. */
export function supportCosts(
  table: CostTable,
  form: FormId,
  frame: Frame,
  leastM: number,
  mostM: number,
): SupportCosts {
  const growth = Math.cbrt(Math.max(mostM / leastM, 1.01));
  const knots = [0, 1, 2, 3].map((k) => leastM * growth ** k);
  const { chainageM } = frame;
  const C = knots.map((span) => {
    const costs = new Float64Array(chainageM.length);
    for (let i = 0; i < costs.length; i += 1) costs[i] = table.support(form, chainageM[i]!, span, span);
    return costs;
  });
  return { knots, C };
}

function knotBefore(knots: readonly number[], span: number): number {
  let k = 0;
  while (k < knots.length - 2 && knots[k + 1]! < span) k += 1;
  return k;
}

/** Mean cost of a support over all positions, money, by the equal spans beside it, m. */
export function meanSupport({ knots, C }: SupportCosts): (spanM: number) => number {
  const means = C.map((column) => {
    let sum = 0;
    for (let i = 0; i < column.length; i += 1) sum += column[i]!;
    return sum / column.length;
  });
  return (spanM) => {
    const k = knotBefore(knots, spanM);
    const share = (spanM - knots[k]!) / (knots[k + 1]! - knots[k]!);
    return means[k]! + share * (means[k + 1]! - means[k]!);
  };
}

/**
 * Splits support costs between the two spans beside a support, straight in the span between `fromM` and `toM`: exact
 * where the cost of a support grows evenly with the sum of its spans, which is what piers and foundations nearly do.
 */
export function halfCosts(costs: SupportCosts, fromM: number, toM: number): HalfCosts {
  const { knots, C } = costs;
  const n = C[0]!.length;
  const A = new Float64Array(n);
  const B = new Float64Array(n);
  const low = knotBefore(knots, fromM);
  const high = knotBefore(knots, toM);
  const shareLow = (fromM - knots[low]!) / (knots[low + 1]! - knots[low]!);
  const shareHigh = (toM - knots[high]!) / (knots[high + 1]! - knots[high]!);
  const width = Math.max(toM - fromM, 1e-6);
  const [lowC, lowNextC, highC, highNextC] = [C[low]!, C[low + 1]!, C[high]!, C[high + 1]!];
  for (let i = 0; i < n; i += 1) {
    const first = lowC[i]! + shareLow * (lowNextC[i]! - lowC[i]!);
    const last = highC[i]! + shareHigh * (highNextC[i]! - highC[i]!);
    const perM = (last - first) / width / 2;
    B[i] = perM;
    A[i] = first / 2 - perM * fromM;
  }
  return { A, B };
}
