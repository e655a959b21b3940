import type { Problem } from '../../../lib/index.ts';

/** The unit behind the last number of some words: 'at most 1240 m, the start of the crossing'. */
const withUnit = (words: string, unit: string | undefined): string =>
  unit === undefined ? words : words.replace(/\d(?=\D*$)/u, (digit) => `${digit} ${unit}`);

/** A problem as it is said beside its own field, where nobody needs to be told which field it is. */
export function problemBeside({ expected, received, unit, remedy }: Problem): string {
  const [asked, found] = [withUnit(expected, unit), withUnit(received, unit)];
  return `Expected ${asked}, not ${found}. ${remedy}.`;
}
