import { describe, expect, it } from 'vitest';
import {
  aashtoFactors,
  atObtuseCorner,
  cellularCorner,
  closeBeamCorner,
  girderCorner,
  spreadBoxCorner,
  trafficEnvelope,
  trafficOnDeck,
  trafficOnGirder,
} from '../../lib/actions/index.ts';
import { lineBeam } from '../../lib/mechanics/index.ts';
import { plainDeck } from '../forms/composite-i/cases.ts';

const stiff = { spanM: 30, slabM: 0.2, kgM4: 0.6 };
const factors = [
  (skewDeg: number) => girderCorner(stiff, skewDeg),
  (skewDeg: number) => spreadBoxCorner({ spanM: 30, depthM: 1.2, spacingM: 3 }, skewDeg),
  (skewDeg: number) => closeBeamCorner({ spanM: 27, depthM: 0.9 }, skewDeg),
  (skewDeg: number) => cellularCorner({ spanM: 42, depthM: 2 }, skewDeg),
];

describe('factors of the obtuse corner', () => {
  it('are by hand at 45 degrees: 1 + 0.2 x 0.4^0.3, 1 + 6 / 18, 1 + 30 / 90, 1 + 0.25 + 21 / 70', () => {
    const byHand = [1 + 0.2 * 0.759658, 1 + 1 / 3, 1 + 1 / 3, 1.55];
    factors.forEach((factor, i) => expect(factor(45)).toBeCloseTo(byHand[i]!, 6));
  });

  it('are 1 on a square deck to the last digit, grow with skew, stop at 60 degrees, and do not mind which way', () => {
    for (const factor of factors) {
      expect(factor(0)).toBe(1);
      for (const skewDeg of [5, 15, 30, 45, 60]) {
        expect(factor(skewDeg)).toBeGreaterThan(factor(skewDeg - 5));
        expect(factor(-skewDeg)).toBe(factor(skewDeg));
      }
      expect(factor(75)).toBe(factor(60));
    }
  });
});

it('aashtoFactors(-skew) is that of +skew; beyond 60 degrees they do not hold', () => {
  const deck = { ...stiff, spacingM: 2.7, girders: 6 };
  expect(aashtoFactors({ ...deck, skewDeg: -40 })).toEqual(aashtoFactors({ ...deck, skewDeg: 40 }));
  expect(aashtoFactors({ ...deck, skewDeg: 65 }).outside.join()).toContain('skew 65 degrees');
});

it.each(['lm1', 'hl93'] as const)(
  'trafficOnGirder(%s) gives no less shear as the skew grows, and no more moment',
  (standard) => {
    const at = (skewDeg: number) => {
      const load = trafficOnGirder(standard, plainDeck(14), [-5.4, -2.7, 0, 2.7, 5.4], 2, {
        ...stiff,
        skewDeg,
      });
      const beam = lineBeam({ spansM: [30], stationsPerSpan: 10 });
      const { momentMaxKNm, shearMaxKN, reactionMaxKN } = trafficEnvelope(beam, load, { deflection: false });
      return { moment: momentMaxKNm[5]!, shear: shearMaxKN[0]!, reaction: reactionMaxKN[0]! };
    };
    const { spanM, slabM, kgM4 } = stiff;
    const beam = lineBeam({ spansM: [30], stationsPerSpan: 10 });
    const plain = trafficOnGirder(standard, plainDeck(14), [-5.4, -2.7, 0, 2.7, 5.4], 2, {
      spanM,
      slabM,
      kgM4,
    });
    expect(at(0).shear).toBe(trafficEnvelope(beam, plain, { deflection: false }).shearMaxKN[0]!);
    const all = [0, 10, 25, 40, 60].map(at);
    for (let i = 1; i < all.length; i++) {
      expect(all[i]!.shear).toBeGreaterThan(all[i - 1]!.shear);
      expect(all[i]!.reaction).toBeGreaterThan(all[i - 1]!.reaction);
      expect(all[i]!.moment).toBeLessThanOrEqual(all[i - 1]!.moment);
    }
    // Only AASHTO takes less moment, and only from 30 degrees on.
    expect(all[2]!.moment).toBeCloseTo(all[0]!.moment, 9);
    if (standard === 'lm1') expect(all[4]!.moment).toBe(all[0]!.moment);
    else expect(all[4]!.moment).toBeLessThan(all[0]!.moment);
  },
);

it('trafficEnvelope(obtuse corner) multiplies shears and reactions, footways among them, and leaves moments', () => {
  const deck = { ...plainDeck(12), footwayM: 2 };
  const beam = lineBeam({ spansM: [20, 25], stationsPerSpan: 8 });
  const load = trafficOnDeck('lm1', deck);
  const square = trafficEnvelope(beam, load);
  const skewed = trafficEnvelope(beam, atObtuseCorner(load, 1.3));
  expect(skewed.momentMaxKNm).toEqual(square.momentMaxKNm);
  skewed.shearMaxKN.forEach((shear, i) => expect(shear).toBeCloseTo(1.3 * square.shearMaxKN[i]!, 6));
  skewed.reactionMaxKN.forEach((kN, j) => expect(kN).toBeCloseTo(1.3 * square.reactionMaxKN[j]!, 6));
});
