import type { Problem } from '../../../lib/index.ts';

/** Names of entries as a problem may quote them, in the words of the tables. */
const entryWords: Readonly<Record<string, string>> = {
  fromM: 'the start',
  toM: 'the end',
  floodFromM: 'the start',
  floodToM: 'the end',
};

const inWords = (text: string): string =>
  text.replace(/'(\w+)'/gu, (quoted, name: string) => entryWords[name] ?? quoted);

/** A problem as it is said beside its own field, where nobody needs to be told which field it is. */
export function problemBeside({ expected, received, unit, remedy }: Problem): string {
  const units = unit === undefined ? '' : ` ${unit}`;
  return `Expected ${inWords(expected)}${units}, not ${received}${units}. ${inWords(remedy)}.`;
}
