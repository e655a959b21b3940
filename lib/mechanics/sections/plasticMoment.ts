import { outlineSums, type SectionPoint } from './polygonProperties.ts';
import { partSums, type SectionPart } from './sectionProperties.ts';

/** A part with its design strength; `tensionMPa` 0 for concrete that cracks. */
export type PlasticPart = SectionPart & {
  /** Strength in compression, and in tension unless `tensionMPa` is given, MPa. */
  readonly fyMPa: number;
  readonly tensionMPa?: number;
};

export interface PlasticMoment {
  readonly momentKNm: number;
  /** Level of the plastic neutral axis, m. */
  readonly axisM: number;
}

/**
 * Plastic moment of a section of several materials without axial force.
 * @param bends 'sagging' puts the top in compression, 'hogging' the bottom
 * @throws RangeError when the parts have no strength
 */
export function plasticMoment(
  parts: readonly PlasticPart[],
  bends: 'sagging' | 'hogging' = 'sagging',
): PlasticMoment {
  let low = Infinity;
  let high = -Infinity;
  for (const part of parts) {
    const sums = partSums(part);
    low = Math.min(low, sums.bottom);
    high = Math.max(high, sums.top);
  }
  if (!(high > low)) throw new RangeError('section: expected parts with a height, received none');
  const lowest = low;
  const highest = high;
  // The resultant changes steadily with the axis: halve the interval until the axis is found to 1e-9 of the depth.
  for (let i = 0; i < 60; i++) {
    const axis = (low + high) / 2;
    const net = resultant(parts, axis, bends).forceMN;
    // Compression positive: in sagging too much of it means the axis lies too low.
    if (bends === 'sagging' ? net > 0 : net < 0) low = axis;
    else high = axis;
    if (high - low < 1e-10 * (highest - lowest)) break;
  }
  const axisM = (low + high) / 2;
  const momentKNm = 1000 * Math.abs(resultant(parts, axisM, bends).momentMNm);
  if (!(momentKNm > 0)) throw new RangeError('section: expected parts with strength, received none');
  return { momentKNm, axisM };
}

/** Force, compression positive, and moment about the axis of the fully plastic section. */
function resultant(parts: readonly PlasticPart[], axis: number, bends: 'sagging' | 'hogging') {
  let forceMN = 0;
  let momentMNm = 0;
  for (const part of parts) {
    const whole = partSums(part);
    const above = sumsAbove(part, axis);
    const below = { area: whole.area - above.area, first: whole.first - above.first };
    const [squeezed, stretched] = bends === 'sagging' ? [above, below] : [below, above];
    const tension = part.tensionMPa ?? part.fyMPa;
    forceMN += part.fyMPa * squeezed.area - tension * stretched.area;
    momentMNm +=
      part.fyMPa * (squeezed.first - axis * squeezed.area) -
      tension * (stretched.first - axis * stretched.area);
  }
  return { forceMN, momentMNm };
}

function sumsAbove(part: SectionPart, axis: number): { area: number; first: number } {
  if (part.kind === 'rect') {
    const bottom = Math.max(part.bottomM, axis);
    const top = part.bottomM + part.heightM;
    if (bottom >= top) return { area: 0, first: 0 };
    return { area: part.widthM * (top - bottom), first: (part.widthM * (top * top - bottom * bottom)) / 2 };
  }
  const outer = clippedSums(part.points, axis);
  for (const hole of part.holes ?? []) {
    const inner = clippedSums(hole, axis);
    outer.area -= inner.area;
    outer.first -= inner.first;
  }
  return outer;
}

/** Area and first moment of the part of a polygon above a level (Sutherland and Hodgman clipping). */
function clippedSums(points: readonly SectionPoint[], axis: number): { area: number; first: number } {
  const kept: SectionPoint[] = [];
  for (let i = 0; i < points.length; i++) {
    const a = points[i]!;
    const b = points[(i + 1) % points.length]!;
    if (a[1] >= axis) kept.push(a);
    if (a[1] >= axis !== b[1] >= axis) {
      const t = (axis - a[1]) / (b[1] - a[1]);
      kept.push([a[0] + t * (b[0] - a[0]), axis]);
    }
  }
  if (kept.length < 3) return { area: 0, first: 0 };
  const sums = outlineSums(kept);
  return { area: sums.area, first: sums.firstZ };
}
