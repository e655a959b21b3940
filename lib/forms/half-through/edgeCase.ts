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
import { thickestPlateM } from '../common/plates.ts';
import { superimposedOn } from '../common/superimposed.ts';
import { supportPositions, totalLength } from '../common/supports.ts';
import { elementsPerSpan } from '../composite-i/elementsPerSpan.ts';
import { halfThroughData } from './halfThroughData.ts';

/** Everything about the two edge girders that hangs neither on their plates nor on the floor between them. */
export interface EdgeCase {
  readonly task: UnitTask;
  readonly standard: LoadStandard;
  readonly supportsM: readonly number[];
  readonly lengthM: number;
  readonly elementM: Float64Array;
  /** Elements that tell all: the first half where the spans are symmetrical. */
  readonly telling: number;
  /** Web of a girder to the edge of the deck, m. */
  readonly reachM: number;
  /** Between the webs of the two girders, m. */
  readonly planesM: number;
  /** Traffic on the girder that carries most, and its share of one lorry. */
  readonly traffic: TrafficLoad;
  readonly lorryShare: number;
  /** Superimposed load and robust kerb on one girder, kN/m. */
  readonly superimposedKNm: number;
  readonly kerbKNm: number;
  /** What curvature in plan adds to every load of the outer girder; 1 on a straight. */
  readonly curve: number;
  readonly yieldMPa: (thicknessM: number) => number;
}

/** Lays out two girders beside the deck and shares the loads between them by the lever rule. */
export function edgeCase(task: UnitTask): EdgeCase {
  const { deck, spansM } = task;
  const standard = loadStandard(task.standard);
  const longestM = Math.max(...spansM);
  const { reach, kerb } = halfThroughData;
  const reachM = Math.max(reach.leastM, reach.ofSpan * longestM);
  const planesM = deck.widthM + 2 * reachM;
  const planes = [-planesM / 2, planesM / 2];
  const weigh = (load: TrafficLoad): number =>
    (load.vehicleFactor * 1200) / longestM + load.udlKNm + load.footwayKNm;
  const loads = planes.map((_, k) => trafficOnGirder(task.standard, deck, planes, k));
  const heavier = weigh(loads[0]!) >= weigh(loads[1]!) ? 0 : 1;
  const curve = curvatureFactor(task, planesM);
  const load = loads[heavier]!;
  const symmetrical = spansM.every((spanM, i) => spanM === spansM[spansM.length - 1 - i]);
  const elements = spansM.length * elementsPerSpan;
  const grade = usualSteel(task.standard);
  const thickestM = thickestPlateM(task.standard);
  return {
    task,
    standard,
    supportsM: supportPositions(spansM),
    lengthM: totalLength(spansM),
    telling: symmetrical ? elements / 2 : elements,
    elementM: Float64Array.from(
      { length: elements },
      (_, e) => spansM[Math.floor(e / elementsPerSpan)]! / elementsPerSpan,
    ),
    reachM,
    planesM,
    traffic: {
      ...load,
      vehicleFactor: curve * load.vehicleFactor,
      udlKNm: curve * load.udlKNm,
      footwayKNm: curve * load.footwayKNm,
    },
    lorryShare: curve * worstLaneShare(task.standard, deck, rigidCrossbeam(planes, heavier)),
    superimposedKNm: (curve * superimposedOn(deck).totalKNm) / 2,
    kerbKNm: curve * kerb.heightM * kerb.widthM * standard.unitWeights.concreteKNm3,
    curve,
    yieldMPa: (thicknessM) => steelYield(grade, Math.min(thicknessM, thickestM) * 1000),
  };
}

/** Torque M/R of a curve as a couple of the two girders: 1 + Le2 / (4.93 R D), V-load method for two girders, from memory. */
function curvatureFactor(task: UnitTask, planesM: number): number {
  if (!(task.planRadiusM < Infinity)) return 1;
  const effectiveM = (task.spansM.length > 1 ? 0.7 : 1) * Math.max(...task.spansM);
  return 1 + (2 * effectiveM ** 2) / (Math.PI ** 2 * task.planRadiusM * planesM);
}
