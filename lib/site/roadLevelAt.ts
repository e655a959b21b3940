import type { RoadPiece, RoadProfile } from '../model/index.ts';

/** Level on a piece of the road, or on its parabola beyond it, m. */
export function pieceLevelAt(piece: RoadPiece, chainageM: number): number {
  const t = chainageM - piece.fromM;
  return piece.levelM + piece.gradient * t + (piece.curvature1PerM * t * t) / 2;
}

/** Gradient on a piece of the road, or on its parabola beyond it. */
export const pieceGradientAt = (piece: RoadPiece, chainageM: number): number =>
  piece.gradient + piece.curvature1PerM * (chainageM - piece.fromM);

/** Which piece of a road a chainage lies on; -1 before the first and one past the last beyond them. */
export function pieceAt({ pieces }: Pick<RoadProfile, 'pieces'>, chainageM: number): number {
  if (chainageM < pieces[0]!.fromM) return -1;
  for (let i = 0; i < pieces.length; i += 1) if (chainageM <= pieces[i]!.toM) return i;
  return pieces.length;
}

/** Finished road level at a chainage, m: on its pieces, and straight on in their last direction beyond them. */
export function roadLevelAt(profile: Pick<RoadProfile, 'pieces'>, chainageM: number): number {
  const { pieces } = profile;
  const at = pieceAt(profile, chainageM);
  if (at < 0) {
    const { fromM, levelM, gradient } = pieces[0]!;
    return levelM + gradient * (chainageM - fromM);
  }
  if (at < pieces.length) return pieceLevelAt(pieces[at]!, chainageM);
  const last = pieces.at(-1)!;
  return pieceLevelAt(last, last.toM) + pieceGradientAt(last, last.toM) * (chainageM - last.toM);
}
