import { materials } from '../../actions/index.ts';
import type { MeasuredLine, UnitTask } from '../../model/index.ts';
import { measured } from '../common/measured.ts';
import { cantileveredSpans } from './erection.ts';
import { bottomWidth } from './boxLayout.ts';
import { steelBoxData } from './steelBoxData.ts';
import type { SizedSteelBox } from './sizeSteelBox.ts';
import type { SteelBoxModel } from './steelBoxModel.ts';

const mm = (lengthM: number): string => (1000 * lengthM).toFixed(0);

/** Thicknesses of a plate along the unit in words. */
function plates(thicknessM: Float64Array): string {
  const least = Math.min(...thicknessM);
  const most = Math.max(...thicknessM);
  const range = least === most ? mm(least) : `${mm(least)} to ${mm(most)}`;
  return `${range} mm, ${materials.steelDensityKgM3} kg/m3`;
}

/** Measured lines of the superstructure and its temporary towers: plates by part, deck, frames, paint outside and inside. */
export function steelBoxLines(box: SizedSteelBox): MeasuredLine[] {
  const { model, plates: run, steel } = box;
  const { rib, cross, layout } = model;
  const kg = (mass: number, what: string, how: string): MeasuredLine =>
    measured('deck', 'orthotropic-steel', mass, what, how);
  const bays = model.bays.reduce((sum, count) => sum + count, 0);
  const paint = painted(box);
  const towers = temporaryTowers(model);
  return [
    kg(steel.deckPlateKg, 'deck plate', plates(run.deckM)),
    kg(
      steel.deckRibsKg,
      'ribs of the deck',
      `closed ribs ${mm(rib.heightM)} mm high, ${mm(rib.thicknessM)} mm walls, every ${mm(steelBoxData.rib.pitchM)} mm`,
    ),
    kg(
      steel.crossbeamsKg,
      'crossbeams and brackets',
      `${bays} every ${model.pitchM.toFixed(2)} m, ${mm(cross.depthM)} mm deep, with their stiffeners`,
    ),
    ...(steel.strutsKg > 0
      ? [
          kg(
            steel.strutsKg,
            'struts under the crossbeams',
            `pairs of tubes of ${mm(cross.strutM)} mm in every cell`,
          ),
        ]
      : []),
    kg(steel.websKg, 'webs', `${layout.webs} webs, ${plates(run.webM)}`),
    kg(steel.bottomKg, 'bottom plates', plates(run.bottomM)),
    kg(
      steel.stiffenersKg,
      'stiffeners along webs and bottom plates',
      `${model.pressedRibs} on the bottom plate where it is pressed, ${model.spanRibs} light ones elsewhere, on the webs every ${steelBoxData.web.panelM} m`,
    ),
    kg(
      steel.framesKg,
      'frames',
      `${steel.frames}, every ${steelBoxData.frame.bracedEvery}rd braced against distortion`,
    ),
    kg(
      steel.diaphragmsKg,
      'diaphragms',
      `over ${model.supportsM.length} supports with bearing stiffeners, by force`,
    ),
    kg(
      steel.weldsKg,
      'welds and splices',
      `${(100 * steelBoxData.weldsShare.value).toFixed(0)} % of the steel above`,
    ),
    measured(
      'deck',
      'paint',
      paint.outsideM2,
      'outside of the box',
      'soffit, outer webs, underside and edges of the deck',
    ),
    measured(
      'deck',
      'paint',
      paint.insideM2,
      'inside of the box',
      'underside of the deck, webs and bottom plate, area by mass for stiffeners and frames',
    ),
    ...(towers.count > 0
      ? [
          measured(
            'temporary-works',
            'temporary-tower',
            towers.heightM,
            'towers under the deck while it is put together',
            `${towers.count} towers, one every ${steelBoxData.cantilever.towerEveryM} m of the spans that are not cantilevered`,
          ),
        ]
      : []),
  ];
}

/** Painted areas, m2. */
export function painted({ model, steel }: SizedSteelBox): { outsideM2: number; insideM2: number } {
  const { layout, rib, cross, elementM, elementDepthM, pitchM } = model;
  const { pitchM: ribPitchM, topM, bottomM } = steelBoxData.rib;
  const wallM = Math.hypot(rib.heightM, (topM - bottomM) / 2);
  const underDeck = 1 + (2 * wallM + bottomM - topM) / ribPitchM;
  const { tipM } = steelBoxData.crossbeam;
  const brackets = (2 * layout.overhangM * (cross.bracketDepthM + tipM)) / pitchM;
  let outsideM2 = 0;
  let insideM2 = 0;
  for (let e = 0; e < elementM.length; e++) {
    const heightM = elementDepthM[e]!;
    const soffitM = bottomWidth(layout, heightM);
    outsideM2 +=
      elementM[e]! *
      (2 * layout.overhangM * underDeck + brackets + 2 * tipM + 2 * layout.slant * heightM + soffitM);
    insideM2 +=
      elementM[e]! *
      (layout.topM * underDeck +
        (2 * cross.depthM * layout.topM) / pitchM +
        2 * (layout.slant + layout.cells - 1) * heightM +
        soffitM);
  }
  const massT = (steel.stiffenersKg + steel.framesKg + steel.strutsKg + steel.diaphragmsKg) / 1000;
  return { outsideM2, insideM2: insideM2 + steelBoxData.insidePaintM2PerT.value * massT };
}

/** Towers under each span of a box: under those that are put together on them. */
export function towersInSpans(task: Pick<UnitTask, 'spansM' | 'method'>): number[] {
  if (task.method === 'launch') return task.spansM.map(() => 0);
  const cantilevered = new Set(cantileveredSpans({ task }));
  const { towerEveryM } = steelBoxData.cantilever;
  return task.spansM.map((span, i) =>
    cantilevered.has(i) ? 0 : Math.max(0, Math.ceil(span / towerEveryM - 1e-9) - 1),
  );
}

/** Towers under the spans that are put together on them, and their height in all, m. */
export function temporaryTowers({ task }: SteelBoxModel): { count: number; heightM: number; known: boolean } {
  const { spansM, clearUnderM, depthM } = task;
  const known = clearUnderM !== undefined && clearUnderM.length === spansM.length + 1;
  const assumedM = Math.max(0, steelBoxData.assumedHeightM.value - depthM);
  const soffit = (j: number): number => (known ? clearUnderM[j]! : assumedM);
  let count = 0;
  let heightM = 0;
  towersInSpans(task).forEach((towers, i) => {
    count += towers;
    heightM += towers * ((soffit(i) + soffit(i + 1)) / 2);
  });
  return { count, heightM, known };
}
