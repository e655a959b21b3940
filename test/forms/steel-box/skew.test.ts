import { describe, expect, it } from 'vitest';
import { steelBox } from '../../../lib/forms/steel-box/index.ts';
import type { Design, UnitTask } from '../../../lib/model/index.ts';
import { steelBoxTask } from './cases.ts';

const at = (skew: Partial<UnitTask>): Design => steelBox.size(steelBoxTask([60, 90, 60], 3.5, skew));
const square = at({});
const steelKg = ({ lines }: Design): number =>
  lines.reduce((sum, { item, quantity }) => (item.endsWith('-steel') ? sum + quantity : sum), 0);
const uplift = ({ checks }: Design): number => checks.find(({ id }) => id === 'bearing-uplift')!.utilisation;

describe('size(steel-box) of a skew deck', () => {
  it('is that of a square one to the last digit at 0', () => {
    const { task: _square, ...plain } = square;
    const { task: _none, ...none } = at({ skewDeg: 0 });
    expect(none).toEqual(plain);
  });

  it('twists its end spans: webs, frames and bearings of more, the acute nearer to lifting', () => {
    const skew = at({ skewDeg: 15 });
    expect(skew.figures['skewTorqueKNm']).toBeGreaterThan(0);
    expect(square.figures).not.toHaveProperty('skewTorqueKNm');
    expect(steelKg(skew)).toBeGreaterThan(steelKg(square));
    expect(uplift(skew)).toBeGreaterThan(uplift(square));
    expect(skew.warnings.join(' ')).toMatch(/square to the road at the piers.*obtuse bearing/);
  });

  it('takes its ends square where the acute bearing would lift, and says so', () => {
    const skew = at({ skewDeg: 45 });
    expect(steelKg(skew)).toBe(steelKg(square));
    expect(uplift(skew)).toBe(uplift(square));
    expect(skew.task.skewDeg).toBe(45);
    // By hand: 12 m wide, tan 45 = 1: 12.0 m of sill at one edge.
    expect(skew.warnings.join(' ')).toMatch(/acute would lift.*12\.0 m of sill and slab/);
  });

  it('has the torque of a beam on skew supports in a single span', () => {
    const { figures, task } = steelBox.size(steelBoxTask([60], 2.5, { skewDeg: 4 }));
    const { span1SagDesignKNm, torsionConstantM4, midspanInertiaM4, skewTorqueKNm } = figures;
    // By hand, a parabola of moments: the ends slope by 2/3 M L / EI together; k = GJ / EI with G = E / 2.6, tan 4 = 0.06993.
    const k = torsionConstantM4! / 2.6 / midspanInertiaM4!;
    const handKNm = ((2 / 3) * span1SagDesignKNm! * k * 0.06993) / (1 + k * 0.06993 ** 2);
    // Plates are thinner towards the ends, and the section is not one along the span.
    expect(skewTorqueKNm! / handKNm).toBeGreaterThan(0.75);
    expect(skewTorqueKNm! / handKNm).toBeLessThan(1.25);
    expect(task.skewDeg).toBe(4);
  });
});
