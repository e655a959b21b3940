import { carries } from '../forms/index.ts';
import { leastCostDepth, type DepthTrial } from './leastCostDepth.ts';
import type { Work } from './work.ts';

/** Beyond a band the depth grows by this factor from one trial to the next. */
const STRIDE = 1.22;
/** So many trials in a row that carry less than the best before them end the walk: deeper is no stronger any more. */
const WEAKER = 2;
/** No depth beyond this is tried, m. */
export const DEEPEST_M = 40;
/** Depths are drawn to 50 mm: 20 steps to the metre. */
const STEPS = 20;

/** A depth, m, and the deepest that was tried beyond the band for want of one inside it; null where none was needed. */
export interface DepthFound {
  readonly depthM: number;
  readonly triedToM: number | null;
}

/**
 * The depth of least cost inside a published band (see `leastCostDepth`). The edge of the band is no physical limit: where
 * nothing inside carries, deeper sections are tried until one does or deeper is no stronger; among those beyond the band
 * that carry the one of least cost is taken. Where none carries it is the depth that comes nearest.
 */
export function* depthThatCarries(
  range: readonly [least: number, most: number],
  tryAt: (depthM: number) => DepthTrial,
  near?: number,
): Work<DepthFound> {
  const tried = new Map<number, DepthTrial>();
  const once = (depthM: number): DepthTrial => {
    const trial = tried.get(depthM) ?? tryAt(depthM);
    tried.set(depthM, trial);
    return trial;
  };
  const insideM = yield* leastCostDepth(range, once, near);
  if (carries(once(insideM).utilisation)) return { depthM: insideM, triedToM: null };
  let bestM = insideM;
  let triedToM: number | null = null;
  let beforeM = range[1];
  for (let weaker = 0; weaker < WEAKER;) {
    const depthM = Math.ceil(beforeM * STRIDE * STEPS - 1e-9) / STEPS;
    if (depthM > DEEPEST_M) break;
    triedToM = depthM;
    const { utilisation } = once(depthM);
    yield;
    if (carries(utilisation))
      return { depthM: yield* leastCostDepth([beforeM, depthM], once, depthM), triedToM };
    weaker = utilisation < once(bestM).utilisation ? 0 : weaker + 1;
    if (weaker === 0) bestM = depthM;
    beforeM = depthM;
  }
  return { depthM: bestM, triedToM };
}
