import { expect, it } from 'vitest';
import { drawDrivers, drawRates, driverData, meanRates, ratePacks, ratesFor } from '../../lib/price/index.ts';
import { loadings } from '../../lib/price/drivers.ts';
import { quantileOf } from '../../lib/price/quantile.ts';
import { items } from '../../lib/takeoff/index.ts';

const typed = { item: 'plate-girder-steel', p10: 3, p50: 4, p90: 6, reason: 'quotation' };

it('ratesFor(books) has one rising rate for every item and lays typed rates over the pack', () => {
  const { rates, pack } = ratesFor({ ratePack: 'demo-2026', rates: [typed] });
  expect(rates.map((rate) => rate.item)).toEqual(items.map((item) => item.id));
  for (const rate of rates) expect(rate.p10 < rate.p50 && rate.p50 < rate.p90, rate.item).toBe(true);
  expect(rates.find((rate) => rate.item === typed.item)).toMatchObject({ p50: 4, typed: 'quotation' });
  expect(pack.source).toMatch(/invented/i);
});

it('ratesFor(books) refuses an unknown pack, an unknown item and points that do not rise', () => {
  expect(() => ratesFor({ ratePack: 'none', rates: [] })).toThrow(
    /rate pack: expected one of demo-2026, received 'none'/,
  );
  expect(() => ratesFor({ ratePack: 'demo-2026', rates: [{ ...typed, item: 'gold' }] })).toThrow(
    /received 'gold'/,
  );
  expect(() => ratesFor({ ratePack: 'demo-2026', rates: [{ ...typed, p90: 3.5 }] })).toThrow(
    /p10 < p50 < p90/,
  );
  expect(() => ratesFor({ ratePack: 'demo-2026', rates: [{ ...typed, p10: NaN }] })).toThrow(
    /p10 < p50 < p90/,
  );
});

it('drivers: shares of variance of every item sum to 1 with its own', () => {
  for (const { drivers, own, item } of loadings.values()) {
    expect(
      drivers.reduce((sum, { factor }) => sum + factor ** 2, own ** 2),
      item,
    ).toBeCloseTo(1, 12);
  }
  expect(driverData.modelError.every((entry) => entry.reason.length > 0)).toBe(true);
});

it('drawRates(rates, draws) meets P10, P50, P90 and the mean of its rates within sampling error', () => {
  const rates = ratesFor({ ratePack: 'demo-2026', rates: [] });
  const draws = drawDrivers({ groundStretches: [], lengthM: 10 }, { draws: 40_000, seed: 11 }, []);
  const drawn = drawRates(rates, draws);
  const mean = meanRates(rates);
  for (const rate of rates.rates) {
    const R = drawn.get(rate.item)!;
    // Standard error of a 10 % point of 40,000 draws of ln-spread 0.3 is about 0.3 %; four of them.
    expect(Math.abs(quantileOf(R.slice(), 0.1) / rate.p10 - 1), rate.item).toBeLessThan(0.015);
    expect(Math.abs(quantileOf(R.slice(), 0.5) / rate.p50 - 1), rate.item).toBeLessThan(0.01);
    expect(Math.abs(quantileOf(R.slice(), 0.9) / rate.p90 - 1), rate.item).toBeLessThan(0.015);
    const average = R.reduce((sum, r) => sum + r, 0) / R.length;
    expect(Math.abs(average / mean[rate.item]! - 1), rate.item).toBeLessThan(0.01);
  }
});

it('meanRates(rates) lies above the median of a rate that is skewed upwards', () => {
  const mean = meanRates(ratesFor({ ratePack: 'demo-2026', rates: [typed] }));
  expect(mean[typed.item]).toBeGreaterThan(4);
  for (const pack of ratePacks.values()) expect(pack.rates.length).toBe(items.length);
});
