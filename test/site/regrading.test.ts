import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Brief, Regrading, Road, RoadPiece } from '../../lib/model/index.ts';
import { easedProfile, profileFor, proposedProfile, roadLevelAt, survey } from '../../lib/site/index.ts';
import { pieceGradientAt, pieceLevelAt } from '../../lib/site/roadLevelAt.ts';
import { plainBrief } from './demoBrief.ts';

const withRoad = (change: Partial<Road>, more: Partial<Brief> = {}): Brief => {
  const plain = plainBrief(more);
  return { ...plain, road: { ...plain.road, ...change } };
};

/** Level at 6 m from 0 to 100, its end tied to a road that falls away at 5 %, curves of 2000 m, walls upright. */
const falling = {
  fixedEnd: 'end',
  endGradient: -0.05,
  crestRadiusM: 2000,
  sagRadiusM: 2000,
  maxGradient: 0.1,
  approachSides: 'walls',
} as const;

const behindEnd = (road: Partial<Road>): Regrading => {
  const { regrading } = proposedProfile(survey(withRoad(road)));
  if (regrading?.end === undefined) throw new Error('expected a regrading behind the end');
  return regrading.end;
};

/** Pieces of a road behind the end of the crossing at 100. */
const beyond = (pieces: readonly RoadPiece[]): RoadPiece[] => pieces.filter(({ fromM }) => fromM >= 100);

describe('the road behind a fixed end', () => {
  it('R 2000 and a change of gradient of 0.05 take a curve of 100 m with tangents of 50 m and an offset of 0.625 m', () => {
    // By hand: L = R d = 100; T = L/2 = 50; T^2 / 2R = 0.625; the road runs parallel R d^2 / 2 = 2.5 m above the old one.
    expect(behindEnd(falling)).toMatchObject({
      kind: 'crest',
      radiusM: 2000,
      comesBack: true,
    });
    const { gradientChange, curveM, tangentM, offsetM, apartM } = behindEnd(falling);
    expect(gradientChange).toBeCloseTo(0.05, 12);
    expect(curveM).toBeCloseTo(100, 9);
    expect(tangentM).toBeCloseTo(50, 9);
    expect(offsetM).toBeCloseTo(0.625, 12);
    expect(apartM).toBeCloseTo(2.5, 12);
    // The same read off the road: below the tangent from the abutment by the offset, above the old road by 2.5 m.
    const profile = proposedProfile(survey(withRoad(falling)));
    expect(6 - roadLevelAt(profile, 150)).toBeCloseTo(0.625, 9);
    expect(roadLevelAt(profile, 200) - (6 - 0.05 * 100)).toBeCloseTo(2.5, 9);
  });

  it('equal radii meet the existing road after R d (1 + sqrt 2), tangent to it', () => {
    const { lengthM, fillM3, cutM3, wallM2 } = behindEnd(falling);
    expect(lengthM).toBeCloseTo(100 * (1 + Math.SQRT2), 9);
    const { pieces } = proposedProfile(survey(withRoad(falling)));
    const last = pieces.at(-1)!;
    expect(last.toM).toBeCloseTo(100 + lengthM, 9);
    expect(pieceLevelAt(last, last.toM)).toBeCloseTo(6 - 0.05 * lengthM, 9);
    expect(pieceGradientAt(last, last.toM)).toBeCloseTo(-0.05, 12);
    // By hand: with y = d x - x^2 / 2R up to a = R (d + t), t = d / sqrt 2, and u^2 / 2R over the last R t.
    const [R, d] = [2000, 0.05];
    const t = d / Math.SQRT2;
    const a = R * (d + t);
    const area = (d * a * a) / 2 - a ** 3 / (6 * R) + (R * t) ** 3 / (6 * R);
    const { widthM } = survey(plainBrief()).deck;
    expect(fillM3).toBeCloseTo(widthM * area, 6);
    expect(wallM2).toBeCloseTo(2 * area, 6);
    expect(cutM3).toBe(0);
  });

  it('a road that falls away less than the deck takes a sag, and the same volume is cut', () => {
    const up = behindEnd({ ...falling, endGradient: 0.05 });
    expect(up).toMatchObject({ kind: 'sag', fillM3: 0, comesBack: true });
    expect(up.cutM3).toBeCloseTo(behindEnd(falling).fillM3, 6);
    expect(up.lengthM).toBeCloseTo(behindEnd(falling).lengthM, 9);
  });

  it('where the way back would be too steep, a straight grade at the limit makes up the rest', () => {
    // By hand: t = 0.06 - 0.05; 2000 x 0.05^2 / 2 - 4000 x 0.01^2 / 2 = 2.3 m at 1 % is 230 m; curves 120 and 20 m.
    const behind = behindEnd({ ...falling, maxGradient: 0.06 });
    expect(behind.lengthM).toBeCloseTo(120 + 230 + 20, 6);
    const { pieces } = proposedProfile(survey(withRoad({ ...falling, maxGradient: 0.06 })));
    for (const piece of beyond(pieces))
      for (const x of [piece.fromM, piece.toM])
        expect(Math.abs(pieceGradientAt(piece, x))).toBeLessThanOrEqual(0.06 + 1e-12);
    expect(roadLevelAt({ pieces }, 470)).toBeCloseTo(6 - 0.05 * 370, 6);
  });

  it('a road as steep as is allowed is not met again, and one without curves goes on at an angle', () => {
    expect(behindEnd({ ...falling, maxGradient: 0.05 })).toMatchObject({ comesBack: false, curveM: 100 });
    expect(behindEnd({ ...falling, crestRadiusM: 0 })).toMatchObject({
      lengthM: 0,
      comesBack: true,
      fillM3: 0,
    });
    expect(behindEnd({ ...falling, endGradient: 0 })).toMatchObject({
      lengthM: 0,
      curveM: 0,
      comesBack: true,
    });
  });

  it('a gradient that is absent, unknown or given behind a free end changes nothing', () => {
    const without = { ...falling, endGradient: 'unknown', startGradient: -0.03 } as const;
    const { endGradient: _held, ...absent } = falling;
    const said = (road: Partial<Road>): string => JSON.stringify(profileFor(survey(withRoad(road)), 1));
    expect(said(without)).toBe(said(absent));
    expect(said(absent)).not.toContain('regrading');
    expect(said(falling)).not.toBe(said(absent));
  });

  const figure = (min: number, max: number) =>
    fc.integer({ min: 0, max: 1000 }).map((part) => min + ((max - min) * part) / 1000);
  const roads = fc.record({
    startLevelM: figure(4, 8),
    endLevelM: figure(4, 8),
    startGradient: figure(-0.07, 0.07),
    endGradient: figure(-0.07, 0.07),
    crestRadiusM: figure(200, 8000),
    sagRadiusM: figure(200, 8000),
    maxGradient: fc.constant(0.08),
    approachSides: fc.constantFrom('slopes', 'walls'),
    fixedEnd: fc.constant('both'),
  });
  const seed = 20260407;

  it('has no steps or breaks, keeps gradients and curves, and ends on the existing road', () => {
    fc.assert(
      fc.property(roads, (road) => {
        const site = survey(withRoad(road));
        const { pieces, regrading } = proposedProfile(site);
        pieces.forEach((piece, i) => {
          for (const x of [piece.fromM, piece.toM])
            expect(Math.abs(pieceGradientAt(piece, x))).toBeLessThanOrEqual(0.08 + 1e-9);
          expect(-piece.curvature1PerM).toBeLessThanOrEqual((1 + 1e-9) / road.crestRadiusM);
          expect(piece.curvature1PerM).toBeLessThanOrEqual((1 + 1e-9) / road.sagRadiusM);
          const next = pieces[i + 1];
          if (next === undefined) return;
          expect(next.fromM).toBeCloseTo(piece.toM, 6);
          expect(next.levelM).toBeCloseTo(pieceLevelAt(piece, piece.toM), 6);
          expect(next.gradient).toBeCloseTo(pieceGradientAt(piece, piece.toM), 9);
        });
        const [first, last] = [pieces[0]!, pieces.at(-1)!];
        expect(regrading).toMatchObject({ start: { comesBack: true }, end: { comesBack: true } });
        if (regrading!.start!.lengthM > 0) {
          expect(first.gradient).toBeCloseTo(road.startGradient, 9);
          expect(first.levelM).toBeCloseTo(road.startLevelM + road.startGradient * first.fromM, 6);
        }
        if (regrading!.end!.lengthM > 0) {
          expect(pieceGradientAt(last, last.toM)).toBeCloseTo(road.endGradient, 9);
          expect(pieceLevelAt(last, last.toM)).toBeCloseTo(
            road.endLevelM + road.endGradient * (last.toM - 100),
            6,
          );
        }
      }),
      { seed, numRuns: 300 },
    );
  });

  it('takes more of everything the farther the gradient of the existing road is from that of the deck', () => {
    fc.assert(
      fc.property(roads, figure(0, 1), (road, share) => {
        const deck = (road.endLevelM - road.startLevelM) / 100;
        const nearer = deck + share * (road.endGradient - deck);
        const [less, more] = [nearer, road.endGradient].map((endGradient) =>
          behindEnd({ ...road, endGradient }),
        ) as [Regrading, Regrading];
        for (const field of ['curveM', 'lengthM', 'fillM3', 'cutM3', 'wallM2', 'apartM'] as const)
          expect(more[field]).toBeGreaterThanOrEqual(less[field] - 1e-9 * (1 + less[field]));
      }),
      { seed, numRuns: 300 },
    );
  });

  it('is turned round with the crossing', () => {
    fc.assert(
      fc.property(roads, (road) => {
        const turned = {
          ...road,
          startLevelM: road.endLevelM,
          endLevelM: road.startLevelM,
          startGradient: -road.endGradient,
          endGradient: -road.startGradient,
        };
        const one = proposedProfile(survey(withRoad(road))).regrading!;
        const other = proposedProfile(survey(withRoad(turned))).regrading!;
        for (const [a, b] of [
          [one.start!, other.end!],
          [one.end!, other.start!],
        ] as const) {
          expect(b.kind).toBe(a.kind);
          for (const field of ['curveM', 'lengthM', 'fillM3', 'cutM3', 'wallM2'] as const)
            expect(b[field]).toBeCloseTo(a[field], 6);
        }
      }),
      { seed, numRuns: 200 },
    );
  });
});

describe('a crest that spares the curve behind a fixed end', () => {
  const eased = (road: Partial<Road>) => {
    const site = survey(withRoad({ ...falling, ...road }));
    const lowest = proposedProfile(site);
    return { site, lowest, profile: easedProfile(site, lowest, 'end') };
  };

  it('has half its length over the gradient for a radius and leads into the existing road without a curve', () => {
    // By hand: level ends 100 m apart and 2 % to fall into at one of them: 100 / (2 x 0.02) = 2500 m, 0.5 m over the middle.
    const { profile, lowest } = eased({ endGradient: -0.02 });
    expect(profile).toMatchObject({ easedFor: 'end', startLevelM: 6, endLevelM: 6 });
    expect(profile!.crestRadiusM).toBeCloseTo(2500, 9);
    expect(roadLevelAt(profile!, 50)).toBeCloseTo(6.5, 9);
    expect(profile!.regrading!.end!.gradientChange).toBeCloseTo(0, 12);
    expect(profile!.regrading!.end!.lengthM).toBeCloseTo(0, 9);
    expect(lowest.regrading!.end!.lengthM).toBeGreaterThan(90);
    for (let x = 0; x <= 100; x += 10)
      expect(roadLevelAt(profile!, x)).toBeGreaterThanOrEqual(roadLevelAt(lowest, x));
  });

  it('is no sharper than is allowed: then the curve is spared as far as that goes', () => {
    const { profile, lowest } = eased({ endGradient: -0.05 });
    expect(profile!.crestRadiusM).toBe(2000);
    // 100 / (2 x 2000) = 0.025 of 0.05: half of the way.
    expect(profile!.regrading!.end!.gradientChange).toBeCloseTo(0.025, 12);
    expect(profile!.regrading!.end!.lengthM / lowest.regrading!.end!.lengthM).toBeCloseTo(0.5, 9);
  });

  it('is not there where the road behind rises, is not known, or its end is free', () => {
    for (const road of [
      { endGradient: 0.02 },
      { endGradient: 0 },
      { endGradient: 'unknown' },
      { fixedEnd: 'none' },
    ] as const)
      expect(eased(road).profile).toBeNull();
  });

  it('clears what the lowest road clears, between the same ends', () => {
    const site = survey(withRoad({ ...falling, endGradient: -0.03, mayRiseM: 3 }));
    let spared = 0;
    fc.assert(
      fc.property(fc.double({ min: 0.3, max: 3, noNaN: true }), (depthM) => {
        const found = profileFor(site, depthM);
        if (!found.ok) return;
        const profile = easedProfile(site, found.profile, 'end');
        if (profile === null) return;
        spared += 1;
        expect(profile.startLevelM).toBe(found.profile.startLevelM);
        expect(profile.endLevelM).toBe(found.profile.endLevelM);
        for (let x = 0; x <= 100; x += 5)
          expect(roadLevelAt(profile, x)).toBeGreaterThanOrEqual(roadLevelAt(found.profile, x) - 1e-9);
      }),
      { seed: 7, numRuns: 60 },
    );
    expect(spared).toBeGreaterThan(10);
  });
});
