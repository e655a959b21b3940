import { describe, expect, it } from 'vitest';
import { crossValue } from '../../../../lib/actions/index.ts';
import { beamShares, type LinkedBeams } from '../../../../lib/forms/common/precast/linkedBeams.ts';

const all = [0, 1, 2, 3, 4, 5, 6];
const deck = (torsionKNm2: number, link: LinkedBeams['link'] = 'hinge', halfM = 0.6): LinkedBeams => ({
  offsetsM: all.map((i) => (i - 3) * 1.2),
  spanM: 25,
  bendingKNm2: 2e6,
  torsionKNm2,
  halfM,
  link,
});
const strip = { lengthM: 0.4, stiffnessKNm: 2e4 };

describe('beamShares(beams, wanted)', () => {
  it.each([
    ['hinges', deck(1e6)],
    ['slab strips', deck(1e6, strip, 0.4)],
    ['no torsion', deck(1, strip, 0.4)],
  ] as const)('shares all of a load out wherever it stands, with %s', (_, beams) => {
    const shares = beamShares(beams, all);
    for (const y of [-4.1, -3.6, -1.3, 0, 0.5, 2.9]) {
      const sum = shares.reduce((total, { bending }) => total + crossValue(bending, y), 0);
      expect(sum).toBeCloseTo(1, 4);
      // Moment about the middle: what the shares miss is torque of the beams.
      const arms = shares.reduce(
        (total, { bending, torsion }, i) =>
          total + crossValue(bending, y) * beams.offsetsM[i]! + crossValue(torsion, y),
        0,
      );
      expect(arms).toBeCloseTo(y, 4);
    }
  });

  it('is the same for beam i under a load on j as for j under one on i (Maxwell)', () => {
    const beams = deck(3e5);
    const [one, other] = beamShares(beams, [1, 4]);
    expect(crossValue(one!.bending, beams.offsetsM[4]!)).toBeCloseTo(
      crossValue(other!.bending, beams.offsetsM[1]!),
      6,
    );
  });

  it('gives every beam the same where none can twist, whichever is loaded', () => {
    for (const { bending } of beamShares(deck(1e12), all))
      for (const y of [-3.6, 0, 2.4]) expect(crossValue(bending, y)).toBeCloseTo(1 / 7, 4);
  });

  it('leaves a load on an outer beam more on it the less torsion the beams have', () => {
    const outer = (torsion: number): number => crossValue(beamShares(deck(torsion), [0])[0]!.bending, -3.6);
    expect(outer(1e5)).toBeGreaterThan(outer(1e6));
    expect(outer(1e6)).toBeGreaterThan(outer(1e7));
  });
});
