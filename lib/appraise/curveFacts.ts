import type { Facts, Site } from '../model/index.ts';

type Known = Record<string, Facts[string]>;

/** Offset of a straight girder of a span from a curve of a plan radius at its middle, m: L^2 / (8 R); 0 on a straight. */
export const chordOffset = (spanM: number, radiusM: number): number => (spanM * spanM) / (8 * radiusM);

/** Angle through which a span turns on a curve, degrees: L / R; 0 on a straight. */
export const centralAngle = (spanM: number, radiusM: number): number => ((spanM / radiusM) * 180) / Math.PI;

/** What the curve of the road does to the longest of the spans of a unit, m; unknown where the radius is not known. */
export function curveFacts({ planRadiusM }: Pick<Site, 'planRadiusM'>, spansM: readonly number[]): Known {
  const longest = Math.max(...spansM);
  return {
    chordOffsetM: planRadiusM === null ? 'unknown' : chordOffset(longest, planRadiusM),
    centralAngleDeg: planRadiusM === null ? 'unknown' : centralAngle(longest, planRadiusM),
  };
}
