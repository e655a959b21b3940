import { describe, expect, it } from 'vitest';
import { quantityOf } from '../../../lib/forms/common/measured.ts';
import { halfThrough } from '../../../lib/forms/half-through/index.ts';
import type { Design, UnitTask } from '../../../lib/model/index.ts';

const deck = {
  widthM: 10.5,
  carriagewayM: 8,
  carriagewayOffsetM: 0,
  lanes: 2,
  footwayM: 0,
  surfacingM: 0.09,
  superimposedKNm: 30,
} as const;
const task: UnitTask = {
  form: 'half-through',
  spansM: [40],
  deck,
  standard: 'lm1',
  planRadiusM: Infinity,
  method: 'crane',
  depthM: 1.1,
};
const design = halfThrough.size(task);
const worst = (one: Design): number => Math.max(...one.checks.map(({ utilisation }) => utilisation));
const find = (one: Design, id: string) => one.checks.find((check) => check.id === id)!;

describe('halfThrough.size(task)', () => {
  it('takes no more depth under the road than its floor, however high the girders are', () => {
    expect(design.depthM).toEqual({ support: 1.1, midspan: 1.1 });
    expect(design.depthAlong.depthM).toEqual([1.1, 1.1]);
    const z = design.elevation.flatMap(({ points }) => points.map((point) => point[1]));
    expect(Math.min(...z)).toBeGreaterThanOrEqual(-1.1 - 1e-9);
    expect(Math.max(...z)).toBeCloseTo(design.figures['edgeGirderM']! - 1.1, 9);
  });

  it('stands its girders clear of carriageway and footways', () => {
    const cut = design.sections[0]!;
    const girders = cut.shapes.filter(({ part }) => part === 'edge girder');
    expect(girders).toHaveLength(2);
    for (const { points } of girders)
      for (const [x] of points) expect(Math.abs(x)).toBeGreaterThanOrEqual(deck.widthM / 2);
  });

  it.each(['lm1', 'hl93'] as const)(
    'keeps every limit at 15, 40, 60 m and over three spans, %s',
    (standard) => {
      for (const spansM of [[15], [40], [60], [40, 50, 40]])
        expect([spansM, worst(halfThrough.size({ ...task, standard, spansM }))]).toEqual([
          spansM,
          expect.toSatisfy((use: number) => use <= 1.0001),
        ]);
    },
  );

  it('carries in its reactions the weight of everything measured', () => {
    const steelKN = (quantityOf(design.lines, 'plate-girder-steel') * 9.81) / 1000;
    const concreteKN = quantityOf(design.lines, 'deck-concrete') * 25;
    const total = design.reactions.reduce((sum, { permanentKN }) => sum + permanentKN, 0);
    // Frames at the supports stand on the bearings and load no girder.
    expect(total / (steelKN + concreteKN + 30 * 40)).toBeGreaterThan(0.96);
    expect(total / (steelKN + concreteKN + 30 * 40)).toBeLessThan(1.005);
  });

  it('bends one girder by w l2 / 8 and by lane 1 on the lever of the girders', () => {
    const { ownKNm, laneVehicles, trafficUniformKNm, sagDesignKNm, planesM } = design.figures;
    // 8 m between kerbs is two lanes of 3 m and 2 m left over: lane 1 at the kerb, lane 2 beside it (EN 1991-2 table 4.2).
    const share = (y: number): number => 0.5 + y / planesM!;
    expect(laneVehicles).toBeCloseTo(share(2.5) + (200 / 300) * share(-0.5), 6);
    expect(trafficUniformKNm).toBeCloseTo(27 * share(2.5) + 7.5 * share(-0.5) + 5 * share(-3), 6);
    const permanent = (1.35 * (ownKNm! + 15) * 40 ** 2) / 8;
    // Two axles of 300 kN 1.2 m apart, one of them a quarter of their distance past midspan: P (2 L - a)2 / 8 L.
    const axles = (300 * (80 - 1.2) ** 2) / (8 * 40);
    const traffic = 1.35 * (laneVehicles! * axles + (trafficUniformKNm! * 40 ** 2) / 8);
    expect(sagDesignKNm! / (permanent + traffic)).toBeGreaterThan(0.995);
    expect(sagDesignKNm! / (permanent + traffic)).toBeLessThan(1.0001);
  });

  it('needs stiffer frames or more flange for more bending and says which check holds the top flange', () => {
    const { criticalKN, topForceKN } = design.figures;
    expect(criticalKN! / topForceKN!).toBeGreaterThan(2);
    expect(find(design, 'top-flange').utilisation).toBeGreaterThan(0.8);
    expect(find(design, 'u-frame').utilisation).toBeLessThanOrEqual(1);
    expect(find(design, 'impact').demand).toBeGreaterThan(0);
  });

  it('bends over the pier of two spans and is lighter for it than two simple spans', () => {
    const two = halfThrough.size({ ...task, spansM: [40, 40] });
    expect(two.figures['hogDesignKNm']).toBeLessThan(0);
    expect(two.figures['steelKgM2']!).toBeLessThan(design.figures['steelKgM2']!);
    expect(two.checks.map(({ id }) => id)).toContain('bending-piers');
  });

  it('warns of nothing but that the road cannot be widened where every limit holds', () => {
    expect(design.warnings).toEqual([
      'The girders stand on both sides of the road: it cannot be widened later.',
    ]);
  });

  it('says so where no plate or no floor is enough', () => {
    const shallow = halfThrough.size({ ...task, depthM: 0.4 });
    expect(find(shallow, 'floor-room').utilisation).toBeGreaterThan(1);
    expect(shallow.warnings.some((text) => text.startsWith('Room for cross-girders'))).toBe(true);
    expect(worst(halfThrough.size({ ...task, spansM: [160] }))).toBeGreaterThan(1);
    expect(() => halfThrough.size({ ...task, spansM: [-5] })).toThrow(/spansM\[0\]: expected more than 0 m/u);
  });

  it('is heavier on a wider deck by its longer cross-girders', () => {
    const wide = halfThrough.size({ ...task, deck: { ...deck, widthM: 15, carriagewayM: 12.5 } });
    const line = (one: Design, what: string): number =>
      one.lines.find((each) => each.what === what)!.quantity;
    expect(line(wide, 'cross-girders') / 15).toBeGreaterThan(line(design, 'cross-girders') / 10.5);
  });
});
