import { describe, expect, it } from 'vitest';
import { girderHeights } from '../../../lib/forms/composite-i/girderHeights.ts';
import { compositeI } from '../../../lib/forms/composite-i/index.ts';
import type { Design, Haunch } from '../../../lib/model/index.ts';
import { girderTask } from './cases.ts';

const spans = [80, 100, 80];
const haunched = (haunch: Haunch, spansM = spans): Design =>
  compositeI.size({ ...girderTask(spansM, 3.4), haunch });
const mass = (design: Design, what: string): number =>
  design.lines.find((line) => line.what === what)!.quantity;

describe('girderHeights(task, supports, midspan, slab)', () => {
  const task = { ...girderTask([60, 80, 60], 3), haunch: { pierDepthM: 5, law: 'parabolic' as const } };
  const at = (law: Haunch['law']): Float64Array =>
    girderHeights({ ...task, haunch: { pierDepthM: 5, law } }, [0, 60, 140, 200], 2.7, 0.3).atStationM;

  it('follows a parabola from pier to midspan, by hand', () => {
    const z = at('parabolic');
    expect(z[20]).toBeCloseTo(4.7, 9);
    // 20 m from the pier of a haunch 40 m long: 2.7 + 2 x 0.25.
    expect(z[25]).toBeCloseTo(3.2, 9);
    expect(z[30]).toBeCloseTo(2.7, 9);
    // 40 m from the pier in the end span, 20 m from its end.
    expect(z[6]).toBeCloseTo(2.7, 9);
    expect([...z].reverse()).toEqual([...z].map((height) => expect.closeTo(height, 9) as number));
  });

  it('falls in a straight line over a quarter of the span, by hand', () => {
    const z = at('straight');
    // 4 m from the pier of a haunch 20 m long: 2.7 + 2 x 0.8.
    expect(z[21]).toBeCloseTo(4.3, 9);
    expect(z[25]).toBeCloseTo(2.7, 9);
  });

  it('is constant on a simple span and refuses a pier under its midspan', () => {
    expect(girderHeights({ ...task, spansM: [60] }, [0, 60], 2.7, 0.3).haunched).toBe(false);
    expect(() =>
      girderHeights({ ...task, haunch: { pierDepthM: 2, law: 'straight' } }, [0, 60, 140, 200], 2.7, 0.3),
    ).toThrow(/haunch\.pierDepthM: expected at least the midspan depth 3 m, received 2 m/u);
  });
});

describe('compositeI.size(task with a haunch)', () => {
  const level = compositeI.size(girderTask(spans, 3.4));
  const deep = haunched({ pierDepthM: 5.2, law: 'parabolic' });

  it('is as deep over its piers as asked and draws its soffit so', () => {
    expect(deep.depthM.midspan).toBeCloseTo(3.4, 9);
    expect(deep.depthM.support).toBeCloseTo(5.2, 9);
    const lowest = Math.min(...deep.elevation.flatMap(({ points }) => points.map((point) => point[1])));
    expect(lowest).toBeCloseTo(-5.2, 2);
    const pier = deep.sections.find(({ at }) => at === 'pier')!;
    expect(Math.min(...pier.shapes.flatMap(({ points }) => points.map((point) => point[1])))).toBeCloseTo(
      -5.2,
      9,
    );
  });

  it('draws moments from the spans to its stiffer piers', () => {
    expect(deep.figures['pier1TrafficKNm']!).toBeLessThan(level.figures['pier1TrafficKNm']!);
    expect(deep.figures['span2SagDesignKNm']!).toBeLessThan(level.figures['span2SagDesignKNm']!);
  });

  it('needs less flange than constant depth, keeps every limit, and less with a parabola than with a short straight haunch', () => {
    const flanges = (design: Design): number => mass(design, 'top flanges') + mass(design, 'bottom flanges');
    expect(flanges(deep)).toBeLessThan(flanges(level));
    expect(deep.checks.every(({ utilisation }) => utilisation <= 1.0001)).toBe(true);
    expect(flanges(deep)).toBeLessThan(flanges(haunched({ pierDepthM: 5.2, law: 'straight' })));
  });

  it('is the girder of constant depth where the pier is no deeper', () => {
    expect(haunched({ pierDepthM: 3.4, law: 'parabolic' }).lines).toEqual(level.lines);
  });
});

describe('compositeI.size(task with substringers)', () => {
  const wide = { ...girderTask([60, 80, 60], 3.4), girders: 4 };
  const deck = { ...wide.deck, widthM: 22, carriagewayM: 20 };
  const plain = compositeI.size({ ...wide, deck });
  const carried = compositeI.size({ ...wide, deck, substringers: true });

  it('spans the slab over half the spacing and measures the beams between the girders', () => {
    expect(mass(carried, 'substringers')).toBeCloseTo(3 * 200 * carried.figures['substringerKgM']!, 3);
    expect(plain.lines.some(({ what }) => what === 'substringers')).toBe(false);
    const bars = (design: Design): number => mass(design, 'transverse bars of the slab');
    expect(bars(carried)).toBeLessThanOrEqual(bars(plain));
    expect(carried.figures['slabMeanM']!).toBeLessThanOrEqual(plain.figures['slabMeanM']!);
    expect(carried.checks.find(({ id }) => id === 'substringers')!.utilisation).toBeLessThanOrEqual(1.0001);
  });

  it('refuses them between two girders', () => {
    expect(() => compositeI.size({ ...girderTask([60], 3), girders: 2, substringers: true })).toThrow(
      /substringers: expected three girders or more, received 2/u,
    );
  });
});
