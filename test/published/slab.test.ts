import { describe, expect, it } from 'vitest';
import { slab } from '../../lib/forms/slab/index.ts';
import { slabTask } from '../forms/slab/cases.ts';

const useOf = (spansM: readonly number[], depthM: number, id: string): number =>
  slab.size(slabTask(spansM, depthM, { standard: 'hl93' })).checks.find((check) => check.id === id)!
    .utilisation;

/**
 * Optional least depths of reinforced slabs: 1.2 (S + 3.0) / 30 on simple spans, (S + 3.0) / 30 on continuous ones, S in
 * m (AASHTO LRFD table 2.5.2.6.3-1, from memory). They were set for deflection: ours at that depth should be near its
 * limit of span over 800, 0.6 to 1.1 of it (band set before the comparison; S taken as the longest span).
 */
describe('slab.size() against the optional least depths', () => {
  it.each([8, 10, 12, 15])(
    'a simple span of %i m at its least depth is near its limit of deflection',
    (spanM) => {
      const use = useOf([spanM], (1.2 * (spanM + 3)) / 30, 'deflection');
      expect(use).toBeGreaterThan(0.6);
      expect(use).toBeLessThan(1.1);
    },
  );

  it.each([10, 12, 15])(
    'three spans round %i m at their least depth are near their limit of deflection',
    (spanM) => {
      const use = useOf([0.8 * spanM, spanM, 0.8 * spanM], (spanM + 3) / 30, 'deflection');
      expect(use).toBeGreaterThan(0.6);
      expect(use).toBeLessThan(1.1);
    },
  );
});

/**
 * Prestressed slabs: concrete 0.5 to 1.1 m3/m2, bars 50 to 90 kg/m3, strand 25 to 55 kg/m3; depth of three spans or more
 * a thirty-third of the span, of one span a twenty-third (SETRA guide on prestressed slab bridges, from memory, a weak
 * source). Solid to 25 m.
 */
describe('slab.size() against ratios of prestressed slabs', () => {
  const cases: readonly (readonly [spansM: readonly number[], depthM: number])[] = [
    [[17], 17 / 23],
    [[20], 20 / 23],
    [[14, 18, 14], 18 / 33],
    [[17, 22, 17], 22 / 33],
    [[20, 25, 25, 20], 25 / 33],
    [[24, 30, 30, 24], 1],
  ];
  it.each(cases)('%o at %f m', (spansM, depthM) => {
    const design = slab.size(slabTask(spansM, depthM));
    const { concreteM3M2, barsKgM3, strandKgM3 } = design.figures;
    expect(design.limitingCheck.utilisation).toBeLessThanOrEqual(1.0001);
    expect(concreteM3M2).toBeGreaterThan(0.5);
    expect(concreteM3M2).toBeLessThan(1.1);
    expect(barsKgM3).toBeGreaterThan(50);
    expect(barsKgM3).toBeLessThan(90);
    expect(strandKgM3).toBeGreaterThan(25);
    expect(strandKgM3).toBeLessThan(55);
  });
});
