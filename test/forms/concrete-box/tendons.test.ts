import { describe, expect, it } from 'vitest';
import { bendingCapacity } from '../../../lib/forms/concrete-box/bendingCapacity.ts';
import { boxModel } from '../../../lib/forms/concrete-box/boxModel.ts';
import { leastForce, type Drape } from '../../../lib/forms/concrete-box/leastForce.ts';
import { tendonStress } from '../../../lib/forms/concrete-box/tendonForce.ts';
import { tendonGroup } from '../../../lib/forms/concrete-box/tendonGroup.ts';
import { sharePowers, tendonShare } from '../../../lib/forms/concrete-box/tendonShare.ts';
import { tendonShapes } from '../../../lib/forms/concrete-box/tendonShape.ts';
import { lineBeam } from '../../../lib/mechanics/index.ts';
import { boxTask } from './cases.ts';

describe('tendonShapes()', () => {
  it('gives two equal spans the parasitic moment of the theorem of three moments', () => {
    const span = 40;
    const beam = lineBeam({ spansM: [span, span], stationsPerSpan: 80 });
    const { shapes, parasitic } = tendonShapes([span, span], beam);
    // X = 3 / L2 times the integral of e x over a span, x from the abutment (Clapeyron), by Simpson over the shape.
    for (const k of [0, 2] as const) {
      let integral = 0;
      const h = span / 80;
      for (let i = 0; i <= 80; i++) {
        const weight = i === 0 || i === 80 ? 1 : i % 2 === 1 ? 4 : 2;
        integral += ((weight * h) / 3) * shapes[k][i]! * beam.xM[i]!;
      }
      expect(parasitic[k][80]! / ((3 / span ** 2) * integral)).toBeCloseTo(1, 3);
    }
    expect(parasitic[0][40]!).toBeCloseTo(parasitic[0][80]! / 2, 9);
  });

  it('leaves a simple span without parasitic moment, lowest in its middle, at the centroid over the ends', () => {
    const beam = lineBeam({ spansM: [30] });
    const { shapes, parasitic } = tendonShapes([30], beam);
    expect([shapes[0][0], shapes[0][10], shapes[0][20]]).toEqual([0, 1, 0]);
    // Parabola: three quarters of the drape at the quarter point.
    expect(shapes[0][5]).toBeCloseTo(0.75, 12);
    for (const moment of parasitic[0]) expect(Math.abs(moment)).toBeLessThan(1e-9);
  });

  it('has no kink where the parabolas of a span meet', () => {
    const spans = [39, 50, 39];
    const beam = lineBeam({ spansM: spans, stationsPerSpan: 200 });
    const { shapes } = tendonShapes(spans, beam);
    const [end, inner, pier] = shapes;
    for (let i = 202; i < 399; i++) {
      const turn = (s: Float64Array): number => Math.abs(s[i + 1]! - 2 * s[i]! + s[i - 1]!);
      // Largest curvature of unit drape, 2 / (half span x turn of a tenth), over one station squared.
      expect(turn(inner) + turn(pier) + turn(end)).toBeLessThan(2 * 1.05 * ((2 / (25 * 5)) * 0.25 ** 2));
    }
  });
});

describe('tendonShare()', () => {
  const spans = [41, 42.5, 63, 42.5, 41];
  const beam = lineBeam({ spansM: spans });
  const middle = (share: Float64Array): number[] => spans.map((_, span) => share[20 * span + 10]!);

  it('keeps every strand at power 0, and where the spans bend alike nothing else is tried', () => {
    expect(new Set(tendonShare(spans, beam, 0))).toEqual(new Set([1]));
    expect(sharePowers([40, 50, 50, 40])).toEqual([0]);
    expect(sharePowers(spans)).toEqual([0, 1, 2]);
  });

  it('shares strands out by the span, an end span counting as an inner one of 1.25 times its length', () => {
    const ends = 41 / 0.8 / 63;
    const inner = 42.5 / 63;
    [ends, inner, 1, inner, ends].forEach((share, span) =>
      expect(middle(tendonShare(spans, beam, 1))[span]).toBeCloseTo(share, 12),
    );
    expect(middle(tendonShare(spans, beam, 2))[1]).toBeCloseTo(inner ** 2, 12);
  });

  it('gives a pier the strands of its heavier span and never steps', () => {
    const share = tendonShare(spans, beam, 1);
    expect(share[beam.supportAt[2]!]).toBe(1);
    expect(share[beam.supportAt[1]!]).toBeCloseTo(41 / 0.8 / 63, 12);
    for (let i = 1; i < share.length; i++) expect(Math.abs(share[i]! - share[i - 1]!)).toBeLessThan(0.15);
  });
});

describe('tendonStress()', () => {
  it('follows friction by hand in a simple span', () => {
    const model = boxModel(boxTask([40], 2.2));
    const { jackMPa, initialMPa, lastingMPa } = tendonStress(model, 1, 5);
    // 0.79 x 1860; exp(-0.19 (4 x 1 / 40 + 0.005 x 20)); half of Ep / Ecm x 5 MPa with Ecm = 22 (58 / 10)^0.3 GPa.
    expect(jackMPa).toBeCloseTo(1469.4, 6);
    const ecm = 22000 * 5.8 ** 0.3;
    expect(initialMPa).toBeCloseTo(1469.4 * Math.exp(-0.038) - (0.5 * 195000 * 5) / ecm, 6);
    expect(lastingMPa / initialMPa).toBeCloseTo(0.85, 12);
  });

  it('takes the mean of a span and the draw-in in continuous decks', () => {
    const model = boxModel(boxTask([50, 50], 2.5));
    const angle = 0.19 * ((16 * 2) / 50 + 0.005 * 50);
    const mean = (1 - Math.exp(-angle)) / angle;
    expect(tendonStress(model, 2, 0).initialMPa).toBeCloseTo(1469.4 * mean - (2 * 0.006 * 195000) / 100, 6);
  });
});

describe('tendonGroup()', () => {
  it('chooses the smallest tendon with four or fewer in a web and takes more of the largest after that', () => {
    expect(tendonGroup(28)).toMatchObject({ tendonsPerWeb: 4, strandsPerTendon: 7 });
    expect(tendonGroup(29)).toMatchObject({ tendonsPerWeb: 3, ductM: 0.08 });
    expect(tendonGroup(200)).toMatchObject({ tendonsPerWeb: 7, ductM: 0.13 });
  });
});

describe('bendingCapacity()', () => {
  const model = boxModel(boxTask([50], 2.5));
  const steel = { strandM2: 0.01, strandDepthM: 2, barM2: 0, barDepthM: 2.3 };

  it('agrees with a rectangular block by hand while it lies in the flange', () => {
    const force = (0.01 * 1637e3) / 1.15;
    const fcd = (0.85 * 50e3) / 1.5;
    const block = force / (fcd * 10);
    expect(bendingCapacity(model, steel, { widthM: 10, flangeM: 0.25, websM: 0.7 })).toBeCloseTo(
      force * (2 - block / 2),
      6,
    );
  });

  it('runs the block into the webs and stops where the steel would no longer yield', () => {
    const narrow = { widthM: 1, flangeM: 0.2, websM: 0.7 };
    const fcd = (0.85 * 50e3) / 1.5;
    const force = (0.01 * 1637e3) / 1.15;
    const inWebs = (force - fcd * 0.2) / (fcd * 0.7);
    const moment = fcd * 0.2 * (2 - 0.1) + fcd * 0.7 * inWebs * (2 - 0.2 - inWebs / 2);
    expect(bendingCapacity(model, steel, narrow)).toBeCloseTo(moment, 6);
    const much = bendingCapacity(model, { ...steel, strandM2: 0.1 }, narrow);
    expect(bendingCapacity(model, { ...steel, strandM2: 0.2 }, narrow)).toBeCloseTo(much, 6);
  });
});

describe('leastForce()', () => {
  it('finds the lowest point of a force whose inverse is concave', () => {
    const over = (arm: number): number => (arm > 0 ? 1 / arm : Infinity);
    const need = ([a, b, c]: Drape): number =>
      Math.max(over(0.2 + 0.8 * a - 0.3 * b), over(0.3 + 0.5 * b - 0.2 * a), over(0.4 + 0.3 * c - 0.1 * a));
    const { forceKN, drape } = leastForce(need, 3, null);
    let brute = Infinity;
    const steps = 200;
    for (let a = 0; a <= steps; a++)
      for (let b = 0; b <= steps; b++) brute = Math.min(brute, need([a / steps, b / steps, 1]));
    expect(forceKN).toBeLessThan(1.02 * brute);
    expect(forceKN).toBeGreaterThanOrEqual(brute - 1e-9);
    expect(need(drape)).toBe(forceKN);
  });
});
