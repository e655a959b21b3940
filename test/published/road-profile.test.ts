import { describe, expect, it } from 'vitest';
import type { Brief, Road } from '../../lib/model/index.ts';
import { profileFor, survey } from '../../lib/site/index.ts';
import { plainBrief } from '../site/demoBrief.ts';

/*
 * Fill of one approach against a rigid lift of the road, worked out from first principles for a formation W = 12 m,
 * 7 m of height at the abutment, side slopes s = 2, a limiting gradient g = 5 % and level ground:
 * dV/dh is the plan area under the fill that is lifted.
 */
const W = 12;
const h = 7;
const s = 2;
const g = 0.05;

const DEPTH_M = 1;

/** A bridge that is to be kept clear from end to end, so that a deeper deck lifts it as it is. */
function lifted(change: Partial<Road>): Brief {
  const plain = plainBrief();
  return {
    ...plain,
    road: {
      ...plain.road,
      startLevelM: 5,
      endLevelM: 5,
      fixedEnd: 'end',
      mayRiseM: 5,
      maxGradient: g,
      fillSideSlope: s,
      crestRadiusM: 0,
      sagRadiusM: 0,
      ...change,
    },
  };
}

/** Rise of the fill at the start for each metre of depth, about 7 m of height, m3 per m. */
function perMetre(change: Partial<Road>, step = 1e-3): number {
  const brief = lifted(change);
  const from = brief.crossing.startM;
  const to = brief.crossing.endM;
  const fillAt = (levelM: number): number => {
    const site = {
      ...survey(brief),
      soffitLimits: [
        { fromM: from, toM: to, levelM: levelM - DEPTH_M, reason: 'deck', kind: 'road' as const },
      ],
    };
    const found = profileFor(site, DEPTH_M);
    if (!found.ok) throw new Error(`no road at ${levelM}`);
    expect(found.profile.startLevelM).toBeCloseTo(levelM, 9);
    return found.profile.approaches.start.fillM3;
  };
  return (fillAt(h + step) - fillAt(h - step)) / (2 * step);
}

describe('fill for each metre of depth', () => {
  it('profileFor(tie-in that moves, one limiting gradient) gives (W h + s h^2)/g = 3640 m3 per m', () => {
    const ours = perMetre({ fixedEnd: 'none' });
    expect(ours / 3640).toBeCloseTo(1, 3);
    expect(ours / ((W * h + s * h * h) / g)).toBeCloseTo(1, 6);
  });

  it('profileFor(tie-in that stays 140 m behind) turns about it: L (W/2 + 2 s h/3) = 2147 m3 per m', () => {
    const L = h / g;
    const stays = { fixedEnd: 'none', startTieIn: 'fixed', startApproachM: L, maxGradient: 0.06 } as const;
    const ours = perMetre(stays);
    expect(ours / 2147).toBeCloseTo(1, 3);
    expect(ours / (L * (W / 2 + (2 * s * h) / 3))).toBeCloseTo(1, 6);
  });

  it('profileFor(crest of 3000 m tangent at the abutment) moves 6453 m3 per m', () => {
    expect(perMetre({ fixedEnd: 'none', crestRadiusM: 3000 }) / 6453).toBeCloseTo(1, 3);
  });

  it('profileFor(both ends fixed) moves nothing', () => {
    const brief = lifted({ fixedEnd: 'both' });
    const site = survey(brief);
    const fills = [0.5, 1, 2].map((depth) => {
      const found = profileFor(site, depth);
      return found.ok ? found.profile.approaches : null;
    });
    expect(fills[0]).not.toBeNull();
    expect(fills[1]).toEqual(fills[0]);
    expect(fills[2]).toEqual(fills[0]);
  });
});
