import { describe, expect, it } from 'vitest';
import { rangeWhileHeld } from '../../notebooks/drawing/whileHeld.ts';

const hold = (): { key: string; valueM: number; supportsM: number[] } => ({
  key: 'depth',
  valueM: 2,
  supportsM: [],
});

describe('rangeWhileHeld(hold, drawing, range, step)', () => {
  it('is the range itself while nothing is in hand', () => {
    expect(rangeWhileHeld(null, 'levels', [2, 10], 1)).toEqual([2, 10]);
    expect(rangeWhileHeld(undefined, 'levels', [3, 9], 1)).toEqual([3, 9]);
  });

  it('grows by whole steps and does not shrink', () => {
    const held = hold();
    expect(rangeWhileHeld(held, 'levels', [2, 10], 4)).toEqual([2, 10]);
    expect(rangeWhileHeld(held, 'levels', [3, 9], 4)).toEqual([2, 10]);
    expect(rangeWhileHeld(held, 'levels', [1.9, 10.1], 4)).toEqual([-2, 14]);
    expect(rangeWhileHeld(held, 'levels', [-2, 14], 4)).toEqual([-2, 14]);
    expect(rangeWhileHeld(held, 'levels', [2, 23], 4)).toEqual([-2, 26]);
  });

  it('is of one drawing and one hold', () => {
    const held = hold();
    rangeWhileHeld(held, 'levels', [0, 100], 1);
    expect(rangeWhileHeld(held, 'costs', [4, 5], 1)).toEqual([4, 5]);
    expect(rangeWhileHeld(hold(), 'levels', [4, 5], 1)).toEqual([4, 5]);
  });
});
