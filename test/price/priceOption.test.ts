import { expect, it } from 'vitest';
import type { RateOverride } from '../../lib/model/index.ts';
import { drawDrivers, drawRates, priceOption, ratesFor } from '../../lib/price/index.ts';
import { loadings } from '../../lib/price/drivers.ts';
import { normalCdf } from '../../lib/price/normal.ts';
import { standSupports } from '../../lib/substructure/index.ts';
import { crossing, plainDesign, profile, unitOn } from '../substructure/crossing.ts';
import { lineOf, logStatistics, optionOf } from './priced.ts';

const books = { draws: 10_000, seed: 4 };
const draws = drawDrivers(crossing, books, ['composite-i', 'concrete-box', 'truss']);
const even = (item: string, p50: number, ratio: number): RateOverride => ({
  item,
  p10: p50 / ratio,
  p50,
  p90: p50 * ratio,
  reason: 'even on the ln scale',
});

it('priceOption(one line) is quantity times rate in every draw', () => {
  const rates = drawRates(ratesFor({ ratePack: 'demo-2026', rates: [] }), draws);
  const { totals, cost, parts } = priceOption(optionOf([lineOf('surfacing', 2400)]), draws, rates);
  const R = rates.get('surfacing')!;
  expect(totals.every((total, k) => Math.abs(total - 2400 * R[k]!) < 1e-6)).toBe(true);
  expect(parts).toEqual([{ part: 'deck', p50: cost.p50 }]);
});

it('priceOption(lines): totals are the sum of the parts in every draw, whatever their order', () => {
  const rates = drawRates(ratesFor({ ratePack: 'demo-2026', rates: [] }), draws);
  const lines = [
    lineOf('surfacing', 2400),
    lineOf('fill', 9000, { part: 'approaches' }),
    lineOf('site-month', 12, { part: 'preliminaries' }),
    lineOf('plate-girder-steel', 4e5, { unit: 0 }),
  ];
  const whole = priceOption(optionOf(lines), draws, rates);
  const apart = lines.map((line) => priceOption(optionOf([line]), draws, rates).totals);
  const again = priceOption(optionOf([...lines].reverse()), draws, rates);
  for (let k = 0; k < books.draws; k += 97) {
    expect(whole.totals[k]).toBeCloseTo(
      apart.reduce((sum, totals) => sum + totals[k]!, 0),
      3,
    );
    expect(again.totals[k]).toBeCloseTo(whole.totals[k]!, 3);
  }
  expect(whole.withoutApproachesP50).toBeLessThan(whole.cost.p50);
});

it('priceOption(unit lines) carries the model error of its form, one draw for all options of the form', () => {
  const rates = drawRates(ratesFor({ ratePack: 'demo-2026', rates: [] }), draws);
  const bare = priceOption(optionOf([lineOf('plate-girder-steel', 1000)]), draws, rates).totals;
  const marked = priceOption(
    optionOf([lineOf('plate-girder-steel', 1000, { unit: 0 })]),
    draws,
    rates,
  ).totals;
  const error = draws.modelError.get('composite-i')!;
  for (let k = 0; k < books.draws; k += 101) expect(marked[k]! / bare[k]!).toBeCloseTo(error[k]!, 9);
});

it('priceOption(months) moves the monthly line by the productivity driver, P10 and P90 as in the programme', () => {
  const fixed = ratesFor({ ratePack: 'demo-2026', rates: [even('site-month', 1000, 1.0000001)] });
  const priced = priceOption(
    optionOf([lineOf('site-month', 12, { part: 'preliminaries' })]),
    draws,
    drawRates(fixed, draws),
  );
  expect(Math.abs(priced.cost.p10 / 10_000 - 1)).toBeLessThan(0.01);
  expect(Math.abs(priced.cost.p50 / 12_000 - 1)).toBeLessThan(0.01);
  expect(Math.abs(priced.cost.p90 / 16_000 - 1)).toBeLessThan(0.015);
});

it('priceOption(supports) takes under every support of a stretch the foundation of the class drawn for it', () => {
  const rates = drawRates(ratesFor({ ratePack: 'demo-2026', rates: [] }), draws);
  const supports = standSupports(crossing, [unitOn([0, 60, 140, 200])], [plainDesign([60, 80, 60])], profile);
  const { totals } = priceOption(optionOf([], supports), draws, rates);
  for (let k = 0; k < books.draws; k += 211) {
    const drawn = draws.ground[0]![k]!;
    const expected = supports
      .flatMap((support) =>
        support.foundations[drawn]!.lines.map((line) => ({
          ...line,
          // One local error for every 10 m of the crossing.
          local: draws.localGround[Math.floor(support.chainageM / 10)]![k]!,
        })),
      )
      .reduce((sum, line) => sum + line.quantity * line.local * rates.get(line.item)![k]!, 0);
    expect(totals[k]! / expected).toBeCloseTo(1, 9);
  }
  const share = draws.ground[0]!.reduce((n, c) => n + (c === 0 ? 1 : 0), 0) / books.draws;
  expect(Math.abs(share - 0.6)).toBeLessThan(4 * Math.sqrt((0.6 * 0.4) / books.draws));
});

it('priceOption(two options) meets P = Phi(ln(m2/m1) / sqrt(s1^2 + s2^2 - 2 rho s1 s2)) on common draws', () => {
  const cases = [
    ['plate-girder-steel', 'box-concrete', 1.05],
    ['plate-girder-steel', 'truss-steel', 1.1],
    ['bored-pile', 'fill', 1.15],
    ['deck-concrete', 'box-concrete', 0.97],
  ] as const;
  for (const [one, two, gap] of cases) {
    const rates = ratesFor({ ratePack: 'demo-2026', rates: [even(one, 100, 1.3), even(two, 100, 1.4)] });
    const drawn = drawRates(rates, draws);
    const A = priceOption(optionOf([lineOf(one, 1)]), draws, drawn).totals;
    const B = priceOption(optionOf([lineOf(two, gap)]), draws, drawn).totals;
    const s1 = Math.log(1.3) / 1.2815515655446004;
    const s2 = Math.log(1.4) / 1.2815515655446004;
    const [l1, l2] = [loadings.get(one)!, loadings.get(two)!];
    const rho = l1.drivers.reduce(
      (sum, { driver, factor }) => sum + factor * (l2.drivers.find((d) => d.driver === driver)?.factor ?? 0),
      0,
    );
    const expected = normalCdf(Math.log(gap) / Math.sqrt(s1 * s1 + s2 * s2 - 2 * rho * s1 * s2));
    const share = A.reduce((n, a, k) => n + (a < B[k]! ? 1 : 0), 0) / books.draws;
    // Four standard errors of a share of 10,000 draws.
    expect(Math.abs(share - expected), `${one} against ${two}`).toBeLessThan(
      4 * Math.sqrt(0.25 / books.draws),
    );
    expect(Math.abs(logStatistics(A, B).rho - rho)).toBeLessThan(0.04);
  }
});

it('priceOption refuses a line without a rate and a form without draws', () => {
  const rates = drawRates(ratesFor({ ratePack: 'demo-2026', rates: [] }), draws);
  expect(() => priceOption(optionOf([lineOf('gold', 1)]), draws, rates)).toThrow(/rate of gold/);
  const few = drawDrivers(crossing, books, ['truss']);
  expect(() => priceOption(optionOf([lineOf('surfacing', 1, { unit: 0 })]), few, rates)).toThrow(
    /expected a model error for composite-i/,
  );
});

it('drawDrivers refuses too few draws, a broken seed and a form without a model error', () => {
  expect(() => drawDrivers(crossing, { draws: 10, seed: 1 }, [])).toThrow(/100 or more, received 10/);
  expect(() => drawDrivers(crossing, { draws: 1000, seed: 1.5 }, [])).toThrow(
    /seed: expected a whole number/,
  );
  expect(() => drawDrivers(crossing, { draws: 1000, seed: 1 }, ['suspension'])).toThrow(
    /model error of suspension/,
  );
});
