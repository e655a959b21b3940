import { expect, it } from 'vitest';
import type { Contender } from '../../lib/decide/index.ts';
import { levelWith, stand } from '../../lib/decide/index.ts';
import { groupsOf } from '../../lib/decide/groupsOf.ts';
import { sayMoney, sayOdds } from '../../lib/decide/words.ts';
import type { Budget } from '../../lib/model/index.ts';

const books = { unseparated: [0.2, 0.8] as const, currency: 'EUR' };
const budget: Budget = { amount: 2.5, priceDate: '2026 Q1', includes: 'all' };
const option = (number: number, totals: number[], status: Contender['status'] = 'in'): Contender => ({
  number,
  status,
  totals: Float64Array.from(totals),
  p50: [...totals].sort((a, b) => a - b)[Math.floor(totals.length / 2)]!,
});

const one = option(1, [1, 2, 3, 4, 5]);
const two = option(2, [2, 1, 4, 5, 6]);
const three = option(3, [11, 12, 13, 14, 15]);

it('stand(options) counts the odds on common draws, ties half, and both ways sum to 1', () => {
  const { odds } = stand([one, two, three], books, 'unknown');
  expect(odds[1]![2]).toBeCloseTo(0.8, 12);
  expect(odds[2]![1]).toBeCloseTo(0.2, 12);
  expect(odds[1]![3]).toBe(1);
  expect(stand([one, { ...one, number: 4 }], books, 'unknown').odds[1]![4]).toBe(0.5);
});

it('stand(options) groups what cannot be separated, ends included, and leads by the lowest median', () => {
  const standing = stand([three, two, one], books, budget);
  expect(standing.leader).toBe(1);
  expect(standing.groups).toEqual([[1, 2], [3]]);
  expect(standing.within).toEqual({ 1: 0.4, 2: 0.4, 3: 0 });
});

it('stand(options) never lets an option lead that a rule puts out, and says so', () => {
  const standing = stand([{ ...one, status: 'out' }, two, three], books, 'unknown');
  expect(standing.leader).toBe(2);
  expect(standing.within).toEqual({});
  expect(standing.because.join(' ')).toMatch(/Option 1 has a lower median, .* but a rule puts it out/);
  expect(standing.because).toContain('No budget is given.');
  expect(stand([{ ...one, status: 'out' }], books, 'unknown').leader).toBeNull();
  expect(stand([], books, budget)).toMatchObject({ leader: null, groups: [], odds: {}, within: {} });
});

it('stand(options) leaves an option that a rule puts out in no group, whatever it costs', () => {
  const between = option(5, [0.5, 2.2, 3.2, 4.2, 5.2], 'out');
  const standing = stand([one, two, between], books, budget);
  expect(standing.groups).toEqual([[1, 2]]);
  expect(standing.odds[5]![1]).toBeGreaterThan(0);
  expect(standing.within[5]).toBe(0.4);
});

it('stand(options) explains the leader with two figures and odds in steps of 5 %', () => {
  const big = [one, two].map((o) => ({
    ...o,
    totals: o.totals.map((t) => t * 1.234e6),
    p50: o.p50 * 1.234e6,
  }));
  expect(stand(big, books, { ...budget, amount: 8.04e6 }).because).toEqual([
    'Option 1 has the lowest median cost of the options not ruled out, 3.7 million EUR.',
    'It is cheaper than option 2 in 80 % of the draws: the two cannot be separated on cost.',
    'The chance that it stays within the budget of 8.0 million EUR is 100 %.',
  ]);
});

it('stand refuses options from different draws and the same number twice', () => {
  expect(() => stand([one, option(5, [1, 2])], books, 'unknown')).toThrow(/price all on one set of draws/);
  expect(() => stand([one, one], books, 'unknown')).toThrow(/expected each number once/);
});

it('groupsOf(order, odds) gives overlapping maximal runs', () => {
  const odds = { 1: { 2: 0.7, 3: 0.9 }, 2: { 1: 0.3, 3: 0.7 }, 3: { 1: 0.1, 2: 0.3 } };
  expect(groupsOf([1, 2, 3], odds, [0.2, 0.8])).toEqual([
    [1, 2],
    [2, 3],
  ]);
  expect(groupsOf([1, 2, 3], odds, [0.05, 0.95])).toEqual([[1, 2, 3]]);
  expect(groupsOf([1, 2, 3], odds, [0.45, 0.55])).toEqual([[1], [2], [3]]);
});

it('sayMoney(amount) and sayOdds(share) keep to two figures and 5 %', () => {
  expect(sayMoney(8_449_000, 'EUR')).toBe('8.4 million EUR');
  expect(sayMoney(12_840_000, 'EUR')).toBe('13 million EUR');
  expect(sayMoney(999_600, 'EUR')).toBe('1.0 million EUR');
  expect(sayMoney(45_300, 'EUR')).toBe('45 thousand EUR');
  expect(sayMoney(0, 'EUR')).toBe('0 EUR');
  expect(sayOdds(0.337)).toBe('35 %');
  expect(sayOdds(0.001)).toBe('less than 5 %');
  expect(sayOdds(0.999)).toBe('more than 95 %');
  expect(sayOdds(0)).toBe('0 %');
});

it('levelWith(standing, option) reads every group that holds an option, rising, and is the same both ways', () => {
  const standing = { groups: [[4, 2, 7], [2, 7, 1], [9]] };
  expect(levelWith(standing, 2)).toEqual([1, 4, 7]);
  expect(levelWith(standing, 4)).toEqual([2, 7]);
  expect(levelWith(standing, 9)).toEqual([]);
  for (const a of [1, 2, 4, 7, 9])
    for (const b of levelWith(standing, a)) expect(levelWith(standing, b)).toContain(a);
});
