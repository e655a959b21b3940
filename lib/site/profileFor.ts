import type { RoadProfile, Site, SoffitLimit } from '../model/index.ts';
import { addedFill } from './addedFill.ts';
import { depthAt, type DepthAlong } from './depthAlong.ts';
import { groundAt } from './lookups.ts';
import { lowestLine, type Demand, type Rises } from './lowestLine.ts';

/** Why no road line fits, and the smallest ways out. */
export interface ProfileRefusal {
  readonly kind: 'clearance' | 'gradient';
  /** The soffit limit that is missed; null when it is the gradient. */
  readonly limit: SoffitLimit | null;
  /** Chainage at which it is missed most, m; null when it is the gradient. */
  readonly chainageM: number | null;
  /** By how much: metres of headroom or depth; for a gradient its excess as a ratio. */
  readonly missedBy: number;
  /** Rise of the free ends, m, with which a line would fit; null when no rise helps. */
  readonly riseNeededM: number | null;
}

export type ProfileResult =
  | { readonly ok: true; readonly profile: RoadProfile }
  | { readonly ok: false; readonly refusal: ProfileRefusal };

interface Clear {
  readonly limit: SoffitLimit;
  readonly chainageM: number;
  /** Road level needed there, m. */
  readonly levelM: number;
}

/** Road levels needed: at both ends of every limit and wherever the depth bends under it. */
function needs(site: Site, depth: number | DepthAlong): Clear[] {
  return site.soffitLimits.flatMap((limit) => {
    const from = Math.max(limit.fromM, site.startM);
    const to = Math.min(limit.toM, site.endM);
    if (!(from <= to)) return [];
    const bends = typeof depth === 'number' ? [] : depth.xM.filter((x) => x > from && x < to);
    return [from, to, ...bends].map((chainageM) => ({
      limit,
      chainageM,
      levelM: limit.levelM + depthAt(depth, chainageM),
    }));
  });
}

/** Every demand on the two rises, with clearances eased by `easedM` and free ends allowed to rise by `riseM`. */
function demandsOn(site: Site, clears: readonly Clear[], riseM: number, easedM: number): Demand[] {
  const { road, lengthM, startM } = site;
  const free = (end: 'start' | 'end'): number =>
    road.fixedEnd === end || road.fixedEnd === 'both' ? 0 : riseM;
  const fall = road.endLevelM - road.startLevelM;
  const most = road.maxGradient * lengthM;
  return [
    { atStart: 1, atEnd: 0, least: 0 },
    { atStart: 0, atEnd: 1, least: 0 },
    { atStart: -1, atEnd: 0, least: -free('start') },
    { atStart: 0, atEnd: -1, least: -free('end') },
    { atStart: 1, atEnd: -1, least: fall - most },
    { atStart: -1, atEnd: 1, least: -fall - most },
    ...clears.map(({ chainageM, levelM }) => {
      const share = (chainageM - startM) / lengthM;
      return { atStart: 1 - share, atEnd: share, least: levelM - easedM - road.startLevelM - share * fall };
    }),
  ];
}

/** Smallest value in (0, most] for which `fits` holds, to 0.1 mm; null when even the largest does not. */
function smallest(most: number, fits: (value: number) => boolean): number | null {
  if (!fits(most)) return null;
  let low = 0;
  let high = most;
  while (high - low > 1e-4) {
    const middle = (low + high) / 2;
    if (fits(middle)) high = middle;
    else low = middle;
  }
  return high;
}

function gradientRefusal(site: Site): ProfileRefusal {
  const { road, lengthM } = site;
  const gradient = Math.abs(road.endLevelM - road.startLevelM) / lengthM;
  const riseNeededM = smallest(
    gradient * lengthM,
    (rise) => lowestLine(demandsOn(site, [], rise, 0)) !== null,
  );
  return {
    kind: 'gradient',
    limit: null,
    chainageM: null,
    missedBy: gradient - road.maxGradient,
    riseNeededM,
  };
}

function refusal(site: Site, clears: readonly Clear[]): ProfileRefusal {
  const rise = site.road.mayRiseM;
  if (lowestLine(demandsOn(site, [], rise, 0)) === null) return gradientRefusal(site);
  const height = Math.max(
    ...clears.map((clear) => clear.levelM - Math.min(site.road.startLevelM, site.road.endLevelM)),
  );
  const missedBy = smallest(
    height + 1,
    (eased) => lowestLine(demandsOn(site, clears, rise, eased)) !== null,
  )!;
  const line = lowestLine(demandsOn(site, clears, rise, missedBy))!;
  const spare = (clear: Clear): number => levelAt(site, line, clear.chainageM) - clear.levelM;
  const tightest = clears.reduce((worst, clear) => (spare(clear) < spare(worst) ? clear : worst));
  const riseNeededM = smallest(
    rise + 10 * (height + 1),
    (r) => lowestLine(demandsOn(site, clears, r, 0)) !== null,
  );
  return { kind: 'clearance', limit: tightest.limit, chainageM: tightest.chainageM, missedBy, riseNeededM };
}

function levelAt(site: Site, rises: Rises, chainageM: number): number {
  const { road, startM, lengthM } = site;
  const share = (chainageM - startM) / lengthM;
  return (1 - share) * (road.startLevelM + rises.start) + share * (road.endLevelM + rises.end);
}

function fillAt(site: Site, chainageM: number, proposedM: number, riseM: number): number {
  const { road, deck } = site;
  const height = proposedM - groundAt(site, chainageM);
  return addedFill(deck.widthM, height, height + riseM, road.fillSideSlope, road.maxGradient);
}

/**
 * The lowest straight road line between the abutments whose soffit clears every limit.
 *
 * `depth` is the construction depth, m > 0 (soffit to road surface), constant or along the crossing. A fixed end is a
 * pivot; a free end may rise by `road.mayRiseM` and never falls below its proposed level; the gradient stays within
 * `road.maxGradient`. Fill behind each abutment is added by `addedFill`, the formation as wide as the deck. When no
 * line fits, the refusal names the limit, by how much it is missed (the smallest relaxation of headroom or depth) and
 * the rise that would do. Throws RangeError on a depth that is not a positive number.
 */
export function profileFor(site: Site, depth: number | DepthAlong): ProfileResult {
  const depths = typeof depth === 'number' ? [depth] : depth.depthM;
  if (!depths.every((d) => d > 0)) throw new RangeError('construction depth: expected more than 0 m');
  const clears = needs(site, depth);
  const rises = lowestLine(demandsOn(site, clears, site.road.mayRiseM, 0));
  if (rises === null) return { ok: false, refusal: refusal(site, clears) };
  const { road } = site;
  const startRiseM = Math.max(rises.start, 0);
  const endRiseM = Math.max(rises.end, 0);
  const startLevelM = road.startLevelM + startRiseM;
  const endLevelM = road.endLevelM + endRiseM;
  return {
    ok: true,
    profile: {
      startLevelM,
      endLevelM,
      startRiseM,
      endRiseM,
      addedFillM3:
        fillAt(site, site.startM, road.startLevelM, startRiseM) +
        fillAt(site, site.endM, road.endLevelM, endRiseM),
      gradient: (endLevelM - startLevelM) / site.lengthM,
    },
  };
}
