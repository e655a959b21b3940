import { describe, expect, it } from 'vitest';
import type { Site } from '../../lib/model/index.ts';
import { articulate } from '../../lib/substructure/articulate.ts';
import {
  forceAlong,
  heldAlong,
  holdingForce,
  inSeries,
  rubberStiffness,
  stillAt,
  type UnitOnGround,
} from '../../lib/substructure/heldAlong.ts';
import { pierStiffness } from '../../lib/substructure/pierStiffness.ts';
import { crossing, plainDesign, unitOn } from './crossing.ts';

/** Dry and level, so that piers are pairs of columns. */
const dry: Site = { ...crossing, waters: [], groundX: [0, 200], groundZ: [0, 0] };

/** A unit of even spans, its road so far above the ground, m. */
function unit(spans: number, spanM: number, heightM: number, site: Site = dry): UnitOnGround {
  const places = Array.from({ length: spans + 1 }, (_, i) => i * spanM);
  return {
    site,
    unit: unitOn(places),
    design: plainDesign(Array.from({ length: spans }, () => spanM)),
    heightM: places.map(() => heightM),
    waterDepthM: places.map(() => 0),
  };
}

describe('pierStiffness', () => {
  it('pierStiffness(leaf 10 m high under 12 m of deck) is 3 E I / h^3 of 1.0 x 6 m by hand', () => {
    // l0 / i = 2 x 10 / (t / sqrt 12) = 70 gives t = 0.990, in steps 1.0 m; I = 6 x 1 / 12 = 0.5 m4;
    // half of 34 GPa: 3 x 17e6 x 0.5 / 1000 = 25 500 kN/m.
    expect(pierStiffness(12, 10, true)).toBeCloseTo(25_500, 6);
  });

  it('pierStiffness(two columns 10 m high) is that of two squares of 1.2 m by hand', () => {
    // I = 2 x 1.2^4 / 12 = 0.3456 m4; 3 x 17e6 x 0.3456 / 1000 = 17 626 kN/m.
    expect(pierStiffness(12, 10, false)).toBeCloseTo(17_625.6, 6);
  });
});

describe('rubberStiffness', () => {
  it('rubberStiffness(load, movement) is G A / height, no lower than the lowest bearings', () => {
    // 3000 kN at 10 MPa: 0.3 m2; 0.9 MPa x 0.3 / 0.03 m = 9000 kN/m. 56 mm both ways: 28 / 0.7 = 40 mm of rubber.
    expect(rubberStiffness(3000, 20)).toBeCloseTo(9000, 6);
    expect(rubberStiffness(3000, 56)).toBeCloseTo(6750, 6);
    expect(inSeries(9000, 25_500)).toBeCloseTo((9000 * 25_500) / 34_500, 6);
  });
});

describe('heldAlong', () => {
  it('heldAlong(stocky piers far apart) leaves one fixed point, to the last figure what it was', () => {
    const on = unit(4, 45, 9);
    const held = heldAlong(on);
    expect(held).toEqual({ stiffnessKNm: [0, 0, 1, 0, 0], stillM: 90, afloat: false });
    // 360 + 2.7 x 180 = 846 kN; three per cent of 8775 kN either side, (1 + a) / 2 and (1 - a) / 2 with a = 8 / 12.
    const friction = 0.03 * 8775 * (8 / 12);
    expect(articulate(on)[2]!.alongKN).toBeCloseTo(846 + friction, 9);
    expect(articulate(on).map(({ fixed }) => fixed)).toEqual([false, false, true, false, false]);
  });

  it('heldAlong(short spans) floats on rubber; every support takes its share of braking by stiffness, by hand', () => {
    const on = unit(4, 18, 8);
    const held = heldAlong(on);
    expect(held.afloat).toBe(true);
    expect(held.stillM).toBeCloseTo(36, 9);
    // End: 1170 + 1050 kN on 0.222 m2; 33.7 mm both ways asks for 24 mm of rubber, 30 mm are the least: 6660 kN/m.
    expect(held.stiffnessKNm[0]).toBeCloseTo(6660, 6);
    // Pier: 2340 + 1500 kN on 0.384 m2, 11 520 kN/m, on columns of 1.2 m, h = 8 - 2.5 - 0.09 - crossfall - 0.4 + 0.5.
    const pierM = 8 - 2.5 - 0.09 - (0.025 * 9) / 2 - 0.4 + 0.5;
    const columns = (3 * 17e6 * 0.3456) / pierM ** 3;
    expect(held.stiffnessKNm[1]).toBeCloseTo((11_520 * columns) / (11_520 + columns), 6);
    // Braking alone, 360 + 2.7 x 72: nothing slides.
    expect(forceAlong(on, held)).toBeCloseTo(554.4, 9);
    const holds = articulate(on);
    const all = held.stiffnessKNm.reduce((sum, k) => sum + k, 0);
    const moveM = (1.2e-5 * 78 * 36) / 2;
    expect(holds[0]!.alongKN).toBeCloseTo((554.4 * 6660) / all + 6660 * moveM, 6);
    expect(holds[2]!.alongKN).toBeCloseTo((554.4 * held.stiffnessKNm[2]!) / all, 6);
    expect(holds.every(({ fixed }) => !fixed)).toBe(true);
  });

  it('heldAlong(any) is in balance: shares add up to the force, and what bends the piers to nothing', () => {
    const shaken: Site = { ...dry, seismic: { groundAccelerationG: 0.25, siteClass: 'C' } };
    for (const on of [unit(4, 18, 8), unit(5, 40, 14, shaken), unit(7, 28, 10, shaken), unit(6, 30, 40)]) {
      const held = heldAlong(on);
      const x = on.unit.supportsM;
      const all = held.stiffnessKNm.reduce((sum, k) => sum + k, 0);
      const force = forceAlong(on, held);
      const shares = held.stiffnessKNm.map((k) => holdingForce(force, k, all, 0));
      expect(shares.reduce((sum, one) => sum + one, 0)).toBeCloseTo(force, 6);
      expect(x.reduce((sum, at, i) => sum + held.stiffnessKNm[i]! * (at - held.stillM), 0)).toBeCloseTo(0, 4);
      expect(held.stillM).toBeCloseTo(stillAt(x, held.stiffnessKNm), 9);
      const weights = articulate(on).map(({ heldKN }) => heldKN);
      const weight = on.design.reactions.reduce((sum, { permanentKN }) => sum + permanentKN, 0);
      expect(weights.reduce((sum, one) => sum + one, 0)).toBeCloseTo(weight, 6);
    }
  });

  it('heldAlong(earthquake) holds a deck by more piers than without, so that none has to carry it all', () => {
    const quiet = unit(4, 45, 9);
    const shaken = unit(4, 45, 9, { ...dry, seismic: { groundAccelerationG: 0.25, siteClass: 'C' } });
    const count = (on: UnitOnGround): number => heldAlong(on).stiffnessKNm.filter((k) => k > 0).length;
    expect(count(quiet)).toBe(1);
    expect(count(shaken)).toBeGreaterThan(1);
    const alone = Math.max(...articulate(shaken, true).map(({ heldKN }) => heldKN));
    expect(Math.max(...articulate(shaken).map(({ heldKN }) => heldKN))).toBeLessThan(0.7 * alone);
  });

  it('heldAlong(cast into its abutments, on pylons, or with one pier) has one fixed point', () => {
    const short = unit(4, 18, 8);
    const isOne = ({ stiffnessKNm }: { readonly stiffnessKNm: readonly number[] }): boolean =>
      stiffnessKNm.filter((k) => k > 0).length === 1;
    expect(isOne(heldAlong(short, true))).toBe(true);
    expect(isOne(heldAlong({ ...short, unit: { ...short.unit, pylons: [1] } }))).toBe(true);
    expect(isOne(heldAlong(unit(2, 18, 8)))).toBe(true);
  });
});
