import { methodNames, type Design, type MeasuredLine, type Site, type Support } from '../model/index.ts';
import { girderLines } from './girderLines.ts';
import { methodData } from './methodData.ts';

/** Main members side by side of forms that do not count them: two trusses, two planes of stays. */
const USUAL_LINES = 2;

interface Stretch {
  readonly name: string;
  readonly fromM: number;
  readonly toM: number;
}

/**
 * Railway possessions with protection: for each railway under the crossing a fixed number by the method of the unit above it
 * and a share for each piece to be set over it (pieces of the longest length brought to site, on every girder line).
 * A simple rule, common practice, no source; the railway decides.
 */
export function possessionLines(
  site: Site,
  designs: readonly Design[],
  supports: readonly Support[],
): MeasuredLine[] {
  return railways(site).flatMap((rail): MeasuredLine[] => {
    const middle = (rail.fromM + rail.toM) / 2;
    const design = designOver(designs, supports, middle);
    if (design === undefined) return [];
    const { base, perPiece } = methodData.methods[design.task.method].possessions;
    const pieces = piecesOver(design, rail.toM - rail.fromM + 2 * methodData.railMarginM);
    return [
      {
        part: 'traffic-management',
        item: 'rail-possession',
        quantity: Math.ceil(base + perPiece * pieces),
        what: `possessions of ${rail.name}`,
        how: `${base} for ${methodNames[design.task.method]}, ${pieces} pieces over the track`,
      },
    ];
  });
}

/** Railways under the crossing, from barred stretches and clearances; the two of one railway are taken together. */
function railways(site: Site): Stretch[] {
  const found = new Map<string, Stretch>();
  const add = (name: string, fromM: number, toM: number): void => {
    if (toM < site.startM || fromM > site.endM) return;
    const before = found.get(name);
    found.set(name, {
      name,
      fromM: Math.min(fromM, before?.fromM ?? fromM),
      toM: Math.max(toM, before?.toM ?? toM),
    });
  };
  for (const zone of site.zones) if (zone.kind === 'railway') add(zone.name, zone.fromM, zone.toM);
  for (const limit of site.soffitLimits)
    if (limit.kind === 'railway') add(limit.reason, limit.fromM, limit.toM);
  return [...found.values()];
}

function designOver(
  designs: readonly Design[],
  supports: readonly Support[],
  chainageM: number,
): Design | undefined {
  let first = 0;
  for (const design of designs) {
    const last = first + design.task.spansM.length;
    const to = supports[last]?.chainageM;
    if (to !== undefined && chainageM <= to) return design;
    first = last;
  }
  return undefined;
}

function piecesOver(design: Design, lengthM: number): number {
  const piece = design.heaviestPiece?.lengthM;
  if (piece === undefined || !(piece > 0)) return 0;
  const lines = girderLines(design)?.count ?? USUAL_LINES;
  return lines * Math.ceil(lengthM / piece);
}
