import type { Problem, Result, Study } from '../model/index.ts';
import { checkStudy } from './checks.ts';
import { migrate } from './migrate.ts';
import { problem } from './problem.ts';
import { safeJson } from './safeJson.ts';
import { studySchema, studyVersion } from './schema.ts';
import { schemaProblems } from './schemaProblems.ts';
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
