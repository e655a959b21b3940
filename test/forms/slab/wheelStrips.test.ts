import { describe, expect, it } from 'vitest';
import { loadStandard } from '../../../lib/actions/index.ts';
import { stripInfluence } from '../../../lib/forms/common/slab/stripInfluence.ts';
import { equivalentStripM, wheelStrips } from '../../../lib/forms/slab/wheelStrips.ts';
import { deck } from './cases.ts';

describe('wheelStrips()', () => {
  it('under AASHTO is E = 2100 + 0.12 root(L1 W1) <= W / NL, or that of one lane where narrower', () => {
    const hl93 = loadStandard('hl93');
    // 12 m deck, 11 m carriageway, three lanes of 12 ft: 2.1 + 0.12 root(10 x 12) = 3.41 m; W / NL = 4 m.
    expect(equivalentStripM(hl93, deck, 10)).toBeCloseTo(2.1 + 0.12 * Math.sqrt(120), 9);
    // A lane alone: 0.25 + 0.42 root(6 x 9) = 3.34 m against 2.1 + 0.12 root(6 x 12) = 3.12 m.
    expect(equivalentStripM(hl93, deck, 6)).toBeCloseTo(2.1 + 0.12 * Math.sqrt(72), 9);
    const narrow = { ...deck, widthM: 6, carriagewayM: 5 };
    expect(equivalentStripM(hl93, narrow, 10)).toBeCloseTo(0.25 + 0.42 * Math.sqrt(60), 9);
    // L1 stops at 18 m.
    expect(equivalentStripM(hl93, deck, 30)).toBeCloseTo(equivalentStripM(hl93, deck, 18), 12);
  });

  it('under LM1 never spreads a lane further than an even share of the deck, and comes near it on long spans', () => {
    // Tandems of 1 + 2/3 + 1/3 on 12 m: 6 m for each lane-1 vehicle when all is even.
    const widths = [6, 10, 20, 40, 80].map((span) => wheelStrips('lm1', deck, span, 0.7).vehicleWidthM);
    widths.forEach((width, i) => {
      expect(width).toBeLessThan(6);
      if (i > 0) expect(width).toBeGreaterThan(widths[i - 1]!);
    });
    expect(widths.at(-1)).toBeGreaterThan(5.7);
  });

  it('under LM1 the uniform load of the heaviest metre lies between that of lane 1 and the mean of the deck', () => {
    const short = wheelStrips('lm1', deck, 4, 0.3).uniformKNm2;
    const long = wheelStrips('lm1', deck, 80, 0.3).uniformKNm2;
    expect(short).toBeLessThan(9);
    expect(short).toBeGreaterThan(long);
    expect(long).toBeGreaterThan(2.5 + (6.5 * 3) / 12 - 0.01);
  });

  it('the moment along the supports is nu times that of the span under a load that is even along them', () => {
    const even = { alongM: [0], sideAlongM: 400, sideSpanM: 0.5 };
    const along = stripInfluence(10, 5, even, 0.2, 20);
    const across = stripInfluence(10, 5, even, 0.2, 20, 'edges');
    expect(across[10]! / along[10]!).toBeCloseTo(0.2, 6);
  });

  it('the two moments under a small round load in the middle differ by (1 - nu) P / 4 pi', () => {
    // Timoshenko and Woinowsky-Krieger, Theory of Plates and Shells, art. 37: endless strip, load at its middle; a square
    // of half the side of the circle, as its own symmetry makes both local parts alike. From memory.
    const square = { alongM: [0], sideAlongM: 0.8, sideSpanM: 0.8 };
    const along = stripInfluence(8, 4, square, 0.2, 40);
    const across = stripInfluence(8, 4, square, 0.2, 40, 'edges');
    // Eleven terms of the series stand for it to 3 %.
    expect(Math.abs((along[20]! - across[20]!) / ((1 - 0.2) / (4 * Math.PI)) - 1)).toBeLessThan(0.03);
  });
});
