import fc from 'fast-check';
import { quantileSorted } from 'd3-array';
import { expect, it } from 'vitest';
import { quantileOf } from '../../lib/price/quantile.ts';

it('quantileOf(draws, p) agrees with a sorted array and the library quantile, ties and all', () => {
  fc.assert(
    fc.property(
      fc.array(fc.integer({ min: -50, max: 50 }), { minLength: 1, maxLength: 200 }),
      fc.double({ min: 0, max: 1, noNaN: true }),
      (values, p) => {
        const sorted = [...values].sort((a, b) => a - b);
        expect(quantileOf(Float64Array.from(values), p)).toBeCloseTo(quantileSorted(sorted, p)!, 9);
      },
    ),
    { seed: 20260107, numRuns: 400 },
  );
});

it('quantileOf([]) refuses', () => {
  expect(() => quantileOf(new Float64Array(0), 0.5)).toThrow(/at least one draw/);
});
