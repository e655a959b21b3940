import { describe, expect, it } from 'vitest';
import { atSupports, skewTorques } from '../../../lib/forms/common/skewTorque.ts';
import { lineBeam, uniform } from '../../../lib/mechanics/index.ts';

const stationsPerSpan = 100;
/** A deck of constant stiffness, GJ 0.8 of EI, with the moments of 100 kN/m on it. */
function deckOf(spansM: readonly number[]) {
  const beam = lineBeam({ spansM, stationsPerSpan });
  const elementM = Float64Array.from({ length: beam.xM.length - 1 }, (_, e) => beam.xM[e + 1]! - beam.xM[e]!);
  const deck = {
    elementM,
    eiKNm2: elementM.map(() => 1e7),
    gjKNm2: elementM.map(() => 0.8e7),
    supportAt: beam.supportAt,
  };
  return { deck, momentKNm: uniform(beam, 100).momentKNm };
}

describe('skewTorques(deck, moments, skew)', () => {
  it('of a single span is w L2 / 12 k tan / (1 + k tan2), k = GJ / EI', () => {
    const { deck, momentKNm } = deckOf([40]);
    // By hand, 40 m and 20 degrees (tan 0.36397): 13,333 x 0.8 x 0.36397 / (1 + 0.8 x 0.13247) = 3,510 kNm.
    expect(skewTorques(deck, momentKNm, 20)[0]! / 3510).toBeCloseTo(1, 3);
    expect(skewTorques(deck, momentKNm, -20)).toEqual(skewTorques(deck, momentKNm, 20));
  });

  it('of end spans comes from the slope of their ends alone, and is turned back by a held far end', () => {
    const { deck, momentKNm } = deckOf([40, 40, 40]);
    const [first, inner, last] = skewTorques(deck, momentKNm, 20);
    // Three equal spans: 0.1 w L2 over the piers, slope w L3 / 24 EI - 0.1 w L3 / 6 EI = w L3 / 40 EI.
    // By hand: 100 x 1600 / 40 x 0.8 x 0.36397 / (1 + 0.8 x 0.13247 / 4) = 1164.7 / 1.02649 = 1,135 kNm.
    expect(first! / 1134.7).toBeCloseTo(1, 2);
    expect(last).toBeCloseTo(first!, 3);
    expect(inner).toBe(0);
  });

  it('is none on square supports, and stays finite where the skew is steep', () => {
    const { deck, momentKNm } = deckOf([40, 40, 40]);
    expect(skewTorques(deck, momentKNm, 0)).toEqual([0, 0, 0]);
    expect(skewTorques(deck, momentKNm, 60)[0]).toBeGreaterThan(skewTorques(deck, momentKNm, 30)[0]!);
  });
});

it('atSupports(torques) are what changes there: nothing at the middle pier of two equal spans', () => {
  expect(atSupports([500, 500])).toEqual([500, 0, 500]);
  expect(atSupports([500, 0, 400])).toEqual([500, 500, 400, 400]);
  expect(atSupports([500])).toEqual([500, 500]);
});
