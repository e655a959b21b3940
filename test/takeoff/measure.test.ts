import { expect, it } from 'vitest';
import type { MeasuredLine, Site } from '../../lib/model/index.ts';
import { proposedProfile } from '../../lib/site/index.ts';
import { substructureData } from '../../lib/substructure/data.ts';
import { standSupports } from '../../lib/substructure/index.ts';
import {
  items,
  measure,
  perM2,
  quantitiesOf,
  splitQuantities,
  girderLines,
} from '../../lib/takeoff/index.ts';
import { crossing, plainDesign, profile, steelLine, unitOn } from '../substructure/crossing.ts';

const units = [unitOn([0, 60]), unitOn([60, 140, 200])];
const designs = [
  plainDesign([60], { lines: [{ ...steelLine(1000), support: 1 }] }),
  plainDesign([80, 60], { lines: [{ ...steelLine(2000), support: 1 }], method: 'launch' }),
];
const measured = (site: Site = crossing, road = profile): MeasuredLine[] =>
  measure(site, designs, standSupports(site, units, designs, road), road);
const sum = (lines: readonly MeasuredLine[], item: string): number =>
  lines.reduce((total, line) => (line.item === item ? total + line.quantity : total), 0);

it('measure(crossing) marks the lines of each unit and counts its supports along the crossing', () => {
  const steel = measured().filter((line) => line.item === 'plate-girder-steel');
  expect(steel.map(({ unit, support }) => [unit, support])).toEqual([
    [0, 1],
    [1, 2],
  ]);
});

it('measure(crossing) surfaces the deck, edges it twice and sets each method up once', () => {
  const lines = measured();
  expect(sum(lines, 'surfacing')).toBeCloseTo(200 * 12, 9);
  expect(sum(lines, 'parapet')).toBeCloseTo(400, 9);
  expect(lines.filter((line) => line.item === 'method-setup').map((line) => line.what)).toEqual([
    'set-up for lifting by crane',
    'set-up for launching',
  ]);
});

/** Fill of the approaches; that before a spill-through abutment belongs to the abutment. */
const approachFill = (lines: readonly MeasuredLine[]): number =>
  sum(
    lines.filter(({ part }) => part === 'approaches'),
    'fill',
  );

it('measure(crossing) has the fill of both approaches by V = (W h^2/2 + s h^3/3)/g', () => {
  // W 12, h 10, s 2, g 5 %: (600 + 666.67) / 0.05 = 25,333 m3 an end.
  expect(approachFill(measured())).toBeCloseTo((2 * (12 * 50 + (2 * 1000) / 3)) / 0.05, 4);
});

it('measure(crossing between walls) has W h of fill, and walls of 2 h of face made like the wings of an abutment', () => {
  const walled: Site = { ...crossing, road: { ...crossing.road, approachSides: 'walls' } };
  const lines = measured(walled, proposedProfile(walled)).filter(({ part }) => part === 'approaches');
  // h 10 run out over 200 m: W h^2/2g = 12,000 m3 and a face of h^2/g = 2,000 m2 an end.
  expect(sum(lines, 'fill')).toBeCloseTo(2 * 12_000, 6);
  const { abutment, footing } = substructureData;
  const stem = 4000 * abutment.wingM;
  const foot = 4000 * abutment.wingFootingWidth * abutment.wingFootingM;
  expect(sum(lines, 'abutment-concrete')).toBeCloseTo(stem, 6);
  expect(sum(lines, 'footing-concrete')).toBeCloseTo(foot, 6);
  expect(sum(lines, 'reinforcement')).toBeCloseTo(stem * abutment.barsKgM3 + foot * footing.barsKgM3, 4);
});

it('measure(railway) counts possessions by method and pieces over the track', () => {
  const rail: Site = {
    ...crossing,
    zones: [{ fromM: 20, toM: 32, hard: true, kind: 'railway', name: 'Branch line' }],
  };
  // Crane: 2 and half of 2 girders x ceil(22 m / 25 m) pieces.
  expect(sum(measured(rail), 'rail-possession')).toBe(3);
  expect(sum(measured(), 'rail-possession')).toBe(0);
});

it('girderLines(design) counts girders, beams or boxes, whichever its form has', () => {
  expect(girderLines({ figures: { girders: 5, spacingM: 3 } })).toEqual({ figure: 'girders', count: 5 });
  expect(girderLines({ figures: { beamLines: 7 } })!.count).toBe(7);
  expect(girderLines({ figures: { cells: 2 } })).toBeUndefined();
});

it('measure(crossing) leaves foundations to the ground class drawn', () => {
  expect(measured().some((line) => line.part === 'foundations')).toBe(false);
});

it('measure refuses an unknown item and a quantity that is no number', () => {
  const wrong = (line: MeasuredLine): (() => unknown) => {
    const design = plainDesign([200], { lines: [line] });
    return () =>
      measure(crossing, [design], standSupports(crossing, [unitOn([0, 200])], [design], profile), profile);
  };
  expect(wrong({ ...steelLine(1), item: 'gold' })).toThrow(
    /expected one of data\/rates\/items.json, received 'gold'/,
  );
  expect(wrong(steelLine(NaN))).toThrow(/expected a quantity of 0 or more, received NaN/);
  expect(wrong(steelLine(-1))).toThrow(/received -1/);
});

it('quantitiesOf(lines) puts each item into its material and splits deck from supports', () => {
  const line = (part: MeasuredLine['part'], item: string): MeasuredLine => ({
    part,
    item,
    quantity: 10,
    what: '',
    how: '',
  });
  const lines = items.map((item) => line('deck', item.id));
  const total = quantitiesOf(lines);
  for (const material of [
    'concreteM3',
    'reinforcementKg',
    'prestressKg',
    'structuralSteelKg',
    'stayCableKg',
  ] as const) {
    expect(total[material]).toBe(10 * items.filter((item) => item.material === material).length);
  }
  expect(total.mainCableKg).toBe(0);
  const split = splitQuantities([line('deck', 'deck-concrete'), line('piers', 'pier-concrete')]);
  expect([split.superstructure.concreteM3, split.supports.concreteM3]).toEqual([10, 10]);
  expect(perM2(total, 100).concreteM3).toBeCloseTo(total.concreteM3 / 100, 12);
  expect(() => perM2(total, 0)).toThrow(/deck area: expected more than 0/);
});
