import { expect, it } from 'vitest';
import { centralAngle, chordOffset } from '../../lib/appraise/curveFacts.ts';
import { supportFacts } from '../../lib/appraise/supportFacts.ts';
import type { MeasuredLine, Site, Support } from '../../lib/model/index.ts';
import { bearingKind, rubberHeight } from '../../lib/substructure/bearingKind.ts';
import { expectedLines, standOneSupport, standSupports } from '../../lib/substructure/index.ts';
import { thermalMovement } from '../../lib/substructure/loads.ts';
import { seismicLoad } from '../../lib/substructure/seismicLoad.ts';
import { vesselAt } from '../../lib/substructure/setting.ts';
import type { SupportAsk } from '../../lib/substructure/supportAsk.ts';
import { crossing, plainDesign, profile, unitOn } from './crossing.ts';

const sum = (lines: readonly MeasuredLine[], ...items: readonly string[]): number =>
  lines.reduce((total, line) => (items.includes(line.item) ? total + line.quantity : total), 0);

it('thermalMovement(60 m of steel, 50 K) is 36 mm, 18 mm at either end of a deck held in its middle', () => {
  // Worked by hand: 1.2e-5 x 50 x 60 000 mm.
  expect(thermalMovement(1.2e-5, 50, 60)).toBeCloseTo(36, 12);
  expect(thermalMovement(1.2e-5, 50, 30)).toBeCloseTo(18, 12);
});

it('chordOffset(40 m) is 0.20, 0.40 and 0.67 m at radii of 1000, 500 and 300 m; nothing on a straight', () => {
  // Worked out from the circle, L^2 / (8 R); the circle itself agrees to the second decimal.
  const exact = (r: number): number => r - Math.sqrt(r * r - 20 * 20);
  for (const [radius, offset] of [
    [1000, 0.2],
    [500, 0.4],
    [300, 0.67],
  ] as const) {
    expect(chordOffset(40, radius)).toBeCloseTo(offset, 2);
    expect(chordOffset(40, radius)).toBeCloseTo(exact(radius), 2);
  }
  expect(chordOffset(40, Infinity)).toBe(0);
  expect(centralAngle(40, Infinity)).toBe(0);
});

it('centralAngle(span, radius): 0.06 rad of open girders is 3.4 degrees, 12 and 34 degrees of boxes', () => {
  // AASHTO LRFD 4.6.1.2 (from memory): 0.06 rad, 12 and 34 degrees.
  expect(centralAngle(0.06 * 500, 500)).toBeCloseTo(3.44, 2);
  expect(centralAngle(46, 220)).toBeCloseTo(12, 0);
});

const short = (site: Site = crossing, endM = 60): Support[] =>
  standSupports(site, [unitOn([0, endM / 2, endM])], [plainDesign([endM / 2, endM / 2])], profile);

/** The same crossing, as long as its bridge. */
const ofLength = (endM: number, more: Partial<Site> = {}): Site => ({
  ...crossing,
  endM,
  lengthM: endM,
  ...more,
});

it('standSupports(short and square) casts the deck into both abutments: no bearings and joints there', () => {
  const supports = short(ofLength(60));
  for (const end of [supports[0]!, supports.at(-1)!]) {
    expect(end.abutment!.integral).toBe(true);
    expect(end.articulation).toMatchObject({ bearings: 0, jointMovementMm: 0 });
    expect(sum(end.lines, 'bearing', 'expansion-joint')).toBe(0);
  }
  expect(sum(supports[1]!.lines, 'bearing')).toBeGreaterThan(0);
});

it('standSupports(longer, skew, or of unknown skew) keeps its joints', () => {
  // Limits of BA 42/96 (from memory): 20 mm either way, 30 degrees. Composite, 0.94 mm a metre: up to 85 m of deck.
  const integral = (site: Site, endM?: number): boolean => short(site, endM)[0]!.abutment!.integral;
  expect(integral(ofLength(84), 84)).toBe(true);
  expect(integral(ofLength(87), 87)).toBe(false);
  expect(integral(ofLength(60, { skewDeg: 30 }))).toBe(true);
  expect(integral(ofLength(60, { skewDeg: -31 }))).toBe(false);
  expect(integral(ofLength(60, { skewDeg: null }))).toBe(false);
});

it('standSupports(lifted ends) keeps its bearings and ties them down', () => {
  const design = plainDesign([30, 30], { permanentKNm: 10, trafficMinKN: -900 });
  const [start] = standSupports(ofLength(60), [unitOn([0, 30, 60])], [design], profile);
  expect(start!.abutment!.integral).toBe(false);
  expect(sum(start!.lines, 'tie-down')).toBeGreaterThan(0);
});

const abutment = (more: Partial<SupportAsk> = {}): SupportAsk => ({
  name: 'start abutment',
  kind: 'abutment',
  chainageM: 0,
  roadLevelM: 9,
  soffitLevelM: 6.8,
  permanentKN: 3000,
  trafficKN: 2000,
  trafficLeastKN: -50,
  alongKN: 100,
  acrossKN: 150,
  fixed: false,
  heldAlongKN: 0,
  bearings: 2,
  jointMovementMm: 60,
  bearingMovementMm: 60,
  ...more,
});

it('standOneSupport(abutment) is what costs least of what has room', () => {
  const dearFill = (lines: readonly MeasuredLine[]): number =>
    sum(lines, 'fill') * 1e6 + sum(lines, 'abutment-concrete');
  const concrete = (lines: readonly MeasuredLine[]): number =>
    sum(lines, 'abutment-concrete', 'footing-concrete');
  expect(standOneSupport(crossing, abutment(), concrete).abutment!.wall).toBe('spill-through');
  expect(standOneSupport(crossing, abutment(), dearFill).abutment!.wall).toBe('full height');
  // A road 3 m in front: the slope has nowhere to go.
  const road: Site = {
    ...crossing,
    zones: [{ fromM: 3, toM: 10, hard: true, kind: 'road', name: 'Mill Lane' }],
  };
  expect(standOneSupport(road, abutment(), concrete).abutment!.wall).toBe('full height');
  expect(
    standOneSupport(crossing, abutment({ roadLevelM: 2.5, soffitLevelM: 0.3 }), concrete).abutment!.wall,
  ).toBe('bank seat');
});

it('standOneSupport(spill-through) measures columns, beam and the slope before them', () => {
  const stood = standOneSupport(crossing, abutment(), (lines) => sum(lines, 'abutment-concrete'));
  const { shaft, topLevelM } = stood;
  expect(shaft.columns).toBe(3);
  const h = topLevelM - 1.5;
  // Prism 12 m wide under a slope of 2 to 1 with 1 m of berm, and half a cone.
  expect(sum(stood.lines, 'fill')).toBeCloseTo(12 * (h + h * h) + (Math.PI * 4 * h ** 3) / 6, 9);
});

it('bearingKind(movement, load): rubber of half the movement over 0.7 strain, pots beyond', () => {
  // EN 1337-3 5.3.3 (from memory): shear strain of 0.7.
  expect(rubberHeight(70)).toBeCloseTo(0.05, 12);
  expect(bearingKind(60, 6, 2)).toBe('elastomeric');
  expect(bearingKind(200, 6, 2)).toBe('pot');
  expect(bearingKind(60, 24, 2)).toBe('pot');
});

it('seismicLoad(site): acceleration x soil x 2.5 / 1.5 on piers; nothing where it is not known', () => {
  // EN 1998-1 table 3.2 and EN 1998-2 table 4.1 (from memory): class C 1.15, q 1.5.
  const load = seismicLoad({ seismic: { groundAccelerationG: 0.2, siteClass: 'C' } })!;
  expect(load.groundShare).toBeCloseTo(0.23, 12);
  expect(load.pierShare).toBeCloseTo((0.23 * 2.5) / 1.5, 12);
  expect(seismicLoad({ seismic: { groundAccelerationG: 0.2, siteClass: null } })!.groundShare).toBeCloseTo(
    0.28,
    12,
  );
  expect(seismicLoad({ seismic: null })).toBeNull();
  expect(seismicLoad({})).toBeNull();
});

it('standSupports(earthquake) makes the piers that hold the deck and their foundations stronger; a heavier deck more so', () => {
  const concrete = (groundAccelerationG: number | null, permanentKNm = 130): number[] =>
    standSupports(
      {
        ...crossing,
        seismic: groundAccelerationG === null ? null : { groundAccelerationG, siteClass: 'C' },
      },
      [unitOn([0, 60, 140, 200])],
      [plainDesign([60, 80, 60], { permanentKNm })],
      profile,
    ).map((s) => sum(expectedLines(s), 'pier-concrete', 'footing-concrete', 'bored-pile'));
  const calm = concrete(null);
  const shaken = concrete(0.3);
  expect(concrete(0)).toEqual(calm);
  expect(shaken[1]!).toBeGreaterThan(1.2 * calm[1]!);
  // The deck is held by both piers then, so that neither has to carry it all.
  expect(shaken[2]!).toBeGreaterThan(1.2 * calm[2]!);
  expect(concrete(0.3, 200)[1]! - concrete(null, 200)[1]!).toBeGreaterThan(shaken[1]! - calm[1]!);
});

const navigable = (vesselDwtT: number | null): Site => ({
  ...crossing,
  waters: [
    {
      ...crossing.waters[0]!,
      river: {
        floodFromM: 80,
        floodToM: 120,
        freeboardM: 1,
        flowM3s: null,
        velocityMs: null,
        allowedAffluxM: null,
        grainMm: null,
        siltFactor: null,
        vesselDwtT,
        vesselSpeedMs: 4,
      },
    },
  ],
});

it('vesselAt(water) is 120 V sqrt(DWT) kN where a vessel passes and nothing on land', () => {
  // AASHTO LRFD 3.14.8 (from memory): 1.2e5 V sqrt(DWT) N; 4 m/s and 2,500 t give 24 MN.
  expect(vesselAt(navigable(2500), 100)).toBeCloseTo(24_000, 9);
  expect(vesselAt(navigable(2500), 40)).toBeNull();
  expect(vesselAt(navigable(0), 100)).toBeNull();
  expect(vesselAt(navigable(null), 100)).toBeNull();
});

it('standSupports(vessel) sizes the pier in the water for it and says so', () => {
  const stood = (site: Site): Support[] =>
    standSupports(site, [unitOn([0, 100, 200])], [plainDesign([100, 100])], profile);
  const struck = stood(navigable(500))[1]!;
  const free = stood(navigable(0))[1]!;
  expect(struck.articulation.vesselKN).toBeCloseTo(120 * 4 * Math.sqrt(500), 6);
  expect(free.articulation.vesselKN).toBeUndefined();
  expect(sum(expectedLines(struck), 'bored-pile', 'footing-concrete')).toBeGreaterThan(
    sum(expectedLines(free), 'bored-pile', 'footing-concrete'),
  );
});

it('supportFacts(pier heights): stiffness within 0.75 and 0.5 by the cube of height is 0.91 and 0.79', () => {
  // Worked out from statics: k by 1 / h^3. Limits of Caltrans (from memory).
  expect(0.75 ** (1 / 3)).toBeCloseTo(0.91, 2);
  expect(0.5 ** (1 / 3)).toBeCloseTo(0.79, 2);
  const units = [unitOn([0, 50, 100, 150, 200])];
  const supports = standSupports(crossing, units, [plainDesign([50, 50, 50, 50])], profile);
  const uneven = supports.map((s, i) => ({ ...s, heightM: [5, 10, 9, 6, 5][i]! }));
  const facts = supportFacts(crossing, { supports: uneven, units });
  expect(facts['pierHeightNext']).toBeCloseTo(6 / 9, 12);
  expect(facts['pierHeightAll']).toBeCloseTo(0.6, 12);
});
