import { describe, expect, it } from 'vitest';
import type { Brief, Road } from '../../lib/model/index.ts';
import { profileFor, proposedProfile, roadCurves, roadLevelAt, survey } from '../../lib/site/index.ts';
import { plainBrief } from './demoBrief.ts';

const withRoad = (change: Partial<Road>, more: Partial<Brief> = {}): Brief => {
  const plain = plainBrief(more);
  return { ...plain, road: { ...plain.road, ...change } };
};

describe('roadCurves', () => {
  const { road } = plainBrief();
  it('roadCurves(speed) is 100 K of the row at that speed or the next above it', () => {
    // CD 109: K 30 and 20 at 70 km/h, 55 and 20 at 85; AASHTO: K 11 and 18 at 60 km/h (both from memory).
    expect(roadCurves({ ...road, designSpeedKmh: 70 }, 'lm1')).toEqual({
      crestRadiusM: 3000,
      sagRadiusM: 2000,
    });
    expect(roadCurves({ ...road, designSpeedKmh: 71 }, 'lm1')).toEqual({
      crestRadiusM: 5500,
      sagRadiusM: 2000,
    });
    expect(roadCurves({ ...road, designSpeedKmh: 60 }, 'hl93')).toEqual({
      crestRadiusM: 1100,
      sagRadiusM: 1800,
    });
    expect(roadCurves({ ...road, designSpeedKmh: 160 }, 'lm1').crestRadiusM).toBe(18_200);
  });

  it('roadCurves(unknown speed) is that of 70 km/h, and a radius that is given stands', () => {
    expect(roadCurves(road, 'lm1')).toEqual({ crestRadiusM: 3000, sagRadiusM: 2000 });
    expect(roadCurves({ ...road, crestRadiusM: 800 }, 'lm1')).toEqual({
      crestRadiusM: 800,
      sagRadiusM: 2000,
    });
  });
});

describe('approaches', () => {
  const angled = { crestRadiusM: 0, sagRadiusM: 0 } as const;

  it('proposedProfile(level ground) runs out over a crest and a sag whose lengths are R g', () => {
    // 6 m high at 5 %: a crest of 1000 m takes 50 m and 1.25 m, a sag of 800 m takes 40 m and 1.00 m; 3.75 m are left at 5 %.
    const site = survey(withRoad({ crestRadiusM: 1000, sagRadiusM: 800 }));
    const { approaches, pieces } = proposedProfile(site);
    expect(approaches.start.lengthM).toBeCloseTo(50 + 75 + 40, 6);
    expect(approaches.end.lengthM).toBeCloseTo(165, 6);
    expect(pieces.map(({ fromM }) => Math.round(fromM))).toEqual([-165, -125, -50, 0, 100, 150, 225]);
    expect(roadLevelAt({ pieces }, -165)).toBeCloseTo(0, 6);
    expect(roadLevelAt({ pieces }, -50)).toBeCloseTo(4.75, 6);
  });

  it('proposedProfile(ground that rises behind the abutment) fills only what is above it', () => {
    const plain = plainBrief();
    const ground = [
      { chainageM: -60, levelM: 4 },
      { chainageM: -20, levelM: 2 },
      { chainageM: 0, levelM: 0 },
      { chainageM: 100, levelM: 0 },
    ];
    const site = survey(withRoad(angled, { crossing: { ...plain.crossing, ground } }));
    const { start } = proposedProfile(site).approaches;
    // By hand: heights 6, 3 and, where 5 - 0.05 t meets 2 + 0.05 t, 0: 30 m further out; W 12, s 2.
    expect(start.lengthM).toBeCloseTo(50, 6);
    const prism = (h0: number, h1: number, long: number): number =>
      long * ((12 * (h0 + h1)) / 2 + (2 * (h0 * h0 + h0 * h1 + h1 * h1)) / 3);
    expect(start.fillM3).toBeCloseTo(prism(6, 3, 20) + prism(3, 0, 30), 4);
  });

  it('profileFor(an approach that may not reach far) lifts that end only as high as it can run out', () => {
    const limit = (levelM: number) => ({
      ...survey(
        withRoad({ ...angled, fixedEnd: 'end', mayRiseM: 10, startApproachM: 160, maxGradient: 0.05 }),
      ),
      soffitLimits: [{ fromM: 0, toM: 5, levelM, reason: 'lane', kind: 'road' as const }],
    });
    // 160 m at 5 % come down 8 m, so the start may stand at 8.00.
    expect(profileFor(limit(6.5), 1).ok).toBe(true);
    const refused = profileFor(limit(7.2), 1);
    if (refused.ok) throw new Error('expected a refusal');
    expect(refused.refusal.missedBy).toBeCloseTo(0.2, 2);
    expect(refused.refusal.riseNeededM).toBeNull();
  });

  it('proposedProfile(between walls) has W h of fill and 2 h of face', () => {
    // 6 m at 5 %: 120 m; W h^2 / 2g = 4320 m3 and h^2 / g = 720 m2.
    const { start } = proposedProfile(survey(withRoad({ ...angled, approachSides: 'walls' }))).approaches;
    expect(start.fillM3).toBeCloseTo(4320, 6);
    expect(start.wallM2).toBeCloseTo(720, 6);
  });
});
