import { describe, expect, it } from 'vitest';
import { carryingWords } from '../../lib/appraise/carryingWords.ts';
import { depthThatCarries } from '../../lib/appraise/depthThatCarries.ts';
import type { DepthTrial } from '../../lib/appraise/leastCostDepth.ts';
import { finish } from '../../lib/appraise/work.ts';
import { cannotCarry, carries } from '../../lib/forms/index.ts';
import type { Check } from '../../lib/model/index.ts';
import { rule, rulingOf } from '../../lib/rules/index.ts';

const checkAt = (utilisation: number, id = 'bending'): Check => ({
  id,
  label: id,
  demand: 100 * utilisation,
  capacity: 100,
  unit: 'kNm',
  utilisation,
});
const unitAt = (utilisation: number) => ({ limitingCheck: checkAt(utilisation) });

describe('cannotCarry(designs)', () => {
  it('is the worst check of any unit that is past its limit, null where all hold; at the limit to the last digit holds', () => {
    expect(cannotCarry([unitAt(0.6), unitAt(1)])).toBeNull();
    expect(cannotCarry([unitAt(1 + 1e-9)])).toBeNull();
    expect(cannotCarry([unitAt(1.3), unitAt(0.4), unitAt(1.7)])?.utilisation).toBe(1.7);
    expect(cannotCarry([unitAt(Infinity)])?.utilisation).toBe(Infinity);
  });

  it('agrees with the rule of strength on both sides of its limit', () => {
    for (const utilisation of [0.2, 0.99, 1, 1.002, 1.3, 8]) {
      const out = rulingOf(rule('strength'), { limitingUtilisation: utilisation })?.effect === 'out';
      expect(out).toBe(cannotCarry([unitAt(utilisation)]) !== null);
    }
  });
});

describe('carryingWords(design)', () => {
  it('names three checks past their limits, the worst first, what is left over, and the share of own weight', () => {
    const checks = [1.2, 0.9, 1.5, 1.1, 1.3].map((use, i) => checkAt(use, `check ${i}`));
    const said = carryingWords({ checks, ownWeightShare: 0.87 });
    expect(said).toMatch(
      /^check 2 at 150 % of its limit \(150 of 100 kNm\); check 4 at 130 %.*; check 0 at 120 %/,
    );
    expect(said).toContain('1 more past their limits');
    expect(said).toMatch(/own weight is 87 % of/);
    expect(said).not.toContain('check 1');
  });
});

describe('depthThatCarries(range, tryAt)', () => {
  const sought = (tryAt: (depthM: number) => DepthTrial) => {
    const triedM: number[] = [];
    const found = finish(
      depthThatCarries([2, 3], (depthM) => {
        triedM.push(depthM);
        return tryAt(depthM);
      }),
    );
    return { ...found, triedM };
  };

  it('stays inside the band where anything in it carries', () => {
    const { depthM, triedToM, triedM } = sought((d) => ({ cost: d, utilisation: 2.5 / d }));
    expect(depthM).toBeGreaterThanOrEqual(2.5);
    expect(triedToM).toBeNull();
    expect(Math.max(...triedM)).toBeLessThanOrEqual(3);
  });

  it('goes beyond the band where nothing in it carries, no deeper than it must, and says how far it looked', () => {
    const { depthM, triedToM } = sought((d) => ({ cost: d, utilisation: 4.1 / d }));
    expect(carries(4.1 / depthM)).toBe(true);
    expect(depthM).toBeLessThan(1.08 * 4.1);
    expect(triedToM).toBeGreaterThanOrEqual(depthM);
  });

  it('gives the depth that comes nearest where none carries, and no trial twice', () => {
    const { depthM, triedToM, triedM } = sought((d) => ({
      cost: d,
      utilisation: 1.5 + Math.log(d / 5) ** 2,
    }));
    expect(depthM).toBeGreaterThan(4);
    expect(depthM).toBeLessThan(6);
    expect(triedToM).toBeGreaterThan(depthM);
    expect(new Set(triedM).size).toBe(triedM.length);
    for (const flat of [Infinity, 1.2])
      expect(sought(() => ({ cost: 1, utilisation: flat })).depthM).toBeLessThanOrEqual(3);
  });
});
