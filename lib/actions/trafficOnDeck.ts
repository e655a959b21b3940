import type { DeckSpec, StandardId } from '../model/index.ts';
import type { CrossLine } from './crossLine.ts';
import { loadStandard } from './loadStandard.ts';
import { placeLanes } from './placeLanes.ts';
import { vehicleAsUniformKNm, type LongSpanLoad, type TrafficLoad } from './trafficLoad.ts';

/** All lanes on one member that carries the whole deck, with the worst number of loaded lanes. */
export function trafficOnDeck(id: StandardId, deck: DeckSpec, longSpan?: LongSpanLoad): TrafficLoad {
  const standard = loadStandard(id);
  const level: CrossLine = { yM: [-1, 1], value: [1, 1] };
  const placed = placeLanes(standard, level, leftKerbM(deck), deck.carriagewayM, vehicleAsUniformKNm(id));
  return {
    standard: id,
    vehicleFactor: placed.vehicle,
    udlKNm: placed.uniformKNm,
    footwayKNm: deck.footwayM * standard.footway.mostWithVehiclesKNm2,
    shearRatio: 1,
    loadedLanes: placed.loadedLanes,
    distribution: 'whole deck',
    ...(longSpan ? { longSpan } : {}),
  };
}

/** Left kerb, m from the middle of the deck. */
export function leftKerbM(deck: DeckSpec): number {
  return deck.carriagewayOffsetM - deck.carriagewayM / 2;
}
