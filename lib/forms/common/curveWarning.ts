import type { UnitTask } from '../../model/index.ts';

/** A span may be taken as straight while it turns through less than this, degrees: AASHTO LRFD 4.6.1.2.4 (from memory). */
const AS_STRAIGHT_DEG = 12;

/**
 * A sentence where the longest span turns through more than a deck may that is analysed as straight, ending in what is then
 * left out; none on a gentler curve.
 */
export function curveWarning({ spansM, planRadiusM }: UnitTask, leftOut: string): string[] {
  const angleDeg = ((Math.max(...spansM) / planRadiusM) * 180) / Math.PI;
  if (!(angleDeg >= AS_STRAIGHT_DEG)) return [];
  return [
    `A span turns through ${angleDeg.toFixed(0)}°; from ${AS_STRAIGHT_DEG}° on it may not be taken as straight: ${leftOut}`,
  ];
}
