import { serviceTraffic, trafficEnvelope } from '../../../actions/index.ts';
import { lineBeam, uniform } from '../../../mechanics/index.ts';
import type { UnitTask } from '../../../model/index.ts';
import { boxData } from '../../concrete-box/boxData.ts';
import { tendonShapes, type TendonShapes } from '../../concrete-box/tendonShape.ts';
import type { BeamChoice } from '../../common/precast/beamChoice.ts';
import { diaphragmsWithin } from '../../common/precast/beamMoments.ts';
import { elementsPerSpan, precastModel, type PrecastModel } from '../../common/precast/precastModel.ts';
import { pretensioned } from '../../common/precast/pretensioned.ts';
import { mostStrands, strandCentroidM } from '../../common/precast/strandRows.ts';
import { iBeams } from '../iBeams.ts';
import { pierReachM, splicePlan, type SplicePlan } from './splicePlan.ts';
import { splicedData } from './splicedData.ts';

/** Spliced beams: the beam that carries most, its weight on the continuous beam, its pieces and the shape of its tendons. */
export interface SplicedModel extends PrecastModel {
  readonly plan: SplicePlan;
  /** Moments at the stations: beam alone, wet slab with diaphragms, kNm; shears likewise, right of a station, kN. */
  readonly ownKNmAt: Float64Array;
  readonly wetKNmAt: Float64Array;
  /** Weight of beam, slab and diaphragms, kN/m by span. */
  readonly deadKNm: readonly number[];
  readonly shapes: TendonShapes;
  /** One strand of a tendon, m2. */
  readonly tendonM2: number;
  /** Where the beam is looked at. */
  readonly places: readonly Place[];
  /** Strands of the bed in a piece, their level and their stress in the end. */
  readonly straight: StraightStrands;
}

/** A place between stations `i` and `i + 1`, `t` of the way, the part of the strands of the bed that acts there, and moments. */
export interface Place extends Spot {
  /** Beam alone, wet slab, superimposed load, MNm. */
  readonly own: number;
  readonly wet: number;
  readonly added: number;
  /** Superimposed load with the service share of traffic and a warm or cool top; with all traffic. MNm. */
  readonly sag: number;
  readonly hog: number;
  readonly sagMost: number;
  readonly hogMost: number;
}

interface Spot {
  readonly i: number;
  readonly t: number;
  readonly bed: number;
}

/** Straight strands of a piece. */
export interface StraightStrands {
  readonly count: number;
  readonly zM: number;
  readonly lastingMPa: number;
}

/** Places loads on the continuous beam and cuts it into pieces that can be hauled. */
export function splicedModel(task: UnitTask, choice: BeamChoice): SplicedModel {
  const model = precastModel(iBeams, task, choice);
  const plan = splicePlan(task.spansM, pretensioned.haul.lengthM);
  const { beam } = model;
  const wet = task.spansM.map(
    (spanM) => model.wetKNm + (diaphragmsWithin(model, spanM) * model.diaphragmKN) / spanM,
  );
  const ownKNmAt = uniform(beam, model.ownKNm).momentKNm;
  const wetKNmAt = uniform(beam, wet).momentKNm;
  const service = trafficEnvelope(beam, serviceTraffic(model.traffic), { deflection: false });
  const { topWarmerK, topCoolerK, withTraffic } = pretensioned.temperature;
  const places = spotsOf(model, plan).map((spot): Place => {
    const at = (values: Float64Array): number =>
      (values[spot.i]! + spot.t * (values[spot.i + 1]! - values[spot.i]!)) / 1e3;
    const added = at(model.superimposed.momentKNm);
    const warm = withTraffic[task.standard] * Math.abs(at(model.warmth.momentKNm));
    return {
      ...spot,
      own: at(ownKNmAt),
      wet: at(wetKNmAt),
      added,
      sag: added + at(service.momentMaxKNm) + topWarmerK * warm,
      hog: added + at(service.momentMinKNm) - topCoolerK * warm,
      sagMost: added + at(model.most.momentMaxKNm),
      hogMost: added + at(model.most.momentMinKNm),
    };
  });
  return {
    ...model,
    plan,
    pieceLengthM: plan.longestM,
    ownKNmAt,
    wetKNmAt,
    deadKNm: wet.map((w) => w + model.ownKNm),
    shapes: tendonShapes(task.spansM, lineBeam({ spansM: task.spansM, stationsPerSpan: elementsPerSpan })),
    tendonM2: boxData.strandAreaMm2[task.standard] / 1e6,
    places,
    straight: straightStrands(model, leastStraight(model, plan.longestM)),
  };
}

/** Stress of the strands of the bed in the end over that at the jack: losses of a fifth, of heavily pressed pieces. */
const lasting = 0.8;

/** `count` straight strands of a piece, from the bottom up. */
export function straightStrands(model: PrecastModel, count: number): StraightStrands {
  return {
    count,
    zM: strandCentroidM(model.shape.rows, count),
    lastingMPa: lasting * model.jackMPa,
  };
}

/** Fewest pairs with which the longest piece carries itself between its ends without a crack. */
function leastStraight(model: PrecastModel, lengthM: number): number {
  const { shape } = model;
  const wBottom = shape.inertiaM4 / shape.centroidM;
  const pulled = (model.ownKNm * lengthM ** 2) / 8 / 1e3 / wBottom - splicedData.stages.tensionMPa;
  const most = mostStrands(shape.rows);
  for (let count = 4; count + 2 <= most; count += 2) {
    const { zM, lastingMPa } = straightStrands(model, count);
    const forceMN = count * model.strandM2 * lastingMPa;
    if (forceMN * (1 / shape.areaM2 + (shape.centroidM - zM) / wBottom) >= pulled) return count;
  }
  return most;
}

/**
 * Stations, where strands of the bed act in pieces that lie in the span (towards an abutment fewer, debonded), and splices,
 * where none do. Those of a piece over a pier hold it while it is handled and are not counted on.
 */
function spotsOf({ beam, task }: PrecastModel, plan: SplicePlan): Spot[] {
  const fade = pretensioned.relief.debonded.endOver;
  const last = task.spansM.length - 1;
  const places: Spot[] = [];
  // A unit that reads the same from both ends is looked at up to its middle.
  const same = task.spansM.every((spanM, k) => spanM === task.spansM[last - k]);
  const upTo = same ? Math.ceil((beam.xM.length - 1) / 2) : beam.xM.length;
  task.spansM.forEach((spanM, span) => {
    const from = beam.supportAt[span]!;
    const [leftM, rightM] = pierReachM(task.spansM, span, pretensioned.haul.lengthM);
    // Nothing of the bed is counted on in pieces over a pier; other ends are debonded.
    const part = (share: number, reachM: number): number =>
      reachM > 0 ? Number(share * spanM > reachM) : Math.min(1, share / fade);
    for (let k = span === 0 ? 0 : 1; k <= elementsPerSpan; k++) {
      const share = k / elementsPerSpan;
      const left = part(share, leftM);
      const right = part(1 - share, rightM);
      const i = from + k;
      places.push({
        i: Math.min(i, beam.xM.length - 2),
        t: i > beam.xM.length - 2 ? 1 : 0,
        bed: Math.min(left, right),
      });
    }
    const end = beam.xM[from]! + spanM;
    for (const x of plan.atM) {
      if (x <= beam.xM[from]! || x >= end) continue;
      const along = ((x - beam.xM[from]!) / spanM) * elementsPerSpan;
      const k = Math.min(elementsPerSpan - 1, Math.floor(along));
      places.push({ i: from + k, t: along - k, bed: 0 });
    }
  });
  return places.filter(({ i }) => i <= upTo);
}
