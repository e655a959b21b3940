import type { SectionPoint } from '../../../mechanics/index.ts';
import type { StandardId } from '../../../model/index.ts';
import { pretensioned } from './pretensioned.ts';

/** One level of the strand grid. */
export interface StrandRow {
  readonly zM: number;
  readonly count: number;
}

/** What the grid has to fit in: outline and holes, m, z up from the soffit. */
interface Grid {
  readonly depthM: number;
  readonly points: readonly SectionPoint[];
  readonly holes: readonly (readonly SectionPoint[])[];
  readonly voidAxisM?: number;
}

/**
 * Strands that fit in a beam, row by row from the bottom: a square grid, half a pitch either side of the middle, every
 * strand at least the axis distance from the outline and from holes. Rows above a share of the depth are left out.
 */
export function strandRows(
  { depthM, points, holes, voidAxisM }: Grid,
  standard: StandardId,
): readonly StrandRow[] {
  const { strand } = pretensioned;
  const pitch = strand.pitchM[standard];
  const axis = strand.axisM[standard];
  const outM = Math.max(...points.map(([y]) => y));
  const rings = [points, ...holes];
  const rows: StrandRow[] = [];
  for (let z = axis; z <= strand.mostHeightShare * depthM + 1e-9; z += pitch) {
    let count = 0;
    for (let y = pitch / 2; y < outM; y += pitch)
      if (inside(rings, y, z, axis, voidAxisM ?? axis)) count += 2;
    if (count > 0) rows.push({ zM: z, count });
  }
  return rows;
}

/** True for a point inside an outline (the first ring), outside its holes (the others) and far enough from both. */
function inside(
  rings: readonly (readonly SectionPoint[])[],
  y: number,
  z: number,
  clear: number,
  clearOfHoles: number,
): boolean {
  let within = false;
  for (let r = 0; r < rings.length; r++) {
    const ring = rings[r]!;
    const least = (r === 0 ? clear : clearOfHoles) - 1e-9;
    for (let i = 0; i < ring.length; i++) {
      const [y0, z0] = ring[i]!;
      const [y1, z1] = ring[i + 1 < ring.length ? i + 1 : 0]!;
      if (z0 > z !== z1 > z && y < y0 + ((z - z0) / (z1 - z0)) * (y1 - y0)) within = !within;
      if (distance2(y, z, y0, z0, y1, z1) < least * least) return false;
    }
  }
  return within;
}

/** Square of the distance from a point to an edge, m2. */
function distance2(y: number, z: number, y0: number, z0: number, y1: number, z1: number): number {
  const length2 = (y1 - y0) ** 2 + (z1 - z0) ** 2;
  const along = length2 > 0 ? ((y - y0) * (y1 - y0) + (z - z0) * (z1 - z0)) / length2 : 0;
  const t = Math.min(1, Math.max(0, along));
  return (y - y0 - t * (y1 - y0)) ** 2 + (z - z0 - t * (z1 - z0)) ** 2;
}

/** The lowest `count` strands of a beam: height of their centroid, m. `count` at most all that fit. */
export function strandCentroidM(rows: readonly StrandRow[], count: number): number {
  let left = count;
  let first = 0;
  for (const row of rows) {
    const here = Math.min(left, row.count);
    first += here * row.zM;
    left -= here;
    if (left <= 0) break;
  }
  return count > 0 ? first / (count - left) : 0;
}

/** Strands that fit in a beam. */
export function mostStrands(rows: readonly StrandRow[]): number {
  return rows.reduce((sum, row) => sum + row.count, 0);
}
