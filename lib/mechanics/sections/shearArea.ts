import { partSums, type SectionPart } from './sectionProperties.ts';

/**
 * Shear area I b / S of a section built of rectangles, m2: shear force over it is the greatest shear stress by
 * Jourawski at the centroid. Webs are the parts that cross the centroid.
 * @throws RangeError when no rectangle crosses the centroid
 */
export function shearArea(parts: readonly (SectionPart & { kind: 'rect' })[], centroidM: number): number {
  let first = 0;
  let width = 0;
  let inertia = 0;
  for (const part of parts) {
    const ratio = part.eRatio ?? 1;
    const sums = partSums(part);
    inertia += ratio * (sums.second - 2 * centroidM * sums.first + centroidM * centroidM * sums.area);
    const bottom = Math.max(sums.bottom, centroidM);
    if (sums.top > bottom) {
      first += (ratio * part.widthM * ((sums.top - centroidM) ** 2 - (bottom - centroidM) ** 2)) / 2;
    }
    if (sums.bottom < centroidM && sums.top > centroidM) width += ratio * part.widthM;
  }
  if (!(width > 0)) throw new RangeError('section: expected a web at the centroid, received none');
  return (inertia * width) / first;
}
