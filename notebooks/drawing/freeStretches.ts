import type { Site } from '../model.ts';
import { PIER_HALF_WIDTH_M } from '../model.ts';

/** A stretch of chainage, m. */
export interface Stretch {
  readonly fromM: number;
  readonly toM: number;
}

/** Stretches barred to supports, with half a pier and its working space on either side, in order; touching ones as one. */
function barredToPiers(site: Site): (Stretch & { readonly name: string })[] {
  const hard = site.zones
    .filter((zone) => zone.hard)
    .map(({ fromM, toM, name }) => ({
      fromM: fromM - PIER_HALF_WIDTH_M,
      toM: toM + PIER_HALF_WIDTH_M,
      name,
    }));
  return hard.sort((a, b) => a.fromM - b.fromM);
}

/** What of a stretch is free for a pier. */
export function freeStretches(site: Site, { fromM, toM }: Stretch): Stretch[] {
  const free: Stretch[] = [];
  let at = fromM;
  for (const barred of barredToPiers(site)) {
    if (barred.fromM > at) free.push({ fromM: at, toM: Math.min(barred.fromM, toM) });
    at = Math.max(at, barred.toM);
    if (at >= toM) return free.filter((one) => one.toM > one.fromM);
  }
  free.push({ fromM: at, toM });
  return free.filter((one) => one.toM > one.fromM);
}

/** The barred stretch that a pier at a chainage would stand in; undefined where it may stand. */
export const barredAt = (site: Site, chainageM: number): { readonly name: string } | undefined =>
  barredToPiers(site).find(({ fromM, toM }) => chainageM > fromM + 0.02 && chainageM < toM - 0.02);
