import type { AppraisedOption, Design } from '../../../lib/index.ts';

/** Depth of the structure of a unit at x from its first support, m, as it was worked out; NaN off the unit. */
export function depthOfUnit({ depthAlong: { xM, depthM } }: Design, x: number): number {
  const i = xM.findIndex((at, n) => n > 0 && x <= at + 1e-9 && x >= xM[n - 1]! - 1e-9);
  if (i < 0) return NaN;
  const share = xM[i]! > xM[i - 1]! ? (x - xM[i - 1]!) / (xM[i]! - xM[i - 1]!) : 1;
  return depthM[i - 1]! + share * (depthM[i]! - depthM[i - 1]!);
}

/** The designs of an option that reach over a chainage. */
export const designsAt = ({ units, designs }: AppraisedOption, chainageM: number): Design[] =>
  designs.filter((design, u) => Number.isFinite(depthOfUnit(design, chainageM - units[u]!.supportsM[0]!)));

/** Depth of the structure of an option at a chainage, m: the deeper where two units meet. */
export const depthOf = ({ units, designs }: AppraisedOption, chainageM: number): number =>
  Math.max(
    ...designs
      .map((design, u) => depthOfUnit(design, chainageM - units[u]!.supportsM[0]!))
      .filter(Number.isFinite),
  );
