import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import {
  beamTrack,
  lineAreas,
  lineBeam,
  loadTrack,
  momentInfluence,
  momentLine,
  pointLoads,
  reversed,
  runGroup,
  runTwoGroups,
  shearLine,
  straightLine,
  type AxleGroup,
} from '../../../lib/mechanics/index.ts';

const group: AxleGroup = { atM: [0, 4.3, 8.6], loadKN: [35, 145, 145], whole: true };

/** The greatest and least moment at a station met by moving the group in small steps and solving the beam each time. */
function moved(spansM: number[], station: number, axles: AxleGroup): { max: number; min: number } {
  const beam = lineBeam({ spansM });
  const result = { max: 0, min: 0 };
  const length = axles.atM.at(-1)!;
  for (let at = -length; at < beam.lengthM; at += 0.1) {
    const loads = axles.atM.flatMap((offset, i) =>
      at + offset >= 0 && at + offset <= beam.lengthM ? [{ xM: at + offset, loadKN: axles.loadKN[i]! }] : [],
    );
    const moment = pointLoads(beam, loads).momentKNm[station]!;
    result.max = Math.max(result.max, moment);
    result.min = Math.min(result.min, moment);
  }
  return result;
}

describe('runGroup()', () => {
  it('finds what moving the group in steps of 10 cm finds, and a little more', () => {
    fc.assert(
      fc.property(
        fc.array(fc.double({ min: 12, max: 45, noNaN: true }), { minLength: 1, maxLength: 3 }),
        fc.double({ min: 0.05, max: 0.95, noNaN: true }),
        (spansM, at) => {
          const beam = lineBeam({ spansM });
          const station = Math.round(at * (beam.xM.length - 1));
          const out = { max: 0, min: 0 };
          runGroup(beamTrack(beam), group, momentLine(beam, station), station, out);
          const slow = moved(spansM, station, group);
          const scale = Math.max(slow.max, -slow.min);
          expect(out.max).toBeGreaterThan(slow.max - 0.001 * scale);
          expect(out.max).toBeLessThan(slow.max + 0.006 * scale);
          expect(out.min).toBeLessThan(slow.min + 0.001 * scale);
          expect(out.min).toBeGreaterThan(slow.min - 0.006 * scale);
        },
      ),
      { seed: 51, numRuns: 8 },
    );
  });

  it('counts an axle just left and just right of a shear section', () => {
    const beam = lineBeam({ spansM: [10] });
    const out = { max: 0, min: 0 };
    runGroup(beamTrack(beam), { atM: [0], loadKN: [10], whole: true }, shearLine(beam, 8, 'right'), 8, out);
    expect(out.max).toBeCloseTo(6, 9);
    expect(out.min).toBeCloseTo(-4, 9);
  });

  it('leaves out axles that relieve unless the group counts whole', () => {
    // Two axles 10 m apart on two spans of 10 m: one always relieves the span moment of the other.
    const beam = lineBeam({ spansM: [10, 10] });
    const parts: AxleGroup = { atM: [0, 10], loadKN: [100, 100], whole: false };
    const out = { max: 0, min: 0 };
    runGroup(beamTrack(beam), parts, momentLine(beam, 8), 8, out);
    expect(out.max).toBeCloseTo(206.4, 3);
    runGroup(beamTrack(beam), { ...parts, whole: true }, momentLine(beam, 8), 8, out);
    // With a weight of its own the second axle can still stand off the beam to the right only when the first stands at its end.
    expect(out.max).toBeLessThan(206.4);
  });

  it('finds kinks of a line of straight pieces under every heavy axle', () => {
    const xM = [0, 6, 12, 18, 24];
    const out = { max: 0, min: 0 };
    const line = straightLine(xM, [0, 1, 0, -2, 0]);
    runGroup(loadTrack(xM), { atM: [0, 2], loadKN: [100, 80], whole: true }, line, -1, out);
    // The heavier axle under the peak, the other 2 m behind or before it.
    expect(out.max).toBeCloseTo(100 + 80 * (2 / 3), 9);
    expect(out.min).toBeCloseTo(-200 - 160 * (2 / 3), 9);
  });
});

describe('runTwoGroups()', () => {
  it('keeps two groups apart and agrees with trying all pairs of places', () => {
    const beam = lineBeam({ spansM: [40, 40] });
    const track = beamTrack(beam);
    const line = momentLine(beam, 20);
    const apartM = 8.6 + 15;
    const axles = { ...group, whole: false };
    const out = { max: 0, min: 0 };
    const best = runTwoGroups(track, axles, runGroup(track, axles, line, 20, out), line, apartM, -1);
    const ordinates = momentInfluence(lineBeam({ spansM: [40, 40], stationsPerSpan: 800 }), 800);
    const at = (x: number): number => (x < 0 || x > 80 ? 0 : ordinates[Math.round(x / 0.05)]!);
    const one = (x: number): number =>
      axles.atM.reduce((sum, offset, i) => sum + Math.min(0, axles.loadKN[i]! * at(x + offset)), 0);
    let slow = 0;
    for (let a = -9; a < 80; a += 0.1)
      for (let b = a + apartM; b < 80; b += 0.1) slow = Math.min(slow, one(a) + one(b));
    expect(best / slow).toBeGreaterThan(0.9995);
    expect(best / slow).toBeLessThan(1.002);
  });

  it('has nothing to add where two do not fit', () => {
    const beam = lineBeam({ spansM: [10] });
    const track = beamTrack(beam);
    const line = momentLine(beam, 10);
    const out = { max: 0, min: 0 };
    const placings = runGroup(track, group, line, 10, out);
    expect(runTwoGroups(track, group, placings, line, 60, 1)).toBe(0);
  });
});

describe('reversed(group)', () => {
  it('runs the axles the other way', () => {
    expect(reversed(group)).toEqual({
      atM: [0, expect.closeTo(4.3), 8.6],
      loadKN: [145, 145, 35],
      whole: true,
    });
  });
});

describe('lineAreas()', () => {
  it('splits a cubic at its change of sign', () => {
    // x (x - 1)(x - 2) on 0 to 2 as one Hermite element: slopes 2, -1, 2 at 0, 1, 2; areas 1/4 each.
    const areas = { positive: 0, negative: 0, positiveM: 0, negativeM: 0 };
    lineAreas([-0.5, 1.5], Float64Array.from([-1.875, 5.75, -0.375, -0.25]), areas);
    const antiderivative = (x: number): number => x ** 4 / 4 - x ** 3 + x * x;
    expect(areas.negative + areas.positive).toBeCloseTo(antiderivative(1.5) - antiderivative(-0.5), 9);
    expect(areas.positiveM + areas.negativeM).toBeCloseTo(2, 9);
  });

  it('finds a quarter above and below for a line that crosses once', () => {
    const areas = { positive: 0, negative: 0, positiveM: 0, negativeM: 0 };
    lineAreas([0, 1], straightLine([0, 1], [1, -1]), areas);
    expect(areas.positive).toBeCloseTo(0.25, 12);
    expect(areas.negative).toBeCloseTo(-0.25, 12);
    expect(areas.positiveM).toBeCloseTo(0.5, 12);
  });
});

describe('loadTrack(xM)', () => {
  it('wants rising stations', () => {
    expect(() => loadTrack([0, 2, 2])).toThrow(/xM\[2\]: expected more than 2/);
    expect(() => loadTrack([0])).toThrow(/two stations/);
  });
});
