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
  /** Length over which the depth falls to that of midspan, m. */
  readonly haunchM: number;
  /** Length that is cantilevered: the same on both sides of a pier, m. */
  readonly armM: number;
}

/**
 * Arms of all inner piers, left arm first. Haunches meet in the middle of inner spans; in an end span they reach as far
 * as in the span beyond the pier and leave at least the piece over the abutment. Where the two sides of a pier differ the
 * shorter one is cantilevered on both, so that the pier stays balanced. None in a single span.
 */
export function armsOf(spansM: readonly number[]): Arm[] {
  const last = spansM.length - 1;
  const supportsM = supportPositions(spansM);
  const { leastOverSpan } = cantileverData.endOnFalsework;
  const reach = (span: number): number =>
    span > 0 && span < last ? spansM[span]! / 2 : (1 - leastOverSpan) * spansM[span]!;
  const arms: Arm[] = [];
  for (let support = 1; support <= last; support++) {
    const left = support - 1;
    const isEnd = (span: number): boolean => span === 0 || span === last;
    const haunch = (span: number, other: number): number =>
      isEnd(span) ? Math.min(reach(span), reach(other)) : reach(span);
    const haunches = [haunch(left, support), haunch(support, left)] as const;
    const armM = Math.min(...haunches);
    const pierM = supportsM[support]!;
    arms.push(
      { support, span: left, side: -1, pierM, haunchM: haunches[0], armM },
      { support, span: support, side: 1, pierM, haunchM: haunches[1], armM },
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
