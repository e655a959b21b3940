import { carries } from '../forms/index.ts';
import { onGrid } from './depthGrid.ts';
import { leastCostDepth, type DepthTrial } from './leastCostDepth.ts';
import type { Work } from './work.ts';

/** Beyond a band the depth grows by this factor from one trial to the next. */
const STRIDE = 1.15;
/** A section more than so many times as deep as published ones are is another form; common practice, no source. */
const DEEPEST_OVER_BAND = 2;
/** No depth beyond this is tried, m. */
export const DEEPEST_M = 40;

/** About the depth that comes nearest to carrying, factors to either side. */
const CLOSER = [STRIDE ** (1 / 2), STRIDE ** (1 / 4)];

/** A depth, m, and the deepest that was tried beyond the band for want of one inside it; null where none was needed. */
export interface DepthFound {
  readonly depthM: number;
  readonly triedToM: number | null;
}

/**
 * The depth of least cost inside a published band (see `leastCostDepth`). The edge of the band is no physical limit: where
 * nothing inside carries, deeper sections, to twice as deep, are tried until one does; among those beyond the band
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
  const deepestM = Math.min(DEEPEST_M, DEEPEST_OVER_BAND * range[1]);
  for (;;) {
    const depthM = onGrid(Math.min(STRIDE * beforeM, deepestM));
    if (depthM <= beforeM) break;
    triedToM = depthM;
    const { utilisation } = once(depthM);
    yield;
    if (carries(utilisation))
      return { depthM: yield* leastCostDepth([beforeM, depthM], once, depthM), triedToM };
    if (utilisation < once(bestM).utilisation) bestM = depthM;
    beforeM = depthM;
  }
  // About the one that comes nearest in strides that are halved: what carries may be no wider than a stride.
  for (const stride of CLOSER) {
    for (const depthM of [bestM / stride, bestM * stride].map(onGrid)) {
      if (depthM < range[0] || depthM > deepestM) continue;
      const { utilisation } = once(depthM);
      yield;
      if (carries(utilisation)) return { depthM, triedToM };
      if (utilisation < once(bestM).utilisation) bestM = depthM;
    }
  }
  return { depthM: bestM, triedToM };
}
