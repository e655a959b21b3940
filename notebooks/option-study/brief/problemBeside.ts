import type { Problem } from '../../../lib/index.ts';

/** Names of entries as a problem may quote them, in the words of the tables. */
const entryWords: Readonly<Record<string, string>> = {
  fromM: 'the start',
  toM: 'the end',
  floodFromM: 'the start',
  floodToM: 'the end',
  startM: 'the start',
  endM: 'the end',
};

const inWords = (text: string): string =>
  text.replace(/'(\w+)'/gu, (quoted, name: string) => entryWords[name] ?? quoted);

/** The unit behind the last number of some words: 'at most 1240 m, the start of the crossing'. */
const withUnit = (words: string, unit: string | undefined): string =>
  unit === undefined ? words : words.replace(/\d(?=\D*$)/u, (digit) => `${digit} ${unit}`);

/** A problem as it is said beside its own field, where nobody needs to be told which field it is. */
export function problemBeside({ expected, received, unit, remedy }: Problem): string {
  const [asked, found] = [withUnit(inWords(expected), unit), withUnit(received, unit)];
  return `Expected ${asked}, not ${found}. ${inWords(remedy)}.`;
}
