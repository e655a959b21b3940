import { materials } from '../../actions/index.ts';
import { stiffenedStrip, stiffenerOf } from '../composite-box/stiffenedPlate.ts';
import { bottomWidth } from './boxLayout.ts';
import { bearingPair } from './bearingsApart.ts';
import type { BoxEffects } from './boxEffects.ts';
import { plateKgPerM, stiffenedWebOf, type BoxPlates } from './boxSection.ts';
import { steelBoxData } from './steelBoxData.ts';
import { elementsPerSpan, type SteelBoxModel } from './steelBoxModel.ts';

/** Steel of a box by part, kg. */
export interface BoxSteel {
  readonly deckPlateKg: number;
  readonly deckRibsKg: number;
  readonly crossbeamsKg: number;
  readonly strutsKg: number;
  readonly websKg: number;
  readonly bottomKg: number;
  readonly stiffenersKg: number;
  readonly framesKg: number;
  readonly diaphragmsKg: number;
  readonly weldsKg: number;
  readonly totalKg: number;
  readonly frames: number;
  /** Bottom beam of a frame where the plate is pressed, and post on a web, m. */
  readonly bottomBeamM: number;
  readonly postM: number;
  /** Design force of the bottom plate at its worst pier, kN. */
  readonly pressedKN: number;
  /** Weight along the box by element, kN/m, and at every support, kN. */
  readonly ownKNm: Float64Array;
  readonly atSupportKN: readonly number[];
}

const g = 9.81e-3;

/** Weighs a box: plates by element, deck, frames by what they hold, diaphragms by the reactions. */
export function boxSteel(model: SteelBoxModel, plates: BoxPlates, effects: BoxEffects | null): BoxSteel {
  const { task, bays, cross, elementM } = model;
  const { weldsShare } = steelBoxData;
  const pressedKN = effects === null ? 0 : pressedForce(model, plates, effects);
  const frame = frameParts(model, plates, pressedKN);
  const ownKNm = new Float64Array(elementM.length);
  const sums = { deck: 0, deckRibs: 0, webs: 0, bottom: 0, ribs: 0, frames: 0 };
  const withWelds = 1 + weldsShare.value;
  let frames = 0;
  for (let e = 0; e < elementM.length; e++) {
    const span = Math.floor(e / elementsPerSpan);
    const bayM = task.spansM[span]! / bays[span]!;
    const kg = plateKgPerM(model, plates, e);
    const frameKgPerM =
      frameKg(model, frame, model.elementDepthM[e]!, plates.pressed[e] === 1) *
      ((bays[span]! - 1) / bays[span]! / bayM);
    const lengthM = elementM[e]!;
    sums.deck += kg.deck * lengthM;
    sums.deckRibs += kg.deckRibs * lengthM;
    sums.webs += kg.webs * lengthM;
    sums.bottom += kg.bottom * lengthM;
    sums.ribs += kg.ribs * lengthM;
    sums.frames += frameKgPerM * lengthM;
    ownKNm[e] =
      g *
      withWelds *
      (kg.deck +
        kg.deckRibs +
        kg.webs +
        kg.bottom +
        kg.ribs +
        frameKgPerM +
        (cross.beamKg + cross.strutsKg) / bayM);
  }
  bays.forEach((count) => (frames += count - 1));
  const crossbeams = bays.reduce((sum, count) => sum + count, 0);
  const diaphragms = model.supportsM.map((_, j) => diaphragmKg(model, effects, j));
  const parts = {
    deckPlateKg: sums.deck,
    deckRibsKg: sums.deckRibs,
    crossbeamsKg: crossbeams * cross.beamKg,
    strutsKg: crossbeams * cross.strutsKg,
    websKg: sums.webs,
    bottomKg: sums.bottom,
    stiffenersKg: sums.ribs,
    framesKg: sums.frames,
    diaphragmsKg: diaphragms.reduce((sum, kg) => sum + kg, 0),
  };
  const bareKg = Object.values(parts).reduce((sum, kg) => sum + kg, 0);
  return {
    ...parts,
    weldsKg: weldsShare.value * bareKg,
    totalKg: withWelds * bareKg,
    frames,
    bottomBeamM: frame.beamM,
    postM: frame.postM,
    pressedKN,
    ownKNm,
    atSupportKN: diaphragms.map((kg) => g * withWelds * kg),
  };
}

/** Greatest design compression of the whole bottom plate, kN: hogging moment over its lever. */
function pressedForce(model: SteelBoxModel, plates: BoxPlates, effects: BoxEffects): number {
  let most = 0;
  effects.hogKNm.forEach((hog, i) => {
    const e = Math.min(plates.deckM.length - 1, i);
    const lever = model.depthM[i]! - (plates.deckM[e]! + plates.bottomM[e]!) / 2;
    most = Math.max(most, -Math.min(hog, effects.stageHogKNm[i]!) / lever);
  });
  return most;
}

interface FrameParts {
  readonly beamM: number;
  readonly postM: number;
}

/**
 * Bottom beam stiff enough to hold the pressed plate (EN 1993-1-5 9.2.1(5), critical stresses as for a plate without
 * stiffeners along it) and posts stiff enough for shear buckling of the webs (9.3.3); from memory.
 */
function frameParts(model: SteelBoxModel, plates: BoxPlates, pressedKN: number): FrameParts {
  const { bottomHeightsM, postHeightsM } = steelBoxData.frame;
  const bottomM = Math.max(...plates.bottomM);
  const webM = Math.max(...plates.webM);
  const acrossM = bottomWidth(model.layout, model.pierDepthM) / model.layout.cells;
  const partKN = pressedKN / model.layout.cells;
  const stressMPa = ((partKN / acrossM) * (2 / model.pitchM)) / 1e3;
  const bowM = Math.min(model.pitchM, acrossM) / 300;
  const needM4 = (heightM: number): number => {
    const { gammaMPa } = { gammaMPa: model.yieldMPa(0.016) / model.standard.resistance.steelBuckling };
    const eMPa = model.modulusKNm2 / 1e3;
    const u = Math.max(1, (Math.PI ** 2 * eMPa * heightM * 0.6) / (gammaMPa * 300 * acrossM));
    return (stressMPa / eMPa) * (acrossM / Math.PI) ** 4 * (1 + ((bowM * 300) / acrossM) * u);
  };
  const stripOf = (thicknessM: number): number =>
    30 * thicknessM * Math.sqrt(235 / model.yieldMPa(thicknessM));
  const last = bottomHeightsM[bottomHeightsM.length - 1]!;
  const beamM =
    bottomHeightsM.find((h) => stiffenedStrip(stripOf(bottomM), bottomM, h).inertiaM4 >= needM4(h)) ?? last;
  const web = stiffenedWebOf(model, model.pierDepthM, webM);
  const ratio = web.postM / web.depthM;
  const postNeed =
    ratio < Math.SQRT2 ? (1.5 * web.depthM ** 3 * webM ** 3) / web.postM ** 2 : 0.75 * web.depthM * webM ** 3;
  const postM =
    postHeightsM.find((h) => stiffenedStrip(stripOf(webM), webM, h).inertiaM4 >= postNeed) ??
    postHeightsM[postHeightsM.length - 1]!;
  return { beamM, postM };
}

/** One frame where the box is `depthM` deep: bottom beam, posts on every web, its part of the diagonals. */
function frameKg(model: SteelBoxModel, frame: FrameParts, depthM: number, pressed: boolean): number {
  const { layout, torsion, standard, pitchM } = model;
  const d = steelBoxData.frame;
  const bottomM = bottomWidth(layout, depthM);
  const beamM = pressed ? frame.beamM : d.bottomHeightsM[0]!;
  const areaM3 =
    bottomM * stiffenerOf(beamM).areaM2 +
    layout.webs * layout.slant * depthM * stiffenerOf(frame.postM).areaM2;
  const cellTopM = layout.cellM;
  const cellBottomM = bottomM / layout.cells;
  const diagonalM = Math.hypot((cellTopM + cellBottomM) / 4, depthM);
  const between = d.bracedEvery * pitchM;
  const torqueKNm =
    standard.factors.uls.traffic *
    (torsion.vehicleTorqueKNm + (torsion.udlTorqueKNmPerM + torsion.footwayTorqueKNmPerM) * between);
  const pairKN = (d.distortionShare * torqueKNm) / ((layout.topM + bottomM) / 2);
  const forceKN = ((pairKN / 2) * diagonalM) / depthM;
  const kgM = Math.max(
    d.diagonalLeastKgM,
    (materials.steelDensityKgM3 * forceKN) / (d.diagonalStressShare * model.yieldMPa(0.012) * 1e3),
  );
  return materials.steelDensityKgM3 * areaM3 + (2 * layout.cells * diagonalM * kgM) / d.bracedEvery;
}

/** Diaphragm over a support with its ribs and bearing stiffeners. */
function diaphragmKg(model: SteelBoxModel, effects: BoxEffects | null, support: number): number {
  const { layout, standard } = model;
  const d = steelBoxData.diaphragm;
  const station = support * elementsPerSpan;
  const heightM = model.depthM[station]!;
  // Brackets to bearings outside the webs run out over half of the height.
  const bracketsM =
    effects === null ? 0 : bearingPair(model, effects, support, effects.own.reactionKN[support]!).bracketsM;
  const areaM2 = Math.max(
    0,
    ((layout.topM + bottomWidth(layout, heightM) + bracketsM) / 2) * heightM - layout.cells * d.openingM2,
  );
  const reactionKN = effects === null ? 0 : designReaction(model, effects, support);
  const fy = model.yieldMPa(0.025) * 1e3;
  const shearKN = reactionKN / 2;
  const needM =
    shearKN / layout.cells / (d.shearDepthShare * heightM * (fy / Math.sqrt(3) / standard.resistance.steel));
  const thicknessM = Math.max(d.leastM, Math.ceil(needM * 500 - 1e-9) / 500);
  const stiffenerM2 = reactionKN / (d.bearingStressShare * fy);
  return materials.steelDensityKgM3 * ((1 + d.ribShare) * areaM2 * thicknessM + stiffenerM2 * heightM);
}

/** Design reaction of the whole deck at a support, kN. */
function designReaction({ standard }: SteelBoxModel, effects: BoxEffects, support: number): number {
  const { uls } = standard.factors;
  const { own, superimposed, traffic } = effects;
  return (
    uls.permanent * own.reactionKN[support]! +
    uls.superimposed * superimposed.reactionKN[support]! +
    uls.traffic * traffic.reactionMaxKN[support]!
  );
}
