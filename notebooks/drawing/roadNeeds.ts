import type { AppraisedOption, Site } from '../model.ts';
import { constructionDepth, siteOf } from '../model.ts';
import { depthAt, lowestSoffit, placedUnits, roadLevel } from './alongOption.ts';

/** What one soffit limit asks of the road over an option. */
export interface RoadNeed {
  /** Which of the limits of the site. */
  readonly limit: number;
  readonly fromM: number;
  readonly toM: number;
  /** Chainages and the road levels needed there for the depth of the option, m; straight in between. */
  readonly points: readonly (readonly [chainageM: number, levelM: number])[];
  /** Least height of the lowest soffit over the limit, m, negative where it is missed, and where that is. */
  readonly spareM: number;
  readonly atM: number;
}

/** Road levels that headrooms and floods need for the depth an option has, within the crossing. */
export function roadNeeds(site: Site, option: AppraisedOption): RoadNeed[] {
  const bends = placedUnits(option).flatMap(({ design, fromM }) =>
    design.depthAlong.xM.map((x) => fromM + x),
  );
  const { startM, endM } = siteOf(site, option.units);
  return site.soffitLimits.flatMap((limit, index) => {
    const fromM = Math.max(limit.fromM, startM);
    const toM = Math.min(limit.toM, endM);
    if (!(fromM < toM)) return [];
    const places = [fromM, ...bends.filter((x) => x > fromM && x < toM), toM].sort((a, b) => a - b);
    const spares = places.map((at) => lowestSoffit(site, option, at) - limit.levelM);
    const spareM = Math.min(...spares);
    return {
      limit: index,
      fromM,
      toM,
      points: places.map(
        (at) => [at, limit.levelM + constructionDepth(site.deck, depthAt(option, at))] as const,
      ),
      spareM,
      atM: places[spares.indexOf(spareM)] ?? NaN,
    };
  });
}

/** A stretch of the road on the bridge: straight, or a curve of a radius. */
export interface RoadStretch {
  /** Which of the pieces of the profile. */
  readonly piece: number;
  readonly fromM: number;
  readonly toM: number;
  readonly fromLevelM: number;
  readonly toLevelM: number;
  /** Gradients at its ends, rising with the chainage. */
  readonly fromGradient: number;
  readonly toGradient: number;
  /** Radius, m, negative over a crest; null on a straight. */
  readonly radiusM: number | null;
}

/** The stretches of the road within a window, cut at its ends. */
export function roadStretches(
  option: AppraisedOption,
  window: { readonly fromM: number; readonly toM: number },
): RoadStretch[] {
  return option.profile.pieces.flatMap(({ fromM, toM, gradient, curvature1PerM }, piece) => {
    const from = Math.max(fromM, window.fromM);
    const to = Math.min(toM, window.toM);
    if (!(to - from > 0.05)) return [];
    return {
      piece,
      fromM: from,
      toM: to,
      fromLevelM: roadLevel(option, from),
      toLevelM: roadLevel(option, to),
      fromGradient: gradient + curvature1PerM * (from - fromM),
      toGradient: gradient + curvature1PerM * (to - fromM),
      radiusM: curvature1PerM === 0 ? null : 1 / curvature1PerM,
    };
  });
}
