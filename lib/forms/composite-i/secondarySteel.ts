import { materials } from '../../actions/index.ts';
import { compositeData } from './compositeData.ts';
import { girderFigures, type GirderFigures } from './girderSection.ts';
import type { GirderEffects } from './girderEffects.ts';
import type { GirderModel } from './girderModel.ts';
import { elementsPerSpan } from './elementsPerSpan.ts';
import { platesAt, type PlateRun } from './plateRun.ts';
import { gussetKg, strutKgPerM } from './bracingMember.ts';
import { fieldSplicesKg } from './fieldSplices.ts';
import { carryingFrameKg } from './substringers.ts';
import { lateralBracingKg } from './lateralBracing.ts';
import { alongKg, stiffenersBetween } from './webStiffener.ts';

/** Steel of a deck besides webs and flanges, kg for the whole width, and what of it is painted. */
export interface SecondarySteel {
  readonly crossKg: number;
  /** Bracing in plan; 0 where there is none. */
  readonly lateralKg: number;
  readonly substringersKg: number;
  readonly stiffenersKg: number;
  readonly bearingStiffenersKg: number;
  readonly studsKg: number;
  readonly weldsKg: number;
  /** Plates and bolts of field splices; 0 where girders are welded on site. */
  readonly splicesKg: number;
  readonly totalKg: number;
  /** Depth of the cross-girder as drawn, m; 0 for cross-frames. */
  readonly crossGirderM: number;
  readonly crossName: string;
  readonly studs: number;
}

const figures: GirderFigures = { areaM2: 0, centroidM: 0, inertiaM4: 0 };

/**
 * Cross-girders or cross-frames, stiffeners, studs and welds. Cross-girders and posts form frames that hold the
 * compressed flange: their moment is that of 1 % of the flange force and the wind of a bay at flange level, about the
 * cross-girder at half height.
 * @param plateKg webs and flanges of all girders, kg
 */
export function secondarySteel(
  model: GirderModel,
  run: PlateRun,
  effects: GirderEffects,
  plateKg: number,
): SecondarySteel {
  const { layout, girderM, braceAtM, supportsM, heights } = model;
  const density = materials.steelDensityKgM3;
  const frame = frameMomentKNm(model, run);
  const fyKNm2 = model.yieldMPa(0.03) * 1e3;
  const inner = braceAtM.length - supportsM.length;
  const cross = layout.twin ? crossGirders(model, frame / fyKNm2, inner) : crossFrames(model, inner);

  const { stiffeners, post } = compositeData;
  const flangesM = Math.min(...run.topM) + Math.min(...run.bottomM);
  const webM = meanBraceHeight(model) - flangesM;
  const widthM = stiffeners.widthBaseM + stiffeners.widthPerHeight * girderM;
  const thicknessM = Math.max(stiffeners.leastMm / 1000, widthM / stiffeners.slenderness);
  const pair = 2 * widthM * thicknessM;
  const postArea = layout.twin
    ? Math.max(pair, frame / fyKNm2 / (post.leverRatio * post.depthOverGirder * girderM))
    : pair;
  const between = stiffenersBetween(model);
  const stiffenersKg =
    layout.count *
    (inner * postArea * webM * density + (between * pair * webM * density) / 2 + alongKg(model, run.heightM));
  const reactions = designReactions(model, effects);
  const bearingM3 = reactions.reduce(
    (sum, kN, j) =>
      sum +
      Math.max(2 * pair, kN / (stiffeners.bearingStressShare * fyKNm2)) *
        (heights.atStationM[j * elementsPerSpan]! - flangesM),
    0,
  );
  const bearingStiffenersKg = layout.count * bearingM3 * density;
  const substringersKg = model.substringers
    ? model.substringers.lines * model.substringers.beam.massKgPerM * model.lengthM
    : 0;
  const lateralKg = lateralBracingKg(model);
  const studs = layout.count * studsOnGirder(model, run, effects);
  const studsKg = studs * compositeData.studs.kgEach;
  const splicesKg = layout.count * fieldSplicesKg(model, run);
  const weldsKg =
    compositeData.weldsAndBoltsShare.value *
    (plateKg + cross.kg + lateralKg + stiffenersKg + bearingStiffenersKg);
  return {
    crossKg: cross.kg,
    lateralKg,
    substringersKg,
    stiffenersKg,
    bearingStiffenersKg,
    studsKg,
    weldsKg,
    splicesKg,
    totalKg:
      cross.kg +
      lateralKg +
      substringersKg +
      stiffenersKg +
      bearingStiffenersKg +
      studsKg +
      weldsKg +
      splicesKg,
    crossGirderM: cross.heightM,
    crossName: cross.name,
    studs,
  };
}

/** Mean height of the girders where they are braced in the spans, m. */
function meanBraceHeight({ heights, braceAtM, supportsM, elementM, girderM }: GirderModel): number {
  if (!heights.haunched) return girderM;
  let e = 0;
  let start = 0;
  let sum = 0;
  let count = 0;
  for (const at of braceAtM) {
    if (supportsM.some((x) => Math.abs(x - at) < 1e-6)) continue;
    while (e < elementM.length - 1 && start + elementM[e]! < at) start += elementM[e++]!;
    sum += heights.ofElementM[e]!;
    count++;
  }
  return count > 0 ? sum / count : girderM;
}

/** Moment of a transverse frame at half height, kNm: share of the greatest flange force plus the wind of a bay. */
function frameMomentKNm(model: GirderModel, run: PlateRun): number {
  const { crossGirder } = compositeData;
  let most = 0;
  for (let e = 0; e < run.bottomM.length; e++) {
    const thickness = run.bottomM[e]!;
    const force =
      crossGirder.flangeForceShare * run.bottomWidthM * thickness * model.yieldMPa(thickness) * 1e3 +
      (crossGirder.windKNm2 * run.heightM[e]! * model.bracingM[e]!) / 2;
    most = Math.max(most, force * run.heightM[e]!);
  }
  return most / 2;
}

interface Cross {
  readonly kg: number;
  readonly heightM: number;
  readonly name: string;
}

/** Rolled beams between twin girders: deep enough for a stiff frame, strong enough for its moment, deeper at supports. */
function crossGirders(model: GirderModel, modulusM3: number, inner: number): Cross {
  const { crossGirder } = compositeData;
  const spacing = model.layout.spacingM;
  const pick = (depthRatio: number): (typeof crossGirder.rolled)[number] => {
    const fitting = crossGirder.rolled.filter((rolled) => rolled.heightM <= 0.8 * model.girderM);
    const strong = fitting.find(
      (rolled) => rolled.heightM >= depthRatio * spacing - 0.02 && rolled.modulusCm3 >= modulusM3 * 1e6,
    );
    return strong ?? fitting[fitting.length - 1] ?? crossGirder.rolled[0]!;
  };
  const ordinary = pick(crossGirder.depthOverSpacing);
  const atSupports = pick(crossGirder.depthOverSpacingAtSupports);
  const kg = spacing * (inner * ordinary.kgPerM + model.supportsM.length * atSupports.kgPerM);
  return { kg, heightM: ordinary.heightM, name: ordinary.name };
}

/** Cross-frames of angles between several girders, channels between shallow ones. */
function crossFrames(model: GirderModel, inner: number): Cross {
  const { crossFrame } = compositeData;
  const { spacingM, count } = model.layout;
  const deep = model.girderM > crossFrame.mostGirderForFrameM;
  const kgPerM = deep ? crossFrame.kgPerM : crossFrame.channelKgPerM;
  const perSupport = deep ? crossFrame.kgPerMAtSupports : crossFrame.channelKgPerM;
  const supports = model.supportsM.length;
  const { substringers, standardId } = model;
  const diagonalM = Math.hypot(spacingM, model.girderM);
  // Diagonals that cross hold each other in the middle; chords are free from girder to girder.
  const angle = (lengthM: number, least: number): number => Math.max(least, strutKgPerM(lengthM, standardId));
  const bay = (least: number): number => {
    if (substringers) return carryingFrameKg(substringers, model, least);
    if (!deep) return spacingM * least;
    const chord = angle(spacingM, least);
    return (
      2 * diagonalM * angle(diagonalM / 2, least) +
      2 * spacingM * chord +
      compositeData.gusset.perFrame * gussetKg(chord)
    );
  };
  const kg = (count - 1) * (inner * bay(kgPerM) + supports * bay(perSupport));
  return { kg, heightM: 0, name: deep ? 'cross-frames of angles' : 'channels' };
}

/** Design reactions of one girder, kN. */
export function designReactions(model: GirderModel, effects: GirderEffects): number[] {
  const { uls } = model.standard.factors;
  return model.supportsM.map(
    (_, j) =>
      uls.permanent * effects.steelStage.reactionKN[j]! +
      uls.superimposed * effects.superimposed.reactionKN[j]! +
      uls.traffic * effects.traffic.reactionMaxKN[j]!,
  );
}

/** Studs of one girder: design longitudinal shear V S / I of the uncracked section along the girder, over one stud. */
export function studsOnGirder(model: GirderModel, run: PlateRun, effects: GirderEffects): number {
  const { uls } = model.standard.factors;
  const { studs } = compositeData;
  let count = 0;
  for (let e = 0; e < model.elementM.length; e++) {
    const top = model.short[e]!;
    const { centroidM, inertiaM4 } = girderFigures(figures, platesAt(run, e), top);
    const first = top.slabAreaM2 * (run.heightM[e]! + top.slabAboveM - centroidM);
    const { superimposed, traffic } = effects;
    const laid = (Math.abs(superimposed.shearRightKN[e]!) + Math.abs(superimposed.shearLeftKN[e + 1]!)) / 2;
    const moving = (absoluteShear(traffic, e) + absoluteShear(traffic, e + 1)) / 2;
    const v = uls.superimposed * laid + uls.traffic * moving;
    const perM = Math.max((v * first) / inertiaM4 / studs.resistanceKN, studs.leastPerM2 * run.topWidthM);
    count += perM * model.elementM[e]!;
  }
  return Math.ceil(count);
}

function absoluteShear(traffic: GirderEffects['traffic'], i: number): number {
  return Math.max(traffic.shearMaxKN[i]!, -traffic.shearMinKN[i]!);
}
