import type { Pattern } from '../model/index.ts';
import { endWorksAs, spanCostAt, spanCosts, type SpanCosts } from './curves.ts';
import { SLACK } from './limits.ts';
import type { MainSearch } from './mainSearch.ts';
import { takeCheapest, type SideEnds } from './sideRoom.ts';

/** First of the rising indices whose position is `fromM` or beyond, by its place among them. */
function firstFrom(X: Float64Array, indices: readonly number[], fromM: number): number {
  let low = 0;
  let high = indices.length;
  while (low < high) {
    const middle = (low + high) >> 1;
    if (X[indices[middle]!]! < fromM) low = middle + 1;
    else high = middle;
  }
  return low;
}

/**
 * Cheapest ends of the span beyond a pylon, each with its approach, at most one for each number of approach spans: the
 * span over the main span lies in `window`. They are left in the room of the search.
 */
function sidesBeyond(
  search: MainSearch,
  pylon: number,
  mainM: number,
  window: readonly [number, number],
  row: MainRow,
  toLeft: boolean,
): SideEnds {
  const { X, room } = search;
  const ends = toLeft ? search.outerLeft : search.outerRight;
  const approaches = toLeft ? search.toLeft : search.toRight;
  const last = X.length - 1;
  const least = window[0] * mainM - SLACK;
  const most = Math.min(window[1], 1) * mainM + SLACK;
  const { costs } = room;
  let fewestSpans = costs.length;
  let mostSpans = 0;
  const from = toLeft ? X[pylon]! - most : X[pylon]! + least;
  const to = toLeft ? X[pylon]! - least : X[pylon]! + most;
  for (let e = firstFrom(X, ends, from); e < ends.length; e += 1) {
    const end = ends[e]!;
    if (X[end]! > to) break;
    const span = Math.abs(X[end]! - X[pylon]!);
    const lists = approaches[end]!;
    if (lists.length === 0) continue;
    const pier = end > 0 && end < last ? search.half(end, span) : 0;
    const own = spanCostAt(row.side, span) + search.half(pylon, span) + pier;
    for (const approach of lists) {
      const { spans } = approach;
      const cost = own + approach.cost;
      if (costs[spans]! < Infinity && !(cost < costs[spans]! * (1 - 1e-9))) continue;
      costs[spans] = cost;
      room.ends[spans] = end;
      room.approaches[spans] = approach;
      fewestSpans = Math.min(fewestSpans, spans);
      mostSpans = Math.max(mostSpans, spans);
    }
  }
  const side = toLeft ? room.left : room.right;
  takeCheapest(room, side, fewestSpans, mostSpans);
  return side;
}

interface Main {
  readonly a: number;
  readonly b: number;
  readonly mainM: number;
  readonly row: MainRow;
  /** Deck of the main span and fixed cost of the unit with one pylon and with two. */
  readonly onePylon: number;
  readonly twoPylons: number;
}

/** One pylon at one end of the main span; the other end is the end of the unit. */
function onePylon(
  search: MainSearch,
  main: Main,
  back: readonly [number, number],
  pylonLeft: boolean,
): boolean {
  const { X, half } = search;
  const { a, b, mainM, row } = main;
  const pylon = pylonLeft ? a : b;
  const far = pylonLeft ? b : a;
  const beyond = pylonLeft ? search.toRight[far]! : search.toLeft[far]!;
  if (beyond.length === 0 || pylon === 0 || pylon === X.length - 1) return false;
  const sides = sidesBeyond(search, pylon, mainM, back, row, pylonLeft);
  const pier = far > 0 && far < X.length - 1 ? half(far, mainM) : 0;
  for (let i = 0; i < sides.count; i += 1) {
    const own = sides.approach[i]!;
    for (const approach of beyond) {
      const cost = main.onePylon + half(pylon, mainM) + pier + sides.cost[i]! + approach.cost;
      if (!search.wants(1, own.spans + approach.spans + 2, mainM, cost)) continue;
      const end = sides.end[i]!;
      const at = pylonLeft ? [end, pylon, far] : [far, pylon, end];
      const [before, after] = pylonLeft ? [own, approach] : [approach, own];
      search.offer({ at, pylons: [1], mainM, cost, before, after });
    }
  }
  return sides.count > 0;
}

/** A pylon at both ends of the main span. */
function twoPylons(search: MainSearch, main: Main, window: readonly [number, number]): boolean {
  const { X, half } = search;
  const { a, b, mainM, row } = main;
  if (a === 0 || b === X.length - 1) return false;
  const lefts = sidesBeyond(search, a, mainM, window, row, true);
  if (lefts.count === 0) return false;
  const rights = sidesBeyond(search, b, mainM, window, row, false);
  const piers = main.twoPylons + half(a, mainM) + half(b, mainM);
  for (let l = 0; l < lefts.count; l += 1) {
    for (let r = 0; r < rights.count; r += 1) {
      const cost = piers + lefts.cost[l]! + rights.cost[r]!;
      const [before, after] = [lefts.approach[l]!, rights.approach[r]!];
      if (!search.wants(2, before.spans + after.spans + 3, mainM, cost)) continue;
      const at = [lefts.end[l]!, a, b, rights.end[r]!];
      search.offer({ at, pylons: [1, 2], mainM, cost, before, after });
    }
  }
  return rights.count > 0;
}

/** How the spans beside a main span are laid out. */
export interface Sides {
  /** Back span over the main span of a unit with one pylon; null where there must be a side span at both ends. */
  readonly one: readonly [least: number, most: number] | null;
  /** Side spans over the main span of a unit with two. */
  readonly two: readonly [least: number, most: number];
  /** The piers of the main span are pylons, with their fixed cost. */
  readonly hung: boolean;
}

/** Sides of a main unit; null for patterns whose main unit has none. */
export function sidesOf(pattern: Pattern): Sides | null {
  if (pattern.kind === 'pylon') return { one: pattern.onePylonBack, two: pattern.twoPylonSide, hung: true };
  if (pattern.kind === 'flanked') return { one: null, two: pattern.side, hung: false };
  return null;
}

/** Costs of the main span and of the spans beside it. */
interface MainRow {
  readonly inner: SpanCosts;
  readonly side: SpanCosts;
}

/** Rows of span costs by whole metre of main span. */
export type SpanRows = (mainM: number) => MainRow;

/** Reads the rows of one form off the table when they are first asked for. */
export function spanRows({ table, request }: Pick<MainSearch, 'table' | 'request'>): SpanRows {
  const rows = new Map<number, MainRow>();
  return (mainM) => {
    const whole = Math.ceil(mainM - SLACK);
    let row = rows.get(whole);
    if (row === undefined) {
      const isHung = sidesOf(request.pattern)?.hung === true;
      const unit = { form: request.form, role: 'main', ...(isHung ? { pylons: [] } : {}) } as const;
      const inner = spanCosts(table, unit, whole);
      const worksAs = isHung ? 1 : endWorksAs(table, request.form, whole);
      row = { inner, side: worksAs === 1 ? inner : spanCosts(table, unit, whole, worksAs) };
      rows.set(whole, row);
    }
    return row;
  };
}

/** Deck, fixed cost and supports of a unit with sides, without anchor piers; null where its spans break their windows. */
export function pylonCost(
  search: MainSearch,
  sides: Sides,
  rowOf: SpanRows,
  at: readonly number[],
  pylons: readonly number[],
): { readonly cost: number; readonly mainM: number } | null {
  const { X, limits, half, table, request } = search;
  const x = at.map((i) => X[i]!);
  const last = X.length - 1;
  const one = pylons.length === 1;
  // With one pylon the main span is the longer one.
  const m = one ? (x[1]! - x[0]! >= x[2]! - x[1]! ? 0 : 1) : 1;
  const mainM = x[m + 1]! - x[m]!;
  if (!(mainM >= limits.minSpanM - SLACK && mainM <= limits.maxSpanM + SLACK)) return null;
  if (at[m]! > search.latestLeft || at[m + 1]! < search.earliestRight) return null;
  if (pylons.some((p) => at[p] === 0 || at[p] === last)) return null;
  const window = one ? sides.one : sides.two;
  if (window === null) return null;
  const row = rowOf(mainM);
  let cost = table.unitFixed(request.form, mainM, sides.hung ? pylons.length : 0);
  for (let s = 0; s < x.length - 1; s += 1) {
    const span = x[s + 1]! - x[s]!;
    if (s !== m && !(span >= window[0] * mainM - SLACK && span <= Math.min(window[1], 1) * mainM + SLACK))
      return null;
    cost += spanCostAt(s === m ? row.inner : row.side, span);
    if (at[s]! > 0) cost += half(at[s]!, span);
    if (at[s + 1]! < last) cost += half(at[s + 1]!, span);
  }
  return { cost, mainM };
}

/** Main units with a side beyond one end of the main span (on either side of the opening) or both: every pair of places in the span band. */
export function pylonLayouts(search: MainSearch, sides: Sides, rowOf: SpanRows): void {
  const { X, limits, left, right, table, request } = search;
  for (const a of left) {
    if (search.isEnough()) return;
    for (const b of right) {
      const mainM = X[b]! - X[a]!;
      if (!(mainM >= limits.minSpanM - SLACK && mainM <= limits.maxSpanM + SLACK)) continue;
      const row = rowOf(mainM);
      const deck = spanCostAt(row.inner, mainM);
      const main = {
        a,
        b,
        mainM,
        row,
        onePylon: deck + table.unitFixed(request.form, mainM, sides.hung ? 1 : 0),
        twoPylons: deck + table.unitFixed(request.form, mainM, sides.hung ? 2 : 0),
      };
      const laid = [
        sides.one !== null && onePylon(search, main, sides.one, true),
        sides.one !== null && onePylon(search, main, sides.one, false),
        twoPylons(search, main, sides.two),
      ];
      if (!laid.includes(true)) search.noApproach();
    }
  }
}
