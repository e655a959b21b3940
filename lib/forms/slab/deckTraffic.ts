import {
  closeBeamCorner,
  loadStandard,
  trafficEnvelope,
  trafficOnDeck,
  trafficOnInfluence,
  type TrafficEnvelope,
  type TrafficLoad,
} from '../../actions/index.ts';
import { beamTrack, deflectionInfluence, type LineBeam } from '../../mechanics/index.ts';
import type { UnitTask } from '../../model/index.ts';
import type { WheelStrips } from './wheelStrips.ts';

/** Greatest and least moments and shears at the stations, kNm and kN. */
interface MomentsAndShears {
  readonly momentMaxKNm: Float64Array;
  readonly momentMinKNm: Float64Array;
  readonly shearMaxKN: Float64Array;
  readonly shearMinKN: Float64Array;
}

/** Traffic on a slab deck. Moments and shears are those of its heaviest metre times the width of the deck. */
export interface DeckTraffic {
  readonly most: MomentsAndShears;
  /** In the combination that decides prestress and cracks. */
  readonly service: MomentsAndShears;
  /** Of the whole deck with all its lanes, kN. */
  readonly reactionMaxKN: Float64Array;
  readonly reactionMinKN: Float64Array;
  /** What shears grow by at an obtuse corner; absent on a square deck. */
  readonly obtuse?: number;
  /** Moments of the whole deck over those of its heaviest metre times the width, at midspan of the longest span. */
  readonly evenShare: number;
  /** Of the whole deck at the middle of each span on stiffness 1, m x kNm2. */
  readonly deflection: readonly number[];
}

interface Units {
  /** One lane-1 vehicle (with its lane load under AASHTO), and 1 kN/m. */
  readonly vehicle: TrafficEnvelope;
  readonly uniform: TrafficEnvelope;
  readonly load: TrafficLoad;
  readonly laneKNm: number;
  readonly deflection: readonly number[];
}

const kept = new Map<string, Units>();

/** Envelopes of a vehicle and of a uniform load; they depend on the spans alone. The last 32 units are kept. */
function unitsOf(task: UnitTask, beam: LineBeam): Units {
  const key = JSON.stringify([task.standard, task.spansM, task.deck]);
  const known = kept.get(key);
  if (known) return known;
  const standard = loadStandard(task.standard);
  const load = trafficOnDeck(task.standard, task.deck);
  // Under AASHTO every lane carries the same, and the lane load goes with its vehicle.
  const laneKNm = standard.distributionFactors ? load.udlKNm / load.vehicleFactor : 0;
  const one: TrafficLoad = { ...load, vehicleFactor: 1, udlKNm: laneKNm, footwayKNm: 0 };
  const made: Units = {
    vehicle: trafficEnvelope(beam, one, { deflection: false }),
    uniform: trafficEnvelope(
      beam,
      { ...load, vehicleFactor: 0, udlKNm: 1, footwayKNm: 0 },
      { deflection: false },
    ),
    load,
    laneKNm,
    deflection: deflections(task, beam, load),
  };
  if (kept.size >= 32) for (const [oldest] of [...kept].slice(0, 16)) kept.delete(oldest);
  kept.set(key, made);
  return made;
}

/** Traffic deflection at midspans on stiffness 1 under the combinations that are limited. */
function deflections(task: UnitTask, beam: LineBeam, load: TrafficLoad): number[] {
  const track = beamTrack(beam);
  const { combinations } = loadStandard(task.standard).deflection;
  return task.spansM.map((_, span) => {
    const line = deflectionInfluence(beam, (beam.supportAt[span]! + beam.supportAt[span + 1]!) >> 1);
    return Math.max(
      ...combinations.map(
        ({ vehicle, uniform }) =>
          trafficOnInfluence(
            {
              ...load,
              vehicleFactor: load.vehicleFactor * vehicle,
              udlKNm: load.udlKNm * uniform,
              footwayKNm: load.footwayKNm * uniform,
            },
            track,
            line,
          ).max,
      ),
    );
  });
}

/**
 * Traffic of a deck whose heaviest metre is loaded by `strips`; never less than an even share of the whole deck. Shears of a
 * skew slab are those at its obtuse corner: AASHTO has no factor for slabs, so that of boxes side by side is borrowed. Its
 * moments are those of its skew span, which is on the safe side (4.6.2.3 would take less).
 */
export function deckTraffic(task: UnitTask, beam: LineBeam, strips: WheelStrips): DeckTraffic {
  const { vehicle, uniform, load, laneKNm, deflection } = unitsOf(task, beam);
  const { sls } = loadStandard(task.standard).factors;
  const widthM = task.deck.widthM;
  const vehicles = Math.max(load.vehicleFactor, widthM / strips.vehicleWidthM);
  const inShear = Math.max(load.vehicleFactor, widthM / strips.shearWidthM);
  const corner = closeBeamCorner({ spanM: Math.max(...task.spansM), depthM: task.depthM }, task.skewDeg ?? 0);
  const evenKNm = (laneKNm > 0 ? 0 : load.udlKNm) + load.footwayKNm;
  const uniformKNm = Math.max(evenKNm, widthM * strips.uniformKNm2);
  const combined = (v: number, q: number): MomentsAndShears => {
    const n = beam.xM.length;
    const out = {
      momentMaxKNm: new Float64Array(n),
      momentMinKNm: new Float64Array(n),
      shearMaxKN: new Float64Array(n),
      shearMinKN: new Float64Array(n),
    };
    for (let i = 0; i < n; i++) {
      out.momentMaxKNm[i] =
        v * vehicles * vehicle.momentMaxKNm[i]! + q * uniformKNm * uniform.momentMaxKNm[i]!;
      out.momentMinKNm[i] =
        v * vehicles * vehicle.momentMinKNm[i]! + q * uniformKNm * uniform.momentMinKNm[i]!;
      out.shearMaxKN[i] =
        corner * (v * inShear * vehicle.shearMaxKN[i]! + q * uniformKNm * uniform.shearMaxKN[i]!);
      out.shearMinKN[i] =
        corner * (v * inShear * vehicle.shearMinKN[i]! + q * uniformKNm * uniform.shearMinKN[i]!);
    }
    return out;
  };
  const most = combined(1, 1);
  // The reaction at an end is the shear beside it.
  const last = task.spansM.length;
  const end = ({ shearMaxKN, shearMinKN }: TrafficEnvelope, j: number): number =>
    j === 0 ? shearMaxKN[0]! : j === last ? -shearMinKN[shearMinKN.length - 1]! : 0;
  const reaction = (j: number): number =>
    load.vehicleFactor * Math.max(vehicle.reactionMaxKN[j]!, end(vehicle, j)) +
    evenKNm * Math.max(uniform.reactionMaxKN[j]!, end(uniform, j));
  const longest = task.spansM.indexOf(Math.max(...task.spansM));
  const middle = (beam.supportAt[longest]! + beam.supportAt[longest + 1]!) >> 1;
  return {
    most,
    ...(corner === 1 ? {} : { obtuse: corner }),
    service: combined(sls.vehicle, laneKNm > 0 ? sls.footway : sls.uniform),
    reactionMaxKN: Float64Array.from({ length: last + 1 }, (_, j) => reaction(j)),
    reactionMinKN: Float64Array.from(
      { length: last + 1 },
      (_, j) => load.vehicleFactor * vehicle.reactionMinKN[j]! + evenKNm * uniform.reactionMinKN[j]!,
    ),
    evenShare:
      (load.vehicleFactor * vehicle.momentMaxKNm[middle]! + evenKNm * uniform.momentMaxKNm[middle]!) /
      most.momentMaxKNm[middle]!,
    deflection,
  };
}
