import type { RoadProfile, Site } from '../model/index.ts';
import { profileFor, type DepthAlong } from '../site/index.ts';

/**
 * The lowest road line that clears everything for a construction depth, m, or where there is none the line that misses it by
 * least.
 */
export function profileOrNearest(site: Site, depth: DepthAlong | number): RoadProfile {
  const found = profileFor(site, depth);
  if (found.ok) return found.profile;
  const { kind, missedBy } = found.refusal;
  const eased: Site =
    kind === 'clearance'
      ? {
          ...site,
          soffitLimits: site.soffitLimits.map((l) => ({ ...l, levelM: l.levelM - missedBy - 1e-3 })),
        }
      : { ...site, road: { ...site.road, maxGradient: site.road.maxGradient + missedBy + 1e-6 } };
  const again = profileFor(eased, depth);
  if (!again.ok) throw new RangeError('road profile: expected a line once the limits are eased, found none');
  return again.profile;
}
