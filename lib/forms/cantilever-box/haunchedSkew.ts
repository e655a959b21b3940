import { bredt } from '../../mechanics/index.ts';
import { skewTorques, type TwistedDeck } from '../common/skewTorque.ts';
import { tube } from '../concrete-box/boxShear.ts';
import type { CantileverModel } from './cantileverModel.ts';
import type { HaunchedSections } from './sectionsAlong.ts';
import type { StagedWeight } from './stages.ts';

/** Characteristic torques of skew ends by span, kNm: of lasting loads and of traffic; 0 on square supports. */
export interface HaunchedSkew {
  readonly lastingKNm: readonly number[];
  readonly trafficKNm: readonly number[];
}

/** Poisson's ratio of uncracked concrete (EN 1992-1-1 3.1.3, from memory). */
const poisson = 0.2;

/**
 * Torques that bearings along skew ends bring into the end spans. Arms are not on them while they are cantilevered: of own
 * weight only what bends the joined deck counts, falsework that goes, travellers that leave, and creep. Tendons are left
 * out, as they are of the reactions; they would turn the ends back.
 */
export function haunchedSkew(
  model: CantileverModel,
  sections: HaunchedSections,
  weight: StagedWeight,
): HaunchedSkew {
  const { task, superimposed, traffic } = model;
  const { skewDeg = 0 } = task;
  if (skewDeg === 0) {
    const none = task.spansM.map(() => 0);
    return { lastingKNm: none, trafficKNm: none };
  }
  const deck = twistedDeck(model, sections);
  const laterKNm = weight.lastingKNm.map(
    (own, i) => own - weight.cantileverKNm[i]! + superimposed.momentKNm[i]!,
  );
  return {
    lastingKNm: skewTorques(deck, laterKNm, skewDeg),
    trafficKNm: skewTorques(deck, traffic.most.momentMaxKNm, skewDeg),
  };
}

/** Stiffnesses of uncracked sections, the box closed by its outer webs (Bredt); their ratio is all that counts. */
function twistedDeck({ layout, beam, depthM }: CantileverModel, sections: HaunchedSections): TwistedDeck {
  const elements = beam.xM.length - 1;
  const mean = (values: Float64Array, e: number): number => (values[e]! + values[e + 1]!) / 2;
  const elementM = new Float64Array(elements);
  const eiKNm2 = new Float64Array(elements);
  const gjKNm2 = new Float64Array(elements);
  for (let e = 0; e < elements; e++) {
    elementM[e] = beam.xM[e + 1]! - beam.xM[e]!;
    eiKNm2[e] = mean(sections.inertiaM4, e);
    const bottomM = mean(sections.bottomM, e);
    const { enclosedM2, wallM } = tube(layout, mean(depthM, e), bottomM);
    gjKNm2[e] =
      bredt(enclosedM2, [
        { lengthM: layout.cells * layout.spacingM, thicknessM: layout.slab.midM },
        { lengthM: 2 * wallM, thicknessM: mean(sections.webM, e) },
        { lengthM: mean(sections.bottomWidthM, e), thicknessM: bottomM },
      ]) /
      (2 * (1 + poisson));
  }
  return { elementM, eiKNm2, gjKNm2, supportAt: beam.supportAt };
}
