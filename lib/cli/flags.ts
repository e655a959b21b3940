import { parseArgs } from 'node:util';
import type { Problem } from '../model/index.ts';
import { sentence } from '../messages/index.ts';

/** Values of the command line by flag, and what stands without a flag. */
export interface Flags {
  readonly values: Readonly<Record<string, string | undefined>>;
  readonly rest: readonly string[];
}

/** Writes problems to standard error, one line each, and ends with exit code 2 (bad input). */
export function refuse(problems: readonly Problem[]): never {
  for (const problem of problems) process.stderr.write(`${sentence(problem)}\n`);
  process.exit(2);
}

/** Reads `--name value` flags; an unknown flag or a missing value is refused. */
export function readFlags(names: readonly string[], argv: readonly string[]): Flags {
  try {
    const { values, positionals } = parseArgs({
      args: [...argv],
      options: Object.fromEntries(names.map((name) => [name, { type: 'string' as const }])),
      allowPositionals: true,
    });
    return { values: values, rest: positionals };
  } catch (error) {
    return refuse([
      {
        code: 'unknown-key',
        path: ['command line'],
        expected: names.map((name) => `--${name}`).join(', '),
        received: error instanceof Error ? error.message : String(error),
        remedy: 'see README.md for the flags of each command',
      },
    ]);
  }
}

/** A number within limits, or a problem added to the list; undefined when the flag is absent. */
export function numberFlag(
  flags: Flags,
  name: string,
  limits: {
    readonly above?: number;
    readonly most?: number;
    readonly whole?: boolean;
    readonly unit: string;
  },
  problems: Problem[],
): number | undefined {
  const text = flags.values[name];
  if (text === undefined) return undefined;
  const value = text.trim() === '' ? NaN : Number(text);
  const { above = -Infinity, most = Infinity, whole = false, unit } = limits;
  if (value > above && value <= most && (!whole || Number.isInteger(value))) return value;
  const kind = whole ? 'a whole number' : 'a number';
  const upTo = Number.isFinite(most) ? `, at most ${most}` : '';
  problems.push({
    code: Number.isNaN(value) ? 'wrong-type' : value > above ? 'too-large-value' : 'too-small',
    path: [`--${name}`],
    expected: Number.isFinite(above) ? `${kind} above ${above}${upTo}` : kind,
    received: text,
    unit,
    remedy: `give --${name} as ${kind} in ${unit}`,
  });
  return undefined;
}
