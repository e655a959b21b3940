import type { GroundOdds, Site } from '../model/index.ts';
import { stretchAt } from '../site/index.ts';

/**
 * The ground stretch under a chainage with the classes it may turn out to be.
 * Throws a RangeError when the site has no ground stretch: reading the study gives every crossing at least a preset one.
 */
export function groundUnder(
  site: Site,
  chainageM: number,
): { readonly stretch: number; readonly classes: readonly GroundOdds[] } {
  const stretch = stretchAt(site, chainageM);
  const found = site.groundStretches[stretch];
  if (found === undefined) {
    throw new RangeError(
      `ground at chainage ${chainageM} m: expected at least one ground stretch, received none; give a stretch or mark the ground unknown`,
    );
  }
  return { stretch, classes: found.classes };
}
