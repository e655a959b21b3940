import { describe, expect, it } from 'vitest';
import { memberSection, type MemberRules } from '../../../lib/forms/truss/memberSection.ts';

const lm1: MemberRules = { standard: 'lm1', yieldMPa: () => 355, rangeMPa: 52.6 };
const hl93: MemberRules = { standard: 'hl93', yieldMPa: () => 345, rangeMPa: 68.9 };
const nothing = { tensionKN: 0, compressionKN: 0, momentKNm: 0, rangeKN: 0, lengthM: 8 };

describe('memberSection(kind, width, demand, rules)', () => {
  it('box strut: area times chi by EN 1993-1-1 6.3.1 worked out here holds the force', () => {
    const demand = { ...nothing, compressionKN: 9000, lengthM: 9 };
    const box = memberSection('box', 0.5, demand, lm1);
    const { depthM: d, widthM: w } = box;
    // Thin box: I = t (d3/6 + w d2/2), A = 2 t (w + d); least of both axes.
    const radius = (a: number, b: number): number =>
      Math.sqrt((a ** 3 / 6 + (b * a * a) / 2) / (2 * (a + b)));
    const slenderness = Math.max((0.9 * 9) / radius(d, w), 9 / radius(w, d));
    const bar = slenderness / (Math.PI * Math.sqrt(210000 / 355));
    const phi = 0.5 * (1 + 0.34 * (bar - 0.2) + bar ** 2);
    const chi = Math.min(1, 1 / (phi + Math.sqrt(phi ** 2 - bar ** 2)));
    const capacity = (chi * box.areaM2 * 355000) / 1.1;
    expect(box.governs).toBe('buckling');
    expect(9000 / capacity).toBeCloseTo(box.utilisation, 3);
    expect(box.utilisation).toBeLessThanOrEqual(1);
  });

  it('tie: net section by EN 1993-1-1 (6.7), 0.9 x 0.85 A fu / 1.25', () => {
    const tie = memberSection('H', 0.5, { ...nothing, tensionKN: 5000 }, lm1);
    expect(tie.governs).toBe('net-section');
    expect(tie.utilisation).toBeCloseTo(5000 / ((0.9 * 0.85 * tie.areaM2 * 490000) / 1.25), 2);
  });

  it('a longer strut is never lighter, a stronger force never needs less', () => {
    const area = (force: number, lengthM: number, rules: MemberRules): number =>
      memberSection('box', 0.6, { ...nothing, compressionKN: force, lengthM }, rules).areaM2;
    for (const rules of [lm1, hl93]) {
      expect(area(9000, 14, rules)).toBeGreaterThanOrEqual(area(9000, 7, rules));
      expect(area(18000, 9, rules)).toBeGreaterThan(area(9000, 9, rules));
    }
  });

  it('a force beyond the thickest plates comes back overstressed, not thrown', () => {
    expect(memberSection('box', 0.4, { ...nothing, compressionKN: 3e5 }, lm1).utilisation).toBeGreaterThan(1);
  });

  it('a strut too slender for every depth says so', () => {
    const strut = memberSection('H', 0.4, { ...nothing, compressionKN: 10, lengthM: 60 }, lm1);
    expect(strut.governs).toBe('slenderness');
    expect(strut.utilisation).toBeGreaterThan(1);
  });
});
