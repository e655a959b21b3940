import { describe, expect, it } from 'vitest';
import { quantityOf } from '../../../lib/forms/common/measured.ts';
import { cableStayed } from '../../../lib/forms/cable-stayed/index.ts';
import type { UnitTask } from '../../../lib/model/index.ts';
import { girderTask } from '../composite-i/cases.ts';

const at = (skew: Partial<UnitTask>) =>
  cableStayed.size({
    ...girderTask([80, 200, 80], 1.9, skew),
    form: 'cable-stayed',
    method: 'stay-cantilever',
    pylons: [1, 2],
  });
const square = at({});
const skew = at({ skewDeg: 20 });

describe('size(cable-stayed) of a skew deck', () => {
  it('is that of a square one to the last digit at 0', () => {
    const { task: _square, ...plain } = square;
    const { task: _none, ...none } = at({ skewDeg: 0 });
    expect(none).toEqual(plain);
  });

  it('has longer and heavier end cross-girders, and else the steel, stays and pylons of a square one', () => {
    const line = skew.lines.find(({ what }) => what === 'end cross-girders along the supports')!;
    const steel = (design: typeof skew): number => quantityOf(design.lines, 'plate-girder-steel');
    expect(line.quantity).toBeGreaterThan(0);
    expect(steel(skew) - steel(square)).toBeCloseTo(line.quantity, 6);
    expect(quantityOf(skew.lines, 'stay-cable')).toBe(quantityOf(square.lines, 'stay-cable'));
    expect(skew.checks.find(({ id }) => id === 'end-cross-girder')!.utilisation).toBeLessThanOrEqual(1);
    expect(square.checks.some(({ id }) => id === 'end-cross-girder')).toBe(false);
    // By hand, the planes 12.6 m apart as figured: 12.6 / cos 20 = 12.6 / 0.9397 = 13.4 m.
    expect(square.figures['planesM']).toBeCloseTo(12.6, 9);
    expect(line.how).toContain('13.4 m');
  });

  it('says what square pylons cost in main span, by the width over their legs', () => {
    // By hand: (distance of the planes + a leg) tan 20 degrees, tan = 0.36397.
    const { planesM, pylonLegWidthM } = skew.figures;
    const longerM = ((planesM! + pylonLegWidthM!) * 0.36397).toFixed(1);
    expect(skew.warnings.join(' ')).toContain(`a main span ${longerM} m longer`);
    expect(at({ skewDeg: 0 }).warnings.join(' ')).not.toContain('longer');
  });
});
