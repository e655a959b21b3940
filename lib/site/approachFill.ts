import type { Approach, ApproachSides } from '../model/index.ts';
import type { Outward } from './approachLine.ts';

/** Places and weights of the three-point Gauss rule on [-1, 1]: exact for the cross-section of a curve over sloping ground. */
const AT = Math.sqrt(3 / 5);
const GAUSS = [
  [-AT, 5 / 9],
  [0, 8 / 9],
  [AT, 5 / 9],
] as const;

/** The section of an approach: formation width, m, side slope (horizontal to vertical), and how its sides are held. */
export interface FillSection {
  readonly widthM: number;
  readonly sideSlope: number;
  readonly sides: ApproachSides;
}

/**
 * Fill and walls of an approach by integration over the ground: W h + s h^2 across where it runs out in side slopes, W h
 * between two walls of height h. Where the road lies in the ground nothing is counted. `breaksM` are the distances from
 * the abutment, rising, at which the ground bends; between them the integral is exact.
 */
export function approachFill(
  stretches: readonly Outward[],
  groundAt: (outM: number) => number,
  breaksM: readonly number[],
  { widthM, sideSlope, sides }: FillSection,
): Approach {
  let fillM3 = 0;
  let wallM2 = 0;
  const slope = sides === 'walls' ? 0 : sideSlope;
  let innerM = 0;
  let next = 0;
  for (const { lengthM, levelM, fall, bend1PerM } of stretches) {
    const outerM = innerM + lengthM;
    const height = (at: number): number => {
      const t = at - innerM;
      return levelM - fall * t - (bend1PerM * t * t) / 2 - groundAt(at);
    };
    /** Adds what stands between two distances where the road is above the ground. */
    const add = (fromM: number, toM: number): void => {
      const half = (toM - fromM) / 2;
      for (const [at, weight] of GAUSS) {
        const h = Math.max(0, height(fromM + half * (1 + at)));
        fillM3 += half * weight * (widthM * h + slope * h * h);
        if (sides === 'walls') wallM2 += half * weight * 2 * h;
      }
    };
    let fromM = innerM;
    while (next < breaksM.length && breaksM[next]! <= innerM) next += 1;
    while (fromM < outerM) {
      const toM = Math.min(next < breaksM.length ? breaksM[next]! : Infinity, outerM);
      addAbove(fromM, toM, height, add);
      if (toM < outerM) next += 1;
      fromM = toM;
    }
    innerM = outerM;
  }
  return { lengthM: innerM, fillM3, wallM2 };
}

/** Cuts a stretch where the road comes out of the ground or goes into it. */
function addAbove(
  fromM: number,
  toM: number,
  height: (at: number) => number,
  add: (fromM: number, toM: number) => void,
): void {
  const above = height(fromM) > 0;
  if (above === height(toM) > 0) {
    add(fromM, toM);
    return;
  }
  let low = fromM;
  let high = toM;
  for (let i = 0; i < 40; i += 1) {
    const middle = (low + high) / 2;
    if (height(middle) > 0 === above) low = middle;
    else high = middle;
  }
  if (above) add(fromM, low);
  else add(high, toM);
}
