import { describe, expect, it } from 'vitest';
import { boxModel } from '../../../lib/forms/concrete-box/boxModel.ts';
import { webNeeded, webShear, type WebDemand } from '../../../lib/forms/concrete-box/webShear.ts';
import { boxTask } from './cases.ts';

const demand: WebDemand = {
  shearKN: 2000,
  momentKNm: 10000,
  strandM2: 0.006,
  barM2: 0.005,
  axialMPa: 4,
  effectiveM: 2.4,
  acrossKNm: 0,
};

describe('webShear() to EN 1992-1-1 6.2.3, from memory', () => {
  const model = boxModel(boxTask([50], 2.5));
  const fcd = (0.85 * 50) / 1.5;
  const strutKN = (1 + 4 / fcd) * 0.3 * (0.9 * 2.4) * 0.6 * (1 - 50 / 250) * fcd * 1e3;

  it('takes struts at cot 2.5 under a low shear', () => {
    const { stirrupsM2PerM, crushing } = webShear(model, 0.35, 0.1, demand);
    expect(crushing).toBeCloseTo(2000 / (strutKN / 2), 9);
    expect(stirrupsM2PerM).toBeCloseTo(2000 / (0.9 * 2.4 * (500 / 1.15) * 1e3 * 2.5), 9);
  });

  it('steepens the struts as far as their strength asks for', () => {
    const shearKN = (0.9 * strutKN) / 2;
    const cot = 1 / 0.9 + Math.sqrt(1 / 0.81 - 1);
    const { stirrupsM2PerM } = webShear(model, 0.35, 0.1, { ...demand, shearKN });
    expect(cot).toBeLessThan(2.5);
    expect(stirrupsM2PerM).toBeCloseTo(shearKN / (0.9 * 2.4 * (500 / 1.15) * 1e3 * cot), 9);
    // At the angle webs are sized for the strut carries less than at 45 degrees.
    expect(webNeeded(model, 0.35, 0.1, { ...demand, shearKN })).toBeGreaterThan(0.35);
  });

  it('keeps the least stirrups 0.08 root fck / fyk', () => {
    const { stirrupsM2PerM } = webShear(model, 0.35, 0.1, { ...demand, shearKN: 1 });
    expect(stirrupsM2PerM).toBeCloseTo(((0.08 * Math.sqrt(50)) / 500) * 0.35, 9);
  });

  it('adds half of the bending across the web, or half of the shear to all of the bending', () => {
    const fy = (500 / 1.15) * 1e3;
    const shear = 2000 / (0.9 * 2.4 * fy * 2.5);
    const bending = (kNm: number): number => kNm / (0.9 * 0.28 * fy);
    const use = (acrossKNm: number): number =>
      webShear(model, 0.35, 0.1, { ...demand, acrossKNm }).stirrupsM2PerM;
    expect(use(10)).toBeCloseTo(2 * (shear / 2 + bending(10) / 2), 9);
    expect(use(80)).toBeCloseTo(2 * (shear / 4 + bending(80)), 9);
  });
});

describe('webShear() to AASHTO LRFD 5.7.3, from memory', () => {
  const model = boxModel(boxTask([50], 2.5, { standard: 'hl93' }));

  it('follows strain, angle and concrete share by hand', () => {
    const lever = 0.9 * 2.4;
    const clear = 0.35 - 0.25 * 0.1;
    const chord = 10000 / lever + 2000 - 0.7 * 1861.6e3 * 0.006;
    const strain = Math.max(0, chord / ((196500 * 0.006 + 200000 * 0.005) * 1e3));
    const beta = 4.8 / (1 + 750 * strain);
    const angle = ((29 + 3500 * strain) * Math.PI) / 180;
    const concreteKN = 0.9 * 0.083 * beta * Math.sqrt(44.82) * clear * lever * 1e3;
    const expected =
      (Math.max(0, 2000 - concreteKN) * Math.tan(angle)) / (lever * ((413.7 * 1e3) / 1.1111111));
    const { stirrupsM2PerM, crushing } = webShear(model, 0.35, 0.1, demand);
    expect(stirrupsM2PerM).toBeCloseTo(Math.max(expected, ((0.083 * Math.sqrt(44.82)) / 413.7) * 0.35), 9);
    expect(crushing).toBeCloseTo(2000 / (0.9 * 0.25 * 44.82e3 * clear * lever), 9);
  });
});
