import type { Appraisal, Figure, FigureInput, FigureValue, Inputs, Told } from '../model/index.ts';
import type { At } from '../model/index.ts';
import type { Context } from './at.ts';
import { manual } from './manual.ts';
import { matcher, type Match } from './match.ts';
import { heldAt, heldPaths } from './read.ts';
import { sourceOf } from './sources.ts';

const match = matcher(manual);

const told = <T extends string | readonly string[]>(what: Told<T>, at: At): T =>
  typeof what === 'function' ? what(at) : what;

/** What has been asked of one appraisal so far; its figures do not change. */
interface Asked {
  readonly context: Context;
  readonly places: Map<string, Place>;
  readonly values: Map<string, FigureValue>;
  chart: Chart | null;
}

/** A figure by its own path: a group may have been asked for, and its likely value found. */
interface Place extends Match {
  readonly path: string;
}

/** Every figure that can be asked for, and which figures hang on each. */
interface Chart {
  readonly paths: readonly string[];
  readonly uses: ReadonlyMap<string, readonly string[]>;
}

const asked = new WeakMap<Appraisal, Asked>();

function askedOf(context: Context): Asked {
  const found = asked.get(context.appraisal);
  if (found?.context.study === context.study && found.context.rates === context.rates) return found;
  const fresh: Asked = { context, places: new Map(), values: new Map(), chart: null };
  asked.set(context.appraisal, fresh);
  return fresh;
}

/** The figure at a path; a group with a likely value is stood for by it (`options/3/cost` -> `options/3/cost/p50`). */
function placeOf(state: Asked, path: string): Place {
  const known = state.places.get(path);
  if (known !== undefined) return known;
  const { context } = state;
  const likely = `${path}/p50`;
  const own = match(context, path) ?? null;
  const standsIn = own === null && heldAt(context, likely) !== undefined ? match(context, likely) : null;
  const found = own === null ? standsIn && { path: likely, ...standsIn } : { path, ...own };
  if (found === null) throw new RangeError(`path: expected a figure of the study, received '${path}'`);
  state.places.set(path, found);
  return found;
}

/** Input paths of a figure, flat and in order. */
function inputPaths({ descriptor, at }: Match): string[] {
  return Object.values(descriptor.inputs?.(at) ?? {}).flat();
}

function valuesOf(state: Asked, inputs: Inputs): Readonly<Record<string, number | readonly number[]>> {
  const number = (path: string): number => Number(valueOf(state, path) ?? NaN);
  return Object.fromEntries(
    Object.entries(inputs).map(([name, paths]) => [
      name,
      typeof paths === 'string' ? number(paths) : paths.map(number),
    ]),
  );
}

function compute(state: Asked, { descriptor, at }: Match): number | undefined {
  const { inputs, compute: formula } = descriptor;
  if (inputs === undefined || formula === undefined) return undefined;
  // The names of the inputs were checked against the formula where the descriptor was written.
  return formula(valuesOf(state, inputs(at)) as Parameters<typeof formula>[0], at);
}

/** Result of a closed formula from its stated inputs alone; undefined where the figure has none. */
export function rebuilt(context: Context, path: string): number | undefined {
  const state = askedOf(context);
  return compute(state, placeOf(state, path));
}

function valueOf(state: Asked, asked: string): FigureValue {
  const place = placeOf(state, asked);
  const { path, descriptor, at } = place;
  const known = state.values.get(path);
  if (known !== undefined) return known;
  // An unknown is held as null in places: only what is not there at all is worked out.
  const held = descriptor.value === undefined ? heldAt(state.context, path) : descriptor.value(at);
  const value = held === undefined ? compute(state, place) : held;
  if (value === undefined) throw new RangeError(`path: expected a figure of the study, received '${path}'`);
  state.values.set(path, value);
  return value;
}

function inputOf(state: Asked, asked: string): FigureInput {
  const { path, descriptor, at } = placeOf(state, asked);
  const value = valueOf(state, path);
  const unknown = value === null || value === 'unknown';
  return {
    label: told(descriptor.label, at),
    path,
    value,
    unit: told(descriptor.unit, at),
    kind: unknown ? 'unknown' : told(descriptor.kind ?? 'computed', at),
  };
}

/** Goes through every held figure and on through inputs to those that are only worked out on the way. */
function chartOf(state: Asked): Chart {
  if (state.chart !== null) return state.chart;
  const { context } = state;
  const paths = new Set<string>();
  for (const path of heldPaths(context)) {
    const found = match(context, path);
    if (found === null) continue;
    state.places.set(path, { path, ...found });
    paths.add(path);
  }
  const uses = new Map<string, string[]>();
  // A set grows while it is gone through: figures behind figures are met in turn.
  for (const path of paths) {
    const inputs = new Set(inputPaths(placeOf(state, path)).map((input) => placeOf(state, input).path));
    for (const input of inputs) {
      const list = uses.get(input);
      if (list === undefined) uses.set(input, [path]);
      else list.push(path);
      paths.add(input);
    }
  }
  state.chart = { paths: [...paths], uses };
  return state.chart;
}

/** Every figure of an appraisal and of the study it was made of that can be asked where it comes from. */
export function figurePaths(context: Context): readonly string[] {
  return chartOf(askedOf(context)).paths;
}

/**
 * Where a figure comes from: its value with unit and range, how it was found, from which inputs after which sources, and
 * which figures hang on it. Made when it is asked for, from the study and its appraisal alone.
 *
 * Paths are those of the study (`brief`, `books`, `kept`), of the appraisal (`site`, `options` by number, `standing`,
 * `droppedCounts`), of the rates (`rates/plate-girder-steel`) and of the data files (`data/substructure/...`).
 *
 * @param path steps joined by '/', or a list of them; a spread stands for its likely value
 * @throws RangeError where there is no such figure
 */
export function figure(context: Context, path: string | readonly (string | number)[]): Figure {
  const state = askedOf(context);
  const place = placeOf(state, typeof path === 'string' ? path : path.join('/'));
  const { descriptor, at } = place;
  const { label, value, unit, kind } = inputOf(state, place.path);
  const range = descriptor.range?.(at);
  return {
    path: place.path,
    label,
    value,
    unit,
    ...(range === undefined ? {} : { range }),
    kind,
    because: {
      method: told(descriptor.method, at),
      formula: told(descriptor.formula, at),
      inputs: inputPaths(place).map((input) => inputOf(state, input)),
      sources: told(descriptor.sources ?? [], at).map(sourceOf),
    },
    // Looked up when it is read: it takes a walk over every figure once.
    get usedBy() {
      return chartOf(state).uses.get(place.path) ?? [];
    },
  };
}
