import type { CostTable } from '../model/index.ts';
import { aloneWorksAs, endWorksAs, halfCosts, spanCostAt, spanCosts } from './curves.ts';
import { fewestSpans, governingSpans, isFull, MORE_SPANS, mostSpans } from './governingSpans.ts';
import { SLACK as sameShare } from './limits.ts';
import {
  close,
  handOn,
  isTooDear,
  leastPerM,
  roomFor,
  type Closed,
  type Layers,
  type Steps,
} from './unitLayers.ts';
import type { UnitTask } from './unitTask.ts';
import { worthOf } from './worth.ts';

/** Read once: the loops below compare millions of spans. */
const SLACK = sameShare;

/**
 * Called for every end, number of spans and governing span that can be laid out; `trace()` gives the indices into `X`,
 * at any time. Giving back false ends the search.
 */
export type Visit = (
  end: number,
  spans: number,
  governingM: number,
  cost: number,
  trace: () => number[],
) => boolean;

/** Cost of the last span from z to the end, with the halves of the supports it carries. */
function lastSpan(layers: Layers, z: number, end: number): number {
  const { task, endCost, half } = layers;
  const s = task.X[end]! - task.X[z]!;
  return (
    spanCostAt(endCost, s) +
    half.A[z]! +
    half.B[z]! * s +
    (task.endIsPier ? half.A[end]! + half.B[end]! * s : 0)
  );
}

/** Layouts of one span; fills the costs of reaching each first pier. */
function firstSpan(layers: Layers, F: Float64Array): void {
  const { task, G, aloneCost, endCost, half } = layers;
  const { X, limits, firstEnd, lastEnd } = task;
  F.fill(Infinity);
  for (let x = 1; x < X.length && X[x]! <= G + SLACK; x += 1) {
    const s = X[x]!;
    if (s < limits.minSpacingM - SLACK) continue;
    if (x >= firstEnd && x <= lastEnd && s >= limits.minSpanM - SLACK) {
      const alone = spanCostAt(aloneCost, s) + (task.endIsPier ? half.A[x]! + half.B[x]! * s : 0);
      close(layers, x, alone, 0, 0);
    }
    const reached = spanCostAt(endCost, s) + half.A[x]! + half.B[x]! * s;
    if (!isTooDear(layers, reached, s)) F[x] = reached;
  }
}

/** Layouts of two spans. */
function twoSpans(layers: Layers, F: Float64Array): void {
  const { task, G } = layers;
  const { X, limits, firstEnd, lastEnd } = task;
  let low = 1;
  for (let end = firstEnd; end <= lastEnd; end += 1) {
    const xe = X[end]!;
    if (xe > 2 * G + SLACK) break;
    while (X[low]! < xe - G - SLACK) low += 1;
    for (let x = low; x < end && X[x]! <= G + SLACK; x += 1) {
      const a = X[x]!;
      const b = xe - a;
      if (b < limits.minSpacingM - SLACK) break;
      if (F[x] === Infinity || Math.min(a, b) < limits.endLeast * Math.max(a, b) - SLACK) continue;
      close(layers, end, F[x]! + lastSpan(layers, x, end), x, 0);
    }
  }
}

/** Closes layouts that end with an interior span onto z: for each end the cheapest one inside the end window. */
function closeFrom(layers: Layers, z: number, n: number): void {
  const { task, G } = layers;
  const { X, limits, firstEnd, lastEnd } = task;
  const { S, V, Y, queue } = layers.room;
  let head = 0;
  let tail = 0;
  let p = 0;
  for (let end = Math.max(firstEnd, z + 1); end <= lastEnd; end += 1) {
    const e = X[end]! - X[z]!;
    if (e < limits.minSpacingM - SLACK) continue;
    if (e > G + SLACK) break;
    const shortest = e / limits.endMost - SLACK;
    const longest = e / limits.endLeast + SLACK;
    while (p < n && S[p]! <= longest) {
      while (tail > head && V[queue[tail - 1]!]! > V[p]!) tail -= 1;
      queue[tail] = p;
      tail += 1;
      p += 1;
    }
    while (head < tail && S[queue[head]!]! < shortest) head += 1;
    if (head < tail) {
      const best = queue[head]!;
      close(layers, end, V[best]! + lastSpan(layers, z, end), z, Y[best]!);
    }
  }
}

/** Cheapest of the interior spans that end on one position, by index of its other end; -1 where there is none. */
interface Onto {
  from: number;
  cost: number;
}

/**
 * The cheapest interior span from any of the reached places low..high onto z, left in `onto`; gives back 0 where there is
 * none.
 */
function cheapestOnto(layers: Layers, low: number, high: number, z: number, onto: Onto): number {
  const { task, cost, half, room } = layers;
  const { at, reached, x, perM } = room;
  const xz = task.X[z]!;
  const bz = half.B[z]!;
  let best = Infinity;
  let from = -1;
  for (let p = high; p >= low; p -= 1) {
    const s = xz - x[p]!;
    const i = s | 0;
    const deck = cost[i]! + (s - i) * (cost[i + 1]! - cost[i]!);
    const v = reached[p]! + deck + (perM[p]! + bz) * s;
    if (v < best && v < best - SLACK * v) {
      best = v;
      from = p;
    }
  }
  if (from < 0) return 0;
  onto.from = at[from]!;
  onto.cost = best + half.A[z]!;
  return 1;
}

/**
 * The same where the span is the second of the unit, which the window of the end span before it limits, or where the
 * unit can end one span on: lists the spans in the room of the search and gives back how many there are.
 */
function listOnto(
  layers: Layers,
  j: number,
  F: Float64Array,
  low: number,
  high: number,
  z: number,
  onto: Onto,
): number {
  const { task, cost, half, room } = layers;
  const { X, limits } = task;
  const { A, B } = half;
  const { at, S, V, Y } = room;
  const xz = X[z]!;
  let count = 0;
  onto.from = -1;
  onto.cost = Infinity;
  for (let p = high; p >= low; p -= 1) {
    const y = at[p]!;
    const s = xz - X[y]!;
    if (j === 2 && (X[y]! < limits.endLeast * s - SLACK || X[y]! > limits.endMost * s + SLACK)) continue;
    const v = F[y]! + spanCostAt(cost, s) + A[y]! + B[y]! * s + A[z]! + B[z]! * s;
    S[count] = s;
    V[count] = v;
    Y[count] = y;
    count += 1;
    if (v < onto.cost - SLACK * v) {
      onto.cost = v;
      onto.from = y;
    }
  }
  return count;
}

/** Puts the places first..end - 1 that can be reached side by side and gives back how many they are. */
function gather(layers: Layers, F: Float64Array, first: number, end: number): number {
  const { task, half, room } = layers;
  const { at, reached, x, perM } = room;
  let count = 0;
  for (let y = first; y < end; y += 1) {
    const f = F[y]!;
    if (f === Infinity) continue;
    at[count] = y;
    reached[count] = f + half.A[y]!;
    x[count] = task.X[y]!;
    perM[count] = half.B[y]!;
    count += 1;
  }
  return count;
}

/** First index but 0 whose position is `x` or beyond. */
function firstFrom(X: Float64Array, x: number): number {
  let high = X.length;
  let from = 1;
  while (from < high) {
    const middle = (from + high) >> 1;
    if (X[middle]! < x) from = middle + 1;
    else high = middle;
  }
  return from;
}

/** One more interior span onto every position it can reach: fills `next`, closes what can end. False where none can be reached. */
function oneMore(layers: Layers, j: number, F: Float64Array, next: Float64Array): boolean {
  const { task, G, K } = layers;
  const { X, limits, firstEnd, lastEnd } = task;
  const { x } = layers.room;
  const n = X.length;
  const least = Math.max(limits.minSpacingM, limits.interiorLeast * G) - SLACK;
  const nearest =
    Math.max(
      limits.minSpacingM + (j - 1) * least,
      X[firstEnd]! - (K - j) * G,
      isFull(task) ? 0 : (j - MORE_SPANS - 1) * G,
    ) - SLACK;
  const farthest = Math.min(j * G, X[lastEnd]! - limits.minSpacingM) + SLACK;
  const closes = X[firstEnd]! - G - SLACK;
  const onto: Onto = { from: -1, cost: Infinity };
  // Positions that j spans can reach move up with j: only these, and those a span before them, are looked at.
  const first = firstFrom(X, nearest);
  let end = first;
  while (end < n && X[end]! <= farthest) end += 1;
  const before = firstFrom(X, X[Math.min(first, n - 1)]! - G - SLACK);
  const places = gather(layers, F, before, end);
  next.fill(Infinity, before, end);
  const from = new Int32Array(end - first);
  layers.back[j] = { first, from };
  let any = false;
  let low = 0;
  let high = -1;
  for (let z = first; z < end; z += 1) {
    const xz = X[z]!;
    while (low < places && x[low]! < xz - G - SLACK) low += 1;
    while (high + 1 < places && x[high + 1]! <= xz - least) high += 1;
    const count =
      j > 2 && xz < closes
        ? cheapestOnto(layers, low, high, z, onto)
        : listOnto(layers, j, F, low, high, z, onto);
    if (count === 0 || isTooDear(layers, onto.cost, xz)) continue;
    if (xz >= closes) closeFrom(layers, z, count);
    any = true;
    next[z] = onto.cost;
    from[z - first] = onto.from;
  }
  return any;
}

/** Indices of the supports of the cheapest layout of k spans to an end, whose last spans begin on y and z. */
function traceOf(back: readonly Steps[], k: number, end: number, z: number, y: number): number[] {
  const at = new Array<number>(k + 1);
  at[k] = end;
  if (k >= 2) at[k - 1] = z;
  let i = y;
  for (let j = k - 2; j >= 1; j -= 1) {
    at[j] = i;
    if (j > 1) i = back[j]!.from[i - back[j]!.first]!;
  }
  at[0] = 0;
  return at;
}

/** Every eighth first: the cheapest of a few spread over the band show early what is too dear. */
function spreadFirst<T>(list: readonly T[]): T[] {
  const few = 8;
  return [...list.filter((_, i) => i % few === few >> 1), ...list.filter((_, i) => i % few !== few >> 1)];
}

/**
 * Lays out one governing span, one layer of spans on the other, and hands on what each layer closes. False where
 * `closed` wants no more.
 */
function layLayers(layers: Layers, F: Float64Array, next: Float64Array, closed: Closed): boolean {
  const { K } = layers;
  firstSpan(layers, F);
  if (!handOn(layers, 1, closed)) return false;
  if (K < 2) return true;
  twoSpans(layers, F);
  if (!handOn(layers, 2, closed)) return false;
  next.fill(Infinity);
  let from = F;
  let onto = next;
  for (let j = 2; j < K && oneMore(layers, j, from, onto); j += 1) {
    if (!handOn(layers, j + 1, closed)) return false;
    [from, onto] = [onto, from];
  }
  return true;
}

/**
 * Lays out one continuous unit for every governing span of its band by dynamic programming over the candidate
 * positions, one layer per span; end windows tie the two outermost pairs of spans. Costs are those of the table with
 * support costs split between neighbouring spans; the fixed cost of the unit is included. Gives back the governing
 * spans of which something was left out as too dear.
 */
export function searchUnit(task: UnitTask, table: CostTable, visit: Visit): ReadonlySet<number> {
  const n = task.X.length;
  const ends = task.lastEnd - task.firstEnd + 1;
  const F = new Float64Array(n);
  const next = new Float64Array(n);
  // The nearest end is too far for some with as many spans as are tried.
  const governing = governingSpans(task)
    .map((G) => ({ G, K: mostSpans(task, G) }))
    .filter(({ G, K }) => K >= fewestSpans(task.limits, task.X[task.firstEnd]!, G));
  const room = roomFor(n, ends);
  const worth = worthOf(ends === 1 ? (task.keep ?? Infinity) : Infinity);
  const cut = new Set<number>();
  for (const { G, K } of spreadFirst(governing)) {
    const unit = { form: task.form, role: task.endIsPier ? 'approach' : 'main' } as const;
    const cost = spanCosts(table, unit, G);
    const worksAs = endWorksAs(table, task.form, G);
    const endCost = worksAs === 1 ? cost : spanCosts(table, unit, G, worksAs);
    const alone = aloneWorksAs(table, task.form, G);
    const aloneCost = alone === 1 ? cost : spanCosts(table, unit, G, alone);
    const half = halfCosts(
      task.supports,
      Math.max(task.limits.minSpacingM, task.limits.interiorLeast * G),
      G,
    );
    const fixed = table.unitFixed(task.form, G);
    const boundCost = worth.boundCost() - fixed;
    const restPerM = boundCost < Infinity ? leastPerM(task, G, cost, endCost, half) : 0;
    const layers: Layers = {
      task,
      G,
      K,
      cost,
      endCost,
      aloneCost,
      half,
      room,
      back: [],
      boundCost,
      restPerM,
      cut: false,
      closedFrom: ends,
      closedTo: -1,
    };
    const more = layLayers(layers, F, next, (end, spans, own, z, y) => {
      worth.add(spans, own + fixed);
      const { back } = layers;
      return visit(end, spans, G, own + fixed, () => traceOf(back, spans, end, z, y));
    });
    if (layers.cut) cut.add(G);
    if (!more) break;
  }
  return cut;
}
