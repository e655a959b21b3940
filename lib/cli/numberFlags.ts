import type { Problem, Result } from '../model/index.ts';

/** What a `--name value` option must be. */
export interface NumberFlag {
  readonly unit: string;
  readonly required: boolean;
}

function problem(name: string, received: string, more: Partial<Problem>): Problem {
  return { code: 'wrong-type', path: [`--${name}`], expected: 'a number', received, remedy: '', ...more };
}

/**
 * Reads `--name value` pairs whose values are positive numbers.
 *
 * @param words the command line after the program's name
 * @param flags the options there are, by name
 * @returns the values by name, or every problem found
 */
export function numberFlags(
  words: readonly string[],
  flags: Readonly<Record<string, NumberFlag>>,
): Result<Readonly<Record<string, number>>> {
  const problems: Problem[] = [];
  const values: Record<string, number> = {};
  const known = Object.keys(flags)
    .map((name) => `--${name}`)
    .join(', ');
  for (let i = 0; i < words.length; i += 2) {
    const word = words[i]!;
    const text = words[i + 1];
    const name = word.replace(/^--/u, '');
    const flag = word.startsWith('--') && Object.hasOwn(flags, name) ? flags[name] : undefined;
    if (flag === undefined) {
      problems.push({
        code: 'unknown-key',
        path: [word],
        expected: `one of ${known}`,
        received: word,
        remedy: 'Remove it or correct its spelling',
      });
      break;
    }
    const value = text === undefined || text.trim() === '' ? NaN : Number(text);
    if (!Number.isFinite(value))
      problems.push(
        problem(name, text ?? 'nothing', {
          remedy: `Write a number of ${flag.unit} after it`,
        }),
      );
    else if (!(value > 0))
      problems.push(
        problem(name, String(value), {
          code: 'too-small',
          expected: 'more than 0',
          unit: flag.unit,
          remedy: 'Enter a larger value',
        }),
      );
    else values[name] = value;
  }
  for (const [name, flag] of Object.entries(flags)) {
    if (flag.required && !words.includes(`--${name}`))
      problems.push(problem(name, 'nothing', { code: 'missing', remedy: `Add --${name} and a number` }));
  }
  return problems.length > 0 ? { ok: false, problems } : { ok: true, value: values };
}
