import { materials } from '../../actions/index.ts';
import { plateThicknessesMm, roundPlateUp } from '../common/plates.ts';
import { plateSteps } from '../common/plateSteps.ts';
import { bottomWidth } from './boxLayout.ts';
import type { BoxEffects } from './boxEffects.ts';
import { stiffenedWebOf, type BoxPlates } from './boxSection.ts';
import { boxUse, noBoxUse } from './boxUse.ts';
import { steelBoxData } from './steelBoxData.ts';
import type { SteelBoxModel } from './steelBoxModel.ts';
import { patchResistanceKN, stiffenedWebShearKN } from './stiffenedWeb.ts';

const use = noBoxUse();

/** Use that flanges are sized for: the last step of weight and stiffness moves the moments by a per cent or two. */
const aim = 0.97;
/** Most of its shear resistance that a web is given, so that bending beside it is hardly reduced. */
const shearAim = 0.75;

/** Design shear of one web along its slope, kN, torsion round the box included, at the ends of element `e`. */
export function webShearKN(model: SteelBoxModel, effects: BoxEffects, e: number): number {
  const { layout } = model;
  const heightM = Math.min(model.depthM[e]!, model.depthM[e + 1]!);
  const enclosedM2 = ((layout.topM + bottomWidth(layout, heightM)) / 2) * heightM;
  const flow = effects.torqueKNm[e]! / (2 * enclosedM2);
  return layout.slant * (effects.shearKN[e]! / layout.webs + flow * heightM);
}

/** Shear resistance of one web of element `e`, kN. */
export function webResistanceKN(model: SteelBoxModel, e: number, webM: number): number {
  const heightM = Math.min(model.depthM[e]!, model.depthM[e + 1]!) - 0.03;
  return stiffenedWebShearKN(stiffenedWebOf(model, heightM, webM), model.standard.resistance.steelBuckling);
}

/** Force of a launching bearing under one web that the web takes, kN. */
export function launchResistanceKN(model: SteelBoxModel, webM: number, bottomM: number): number {
  return patchResistanceKN(
    stiffenedWebOf(model, model.pierDepthM, webM),
    steelBoxData.launch.bearingM,
    bottomM,
    model.standard.resistance.steelBuckling,
  );
}

/** Web thicknesses by element, m: shear, panels, bearings of launching, practical minimum. */
export function sizeWebs(model: SteelBoxModel, effects: BoxEffects, plates: BoxPlates): Float64Array {
  const { leastM, mostM, panelM, panelOverThickness } = steelBoxData.web;
  const least = Math.max(leastM, panelM / panelOverThickness);
  const rolled = plateThicknessesMm
    .map((mm) => mm / 1000)
    .filter((t) => t >= least - 1e-9 && t <= mostM + 1e-9);
  const launchKN = effects.launchKN / model.layout.webs / aim;
  const thinnest = launchKN > 0 ? Math.min(...plates.bottomM) : 0;
  const elements = model.elementM.length;
  const half = model.symmetrical ? Math.ceil(elements / 2) : elements;
  const need = model.elementM.map((_, e) => {
    if (e >= half) return leastM;
    const shear = webShearKN(model, effects, e);
    return (
      rolled.find(
        (t) =>
          shear <= shearAim * webResistanceKN(model, e, t) &&
          (launchKN === 0 || launchKN <= launchResistanceKN(model, t, thinnest)),
      ) ?? mostM
    );
  });
  return stepped(model, need, model.layout.webs * model.pierDepthM);
}

/** Where the bottom plate can be pressed, by element: 1; everywhere in a launched box. */
export function pressedZones(model: SteelBoxModel, effects: BoxEffects): Uint8Array {
  return Uint8Array.from(model.elementM, (_, e) =>
    Math.min(
      effects.hogKNm[e]!,
      effects.hogKNm[e + 1]!,
      effects.stageHogKNm[e]!,
      effects.stageHogKNm[e + 1]!,
    ) < -1e-6
      ? 1
      : 0,
  );
}

/**
 * Thickness of deck and bottom plate by element, m, before they are stepped: each is moved by the stress it lacks or has to
 * spare a few times over.
 */
export function flangeNeeds(
  model: SteelBoxModel,
  effects: BoxEffects,
  plates: BoxPlates,
): Pick<BoxPlates, 'deckM' | 'bottomM'> {
  const elements = model.elementM.length;
  const deck = new Float64Array(elements);
  const bottom = new Float64Array(elements);
  const { mostM: mostDeck } = steelBoxData.deckPlate;
  const { leastM, mostM } = steelBoxData.bottom;
  const widthM = model.task.deck.widthM;
  const ribM = model.rib.areaM2 / steelBoxData.rib.pitchM;
  // Both halves of symmetrical spans need the same.
  const half = model.symmetrical ? Math.ceil(elements / 2) : elements;
  for (let e = 0; e < half; e++) {
    let deckM = plates.deckM[e]!;
    let bottomM = plates.bottomM[e]!;
    const webM = plates.webM[e]!;
    const bottomWidthM = bottomWidth(model.layout, model.elementDepthM[e]!);
    const webPartM2 = (model.layout.webs * model.elementDepthM[e]! * webM) / 6;
    for (let round = 0; round < 5; round++) {
      boxUse(use, model, effects, e, deckM, webM, bottomM, plates.pressed[e] === 1);
      const interaction =
        use.webShare * shearReduction(webShearKN(model, effects, e) / webResistanceKN(model, e, webM));
      const wantDeck = Math.max(Math.max(use.deckSag, use.deckHog) + interaction, use.deckStage) / aim;
      const wantBottom =
        Math.max(Math.max(use.bottomSag, use.bottomHog) + interaction, use.bottomStage, use.fatigue) / aim;
      const before = deckM + bottomM;
      deckM = clamp(
        deckM + (wantDeck - 1) * (deckM + ribM + webPartM2 / widthM),
        model.deckM,
        Math.max(mostDeck, model.deckM),
      );
      bottomM = clamp(bottomM + (wantBottom - 1) * (bottomM + webPartM2 / bottomWidthM), leastM, mostM);
      if (Math.abs(deckM + bottomM - before) < 1e-4) break;
    }
    deck[e] = deckM;
    bottom[e] = bottomM;
  }
  for (let e = half; e < elements; e++) {
    deck[e] = deck[elements - 1 - e]!;
    bottom[e] = bottom[elements - 1 - e]!;
  }
  return { deckM: deck, bottomM: bottom };
}

/** Most used flange of a box, shear of the webs included. */
export function mostUsed(model: SteelBoxModel, effects: BoxEffects, plates: BoxPlates): number {
  let most = 0;
  for (let e = 0; e < model.elementM.length; e++) {
    const webM = plates.webM[e]!;
    boxUse(use, model, effects, e, plates.deckM[e]!, webM, plates.bottomM[e]!, plates.pressed[e] === 1);
    const share = webShearKN(model, effects, e) / webResistanceKN(model, e, webM);
    const bent = Math.max(use.deckSag, use.deckHog, use.bottomSag, use.bottomHog);
    most = Math.max(most, bent + use.webShare * shearReduction(share), use.deckStage, use.bottomStage);
  }
  return most;
}

/** Bending that shear over half of its resistance takes away, per share of the webs (EN 1993-1-5 7.1, from memory). */
export function shearReduction(share: number): number {
  return share > 0.5 ? (2 * share - 1) ** 2 : 0;
}

function clamp(value: number, least: number, most: number): number {
  return Number.isFinite(value) ? Math.min(most, Math.max(least, value)) : most;
}

/** Rolled plates in few steps; on symmetrical spans both halves get the greater need: traces of rounding decide no plate. */
export function stepped(model: SteelBoxModel, need: Float64Array, widthM: number): Float64Array {
  if (model.symmetrical) {
    const last = need.length - 1;
    for (let e = 0; e <= last - e; e++) {
      const most = Math.max(need[e]!, need[last - e]!);
      need[e] = most;
      need[last - e] = most;
    }
  }
  const { plateChangeKgPerM, leastPlateLengthM } = steelBoxData;
  return plateSteps(
    need,
    model.elementM,
    widthM * materials.steelDensityKgM3,
    plateChangeKgPerM.value * widthM,
    leastPlateLengthM.value,
    (thicknessM) => (Math.abs(thicknessM - model.deckM) < 1e-9 ? thicknessM : roundPlateUp(thicknessM)),
  );
}
