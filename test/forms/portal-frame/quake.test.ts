import { describe, expect, it } from 'vitest';
import { frameModel } from '../../../lib/forms/portal-frame/frameModel.ts';
import { portalFrame } from '../../../lib/forms/portal-frame/index.ts';
import { portalData } from '../../../lib/forms/portal-frame/portalData.ts';
import type { Design } from '../../../lib/model/index.ts';
import { task, useOf } from './trialFrame.ts';

const shaken = (quakeShare: number, spansM: readonly number[] = [20], depthM = 0.7): Design =>
  portalFrame.size(task(spansM, depthM, { quakeShare }));
const barsKg = ({ lines }: Design): number =>
  lines.reduce((sum, { item, quantity }) => sum + (item === 'reinforcement' ? quantity : 0), 0);

describe('weight turned along the road', () => {
  it('goes into the feet whole, and lifts one end off by its moment about them over the span', () => {
    for (const spansM of [[20], [16, 22]]) {
      const { cases, shape, wallM3, deckM3, deckXM } = frameModel(task(spansM, 0.7));
      const kN = 25 * (deckM3 + wallM3.reduce((sum, m3) => sum + m3, 0)) + 45 * deckXM.at(-1)!;
      for (const { weightAlong } of cases) {
        const along = weightAlong.feet.map(({ alongKN }, w) =>
          w < shape.walls.length - 1 ? alongKN : -alongKN,
        );
        expect(along.reduce((sum, one) => sum + one, 0) / kN).toBeCloseTo(1, 6);
        expect(weightAlong.feet.reduce((sum, { verticalKN }) => sum + verticalKN, 0)).toBeCloseTo(0, 6);
      }
    }
  });

  it('is statics by hand on soft feet: half of it at either foot, the wall bent by that on its height less its own part', () => {
    const { cases, shape, wallM3, deckM3 } = frameModel(task([20], 0.7));
    const soft = cases[1]!.weightAlong;
    const [wall] = shape.walls;
    const [height, wallKN] = [wall!.heightM - shape.kneeM, 25 * wallM3[0]!];
    const half = 25 * wallM3[0]! + (25 * deckM3 + 45 * 20) / 2;
    expect(soft.feet[0]!.alongKN / half).toBeCloseTo(1, 6);
    expect(soft.feet[0]!.momentKNm).toBeCloseTo(0, 6);
    // The wall is thicker on top: its middle by weight stands above its middle.
    const middle = (height / 3) * ((wall!.footM + 2 * wall!.topM) / (wall!.footM + wall!.topM));
    const under = wall!.nodes.at(-1)!;
    const byHand = half * height - wallKN * (height - middle);
    expect(Math.abs(soft.momentKNm[under]!) / byHand).toBeCloseTo(1, 2);
    // As much is lifted off one foot as is put on the other: all moments about the feet over the span.
    const [start, end] = soft.feet;
    expect(start!.verticalKN + end!.verticalKN).toBeCloseTo(0, 6);
    const deckKN = 2 * half - 2 * wallKN;
    expect(end!.verticalKN).toBeGreaterThan((deckKN * (wall!.heightM - shape.kneeM)) / 20);
    expect(end!.verticalKN).toBeLessThan((deckKN * wall!.heightM + 2 * wallKN * height) / 20);
  });
});

it('has fill at rest press as active fill shaken by a fifth of gravity does, by Seed and Whitman', () => {
  const { activePressure, restPressure } = portalData.earth;
  expect(activePressure + 0.75 * 0.2).toBeLessThan(restPressure);
  expect(activePressure + 0.75 * 0.22).toBeGreaterThan(restPressure);
});

describe('portalFrame.size() in an earthquake', () => {
  it('is the frame without one where its share is nothing; refuses less', () => {
    const calm = portalFrame.size(task([20], 0.7));
    expect({ ...shaken(0), task: null }).toEqual({ ...calm, task: null });
    expect(calm.walls![0]!.quake).toBeUndefined();
    expect(() => shaken(-0.1)).toThrow(/quakeShare: expected 0 or more, received -0\.1/u);
  });

  it('has more bars the harder it is shaken, and in the end not enough', () => {
    const bars = [0, 0.3, 0.6, 0.9].map((share) => barsKg(shaken(share)));
    expect(bars[1]!).toBeGreaterThanOrEqual(bars[0]!);
    expect(bars[2]!).toBeGreaterThan(bars[1]!);
    expect(bars[3]!).toBeGreaterThan(bars[2]!);
    expect(useOf(shaken(4), 'bending-wall')).toBeGreaterThan(1);
    expect(useOf(shaken(0.9), 'shear-walls')).toBeGreaterThan(useOf(shaken(0), 'shear-walls'));
  });

  it('draws on every wall of two spans, the middle one among them, and on twice the span with more', () => {
    const two = shaken(0.6, [20, 20]);
    const free = shaken(0, [20, 20]);
    two.walls!.forEach(({ reinforcementKg }, w) =>
      expect(reinforcementKg).toBeGreaterThan(free.walls![w]!.reinforcementKg),
    );
    expect(two.figures['quakeKN']! / shaken(0.6).figures['quakeKN']!).toBeGreaterThan(1.7);
  });

  it('is the same seen from the other end', () => {
    const [one, other] = [
      [16, 22],
      [22, 16],
    ].map((spansM) => shaken(0.5, spansM, 0.75));
    const first = one!.walls![0]!.quake!;
    const last = other!.walls![2]!.quake!;
    first.forEach(({ rest, along, acrossKN }, k) => {
      expect(last[k]!.rest.momentKNm).toBeCloseTo(rest.momentKNm, 6);
      expect(last[k]!.along.momentKNm).toBeCloseTo(-along.momentKNm, 6);
      expect(last[k]!.acrossKN).toBeCloseTo(acrossKN, 6);
    });
  });

  it('takes it across in the plane of its walls: share x weight on its height by hand', () => {
    const design = shaken(0.5);
    const across = design.checks.find(({ id }) => id === 'quake-across')!;
    const [wall] = design.walls!;
    const weight = design.reactions[0]!.permanentKN;
    const wallKN = 25 * wall!.concreteM3;
    const [foot, top] = [design.figures['wallFootM']!, design.figures['wallTopM']!];
    const middle = ((wall!.heightM - design.depthM.support) / 3) * ((foot + 2 * top) / (foot + top));
    const byHand = 0.5 * ((weight - wallKN) * wall!.heightM + wallKN * middle);
    expect(across.demand / byHand).toBeCloseTo(1, 9);
    // Half of its width of 12 m is the lever of the weight, less a stress block of 0.4 m or so; bars come on top.
    expect(across.capacity).toBeGreaterThan(weight * 5.5);
    expect(useOf(shaken(1), 'quake-across') / across.utilisation).toBeLessThan(2.0001);
    expect(portalFrame.size(task([20], 0.7)).checks.some(({ id }) => id === 'quake-across')).toBe(false);
    for (const { acrossKN, acrossAboveM } of wall!.quake!)
      expect(acrossKN * acrossAboveM).toBeCloseTo(byHand, 6);
  });
});
