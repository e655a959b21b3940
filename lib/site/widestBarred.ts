import type { Site, Zone } from '../model/index.ts';

/** Widest stretch inside the crossing that no support may stand in, overlapping hard zones taken together. */
export function widestBarred(zones: readonly Zone[], startM: number, endM: number): Site['mainOpening'] {
  const hard = zones
    .filter((zone) => zone.hard && zone.toM > startM && zone.fromM < endM)
    .map((zone) => ({ fromM: Math.max(zone.fromM, startM), toM: Math.min(zone.toM, endM) }))
    .sort((a, b) => a.fromM - b.fromM);
  const joined: { fromM: number; toM: number }[] = [];
  for (const zone of hard) {
    const last = joined.at(-1);
    if (last !== undefined && zone.fromM <= last.toM) last.toM = Math.max(last.toM, zone.toM);
    else joined.push({ ...zone });
  }
  let widest: Site['mainOpening'] = null;
  for (const { fromM, toM } of joined) {
    const widthM = toM - fromM;
    if (widest === null || widthM > widest.widthM + 1e-9) widest = { fromM, toM, widthM };
  }
  return widest;
}
