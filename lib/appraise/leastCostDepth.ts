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
/** Depths closer than this share of themselves cost so nearly the same that nothing is tried between them. */
const FINE = 0.08;
/** Depths are drawn to 50 mm: 20 steps to the metre. */
const STEPS = 20;

/**
 * The shallowest depth, m, within 1 % of the least cost between two depths, on a grid of 50 mm.
 * Depths whose checks hold come first; where none holds the one with the lowest utilisation is returned.
 *
 * The band is tried at `trials` depths and once more between the neighbours of the best; costs between trials are read
 * off straight lines. The work pauses after each trial.
 *
 * @param range least and most depth, m, least > 0
 * @param tryAt cost and utilisation at one depth, m
 */
export function* leastCostDepth(
  range: readonly [least: number, most: number],
  tryAt: (depthM: number) => DepthTrial,
  trials: number,
): Work<number> {
  const least = Math.ceil(range[0] * STEPS - 1e-9);
  const most = Math.max(least, Math.floor(range[1] * STEPS + 1e-9));
  const tried = new Map<number, DepthTrial>();
  const visit = function* (step: number): Work<void> {
    const on = Math.round(step);
    if (tried.has(on)) return;
    tried.set(on, tryAt(on / STEPS));
    yield;
  };
  const count = Math.max(2, Math.min(trials, most - least + 1));
  for (let i = 0; i < count; i++) yield* visit(least + ((most - least) * i) / (count - 1));

  const sorted = (): [on: number, trial: DepthTrial][] => [...tried].sort((a, b) => a[0] - b[0]);
  const holding = (): [on: number, trial: DepthTrial][] => sorted().filter(([, t]) => t.utilisation <= 1);
  const cheapest = (rows: readonly [number, DepthTrial][]) =>
    rows.reduce((best, row) => (row[1].cost < best[1].cost ? row : best));

  if (holding().length === 0) {
    return sorted().reduce((best, row) => (row[1].utilisation < best[1].utilisation ? row : best))[0] / STEPS;
  }
  const rows = sorted();
  const at = rows.findIndex(([on]) => on === cheapest(holding())[0]);
  const best = rows[at]![0];
  for (const beside of [rows[at - 1], rows[at + 1]]) {
    if (beside && Math.abs(beside[0] - best) > FINE * best) yield* visit((best + beside[0]) / 2);
  }

  const final = holding();
  const limit = (1 + FLAT) * cheapest(final)[1].cost;
  const first = final.findIndex(([, t]) => t.cost <= limit);
  const inside = final[first]!;
  const outside = final[first - 1];
  if (!outside) return inside[0] / STEPS;
  // Between a depth that is too dear and one that is not: where the straight line meets the limit.
  const share = (outside[1].cost - limit) / (outside[1].cost - inside[1].cost);
  return Math.ceil(outside[0] + share * (inside[0] - outside[0]) - 1e-9) / STEPS;
}
