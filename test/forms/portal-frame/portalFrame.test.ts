import { describe, expect, it } from 'vitest';
import { quantityOf } from '../../../lib/forms/common/measured.ts';
import { pressureAt, pressureOnNodes, ratchetPressure } from '../../../lib/forms/portal-frame/earth.ts';
import { frameModel } from '../../../lib/forms/portal-frame/frameModel.ts';
import { frameShape } from '../../../lib/forms/portal-frame/frameShape.ts';
import { portalFrame } from '../../../lib/forms/portal-frame/index.ts';
import { splitQuantities, itemOf } from '../../../lib/takeoff/index.ts';
import { deck, task, useOf } from './trialFrame.ts';

describe('portalFrame.size()', () => {
  it.each([
    [{ spansM: [20, 20, 20], clearUnderM: [5, 5, 5, 5] }, /one span or two/u],
    [{ depthM: NaN }, /depthM/u],
    [{ deck: { ...deck, carriagewayM: 13 } }, /carriagewayM/u],
  ])('size(%o) says what is wrong', (change, message) => {
    expect(() => portalFrame.size({ ...task([20], 0.7), ...change })).toThrow(message);
  });

  it('is reinforced on short spans and prestressed on longer ones, every check within its limit', () => {
    const short = portalFrame.size(task([18], 0.6));
    const long = portalFrame.size(task([38], 1.2));
    expect(quantityOf(short.lines, 'prestress')).toBe(0);
    expect(quantityOf(long.lines, 'prestress')).toBeGreaterThan(0);
    for (const design of [short, long])
      for (const { id, utilisation } of design.checks) expect(utilisation, id).toBeLessThanOrEqual(1);
  });

  it('measures only items of the bill; deck above, walls among the supports', () => {
    const design = portalFrame.size(task([18], 0.6));
    for (const { item, quantity } of design.lines) {
      expect(() => itemOf(item)).not.toThrow();
      expect(quantity).toBeGreaterThan(0);
    }
    const { superstructure, supports } = splitQuantities(design.lines);
    expect(superstructure.concreteM3).toBeCloseTo(quantityOf(design.lines, 'deck-concrete'), 9);
    expect(supports.concreteM3).toBeCloseTo(2 * design.walls![0]!.concreteM3, 9);
    expect(quantityOf(design.lines, 'bearing') + quantityOf(design.lines, 'expansion-joint')).toBe(0);
  });

  it('stands on its weight: both feet carry the measured concrete and the superimposed load', () => {
    for (const [spanM, depthM] of [
      [16, 0.6],
      [38, 1.2],
    ] as const) {
      const design = portalFrame.size(task([spanM], depthM));
      const { concreteM3 } = splitQuantities(design.lines).superstructure;
      const walls = 2 * design.walls![0]!.concreteM3;
      const sum = design.reactions.reduce((all, { permanentKN }) => all + permanentKN, 0);
      expect(sum / (25 * (concreteM3 + walls) + 45 * spanM)).toBeCloseTo(1, 9);
    }
  });

  it('balances thrust: what one foot pushes, the other and the fill push back', () => {
    const { cases } = frameModel(task([20], 0.7));
    for (const one of cases) {
      const [first, last] = [one.own.feet[0]!, one.own.feet[1]!];
      expect(first.alongKN).toBeCloseTo(last.alongKN, 6);
      expect(first.alongKN).toBeLessThan(0);
      // Surcharge behind the first wall alone: 0.43 x 10 kPa on the height and the width of the wall.
      const [a, b] = [one.surcharge[0].feet[0]!, one.surcharge[0].feet[1]!];
      const height = frameShape(task([20], 0.7)).walls[0]!.heightM;
      expect(a.alongKN - b.alongKN).toBeCloseTo(0.43 * 10 * height * 12, 6);
      // Braking goes into both feet.
      const [c, d] = [one.braking.feet[0]!, one.braking.feet[1]!];
      expect(c.alongKN - d.alongKN).toBeCloseTo(1, 9);
    }
  });

  it('is the same seen from the other end', () => {
    const one = portalFrame.size(task([22], 0.75, { clearUnderM: [5, 7] }));
    const other = portalFrame.size(task([22], 0.75, { clearUnderM: [7, 5] }));
    expect(other.checks.map(({ id }) => [id, useOf(other, id).toFixed(6)])).toEqual(
      one.checks.map(({ id }) => [id, useOf(one, id).toFixed(6)]),
    );
    expect(other.walls![0]!.concreteM3).toBeCloseTo(one.walls![1]!.concreteM3, 9);
    expect(other.walls![0]!.loads[0]!.alongKN).toBeCloseTo(one.walls![1]!.loads[0]!.alongKN, 6);
    expect(other.walls![0]!.loads[0]!.momentKNm).toBeCloseTo(one.walls![1]!.loads[0]!.momentKNm, 6);
  });

  it('moves the right way with the stiffness of its feet and the height of its walls', () => {
    const low = portalFrame.size(task([22], 0.75)).figures;
    const high = portalFrame.size(task([22], 0.75, { clearUnderM: [9, 9] })).figures;
    expect(low.kneeOwnKNm!).toBeGreaterThan(low.kneeOwnSoftKNm!);
    expect(low.midspanOwnKNm!).toBeLessThan(low.midspanOwnSoftKNm!);
    expect(high.thrustOwnKN!).toBeLessThan(low.thrustOwnKN!);
    // A simple span carries w L2 / 8; the knee takes part of it off the middle.
    const { cases, shape } = frameModel(task([22], 0.75));
    const middle = (shape.knees[0] + shape.knees[1]) >> 1;
    expect(cases[0]!.own.momentKNm[middle]! - cases[0]!.own.momentKNm[shape.knees[0]]!).toBeGreaterThan(0);
  });

  it('draws one closed face from wall to wall with its soffit where the depth along it says', () => {
    const design = portalFrame.size(task([22], 0.75));
    const face = design.elevation.find(({ part }) => part === 'deck')!;
    const middle = face.points.filter(([x, z]) => z < 0 && Math.abs(x - 11) < 0.6);
    expect(middle.length).toBeGreaterThan(0);
    for (const [, z] of middle) expect(z).toBeCloseTo(-0.75, 9);
    const walls = design.elevation.filter(({ part }) => part.endsWith('wall'));
    expect(walls).toHaveLength(2);
    for (const wall of walls)
      expect(Math.min(...wall.points.map(([, z]) => z))).toBeCloseTo(-design.walls![0]!.heightM, 9);
    expect(design.depthAlong.xM[0]).toBe(0);
    expect(design.depthAlong.xM.at(-1)).toBe(22);
    expect(design.depthM.support).toBeGreaterThan(design.depthM.midspan);
  });
});

describe('ratchetPressure(height, range, factor)', () => {
  it('is K0 + (C d / H)^0.6 Kp: 6 m wall on rock, end of the deck moving by 8 mm', () => {
    // By hand: d = 4 mm at the middle, 66 x 0.004 / 6 = 0.044, ^0.6 = 0.1535, x 3.69 = 0.5665, + 0.43.
    expect(ratchetPressure(6, 0.008, 66)).toBeCloseTo(0.9965, 3);
    expect(ratchetPressure(6, 0, 66)).toBe(0.43);
  });

  it('presses the upper half with K* and comes back to K0 at the foot', () => {
    const shape = { upper: 1, foot: 0.43 };
    expect(pressureAt(2, 6, shape)).toBeCloseTo(38, 9);
    expect(pressureAt(3, 6, shape)).toBeCloseTo(57, 9);
    expect(pressureAt(6, 6, shape)).toBeCloseTo(0.43 * 19 * 6, 9);
  });

  it('puts the whole triangle on the nodes: gamma H2 / 2 at a third of the height', () => {
    const depths = [0, 1, 2.5, 4, 6];
    const forces = pressureOnNodes(depths, 1, (depth) => 19 * depth);
    const total = forces.reduce((sum, force) => sum + force, 0);
    expect(total).toBeCloseTo((19 * 36) / 2, 9);
    const moment = forces.reduce((sum, force, i) => sum + force * depths[i]!, 0);
    expect(moment / total).toBeCloseTo(4, 9);
  });
});

describe('frameShape(task)', () => {
  it('runs from the foot to the soffit on both sides', () => {
    const shape = frameShape(task([20], 0.7));
    const first = shape.walls[0]!.nodes.map((i) => shape.nodes[i]![1]);
    const last = shape.walls[1]!.nodes.map((i) => shape.nodes[i]![1]);
    expect(first[0]).toBeCloseTo(-shape.walls[0]!.heightM, 9);
    expect(first.at(-1)).toBeCloseTo(-shape.kneeM, 9);
    expect([...last].reverse()).toEqual(first);
  });
});
