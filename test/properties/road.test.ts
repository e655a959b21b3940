import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Brief, Obstacle, Road, RoadProfile, Site } from '../../lib/model/index.ts';
import { addedFill, profileFor, roadLevelAt, survey } from '../../lib/site/index.ts';
import { crestBetween, crestLevelAt } from '../../lib/site/crest.ts';
import { plainBrief } from '../site/demoBrief.ts';

/** Evenly spread: what a brief says, not the ends of what a number can hold. */
const figure = (min: number, max: number) =>
  fc.integer({ min: 0, max: 1000 }).map((part) => min + ((max - min) * part) / 1000);

interface Trial {
  readonly brief: Brief;
  readonly depthM: number;
}

/** Crossings with up to three things to clear, uneven ground beyond both ends, and any way of tying the road in. */
const trials: fc.Arbitrary<Trial> = fc
  .record({
    lengthM: figure(30, 900),
    start: figure(4, 12),
    fall: figure(-0.04, 0.04),
    crestRadiusM: fc.oneof(fc.constantFrom(0, 1000, 3000, 10_000), figure(100, 20_000)),
    sagRadiusM: fc.constantFrom(0, 900, 2000),
    maxGradient: figure(0.041, 0.08),
    mayRiseM: figure(0, 12),
    fixedEnd: fc.constantFrom('start', 'end', 'both', 'none'),
    startTieIn: fc.constantFrom('moves', 'fixed'),
    endTieIn: fc.constantFrom('moves', 'fixed'),
    startApproachM: fc.oneof(fc.constant('unknown' as const), figure(60, 600)),
    endApproachM: fc.oneof(fc.constant('unknown' as const), figure(60, 600)),
    approachSides: fc.constantFrom('slopes', 'walls'),
    clear: fc.array(fc.record({ at: figure(0.02, 0.9), wide: figure(0.01, 0.1), over: figure(-2, 6) }), {
      maxLength: 3,
    }),
    ground: fc.array(figure(-2, 3), { minLength: 4, maxLength: 4 }),
    depthM: figure(0.8, 3),
  })
  .map(({ lengthM, start, fall, clear, ground, depthM, ...road }) => {
    const plain = plainBrief();
    const [a, b, c, d] = ground as [number, number, number, number];
    const chord = (x: number): number => start + fall * x;
    const obstacles = clear.map(({ at, wide, over }, i): Obstacle => {
      const fromM = at * lengthM;
      const toM = Math.min(lengthM, fromM + wide * lengthM);
      return {
        kind: 'road',
        name: `way ${i}`,
        fromM,
        toM,
        supports: 'none',
        pierPremium: 'unknown',
        clearance: {
          fromM,
          toM,
          datumLevelM: chord(fromM) - depthM + over - 3,
          headroomM: 3,
          confirmed: true,
        },
      };
    });
    const given: Road = {
      ...plain.road,
      ...(road as Partial<Road>),
      startLevelM: start,
      endLevelM: chord(lengthM),
    };
    return {
      depthM,
      brief: {
        ...plain,
        crossing: {
          ...plain.crossing,
          startM: 0,
          endM: lengthM,
          ground: [
            { chainageM: -150, levelM: a },
            { chainageM: -40, levelM: b },
            { chainageM: 0, levelM: 0 },
            { chainageM: lengthM, levelM: 0 },
            { chainageM: lengthM + 40, levelM: c },
            { chainageM: lengthM + 150, levelM: d },
          ],
        },
        road: given,
        obstacles,
      },
    };
  });

const profileOf = (site: Site, depthM: number): RoadProfile | null => {
  const found = profileFor(site, depthM);
  return found.ok ? found.profile : null;
};

/** What raised ends cost: fill at the limiting gradient over level ground, and a little for the level itself. */
function endCost(site: Site, startLevelM: number, endLevelM: number): number {
  const { road, deck } = site;
  const slope = road.approachSides === 'walls' ? 0 : road.fillSideSlope;
  return [startLevelM, endLevelM].reduce(
    (sum, level) => sum + addedFill(deck.widthM, 0, level, slope, road.maxGradient) + deck.widthM * level,
    0,
  );
}

const seed = 20260101;

describe('profileFor on any crossing', () => {
  it('keeps every clearance, gradient and curve at stations of 0.1 m, and has no steps or breaks', () => {
    let roads = 0;
    fc.assert(
      fc.property(trials, ({ brief, depthM }) => {
        const site = survey(brief);
        const profile = profileOf(site, depthM);
        if (profile === null) return;
        roads += 1;
        const { pieces } = profile;
        const { road, roadCurves } = site;
        const at = (x: number): number => roadLevelAt(profile, x);
        for (const [i, piece] of pieces.entries()) {
          const next = pieces[i + 1];
          const last = piece.gradient + piece.curvature1PerM * (piece.toM - piece.fromM);
          for (const gradient of [piece.gradient, last])
            expect(Math.abs(gradient)).toBeLessThanOrEqual(road.maxGradient + 1e-9);
          if (roadCurves.crestRadiusM > 0)
            expect(-piece.curvature1PerM).toBeLessThanOrEqual((1 + 1e-9) / roadCurves.crestRadiusM);
          if (roadCurves.sagRadiusM > 0)
            expect(piece.curvature1PerM).toBeLessThanOrEqual((1 + 1e-9) / roadCurves.sagRadiusM);
          if (next === undefined) continue;
          expect(next.fromM).toBeCloseTo(piece.toM, 6);
          const t = piece.toM - piece.fromM;
          expect(next.levelM).toBeCloseTo(
            piece.levelM + piece.gradient * t + (piece.curvature1PerM * t * t) / 2,
            6,
          );
          // Gradients may meet at an angle only where no curve is asked for.
          if (roadCurves.crestRadiusM > 0 && roadCurves.sagRadiusM > 0)
            expect(next.gradient).toBeCloseTo(last, 6);
        }
        for (let x = site.startM; x <= site.endM; x += 0.1) {
          for (const { fromM, toM, levelM } of site.soffitLimits)
            if (x >= fromM && x <= toM) expect(at(x) - depthM).toBeGreaterThanOrEqual(levelM - 1e-6);
        }
        expect(profile.startRiseM).toBeGreaterThanOrEqual(0);
        expect(profile.endRiseM).toBeGreaterThanOrEqual(0);
        const most = (end: 'start' | 'end') =>
          road.fixedEnd === end || road.fixedEnd === 'both' ? 0 : road.mayRiseM;
        expect(profile.startRiseM).toBeLessThanOrEqual(most('start') + 1e-6);
        expect(profile.endRiseM).toBeLessThanOrEqual(most('end') + 1e-6);
      }),
      { seed, numRuns: 120 },
    );
    expect(roads).toBeGreaterThan(40);
  });

  it('is turned round with the crossing', () => {
    fc.assert(
      fc.property(trials, ({ brief, depthM }) => {
        const { endM } = brief.crossing;
        const turn = (x: number): number => endM - x;
        const swap = { start: 'end', end: 'start', both: 'both', none: 'none' } as const;
        const { road } = brief;
        const turned: Brief = {
          ...brief,
          crossing: {
            ...brief.crossing,
            ground: brief.crossing.ground.map((p) => ({ ...p, chainageM: turn(p.chainageM) })).reverse(),
          },
          road: {
            ...road,
            startLevelM: road.endLevelM,
            endLevelM: road.startLevelM,
            fixedEnd: swap[road.fixedEnd],
            startTieIn: road.endTieIn,
            endTieIn: road.startTieIn,
            startApproachM: road.endApproachM,
            endApproachM: road.startApproachM,
          },
          obstacles: brief.obstacles.map((o) => ({
            ...o,
            fromM: turn(o.toM),
            toM: turn(o.fromM),
            clearance: o.clearance && {
              ...o.clearance,
              fromM: turn(o.clearance.toM),
              toM: turn(o.clearance.fromM),
            },
          })),
        };
        const one = profileOf(survey(brief), depthM);
        const other = profileOf(survey(turned), depthM);
        expect(other === null).toBe(one === null);
        if (one === null || other === null) return;
        for (let i = 0; i <= 20; i += 1) {
          const x = (endM * i) / 20;
          expect(roadLevelAt(other, turn(x))).toBeCloseTo(roadLevelAt(one, x), 3);
        }
        expect(other.approaches.start.fillM3 / Math.max(1, one.approaches.end.fillM3)).toBeCloseTo(
          one.approaches.end.fillM3 / Math.max(1, one.approaches.end.fillM3),
          2,
        );
      }),
      { seed, numRuns: 150 },
    );
  });

  it('never gets cheaper where a clearance is raised, and where one end is fixed the other never comes down', () => {
    let raised = 0;
    fc.assert(
      fc.property(trials, figure(0, 1), ({ brief, depthM }, by) => {
        const site = survey(brief);
        const before = profileOf(site, depthM);
        const lifted = site.soffitLimits.map((limit, i) =>
          i === 0 ? { ...limit, levelM: limit.levelM + by } : limit,
        );
        const after = profileOf({ ...site, soffitLimits: lifted }, depthM);
        if (before === null) {
          expect(after).toBeNull();
          return;
        }
        if (after === null || site.soffitLimits.length === 0) return;
        raised += 1;
        const cost = (profile: RoadProfile): number => endCost(site, profile.startLevelM, profile.endLevelM);
        expect(cost(after)).toBeGreaterThanOrEqual(cost(before) * (1 - 1e-6) - 1e-3);
        if (site.road.fixedEnd === 'none') return;
        expect(after.startLevelM).toBeGreaterThanOrEqual(before.startLevelM - 1e-6);
        expect(after.endLevelM).toBeGreaterThanOrEqual(before.endLevelM - 1e-6);
        for (let i = 0; i <= 20; i += 1) {
          const x = (site.endM * i) / 20;
          expect(roadLevelAt(after, x)).toBeGreaterThanOrEqual(roadLevelAt(before, x) - 1e-5);
        }
      }),
      { seed, numRuns: 200 },
    );
    expect(raised).toBeGreaterThan(40);
  });

  it('has the cheapest ends: every pair of levels on a grid under the sharpest crest is dearer or does not clear', () => {
    let compared = 0;
    fc.assert(
      fc.property(trials, ({ brief, depthM }) => {
        const free = { ...brief.road, startTieIn: 'moves', endTieIn: 'moves' } as const;
        const site = survey({
          ...brief,
          road: { ...free, startApproachM: 'unknown', endApproachM: 'unknown' },
        });
        const profile = profileOf(site, depthM);
        if (profile === null) return;
        const { road, startM, endM, roadCurves } = site;
        const ours = endCost(site, profile.startLevelM, profile.endLevelM);
        const steps = (end: 'start' | 'end'): number[] =>
          road.fixedEnd === end || road.fixedEnd === 'both'
            ? [0]
            : Array.from({ length: 41 }, (_, i) => (i / 40) * road.mayRiseM);
        for (const start of steps('start').map((rise) => road.startLevelM + rise)) {
          for (const end of steps('end').map((rise) => road.endLevelM + rise)) {
            if (endCost(site, start, end) >= ours - 1e-3) continue;
            compared += 1;
            const crest = crestBetween(startM, endM, start, end, roadCurves.crestRadiusM, road.maxGradient);
            const clears =
              crest !== null &&
              site.soffitLimits.every(({ fromM, toM, levelM }) =>
                [fromM, toM].every((x) => crestLevelAt(crest, x) - depthM >= levelM),
              );
            expect(clears).toBe(false);
          }
        }
      }),
      { seed, numRuns: 150 },
    );
    expect(compared).toBeGreaterThan(500);
  });
});
