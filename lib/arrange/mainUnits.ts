import type { CostTable, FormId } from '../model/index.ts';
import { approachesTo, type Approach } from './approaches.ts';
import { kindFor, type Candidate, type PlacedUnit } from './candidate.ts';
import type { Counter } from './counter.ts';
import { halfCosts, supportCosts, type SupportCosts } from './curves.ts';
import type { Frame } from './frame.ts';
import { limitsOf, SLACK, type Limits } from './limits.ts';
import type { MainLayout, MainSearch } from './mainSearch.ts';
import { pylonCost, pylonLayouts, sidesOf, spanRows } from './pylons.ts';
import { refine } from './refine.ts';
import type { ArrangeRequest } from './request.ts';
import { sideRoom } from './sideRoom.ts';
import { simpleCost, simpleLayouts } from './simpleMain.ts';

/** Places tried on each side of the opening before the best are refined; edges of barred stretches come on top. */
const PLACES = 64;

/** The cheapest is kept for each class of main span: whole metres, or this share of a longer crossing. */
const MAIN_CLASSES = 400;

/** Steps between places tried among the indices first..last. */
const strideOf = (first: number, last: number): number => Math.max(1, Math.ceil((last - first + 1) / PLACES));

/** At most `PLACES` of the indices first..last and the last: of each few the one beside a stretch without any, or the first. */
function places(X: Float64Array, first: number, last: number): number[] {
  const stride = strideOf(first, last);
  const wide = (2 * X[X.length - 1]!) / X.length + 1;
  const isBeside = (i: number): boolean =>
    X[i]! - (X[i - 1] ?? X[i]!) > wide || (X[i + 1] ?? X[i]!) - X[i]! > wide;
  const all: number[] = [];
  for (let i = first; i <= last; i += stride) {
    let chosen = i;
    for (let j = Math.min(i + stride, last + 1) - 1; i > first && j > i; j -= 1) if (isBeside(j)) chosen = j;
    all.push(chosen);
  }
  if (all.length > 0 && all.at(-1) !== last) all.push(last);
  return all;
}

function firstAtLeast(X: Float64Array, x: number): number {
  let i = 0;
  while (i < X.length && X[i]! < x - 1e-6) i += 1;
  return i;
}

function lastAtMost(X: Float64Array, x: number): number {
  let i = X.length - 1;
  while (i >= 0 && X[i]! > x + 1e-6) i -= 1;
  return i;
}

function backwards(costs: SupportCosts): SupportCosts {
  return { knots: costs.knots, C: costs.C.map((column) => column.slice().reverse()) };
}

/** Approaches read from the far abutment, with indices turned round so that they rise again. */
function approachesFromEnd(
  form: FormId,
  X: Float64Array,
  first: number,
  last: number,
  limits: Limits,
  supports: SupportCosts,
  table: CostTable,
  anyWillDo: boolean,
): Approach[][] {
  const n = X.length;
  const lengthM = X[n - 1]!;
  const turned = Float64Array.from(X, (_, i) => lengthM - X[n - 1 - i]!);
  const turnedBack = (at: readonly number[]): number[] => at.map((i) => n - 1 - i).reverse();
  const lists = approachesTo(
    form,
    turned,
    n - 1 - last,
    n - 1 - first,
    limits,
    backwards(supports),
    table,
    anyWillDo,
  );
  return lists
    .reverse()
    .map((list) => list.map(({ cost, spans, at }) => ({ cost, spans, at: () => turnedBack(at()) })));
}

/** How far a main unit may reach beyond its main span, as a share of that. */
function reachOf({ pattern }: ArrangeRequest): number {
  const sides = sidesOf(pattern);
  return sides ? Math.max(sides.one?.[1] ?? 0, sides.two[1]) : 0;
}

interface Ranges {
  readonly left: readonly [number, number];
  readonly right: readonly [number, number];
  readonly outerLeft: readonly [number, number];
  readonly outerRight: readonly [number, number];
}

function rangesOf(frame: Frame, limits: Limits, reach: number): Ranges {
  const { X, opening, deepestM } = frame;
  const { fromM, toM } = opening ?? { fromM: deepestM, toM: deepestM };
  const inner = limits.maxSpanM;
  const left = [firstAtLeast(X, toM - inner), lastAtMost(X, fromM)] as const;
  const right = [firstAtLeast(X, toM), lastAtMost(X, fromM + inner)] as const;
  const outerLeft = [firstAtLeast(X, toM - inner * (1 + reach)), left[1]] as const;
  const outerRight = [right[0], lastAtMost(X, fromM + inner * (1 + reach))] as const;
  return { left, right, outerLeft, outerRight };
}

/**
 * Arrangements of a main unit over the opening, or over the deepest place where nothing is barred, with approach units where needed: the cheapest for each number of
 * supports, number of pylons and metre of main span. Throws RangeError when the windows of the approach form are missing.
 */
export function mainUnitCandidates(
  request: ArrangeRequest,
  frame: Frame,
  table: CostTable,
  dropped: Counter,
  enough = Infinity,
): Candidate[] {
  const { pattern, form, approach } = request;
  if (pattern.kind === 'continuous' || approach === undefined) {
    throw new RangeError('approach: expected the windows of the approach form');
  }
  const limits = limitsOf(request.windows);
  const approachLimits = limitsOf(approach);
  const { X } = frame;
  const ranges = rangesOf(frame, limits, reachOf(request));
  const left = places(X, ...ranges.left);
  const right = places(X, ...ranges.right);
  const inBand = (spanM: number): boolean =>
    spanM >= limits.minSpanM - SLACK && spanM <= limits.maxSpanM + SLACK;
  if (!left.some((a) => right.some((b) => inBand(X[b]! - X[a]!)))) {
    dropped.add('span outside the band of the form');
    return [];
  }
  const most = Math.min(limits.maxSpanM, frame.lengthM);
  const least = Math.min(approachLimits.minSpacingM, most);
  const own = halfCosts(supportCosts(table, form, frame, least, most), least, most);
  const approachMost = Math.max(Math.min(approachLimits.maxSpanM, frame.lengthM), least);
  const supports = supportCosts(table, pattern.approach, frame, least, approachMost);
  // Whether anything fits hangs on whether there is an approach, not on which.
  const anyWillDo = enough === 1;
  const best = new Map<number, MainLayout>();
  const classM = Math.max(1, frame.lengthM / MAIN_CLASSES);
  // Fewer spans than positions and no more classes than whole metres up to the most: small keys are looked up fast.
  const keyOf = (pylons: number, spans: number, mainM: number): number =>
    (pylons * X.length + spans) * (MAIN_CLASSES + 1) + Math.round(mainM / classM);
  const alone = new Map<number, number>();
  const rowOf = spanRows({ request, table });
  const sides = sidesOf(pattern);
  const search: MainSearch = {
    request,
    limits,
    X,
    table,
    half: (index, spanM) => own.A[index]! + own.B[index]! * spanM,
    left,
    right,
    latestLeft: ranges.left[1],
    earliestRight: ranges.right[0],
    outerLeft: places(X, ...ranges.outerLeft),
    outerRight: places(X, ...ranges.outerRight),
    toLeft: approachesTo(
      pattern.approach,
      X,
      ...ranges.outerLeft,
      approachLimits,
      supports,
      table,
      anyWillDo,
    ),
    toRight: approachesFromEnd(
      pattern.approach,
      X,
      ...ranges.outerRight,
      approachLimits,
      supports,
      table,
      anyWillDo,
    ),
    room: sideRoom(X.length),
    spanAlone(mainM) {
      // Places lie on a grid, so that many pairs of them are as far apart.
      let cost = alone.get(mainM);
      if (cost === undefined)
        alone.set(mainM, (cost = mainM * table.deckPerM(form, mainM, mainM) + table.unitFixed(form, mainM)));
      return cost;
    },
    ownCost: (at, pylons) =>
      sides ? pylonCost(search, sides, rowOf, at, pylons) : simpleCost(search, at[0]!, at[1]!),
    wants(pylons, spans, mainM, cost) {
      const known = best.get(keyOf(pylons, spans, mainM));
      return known === undefined || cost < known.cost * (1 - 1e-9);
    },
    offer(layout) {
      const { at, pylons, mainM, before, after, cost } = layout;
      const spans = before.spans + after.spans + at.length - 1;
      if (search.wants(pylons.length, spans, mainM, cost))
        best.set(keyOf(pylons.length, spans, mainM), layout);
    },
    isEnough: () => best.size >= enough,
    noApproach: () => dropped.add('no approach spans within their windows'),
  };
  if (sides) pylonLayouts(search, sides, rowOf);
  else simpleLayouts(search);
  const strides = [ranges.left, ranges.right, ranges.outerLeft, ranges.outerRight].map(([first, last]) =>
    strideOf(first, last),
  );
  if (!search.isEnough()) refine(search, [...best.values()], Math.max(...strides));
  const placedOf = ({ at, pylons, before, after }: MainLayout): PlacedUnit[] => {
    const placed: PlacedUnit[] = [];
    if (before.spans > 0) placed.push({ form: pattern.approach, role: 'approach', at: before.at() });
    placed.push(sides?.hung === true ? { form, role: 'main', at, pylons } : { form, role: 'main', at });
    if (after.spans > 0) placed.push({ form: pattern.approach, role: 'approach', at: after.at() });
    return placed;
  };
  return Array.from(best.values(), (layout): Candidate => {
    const { at, pylons, before, after, cost } = layout;
    const supports = before.spans + at.length + after.spans;
    const kind = kindFor(supports, sides?.hung === true ? pylons.length : 0);
    return { kind, estimate: cost, placed: () => placedOf(layout) };
  });
}
