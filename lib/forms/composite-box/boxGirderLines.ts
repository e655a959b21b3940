import { materials } from '../../actions/index.ts';
import type { MeasuredLine } from '../../model/index.ts';
import { measured } from '../common/measured.ts';
import { compositeData } from '../composite-i/compositeData.ts';
import { longitudinalBars } from '../composite-i/girderLines.ts';
import { runsOf } from '../composite-i/plateRun.ts';
import type { SizedGirder } from '../composite-i/sizeGirder.ts';
import type { BoxGirderModel } from './boxGirderModel.ts';
import type { BoxSteel } from './boxSteel.ts';
import { compositeBoxData } from './compositeBoxData.ts';

const mm = (lengthM: number): string => (1000 * lengthM).toFixed(0);

/** Measured lines of the superstructure: plates by part, frames, ribs, paint outside and inside, slab, bars and formwork. */
export function boxGirderLines(model: BoxGirderModel, girder: SizedGirder, steel: BoxSteel): MeasuredLine[] {
  const { tubs, shape, lengthM, task, slab, elementM } = model;
  const { run } = girder;
  const density = materials.steelDensityKgM3;
  const kg = (mass: number, what: string, how: string): MeasuredLine =>
    measured('deck', 'plate-girder-steel', mass, what, how);
  const along = (area: (e: number) => number): number =>
    elementM.reduce((sum, length, e) => sum + area(e) * length, 0);
  const webM = (e: number): number => model.girderM - run.topM[e]! - run.bottomM[e]!;
  const boxes = `${tubs.boxes} ${tubs.boxes === 1 ? 'box' : 'boxes'}`;
  const plates = (thicknessM: Float64Array): string =>
    `${boxes}, ${runsOf(thicknessM).length} thicknesses along the unit, ${density} kg/m3`;
  const areaM2 = task.deck.widthM * lengthM;
  const outsideM2 =
    tubs.boxes *
    along((e) => 2 * shape.slant * webM(e) + shape.bottomM + 2 * (run.topWidthM + 2 * run.topM[e]!));
  const insideM2 =
    tubs.boxes * along((e) => 2 * shape.slant * webM(e) + shape.bottomM) +
    (compositeBoxData.insidePaintM2PerT.value *
      (steel.framesKg + steel.topBracingKg + steel.ribsKg + steel.diaphragmsKg)) /
      1000;
  return [
    kg(tubs.count * density * along((e) => run.webM[e]! * webM(e) * shape.slant), 'webs', plates(run.webM)),
    kg(
      tubs.count * density * along((e) => run.topM[e]! * run.topWidthM),
      'top flanges',
      `${plates(run.topM)}, ${mm(run.topWidthM)} mm wide on each web`,
    ),
    kg(
      tubs.boxes * density * along((e) => run.bottomM[e]! * shape.bottomM),
      'bottom plates',
      `${plates(run.bottomM)}, ${mm(shape.bottomM)} mm wide`,
    ),
    kg(
      steel.ribsKg,
      'ribs of the bottom plates',
      `${steel.pressedRibs} ribs ${mm(model.field.stiffener.heightM)} mm high where pressed, ${steel.spanRibs} light ones elsewhere`,
    ),
    kg(steel.framesKg, 'frames', `${steel.frames} in each box, against distortion`),
    kg(steel.topBracingKg, 'bracing between the top flanges', 'one diagonal and a strut in every bay'),
    kg(
      steel.diaphragmsKg + steel.bearingStiffenersKg,
      'diaphragms',
      `plates over ${model.supportsM.length} supports and bearing stiffeners, by force`,
    ),
    kg(steel.studsKg, 'shear studs', `${steel.studs} studs, ${compositeData.studs.kgEach} kg each`),
    kg(
      steel.weldsKg,
      'welds and bolts',
      `${(100 * compositeData.weldsAndBoltsShare.value).toFixed(1)} % of the steel above`,
    ),
    ...(steel.splicesKg > 0
      ? [
          kg(
            steel.splicesKg,
            'field splices',
            'joints of the pieces, plates and bolts for the yield of plates and webs',
          ),
        ]
      : []),
    measured('deck', 'paint', outsideM2, 'outside of the boxes', 'webs, soffit and top flanges'),
    measured(
      'deck',
      'paint',
      insideM2,
      'inside of the boxes',
      'webs and bottom plate, area by mass for frames, ribs and bracing',
    ),
    measured(
      'deck',
      'deck-concrete',
      slab.meanM * areaM2,
      'deck slab',
      `mean thickness ${mm(slab.meanM)} mm`,
    ),
    measured(
      'deck',
      'reinforcement',
      slab.mainBarsKgM2 * areaM2,
      'transverse bars of the slab',
      'wheels, weight and edges across the deck, laps included',
    ),
    measured(
      'deck',
      'reinforcement',
      Math.max(longitudinalBars(model), slab.crossBarsKgM2 * areaM2),
      'longitudinal bars of the slab',
      'crack control over the piers and in the spans, laps included',
    ),
    measured(
      'deck',
      'slab-formwork',
      (task.deck.widthM - tubs.count * run.topWidthM + 2 * slab.edgeM) * lengthM,
      'formwork of the slab',
      'soffit between flanges and edges',
    ),
  ];
}
