import { expect, it } from 'vitest';
import type { Design, MeasuredLine, Site, Support } from '../../lib/model/index.ts';
import { alongSupportsM } from '../../lib/site/index.ts';
import { expectedLines, standSupports } from '../../lib/substructure/index.ts';
import { wingsOf } from '../../lib/substructure/wings.ts';
import { crossing, plainDesign, profile, unitOn } from './crossing.ts';

/** Land without water, so that the abutments may be of any kind and piers are columns. */
const dry: Site = { ...crossing, waters: [], groundX: [0, 200], groundZ: [0, 0] };
const stood = (skewDeg: number | null, site: Site = dry): Support[] =>
  standSupports({ ...site, skewDeg }, [unitOn([0, 60, 140, 200])], [plainDesign([60, 80, 60])], profile);
const sum = (supports: readonly Support[], item: string): number =>
  supports
    .flatMap(expectedLines)
    .reduce((total: number, line: MeasuredLine) => (line.item === item ? total + line.quantity : total), 0);

it('alongSupportsM(12 m of deck) is 24 m at 60 degrees either way, and 12 m square or unknown, to the last digit', () => {
  expect(alongSupportsM({ ...crossing, skewDeg: 60 })).toBeCloseTo(24, 9);
  expect(alongSupportsM({ ...crossing, skewDeg: -60 })).toBeCloseTo(24, 9);
  expect(alongSupportsM({ ...crossing, skewDeg: 0 })).toBe(12);
  expect(alongSupportsM({ ...crossing, skewDeg: null })).toBe(12);
});

it('standSupports(skew) is the same to the last digit for a square and an unknown skew, and either way round', () => {
  expect(stood(null)).toEqual(stood(0));
  expect(stood(-35)).toEqual(stood(35));
});

it('standSupports(60 degrees) makes joints twice as long', () => {
  expect(sum(stood(60), 'expansion-joint')).toBeCloseTo(2 * sum(stood(0), 'expansion-joint'), 9);
});

it('standSupports(60 degrees) makes abutment walls and wings twice as long where their height stays', () => {
  const walls = (supports: Support[], ending: string): number =>
    supports[0]!.lines.find(({ item, what }) => item === 'abutment-concrete' && what.endsWith(ending))!
      .quantity;
  // Water before the wall leaves no slope: full height on either.
  const wet = { ...dry, waters: [{ name: 'Brook', fromM: 0, toM: 200, levelM: 1, floodLevelM: null }] };
  const [square, skewed] = [stood(0, wet), stood(60, wet)];
  expect(square[0]!.abutment?.wall).toBe('full height');
  expect(walls(skewed, 'full height')).toBeCloseTo(2 * walls(square, 'full height'), 9);
  expect(walls(skewed, 'wing walls')).toBeCloseTo(2 * walls(square, 'wing walls'), 9);
  expect(skewed[0]!.shaft.widthM).toBeCloseTo(24, 9);
});

it('wingsOf(5 m retained, 2 to 1, 30 degrees) are 10 / cos 30 m long by hand', () => {
  const square = wingsOf({ ...crossing, skewDeg: 0 }, 5).wallsM3;
  expect(wingsOf({ ...crossing, skewDeg: 30 }, 5).wallsM3 / square).toBeCloseTo(10 / 8.660254, 6);
});

it('standSupports(skew) asks for more of everything above the foundations as the skew grows', () => {
  // A longer wall spreads its load; foundations below may be as large or, in a coarser step, a little smaller.
  const items = ['abutment-concrete', 'pier-concrete', 'expansion-joint', 'reinforcement'];
  const sum = (supports: readonly Support[], item: string): number =>
    supports.flatMap(({ lines }) => lines).reduce((t, l) => (l.item === item ? t + l.quantity : t), 0);
  const all = [0, 10, 20, 35, 50, 65].map((skewDeg) => stood(skewDeg));
  for (const item of items) {
    const amounts = all.map((supports) => sum(supports, item));
    for (let i = 1; i < amounts.length; i++) expect(amounts[i]!, item).toBeGreaterThan(amounts[i - 1]!);
  }
});

it('standSupports(obtuse corner 1.2) prices bearings for 1.2 of their traffic and leaves shafts and foundations', () => {
  const units = [unitOn([0, 60, 140, 200])];
  const [square, corner] = [{}, { obtuseCorner: 1.2 }].map(
    (more) => standSupports(dry, units, [{ ...plainDesign([60, 80, 60]), ...more }], profile)[1]!,
  );
  // 1.35 x 130 x 70 + 1.35 x 1.2 x (50 x 70 + 600), by hand.
  expect(square!.articulation.bearingMN).toBeCloseTo((1.35 * 9100 + 1.35 * 4100) / 1000, 9);
  expect(corner!.articulation.bearingMN).toBeCloseTo((1.35 * 9100 + 1.35 * 1.2 * 4100) / 1000, 9);
  expect(sum([corner!], 'bearing')).toBeGreaterThan(sum([square!], 'bearing'));
  expect(corner!.shaft).toEqual(square!.shaft);
  expect(corner!.foundations).toEqual(square!.foundations);
});

it('standSupports(skew ends) presses the bearings of the end spans, where that is more than the factor of the corner', () => {
  const units = [unitOn([0, 60, 140, 220, 280])];
  const plain = plainDesign([60, 80, 80, 60]);
  const load = (more: Partial<Design>): number[] =>
    standSupports(dry, units, [{ ...plain, ...more }], profile).map((one) => one.articulation.bearingMN);
  const square = load({});
  const pressed = load({ skewPressKN: 2000 });
  // Both ends and the piers next to them; nothing over the pier in the middle.
  pressed.forEach((mn, j) => expect(mn - square[j]!).toBeCloseTo(j === 2 ? 0 : 2, 9));
  expect(load({ skewPressKN: 2000, obtuseCorner: 1.001 })[0]).toBe(pressed[0]);
  expect(load({ skewPressKN: 1, obtuseCorner: 1.2 })).toEqual(load({ obtuseCorner: 1.2 }));
});

it('standSupports(skew) widens the head over two columns by 1 / cos', () => {
  const [square, skewed] = [stood(0)[1]!, stood(60)[1]!];
  expect(square.shaft.columns).toBe(2);
  expect(skewed.shaft.widthM).toBeCloseTo(2 * square.shaft.widthM, 9);
});
