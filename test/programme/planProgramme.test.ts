import { expect, it } from 'vitest';
import type { Design } from '../../lib/model/index.ts';
import { planProgramme } from '../../lib/programme/index.ts';
import { standSupports } from '../../lib/substructure/index.ts';
import { crossing, plainDesign, profile, unitOn } from '../substructure/crossing.ts';

const plan = (design: Design, supportsM: readonly number[]) =>
  planProgramme(crossing, [design], standSupports(crossing, [unitOn(supportsM)], [design], profile));

it('planProgramme(option) rises from quick to slow and its months end with its last activity', () => {
  const { months, activities } = plan(plainDesign([60, 80, 60]), [0, 60, 140, 200]);
  expect(months.p10).toBeLessThan(months.p50);
  expect(months.p50).toBeLessThan(months.p90);
  for (const key of ['p10', 'p50', 'p90'] as const) {
    expect(Math.max(...activities.map((a) => a.startMonths[key] + a.months[key]))).toBeCloseTo(
      months[key],
      9,
    );
  }
  // A crossing of 200 m and 2400 m2 takes one to three years on site: common practice, no source.
  expect(months.p50).toBeGreaterThan(9);
  expect(months.p50).toBeLessThan(30);
});

it('planProgramme(option) starts the deck after establishment and ends it after the supports', () => {
  const { activities } = plan(plainDesign([60, 80, 60]), [0, 60, 140, 200]);
  const find = (id: string) => activities.find((activity) => activity.id === id)!;
  const end = (id: string): number => find(id).startMonths.p50 + find(id).months.p50;
  expect(find('deck').startMonths.p50).toBeGreaterThanOrEqual(end('establish'));
  expect(end('deck')).toBeGreaterThanOrEqual(end('supports') - 1e-9);
  expect(find('finishes').startMonths.p50).toBeCloseTo(end('deck'), 9);
});

it('planProgramme(more supports) takes longer on the supports; more steel longer in the shop', () => {
  const weeks = (design: Design, at: readonly number[], id: string): number =>
    plan(design, at).activities.find((activity) => activity.id === id)!.months.p50;
  const few = plainDesign([60, 80, 60]);
  const many = plainDesign([40, 40, 40, 40, 40]);
  expect(weeks(many, [0, 40, 80, 120, 160, 200], 'supports')).toBeGreaterThan(
    weeks(few, [0, 60, 140, 200], 'supports'),
  );
  const heavy = { ...few, lines: few.lines.map((line) => ({ ...line, quantity: 2 * line.quantity })) };
  expect(weeks(heavy, [0, 60, 140, 200], 'steel')).toBeGreaterThan(weeks(few, [0, 60, 140, 200], 'steel'));
});

it('planProgramme(option) gives preliminaries: establishment once and the likely months', () => {
  const { lines, months } = plan(plainDesign([60, 80, 60]), [0, 60, 140, 200]);
  expect(lines.map((line) => [line.item, line.quantity])).toEqual([
    ['site-setup', 1],
    ['site-month', months.p50],
  ]);
});
