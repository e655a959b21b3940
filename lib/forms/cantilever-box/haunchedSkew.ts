import { noSkew, skewTorques, type SkewTorques } from '../common/skewTorque.ts';
import { tubeTwist } from '../concrete-box/tubeTwist.ts';
import type { CantileverModel } from './cantileverModel.ts';
import type { HaunchedSections } from './sectionsAlong.ts';
import type { StagedWeight } from './stages.ts';

/**
 * Torques that bearings along skew ends bring into the end spans. Arms are not on them while they are cantilevered: of own
 * weight only what bends the joined deck counts, falsework that goes, travellers that leave, and creep. Tendons are left
 * out, as they are of the reactions; they would turn the ends back.
 */
export function haunchedSkew(
  model: CantileverModel,
  sections: HaunchedSections,
  weight: StagedWeight,
): SkewTorques {
  const { task, layout, beam, depthM, superimposed, traffic } = model;
  const { skewDeg = 0 } = task;
  if (skewDeg === 0) return noSkew(task.spansM);
  const deck = tubeTwist(layout, beam, { ...sections, depthM });
  const laterKNm = weight.lastingKNm.map(
    (own, i) => own - weight.cantileverKNm[i]! + superimposed.momentKNm[i]!,
  );
  return {
    lastingKNm: skewTorques(deck, laterKNm, skewDeg),
    trafficKNm: skewTorques(deck, traffic.most.momentMaxKNm, skewDeg),
  };
}
