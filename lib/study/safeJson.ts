import type { Problem, Result } from '../model/index.ts';
import { problem } from './problem.ts';

/** Largest study file, characters of JSON. */
const largestStudy = 5_000_000;

const DEEPEST = 64;
const barredKeys: ReadonlySet<string> = new Set(['__proto__', 'constructor', 'prototype']);

/** Walks the whole value without recursion; finds keys that could reach a prototype, and nesting beyond any study. */
function unsafeParts(root: unknown): Problem[] {
  const found: Problem[] = [];
  const waiting: { value: unknown; path: readonly (string | number)[] }[] = [{ value: root, path: [] }];
  for (let next = waiting.pop(); next !== undefined; next = waiting.pop()) {
    const { value, path } = next;
    if (typeof value !== 'object' || value === null) continue;
    if (path.length >= DEEPEST) {
      return [problem('refused', path.slice(0, 3), `at most ${DEEPEST} levels of nesting`, 'more')];
    }
    if (Array.isArray(value)) {
      value.forEach((entry: unknown, i) => waiting.push({ value: entry, path: [...path, i] }));
      continue;
    }
    for (const key of Object.keys(value)) {
      if (barredKeys.has(key))
        found.push(problem('unknown-key', [...path, key], 'no such entry', `'${key}'`));
      else waiting.push({ value: (value as Record<string, unknown>)[key], path: [...path, key] });
    }
  }
  return found;
}

/** JSON text to a plain value: refused when too large, not JSON, nested too deep, or with keys that reach a prototype. */
export function safeJson(text: string): Result<unknown> {
  if (text.length > largestStudy) {
    const received = `${text.length} characters`;
    return {
      ok: false,
      problems: [problem('too-large', [], `at most ${largestStudy} characters`, received)],
    };
  }
  let value: unknown;
  try {
    value = JSON.parse(text);
  } catch {
    const received = 'text that breaks off or has been damaged';
    return { ok: false, problems: [problem('not-json', [], 'a study file in JSON', received)] };
  }
  const problems = unsafeParts(value);
  return problems.length > 0 ? { ok: false, problems } : { ok: true, value };
}
