import type { GroundClassId, Site } from '../model/index.ts';
import { bearingLevel, groundAt, stretchAt } from '../site/index.ts';

/** A class that the ground under a support may turn out to be, with the level at which it bears there, m. */
export interface GroundHere {
  readonly ground: GroundClassId;
  readonly bearingLevelM: number;
  readonly odds: number;
}

/**
 * The ground stretch under a chainage with the classes it may turn out to be.
 * Throws a RangeError when the site has no ground stretch: reading the study gives every crossing at least a preset one.
 */
export function groundUnder(
  site: Site,
  chainageM: number,
): { readonly stretch: number; readonly classes: readonly GroundHere[] } {
  const stretch = stretchAt(site, chainageM);
  const found = site.groundStretches[stretch];
  if (found === undefined) {
    throw new RangeError(
      `ground at chainage ${chainageM} m: expected at least one ground stretch, received none; give a stretch or mark the ground unknown`,
    );
  }
  const groundM = groundAt(site, chainageM);
  const classes = found.classes.map((one) => ({
    ground: one.ground,
    bearingLevelM: bearingLevel(one, groundM),
    odds: one.odds,
  }));
  return { stretch, classes };
}
