import type { z } from '../zod.ts';
import type { Problem, ProblemCode } from '../model/index.ts';
import { problem } from './problem.ts';
import { shown } from './shown.ts';

type Issue = z.core.$ZodIssue;
type Path = (string | number)[];

const unitOf: readonly (readonly [ending: RegExp, unit: string])[] = [
  [/M$/u, 'm'],
  [/MassT$/u, 't'],
  [/Deg$/u, 'degrees'],
];

function unitFor(path: Path): string | undefined {
  const last = path.findLast((key) => typeof key === 'string');
  return last === undefined ? undefined : unitOf.find(([ending]) => ending.test(last))?.[1];
}

function keysOf(path: readonly PropertyKey[]): Path {
  return path.map((key) => (typeof key === 'symbol' ? key.toString() : key));
}

/** What stands at a path of plain data; undefined where it leads nowhere. */
export function valueAt(root: unknown, path: readonly (string | number)[]): unknown {
  let value = root;
  for (const key of path) {
    if (typeof value !== 'object' || value === null || !Object.hasOwn(value, key)) return undefined;
    value = (value as Record<string | number, unknown>)[key];
  }
  return value;
}

const nouns: Readonly<Record<string, string>> = {
  number: 'a number',
  int: 'a whole number',
  string: 'text',
  boolean: 'true or false',
  object: 'a group of named values',
  record: 'a group of named values',
  array: 'a list',
  tuple: 'a list',
  null: 'nothing',
};

/** What one issue of a schema asked for, in words. */
function expectation(issue: Issue): string {
  switch (issue.code) {
    case 'invalid_type':
      return nouns[issue.expected] ?? issue.expected;
    case 'invalid_value':
      return issue.values.map((value) => shown(value)).join(' or ');
    case 'invalid_union':
      return [...new Set(issue.errors.flatMap((branch) => branch.slice(0, 1).map(expectation)))].join(' or ');
    case 'too_small':
      return `${issue.inclusive === true ? 'at least' : 'more than'} ${issue.minimum}${sized(issue.origin)}`;
    case 'too_big':
      return `${issue.inclusive === true ? 'at most' : 'less than'} ${issue.maximum}${sized(issue.origin)}`;
    case 'custom':
      return issue.message;
    default:
      return 'a value of the right form';
  }
}

function sized(origin: string): string {
  if (origin === 'array') return ' entries';
  return origin === 'string' ? ' characters' : '';
}

const kinds: Readonly<Partial<Record<NonNullable<Issue['code']>, ProblemCode>>> = {
  invalid_type: 'wrong-type',
  invalid_value: 'not-in-list',
  invalid_union: 'wrong-type',
  too_small: 'too-small',
  too_big: 'too-large-value',
};

/** Issues of the branch of a union that got furthest into the value, or null when none got past its outside. */
function deepestBranch(issue: Issue): readonly Issue[] | null {
  if (issue.code !== 'invalid_union') return null;
  const deep = issue.errors.filter((branch) =>
    branch.every((inner) => inner.path.length > 0 || inner.code === 'unrecognized_keys'),
  );
  return deep.find((branch) => branch.length > 0) ?? null;
}

function translate(issue: Issue, root: unknown, above: Path): Problem[] {
  const path = [...above, ...keysOf(issue.path)];
  if (issue.code === 'unrecognized_keys') {
    return issue.keys.map((key) =>
      problem('unknown-key', [...path, key], 'no such entry', shown(valueAt(root, [...path, key]))),
    );
  }
  const branch = deepestBranch(issue);
  if (branch !== null) return branch.flatMap((inner) => translate(inner, root, path));
  const value = valueAt(root, path);
  const expected = expectation(issue);
  if (value === undefined) return [problem('missing', path, expected, 'nothing')];
  const code = kinds[issue.code] ?? 'refused';
  const numeric = code === 'too-small' || code === 'too-large-value';
  return [
    problem(code, path, expected, shown(value), {
      unit: numeric && typeof value === 'number' ? unitFor(path) : undefined,
    }),
  ];
}

/** The one place where issues of the schema library become problems of ours; `root` is the value that was parsed. */
export function schemaProblems(issues: readonly Issue[], root: unknown): Problem[] {
  return issues.flatMap((issue) => translate(issue, root, []));
}
