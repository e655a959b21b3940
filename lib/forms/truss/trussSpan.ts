import {
  loadStandard,
  rigidCrossbeam,
  steelYield,
  trafficOnGirder,
  usualSteel,
  worstLaneShare,
  type LoadStandard,
  type TrafficLoad,
} from '../../actions/index.ts';
import type { UnitTask } from '../../model/index.ts';
import { aheadM } from '../common/skewPlanes.ts';
import { fatigueLimitMPa } from '../floor/fatigue.ts';
import { sizeFloor, type Floor } from '../floor/sizeFloor.ts';
import { lightestTruss, type Layout } from './lightestTruss.ts';
import { panelForces } from './panelForces.ts';
import type { SizedTruss } from './sizeTruss.ts';
import type { TrussCase } from './trussCase.ts';
import { trussData } from './trussData.ts';
import { trussDeflection } from './trussDeflection.ts';

/** One simple span: two trusses, their bracing and the floor between them. */
export interface TrussSpan {
  readonly spanM: number;
  readonly planesM: number;
  readonly memberWidthM: number;
  readonly truss: SizedTruss;
  readonly floor: Floor;
  readonly traffic: TrafficLoad;
  readonly deflectionM: number;
  readonly deflectionLimitM: number;
  /** All structural steel of the span, kg. */
  readonly steelKg: number;
}

/**
 * Through-truss span of least steel: floor panels of 5 to 9 m, Warren panels with or without hangers by the slope of
 * their diagonals, heights of span/10 to span/6. Layouts in which every member fits are preferred to lighter ones in
 * which one does not.
 */
export function trussSpan(spanM: number, task: UnitTask): TrussSpan {
  const standard = loadStandard(task.standard);
  const { deck } = task;
  const { memberWidth, planeGapM } = trussData;
  const widestM = Math.min(
    memberWidth.mostM,
    Math.max(memberWidth.leastM, Math.round(memberWidth.ofSpan * spanM * 20) / 20),
  );
  const planesM = deck.widthM + 2 * planeGapM.value + widestM;
  const planes = [-planesM / 2, planesM / 2];
  const loads = [0, 1].map((k) => trafficOnGirder(task.standard, deck, planes, k));
  const heavier = spanLoad(loads[0]!, spanM) >= spanLoad(loads[1]!, spanM) ? 0 : 1;
  const traffic = loads[heavier]!;
  const fatigueShare = worstLaneShare(task.standard, deck, rigidCrossbeam(planes, heavier));

  const layouts: Layout[] = [];
  for (const panels of panelCounts(spanM)) {
    const floor = sizeFloor({
      standard: task.standard,
      deck,
      planesM,
      crossSpacingM: spanM / panels,
      depthM: task.depthM,
      stringers: true,
      ...(task.skewDeg === undefined ? {} : { skewDeg: task.skewDeg }),
    });
    const c = trussCase(task, standard, floor, planesM, widestM);
    for (const hangers of [false, true]) {
      const heights = heightsFor(spanM, panels, hangers);
      if (heights.length === 0) continue;
      const forces = panelForces(spanM, panels, hangers, traffic, fatigueShare);
      layouts.push({ panels, hangers, heights, forces, floor, case: c });
    }
  }
  const { truss, layout, steelKg, memberWidthM } = lightestTruss(layouts);
  return {
    truss,
    floor: layout.floor,
    steelKg,
    spanM,
    planesM,
    memberWidthM,
    traffic,
    deflectionM: trussDeflection(truss, standard, traffic),
    deflectionLimitM: spanM / standard.deflection.limitRatio,
  };
}

function trussCase(
  task: UnitTask,
  standard: LoadStandard,
  floor: Floor,
  planesM: number,
  memberWidthM: number,
): TrussCase {
  const grade = usualSteel(task.standard);
  const yields = Array.from({ length: trussData.plateMm.most + 1 }, (_, mm) =>
    steelYield(grade, Math.max(1, mm)),
  );
  return {
    standardId: task.standard,
    standard,
    rules: {
      standard: task.standard,
      yieldMPa: (thicknessMm) => yields[Math.ceil(thicknessMm)]!,
      rangeMPa: fatigueLimitMPa(task.standard, 'gusset'),
    },
    loads: {
      floorKNm: (floor.slabKNm + floor.steelKNm) / 2,
      superimposedKNm: task.deck.superimposedKNm / 2,
    },
    memberWidthM,
    planesM,
    crossM: floor.crossM,
    aheadM: aheadM(planesM, task.skewDeg),
    floorDepthM: task.depthM,
  };
}

/** Numbers of floor panels tried: the fewest, the most and one between, of those with panels in the usual range. */
function panelCounts(spanM: number): number[] {
  const { least, most } = trussData.panelM;
  const fewest = Math.max(4, Math.ceil(spanM / most - 1e-9));
  const greatest = Math.max(fewest, Math.floor(spanM / least + 1e-9));
  const counts = new Set<number>();
  for (const share of [0, 0.25, 0.6]) {
    const n = Math.round(fewest + share * (greatest - fewest));
    counts.add(n % 2 === 0 ? n : n + 1);
  }
  return [...counts];
}

/** Heights tried, m, those whose diagonals lie in the usual range of slopes. */
function heightsFor(spanM: number, panels: number, hangers: boolean): number[] {
  const { heightOverSpan, leastHeightM, diagonalSlopeDeg } = trussData;
  const reach = hangers ? spanM / panels : spanM / panels / 2;
  const least = Math.max(leastHeightM.value, heightOverSpan.least * spanM);
  const most = Math.max(least, heightOverSpan.most * spanM);
  const heights: number[] = [];
  for (const share of [0, 0.25, 0.5, 0.75, 1]) {
    const heightM = least + share * (most - least);
    const slope = (Math.atan2(heightM, reach) * 180) / Math.PI;
    const inRange = slope >= diagonalSlopeDeg.least && slope <= diagonalSlopeDeg.most;
    // Short spans under the least height stand steeper than usual; they are allowed as they are, without hangers.
    const steepButShort = !hangers && slope > diagonalSlopeDeg.most && heightM <= leastHeightM.value;
    if ((inRange || steepButShort) && !heights.includes(heightM)) heights.push(heightM);
  }
  return heights;
}

/** Longest span, m in tens, up to which the usual panels, heights and slopes always allow a truss. */
export function longestTrussM(): number {
  const canBeLaidOut = (spanM: number): boolean =>
    panelCounts(spanM).some((panels) =>
      [false, true].some((hangers) => heightsFor(spanM, panels, hangers).length > 0),
    );
  let spanM = 100;
  while (canBeLaidOut(spanM + 10)) spanM += 10;
  return spanM;
}

/** Weight of a traffic load on a span, for telling which plane is worse off. */
function spanLoad(load: TrafficLoad, spanM: number): number {
  return load.vehicleFactor * 600 + ((load.udlKNm + load.footwayKNm) * spanM) / 2;
}
