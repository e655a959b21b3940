import { expect, it } from 'vitest';
import { quakeOn } from '../../lib/appraise/quakeOn.ts';
import { portalFrame } from '../../lib/forms/portal-frame/index.ts';
import type { Design, MeasuredLine, Support, UnitTask } from '../../lib/model/index.ts';
import { constructionDepth } from '../../lib/site/index.ts';
import { settingAt, standSupports, strikesAt } from '../../lib/substructure/index.ts';
import { measure } from '../../lib/takeoff/index.ts';
import { crossing, profile, unitOn } from './crossing.ts';

const sum = (lines: readonly MeasuredLine[], item: string): number =>
  lines.reduce((total, line) => (line.item === item ? total + line.quantity : total), 0);

const site = { ...crossing, endM: 24, lengthM: 24, waters: [] };
const frame = (): Design =>
  portalFrame.size({
    form: 'portal-frame',
    method: 'falsework',
    spansM: [24],
    deck: site.deck,
    standard: 'lm1',
    planRadiusM: Infinity,
    depthM: 0.8,
    clearUnderM: [8.75, 8.75],
  });
const stood = (design: Design): Support[] =>
  standSupports(site, [{ ...unitOn([0, 24]), form: 'portal-frame' }], [design], profile);

it('standSupports(frame) has two walls in one with the deck: no bearings, joints or seats', () => {
  const supports = stood(frame());
  expect(supports.map(({ kind }) => kind)).toEqual(['abutment', 'abutment']);
  for (const { lines, articulation } of supports) {
    expect(sum(lines, 'bearing') + sum(lines, 'expansion-joint')).toBe(0);
    expect(articulation).toMatchObject({ bearings: 0, bearingMN: 0, jointMovementMm: 0, fixed: true });
    expect(lines.some(({ what }) => /bank seat|full height/u.test(what))).toBe(false);
  }
});

it('measure(frame) counts each wall once: in the design down to its foot, in the foundation below it or off what reaches higher', () => {
  const design = frame();
  const supports = stood(design);
  const lines = measure(site, [design], supports, profile);
  const wings = supports.flatMap((one) => one.lines).filter(({ what }) => what.endsWith('wing walls'));
  expect(sum(lines, 'abutment-concrete')).toBeCloseTo(
    design.walls!.reduce((total, wall) => total + wall.concreteM3, 0) + sum(wings, 'abutment-concrete'),
    9,
  );
  const slab = 10 - constructionDepth(site.deck, 0);
  for (const { foundations } of supports)
    for (const { lines: below, footing } of foundations) {
      const gap = slab - design.walls![0]!.heightM - footing.topLevelM;
      expect(sum(below, 'abutment-concrete')).toBeCloseTo(gap * design.walls![0]!.footM * 12, 9);
    }
});

it('standSupports(frame) sizes footings and piles for thrust and moment on every ground', () => {
  const design = frame();
  const plain = stood(design)[0]!;
  expect(plain.foundations.map(({ kind }) => kind)).toEqual(['spread', 'bored-piles']);
  const more = (
    change: (load: { verticalKN: number; alongKN: number; momentKNm: number }) => object,
  ): Support =>
    stood({
      ...design,
      walls: design.walls!.map((wall) => ({
        ...wall,
        loads: wall.loads.map((load) => ({ ...load, ...change(load) })),
      })),
    })[0]!;
  const area = ({ foundations }: Support): number =>
    foundations[0]!.footing.lengthM * foundations[0]!.footing.widthM;
  const piles = ({ foundations }: Support): number => sum(foundations[1]!.lines, 'bored-pile');
  const thrust = more(({ alongKN }) => ({ alongKN: 2 * alongKN }));
  const turned = more(({ momentKNm, verticalKN }) => ({ momentKNm: momentKNm - 1.5 * verticalKN }));
  expect(area(thrust)).toBeGreaterThan(area(plain));
  expect(piles(thrust)).toBeGreaterThan(piles(plain));
  expect(area(turned)).toBeGreaterThan(area(plain));
});

it('measure(frame) takes off what a deep footing has of the wall that stands on it, concrete and bars', () => {
  // On gravel near the surface the underside is 1.5 m down and the wall ends 0.5 m down: deeper than a metre is too high.
  const design = portalFrame.size({ ...frame().task, quakeShare: 0.6 });
  const near = site.groundStretches.map((stretch) => ({
    ...stretch,
    classes: stretch.classes.map((one) => ({ ...one, bearingLevelM: 10 })),
  }));
  const unit = { ...unitOn([0, 24]), form: 'portal-frame' } as const;
  const [support] = standSupports({ ...site, groundStretches: near }, [unit], [design], profile);
  const { footing, lines } = support!.foundations[0]!;
  const over = footing.topLevelM - (10 - constructionDepth(site.deck, 0) - design.walls![0]!.heightM);
  expect(over).toBeGreaterThan(0.05);
  const [wall] = design.walls!;
  expect(sum(lines, 'abutment-concrete')).toBeCloseTo(-over * wall!.footM * 12, 9);
  const off = lines.find(({ item, what }) => item === 'reinforcement' && what.includes('shaft'))!;
  expect(off.quantity).toBeCloseTo((-over * wall!.footM * 12 * wall!.reinforcementKg) / wall!.concreteM3, 6);
});

it('standSupports(frame) slides nowhere: thrust within 0.4 of the vertical load with the fill on the heel', () => {
  const [support] = stood(frame());
  const { footing } = support!.foundations[0]!;
  const heel = 0.65 * (footing.lengthM - support!.shaft.lengthM);
  const fill = heel * 12 * (10 - footing.topLevelM) * 19;
  const own = footing.lengthM * footing.widthM * footing.depthM * 25;
  for (const { verticalKN, alongKN } of frame().walls![0]!.loads)
    expect(Math.abs(alongKN)).toBeLessThan(0.4 * (verticalKN + fill + own));
});

it('standSupports(frame of two spans) has a wall between them: no wings, no fill on its heel, a footing on its middle', () => {
  const design = portalFrame.size({ ...frame().task, spansM: [12, 12], clearUnderM: [8.75, 8.75, 8.75] });
  const supports = standSupports(site, [{ ...unitOn([0, 12, 24]), form: 'portal-frame' }], [design], profile);
  expect(supports.map(({ kind }) => kind)).toEqual(['abutment', 'pier', 'abutment']);
  const [first, middle] = supports as [Support, Support, Support];
  expect(middle.articulation).toMatchObject({ bearings: 0, jointMovementMm: 0, fixed: true });
  expect(middle.lines.some(({ what }) => /wing|bearing|column|leaf/u.test(what))).toBe(false);
  expect(middle.shaft.concreteM3).toBe(design.walls![1]!.concreteM3);
  expect(middle.foundations.map(({ kind }) => kind)).toEqual(first.foundations.map(({ kind }) => kind));
  // Equal spans and no fill to hold: a smaller footing than at an end, for more load.
  expect(middle.permanentKN).toBeGreaterThan(first.permanentKN);
  const plan = ({ foundations }: Support): number =>
    foundations[0]!.footing.lengthM * foundations[0]!.footing.widthM;
  expect(plan(middle)).toBeLessThan(plan(first));
  const lines = measure(site, [design], supports, profile);
  expect(sum(lines, 'pier-concrete')).toBeCloseTo(design.walls![1]!.concreteM3, 9);
});

it('standSupports(frame of two spans, struck) takes the blow at half again of what the ground may carry, across as well', () => {
  const spansM = [12, 12];
  const frameOf = (strikes?: UnitTask['strikes']): Design =>
    portalFrame.size({
      ...frame().task,
      spansM,
      clearUnderM: [8.75, 8.75, 8.75],
      ...(strikes ? { strikes } : {}),
    });
  const middle = (design: Design): Support =>
    standSupports(site, [{ ...unitOn([0, 12, 24]), form: 'portal-frame' }], [design], profile)[1]!;
  const plan = ({ foundations }: Support): number =>
    foundations[0]!.footing.lengthM * foundations[0]!.footing.widthM;
  const free = middle(frameOf());
  const blow = (alongKN: number, acrossKN: number): Support =>
    middle(frameOf([[], [{ alongKN, acrossKN, aboveGroundM: 3 }], []]));
  expect(plan(blow(4000, 0))).toBeGreaterThan(plan(free));
  expect(plan(blow(0, 12_000))).toBeGreaterThan(plan(free));
  // By hand, along: a force less than 1.5 times as great as what already goes into the ground asks for no more of it.
  expect(plan(blow(10, 0))).toBe(plan(free));
  expect(blow(4000, 0).articulation.alongKN).toBeCloseTo(free.articulation.alongKN, 6);
});

it('strikesAt() is the vehicle along the road, and the vessel across it or with half of its force along it', () => {
  const setting = { ...settingAt(site, 12), impact: null, vesselKN: null };
  expect(strikesAt(setting)).toEqual([]);
  expect(strikesAt({ ...setting, impact: { forceKN: 1000, heightM: 1.25 } })).toEqual([
    { alongKN: 1000, acrossKN: 0, aboveGroundM: 1.25 },
  ]);
  expect(strikesAt({ ...setting, groundLevelM: -4, waterLevelM: -1, vesselKN: 24_000 })).toEqual([
    { alongKN: 0, acrossKN: 24_000, aboveGroundM: 3 },
    { alongKN: 12_000, acrossKN: 0, aboveGroundM: 3 },
  ]);
});

it('standSupports(frame in an earthquake) puts it into the footings, along and across, at half again of what the ground may carry', () => {
  const stoodAt = (quakeShare: number): { readonly design: Design; readonly supports: Support[] } => {
    const design = portalFrame.size({ ...frame().task, quakeShare });
    return { design, supports: stood(design) };
  };
  const plan = ({ foundations }: Support): number =>
    foundations[0]!.footing.lengthM * foundations[0]!.footing.widthM;
  const [calm, weak, strong] = [0, 0.02, 0.6].map(stoodAt);
  calm!.supports.forEach((support, s) => {
    // By hand: 2 % of the weight along, less than half of what the ground carries already, asks for no more of it.
    expect(plan(weak!.supports[s]!)).toBe(plan(support));
    expect(plan(strong!.supports[s]!)).toBeGreaterThan(1.1 * plan(support));
    // What holds the deck from day to day is not the earthquake.
    expect(strong!.supports[s]!.articulation.alongKN).toBeCloseTo(support.articulation.alongKN, -2);
    // It stands under what comes along in full with 0.3 of it across: no slip, the resultant within the footing.
    const [quake] = strong!.design.walls![s]!.quake!;
    const { footing } = strong!.supports[s]!.foundations[0]!;
    const own = footing.lengthM * footing.widthM * footing.depthM * 25;
    const fill =
      0.65 * (footing.lengthM - strong!.supports[s]!.shaft.lengthM) * 12 * (10 - footing.topLevelM) * 19;
    for (const sign of [1, -1]) {
      const down = quake!.rest.verticalKN + sign * quake!.along.verticalKN + own + fill;
      const along = quake!.rest.alongKN + sign * quake!.along.alongKN;
      expect(Math.hypot(along, 0.3 * quake!.acrossKN)).toBeLessThanOrEqual(0.4 * 1.5 * down);
    }
  });
});

it('quakeOn(site) asks of walls in one with the deck what it asks of piers, of a deck on bearings nothing', () => {
  const seismic = { groundAccelerationG: 0.2, siteClass: 'C' } as const;
  expect(quakeOn({ seismic }, portalFrame).quakeShare).toBeCloseTo((0.2 * 1.15 * 2.5) / 1.5, 12);
  expect(quakeOn({ seismic }, {})).toEqual({});
  expect(quakeOn({ seismic: null }, portalFrame)).toEqual({});
});
