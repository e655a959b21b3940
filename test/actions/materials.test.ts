import { describe, expect, it } from 'vitest';
import { concrete, steelYield, usualSteel } from '../../lib/actions/index.ts';

describe('steelYield(grade, thickness)', () => {
  it('falls with thickness as in EN 10025 (from memory)', () => {
    expect([16, 17, 40, 63, 80, 100, 150].map((t) => steelYield('S355', t))).toEqual([
      355, 345, 345, 335, 325, 315, 295,
    ]);
  });

  it('is 50 ksi for Grade 50 up to 4 in', () => {
    expect(steelYield('GR50', 100) / 6.894757).toBeCloseTo(50, 1);
  });

  it('refuses plates nobody rolls', () => {
    expect(() => steelYield('S355', 200)).toThrow(/up to 150 mm, received 200/);
    expect(() => steelYield('S355', Number.NaN)).toThrow(/NaN/);
  });
});

describe('concrete(standard, strength)', () => {
  it('follows EN 1992-1-1 table 3.1 (from memory)', () => {
    // C35/45: fctm 3.2, Ecm 34; C50/60: 4.1, 37; C60/75: 4.4, 39.
    expect(concrete('lm1', 35).fctmMPa).toBeCloseTo(3.2, 1);
    expect(concrete('lm1', 35).ecmMPa / 1000).toBeCloseTo(34, 0);
    expect(concrete('lm1', 50).fctmMPa).toBeCloseTo(4.1, 1);
    expect(concrete('lm1', 50).ecmMPa / 1000).toBeCloseTo(37, 0);
    expect(concrete('lm1', 60).fctmMPa).toBeCloseTo(4.4, 1);
    expect(concrete('lm1', 35).fcdMPa).toBeCloseTo(19.83, 2);
  });

  it('gives 4,888 and 3,834 ksi for 6.5 and 4.0 ksi at 150 pcf (PCI Bridge Design Manual 9.1a, from memory)', () => {
    const ksi = 6.894757;
    expect(concrete('hl93', 6.5 * ksi).ecmMPa / ksi).toBeCloseTo(4888, -1);
    expect(concrete('hl93', 4 * ksi).ecmMPa / ksi).toBeCloseTo(3834, -1);
  });

  it('refuses no strength', () => {
    expect(() => concrete('lm1', 0)).toThrow(/received 0/);
  });
});

describe('usualSteel(standard)', () => {
  it('comes from the standard', () => {
    expect([usualSteel('lm1'), usualSteel('hl93')]).toEqual(['S355', 'GR50']);
  });
});
