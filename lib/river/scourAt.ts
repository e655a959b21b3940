import { riverData } from './data.ts';
import type { FlowAt } from './flowAt.ts';
import { pierScour } from './pierScour.ts';

/**
 * Depth of scour below the ground at a support in a flood, m, the deeper of two: Lacey's depth under the flood times its
 * factor at a pier or a wall; and general scour, which is Lacey's depth itself or `presetM` where the bed is not known,
 * with the hole at the pier (HEC-18). `thicknessM` is that of the pier, 0 for a wall.
 */
export function scourAt({ depthM, velocityMs, laceyM }: FlowAt, thicknessM: number, presetM: number): number {
  const { atPier, atWall } = riverData.lacey;
  const general = laceyM === null ? presetM : Math.max(0, laceyM - depthM);
  const whole = laceyM === null ? 0 : (thicknessM > 0 ? atPier : atWall) * laceyM - depthM;
  return Math.max(general + pierScour(thicknessM, depthM, velocityMs), whole);
}
