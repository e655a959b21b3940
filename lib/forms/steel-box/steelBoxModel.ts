import {
  loadStandard,
  materials,
  steelYield,
  trafficOnDeck,
  trafficTorsion,
  usualSteel,
  type LoadStandard,
  type TrafficLoad,
  type TrafficTorsion,
} from '../../actions/index.ts';
import { lineBeam } from '../../mechanics/index.ts';
import type { StandardId, UnitTask } from '../../model/index.ts';
import { supportPositions, totalLength } from '../common/supports.ts';
import { chooseStiffener, supportShearLag, type PlateField } from '../composite-box/stiffenedPlate.ts';
import { bottomWidth, boxLayout, type BoxLayout } from './boxLayout.ts';
import { depthsAlong } from './boxHaunch.ts';
import { sizeCrossBeam, type CrossBeam } from './crossBeam.ts';
import { sizeRib, type DeckRib } from './deckRibs.ts';
import { steelBoxData } from './steelBoxData.ts';

/** Elements of a span. */
export const elementsPerSpan = 12;

/** Everything about a box of one depth at its piers that does not change while its plates are sought. */
export interface SteelBoxModel {
  readonly task: UnitTask;
  readonly id: StandardId;
  readonly standard: LoadStandard;
  readonly supportsM: readonly number[];
  readonly lengthM: number;
  /** Stations, m, and the elements between them, m. */
  readonly xM: Float64Array;
  readonly elementM: Float64Array;
  /** Depth at the stations and in the middle of the elements, deck plate to soffit, m. */
  readonly depthM: Float64Array;
  readonly elementDepthM: Float64Array;
  readonly pierDepthM: number;
  readonly layout: BoxLayout;
  /** Bays of crossbeams in each span, and the longest of them, m. */
  readonly bays: readonly number[];
  readonly pitchM: number;
  /** Thinnest deck plate, as given or as wheels and surfacing ask for, m. */
  readonly deckM: number;
  readonly leastDeckM: number;
  readonly rib: DeckRib;
  readonly cross: CrossBeam;
  /** Bottom plate where it is pressed: stiffeners side by side and their field at the pier. */
  readonly field: PlateField;
  readonly pressedRibs: number;
  readonly spanRibs: number;
  /** Share of deck and bottom plate that acts at the stations at the ultimate limit. */
  readonly deckLag: Float64Array;
  readonly bottomLag: Float64Array;
  readonly traffic: TrafficLoad;
  readonly torsion: TrafficTorsion;
  readonly modulusKNm2: number;
  readonly symmetrical: boolean;
  yieldMPa(thicknessM: number): number;
}

/** Deck plate that wheels ask for under a surfacing, m. */
export function leastDeckPlate(surfacingM: number): number {
  const { leastM, thinSurfacingM, surfacingM: thick, clearOverThickness } = steelBoxData.deckPlate;
  return Math.max(
    surfacingM >= thick - 1e-9 ? leastM : thinSurfacingM,
    steelBoxData.rib.topM / clearOverThickness,
  );
}

/** Box of `pierDepthM` over its piers and the depth of the task in its spans, its outer webs upright or leaning. */
export function steelBoxModel(task: UnitTask, pierDepthM: number, upright: boolean): SteelBoxModel {
  const { spansM, deck, standard: id } = task;
  const standard = loadStandard(id);
  const grade = usualSteel(id);
  const yieldMPa = (thicknessM: number): number => steelYield(grade, thicknessM * 1000);
  const mesh = lineBeam({ spansM, stationsPerSpan: elementsPerSpan });
  const { xM } = mesh;
  const elements = xM.length - 1;
  const middles = Float64Array.from({ length: elements }, (_, e) => (xM[e]! + xM[e + 1]!) / 2);
  const layout = boxLayout(deck, pierDepthM, upright);
  const bays = spansM.map((span) => Math.max(2, Math.ceil(span / steelBoxData.crossbeam.mostPitchM - 1e-9)));
  const pitchM = Math.max(...spansM.map((span, i) => span / bays[i]!));
  const leastDeckM = leastDeckPlate(deck.surfacingM);
  const deckM = task.deckPlateM ?? leastDeckM;
  const rib = sizeRib(id, pitchM, deckM, yieldMPa);
  const cross = sizeCrossBeam({
    id,
    standard,
    deck,
    layout,
    pitchM,
    deckM,
    ribHeightM: rib.heightM,
    plateKNm2: standard.unitWeights.steelKNm3 * (deckM + rib.areaM2 / steelBoxData.rib.pitchM),
    boxM: task.depthM,
    deepestM: pierDepthM,
    yieldMPa,
  });
  const { ribPitchM, spanPitchM } = steelBoxData.bottom;
  const widestM = bottomWidth(layout, task.depthM);
  const pressedRibs = Math.max(1, Math.ceil(widestM / ribPitchM) - 1);
  const ribsApartM = bottomWidth(layout, pierDepthM) / (pressedRibs + 1);
  const lag = shearLag(task, layout, xM, pierDepthM);
  return {
    task,
    id,
    standard,
    supportsM: supportPositions(spansM),
    lengthM: totalLength(spansM),
    xM,
    elementM: Float64Array.from({ length: elements }, (_, e) => xM[e + 1]! - xM[e]!),
    depthM: depthsAlong(spansM, xM, task.depthM, pierDepthM, task.haunch?.law),
    elementDepthM: depthsAlong(spansM, middles, task.depthM, pierDepthM, task.haunch?.law),
    pierDepthM,
    layout,
    bays,
    pitchM,
    deckM,
    leastDeckM,
    rib,
    cross,
    field: {
      pitchM: ribsApartM,
      frameM: pitchM,
      stiffener: chooseStiffener(ribsApartM, pitchM, yieldMPa(0.03)),
    },
    pressedRibs,
    spanRibs: Math.max(1, Math.ceil(widestM / spanPitchM) - 1),
    ...lag,
    traffic: trafficOnDeck(id, deck),
    torsion: trafficTorsion(id, deck),
    modulusKNm2: materials.steel[grade].eMPa * 1e3,
    symmetrical: spansM.every((span, i) => Math.abs(span - spansM[spansM.length - 1 - i]!) < 1e-9),
    yieldMPa,
  };
}

/** Within a quarter of the span of an inner support the flanges act by their share there, elsewhere whole. */
function shearLag(
  { spansM }: UnitTask,
  layout: BoxLayout,
  xM: Float64Array,
  pierDepthM: number,
): { deckLag: Float64Array; bottomLag: Float64Array } {
  const deckLag = new Float64Array(xM.length).fill(1);
  const bottomLag = new Float64Array(xM.length).fill(1);
  const supportsM = supportPositions(spansM);
  const halfDeckM = Math.max(layout.cellM / 2, layout.overhangM);
  const halfBottomM = bottomWidth(layout, pierDepthM) / layout.cells / 2;
  for (let j = 1; j < spansM.length; j++) {
    const effectiveM = (spansM[j - 1]! + spansM[j]!) / 4;
    const deck = supportShearLag(halfDeckM, effectiveM);
    const bottom = supportShearLag(halfBottomM, effectiveM);
    for (let i = 0; i < xM.length; i++) {
      const away = xM[i]! - supportsM[j]!;
      const span = away < 0 ? spansM[j - 1]! : spansM[j]!;
      if (Math.abs(away) > span / 4) continue;
      deckLag[i] = Math.min(deckLag[i]!, deck);
      bottomLag[i] = Math.min(bottomLag[i]!, bottom);
    }
  }
  return { deckLag, bottomLag };
}
