import type { CostTable } from '../model/index.ts';
import { aloneWorksAs, endWorksAs, halfCosts, meanSupport, spanCostAt, spanCosts } from './curves.ts';
import { fewestSpans, governingSpans, isFull, MORE_SPANS, mostSpans } from './governingSpans.ts';
import { SLACK as sameShare } from './limits.ts';
import { cheapestOnto, type Places } from './places.ts';
import { spansToGo } from './spansToGo.ts';
import { close, handOn, reach, roomFor, type Closed, type Layers, type Steps } from './unitLayers.ts';
import type { UnitTask } from './unitTask.ts';
import { boundWays } from './worthFollowing.ts';

/** Read once: the loops below compare millions of spans. */
const SLACK = sameShare;

/** Indices into `X` of the supports of a layout, when they are asked for. */
type Trace = () => number[];

/**
 * Called for every end, number of spans and governing span that can be laid out; `trace()`, to be called at once, gives
 * its supports. Giving back false ends the search.
 */
export type Visit = (
  end: number,
  spans: number,
  governingM: number,
  cost: number,
  trace: () => Trace,
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

/** Layouts of one span; fills the places of the first pier. */
function firstSpan(layers: Layers, onto: Places): void {
  const { task, G, K, aloneCost, endCost, half, room } = layers;
  const { X, limits, firstEnd, lastEnd } = task;
  onto.count = 0;
  for (let x = 1; x < X.length && X[x]! <= G + SLACK; x += 1) {
    const s = X[x]!;
    if (s < limits.minSpacingM - SLACK) continue;
    if (x >= firstEnd && x <= lastEnd && s >= limits.minSpanM - SLACK) {
      const alone = spanCostAt(aloneCost, s) + (task.endIsPier ? half.A[x]! + half.B[x]! * s : 0);
      close(layers, x, alone, 0, -1);
    }
    if (room.toGo[x]! < K) reach(layers, onto, x, spanCostAt(endCost, s) + half.A[x]! + half.B[x]! * s, -1);
  }
}

/** Layouts of two spans. */
function twoSpans(layers: Layers, first: Places): void {
  const { task, G } = layers;
  const { X, limits, firstEnd, lastEnd } = task;
  let low = 0;
  for (let end = firstEnd; end <= lastEnd; end += 1) {
    const xe = X[end]!;
    while (low < first.count && first.x[low]! < xe - G - SLACK) low += 1;
    if (low === first.count) break;
    for (let p = low; p < first.count; p += 1) {
      const a = first.x[p]!;
      const b = xe - a;
      if (b < limits.minSpacingM - SLACK) break;
      if (Math.min(a, b) < limits.endLeast * Math.max(a, b) - SLACK) continue;
      close(layers, end, first.cost[p]! + lastSpan(layers, first.at[p]!, end), first.at[p]!, -1);
    }
  }
}

/** Closes layouts that end with an interior span onto z: for each end the cheapest one inside the end window. */
function closeFrom(layers: Layers, z: number, n: number): void {
  const { task, G } = layers;
  const { X, limits, firstEnd, lastEnd } = task;
  const { S, V, from, queue } = layers.room;
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
      close(layers, end, V[best]! + lastSpan(layers, z, end), z, from[best]!);
    }
  }
}

/**
 * Like `cheapestOnto` where the span is the second of the unit, which the window of the end span before it limits, or
 * where the unit can end one span on: lists the spans in the room of the search and gives back how many there are.
 */
function listOnto(layers: Layers, j: number, places: Places, low: number, high: number, z: number): number {
  const { task, cost, half, room } = layers;
  const { X, limits } = task;
  const { S, V, from, onto } = room;
  const { x, reached, perM } = places;
  const xz = X[z]!;
  const az = half.A[z]!;
  const bz = half.B[z]!;
  let count = 0;
  onto.from = -1;
  onto.cost = Infinity;
  for (let p = high; p >= low; p -= 1) {
    const y = x[p]!;
    const s = xz - y;
    if (j === 2 && (y < limits.endLeast * s - SLACK || y > limits.endMost * s + SLACK)) continue;
    const i = s | 0;
    const v = reached[p]! + (cost[i]! + (s - i) * (cost[i + 1]! - cost[i]!)) + (perM[p]! + bz) * s;
    S[count] = s;
    V[count] = v + az;
    from[count] = p;
    count += 1;
    if (v < onto.cost - SLACK * v) {
      onto.cost = v;
      onto.from = p;
    }
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

/** One more interior span onto every position it can reach: fills `next`, closes what can end. */
function oneMore(layers: Layers, j: number, places: Places, next: Places): void {
  const { task, isFull, G, K, cost, half, room } = layers;
  const { X, limits, firstEnd, lastEnd } = task;
  const { x } = places;
  const { toGo, most, onto } = room;
  const least = Math.max(limits.minSpacingM, limits.interiorLeast * G) - SLACK;
  const nearest = Math.max(x[0]! + least, isFull ? 0 : (j - MORE_SPANS - 1) * G - SLACK);
  const farthest = Math.min(x[places.count - 1]! + G, X[lastEnd]! - limits.minSpacingM) + SLACK;
  const closes = X[firstEnd]! - G - SLACK;
  next.count = 0;
  let low = 0;
  let high = -1;
  for (let z = firstFrom(X, nearest); z < X.length && X[z]! <= farthest; z += 1) {
    const xz = X[z]!;
    while (low < places.count && x[low]! < xz - G - SLACK) low += 1;
    while (high + 1 < places.count && x[high + 1]! <= xz - least) high += 1;
    if (low > high || toGo[z]! > K - j) continue;
    let count = 1;
    if (j > 2 && xz < closes) cheapestOnto(places, low, high, cost, xz, half.B[z]!, onto);
    else count = listOnto(layers, j, places, low, high, z);
    if (onto.from < 0) continue;
    const way = onto.cost + half.A[z]!;
    if (xz >= closes && way <= most[z]!) closeFrom(layers, z, count);
    reach(layers, next, z, way, onto.from);
  }
}

/** Indices of the supports of the cheapest layout of k spans to an end, whose last pier is z, come to from a place. */
function traceOf(back: readonly Steps[], k: number, end: number, z: number, from: number): number[] {
  const at = new Array<number>(k + 1);
  at[k] = end;
  if (k >= 2) at[k - 1] = z;
  let p = from;
  for (let j = k - 2; j >= 1; j -= 1) {
    const steps = back[j]!;
    at[j] = steps[p]!;
    p = steps[p + steps.length / 2]!;
  }
  at[0] = 0;
  return at;
}

/** Keeps what leads back from the places of a layer. */
function stepsOf({ at, from, count }: Places): Steps {
  const steps = new Int32Array(2 * count);
  for (let p = 0; p < count; p += 1) {
    steps[p] = at[p]!;
    steps[count + p] = from[p]!;
  }
  return steps;
}

/**
 * Lays out one governing span, one layer of spans on the other, and hands on what each layer closes. False where
 * `closed` wants no more.
 */
function layLayers(layers: Layers, closed: Closed): boolean {
  const { K, room, back } = layers;
  let { places, next } = room;
  firstSpan(layers, places);
  if (!handOn(layers, 1, closed)) return false;
  if (K < 2) return true;
  twoSpans(layers, places);
  back[1] = stepsOf(places);
  if (!handOn(layers, 2, closed)) return false;
  for (let j = 2; j < K && places.count > 0; j += 1) {
    oneMore(layers, j, places, next);
    back[j] = stepsOf(next);
    if (!handOn(layers, j + 1, closed)) return false;
    [places, next] = [next, places];
  }
  return true;
}

/** The task between the first and the last end of which a layout is still wanted; null where there is none. */
function betweenWanted(task: UnitTask): UnitTask | null {
  let { firstEnd, lastEnd } = task;
  while (firstEnd <= lastEnd && task.wantedUpTo(firstEnd) === -Infinity) firstEnd += 1;
  while (lastEnd > firstEnd && task.wantedUpTo(lastEnd) === -Infinity) lastEnd -= 1;
  return firstEnd <= lastEnd ? { ...task, firstEnd, lastEnd } : null;
}

/**
 * Lays out one continuous unit for every governing span of its band by dynamic programming over the candidate
 * positions, one layer per span; end windows tie the two outermost pairs of spans. Costs are those of the table with
 * support costs split between neighbouring spans; the fixed cost of the unit is included. Gives back the governing
 * spans of which something was left out as too dear, with the fewest spans that each can be laid out in.
 */
export function searchUnit(given: UnitTask, table: CostTable, visit: Visit): ReadonlyMap<number, number> {
  const { form, limits, X, supports, endIsPier } = given;
  const ends = given.lastEnd - given.firstEnd + 1;
  const supportOver = meanSupport(supports);
  const governing = governingSpans(given)
    .map((G) => ({ G, K: mostSpans(given, G), perM: table.deckPerM(form, G, G) + supportOver(G) / G }))
    // The nearest end is too far for some with as many spans as are tried.
    .filter(({ G, K }) => K >= fewestSpans(limits, X[given.firstEnd]!, G))
    // The cheapest with even spans first: they show early what is too dear.
    .sort((a, b) => a.perM - b.perM);
  const cut = new Map<number, number>();
  if (governing.length === 0) return cut;
  const room = roomFor(X.length, ends);
  const unit = { form, role: endIsPier ? 'approach' : 'main' } as const;
  for (const { G, K } of governing) {
    const task = betweenWanted(given);
    if (task === null) break;
    spansToGo(task, G, room.toGo, room.queue);
    if (room.toGo[0]! > K) continue;
    const cost = spanCosts(table, unit, G);
    const worksAs = endWorksAs(table, form, G);
    const alone = aloneWorksAs(table, form, G);
    const layers: Layers = {
      task,
      isFull: isFull(given),
      G,
      K,
      cost,
      endCost: worksAs === 1 ? cost : spanCosts(table, unit, G, worksAs),
      aloneCost: alone === 1 ? cost : spanCosts(table, unit, G, alone),
      half: halfCosts(supports, Math.max(limits.minSpacingM, limits.interiorLeast * G), G),
      room,
      back: [],
      cut: false,
      closedFirst: ends,
      closedLast: -1,
    };
    const fixed = table.unitFixed(form, G);
    boundWays(layers, fixed);
    // One for all layouts: most of them are not asked how they go.
    const closed = { end: 0, spans: 0, z: 0, from: 0 };
    const trace = (): Trace => {
      const { end, spans, z, from } = closed;
      return () => traceOf(layers.back, spans, end, z, from);
    };
    const more = layLayers(layers, (end, spans, own, z, from) => {
      closed.end = end;
      closed.spans = spans;
      closed.z = z;
      closed.from = from;
      return visit(end, spans, G, own + fixed, trace);
    });
    if (layers.cut) cut.set(G, room.toGo[0]!);
    if (!more) break;
  }
  return cut;
}
