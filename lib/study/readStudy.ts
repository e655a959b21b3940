import type { Problem, Result, Study } from '../model/index.ts';
import { checkStudy } from './checks.ts';
import { migrate } from './migrate.ts';
import { problem } from './problem.ts';
import { safeJson } from './safeJson.ts';
import { studySchema, studyVersion } from './schema.ts';
import { schemaProblems, valueAt } from './schemaProblems.ts';
import { shown } from './shown.ts';

function headProblem(raw: Record<string, unknown>): Problem | null {
  if (raw['format'] !== 'spanledger-study') {
    return problem('wrong-format', ['format'], "'spanledger-study'", shown(raw['format']));
  }
  const version = raw['version'];
  if (version === undefined) return problem('missing', ['version'], 'a whole number', 'nothing');
  if (typeof version !== 'number' || !Number.isInteger(version)) {
    return problem('wrong-type', ['version'], 'a whole number', shown(version));
  }
  if (version < 1) return problem('too-small', ['version'], 'at least 1', `${version}`);
  if (version > studyVersion) {
    return problem('newer-version', ['version'], `at most ${studyVersion}`, `${version}`);
  }
  return null;
}

/**
 * A plain value of any version to a study: format and version, migration, schema with its defaults, then the checks
 * that span several fields. Gives either the study or every problem of the stage that failed; never throws.
 */
export function parseStudy(value: unknown): Result<Study> {
  if (typeof value !== 'object' || value === null || Array.isArray(value)) {
    return { ok: false, problems: [problem('wrong-type', [], 'a group of named values', shown(value))] };
  }
  const raw = value as Record<string, unknown>;
  const head = headProblem(raw);
  if (head !== null) return { ok: false, problems: [head] };
  const current = migrate(raw, raw['version'] as number, studyVersion);
  const parsed = studySchema.safeParse(current);
  if (!parsed.success) return { ok: false, problems: schemaProblems(parsed.error.issues, current) };
  const problems = checkStudy(parsed.data);
  return problems.length > 0 ? { ok: false, problems } : { ok: true, value: parsed.data };
}

/** Text of a study file to a study: size limit, JSON without prototype keys, then `parseStudy`. Never throws. */
export function readStudy(text: string): Result<Study> {
  const json = safeJson(text);
  return json.ok ? parseStudy(json.value) : json;
}

const isEntry = (value: unknown): boolean => typeof value === 'number' || typeof value === 'string';

/** Plain data with another entry at a path that leads to one. */
function withEntry<T>(root: T, path: readonly (string | number)[], value: unknown): T {
  const [key, ...rest] = path;
  if (key === undefined) return value as T;
  const part = withEntry((root as Record<string | number, unknown>)[key], rest, value);
  if (Array.isArray(root)) return root.map((one: unknown, i) => (i === key ? part : one)) as T;
  return { ...root, [key]: part };
}

/**
 * Entries that hold the place of a refused one while a shape is read: between them every entry of a study takes one,
 * wherever figures, counts and words may lie.
 */
const standIns: readonly (number | string)[] = [1, 0.1, 'unknown', 2, 100];

/** Plain data in which some entry that is allowed stands at `path`; unchanged where none of those at hand is. */
function withStandIn(
  root: Readonly<Record<string, unknown>>,
  path: readonly (string | number)[],
): Readonly<Record<string, unknown>> {
  const place = path.join('.');
  const isRefused = (study: unknown): boolean => {
    const parsed = studySchema.safeParse(study);
    return (
      !parsed.success &&
      schemaProblems(parsed.error.issues, study).some((one) => one.path.join('.') === place)
    );
  };
  const shapes = standIns.map((entry) => withEntry(root, path, entry));
  return shapes.find((shape) => !isRefused(shape)) ?? root;
}

/**
 * Text of a study as it was typed, which need not be valid: its shape is that of a study, single entries may lie outside
 * what is allowed and several may contradict each other. Null where the shape cannot be read. Never throws.
 */
export function readDraft(text: string): Study | null {
  const json = safeJson(text);
  if (!json.ok || typeof json.value !== 'object' || json.value === null) return null;
  const raw = json.value as Record<string, unknown>;
  if (headProblem(raw) !== null) return null;
  const current = migrate(raw, raw['version'] as number, studyVersion);
  const parsed = studySchema.safeParse(current);
  if (parsed.success) return parsed.data;
  const faults = schemaProblems(parsed.error.issues, current).map(({ path }) => ({
    path,
    typed: valueAt(current, path),
  }));
  if (!faults.every(({ typed }) => isEntry(typed))) return null;
  const shape = faults.reduce((study, { path }) => withStandIn(study, path), current);
  const read = studySchema.safeParse(shape);
  if (!read.success) return null;
  return faults.reduce<Study>((study, { path, typed }) => withEntry(study, path, typed), read.data);
}
