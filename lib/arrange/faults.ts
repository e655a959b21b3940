import type { Site, Unit } from '../model/index.ts';
import { SAME_M } from './frame.ts';
import { limitsOf, spanFault, type Limits } from './limits.ts';
import type { ArrangeRequest } from './request.ts';

function spansOf(unit: Unit): number[] {
  return unit.supportsM.slice(1).map((x, i) => x - unit.supportsM[i]!);
}

function ratioFault(shorter: number, main: number, window: readonly [number, number]): boolean {
  const slack = 1e-6 * main + 1e-6;
  return !(shorter >= window[0] * main - slack && shorter <= window[1] * main + slack);
}

/** Ends of the main span of a unit on pylons: between two, or on the longer side of one. */
function mainSpanOf(unit: Unit): readonly [number, number] {
  const x = unit.supportsM;
  const [left, right] = [x[0]!, x.at(-1)!];
  const places = (unit.pylons ?? []).map((i) => x[i]!);
  if (places.length >= 2) return [places[0]!, places.at(-1)!];
  const pylon = places[0] ?? right;
  return pylon - left >= right - pylon ? [left, pylon] : [pylon, right];
}

/** Ends of the longest span of a unit. */
function longestSpanOf({ supportsM }: Unit): readonly [number, number] {
  let at = 1;
  for (let i = 2; i < supportsM.length; i += 1) {
    if (supportsM[i]! - supportsM[i - 1]! > supportsM[at]! - supportsM[at - 1]!) at = i;
  }
  return [supportsM[at - 1]!, supportsM[at]!];
}

/** Faults of a main unit on pylons: main span in its band, back or side spans in their windows, supports apart. */
function pylonFault(unit: Unit, limits: Limits, request: ArrangeRequest): string | null {
  const { pattern } = request;
  if (pattern.kind !== 'pylon') return null;
  const count = unit.pylons?.length ?? 0;
  if (count !== 1 && count !== 2) return 'one or two pylons expected';
  if (!(Math.min(...spansOf(unit)) >= limits.minSpacingM - 1e-6)) return 'supports too close together';
  const [from, to] = mainSpanOf(unit);
  const main = to - from;
  if (!(main >= limits.minSpanM - 1e-6 && main <= limits.maxSpanM + 1e-6))
    return 'span outside the band of the form';
  const beyond = [from - unit.supportsM[0]!, unit.supportsM.at(-1)! - to];
  const window = count === 1 ? pattern.onePylonBack : pattern.twoPylonSide;
  const sides = count === 1 ? [Math.max(...beyond)] : beyond;
  return sides.some((side) => ratioFault(side, main, window)) ? 'end span outside its window' : null;
}

/** Whether the main span of a unit leaves the widest barred stretch uncovered. */
function missesOpening(unit: Unit, request: ArrangeRequest, site: Site): boolean {
  const opening = site.mainOpening;
  if (unit.role !== 'main' || request.pattern.kind === 'continuous' || opening === null) return false;
  const [from, to] =
    request.pattern.kind === 'pylon'
      ? mainSpanOf(unit)
      : request.pattern.kind === 'flanked'
        ? longestSpanOf(unit)
        : [unit.supportsM[0]!, unit.supportsM.at(-1)!];
  return from > opening.fromM + SAME_M || to < opening.toM - SAME_M;
}

function unitFault(unit: Unit, request: ArrangeRequest, site: Site): string | null {
  const approach = request.approach;
  if (unit.role === 'approach' && approach !== undefined) return spanFault(spansOf(unit), limitsOf(approach));
  if (missesOpening(unit, request, site)) return 'main span not over the opening';
  const limits = limitsOf(request.windows);
  if (request.pattern.kind === 'pylon') return pylonFault(unit, limits, request);
  const spans = spansOf(unit);
  if (request.pattern.kind === 'simple-main' && spans.length !== 1) return 'one main span expected';
  return spanFault(spans, limits);
}

/** Reason a support at this chainage may not stand there, or null; abutments are the brief's and are not asked about. */
function standingFault(site: Site, chainageM: number, pierHalfWidthM: number): string | null {
  const zone = site.zones.find(
    ({ hard, fromM, toM }) =>
      hard &&
      chainageM > fromM - pierHalfWidthM + 2 * SAME_M &&
      chainageM < toM + pierHalfWidthM - 2 * SAME_M,
  );
  return zone === undefined ? null : `support in a barred stretch: ${zone.name}`;
}

/**
 * Everything that is wrong with a row of units on a site: supports in hard zones, spans outside their windows. Empty for
 * an arrangement the search may return; a dragged or typed one is asked the same.
 */
export function faultsOf(units: readonly Unit[], request: ArrangeRequest, site: Site): string[] {
  const places = new Set(units.flatMap((unit) => unit.supportsM));
  const standing = [...places]
    .filter((x) => x > site.startM + SAME_M && x < site.endM - SAME_M)
    .map((x) => standingFault(site, x, request.pierHalfWidthM));
  const spans = units.map((unit) => unitFault(unit, request, site));
  return [...new Set([...standing, ...spans].filter((fault) => fault !== null))];
}
