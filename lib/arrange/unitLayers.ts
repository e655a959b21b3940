import type { HalfCosts, SpanCosts } from './curves.ts';
import { SLACK } from './limits.ts';
import type { UnitTask } from './unitTask.ts';

/** Working room of one search, reused for every governing span. */
interface Room {
  /** Best closed layouts of the last layer by end: cost, last and last but one support. */
  readonly closed: Float64Array;
  readonly closedZ: Int32Array;
  readonly closedY: Int32Array;
  /** Last interior spans ending on a position, by rising length: the span, its cost, its other end. */
  readonly S: Float64Array;
  readonly V: Float64Array;
  readonly Y: Int32Array;
  readonly queue: Int32Array;
  /** Places reached by the layer before, side by side: index, cost with half the support there, position, half support per metre. */
  readonly at: Int32Array;
  readonly reached: Float64Array;
  readonly x: Float64Array;
  readonly perM: Float64Array;
}

export function roomFor(n: number, ends: number): Room {
  return {
    closed: new Float64Array(ends).fill(Infinity),
    closedZ: new Int32Array(ends),
    closedY: new Int32Array(ends),
    S: new Float64Array(n),
    V: new Float64Array(n),
    Y: new Int32Array(n),
    queue: new Int32Array(n),
    at: new Int32Array(n),
    reached: new Float64Array(n),
    x: new Float64Array(n),
    perM: new Float64Array(n),
  };
}

/** Where the last span onto each position from `first` on begins, in one layer. */
export interface Steps {
  readonly first: number;
  readonly from: Int32Array;
}

/** Takes a closed layout: its end, spans, cost, last support before the end and the one before that. */
export type Closed = (end: number, spans: number, cost: number, z: number, y: number) => boolean;

export interface Layers {
  readonly task: UnitTask;
  readonly G: number;
  readonly K: number;
  /** Of an inner span, of an end span and of one alone. */
  readonly cost: SpanCosts;
  readonly endCost: SpanCosts;
  readonly aloneCost: SpanCosts;
  readonly half: HalfCosts;
  readonly room: Room;
  /** By the number of spans of a layer. */
  readonly back: Steps[];
  /** A layout dearer than this need not be followed, and what the rest of it costs at least for each metre. */
  readonly boundCost: number;
  readonly restPerM: number;
  /** Set once something was left out as too dear. */
  cut: boolean;
  /** Ends between which the last layer closed layouts, counted from the first end. */
  closedFrom: number;
  closedTo: number;
}

/** Least that one more span costs for each metre of it: its deck and half the support it begins on. */
export function leastPerM(
  { limits }: UnitTask,
  G: number,
  cost: SpanCosts,
  endCost: SpanCosts,
  { A, B }: HalfCosts,
): number {
  let a = Infinity;
  let b = Infinity;
  for (let i = 1; i < A.length - 1; i += 1) {
    a = Math.min(a, A[i]!);
    b = Math.min(b, B[i]!);
  }
  let least = Infinity;
  for (let s = Math.max(1, Math.floor(limits.minSpacingM)); s <= Math.ceil(G); s += 1) {
    // A span is straight between whole metres, so its cost for each metre is least at one of them.
    least = Math.min(
      least,
      (Math.min(cost[s]!, endCost[s]!) + Math.min(0, a)) / s + Math.max(0, a) / (s + 1) + b,
    );
  }
  return Math.max(0, least);
}

/** Whether the cheapest way to reach a position is too dear to be followed. */
export function isTooDear(layers: Layers, cost: number, x: number): boolean {
  const { task, boundCost, restPerM } = layers;
  if (!(cost + restPerM * (task.X[task.firstEnd]! - x) > boundCost)) return false;
  if (cost < Infinity) layers.cut = true;
  return true;
}

/** Keeps a closed layout of the last layer where it is the cheapest to its end. */
export function close(layers: Layers, end: number, cost: number, z: number, y: number): void {
  const at = end - layers.task.firstEnd;
  const { closed, closedZ, closedY } = layers.room;
  if (cost < closed[at]! - SLACK * Math.abs(cost)) {
    closed[at] = cost;
    closedZ[at] = z;
    closedY[at] = y;
    layers.closedFrom = Math.min(layers.closedFrom, at);
    layers.closedTo = Math.max(layers.closedTo, at);
  }
}

/** Hands on the closed layouts of the last layer by rising end and forgets them; false where no more are wanted. */
export function handOn(layers: Layers, spans: number, take: Closed): boolean {
  const { task, room, closedFrom, closedTo } = layers;
  const { closed, closedZ, closedY } = room;
  let more = true;
  for (let at = closedFrom; at <= closedTo && more; at += 1)
    if (closed[at]! < Infinity)
      more = take(task.firstEnd + at, spans, closed[at]!, closedZ[at]!, closedY[at]!);
  closed.fill(Infinity, closedFrom, closedTo + 1);
  layers.closedFrom = closed.length;
  layers.closedTo = -1;
  return more;
}
