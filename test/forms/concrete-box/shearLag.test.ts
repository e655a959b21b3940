import { describe, expect, it } from 'vitest';
import { boxLayout } from '../../../lib/forms/concrete-box/boxLayout.ts';
import { boxSection } from '../../../lib/forms/concrete-box/boxSection.ts';
import { boxFigures } from '../../../lib/forms/concrete-box/figures.ts';
import { concreteBox } from '../../../lib/forms/concrete-box/index.ts';
import {
  betweenZeros,
  effectiveWingM,
  lagOf,
  workingWidthM,
} from '../../../lib/forms/concrete-box/shearLag.ts';
import { boxTask } from './cases.ts';

describe('betweenZeros(spans)', () => {
  it.each([
    [[50], 50, 50],
    [[40, 50, 40], 0.7 * 50, 0.15 * 90],
    [[50, 50], 0.85 * 50, 0.15 * 100],
    [[40, 60, 50], 0.7 * 60, 0.15 * 100],
  ] as const)('of %j m, as EN 1992-1-1 figure 5.2 has them (from memory)', (spansM, inSpanM, overPierM) => {
    const found = betweenZeros(spansM);
    expect(found.inSpanM).toBeCloseTo(inSpanM, 9);
    expect(found.overPierM).toBeCloseTo(overPierM, 9);
  });
});

describe('effectiveWingM(wing, zeros)', () => {
  it('is all of a short wing, 0.2 b + 0.1 l0 of a long one, never more than 0.2 l0: by hand', () => {
    expect(effectiveWingM(3, 42)).toBe(3);
    expect(effectiveWingM(8, 42)).toBeCloseTo(1.6 + 4.2, 9);
    expect(effectiveWingM(8, 6)).toBeCloseTo(1.2, 9);
  });
});

describe('lagOf(layout, section, zeros)', () => {
  const layout = boxLayout(boxTask([50], 3.4, { widthM: 24, struts: true }));
  const section = boxSection(layout, 3.4, 0.4, 0.25);

  it('is nothing where the wings work in full, and in plain boxes', () => {
    expect(workingWidthM(layout, 1000)).toBeCloseTo(24, 9);
    const { top, low } = lagOf(layout, section, 1000);
    expect([top, low].map((one) => Number(one.toFixed(9)))).toEqual([1, 1]);
    const plain = boxLayout(boxTask([50], 3.4, { widthM: 24 }));
    expect(lagOf(plain, boxSection(plain, 3.4, 0.4, 0.25), 10)).toEqual({ top: 1, low: 1 });
  });

  it('takes the idle edges of the wings off the section: by hand', () => {
    // Idle edges are a slab of about the mean of its thicknesses; Steiner about the axis of what is left.
    const zerosM = 42;
    const idleM = 24 - workingWidthM(layout, zerosM);
    expect(idleM).toBeGreaterThan(2);
    const thicknessM = (layout.slab.edgeM + layout.slab.rootM) / 2;
    const idleM2 = idleM * thicknessM;
    const { areaM2, inertiaM4, topM } = section;
    const leftM2 = areaM2 - idleM2;
    const axisM = (areaM2 * topM - (idleM2 * thicknessM) / 2) / leftM2;
    const leftM4 = inertiaM4 + areaM2 * (axisM - topM) ** 2 - idleM2 * (axisM - thicknessM / 2) ** 2;
    const { top, low } = lagOf(layout, section, zerosM);
    expect(top / (axisM / leftM4 / (topM / inertiaM4))).toBeCloseTo(1, 1);
    expect(low / ((3.4 - axisM) / leftM4 / ((3.4 - topM) / inertiaM4))).toBeCloseTo(1, 1);
  });

  it('is worse over a pier than in a span, worse at the top than at the soffit', () => {
    const { inSpanM, overPierM } = betweenZeros([48, 60, 48]);
    const [span, pier] = [lagOf(layout, section, inSpanM), lagOf(layout, section, overPierM)];
    expect(pier.top).toBeGreaterThan(span.top);
    expect(pier.top).toBeGreaterThan(pier.low);
    expect(pier.low).toBeGreaterThanOrEqual(1);
  });
});

describe('concreteBox.size(wide deck on struts)', () => {
  // Measured without shear lag: 15.8 kg/m2; the wings of 8 m work by 40 % over the piers.
  it('pays for the shear lag of its wings in strand and says what works', () => {
    const { figures } = concreteBox.size(boxTask([48, 60, 48], 3.4, { widthM: 24, struts: true }));
    expect(figures['strandKgM2']).toBeGreaterThan(16.2);
    expect(figures['strandKgM2']).toBeLessThan(18);
    expect(figures['workingWidthAtPiersM']).toBeLessThan(figures['workingWidthM']!);
    expect(figures['workingWidthM']).toBeLessThan(24);
    const manual = new Set(boxFigures.map(({ path }) => path));
    for (const name of ['workingWidthM', 'workingWidthAtPiersM'])
      expect(manual).toContain(`options/:option/designs/:unit/figures/${name}`);
  });
});
