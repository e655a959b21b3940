import type { EdgeCase } from './edgeCase.ts';
import type { EdgeStatics } from './edgeStatics.ts';
import { criticalOnBedKN, flangeStiffness, flangeUse, noFlangeUse } from './flangeUse.ts';
import { halfThroughData } from './halfThroughData.ts';
import { edgePlates, edgeRules, edgeWebKN, spacingAt, type EdgeGirder } from './sizeEdgeGirder.ts';
import { elementsPerSpan } from '../composite-i/elementsPerSpan.ts';
import { holdingForceKN, ownShare, steelKNm2, turningForceKN } from './uFrame.ts';

/** Worst shares used of a sized edge girder and the forces on its frames. */
export interface EdgeUse {
  readonly sag: number;
  /** Of it, what the top flange uses as a bar between frames. */
  readonly topFlange: number;
  readonly hog: number;
  readonly fatigue: number;
  readonly shear: { readonly demandKN: number; readonly capacityKN: number };
  /** Least critical over design force in the top flange. */
  readonly criticalRatio: number;
  readonly topForceKN: number;
  readonly criticalKN: number;
  /** Forces on a frame at the top flange, design, kN. */
  readonly holdingKN: number;
  readonly turningKN: number;
  /** Moment at the foot of a post and what post and cross-girder may carry, kNm. */
  readonly postKNm: number;
  readonly postMayKNm: number;
  readonly impactKNm: number;
  readonly impactMayKNm: number;
}

/** Looks through all elements of a girder and at its frames. */
export function edgeUse(c: EdgeCase, statics: EdgeStatics, girder: EdgeGirder): EdgeUse {
  const use = noFlangeUse();
  const rules = edgeRules(c);
  const { demand, choice } = girder;
  let sag = 0;
  let topFlange = 0;
  let hog = 0;
  let fatigue = 0;
  let worst = { share: -1, demandKN: 0, capacityKN: 1 };
  let criticalRatio = Infinity;
  let topForceKN = 0;
  let criticalKN = Infinity;
  let holdingKN = 0;
  for (let e = 0; e < c.telling; e++) {
    const plates = edgePlates(girder, e);
    const bed = girder.beds[Math.floor(e / elementsPerSpan)]!;
    for (const i of [e, e + 1]) {
      flangeUse(use, plates, bed, rules, demand.sagKNm[i]!, demand.hogKNm[i]!, statics.rangeKNm[i]!);
      sag = Math.max(sag, use.sagTop, use.sagBottom);
      topFlange = Math.max(topFlange, use.sagTop);
      hog = Math.max(hog, use.hogTop, use.hogBottom);
      fatigue = Math.max(fatigue, use.fatigueTop, use.fatigueBottom);
      if (!(use.forceKN > 0)) continue;
      if (use.criticalKN / use.forceKN < criticalRatio) {
        criticalRatio = use.criticalKN / use.forceKN;
        topForceKN = use.forceKN;
        criticalKN = use.criticalKN;
      }
      holdingKN = Math.max(
        holdingKN,
        holdingForceKN(use.forceKN, use.criticalKN, flangeStiffness(plates), bed.spacingM),
      );
    }
    const capacityKN = edgeWebKN(
      c,
      plates.webM,
      plates.heightM - plates.topM - plates.bottomM,
      spacingAt(c, choice, e),
    );
    const share = demand.shearKN[e]! / capacityKN;
    if (share > worst.share) worst = { share, demandKN: demand.shearKN[e]!, capacityKN };
  }
  const middle = edgePlates(girder, girder.topM.indexOf(Math.max(...girder.topM)));
  const frames = framesOf(c, girder, holdingKN, flangeStiffness(middle));
  return {
    sag,
    topFlange,
    hog,
    fatigue,
    shear: { demandKN: worst.demandKN, capacityKN: worst.capacityKN },
    criticalRatio,
    topForceKN,
    criticalKN: Number.isFinite(criticalKN) ? criticalKN : criticalOnBedKN(middle, girder.beds[0]!),
    holdingKN,
    ...frames,
  };
}

/** Forces on an ordinary frame: the flange it holds, its cross-girder loaded alone, wind, and a vehicle against it. */
function framesOf(
  c: EdgeCase,
  girder: EdgeGirder,
  holdingKN: number,
  flangeKNm2: number,
): Pick<EdgeUse, 'turningKN' | 'postKNm' | 'postMayKNm' | 'impactKNm' | 'impactMayKNm'> {
  const { crossGirder, slab } = girder.choice.floor;
  const { frame, frameKNm } = girder;
  const spacingM = Math.max(...girder.beds.map((bed) => bed.spacingM));
  const { traffic } = c.standard.factors.uls;
  // A turned frame moves the flange across by 1 / cos of what its head moves, and is bent by 1 / cos of what it holds.
  const { cosine = 1 } = frame;
  // End rotation of a simple beam under a bending moment like that of a uniform load: M b / 3 E I.
  const turn =
    (traffic * crossGirder.trafficCharacteristicKNm * frame.planesM) /
    (3 * steelKNm2 * crossGirder.shortInertiaM4);
  const turningKN = turningForceKN(turn / cosine, frame.leverM, frameKNm, flangeKNm2, spacingM);
  const wind = (halfThroughData.windKNm2.value * spacingM * frame.postM ** 2) / 2;
  const fy = c.yieldMPa(girder.choice.post.webMm / 1000) * 1000;
  const gamma = c.standard.resistance.steel;
  const { plates } = crossGirder;
  const crossModulus = crossGirder.steelInertiaM4 / (plates.heightM / 2);
  const impact = halfThroughData.impact[c.task.standard];
  const impactArm = Math.min(frame.postM, impact.heightM + c.task.deck.surfacingM + slab.midM);
  const weakest = Math.min(girder.post.modulusM3, crossModulus);
  return {
    turningKN,
    postKNm: ((holdingKN + turningKN) * frame.postM + wind) / cosine,
    postMayKNm: (girder.post.modulusM3 * fy) / gamma,
    impactKNm: ownShare(frameKNm / spacingM, flangeKNm2, spacingM) * impact.forceKN * impactArm,
    impactMayKNm: weakest * fy,
  };
}

/** Greatest share used of all that is looked at. */
export function worstUse(use: EdgeUse): number {
  return Math.max(
    use.sag,
    use.hog,
    use.fatigue,
    use.shear.demandKN / use.shear.capacityKN,
    use.postKNm / use.postMayKNm,
    use.impactKNm / use.impactMayKNm,
  );
}
