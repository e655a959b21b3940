import type { Site } from '../model/index.ts';
import { substructureData } from './data.ts';
import { settingAt } from './setting.ts';
import { gyration } from './sizeShaft.ts';

/** Whether a pier at a chainage is a leaf because water reaches it or traffic may strike it. */
export function leafAt(site: Site, chainageM: number): boolean {
  const { floodDepthM, impact } = settingAt(site, chainageM);
  return floodDepthM > 0 || impact !== null;
}

/**
 * Stiffness of a pier against its top moving along the road, kN per m: 3 E I / h^3 of a cantilever from a rigid foundation,
 * height in metres. Its shaft is as thick as its slenderness alone asks for, in the steps in which shafts are sized; cracks
 * and creep leave it a share of its stiffness.
 */
export function pierStiffness(deckWidthM: number, heightM: number, isLeaf: boolean): number {
  const { pier, concrete } = substructureData;
  const isHollow = heightM > pier.hollowAboveM;
  const isOne = isLeaf || isHollow;
  const widthM = Math.max(pier.leastLeafWidthM, pier.leafWidthShare * deckWidthM);
  const slender = (pier.effectiveLength * heightM) / (gyration(isHollow) * pier.slenderness);
  const steps = Math.ceil(slender / pier.stepM - 1e-9);
  const t = Math.max(isOne ? pier.leastLeafM : pier.leastColumnM, steps * pier.stepM);
  const inner = isHollow ? [Math.max(0, widthM - 2 * pier.wallM), Math.max(0, t - 2 * pier.wallM)] : [0, 0];
  const inertiaM4 = isOne ? (widthM * t ** 3 - inner[0]! * inner[1]! ** 3) / 12 : (2 * t ** 4) / 12;
  return (3 * concrete.modulusMPa * 1000 * concrete.crackedShare * inertiaM4) / heightM ** 3;
}
