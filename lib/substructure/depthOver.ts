import type { Design } from '../model/index.ts';

/** Structural depth of a unit over its support `i` (0-based), m. */
export function depthOver(design: Design, i: number): number {
  const { xM, depthM } = design.depthAlong;
  const at = design.task.spansM.slice(0, i).reduce((sum, span) => sum + span, 0);
  let k = 1;
  while (k < xM.length - 1 && xM[k]! < at - 1e-9) k++;
  const x0 = xM[k - 1] ?? 0;
  const x1 = xM[k] ?? x0;
  const d0 = depthM[k - 1] ?? design.depthM.support;
  const d1 = depthM[k] ?? d0;
  const share = x1 > x0 ? Math.min(1, Math.max(0, (at - x0) / (x1 - x0))) : 0;
  return d0 + share * (d1 - d0);
}
