import { describe, expect, it } from 'vitest';
import { concrete } from '../../../lib/actions/index.ts';
import { bendingCapacity } from '../../../lib/forms/concrete-box/bendingCapacity.ts';
import { boxModel } from '../../../lib/forms/concrete-box/boxModel.ts';
import { fewestStrands, leastForce, type Drape } from '../../../lib/forms/concrete-box/leastForce.ts';
import { serviceNeed } from '../../../lib/forms/concrete-box/serviceNeed.ts';
import { drapeNeed, type StationNeed } from '../../../lib/forms/concrete-box/stationNeed.ts';
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
    const { forceKN, drape } = leastForce({ need, bears: () => true }, 3, null);
    let brute = Infinity;
    const steps = 200;
    for (let a = 0; a <= steps; a++)
      for (let b = 0; b <= steps; b++) brute = Math.min(brute, need([a / steps, b / steps, 1]));
    expect(forceKN).toBeLessThan(1.01 * brute);
    expect(forceKN).toBeGreaterThanOrEqual(brute - 1e-9);
    expect(need(drape)).toBe(forceKN);
  });

  it('takes more force rather than a drape that the concrete does not bear, and the least where it bears none', () => {
    const need = ([a]: Drape): number => 1 / (0.2 + 0.8 * a);
    const within = leastForce({ need, bears: ([a]) => a <= 0.55 }, 1, null);
    expect(within.drape[0]).toBeGreaterThan(0.5);
    expect(within.drape[0]).toBeLessThanOrEqual(0.55);
    expect(leastForce({ need, bears: () => false }, 1, null)).toMatchObject({ drape: [1, 1, 1], forceKN: 1 });
    // Begun from a drape that is not borne it looks everywhere.
    expect(leastForce({ need, bears: ([a]) => a <= 0.25 }, 1, [1, 1, 1]).drape[0]).toBeLessThanOrEqual(0.25);
  });
});

describe('serviceNeed()', () => {
  // A rectangle of 2 x 1 m with a simple sagging moment of 2000 kNm and no temperature, of C50.
  const moments = (value: number) => Float64Array.of(value);
  const model = {
    standardId: 'lm1' as const,
    concrete: concrete('lm1', 50),
    superimposed: { momentKNm: moments(0) },
    archedKNm: moments(0),
    task: { depthM: 1 },
    traffic: { service: { momentMaxKNm: moments(0), momentMinKNm: moments(0) } },
  };
  const sections = {
    areaM2: moments(2),
    inertiaM4: moments(2 / 12),
    topM: moments(0.5),
    lowM: moments(0.5),
    topLag: moments(1),
    lowLag: moments(1),
    span: { inertiaM4: 2 / 12 },
  };
  const needAt = (eccentricityM: number, momentKNm: number): number =>
    serviceNeed(
      model,
      sections,
      { effects: { momentKNm: moments(momentKNm) } },
      { heightM: 0.1 },
      0,
    )(0, { depthM: 0.5 + eccentricityM, eccentricityM, parasiticM: 0, share: 1 });

  it('keeps the faces uncracked where tendons lie in the middle: (M / W - fctm) A, by hand', () => {
    // W = 1/3 m3: 2000 kNm give 6 MPa at the face; fctm of C50 is 4.07 MPa: 1.93 MPa over 2 m2 at 0.9.
    // Within 150 mm of the middle 1.8 MPa are asked for: less.
    expect(needAt(0, 2000) / (((6000 - 4072) * 2) / 0.9)).toBeCloseTo(1, 3);
    // At 1200 kNm the face has 3.6 MPa, uncracked; round the duct 1200 x 0.15 x 6 = 1.08 MPa over 2 m2.
    expect(needAt(0, 1200)).toBeCloseTo((1080 * 2) / 0.9, 6);
  });

  it('judges low tendons by the concrete round them', () => {
    // e = 0.35: 150 mm below is the face: M / W = P (1 / A + e / W), 6000 = 0.9 P (0.5 + 1.05).
    expect(needAt(0.35, 2000)).toBeCloseTo(6000 / 0.9 / 1.55, 6);
  });
});

describe('drapeNeed()', () => {
  // Three shapes that are 1 at a station of their own, and limits that ask for a moment over an arm.
  const unit = (at: number) => Float64Array.from({ length: 5 }, (_, i) => (i === at ? 1 : 0.1 * i));
  const [end, inner, pier] = [unit(1), unit(2), unit(4)];
  const eccentricityM = ([a, b, c]: Drape, i: number) => a * end[i]! + b * inner[i]! - c * pier[i]!;
  const lines = {
    share: new Float64Array(5).fill(1),
    depthM: (drape: Drape, i: number) => 1 + eccentricityM(drape, i),
    eccentricityM,
    parasiticM: (_: Drape, i: number) => 0.01 * i,
    along: () => expect.fail('the whole line is not asked for'),
  };
  const over = (moment: number, armM: number): number => (armM > 0 ? moment / armM : Infinity);
  const needs: readonly StationNeed[] = [
    (i, at) => over(1 + i, 0.4 + at.eccentricityM - at.parasiticM),
    (i, at) => over(3 - 0.5 * i, 1.7 - at.depthM),
  ];
  const whole = (drape: Drape): number =>
    Math.max(
      ...needs.flatMap((need) =>
        [0, 1, 2, 3, 4].map((i) =>
          need(i, {
            depthM: lines.depthM(drape, i),
            eccentricityM: lines.eccentricityM(drape, i),
            parasiticM: lines.parasiticM(drape, i),
            share: 1,
          }),
        ),
      ),
    );

  it('is the most of all limits at all stations, and rules out what needs enough or more, whatever was asked before', () => {
    const need = drapeNeed(lines, needs);
    const shares = [0, 0.3, 0.7, 1];
    const drapes = shares.flatMap((a) => shares.flatMap((b) => shares.map((c) => [a, b, c] as const)));
    for (const enough of [Infinity, 9, 6, 4]) {
      for (const drape of drapes) {
        const [said, is] = [need(drape, enough), whole(drape)];
        if (is < enough) expect(said).toBe(is);
        else expect(said).toBeGreaterThanOrEqual(enough);
      }
    }
    // The limits asked for do tell drapes apart.
    expect(new Set(drapes.map((drape) => whole(drape) < 9)).size).toBe(2);
  });
});

describe('fewestStrands()', () => {
  const way = (forceKN: number, meanShare: number, isBorne: boolean) => ({
    drape: [1, 1, 1] as const,
    forceKN,
    meanShare,
    isBorne,
  });
  it('takes the fewest along the deck of what the concrete bears, of all where it bears none', () => {
    const ways = [way(900, 1, false), way(1000, 1, true), way(1100, 0.8, true)];
    expect(fewestStrands(ways)).toBe(ways[2]);
    expect(fewestStrands(ways.slice(0, 2))).toBe(ways[1]);
    expect(fewestStrands([way(900, 1, false), way(1000, 0.8, false)]).forceKN).toBe(1000);
  });
});
