import { riverData } from './data.ts';

/** Acceleration of gravity, m/s2. */
const gravity = 9.81;

/**
 * Depth of the hole at a pier below the bed, m, by the equation of Colorado State University in HEC-18:
 * 2 K1 K3 a^0.65 y^0.35 Fr^0.43, for a pier of thickness a along the flow, m, in water y deep, m, that runs at V, m/s.
 * At most 2.4 a, or 3 a where the Froude number is above 0.8; 0 without water, flow or pier.
 */
export function pierScour(thicknessM: number, depthM: number, velocityMs: number): number {
  if (!(thicknessM > 0) || !(depthM > 0) || !(velocityMs > 0)) return 0;
  const { factor, noseFactor, bedFactor, widthPower, froudePower, slowFroude, mostSlow, mostFast } =
    riverData.pierScour;
  const froude = velocityMs / Math.sqrt(gravity * depthM);
  const hole =
    factor * noseFactor * bedFactor * depthM * (thicknessM / depthM) ** widthPower * froude ** froudePower;
  return Math.min(hole, (froude > slowFroude ? mostFast : mostSlow) * thicknessM);
}
