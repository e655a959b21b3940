import type { RoadProfile, Site } from '../model/index.ts';

/** Finished road level at a chainage, m: straight between the abutments. */
export function roadLevelAt(
  site: Pick<Site, 'startM' | 'lengthM'>,
  profile: RoadProfile,
  chainageM: number,
): number {
  const share = (chainageM - site.startM) / site.lengthM;
  return profile.startLevelM + share * (profile.endLevelM - profile.startLevelM);
}
