import { trafficEnvelope, trafficOnDeck } from '../../actions/index.ts';
import { compositeData } from '../composite-i/compositeData.ts';
import { elementsPerSpan } from '../composite-i/elementsPerSpan.ts';
import { girderFigures, type GirderFigures } from '../composite-i/girderSection.ts';
import { platesAt } from '../composite-i/plateRun.ts';
import type { SizedGirder } from '../composite-i/sizeGirder.ts';
import { noSkew, skewTorques, type SkewTorques, type TwistedDeck } from '../common/skewTorque.ts';
import type { BoxGirderModel } from './boxGirderModel.ts';
import { shearRatioOf, steelPoisson, tubConstants } from './tubTorsion.ts';

const figures: GirderFigures = { areaM2: 0, centroidM: 0, inertiaM4: 0 };

/**
 * Characteristic torques that bearings along skew ends bring into the end spans, of all boxes together. The open tub yields
 * to the twist of its own weight and of the wet slab: what counts is what comes on the closed box, superimposed load and
 * the shrinkage of its slab by the ratio of moduli of lasting loads, and traffic.
 */
export function boxGirderSkew(model: BoxGirderModel, { run, effects }: SizedGirder): SkewTorques {
  const { task, tubs, standardId, modularRatio, lasting, short } = model;
  const { skewDeg = 0 } = task;
  if (skewDeg === 0) return noSkew(task.spansM);
  const { superimposed, shrinkage, shrunk1PerM, shortBeam, traffic } = effects;
  const lastingDeck = deckOf(model, run, lasting, modularRatio * compositeData.longTermRatio.value);
  const { eiKNm2 } = lastingDeck;
  const last = eiKNm2.length - 1;
  const lastingKNm = shrunk1PerM.map((curvature, i) => {
    const stiffness = (eiKNm2[Math.max(0, i - 1)]! + eiKNm2[Math.min(last, i)]!) / 2;
    return tubs.count * (superimposed.momentKNm[i]! + shrinkage.momentKNm[i]!) + stiffness * curvature;
  });
  // Two halves of the only box carry the deck; of several the worst carries more than its part.
  const trafficKNm =
    tubs.boxes === 1
      ? traffic.momentMaxKNm.map((half) => tubs.count * half)
      : trafficEnvelope(shortBeam, trafficOnDeck(standardId, task.deck), { deflection: false }).momentMaxKNm;
  return {
    lastingKNm: skewTorques(lastingDeck, lastingKNm, skewDeg),
    trafficKNm: skewTorques(deckOf(model, run, short, modularRatio), trafficKNm, skewDeg),
  };
}

/**
 * All boxes by their elements. The slab is cracked for bending where it is in the statics, and whole throughout for
 * torsion, which gives the greater torque.
 */
function deckOf(
  model: BoxGirderModel,
  run: SizedGirder['run'],
  tops: BoxGirderModel['short'],
  modularRatio: number,
): TwistedDeck {
  const { tubs, shape, slab, elementM, modulusKNm2, isCracked, cracked, task } = model;
  const eiKNm2 = elementM.map((_, e) => {
    const top = isCracked[e] === 1 ? cracked[e] : tops[e];
    return tubs.count * modulusKNm2 * girderFigures(figures, platesAt(run, e), top).inertiaM4;
  });
  const shearModulusKNm2 = modulusKNm2 / (2 * (1 + steelPoisson));
  const gjKNm2 = elementM.map((_, e) => {
    const { webM, bottomM } = platesAt(run, e);
    const { closedM4 } = tubConstants(shape, slab.meanM, shearRatioOf(modularRatio), webM, bottomM);
    return tubs.boxes * shearModulusKNm2 * closedM4;
  });
  const supportAt = Array.from({ length: task.spansM.length + 1 }, (_, j) => j * elementsPerSpan);
  return { elementM, eiKNm2, gjKNm2, supportAt };
}
