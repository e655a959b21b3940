import { describe, expect, it } from 'vitest';
import { plateSteps } from '../../../lib/forms/common/plateSteps.ts';
import { plateThicknessesMm, roundPlateUp, roundWidthUp } from '../../../lib/forms/common/plates.ts';

const steel = 7850;

describe('roundPlateUp()', () => {
  it('keeps a rolled thickness and moves anything else to the next', () => {
    for (const mm of plateThicknessesMm) expect(roundPlateUp(mm / 1000)).toBeCloseTo(mm / 1000, 9);
    expect(roundPlateUp(0.0201)).toBeCloseTo(0.022, 9);
  });

  it('gives back what is past the series, so that a check can say so', () => {
    expect(roundPlateUp(0.131)).toBe(0.131);
  });
});

describe('roundWidthUp()', () => {
  it('steps by 50 mm', () => {
    expect(roundWidthUp(0.601)).toBeCloseTo(0.65, 9);
    expect(roundWidthUp(0.6)).toBeCloseTo(0.6, 9);
  });
});

/** Cheapest steps found by trying every way to cut the girder into runs. */
function bruteForce(need: readonly number[], length: number, kgM2: number, change: number): number {
  const n = need.length;
  let best = Infinity;
  for (let cuts = 0; cuts < 2 ** (n - 1); cuts++) {
    let cost = 0;
    let thickest = 0;
    let run = 0;
    for (let e = 0; e < n; e++) {
      thickest = Math.max(thickest, need[e]!);
      run++;
      if (e === n - 1 || (cuts >> e) & 1) {
        cost += kgM2 * thickest * length * run + (e < n - 1 ? change : 0);
        thickest = 0;
        run = 0;
      }
    }
    best = Math.min(best, cost);
  }
  return best;
}

describe('plateSteps()', () => {
  const cost = (steps: ArrayLike<number>, length: number, kgM2: number, change: number): number => {
    let sum = 0;
    for (let e = 0; e < steps.length; e++) {
      sum += kgM2 * steps[e]! * length;
      if (e > 0 && steps[e] !== steps[e - 1]) sum += change;
    }
    return sum;
  };

  it('is never thinner than needed and never dearer than the best of all cuttings', () => {
    const needs = [
      [0.02, 0.02, 0.035, 0.06, 0.06, 0.1, 0.06, 0.03, 0.02, 0.02],
      [0.05, 0.02, 0.05, 0.02, 0.05, 0.02, 0.05, 0.02, 0.05, 0.02],
      [0.02, 0.022, 0.025, 0.028, 0.03, 0.035, 0.04, 0.045, 0.05, 0.055],
    ];
    for (const need of needs) {
      for (const change of [50, 350, 2000]) {
        const steps = plateSteps(
          need,
          need.map(() => 4),
          1.1 * steel,
          change,
          0,
          (t) => t,
        );
        steps.forEach((t, e) => expect(t).toBeGreaterThanOrEqual(need[e]!));
        expect(cost(steps, 4, 1.1 * steel, change)).toBeCloseTo(bruteForce(need, 4, 1.1 * steel, change), 3);
      }
    }
  });

  it('makes one plate where a change costs more than it saves', () => {
    const steps = plateSteps([0.02, 0.04, 0.02], [4, 4, 4], 400, 1e6, 0, (t) => t);
    expect([...steps]).toEqual([0.04, 0.04, 0.04]);
  });

  it('leaves no plate shorter than the shortest, and mirrors with its needs', () => {
    const need = [0.02, 0.02, 0.08, 0.02, 0.03, 0.03, 0.06, 0.02];
    const lengths = need.map(() => 2);
    const steps = plateSteps(need, lengths, 9000, 10, 4, (t) => t);
    const back = plateSteps([...need].reverse(), lengths, 9000, 10, 4, (t) => t);
    expect([...back].reverse()).toEqual([...steps]);
    let run = 1;
    for (let e = 1; e <= steps.length; e++) {
      if (e < steps.length && steps[e] === steps[e - 1]) run++;
      else {
        expect(run * 2).toBeGreaterThanOrEqual(4);
        run = 1;
      }
    }
  });
});
