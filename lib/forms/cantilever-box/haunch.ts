import type { Arm } from './arms.ts';
import { cantileverData } from './cantileverData.ts';

/** Where a place of the deck lies: its arm, -1 in a single span, and the way from the pier (0) to the end of the haunch (1). */
export interface Place {
  readonly arm: number;
  readonly way: number;
}

/** Place of the deck at `xM` from its first support: on the nearer arm of its span. */
export function placeAt(arms: readonly Arm[], supportsM: readonly number[], xM: number): Place {
  let arm = -1;
  let nearest = Infinity;
  arms.forEach(({ span, pierM }, i) => {
    const away = Math.abs(xM - pierM);
    if (xM < supportsM[span]! || xM > supportsM[span + 1]! || !(away < nearest)) return;
    nearest = away;
    arm = i;
  });
  if (arm < 0) return { arm, way: 1 };
  return { arm, way: Math.min(1, nearest / arms[arm]!.armM) };
}

/** Depth over each inner pier, m, by support: that of the longest arms at `pierDepthM`, less over piers of shorter arms. */
export function pierDepths(arms: readonly Arm[], midspanM: number, pierDepthM: number): Map<number, number> {
  const longest = Math.max(0, ...arms.map(({ armM }) => armM));
  const depths = new Map<number, number>();
  for (const { support, armM } of arms) {
    const own = midspanM + ((pierDepthM - midspanM) * armM) / longest;
    depths.set(support, Math.max(own, depths.get(support) ?? 0));
  }
  return depths;
}

/** Share of the haunch at a way from the pier: 1 over the pier, 0 where the haunch ends. */
export function haunchShare(way: number): number {
  return (1 - way) ** cantileverData.haunchPower.value;
}
