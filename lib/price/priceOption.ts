import type { BillPart, FormId, MeasuredLine, Spread, Support, WorkedOption } from '../model/index.ts';
import { billParts } from '../model/index.ts';
import type { Draws } from './drawDrivers.ts';
import type { RateDraws } from './drawRates.ts';
import { driverData } from './drivers.ts';
import { quantileOf, quantilesOf } from './quantile.ts';
import { halfSigmas } from './rates.ts';

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
    if (found === undefined) parts.set(part, (found = new Float64Array(n)));
    return found;
  };
  const F = new Float64Array(n);
  for (const group of groupLines(option)) {
    const P = partOf(group.part);
    const factor = factorOf(group, option, draws);
    F.fill(0);
    addLines(factor === null ? P : F, [...group.items.values()], ratesOf(rates, group.items));
    if (factor !== null) addProduct(P, F, factor);
  }
  const first = option.supports[0]?.chainageM ?? 0;
  for (const support of option.supports) {
    const C = draws.ground[support.stretch];
    const L = draws.localGround[Math.floor((support.chainageM - first) / driverData.localGround.everyM)];
    if (C === undefined || L === undefined) {
      throw new RangeError(
        `support at ${support.chainageM} m: expected a place on the crossing that was drawn, received stretch ${support.stretch}`,
      );
    }
    for (const [part, items] of foundationItems(support)) {
      F.fill(0);
      addByClass(F, [...items.values()], C, ratesOf(rates, items));
      addProduct(partOf(part), F, L);
    }
  }
  if (privateError !== null) {
    for (const P of parts.values()) multiply(P, privateError);
  }
  const totals = new Float64Array(n);
  for (const part of billParts) {
    const P = parts.get(part);
    if (P !== undefined) addTimes(totals, 1, P);
  }
  const [p10, q1, p50, q3, p90] = quantilesOf(totals, [0.1, 0.25, 0.5, 0.75, 0.9]) as Quantiles;
  const approaches = parts.get('approaches');
  const without = Float64Array.from(totals);
  if (approaches !== undefined) addTimes(without, -1, approaches);
  return {
    totals,
    cost: { p10, p50, p90 },
    quartiles: [q1, q3],
    parts: billParts.flatMap((part) => {
      const P = parts.get(part);
      return P === undefined ? [] : [{ part, p50: quantileOf(P, 0.5) }];
    }),
    withoutApproachesP50: quantileOf(without, 0.5),
  };
}

/** T + quantity R in each draw. */
function addTimes(T: Float64Array, quantity: number, R: Float64Array): void {
  for (let k = 0; k < T.length; k++) T[k] = T[k]! + quantity * R[k]!;
}

/** T + A B in each draw. */
function addProduct(T: Float64Array, A: Float64Array, B: Float64Array): void {
  for (let k = 0; k < T.length; k++) T[k] = T[k]! + A[k]! * B[k]!;
}

/** T times A in each draw. */
function multiply(T: Float64Array, A: Float64Array): void {
  for (let k = 0; k < T.length; k++) T[k] = T[k]! * A[k]!;
}

/** Lines added in one pass over the draws: what is added to is read and written once for four. */
const TOGETHER = 4;

/** T + the sum of quantities times their rates in each draw, in the order given. */
function addLines(T: Float64Array, quantities: readonly number[], rates: readonly Float64Array[]): void {
  let at = 0;
  for (; at + TOGETHER <= rates.length; at += TOGETHER) {
    const [a, b, c, d] = quantities.slice(at, at + TOGETHER) as Four<number>;
    const [A, B, C, D] = rates.slice(at, at + TOGETHER) as Four<Float64Array>;
    for (let k = 0; k < T.length; k++) T[k] = T[k]! + a * A[k]! + b * B[k]! + c * C[k]! + d * D[k]!;
  }
  for (; at < rates.length; at++) addTimes(T, quantities[at]!, rates[at]!);
}

/** The same where each quantity is that of the ground class drawn. */
function addByClass(
  T: Float64Array,
  byClass: readonly Float64Array[],
  drawnClass: Uint8Array,
  rates: readonly Float64Array[],
): void {
  let at = 0;
  for (; at + TOGETHER <= rates.length; at += TOGETHER) {
    const [a, b, c, d] = byClass.slice(at, at + TOGETHER) as Four<Float64Array>;
    const [A, B, C, D] = rates.slice(at, at + TOGETHER) as Four<Float64Array>;
    for (let k = 0; k < T.length; k++) {
      const on = drawnClass[k]!;
      T[k] = T[k]! + a[on]! * A[k]! + b[on]! * B[k]! + c[on]! * C[k]! + d[on]! * D[k]!;
    }
  }
  for (; at < rates.length; at++) {
    const [a, A] = [byClass[at]!, rates[at]!];
    for (let k = 0; k < T.length; k++) T[k] = T[k]! + a[drawnClass[k]!]! * A[k]!;
  }
}

type Four<T> = [T, T, T, T];

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
  const F = Float64Array.from(draws.drivers.productivity);
  for (let k = 0; k < F.length; k++) F[k] = Math.exp((F[k]! < 0 ? low : high) * F[k]!);
  return F;
}

/** Quantities of the foundations of a support by part and item, one for each class its ground may turn out to be. */
function foundationItems(support: Support): Map<BillPart, Map<string, Float64Array>> {
  const parts = new Map<BillPart, Map<string, Float64Array>>();
  support.foundations.forEach((foundation, index) => {
    for (const { part, item, quantity } of foundation.lines) {
      let items = parts.get(part);
      if (items === undefined) parts.set(part, (items = new Map<string, Float64Array>()));
      let byClass = items.get(item);
      if (byClass === undefined) items.set(item, (byClass = new Float64Array(support.foundations.length)));
      byClass[index] = byClass[index]! + quantity;
    }
  });
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
