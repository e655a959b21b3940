import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { leastForce, type Drape } from '../../../lib/forms/concrete-box/leastForce.ts';

/** Stations that ask for force: a moment over an axial part and what each shape of the drape gives; none where it makes things worse. */
const station = fc.record({
  moment: fc.double({ min: 1, max: 10, noNaN: true }),
  axial: fc.double({ min: 0.2, max: 1, noNaN: true }),
  gives: fc.tuple(...[0, 1, 2].map(() => fc.double({ min: -0.8, max: 1, noNaN: true }))),
});
type Station = typeof station extends fc.Arbitrary<infer T> ? T : never;

const needOf =
  (stations: readonly Station[]) =>
  (drape: Drape): number =>
    Math.max(
      ...stations.map(({ moment, axial, gives }) => {
        const per = axial + gives.reduce((total, give, k) => total + give * drape[k]!, 0);
        return per > 0 ? moment / per : Infinity;
      }),
    );

const shares = Array.from({ length: 26 }, (_, i) => i / 25);

describe('leastForce(need, spans, null)', () => {
  it.each([1, 2, 3])('finds what a fine grid finds, %d spans', (spans) => {
    fc.assert(
      fc.property(fc.array(station, { minLength: 2, maxLength: 8 }), (stations) => {
        const need = needOf(stations);
        let least = Infinity;
        for (const a of shares)
          for (const b of spans > 2 ? shares : [1])
            for (const c of spans > 1 ? shares : [1]) least = Math.min(least, need([a, b, c]));
        const { drape, forceKN } = leastForce(need, spans, null);
        if (least === Infinity) return;
        expect(forceKN).toBe(need(drape));
        // A share to 1/80 against one to 1/25.
        expect(forceKN / least).toBeLessThan(1.05);
      }),
      { seed: 811, numRuns: 60 },
    );
  });

  it('goes on to a far corner over a long ridge', () => {
    const need = ([a, , c]: Drape): number => 100 * Math.abs(a - c) + 10 * (1 + a);
    const { drape, forceKN } = leastForce(need, 2, [1, 1, 1]);
    expect(forceKN).toBeCloseTo(10, 6);
    expect(drape[0]).toBeCloseTo(0, 6);
  });
});
