import { rigidCrossbeam } from '../../actions/index.ts';
import {
  beamStretches,
  beamTrack,
  reversed,
  runGroup,
  sectionLine,
  type AxleGroup,
  type Extremes,
  type LineBeam,
} from '../../mechanics/index.ts';
import type { DeckSpec, StandardId } from '../../model/index.ts';
import { compositeData } from './compositeData.ts';
import type { GirderModel } from './girderModel.ts';

const stride = 2;

/** Share of a lorry in an outer marked lane that the girder on that side carries. */
export function fatigueShare(deck: DeckSpec, offsetsM: readonly number[]): number {
  const lanes = Math.max(1, deck.lanes);
  const laneM = Math.min(3.5, deck.carriagewayM / lanes);
  const out = ((lanes - 1) * laneM) / 2;
  const on = (girder: number, y: number): number => {
    const line = rigidCrossbeam(offsetsM, girder);
    const [y0 = 0, y1 = 1] = line.yM;
    const [v0 = 0, v1 = 0] = line.value;
    return v0 + ((v1 - v0) * (y - y0)) / (y1 - y0);
  };
  return Math.max(
    on(0, deck.carriagewayOffsetM - out),
    on(offsetsM.length - 1, deck.carriagewayOffsetM + out),
  );
}

/** Stress range a flange may see from the equivalent lorry, MPa. */
export function fatigueLimitMPa(standard: StandardId): number {
  const vehicle = compositeData.fatigue[standard];
  return vehicle.categoryMPa / vehicle.gammaM;
}

/**
 * Moment range on one girder, kNm at the stations, of one fatigue lorry brought to the whole traffic: damage equivalent
 * factor by span under the European standard, factor for endless life in the other. Every second station is run, the
 * rest lie straight between.
 */
export function fatigueRange(model: GirderModel, beam: LineBeam): Float64Array {
  const vehicle = compositeData.fatigue[model.standardId];
  const scale =
    vehicle.loadFactor *
    (1 + vehicle.allowance) *
    (model.plate?.lorryShare ?? fatigueShare(model.task.deck, model.layout.offsetsM));
  const lorries = lorriesOf(model.standardId);
  const track = beamTrack(beam);
  const { left } = beamStretches(beam);
  const stations = beam.xM.length;
  const range = new Float64Array(stations);
  const out: Extremes = { max: 0, min: 0 };
  const line = new Float64Array(4 * (stations - 1));
  for (let s = 0; s < stations; s += stride) {
    const of = { stretch: left[s]!, station: s, arm: beam.xM[s]!, turn: 1 };
    sectionLine(of, line);
    let most = 0;
    for (const lorry of lorries) {
      runGroup(track, lorry, line, -1, out, of);
      most = Math.max(most, out.max - out.min);
    }
    range[s] = scale * most * damage(model, beam, s);
  }
  for (let s = 0; s < stations; s++) {
    const before = s - (s % stride);
    if (before === s) continue;
    range[s] = range[before]! + ((range[before + stride]! - range[before]!) * (s - before)) / stride;
  }
  return range;
}

const lorriesKnown = new Map<StandardId, readonly AxleGroup[]>();

/** The fatigue lorry of a standard by itself, both ways round where that differs, made once. */
function lorriesOf(standard: StandardId): readonly AxleGroup[] {
  const known = lorriesKnown.get(standard);
  if (known) return known;
  const { atM, axlesKN } = compositeData.fatigue[standard];
  const group: AxleGroup = { atM, loadKN: axlesKN, whole: true };
  const back = reversed(group);
  const symmetrical = back.atM.every((x, i) => Math.abs(x - atM[i]!) < 1e-9);
  const made = symmetrical ? [group] : [group, back];
  lorriesKnown.set(standard, made);
  return made;
}

/** Damage equivalent factor of EN 1993-2 9.5.2 at a station; 1 where the standard has none. */
function damage(model: GirderModel, beam: LineBeam, station: number): number {
  if (model.standardId !== 'lm1') return 1;
  const d = compositeData.fatigue.damage;
  const { spansM } = model.task;
  const x = beam.xM[station]!;
  const span = Math.max(0, model.supportsM.findIndex((end, i) => i > 0 && x <= end + 1e-9) - 1);
  const along = (x - model.supportsM[span]!) / spansM[span]!;
  const last = spansM.length - 1;
  const leftPier = span > 0 && along < 0.15;
  const rightPier = span < last && along > 0.85;
  if (leftPier || rightPier) {
    const mean = (spansM[leftPier ? span - 1 : span]! + spansM[leftPier ? span : span + 1]!) / 2;
    const past = Math.min(1, Math.max(0, (mean - 30) / 50));
    return Math.min(
      d.supportMost + d.supportMostRise * past,
      d.volume * (d.supportLow + d.supportRise * past),
    );
  }
  const share = Math.min(1, Math.max(0, (spansM[span]! - 10) / 70));
  const short = Math.min(1, Math.max(0, (spansM[span]! - 10) / 15));
  const most = d.spanMostShort + (d.spanMost - d.spanMostShort) * short;
  return Math.min(most, d.volume * Math.max(d.spanLow, d.spanStart - d.spanFall * share));
}
