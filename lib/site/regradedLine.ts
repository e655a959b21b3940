import { bendOf, lengthOf, strung, type ApproachRules, type Outward } from './approachLine.ts';

/** The line of an existing road that is regraded behind an abutment. */
export interface RegradedLine {
  readonly stretches: readonly Outward[];
  readonly lengthM: number;
  /** Change of fall at the abutment, as a ratio: more than 0 where the existing road falls more steeply than the deck. */
  readonly turn: number;
  readonly radiusM: number;
  readonly comesBack: boolean;
}

/**
 * The shortest line from the fall of the deck at a fixed level back onto an existing road that runs through the same level
 * at a fall of its own, with the sharpest curves. Falls are ratios, outward.
 *
 * The curve at the abutment, of radius R, is parallel to the existing road after R d, d the change of fall, but stands
 * R d^2 / 2 away from it. So it turns on by t, and a curve the other way, of radius S, meets the road:
 * R d^2 / 2 = (R + S) t^2 / 2. Where that would be steeper than the steepest gradient, t is what is left up to it, and a
 * straight grade between the curves makes up the rest. A road that is as steep as that itself is never met again. Where
 * gradients may meet at an angle at the abutment (R = 0) the existing road is met at once. Geometry of parabolic vertical
 * curves in their usual approximation; common practice, no source.
 */
export function regradedLine(
  levelM: number,
  deckFall: number,
  heldFall: number,
  { gradient, crestRadiusM, sagRadiusM }: Pick<ApproachRules, 'gradient' | 'crestRadiusM' | 'sagRadiusM'>,
): RegradedLine {
  const turn = heldFall - deckFall;
  const change = Math.abs(turn);
  const side = Math.sign(turn);
  const [first, last] = turn > 0 ? [crestRadiusM, sagRadiusM] : [sagRadiusM, crestRadiusM];
  const whole = first > 0 ? change * Math.sqrt(first / (first + last)) : 0;
  const past = Math.min(whole, Math.max(0, gradient - side * heldFall));
  const comesBack = whole === 0 || past > 0;
  const grade = past > 0 ? (first * change * change - (first + last) * past * past) / (2 * past) : 0;
  const stretches = strung(levelM, [
    { fall: deckFall, lengthM: first * (change + past), bend1PerM: side * bendOf(first) },
    { fall: heldFall + side * past, lengthM: past < whole ? grade : 0, bend1PerM: 0 },
    { fall: heldFall + side * past, lengthM: last * past, bend1PerM: -side * bendOf(last) },
  ]);
  return { stretches, lengthM: lengthOf(stretches), turn, radiusM: first, comesBack };
}

/** The same line seen in the existing road: as far below it as it lies above. */
export const turnedOver = (stretches: readonly Outward[], levelM: number, heldFall: number): Outward[] => {
  let outM = 0;
  return stretches.map((stretch) => {
    const existingM = levelM - heldFall * outM;
    outM += stretch.lengthM;
    return {
      lengthM: stretch.lengthM,
      levelM: 2 * existingM - stretch.levelM,
      fall: 2 * heldFall - stretch.fall,
      bend1PerM: -stretch.bend1PerM,
    };
  });
};
