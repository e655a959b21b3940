import { END_SHARE } from '../common/skewTorque.ts';
import { bottomWidth } from './boxLayout.ts';
import type { BoxEffects } from './boxEffects.ts';
import { steelBoxData } from './steelBoxData.ts';
import { elementsPerSpan, type SteelBoxModel } from './steelBoxModel.ts';

/** Two bearings under the box at one support. */
export interface BearingPair {
  /** Distance at which eccentric traffic and curvature lift neither, m. */
  readonly neededM: number;
  /** Distance they have, m: inside the webs, or as far under brackets of the diaphragm as is needed and possible. */
  readonly apartM: number;
  /** Farthest they may stand, m, and length of the two brackets together; 0 inside the webs. */
  readonly mostM: number;
  readonly bracketsM: number;
}

/**
 * Bearings at a support as eccentric traffic over both spans beside it, curvature and skew ends turn the box. What makes the torque
 * presses at least so much that it stands no farther out than the outer lane; what slopes a skew end presses it by the
 * uniform load of the end span.
 * @param ownKN lasting reaction of the steel, kN
 */
export function bearingPair(
  model: SteelBoxModel,
  effects: BoxEffects,
  support: number,
  ownKN: number,
): BearingPair {
  const { layout, torsion, standard, task } = model;
  const { uls } = standard.factors;
  const { spansM, deck } = task;
  const besideM = ((spansM[support - 1] ?? 0) + (spansM[support] ?? 0)) / 2;
  const uniformKNm = torsion.udlTorqueKNmPerM + torsion.footwayTorqueKNmPerM;
  const trafficKNm = uls.traffic * (torsion.vehicleTorqueKNm + uniformKNm * besideM);
  const farthestM = (deck.carriagewayM - standard.lanes.widthM) / 2 + Math.abs(deck.carriagewayOffsetM);
  const lastingKN =
    uls.permanentFavourable * ownKN + uls.superimposedFavourable * effects.superimposed.reactionKN[support]!;
  const shorterM = Math.min(spansM[support - 1] ?? Infinity, spansM[support] ?? Infinity);
  const skewKNm = effects.skewAtKNm[support]!;
  const trafficKN = Math.max(
    farthestM > 0 ? trafficKNm / farthestM : 0,
    skewKNm > 0 ? uls.traffic * END_SHARE * model.traffic.udlKNm * shorterM : 0,
  );
  const pressKN = (lastingKN + trafficKN) / 2;
  const neededM = pressKN > 0 ? (trafficKNm + effects.curveAtKNm[support]! + skewKNm) / pressKN : Infinity;
  const bottomM = bottomWidth(layout, model.depthM[support * elementsPerSpan]!);
  const insideM = Math.max(0.5 * bottomM, bottomM - steelBoxData.bearings.fromWebsM);
  const mostM = Math.max(insideM, layout.topM);
  const apartM = Math.min(Math.max(insideM, neededM), mostM);
  return { neededM, apartM, mostM, bracketsM: apartM - insideM };
}
