import type { RoadProfile, Site, SoffitLimit } from '../model/index.ts';
import { addedFill } from './addedFill.ts';
import {
  approachEnds,
  approachFrom,
  isFixed,
  outwardFall,
  proposedGradient,
  type RoadEnd,
} from './approachEnd.ts';
import { crestLevelAt, type Crest } from './crest.ts';
import type { DepthAlong } from './depthAlong.ts';
import { groundAt } from './lookups.ts';
import { hasRoad, lowestEnds, type Layout } from './lowestEnds.ts';
import { decidingNeeds, needsOf, type Need } from './needs.ts';
import { profileOn, roadLength } from './profileOn.ts';
import { roadEndsOf } from './standBetween.ts';

/** Why no road line fits, and the smallest ways out. */
export interface ProfileRefusal {
  readonly kind: 'clearance' | 'gradient';
  /** The soffit limit that is missed; null when it is the gradient. */
  readonly limit: SoffitLimit | null;
  /** Chainage at which it is missed most, m; null when it is the gradient. */
  readonly chainageM: number | null;
  /** By how much: metres of headroom or depth; for a gradient its excess as a ratio. */
  readonly missedBy: number;
  /** Rise of the free ends, m, with which a line would fit; null when no rise helps. Looked for when it is read. */
  readonly riseNeededM: number | null;
}

export type ProfileResult =
  | { readonly ok: true; readonly profile: RoadProfile }
  | { readonly ok: false; readonly refusal: ProfileRefusal };

/** What the road between the abutments is laid out by when free ends may rise by so much, m. */
function layoutOf(site: Site, riseM: number): Layout {
  const { road, roadCurves, deck } = site;
  const { startM, endM } = roadEndsOf(site);
  const { startLevelM, endLevelM, maxGradient } = road;
  const most = (end: RoadEnd): number => road[`${end}LevelM`] + (isFixed(site, end) ? 0 : riseM);
  const ends = approachEnds(site);
  const bound = (end: RoadEnd): ((crest: Crest) => boolean) | undefined => {
    const approach = ends[end];
    if (isFixed(site, end) || (approach.tieInM === null && approach.reachM === Infinity)) return undefined;
    return (crest) =>
      approachFrom(
        approach,
        end === 'start' ? crest.levelM : crest.endLevelM,
        outwardFall(end, end === 'start' ? crest.before : crest.after),
      ).fits;
  };
  const startFits = bound('start');
  const endFits = bound('end');
  const slope = road.approachSides === 'walls' ? 0 : road.fillSideSlope;
  const fill = (end: RoadEnd, levelM: number): number => {
    const height = levelM - groundAt(site, end === 'start' ? startM : endM);
    // Where no fill is moved the lower road is still the better one.
    return addedFill(deck.widthM, 0, height, slope, maxGradient) + deck.widthM * levelM;
  };
  return {
    startM,
    endM,
    leastStartM: startLevelM,
    leastEndM: endLevelM,
    mostStartM: most('start'),
    mostEndM: most('end'),
    radiusM: roadCurves.crestRadiusM,
    // Less by a hair, so that rounding never leaves the road steeper.
    gradient: maxGradient * (1 - 1e-12),
    costOf: (start, end) => fill('start', start) + fill('end', end),
    ...(startFits ? { startFits } : {}),
    ...(endFits ? { endFits } : {}),
  };
}

/** Those needs that decide once every one is eased by so much, m. */
function decidingWhen(site: Site, needs: readonly Need[], easedM: number): Need[] {
  const eased = easedM === 0 ? needs : needs.map((need) => ({ ...need, levelM: need.levelM - easedM }));
  return decidingNeeds(site, eased, site.road.startLevelM, site.road.endLevelM);
}

/** The lowest road between the abutments when free ends may rise by so much and every need is eased by so much, m. */
const crestFor = (site: Site, needs: readonly Need[], riseM: number, easedM: number): Crest | null =>
  lowestEnds(layoutOf(site, riseM), decidingWhen(site, needs, easedM));

/** Whether there is one. */
const fitsWith = (site: Site, needs: readonly Need[], riseM: number, easedM: number): boolean =>
  hasRoad(layoutOf(site, riseM), decidingWhen(site, needs, easedM));

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
  const gradient = Math.abs(proposedGradient(site));
  return {
    kind: 'gradient',
    limit: null,
    chainageM: null,
    missedBy: gradient - site.road.maxGradient,
    get riseNeededM() {
      return smallest(gradient * roadLength(site), (rise) => fitsWith(site, [], rise, 0));
    },
  };
}

function refusal(site: Site, needs: readonly Need[]): ProfileRefusal {
  const rise = site.road.mayRiseM;
  if (!fitsWith(site, [], rise, 0)) return gradientRefusal(site);
  const lowest = Math.min(site.road.startLevelM, site.road.endLevelM);
  const height = Math.max(...needs.map(({ levelM }) => levelM - lowest));
  const missedBy = smallest(height + 1, (eased) => fitsWith(site, needs, rise, eased))!;
  const crest = crestFor(site, needs, rise, missedBy)!;
  const spare = (need: Need): number => crestLevelAt(crest, need.chainageM) - need.levelM;
  const tightest = needs.reduce((worst, need) => (spare(need) < spare(worst) ? need : worst));
  return {
    kind: 'clearance',
    limit: tightest.limit,
    chainageM: tightest.chainageM,
    missedBy,
    get riseNeededM() {
      return smallest(rise + 10 * (height + 1), (r) => fitsWith(site, needs, r, 0));
    },
  };
}

/**
 * The lowest road whose soffit clears every limit, for a construction depth, m > 0 (soffit to road surface), constant or
 * along the crossing.
 *
 * Between the abutments it runs straight or over one crest and nowhere sags; its ends stay at their proposed levels where
 * the sharpest crest allowed is enough, and else rise as far as they must, shared so that the fill at the limiting
 * gradient over level ground is least. Between such ends the crest is as flat as the limits allow. A fixed end keeps its
 * level; a free one may rise by `road.mayRiseM`, never falls below its proposed level and takes its approach along:
 * tangent at the abutment, over a crest to the limiting gradient and through a sag to the ground, or at one gradient to a
 * tie-in that stays. Behind a fixed end whose road has a known gradient the existing road is regraded. Gradients stay within `road.maxGradient` and curves within `roadCurves` everywhere.
 *
 * When no line fits, the refusal names the limit, by how much it is missed (the smallest relaxation of headroom or depth)
 * and the rise that would do. Throws RangeError on a depth that is not a positive number.
 */
export function profileFor(site: Site, depth: number | DepthAlong): ProfileResult {
  const depths = typeof depth === 'number' ? [depth] : depth.depthM;
  if (!depths.every((d) => d > 0)) throw new RangeError('construction depth: expected more than 0 m');
  const needs = needsOf(site, depth);
  const crest = crestFor(site, needs, site.road.mayRiseM, 0);
  return crest === null
    ? { ok: false, refusal: refusal(site, needs) }
    : { ok: true, profile: profileOn(site, crest) };
}
