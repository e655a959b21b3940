import {
  cantileverStages,
  creepRedistributed,
  distributed,
  pointLoads,
  stepped,
  uniform,
  type CantileverMoments,
  type Effects,
} from '../../mechanics/index.ts';
import { weightAlong, weightOver } from '../concrete-box/boxConcrete.ts';
import { boxData } from '../concrete-box/boxData.ts';
import { diaphragmM3 } from '../concrete-box/boxLoads.ts';
import { underSlabM3M } from '../concrete-box/underSlab.ts';
import type { Arm } from './arms.ts';
import { cantileverData } from './cantileverData.ts';
import { holdsDown, type CantileverModel } from './cantileverModel.ts';
import { haunchShare } from './haunch.ts';
import { heldDown, type Hold } from './heldDown.ts';
import type { HaunchedSections } from './sectionsAlong.ts';

/** Own weight of the box through its stages. Moments sagging positive, at the stations. */
export interface StagedWeight {
  /** Segment length, weight of the heaviest segment and of a traveller, m and kN. */
  readonly segmentM: number;
  readonly heaviestKN: number;
  readonly travellerKN: number;
  readonly segmentsPerArm: number;
  /** Free cantilevers with a traveller at each tip and the spans that hold longer ones down, most hogging before the deck is whole. */
  readonly cantileverKNm: Float64Array;
  /** When all is joined and travellers and falsework are gone; after creep; had it been built in one go. */
  readonly openKNm: Float64Array;
  readonly lastingKNm: Float64Array;
  readonly atOnce: Effects;
  /** After creep. */
  readonly shearLeftKN: Float64Array;
  readonly shearRightKN: Float64Array;
  readonly reactionKN: readonly number[];
  /** How joined spans hold longer arms down; none where all arms are balanced. */
  readonly holds: readonly Hold[];
  /** Moment a pier takes with one arm a segment ahead and heavier by a share, the most of all piers, kNm. */
  readonly unbalancedKNm: number;
  /** Weight along the deck, kN/m, and concrete, m3: along the deck, blisters, diaphragm over each support. */
  readonly loadKNm: Float64Array;
  readonly boxM3: number;
  readonly blistersM3: number;
  readonly diaphragmM3: readonly number[];
}

/** Stations of a free arm. */
const armStations = 40;

/** Share of the moments of the joined deck that creep brings about of what it would have been at once. */
export const creepShare = creepRedistributed(
  { xM: new Float64Array(1), builtKNm: new Float64Array(1), atOnceKNm: new Float64Array([1]) },
  cantileverData.creep.factor,
)[0]!;

/**
 * Arms as free cantilevers, longer ones held down by the spans joined before them, then pieces on falsework and the
 * travellers' going on the joined deck, then creep towards what the deck would carry had it been struck in one go. Ballast
 * that holds an arm down counts with the weight. Diaphragms stand on their supports.
 */
export function stagedWeight(model: CantileverModel, sections: HaunchedSections): StagedWeight {
  const { beam, standard, arms, supportsM } = model;
  const { share } = boxData.blisters;
  const gamma = standard.unitWeights.concreteKNm3;
  const weight = gamma * (1 + share);
  const weights = weightAlong(model, beam.xM).map((kNm3) => kNm3 * (1 + share));
  const underKNm = (depthM: number): number => gamma * underSlabM3M(model.layout, depthM);
  const loadKNm = sections.areaM2.map((area, i) => weights[i]! * area + underKNm(model.depthM[i]!));
  const n = loadKNm.length;
  const atOnce = struckAtOnce(model, loadKNm);
  const longest = arms.length > 0 ? Math.max(...arms.map(({ armM }) => armM)) : 0;
  const rootKNm = weight * sections.pier.areaM2 + underKNm(sections.pier.depthM);
  const { leastM, mostM, mostKN } = cantileverData.segment;
  const segmentM = Math.min(mostM, Math.max(leastM, mostKN / rootKNm));
  const heaviestKN = rootKNm * segmentM;
  const { overSegment, leastKN, mostKN: heaviestTraveller } = cantileverData.traveller;
  const travellerKN = Math.min(heaviestTraveller, Math.max(leastKN, overSegment * heaviestKN));

  const freeArm = freeArms(model, sections, underKNm, travellerKN, segmentM);
  const free = arms.map((arm) => freeArm(arm, arm.armM));
  const freeKNm = new Float64Array(n);
  const armOf = Array.from({ length: n - 1 }, (_, e) => armWith(arms, (beam.xM[e]! + beam.xM[e + 1]!) / 2));
  for (let i = 0; i < n; i++) {
    const k = armOf[i] ?? -1;
    if (k < 0) continue;
    const { fromPierM, momentKNm } = free[k]!;
    freeKNm[i] = read(fromPierM, momentKNm, Math.abs(beam.xM[i]! - arms[k]!.pierM));
  }
  /** Shear of the free arm just left or right of a station. */
  const freeShear = (i: number, side: 'shearLeftKN' | 'shearRightKN'): number => {
    const k = armOf[side === 'shearLeftKN' ? i - 1 : i] ?? -1;
    if (k < 0) return 0;
    const { fromPierM, shearKN } = free[k]!;
    const arm = arms[k]!;
    return arm.side * read(fromPierM, shearKN, Math.abs(beam.xM[i]! - arm.pierM));
  };
  const late = new Float64Array(n - 1);
  for (let e = 0; e < n - 1; e++) if (armOf[e] === -1) late[e] = (loadKNm[e]! + loadKNm[e + 1]!) / 2;
  const diaphragms = supportsM.map((_, j) =>
    diaphragmM3(sections.pierAt.get(j) ?? sections.ends[j === 0 ? 0 : 1], sections.pierAt.has(j)),
  );
  const held = heldDown(model, {
    arms: free,
    momentKNm: freeKNm,
    travellerKN,
    onFalseworkKNm: late,
    diaphragmKN: diaphragms.map((m3) => gamma * m3),
  });
  // What else is cast on falsework, and the other travellers that leave, act on the joined deck.
  for (const span of held.spans) late.fill(0, beam.supportAt[span], beam.supportAt[span + 1]);
  const onFalsework = stepped(beam, late);
  const leaving = pointLoads(
    beam,
    arms
      .filter(({ span }) => !held.spans.has(span))
      .map((arm) => ({ xM: arm.pierM + arm.side * arm.armM, loadKN: -travellerKN })),
  );
  const mix = (open: number, once: number): number => open + creepShare * (once - open);
  const openKNm = freeKNm.map(
    (moment, i) => moment + held.momentKNm[i]! + onFalsework.momentKNm[i]! + leaving.momentKNm[i]!,
  );
  const lastingKNm = creepRedistributed(
    { xM: beam.xM, builtKNm: openKNm, atOnceKNm: atOnce.momentKNm },
    cantileverData.creep.factor,
  );
  const shear = (side: 'shearLeftKN' | 'shearRightKN'): Float64Array =>
    Float64Array.from({ length: n }, (_, i) =>
      mix(freeShear(i, side) + held[side][i]! + onFalsework[side][i]! + leaving[side][i]!, atOnce[side][i]!),
    );
  let boxM3 = 0;
  for (let e = 0; e < n - 1; e++)
    boxM3 += ((sections.areaM2[e]! + sections.areaM2[e + 1]!) / 2) * (beam.xM[e + 1]! - beam.xM[e]!);
  const reactionKN = supportsM.map((_, j) => {
    const armsKN = arms.reduce((sum, arm, k) => sum + (arm.support === j ? free[k]!.shearKN[0]! : 0), 0);
    const open = armsKN + held.reactionKN[j]! + onFalsework.reactionKN[j]! + leaving.reactionKN[j]!;
    return mix(open, atOnce.reactionKN[j]!) + gamma * diaphragms[j]!;
  });
  const { ownShare } = cantileverData.imbalance;
  // A pier is on its own until the span of its shorter arm is joined.
  const onPier = arms.map((arm, k) => ({
    arm,
    at: arm.armM > arm.balancedM ? freeArm(arm, arm.balancedM) : free[k]!,
  }));
  const unbalancedKNm = Math.max(
    0,
    ...onPier.map(({ arm, at }, k) => {
      const unlike = Math.abs(at.momentKNm[0]! - onPier[k - arm.side]!.at.momentKNm[0]!);
      return at.pierMomentKNm + unlike + ownShare * Math.abs(at.momentKNm[0]! + travellerKN * arm.balancedM);
    }),
  );
  return {
    segmentM,
    heaviestKN,
    travellerKN,
    segmentsPerArm: Math.ceil(Math.max(0, longest - cantileverData.pierTableM.value / 2) / segmentM),
    cantileverKNm: held.worstKNm,
    openKNm,
    lastingKNm,
    atOnce,
    shearLeftKN: shear('shearLeftKN'),
    shearRightKN: shear('shearRightKN'),
    reactionKN,
    holds: held.holds,
    unbalancedKNm,
    loadKNm,
    boxM3,
    blistersM3: share * boxM3,
    diaphragmM3: diaphragms,
  };
}

/** Place of the arm that is cantilevered over `xM`, -1 where there is none. */
function armWith(arms: readonly Arm[], xM: number): number {
  return arms.findIndex(({ pierM, side, armM }) => {
    const away = side * (xM - pierM);
    return away >= 0 && away <= armM;
  });
}

/** What the whole deck would carry of its weight had it been struck in one go, with the ballast that holds arms down. */
function struckAtOnce(model: CantileverModel, loadKNm: Float64Array): Effects {
  const { beam, anchors, task } = model;
  const box = distributed(beam, loadKNm);
  if (!task.ballastKNm || anchors.length === 0) return box;
  const ballast = uniform(
    beam,
    task.ballastKNm.map((kNm, span) => (holdsDown(anchors, span) ? kNm : 0)),
  );
  const sum = (name: keyof Effects): Float64Array => box[name].map((value, i) => value + ballast[name][i]!);
  return {
    momentKNm: sum('momentKNm'),
    shearLeftKN: sum('shearLeftKN'),
    shearRightKN: sum('shearRightKN'),
    reactionKN: sum('reactionKN'),
    springKN: sum('springKN'),
    deflectionM: sum('deflectionM'),
  };
}

/** Statics of a free arm when it has grown to a length; equal ones are worked out once. */
function freeArms(
  model: CantileverModel,
  sections: HaunchedSections,
  underKNm: (depthM: number) => number,
  travellerKN: number,
  segmentM: number,
): (arm: Arm, lengthM: number) => CantileverMoments {
  const { arms, light } = model;
  const { share } = boxData.blisters;
  const made = new Map<string, CantileverMoments>();
  return (arm, lengthM) => {
    // Lightweight concrete is not the same in every span, nor are the thicknesses of one that holds an arm down.
    const key = [
      model.depthsM.get(arm.support)!,
      arm.armM,
      lengthM,
      light || model.anchors.length > 0 ? arm.side * arm.pierM : 0,
    ]
      .map((v) => v.toFixed(6))
      .join();
    const known = made.get(key);
    if (known) return known;
    const slice = lengthM / armStations / 2;
    const weightKNm3 = (fromPierM: number): number => {
      const a = arm.pierM + arm.side * Math.max(0, fromPierM - slice);
      const b = arm.pierM + arm.side * Math.min(lengthM, fromPierM + slice);
      return (1 + share) * weightOver(model, Math.min(a, b), Math.max(a, b));
    };
    const areaM2 = sections.armAreaM2[arms.indexOf(arm)]!;
    const deeperM = model.depthsM.get(arm.support)! - model.task.depthM;
    const at = cantileverStages(
      {
        armM: lengthM,
        weightKNm: (fromPierM) => {
          const way = Math.min(1, fromPierM / arm.armM);
          return (
            weightKNm3(fromPierM) * areaM2(way) + underKNm(model.task.depthM + deeperM * haunchShare(way))
          );
        },
        travellerKN,
        segmentM: Math.min(segmentM, lengthM),
      },
      armStations,
    );
    made.set(key, at);
    return at;
  };
}

function read(xM: Float64Array, values: Float64Array, x: number): number {
  const step = xM[1]! - xM[0]!;
  const k = Math.min(xM.length - 2, Math.max(0, Math.floor(x / step)));
  const share = Math.min(1, (x - xM[k]!) / step);
  return values[k]! + share * (values[k + 1]! - values[k]!);
}
