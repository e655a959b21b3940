import { materials } from '../../actions/index.ts';
import { webShearCapacity, yieldRatio } from '../../mechanics/index.ts';
import { plateSteps } from '../common/plateSteps.ts';
import { plateThicknessesMm, roundPlateUp, roundWidthUp, thickestPlateM } from '../common/plates.ts';
import { elementsPerSpan } from '../composite-i/elementsPerSpan.ts';
import {
  girderFigures,
  steelArea,
  type GirderFigures,
  type GirderPlates,
} from '../composite-i/girderSection.ts';
import { fatigueLimitMPa } from '../floor/fatigue.ts';
import type { Floor } from '../floor/sizeFloor.ts';
import type { EdgeCase } from './edgeCase.ts';
import { edgeDemand, type EdgeDemand, type EdgeLoads, type EdgeStatics } from './edgeStatics.ts';
import { flangeUse, noFlangeUse, type Bed, type EdgeRules } from './flangeUse.ts';
import { framePost, type FramePost } from './framePost.ts';
import { halfThroughData, type PostSection } from './halfThroughData.ts';
import { cosineOfSkew } from '../../site/skew.ts';
import { endShare, frameStiffnessKNm, steelKNm2, type UFrame } from './uFrame.ts';

/** What is chosen before the plates are sought. */
export interface EdgeChoice {
  readonly heightM: number;
  readonly post: PostSection;
  readonly floor: Floor;
  /** Cross-girders from support to support of each span, the first not counted. */
  readonly panels: readonly number[];
}

/** One edge girder with its plates and frames. */
export interface EdgeGirder {
  readonly choice: EdgeChoice;
  readonly widthM: number;
  readonly topM: Float64Array;
  readonly bottomM: Float64Array;
  readonly webM: Float64Array;
  readonly post: FramePost;
  readonly frame: UFrame;
  readonly frameKNm: number;
  /** Ordinary frames that each frame at a support is worth. */
  readonly endFrames: number;
  readonly beds: readonly Bed[];
  readonly loads: EdgeLoads;
  readonly demand: EdgeDemand;
  /** One girder: flanges and webs, posts, bearing stiffeners, details; kg. */
  readonly platesKg: number;
  readonly postsKg: number;
  readonly bearingKg: number;
  readonly detailKg: number;
  /** What the end frames add to the floor, both girders together, kg. */
  readonly endCrossKg: number;
}

const density = materials.steelDensityKgM3;
const gravity = 9.81e-3;
const work: GirderFigures = { areaM2: 0, centroidM: 0, inertiaM4: 0 };

/** Plates of element `e`; a fresh object. */
export function edgePlates(
  girder: Pick<EdgeGirder, 'choice' | 'widthM' | 'topM' | 'bottomM' | 'webM'>,
  e: number,
): GirderPlates {
  return {
    heightM: girder.choice.heightM,
    topWidthM: girder.widthM,
    bottomWidthM: girder.widthM,
    topM: girder.topM[e]!,
    bottomM: girder.bottomM[e]!,
    webM: girder.webM[e]!,
  };
}

/** Stiffness of a girder by element, kNm2. */
export function edgeStiffness(girder: EdgeGirder): Float64Array {
  return girder.topM.map((_, e) => steelKNm2 * girderFigures(work, edgePlates(girder, e)).inertiaM4);
}

/** Rules for the plates of an edge girder under the standard of a case. */
export function edgeRules(c: EdgeCase): EdgeRules {
  return {
    yieldMPa: c.yieldMPa,
    gammaM0: c.standard.resistance.steel,
    gammaM1: c.standard.resistance.steelBuckling,
    rangeMPa: fatigueLimitMPa(c.task.standard, 'stiffener'),
  };
}

/** Shear resistance of a web of an element, kN; stiffened at the posts. */
export function edgeWebKN(c: EdgeCase, webM: number, heightM: number, spacingM: number): number {
  return webShearCapacity({
    depthM: heightM,
    thicknessM: webM,
    fyMPa: c.yieldMPa(webM),
    panelLengthM: spacingM,
    partialFactor: c.standard.resistance.steelBuckling,
  });
}

/**
 * Plates of an edge girder for a height, posts and floor, with its own weight, until they agree.
 * @param start `passes`: rounds at most; `like`: a girder of about the same weight; `earlier`: one whose plates must not
 * grow thinner
 */
export function sizeEdgeGirder(
  c: EdgeCase,
  statics: EdgeStatics,
  choice: EdgeChoice,
  start: { readonly passes?: number; readonly like?: EdgeGirder; readonly earlier?: EdgeGirder } = {},
): EdgeGirder {
  const { passes = 4, earlier, like = earlier } = start;
  const { heightM } = choice;
  const carriedKNm = (c.curve * (choice.floor.slabKNm + choice.floor.steelKNm)) / 2 + c.kerbKNm;
  let girder = earlier;
  let ownKgM = like ? massKgM(like, c.lengthM) : (0.25 * carriedKNm) / gravity;
  for (let pass = 0; pass < passes; pass++) {
    const loads = { ownKNm: carriedKNm + c.curve * ownKgM * gravity, superimposedKNm: c.superimposedKNm };
    const demand = edgeDemand(c, statics, loads);
    const before = girder ?? firstPlates(c, heightM, demand);
    const webM = webs(c, choice, before, demand.shearKN);
    const post = framePost(choice.post, Math.min(...webM), c.yieldMPa(0.02));
    const frame = frameOf(c, choice, post, before);
    const framed = frames(c, choice, frame, before);
    const needs = flangeNeeds(c, choice, { ...before, webM }, framed.beds, demand, statics.rangeKNm);
    const widthM =
      pass === 0 && !earlier
        ? flangeWidth(c, before.widthM * Math.max(...needs.top, ...needs.bottom))
        : before.widthM;
    const ratio = before.widthM / widthM;
    const stepped = (need: Float64Array, floor?: Float64Array): Float64Array =>
      steps(
        c,
        need.map((t, e) => Math.min(thickestPlateM(c.task.standard), Math.max(t * ratio, floor?.[e] ?? 0))),
        widthM,
      );
    const sized = {
      choice,
      widthM,
      topM: stepped(needs.top, earlier?.topM),
      bottomM: stepped(needs.bottom, earlier?.bottomM),
      webM,
    };
    const masses = massesOf(c, statics, sized, post, framed.endFrames, loads);
    girder = { ...sized, post, frame, ...framed, loads, demand, ...masses };
    const next = massKgM(girder, c.lengthM);
    const settled = pass > 0 && Math.abs(next - ownKgM) < 0.005 * next;
    ownKgM = next;
    if (settled) break;
  }
  return girder!;
}

/** All steel of one girder per metre, kg. */
function massKgM(girder: EdgeGirder, lengthM: number): number {
  return (girder.platesKg + girder.postsKg + girder.bearingKg + girder.detailKg) / lengthM;
}

type Plates = Pick<EdgeGirder, 'widthM' | 'topM' | 'bottomM' | 'webM'>;

/** Flanges of M / (0.9 h fy), web by slenderness. */
function firstPlates(c: EdgeCase, heightM: number, demand: EdgeDemand): Plates {
  const { web } = halfThroughData;
  const fy = c.yieldMPa(0.05) * 1000;
  const most = Math.max(...demand.sagKNm, ...demand.hogKNm.map(Math.abs));
  const widthM = flangeWidth(c, most / (0.9 * heightM * fy));
  const t = c.elementM.map((_, e) => {
    const moment = Math.max(
      demand.sagKNm[e]!,
      demand.sagKNm[e + 1]!,
      -demand.hogKNm[e]!,
      -demand.hogKNm[e + 1]!,
    );
    return Math.max(halfThroughData.flange.leastMm / 1000, moment / (0.9 * heightM * fy) / widthM);
  });
  return {
    widthM,
    topM: t,
    bottomM: t,
    webM: new Float64Array(c.elementM.length).fill(
      roundPlateUp(Math.max(web.leastMm / 1000, heightM / web.mostHeightOverThickness)),
    ),
  };
}

/** Width of both flanges for the largest area asked for, m: no wider than the room beside the deck. */
function flangeWidth(c: EdgeCase, areaM2: number): number {
  const { flange, reach } = halfThroughData;
  const wanted = Math.max(
    flange.leastWidthM,
    Math.sqrt(flange.widthOverThickness * areaM2),
    areaM2 / thickestPlateM(c.task.standard),
  );
  return Math.min(roundWidthUp(wanted), 2 * (c.reachM - reach.gapM));
}

/** Web thicknesses by shear and slenderness, in few steps. */
function webs(c: EdgeCase, choice: EdgeChoice, plates: Plates, shearKN: Float64Array): Float64Array {
  const { web } = halfThroughData;
  const rolled = plateThicknessesMm.map((mm) => mm / 1000).filter((t) => t <= web.mostMm / 1000);
  const need = shearKN.map((v, e) => {
    const height = choice.heightM - plates.topM[e]! - plates.bottomM[e]!;
    const least = Math.max(web.leastMm / 1000, height / web.mostHeightOverThickness);
    const spacing = spacingAt(c, choice, e);
    const fits = rolled.find(
      (t) => t >= least - 1e-9 && v <= web.shearShare * edgeWebKN(c, t, height, spacing),
    );
    return fits ?? web.mostMm / 1000;
  });
  return steps(c, need, choice.heightM);
}

function steps(c: EdgeCase, needM: Float64Array, widthM: number): Float64Array {
  return plateSteps(
    mirrored(c, needM),
    c.elementM,
    widthM * density,
    halfThroughData.plateChangeKg.value,
    halfThroughData.leastPlateLengthM.value,
    roundPlateUp,
  );
}

/** Needs of the first half carried over to the other where it tells all; the greater where both are there. */
function mirrored(c: EdgeCase, needM: Float64Array): Float64Array {
  if (c.telling === needM.length) return needM;
  return needM.map((t, e) => Math.max(t, needM[needM.length - 1 - e]!));
}

/** Distance of cross-girders in the span of element `e`, m. */
export function spacingAt(c: EdgeCase, choice: Pick<EdgeChoice, 'panels'>, e: number): number {
  const span = Math.floor(e / elementsPerSpan);
  return c.task.spansM[span]! / choice.panels[span]!;
}

function frameOf(c: EdgeCase, { heightM, floor }: EdgeChoice, post: FramePost, plates: Plates): UFrame {
  const flangeZ = heightM - Math.max(...plates.topM) / 2;
  const crossM = floor.crossGirder.plates.heightM;
  return {
    postM: flangeZ - crossM,
    leverM: flangeZ - crossM / 2,
    planesM: floor.crossM,
    cosine: cosineOfSkew(c.task.skewDeg ?? null),
    postInertiaM4: post.inertiaM4,
    // The slab adds stiffness where it is pressed; where it is pulled it has cracked.
    crossInertiaM4: floor.crossGirder.steelInertiaM4,
  };
}

/** Ordinary and end frames of every span: as few at the supports as keep the share of the flange's strength. */
function frames(
  c: EdgeCase,
  choice: EdgeChoice,
  frame: UFrame,
  plates: Plates,
): { frameKNm: number; endFrames: number; beds: Bed[] } {
  const frameKNm = frameStiffnessKNm(frame);
  const { most, share } = halfThroughData.endFrames;
  const flange = (steelKNm2 * Math.max(...plates.topM) * plates.widthM ** 3) / 12;
  const spacings = choice.panels.map((panels, i) => c.task.spansM[i]! / panels);
  const bedKNm2 = frameKNm / Math.max(...spacings);
  let endFrames = 1;
  while (endFrames < most && endShare(endFrames * frameKNm, bedKNm2, flange) < share) endFrames++;
  return {
    frameKNm,
    endFrames,
    beds: spacings.map((spacingM, i) => ({
      frameKNm,
      endKNm: endFrames * frameKNm,
      spacingM,
      spanM: c.task.spansM[i]!,
    })),
  };
}

const use = noFlangeUse();
/** Use the flanges are sized for: the last round of own weight and stiffness moves the moments by a per cent or two. */
const aim = 0.98;

function flangeNeeds(
  c: EdgeCase,
  choice: EdgeChoice,
  plates: Plates,
  beds: readonly Bed[],
  demand: EdgeDemand,
  rangeKNm: Float64Array,
): { top: Float64Array; bottom: Float64Array } {
  const { flange, outstandSlenderness } = halfThroughData;
  const rules = edgeRules(c);
  const most = 1.5 * thickestPlateM(c.task.standard);
  const least = Math.max(
    flange.leastMm / 1000,
    plates.widthM / 2 / (outstandSlenderness.value * yieldRatio(c.yieldMPa(0.03))),
  );
  const top = new Float64Array(c.elementM.length);
  const bottom = new Float64Array(c.elementM.length);
  for (let e = 0; e < c.telling; e++) {
    const bed = beds[Math.floor(e / elementsPerSpan)]!;
    const sag = Math.max(demand.sagKNm[e]!, demand.sagKNm[e + 1]!);
    const hog = Math.min(demand.hogKNm[e]!, demand.hogKNm[e + 1]!);
    const range = Math.max(rangeKNm[e]!, rangeKNm[e + 1]!);
    const at = {
      heightM: choice.heightM,
      topWidthM: plates.widthM,
      bottomWidthM: plates.widthM,
      topM: Math.max(least, plates.topM[e]!),
      bottomM: Math.max(least, plates.bottomM[e]!),
      webM: plates.webM[e]!,
    };
    const web = (at.heightM * at.webM) / (6 * plates.widthM);
    for (let round = 0; round < 6; round++) {
      flangeUse(use, at, bed, rules, sag, hog, range);
      const before = at.topM + at.bottomM;
      at.topM = moved(at.topM, web, least, most, Math.max(use.sagTop, use.hogTop, use.fatigueTop));
      at.bottomM = moved(
        at.bottomM,
        web,
        least,
        most,
        Math.max(use.sagBottom, use.hogBottom, use.fatigueBottom),
      );
      if (Math.abs(at.topM + at.bottomM - before) < 2e-4) break;
    }
    top[e] = at.topM;
    bottom[e] = at.bottomM;
  }
  return { top, bottom };
}

/** Thickness moved by the share it lacks or has to spare: a modulus is made of the flange and a sixth of the web. */
function moved(t: number, web: number, least: number, most: number, want: number): number {
  return Math.min(most, Math.max(least, t + (want / aim - 1) * (t + web), t / 3));
}

function massesOf(
  c: EdgeCase,
  statics: EdgeStatics,
  plates: Plates & { readonly choice: EdgeChoice },
  post: FramePost,
  endFrames: number,
  loads: EdgeLoads,
): Pick<EdgeGirder, 'platesKg' | 'postsKg' | 'bearingKg' | 'detailKg' | 'endCrossKg'> {
  const { choice } = plates;
  let platesKg = 0;
  for (let e = 0; e < plates.topM.length; e++)
    platesKg += density * steelArea(edgePlates(plates, e)) * c.elementM[e]!;
  const inner = choice.panels.reduce((sum, panels) => sum + panels - 1, 0);
  const supports = c.supportsM.length;
  const postKg = density * post.areaM2 * choice.heightM;
  const { uls } = c.standard.factors;
  const fy = c.yieldMPa(0.03) * 1000;
  let bearingKg = 0;
  for (let j = 0; j < supports; j++) {
    const reaction =
      (uls.permanent * loads.ownKNm + uls.superimposed * loads.superimposedKNm) *
        statics.unit.reactionKN[j]! +
      uls.traffic * statics.traffic.reactionMaxKN[j]!;
    const areaM2 = Math.max(
      0,
      reaction / (halfThroughData.bearingStressShare.value * fy) - endFrames * post.areaM2,
    );
    bearingKg += density * areaM2 * choice.heightM;
  }
  const postsKg = postKg * (inner + endFrames * supports);
  return {
    platesKg,
    postsKg,
    bearingKg,
    detailKg: halfThroughData.detailShare.value * (platesKg + postsKg + bearingKg),
    endCrossKg: (endFrames - 1) * supports * choice.floor.crossGirder.massKgPerM * choice.floor.crossM,
  };
}
