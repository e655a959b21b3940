import type { At } from '../model/index.ts';
import { pieceAt } from './roadLevelAt.ts';

/** How the level of the road at a place is worked out, as an explanation says it. */
export const onRoadFormula =
  'level at the start of its stretch + gradient x distance + change of gradient x distance^2 / 2';

/** What the level of an option's road at a chainage, m, is worked out from; `chainagePath` is where the chainage stands. */
export function onRoad(at: At, chainageM: number, chainagePath: string) {
  const piece = `${at.root}/profile/pieces/${pieceAt(at.option.profile, chainageM)}`;
  return {
    level: `${piece}/levelM`,
    gradient: `${piece}/gradient`,
    bend: `${piece}/curvature1PerM`,
    x: chainagePath,
    from: `${piece}/fromM`,
  } as const;
}

/** The level from those, m. */
export function levelOnRoad(v: { readonly [K in keyof ReturnType<typeof onRoad>]: number }): number {
  const t = v.x - v.from;
  return v.level + v.gradient * t + (v.bend * t * t) / 2;
}
