import type { CastInPier } from '../../model/index.ts';
import { skewFigures } from '../common/skewEnds.ts';
import { middleStation } from '../common/middleStation.ts';
import { madeFigures } from '../concrete-box/boxConcrete.ts';
import { underSlabFigures, workingFigures } from '../concrete-box/boxReport.ts';
import { underSlabBarsKg } from '../concrete-box/underSlab.ts';
import { laidWhenJoined, type CantileverModel } from './cantileverModel.ts';
import { haunchedApart } from './haunchedBearings.ts';
import { haunchedBars } from './haunchedBars.ts';
import { worstHold } from './haunchedChecks.ts';
import { heldKNm } from './heldPiers.ts';
import { along, onFalseworkM, strandTotalKg, underSlabTotalM3, travellersOf } from './haunchedLines.ts';
import { restraintInUse } from './restraint.ts';
import type { SizedHaunched } from './sizeHaunched.ts';

/**
 * Piers that the deck is cast in with, as it meets them; none on bearings throughout. What creep turns after the arms are
 * joined is left out: the weight of the arms and their tendons turn the deck opposite ways.
 */
export function haunchedCastIn(model: CantileverModel, { sections }: SizedHaunched): CastInPier[] {
  const { heldPiers, concrete, task, anchors } = model;
  const midspanKNm2 = concrete.ecmMPa * 1e3 * sections.midspan.inertiaM4;
  return heldPiers.map((pier) => ({
    support: pier.support,
    deckTurnKNm: midspanKNm2 * pier.turnKNm,
    laidKNm: Math.abs(heldKNm(pier, laidWhenJoined(task, anchors))),
    trafficKNm: pier.trafficKNm,
  }));
}

/** Own weight of the governing characteristic moment, 0 to 1. */
export function haunchedOwnShare(model: CantileverModel, { weight }: SizedHaunched): number {
  const { most } = model.traffic;
  let worst = 0;
  let share = 0;
  for (let i = 0; i < most.momentMaxKNm.length; i++) {
    const own = weight.lastingKNm[i]!;
    const lasting = own + model.superimposed.momentKNm[i]!;
    const total = lasting + (lasting < 0 ? most.momentMinKNm[i]! : most.momentMaxKNm[i]!);
    if (!(Math.abs(total) > worst)) continue;
    worst = Math.abs(total);
    share = own / total;
  }
  return Math.min(1, Math.max(0, share));
}

/** Named figures of arms that are held down and of the spans that hold them; none where all arms are balanced. */
function heldFigures(model: CantileverModel, { weight, thicknesses }: SizedHaunched): Record<string, number> {
  const worst = worstHold(weight.holds);
  if (!worst) return {};
  const figures: Record<string, number> = {
    heldArmM: Math.max(...model.arms.map(({ armM, balancedM }) => armM - balancedM)),
    upliftKN: worst.upliftKN,
    holdingKN: worst.weightKN,
  };
  thicknesses.holding.forEach((own, span) => {
    if (!own) return;
    figures[`span${span + 1}HoldingWebM`] = own.webM;
    figures[`span${span + 1}HoldingBottomM`] = own.bottomM;
  });
  return figures;
}

/** Named figures of what shafts do that the deck is cast in with; none where it stands on bearings or they are not known. */
function restraintFigures(model: CantileverModel, { sections }: SizedHaunched): Record<string, number> {
  const held = restraintInUse(model, sections);
  if (held === null) return {};
  const figures: Record<string, number> = {
    pulledKN: held.lastingPulledKN.reduce((most, kN) => Math.max(most, kN), 0),
  };
  model.task.spansM.forEach((_, span) => {
    figures[`span${span + 1}RestraintKNm`] = held.lastingMax[middleStation(model.beam, span)]!;
  });
  return figures;
}

/** Named figures of section, stages, statics and tendons. */
export function haunchedFigures(model: CantileverModel, box: SizedHaunched): Record<string, number> {
  const { layout, beam, task, traffic, lengthM } = model;
  const { sections, found, weight, thicknesses, stresses, shear } = box;
  const areaM2 = lengthM * task.deck.widthM;
  const underM3 = underSlabTotalM3(model);
  const concreteM3 =
    underM3 + weight.boxM3 + weight.blistersM3 + weight.diaphragmM3.reduce((sum, m3) => sum + m3, 0);
  const { pairs } = travellersOf(model);
  const apartM = haunchedApart(model, box);
  const most = (values: Float64Array): number => values.reduce((a, b) => Math.max(a, b), 0);
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
    boxInnerHeightM: sections.innerM,
    areaM2: sections.midspan.areaM2,
    inertiaM4: sections.midspan.inertiaM4,
    centroidFromTopM: sections.midspan.topM,
    pierAreaM2: sections.pier.areaM2,
    pierInertiaM4: sections.pier.inertiaM4,
    pierCentroidFromTopM: sections.pier.topM,
    governingSpanM: model.governingM,
    armM: model.arms.length > 0 ? Math.max(...model.arms.map(({ armM }) => armM)) : 0,
    segmentM: weight.segmentM,
    segmentsPerArm: weight.segmentsPerArm,
    heaviestSegmentKN: weight.heaviestKN,
    travellerKN: weight.travellerKN,
    travellerPairs: pairs,
    unbalancedMomentKNm: weight.unbalancedKNm,
    onFalseworkM: onFalseworkM(model).reduce((sum, m) => sum + m, 0),
    topStrandCount: most(found.top),
    bottomStrandCount: most(found.bottom),
    topStrandMean: along(model, found.top) / lengthM,
    bottomStrandMean: along(model, found.bottom) / lengthM,
    jackingStressMPa: found.stresses.top.jackMPa,
    lastingTopStressMPa: found.stresses.top.lastingMPa,
    lastingBottomStressMPa: found.stresses.bottom.lastingMPa,
    pierSoffitMPa: stresses.pierSoffit.stressMPa,
    ...skewFigures(shear.skewKNm, apartM[0]!),
    bearingsApartM: Math.min(...apartM),
    webTrafficShare: shear.webShare,
    shearDesignKN: shear.mostKN,
    chordShearKN: shear.chordKN,
    concreteM3M2: concreteM3 / areaM2,
    barsKgM3: (haunchedBars(model, box).totalKg + underSlabBarsKg(layout, underM3, lengthM)) / concreteM3,
    strandKgM2: strandTotalKg(model, box) / areaM2,
  };
  Object.assign(figures, heldFigures(model, box));
  Object.assign(figures, restraintFigures(model, box));
  Object.assign(figures, madeFigures(model, beam.xM, sections.areaM2));
  for (let span = 0; span < task.spansM.length; span++) {
    const middle = middleStation(beam, span);
    figures[`span${span + 1}OwnKNm`] = weight.lastingKNm[middle]!;
    figures[`span${span + 1}OpenKNm`] = weight.openKNm[middle]!;
    figures[`span${span + 1}TrafficKNm`] = traffic.most.momentMaxKNm[middle]!;
    figures[`span${span + 1}ParasiticKNm`] = found.parasiticBottomKNm[middle]!;
  }
  for (let pier = 1; pier < task.spansM.length; pier++) {
    const station = beam.supportAt[pier]!;
    figures[`pier${pier}CantileverKNm`] = weight.cantileverKNm[station]!;
    figures[`pier${pier}OpenKNm`] = weight.openKNm[station]!;
    figures[`pier${pier}OwnKNm`] = weight.lastingKNm[station]!;
    figures[`pier${pier}AtOnceKNm`] = weight.atOnce.momentKNm[station]!;
    figures[`pier${pier}TrafficKNm`] = traffic.most.momentMinKNm[station]!;
  }
  return figures;
}
