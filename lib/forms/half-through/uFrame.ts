import { halfThroughData } from './halfThroughData.ts';

/** Modulus of steel, kN/m2. */
export const steelKNm2 = 210e6;

/** One frame of a cross-girder and two posts, open at the top. Metres, m4. */
export interface UFrame {
  /** Top of the cross-girder to the middle of the top flange. */
  readonly postM: number;
  /** Axis of the cross-girder to the middle of the top flange. */
  readonly leverM: number;
  /** Length of the cross-girder between the girders. */
  readonly planesM: number;
  /** Cosine of the angle at which the frame stands to the girders, cross-girder and posts in one plane; 1 when absent. */
  readonly cosine?: number;
  readonly postInertiaM4: number;
  readonly crossInertiaM4: number;
}

/**
 * Stiffness of a frame against equal and opposite pushes at both flanges, kN/m:
 * E / (hv3 / 3 Iv + h2 b / 2 Iq) (EN 1993-2 annex D table D.3, from memory; it follows from bending of the three parts).
 * A frame in a plane that is turned by the skew is bent by v cos of a movement v across the girder, and its force holds by
 * cos of itself: cos2 of its stiffness.
 */
export function frameStiffnessKNm(frame: UFrame): number {
  const post = frame.postM ** 3 / (3 * frame.postInertiaM4);
  const cross = (frame.leverM ** 2 * frame.planesM) / (2 * frame.crossInertiaM4);
  return ((frame.cosine ?? 1) ** 2 * steelKNm2) / (post + cross);
}

/**
 * Share of the critical force 2 root(c EI) of a long flange on an elastic bed that is left when its end stands on a
 * spring: 0.5 for a free end, 1 for an unyielding one. From the decaying buckled shape of a half-infinite bar:
 * k = EI a3 (2 n - 1) / root(2 (1 - n)) with a = (c / EI)^(1/4), solved for n.
 * @param endKNm spring at the end, kN/m
 * @param bedKNm2 stiffness of the bed, kN/m per m
 * @param flangeKNm2 lateral bending stiffness of the flange, kNm2
 */
export function endShare(endKNm: number, bedKNm2: number, flangeKNm2: number): number {
  const a = (bedKNm2 / flangeKNm2) ** 0.25;
  const k = endKNm / (flangeKNm2 * a ** 3);
  // k (root(k2 + 4) - k) loses its digits for a stiff end; 4 k / (root(k2 + 4) + k) does not.
  return 0.5 + k / (Math.sqrt(k * k + 4) + k);
}

/**
 * Critical force of the top flange between supports, kN: bar on the bed of its frames, m pi2 EI / L2 with
 * m = (2 / pi2) root(c L4 / EI) (EN 1993-2 6.3.4.2, from memory), at least that of a bar over the whole span, at most
 * that of a bar between two frames.
 */
export function criticalForceKN(
  bedKNm2: number,
  flangeKNm2: number,
  share: number,
  spacingM: number,
  spanM: number,
): number {
  const euler = Math.PI ** 2 * flangeKNm2;
  return Math.min(
    euler / spacingM ** 2,
    Math.max(euler / spanM ** 2, share * 2 * Math.sqrt(bedKNm2 * flangeKNm2)),
  );
}

/** Lateral force on a frame from the bow of the flange it holds, kN; infinite where the flange buckles. */
export function holdingForceKN(
  forceKN: number,
  criticalKN: number,
  flangeKNm2: number,
  spacingM: number,
): number {
  const { short, long, shortUpTo } = halfThroughData.imperfection;
  const halfWaveM = Math.PI * Math.sqrt(flangeKNm2 / criticalKN);
  if (halfWaveM <= shortUpTo * spacingM) return forceKN / short;
  if (!(forceKN < criticalKN)) return Infinity;
  return ((spacingM / halfWaveM) * forceKN) / long / (1 - forceKN / criticalKN);
}

/**
 * Push of the flange on a frame whose cross-girder alone is loaded, kN: its ends turn by `turn` and the flange, held by
 * the frames beside it, resists: turn h / (1.5 d + l3 / 12 EI), d the flexibility of a frame (BS 5400-3 9.12.2, from memory).
 */
export function turningForceKN(
  turn: number,
  leverM: number,
  stiffnessKNm: number,
  flangeKNm2: number,
  spacingM: number,
): number {
  return (turn * leverM) / (1.5 / stiffnessKNm + spacingM ** 3 / (12 * flangeKNm2));
}

/** Share of a push on one frame that it keeps to itself when its flange hands it on: root4(c / 4 EI) l / 2, at most 1. */
export function ownShare(bedKNm2: number, flangeKNm2: number, spacingM: number): number {
  return Math.min(1, ((bedKNm2 / (4 * flangeKNm2)) ** 0.25 * spacingM) / 2);
}
