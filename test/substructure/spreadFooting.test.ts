import { expect, it } from 'vitest';
import { substructureData } from '../../lib/substructure/data.ts';
import type { FootTask } from '../../lib/substructure/foot.ts';
import { demandAt } from '../../lib/substructure/foot.ts';
import { spreadFooting } from '../../lib/substructure/spreadFooting.ts';

const task = (verticalKN: number, alongKN = 0): FootTask => ({
  shaftLengthM: 1,
  shaftWidthM: 6,
  combos: [{ verticalKN, alongKN, alongLevelM: 8, acrossKN: 0, acrossLevelM: 8, capacity: 1, ultimate: 1 }],
  groundLevelM: 0,
  waterLevelM: null,
  scourM: 0,
  backfill: null,
});

it('spreadFooting(central load) covers the least area: load with footing and soil over the allowable pressure', () => {
  const size = spreadFooting(task(10_000), substructureData.ground.gravel, -2)!;
  const load = demandAt(task(10_000), task(10_000).combos[0]!, size.lengthM, size.widthM, size.depthM, -2);
  const needed = load.verticalKN / 400;
  expect(size.lengthM * size.widthM).toBeGreaterThanOrEqual(needed - 1e-9);
  // One step of 0.25 m on one side at most is wasted.
  expect((size.lengthM - 0.25) * size.widthM).toBeLessThan(needed);
});

it('spreadFooting(with moment) keeps pressure on the effective area within the allowable and the resultant within a third', () => {
  const given = task(10_000, 400);
  const size = spreadFooting(given, substructureData.ground.gravel, -2)!;
  const d = demandAt(given, given.combos[0]!, size.lengthM, size.widthM, size.depthM, -2);
  const e = d.momentAlongKNm / d.verticalKN;
  expect(e).toBeLessThanOrEqual(size.lengthM / 3);
  expect(d.verticalKN / ((size.lengthM - 2 * e) * size.widthM)).toBeLessThanOrEqual(400);
  expect(size.lengthM * size.widthM).toBeGreaterThan(
    ((s) => s.lengthM * s.widthM)(spreadFooting(task(10_000), substructureData.ground.gravel, -2)!),
  );
});

it('spreadFooting(sliding) needs weight: horizontal over vertical within 0.4', () => {
  const given = task(500, 2000);
  const size = spreadFooting(
    { ...given, combos: [{ ...given.combos[0]!, alongLevelM: -1 }] },
    substructureData.ground.rock,
    -2,
  )!;
  const d = demandAt(given, given.combos[0]!, size.lengthM, size.widthM, size.depthM, -2);
  expect(2000 / d.verticalKN).toBeLessThanOrEqual(0.4);
});

it('spreadFooting(hopeless load) is null', () => {
  expect(spreadFooting(task(400_000), substructureData.ground['stiff-clay'], -2)).toBeNull();
});
