import { describe, expect, it } from 'vitest';
import { figure, type Context } from '../../lib/explain/index.ts';
import {
  drawDrivers,
  drawRates,
  optionError,
  ratesFor,
  type Draws,
  type RateDraws,
} from '../../lib/price/index.ts';
import { example } from './contexts.ts';

/** Quantile by sorting, straight between order statistics. */
function quantile(draws: readonly number[], p: number): number {
  const sorted = [...draws].sort((a, b) => a - b);
  const at = p * (sorted.length - 1);
  const low = Math.floor(at);
  return sorted[low]! + (at - low) * ((sorted[low + 1] ?? sorted[low]!) - sorted[low]!);
}

const number = (context: Context, path: string): number => Number(figure(context, path).value);

/** Lines that a figure comes down to, through what is founded under each support. */
function linesUnder(context: Context, path: string): string[] {
  return figure(context, path).because.inputs.flatMap((input) => {
    if (/\/lines\/\d+$/u.test(input.path)) return [input.path];
    return /\/founded\//u.test(input.path) ? linesUnder(context, input.path) : [];
  });
}

/** Draws of one part of the bill, draw by draw from the inputs that its explanation names. */
function partDraws(context: Context, draws: Draws, rates: RateDraws, option: number, part: string): number[] {
  const own = context.appraisal.options.find((one) => one.number === option)!;
  const lines = linesUnder(context, `options/${option}/parts/${part}`);
  const z90 = 1.2815515655446004;
  const everyM = number(context, 'data/drivers/localGround/everyM');
  const sum = new Float64Array(draws.count);
  for (const path of lines) {
    const rate = figure(context, path).because.inputs.find((input) => input.path.startsWith('rates/'))!;
    const item = rate.path.split('/')[1]!;
    const quantity = number(context, `${path}/quantity`);
    const R = rates.get(item)!;
    const [, support, foundation] = /supports\/(\d+)\/foundations\/(\d+)/u.exec(path) ?? [];
    if (support !== undefined) {
      const stand = own.supports[Number(support)]!;
      const C = draws.ground[stand.stretch]!;
      const L = draws.localGround[Math.floor((stand.chainageM - own.supports[0]!.chainageM) / everyM)]!;
      for (let k = 0; k < sum.length; k++) {
        if (C[k] === Number(foundation)) sum[k] = sum[k]! + quantity * R[k]! * L[k]!;
      }
      continue;
    }
    const { unit } = own.lines[Number(path.split('/').at(-1))]!;
    const E = unit === undefined ? null : draws.modelError.get(own.units[unit]!.form)!;
    const { p10, p50, p90 } = own.months;
    const Z = item === 'site-month' ? draws.drivers.productivity : null;
    for (let k = 0; k < sum.length; k++) {
      const pace = Z === null ? 1 : (Z[k]! < 0 ? p50 / p10 : p90 / p50) ** (Z[k]! / z90);
      sum[k] = sum[k]! + quantity * R[k]! * (E?.[k] ?? 1) * pace;
    }
  }
  return [...optionError(draws, option)].map((error, k) => error * sum[k]!);
}

describe('figures counted on draws, drawn again from the inputs their explanations name', () => {
  const all = (): Map<number, Map<string, number[]>> => {
    const context = example();
    const { study, appraisal } = context;
    const forms = [...new Set(appraisal.options.flatMap(({ units }) => units.map(({ form }) => form)))];
    const draws = drawDrivers(appraisal.site, study.books, forms);
    const rates = drawRates(ratesFor(study.books), draws);
    // The cheapest of each form: every kind of part is among them.
    const chosen = forms
      .map((form) => appraisal.options.find((option) => option.form === form))
      .filter((one) => one !== undefined);
    return new Map(
      chosen.map(({ number: n, parts }) => [
        n,
        new Map(parts.map(({ part }) => [part, partDraws(context, draws, rates, n, part)])),
      ]),
    );
  };
  let drawn: Map<number, Map<string, number[]>> | null = null;
  const drawnOnce = (): Map<number, Map<string, number[]>> => (drawn ??= all());
  const totals = (parts: ReadonlyMap<string, number[]>, without = ''): number[] => {
    const kept = [...parts].filter(([part]) => part !== without).map(([, draws]) => draws);
    return kept[0]!.map((_, k) => kept.reduce((sum, draws) => sum + draws[k]!, 0));
  };

  it('parts/:part is the median of the draws of its lines', { timeout: 60_000 }, () => {
    for (const [option, parts] of drawnOnce())
      for (const [part, draws] of parts)
        expect(quantile(draws, 0.5) / number(example(), `options/${option}/parts/${part}`), part).toBeCloseTo(
          1,
          9,
        );
  });

  it('cost, quartiles and price per m2 are quantiles of the sum of the parts', () => {
    for (const [option, parts] of drawnOnce()) {
      const sum = totals(parts);
      const path = `options/${option}`;
      for (const [steps, p] of [
        ['cost/p10', 0.1],
        ['cost/p50', 0.5],
        ['cost/p90', 0.9],
        ['quartiles/0', 0.25],
        ['quartiles/1', 0.75],
      ] as const)
        expect(quantile(sum, p) / number(example(), `${path}/${steps}`), steps).toBeCloseTo(1, 9);
      const without = quantile(totals(parts, 'approaches'), 0.5) / number(example(), `${path}/deckAreaM2`);
      expect(without / number(example(), `${path}/pricePerM2/withoutApproaches`)).toBeCloseTo(1, 9);
    }
  });

  it('standing/odds and standing/within count draws', () => {
    const budget = number(example(), 'brief/budget/amount');
    const options = [...drawnOnce()].map(([option, parts]) => [option, totals(parts)] as const);
    for (const [a, A] of options) {
      expect(number(example(), `standing/within/${a}`)).toBe(
        A.filter((cost) => cost <= budget).length / A.length,
      );
      for (const [b, B] of options) {
        if (a === b) continue;
        const cheaper = A.filter((cost, k) => cost < B[k]!).length / A.length;
        expect(number(example(), `standing/odds/${a}/${b}`)).toBeCloseTo(cheaper, 12);
      }
    }
  });
});
