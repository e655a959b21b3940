import type { CostTable, Site } from '../model/index.ts';
import { kindOf, type Candidate } from './candidate.ts';
import { continuousCandidates } from './continuous.ts';
import { counter, type Counter } from './counter.ts';
import { SAME_M, barredOf, frameOf, type Barred, type Frame } from './frame.ts';
import { mainUnitCandidates } from './mainUnits.ts';
import { polish } from './polish.ts';
import { flatTable, relaxationsOf, type Fits } from './relaxations.ts';
import { KEPT, type ArrangeRequest, type ArrangeResult } from './request.ts';
import { select } from './select.ts';

function candidatesOf(
  request: ArrangeRequest,
  frame: Frame,
  table: CostTable,
  dropped: Counter,
  enough = Infinity,
): Candidate[] {
  return request.pattern.kind === 'continuous'
    ? continuousCandidates(request, frame, table, dropped, enough)
    : mainUnitCandidates(request, frame, table, dropped, enough);
}

function frameFor(request: ArrangeRequest, site: Site, table: CostTable): Frame {
  return frameOf(site, request.pierHalfWidthM, request.form, table, request.windows.minSpanM);
}

/** Whether the longest span allowed reaches over every barred stretch: where it does not, nothing needs to be searched. */
function reachesOver(
  { windows, approach }: ArrangeRequest,
  barred: readonly Barred[],
  lengthM: number,
): boolean {
  const longestM = Math.max(windows.maxSpanM, approach?.maxSpanM ?? 0) + SAME_M;
  return barred.every(({ fromM, toM }) => Math.min(toM, lengthM) - Math.max(fromM, 0) <= longestM);
}

/** Whether anything fits, where cost plays no part: the places on a site are then the same for all windows, and kept. */
function fitter(): Fits {
  const frames = new Map<Site, Frame>();
  return (request, site) => {
    const known = frames.get(site);
    const barred = known?.barred ?? barredOf(site, request.pierHalfWidthM);
    if (!reachesOver(request, barred, site.lengthM)) return false;
    const frame = known ?? frameFor(request, site, flatTable);
    frames.set(site, frame);
    return candidatesOf(request, frame, flatTable, counter(), 1).length > 0;
  };
}

/** Whether anything of a request fits a site, whatever it costs. */
export const fits: Fits = (request, site) => fitter()(request, site);

/**
 * The best different arrangements of one form on one site by the cost table: the cheapest for each number of supports
 * (and of pylons), at most `keep` of them, cheapest first. Supports stand on a grid of 1 m and on the edges of zones,
 * never in a hard zone widened by half a pier. Nothing is priced here: the table is all that is known of cost. A
 * mirrored site with a mirrored table gives the mirrored arrangements. When nothing fits, the list is empty and
 * `relaxations` says what to give way on, smallest first.
 * Throws RangeError on reversed windows and on a pattern with approaches when the approach windows are missing.
 */
export function arrange(request: ArrangeRequest, site: Site, table: CostTable): ArrangeResult {
  const { form, method } = request;
  const dropped = counter();
  const frame = frameFor(request, site, table);
  const candidates = candidatesOf(request, frame, table, dropped);
  const polished = select(candidates, request.keep ?? KEPT, frame, table, dropped)
    .map((best) => polish(best, request, frame, site, table))
    .sort((a, b) => a.cost - b.cost);
  // An anchor pier may have made two of them the same kind.
  const kept = polished.filter(
    ({ placed }, i) => polished.findIndex((other) => kindOf(other.placed) === kindOf(placed)) === i,
  );
  if (kept.length < polished.length)
    dropped.add('dearer than one kept with as many supports', polished.length - kept.length);
  return {
    arrangements: kept.map(({ units, cost }) => ({ form, method, units, tableCost: cost })),
    dropped: dropped.list(form),
    relaxations: kept.length > 0 ? [] : relaxationsOf(request, site, fitter()),
  };
}
