import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { share } from '../../notebooks/page/share.ts';

const plain = fc.jsonValue({ maxDepth: 4 });

describe('share', () => {
  it('share(before, after) keeps every part that says the same', () => {
    const before = { brief: { startM: 1240, ground: [{ x: 1 }, { x: 2 }] }, notes: [] as string[] };
    const after = { brief: { startM: 1250, ground: [{ x: 1 }, { x: 2 }] }, notes: [] as string[] };
    const shared = share(before, after);
    expect(shared).toEqual(after);
    expect(shared.brief).not.toBe(before.brief);
    expect(shared.brief.ground).toBe(before.brief.ground);
    expect(shared.notes).toBe(before.notes);
  });

  it('share(before, copy) is the value before', () => {
    fc.assert(
      fc.property(plain, (value) => {
        expect(share(value, structuredClone(value))).toBe(value);
      }),
      { seed: 7 },
    );
  });

  it('share(before, after) says what after says, whatever was before', () => {
    fc.assert(
      fc.property(plain, plain, (before, after) => {
        expect(share(before, after)).toEqual(after);
      }),
      { seed: 11 },
    );
  });

  it('share(before, after) tells a missing key, a longer list and a list from a group', () => {
    expect(share({ a: 1, b: 2 }, { a: 1 })).toEqual({ a: 1 });
    expect(share([1, 2], [1, 2, 3])).toEqual([1, 2, 3]);
    expect(share({ 0: 1 }, [1])).toEqual([1]);
    expect(share({ a: undefined }, { b: undefined })).toEqual({ b: undefined });
  });
});
