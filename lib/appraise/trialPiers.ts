import { remembered } from '../kept.ts';
import type { MeasuredLine, RoadProfile, Site, Support } from '../model/index.ts';
import { programmeData, supportWeeks } from '../programme/index.ts';
import { constructionDepth, groundAt, roadLevelAt, stretchAt } from '../site/index.ts';
import { expectedLines, placeText, settingAt, standPierBetween } from '../substructure/index.ts';
import type { Memory } from './memory.ts';
import { ORDINARY_DEPTH_M } from './meanClearance.ts';
import { profileOrNearest } from './profileOrNearest.ts';
import type { RowMakers } from './trialRows.ts';

/**
 * Loads, kN, at which a trial pier is really sized at each chainage, permanent and traffic together; in between its cost is
 * read off straight lines. A pier feels the form it carries through its load.
 */
export const PIER_LOADS_KN = [1500, 4000, 8000, 14000, 24000, 45000, 90000] as const;
/** Of that load, what is permanent: ordinary road decks. */
export const PIER_PERMANENT = 0.7;
/** Span over which the trial load is spread, m: gives wind and friction their size. */
const PIER_SPAN_M = 40;

/** Trial piers stand this share of the crossing apart, and never closer or farther than these, m. */
const KNOTS = 60;
const KNOT_M = [2, 20] as const;
/** Ground this near to the straight line between two trial piers is as good as on it, m. */
const STRAIGHT_M = 0.3;

/** Everything but levels that a pier meets: two places alike in this differ by their ground and water depth alone. */
function likeness(site: Site, chainageM: number): string {
  const { waterDepthM, waterLevelM, floodDepthM, impact, soft } = settingAt(site, chainageM);
  return [
    stretchAt(site, chainageM),
    waterDepthM > 0,
    waterLevelM,
    floodDepthM > 0,
    impact?.forceKN,
    impact?.heightM,
    ...soft.map(({ name, fromM }) => `${name} ${fromM}`),
  ].join();
}

/**
 * What a pier adds to the time on site: the deck begins when so much of the supports stands. Of the methods that wait for the
 * least of them, as steel in the shop may take as long.
 */
function monthsOf(pier: Support): MeasuredLine {
  const { crews, methods, weeksPerMonth } = programmeData;
  const share = Math.min(...Object.values(methods).map(({ startsAfter }) => startsAfter));
  const quantity = (share * supportWeeks(pier, [], 'likely')) / crews / weeksPerMonth;
  return { part: 'preliminaries', item: 'site-month', quantity, what: 'months on site', how: 'trial pier' };
}

/** Cost of a pier, money, at a chainage, m, under one of `PIER_LOADS_KN` by its index. */
export type PierCost = (chainageM: number, load: number) => number;

/**
 * Costs of piers along a crossing at mean rates with the odds of the ground. A pier is really sized at even distances, and
 * wherever ground, water or traffic nearby change between two of those; in between cost is read off straight lines.
 */
export function trialPiers(
  { site, costOf }: Pick<RowMakers, 'site' | 'costOf'>,
  piers: Memory['piers'],
): PierCost {
  const { startM, lengthM } = site;
  // Piers reach up to the road that clears what it crosses, not to the one proposed.
  let road: RoadProfile | undefined;
  const roadLevel = (chainageM: number): number =>
    roadLevelAt((road ??= profileOrNearest(site, constructionDepth(site.deck, ORDINARY_DEPTH_M))), chainageM);
  const sized = (chainageM: number, load: number): MeasuredLine[] => {
    const perM = PIER_LOADS_KN[load]! / PIER_SPAN_M;
    const deck = {
      permanentKNm: PIER_PERMANENT * perM,
      trafficKNm: (1 - PIER_PERMANENT) * perM,
      depthM: ORDINARY_DEPTH_M,
    };
    const pier = standPierBetween(site, deck, chainageM, PIER_SPAN_M, PIER_SPAN_M, roadLevel(chainageM));
    return [...expectedLines(pier), monthsOf(pier)];
  };
  const exact = (chainageM: number, load: number): number => {
    const place = `${placeText(site, chainageM)} ${roadLevel(chainageM)}`;
    const lines = remembered(piers, place, () => []);
    return costOf((lines[load] ??= sized(chainageM, load)));
  };

  const count = Math.max(
    1,
    Math.ceil(lengthM / Math.min(KNOT_M[1], Math.max(KNOT_M[0], lengthM / KNOTS)) - 1e-9),
  );
  const knotAt = (k: number): number => startM + (k * lengthM) / count;
  const likes: (string | undefined)[] = [];
  const likeAt = (k: number): string => (likes[k] ??= likeness(site, knotAt(k)));
  /** The interval of trial piers a place may be read off, or -1 where it has to be sized itself. */
  const intervalOf = (chainageM: number): number => {
    const k = Math.min(count - 1, Math.max(0, Math.floor(((chainageM - startM) * count) / lengthM)));
    const [from, to] = [knotAt(k), knotAt(k + 1)];
    const share = (chainageM - from) / (to - from);
    if (!(share >= 0 && share <= 1)) return -1;
    const straight = (1 - share) * groundAt(site, from) + share * groundAt(site, to);
    if (Math.abs(groundAt(site, chainageM) - straight) > STRAIGHT_M) return -1;
    return likeAt(k) === likeAt(k + 1) && likeAt(k) === likeness(site, chainageM) ? k : -1;
  };

  const costs = new Map<number, Float64Array>();
  const intervals = new Map<number, number>();
  // Asked twice in turn of one place, for the loads on both sides of a load.
  let last: { readonly chainageM: number; readonly byLoad: Float64Array } = {
    chainageM: NaN,
    byLoad: new Float64Array(),
  };
  const byLoadAt = (chainageM: number): Float64Array => {
    if (chainageM === last.chainageM) return last.byLoad;
    let byLoad = costs.get(chainageM);
    if (!byLoad) costs.set(chainageM, (byLoad = new Float64Array(PIER_LOADS_KN.length).fill(NaN)));
    last = { chainageM, byLoad };
    return byLoad;
  };
  const known = (chainageM: number, load: number, make: PierCost): number => {
    const byLoad = byLoadAt(chainageM);
    if (Number.isNaN(byLoad[load]!)) byLoad[load] = make(chainageM, load);
    return byLoad[load]!;
  };
  const read: PierCost = (chainageM, load) => {
    let k = intervals.get(chainageM);
    if (k === undefined) intervals.set(chainageM, (k = intervalOf(chainageM)));
    if (k < 0) return exact(chainageM, load);
    const [from, to] = [knotAt(k), knotAt(k + 1)];
    if (chainageM === from || chainageM === to) return exact(chainageM, load);
    const [low, high] = [known(from, load, exact), known(to, load, exact)];
    return low + ((high - low) * (chainageM - from)) / (to - from);
  };
  return (chainageM, load) => known(chainageM, load, read);
}
