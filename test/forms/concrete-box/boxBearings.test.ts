import { describe, expect, it } from 'vitest';
import { concreteBox } from '../../../lib/forms/concrete-box/index.ts';
import {
  bearingsApart,
  curveAtSupports,
  pushShare,
  turnedOver,
} from '../../../lib/forms/concrete-box/boxBearings.ts';
import { lineBeam, uniform } from '../../../lib/mechanics/index.ts';
import { boxTask, plainDeck } from './cases.ts';

const atSupports = (spansM: readonly number[], planRadiusM: number, loadKNm = 1): number[] => {
  const beam = lineBeam({ spansM });
  const task = boxTask(spansM, 2, { planRadiusM });
  return curveAtSupports({ beam, task }, uniform(beam, loadKNm).momentKNm);
};

describe('curveAtSupports(model, moments)', () => {
  it.each([
    [400, 0.004],
    [100, 0.02],
  ])('agrees with the circular beam held against turning at its ends, radius %i m', (radiusM, within) => {
    // What is left is 1/400 of twenty elements a span and, at 100 m, 1.6 % of the moments of the straight span.
    // Uniform load on an arc that subtends phi, ends forked: T = w R^2 (tan(phi / 2) - phi / 2), classical.
    const half = 40 / radiusM / 2;
    const exact = radiusM ** 2 * (Math.tan(half) - half);
    const [first, last] = atSupports([40], radiusM);
    expect(Math.abs(first! / exact - 1)).toBeLessThan(within);
    expect(last).toBeCloseTo(first!, 6);
  });

  it('turns the ends of a continuous deck outwards and its pier less than two simple spans would', () => {
    // Two equal spans: M / R over both comes to w L^3 / (24 R), of which each end has w L^3 / (48 R) by its first moment.
    const unit = 40 ** 3 / 200;
    const [first, pier, last] = atSupports([40, 40], 200);
    expect(first! + pier! + last!).toBeCloseTo(unit / 24, 0);
    expect(first!).toBeCloseTo(unit / 48, 0);
    expect(pier!).toBeCloseTo(0, 0);
    expect(last!).toBeCloseTo(first!, 6);
  });

  it('brings nothing to the supports of a straight deck', () => {
    expect(atSupports([40, 40], Infinity)).toEqual([0, 0, 0]);
  });
});

describe('pushShare(standard, radius)', () => {
  it('follows the radius between its bounds', () => {
    expect(pushShare('lm1', 100)).toBe(0.2);
    expect(pushShare('lm1', 400)).toBeCloseTo(0.1, 12);
    expect(pushShare('lm1', 1501)).toBe(0);
    expect(pushShare('lm1', Infinity)).toBe(0);
    expect(pushShare('hl93', 100)).toBe(0.27);
    expect(pushShare('hl93', 1220)).toBeCloseTo(0.1, 12);
  });
});

describe('turnedOver(turning, apart, farthest, factors)', () => {
  const turning = {
    lastingKN: 2000,
    outwardKNm: 1000,
    trafficKNm: 1500,
    besidePushKNm: 700,
    pushKNm: 600,
  };
  const factors = { favourable: 0.9, traffic: 1.5 };

  it('takes the outer side of a curve with vehicles that push outwards', () => {
    // 700 kNm stand 4 m out and press 175 kN, which the curve carries 0.5 m out: 700 + 175 (0.5 - 2) + 600 = 1037.5.
    const { overKNm, heldKNm } = turnedOver(turning, 4, 4, factors);
    expect(overKNm).toBeCloseTo(0.9 * 1000 + 1.5 * 1037.5, 9);
    expect(heldKNm).toBeCloseTo(0.9 * 2000 * 2, 9);
  });

  it('takes the inner side where lasting load leans inwards', () => {
    // 1500 kNm press 375 kN, carried 0.5 m in: 1500 + 375 (0.5 - 2) = 937.5; nothing pushes inwards.
    const { overKNm, heldKNm } = turnedOver({ ...turning, outwardKNm: -1000 }, 4, 4, factors);
    expect(overKNm).toBeCloseTo(0.9 * 1000 + 1.5 * 937.5, 9);
    expect(heldKNm).toBeCloseTo(0.9 * 2000 * 2, 9);
  });

  it('is not turned by traffic between the bearings', () => {
    const still = { ...turning, outwardKNm: 0, besidePushKNm: 0, pushKNm: 0 };
    expect(turnedOver(still, 8.1, 4, factors).overKNm).toBe(0);
  });
});

describe('bearing checks of a concrete box', () => {
  const checksOf = (planRadiusM: number) => {
    const design = concreteBox.size(boxTask([40], 2, { planRadiusM }));
    const of = (id: string) => design.checks.find((check) => check.id === id)!;
    return { design, uplift: of('bearing-uplift'), overturning: of('overturning') };
  };

  it('agrees with a simple span of 40 m on 150 m worked out by hand', () => {
    const { design, uplift, overturning } = checksOf(150);
    const { carriagewayM, surfacingM } = plainDeck(12);
    expect(carriagewayM).toBe(11);
    const lastingKN = design.reactions[0]!.permanentKN;
    const loadKNm = (lastingKN - design.figures['endDiaphragmKN']!) / 20;
    const outward = (loadKNm * 40 ** 3) / (24 * 150);
    const off = outward / lastingKN;
    const apart = bearingsApart(design.figures['bearingsApartM']! + 1.2);
    // LM1 on 11 m: lanes at 4 and 1 m, the third on the other side; 27 and 7.5 kN/m, vehicles of 600 and 400 kN.
    const vehicle = 600 * 4 + 400 * 1;
    const uniformOf = 27 * 4 + 7.5 * 1;
    const push = 0.2 * (600 + 400 + 200) * (2 + surfacingM);
    const net = (torque: number): number => torque + (torque / 4) * (off - apart / 2);
    const moving = (lengthM: number): number =>
      Math.max(net(vehicle + uniformOf * lengthM), net(0.75 * vehicle + 0.4 * uniformOf * lengthM) + push);
    expect(uplift.demand).toBeCloseTo((outward + 1.35 * moving(20)) / apart, -2);
    expect(uplift.demand / ((outward + 1.35 * moving(20)) / apart)).toBeCloseTo(1, 2);
    expect(uplift.capacity).toBeCloseTo(lastingKN / 2, 6);
    expect(overturning.demand / (2 * outward + 1.35 * moving(40))).toBeCloseTo(1, 2);
    expect(overturning.capacity).toBeCloseTo(lastingKN * apart, 6);
  });

  it('grows as the curve tightens, and bearings lift on a ramp of 60 m', () => {
    const uses = [Infinity, 400, 150, 60].map((radiusM) => checksOf(radiusM));
    const uplifts = uses.map(({ uplift }) => uplift.utilisation);
    expect(uplifts).toEqual([...uplifts].sort((a, b) => a - b));
    expect(uplifts[0]).toBeLessThan(0.5);
    const { design } = uses[3]!;
    expect(uplifts[3]).toBeGreaterThan(1);
    expect(design.limitingCheck.id).toBe('bearing-uplift');
    expect(design.warnings.join(' ')).toContain('Uplift of one of two bearings');
  });

  it('does not overturn before a bearing lifts where each support has two', () => {
    for (const radiusM of [400, 150, 60]) {
      const { uplift, overturning } = checksOf(radiusM);
      expect(overturning.utilisation).toBeLessThanOrEqual(uplift.utilisation);
    }
  });
});
