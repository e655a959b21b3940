import highsLoader from 'highs';
import { beforeAll, describe, expect, it } from 'vitest';
import { arrange } from '../../lib/arrange/index.ts';
import { leastBySolver, milpCases, searchFor } from './arrangeMilp.ts';

let highs: Awaited<ReturnType<typeof highsLoader>>;
beforeAll(async () => {
  highs = await highsLoader();
});

describe('arrange against a mixed-integer solver', () => {
  it.each(milpCases)(
    'arrange(continuous) on $lengthM m is within 0.1 % of the solver and never below it',
    (given) => {
      const found = arrange(...searchFor(given)).arrangements.filter(
        ({ units }) => units[0]!.supportsM.length > 3,
      );
      const least = leastBySolver(highs, given);
      expect(least).toBeLessThan(Infinity);
      expect(found[0]!.tableCost).toBeGreaterThanOrEqual(least * (1 - 1e-7));
      expect(found[0]!.tableCost).toBeLessThanOrEqual(least * 1.001);
    },
    120_000,
  );
});
