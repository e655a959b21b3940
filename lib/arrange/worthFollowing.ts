import { spanCostAt, type SpanCosts } from './curves.ts';
import { SLACK } from './limits.ts';
import { cheapestOnto } from './places.ts';
import { reach, type Layers } from './unitLayers.ts';

/** Share by which a layout may be dearer than what is wanted: more than the comparisons of the search give away. */
const MARGIN = 1e-6;

/** Least that a way costs, money: onto every position as a pier, and onto every end by its place among the ends. */
interface Least {
  readonly way: Float64Array;
  readonly whole: Float64Array;
}

function lower(a: SpanCosts, b: SpanCosts): SpanCosts {
  if (a === b) return a;
  const least = new Float64Array(a.length);
  for (let i = 0; i < least.length; i += 1) least[i] = Math.min(a[i]!, b[i]!);
  return least;
}

/** Least of the values at the piers in every stretch as long as the governing span, and in those beside it. */
function leastNear(values: Float64Array, { task, G }: Layers): number[] {
  const { X } = task;
  const stretches = Math.floor(X[X.length - 1]! / G) + 1;
  const own = new Array<number>(stretches).fill(Infinity);
  for (let i = 1; i < X.length - 1; i += 1) {
    const k = Math.floor(X[i]! / G);
    if (values[i]! < own[k]!) own[k] = values[i]!;
  }
  return own.map((least, k) => Math.min(least, own[k - 1] ?? Infinity, own[k + 1] ?? Infinity));
}

/**
 * Quickly found: a metre costs no less than in the cheapest of all spans over it, if both supports of that were the
 * cheapest near.
 */
function leastByMetres(layers: Layers, deck: SpanCosts): Least {
  const { task, G, half } = layers;
  const { X, limits, firstEnd, lastEnd, endIsPier } = task;
  const A = leastNear(half.A, layers);
  const B = leastNear(half.B, layers);
  // A span is straight between whole metres, so its cost for each metre is least at one of them.
  const perM = A.map((a, k) => {
    let least = Infinity;
    for (let s = Math.max(1, Math.floor(limits.minSpacingM)); s <= Math.ceil(G); s += 1)
      least = Math.min(least, (deck[s]! + 2 * a) / s);
    return least + 2 * B[k]!;
  });
  const way = new Float64Array(X.length);
  const whole = new Float64Array(lastEnd - firstEnd + 1);
  let k = 0;
  for (let z = 1; z <= lastEnd; z += 1) {
    let least = perM[k]!;
    while ((k + 1) * G < X[z]!) least = Math.min(least, perM[(k += 1)]!);
    way[z] = way[z - 1]! + least * (X[z]! - X[z - 1]!);
    // No half of a pier on an abutment.
    if (z >= firstEnd) whole[z - firstEnd] = way[z]! - (endIsPier ? 0 : Math.max(0, A[k]! + B[k]! * G));
  }
  return { way, whole };
}

/** By any number of spans and without end windows; nothing is found where that is more than is worth paying already. */
function leastBySpans(layers: Layers, deck: SpanCosts): Least {
  const { task, room, G, K, half, endCost } = layers;
  const { X, limits, firstEnd, lastEnd, endIsPier } = task;
  const { places, onto, toGo } = room;
  const { x } = places;
  const inner = Math.max(limits.minSpacingM, limits.interiorLeast * G) - 2 * SLACK;
  const outer = limits.minSpacingM - 2 * SLACK;
  const way = new Float64Array(X.length).fill(Infinity);
  const whole = new Float64Array(lastEnd - firstEnd + 1).fill(Infinity);
  places.count = 0;
  let low = 0;
  let high = -1;
  for (let z = 1; z <= lastEnd; z += 1) {
    const xz = X[z]!;
    while (low < places.count && x[low]! < xz - G - 2 * SLACK) low += 1;
    while (high + 1 < places.count && x[high + 1]! <= xz - inner) high += 1;
    if (toGo[z]! < K) {
      cheapestOnto(places, low, high, deck, xz, half.B[z]!, onto);
      const first = xz >= outer && xz <= G + 2 * SLACK ? spanCostAt(endCost, xz) + half.B[z]! * xz : Infinity;
      way[z] = Math.min(first, onto.cost) + half.A[z]!;
    }
    if (z >= firstEnd) {
      let last = high;
      while (last + 1 < places.count && x[last + 1]! <= xz - outer) last += 1;
      cheapestOnto(places, low, last, deck, xz, endIsPier ? half.B[z]! : 0, onto);
      whole[z - firstEnd] = onto.cost + (endIsPier ? half.A[z]! : 0);
    }
    if (way[z]! < Infinity) reach(layers, places, z, way[z]!, -1);
  }
  return { way, whole };
}

/** Most that is worth paying for a way onto each position: what it costs at least and what an end beyond can spare. */
function fillMost({ task, room }: Layers, { way, whole }: Least, wanted: Float64Array): void {
  const { firstEnd, lastEnd } = task;
  const { most } = room;
  let spare = -Infinity;
  for (let z = lastEnd; z >= 1; z -= 1) {
    most[z] = way[z] === Infinity ? -Infinity : way[z]! + spare;
    if (z < firstEnd) continue;
    const end = z - firstEnd;
    const left = wanted[end]! - whole[end]! * (1 - MARGIN);
    // Not a number where an end of which all layouts are wanted cannot be reached.
    if (left > spare) spare = left;
  }
}

/**
 * Fills the room of the search with the most that a way onto each position may cost to be worth following: what no end
 * wants is left out, and nothing else.
 */
export function boundWays(layers: Layers, fixed: number): void {
  const { task, room, cost, endCost } = layers;
  const { firstEnd, lastEnd, wantedUpTo } = task;
  const wanted = new Float64Array(lastEnd - firstEnd + 1);
  for (let end = firstEnd; end <= lastEnd; end += 1) wanted[end - firstEnd] = wantedUpTo(end) - fixed;
  room.most.fill(Infinity);
  if (wanted.every((up) => up === Infinity)) return;
  const deck = lower(cost, endCost);
  fillMost(layers, leastByMetres(layers, deck), wanted);
  fillMost(layers, leastBySpans(layers, deck), wanted);
}
