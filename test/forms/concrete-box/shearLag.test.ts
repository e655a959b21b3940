import { describe, expect, it } from 'vitest';
import { boxLayout } from '../../../lib/forms/concrete-box/boxLayout.ts';
import { boxSection } from '../../../lib/forms/concrete-box/boxSection.ts';
import { boxFigures } from '../../../lib/forms/concrete-box/figures.ts';
import { concreteBox } from '../../../lib/forms/concrete-box/index.ts';
import {
  betweenZeros,
  effectiveFlangeM,
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

describe('effectiveFlangeM(wing, zeros)', () => {
  it('is all of a short wing, 0.2 b + 0.1 l0 of a long one, never more than 0.2 l0: by hand', () => {
    expect(effectiveFlangeM(3, 42)).toBe(3);
    expect(effectiveFlangeM(8, 42)).toBeCloseTo(1.6 + 4.2, 9);
    expect(effectiveFlangeM(8, 6)).toBeCloseTo(1.2, 9);
  });
});

describe('lagOf(layout, section, zeros)', () => {
  const layout = boxLayout(boxTask([50], 3.4, { widthM: 24, struts: true }));
  const section = boxSection(layout, 3.4, 0.4, 0.25);

  it('is nothing where wings and slabs between webs work in full', () => {
    expect(workingWidthM(layout, 1000)).toBeCloseTo(24, 9);
    const { top, low } = lagOf(layout, section, 1000);
    expect([top, low].map((one) => Number(one.toFixed(9)))).toEqual([1, 1]);
    const plain = boxLayout(boxTask([50], 3.4, { widthM: 12 }));
    expect(lagOf(plain, boxSection(plain, 3.4, 0.4, 0.25), 40)).toEqual({ top: 1, low: 1 });
  });

  it('takes edges of the wings and middles of the slabs of a plain box off the section over a pier: by hand', () => {
    const plain = boxLayout(boxTask([50], 3.4, { widthM: 12 }));
    const cut = boxSection(plain, 3.4, 0.4, 0.25);
    const zerosM = 0.15 * 90;
    const { spacingM, slab, cells } = plain;
    expect(cells).toBe(1);
    // Both sides of a wing of b: 0.2 b + 1.35 m of it works.
    const wingM = 6 - spacingM / 2;
    const edgeM = 0.8 * wingM - 1.35;
    const topM = spacingM - 2 * (0.1 * spacingM + 1.35);
    const lowM = cut.bottomWidthM - 2 * (0.1 * cut.bottomWidthM + 1.35);
    // An edge tapers from its tip: a strip of its mean thickness.
    const thickM = slab.edgeM + ((slab.rootM - slab.edgeM) * edgeM) / wingM / 2;
    const idle = [
      [2 * edgeM, thickM, thickM / 2],
      [topM, slab.midM, slab.midM / 2],
      [lowM, 0.25, 3.4 - 0.125],
    ] as const;
    const area = cut.areaM2 - idle.reduce((sum, [width, thick]) => sum + width * thick, 0);
    const moment =
      cut.areaM2 * cut.topM - idle.reduce((sum, [width, thick, at]) => sum + width * thick * at, 0);
    const axisM = moment / area;
    const left = idle.reduce(
      (sum, [width, thick, at]) => sum - width * (thick ** 3 / 12 + thick * (at - axisM) ** 2),
      cut.inertiaM4 + cut.areaM2 * (cut.topM - axisM) ** 2,
    );
    const { top, low } = lagOf(plain, cut, zerosM);
    expect(top / (axisM / left / (cut.topM / cut.inertiaM4))).toBeCloseTo(1, 2);
    expect(low / ((3.4 - axisM) / left / (cut.lowM / cut.inertiaM4))).toBeCloseTo(1, 2);
    expect(top).toBeGreaterThan(1.1);
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
