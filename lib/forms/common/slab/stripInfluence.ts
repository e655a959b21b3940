/** A group of equal wheel patches in one row along the supported edges of a slab strip. */
export interface PatchRow {
  /** Distances of the patches from the section looked at, measured along the supported edges, m. */
  readonly alongM: readonly number[];
  /** Side of a patch along the supported edges and along the span, m. */
  readonly sideAlongM: number;
  readonly sideSpanM: number;
}

const terms = 21;

/**
 * Moment per metre at `sectionM` of an endless slab strip on two simply supported edges `spanM` apart, kNm/m, for a
 * row of patches of 1 kN each whose middles stand at i / `steps` of the span, i = 0 to `steps`.
 *
 * Fourier series across the span with the closed solution along the edges (Levy; Timoshenko and Woinowsky-Krieger,
 * Theory of Plates and Shells, infinitely long plate with simply supported edges). 0 < sectionM < spanM.
 * @param direction moment in the direction of the span, or along the supported edges
 */
export function stripInfluence(
  spanM: number,
  sectionM: number,
  row: PatchRow,
  poisson: number,
  steps: number,
  direction: 'span' | 'edges' = 'span',
): Float64Array {
  const influence = new Float64Array(steps + 1);
  const reach = direction === 'span' ? reachAlongSpan : reachAlongEdges;
  const halfSpanSide = row.sideSpanM / 2;
  const halfAlong = row.sideAlongM / 2;
  for (let n = 1; n <= terms; n++) {
    const alpha = (n * Math.PI) / spanM;
    const atSection = Math.sin(alpha * sectionM);
    if (Math.abs(atSection) < 1e-12) continue;
    let along = 0;
    for (const c of row.alongM)
      along += reach(alpha, c + halfAlong, poisson) - reach(alpha, c - halfAlong, poisson);
    const spread = Math.sin(alpha * halfSpanSide) / (alpha * halfSpanSide);
    const amplitude = ((2 / spanM) * spread * along * atSection) / row.sideAlongM;
    for (let i = 1; i < steps; i++) influence[i]! += amplitude * Math.sin((n * Math.PI * i) / steps);
  }
  return influence;
}

/** Moment amplitude of one sine term loaded from the section to a distance `a` along the edges (odd in `a`). */
function reachAlongSpan(alpha: number, a: number, poisson: number): number {
  const d = Math.abs(a);
  const decayed = (2 + (1 - poisson) * alpha * d) * Math.exp(-alpha * d);
  return (Math.sign(a) * (2 - decayed)) / (4 * alpha * alpha);
}

/** The same for the moment along the supported edges: (-w,yy - nu w,xx) in place of (-w,xx - nu w,yy). */
function reachAlongEdges(alpha: number, a: number, poisson: number): number {
  const d = Math.abs(a);
  const decayed = (2 * poisson - (1 - poisson) * alpha * d) * Math.exp(-alpha * d);
  return (Math.sign(a) * (2 * poisson - decayed)) / (4 * alpha * alpha);
}
