import { expect, it } from 'vitest';
import type { MeasuredLine, Site, Support } from '../../lib/model/index.ts';
import {
  deckOnSupport,
  expectedLines,
  standOneSupport,
  standPierBetween,
  standSupports,
} from '../../lib/substructure/index.ts';
import { crossing, plainDesign, profile, unitOn } from './crossing.ts';

const sum = (lines: readonly MeasuredLine[], item: string): number =>
  lines.reduce((total, line) => (line.item === item ? total + line.quantity : total), 0);

const threeSpans = (): Support[] =>
  standSupports(crossing, [unitOn([0, 60, 140, 200])], [plainDesign([60, 80, 60])], profile);

it('standSupports(one unit) stands abutments at the ends and piers between, on the ground, under the soffit', () => {
  const supports = threeSpans();
  expect(supports.map((s) => s.kind)).toEqual(['abutment', 'pier', 'pier', 'abutment']);
  for (const support of supports) {
    expect(support.topLevelM).toBeLessThan(10 - 2.5 - 0.09);
    expect(support.heightM).toBeCloseTo(support.topLevelM - support.groundLevelM, 9);
    expect(support.foundations.map((f) => f.ground)).toEqual(['gravel', 'soft-clay']);
    expect(support.foundations.reduce((total, f) => total + f.odds, 0)).toBeCloseTo(1, 12);
  }
});

it('standSupports(ground that is followed) founds as deep below the ground on the side of a valley as on its floor', () => {
  // Sides that fall by 20 m over 60 m, as steep as those of a valley cut into what bears.
  const valley = (bearing: { bearingDepthM: number } | { bearingLevelM: number }): Site => ({
    ...crossing,
    groundX: [0, 60, 140, 200],
    groundZ: [0, -20, -20, 0],
    waters: [],
    groundStretches: [
      { fromM: 0, toM: 200, known: false, classes: [{ ground: 'gravel', ...bearing, odds: 1 }] },
    ],
  });
  const spans = [30, 40, 60, 40, 30];
  const supports = (site: Site): Support[] =>
    standSupports(site, [unitOn([0, 30, 70, 130, 170, 200])], [plainDesign(spans)], profile);
  const below = ({ groundLevelM, foundations: [one] }: Support): number => groundLevelM - one!.bearingLevelM;
  const pilesM3 = ({ foundations: [one] }: Support): number => sum(one!.lines, 'bored-pile');
  for (const support of supports(valley({ bearingDepthM: 7 }))) expect(below(support)).toBeCloseTo(7, 9);
  const level = supports(valley({ bearingLevelM: -27 }));
  expect(below(level[2]!)).toBeCloseTo(7, 9);
  expect(below(level[1]!)).toBeCloseTo(17, 9);
  // Piles on the side reach the level stratum through ten metres more.
  const followed = supports(valley({ bearingDepthM: 7 }));
  expect(pilesM3(level[1]!)).toBeGreaterThan(1.2 * pilesM3(followed[1]!));
  expect(pilesM3(level[2]!)).toBe(pilesM3(followed[2]!));
});

it('standSupports(one unit) has one fixed point, joints at the ends only, and movement that grows with distance', () => {
  const supports = threeSpans();
  expect(supports.map((s) => s.articulation.fixed)).toEqual([false, true, false, false]);
  const [start, one, two, end] = supports.map((s) => s.articulation.jointMovementMm);
  expect([one, two]).toEqual([0, 0]);
  expect(end! / start!).toBeCloseTo(140 / 60, 9);
  expect(supports[1]!.articulation.alongKN).toBeGreaterThanOrEqual(360 + 2.7 * 200);
});

it('standSupports(two units) adds both reactions where they meet and puts one joint there for both movements', () => {
  const units = [unitOn([0, 60]), unitOn([60, 200])];
  const supports = standSupports(crossing, units, [plainDesign([60]), plainDesign([140])], profile);
  expect(supports).toHaveLength(3);
  const middle = supports[1]!;
  expect(middle.permanentKN).toBeCloseTo(130 * 30 + 130 * 70, 9);
  expect(middle.trafficKN).toBeCloseTo(50 * 100 + 1200, 9);
  expect(middle.articulation.bearings).toBe(4);
  expect(sum(middle.lines, 'expansion-joint')).toBeGreaterThan(0);
});

it('standSupports(joints): length times elements of 80 mm', () => {
  const end = threeSpans()[3]!;
  const elements = Math.ceil(end.articulation.jointMovementMm / 80);
  expect(sum(end.lines, 'expansion-joint')).toBeCloseTo(12 * elements, 9);
});

it('standSupports(uplift) ties the deck down and names the pier an anchor pier', () => {
  const design = plainDesign([60, 80, 60], { permanentKNm: 20, trafficMinKN: -2500 });
  const supports = standSupports(crossing, [unitOn([0, 60, 140, 200])], [design], profile);
  const pier = supports[1]!;
  expect(pier.kind).toBe('anchor-pier');
  // 1.35 x 2500 - 0.95 x 20 x 70.
  expect(pier.articulation.tieDownKN).toBeCloseTo(1.35 * 2500 - 0.95 * 1400, 6);
  expect(sum(pier.lines, 'tie-down')).toBeCloseTo(pier.articulation.tieDownKN / 1000, 9);
});

it('standSupports(pylon) takes the shaft from the form and still has foundations for its weight', () => {
  const lines: MeasuredLine[] = [
    { part: 'pylons', item: 'pylon-concrete', quantity: 900, what: 'pylon', how: 'given' },
  ];
  const plain = plainDesign([60, 140], { lines });
  const design = { ...plain, task: { ...plain.task, pylons: [1] } };
  const pylon = standSupports(crossing, [unitOn([0, 60, 200])], [design], profile)[1]!;
  const pier = standSupports(crossing, [unitOn([0, 60, 200])], [plain], profile)[1]!;
  expect(pylon.kind).toBe('pylon');
  expect(sum(pylon.lines, 'pier-concrete')).toBe(0);
  const footing = (s: Support): number =>
    sum(expectedLines(s), 'footing-concrete') + sum(expectedLines(s), 'bored-pile');
  expect(footing(pylon)).toBeGreaterThan(1.25 * footing(pier));
});

it('standSupports refuses units and designs that do not belong together', () => {
  expect(() => standSupports(crossing, [unitOn([0, 200])], [], profile)).toThrow(
    /expected one for each of 1 units/,
  );
  expect(() => standSupports(crossing, [unitOn([0, 100, 200])], [plainDesign([200])], profile)).toThrow(
    /expected a reaction at each of 3 supports, received 2/,
  );
});

it('standPierBetween(deck) is the pier of an option in everything but the fixed point', () => {
  const design = plainDesign([60, 80, 60]);
  const trial = standPierBetween(crossing, deckOnSupport(design), 140, 80, 60, 10);
  const pier = threeSpans()[2]!;
  expect(trial.shaft).toEqual(pier.shaft);
  expect(trial.permanentKN).toBeCloseTo(pier.permanentKN, 6);
  expect(trial.foundations.map((f) => f.footing)).toEqual(pier.foundations.map((f) => f.footing));
});

it('standPierBetween(in water) needs sheets, a seal and access; on dry land none of them', () => {
  const deck = deckOnSupport(plainDesign([60, 80, 60]));
  const river = expectedLines(standPierBetween(crossing, deck, 100, 60, 60, 10));
  const land = expectedLines(standPierBetween(crossing, deck, 40, 60, 60, 10));
  expect(sum(river, 'cofferdam')).toBeGreaterThan(0);
  expect(sum(river, 'water-access')).toBe(1);
  expect(sum(land, 'cofferdam') + sum(land, 'water-access') + sum(land, 'scour-protection')).toBe(0);
});

it('standPierBetween(flood plain) founds below the scoured ground and protects the pier', () => {
  const flooded: Site = {
    ...crossing,
    waters: [{ name: 'Brook', fromM: 80, toM: 120, levelM: -1, floodLevelM: 3 }],
    soffitLimits: [{ fromM: 0, toM: 200, levelM: 4, reason: 'flood', kind: 'flood' }],
  };
  const deck = deckOnSupport(plainDesign([60, 80, 60]));
  const wet = standPierBetween(flooded, deck, 40, 60, 60, 10);
  const dry = standPierBetween(crossing, deck, 40, 60, 60, 10);
  const under = (s: Support): number =>
    s.foundations[0]!.footing.topLevelM - s.foundations[0]!.footing.depthM;
  // Local scour 1.5 b tanh(y / b) for b = 0.9 m, y = 3 m is 1.35 m; with 0.5 m general and 0.5 m embedment 2.35 m.
  expect(under(wet)).toBeLessThanOrEqual(-2.34);
  expect(under(wet)).toBeLessThan(under(dry));
  expect(sum(expectedLines(wet), 'scour-protection')).toBeGreaterThan(0);
});

it('standOneSupport(abutment) holds more concrete the higher it stands', () => {
  // A road right in front leaves no room for a slope: these are walls.
  const beside: Site = {
    ...crossing,
    zones: [{ fromM: 2, toM: 12, hard: true, kind: 'road', name: 'Mill Lane' }],
  };
  const at = (roadLevelM: number): Support =>
    standOneSupport(beside, {
      name: 'start abutment',
      kind: 'abutment',
      chainageM: 0,
      roadLevelM,
      soffitLevelM: roadLevelM - 2.7,
      permanentKN: 3000,
      trafficKN: 2000,
      trafficLeastKN: -100,
      alongKN: 100,
      acrossKN: 150,
      fixed: false,
      bearings: 2,
      jointMovementMm: 60,
      heldAlongKN: 0,
      bearingMovementMm: 60,
    });
  const heights = [2, 5, 8, 11].map((h) => sum(expectedLines(at(h)), 'abutment-concrete'));
  expect(heights).toEqual([...heights].sort((a, b) => a - b));
  // Wall of 11 m retained height and 12 m width in mass concrete terms: some hundreds of m3, common practice, no source.
  expect(heights[3]).toBeGreaterThan(150);
  expect(heights[3]).toBeLessThan(700);
});

it('standOneSupport(near a railway) is a leaf strong enough for the blow', () => {
  const rail: Site = {
    ...crossing,
    zones: [{ fromM: 30, toM: 42, hard: true, kind: 'railway', name: 'Branch line' }],
  };
  const deck = deckOnSupport(plainDesign([60, 80, 60]));
  expect(standPierBetween(crossing, deck, 43, 60, 60, 10).shaft.columns).toBe(2);
  expect(standPierBetween(rail, deck, 43, 60, 60, 10).shaft.columns).toBe(1);
});

it('standOneSupport(not a number) names the support and the load', () => {
  const deck = { permanentKNm: NaN, trafficKNm: 50, depthM: 2 };
  expect(() => standPierBetween(crossing, deck, 40, 60, 60, 10)).toThrow(
    /pier, permanentKN: expected a number/,
  );
});

it('standOneSupport(no ground stretch) says what is missing', () => {
  const deck = deckOnSupport(plainDesign([60, 80, 60]));
  expect(() => standPierBetween({ ...crossing, groundStretches: [] }, deck, 40, 60, 60, 10)).toThrow(
    /expected at least one ground stretch/,
  );
});
