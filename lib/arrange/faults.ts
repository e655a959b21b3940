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

/** Faults of a main unit on pylons: main span in its band, back or side spans in their windows. */
function pylonFault(unit: Unit, limits: Limits, request: ArrangeRequest): string | null {
  const { pattern } = request;
  if (pattern.kind !== 'pylon') return null;
  const pylons = unit.pylons ?? [];
  const x = unit.supportsM;
  const first = x[0]!;
  const last = x.at(-1)!;
  const places = pylons.map((i) => x[i]!);
  let main: number;
  let outer: boolean;
  if (places.length === 2) {
    main = places[1]! - places[0]!;
    outer = [places[0]! - first, last - places[1]!].some((side) =>
      ratioFault(side, main, pattern.twoPylonSide),
    );
  } else if (places.length === 1) {
    const left = places[0]! - first;
    const right = last - places[0]!;
    main = Math.max(left, right);
    outer = ratioFault(Math.min(left, right), main, pattern.onePylonBack);
  } else return 'one or two pylons expected';
  if (!(main >= limits.minSpanM - 1e-6 && main <= limits.maxSpanM + 1e-6))
    return 'span outside the band of the form';
  return outer ? 'end span outside its window' : null;
}

function unitFault(unit: Unit, request: ArrangeRequest): string | null {
  const approach = request.approach;
  if (unit.role === 'approach' && approach !== undefined) return spanFault(spansOf(unit), limitsOf(approach));
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
  const spans = units.map((unit) => unitFault(unit, request));
  return [...new Set([...standing, ...spans].filter((fault) => fault !== null))];
}
