import fc from 'fast-check';
import { expect, it } from 'vitest';
import type { Contender } from '../../lib/decide/index.ts';
import { stand } from '../../lib/decide/index.ts';
import { drawDrivers, drawRates, priceOption, ratesFor } from '../../lib/price/index.ts';
import { items } from '../../lib/takeoff/index.ts';
import { lineOf, optionOf } from '../price/priced.ts';
import { crossing } from '../substructure/crossing.ts';

const rates = ratesFor({ ratePack: 'demo-2026', rates: [] });
const draws = drawDrivers(crossing, { draws: 500, seed: 99 }, ['composite-i']);
const drawn = drawRates(rates, draws);
const seed = { seed: 20260114 };

const lines = fc.array(
  fc.record({
    item: fc.constantFrom(...items.map((i) => i.id)),
    quantity: fc.double({ min: 0.1, max: 1e5, noNaN: true }),
  }),
  { minLength: 1, maxLength: 12 },
);

it('priceOption(any lines) has p10 < q1 < p50 < q3 < p90 and grows with every quantity', () => {
  fc.assert(
    fc.property(lines, (list) => {
      const made = list.map(({ item, quantity }) => lineOf(item, quantity, { unit: 0 }));
      const { cost, quartiles, totals } = priceOption(optionOf(made), draws, drawn);
      expect(cost.p10).toBeLessThan(quartiles[0]);
      expect(quartiles[0]).toBeLessThan(cost.p50);
      expect(cost.p50).toBeLessThan(quartiles[1]);
      expect(quartiles[1]).toBeLessThan(cost.p90);
      const more = priceOption(
        optionOf([...made, lineOf(list[0]!.item, list[0]!.quantity)]),
        draws,
        drawn,
      ).totals;
      expect(totals.every((total, k) => more[k]! > total)).toBe(true);
    }),
    { ...seed, numRuns: 100 },
  );
});

it('drawDrivers(seed) repeats, and a form more leaves every other draw as it was', () => {
  const again = drawDrivers(crossing, { draws: 500, seed: 99 }, ['truss', 'composite-i']);
  for (const [id, Z] of Object.entries(draws.drivers))
    expect(again.drivers[id as keyof typeof again.drivers]).toEqual(Z);
  for (const [item, Z] of draws.own) expect(again.own.get(item)).toEqual(Z);
  expect(again.ground).toEqual(draws.ground);
  expect(again.localGround).toEqual(draws.localGround);
  expect(again.modelError.get('composite-i')).toEqual(draws.modelError.get('composite-i'));
  const other = drawDrivers(crossing, { draws: 500, seed: 100 }, ['composite-i']);
  expect(other.drivers.market).not.toEqual(draws.drivers.market);
});

it('drawRates(a typed rate) moves that rate and no other', () => {
  const typed = ratesFor({
    ratePack: 'demo-2026',
    rates: [{ item: 'plate-girder-steel', p10: 4, p50: 5, p90: 7, reason: 'quotation' }],
  });
  const moved = drawRates(typed, draws);
  for (const [item, R] of drawn) {
    if (item === 'plate-girder-steel') expect(moved.get(item)).not.toEqual(R);
    else expect(moved.get(item)).toEqual(R);
  }
});

const contenders = fc
  .uniqueArray(fc.integer({ min: 1, max: 40 }), { minLength: 2, maxLength: 9 })
  .chain((numbers) =>
    fc.tuple(
      ...numbers.map((number) =>
        fc.record({
          number: fc.constant(number),
          status: fc.constantFrom('in', 'possible', 'out'),
          scale: fc.double({ min: 0.8, max: 1.2, noNaN: true }),
          wobble: fc.array(fc.double({ min: 0.7, max: 1.4, noNaN: true }), { minLength: 21, maxLength: 21 }),
        }),
      ),
    ),
  )
  .map((list): Contender[] =>
    list.map(({ number, status, scale, wobble }) => {
      const totals = Float64Array.from(wobble, (w, k) => scale * w * (1 + k / 50));
      return { number, status, totals, p50: totals.slice().sort()[10]! };
    }),
  );
const books = { unseparated: [0.2, 0.8] as const, currency: 'EUR' };
const rank = (list: readonly Contender[]): number[] => {
  const place = new Map<number, number>();
  stand(list, books, 'unknown')
    .groups.flat()
    .forEach((n, k) => {
      if (!place.has(n)) place.set(n, k);
    });
  return [...place.keys()];
};

it('stand(options) never reorders the others when one is added or taken away', () => {
  fc.assert(
    fc.property(contenders, fc.nat(), (list, pick) => {
      const gone = list[pick % list.length]!;
      const rest = list.filter((option) => option !== gone);
      const whole = stand(list, books, 'unknown');
      const less = stand(rest, books, 'unknown');
      const kept = rank(list).filter((n) => n !== gone.number);
      expect(rank(rest)).toEqual(kept);
      for (const a of rest) {
        for (const b of rest)
          if (a !== b) expect(less.odds[a.number]![b.number]).toBe(whole.odds[a.number]![b.number]);
      }
      if (whole.leader !== gone.number) expect(less.leader).toBe(whole.leader);
    }),
    { ...seed, numRuns: 200 },
  );
});

it('stand(options) makes maximal runs: every pair inside is unseparated, no run lies in another, all that no rule puts out are in one', () => {
  fc.assert(
    fc.property(contenders, (list) => {
      const { groups, odds, leader } = stand(list, books, 'unknown');
      const order = list
        .filter(({ status }) => status !== 'out')
        .sort((a, b) => a.p50 - b.p50 || a.number - b.number)
        .map((o) => o.number);
      const alike = (a: number, b: number): boolean => odds[a]![b]! >= 0.2 && odds[a]![b]! <= 0.8;
      for (const group of groups) {
        const at = order.indexOf(group[0]!);
        expect(order.slice(at, at + group.length)).toEqual(group);
        group.forEach((a, i) => group.slice(i + 1).forEach((b) => expect(alike(a, b)).toBe(true)));
        const [before, after] = [order[at - 1], order[at + group.length]];
        if (before !== undefined) expect(group.every((a) => alike(before, a))).toBe(false);
        if (after !== undefined) expect(group.every((a) => alike(a, after))).toBe(false);
      }
      expect(new Set(groups.flat())).toEqual(new Set(order));
      expect(list.find((o) => o.number === leader)?.status ?? 'none').not.toBe('out');
    }),
    { ...seed, numRuns: 200 },
  );
});
