import { noSkew, skewTorques, type SkewTorques } from '../common/skewTorque.ts';
import type { BoxModel } from './boxModel.ts';
import type { SizedBox } from './sizeBox.ts';
import { tubeTwist } from './tubeTwist.ts';

/**
 * Characteristic torques that bearings along skew ends bring into the end spans of a box of constant depth. Cast on
 * falsework it comes down on them with its own weight and its tendons stressed, which bend it back; launched it is set on
 * them when both are in it, and only what is laid on it later counts.
 */
export function boxSkew(
  model: BoxModel,
  { sections, own, tendons }: Pick<SizedBox, 'sections' | 'own' | 'tendons'>,
): SkewTorques {
  const { task, layout, beam, superimposed, traffic } = model;
  const { skewDeg = 0 } = task;
  if (skewDeg === 0) return noSkew(task.spansM);
  const { webM, bottomM, inertiaM4 } = sections;
  const deck = tubeTwist(layout, beam, {
    webM,
    bottomM,
    inertiaM4,
    depthM: inertiaM4.map(() => task.depthM),
    bottomWidthM: inertiaM4.map(() => sections.span.bottomWidthM),
  });
  const isLaunched = task.method === 'launch';
  const lastingKNm = superimposed.momentKNm.map((laid, i) => {
    const tendon = tendons.forceKN * (tendons.parasiticM[i]! - tendons.share[i]! * tendons.eccentricityM[i]!);
    return laid + (isLaunched ? 0 : own.effects.momentKNm[i]! + tendon);
  });
  return {
    lastingKNm: skewTorques(deck, lastingKNm, skewDeg),
    trafficKNm: skewTorques(deck, traffic.most.momentMaxKNm, skewDeg),
  };
}
