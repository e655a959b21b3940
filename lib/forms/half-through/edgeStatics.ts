import { trafficEnvelope, type TrafficEnvelope } from '../../actions/index.ts';
import {
  beamTrack,
  lineBeam,
  momentInfluence,
  uniform,
  type Effects,
  type LineBeam,
} from '../../mechanics/index.ts';
import { steppedStiffness } from '../common/steppedStiffness.ts';
import { elementsPerSpan } from '../composite-i/elementsPerSpan.ts';
import { fatigueRange } from '../floor/fatigue.ts';
import type { EdgeCase } from './edgeCase.ts';

/** One edge girder as a beam: effects at its stations. */
export interface EdgeStatics {
  readonly beam: LineBeam;
  /** Of 1 kN/m from end to end. */
  readonly unit: Effects;
  readonly traffic: TrafficEnvelope;
  /** Moment range of the fatigue lorry, equivalent to the whole traffic, kNm. */
  readonly rangeKNm: Float64Array;
}

/** @param eiKNm2 stiffness by element, kNm2; constant when absent */
export function edgeStatics(c: EdgeCase, eiKNm2?: Float64Array): EdgeStatics {
  const { spansM, standard } = c.task;
  const beam = lineBeam({
    spansM,
    stationsPerSpan: elementsPerSpan,
    ...(eiKNm2 ? { eiKNm2: steppedStiffness(c.elementM, eiKNm2) } : {}),
  });
  const track = beamTrack(beam);
  // Every second station is run, those between lie straight between.
  const rangeKNm = new Float64Array(beam.xM.length);
  for (let s = 0; s < rangeKNm.length; s += 2) {
    const spanM = spansM[Math.min(spansM.length - 1, Math.floor(s / elementsPerSpan))]!;
    rangeKNm[s] = c.lorryShare * fatigueRange(standard, track, momentInfluence(beam, s), spanM);
    if (s > 0) rangeKNm[s - 1] = (rangeKNm[s - 2]! + rangeKNm[s]!) / 2;
  }
  return {
    beam,
    unit: uniform(beam, 1),
    traffic: trafficEnvelope(beam, c.traffic, { deflection: false }),
    rangeKNm,
  };
}

/** Permanent loads of one girder, characteristic, kN/m. */
export interface EdgeLoads {
  /** Slab, floor steel, kerb and the girder itself. */
  readonly ownKNm: number;
  readonly superimposedKNm: number;
}

/** Greatest and least design moments at the stations, kNm, and design shear of the elements, kN. */
export interface EdgeDemand {
  readonly sagKNm: Float64Array;
  readonly hogKNm: Float64Array;
  readonly shearKN: Float64Array;
}

/** Design effects of the permanent loads and the traffic; permanent loads count with their lesser factor where they help. */
export function edgeDemand(c: EdgeCase, statics: EdgeStatics, loads: EdgeLoads): EdgeDemand {
  const { uls } = c.standard.factors;
  const adverse = uls.permanent * loads.ownKNm + uls.superimposed * loads.superimposedKNm;
  const helping = uls.permanentFavourable * loads.ownKNm + uls.superimposedFavourable * loads.superimposedKNm;
  const { unit, traffic } = statics;
  const shear = (v: number, i: number): number =>
    Math.max(
      Math.abs(adverse * v + uls.traffic * traffic.shearMaxKN[i]!),
      Math.abs(adverse * v + uls.traffic * traffic.shearMinKN[i]!),
    );
  return {
    sagKNm: unit.momentKNm.map(
      (m, i) => (m > 0 ? adverse : helping) * m + uls.traffic * traffic.momentMaxKNm[i]!,
    ),
    hogKNm: unit.momentKNm.map(
      (m, i) => (m < 0 ? adverse : helping) * m + uls.traffic * traffic.momentMinKNm[i]!,
    ),
    shearKN: c.elementM.map((_, e) =>
      Math.max(shear(unit.shearRightKN[e]!, e), shear(unit.shearLeftKN[e + 1]!, e + 1)),
    ),
  };
}
