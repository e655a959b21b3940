import type { RoadProfile, Site } from '../model/index.ts';
import { profileFor, type DepthAlong } from '../site/index.ts';
import { kept, remembered, type Kept } from '../kept.ts';

/** Roads kept for one site: more than the depths that one appraisal of it tries. */
const MOST_ROADS = 400;
const known = new WeakMap<Site, Kept<RoadProfile>>();

/**
 * The lowest road line that clears everything for a construction depth, m, or where there is none the line that misses it by
 * least. Options of one depth share their road: the same depth on one site gives the same object.
 */
export function profileOrNearest(site: Site, depth: DepthAlong | number): RoadProfile {
  let roads = known.get(site);
  if (roads === undefined) known.set(site, (roads = kept(MOST_ROADS)));
  return remembered(roads, JSON.stringify(depth), () => lowestOrNearest(site, depth));
}

function lowestOrNearest(site: Site, depth: DepthAlong | number): RoadProfile {
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
