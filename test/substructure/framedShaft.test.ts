import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  pushOf,
  pushedBy,
  swayOf,
  swayedBy,
  turnedBy,
  type FramedShaft,
} from '../../lib/substructure/framedShaft.ts';

const shaft = { heightM: 20, eiKNm2: 6e7, deckTurnKNm: 0 };
const stiffDeck: FramedShaft = { ...shaft, deckTurnKNm: 1e15 };
const looseDeck: FramedShaft = shaft;

describe('a shaft pushed by the deck it is cast in with', () => {
  it('pushedBy(shaft under a deck that does not turn) has 6 E I push / h^2 at both ends and 12 E I push / h^3 across', () => {
    // 6 x 6e7 x 0.04 / 400 = 36 000 kNm; 12 x 6e7 x 0.04 / 8000 = 3600 kN.
    const moved = pushedBy(stiffDeck, 0.04);
    expect(moved.topKNm).toBeCloseTo(36_000, 3);
    expect(moved.footKNm).toBeCloseTo(36_000, 3);
    expect(moved.forceKN).toBeCloseTo(3600, 3);
    expect(swayOf(stiffDeck)).toBeCloseTo(90_000, 2);
  });

  it('pushedBy(shaft under a deck that turns freely) has 3 E I push / h^2 at the foot alone and 3 E I push / h^3 across', () => {
    const moved = pushedBy(looseDeck, 0.04);
    expect(moved.topKNm).toBe(0);
    expect(moved.footKNm).toBeCloseTo(18_000, 6);
    expect(moved.forceKN).toBeCloseTo(900, 6);
  });

  it('pushedBy(shaft under a deck as stiff as itself) solves both slope deflection equations by hand', () => {
    // 4 E I / h = 1.2e7; theta = 36 000 / (1.2e7 + 1.2e7) = 1.5e-3: top 18 000, foot 36 000 - 2 E I / h theta = 27 000.
    const moved = pushedBy({ ...shaft, deckTurnKNm: 1.2e7 }, 0.04);
    expect(moved.topKNm).toBeCloseTo(18_000, 6);
    expect(moved.footKNm).toBeCloseTo(27_000, 6);
    expect(moved.forceKN * 20).toBeCloseTo(45_000, 6);
  });

  it('turnedBy(couple) gives the shaft its share by stiffness at the top and half of it at the foot', () => {
    const turned = turnedBy({ ...shaft, deckTurnKNm: 3.6e7 }, 40_000);
    expect(turned.topKNm).toBeCloseTo(10_000, 6);
    expect(turned.footKNm).toBeCloseTo(5000, 6);
    expect(turned.forceKN * 20).toBeCloseTo(15_000, 6);
  });

  it('swayedBy(force) is in balance: moments at both ends hold the force at its height', () => {
    const { topKNm, footKNm } = swayedBy({ ...shaft, deckTurnKNm: 2e7 }, 500);
    expect(topKNm + footKNm).toBeCloseTo(500 * 20, 6);
  });

  it('pushOf(prestressed, 50 m) is half of the range of temperature and all of the shortening', () => {
    // 1e-5 x 71.5 / 2 x 50 m + 0.0004 x 50 m.
    const { pushM, cooledM } = pushOf('prestressed', 50);
    expect(cooledM).toBeCloseTo(0.017875, 12);
    expect(pushM).toBeCloseTo(0.017875 + 0.02, 12);
  });

  it('pushedBy(taller or thinner shaft) bends less, farther pushes more, whatever the deck', () => {
    const any = fc.record({
      heightM: fc.double({ min: 5, max: 80, noNaN: true }),
      eiKNm2: fc.double({ min: 1e6, max: 1e9, noNaN: true }),
      deckTurnKNm: fc.double({ min: 0, max: 1e9, noNaN: true }),
    });
    fc.assert(
      fc.property(any, fc.double({ min: 1e-3, max: 0.2, noNaN: true }), (one, pushM) => {
        const { footKNm, topKNm } = pushedBy(one, pushM);
        expect(pushedBy({ ...one, heightM: 1.2 * one.heightM }, pushM).footKNm).toBeLessThan(footKNm);
        expect(pushedBy({ ...one, eiKNm2: 0.8 * one.eiKNm2 }, pushM).footKNm).toBeLessThan(footKNm);
        expect(pushedBy(one, 1.5 * pushM).footKNm / footKNm).toBeCloseTo(1.5, 9);
        expect(topKNm).toBeLessThanOrEqual(footKNm * (1 + 1e-12));
      }),
      { seed: 20_261, numRuns: 200 },
    );
  });
});
