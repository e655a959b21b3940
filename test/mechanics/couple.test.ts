import { describe, expect, it } from 'vitest';
import { coupleAt, lineBeam } from '../../lib/mechanics/index.ts';

describe('coupleAt()', () => {
  it('coupleAt(simple beam, its start) has a moment that falls to nothing, and turns it by l / 3 E I and -l / 6 E I', () => {
    const beam = lineBeam({ spansM: [12], eiKNm2: () => 500, stationsPerSpan: 8 });
    const { rightKNm, leftKNm, turnRad } = coupleAt(beam, 0);
    expect(rightKNm[0]).toBeCloseTo(1, 12);
    expect(leftKNm[4]).toBeCloseTo(0.5, 12);
    expect(leftKNm[8]).toBeCloseTo(0, 12);
    expect(turnRad[0]).toBeCloseTo(12 / 1500, 12);
    expect(turnRad[8]).toBeCloseTo(-12 / 3000, 12);
  });

  it('coupleAt(two spans, between them) leaps by 1 kNm, shared by 3 E I / l', () => {
    const beam = lineBeam({ spansM: [10, 30], eiKNm2: () => 1 });
    const pier = beam.supportAt[1]!;
    const { leftKNm, rightKNm, turnRad } = coupleAt(beam, pier);
    expect(rightKNm[pier]! - leftKNm[pier]!).toBeCloseTo(1, 12);
    expect(-leftKNm[pier]!).toBeCloseTo(0.3 / (0.3 + 0.1), 12);
    expect(turnRad[pier]).toBeCloseTo(1 / 0.4, 12);
  });

  it('coupleAt(varying stiffness) turns there what a couple here turns here (Maxwell)', () => {
    const beam = lineBeam({ spansM: [20, 30, 25], eiKNm2: (x) => 100 + x * x });
    const [a, b] = [beam.supportAt[1]!, beam.supportAt[2]!];
    expect(coupleAt(beam, a).turnRad[b]).toBeCloseTo(coupleAt(beam, b).turnRad[a]!, 12);
    expect(() => coupleAt(beam, beam.xM.length)).toThrow(RangeError);
  });
});
