/**
 * Fill added behind one abutment when its road level is lifted, m3.
 *
 * For a rigid lift dV/dh = (W h + s h^2)/g, the plan area under the fill, with one straight limiting gradient g, level
 * ground and a tie-in that moves; integrated here from the height before to the height after the lift:
 * V = (W (h1^2 - h0^2)/2 + s (h1^3 - h0^3)/3) / g.
 *
 * `formationM` width of the formation W, m; heights of the road above the ground at the abutment, m (below ground
 * counts as 0); `sideSlope` s horizontal to vertical; `gradient` g > 0 as a ratio.
 */
export function addedFill(
  formationM: number,
  heightBeforeM: number,
  heightAfterM: number,
  sideSlope: number,
  gradient: number,
): number {
  if (!(gradient > 0)) throw new RangeError(`gradient: expected more than 0, received ${gradient}`);
  const h0 = Math.max(heightBeforeM, 0);
  const h1 = Math.max(heightAfterM, 0);
  return ((formationM * (h1 ** 2 - h0 ** 2)) / 2 + (sideSlope * (h1 ** 3 - h0 ** 3)) / 3) / gradient;
}
