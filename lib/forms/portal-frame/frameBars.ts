import { materials } from '../../actions/index.ts';
import { barDesignMPa } from '../common/bars.ts';
import { slabData } from '../common/slab/slabData.ts';
import { boxData } from '../concrete-box/boxData.ts';
import { bendingCapacity, compressionDepth, strandDesignMPa } from '../concrete-box/bendingCapacity.ts';
import { crackWidthMm, serviceBars } from '../slab/crackedSection.ts';
import { slabDeckData } from '../slab/slabDeckData.ts';
import { strengthCombinations } from './accidental.ts';
import { combinations, worstMoment, type Combination, type Combined } from './combine.ts';
import { deckDesignNodes, type FrameModel } from './frameModel.ts';
import type { FrameWall } from './frameShape.ts';
import type { FrameTendons } from './frameTendons.ts';
import type { FrameTraffic } from './frameTraffic.ts';
import { portalData } from './portalData.ts';

export type FaceId =
  | 'soffit'
  | 'top'
  | `${'first' | 'last'}-${'outer' | 'inner'}`
  | `middle-${'left' | 'right'}`;

/** Faces of a wall: away from the first span side and towards it, in the order outer, inner. */
export const wallFaces = (name: FrameWall['name']): readonly [FaceId, FaceId] =>
  name === 'middle' ? ['middle-left', 'middle-right'] : [`${name}-outer`, `${name}-inner`];

/** Main bars of one face of one part, along the chain. */
export interface FaceBars {
  readonly id: FaceId;
  readonly nodes: readonly number[];
  /** 1 the inner face (soffit), -1 the outer. */
  readonly sign: 1 | -1;
  readonly barM: number;
  /** Needed at the nodes over the whole width, m2, and placed. */
  readonly needM2: Float64Array;
  readonly placedM2: Float64Array;
  /** Greatest need over what fits, and where. */
  readonly use: number;
  readonly worst: number;
  readonly fitsM2: number;
  /** Design moment where it is used most, and what the most bars that fit carry there, kNm. */
  readonly designKNm: number;
  readonly capacityKNm: number;
  /** Steel, m3. */
  readonly volumeM3: number;
}

/** Width of a face and of the one opposite at a node, with the depth of the bars, m. */
interface Strip {
  readonly widthM: number;
  readonly pressedM: number;
  readonly depthM: number;
  /** Centroid from the pressed face. */
  readonly centroidM: number;
  readonly effectiveM: number;
}

/**
 * Bars of both faces of deck and walls: at the ultimate limit with the thrust that comes with each moment, and in service
 * for stress and cracks where nothing is prestressed, or the face cracks beside its tendons; the smallest size that fits.
 */
export function frameBars(
  model: FrameModel,
  traffic: FrameTraffic,
  tendons: FrameTendons | null,
): FaceBars[] {
  const parasitic = tendons?.parasitic ?? null;
  const ultimate = strengthCombinations(model, traffic, parasitic);
  const characteristic = combinations(model, traffic, 'characteristic', parasitic);
  const frequent = combinations(model, traffic, 'frequent', parasitic);
  const deck = deckDesignNodes(model.shape);
  const face = (id: FaceBars['id'], nodes: readonly number[], sign: 1 | -1): FaceBars =>
    faceBars(model, id, nodes, sign, [ultimate, characteristic, frequent], tendons);
  return [
    face('soffit', deck, 1),
    face('top', deck, -1),
    ...model.shape.walls.flatMap(({ name, nodes }) => {
      const [outer, inner] = wallFaces(name);
      return [face(outer, nodes, -1), face(inner, nodes, 1)];
    }),
  ];
}

type Limits = readonly [ultimate: Combination[], characteristic: Combination[], frequent: Combination[]];

function faceBars(
  model: FrameModel,
  id: FaceBars['id'],
  nodes: readonly number[],
  sign: 1 | -1,
  [ultimate, characteristic, frequent]: Limits,
  tendons: FrameTendons | null,
): FaceBars {
  const { bars } = slabDeckData;
  const inDeck = id === 'soffit' || id === 'top';
  const stressed = inDeck ? tendons : null;
  const at = (list: Combination[], node: number): Combined[] =>
    list.map((combination) => worstMoment(combination, node, sign));
  const ult = nodes.map((node) => at(ultimate, node));
  const inService = (list: Combination[], node: number): Combined[] =>
    stressed
      ? at(list, node).map((loads) => withTendons(model, stressed, loads, node, sign))
      : at(list, node);
  const frq = nodes.map((node) => inService(frequent, node));
  const chr = nodes.map((node) => inService(characteristic, node));
  const mayCrack = nodes.map((node, i) => !stressed || cracks(model, frq[i]!, node, sign));
  let found: FaceBars | null = null;
  for (const barM of bars.sizesM) {
    const needM2 = new Float64Array(nodes.length);
    let worst = 0;
    let use = 0;
    nodes.forEach((node, i) => {
      const strip = stripOf(model, node, sign, barM, inDeck);
      for (const loads of ult[i]!)
        needM2[i] = Math.max(needM2[i]!, ultimateBars(model, strip, loads, node, sign, stressed));
      if (mayCrack[i]!) needM2[i] = crackBars(model, strip, barM, frq[i]!, chr[i]!, needM2[i]!);
      const here = needM2[i]! / fits(strip, barM);
      if (here > use) {
        use = here;
        worst = i;
      }
    });
    const strip = stripOf(model, nodes[worst]!, sign, barM, inDeck);
    const design = ult[worst]!.reduce((a, b) => (b.momentKNm > a.momentKNm ? b : a));
    const placedM2 = placed(model, nodes, needM2, strip, barM, id === 'top');
    found = {
      id,
      nodes,
      sign,
      barM,
      needM2,
      placedM2,
      use,
      worst: nodes[worst]!,
      fitsM2: fits(strip, barM),
      designKNm: Math.max(0, design.momentKNm),
      capacityKNm: capacity(model, strip, design, barM, nodes[worst]!, sign, stressed),
      volumeM3: volume(model, nodes, placedM2, strip, barM),
    };
    if (use <= bars.closestM / bars.usualM / portalData.bars.layers) break;
  }
  return found!;
}

/** Most bars of a size in a face: layers at the closest spacing. */
function fits({ widthM }: Strip, barM: number): number {
  return (portalData.bars.layers * widthM * Math.PI * barM ** 2) / 4 / slabDeckData.bars.closestM;
}

function stripOf(model: FrameModel, node: number, sign: 1 | -1, barM: number, inDeck: boolean): Strip {
  const section = model.shape.sections[node]!;
  const { depthM, outerM, outerWidthM, innerWidthM } = section;
  // Walls and deck meet with bars of both crossing at the knee.
  const axisM = slabDeckData.bars.coverM + (inDeck ? 0.5 : 1) * barM;
  return {
    widthM: sign > 0 ? innerWidthM : outerWidthM,
    pressedM: sign > 0 ? outerWidthM : innerWidthM,
    depthM,
    centroidM: sign > 0 ? outerM : depthM - outerM,
    effectiveM: depthM - axisM,
  };
}

/** Tendons of a node as seen from the pressed face: area, m2, and depth, m. */
function strandsAt(
  node: number,
  sign: 1 | -1,
  depthM: number,
  tendons: FrameTendons | null,
): { readonly strandM2: number; readonly strandDepthM: number } {
  if (!tendons) return { strandM2: 0, strandDepthM: 0 };
  const level = tendons.levelM[node]!;
  return { strandM2: tendons.areaM2, strandDepthM: sign > 0 ? level : depthM - level };
}

/** A combination of service with what the lasting force of the tendons, on its low side, does to the section. */
function withTendons(
  { standardId, shape }: FrameModel,
  { forceKN, levelM }: FrameTendons,
  { momentKNm, thrustKN }: Combined,
  node: number,
  sign: 1 | -1,
): Combined {
  const lastingKN = boxData.prestressSpread[standardId] * forceKN;
  const eccentricityM = levelM[node]! - shape.sections[node]!.outerM;
  return {
    momentKNm: momentKNm - sign * lastingKN * eccentricityM,
    thrustKN: thrustKN + lastingKN,
  };
}

/**
 * Whether a face beside tendons cracks in frequent service (EN 1992-1-1 7.1(2)). Under AASHTO the tendons are found so that
 * it does not.
 */
function cracks(
  { standardId, shape, concrete }: FrameModel,
  frequent: readonly Combined[],
  node: number,
  sign: 1 | -1,
): boolean {
  if (standardId !== 'lm1') return false;
  const { areaM2, inertiaM4, outerM, depthM } = shape.sections[node]!;
  const farM = sign > 0 ? depthM - outerM : outerM;
  return frequent.some(
    ({ momentKNm, thrustKN }) => (momentKNm * farM) / inertiaM4 - thrustKN / areaM2 > concrete.fctmMPa * 1e3,
  );
}

const pressedFace = ({ pressedM, depthM }: Strip) => ({ widthM: pressedM, flangeM: depthM, websM: pressedM });

/** As fyd (d - c) = M - N (cg - c) - Ap fpd (dp - c), c the middle of the stress block under all of them. */
function ultimateBars(
  model: FrameModel,
  strip: Strip,
  { momentKNm, thrustKN }: Combined,
  node: number,
  sign: 1 | -1,
  tendons: FrameTendons | null,
): number {
  if (!(momentKNm > 0)) return 0;
  const strength = barDesignMPa(model.standardId) * 1e3;
  const { strandM2, strandDepthM } = strandsAt(node, sign, strip.depthM, tendons);
  const strandKN = strandM2 * (tendons ? strandDesignMPa(model) * 1e3 : 0);
  let areaM2 = 0;
  for (let pass = 0; pass < 5; pass++) {
    const force = Math.max(0, areaM2 * strength + strandKN + thrustKN);
    const c = Math.min(0.2 * strip.effectiveM, compressionDepth(model, pressedFace(strip), force));
    areaM2 = Math.max(
      0,
      (momentKNm - thrustKN * (strip.centroidM - c) - strandKN * Math.max(0, strandDepthM - c)) /
        (strength * (strip.effectiveM - c)),
    );
  }
  return areaM2;
}

/** Bars for stress and cracks, at least those given; a thrust takes its part of the moment off the bars. */
function crackBars(
  model: FrameModel,
  strip: Strip,
  barM: number,
  frequent: readonly Combined[],
  characteristic: readonly Combined[],
  leastM2: number,
): number {
  const { widthM, depthM, centroidM, effectiveM } = strip;
  const { standardId, concrete } = model;
  const arm = centroidM - (1 - slabData.leverRatio.value) * effectiveM;
  const worst = (loads: readonly Combined[]): number =>
    Math.max(...loads.map(({ momentKNm, thrustKN }) => (momentKNm - thrustKN * arm) / widthM));
  const piece = { depthM, effectiveM, barM };
  const moments = { frequentKNm: worst(frequent), characteristicKNm: worst(characteristic) };
  if (!(Math.max(moments.frequentKNm, moments.characteristicKNm) > 0)) return leastM2;
  const { yieldMPa } = materials.reinforcement[standardId];
  const { crack, serviceStressShare } = slabDeckData;
  const share = standardId === 'lm1' ? crack.sigma : serviceStressShare.value;
  const held =
    leastM2 * slabData.leverRatio.value * effectiveM * share * yieldMPa * 1e3 >=
      moments.characteristicKNm * widthM &&
    (standardId !== 'lm1' ||
      !(moments.frequentKNm > 0) ||
      crackWidthMm(piece, leastM2 / widthM, moments.frequentKNm, standardId, concrete) <= crack.widthMm);
  return held ? leastM2 : Math.max(leastM2, widthM * serviceBars(piece, moments, standardId, concrete));
}

function capacity(
  model: FrameModel,
  strip: Strip,
  { thrustKN }: Combined,
  barM: number,
  node: number,
  sign: 1 | -1,
  tendons: FrameTendons | null,
): number {
  const steel = {
    ...strandsAt(node, sign, strip.depthM, tendons),
    barM2: fits(strip, barM),
    barDepthM: strip.effectiveM - ((portalData.bars.layers - 1) / 2) * 2 * barM,
  };
  const c = compressionDepth(model, pressedFace(strip), Math.max(0, thrustKN));
  return bendingCapacity(model, steel, pressedFace(strip)) + thrustKN * (strip.centroidM - c);
}

/** Length of the members from a node to a later one of the same part, m. */
function lengthTo({ memberM, shape: { chainNodes } }: FrameModel, from: number, to: number): number {
  // Behind the chain a member starts at the node after its number.
  const late = from >= chainNodes ? 1 : 0;
  let s = 0;
  for (let e = from - late; e < to - late; e++) s += memberM[e]!;
  return s;
}

/**
 * Bars as placed: the least of a slab everywhere, half of the peak where more is needed and all of it where more than half
 * is, run on by the effective depth and an anchorage; the top of the deck apart for each wall.
 */
function placed(
  model: FrameModel,
  nodes: readonly number[],
  needM2: Float64Array,
  { effectiveM }: Strip,
  barM: number,
  halves: boolean,
): Float64Array {
  const s = nodes.map((node) => lengthTo(model, nodes[0]!, node));
  const least = nodes.map((node) => {
    const { depthM, outerWidthM, innerWidthM } = model.shape.sections[node]!;
    return slabData.steelRatioLeast.value * depthM * Math.min(outerWidthM, innerWidthM);
  });
  const out = Float64Array.from(least);
  const runOnM = effectiveM + slabDeckData.bars.anchorDiameters * barM;
  const cuts = halves ? model.shape.middles.map((node) => nodes.indexOf(node)) : [];
  const groups = [0, ...cuts].map((from, g) => nodes.slice(from, (cuts[g] ?? nodes.length - 1) + 1));
  for (const group of groups) {
    const index = group.map((node) => nodes.indexOf(node));
    const peak = Math.max(...index.map((i) => needM2[i]!));
    nodes.forEach((_, i) => {
      let most = 0;
      for (const k of index) if (Math.abs(s[k]! - s[i]!) <= runOnM) most = Math.max(most, needM2[k]!);
      if (most > least[i]!) out[i] = Math.max(out[i]!, most > peak / 2 ? peak : peak / 2);
    });
  }
  return out;
}

/** Steel of the placed bars with their ends run into the neighbouring part. */
function volume(
  model: FrameModel,
  nodes: readonly number[],
  placedM2: Float64Array,
  { depthM }: Strip,
  barM: number,
): number {
  let sum = 0;
  for (let i = 0; i < nodes.length - 1; i++)
    sum += ((placedM2[i]! + placedM2[i + 1]!) / 2) * lengthTo(model, nodes[i]!, nodes[i + 1]!);
  const anchorM = slabDeckData.bars.anchorDiameters * barM + depthM / 2;
  return sum + (placedM2[0]! + placedM2[placedM2.length - 1]!) * anchorM;
}
