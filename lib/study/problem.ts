import { remedyFor } from '../messages/index.ts';
import type { Problem, ProblemCode } from '../model/index.ts';

/** Builds a problem; the remedy is the general one of its kind unless a better one is given. */
export function problem(
  code: ProblemCode,
  path: readonly (string | number)[],
  expected: string,
  received: string,
  more: { readonly unit?: string | undefined; readonly remedy?: string } = {},
): Problem {
  const { unit, remedy } = more;
  const base = { code, path, expected, received, remedy: remedy ?? remedyFor(code) };
  return unit === undefined ? base : { ...base, unit };
}
