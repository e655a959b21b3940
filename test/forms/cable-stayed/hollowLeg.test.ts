import { describe, expect, it } from 'vitest';
import { legArea, legInertia, legMoment } from '../../../lib/forms/cable-stayed/hollowLeg.ts';

const leg = { depthM: 4, widthM: 3, wallM: 0.5, barRatio: 0.015 };

describe('legMoment(leg, axial, fcd, fyd)', () => {
  it('agrees with strips summed one by one', () => {
    const fcd = 28.3;
    const fyd = 435;
    const n = 40000;
    for (const axialKN of [0, 20000, 60000, 110000]) {
      // Strips from the pressed face; the compressed depth that balances the axial force is found by halving.
      const width = (y: number): number => (y < 0.5 || y > 3.5 ? 3 : 1);
      const sum = (edge: number): { force: number; moment: number } => {
        let force = 0;
        let moment = 0;
        const h = 4 / n;
        for (let i = 0; i < n; i++) {
          const y = (i + 0.5) * h;
          const stress = y < edge ? fcd + 0.015 * fyd : -0.015 * fyd;
          force += stress * width(y) * h * 1000;
          moment += stress * width(y) * h * 1000 * (2 - y);
        }
        return { force, moment };
      };
      let low = 0;
      let high = 4;
      for (let k = 0; k < 40; k++) {
        const middle = (low + high) / 2;
        if (sum(middle).force < axialKN) low = middle;
        else high = middle;
      }
      expect(legMoment(leg, axialKN, fcd, fyd) / sum(high).moment).toBeCloseTo(1, 2);
    }
  });

  it('has nothing left when the axial force alone is too much', () => {
    expect(legMoment(leg, 1e7, 28.3, 435)).toBe(0);
  });

  it('area and inertia of a box, by hand', () => {
    expect(legArea(leg)).toBeCloseTo(12 - 3 * 2, 12);
    expect(legInertia(leg)).toBeCloseTo((3 * 64 - 2 * 27) / 12, 12);
  });
});
