import type { Site, Unit } from '../model/index.ts';
import { widestBarred } from './widestBarred.ts';

/** Chainages of the ends of the crossing, m: the abutments themselves unless an option has them farther in. */
export const roadEndsOf = ({ roadEnds, startM, endM }: Site): NonNullable<Site['roadEnds']> =>
  roadEnds ?? { startM, endM };

/** Places closer than this are the same, m. */
const SAME_M = 1e-6;

const known = new WeakMap<Site, Map<string, Site>>();

/**
 * The site as an option meets it whose abutments stand at these chainages, m, inside the crossing: what lies between them
 * is bridged, and the road in front of and behind them stays that of the whole crossing. The site itself where they stand
 * at its ends. The same places of one site give the same object.
 */
export function standBetween(site: Site, startM: number, endM: number): Site {
  const ends = roadEndsOf(site);
  if (Math.abs(startM - ends.startM) < SAME_M && Math.abs(endM - ends.endM) < SAME_M && !site.roadEnds)
    return site;
  const stood = known.get(site) ?? new Map<string, Site>();
  known.set(site, stood);
  const key = `${startM} ${endM}`;
  const before = stood.get(key);
  if (before) return before;
  const between: Site = {
    ...site,
    startM,
    endM,
    lengthM: endM - startM,
    roadEnds: ends,
    mainOpening: widestBarred(site.zones, startM, endM),
  };
  stood.set(key, between);
  return between;
}

/** The site as a row of units meets it: between its first and its last support. Supports of a crossing without windows stand at its ends. */
export const siteOf = (site: Site, units: readonly Unit[]): Site =>
  site.windows === undefined
    ? site
    : standBetween(site, units[0]!.supportsM[0]!, units.at(-1)!.supportsM.at(-1)!);

/** How far in from its end of the crossing each abutment may stand, chainages, m. */
export interface AbutmentWindows {
  readonly start: readonly [fromM: number, toM: number];
  readonly end: readonly [fromM: number, toM: number];
}

/**
 * Where the abutments may stand: from the ends of the crossing inward as far as the brief says, and no farther than keeps
 * them, with half a pier's room, out of every stretch that something lies in: barred or soft ones, those with a headroom,
 * and water at its ordinary level. What has to pass is never buried in the fill behind an abutment; a flood plain may be.
 */
export function abutmentWindows(site: Site, roomM: number): AbutmentWindows {
  const { startM, endM } = roadEndsOf(site);
  const { startLatestM, endEarliestM } = site.windows ?? { startLatestM: startM, endEarliestM: endM };
  const kept = [
    ...site.zones,
    ...site.soffitLimits.filter(({ kind }) => kind !== 'flood'),
    ...site.waters,
  ].filter(({ fromM, toM }) => toM > startM && fromM < endM);
  const first = Math.min(...kept.map(({ fromM }) => fromM)) - roomM;
  const last = Math.max(...kept.map(({ toM }) => toM)) + roomM;
  return {
    start: [startM, Math.max(startM, Math.min(startLatestM, first))],
    end: [Math.min(endM, Math.max(endEarliestM, last)), endM],
  };
}
