import { expect, it } from 'vitest';
import { boredPiles, pileCapacity, pilesOrNearest } from '../../lib/substructure/boredPiles.ts';
import { substructureData } from '../../lib/substructure/data.ts';
import type { FootTask } from '../../lib/substructure/foot.ts';
import { demandAt } from '../../lib/substructure/foot.ts';

const task: FootTask = {
  shaftLengthM: 1,
  shaftWidthM: 6,
  combos: [
    {
      verticalKN: 14_000,
      alongKN: 400,
      alongLevelM: 9,
      acrossKN: 300,
      acrossLevelM: 9,
      capacity: 1,
      ultimate: 1,
    },
  ],
  groundLevelM: 0,
  waterLevelM: null,
  scourM: 0,
  backfill: null,
};
const levels = { capTopM: -0.5, bearingLevelM: -10, scouredLevelM: 0 };

it('pileCapacity(clay) is adhesion on the shaft and 9 cu on the base over the safety factor', () => {
  // cu = 120 kPa, adhesion 0.5, 1 m pile 10 m in clay: (60 x pi x 10 + 9 x 120 x pi / 4) / 2.5 = 1093 kN.
  expect(pileCapacity(substructureData.ground['stiff-clay'], 1, 10)).toBeCloseTo(1093.3, 0);
});

it('pileCapacity(rock) never passes the stress of the concrete', () => {
  expect(pileCapacity(substructureData.ground.rock, 1, 50)).toBeCloseTo((6000 * Math.PI) / 4, 6);
});

it('boredPiles(task): the corner pile by M y / sum y2 on the written-out grid is carried by its length', () => {
  const ground = substructureData.ground['soft-clay'];
  const group = boredPiles(task, ground, levels)!;
  const { cap, diameterM: d, rowsAlong, rowsAcross } = group;
  const load = demandAt(
    task,
    task.combos[0]!,
    cap.lengthM,
    cap.widthM,
    cap.depthM,
    levels.capTopM - cap.depthM,
  );
  const at = (rows: number): number[] => Array.from({ length: rows }, (_, i) => (i - (rows - 1) / 2) * 3 * d);
  const piles = at(rowsAlong).flatMap((x) => at(rowsAcross).map((y) => [x, y] as const));
  const sum = (f: (p: readonly [number, number]) => number): number => piles.reduce((s, p) => s + f(p), 0);
  const xx = sum(([x]) => x * x);
  const yy = sum(([, y]) => y * y);
  const forces = piles.map(
    ([x, y]) =>
      load.verticalKN / piles.length + (load.momentAlongKNm * x) / xx + (load.momentAcrossKNm * y) / yy,
  );
  const inStratum = levels.bearingLevelM - group.toeLevelM;
  expect(Math.max(...forces)).toBeLessThanOrEqual(pileCapacity(ground, d, inStratum) + 1e-6);
  expect(forces.reduce((a, b) => a + b, 0)).toBeCloseTo(load.verticalKN, 6);
  expect(inStratum).toBeGreaterThanOrEqual(ground.socketDiameters * d - 1e-9);
});

it('boredPiles(scour) counts no friction above the scoured bed: the toe goes as much deeper', () => {
  const ground = substructureData.ground.gravel;
  const free = boredPiles(task, ground, { ...levels, bearingLevelM: -2 })!;
  const scoured = boredPiles(task, ground, { ...levels, bearingLevelM: -2, scouredLevelM: -5 })!;
  expect(scoured.toeLevelM).toBeLessThan(free.toeLevelM);
});

it('boredPiles(under a wall) never spreads wider than the wall with two diameters', () => {
  const wall: FootTask = {
    ...task,
    shaftWidthM: 12,
    backfill: { topLevelM: 7, widthM: 12, heelShare: 0.65 },
  };
  const group = boredPiles(wall, substructureData.ground['soft-clay'], levels)!;
  expect(group.cap.widthM).toBeLessThanOrEqual(12 + 2 * group.diameterM);
});

const gravel = substructureData.ground.gravel;

it('pilesOrNearest(more than any group carries) is the group of so many times stronger piles, and says how many', () => {
  const within = pilesOrNearest(task, gravel, levels);
  expect(within).toEqual({ group: boredPiles(task, gravel, levels), overload: 1 });
  const heavy = {
    ...task,
    combos: task.combos.map((combo) => ({ ...combo, verticalKN: 100 * combo.verticalKN })),
  };
  expect(boredPiles(heavy, gravel, levels)).toBeNull();
  const found = pilesOrNearest(heavy, gravel, levels);
  expect(found.overload).toBeGreaterThan(1);
  // The multiple is least: piles a twentieth weaker have no group.
  const weaker = {
    ...heavy,
    combos: heavy.combos.map((combo) => ({ ...combo, capacity: 0.95 * found.overload * combo.capacity })),
  };
  expect(boredPiles(weaker, gravel, levels, 0.95 * found.overload)).toBeNull();
});

it('pilesOrNearest(bearing stratum out of reach) measures how far it is', () => {
  const deep = pilesOrNearest(task, gravel, { ...levels, bearingLevelM: -160 });
  // Longest pile 25 diameters of 2 m.
  expect(deep.overload).toBeGreaterThan(2);
  expect(deep.group.lengthM).toBeGreaterThan(150);
});
