import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { leastCostDepth, type DepthTrial } from '../../lib/appraise/leastCostDepth.ts';
import { finish } from '../../lib/appraise/work.ts';

const STEP_M = 0.05;
/** The depth found and the depths that were tried for it. */
function found(range: readonly [number, number], tryAt: (depthM: number) => DepthTrial, near?: number) {
  const triedM: number[] = [];
  const depthM = finish(
    leastCostDepth(
      range,
      (at) => {
        triedM.push(at);
        return tryAt(at);
      },
      near,
    ),
  );
  return { depthM, triedM };
}
/** Cost rises by `steep` times the square of the logarithm of depth over the best. */
const valley =
  (bestM: number, steep: number, strongFromM = 0) =>
  (depthM: number): DepthTrial => ({
    cost: 100 * (1 + steep * Math.log(depthM / bestM) ** 2),
    utilisation: depthM < strongFromM ? 1.2 : 0.9,
  });
/** Shallowest depth of the grid within 1 % of the least that holds, by trying all of them. */
function byAll([least, most]: readonly [number, number], tryAt: (depthM: number) => DepthTrial): number {
  const all: { depthM: number; trial: DepthTrial }[] = [];
  for (let on = Math.ceil(least / STEP_M - 1e-9); on <= most / STEP_M + 1e-9; on += 1)
    all.push({ depthM: on / 20, trial: tryAt(on / 20) });
  const holding = all.filter(({ trial }) => trial.utilisation <= 1);
  const limit = 1.01 * Math.min(...holding.map(({ trial }) => trial.cost));
  return holding.find(({ trial }) => trial.cost <= limit)!.depthM;
}

describe('leastCostDepth(range, tryAt)', () => {
  it('finds what trying every depth finds, within one step, with few trials, wherever it begins', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 1, max: 6, noNaN: true }),
        fc.double({ min: 0.3, max: 3, noNaN: true }),
        fc.double({ min: 0.6, max: 1.6, noNaN: true }),
        (bestM, steep, off) => {
          const range = [0.5 * bestM, 2 * bestM] as const;
          const { depthM, triedM } = found(range, valley(bestM, steep), off * bestM);
          const best = byAll(range, valley(bestM, steep));
          expect(Math.abs(depthM - best)).toBeLessThanOrEqual(STEP_M + 1e-9);
          expect(triedM.length).toBeLessThanOrEqual(8);
          expect(new Set(triedM).size).toBe(triedM.length);
        },
      ),
      { seed: 20260101, numRuns: 300 },
    );
  });

  it('takes no depth that it has not worked out, and none dearer than the limit, where cost goes in steps', () => {
    const stepped = (depthM: number): DepthTrial => {
      const { cost, utilisation } = valley(2.5, 0.6)(depthM);
      return { cost: cost + (Math.floor(depthM * 7) % 2) * 0.7, utilisation };
    };
    for (const near of [1.6, 2, 2.5, 3.1]) {
      const { depthM, triedM } = found([1.4, 3.8], stepped, near);
      expect(triedM).toContain(depthM);
      expect(stepped(depthM).cost).toBeLessThanOrEqual(
        1.01 * Math.min(...triedM.map((m) => stepped(m).cost)),
      );
    }
  });

  it('takes no depth that is too weak, however cheap', () => {
    const { depthM } = found([1, 4], valley(1.5, 1, 2.4));
    expect(depthM).toBeGreaterThanOrEqual(2.4);
    expect(depthM).toBeLessThan(2.4 * 1.12);
  });

  it('where nothing holds takes the depth that is used least', () => {
    const weak = (depthM: number): DepthTrial => ({ cost: depthM, utilisation: 1 + 1 / depthM });
    expect(found([1, 3], weak).depthM).toBe(3);
    const slack = (depthM: number): DepthTrial => ({ cost: depthM, utilisation: 1 + depthM });
    expect(found([1, 3], slack).depthM).toBe(1);
  });

  it('stays inside the range and on the grid of 50 mm', () => {
    expect(found([2.02, 2.04], valley(5, 1)).depthM).toBe(2.05);
    expect(found([1, 2], valley(5, 1)).depthM).toBe(2);
    expect(found([6, 7], valley(5, 1)).depthM).toBe(6);
  });
});
