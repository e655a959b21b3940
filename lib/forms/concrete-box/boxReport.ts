import type { SupportReaction } from '../../model/index.ts';
import { skewFigures } from '../common/skewEnds.ts';
import { skewDesignKNm } from '../common/skewTorque.ts';
import type { SkewTorques } from '../common/skewTorque.ts';
import { boxBars } from './boxBars.ts';
import { strandKg } from './boxLines.ts';
import { bearingsApart } from './boxBearings.ts';
import { madeFigures } from './boxConcrete.ts';
import type { BoxLayout } from './boxLayout.ts';
import type { BoxModel } from './boxModel.ts';
import { betweenZeros, workingWidthM } from './shearLag.ts';
import type { SizedBox } from './sizeBox.ts';
import type { Struts } from './struts.ts';
import { underSlabBarsKg, underSlabM3M } from './underSlab.ts';

/**
 * Characteristic reactions of the whole deck: own weight with diaphragms, superimposed load, traffic. The parasitic part
 * of the tendons adds up to nothing and is left out: it relieves the piers and presses the ends down, and both would then
 * hang on the drape.
 */
export function boxReactions(model: BoxModel, box: SizedBox): SupportReaction[] {
  const { most, load } = model.traffic;
  // The whole deck weighs what it weighs: a skew only heaps it on the obtuse corners.
  const { obtuse = 1 } = load;
  const gamma = model.standard.unitWeights.concreteKNm3;
  const last = model.supportsM.length - 1;
  // At the two ends the reaction is the shear beside it.
  const end = (j: number): number =>
    j === 0 ? most.shearMaxKN[0]! : j === last ? -most.shearMinKN[most.shearMinKN.length - 1]! : 0;
  return model.supportsM.map((_, j) => ({
    permanentKN:
      box.own.effects.reactionKN[j]! + model.superimposed.reactionKN[j]! + gamma * box.own.diaphragmM3[j]!,
    trafficMaxKN: Math.max(most.reactionMaxKN[j]!, end(j)) / obtuse,
    trafficMinKN: most.reactionMinKN[j]! / obtuse,
  }));
}

/** Own weight of the governing characteristic moment, 0 to 1. */
export function ownWeightShare(model: BoxModel, box: SizedBox): number {
  const { most } = model.traffic;
  let worst = 0;
  let share = 0;
  for (let i = 0; i < most.momentMaxKNm.length; i++) {
    const own = box.own.effects.momentKNm[i]!;
    const lasting = own + model.superimposed.momentKNm[i]!;
    const total = lasting + (lasting < 0 ? most.momentMinKNm[i]! : most.momentMaxKNm[i]!);
    if (!(Math.abs(total) > worst)) continue;
    worst = Math.abs(total);
    share = own / total;
  }
  return Math.min(1, Math.max(0, share));
}

/**
 * Named figures of section, statics and tendons.
 * @param skew torques of skew ends by span
 */
export function boxFigures(model: BoxModel, box: SizedBox, skew: SkewTorques): Record<string, number> {
  const { layout, beam, task, traffic, lengthM } = model;
  const { sections, tendons, own, thicknesses } = box;
  const areaM2 = lengthM * task.deck.widthM;
  const apartM = bearingsApart(sections.span.bottomWidthM);
  const underM3 = underSlabM3M(layout, task.depthM) * lengthM;
  const concreteM3 = underM3 + own.boxM3 + own.blistersM3 + own.diaphragmM3.reduce((sum, m3) => sum + m3, 0);
  const barsKg = boxBars(model, box).totalKg + underSlabBarsKg(layout, underM3, lengthM);
  const strands = tendons.strandsPerWeb * layout.webs + tendons.straightStrands;
  const figures: Record<string, number> = {
    cells: layout.cells,
    webs: layout.webs,
    webSpacingM: layout.spacingM,
    overhangM: layout.overhangM,
    topSlabMidM: layout.slab.midM,
    topSlabRootM: layout.slab.rootM,
    ...(layout.across
      ? { acrossStrandKgM2: layout.across.strandKgM2, acrossForceKNm: layout.across.forceKNm }
      : {}),
    ...workingFigures(layout, task.spansM),
    ...underSlabFigures(layout),
    webM: thicknesses.webM,
    webAtSupportsM: thicknesses.supportWebM,
    bottomSlabM: thicknesses.bottomM,
    bottomSlabAtPiersM: thicknesses.pierBottomM,
    boxInnerHeightM: Math.max(0, sections.pier.outline.innerM),
    areaM2: sections.span.areaM2,
    inertiaM4: sections.span.inertiaM4,
    centroidFromTopM: sections.span.topM,
    pierAreaM2: sections.pier.areaM2,
    pierInertiaM4: sections.pier.inertiaM4,
    enclosedAreaM2: box.shear.enclosedM2,
    bearingsApartM: apartM,
    ...skewFigures(
      skewDesignKNm(skew, {
        lasting: model.standard.factors.uls.permanent,
        traffic: model.standard.factors.uls.traffic,
      }),
      apartM,
    ),
    webTrafficShare: box.shear.webShare,
    tendonCount: tendons.group.tendonsPerWeb * layout.webs,
    strandsPerTendon: tendons.group.strandsPerTendon,
    strandCount: strands,
    meanStrandShare: tendons.meanShare,
    tendonForceKN: tendons.forceKN,
    launchingForceKN: tendons.straightInitialKN,
    jackingStressMPa: tendons.stress.jackMPa,
    lastingStressMPa: tendons.stress.lastingMPa,
    eccentricityMidspanM: Math.max(...tendons.eccentricityM),
    eccentricityPierM: Math.min(...tendons.eccentricityM),
    endDiaphragmKN: model.standard.unitWeights.concreteKNm3 * own.diaphragmM3[0]!,
    shearDesignKN: box.shear.mostKN,
    concreteM3M2: concreteM3 / areaM2,
    barsKgM3: barsKg / concreteM3,
    strandKgM2:
      strandKg(model, tendons.strandsPerWeb * layout.webs * tendons.meanShare + tendons.straightStrands) /
      areaM2,
  };
  Object.assign(figures, madeFigures(model, beam.xM, sections.areaM2));
  for (let span = 0; span < task.spansM.length; span++) {
    const middle = (beam.supportAt[span]! + beam.supportAt[span + 1]!) >> 1;
    figures[`span${span + 1}OwnKNm`] = own.effects.momentKNm[middle]!;
    figures[`span${span + 1}TrafficKNm`] = traffic.most.momentMaxKNm[middle]!;
  }
  for (let pier = 1; pier < task.spansM.length; pier++) {
    const station = beam.supportAt[pier]!;
    figures[`pier${pier}OwnKNm`] = own.effects.momentKNm[station]!;
    figures[`pier${pier}TrafficKNm`] = traffic.most.momentMinKNm[station]!;
    figures[`pier${pier}ParasiticKNm`] = tendons.forceKN * tendons.parasiticM[station]!;
  }
  if (box.launch) {
    figures.launchingHogKNm = box.launch.hogKNm;
    figures.launchingSagKNm = box.launch.sagKNm;
  }
  return figures;
}

/** Named figures of the width of the deck that works in bending. */
export function workingFigures(layout: BoxLayout, spansM: readonly number[]): Record<string, number> {
  const { inSpanM, overPierM } = betweenZeros(spansM);
  return {
    workingWidthM: workingWidthM(layout, inSpanM),
    workingWidthAtPiersM: workingWidthM(layout, overPierM),
  };
}

/** Named figures of struts or ribs; none without. */
export function underSlabFigures({ struts, ribs }: BoxLayout): Record<string, number> {
  return {
    ...(struts ? strutFigures(struts) : {}),
    ...(ribs
      ? {
          ribDepthM: ribs.rootM,
          ribRootKNm: ribs.rootMomentKNm,
          ribInsideKNm: ribs.insideMomentKNm,
          ribShearKN: ribs.shearKN,
        }
      : {}),
  };
}

function strutFigures({
  outM,
  sideM,
  lengthM,
  riseM,
  forceKN,
  tie,
  hangKNm,
  beamM,
}: Struts): Record<string, number> {
  return {
    strutsOutM: outM,
    strutRiseM: riseM,
    strutLengthM: lengthM,
    strutSideM: sideM,
    strutForceKN: forceKN,
    strutTieKNm: tie.ultimateKNm,
    strutHangKNm: hangKNm,
    strutBeamM: beamM,
  };
}
