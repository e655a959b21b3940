import { riverData } from './data.ts';

/**
 * Rise of the flood upstream of a bridge, m: (V^2 / 17.88 + 0.015) ((A / a)^2 - 1) with the mean velocity of the river
 * before the bridge stood, m/s, its area and the area that is left, m2 (Molesworth, see the data file).
 * 0 where nothing is taken away; Infinity where nothing is left.
 */
export function afflux(velocityMs: number, areaM2: number, openingM2: number): number {
  if (!(openingM2 < areaM2)) return 0;
  if (!(openingM2 > 0)) return Infinity;
  const { velocityDivisor, restM } = riverData.afflux;
  return ((velocityMs * velocityMs) / velocityDivisor + restM) * ((areaM2 / openingM2) ** 2 - 1);
}
