import { outlineSums, type SectionPoint } from './polygonProperties.ts';

/** A part of a section: a rectangle standing on its bottom edge, or a polygon with holes. Lengths m. */
export type SectionPart =
  | {
      readonly kind: 'rect';
      readonly widthM: number;
      readonly heightM: number;
      readonly bottomM: number;
      /** Stiffness against that of the reference material; 1 when absent. A slab of effective width is a part of that width. */
      readonly eRatio?: number;
    }
  | {
      readonly kind: 'polygon';
      readonly points: readonly SectionPoint[];
      readonly holes?: readonly (readonly SectionPoint[])[];
      readonly eRatio?: number;
    };

/** Transformed section in the reference material. */
export interface SectionProperties {
  readonly areaM2: number;
  /** Height of the centroid above z = 0, m. */
  readonly centroidM: number;
  readonly inertiaM4: number;
  /** Highest and lowest level of the section, m. */
  readonly topM: number;
  readonly bottomM: number;
  /** Section moduli at those levels, reference material, m3. */
  readonly wTopM3: number;
  readonly wBottomM3: number;
}

/** Area, first and second moment about z = 0, and extreme levels of one part, not transformed. */
export interface PartSums {
  readonly area: number;
  readonly first: number;
  readonly second: number;
  readonly bottom: number;
  readonly top: number;
}

export function partSums(part: SectionPart): PartSums {
  if (part.kind === 'rect') {
    const bottom = part.bottomM;
    const top = bottom + part.heightM;
    return {
      area: part.widthM * part.heightM,
      first: (part.widthM * (top * top - bottom * bottom)) / 2,
      second: (part.widthM * (top ** 3 - bottom ** 3)) / 3,
      bottom,
      top,
    };
  }
  const sums = outlineSums(part.points);
  for (const hole of part.holes ?? []) {
    const inner = outlineSums(hole);
    sums.area -= inner.area;
    sums.firstZ -= inner.firstZ;
    sums.secondZ -= inner.secondZ;
  }
  let bottom = Infinity;
  let top = -Infinity;
  for (const [, z] of part.points) {
    bottom = Math.min(bottom, z);
    top = Math.max(top, z);
  }
  return { area: sums.area, first: sums.firstZ, second: sums.secondZ, bottom, top };
}

/**
 * Properties of a section of several parts and materials by the transformed section.
 * @throws RangeError when the parts have no area
 */
export function sectionProperties(parts: readonly SectionPart[]): SectionProperties {
  let area = 0;
  let first = 0;
  let second = 0;
  let bottomM = Infinity;
  let topM = -Infinity;
  for (const part of parts) {
    const ratio = part.eRatio ?? 1;
    const sums = partSums(part);
    area += ratio * sums.area;
    first += ratio * sums.first;
    second += ratio * sums.second;
    bottomM = Math.min(bottomM, sums.bottom);
    topM = Math.max(topM, sums.top);
  }
  if (!(area > 0)) throw new RangeError(`section: expected an area above 0, received ${area} m2`);
  const centroidM = first / area;
  const inertiaM4 = second - first * centroidM;
  return {
    areaM2: area,
    centroidM,
    inertiaM4,
    topM,
    bottomM,
    wTopM3: inertiaM4 / (topM - centroidM),
    wBottomM3: inertiaM4 / (centroidM - bottomM),
  };
}
