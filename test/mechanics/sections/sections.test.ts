import { describe, expect, it } from 'vitest';
import {
  bredt,
  multiCellTorsion,
  openTorsion,
  plasticMoment,
  polygonProperties,
  rectangleTorsion,
  sectionProperties,
  shearArea,
  type SectionPart,
} from '../../../lib/mechanics/index.ts';

const rect = (
  widthM: number,
  heightM: number,
  bottomM: number,
  eRatio = 1,
): SectionPart & { kind: 'rect' } => ({
  kind: 'rect',
  widthM,
  heightM,
  bottomM,
  eRatio,
});

describe('polygonProperties(points, holes)', () => {
  it('is the same whichever way the outline runs, and subtracts holes', () => {
    const outer = [
      [0, 0],
      [4, 0],
      [4, 2],
      [0, 2],
    ] as const;
    const hole = [
      [1, 0.5],
      [3, 0.5],
      [3, 1.5],
      [1, 1.5],
    ] as const;
    const box = polygonProperties(outer, [hole]);
    expect(box.areaM2).toBeCloseTo(6, 12);
    expect(box.inertiaM4).toBeCloseTo((4 * 8 - 2 * 1) / 12, 12);
    expect(box.inertiaYM4).toBeCloseTo((2 * 64 - 1 * 8) / 12, 12);
    expect(box.perimeterM).toBeCloseTo(18, 12);
    expect(polygonProperties([...outer].reverse(), [[...hole].reverse()])).toEqual({
      ...box,
      inertiaM4: expect.closeTo(box.inertiaM4, 12) as number,
      inertiaYM4: expect.closeTo(box.inertiaYM4, 12) as number,
    });
  });

  it('refuses what has no area', () => {
    expect(() =>
      polygonProperties([
        [0, 0],
        [1, 1],
      ]),
    ).toThrow(/three or more/);
    expect(() =>
      polygonProperties([
        [0, 0],
        [1, 1],
        [2, 2],
      ]),
    ).toThrow(/area above 0/);
  });
});

describe('sectionProperties(parts)', () => {
  it('moves the centroid of a transformed section towards the stiffer part', () => {
    // Steel 0.1 x 1 below, slab 2 x 0.2 above at a sixth: transformed slab 0.0667 m2.
    const section = sectionProperties([rect(0.1, 1, 0), rect(2, 0.2, 1, 1 / 6)]);
    const slab = 0.4 / 6;
    const z = (0.1 * 0.5 + slab * 1.1) / (0.1 + slab);
    expect(section.centroidM).toBeCloseTo(z, 12);
    expect(section.inertiaM4).toBeCloseTo(
      0.1 / 12 + 0.1 * (z - 0.5) ** 2 + (slab * 0.04) / 12 + slab * (1.1 - z) ** 2,
      12,
    );
    expect(section.wTopM3).toBeCloseTo(section.inertiaM4 / (1.2 - z), 12);
  });

  it('gives a polygon and a rectangle of the same shape the same properties', () => {
    const polygon = sectionProperties([
      {
        kind: 'polygon',
        points: [
          [0, 1],
          [2, 1],
          [2, 4],
          [0, 4],
        ],
      },
    ]);
    expect(polygon).toEqual(sectionProperties([rect(2, 3, 1)]));
  });
});

describe('plasticMoment(parts)', () => {
  it('is b h2 / 4 fy for a rectangle, its axis at half height', () => {
    const plastic = plasticMoment([{ ...rect(0.2, 0.6, 0), fyMPa: 300 }]);
    expect(plastic.momentKNm).toBeCloseTo((1000 * 300 * 0.2 * 0.36) / 4, 3);
    expect(plastic.axisM).toBeCloseTo(0.3, 8);
  });

  it('follows the stress block of a slab on a girder when the axis lies in the slab', () => {
    // Girder 0.03 m2 of 345 MPa at 0.5 m; slab 3 x 0.25 of 19.8 MPa that cracks: a = 10.35 / (19.8 x 3).
    const parts = [
      { ...rect(0.03, 1, 0), fyMPa: 345 },
      { ...rect(3, 0.25, 1), fyMPa: 19.8, tensionMPa: 0 },
    ];
    const a = (345 * 0.03) / (19.8 * 3);
    const plastic = plasticMoment(parts);
    expect(plastic.axisM).toBeCloseTo(1.25 - a, 7);
    expect(plastic.momentKNm).toBeCloseTo(1000 * 345 * 0.03 * (1.25 - a / 2 - 0.5), 2);
  });

  it('leaves out a cracked slab in hogging', () => {
    const steel = { ...rect(0.2, 0.6, 0), fyMPa: 300 };
    const slab = { ...rect(3, 0.25, 0.6), fyMPa: 20, tensionMPa: 0 };
    expect(plasticMoment([steel, slab], 'hogging').momentKNm).toBeCloseTo(
      plasticMoment([steel]).momentKNm,
      3,
    );
  });
});

describe('shearArea(parts, centroid)', () => {
  it('is two thirds of a rectangle', () => {
    expect(shearArea([rect(0.3, 0.9, 0)], 0.45)).toBeCloseTo((2 / 3) * 0.27, 12);
  });

  it('is nearly the web of an I-section', () => {
    const parts = [rect(0.5, 0.03, 0), rect(0.012, 1.5, 0.03), rect(0.5, 0.03, 1.53)];
    expect(shearArea(parts, 0.78) / (0.012 * 1.53)).toBeCloseTo(0.96, 1);
  });
});

describe('torsion', () => {
  it('rectangleTorsion() meets the series of Saint-Venant: 0.1406 a4 square, 0.229 a b3 at 2 to 1', () => {
    // Timoshenko and Goodier, Theory of Elasticity, table of rectangular bars, from memory.
    expect(rectangleTorsion(1, 1)).toBeCloseTo(0.1406, 3);
    expect(rectangleTorsion(2, 1) / 2).toBeCloseTo(0.229, 3);
    expect(rectangleTorsion(1, 10) / 10).toBeCloseTo(0.312, 2);
  });

  it('multiCellTorsion() of one cell is bredt()', () => {
    const walls = [3, 2, 3, 2].map((lengthM) => ({ lengthM, thicknessM: 0.25 }));
    expect(multiCellTorsion([{ areaM2: 6, ownWalls: walls }], []).constantM4).toBeCloseTo(
      bredt(6, walls),
      12,
    );
  });

  it('multiCellTorsion() of two equal cells leaves the wall between them without stress', () => {
    const own = [2, 2, 2].map((lengthM) => ({ lengthM, thicknessM: 0.2 }));
    const two = multiCellTorsion(
      [
        { areaM2: 4, ownWalls: own },
        { areaM2: 4, ownWalls: own },
      ],
      [{ between: [0, 1], lengthM: 2, thicknessM: 0.2 }],
    );
    const whole = bredt(
      8,
      [4, 2, 4, 2].map((lengthM) => ({ lengthM, thicknessM: 0.2 })),
    );
    expect(two.constantM4).toBeCloseTo(whole, 10);
    // Flows of unit torque do its work: 2 sum A q = 1.
    expect(2 * 4 * (two.flowPerTorque[0]! + two.flowPerTorque[1]!)).toBeCloseTo(1, 12);
  });

  it('openTorsion() of three plates', () => {
    expect(
      openTorsion([
        { lengthM: 0.3, thicknessM: 0.02 },
        { lengthM: 1, thicknessM: 0.01 },
      ]),
    ).toBeCloseTo((0.3 * 8e-6 + 1e-6) / 3, 15);
  });

  it('refuses a cell without area or walls', () => {
    expect(() => bredt(0, [{ lengthM: 1, thicknessM: 1 }])).toThrow(/cellAreaM2/);
    expect(() => bredt(1, [])).toThrow(/walls/);
  });
});
