import { expect } from 'vitest';
import type { Design, UnitTask } from '../../lib/model/index.ts';

/** What a box of 35 + 45 + 35 m with a deck 12 m wide does on a skew of 30 degrees, where the acute bearing would lift. */
export function expectSquareEnds(at: (asked: Partial<UnitTask>) => Design): void {
  const { task: _skew, warnings, lines, ...skew } = at({ skewDeg: 30 });
  const { task: _square, warnings: _none, lines: plain, ...square } = at({});
  expect(skew).toEqual(square);
  // By hand: 12 m wide, tan 30 = 0.5774: 6.9 m of sill at one edge, two wedges of 12 x 6.928 / 2 x 1.2 m thick.
  expect(warnings.join(' ')).toMatch(/acute would lift.*6\.9 m of sill and slab/);
  expect(lines.slice(0, -2)).toEqual(plain);
  expect(lines.at(-2)!.quantity).toBeCloseTo(99.77, 2);
  // They are part of the abutments, not of the deck whose quantities are given by its area.
  expect(lines.slice(-2).map(({ part }) => part)).toEqual(['abutments', 'abutments']);
}
