import { describe, expect, it } from 'vitest';
import { depthAt } from '../../lib/site/depthAlong.ts';

describe('depthAt(depth, chainage)', () => {
  it('is straight between points and level beyond them', () => {
    const depth = { xM: [10, 20, 40], depthM: [2, 4, 3] };
    expect([0, 10, 15, 20, 30, 40, 50].map((x) => depthAt(depth, x))).toEqual([2, 2, 3, 4, 3.5, 3, 3]);
    expect(depthAt(1.7, 25)).toBe(1.7);
  });

  it('where units of two depths meet it is that of the deeper, whichever side it lies on', () => {
    const xM = [0, 30, 30, 90];
    expect(depthAt({ xM, depthM: [1, 1, 2.5, 2.5] }, 30)).toBe(2.5);
    expect(depthAt({ xM, depthM: [2.5, 2.5, 1, 1] }, 30)).toBe(2.5);
    expect(depthAt({ xM, depthM: [1, 1, 2.5, 2.5] }, 29.9)).toBe(1);
  });
});
