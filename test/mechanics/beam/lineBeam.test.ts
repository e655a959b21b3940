import { describe, expect, it } from 'vitest';
import {
  imposedCurvature,
  lineBeam,
  momentInfluence,
  pointLoads,
  settle,
  shearInfluence,
  springInfluence,
  uniform,
} from '../../../lib/mechanics/index.ts';

describe('lineBeam({spansM})', () => {
  it('puts supports among the stations', () => {
    const beam = lineBeam({ spansM: [30, 40], hingesM: [33.3] });
    expect(beam.supportAt.map((s) => beam.xM[s])).toEqual([0, 30, 70]);
    expect(beam.xM).toContain(33.3);
  });

  it('refuses what is no beam, naming what it got', () => {
    expect(() => lineBeam({ spansM: [] })).toThrow(/spansM: expected at least one span/);
    expect(() => lineBeam({ spansM: [30, Number.NaN] })).toThrow(
      /spansM\[1\]: expected more than 0 m, received NaN/,
    );
    expect(() => lineBeam({ spansM: [30], eiKNm2: () => 0 })).toThrow(/eiKNm2: expected more than 0/);
    expect(() => lineBeam({ spansM: [30], hingesM: [31] })).toThrow(/received 31/);
    expect(() => lineBeam({ spansM: [30, 30], hingesM: [10, 20] })).toThrow(/mechanism/);
    expect(() => lineBeam({ spansM: [30], springs: [{ xM: 5, kNPerM: -1 }] })).toThrow(/springs\[0\]/);
  });

  it('with a hinge over the support is two simple spans', () => {
    const beam = lineBeam({ spansM: [20, 30], hingesM: [20] });
    const { momentKNm } = uniform(beam, 8);
    expect(momentKNm[beam.supportAt[1]!]).toBeCloseTo(0, 6);
    expect(Math.max(...momentKNm)).toBeCloseTo(900, 6);
  });

  it('with built-in ends has -w l2 / 12 there and w l2 / 24 between, and the influence line -l / 8 at the end', () => {
    const beam = lineBeam({ spansM: [12], fixedEnds: { start: true, end: true } });
    const { momentKNm } = uniform(beam, 1);
    expect(momentKNm[0]).toBeCloseTo(-12, 9);
    expect(momentKNm[10]).toBeCloseTo(6, 9);
    expect(momentKNm[20]).toBeCloseTo(-12, 9);
    expect(momentInfluence(beam, 0)[10]).toBeCloseTo(-1.5, 9);
    expect(momentInfluence(beam, 20)[10]).toBeCloseTo(-1.5, 9);
  });

  it('on a spring shares the load as stiffnesses say', () => {
    // Middle of a simple span: 48 EI / l3 against the spring; equal stiffness takes half of a load there.
    const beam = lineBeam({ spansM: [10], eiKNm2: () => 1000, springs: [{ xM: 5, kNPerM: 48 }] });
    expect(springInfluence(beam, 0)[10]).toBeCloseTo(0.5, 9);
    expect(pointLoads(beam, [{ xM: 5, loadKN: 10 }]).springKN[0]).toBeCloseTo(5, 9);
    expect(momentInfluence(beam, 10)[10]).toBeCloseTo(1.25, 9);
  });

  it('with overhangs carries their moment at the support and lifts the far one', () => {
    const beam = lineBeam({ spansM: [10], overhangsM: { start: 2, end: 3 } });
    const effects = uniform(beam, 1);
    expect(beam.xM[0]).toBe(-2);
    expect(effects.momentKNm[beam.supportAt[0]!]).toBeCloseTo(-2, 9);
    expect(effects.momentKNm[beam.supportAt[1]!]).toBeCloseTo(-4.5, 9);
    expect(effects.reactionKN[0]).toBeCloseTo(6.75, 9);
    expect(momentInfluence(beam, beam.supportAt[1]!).at(-1)).toBeCloseTo(-3, 9);
  });

  it('takes a haunch within 0.01 % at 20 stations a span of what 400 give', () => {
    const eiKNm2 = (x: number): number => 1e7 * (1 + 1.5 * Math.max(0, 1 - Math.abs(x - 60) / 30) ** 2) ** 3;
    const pier = (stationsPerSpan: number): number => {
      const beam = lineBeam({ spansM: [60, 80], eiKNm2, stationsPerSpan });
      return uniform(beam, 1).momentKNm[beam.supportAt[1]!]!;
    };
    expect(pier(20) / pier(400)).toBeCloseTo(1, 4);
  });

  it('takes a step of stiffness at an extra station exactly', () => {
    // Simple span, half of it twice as stiff, load at the middle: d = P l3 / 96 (1 / EI1 + 1 / EI2).
    const beam = lineBeam({ spansM: [8], eiKNm2: (x) => (x > 4 ? 2000 : 1000) });
    const deflection = pointLoads(beam, [{ xM: 4, loadKN: 6 }]).deflectionM[10]!;
    expect(deflection).toBeCloseTo(((6 * 512) / 96) * (1 / 1000 + 1 / 2000), 9);
  });
});

describe('settle(beam, settlementM)', () => {
  it('bends two equal spans by 3 EI d / l2 when the middle goes down', () => {
    const beam = lineBeam({ spansM: [25, 25], eiKNm2: () => 5e6 });
    const { momentKNm, deflectionM, reactionKN } = settle(beam, [0, 0.01, 0]);
    expect(momentKNm[20]).toBeCloseTo((3 * 5e6 * 0.01) / 625, 3);
    expect(deflectionM[20]).toBeCloseTo(0.01, 12);
    expect(reactionKN[0]! + reactionKN[1]! + reactionKN[2]!).toBeCloseTo(0, 5);
  });

  it('does nothing to a beam that goes down as a whole or tilts', () => {
    const beam = lineBeam({ spansM: [20, 30, 20], eiKNm2: () => 1e6 });
    for (const m of settle(beam, [0.01, 0.03, 0.06, 0.08]).momentKNm) expect(m).toBeCloseTo(0, 4);
  });
});

describe('imposedCurvature(beam, kappa)', () => {
  it('is free in a simple span and 1.5 EI kappa over the middle of two', () => {
    const simple = lineBeam({ spansM: [20], eiKNm2: () => 1e6 });
    for (const m of imposedCurvature(simple, new Float64Array(21).fill(1e-4)).momentKNm)
      expect(m).toBeCloseTo(0, 6);
    const two = lineBeam({ spansM: [20, 20], eiKNm2: () => 1e6 });
    expect(imposedCurvature(two, new Float64Array(41).fill(1e-4)).momentKNm[20]).toBeCloseTo(-150, 6);
  });

  it('gives back the sag of the free beam', () => {
    const beam = lineBeam({ spansM: [20], eiKNm2: () => 1e6 });
    // kappa l2 / 8
    expect(imposedCurvature(beam, new Float64Array(21).fill(1e-4)).deflectionM[10]).toBeCloseTo(5e-3, 9);
  });

  it('wants one value a station', () => {
    expect(() => imposedCurvature(lineBeam({ spansM: [20] }), new Float64Array(3))).toThrow(
      /expected 21 values/,
    );
  });
});

describe('shearInfluence(beam, station, side)', () => {
  it('jumps by one at its section and tells the sides of a support apart', () => {
    const beam = lineBeam({ spansM: [10, 10] });
    const at = shearInfluence(beam, 8);
    expect(at[8]! - at[7]!).toBeGreaterThan(0.9);
    expect(shearInfluence(beam, 20, 'left')[10]).toBeCloseTo(-0.59375, 9);
    expect(shearInfluence(beam, 20, 'right')[10]).toBeCloseTo(0.09375, 9);
  });
});
