import type { EndMoments } from './framedShaft.ts';

/**
 * One combination of characteristic loads at a support. Forces in kN; a horizontal force acts at its own level, m.
 * `along` is positive towards the span for an abutment and has no sign for a pier.
 */
export interface Combo {
  readonly verticalKN: number;
  readonly alongKN: number;
  readonly alongLevelM: number;
  /** Moment in the plane of the road at `alongLevelM`, positive towards the span for an abutment; none unless given. */
  readonly momentAlongKNm?: number;
  readonly acrossKN: number;
  readonly acrossLevelM: number;
  /** Moments at the ends of a shaft in one with the deck that come of its movement: part of the others, with a factor of their own. */
  readonly imposed?: Pick<EndMoments, 'topKNm' | 'footKNm'>;
  /** Factor on allowable ground and pile loads: 1, or more for accidental loads. */
  readonly capacity: number;
  /** Factor on the loads for the check of the shaft at the ultimate limit state. */
  readonly ultimate: number;
}

/** Soil held behind an abutment; it loads the heel of the footing and pushes towards the span. */
export interface Backfill {
  /** Level of the road over it, m. */
  readonly topLevelM: number;
  readonly widthM: number;
  /** Share of the plan outside the stem that lies behind it, under the soil. */
  readonly heelShare: number;
  /** True where the wall is held at both ends, so that the loads on the foundation have the pressure of the soil in them. */
  readonly inLoads?: true;
}

/** Loads of a combination brought down to one level: V, H and M in kN and kNm. */
export interface Resultant {
  verticalKN: number;
  alongKN: number;
  acrossKN: number;
  momentAlongKNm: number;
  momentAcrossKNm: number;
}

/** A resultant to be written to. */
export const noForces = (): Resultant => ({
  verticalKN: 0,
  alongKN: 0,
  acrossKN: 0,
  momentAlongKNm: 0,
  momentAcrossKNm: 0,
});

/** Brings the loads of a combination down to `levelM`; writes them to `into` and hands it back. */
export function resultantAt(combo: Combo, levelM: number, into: Resultant = noForces()): Resultant {
  into.verticalKN = combo.verticalKN;
  into.alongKN = combo.alongKN;
  into.acrossKN = combo.acrossKN;
  into.momentAlongKNm = (combo.momentAlongKNm ?? 0) + combo.alongKN * Math.max(0, combo.alongLevelM - levelM);
  into.momentAcrossKNm = combo.acrossKN * Math.max(0, combo.acrossLevelM - levelM);
  return into;
}
