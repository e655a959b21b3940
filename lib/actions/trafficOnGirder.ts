import type { DeckSpec, StandardId } from '../model/index.ts';
import { crossPositiveArea, type CrossLine } from './crossLine.ts';
import { loadStandard } from './loadStandard.ts';
import { placeLanes } from './placeLanes.ts';
import { leftKerbM } from './trafficOnDeck.ts';
import { vehicleAsUniformKNm, type TrafficLoad } from './trafficLoad.ts';

/**
 * Traffic on one girder of a deck: lever rule between two girders, rigid crossbeam for more.
 * @param girderOffsetsM girder lines, m from the middle of the deck, rising
 * @param girder which of them
 * @throws RangeError for fewer than two girders or one that is not there
 */
export function trafficOnGirder(
  id: StandardId,
  deck: DeckSpec,
  girderOffsetsM: readonly number[],
  girder: number,
): TrafficLoad {
  if (!(girderOffsetsM.length >= 2)) {
    throw new RangeError(`girderOffsetsM: expected two girders or more, received ${girderOffsetsM.length}`);
  }
  if (!(girder >= 0 && girder < girderOffsetsM.length)) {
    throw new RangeError(`girder: expected 0 to ${girderOffsetsM.length - 1}, received ${girder}`);
  }
  const standard = loadStandard(id);
  const line = rigidCrossbeam(girderOffsetsM, girder);
  const placed = placeLanes(standard, line, leftKerbM(deck), deck.carriagewayM, vehicleAsUniformKNm(id));
  return {
    standard: id,
    vehicleFactor: placed.vehicle,
    udlKNm: placed.uniformKNm,
    footwayKNm: footwayOnLine(deck, line) * standard.footway.mostWithVehiclesKNm2,
    shearRatio: 1,
    loadedLanes: placed.loadedLanes,
    distribution: girderOffsetsM.length === 2 ? 'lever rule' : 'rigid crossbeam',
  };
}

/**
 * Share of girder i of a unit load at y when the crossbeam stays straight and girders are equal:
 * 1/n + e_i (y - mean) / sum e2. For two girders it is the lever rule.
 */
export function rigidCrossbeam(girderOffsetsM: readonly number[], girder: number): CrossLine {
  const n = girderOffsetsM.length;
  const mean = girderOffsetsM.reduce((sum, y) => sum + y, 0) / n;
  const second = girderOffsetsM.reduce((sum, y) => sum + (y - mean) ** 2, 0);
  const arm = girderOffsetsM[girder]! - mean;
  const at = (y: number): number => 1 / n + (arm * (y - mean)) / second;
  const yM = [mean - 1, mean + 1];
  return { yM, value: yM.map(at) };
}

/** Adverse footway width x cross line, m. The footways lie outside the carriageway, shared by the width there is on each side. */
export function footwayOnLine(deck: DeckSpec, line: CrossLine): number {
  if (!(deck.footwayM > 0)) return 0;
  const left = leftKerbM(deck);
  const right = left + deck.carriagewayM;
  const leftRoom = Math.max(0, left + deck.widthM / 2);
  const rightRoom = Math.max(0, deck.widthM / 2 - right);
  const room = leftRoom + rightRoom;
  if (!(room > 0)) return 0;
  const leftWidth = (deck.footwayM * leftRoom) / room;
  const rightWidth = (deck.footwayM * rightRoom) / room;
  return (
    crossPositiveArea(line, -deck.widthM / 2, -deck.widthM / 2 + leftWidth) +
    crossPositiveArea(line, deck.widthM / 2 - rightWidth, deck.widthM / 2)
  );
}
