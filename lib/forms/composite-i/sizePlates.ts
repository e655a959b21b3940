import { materials } from '../../actions/index.ts';
import { webShearCapacity } from '../../mechanics/index.ts';
import { plateThicknessesMm, roundPlateUp, roundWidthUp, thickestPlateM } from '../common/plates.ts';
import { plateSteps } from '../common/plateSteps.ts';
import { compositeData } from './compositeData.ts';
import { elementChecks, leastFlangeM, noUse } from './elementChecks.ts';
import type { GirderEffects } from './girderEffects.ts';
import type { GirderModel } from './girderModel.ts';
import type { GirderPlates } from './girderSection.ts';
import type { PlateRun } from './plateRun.ts';
import type { StageMoments } from './stageMoments.ts';
import { mostWebSlenderness } from './webStiffener.ts';

/** Design shear on one girder, kN, by element: greatest over its ends and over the signs of traffic. */
export function designShear(model: GirderModel, effects: GirderEffects): Float64Array {
  const { uls } = model.standard.factors;
  const { steelStage, superimposed, shrinkage, traffic } = effects;
  const slant = model.plate?.slant ?? 1;
  return model.elementM.map((_, e) => {
    const torsion = model.plate?.torsionKN[e] ?? 0;
    const right =
      uls.permanent * steelStage.shearRightKN[e]! +
      uls.superimposed * superimposed.shearRightKN[e]! +
      shrinkage.shearRightKN[e]!;
    const left =
      uls.permanent * steelStage.shearLeftKN[e + 1]! +
      uls.superimposed * superimposed.shearLeftKN[e + 1]! +
      shrinkage.shearLeftKN[e + 1]!;
    const q = uls.traffic;
    const upright = Math.max(
      Math.abs(right + q * traffic.shearMaxKN[e]!),
      Math.abs(right + q * traffic.shearMinKN[e]!),
      Math.abs(left + q * traffic.shearMaxKN[e + 1]!),
      Math.abs(left + q * traffic.shearMinKN[e + 1]!),
    );
    return slant * upright + torsion;
  });
}

/** Shear resistance of a web of one element, kN; stiffened at the bracings. */
export function webCapacityKN(model: GirderModel, e: number, webM: number, heightM: number): number {
  return webShearCapacity({
    depthM: heightM * (model.plate?.slant ?? 1),
    thicknessM: webM,
    fyMPa: model.yieldMPa(webM),
    panelLengthM: model.bracingM[e]!,
    partialFactor: model.standard.resistance.steelBuckling,
  });
}

/** Web thicknesses, m, by element: shear, slenderness and the practical minimum, in few steps. */
export function sizeWeb(model: GirderModel, run: PlateRun, shearKN: Float64Array): Float64Array {
  const { web, bendingShear } = compositeData;
  const rolled = plateThicknessesMm.map((mm) => mm / 1000).filter((t) => t <= web.mostMm.value / 1000);
  const need = shearKN.map((v, e) => {
    const height = run.heightM[e]! - run.topM[e]! - run.bottomM[e]!;
    const longM = height * (model.plate?.slant ?? 1);
    const least = Math.max(web.leastMm[model.standardId] / 1000, longM / mostWebSlenderness(model, height));
    const fits = rolled.find(
      (t) => t >= least - 1e-9 && v <= bendingShear.most * webCapacityKN(model, e, t, height),
    );
    return fits ?? web.mostMm.value / 1000;
  });
  mirrored(model, need);
  return steps(model, need, model.girderM);
}

/** Flange widths from the areas that the most loaded sections need; constant along the girder. */
export function flangeWidths(
  model: GirderModel,
  topAreaM2: number,
  bottomAreaM2: number,
): { readonly topM: number; readonly bottomM: number } {
  const { flange } = compositeData;
  const bay = Math.max(...model.bracingM);
  const least = Math.max(
    flange.leastWidthM,
    flange.leastWidthOverGirder * model.girderM,
    flange.leastWidthOverBracing * Math.min(bay * 4, compositeData.pieceLengthM.value),
  );
  const width = (area: number): number =>
    Math.min(
      flange.mostWidthM,
      Math.max(least, Math.sqrt(flange.widthOverThickness * area), area / thickestPlateM(model.standardId)),
    );
  if (model.plate) return { topM: roundWidthUp(width(topAreaM2)), bottomM: model.plate.widthM };
  const bottomM = roundWidthUp(width(bottomAreaM2));
  const topM = Math.min(
    bottomM,
    roundWidthUp(Math.max(least, Math.min(width(topAreaM2), flange.topOverBottomWidth * bottomM))),
  );
  return { topM, bottomM };
}

const use = noUse();

/** Use the flanges are sized for: the last step of stiffness moves the moments by a per cent or two. */
const aim = 0.98;

/**
 * Flange thicknesses that the moments ask for, by element, m, before they are stepped. Each flange is moved by the
 * stress it lacks or has to spare (its area plus a sixth of the web is what a modulus is made of) a few times over.
 * @param most thickest flange, m; more than the thickest plate while widths are still open
 */
export function flangeNeeds(
  model: GirderModel,
  run: PlateRun,
  moments: StageMoments,
  equivalentKNm: Float64Array,
  fatigueMPa: number,
  most = thickestPlateM(model.standardId),
): { readonly top: Float64Array; readonly bottom: Float64Array } {
  const elements = model.elementM.length;
  const top = new Float64Array(elements);
  const bottom = new Float64Array(elements);
  const least = compositeData.flange.leastMm / 1000;
  const leastBottom = model.plate?.leastM ?? least;
  const plates = {
    heightM: 0,
    topWidthM: run.topWidthM,
    bottomWidthM: run.bottomWidthM,
    topM: 0,
    bottomM: 0,
    webM: 0,
  };
  for (let e = 0; e < elements; e++) {
    plates.heightM = run.heightM[e]!;
    plates.topM = run.topM[e]!;
    plates.bottomM = run.bottomM[e]!;
    plates.webM = run.webM[e]!;
    for (let round = 0; round < 5; round++) {
      elementChecks(use, model, plates, e, moments, equivalentKNm, fatigueMPa);
      const wantTop = Math.max(use.castTop, use.sagTop, use.hogTop, use.fatigueTop) / aim;
      const wantBottom = Math.max(use.sagBottom, use.hogBottom, use.service, use.fatigueBottom) / aim;
      const before = plates.topM + plates.bottomM;
      plates.topM = moved(plates, plates.topM, plates.topWidthM, wantTop, least, most);
      plates.bottomM = moved(plates, plates.bottomM, plates.bottomWidthM, wantBottom, leastBottom, most);
      // Outstands of compressed flanges stay in class 3 at the stress they carry.
      plates.topM = Math.max(
        plates.topM,
        leastFlangeM(plates.topWidthM, plates.webM, use.castTop * model.yieldMPa(plates.topM)),
      );
      if (use.hogBottom > 0 && !model.plate)
        plates.bottomM = Math.max(
          plates.bottomM,
          leastFlangeM(plates.bottomWidthM, plates.webM, use.hogBottom * model.yieldMPa(plates.bottomM)),
        );
      if (Math.abs(plates.topM + plates.bottomM - before) < 2e-4) break;
    }
    top[e] = Math.min(most, plates.topM);
    bottom[e] = Math.min(most, plates.bottomM);
  }
  mirrored(model, top);
  mirrored(model, bottom);
  return { top, bottom };
}

/** On symmetrical spans both halves get the greater need: traces of rounding do not decide a plate. */
function mirrored(model: GirderModel, needM: Float64Array): void {
  const { spansM } = model.task;
  if (!spansM.every((spanM, i) => spanM === spansM[spansM.length - 1 - i])) return;
  for (let e = 0, m = needM.length - 1; e < m; e++, m--) needM[e] = needM[m] = Math.max(needM[e]!, needM[m]!);
}

function moved(
  plates: GirderPlates,
  thicknessM: number,
  widthM: number,
  want: number,
  least: number,
  most: number,
): number {
  const web = (plates.heightM - plates.topM - plates.bottomM) * plates.webM;
  const next = thicknessM + (want - 1) * (thicknessM + web / (6 * widthM));
  return Math.min(most, Math.max(least, next, thicknessM / 3));
}

/** Stepped flanges from the needs; `floor` keeps plates of an earlier round from growing thinner. */
export function steppedFlange(
  model: GirderModel,
  needM: Float64Array,
  widthM: number,
  floor?: Float64Array,
): Float64Array {
  const need = floor ? needM.map((t, e) => Math.max(t, floor[e]!)) : needM;
  return steps(model, need, widthM);
}

function steps(model: GirderModel, need: Float64Array, widthM: number): Float64Array {
  return plateSteps(
    need,
    model.elementM,
    widthM * materials.steelDensityKgM3,
    compositeData.plateChangeKg.value,
    compositeData.leastPlateLengthM.value,
    roundPlateUp,
  );
}
