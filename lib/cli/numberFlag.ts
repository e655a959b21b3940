import type { Problem } from '../model/index.ts';
import type { Flags } from './flags.ts';

/** What a number of the command line must be. */
export interface Limits {
  readonly above?: number;
  readonly least?: number;
  readonly most?: number;
  readonly whole?: boolean;
  readonly unit: string;
}

/** A number within limits, or a problem added to the list; undefined when the flag is absent. */
export function numberFlag(
  flags: Flags,
  name: string,
  { above = -Infinity, least = -Infinity, most = Infinity, whole = false, unit }: Limits,
  problems: Problem[],
): number | undefined {
  const text = flags.values[name];
  if (text === undefined) return undefined;
  const value = text.trim() === '' ? NaN : Number(text);
  if (value > above && value >= least && value <= most && (!whole || Number.isInteger(value))) return value;
  const kind = whole ? 'a whole number' : 'a number';
  const from = Number.isFinite(above)
    ? ` above ${above}`
    : Number.isFinite(least)
      ? ` of at least ${least}`
      : '';
  const upTo = from !== '' && Number.isFinite(most) ? `, at most ${most}` : '';
  problems.push({
    code: Number.isNaN(value)
      ? 'wrong-type'
      : value > above && value >= least
        ? 'too-large-value'
        : 'too-small',
    path: [`--${name}`],
    expected: `${kind}${from}${upTo}`,
    received: text,
    unit,
    remedy: `give --${name} as ${kind} in ${unit}`,
  });
  return undefined;
}
