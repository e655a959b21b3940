import { describe, expect, it } from 'vitest';
import {
  cubicMetresToCubicYards,
  degreesToRadians,
  feetToMetres,
  inchesToMetres,
  kilonewtons,
  kilogramsPerSquareMetreToPsf,
  kilogramsToPounds,
  kipFeetToKilonewtonMetres,
  kipsPerFootToKilonewtonsPerMetre,
  kipsToKilonewtons,
  ksiToMegapascals,
  metres,
  metresToFeet,
  pcfToKilonewtonsPerCubicMetre,
  percentToRatio,
  psfToKilonewtonsPerSquareMetre,
  squareMetresToSquareFeet,
  weightOf,
  type Metres,
} from '../../lib/units/index.ts';

describe('conversions', () => {
  // NIST SP 811 (2008), appendix B.8, from memory.
  it.each([
    ['feetToMetres(1)', feetToMetres(1), 0.3048],
    ['inchesToMetres(1)', inchesToMetres(1), 0.0254],
    ['kipsToKilonewtons(1)', kipsToKilonewtons(1), 4.448222],
    ['kipsPerFootToKilonewtonsPerMetre(1)', kipsPerFootToKilonewtonsPerMetre(1), 14.5939],
    ['kipFeetToKilonewtonMetres(1)', kipFeetToKilonewtonMetres(1), 1.355818],
    ['ksiToMegapascals(1)', ksiToMegapascals(1), 6.894757],
    ['psfToKilonewtonsPerSquareMetre(1)', psfToKilonewtonsPerSquareMetre(1), 0.04788026],
    ['pcfToKilonewtonsPerCubicMetre(1)', pcfToKilonewtonsPerCubicMetre(1), 0.1570875],
    ['1 / squareMetresToSquareFeet(1)', 1 / squareMetresToSquareFeet(1), 0.09290304],
    ['1 / cubicMetresToCubicYards(1)', 1 / cubicMetresToCubicYards(1), 0.7645549],
    ['1 / kilogramsToPounds(1)', 1 / kilogramsToPounds(1), 0.4535924],
    ['1 / kilogramsPerSquareMetreToPsf(1)', 1 / kilogramsPerSquareMetreToPsf(1), 4.882428],
    ['weightOf(1000)', weightOf(1000), 9.80665],
    ['degreesToRadians(180)', degreesToRadians(180), Math.PI],
    ['percentToRatio(6)', percentToRatio(6), 0.06],
  ])('%s agrees with the published factor', (_, ours, published) => {
    expect(Math.abs(ours / published - 1)).toBeLessThan(5e-7 * 2);
  });

  it('metresToFeet(feetToMetres(x)) gives x back', () => {
    expect(metresToFeet(feetToMetres(123.4))).toBeCloseTo(123.4, 12);
  });
});

describe('makers', () => {
  it('metres(NaN) and metres(Infinity) throw', () => {
    expect(() => metres(NaN)).toThrow(RangeError);
    expect(() => metres(Infinity)).toThrow('expected a finite number of m, received Infinity');
  });

  it('metres and kilonewtons cannot be exchanged', () => {
    const span: Metres = metres(30);
    // @ts-expect-error a force is not a length
    const wrong: Metres = kilonewtons(30);
    // @ts-expect-error a bare number is not a length
    const bare: Metres = 30;
    expect([span, wrong, bare]).toEqual([30, 30, 30]);
  });
});
