import type { RoadProfile, Site } from '../model/index.ts';
import { approachEnds, approachFrom, isFixed, outwardFall, type RoadEnd } from './approachEnd.ts';
import { crestBetween } from './crest.ts';
import { profileOn, roadLength } from './profileOn.ts';
import { heldGradient } from './regrading.ts';
import { roadEndsOf } from './standBetween.ts';

/** A crest that is sharper by less than this share of its radius is the same. */
const SAME_RADIUS = 1e-9;

/**
 * A road between the same ends whose crest is as sharp as leads it into the gradient of the existing road behind a fixed end,
 * or as near as the least radius allows. A sharper crest is nowhere lower, so what the flatter one clears is cleared; the
 * curve behind that end is shorter for it, or none. What a road costs by the gradient at an end has its one bend where that
 * is the gradient of the existing road, so that no crest between the two is cheaper than both while cost is a straight line
 * on either side of it.
 *
 * Null where the gradient there is not known, a flatter crest would be asked for, or the approach of a free end has no room.
 */
export function easedProfile(site: Site, profile: RoadProfile, end: RoadEnd): RoadProfile | null {
  const held = heldGradient(site, end);
  if (held === null) return null;
  const { startM, endM } = roadEndsOf(site);
  const turn = outwardFall(end, held - profile.gradient);
  const radiusM = Math.max(site.roadCurves.crestRadiusM, roadLength(site) / (2 * turn));
  if (!(turn > 0) || !(radiusM < (profile.crestRadiusM ?? Infinity) * (1 - SAME_RADIUS))) return null;
  const { startLevelM, endLevelM } = profile;
  const crest = crestBetween(startM, endM, startLevelM, endLevelM, radiusM, site.road.maxGradient);
  if (crest === null) return null;
  const fits = (which: RoadEnd, levelM: number, gradient: number): boolean =>
    isFixed(site, which) ||
    approachFrom(approachEnds(site)[which], levelM, outwardFall(which, gradient)).fits;
  if (!fits('start', startLevelM, crest.before) || !fits('end', endLevelM, crest.after)) return null;
  return { ...profileOn(site, crest), easedFor: end };
}
