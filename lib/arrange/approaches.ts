import type { CostTable, FormId } from '../model/index.ts';
import { spanFault, spansAlong, type Limits } from './limits.ts';
import type { SupportCosts } from './curves.ts';
import { searchUnit } from './unitSearch.ts';

/** One way to lay out the stretch between an abutment and the main unit. */
export interface Approach {
  readonly cost: number;
  readonly spans: number;
  /** Indices of its supports from the abutment to the main unit; none when the main unit begins at the abutment. */
  readonly at: () => readonly number[];
}

/** Different numbers of spans kept for each end of an approach. */
const KEPT = 3;

function insert(list: Approach[], approach: Approach): void {
  const same = list.findIndex(({ spans }) => spans === approach.spans);
  if (same >= 0) list.splice(same, 1);
  list.push(approach);
  list.sort((a, b) => a.cost - b.cost || a.spans - b.spans);
  list.length = Math.min(list.length, KEPT);
}

/**
 * The cheapest approaches from the abutment at position 0 to each position firstEnd..lastEnd, at most three for each,
 * with different numbers of spans. Position 0 itself needs none. Where nothing fits the list is empty.
 */
export function approachesTo(
  form: FormId,
  X: Float64Array,
  firstEnd: number,
  lastEnd: number,
  limits: Limits,
  supports: SupportCosts,
  table: CostTable,
): Approach[][] {
  const lists: Approach[][] = Array.from({ length: X.length }, () => []);
  if (firstEnd === 0) lists[0]!.push({ cost: 0, spans: 0, at: () => [] });
  const first = Math.max(firstEnd, 1);
  if (lastEnd < first) return lists;
  const task = { form, X, firstEnd: first, lastEnd, limits, supports, endIsPier: true };
  searchUnit(task, table, (end, spans, governingM, cost, at) => {
    const list = lists[end]!;
    const same = list.find((known) => known.spans === spans);
    if (same !== undefined ? cost >= same.cost : list.length === KEPT && cost >= list[KEPT - 1]!.cost)
      return true;
    // The search keeps every window but the least longest span, which an inner span may reach by itself.
    const reaches = spans > 2 && limits.interiorLeast * governingM >= limits.minSpanM;
    if (reaches || spanFault(spansAlong(X, at()), limits) === null) insert(list, { cost, spans, at });
    return true;
  });
  return lists;
}
