import type { Draws } from './drawDrivers.ts';
import { loadings } from './drivers.ts';
import type { Rate, Rates } from './rates.ts';
import { halfSigmas } from './rates.ts';

/** Rates on the draws: for each item one rate a draw, money per unit. Made again when a rate changes. */
export type RateDraws = ReadonlyMap<string, Float64Array>;

/**
 * Puts one rate on the draws of a study, money per unit in each draw. The deviate of an item is its share of the drivers
 * and its own, in root variance shares; below 0 it spreads by the lower, above 0 by the upper half of the rate (two
 * half-lognormals joined at P50).
 */
export function drawRate(rate: Rate, draws: Draws): Float64Array {
  const { low, high } = halfSigmas(rate);
  const loading = loadings.get(rate.item)!;
  const own = draws.own.get(rate.item)!;
  const R = new Float64Array(draws.count);
  for (let k = 0; k < R.length; k++) R[k] = loading.own * own[k]!;
  for (const { driver, factor } of loading.drivers) {
    const D = draws.drivers[driver];
    for (let k = 0; k < R.length; k++) R[k] = R[k]! + factor * D[k]!;
  }
  for (let k = 0; k < R.length; k++) {
    const z = R[k]!;
    R[k] = rate.p50 * Math.exp((z < 0 ? low : high) * z);
  }
  return R;
}

/** Puts all rates of a study on its draws. */
export function drawRates(rates: Rates, draws: Draws): RateDraws {
  return new Map(rates.rates.map((rate) => [rate.item, drawRate(rate, draws)]));
}
