import type { RoadPiece } from '../model/index.ts';

/**
 * The road between the abutments: a grade, a crest and a grade, in one line. The crest may fill the whole length, its
 * radius may be infinite (the road runs straight) or 0 (the grades meet at an angle).
 */
export interface Crest {
  readonly startM: number;
  readonly endM: number;
  /** Levels at both, m. */
  readonly levelM: number;
  readonly endLevelM: number;
  /** Chainages between which it curves. */
  readonly fromM: number;
  readonly toM: number;
  /** Gradients before and after the curve. */
  readonly before: number;
  readonly after: number;
  readonly radiusM: number;
}

/**
 * The highest line between two levels that nowhere bends over more sharply than a radius and is nowhere steeper than a
 * gradient: an arc from end to end where its ends are not too steep, else an arc between grades at the limit. Null where
 * the ends are too far apart in level.
 */
export function crestBetween(
  startM: number,
  endM: number,
  startLevelM: number,
  endLevelM: number,
  radiusM: number,
  gradient: number,
): Crest | null {
  const length = endM - startM;
  const mean = (endLevelM - startLevelM) / length;
  if (!(Math.abs(mean) <= gradient + 1e-9)) return null;
  const half = length / (2 * radiusM);
  const base = { startM, endM, levelM: startLevelM, endLevelM, radiusM };
  if (Math.abs(mean) + half <= gradient + 1e-12)
    return { ...base, fromM: startM, toM: endM, before: mean + half, after: mean - half };
  // Else the arc begins on a limiting grade, ends on one, or both.
  const climb = (gradient - mean) * length;
  const drop = (gradient + mean) * length;
  const room = 2 * gradient * gradient * radiusM;
  const bend = (arc: number): number => (arc > 0 ? arc / radiusM : 0);
  if (mean + half >= gradient && climb <= room) {
    const arc = Math.sqrt(2 * Math.max(0, climb) * radiusM);
    return { ...base, fromM: endM - arc, toM: endM, before: gradient, after: gradient - bend(arc) };
  }
  if (mean - half <= -gradient && drop <= room) {
    const arc = Math.sqrt(2 * Math.max(0, drop) * radiusM);
    return { ...base, fromM: startM, toM: startM + arc, before: bend(arc) - gradient, after: -gradient };
  }
  const apex = startM + (length + (endLevelM - startLevelM) / gradient) / 2;
  return {
    ...base,
    fromM: apex - gradient * radiusM,
    toM: apex + gradient * radiusM,
    before: gradient,
    after: -gradient,
  };
}

/** Level at a chainage, m. */
export function crestLevelAt(crest: Crest, chainageM: number): number {
  const { startM, levelM, fromM, toM, before, after, radiusM } = crest;
  const onGrade = levelM + before * (Math.min(chainageM, fromM) - startM);
  if (chainageM <= fromM) return onGrade;
  const along = Math.min(chainageM, toM) - fromM;
  const bend = along > 0 ? (along * along) / (2 * radiusM) : 0;
  return onGrade + before * along - bend + after * Math.max(0, chainageM - toM);
}

/** The same as pieces of the road; those without length are left out. */
export function crestPieces(crest: Crest): RoadPiece[] {
  const { startM, endM, fromM, toM, before, after, radiusM } = crest;
  const level = (x: number): number => crestLevelAt(crest, x);
  return [
    { fromM: startM, toM: fromM, levelM: level(startM), gradient: before, curvature1PerM: 0 },
    { fromM, toM, levelM: level(fromM), gradient: before, curvature1PerM: toM > fromM ? -1 / radiusM : 0 },
    { fromM: toM, toM: endM, levelM: level(toM), gradient: after, curvature1PerM: 0 },
  ]
    .filter((piece) => piece.toM > piece.fromM + 1e-9)
    .map((piece) => ({ ...piece, curvature1PerM: piece.curvature1PerM || 0 }));
}
