import type { BillPart, FormId, MeasuredLine, Spread, WorkedOption } from '../model/index.ts';
import { billParts } from '../model/index.ts';
import { addLines, type Sum } from './addLines.ts';
import type { Draws } from './drawDrivers.ts';
import type { RateDraws } from './drawRates.ts';
import { driverData } from './drivers.ts';
import { quantileOf, quantilesOf } from './quantile.ts';
import { halfSigmas } from './rates.ts';

/** Draws priced at a time: their rates are then near at hand for every line. */
const BLOCK = 1000;

/** What an option costs on the draws of the study, money. */
export interface PricedOption {
  /** Cost in each draw. */
  readonly totals: Float64Array;
  readonly cost: Spread;
  readonly quartiles: readonly [q1: number, q3: number];
  /** Median of each part of the bill, in the order of the bill. Medians of parts do not add up to the median of the whole. */
  readonly parts: readonly { readonly part: BillPart; readonly p50: number }[];
  /** Median of the cost without the approaches. */
  readonly withoutApproachesP50: number;
}

/** What pricing reads of an option. */
export type Priceable = Pick<WorkedOption, 'units' | 'lines' | 'supports' | 'months'>;

/**
 * Prices one option on the draws of its study: quantities times drawn rates, lines of each unit times the model error of its
 * form, months by the productivity driver, and under every support the foundation of the ground class drawn for its stretch,
 * with the local error of the ground there.
 * `privateError` is a factor on everything in each draw, see `optionError`; null = none.
 * Risk is carried by these draws alone; no contingency is added on top.
 * Throws a RangeError on a line without a rate, a form without draws, or a support off the crossing that was drawn.
 */
export function priceOption(
  option: Priceable,
  draws: Draws,
  rates: RateDraws,
  privateError: Float64Array | null = null,
): PricedOption {
  const n = draws.count;
  const parts = new Map<BillPart, Float64Array>();
  const partOf = (part: BillPart): Float64Array => {
    let found = parts.get(part);
    if (found === undefined) parts.set(part, (found = scratch(part, n).fill(0)));
    return found;
  };
  const ones = scratch('ones', n).fill(1);
  const sums: Sum[] = groupLines(option).map((group) => ({
    to: partOf(group.part),
    factor: factorOf(group, option, draws) ?? ones,
    draws: null,
    quantities: [...group.items.values()],
    rates: ratesOf(rates, group.items),
  }));
  const first = option.supports[0]?.chainageM ?? 0;
  for (const support of option.supports) {
    const drawn = draws.drawnAs[support.stretch];
    const L = draws.localGround[Math.floor((support.chainageM - first) / driverData.localGround.everyM)];
    if (drawn === undefined || L === undefined) {
      throw new RangeError(
        `support at ${support.chainageM} m: expected a place on the crossing that was drawn, received stretch ${support.stretch}`,
      );
    }
    support.foundations.forEach(({ lines }, ground) => {
      for (const [part, items] of itemsByPart(lines))
        sums.push({
          to: partOf(part),
          factor: L,
          draws: drawn[ground]!,
          quantities: [...items.values()],
          rates: ratesOf(rates, items),
        });
    });
  }
  const inOrder = billParts.flatMap((part) => parts.get(part) ?? []);
  const totals = new Float64Array(n);
  for (let from = 0; from < n; from += BLOCK) {
    const to = Math.min(n, from + BLOCK);
    for (const sum of sums) addLines(sum, from, to);
    for (const P of inOrder) addWithError(totals, P, privateError ?? ones, from, to);
  }
  const [p10, q1, p50, q3, p90] = quantilesOf(totals, [0.1, 0.25, 0.5, 0.75, 0.9]) as Quantiles;
  const approaches = parts.get('approaches');
  return {
    totals,
    cost: { p10, p50, p90 },
    quartiles: [q1, q3],
    parts: billParts.flatMap((part) => {
      const P = parts.get(part);
      return P === undefined ? [] : [{ part, p50: quantileOf(P, 0.5) }];
    }),
    withoutApproachesP50: approaches === undefined ? p50 : quantileOf(less(totals, approaches), 0.5),
  };
}

/** Arrays that are done with when an option is priced, one for each use: a fresh megabyte an option keeps the collector busy. */
const scratches = new Map<string, Float64Array>();

function scratch(use: string, n: number): Float64Array {
  let found = scratches.get(use);
  if (found?.length !== n) scratches.set(use, (found = new Float64Array(n)));
  return found;
}

/** P times its error, and that added to T, in each draw from `from` to before `to`. */
function addWithError(T: Float64Array, P: Float64Array, error: Float64Array, from: number, to: number): void {
  for (let k = from; k < to; k++) {
    const cost = P[k]! * error[k]!;
    P[k] = cost;
    T[k] = T[k]! + cost;
  }
}

/** T - P in each draw. */
function less(T: Float64Array, P: Float64Array): Float64Array {
  const L = scratch('less', T.length);
  for (let k = 0; k < L.length; k++) L[k] = T[k]! - P[k]!;
  return L;
}

type Quantiles = [p10: number, q1: number, p50: number, q3: number, p90: number];

/** Lines of one part that share a factor: the model error of a form, the months, or none. */
interface Group {
  readonly part: BillPart;
  readonly form: FormId | null;
  readonly monthly: boolean;
  readonly items: Map<string, number>;
}

function groupLines(option: Priceable): Group[] {
  const groups = new Map<string, Group>();
  for (const line of option.lines) {
    const form = line.unit === undefined ? null : unitForm(option, line);
    const monthly = line.item === 'site-month';
    const key = `${line.part} ${form ?? ''} ${monthly}`;
    let group = groups.get(key);
    if (group === undefined) groups.set(key, (group = { part: line.part, form, monthly, items: new Map() }));
    group.items.set(line.item, (group.items.get(line.item) ?? 0) + line.quantity);
  }
  return [...groups.values()];
}

function unitForm(option: Priceable, line: MeasuredLine): FormId {
  const unit = option.units[line.unit!];
  if (unit === undefined) {
    throw new RangeError(`${line.what}: expected a unit of the option, received unit ${line.unit}`);
  }
  return unit.form;
}

function factorOf(group: Group, option: Priceable, draws: Draws): Float64Array | null {
  if (group.form !== null) {
    const error = draws.modelError.get(group.form);
    if (error === undefined) {
      throw new RangeError(
        `draws: expected a model error for ${group.form}, received none; draw for every form used`,
      );
    }
    return error;
  }
  if (!group.monthly) return null;
  const { low, high } = halfSigmas(option.months);
  const Z = draws.drivers.productivity;
  const F = scratch(`months of ${group.part}`, Z.length);
  for (let k = 0; k < F.length; k++) F[k] = Math.exp((Z[k]! < 0 ? low : high) * Z[k]!);
  return F;
}

/** Quantities of measured lines by part of the bill and item. */
function itemsByPart(lines: readonly MeasuredLine[]): Map<BillPart, Map<string, number>> {
  const parts = new Map<BillPart, Map<string, number>>();
  for (const { part, item, quantity } of lines) {
    let items = parts.get(part);
    if (items === undefined) parts.set(part, (items = new Map<string, number>()));
    items.set(item, (items.get(item) ?? 0) + quantity);
  }
  return parts;
}

/** The rates of items in each draw, in their order. */
function ratesOf(rates: RateDraws, items: ReadonlyMap<string, unknown>): Float64Array[] {
  return [...items.keys()].map((item) => {
    const found = rates.get(item);
    if (found === undefined)
      throw new RangeError(`rate of ${item}: expected one in the rate pack, received none`);
    return found;
  });
}
