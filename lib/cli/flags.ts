import { parseArgs } from 'node:util';
import type { Problem } from '../model/index.ts';
import { refuse } from './refusal.ts';

/** Values of the command line by flag, and what stands without a flag. */
export interface Flags {
  readonly values: Readonly<Record<string, string | undefined>>;
  /** Flags without a value that were given. */
  readonly on: ReadonlySet<string>;
  readonly rest: readonly string[];
}

/** What a command line may have besides flags with values. */
export interface AlsoTaken {
  /** Flags without a value. */
  readonly switches?: readonly string[];
  /** Words without a flag. */
  readonly words?: boolean;
}

/** A negative number after a flag is its value and not another flag: `--span -3` is read as `--span=-3`. */
function joined(words: readonly string[]): string[] {
  return words.reduce<string[]>((list, word) => {
    const before = list.at(-1) ?? '';
    const isValue = /^-[\d.]/u.test(word) && before.startsWith('--') && !before.includes('=');
    return isValue ? [...list.slice(0, -1), `${before}=${word}`] : [...list, word];
  }, []);
}

/**
 * Reads `--name value` flags.
 *
 * @param names the flags there are
 * @param argv the command line after the name of the command
 * @param also switches and words that may stand among them
 * @throws Refusal where a flag is not known or has no value, or where a word may not stand
 */
export function readFlags(
  names: readonly string[],
  argv: readonly string[],
  { switches = [], words = false }: AlsoTaken = {},
): Flags {
  try {
    const { values, positionals } = parseArgs({
      args: joined(argv),
      options: Object.fromEntries<{ readonly type: 'string' | 'boolean' }>([
        ...names.map((name) => [name, { type: 'string' as const }] as const),
        ...switches.map((name) => [name, { type: 'boolean' as const }] as const),
      ]),
      allowPositionals: words,
    });
    const given = Object.entries(values);
    return {
      values: Object.fromEntries(
        given.filter((entry): entry is [string, string] => typeof entry[1] === 'string'),
      ),
      on: new Set(given.filter(([, value]) => value === true).map(([name]) => name)),
      rest: positionals,
    };
  } catch (error) {
    return refuse([
      {
        code: 'unknown-key',
        path: ['command line'],
        expected: [...names, ...switches].map((name) => `--${name}`).join(', '),
        received: error instanceof Error ? error.message : String(error),
        remedy: 'see README.md for the flags of each command',
      },
    ]);
  }
}

/** Adds a problem for every flag of the list that is absent. */
export function needFlags(flags: Flags, names: readonly string[], problems: Problem[]): void {
  for (const name of names) {
    if (flags.values[name] !== undefined) continue;
    problems.push({
      code: 'missing',
      path: [`--${name}`],
      expected: 'a number',
      received: 'nothing',
      remedy: `give --${name}`,
    });
  }
}
