import { describe, expect, it } from 'vitest';
import { atSupports, skewTorques } from '../../../lib/forms/common/skewTorque.ts';
import { skewCases, skewTurnings } from '../../../lib/forms/common/skewTurning.ts';
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

  it('of a deck turned end for end are those of the other end', () => {
    const { deck, momentKNm } = deckOf([30, 45, 38]);
    const taper = deck.eiKNm2.map((ei, e) => ei * (1 + e / 100));
    const turned = {
      elementM: deck.elementM.toReversed(),
      eiKNm2: taper.toReversed(),
      gjKNm2: deck.gjKNm2,
      supportAt: deck.supportAt,
    };
    const ahead = skewTorques({ ...deck, eiKNm2: taper }, momentKNm, 15);
    const back = skewTorques(turned, momentKNm.toReversed(), 15);
    back.toReversed().forEach((kNm, span) => expect(kNm).toBeCloseTo(ahead[span]!, 6));
    expect(ahead[0]).not.toBeCloseTo(ahead[2]!, 0);
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

describe('skewTurnings(torques, spans, load) and its cases', () => {
  it('press by three eighths of the load on the shorter span beside, where traffic twists at all', () => {
    const turnings = skewTurnings(
      { lastingKNm: [-300, 0, 200], trafficKNm: [500, 0, 400] },
      [30, 50, 40],
      20,
    );
    // By hand: 3/8 x 20 x 30 = 225 kN, 3/8 x 20 x 40 = 300 kN.
    expect(turnings).toEqual([
      { lastingKNm: -300, trafficKNm: 500, pressKN: 225 },
      { lastingKNm: -300, trafficKNm: 500, pressKN: 225 },
      { lastingKNm: 200, trafficKNm: 400, pressKN: 300 },
      { lastingKNm: 200, trafficKNm: 400, pressKN: 300 },
    ]);
  });

  it('are the traffic that twists with what lasts the same way, and what lasts either way alone', () => {
    const of = (lastingKNm: number) => skewCases({ lastingKNm, trafficKNm: 500, pressKN: 225 });
    const alone = { lastingKNm: 300, trafficKNm: 0, pressKN: 0 };
    expect(of(-300)).toEqual([{ lastingKNm: 0, trafficKNm: 500, pressKN: 225 }, alone]);
    expect(of(300)).toEqual([{ lastingKNm: 300, trafficKNm: 500, pressKN: 225 }, alone]);
  });
});
