import { carries } from '../forms/index.ts';
import { stepsPerM } from './depthGrid.ts';
import type { Work } from './work.ts';

/** What one trial depth comes to. */
export interface DepthTrial {
  /** Money; only differences matter. */
  readonly cost: number;
  /** Highest utilisation of any check. */
  readonly utilisation: number;
}

/** Cost within this share of the least counts as the least: the curve is flat and the choice must not jitter. */
const FLAT = 0.01;
/** Of a band of depths, where the search begins when nothing better is known. */
const FIRST_LOOK = 0.4;
/** From one trial to the next the depth grows by this factor. */
const STRIDE = 1.22;
/** Depths closer than this share of themselves cost so nearly the same that nothing is tried between them. */
const FINE = 0.08;
/** Depths read off the curve that are worked out before the shallowest known to do is taken. */
const LOOKS = 3;

type Tried = readonly [on: number, trial: DepthTrial];

const holds = ([, { utilisation }]: Tried): boolean => carries(utilisation);

/** Cost at a depth between trials: a parabola against the logarithm of depth through the three about it, a line through two. */
function costAt(rising: readonly Tried[], on: number): number {
  const next = rising.findIndex(([tried]) => tried >= on);
  if (rising[next]![0] === on) return rising[next]![1].cost;
  const first = Math.max(0, Math.min(next - 1, rising.length - 3));
  const three = rising.slice(first, first + 3);
  const [x0 = 0, x1 = 0, x2] = three.map(([tried]) => Math.log(tried));
  const [y0 = 0, y1 = 0, y2] = three.map(([, { cost }]) => cost);
  const x = Math.log(on);
  const rise = (y1 - y0) / (x1 - x0);
  const bend = x2 === undefined || y2 === undefined ? 0 : ((y2 - y1) / (x2 - x1) - rise) / (x2 - x0);
  return y0 + (x - x0) * (rise + bend * (x - x1));
}

/**
 * The shallowest depth, m, within 1 % of the least cost between two depths, on the grid on which they are drawn.
 * Depths whose checks hold come first; where none holds the one with the lowest utilisation is returned.
 *
 * Walks from a depth near which the least is looked for, shallower and deeper, until it has left it behind on both sides;
 * between three trials that hold the cost is a parabola. The work pauses after each trial.
 *
 * @param range least and most depth, m, least > 0
 * @param tryAt cost and utilisation at one depth, m
 * @param near depth to begin with, m; held in the range
 */
export function* leastCostDepth(
  range: readonly [least: number, most: number],
  tryAt: (depthM: number) => DepthTrial,
  near = range[0] + FIRST_LOOK * (range[1] - range[0]),
): Work<number> {
  const steps = stepsPerM(range[1]);
  const least = Math.ceil(range[0] * steps - 1e-9);
  const most = Math.max(least, Math.floor(range[1] * steps + 1e-9));
  const kept = (step: number): number => Math.min(most, Math.max(least, Math.round(step)));
  const tried = new Map<number, DepthTrial>();
  const visit = function* (on: number): Work<void> {
    if (tried.has(on)) return;
    tried.set(on, tryAt(on / steps));
    yield;
  };
  const sorted = (): Tried[] => [...tried].sort((a, b) => a[0] - b[0]);
  const cheapest = (rows: readonly Tried[]): Tried =>
    rows.reduce((best, row) => (row[1].cost < best[1].cost ? row : best));
  const flat = (rows: readonly Tried[]): number => (1 + FLAT) * cheapest(rows)[1].cost;

  const start = kept(near * steps);
  yield* visit(start);
  yield* visit(kept(Math.min(start - 1, start / STRIDE)));
  yield* visit(kept(Math.max(start + 1, start * STRIDE)));
  for (;;) {
    const rows = sorted();
    const holding = rows.filter(holds);
    const first = rows[0]!;
    const last = rows.at(-1)!;
    // Nothing holds: deeper is stronger, until it is not.
    const weak = holding.length === 0;
    const deeper = weak ? last[1].utilisation <= first[1].utilisation : cheapest(holding) === last;
    const shallower = weak ? !deeper : holds(first) && first[1].cost <= flat(holding);
    const next =
      deeper && last[0] < most
        ? Math.max(last[0] + 1, last[0] * STRIDE)
        : shallower && first[0] > least
          ? Math.min(first[0] - 1, first[0] / STRIDE)
          : undefined;
    if (next === undefined) break;
    yield* visit(kept(next));
  }

  const holding = sorted().filter(holds);
  if (holding.length === 0) {
    return sorted().reduce((best, row) => (row[1].utilisation < best[1].utilisation ? row : best))[0] / steps;
  }
  // Where the depth beside the best no longer holds, the limit between them is looked for once.
  const rows = sorted();
  const best = cheapest(holding)[0];
  const weaker = rows[rows.findIndex(([on]) => on === best) - 1];
  if (weaker && !holds(weaker) && best - weaker[0] > FINE * best)
    yield* visit(Math.round((best + weaker[0]) / 2));

  // The first on the grid that is within the limit, or would be by the curve. Plates and strands go in steps, so what was
  // read off the curve has to hold where it is worked out; if not, the curve is drawn anew.
  for (let look = 1; ; look++) {
    const final = sorted().filter(holds);
    const grid = Array.from({ length: final.at(-1)![0] - final[0]![0] + 1 }, (_, i) => final[0]![0] + i);
    const costs = grid.map((on) => costAt(final, on));
    const limit = look > LOOKS ? flat(final) : (1 + FLAT) * Math.min(...costs);
    const on = grid.find((step, i) => costs[i]! <= limit && (look <= LOOKS || tried.has(step)))!;
    if (tried.has(on)) return on / steps;
    yield* visit(on);
  }
}
