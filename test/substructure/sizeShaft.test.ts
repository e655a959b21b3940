import { expect, it } from 'vitest';
import { bendingCapacity, sizeShaft } from '../../lib/substructure/sizeShaft.ts';

const task = {
  heightM: 8,
  footLevelM: 0,
  alongSupportsM: 12,
  leaf: true,
  designVerticalKN: 12_000,
  permanentKN: 6000,
  combos: [
    {
      verticalKN: 9000,
      alongKN: 200,
      alongLevelM: 8,
      acrossKN: 250,
      acrossLevelM: 8,
      capacity: 1,
      ultimate: 1.35,
    },
  ],
};

it('sizeShaft(short pier) stands at the practical least thickness', () => {
  expect(sizeShaft(task)).toMatchObject({ lengthM: 0.9, widthM: 6, columns: 1 });
});

it('sizeShaft(slender pier) is thick enough for l0 / i = 70 with l0 = 2 H', () => {
  const shaft = sizeShaft({ ...task, heightM: 12, combos: [] });
  expect((2 * 12) / (shaft.lengthM / Math.sqrt(12))).toBeLessThanOrEqual(70);
  expect((2 * 12) / ((shaft.lengthM - 0.1) / Math.sqrt(12))).toBeGreaterThan(70);
});

it('sizeShaft(fixed pier) grows with the force along the road', () => {
  const strong = { ...task.combos[0]!, alongKN: 2500 };
  expect(sizeShaft({ ...task, combos: [strong] }).lengthM).toBeGreaterThan(0.9);
});

it('sizeShaft(high) is hollow and holds less concrete than its outline', () => {
  const shaft = sizeShaft({ ...task, heightM: 40 });
  expect(shaft.hollow).toBe(true);
  expect(shaft.concreteM3).toBeLessThan(0.6 * shaft.lengthM * shaft.widthM * 40);
});

it.each([true, false])(
  'sizeShaft(leaf %s) is solid while low, hollow where that costs less, and dearer with every metre',
  (leaf) => {
    // What a m3 of a hollow shaft costs beside a solid one stands in the data file: 1.8.
    const worth = (heightM: number): { readonly hollow: boolean; readonly m3: number } => {
      const { concreteM3, hollow = false } = sizeShaft({ ...task, leaf, heightM, footLevelM: 8 - heightM });
      return { hollow, m3: concreteM3 * (hollow ? 1.8 : 1) };
    };
    const heights = Array.from({ length: 113 }, (_, i) => 4 + 0.5 * i);
    const all = heights.map(worth);
    const turn = all.findIndex(({ hollow }) => hollow);
    expect(heights[turn]).toBeGreaterThan(10);
    expect(heights[turn]).toBeLessThan(25);
    all.slice(1).forEach(({ hollow, m3 }, i) => {
      const before = all[i]!;
      expect(hollow || !before.hollow, `back to solid at ${heights[i + 1]} m`).toBe(true);
      // A step of 100 mm in two columns near 2 m square is a tenth of their concrete, and half a metre of height.
      expect(m3 / before.m3, `at ${heights[i + 1]} m`).toBeGreaterThan(0.999);
      expect(m3 / before.m3, `at ${heights[i + 1]} m`).toBeLessThan(1.25);
    });
  },
);

it('sizeShaft(land) stands on two columns with a head and holds less than a leaf', () => {
  const columns = sizeShaft({ ...task, leaf: false });
  expect(columns.columns).toBe(2);
  expect(columns.concreteM3).toBeLessThan(sizeShaft(task).concreteM3);
});

it('bendingCapacity(area, depth, steel, N) of bars alone is As/2 fyd 0.8 h, and N helps until half the section', () => {
  // 1 m square, 0.01 m2 of bars: 0.005 x 435,000 x 0.8 = 1740 kNm.
  expect(bendingCapacity(1, 1, 0.01, 0)).toBeCloseTo(1740, 6);
  const squash = 19_800;
  expect(bendingCapacity(1, 1, 0, squash / 2)).toBeCloseTo(squash / 8, 6);
  expect(bendingCapacity(1, 1, 0, squash)).toBeCloseTo(0, 6);
});
