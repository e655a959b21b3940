import { describe, expect, it } from 'vitest';
import { compositeBox } from '../../../lib/forms/composite-box/index.ts';
import { curveTorque, enclosedArea, tubConstants } from '../../../lib/forms/composite-box/tubTorsion.ts';
import { compositeI } from '../../../lib/forms/composite-i/index.ts';
import { openTorsion } from '../../../lib/mechanics/index.ts';
import { tubTask } from './cases.ts';

const shape = { topM: 6, bottomM: 5, heightM: 2, slope: 0.25, slant: Math.hypot(1, 0.25) };

describe('tubConstants()', () => {
  it('closes the box by Bredt: 4 A2 / sum (s / t), by hand', () => {
    // Slab 250 mm at a shear ratio of 6, webs 16 mm, plate 20 mm: A = 5.5 x 2.125 = 11.69 m2;
    // sum = 6 / 0.04167 + 2 x 2.1904 / 0.016 + 5 / 0.02 = 144 + 273.8 + 250 = 667.8; 4 x 136.6 / 667.8 = 0.818 m4.
    expect(enclosedArea(shape, 0.25)).toBeCloseTo(11.6875, 9);
    expect(tubConstants(shape, 0.25, 6, 0.016, 0.02).closedM4).toBeCloseTo(0.818, 3);
  });
});

describe('curveTorque()', () => {
  it('of an even moment between supports held against turning is M L / 2R at the ends and nothing in the middle', () => {
    const torque = curveTorque(new Float64Array(21).fill(10_000), 2, 200);
    expect(torque[0]).toBeCloseTo((10_000 * 40) / 400, 6);
    expect(torque[10]).toBeCloseTo(0, 6);
    expect(torque[20]).toBeCloseTo(-1000, 6);
    expect(Math.max(...curveTorque(new Float64Array(21).fill(1), 2, Infinity))).toBe(0);
  });
});

describe('a box against two girders of the same deck', () => {
  it('is over a thousand times as stiff in torsion as two open girders, and tens of times as they are with the slab, at 80 m', () => {
    const box = compositeBox.size(tubTask([64, 80, 64], 3.6)).figures;
    const open = compositeI.size(tubTask([64, 80, 64], 3.6, { form: 'composite-i' })).figures;
    const girder = [
      { lengthM: open.topFlangeWidthM!, thicknessM: open.midspanTopFlangeM! },
      { lengthM: open.bottomFlangeWidthM!, thicknessM: open.midspanBottomFlangeM! },
      { lengthM: open.girderHeightM!, thicknessM: open.midspanWebM! },
    ];
    const slab = (12 * open.slabMeanM! ** 3) / 3 / ((open.modularRatio! * 1.2) / 1.3);
    const two = 2 * openTorsion(girder);
    // Steel within a quarter of one another.
    expect(Math.abs(box.steelKgM2! / open.steelKgM2! - 1)).toBeLessThan(0.25);
    expect(box.torsionConstantM4! / two).toBeGreaterThan(1000);
    // The slab alone, as an open strip, is what the girders have: b t3 / 3 over the ratio of shear moduli.
    expect(slab / two).toBeGreaterThan(5);
    expect(box.torsionConstantM4! / (two + slab)).toBeGreaterThan(50);
  });
});
