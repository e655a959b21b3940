import { materials } from '../../actions/index.ts';
import { stiffenedStrip, stiffenerOf } from '../composite-box/stiffenedPlate.ts';
import { bottomWidth, websLength } from './boxLayout.ts';
import { steelBoxData } from './steelBoxData.ts';
import type { SteelBoxModel } from './steelBoxModel.ts';
import { pressedWebShare, type StiffenedWeb } from './stiffenedWeb.ts';

/** Plates along a box by element, m. */
export interface BoxPlates {
  readonly deckM: Float64Array;
  readonly webM: Float64Array;
  readonly bottomM: Float64Array;
  /** 1 where the bottom plate has the stiffeners of a pressed plate. */
  readonly pressed: Uint8Array;
}

/** Section of a box: heights from the middle of the bottom plate. */
export interface BoxSection {
  areaM2: number;
  axisM: number;
  inertiaM4: number;
  /** Between the middles of deck and bottom plate. */
  heightM: number;
  /** Inertia of the webs alone about the axis. */
  websM4: number;
}

export const noSection = (): BoxSection => ({ areaM2: 0, axisM: 0, inertiaM4: 0, heightM: 0, websM4: 0 });

const webRib = stiffenerOf(steelBoxData.web.ribHeightM);
const spanRib = stiffenerOf(steelBoxData.bottom.spanRibM);

/** Stiffeners along one web that is `heightM` high. */
function webRibs(model: SteelBoxModel, heightM: number): number {
  return Math.max(0, Math.ceil((model.layout.slant * heightM) / steelBoxData.web.panelM - 1e-9) - 1);
}

const webRibInertia = new Map<string, number>();

/** Second moment of area of a stiffener of a web with the strip of web that acts with it, m4. */
function webRibM4(webM: number, fyMPa: number): number {
  const key = `${webM} ${fyMPa}`;
  const known = webRibInertia.get(key);
  if (known !== undefined) return known;
  const stripM = 30 * webM * Math.sqrt(235 / fyMPa);
  const made = stiffenedStrip(stripM, webM, steelBoxData.web.ribHeightM).inertiaM4;
  if (webRibInertia.size >= 128) webRibInertia.clear();
  webRibInertia.set(key, made);
  return made;
}

/** Outer web of an element as a stiffened plate. */
export function stiffenedWebOf(model: SteelBoxModel, heightM: number, webM: number): StiffenedWeb {
  const fyMPa = model.yieldMPa(webM);
  return {
    depthM: heightM * model.layout.slant,
    postM: model.pitchM,
    thicknessM: webM,
    ribs: webRibs(model, heightM),
    ribM4: webRibM4(webM, fyMPa),
    fyMPa,
  };
}

/** Area of all stiffeners along the webs and along the bottom plate, m2, and their mass, kg/m. */
function ribAreas(
  model: SteelBoxModel,
  heightM: number,
  pressed: boolean,
): { readonly websM2: number; readonly bottomM2: number; readonly bottomHeightM: number } {
  const stiffener = pressed ? model.field.stiffener : spanRib;
  return {
    websM2: model.layout.webs * webRibs(model, heightM) * webRib.areaM2,
    bottomM2: (pressed ? model.pressedRibs : model.spanRibs) * stiffener.areaM2,
    bottomHeightM: stiffener.heightM,
  };
}

/**
 * Section at a station from the plates of an element.
 * @param side 1 where the deck is pressed, -1 where the bottom is, 0 for stiffness (whole plates)
 */
export function boxSection(
  out: BoxSection,
  model: SteelBoxModel,
  station: number,
  deckM: number,
  webM: number,
  bottomM: number,
  pressed: boolean,
  side: -1 | 0 | 1,
): BoxSection {
  const { layout, rib, task } = model;
  const H = model.depthM[station]! - (deckM + bottomM) / 2;
  const deckLag = side === 0 ? 1 : model.deckLag[station]!;
  const bottomLag = side === 0 ? 1 : model.bottomLag[station]!;
  const widthM = task.deck.widthM;
  const deck = widthM * deckM * deckLag;
  const ribs = (widthM / steelBoxData.rib.pitchM) * rib.areaM2 * deckLag;
  const ribsZ = H - rib.centroidM;
  const across = websLength(layout, H);
  const stiff = ribAreas(model, H, pressed);
  const webs = across * webM + stiff.websM2;
  const bottom = bottomWidth(layout, H) * bottomM * bottomLag;
  const bottomRibs = stiff.bottomM2 * bottomLag;
  const bottomRibsZ = bottomM / 2 + 0.6 * stiff.bottomHeightM;
  let area = deck + ribs + webs + bottom + bottomRibs;
  let first = deck * H + ribs * ribsZ + (webs * H) / 2 + bottomRibs * bottomRibsZ;
  let second = deck * H ** 2 + ribs * ribsZ ** 2 + (webs * H ** 2) / 3 + bottomRibs * bottomRibsZ ** 2;
  let axis = first / area;
  out.websM4 = webs * (H ** 2 / 12 + (H / 2 - axis) ** 2);
  if (side !== 0) {
    const pressedM = side > 0 ? H - axis : axis;
    const share = pressedWebShare(stiffenedWebOf(model, H, webM), pressedM * layout.slant);
    if (share < 1) {
      const lost = (1 - share) * across * webM * (pressedM / H);
      const z = side > 0 ? H - pressedM / 2 : pressedM / 2;
      area -= lost;
      first -= lost * z;
      second -= lost * (z ** 2 + pressedM ** 2 / 12);
      axis = first / area;
    }
  }
  out.areaM2 = area;
  out.axisM = axis;
  out.inertiaM4 = second - area * axis ** 2;
  out.heightM = H;
  return out;
}

/** Mass of the plates of an element and of the stiffeners along them, kg/m. */
export function plateKgPerM(
  model: SteelBoxModel,
  plates: BoxPlates,
  e: number,
): {
  readonly deck: number;
  readonly webs: number;
  readonly bottom: number;
  readonly ribs: number;
  readonly deckRibs: number;
} {
  const density = materials.steelDensityKgM3;
  const H = model.elementDepthM[e]! - (plates.deckM[e]! + plates.bottomM[e]!) / 2;
  const stiff = ribAreas(model, H, plates.pressed[e] === 1);
  return {
    deck: density * model.task.deck.widthM * plates.deckM[e]!,
    deckRibs: (density * model.task.deck.widthM * model.rib.areaM2) / steelBoxData.rib.pitchM,
    webs: density * websLength(model.layout, H) * plates.webM[e]!,
    bottom: density * bottomWidth(model.layout, H) * plates.bottomM[e]!,
    ribs: density * (stiff.websM2 + stiff.bottomM2),
  };
}
