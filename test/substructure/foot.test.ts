import { expect, it } from 'vitest';
import type { FootTask } from '../../lib/substructure/foot.ts';
import { demandAt } from '../../lib/substructure/foot.ts';

const combo = {
  verticalKN: 1000,
  alongKN: 100,
  alongLevelM: 8,
  acrossKN: 50,
  acrossLevelM: 10,
  capacity: 1,
  ultimate: 1,
};
const pier: FootTask = {
  shaftLengthM: 1,
  shaftWidthM: 6,
  combos: [combo],
  groundLevelM: 0,
  waterLevelM: null,
  scourM: 0,
  backfill: null,
};

it('demandAt(pier) adds footing and ground and carries the horizontals down by their lever', () => {
  const d = demandAt(pier, combo, 4, 8, 1, -2);
  // 1000 + 32 m2 x 1 m x 25 + (32 - 6) m2 x 1 m x 19.
  expect(d.verticalKN).toBeCloseTo(1000 + 800 + 494, 9);
  expect(d.momentAlongKNm).toBeCloseTo(100 * 10, 9);
  expect(d.momentAcrossKNm).toBeCloseTo(50 * 12, 9);
});

it('demandAt(pier in water) floats the footing: 10 kN less for every m3 under water', () => {
  const dry = demandAt(pier, combo, 4, 8, 1, -2);
  const wet = demandAt({ ...pier, waterLevelM: 3 }, combo, 4, 8, 1, -2);
  expect(dry.verticalKN - wet.verticalKN).toBeCloseTo(10 * (32 * 1 + 26 * 1), 9);
});

it('demandAt(abutment) gives the active thrust and overturning of a wall by Rankine', () => {
  // Friction angle 35 degrees: Ka = tan2(45 - 35/2) = 0.271 (any soil mechanics text); the data hold 0.27.
  const ka = Math.tan(((45 - 35 / 2) * Math.PI) / 180) ** 2;
  expect(0.27).toBeCloseTo(ka, 2);
  const wall: FootTask = {
    ...pier,
    shaftLengthM: 1,
    shaftWidthM: 10,
    backfill: { topLevelM: 6, widthM: 10, heelShare: 0.65 },
  };
  const nothing = { ...combo, verticalKN: 0, alongKN: 0, acrossKN: 0 };
  const d = demandAt(wall, nothing, 5, 10, 1, -1);
  const h = 7;
  const thrust = 0.5 * 0.27 * 19 * h * h * 10;
  const surcharge = 0.27 * 10 * h * 10;
  expect(d.alongKN).toBeCloseTo(thrust + surcharge, 6);
  // Heel 0.65 of 4 m = 2.6 m, its soil 6 m high; it turns back, the thrust turns forward.
  const soil = 2.6 * 10 * 6 * 19;
  expect(d.verticalKN).toBeCloseTo(5 * 10 * 1 * 25 + soil, 6);
  expect(d.momentAlongKNm).toBeCloseTo((thrust * h) / 3 + (surcharge * h) / 2 - soil * (2.5 - 1.3), 6);
});
