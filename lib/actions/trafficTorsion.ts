import type { DeckSpec, StandardId } from '../model/index.ts';
import type { CrossLine } from './crossLine.ts';
import { loadStandard } from './loadStandard.ts';
import { placeLanes } from './placeLanes.ts';
import { leftKerbM } from './trafficOnDeck.ts';
import { footwayOnLine } from './footwayOnLine.ts';
import { vehicleAsUniformKNm } from './trafficLoad.ts';

/** Torque of traffic about the middle of the deck in its worst eccentric arrangement, characteristic. */
export interface TrafficTorsion {
  /** Lane-1 vehicles x eccentricity, m: times the axle loads of one vehicle gives the torque of a vehicle row. */
  readonly vehicleFactorM: number;
  /** Torque of the whole heaviest vehicle row with its dynamic allowance, kNm. */
  readonly vehicleTorqueKNm: number;
  /** Torque of uniform loads, kNm per m. */
  readonly udlTorqueKNmPerM: number;
  readonly footwayTorqueKNmPerM: number;
}

/** Only lanes on one side count when those on the other relieve. */
export function trafficTorsion(id: StandardId, deck: DeckSpec): TrafficTorsion {
  const standard = loadStandard(id);
  const sides = [1, -1].map((side) => {
    const line: CrossLine = { yM: [-1, 1], value: [-side, side] };
    const placed = placeLanes(standard, line, leftKerbM(deck), deck.carriagewayM, vehicleAsUniformKNm(id));
    return { placed, footway: footwayOnLine(deck, line) };
  });
  const heaviest = Math.max(
    ...standard.vehicles.map((v) => v.axles.reduce((sum, axle) => sum + axle.loadKN, 0)),
  );
  const vehicleFactorM = Math.max(...sides.map((side) => side.placed.vehicle));
  return {
    vehicleFactorM,
    vehicleTorqueKNm: vehicleFactorM * heaviest * (1 + standard.dynamicAllowance),
    udlTorqueKNmPerM: Math.max(...sides.map((side) => side.placed.uniformKNm)),
    footwayTorqueKNmPerM:
      Math.max(...sides.map((side) => side.footway)) * standard.footway.mostWithVehiclesKNm2,
  };
}
