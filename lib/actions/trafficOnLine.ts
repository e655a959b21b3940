import {
  lineAreas,
  runGroup,
  runTwoGroups,
  type Extremes,
  type LineAreas,
  type Track,
} from '../mechanics/index.ts';
import { axleGroups } from './axleGroups.ts';
import { loadStandard, type LoadStandard } from './loadStandard.ts';
import type { LongSpanLoad, TrafficLoad } from './trafficLoad.ts';

/** What of a line is looked for. */
export interface LineQuest {
  /** Station where the line jumps, or -1. */
  readonly jumpAt: number;
  /** Hogging moment: longer wheelbases and two vehicles count towards the least value. */
  readonly hogging: boolean;
  /** Reaction of an inner support: two vehicles count towards the greatest value. */
  readonly innerReaction: boolean;
}

export const plainQuest: LineQuest = { jumpAt: -1, hogging: false, innerReaction: false };

const areas: LineAreas = { positive: 0, negative: 0, positiveM: 0, negativeM: 0 };
const run: Extremes = { max: 0, min: 0 };

/**
 * Greatest and least effect of a traffic load on one element line (four numbers an element), vehicles and uniform load
 * each where adverse.
 * @returns true when an adverse length went beyond the reach of the standard and no long-span load was given
 */
export function trafficOnLine(
  load: TrafficLoad,
  track: Track,
  line: Float64Array,
  quest: LineQuest,
  out: Extremes,
): boolean {
  const standard = loadStandard(load.standard);
  const groups = axleGroups(load.standard);
  lineAreas(track.xM, line, areas);
  const { positive, negative, positiveM, negativeM } = areas;
  let max = 0;
  let min = 0;
  for (const group of groups.usual) {
    runGroup(track, group, line, quest.jumpAt, run);
    max = Math.max(max, run.max);
    min = Math.min(min, run.min);
  }
  if (quest.hogging) {
    for (const group of groups.longer) {
      runGroup(track, group, line, quest.jumpAt, run);
      min = Math.min(min, run.min);
    }
  }
  max = load.vehicleFactor * max + load.udlKNm * positive;
  min = load.vehicleFactor * min + load.udlKNm * negative;
  const { two } = groups;
  if (two && (quest.hogging || quest.innerReaction)) {
    for (const group of two.groups) {
      if (quest.hogging) {
        const pair = load.vehicleFactor * runTwoGroups(track, group, line, two.apartM, -1);
        min = Math.min(min, two.share * (pair + load.udlKNm * negative));
      } else {
        const pair = load.vehicleFactor * runTwoGroups(track, group, line, two.apartM, 1);
        max = Math.max(max, two.share * (pair + load.udlKNm * positive));
      }
    }
  }
  const reach = standard.longestLoadedM;
  let beyond = false;
  if (reach !== null) {
    if (positiveM > reach) {
      if (load.longSpan) max = longSpanKNm(load, load.longSpan, positiveM) * positive;
      else beyond = true;
    }
    if (negativeM > reach) {
      if (load.longSpan) min = longSpanKNm(load, load.longSpan, negativeM) * negative;
      else beyond = true;
    }
  }
  out.max = max + load.footwayKNm * footwayShare(standard, positiveM) * positive;
  out.min = min + load.footwayKNm * footwayShare(standard, negativeM) * negative;
  return beyond;
}

/** Footway load at a loaded length against its highest value with vehicles. */
function footwayShare(standard: LoadStandard, loadedM: number): number {
  const f = standard.footway;
  const q = Math.min(
    f.mostKNm2,
    Math.max(f.leastKNm2, f.constantKNm2 + f.numeratorKNm / (loadedM + f.addedM)),
  );
  return f.mostWithVehiclesKNm2 > 0 ? Math.min(q, f.mostWithVehiclesKNm2) / f.mostWithVehiclesKNm2 : 0;
}

/** Typed load per lane at a loaded length, for the lanes' worth the member carries. */
function longSpanKNm(load: TrafficLoad, law: LongSpanLoad, loadedM: number): number {
  const { loadedM: L, laneKNm: Q } = law;
  let i = 0;
  while (i < L.length && loadedM > L[i]!) i++;
  if (i === 0) return load.vehicleFactor * Q[0]!;
  if (i === L.length) return load.vehicleFactor * Q[i - 1]!;
  const t = (loadedM - L[i - 1]!) / (L[i]! - L[i - 1]!);
  return load.vehicleFactor * (Q[i - 1]! + t * (Q[i]! - Q[i - 1]!));
}
