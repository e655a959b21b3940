import type { FigureValue } from '../model/index.ts';
import { ratesFor, type Rates } from '../price/index.ts';
import type { Context } from './at.ts';
import { shelved } from './shelf.ts';

/** Lists whose entries go by a field of theirs and not by their place. */
const namedBy: Readonly<Record<string, string>> = {
  options: 'number',
  parts: 'part',
  rulings: 'rule',
  checks: 'id',
  rates: 'item',
};

const isGroup = (value: unknown): value is Readonly<Record<string, unknown>> =>
  typeof value === 'object' && value !== null && !ArrayBuffer.isView(value);

/** Rates of a context, read from its study where they are not given. */
export function ratesOf({ study, rates }: Context): Rates {
  return rates ?? ratesFor(study.books);
}

/** What stands at the root of paths. */
function rootsOf(context: Context): Readonly<Record<string, unknown>> {
  const { study, appraisal } = context;
  return {
    brief: study.brief,
    books: study.books,
    kept: study.options.kept,
    site: appraisal.site,
    options: appraisal.options,
    droppedCounts: appraisal.droppedCounts,
    standing: appraisal.standing,
    rates: ratesOf(context).rates,
  };
}

/** The value held at a path: of the study, its appraisal, its rates or the data files; undefined where none is. */
export function heldAt(context: Context, path: string): FigureValue | undefined {
  if (path.startsWith('data/')) return shelved(path.slice('data/'.length))?.value;
  const steps = path.split('/');
  let holder: unknown = rootsOf(context)[steps[0]!];
  for (let i = 1; i < steps.length && holder !== undefined; i++) {
    const name = steps[i]!;
    const by = namedBy[steps[i - 1]!];
    if (Array.isArray(holder) && by !== undefined) {
      holder = holder.find((one: unknown) => isGroup(one) && String(one[by]) === name);
    } else holder = isGroup(holder) && Object.hasOwn(holder, name) ? holder[name] : undefined;
  }
  if (
    holder === null ||
    typeof holder === 'number' ||
    typeof holder === 'string' ||
    typeof holder === 'boolean'
  )
    return holder;
  return undefined;
}

/** What is drawn and not printed: no figure of it is asked for. */
const drawn: ReadonlySet<string> = new Set(['elevation', 'sections', 'depthAlong']);

/** Paths of everything held that is a number, a switch, an unknown or a word, in the order of the study. */
export function heldPaths(context: Context): string[] {
  const paths: string[] = [];
  const walk = (value: unknown, path: string, by: string | undefined): void => {
    if (Array.isArray(value)) {
      value.forEach((one: unknown, i) => {
        walk(one, `${path}/${by !== undefined && isGroup(one) ? String(one[by]) : i}`, undefined);
      });
    } else if (isGroup(value)) {
      for (const [key, one] of Object.entries(value))
        if (!drawn.has(key)) walk(one, `${path}/${key}`, namedBy[key]);
    } else if (value !== undefined) paths.push(path);
  };
  for (const [root, value] of Object.entries(rootsOf(context))) walk(value, root, namedBy[root]);
  return paths;
}
