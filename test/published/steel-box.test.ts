import { describe, expect, it } from 'vitest';
import { steelBox } from '../../lib/forms/steel-box/index.ts';
import { steelBoxTask } from '../forms/steel-box/cases.ts';

// Pier of three spans 60-80-60 m, stiffness constant: -505.56 per kN/m on all spans, -565.56 per kN/m on those that hog it,
// -7.1875 per kN at the worst place (three-moment equation, worked out independently). Load model 1 on 11 m between kerbs:
// two axles of 600 kN, 3 x 9 + 3 x 2.5 + 5 x 2.5 = 47 kN/m (EN 1991-2 table 4.2, from memory). All times 1.35.
describe('steelBox.size() on 60-80-60 m', () => {
  const hog = (method: 'balanced-cantilever' | 'launch', ownFactor: number): number => {
    const task = steelBoxTask([60, 80, 60], 2.9, { method });
    const { figures } = steelBox.size(task);
    const ownKNm = 9.81e-3 * figures.steelKgM2! * task.deck.widthM;
    const expected =
      1.35 * (ownFactor * ownKNm + 505.556 * task.deck.superimposedKNm + 565.556 * 47 + 7.1875 * 1200);
    return figures.pier1HogDesignKNm! / expected;
  };

  it('has the moment of one continuous beam at its pier where it is launched', () => {
    expect(Math.abs(hog('launch', 505.556) - 1)).toBeLessThan(0.03);
  });

  it('keeps that of two arms, w L2 / 8, for its own weight where it is cantilevered', () => {
    expect(Math.abs(hog('balanced-cantilever', 80 ** 2 / 8) - 1)).toBeLessThan(0.04);
  });
});
