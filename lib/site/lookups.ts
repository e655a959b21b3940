import type { GroundOdds, GroundStretch, Site, SoffitLimit, Zone } from '../model/index.ts';

/** Places closer than this are the same, m. */
const SAME_M = 1e-6;

/** Ground or bed level at a chainage, m: straight between the surveyed points, level beyond the first and last. */
export function groundAt({ groundX, groundZ }: Pick<Site, 'groundX' | 'groundZ'>, chainageM: number): number {
  const n = groundX.length;
  if (chainageM <= groundX[0]!) return groundZ[0]!;
  if (chainageM >= groundX[n - 1]!) return groundZ[n - 1]!;
  let low = 0;
  let high = n - 1;
  while (high - low > 1) {
    const middle = (low + high) >> 1;
    if (groundX[middle]! <= chainageM) low = middle;
    else high = middle;
  }
  const share = (chainageM - groundX[low]!) / (groundX[high]! - groundX[low]!);
  return groundZ[low]! + share * (groundZ[high]! - groundZ[low]!);
}

/** Depth of water at ordinary level at a chainage, m; 0 on land. */
export function waterDepthAt(site: Site, chainageM: number): number {
  let depth = 0;
  for (const water of site.waters) {
    if (chainageM >= water.fromM && chainageM <= water.toM) {
      depth = Math.max(depth, water.levelM - groundAt(site, chainageM));
    }
  }
  return depth;
}

/** Level of the bearing stratum of a class where the ground lies at a level, m. */
export const bearingLevel = (
  { bearingLevelM, bearingDepthM }: Pick<GroundOdds, 'bearingLevelM' | 'bearingDepthM'>,
  groundLevelM: number,
): number => (bearingDepthM === undefined ? bearingLevelM! : groundLevelM - bearingDepthM);

/** Mean level of the bearing stratum of a stretch by its odds, m, where the ground lies at a level, m. */
const meanBearingLevel = ({ classes }: GroundStretch, groundLevelM: number): number =>
  classes.reduce((sum, one) => sum + one.odds * bearingLevel(one, groundLevelM), 0);

/**
 * Index of the ground stretch a chainage lies in, or of the nearest one; -1 when the site has none. On the boundary of two
 * it is the one with the deeper ground, whichever way the crossing is read.
 */
export function stretchAt(site: Site, chainageM: number): number {
  let nearest = -1;
  let least = Infinity;
  site.groundStretches.forEach((stretch, index) => {
    const away = Math.max(stretch.fromM - chainageM, chainageM - stretch.toM, 0);
    const before = site.groundStretches[nearest];
    const same = before !== undefined && Math.abs(away - least) <= SAME_M;
    const levelM = same ? groundAt(site, chainageM) : 0;
    if (same ? meanBearingLevel(stretch, levelM) < meanBearingLevel(before, levelM) : away < least) {
      least = away;
      nearest = index;
    }
  });
  return nearest;
}

/** The soft stretches in which a chainage lies; its ends are outside. */
export function softZonesAt(site: Pick<Site, 'zones'>, chainageM: number): readonly Zone[] {
  return site.zones.filter(
    ({ hard, fromM, toM }) => !hard && chainageM > fromM + SAME_M && chainageM < toM - SAME_M,
  );
}

/** The highest of the lowest-soffit limits at a chainage, or null where nothing has to be kept clear. */
export function soffitLimitAt(site: Site, chainageM: number): SoffitLimit | null {
  let governing: SoffitLimit | null = null;
  for (const limit of site.soffitLimits) {
    if (chainageM < limit.fromM || chainageM > limit.toM) continue;
    if (governing === null || limit.levelM > governing.levelM) governing = limit;
  }
  return governing;
}
