import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { isSame } from '../../notebooks/drawing/isSame.ts';

describe('isSame(a, b)', () => {
  it('is true of a copy and false of what has more or less in it', () => {
    const value = fc.jsonValue({ maxDepth: 4 });
    fc.assert(
      fc.property(value, value, (a, b) => {
        expect(isSame(a, structuredClone(a))).toBe(true);
        expect(isSame([a, b], [a, structuredClone(b)])).toBe(true);
        expect(isSame([a], [a, b])).toBe(false);
        expect(isSame({ a }, { a, b })).toBe(false);
        expect(isSame({ a, b }, { a })).toBe(false);
      }),
      { seed: 5 },
    );
  });

  it('tells a changed figure deep down, a list from a group, and nothing from an empty group', () => {
    expect(isSame({ units: [{ spans: [40, 60] }] }, { units: [{ spans: [40, 60.5] }] })).toBe(false);
    expect(isSame([1], { 0: 1 })).toBe(false);
    expect(isSame(null, {})).toBe(false);
    expect(isSame({ a: undefined }, { b: undefined })).toBe(false);
    expect(isSame(NaN, NaN)).toBe(true);
  });
});
