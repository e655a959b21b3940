import type { Books, FormId, Site } from '../model/index.ts';
import { items } from '../takeoff/index.ts';
import type { DriverId } from './drivers.ts';
import { driverData, driverIds } from './drivers.ts';
import { normalQuantile } from './normal.ts';
import { uniformStream } from './stream.ts';

/**
 * One set of draws of a study, common to every option. Every array holds one value a draw and is never written again.
 * It depends on the seed, the number of draws, the length and ground odds of the crossing and the forms; not on rates,
 * quantities or options.
 */
export interface Draws {
  readonly count: number;
  readonly seed: number;
  /** Standard normal draws of each driver. */
  readonly drivers: Readonly<Record<DriverId, Float64Array>>;
  /** Standard normal draws of each item's own spread. */
  readonly own: ReadonlyMap<string, Float64Array>;
  /** For each ground stretch, the index of the class drawn. */
  readonly ground: readonly Uint8Array[];
  /** For each ground stretch and each of its classes, the draws in which it is of that class. */
  readonly drawnAs: readonly (readonly Uint32Array[])[];
  /** Factor of the local error of the ground for each length of the crossing, from its start, median 1. */
  readonly localGround: readonly Float64Array[];
  /** Factor of the private model error of each form, median 1: one draw shared by all options of the form. */
  readonly modelError: ReadonlyMap<FormId, Float64Array>;
}

/**
 * Draws the drivers once for a study. Each driver, item, stretch, length of ground and form has its own stream, so that adding
 * a form or an item leaves every other draw as it was.
 * Throws a RangeError on fewer than 100 draws, a seed that is no integer, or a form without a model error.
 */
export function drawDrivers(
  site: Pick<Site, 'groundStretches' | 'lengthM'>,
  books: Pick<Books, 'draws' | 'seed'>,
  forms: readonly FormId[],
): Draws {
  const { draws: count, seed } = books;
  if (!(Number.isInteger(count) && count >= 100)) {
    throw new RangeError(`draws: expected a whole number of 100 or more, received ${count}`);
  }
  if (!Number.isSafeInteger(seed)) throw new RangeError(`seed: expected a whole number, received ${seed}`);
  const drivers = Object.fromEntries(
    driverIds.map((id) => [id, normals(count, seed, `driver ${id}`)]),
  ) as Record<DriverId, Float64Array>;
  const own = new Map(items.map(({ id }) => [id, normals(count, seed, `item ${id}`)]));
  const ground = site.groundStretches.map(({ classes }, index) =>
    classesDrawn(
      count,
      uniformStream(seed, `ground ${index}`),
      classes.map(({ odds }) => odds),
    ),
  );
  const drawnAs = site.groundStretches.map(({ classes }, index) => listed(ground[index]!, classes.length));
  const { everyM, sigma } = driverData.localGround;
  const localGround = Array.from({ length: Math.floor(site.lengthM / everyM) + 1 }, (_, index) =>
    factors(sigma, count, seed, `local ground ${index}`),
  );
  const modelError = new Map(forms.map((form) => [form, modelErrors(form, count, seed)]));
  return { count, seed, drivers, own, ground, drawnAs, localGround, modelError };
}

function normals(count: number, seed: number, name: string): Float64Array {
  const next = uniformStream(seed, name);
  const Z = new Float64Array(count);
  for (let k = 0; k < count; k++) Z[k] = normalQuantile(next());
  return Z;
}

function classesDrawn(count: number, next: () => number, odds: readonly number[]): Uint8Array {
  const C = new Uint8Array(count);
  const last = odds.length - 1;
  for (let k = 0; k < count; k++) {
    let u = next();
    let index = 0;
    while (index < last && u >= odds[index]!) {
      u -= odds[index]!;
      index++;
    }
    C[k] = index;
  }
  return C;
}

/** The draws of each of a number of classes. */
function listed(C: Uint8Array, classes: number): Uint32Array[] {
  return Array.from({ length: classes }, (_, of) => Uint32Array.from(C.keys()).filter((k) => C[k] === of));
}

function modelErrors(form: FormId, count: number, seed: number): Float64Array {
  const found = driverData.modelError.find((entry) => entry.form === form);
  if (found === undefined) {
    throw new RangeError(
      `model error of ${form}: expected an entry in data/rates/drivers.json, received none; add one`,
    );
  }
  return factors(found.sigma, count, seed, `form ${form}`);
}

const optionErrors = new WeakMap<Draws, Map<number, Float64Array>>();

/**
 * Factor of the private error of one option, median 1, drawn from the number it keeps for life: what no driver shares and
 * no other option has. Drawn once for each set of draws.
 */
export function optionError(draws: Draws, number: number): Float64Array {
  const known = optionErrors.get(draws) ?? new Map<number, Float64Array>();
  optionErrors.set(draws, known);
  const found =
    known.get(number) ?? factors(driverData.optionError.sigma, draws.count, draws.seed, `option ${number}`);
  known.set(number, found);
  return found;
}

/** Lognormal factors of median 1. */
function factors(sigma: number, count: number, seed: number, name: string): Float64Array {
  const E = normals(count, seed, name);
  for (let k = 0; k < count; k++) E[k] = Math.exp(sigma * E[k]!);
  return E;
}
