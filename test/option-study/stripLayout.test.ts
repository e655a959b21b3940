import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { stripLayout } from '../../notebooks/option-study/brief/stripLayout.ts';

describe('stripLayout', () => {
  it('keeps the words of wide strips in one tier and sets those of narrow ones lower', () => {
    expect(stripLayout([100, 100, 100], [40, 40, 40]).tiers).toBe(1);
    const { edges, places, tiers } = stripLayout([20, 40, 130], [40, 60, 40]);
    expect(edges).toEqual([0, 20, 60, 190]);
    expect(places.map(({ tier }) => tier)).toEqual([0, 1, 0]);
    expect(places.map(({ middle }) => middle)).toEqual([10, 40, 125]);
    expect(tiers).toBe(2);
  });

  it('never lets two words of one tier touch', () => {
    const strip = fc.tuple(fc.integer({ min: 1, max: 200 }), fc.integer({ min: 1, max: 90 }));
    fc.assert(
      fc.property(fc.array(strip, { minLength: 1, maxLength: 30 }), (strips) => {
        const words = strips.map(([, word]) => word);
        const { places, tiers } = stripLayout(
          strips.map(([width]) => width),
          words,
        );
        for (let tier = 0; tier < tiers; tier += 1) {
          const inTier = places.flatMap((place, i) =>
            place.tier === tier
              ? [[place.middle - words[i]! / 2, place.middle + words[i]! / 2] as const]
              : [],
          );
          for (let i = 1; i < inTier.length; i += 1) {
            expect(inTier[i]![0]).toBeGreaterThanOrEqual(inTier[i - 1]![1]);
          }
        }
      }),
      { seed: 20260101, numRuns: 200 },
    );
  });
});
