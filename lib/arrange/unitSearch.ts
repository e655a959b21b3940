import type { CostTable, FormId } from '../model/index.ts';
import {
  halfCosts,
  spanCostAt,
  spanCosts,
  type HalfCosts,
  type SpanCosts,
  type SupportCosts,
} from './curves.ts';
import { SLACK, type Limits } from './limits.ts';

/** One continuous unit that starts at position 0 of `X` and ends at any of the positions firstEnd..lastEnd. */
export interface UnitTask {
  readonly form: FormId;
  /** Candidate positions, m, rising from 0. */
  readonly X: Float64Array;
  readonly firstEnd: number;
  readonly lastEnd: number;
  readonly limits: Limits;
  readonly supports: SupportCosts;
  /** Whether the support at the end is a pier, half of which the unit carries. */
  readonly endIsPier: boolean;
}

/** Called for every end, number of spans and governing span that can be laid out; `trace(end, spans)` gives the indices into
 * `X` while the call lasts.
 * Giving back false ends the search. */
export type Visit = (
  end: number,
  spans: number,
  governingM: number,
  cost: number,
  trace: (end: number, spans: number) => number[],
) => boolean;

/**
 * Full search up to this many positions and for one end only: governing spans by half metres, by more where that makes
 * too many, and every number of spans. Longer crossings and approaches, which have many ends, take fewer
 * governing spans, in even steps of their logarithm, and numbers of spans near the fewest possible for each.
 */
const MANY = 700;
const FINEST_M = 0.5;
const MORE_SPANS = 3;
const MOST_GOVERNING = 64;
const APPROACH_GOVERNING = 32;
const FEW_GOVERNING = 16;

function manyEnds(task: UnitTask): boolean {
  return task.lastEnd > task.firstEnd;
}

/** Widest gap between neighbouring candidates that every layout has to span, m. */
function forcedSpan(X: Float64Array, last: number): number {
  let widest = 0;
  for (let i = 1; i <= last; i += 1) widest = Math.max(widest, X[i]! - X[i - 1]!);
  return widest;
}

/** Governing spans to try, rising, m; empty when the forced span is beyond the band. */
export function governingSpans(task: UnitTask): number[] {
  const { X, firstEnd, lastEnd, limits } = task;
  const least = Math.max(limits.minSpanM, forcedSpan(X, firstEnd));
  const most = Math.min(limits.maxSpanM, X[lastEnd]!);
  if (!(least <= most + SLACK)) return [];
  const range = most - least;
  const count = X.length > MANY ? FEW_GOVERNING : manyEnds(task) ? APPROACH_GOVERNING : MOST_GOVERNING;
  if (range <= count) {
    const steps = Math.min(Math.max(Math.ceil(range / FINEST_M - SLACK), 0), count);
    return Array.from({ length: steps + 1 }, (_, i) =>
      i === steps ? Math.max(most, least) : least + (i * range) / steps,
    );
  }
  const growth = (most / least) ** (1 / count);
  return Array.from({ length: count + 1 }, (_, i) => least * growth ** i);
}

/** Most spans worth trying with one governing span. */
export function mostSpans(task: UnitTask, governingM: number): number {
  const { limits, X, lastEnd } = task;
  const lengthM = X[lastEnd]!;
  const interior = Math.max(limits.minSpacingM, limits.interiorLeast * governingM);
  const ever = Math.max(2, Math.floor(2 + (lengthM - 2 * limits.minSpacingM) / interior + SLACK));
  if (X.length <= MANY && !manyEnds(task)) return ever;
  return Math.min(ever, fewestSpans(limits, lengthM, governingM) + MORE_SPANS);
}

/** Fewest spans that can reach a length with one governing span. */
export function fewestSpans(limits: Limits, lengthM: number, governingM: number): number {
  if (lengthM <= governingM + SLACK) return 1;
  if (lengthM <= 2 * governingM + SLACK) return 2;
  return Math.max(3, Math.ceil(lengthM / governingM + 2 * (1 - Math.min(limits.endMost, 1)) - 1e-6));
}

interface Layers {
  readonly task: UnitTask;
  readonly G: number;
  readonly K: number;
  readonly cost: SpanCosts;
  readonly half: HalfCosts;
  /** Predecessor of each position by the number of spans used to reach it, K x n. */
  readonly back: Int32Array;
  /** Best closed layouts by number of spans and end, (K + 1) x ends: cost, last and last but one support. */
  readonly closed: Float64Array;
  readonly closedZ: Int32Array;
  readonly closedY: Int32Array;
}

function close(layers: Layers, k: number, end: number, cost: number, z: number, y: number): void {
  const at = k * (layers.task.lastEnd - layers.task.firstEnd + 1) + end - layers.task.firstEnd;
  if (cost < layers.closed[at]! - SLACK * Math.abs(cost)) {
    layers.closed[at] = cost;
    layers.closedZ[at] = z;
    layers.closedY[at] = y;
  }
}

/** Cost of the last span from z to the end, with the halves of the supports it carries. */
function lastSpan(layers: Layers, z: number, end: number): number {
  const { task, cost, half } = layers;
  const s = task.X[end]! - task.X[z]!;
  return (
    spanCostAt(cost, s) + half.A[z]! + half.B[z]! * s + (task.endIsPier ? half.A[end]! + half.B[end]! * s : 0)
  );
}

/** Layouts of one and two spans; fills the costs of reaching each first pier. */
function firstTwo(layers: Layers, F: Float64Array): void {
  const { task, G, cost, half } = layers;
  const { X, limits, firstEnd, lastEnd } = task;
  F.fill(Infinity);
  for (let x = 1; x < X.length && X[x]! <= G + SLACK; x += 1) {
    const s = X[x]!;
    if (s < limits.minSpacingM - SLACK) continue;
    const deck = spanCostAt(cost, s);
    if (x >= firstEnd && x <= lastEnd && s >= limits.minSpanM - SLACK) {
      close(layers, 1, x, deck + (task.endIsPier ? half.A[x]! + half.B[x]! * s : 0), 0, 0);
    }
    F[x] = deck + half.A[x]! + half.B[x]! * s;
  }
  for (let end = firstEnd; end <= lastEnd; end += 1) {
    for (let x = 1; x < end && X[x]! <= G + SLACK; x += 1) {
      const a = X[x]!;
      const b = X[end]! - a;
      if (b > G + SLACK || b < limits.minSpacingM - SLACK) continue;
      if (Math.min(a, b) < limits.endLeast * Math.max(a, b) - SLACK) continue;
      if (F[x]! < Infinity) close(layers, 2, end, F[x]! + lastSpan(layers, x, end), x, 0);
    }
  }
}

/** Scratch of one layer: last interior spans ending on a position, by rising length. */
interface Scratch {
  readonly S: Float64Array;
  readonly V: Float64Array;
  readonly Y: Int32Array;
  readonly queue: Int32Array;
}

/** Closes layouts that end with an interior span onto z: for each end the cheapest one inside the end window. */
function closeFrom(layers: Layers, k: number, z: number, n: number, scratch: Scratch): void {
  const { task, G } = layers;
  const { X, limits, firstEnd, lastEnd } = task;
  const { S, V, Y, queue } = scratch;
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
      close(layers, k, end, V[best]! + lastSpan(layers, z, end), z, Y[best]!);
    }
  }
}

/** One more interior span onto every position it can reach: fills `next`, closes what can end. */
function oneMore(layers: Layers, j: number, F: Float64Array, next: Float64Array, scratch: Scratch): boolean {
  const { task, G, K, cost, half, back } = layers;
  const { X, limits, firstEnd, lastEnd } = task;
  const { S, V, Y } = scratch;
  const { A, B } = half;
  const n = X.length;
  const least = Math.max(limits.minSpacingM, limits.interiorLeast * G) - SLACK;
  const nearest = Math.max(limits.minSpacingM + (j - 1) * least, X[firstEnd]! - (K - j) * G) - SLACK;
  const farthest = Math.min(j * G, X[lastEnd]! - limits.minSpacingM) + SLACK;
  next.fill(Infinity);
  let any = false;
  let low = 0;
  let high = 0;
  for (let z = 1; z < n && X[z]! <= farthest; z += 1) {
    const xz = X[z]!;
    if (xz < nearest) continue;
    while (X[low]! < xz - G - SLACK) low += 1;
    while (X[high + 1]! <= xz - least) high += 1;
    let count = 0;
    let best = Infinity;
    let from = -1;
    for (let y = high; y >= Math.max(low, 1); y -= 1) {
      const f = F[y]!;
      if (f === Infinity) continue;
      const s = xz - X[y]!;
      if (j === 2 && (X[y]! < limits.endLeast * s - SLACK || X[y]! > limits.endMost * s + SLACK)) continue;
      const v = f + spanCostAt(cost, s) + A[y]! + B[y]! * s + A[z]! + B[z]! * s;
      S[count] = s;
      V[count] = v;
      Y[count] = y;
      count += 1;
      if (v < best - SLACK * v) {
        best = v;
        from = y;
      }
    }
    if (count === 0) continue;
    any = true;
    next[z] = best;
    back[j * n + z] = from;
    closeFrom(layers, j + 1, z, count, scratch);
  }
  return any;
}

function traceOf(layers: Layers, k: number, end: number): number[] {
  const { task, back } = layers;
  const at = k * (task.lastEnd - task.firstEnd + 1) + end - task.firstEnd;
  const indices = [end];
  if (k >= 2) indices.push(layers.closedZ[at]!);
  let y = layers.closedY[at]!;
  for (let j = k - 2; j >= 1; j -= 1) {
    indices.push(y);
    y = j > 1 ? back[j * task.X.length + y]! : 0;
  }
  indices.push(0);
  return indices.reverse();
}

/**
 * Lays out one continuous unit for every governing span of its band by dynamic programming over the candidate
 * positions, one layer per span; end windows tie the two outermost pairs of spans. Costs are those of the table with
 * support costs split between neighbouring spans; the fixed cost of the unit is included.
 */
export function searchUnit(task: UnitTask, table: CostTable, visit: Visit): void {
  const n = task.X.length;
  const ends = task.lastEnd - task.firstEnd + 1;
  let F: Float64Array = new Float64Array(n);
  let next: Float64Array = new Float64Array(n);
  const scratch = {
    S: new Float64Array(n),
    V: new Float64Array(n),
    Y: new Int32Array(n),
    queue: new Int32Array(n),
  };
  for (const G of governingSpans(task)) {
    const K = mostSpans(task, G);
    const layers: Layers = {
      task,
      G,
      K,
      cost: spanCosts(table, { form: task.form, role: task.endIsPier ? 'approach' : 'main' }, G),
      half: halfCosts(task.supports, Math.max(task.limits.minSpacingM, task.limits.interiorLeast * G), G),
      back: new Int32Array(K * n),
      closed: new Float64Array((K + 1) * ends).fill(Infinity),
      closedZ: new Int32Array((K + 1) * ends),
      closedY: new Int32Array((K + 1) * ends),
    };
    firstTwo(layers, F);
    for (let j = 2; j < K; j += 1) {
      if (!oneMore(layers, j, F, next, scratch)) break;
      [F, next] = [next, F];
    }
    const fixed = table.unitFixed(task.form, G);
    const trace = (end: number, spans: number): number[] => traceOf(layers, spans, end);
    for (let k = 1; k <= K; k += 1) {
      for (let end = task.firstEnd; end <= task.lastEnd; end += 1) {
        const cost = layers.closed[k * ends + end - task.firstEnd]!;
        if (cost === Infinity) continue;
        if (!visit(end, k, G, cost + fixed, trace)) return;
      }
    }
  }
}
