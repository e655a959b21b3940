import { describe, expect, it } from 'vitest';
import type { Brief, Obstacle } from '../../lib/model/index.ts';
import {
  abutmentWindows,
  profileFor,
  proposedProfile,
  siteOf,
  standBetween,
  survey,
} from '../../lib/site/index.ts';
import { plainBrief } from './demoBrief.ts';

const withWindows = (
  startLatestM: number | 'unknown',
  endEarliestM: number | 'unknown',
  more: Partial<Brief> = {},
) => {
  const plain = plainBrief(more);
  return survey({ ...plain, crossing: { ...plain.crossing, startLatestM, endEarliestM } });
};

const barred = (fromM: number, toM: number, supports: Obstacle['supports']): Obstacle => ({
  kind: 'road',
  name: 'Lane',
  fromM,
  toM,
  supports,
  pierPremium: 'unknown',
  clearance: null,
});

describe('survey', () => {
  it('survey(brief without windows, or with windows of no width) is the same site', () => {
    const fixed = survey(plainBrief());
    expect(withWindows('unknown', 'unknown')).toEqual(fixed);
    expect(withWindows(0, 100)).toEqual(fixed);
    expect(fixed).not.toHaveProperty('windows');
    expect(withWindows(30, 'unknown').windows).toEqual({ startLatestM: 30, endEarliestM: 100 });
  });
});

describe('standBetween', () => {
  it('standBetween(site, its ends) is the site itself, and the same places are the same object', () => {
    const site = withWindows(30, 80);
    expect(standBetween(site, 0, 100)).toBe(site);
    expect(standBetween(site, 20, 90)).toBe(standBetween(site, 20, 90));
    expect(standBetween(site, 20, 90)).toMatchObject({
      startM: 20,
      endM: 90,
      lengthM: 70,
      roadEnds: { startM: 0, endM: 100 },
    });
    expect(siteOf(site, [{ form: 'slab', role: 'main', supportsM: [20, 90] }])).toBe(
      standBetween(site, 20, 90),
    );
  });

  it('standBetween(site, abutment farther in) adds W h + s h^2 of fill for every metre, or W h and two faces between walls', () => {
    // By hand: 12 m wide and 6 m high at 2 to 1: 12 x 6 + 2 x 36 = 144 m3 a metre; between walls 72 m3 and 12 m2.
    for (const [approachSides, perM, faceM] of [
      ['slopes', 144, 0],
      ['walls', 72, 12],
    ] as const) {
      const site = withWindows(30, 80, { road: { ...plainBrief().road, approachSides } });
      const before = proposedProfile(site).approaches;
      const after = proposedProfile(standBetween(site, 25, 90)).approaches;
      expect(after.start.fillM3 - before.start.fillM3).toBeCloseTo(25 * perM, 6);
      expect(after.end.fillM3 - before.end.fillM3).toBeCloseTo(10 * perM, 6);
      expect(after.start.wallM2 - before.start.wallM2).toBeCloseTo(25 * faceM, 6);
      expect(after.end.lengthM - before.end.lengthM).toBeCloseTo(10, 9);
    }
  });

  it('standBetween(site, anywhere) keeps the road of the crossing where what it must clear stays under the bridge', () => {
    const obstacles = [
      {
        ...barred(44, 56, 'hard'),
        clearance: { fromM: 45, toM: 55, datumLevelM: 0, headroomM: 5.3, confirmed: true },
      },
    ];
    for (const fixedEnd of ['none', 'start', 'both'] as const) {
      const road = { ...plainBrief().road, fixedEnd, crestRadiusM: 400, sagRadiusM: 400, mayRiseM: 4 };
      const site = withWindows(40, 60, { obstacles, road });
      const whole = profileFor(site, 1.5);
      const part = profileFor(standBetween(site, 31, 68), 1.5);
      if (!whole.ok || !part.ok) throw new Error('no road');
      expect(part.profile.pieces).toEqual(whole.profile.pieces);
      expect(part.profile.startLevelM).toBe(whole.profile.startLevelM);
      // Fixed or free, the fill beyond the crossing is what it was.
      expect(part.profile.addedFillM3).toBeGreaterThan(whole.profile.addedFillM3 - 1e-6);
    }
  });
});

describe('abutmentWindows', () => {
  it('abutmentWindows(site) goes as far in as the brief says, or up to what the fill would bury', () => {
    expect(abutmentWindows(withWindows(30, 80), 1.5)).toEqual({ start: [0, 30], end: [80, 100] });
    for (const supports of ['hard', 'soft'] as const) {
      const obstacles = [barred(20, 40, supports)];
      expect(abutmentWindows(withWindows(30, 30.5, { obstacles }), 1.5)).toEqual({
        start: [0, 18.5],
        end: [41.5, 100],
      });
    }
    expect(abutmentWindows(survey(plainBrief()), 1.5)).toEqual({ start: [0, 0], end: [100, 100] });
  });

  it('abutmentWindows(site) keeps out of headroom and of water, and may stand on a flood plain', () => {
    const clearance = { fromM: 60, toM: 70, datumLevelM: 0, headroomM: 2, confirmed: true };
    const obstacles = [{ ...barred(62, 68, 'none'), clearance }];
    expect(abutmentWindows(withWindows(90, 95, { obstacles }), 1.5).start).toEqual([0, 58.5]);
    const water = {
      name: 'Brook',
      fromM: 50,
      toM: 55,
      levelM: -1,
      floodLevelM: 1,
      floodReturnYears: 100,
      freeboardM: 0.6,
      floodFromM: 5,
      floodToM: 95,
      flowM3s: 'unknown',
      velocityMs: 'unknown',
      allowedAffluxM: 'unknown',
      grainMm: 'unknown',
      siltFactor: 'unknown',
      vesselDwtT: 'unknown',
      vesselSpeedMs: 'unknown',
    } as const;
    expect(abutmentWindows(withWindows(60, 61, { waters: [water] }), 1.5)).toEqual({
      start: [0, 48.5],
      end: [61, 100],
    });
  });
});
