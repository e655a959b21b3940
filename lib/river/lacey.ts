import { riverData } from './data.ts';

/** Width that a river in its own alluvium makes for itself, m, for a flow in m3/s: 4.8 sqrt(Q) (Lacey). */
export const laceyWidth = (flowM3s: number): number => riverData.lacey.widthFactor * Math.sqrt(flowM3s);

/** Silt factor of a bed of median grain d50, mm: 1.76 sqrt(d50) (Lacey). */
export const siltFactorOf = (grainMm: number): number => riverData.lacey.siltFactor * Math.sqrt(grainMm);

/** Depth under the flood that a flow q, m2/s, scours in a bed of silt factor f, m: 1.34 (q^2 / f)^(1/3) (Lacey). */
export function laceyDepth(flowM2s: number, siltFactor: number): number {
  return riverData.lacey.depthFactor * Math.cbrt((flowM2s * flowM2s) / siltFactor);
}
