import { atSupports, END_SHARE, type SkewTorques } from './skewTorque.ts';

/**
 * Torque of skew ends at a support, kNm, of lasting loads (negative where they turn it the other way than traffic does) and
 * of traffic, and the least that this traffic presses, kN.
 */
export interface SkewTurning {
  readonly lastingKNm: number;
  readonly trafficKNm: number;
  readonly pressKN: number;
}

/** On square supports. */
export const noTwist: SkewTurning = { lastingKNm: 0, trafficKNm: 0, pressKN: 0 };

/** What skew ends bring to each support; a uniform load stands on the shorter of the spans beside it at least. */
export function skewTurnings(
  { lastingKNm, trafficKNm }: SkewTorques,
  spansM: readonly number[],
  udlKNm: number,
): SkewTurning[] {
  const lasting = atSupports(lastingKNm);
  return atSupports(trafficKNm).map((traffic, j) => {
    const beside = [lastingKNm[j - 1] ?? 0, lastingKNm[j] ?? 0];
    const worst = beside.reduce((a, b) => (Math.abs(b) > Math.abs(a) ? b : a));
    return {
      lastingKNm: worst < 0 ? -lasting[j]! : lasting[j]!,
      trafficKNm: traffic,
      pressKN:
        traffic > 0 ? END_SHARE * udlKNm * Math.min(spansM[j - 1] ?? Infinity, spansM[j] ?? Infinity) : 0,
    };
  });
}

/**
 * What may turn a support together, with the traffic that twists it and without: it presses the support as well, and at a
 * slight skew by more than it twists. What lasts relieves nothing that traffic twists: it is the rest of two great
 * moments, that of loads and of tendons.
 */
export const skewCases = ({ lastingKNm, trafficKNm, pressKN }: SkewTurning): SkewTurning[] => [
  { lastingKNm: Math.max(0, lastingKNm), trafficKNm, pressKN },
  { ...noTwist, lastingKNm: Math.abs(lastingKNm) },
];
