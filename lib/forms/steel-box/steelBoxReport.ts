import type { SupportReaction } from '../../model/index.ts';
import { bredt } from '../../mechanics/index.ts';
import { skewFigures } from '../common/skewEnds.ts';
import { bearingPair } from './bearingsApart.ts';
import { cantileveredSpans } from './erection.ts';
import { bottomWidth } from './boxLayout.ts';
import { boxSection, noSection } from './boxSection.ts';
import { bottomPressedShare } from './boxUse.ts';
import { webShearKN } from './sizePlates.ts';
import { steelBoxData } from './steelBoxData.ts';
import { temporaryTowers } from './steelBoxLines.ts';
import type { SizedSteelBox } from './sizeSteelBox.ts';
import { elementsPerSpan } from './steelBoxModel.ts';

/** Characteristic reactions of the whole deck. */
export function steelBoxReactions({ model, effects, steel }: SizedSteelBox): SupportReaction[] {
  const { own, superimposed, traffic } = effects;
  const last = model.supportsM.length - 1;
  // At the two ends the reaction is the shear beside it.
  const end = (j: number): number =>
    j === 0 ? traffic.shearMaxKN[0]! : j === last ? -traffic.shearMinKN[traffic.shearMinKN.length - 1]! : 0;
  return model.supportsM.map((_, j) => ({
    permanentKN: own.reactionKN[j]! + superimposed.reactionKN[j]! + steel.atSupportKN[j]!,
    trafficMaxKN: Math.max(traffic.reactionMaxKN[j]!, end(j)),
    trafficMinKN: traffic.reactionMinKN[j]!,
  }));
}

/** Own weight of the governing characteristic moment, 0 to 1. */
export function steelBoxOwnShare({ effects }: SizedSteelBox): number {
  const { own, superimposed, traffic } = effects;
  let worst = 0;
  let share = 0;
  for (let i = 0; i < own.momentKNm.length; i++) {
    const steel = own.momentKNm[i]!;
    const lasting = steel + superimposed.momentKNm[i]!;
    const total = lasting + (lasting < 0 ? traffic.momentMinKNm[i]! : traffic.momentMaxKNm[i]!);
    if (!(Math.abs(total) > worst)) continue;
    worst = Math.abs(total);
    share = steel / total;
  }
  return Math.min(1, Math.max(0, share));
}

/** Longest and heaviest segment brought to site. */
export function steelBoxPiece({ model, steel }: SizedSteelBox): { lengthM: number; massT: number } {
  const lengthM = Math.min(steelBoxData.pieceM.value, ...model.task.spansM);
  return { lengthM, massT: (Math.max(...steel.ownKNm) * lengthM) / 9.81 };
}

/** What the engineer has to know of heights that are assumed. */
export function steelBoxWarnings({ model }: SizedSteelBox): string[] {
  const warnings: string[] = [];
  const towers = temporaryTowers(model);
  if (towers.count > 0 && !towers.known)
    warnings.push(
      `Height under the deck is not given: towers are measured for a road ${steelBoxData.assumedHeightM.value} m above ground.`,
    );
  return warnings;
}

const section = noSection();

/** Named figures of layout, deck, plates and statics. */
export function steelBoxFigures(box: SizedSteelBox): Record<string, number> {
  const { model, plates, effects, steel } = box;
  const { layout, rib, cross, task, lengthM } = model;
  const { spansM } = task;
  const areaM2 = task.deck.widthM * lengthM;
  const longest = spansM.indexOf(Math.max(...spansM));
  const middle = longest * elementsPerSpan + elementsPerSpan / 2;
  const inertia = (station: number): number => {
    const e = Math.min(plates.deckM.length - 1, station);
    return boxSection(
      section,
      model,
      station,
      plates.deckM[e]!,
      plates.webM[e]!,
      plates.bottomM[e]!,
      plates.pressed[e] === 1,
      0,
    ).inertiaM4;
  };
  const midDepthM = model.depthM[middle]!;
  const bottomM = bottomWidth(layout, midDepthM);
  const enclosedAreaM2 = ((layout.topM + bottomM) / 2) * midDepthM;
  const pairs = model.supportsM.map((_, j) => bearingPair(model, effects, j, effects.own.reactionKN[j]!));
  const figures: Record<string, number> = {
    cells: layout.cells,
    webs: layout.webs,
    webSpacingM: layout.cellM,
    overhangM: layout.overhangM,
    webSlope: layout.slope,
    bottomWidthM: bottomM,
    bottomWidthAtPiersM: bottomWidth(layout, model.pierDepthM),
    boxInnerHeightM: Math.max(0, midDepthM - plates.deckM[middle]! - plates.bottomM[middle]!),
    deckPlateM: model.deckM,
    ribHeightM: rib.heightM,
    ribWallM: rib.thicknessM,
    ribInertiaM4: rib.inertiaM4,
    ribStressMPa: Math.max(rib.spanMPa, rib.crossbeamMPa),
    ribRangeMPa: rib.rangeMPa,
    crossbeamPitchM: model.pitchM,
    crossbeamDepthM: cross.depthM,
    crossbeamFlangeM2: cross.flangeM2,
    bracketFlangeM2: cross.bracketFlangeM2,
    strutDiameterM: cross.strutM,
    deckPlateKgM2: steel.deckPlateKg / areaM2,
    deckRibsKgM2: steel.deckRibsKg / areaM2,
    crossbeamsKgM2: steel.crossbeamsKg / areaM2,
    deckSystemKgM2: (steel.deckPlateKg + steel.deckRibsKg + steel.crossbeamsKg) / areaM2,
    steelKgM2: steel.totalKg / areaM2,
    midspanDeckPlateM: plates.deckM[middle]!,
    midspanWebM: plates.webM[middle]!,
    midspanBottomPlateM: plates.bottomM[middle]!,
    midspanInertiaM4: inertia(middle),
    stiffenerHeightM: model.field.stiffener.heightM,
    frameBeamM: steel.bottomBeamM,
    framePostM: steel.postM,
    enclosedAreaM2,
    torsionConstantM4: bredt(enclosedAreaM2, [
      { lengthM: layout.topM, thicknessM: plates.deckM[middle]! },
      { lengthM: layout.slant * midDepthM, thicknessM: plates.webM[middle]! },
      { lengthM: layout.slant * midDepthM, thicknessM: plates.webM[middle]! },
      { lengthM: bottomM, thicknessM: plates.bottomM[middle]! },
    ]),
    torqueDesignKNm: Math.max(...effects.torqueKNm),
    curveTorqueKNm: effects.curveKNm,
    ...skewFigures(effects.skewKNm, Math.min(pairs[0]!.apartM, pairs[pairs.length - 1]!.apartM)),
    bearingsApartM: Math.max(...pairs.map(({ apartM }) => apartM)),
    cantileveredSpans: cantileveredSpans(model).length,
    towers: temporaryTowers(model).count,
    stageHogKNm: -Math.min(...effects.stageHogKNm),
    stageSagKNm: Math.max(...effects.stageSagKNm),
  };
  if (effects.launchKN > 0) figures['launchReactionKN'] = effects.launchKN;
  for (let span = 0; span < spansM.length; span++) {
    const stations = effects.sagKNm.subarray(span * elementsPerSpan, (span + 1) * elementsPerSpan + 1);
    figures[`span${span + 1}SagDesignKNm`] = Math.max(...stations);
  }
  for (let pier = 1; pier < spansM.length; pier++) {
    const i = pier * elementsPerSpan;
    const plateM = Math.max(plates.bottomM[i - 1]!, plates.bottomM[i]!);
    figures[`pier${pier}HogDesignKNm`] = -effects.hogKNm[i]!;
    figures[`pier${pier}ShearDesignKN`] = Math.max(
      webShearKN(model, effects, i - 1),
      webShearKN(model, effects, i),
    );
    figures[`pier${pier}DeckPlateM`] = Math.max(plates.deckM[i - 1]!, plates.deckM[i]!);
    figures[`pier${pier}WebM`] = Math.max(plates.webM[i - 1]!, plates.webM[i]!);
    figures[`pier${pier}BottomPlateM`] = plateM;
    figures[`pier${pier}PressedShare`] = bottomPressedShare(model, plateM);
    figures[`pier${pier}InertiaM4`] = inertia(i);
  }
  return figures;
}
