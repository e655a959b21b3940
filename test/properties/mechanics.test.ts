import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  bredt,
  deflectionInfluence,
  lineBeam,
  momentInfluence,
  openTorsion,
  pointLoads,
  reactionInfluence,
  sectionProperties,
  uniform,
  type LineBeam,
} from '../../lib/mechanics/index.ts';

const spans = fc.array(fc.double({ min: 10, max: 120, noNaN: true }), { minLength: 1, maxLength: 5 });
const share = fc.double({ min: 0.02, max: 0.98, noNaN: true });

/** Haunched stiffness: up to nine times as stiff at inner supports. */
function haunchedStiffness(spansM: readonly number[], haunch: number): (xM: number) => number {
  const supports = spansM.reduce((all, span) => [...all, all[all.length - 1]! + span], [0]);
  return (x) => {
    const nearest = Math.min(...supports.slice(1, -1).map((s) => Math.abs(s - x)), Infinity);
    return 1e7 * (1 + haunch * Math.max(0, 1 - nearest / 12));
  };
}
const haunched = fc.tuple(spans, fc.double({ min: 0, max: 8, noNaN: true })).map(([spansM, haunch]) => {
  const eiKNm2 = haunchedStiffness(spansM, haunch);
  return { beam: lineBeam({ spansM, eiKNm2 }), eiKNm2 };
});
const beams: fc.Arbitrary<LineBeam> = haunched.map(({ beam }) => beam);

describe('lineBeam() by statics', () => {
  it('has reactions that sum to the loads, about both forces and moments', () => {
    fc.assert(
      fc.property(beams, fc.array(share, { minLength: 1, maxLength: 5 }), (beam, places) => {
        const loads = places.map((at, i) => ({ xM: at * beam.lengthM, loadKN: 100 + 37 * i }));
        const { reactionKN } = pointLoads(beam, loads);
        const total = loads.reduce((sum, load) => sum + load.loadKN, 0);
        expect(reactionKN.reduce((sum, r) => sum + r, 0) / total).toBeCloseTo(1, 8);
        const turning = loads.reduce((sum, load) => sum + load.loadKN * load.xM, 0);
        const held = reactionKN.reduce((sum, r, j) => sum + r * beam.xM[beam.supportAt[j]!]!, 0);
        expect(held / turning).toBeCloseTo(1, 8);
      }),
      { seed: 31, numRuns: 80 },
    );
  });

  it('deflects at a under a load at b as at b under a load at a (Maxwell)', () => {
    fc.assert(
      fc.property(beams, share, share, (beam, a, b) => {
        const i = Math.round(a * (beam.xM.length - 1));
        const j = Math.round(b * (beam.xM.length - 1));
        const there = pointLoads(beam, [{ xM: beam.xM[j]!, loadKN: 1 }]).deflectionM[i]!;
        const back = pointLoads(beam, [{ xM: beam.xM[i]!, loadKN: 1 }]).deflectionM[j]!;
        expect(1e6 * there).toBeCloseTo(1e6 * back, 6);
        expect(1e6 * deflectionInfluence(beam, i)[j]!).toBeCloseTo(1e6 * there, 6);
      }),
      { seed: 32, numRuns: 80 },
    );
  });

  it('does the same work under two loadings on each other (Betti)', () => {
    fc.assert(
      fc.property(beams, fc.tuple(share, share, share, share), (beam, [a, b, c, d]) => {
        const first = [a, b].map((at, i) => ({
          xM: beam.xM[Math.round(at * (beam.xM.length - 1))]!,
          loadKN: 50 + 80 * i,
        }));
        const second = [c, d].map((at, i) => ({
          xM: beam.xM[Math.round(at * (beam.xM.length - 1))]!,
          loadKN: 120 - 30 * i,
        }));
        const work = (loads: typeof first, deflectionM: Float64Array): number =>
          loads.reduce((sum, load) => sum + load.loadKN * deflectionM[beam.xM.indexOf(load.xM)]!, 0);
        const one = work(first, pointLoads(beam, second).deflectionM);
        const other = work(second, pointLoads(beam, first).deflectionM);
        expect(1e4 * one).toBeCloseTo(1e4 * other, 6);
      }),
      { seed: 33, numRuns: 80 },
    );
  });

  it('stores as bending energy the work of the load', () => {
    fc.assert(
      fc.property(haunched, share, ({ beam, eiKNm2 }, at) => {
        const station = Math.max(1, Math.round(at * (beam.xM.length - 2)));
        fc.pre(!beam.supportAt.includes(station));
        const effects = pointLoads(beam, [{ xM: beam.xM[station]!, loadKN: 1000 }]);
        const work = 500 * effects.deflectionM[station]!;
        // Moments run straight over an element; the integral of M2 / 2EI by the middle rule in 40 slices.
        let energy = 0;
        for (let e = 0; e < beam.xM.length - 1; e++) {
          const h = beam.xM[e + 1]! - beam.xM[e]!;
          const a = effects.momentKNm[e]!;
          const b = effects.momentKNm[e + 1]!;
          for (let i = 0; i < 40; i++) {
            const t = (i + 0.5) / 40;
            energy += ((h / 40) * (a + t * (b - a)) ** 2) / (2 * eiKNm2(beam.xM[e]! + t * h));
          }
        }
        expect(energy / work).toBeCloseTo(1, 2);
      }),
      { seed: 34, numRuns: 80 },
    );
  });

  it('has influence lines that add up to the effect of any loads on stations', () => {
    fc.assert(
      fc.property(beams, fc.tuple(share, share, share), (beam, [a, b, s]) => {
        const station = Math.round(s * (beam.xM.length - 1));
        const places = [a, b].map((at) => Math.round(at * (beam.xM.length - 1)));
        const effects = pointLoads(
          beam,
          places.map((i) => ({ xM: beam.xM[i]!, loadKN: 10 })),
        );
        const line = momentInfluence(beam, station);
        expect(10 * (line[places[0]!]! + line[places[1]!]!)).toBeCloseTo(effects.momentKNm[station]!, 5);
        beam.supportAt.forEach((_, j) => {
          const reaction = reactionInfluence(beam, j);
          expect(10 * (reaction[places[0]!]! + reaction[places[1]!]!)).toBeCloseTo(effects.reactionKN[j]!, 5);
        });
      }),
      { seed: 35, numRuns: 60 },
    );
  });

  it('is the same beam from the other end', () => {
    fc.assert(
      fc.property(haunched, ({ beam, eiKNm2 }) => {
        const ours = uniform(beam, 10).momentKNm;
        const turned = lineBeam({
          spansM: [...beam.spansM].reverse(),
          eiKNm2: (x) => eiKNm2(beam.lengthM - x),
        });
        const theirs = uniform(turned, 10).momentKNm;
        const scale = Math.max(...ours.map(Math.abs));
        theirs.forEach((moment, i) => {
          expect((moment - ours[ours.length - 1 - i]!) / scale).toBeCloseTo(0, 6);
        });
      }),
      { seed: 36, numRuns: 30 },
    );
  });
});

describe('lineBeam() by scale', () => {
  it('has four times the moment and sixteen times the deflection when spans double under the same load', () => {
    fc.assert(
      fc.property(spans, (spansM) => {
        const once = uniform(lineBeam({ spansM }), 7);
        const twice = uniform(lineBeam({ spansM: spansM.map((span) => 2 * span) }), 7);
        const most = once.momentKNm.findIndex(
          (m) => Math.abs(m) === Math.max(...once.momentKNm.map(Math.abs)),
        );
        expect(twice.momentKNm[most]! / once.momentKNm[most]!).toBeCloseTo(4, 6);
        const lowest = once.deflectionM.indexOf(Math.max(...once.deflectionM));
        expect(twice.deflectionM[lowest]! / once.deflectionM[lowest]!).toBeCloseTo(16, 5);
      }),
      { seed: 37, numRuns: 60 },
    );
  });

  it('keeps its moments and halves its deflections when the stiffness doubles', () => {
    fc.assert(
      fc.property(spans, (spansM) => {
        const soft = uniform(lineBeam({ spansM, eiKNm2: () => 1e6 }), 7);
        const stiff = uniform(lineBeam({ spansM, eiKNm2: () => 2e6 }), 7);
        const lowest = soft.deflectionM.indexOf(Math.max(...soft.deflectionM));
        expect(stiff.deflectionM[lowest]! / soft.deflectionM[lowest]!).toBeCloseTo(0.5, 8);
        soft.momentKNm.forEach((m, i) => expect(stiff.momentKNm[i]!).toBeCloseTo(m, 5));
      }),
      { seed: 38, numRuns: 60 },
    );
  });
});

describe('sections by scale', () => {
  const side = fc.double({ min: 0.05, max: 5, noNaN: true });

  it('sectionProperties() goes with b h3', () => {
    fc.assert(
      fc.property(side, side, (widthM, heightM) => {
        const inertia = (b: number, h: number): number =>
          sectionProperties([{ kind: 'rect', widthM: b, heightM: h, bottomM: -1 }]).inertiaM4;
        expect(inertia(widthM, heightM) / ((widthM * heightM ** 3) / 12)).toBeCloseTo(1, 8);
        expect(inertia(2 * widthM, heightM) / inertia(widthM, heightM)).toBeCloseTo(2, 8);
        expect(inertia(widthM, 2 * heightM) / inertia(widthM, heightM)).toBeCloseTo(8, 8);
      }),
      { seed: 41, numRuns: 60 },
    );
  });

  it('a closed box is 0.75 (c / t)2 times as stiff in torsion as the same box slit open, c its side', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 1, max: 8, noNaN: true }),
        fc.double({ min: 0.01, max: 0.3, noNaN: true }),
        (c, t) => {
          const walls = Array.from({ length: 4 }, () => ({ lengthM: c, thicknessM: t }));
          // Closed 4 c4 / (4 c / t) = c3 t; open 4 c t3 / 3; their ratio 3 c2 / 4 t2.
          expect(bredt(c * c, walls) / openTorsion(walls) / ((0.75 * c * c) / (t * t))).toBeCloseTo(1, 8);
        },
      ),
      { seed: 42, numRuns: 60 },
    );
  });
});
