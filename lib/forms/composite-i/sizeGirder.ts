import { materials } from '../../actions/index.ts';
import { roundPlateUp, roundWidthUp, thickestPlateM } from '../common/plates.ts';
import { compositeData } from './compositeData.ts';
import { elementChecks, noUse } from './elementChecks.ts';
import { fatigueLimitMPa, fatigueRange } from './fatigueRange.ts';
import { girderEffects, type GirderEffects } from './girderEffects.ts';
import { elementsPerSpan } from './elementsPerSpan.ts';
import type { GirderModel } from './girderModel.ts';
import { steelArea } from './girderSection.ts';
import { platesAt, sameRun, type PlateRun } from './plateRun.ts';
import { secondarySteel, type SecondarySteel } from './secondarySteel.ts';
import { designShear, flangeNeeds, flangeWidths, sizeWeb, steppedFlange } from './sizePlates.ts';
import { stageMoments, type StageMoments } from './stageMoments.ts';
import { mostWebSlenderness } from './webStiffener.ts';

/** One girder with its plates and what it was checked with. */
export interface SizedGirder {
  readonly run: PlateRun;
  readonly effects: GirderEffects;
  readonly moments: StageMoments;
  readonly shearKN: Float64Array;
  readonly equivalentKNm: Float64Array;
  readonly secondary: SecondarySteel;
  /** Webs and flanges of all girders, kg. */
  readonly plateKg: number;
}

/**
 * Plates of a girder from its moments, and moments from its plates: stiffness, own weight and plates are brought into
 * agreement, then the result is worked out once more and plates that came out short are thickened.
 */
export function sizeGirder(model: GirderModel, secondaryOf = secondarySteel): SizedGirder {
  const fatigueMPa = fatigueLimitMPa(model.standardId);
  let run = guessRun(model);
  let secondaryKgM = 0.15 * meanKgM(model, run);
  let effects = girderEffects(model, run, secondaryKgM);
  const equivalentKNm = fatigueRange(model, effects.shortBeam);
  for (let pass = 0; pass < 2; pass++) {
    const moments = stageMoments(model, effects);
    const webM = sizeWeb(model, run, designShear(model, effects));
    run = flanged(model, { ...run, webM }, moments, equivalentKNm, fatigueMPa, pass === 0);
    secondaryKgM = secondaryPerM(model, run, effects, secondaryOf);
    // Traffic moves little with the stiffness: it is placed on the first guess and on the finished girder.
    effects = girderEffects(model, run, secondaryKgM, pass === 0 ? effects.traffic : undefined);
  }
  for (let round = 0; ; round++) {
    const moments = stageMoments(model, effects);
    const shearKN = designShear(model, effects);
    const next = round < 2 ? thickened(model, run, moments, shearKN, equivalentKNm, fatigueMPa) : run;
    if (sameRun(next, run)) {
      const plateKg = model.layout.count * model.lengthM * meanKgM(model, run);
      const secondary = secondaryOf(model, run, effects, plateKg);
      return { run, effects, moments, shearKN, equivalentKNm, secondary, plateKg };
    }
    run = next;
    secondaryKgM = secondaryPerM(model, run, effects, secondaryOf);
    effects = girderEffects(model, run, secondaryKgM);
  }
}

/** Flanges from the guessed moments, M / (h fy), web by slenderness. */
function guessRun(model: GirderModel): PlateRun {
  const { flange, web } = compositeData;
  const elements = model.elementM.length;
  const fy = model.yieldMPa(0.05) * 1e3;
  const areas = Float64Array.from({ length: elements }, (_, e) => {
    const moment = Math.max(Math.abs(model.guessKNm[e]!), Math.abs(model.guessKNm[e + 1]!));
    return moment / (model.heights.ofElementM[e]! * fy);
  });
  const most = Math.max(...areas);
  const { topM: topWidthM, bottomM: bottomWidthM } = flangeWidths(model, 0.7 * most, most);
  const least = flange.leastMm / 1000;
  const leastBottom = model.plate?.leastM ?? least;
  const thickest = thickestPlateM(model.standardId);
  const thickness = (area: number, widthM: number, leastM: number): number =>
    Math.min(thickest, Math.max(leastM, area / widthM));
  const webM = model.heights.ofElementM.map((heightM) =>
    Math.min(
      web.mostMm.value / 1000,
      roundPlateUp(
        Math.max(web.leastMm[model.standardId] / 1000, heightM / mostWebSlenderness(model, heightM)),
      ),
    ),
  );
  return {
    heightM: model.heights.ofElementM,
    topWidthM,
    bottomWidthM,
    topM: areas.map((area) => thickness(0.7 * area, topWidthM, least)),
    bottomM: areas.map((area) => thickness(area, bottomWidthM, leastBottom)),
    webM,
  };
}

/**
 * Stepped flanges from the moments. With `rewidth` the widths follow the areas asked for and the thicknesses keep the
 * areas: a shape to go on with.
 */
function flanged(
  model: GirderModel,
  run: PlateRun,
  moments: StageMoments,
  equivalentKNm: Float64Array,
  fatigueMPa: number,
  rewidth: boolean,
): PlateRun {
  const most = thickestPlateM(model.standardId);
  const needs = flangeNeeds(
    model,
    run,
    moments,
    equivalentKNm,
    fatigueMPa,
    rewidth ? openWidths * most : most,
  );
  const widths = rewidth
    ? flangeWidths(
        model,
        Math.max(...needs.top) * run.topWidthM,
        Math.max(...needs.bottom) * run.bottomWidthM,
      )
    : { topM: run.topWidthM, bottomM: run.bottomWidthM };
  const kept = (needM: Float64Array, ratio: number): Float64Array =>
    needM.map((t) => Math.min(most, t * ratio));
  return {
    ...run,
    topWidthM: widths.topM,
    bottomWidthM: widths.bottomM,
    topM: steppedFlange(model, kept(needs.top, run.topWidthM / widths.topM), widths.topM),
    bottomM: steppedFlange(model, kept(needs.bottom, run.bottomWidthM / widths.bottomM), widths.bottomM),
  };
}

/** How far past the thickest plate a need may go while the width is still to be chosen: yield is held at the thickest. */
const openWidths = 1.5;

const use = noUse();

/** Plates thickened where a limit is passed; the same run where none is, or where the thickest plates are there already. */
function thickened(
  model: GirderModel,
  run: PlateRun,
  moments: StageMoments,
  shearKN: Float64Array,
  equivalentKNm: Float64Array,
  fatigueMPa: number,
): PlateRun {
  let topUse = 0;
  let bottomUse = 0;
  for (let e = 0; e < model.elementM.length; e++) {
    elementChecks(use, model, platesAt(run, e), e, moments, equivalentKNm, fatigueMPa);
    topUse = Math.max(topUse, use.castTop, use.sagTop, use.hogTop, use.fatigueTop);
    bottomUse = Math.max(bottomUse, use.sagBottom, use.hogBottom, use.service, use.fatigueBottom);
  }
  const top = topUse > 1;
  const bottom = bottomUse > 1;
  const webNeed = sizeWeb(model, run, shearKN);
  const web = webNeed.some((t, e) => t > run.webM[e]!);
  if (!top && !bottom && !web) return run;
  const next = { ...run, webM: web ? run.webM.map((t, e) => Math.max(t, webNeed[e]!)) : run.webM };
  const needs = flangeNeeds(model, next, moments, equivalentKNm, fatigueMPa);
  const topWidthM = top ? widened(model, needs.top, run.topWidthM, topUse) : run.topWidthM;
  // The bottom plate of a box is as wide as the box.
  const bottomWidthM = model.plate
    ? run.bottomWidthM
    : Math.max(
        topWidthM,
        bottom ? widened(model, needs.bottom, run.bottomWidthM, bottomUse) : run.bottomWidthM,
      );
  return {
    ...next,
    topWidthM,
    bottomWidthM,
    topM: top ? steppedFlange(model, needs.top, topWidthM, run.topM) : run.topM,
    bottomM: bottom ? steppedFlange(model, needs.bottom, bottomWidthM, run.bottomM) : run.bottomM,
  };
}

/** Width of a flange whose thickest plate is not enough, m: wider by what it lacks. */
function widened(model: GirderModel, needM: Float64Array, widthM: number, use: number): number {
  const enough = needM.every((t) => t < thickestPlateM(model.standardId) - 1e-9);
  if (enough) return widthM;
  return Math.max(widthM, Math.min(compositeData.flange.mostWidthM, roundWidthUp(widthM * use)));
}

/** Mean mass of webs and flanges of one girder, kg/m. */
function meanKgM(model: GirderModel, run: PlateRun): number {
  let kg = 0;
  for (let e = 0; e < model.elementM.length; e++)
    kg += materials.steelDensityKgM3 * steelArea(platesAt(run, e)) * model.elementM[e]!;
  return kg / model.lengthM;
}

function secondaryPerM(
  model: GirderModel,
  run: PlateRun,
  effects: GirderEffects,
  secondaryOf: typeof secondarySteel,
): number {
  const plateKg = model.layout.count * model.lengthM * meanKgM(model, run);
  return secondaryOf(model, run, effects, plateKg).totalKg / (model.layout.count * model.lengthM);
}

/** Station in the middle of each span. */
export function midStations(model: GirderModel): number[] {
  return model.task.spansM.map((_, span) => span * elementsPerSpan + elementsPerSpan / 2);
}
