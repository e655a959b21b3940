import { describe, expect, it } from 'vitest';
import { aloneSpanWork, endSpanWork } from '../../lib/appraise/endSpanWork.ts';

/**
 * Sagging in an end span and hogging over the first pier of an endless row of spans of 1 m under 1 kN/m, by the theorem of
 * three moments (Clapeyron, any text on statics): what differs from the moment of an inner support, 1/12, dies out by
 * 2 - sqrt(3) from one support to the next.
 */
function endOfARow(end: number): { readonly sag: number; readonly hog: number } {
  const dies = Math.sqrt(3) - 2;
  const more = ((2 * end + 3) / 12 - (end ** 3 + 1) / 4) / (2 * (end + 1) + dies);
  const support = -1 / 12 + more;
  const reaction = end / 2 + support / end;
  return { sag: reaction ** 2 / 2, hog: -support };
}

describe('endSpanWork', () => {
  it('endSpanWork({permanent}) is where the end span sags as much as an inner one by the theorem of three moments', () => {
    const end = 1 / endSpanWork({ simpleKNm: 0, continuousKNm: 100, trafficKNm: 0 });
    const { sag, hog } = endOfARow(end);
    expect(Math.abs(sag / (1 / 24) - 1)).toBeLessThan(0.005);
    expect(hog).toBeLessThan(1 / 12);
  });

  it('endSpanWork({simple beams alone}) is 1: spans that are not joined know nothing of each other', () => {
    expect(endSpanWork({ simpleKNm: 100, continuousKNm: 0, trafficKNm: 0 })).toBeCloseTo(1, 9);
  });

  it('endSpanWork falls with the share of traffic and of weight on simple spans', () => {
    const whole = endSpanWork({ simpleKNm: 0, continuousKNm: 100, trafficKNm: 0 });
    const loaded = endSpanWork({ simpleKNm: 0, continuousKNm: 70, trafficKNm: 30 });
    const laid = endSpanWork({ simpleKNm: 50, continuousKNm: 20, trafficKNm: 30 });
    expect(loaded).toBeLessThan(whole);
    expect(laid).toBeLessThan(loaded);
    expect(laid).toBeGreaterThan(1);
  });
});

describe('aloneSpanWork', () => {
  it('aloneSpanWork({permanent}) is root 3: w l^2 / 8 alone over w l^2 / 24 far from the ends of a row', () => {
    const alone = aloneSpanWork({ simpleKNm: 0, continuousKNm: 100, trafficKNm: 0 });
    // The trial row is of seven spans: its middle one is within 0.5 % of an endless row.
    expect(alone / Math.sqrt(3)).toBeCloseTo(1, 2);
  });

  it('aloneSpanWork({simple beams alone}) is 1, and falls with what the spans carry before they are joined', () => {
    expect(aloneSpanWork({ simpleKNm: 100, continuousKNm: 0, trafficKNm: 0 })).toBeCloseTo(1, 9);
    const whole = aloneSpanWork({ simpleKNm: 0, continuousKNm: 70, trafficKNm: 30 });
    const laid = aloneSpanWork({ simpleKNm: 50, continuousKNm: 20, trafficKNm: 30 });
    expect(laid).toBeLessThan(whole);
    expect(laid).toBeGreaterThan(1);
  });
});
