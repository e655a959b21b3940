import type { Box } from './placer.ts';

/** Least side of a target that a pointer is to hit, px: success criterion 2.5.8 of WCAG 2.2 (from memory). */
export const LEAST_TARGET_PX = 24;

/** Across and down, px. */
type Spot = readonly [x: number, y: number];

/** Where the middle of a target is wanted, and its size, px. */
export interface WantedPlace {
  readonly key: string;
  readonly x: number;
  readonly y: number;
  readonly width: number;
  readonly height: number;
  /** The way it gives first: that in which it does not seem to say another value. */
  readonly gives: 'across' | 'down';
  /** How far it may be moved either way, px. */
  readonly reach: Spot;
}

/** How far a target stands from where it was wanted, px; null where there is no free place for it. */
export type Shift = readonly [across: number, down: number] | null;

/** A target that has its place: the way it gives as 0 or 1, and where it was wanted that way. */
interface Placed {
  readonly at: Spot;
  readonly half: Spot;
  readonly way: 0 | 1;
  readonly wanted: number;
}

/** Places that differ by less are one: they are written to the hundredth of a pixel. */
const EVEN = 0.01;

const clamp = (value: number, least: number, most: number): number => Math.min(Math.max(value, least), most);

/** Whether two targets leave one another free along an axis. */
const areApart = (axis: 0 | 1, a: Spot, halfA: Spot, b: Spot, halfB: Spot): boolean =>
  Math.abs(a[axis] - b[axis]) >= halfA[axis] + halfB[axis] - EVEN / 2;

/**
 * Gives every handle of a drawing a target of its own: moved as little as possible, the way it gives if it can be, none over
 * another, none off the sheet. What may be moved least has its place first, then comes what stands first in the list. Those
 * that give the same way stay in order beside one another.
 * @param sheet what all of them keep inside, px
 * @returns by key how far each was moved
 */
export function handlesApart(wanted: readonly WantedPlace[], sheet: Box): ReadonlyMap<string, Shift> {
  const placed: Placed[] = [];
  const shifts = new Map<string, Shift>();
  const put = ({ key, x, y, width, height, gives, reach }: WantedPlace): void => {
    const half: Spot = [width / 2, height / 2];
    const least: Spot = [sheet.left + half[0], sheet.top + half[1]];
    const most: Spot = [sheet.right - half[0], sheet.bottom - half[1]];
    const [way, cross] = gives === 'across' ? ([0, 1] as const) : ([1, 0] as const);
    const wantedAt = way === 0 ? x : y;
    const here: Spot = [clamp(x, least[0], most[0]), clamp(y, least[1], most[1])];
    const isOn = (at: Spot): boolean =>
      ([0, 1] as const).every(
        (axis) =>
          at[axis] >= least[axis] - EVEN &&
          at[axis] <= most[axis] + EVEN &&
          Math.abs(at[axis] - here[axis]) <= reach[axis] + EVEN,
      );
    /** Over no other, and beside one that gives the same way on the side on which it was wanted. */
    const isFree = (at: Spot): boolean =>
      placed.every((other) => {
        if (areApart(cross, at, half, other.at, other.half)) return true;
        if (!areApart(way, at, half, other.at, other.half)) return false;
        const side = wantedAt < other.wanted ? -1 : 1;
        return other.way !== way || Math.sign(at[way] - other.at[way]) === side;
      });
    /** Places along an axis that just touch another target, and the one wanted. */
    const along = (axis: 0 | 1): number[] => [
      here[axis],
      ...placed
        .flatMap((other) => [-1, 1].map((side) => other.at[axis] + side * (half[axis] + other.half[axis])))
        .filter((value) => Math.abs(value - here[axis]) <= reach[axis]),
    ];
    const nearest = (spots: readonly Spot[]): Spot | undefined =>
      spots
        .map((at) => ({ at, far: Math.hypot(at[0] - here[0], at[1] - here[1]) }))
        .sort((a, b) => a.far - b.far)
        .find(({ at }) => isOn(at) && isFree(at))?.at;
    const found =
      nearest(along(way).map((at): Spot => (way === 0 ? [at, here[1]] : [here[0], at]))) ??
      nearest(along(0).flatMap((atX) => along(1).map((atY): Spot => [atX, atY])));
    shifts.set(key, found === undefined ? null : [found[0] - x, found[1] - y]);
    if (found !== undefined) placed.push({ at: found, half, way, wanted: wantedAt });
  };
  const room = ({ reach }: WantedPlace): number => reach[0] + reach[1];
  for (const one of [...wanted].sort((a, b) => room(a) - room(b))) put(one);
  return shifts;
}
