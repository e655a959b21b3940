import { portalData } from './portalData.ts';

/**
 * Pressure of the fill on a wall that the deck pushes into it and draws away from it year by year, K* (PD 6694-1, from
 * memory; see the data file).
 * @param heightM of the retained fill
 * @param rangeM movement of the end of the deck from its coldest to its warmest, m
 * @param factor 20 on soil, 66 on rock
 * @returns coefficient over the upper half of the wall, not less than at rest
 */
export function ratchetPressure(heightM: number, rangeM: number, factor: number): number {
  const { restPressure, passivePressure, movedAtMiddle, power } = portalData.earth;
  return restPressure + passivePressure * ((factor * movedAtMiddle * rangeM) / heightM) ** power;
}

/** Pressure of the fill at a depth, kN/m2, as a share of its own weight; K* in the upper half, then falling to K0 at the foot. */
export function pressureAt(
  depthM: number,
  heightM: number,
  { upper, foot }: { readonly upper: number; readonly foot: number },
): number {
  const { fillKNm3 } = portalData.earth;
  const middle = heightM / 2;
  if (depthM <= middle) return upper * fillKNm3 * depthM;
  const down = (depthM - middle) / middle;
  return fillKNm3 * (upper * middle * (1 - down) + foot * heightM * down);
}

/**
 * Forces that a pressure puts on the nodes of a wall, kN towards the span, from its depths under the road. Between nodes
 * the pressure is taken to change evenly.
 */
export function pressureOnNodes(
  depthsM: readonly number[],
  widthM: number,
  pressureKPa: (depthM: number) => number,
): number[] {
  const out = depthsM.map(() => 0);
  for (let i = 0; i < depthsM.length - 1; i++) {
    const length = Math.abs(depthsM[i + 1]! - depthsM[i]!);
    const a = pressureKPa(depthsM[i]!);
    const b = pressureKPa(depthsM[i + 1]!);
    out[i]! += (widthM * length * (2 * a + b)) / 6;
    out[i + 1]! += (widthM * length * (a + 2 * b)) / 6;
  }
  return out;
}
