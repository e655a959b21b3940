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

const isBefore = (a: Approach, b: Approach): boolean =>
  a.cost < b.cost || (a.cost === b.cost && a.spans < b.spans);

/** Takes an approach into a list in place of one with as many spans, or of the dearest of too many. */
function insert(list: Approach[], approach: Approach): void {
  const same = list.findIndex(({ spans }) => spans === approach.spans);
  if (same >= 0) list.splice(same, 1);
  let at = list.length;
  while (at > 0 && isBefore(approach, list[at - 1]!)) at -= 1;
  list.splice(at, 0, approach);
  list.length = Math.min(list.length, KEPT);
}

/**
 * The cheapest approaches from the abutment at position 0 to each position firstEnd..lastEnd, at most three for each,
 * with different numbers of spans; where any will do, only the first found. Position 0 itself needs none. Where nothing
 * fits the list is empty.
 */
export function approachesTo(
  form: FormId,
  X: Float64Array,
  firstEnd: number,
  lastEnd: number,
  limits: Limits,
  supports: SupportCosts,
  table: CostTable,
  anyWillDo: boolean,
): Approach[][] {
  const lists: Approach[][] = Array.from({ length: X.length }, () => []);
  if (firstEnd === 0) lists[0]!.push({ cost: 0, spans: 0, at: () => [] });
  const first = Math.max(firstEnd, 1);
  if (lastEnd < first) return lists;
  const wantedUpTo = (end: number): number => {
    const list = lists[end]!;
    return anyWillDo && list.length > 0 ? -Infinity : (list[KEPT - 1]?.cost ?? Infinity);
  };
  const task = {
    form,
    X,
    firstEnd: first,
    lastEnd,
    limits,
    supports,
    endIsPier: true,
    wantedUpTo,
  };
  searchUnit(task, table, (end, spans, governingM, cost, trace) => {
    const list = lists[end]!;
    if (cost >= wantedUpTo(end)) return true;
    for (const known of list) if (known.spans === spans && cost >= known.cost) return true;
    const at = trace();
    // The search keeps every window but the least longest span, which an inner span may reach by itself.
    const reaches = spans > 2 && limits.interiorLeast * governingM >= limits.minSpanM;
    if (reaches || spanFault(spansAlong(X, at()), limits) === null) insert(list, { cost, spans, at });
    return true;
  });
  return lists;
}
