import { expect, it } from 'vitest';
import { normalCdf, normalQuantile } from '../../lib/price/normal.ts';
import fixture from '../oracles/normal/normal.json';

it('normalQuantile(p) agrees with Python statistics.NormalDist to 1e-14 of its value', () => {
  for (const { p, z } of fixture.quantiles) {
    expect(Math.abs(normalQuantile(p) - z), `p = ${p}`).toBeLessThanOrEqual(1e-14 * Math.max(1, Math.abs(z)));
  }
});

it('normalCdf(x) agrees with Python statistics.NormalDist to 1e-14', () => {
  for (const { x, p } of fixture.distribution)
    expect(Math.abs(normalCdf(x) - p), `x = ${x}`).toBeLessThan(1e-14);
});

it('normalQuantile(0), (1) and outside are infinite and not a number', () => {
  expect(normalQuantile(0)).toBe(-Infinity);
  expect(normalQuantile(1)).toBe(Infinity);
  expect(normalQuantile(-0.1)).toBeNaN();
  expect(normalQuantile(NaN)).toBeNaN();
});
