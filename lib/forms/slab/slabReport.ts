import type { SupportReaction } from '../../model/index.ts';
import type { SizedSlab } from './sizeSlab.ts';
import { strandKg } from './slabLines.ts';
import type { SlabModel } from './slabModel.ts';

/** Characteristic reactions of the whole deck; the parasitic part of the tendons adds up to nothing and is left out. */
export function slabReactions(model: SlabModel): SupportReaction[] {
  return model.supportsM.map((_, j) => ({
    permanentKN: model.own.effects.reactionKN[j]! + model.superimposed.reactionKN[j]! + model.solidKN[j]!,
    trafficMaxKN: model.traffic.reactionMaxKN[j]!,
    trafficMinKN: model.traffic.reactionMinKN[j]!,
  }));
}

/** Own weight of the governing characteristic moment, 0 to 1. */
export function ownWeightShare({ traffic, own, superimposed }: SlabModel): number {
  let worst = 0;
  let share = 0;
  own.effects.momentKNm.forEach((moment, i) => {
    const lasting = moment + superimposed.momentKNm[i]!;
    const total = lasting + (lasting < 0 ? traffic.most.momentMinKNm : traffic.most.momentMaxKNm)[i]!;
    if (!(Math.abs(total) > worst)) return;
    worst = Math.abs(total);
    share = moment / total;
  });
  return Math.min(1, Math.max(0, share));
}

/** Named figures of section, strips, statics and steel. */
export function slabFigures(model: SlabModel, slab: SizedSlab): Record<string, number> {
  const { outline, strips, task, beam, lengthM, traffic } = model;
  const { tendons, low, high, across, shear } = slab;
  const areaM2 = lengthM * task.deck.widthM;
  const barsKg = Object.values(slab.barsKg).reduce((sum, kg) => sum + kg, 0);
  const figures: Record<string, number> = {
    soffitWidthM: outline.soffitM,
    wingM: outline.wingM,
    wingRootM: outline.wingRootM,
    voids: outline.voids.length,
    voidDiameterM: outline.voidDiameterM,
    areaM2: model.span.areaM2,
    inertiaM4: model.span.inertiaM4,
    centroidFromTopM: model.span.topM,
    vehicleWidthM: strips.vehicleWidthM,
    vehicleShearWidthM: strips.shearWidthM,
    heaviestUniformKNm2: strips.uniformKNm2,
    evenTrafficShare: traffic.evenShare,
    wheelsAcrossKNm: strips.acrossKNm ?? 0,
    barsLowM2PerM: low.peakM2 / low.widthM,
    barsLowSizeM: low.barM,
    barsAcrossM2PerM: across.lowM2PerM,
    shearAloneUse: shear.aloneUse,
    linkedM: shear.linkedM,
    concreteM3M2: model.concreteM3 / areaM2,
    barsKgM3: barsKg / model.concreteM3,
    strandKgM3: strandKg(model, slab) / model.concreteM3,
  };
  if (task.spansM.length > 1) {
    figures.barsHighM2PerM = high.peakM2 / high.widthM;
    figures.barsHighSizeM = high.barM;
  }
  if (slab.punching) figures.bearingsPerPier = slab.punching.bearings;
  if (tendons) {
    figures.tendonCount = tendons.count;
    figures.strandCount = tendons.strands;
    figures.meanStrandShare = tendons.meanShare;
    figures.tendonForceKN = tendons.forceKN;
    figures.jackingStressMPa = tendons.stress.jackMPa;
    figures.lastingStressMPa = tendons.stress.lastingMPa;
    figures.eccentricityMidspanM = Math.max(...tendons.eccentricityM);
    figures.eccentricityPierM = Math.min(...tendons.eccentricityM);
  }
  for (let span = 0; span < task.spansM.length; span++) {
    const middle = (beam.supportAt[span]! + beam.supportAt[span + 1]!) >> 1;
    figures[`span${span + 1}OwnKNm`] = model.own.effects.momentKNm[middle]!;
    figures[`span${span + 1}TrafficKNm`] = traffic.most.momentMaxKNm[middle]!;
  }
  for (let pier = 1; pier < task.spansM.length; pier++) {
    const station = beam.supportAt[pier]!;
    figures[`pier${pier}OwnKNm`] = model.own.effects.momentKNm[station]!;
    figures[`pier${pier}TrafficKNm`] = traffic.most.momentMinKNm[station]!;
    if (tendons) figures[`pier${pier}ParasiticKNm`] = tendons.forceKN * tendons.parasiticM[station]!;
  }
  return figures;
}
