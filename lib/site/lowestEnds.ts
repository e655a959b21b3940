import { crestBetween, crestLevelAt, type Crest } from './crest.ts';
import type { Need } from './needs.ts';

/** What the road between the abutments is laid out by. */
export interface Layout {
  readonly startM: number;
  readonly endM: number;
  /** Levels below which the ends never fall, and above which they may not rise, m. */
  readonly leastStartM: number;
  readonly leastEndM: number;
  readonly mostStartM: number;
  readonly mostEndM: number;
  readonly radiusM: number;
  readonly gradient: number;
  /** What raised ends cost, in any unit; rises with each level. */
  readonly costOf: (startLevelM: number, endLevelM: number) => number;
  /** Whether the approach behind an end can be built from there; where absent, always. */
  readonly startFits?: (crest: Crest) => boolean;
  readonly endFits?: (crest: Crest) => boolean;
}

const LEVEL_TOLERANCE_M = 1e-9;
/** What a road stands above the least it needs, so that rounding never leaves it below. */
const HAIR_M = 1e-12;
/** A top is placed to this: levels follow it at no more than twice the steepest gradient. */
const PLACE_TOLERANCE_M = 1e-8;
const HALVINGS = 60;

/** Chainages and levels to be cleared, the ends of the road among them; grown when needed and used again. */
let xs = new Float64Array(64);
let zs = new Float64Array(64);
let count = 0;

function gather(layout: Layout, needs: readonly Need[]): void {
  count = needs.length + 2;
  if (xs.length < count) {
    xs = new Float64Array(2 * count);
    zs = new Float64Array(2 * count);
  }
  needs.forEach(({ chainageM, levelM }, i) => {
    xs[i] = chainageM;
    zs[i] = levelM;
  });
  xs[count - 2] = layout.startM;
  zs[count - 2] = layout.leastStartM;
  xs[count - 1] = layout.endM;
  zs[count - 1] = layout.leastEndM;
}

/** Fall from the top of the sharpest crest to a place beside it, m: an arc, then the steepest grade. */
function fallTo(aside: number, radiusM: number, gradient: number): number {
  const u = Math.abs(aside);
  const arc = gradient * radiusM;
  return u < arc ? (u * u) / (2 * radiusM) : gradient * (u - arc / 2);
}

/** Least level of the road at a place when its crest stands with its top at a chainage, m. */
function levelWith(topM: number, atM: number, { radiusM, gradient }: Layout): number {
  let top = -Infinity;
  for (let i = 0; i < count; i += 1) top = Math.max(top, zs[i]! + fallTo(xs[i]! - topM, radiusM, gradient));
  return top - fallTo(atM - topM, radiusM, gradient);
}

const clears = (crest: Crest, needs: readonly Need[], toleranceM = LEVEL_TOLERANCE_M): boolean =>
  needs.every(({ chainageM, levelM }) => crestLevelAt(crest, chainageM) >= levelM - toleranceM);

/** The flattest crest between two levels that clears everything; null where even the sharpest does not. */
function flattestCrest(
  layout: Layout,
  needs: readonly Need[],
  startLevelM: number,
  endLevelM: number,
): Crest | null {
  const { startM, endM, radiusM, gradient } = layout;
  const length = endM - startM;
  const mean = (endLevelM - startLevelM) / length;
  const crest = (radius: number): Crest | null =>
    crestBetween(startM, endM, startLevelM, endLevelM, radius, gradient);
  // Curvature of an arc from end to end over each need.
  let curvature = 0;
  for (const { chainageM, levelM } of needs) {
    const short = levelM - startLevelM - mean * (chainageM - startM);
    if (!(short > LEVEL_TOLERANCE_M)) continue;
    const span = (chainageM - startM) * (endM - chainageM);
    curvature = Math.max(curvature, span > 0 ? (2 * (short + HAIR_M)) / span : Infinity);
  }
  if (curvature === 0) return crest(Infinity);
  if (Math.abs(mean) + (curvature * length) / 2 <= gradient) {
    const flattest = crest(Math.max(radiusM, 1 / curvature));
    return flattest !== null && clears(flattest, needs) ? flattest : null;
  }
  // Its ends would be too steep: the arc is shorter, between grades at the limit.
  let best = crest(radiusM);
  if (best === null || !clears(best, needs)) return null;
  let sharp = radiusM;
  let flat = Math.max(radiusM, length / (2 * Math.max(gradient - Math.abs(mean), 1e-9)));
  for (let i = 0; i < HALVINGS && flat - sharp > 1e-9 * flat; i += 1) {
    const middle = (sharp + flat) / 2;
    const trial = crest(middle);
    if (trial !== null && clears(trial, needs, -HAIR_M)) {
      best = trial;
      sharp = middle;
    } else flat = middle;
  }
  return best;
}

/** The place in [low, high] where a condition that holds from some place on begins; null where it never holds. */
function firstWhere(low: number, high: number, holds: (at: number) => boolean): number | null {
  if (!holds(high)) return null;
  if (holds(low)) return low;
  let no = low;
  let yes = high;
  for (let i = 0; i < HALVINGS && yes - no > PLACE_TOLERANCE_M; i += 1) {
    const middle = (no + yes) / 2;
    if (holds(middle)) yes = middle;
    else no = middle;
  }
  return yes;
}

/** Place of the least value between two places: looked for in steps, then by golden section about the best of them. */
function leastAt(from: number, to: number, value: (at: number) => number): number {
  const STEPS = 16;
  let best = 0;
  let least = Infinity;
  for (let i = 0; i <= STEPS; i += 1) {
    const here = value(from + ((to - from) * i) / STEPS);
    if (here < least) {
      least = here;
      best = i;
    }
  }
  const golden = (Math.sqrt(5) - 1) / 2;
  let low = from + ((to - from) * Math.max(0, best - 1)) / STEPS;
  let high = from + ((to - from) * Math.min(STEPS, best + 1)) / STEPS;
  let a = high - golden * (high - low);
  let b = low + golden * (high - low);
  let atA = value(a);
  let atB = value(b);
  for (let i = 0; i < HALVINGS && high - low > PLACE_TOLERANCE_M; i += 1) {
    if (atA <= atB) {
      high = b;
      b = a;
      atB = atA;
      a = high - golden * (high - low);
      atA = value(a);
    } else {
      low = a;
      a = b;
      atA = atB;
      b = low + golden * (high - low);
      atB = value(b);
    }
  }
  const middle = (low + high) / 2;
  // The least may lie at an end, which the sections only come near to.
  return [from, to].reduce((at, end) => (value(end) < value(at) ? end : at), middle);
}

const startAt = (top: number, layout: Layout): number =>
  Math.max(levelWith(top, layout.startM, layout), layout.leastStartM);
const endAt = (top: number, layout: Layout): number =>
  Math.max(levelWith(top, layout.endM, layout), layout.leastEndM);

/**
 * Stretch on which the top of the sharpest crest may stand so that both ends stay within their limits and their
 * approaches fit; null where there is none. Moving it along lowers the start and raises the end, never the other way.
 */
function topsThatFit(
  layout: Layout,
  needs: readonly Need[],
): { readonly fromM: number; readonly toM: number } | null {
  const { startM, endM, leastStartM, leastEndM, mostStartM, mostEndM, radiusM, gradient } = layout;
  gather(layout, needs);
  const mostStart = Math.max(mostStartM, leastStartM) + LEVEL_TOLERANCE_M;
  const mostEnd = Math.max(mostEndM, leastEndM) + LEVEL_TOLERANCE_M;
  const fits = (top: number, check: ((crest: Crest) => boolean) | undefined): boolean => {
    if (check === undefined) return true;
    const crest = flattestCrest(layout, needs, startAt(top, layout), endAt(top, layout));
    return crest !== null && check(crest);
  };
  const reach = gradient * radiusM;
  const from = firstWhere(
    startM - reach,
    endM + reach,
    (top) => startAt(top, layout) <= mostStart && fits(top, layout.startFits),
  );
  if (from === null) return null;
  const back = firstWhere(
    -(endM + reach),
    -(startM - reach),
    (top) => endAt(-top, layout) <= mostEnd && fits(-top, layout.endFits),
  );
  return back === null || from > -back ? null : { fromM: from, toM: -back };
}

/** Whether any road clears every need: the same as whether `lowestEnds` finds one, in less time. */
export const hasRoad = (layout: Layout, needs: readonly Need[]): boolean =>
  flattestCrest(layout, needs, layout.leastStartM, layout.leastEndM) !== null ||
  topsThatFit(layout, needs) !== null;

/**
 * The lowest road between the abutments that clears every need: ends at their least levels where a crest between them
 * is enough, and else raised by what costs least; between those ends the flattest crest that clears. The road nowhere
 * sags between the abutments, bends over more sharply than the radius or is steeper than the gradient.
 *
 * As the top of the sharpest crest moves along, one end comes down while the other goes up, so every lowest pair of ends
 * has its top on one stretch, which is searched. Null where nothing clears.
 */
export function lowestEnds(layout: Layout, needs: readonly Need[]): Crest | null {
  const { leastStartM, leastEndM, mostStartM, mostEndM } = layout;
  const asProposed = flattestCrest(layout, needs, leastStartM, leastEndM);
  if (asProposed !== null) return asProposed;
  const tops = topsThatFit(layout, needs);
  if (tops === null) return null;
  const top = leastAt(tops.fromM, tops.toM, (at) => layout.costOf(startAt(at, layout), endAt(at, layout)));
  return settled(
    layout,
    needs,
    Math.min(startAt(top, layout), Math.max(mostStartM, leastStartM)),
    Math.min(endAt(top, layout), Math.max(mostEndM, leastEndM)),
  );
}

/**
 * The flattest crest between ends found by search, which may want for a hair of height where the numbers were rounded:
 * ends that may move are raised by it first.
 */
function settled(
  layout: Layout,
  needs: readonly Need[],
  startLevelM: number,
  endLevelM: number,
): Crest | null {
  const { startM, endM, leastStartM, leastEndM, mostStartM, mostEndM, radiusM, gradient } = layout;
  const startMoves = mostStartM > leastStartM;
  const endMoves = mostEndM > leastEndM;
  let start = startLevelM;
  let end = endLevelM;
  for (let i = 0; i < 3; i += 1) {
    const crest = crestBetween(startM, endM, start, end, radiusM, gradient);
    if (crest === null) break;
    let lack = 0;
    let share = 1;
    for (const { chainageM, levelM } of needs) {
      const here = levelM + HAIR_M - crestLevelAt(crest, chainageM);
      if (!(here > lack)) continue;
      lack = here;
      share = Math.max(0.01, (startMoves ? endM - chainageM : chainageM - startM) / (endM - startM));
    }
    if (lack === 0) break;
    // Both ends together lift every place by what they rise, one alone by its share of the distance.
    const by = startMoves && endMoves ? lack : lack / share;
    if (startMoves) start += by;
    if (endMoves) end += by;
  }
  return flattestCrest(layout, needs, start, end);
}
