import {
  beamStretches,
  beamTrack,
  deflectionLine,
  reactionLines,
  sectionLine,
  sources,
  uniform,
  type Extremes,
  type LineBeam,
  type Stretch,
} from '../mechanics/index.ts';
import { loadStandard } from './loadStandard.ts';
import { plainQuest, trafficOnLine } from './trafficOnLine.ts';
import type { TrafficLoad } from './trafficLoad.ts';

/** Extremes of traffic at the stations and supports of a beam, characteristic, dynamic allowance included. */
export interface TrafficEnvelope {
  /** Sagging positive; max is 0 or more, min 0 or less. */
  readonly momentMaxKNm: Float64Array;
  readonly momentMinKNm: Float64Array;
  /** Of the sections just left and just right of each station. */
  readonly shearMaxKN: Float64Array;
  readonly shearMinKN: Float64Array;
  /** Upward positive; min below 0 pulls the beam up from its support. */
  readonly reactionMaxKN: Float64Array;
  readonly reactionMinKN: Float64Array;
  readonly springMaxKN: Float64Array;
  readonly springMinKN: Float64Array;
  /** Greatest downward deflection, m, under the combinations the standard limits it for; zeros when left out. */
  readonly deflectionM: Float64Array;
  /** True when an adverse loaded length lies beyond the reach of the standard: the result is then on the safe side. */
  readonly beyondScope: boolean;
}

export interface EnvelopeOptions {
  /** Deflections are asked for by default at every station; `false` leaves them out. */
  readonly deflection?: boolean;
}

/**
 * Places a traffic load on every influence line of a beam: moments and shears at all stations, reactions, springs and
 * deflections. Lines follow one another from left to right, so that each costs a few sums.
 */
export function trafficEnvelope(
  beam: LineBeam,
  load: TrafficLoad,
  options: EnvelopeOptions = {},
): TrafficEnvelope {
  const { xM } = beam;
  const n = xM.length;
  const track = beamTrack(beam);
  const hogs = uniform(beam, 1).momentKNm;
  const result = emptyEnvelope(beam);
  const out: Extremes = { max: 0, min: 0 };
  const { obtuse = 1 } = load;
  const shearLoad = {
    ...load,
    vehicleFactor: load.vehicleFactor * load.shearRatio * obtuse,
    udlKNm: load.udlKNm * load.shearRatio * obtuse,
    footwayKNm: load.footwayKNm * obtuse,
  };
  let beyond = false;

  const line = new Float64Array(4 * (n - 1));
  const { left, right } = beamStretches(beam);
  const shear = (s: number, stretch: Stretch): void => {
    const of = { stretch, station: s, arm: 1, turn: 0 };
    sectionLine(of, line);
    const quest = { section: s, hogging: false, innerReaction: false, of };
    beyond = trafficOnLine(shearLoad, track, line, quest, out) || beyond;
    result.shearMaxKN[s] = Math.max(result.shearMaxKN[s]!, out.max);
    result.shearMinKN[s] = Math.min(result.shearMinKN[s]!, out.min);
  };
  for (let s = 0; s < n; s++) {
    const x = xM[s]!;
    const of = { stretch: left[s]!, station: s, arm: x, turn: 1 };
    sectionLine(of, line);
    // Along a span the hogging part has the same sign as under a uniform load (points of contraflexure).
    const quest = { section: s, hogging: hogs[s]! < -1e-9 * x * x, innerReaction: false, of };
    beyond = trafficOnLine(load, track, line, quest, out) || beyond;
    result.momentMaxKNm[s] = out.max;
    result.momentMinKNm[s] = out.min;
    if (s > 0) shear(s, left[s]!);
    if (s < n - 1 && (right[s] !== left[s] || s === 0)) shear(s, right[s]!);
  }

  const at = sources(beam);
  const supports = beam.supportAt.length;
  at.forEach((station, j) => {
    const inner = station > 0 && station < n - 1;
    // The line of an end support breaks off at its peak, where the vehicle may stand with axles already past the end.
    const quest = { section: inner ? -1 : station, hogging: false, innerReaction: inner && j < supports };
    beyond = trafficOnLine(shearLoad, track, reactionLines(beam)[j]!, quest, out) || beyond;
    const [max, min] =
      j < supports ? [result.reactionMaxKN, result.reactionMinKN] : [result.springMaxKN, result.springMinKN];
    max[j < supports ? j : j - supports] = out.max;
    min[j < supports ? j : j - supports] = out.min;
  });
  if (options.deflection !== false) deflections(beam, load, result.deflectionM);
  return { ...result, beyondScope: beyond };
}

/** Worst of the combinations the standard limits deflections for. */
function deflections(beam: LineBeam, load: TrafficLoad, out: Float64Array): void {
  const track = beamTrack(beam);
  const loads = loadStandard(load.standard).deflection.combinations.map((share) => ({
    ...load,
    vehicleFactor: load.vehicleFactor * share.vehicle,
    udlKNm: load.udlKNm * share.uniform,
    footwayKNm: load.footwayKNm * share.uniform,
  }));
  const extremes: Extremes = { max: 0, min: 0 };
  for (let s = 0; s < out.length; s++) {
    if (beam.supportAt.includes(s)) continue;
    const line = deflectionLine(beam, s);
    for (const combined of loads) {
      trafficOnLine(combined, track, line, plainQuest, extremes);
      out[s] = Math.max(out[s]!, extremes.max);
    }
  }
}

function emptyEnvelope(beam: LineBeam): Omit<TrafficEnvelope, 'beyondScope'> {
  const n = beam.xM.length;
  return {
    momentMaxKNm: new Float64Array(n),
    momentMinKNm: new Float64Array(n),
    shearMaxKN: new Float64Array(n),
    shearMinKN: new Float64Array(n),
    reactionMaxKN: new Float64Array(beam.supportAt.length),
    reactionMinKN: new Float64Array(beam.supportAt.length),
    springMaxKN: new Float64Array(beam.springAt.length),
    springMinKN: new Float64Array(beam.springAt.length),
    deflectionM: new Float64Array(n),
  };
}
