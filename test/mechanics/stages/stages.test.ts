import { describe, expect, it } from 'vitest';
import {
  cantileverStages,
  creepRedistributed,
  launchStages,
  spanBySpan,
} from '../../../lib/mechanics/index.ts';

describe('launchStages()', () => {
  const launch = { spansM: [1, 1, 1, 1], weightKNm: 1, noseKNm: 0.1, noseStiffness: 0.2, yardSpansM: [1, 1] };

  it('a bare tip hogs by w l2 / 2 at touchdown, six times an inner support of the finished deck', () => {
    const bare = launchStages({ ...launch, noseM: 0 });
    expect(bare.hogKNm).toBeCloseTo(-0.5, 6);
    expect(bare.hogKNm / (-1 / 12)).toBeCloseTo(6, 6);
  });

  it('with a nose of 0.6 of the span the touchdown moment is 0.4^2 / 2 and the nose on its lever', () => {
    const nosed = launchStages({ ...launch, noseM: 0.6 });
    expect(nosed.hogKNm).toBeCloseTo(-(0.08 + 0.06 * 0.7), 6);
    expect(nosed.sagKNm).toBeLessThan(launchStages({ ...launch, noseM: 0 }).sagKNm);
  });

  it('says what it cannot launch', () => {
    expect(() => launchStages({ ...launch, noseM: 2.5 })).toThrow(/noseM/);
    expect(() => launchStages({ ...launch, noseM: 0, yardSpansM: [] })).toThrow(/yard/);
  });
});

describe('cantileverStages()', () => {
  it('of even weight is w a2 / 2 with the traveller on the whole arm', () => {
    const arm = cantileverStages({ armM: 50, weightKNm: () => 100, travellerKN: 600, segmentM: 5 });
    expect(arm.momentKNm[0]).toBeCloseTo(-(125000 + 30000), 6);
    expect(arm.shearKN[0]).toBeCloseTo(5600, 6);
    expect(arm.pierMomentKNm).toBeCloseTo(500 * 47.5 + 600 * 5, 6);
  });

  it('of weight falling to nothing is w a2 / 6', () => {
    const arm = cantileverStages({
      armM: 30,
      weightKNm: (x) => 90 * (1 - x / 30),
      travellerKN: 0,
      segmentM: 3,
    });
    expect(arm.momentKNm[0]).toBeCloseTo((-90 * 900) / 6, 6);
  });
});

describe('spanBySpan()', () => {
  it('with joints over the supports locks in simple spans on what stands before', () => {
    const staged = spanBySpan({ spansM: [10, 10], wKNm: 1, jointShare: 0 });
    // The second span is set on the two-span beam: -l2 / 16 at the pier.
    expect(staged.builtKNm[20]).toBeCloseTo(-100 / 16, 6);
    expect(staged.atOnceKNm[20]).toBeCloseTo(-12.5, 6);
  });

  it('with joints at a fifth agrees with statics at the first pier: the overhang alone, then the next stage', () => {
    const staged = spanBySpan({ spansM: [1, 1], wKNm: 1, jointShare: 0.2 });
    // Stage 1 leaves -0.02 there; stage 2 loads 0.2 to 1 of the second span: integral of -(x - x3) / 4 read from the far end.
    const fromFarEnd = (x: number): number => -((x * x) / 2 - x ** 4 / 4) / 4;
    expect(staged.builtKNm[20]).toBeCloseTo(-0.02 + fromFarEnd(0.8), 6);
  });

  it('creeps towards the deck struck at once', () => {
    const staged = spanBySpan({ spansM: [40, 40, 40], wKNm: 200, jointShare: 0.2 });
    const crept = creepRedistributed(staged, 2);
    const share = (crept[20]! - staged.builtKNm[20]!) / (staged.atOnceKNm[20]! - staged.builtKNm[20]!);
    expect(share).toBeCloseTo(2 / 2.6, 9);
  });

  it('refuses a joint far in the span', () => {
    expect(() => spanBySpan({ spansM: [10, 10], wKNm: 1, jointShare: 0.5 })).toThrow(/jointShare/);
  });
});
