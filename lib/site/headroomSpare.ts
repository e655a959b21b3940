import type { RoadProfile, Site, SoffitLimit } from '../model/index.ts';
import { depthAt, type DepthAlong } from './depthAlong.ts';
import { roadLevelAt } from './roadLevelAt.ts';

/** Height of a soffit above the lowest it may have, at the place where it is least. */
export interface HeadroomSpare {
  /** m; negative where a limit is fouled. */
  readonly spareM: number;
  readonly limit: SoffitLimit;
  readonly chainageM: number;
}

/**
 * Least spare headroom under a deck of a construction depth, m, along a road profile, over every soffit limit; null where
 * nothing has to be kept clear. Limits and depths are straight between their points, so the ends of the limits and the
 * bends of the depth under them are enough.
 */
export function headroomSpare(
  site: Site,
  profile: RoadProfile,
  depth: number | DepthAlong,
): HeadroomSpare | null {
  let least: HeadroomSpare | null = null;
  for (const limit of site.soffitLimits) {
    const from = Math.max(limit.fromM, site.startM);
    const to = Math.min(limit.toM, site.endM);
    if (!(from <= to)) continue;
    const bends = typeof depth === 'number' ? [] : depth.xM.filter((x) => x > from && x < to);
    for (const chainageM of [from, to, ...bends]) {
      const spareM = roadLevelAt(profile, chainageM) - depthAt(depth, chainageM) - limit.levelM;
      if (least === null || spareM < least.spareM) least = { spareM, limit, chainageM };
    }
  }
  return least;
}
