import type { HalfCosts, SpanCosts } from './curves.ts';
import { SLACK } from './limits.ts';
import { placesFor, type Onto, type Places } from './places.ts';
import type { UnitTask } from './unitTask.ts';

/** Working room of one search, reused for every governing span. */
interface Room {
  /** Fewest spans from every position to an end, and most that is worth paying on the way there. */
  readonly toGo: Int32Array;
  readonly most: Float64Array;
  /** Best closed layouts of the last layer by end: cost, last support before it and place of the one before that. */
  readonly closed: Float64Array;
  readonly closedZ: Int32Array;
  readonly closedFrom: Int32Array;
  /** Last interior spans ending on a position, by rising length: the span, its cost, the place it comes from. */
  readonly S: Float64Array;
  readonly V: Float64Array;
  readonly from: Int32Array;
  readonly queue: Int32Array;
  /** The last layer and the next. */
  readonly places: Places;
  readonly next: Places;
  readonly onto: Onto;
}

/** Room for `n` positions of which `ends` are ends. */
export function roomFor(n: number, ends: number): Room {
  return {
    toGo: new Int32Array(n),
    most: new Float64Array(n),
    closed: new Float64Array(ends).fill(Infinity),
    closedZ: new Int32Array(ends),
    closedFrom: new Int32Array(ends),
    S: new Float64Array(n),
    V: new Float64Array(n),
    from: new Int32Array(n),
    queue: new Int32Array(n),
    places: placesFor(n),
    next: placesFor(n),
    onto: { from: -1, cost: Infinity },
  };
}

/** Indices of the places of one layer, and after them the places of the layer before from which they are reached. */
export type Steps = Int32Array;

/** Takes a closed layout: its end, spans, cost, last support before the end and place of the one before that. */
export type Closed = (end: number, spans: number, cost: number, z: number, from: number) => boolean;

export interface Layers {
  readonly task: UnitTask;
  /** As of the whole task, where only some of its ends are still wanted. */
  readonly isFull: boolean;
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
  /** Set once something was left out as too dear. */
  cut: boolean;
  /** Ends between which the last layer closed layouts, counted from the first end. */
  closedFirst: number;
  closedLast: number;
}

/** Adds a pier to the places of a layer, unless the cheapest way there is too dear to be worth following. */
export function reach(layers: Layers, onto: Places, z: number, cost: number, from: number): void {
  const { task, half, room } = layers;
  if (!(cost <= room.most[z]!)) {
    layers.cut = true;
    return;
  }
  const p = onto.count;
  onto.at[p] = z;
  onto.x[p] = task.X[z]!;
  onto.cost[p] = cost;
  onto.reached[p] = cost + half.A[z]!;
  onto.perM[p] = half.B[z]!;
  onto.from[p] = from;
  onto.count = p + 1;
}

/** Keeps a closed layout of the last layer where it is the cheapest to its end. */
export function close(layers: Layers, end: number, cost: number, z: number, from: number): void {
  const at = end - layers.task.firstEnd;
  const { closed, closedZ, closedFrom } = layers.room;
  if (cost < closed[at]! - SLACK * Math.abs(cost)) {
    closed[at] = cost;
    closedZ[at] = z;
    closedFrom[at] = from;
    layers.closedFirst = Math.min(layers.closedFirst, at);
    layers.closedLast = Math.max(layers.closedLast, at);
  }
}

/** Hands on the closed layouts of the last layer by rising end and forgets them; false where no more are wanted. */
export function handOn(layers: Layers, spans: number, take: Closed): boolean {
  const { task, room, closedFirst, closedLast } = layers;
  const { closed, closedZ, closedFrom } = room;
  let more = true;
  for (let at = closedFirst; at <= closedLast && more; at += 1)
    if (closed[at]! < Infinity)
      more = take(task.firstEnd + at, spans, closed[at]!, closedZ[at]!, closedFrom[at]!);
  closed.fill(Infinity, closedFirst, closedLast + 1);
  layers.closedFirst = closed.length;
  layers.closedLast = -1;
  return more;
}
