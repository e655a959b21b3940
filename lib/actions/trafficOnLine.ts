import {
  lineAreas,
  runGroup,
  runTwoGroups,
  type Extremes,
  type LineAreas,
  type StretchSection,
  type Track,
} from '../mechanics/index.ts';
import { axleGroups } from './axleGroups.ts';
import { loadStandard, type LoadStandard } from './loadStandard.ts';
import type { LongSpanLoad, TrafficLoad } from './trafficLoad.ts';

/** What of a line is looked for. */
export interface LineQuest {
  /** Station where the line has its peak or jump: the section of a moment or shear, an end support; -1 for other lines. */
  readonly section: number;
  /** Hogging moment: longer wheelbases and two vehicles count towards the least value. */
  readonly hogging: boolean;
  /** Reaction of an inner support: two vehicles count towards the greatest value. */
  readonly innerReaction: boolean;
  /** What the line of a section of a beam is made of, where it is known. */
  readonly of?: StretchSection;
}

export const plainQuest: LineQuest = { section: -1, hogging: false, innerReaction: false };

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
  const { two } = groups;
  let max = 0;
  let min = 0;
  let pairMax = 0;
  let pairMin = 0;
  for (const group of groups.usual) {
    const placings = runGroup(track, group, line, quest.section, run, quest.of);
    max = Math.max(max, run.max);
    min = Math.min(min, run.min);
    if (two?.groups.has(group)) {
      if (quest.hogging)
        pairMin = Math.min(pairMin, runTwoGroups(track, group, placings, line, two.apartM, -1));
      if (quest.innerReaction)
        pairMax = Math.max(pairMax, runTwoGroups(track, group, placings, line, two.apartM, 1));
    }
  }
  const { vehicleFactor, udlKNm } = load;
  const pairShare = two?.share ?? 0;
  const pairLeast = pairShare * (vehicleFactor * pairMin + udlKNm * negative);
  if (quest.hogging && vehicleFactor * groups.longerKN * lowestOf(line) + udlKNm * negative < pairLeast) {
    for (const group of groups.longer) {
      runGroup(track, group, line, quest.section, run, quest.of);
      min = Math.min(min, run.min);
    }
  }
  max = vehicleFactor * max + udlKNm * positive;
  min = vehicleFactor * min + udlKNm * negative;
  if (quest.hogging) min = Math.min(min, pairLeast);
  if (quest.innerReaction) max = Math.max(max, pairShare * (vehicleFactor * pairMax + udlKNm * positive));
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

/** Lowest ordinate at the stations: no vehicle does worse than its whole weight there. */
function lowestOf(line: Float64Array): number {
  let low = 0;
  for (let i = 0; i < line.length; i += 2) if (line[i]! < low) low = line[i]!;
  return low;
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
