import { materials } from '../../actions/index.ts';
import { compositeData } from '../composite-i/compositeData.ts';
import { fieldSplicesKg } from '../composite-i/fieldSplices.ts';
import type { GirderEffects } from '../composite-i/girderEffects.ts';
import type { GirderModel } from '../composite-i/girderModel.ts';
import type { PlateRun } from '../composite-i/plateRun.ts';
import { designReactions, studsOnGirder, type SecondarySteel } from '../composite-i/secondarySteel.ts';
import type { BoxGirderModel } from './boxGirderModel.ts';
import { compositeBoxData } from './compositeBoxData.ts';
import { stiffenerOf } from './stiffenedPlate.ts';

/** Steel of the boxes besides webs, flanges and bottom plates, kg for the whole width. */
export interface BoxSteel extends SecondarySteel {
  /** Frames against distortion, bracing between the top flanges, ribs along the bottom plate, diaphragms. */
  readonly framesKg: number;
  readonly topBracingKg: number;
  readonly ribsKg: number;
  readonly diaphragmsKg: number;
  /** What leaning webs have over upright ones. */
  readonly leanKg: number;
  /** Ribs side by side in one bottom plate where it is pressed, and elsewhere. */
  readonly pressedRibs: number;
  readonly spanRibs: number;
  readonly frames: number;
}

/** Works out the secondary steel of a box; the same call as for I-girders, so that the sizing of plates can weigh it. */
export function boxSteelOf(box: BoxGirderModel) {
  return (model: GirderModel, run: PlateRun, effects: GirderEffects, plateKg: number): BoxSteel => {
    const { tubs, shape, supportsM, braceAtM } = box;
    const density = materials.steelDensityKgM3;
    const frames = braceAtM.length - supportsM.length;
    const framesKg = tubs.boxes * frames * frameKg(box);
    const topBracingKg = tubs.boxes * topBracing(box);
    const { pitchM } = box.field;
    const pressedRibs = Math.round(shape.bottomM / pitchM) - 1;
    const spanRibs = Math.min(
      pressedRibs,
      Math.max(1, Math.ceil(shape.bottomM / compositeBoxData.bottomPlate.spanPitchM) - 1),
    );
    const pressedM = pressedLength(box, effects);
    const light = stiffenerOf(compositeBoxData.stiffener.heightsM[0]!);
    const ribsKg =
      tubs.boxes *
      density *
      (pressedRibs * box.field.stiffener.areaM2 * pressedM +
        spanRibs * light.areaM2 * (model.lengthM - pressedM));
    const diaphragmsKg = tubs.boxes * diaphragms(box);
    const { stiffeners } = compositeData;
    const fyKNm2 = model.yieldMPa(0.03) * 1e3;
    const bearingStiffenersKg =
      tubs.count *
      shape.heightM *
      shape.slant *
      density *
      designReactions(model, effects).reduce(
        (sum, kN) => sum + kN / (stiffeners.bearingStressShare * fyKNm2),
        0,
      );
    let leanKg = 0;
    run.webM.forEach((webM, e) => {
      const heightM = model.girderM - run.topM[e]! - run.bottomM[e]!;
      leanKg += tubs.count * density * webM * heightM * (shape.slant - 1) * model.elementM[e]!;
    });
    const studs = tubs.count * studsOnGirder(model, run, effects);
    const studsKg = studs * compositeData.studs.kgEach;
    const crossKg = framesKg + topBracingKg + diaphragmsKg;
    const splicesKg = tubs.count * fieldSplicesKg(model, run);
    const weldsKg =
      compositeData.weldsAndBoltsShare.value * (plateKg + leanKg + crossKg + ribsKg + bearingStiffenersKg);
    return {
      framesKg,
      topBracingKg,
      ribsKg,
      diaphragmsKg,
      leanKg,
      pressedRibs,
      spanRibs,
      frames,
      crossKg,
      lateralKg: 0,
      substringersKg: 0,
      stiffenersKg: ribsKg,
      bearingStiffenersKg,
      studsKg,
      weldsKg,
      splicesKg,
      totalKg: crossKg + ribsKg + bearingStiffenersKg + leanKg + studsKg + weldsKg + splicesKg,
      crossGirderM: 0,
      crossName: 'frames',
      studs,
    };
  };
}

/** One frame: ribs on bottom plate and webs, and a pair of diagonals for the distortion of an eccentric load. */
function frameKg(box: BoxGirderModel): number {
  const { shape, torsion, standard, field } = box;
  const { ringKgM, diagonalLeastKgM, diagonalStressShare, distortionShare } = compositeBoxData.frames;
  const ringM = shape.bottomM + 2 * shape.slant * shape.heightM;
  const diagonalM = Math.hypot((shape.topM + shape.bottomM) / 4, shape.heightM);
  const torqueKNm =
    standard.factors.uls.traffic * (torsion.vehicleKNm + torsion.uniformKNmPerM * field.frameM);
  // The pair of forces on the webs, halved for distortion, is held by one diagonal in tension and one in compression.
  const pairKN = (distortionShare * torqueKNm) / ((shape.topM + shape.bottomM) / 2);
  const forceKN = ((pairKN / 2) * diagonalM) / shape.heightM;
  const areaM2 = forceKN / (diagonalStressShare * box.yieldMPa(0.012) * 1e3);
  const kgM = Math.max(diagonalLeastKgM, materials.steelDensityKgM3 * areaM2);
  return ringKgM * ringM + 2 * diagonalM * kgM;
}

/** Diagonals and struts between the top flanges of one tub, kg. */
function topBracing({ shape, braceAtM }: BoxGirderModel): number {
  let lengthM = shape.topM;
  for (let i = 1; i < braceAtM.length; i++)
    lengthM += shape.topM + Math.hypot(shape.topM, braceAtM[i]! - braceAtM[i - 1]!);
  return compositeBoxData.topBracing.kgM * lengthM;
}

/** Plate diaphragms of one box over its supports with their ribs, kg. */
function diaphragms({ shape, supportsM }: BoxGirderModel): number {
  const { plateM, endPlateM, openingM2, ribShare } = compositeBoxData.diaphragm;
  const areaM2 = Math.max(0, ((shape.topM + shape.bottomM) / 2) * shape.heightM - openingM2);
  const last = supportsM.length - 1;
  const volume = supportsM.reduce((sum, _, j) => sum + areaM2 * (j > 0 && j < last ? plateM : endPlateM), 0);
  return (1 + ribShare) * materials.steelDensityKgM3 * volume;
}

/**
 * Share of a stretch over which a value that runs straight from `a` to `b` is negative. Whole elements would come and go with
 * the rounding of moments that are nothing, over the abutments above all.
 */
function negativeShare(a: number, b: number): number {
  if (a >= 0 && b >= 0) return 0;
  if (a <= 0 && b <= 0) return 1;
  return Math.min(a, b) / (Math.min(a, b) - Math.max(a, b));
}

/** Length over which the bottom plate can be pressed under design loads, m. */
function pressedLength(model: GirderModel, { steelStage, superimposed, traffic }: GirderEffects): number {
  const { uls } = model.standard.factors;
  let lengthM = 0;
  model.elementM.forEach((length, e) => {
    const least = (i: number): number =>
      uls.permanentFavourable * steelStage.momentKNm[i]! +
      superimposed.momentKNm[i]! +
      uls.traffic * traffic.momentMinKNm[i]!;
    lengthM += length * negativeShare(least(e), least(e + 1));
  });
  // Single spans have none to speak of: traffic does not lift them.
  return model.task.spansM.length > 1 ? lengthM : 0;
}
