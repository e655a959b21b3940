import { outlineSums, type SectionPoint } from './polygonProperties.ts';
import { partSums, type PartSums, type SectionPart } from './sectionProperties.ts';

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
  const wholes = parts.map((part) => partSums(part));
  for (const sums of wholes) {
    low = Math.min(low, sums.bottom);
    high = Math.max(high, sums.top);
  }
  if (!(high > low)) throw new RangeError('section: expected parts with a height, received none');
  const lowest = low;
  const highest = high;
  // The resultant changes steadily with the axis: halve the interval until the axis is found to 1e-9 of the depth.
  for (let i = 0; i < 60; i++) {
    const axis = (low + high) / 2;
    const net = forceMN(parts, wholes, axis, bends);
    // Compression positive: in sagging too much of it means the axis lies too low.
    if (bends === 'sagging' ? net > 0 : net < 0) low = axis;
    else high = axis;
    if (high - low < 1e-10 * (highest - lowest)) break;
  }
  const axisM = (low + high) / 2;
  const momentKNm = 1000 * Math.abs(momentMNm(parts, wholes, axisM, bends));
  if (!(momentKNm > 0)) throw new RangeError('section: expected parts with strength, received none');
  return { momentKNm, axisM };
}

/** Force of the fully plastic section, compression positive; `wholes` are the sums of its parts. */
function forceMN(
  parts: readonly PlasticPart[],
  wholes: readonly PartSums[],
  axis: number,
  bends: 'sagging' | 'hogging',
): number {
  let force = 0;
  for (let i = 0; i < parts.length; i++) {
    const part = parts[i]!;
    const above = areaAbove(part, axis);
    const below = wholes[i]!.area - above;
    const tension = part.tensionMPa ?? part.fyMPa;
    force +=
      bends === 'sagging' ? part.fyMPa * above - tension * below : part.fyMPa * below - tension * above;
  }
  return force;
}

/** Its moment about the axis. */
function momentMNm(
  parts: readonly PlasticPart[],
  wholes: readonly PartSums[],
  axis: number,
  bends: 'sagging' | 'hogging',
): number {
  let moment = 0;
  parts.forEach((part, i) => {
    const above = sumsAbove(part, axis);
    const below = { area: wholes[i]!.area - above.area, first: wholes[i]!.first - above.first };
    const [squeezed, stretched] = bends === 'sagging' ? [above, below] : [below, above];
    const tension = part.tensionMPa ?? part.fyMPa;
    moment +=
      part.fyMPa * (squeezed.first - axis * squeezed.area) -
      tension * (stretched.first - axis * stretched.area);
  });
  return moment;
}

function areaAbove(part: SectionPart, axis: number): number {
  if (part.kind !== 'rect') return sumsAbove(part, axis).area;
  return part.widthM * Math.min(part.heightM, Math.max(0, part.bottomM + part.heightM - axis));
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
