import type { Site, SoffitLimit } from '../model/index.ts';
import { depthAt, type DepthAlong } from './depthAlong.ts';
import { roadEndsOf } from './standBetween.ts';

/** A road level that a soffit limit asks for at a place. */
export interface Need {
  readonly limit: SoffitLimit;
  readonly chainageM: number;
  readonly levelM: number;
}

/**
 * Road levels that a deck of a construction depth needs: at both ends of every limit within the crossing and wherever
 * the depth bends under it. A road that nowhere sags between the abutments and is high enough there is so everywhere.
 */
export function needsOf(site: Site, depth: number | DepthAlong): Need[] {
  const found: Need[] = [];
  for (const limit of site.soffitLimits) {
    const from = Math.max(limit.fromM, site.startM);
    const to = Math.min(limit.toM, site.endM);
    if (!(from <= to)) continue;
    for (const chainageM of from < to ? [from, to] : [from])
      found.push({ limit, chainageM, levelM: limit.levelM + depthAt(depth, chainageM) });
    if (typeof depth === 'number') continue;
    depth.xM.forEach((chainageM, i) => {
      if (chainageM > from && chainageM < to)
        found.push({ limit, chainageM, levelM: limit.levelM + depth.depthM[i]! });
    });
  }
  return found;
}

/**
 * Those needs that can hold up a road which is at both ends at least at the levels given: the corners of the tightest
 * line without sags over all of them. In order of chainage.
 */
export function decidingNeeds(
  site: Site,
  needs: readonly Need[],
  startLevelM: number,
  endLevelM: number,
): Need[] {
  const { startM, endM } = roadEndsOf(site);
  const grade = (endLevelM - startLevelM) / (endM - startM);
  const above = needs
    .filter(({ chainageM, levelM }) => levelM > startLevelM + grade * (chainageM - startM))
    .sort((a, b) => a.chainageM - b.chainageM || a.levelM - b.levelM);
  const hull: Need[] = [];
  /** Whether b lies on or under the line from a to c. */
  const idle = (a: Need, b: Need, c: Need): boolean =>
    (b.levelM - a.levelM) * (c.chainageM - a.chainageM) <=
    (c.levelM - a.levelM) * (b.chainageM - a.chainageM);
  for (const need of above) {
    while (hull.length > 1 && idle(hull.at(-2)!, hull.at(-1)!, need)) hull.pop();
    if (hull.length > 0 && hull.at(-1)!.chainageM === need.chainageM) hull.pop();
    hull.push(need);
  }
  return hull;
}
