import { supportPositions } from '../common/supports.ts';
import { cableData } from './cableData.ts';

/** One stay of one plane. */
interface Stay {
  /** Which pylon of the layout holds it. */
  readonly pylon: number;
  /** Side of the pylon on which the deck is held: -1 towards the start, +1 towards the end. */
  readonly side: -1 | 1;
  /** Anchorage on the deck, m from the first support. */
  readonly deckM: number;
  /** Anchorage in the pylon above the deck, m. */
  readonly riseM: number;
  readonly lengthM: number;
  readonly sine: number;
  readonly cosine: number;
  /** Deck length whose lasting load it carries, m; 0 for a stay to an anchor pier. */
  readonly tributaryM: number;
  /** A back-stay held down at a support. */
  readonly anchor: boolean;
  /** Stays side by side that this one stands for (anchor stays are worked out as one). */
  readonly count: number;
}

interface PylonPlace {
  /** Index of its support in the unit. */
  readonly support: number;
  readonly xM: number;
  /** Highest anchorage above the deck, m. */
  readonly heightM: number;
  /** Spacing of stays on the deck, m. */
  readonly spacingM: number;
}

export interface StayLayout {
  readonly pylons: readonly PylonPlace[];
  /** All stays of one plane. */
  readonly stays: readonly Stay[];
  readonly mainSpanM: number;
  /** Longest stretch of deck between a last stay and its anchor pier, m. */
  readonly endBayM: number;
  readonly lengthM: number;
}

/**
 * Which supports carry pylons when the task does not say: both ends of the longest span when it is an inner one, the
 * inner end of the longest span otherwise.
 */
export function usualPylons(spansM: readonly number[]): number[] {
  const longest = spansM.indexOf(Math.max(...spansM));
  if (spansM.length < 2) return [];
  if (longest > 0 && longest < spansM.length - 1) return [longest, longest + 1];
  return [longest === 0 ? 1 : longest];
}

/**
 * Semi-fan of stays for one or two pylons.
 *
 * Stays stand at equal steps on the deck from each pylon, one upright beside it, to midspan (two pylons) or to the far support (one); on the back
 * span they repeat the same steps as far as it goes, and the rest are gathered at its end support as anchor stays. Both
 * ends of a one-pylon bridge of equal spans have anchor stays. Pylon heights keep the slope of the longest stay.
 * @throws RangeError where pylons do not stand on inner supports
 */
export function stayLayout(spansM: readonly number[], pylonSupports: readonly number[]): StayLayout {
  const x = supportPositions(spansM);
  const last = x.length - 1;
  checkPylons(pylonSupports, last);
  const lengthM = x[last]!;
  const two = pylonSupports.length === 2;
  const places = pylonSupports.map((support) => x[support]!);
  const mainSpanM = two ? places[1]! - places[0]! : Math.max(places[0]!, lengthM - places[0]!);
  const heightM = two
    ? cableData.pylonHeight.overMainTwo * mainSpanM
    : cableData.pylonHeight.overMainOne * mainSpanM;
  const { least, most, target, overMain } = cableData.staySpacingM;
  const wantedM = Math.min(most, Math.max(least, Math.min(target, overMain * mainSpanM)));
  const reachM = two ? mainSpanM / 2 : mainSpanM;
  // Half a step is left at midspan, a whole one before a support.
  const count = Math.max(2, Math.round(reachM / wantedM - (two ? 0.5 : 1)));
  const spacingM = reachM / (count + (two ? 0.5 : 1));

  const pylons: PylonPlace[] = pylonSupports.map((support, p) => ({
    support,
    xM: places[p]!,
    heightM,
    spacingM,
  }));
  const stays: Stay[] = [];
  let endBayM = 0;
  pylons.forEach((pylon, p) => {
    // The deck passes the pylon afloat, on a pair of upright stays instead of a bearing that would bend it hard.
    stays.push(stayAt(pylon, p, 1, 0, 0, count, spacingM));
    for (const side of [-1, 1] as const) {
      const towardsOther = two && (p === 0) === (side === 1);
      const sideM = towardsOther ? reachM : side === 1 ? lengthM - pylon.xM : pylon.xM;
      const otherM = side === 1 ? pylon.xM : lengthM - pylon.xM;
      const isBack = !towardsOther && (two || sideM <= otherM * 1.0001);
      if (!isBack) {
        for (let k = 1; k <= count; k++) stays.push(stayAt(pylon, p, side, k * spacingM, k, count, spacingM));
        continue;
      }
      // The last suspended stay keeps clear of the anchor stays by at least 0.6 of a step.
      const hung = Math.max(0, Math.min(count - 1, Math.floor(sideM / spacingM - 0.6)));
      const bayM = sideM - hung * spacingM;
      endBayM = Math.max(endBayM, bayM);
      for (let k = 1; k <= hung; k++) {
        const tributary = k === hung ? (spacingM + bayM) / 2 : spacingM;
        stays.push(stayAt(pylon, p, side, k * spacingM, k, count, tributary));
      }
      const { least: fewest, most: greatest } = cableData.anchorStays;
      const anchors = Math.min(greatest, Math.max(fewest, count - hung));
      const rise = pylon.heightM - ((anchors - 1) / 2) * stepUp(pylon.heightM, count);
      stays.push(stay(p, side, pylon.xM + side * sideM, sideM, rise, 0, anchors));
    }
  });
  return { pylons, stays, mainSpanM, endBayM, lengthM };
}

/** Vertical step of anchorages in the pylon, m. */
export function stepUp(heightM: number, count: number): number {
  const { spacingM, mostOverHeight } = cableData.anchorZone;
  return Math.min(spacingM, (mostOverHeight * heightM) / Math.max(1, count - 1));
}

/** Stay k of `count` from the pylon; the farthest is anchored highest. */
function stayAt(
  pylon: PylonPlace,
  p: number,
  side: -1 | 1,
  reachM: number,
  k: number,
  count: number,
  tributaryM: number,
): Stay {
  const rise = pylon.heightM - (count - k) * stepUp(pylon.heightM, count);
  return stay(p, side, pylon.xM + side * reachM, reachM, rise, tributaryM, 0);
}

function stay(
  pylon: number,
  side: -1 | 1,
  deckM: number,
  reachM: number,
  riseM: number,
  tributaryM: number,
  anchors: number,
): Stay {
  const lengthM = Math.hypot(reachM, riseM);
  return {
    pylon,
    side,
    deckM,
    riseM,
    lengthM,
    sine: riseM / lengthM,
    cosine: reachM / lengthM,
    tributaryM,
    anchor: anchors > 0,
    count: Math.max(1, anchors),
  };
}

function checkPylons(supports: readonly number[], last: number): void {
  const inner = supports.every(
    (s, i) => Number.isInteger(s) && s > 0 && s < last && (i === 0 || s > supports[i - 1]!),
  );
  if (!(supports.length === 1 || supports.length === 2) || !inner)
    throw new RangeError(
      `pylons: expected one or two inner supports (1 to ${last - 1}), rising, received [${supports.join(', ')}]; give at least two spans`,
    );
}
