import type { StandardId } from '../model/index.ts';
import { loadStandard } from './loadStandard.ts';

/** Traffic as one member carries it, characteristic, ready to be placed along it. */
export interface TrafficLoad {
  readonly standard: StandardId;
  /** Lane-1 vehicles carried: presence, adjustment and distribution inside, dynamic allowance not. */
  readonly vehicleFactor: number;
  /** Uniform load of lanes and remaining area, kN per m of member, placed where adverse. */
  readonly udlKNm: number;
  /** Footway load at its highest value, kN/m; it falls with the loaded length by the standard's law. */
  readonly footwayKNm: number;
  /** What shears and reactions carry against moments (AASHTO has factors for each); 1 otherwise. */
  readonly shearRatio: number;
  /** What all shears and reactions grow by at the obtuse corner of a skew deck; 1 when absent. */
  readonly obtuse?: number;
  /** Loaded lanes behind the factor. */
  readonly loadedLanes: number;
  /** How it was shared out across the deck. */
  readonly distribution: 'whole deck' | 'lever rule' | 'rigid crossbeam' | 'linked beams' | 'AASHTO factors';
  /** Typed by the user: load per lane against loaded length, used instead beyond the reach of the standard. */
  readonly longSpan?: LongSpanLoad;
}

/** Uniform load of one lane, kN/m, against loaded length, m; straight between points, level beyond them. */
export interface LongSpanLoad {
  readonly loadedM: readonly number[];
  readonly laneKNm: readonly number[];
}

/** The share of the characteristic traffic in the combination that decides the prestress (frequent; Service III). */
export function serviceTraffic(load: TrafficLoad): TrafficLoad {
  const { sls } = loadStandard(load.standard).factors;
  return {
    ...load,
    vehicleFactor: load.vehicleFactor * sls.vehicle,
    udlKNm: load.udlKNm * sls.uniform,
    footwayKNm: load.footwayKNm * sls.footway,
  };
}

/** Weight of one lane-1 vehicle against 1 kN/m of uniform load when arrangements are compared: its axles over 40 m. */
export function vehicleAsUniformKNm(id: StandardId): number {
  const standard = loadStandard(id);
  const heaviest = Math.max(
    ...standard.vehicles.map((v) => v.axles.reduce((sum, axle) => sum + axle.loadKN, 0)),
  );
  // A vehicle P at the middle of a span counts like 2 P / span; 40 m is an ordinary span and the order rarely turns on it.
  return (2 * heaviest * (1 + standard.dynamicAllowance)) / 40;
}
