import { materials, trafficOnInfluence, type TrafficLoad } from '../../actions/index.ts';
import { ernstModulus, loadTrack, type Track } from '../../mechanics/index.ts';
import { fatigueLimitMPa, fatigueRange } from '../floor/fatigue.ts';
import { cableData } from './cableData.ts';
import type { CableModel } from './cableModel.ts';
import type { StayLayout } from './stayLayout.ts';

/** One stay (or group of anchor stays) of one plane. Forces characteristic, kN. */
export interface SizedStay {
  readonly permanentKN: number;
  readonly trafficMaxKN: number;
  readonly trafficMinKN: number;
  readonly rangeMPa: number;
  /** Strands of all stays it stands for. */
  readonly strands: number;
  readonly areaM2: number;
  readonly utilisation: number;
  readonly governs: 'strength' | 'fatigue' | 'minimum';
}

export interface StayTraffic {
  readonly maxKN: number;
  readonly minKN: number;
  /** Equivalent range of the fatigue lorry, kN. */
  readonly rangeKN: number;
}

const { stay: rules } = cableData;

/** Stress allowed under characteristic load, MPa. */
export const serviceMPa = rules.serviceShare * materials.stay.ultimateMPa;

/** Traffic on every stay of one plane by its influence line; a mirrored stay of a symmetrical bridge is not worked out twice. */
export function stayTraffic(
  model: CableModel,
  traffic: TrafficLoad,
  fatigueShare: number,
  symmetrical: boolean,
): StayTraffic[] {
  const { stays, lengthM, mainSpanM } = model.layout;
  const track: Track = loadTrack(model.beam.xM);
  const known = new Map<string, StayTraffic>();
  return stays.map((stay, i) => {
    const fromEnd = symmetrical ? Math.min(stay.deckM, lengthM - stay.deckM) : stay.deckM;
    const key = `${fromEnd.toFixed(3)} ${stay.anchor}`;
    const before = known.get(key);
    if (before) return before;
    const line = model.stayLine(i);
    const placed = trafficOnInfluence(traffic, track, line);
    const rangeKN = fatigueShare * fatigueRange(traffic.standard, track, line, mainSpanM);
    const made = { maxKN: placed.max, minKN: placed.min, rangeKN };
    known.set(key, made);
    return made;
  });
}

/** Whole strands for each stay by strength (a share of the tensile strength under characteristic load) and fatigue range. */
export function sizeStays(
  layout: StayLayout,
  permanentKN: readonly number[],
  traffic: readonly StayTraffic[],
  rangeLimitMPa: number,
): SizedStay[] {
  const strandM2 = rules.strandMm2 / 1e6;
  return layout.stays.map((stay, i) => {
    const { maxKN, minKN, rangeKN } = traffic[i]!;
    const force = permanentKN[i]! + maxKN;
    const byStrength = force / (serviceMPa * 1000) / strandM2;
    const byFatigue = rangeKN / (rangeLimitMPa * 1000) / strandM2;
    const least = rules.leastStrands * stay.count;
    const perStay = Math.ceil(Math.max(byStrength, byFatigue, least) / stay.count - 1e-9);
    const strands = Math.min(perStay, rules.mostStrands) * stay.count;
    const most = Math.max(byStrength, byFatigue);
    return {
      permanentKN: permanentKN[i]!,
      trafficMaxKN: maxKN,
      trafficMinKN: minKN,
      rangeMPa: rangeKN / (strands * strandM2) / 1000,
      strands,
      areaM2: strands * strandM2,
      utilisation: most / strands,
      governs: most < least ? 'minimum' : byFatigue > byStrength ? 'fatigue' : 'strength',
    };
  });
}

/** Range limit of a standard, MPa. */
export function stayRangeLimitMPa(standard: TrafficLoad['standard']): number {
  return fatigueLimitMPa(standard, 'stay');
}

/** EA / l of each stay with its sag under lasting load, kN/m. */
export function stayStiffness(layout: StayLayout, stays: readonly SizedStay[]): number[] {
  return layout.stays.map((stay, i) => {
    const { areaM2, permanentKN } = stays[i]!;
    // A stay that lasting load hardly pulls still stands at about a tenth of its service stress.
    const stressMPa = Math.max(0.1 * serviceMPa, permanentKN / areaM2 / 1000);
    const horizontalM = stay.lengthM * stay.cosine;
    const eMPa = ernstModulus({
      eMPa: materials.stay.eMPa,
      horizontalM,
      stressMPa,
      unitWeightKNm3: materials.stay.unitWeightKNm3,
    });
    return (eMPa * 1000 * areaM2) / stay.lengthM;
  });
}

/** Mass of strand of the stays of both planes, kg: all of them or the anchor stays alone. */
export function stayMassKg(
  layout: StayLayout,
  stays: readonly SizedStay[],
  which: 'all' | 'anchor' | 'hung',
): number {
  let sum = 0;
  layout.stays.forEach((stay, i) => {
    if (which === 'anchor' && !stay.anchor) return;
    if (which === 'hung' && stay.anchor) return;
    sum += 2 * stays[i]!.areaM2 * stay.lengthM * materials.steelDensityKgM3;
  });
  return sum;
}
