import type { DeckSpec, StandardId } from '../model/index.ts';
import type { CrossLine } from './crossLine.ts';
import { loadStandard } from './loadStandard.ts';
import { placeLanes } from './placeLanes.ts';
import { leftKerbM } from './trafficOnDeck.ts';
import { footwayOnLine } from './trafficOnGirder.ts';
import { vehicleAsUniformKNm, type TrafficLoad } from './trafficLoad.ts';

/**
 * Traffic on a member whose share of a load depends on where it stands across the deck by any line of straight pieces:
 * a stringer by the lever rule, the bending of a cross-girder (then the load comes out in kNm for kN). Lanes are placed
 * for the worst.
 * @param weighKNm what one vehicle counts against 1 kN/m of uniform load; for short loaded lengths the default is low
 */
export function trafficOnCrossLine(
  id: StandardId,
  deck: DeckSpec,
  line: CrossLine,
  weighKNm = vehicleAsUniformKNm(id),
): TrafficLoad {
  const standard = loadStandard(id);
  const placed = placeLanes(standard, line, leftKerbM(deck), deck.carriagewayM, weighKNm);
  return {
    standard: id,
    vehicleFactor: placed.vehicle,
    udlKNm: placed.uniformKNm,
    footwayKNm: footwayOnLine(deck, line) * standard.footway.mostWithVehiclesKNm2,
    shearRatio: 1,
    loadedLanes: placed.loadedLanes,
    distribution: 'lever rule',
  };
}

/**
 * The standard's fatigue traffic on such a member: every lane at the shares of `factors.fatigue` where these hold for
 * uniform loads too (EN 1991-2 4.6.2), otherwise one vehicle in the worst lane without the presence factor
 * (AASHTO LRFD 3.6.1.4), both from memory.
 */
export function fatigueOnCrossLine(id: StandardId, deck: DeckSpec, line: CrossLine): TrafficLoad {
  const standard = loadStandard(id);
  const { fatigue } = standard.factors;
  if (fatigue.uniform > 0) {
    const all = trafficOnCrossLine(id, deck, line);
    return scaled(all, fatigue.vehicle, fatigue.uniform);
  }
  const laneM = Math.min(standard.lanes.widthM, deck.carriagewayM);
  const play = (deck.carriagewayM - laneM) / 2;
  const [presence = 1] = standard.lanes.multiplePresence;
  let worst: TrafficLoad | null = null;
  for (const side of [-1, 0, 1]) {
    const lane = {
      ...deck,
      carriagewayM: laneM,
      carriagewayOffsetM: deck.carriagewayOffsetM + side * play,
      footwayM: 0,
    };
    const one = trafficOnCrossLine(id, lane, line);
    if (worst === null || one.vehicleFactor > worst.vehicleFactor) worst = one;
  }
  const allowance = (1 + fatigueDynamicAllowance) / (1 + standard.dynamicAllowance);
  return scaled(worst!, (fatigue.vehicle / presence) * allowance, 0);
}

/** AASHTO LRFD table 3.6.2.1-1, from memory. */
const fatigueDynamicAllowance = 0.15;

function scaled(load: TrafficLoad, vehicle: number, uniform: number): TrafficLoad {
  return {
    ...load,
    vehicleFactor: load.vehicleFactor * vehicle,
    udlKNm: load.udlKNm * uniform,
    footwayKNm: 0,
  };
}
