import { supportPositions } from '../common/supports.ts';
import { cantileverData } from './cantileverData.ts';

/** One side of an inner pier. */
export interface Arm {
  /** Support it stands on, and the span it reaches into. */
  readonly support: number;
  readonly span: number;
  /** -1 to the left, 1 to the right. */
  readonly side: -1 | 1;
  readonly pierM: number;
  /** Length that is cantilevered, over which the depth falls to that of midspan, m. */
  readonly armM: number;
  /** Length of it that the other arm of the pier balances, m. */
  readonly balancedM: number;
}

/**
 * Arms of all inner piers, left arm first. They meet in the middle of inner spans; in an end span they reach as far as in
 * the span beyond the pier and leave at least the piece over the abutment. Where the two sides of a pier differ the longer
 * one goes on when the span of the shorter one is joined and holds it down. None in a single span.
 */
export function armsOf(spansM: readonly number[]): Arm[] {
  const last = spansM.length - 1;
  const supportsM = supportPositions(spansM);
  const { leastOverSpan } = cantileverData.endOnFalsework;
  const isEnd = (span: number): boolean => span === 0 || span === last;
  const reach = (span: number): number =>
    isEnd(span) ? (1 - leastOverSpan) * spansM[span]! : spansM[span]! / 2;
  const arms: Arm[] = [];
  for (let support = 1; support <= last; support++) {
    const left = support - 1;
    const length = (span: number, other: number): number =>
      isEnd(span) ? Math.min(reach(span), reach(other)) : reach(span);
    const both = [length(left, support), length(support, left)] as const;
    const at = { support, pierM: supportsM[support]!, balancedM: Math.min(...both) };
    arms.push(
      { ...at, span: left, side: -1, armM: both[0] },
      { ...at, span: support, side: 1, armM: both[1] },
    );
  }
  return arms;
}

/** Tips of the arms that do not coincide with the middle of a span, m: stations of the beam besides the usual ones. */
export function tipsM(arms: readonly Arm[], spansM: readonly number[], stationsPerSpan: number): number[] {
  const supportsM = supportPositions(spansM);
  return arms.flatMap((arm) => {
    const tip = arm.pierM + arm.side * arm.armM;
    const step = spansM[arm.span]! / stationsPerSpan;
    const away = (tip - supportsM[arm.span]!) / step;
    return Math.abs(away - Math.round(away)) < 1e-6 ? [] : [tip];
  });
}
