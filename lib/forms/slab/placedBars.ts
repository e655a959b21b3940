import { slabData } from '../common/slab/slabData.ts';
import type { FaceNeed } from './barNeeds.ts';
import { slabDeckData } from './slabDeckData.ts';
import type { SlabModel } from './slabModel.ts';

/**
 * Bars along a face as they are placed, m2 at the stations: the least of a slab everywhere, in each span (or over each
 * pier) half of the peak where more than the least is needed and the whole of it where more than half is, each run on
 * by the effective depth and its anchorage.
 */
export function placedBars(model: SlabModel, face: 'low' | 'high', need: FaceNeed): Float64Array {
  const { beam, task } = model;
  const { xM } = beam;
  const n = xM.length;
  const leastM2 = slabData.steelRatioLeast.value * task.depthM * need.widthM;
  const runOnM = need.effectiveM + slabDeckData.bars.anchorDiameters * need.barM;
  const placed = new Float64Array(n).fill(leastM2);
  for (const [from, to] of regions(model, face)) {
    let peak = 0;
    for (let i = from; i <= to; i++) peak = Math.max(peak, need.areaM2[i]!);
    if (!(peak > leastM2)) continue;
    const half = Math.max(leastM2, peak / 2);
    for (let i = 0; i < n; i++) {
      let most = 0;
      for (let k = from; k <= to; k++)
        if (Math.abs(xM[k]! - xM[i]!) <= runOnM) most = Math.max(most, need.areaM2[k]!);
      if (most > leastM2) placed[i] = Math.max(placed[i]!, most > half ? peak : half);
    }
  }
  return placed;
}

/** Stations of each span for the soffit, of half a span on both sides of each inner support for the top. */
function regions({ beam, task }: SlabModel, face: 'low' | 'high'): [from: number, to: number][] {
  const { supportAt } = beam;
  const middle = (span: number): number => (supportAt[span]! + supportAt[span + 1]!) >> 1;
  if (face === 'low') return task.spansM.map((_, span) => [supportAt[span]!, supportAt[span + 1]!]);
  return task.spansM.slice(1).map((_, pier) => [middle(pier), middle(pier + 1)]);
}

/** Steel volume of bars given at the stations, m3. */
export function volumeAlong(model: SlabModel, areaM2: Float64Array): number {
  const { xM } = model.beam;
  let sum = 0;
  for (let e = 0; e < xM.length - 1; e++) sum += ((areaM2[e]! + areaM2[e + 1]!) / 2) * (xM[e + 1]! - xM[e]!);
  return sum;
}
