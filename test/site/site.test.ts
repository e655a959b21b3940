import { describe, expect, it } from 'vitest';
import type { Clearance, Obstacle } from '../../lib/model/index.ts';
import {
  addedFill,
  deckSpec,
  groundAt,
  profileFor,
  roadLevelAt,
  soffitLimitAt,
  stretchAt,
  survey,
  waterDepthAt,
} from '../../lib/site/index.ts';
import { lowFerry, plainBrief } from './demoBrief.ts';

function obstacle(fromM: number, toM: number, clearance: Clearance | null = null): Obstacle {
  return { kind: 'railway', name: 'line', fromM, toM, supports: 'hard', pierPremium: 'unknown', clearance };
}

function clear(fromM: number, toM: number, levelM: number): Clearance {
  return { fromM, toM, datumLevelM: levelM - 5, headroomM: 5, confirmed: true };
}

describe('addedFill', () => {
  it('addedFill(W 12, h 7, s 2, g 5 %) rises by 3640 m3 per metre of lift', () => {
    // By hand: dV/dh = (W h + s h^2)/g = (12 x 7 + 2 x 49)/0.05.
    const step = 1e-4;
    const slope = addedFill(12, 7 - step, 7 + step, 2, 0.05) / (2 * step);
    expect(Math.abs(slope / 3640 - 1)).toBeLessThan(1e-3);
  });

  it('addedFill equals the plan area under the fill summed over the lift', () => {
    let sum = 0;
    const steps = 20_000;
    for (let i = 0; i < steps; i += 1) {
      const h = 5 + (2 * (i + 0.5)) / steps;
      sum += (((12 * h + 2 * h * h) / 0.05) * 2) / steps;
    }
    expect(addedFill(12, 5, 7, 2, 0.05)).toBeCloseTo(sum, 2);
  });

  it('addedFill without a lift, or below the ground, is zero', () => {
    expect(addedFill(12, 7, 7, 2, 0.05)).toBe(0);
    expect(addedFill(12, -3, -1, 2, 0.05)).toBe(0);
  });

  it('addedFill refuses a gradient that is not positive', () => {
    expect(() => addedFill(12, 1, 2, 2, 0)).toThrow(RangeError);
    expect(() => addedFill(12, 1, 2, 2, NaN)).toThrow(RangeError);
  });
});

describe('deckSpec', () => {
  it('deckSpec(worked example) measures the strips', () => {
    const { deck, surfacingM } = lowFerry().brief;
    const spec = deckSpec(deck, surfacingM, 'lm1');
    expect(spec).toMatchObject({ widthM: 12.5, carriagewayM: 9, lanes: 2, footwayM: 2, surfacingM: 0.09 });
    // By hand: carriageway from 0.5 to 9.5, middle 5.0, deck middle 6.25.
    expect(spec.carriagewayOffsetM).toBeCloseTo(-1.25, 12);
    // By hand: 0.09 x 23.5 x 9.0 + 2.4 x 2.0 + 3 lines x 5 = 19.035 + 4.8 + 15.
    expect(spec.superimposedKNm).toBeCloseTo(38.835, 9);
  });

  it('deckSpec turned left to right turns the offset and nothing else', () => {
    const { deck } = lowFerry().brief;
    const there = deckSpec(deck, 0.09, 'lm1');
    const back = deckSpec([...deck].reverse(), 0.09, 'lm1');
    expect(back.carriagewayOffsetM).toBeCloseTo(-there.carriagewayOffsetM, 12);
    expect(back.superimposedKNm).toBeCloseTo(there.superimposedKNm, 12);
  });
});

describe('survey', () => {
  const site = survey(lowFerry().brief);

  it('survey(worked example) finds the river as the main opening', () => {
    expect(site.lengthM).toBe(230);
    expect(site.mainOpening).toEqual({ fromM: 1325, toM: 1385, widthM: 60 });
    expect(site.zones.map(({ name, hard }) => [name, hard])).toEqual([
      ['Low Ferry branch, single track', true],
      ['River Wend', true],
    ]);
    expect(site.planRadiusM).toBe(Infinity);
  });

  it('survey joins hard zones that overlap into one opening', () => {
    const { mainOpening } = survey(
      plainBrief({ obstacles: [obstacle(10, 30), obstacle(25, 50), obstacle(70, 90)] }),
    );
    expect(mainOpening).toEqual({ fromM: 10, toM: 50, widthM: 40 });
  });

  it('survey takes the ordinary level and says so where the flood level is unknown', () => {
    const { brief } = lowFerry();
    const waters = [{ ...brief.waters[0]!, floodLevelM: 'unknown' as const }];
    const limit = survey({ ...brief, waters }).soffitLimits.at(-1)!;
    expect(limit.levelM).toBeCloseTo(8.2, 12);
    expect(limit.reason).toContain('flood level unknown');
  });

  it('groundAt interpolates and stays level beyond the survey', () => {
    expect(groundAt(site, 1255)).toBeCloseTo((12.9 + 11.2) / 2, 12);
    expect(groundAt(site, 0)).toBe(18.9);
    expect(groundAt(site, 9999)).toBe(16.7);
  });

  it('waterDepthAt is level minus bed in the river and nothing on land', () => {
    expect(waterDepthAt(site, 1349)).toBeCloseTo(7.2 - 3.7, 12);
    expect(waterDepthAt(site, 1300)).toBe(0);
  });

  it('stretchAt gives the stretch a support stands on, or the nearest', () => {
    expect([1240, 1300, 1400, 1470, 2000].map((x) => stretchAt(site, x))).toEqual([0, 1, 2, 3, 3]);
  });

  it('soffitLimitAt gives the highest limit at a place', () => {
    expect(soffitLimitAt(site, 1272)!.levelM).toBeCloseTo(17.7, 12);
    expect(soffitLimitAt(site, 1276.3)!.kind).toBe('railway');
    expect(soffitLimitAt(site, 1355)!.levelM).toBeCloseTo(11.9, 12);
    expect(soffitLimitAt(site, 1250)).toBeNull();
  });
});

describe('profileFor', () => {
  // A crest of 1000 km is straight but for its sagitta: 100^2 / 8e6 = 1.25 mm in the middle of 100 m.
  const STRAIGHT_M = 1e6;
  const SAGITTA_M = 0.00125;
  const fixedEnd = {
    ...plainBrief().road,
    fixedEnd: 'end',
    crestRadiusM: STRAIGHT_M,
    sagRadiusM: 0,
  } as const;
  const middle = { obstacles: [obstacle(40, 60, clear(50, 50.0001, 5))] };

  it('profileFor without a limit in the way leaves the road where it is and adds no fill', () => {
    const result = profileFor(survey(plainBrief(middle)), 0.9);
    expect(result).toMatchObject({
      ok: true,
      profile: { startRiseM: 0, endRiseM: 0, addedFillM3: 0, gradient: 0 },
    });
  });

  it('profileFor(fixed end, no crest) pivots about it: twice the shortage at the middle, no rise at the end', () => {
    // By hand: 5 + 1.3 - 6 = 0.3 short at the middle less the sagitta; the start rises by twice that.
    const result = profileFor(survey(plainBrief({ ...middle, road: fixedEnd })), 1.3);
    if (!result.ok) throw new Error('expected a road');
    const { profile } = result;
    const rise = 2 * (0.3 - SAGITTA_M);
    expect(profile.startRiseM).toBeCloseTo(rise, 5);
    expect(profile.endRiseM).toBe(0);
    expect(roadLevelAt(profile, 50)).toBeCloseTo(6.3, 5);
  });

  it('profileFor(both ends fixed, no crest) refuses, names the limit and says by how much it is missed', () => {
    const road = { ...fixedEnd, fixedEnd: 'both' } as const;
    const result = profileFor(survey(plainBrief({ ...middle, road })), 1.3);
    if (result.ok) throw new Error('expected a refusal');
    expect(result.refusal).toMatchObject({ kind: 'clearance', riseNeededM: null, limit: { reason: 'line' } });
    expect(result.refusal.missedBy).toBeCloseTo(0.3 - SAGITTA_M, 3);
  });

  it('profileFor refused at the most allowed rise says which rise would do', () => {
    const result = profileFor(survey(plainBrief({ ...middle, road: { ...fixedEnd, mayRiseM: 0.4 } })), 1.3);
    if (result.ok) throw new Error('expected a refusal');
    expect(result.refusal.missedBy).toBeCloseTo(0.1 - SAGITTA_M, 3);
    expect(result.refusal.riseNeededM).toBeCloseTo(0.6 - 2 * SAGITTA_M, 3);
  });

  it('profileFor keeps the gradient limit: both ends rise when one alone would be too steep', () => {
    const road = { ...fixedEnd, fixedEnd: 'none', maxGradient: 0.004, mayRiseM: 2 } as const;
    const near = { obstacles: [obstacle(5, 25, clear(10, 10.0001, 5))] };
    // Straight, the end can fall 0.4 m below the start; with the end fixed the start is stuck there.
    expect(profileFor(survey(plainBrief({ ...near, road: { ...road, fixedEnd: 'end' } })), 2).ok).toBe(false);
    const result = profileFor(survey(plainBrief({ ...near, road })), 2);
    if (!result.ok) throw new Error('expected a line');
    const { profile } = result;
    expect(roadLevelAt(profile, 10)).toBeCloseTo(7, 6);
    expect(Math.abs(profile.gradient)).toBeLessThanOrEqual(0.004);
    expect(profile.steepestGradient).toBeLessThanOrEqual(0.004 + 1e-12);
    // Fill costs more the higher it stands, so no end is spared that could have shared.
    expect(profile.startRiseM).toBeCloseTo(profile.endRiseM + 0.4, 1);
  });

  it('profileFor lifts a road over the middle by a crest alone where that is enough', () => {
    // By hand: an arc of 3000 m over 100 m stands 100^2 / 24000 = 0.4167 m above its chord; 0.3 m takes 4166.7 m.
    const road = { ...fixedEnd, fixedEnd: 'both', crestRadiusM: 3000 } as const;
    const at = (depth: number) => profileFor(survey(plainBrief({ ...middle, road })), depth);
    const low = at(1.3);
    if (!low.ok) throw new Error('expected a crest');
    expect(low.profile.crestRadiusM).toBeCloseTo(10_000 / 2.4, 1);
    expect(low.profile.startRiseM).toBe(0);
    expect(roadLevelAt(low.profile, 50)).toBeCloseTo(6.3, 5);
    expect(at(1.416).ok).toBe(true);
    const high = at(1.5);
    if (high.ok) throw new Error('expected a refusal');
    expect(high.refusal.missedBy).toBeCloseTo(0.5 - 10_000 / 24_000, 3);
  });

  it('profileFor refuses a proposed road that is too steep to begin with', () => {
    const road = { ...fixedEnd, startLevelM: 16, mayRiseM: 1 };
    const result = profileFor(survey(plainBrief({ road })), 1);
    if (result.ok) throw new Error('expected a refusal');
    expect(result.refusal.kind).toBe('gradient');
    expect(result.refusal.missedBy).toBeCloseTo(0.05, 9);
  });

  it('profileFor(depth along) clears with the depth at the place, not with the largest', () => {
    const site = survey(plainBrief(middle));
    const haunched = { xM: [0, 50, 100], depthM: [4, 0.9, 4] };
    const result = profileFor(site, haunched);
    expect(result.ok && result.profile.startRiseM).toBeCloseTo(0, 4);
    expect(profileFor(site, { xM: [0, 50, 100], depthM: [4, 4, 4] }).ok).toBe(false);
  });

  it('profileFor of the worked example: the shallower the deck the lower the road, and every soffit clears', () => {
    const site = survey(lowFerry().brief);
    let before = -1;
    for (const depth of [1.5, 2, 2.5, 3, 3.5, 4]) {
      const result = profileFor(site, depth);
      if (!result.ok) throw new Error(`no line at ${depth} m`);
      const { profile } = result;
      expect(profile.startRiseM).toBeGreaterThanOrEqual(before);
      before = profile.startRiseM;
      for (const { fromM, toM, levelM } of site.soffitLimits)
        for (const x of [fromM, toM])
          expect(roadLevelAt(profile, x) - depth).toBeGreaterThanOrEqual(levelM - 1e-6);
      expect(profile.endLevelM).toBe(18.2);
    }
  });

  it('profileFor refuses a depth that is not positive', () => {
    expect(() => profileFor(survey(plainBrief()), NaN)).toThrow(RangeError);
  });
});
