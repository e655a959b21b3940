import type { DeckSpec, StandardId } from '../model/index.ts';
import type { CrossLine } from './crossLine.ts';
import { loadStandard } from './loadStandard.ts';
import { placeLanes } from './placeLanes.ts';
import { leftKerbM } from './trafficOnDeck.ts';
import { footwayOnLine } from './footwayOnLine.ts';
import { vehicleAsUniformKNm, type TrafficLoad } from './trafficLoad.ts';

/**
 * Traffic on a member whose share of a load depends on where it stands across the deck by any line of straight pieces:
 * a stringer by the lever rule, the bending of a cross-girder (then the load comes out in kNm for kN). Lanes are placed
 * for the worst.
 * @param weighKNm what one vehicle counts against 1 kN/m of uniform load; for short loaded lengths the default is low
 * @param mostLanes at most so many lanes are loaded
 */
export function trafficOnCrossLine(
  id: StandardId,
  deck: DeckSpec,
  line: CrossLine,
  weighKNm = vehicleAsUniformKNm(id),
  mostLanes?: number,
): TrafficLoad {
  const standard = loadStandard(id);
  const placed = placeLanes(standard, line, leftKerbM(deck), deck.carriagewayM, weighKNm, mostLanes);
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
 * Share of one vehicle that a member takes from the worst notional lane, presence factor aside: for fatigue, where one
 * lane carries the lorries.
 */
export function worstLaneShare(id: StandardId, deck: DeckSpec, line: CrossLine): number {
  const standard = loadStandard(id);
  const laneM = Math.min(standard.lanes.widthM, deck.carriagewayM);
  const play = (deck.carriagewayM - laneM) / 2;
  const [presence = 1] = standard.lanes.multiplePresence;
  let worst = 0;
  for (const side of [-1, 0, 1]) {
    const lane = {
      ...deck,
      carriagewayM: laneM,
      carriagewayOffsetM: deck.carriagewayOffsetM + side * play,
      footwayM: 0,
    };
    worst = Math.max(worst, trafficOnCrossLine(id, lane, line).vehicleFactor / presence);
  }
  return worst;
}
