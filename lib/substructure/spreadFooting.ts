import { noForces } from './combos.ts';
import type { FootTask } from './foot.ts';
import { demandAt } from './foot.ts';
import type { GroundFigures } from './data.ts';
import { substructureData } from './data.ts';

/** Plan and depth of a spread footing, m. */
export interface FootingSize {
  readonly lengthM: number;
  readonly widthM: number;
  readonly depthM: number;
}

const widest = 24;

/**
 * Smallest spread footing whose underside is at `undersideM`, or null when none up to 24 m will do.
 * For every combination: pressure on the effective area (V over (B - 2e)(W - 2e')) within the allowable pressure,
 * eccentricity within a third, sliding within base friction (Meyerhof's effective area; allowable pressures by class).
 * Both sides move in steps along the edge of what is possible, so the search is linear in the number of steps.
 */
export function spreadFooting(task: FootTask, ground: GroundFigures, undersideM: number): FootingSize | null {
  const { stepM, leastOverhangM } = substructureData.footing;
  const up = (value: number): number => Math.ceil(value / stepM - 1e-9) * stepM;
  const leastLength = up(task.shaftLengthM + 2 * leastOverhangM);
  const leastWidth = up(task.shaftWidthM + (task.backfill === null ? 2 * leastOverhangM : 0));
  const mostWidth = task.backfill === null ? Math.max(widest, leastWidth) : leastWidth;
  let best: FootingSize | null = null;
  let widthM = mostWidth;
  for (let lengthM = leastLength; lengthM <= widest; lengthM += stepM) {
    if (best !== null && lengthM * leastWidth >= best.lengthM * best.widthM) break;
    if (!stands(task, ground, lengthM, widthM, undersideM)) continue;
    while (widthM - stepM >= leastWidth && stands(task, ground, lengthM, widthM - stepM, undersideM))
      widthM -= stepM;
    const area = lengthM * widthM;
    if (best === null || area < best.lengthM * best.widthM - 1e-9) {
      best = { lengthM, widthM, depthM: footingDepth(task, ground, lengthM, widthM) };
    }
    if (widthM <= leastWidth) break;
  }
  return best;
}

/**
 * Depth of a footing, m: one-way shear at its effective depth from the face of the shaft, a q / (q + v) for overhang a,
 * design pressure q and shear strength v without links (EN 1992-1-1 6.2.2), and the practical least.
 */
function footingDepth(task: FootTask, ground: GroundFigures, lengthM: number, widthM: number): number {
  const { leastDepthM, shearKPa, designPressure, coverM } = substructureData.footing;
  const overhang = Math.max(lengthM - task.shaftLengthM, widthM - task.shaftWidthM) / 2;
  const q = designPressure * ground.allowableKPa;
  return Math.max(leastDepthM, (overhang * q) / (q + shearKPa) + coverM);
}

const demand = noForces();

function stands(
  task: FootTask,
  ground: GroundFigures,
  lengthM: number,
  widthM: number,
  undersideM: number,
): boolean {
  const depthM = footingDepth(task, ground, lengthM, widthM);
  const { baseFriction } = substructureData.footing;
  const plan = lengthM * widthM;
  // Without its own weight it is already too small: nothing more to work out.
  for (const combo of task.combos)
    if (combo.verticalKN > ground.allowableKPa * combo.capacity * plan) return false;
  for (const combo of task.combos) {
    const d = demandAt(task, combo, lengthM, widthM, depthM, undersideM, demand);
    if (!(d.verticalKN > 0)) return false;
    const e = Math.abs(d.momentAlongKNm) / d.verticalKN;
    const f = Math.abs(d.momentAcrossKNm) / d.verticalKN;
    if (e > lengthM / 3 || f > widthM / 3) return false;
    const pressure = d.verticalKN / ((lengthM - 2 * e) * (widthM - 2 * f));
    if (pressure > ground.allowableKPa * combo.capacity) return false;
    if (Math.sqrt(d.alongKN ** 2 + d.acrossKN ** 2) > baseFriction * combo.capacity * d.verticalKN)
      return false;
  }
  return true;
}
