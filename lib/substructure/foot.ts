import type { Backfill, Combo, Resultant } from './combos.ts';
import { noForces, resultantAt } from './combos.ts';
import { substructureData } from './data.ts';

/** What every foundation of one support has in common, whatever the ground. Metres, kN. */
export interface FootTask {
  /** Footprint of the shaft or wall on the foundation, along and across the road. */
  readonly shaftLengthM: number;
  readonly shaftWidthM: number;
  readonly combos: readonly Combo[];
  readonly groundLevelM: number;
  /** Water that can reach the pit, m; null on dry land. */
  readonly waterLevelM: number | null;
  readonly scourM: number;
  /** Soil behind an abutment; null for a pier. */
  readonly backfill: Backfill | null;
}

/** A foundation to be found for one support. */
export interface FoundationTask extends FootTask {
  readonly name: string;
  /** Index of the support along the crossing, carried into the lines; absent in a trial. */
  readonly support?: number;
  /** Level to which the lines of the shaft reach, m: what lies between it and the foundation is measured here, or taken off. */
  readonly shaftFootM: number;
  readonly shaftAreaM2: number;
  readonly shaftBarsKgM3: number;
  readonly shaftItem: 'pier-concrete' | 'hollow-pier-concrete' | 'abutment-concrete' | 'pylon-concrete';
}

/**
 * Loads at the underside of a footing or cap of `lengthM` x `widthM` x `depthM`, whose underside is at `undersideM`.
 * Adds its own weight less buoyancy, the ground over it, and for an abutment the soil on the heel and active pressure
 * with surcharge (Rankine). Moments are about the middle of the plan; along is positive towards the span.
 * @param into what the demand is written to and handed back as: one record will do for all the sizes that are tried
 */
export function demandAt(
  task: FootTask,
  combo: Combo,
  lengthM: number,
  widthM: number,
  depthM: number,
  undersideM: number,
  into: Resultant = noForces(),
): Resultant {
  const { concrete, footing, abutment } = substructureData;
  const plan = lengthM * widthM;
  const topM = undersideM + depthM;
  const shaftPlan = Math.min(plan, task.shaftLengthM * task.shaftWidthM);
  const coverM = Math.max(0, task.groundLevelM - topM);
  const submerged =
    task.waterLevelM === null ? 0 : Math.max(0, Math.min(task.waterLevelM, topM) - undersideM);
  const own = plan * depthM * concrete.weightKNm3 - plan * submerged * waterKNm3;
  resultantAt(combo, undersideM, into);
  const loadKN = into.verticalKN;
  if (task.backfill === null) {
    into.verticalKN = loadKN + own + (plan - shaftPlan) * coverM * soilOver(task.waterLevelM, topM);
    return into;
  }
  const { topLevelM, widthM: wallM, heelShare, inLoads } = task.backfill;
  const outside = Math.max(0, lengthM - task.shaftLengthM);
  const heel = heelShare * outside;
  const toe = outside - heel;
  const soilHeight = Math.max(0, topLevelM - topM);
  const soil = heel * wallM * soilHeight * footing.soilKNm3;
  const height = Math.max(0, topLevelM - undersideM);
  const pressure = inLoads ? 0 : abutment.activePressure;
  const earth = (pressure * footing.soilKNm3 * height * height * wallM) / 2;
  const surcharge = pressure * abutment.surchargeKPa * height * wallM;
  // Distances from the middle of the plan, positive towards the span.
  const stemAt = lengthM / 2 - toe - task.shaftLengthM / 2;
  const heelAt = -(lengthM / 2 - heel / 2);
  into.verticalKN = loadKN + own + soil;
  into.alongKN = into.alongKN + earth + surcharge;
  into.momentAlongKNm =
    into.momentAlongKNm + (earth * height) / 3 + (surcharge * height) / 2 + loadKN * stemAt + soil * heelAt;
  return into;
}

const waterKNm3 = 10;
const soilOver = (waterLevelM: number | null, levelM: number): number =>
  substructureData.footing.soilKNm3 - (waterLevelM !== null && levelM < waterLevelM ? waterKNm3 : 0);
