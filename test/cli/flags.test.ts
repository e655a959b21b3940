import { describe, expect, it } from 'vitest';
import { needFlags, readFlags } from '../../lib/cli/flags.ts';
import { numberFlag } from '../../lib/cli/numberFlag.ts';
import { Refusal } from '../../lib/cli/refusal.ts';
import type { Problem } from '../../lib/model/index.ts';
import { fileSentence } from '../../lib/messages/index.ts';

/** Values of two number flags, the first of which is needed, and the problems there are. */
function read(line: string): { values: (number | undefined)[]; problems: Problem[] } {
  const problems: Problem[] = [];
  try {
    const flags = readFlags(['span', 'width'], line.split(' ').filter(Boolean));
    needFlags(flags, ['span'], problems);
    const values = ['span', 'width'].map((name) =>
      numberFlag(flags, name, { above: 0, most: 3000, unit: 'm' }, problems),
    );
    return { values, problems };
  } catch (error) {
    if (!(error instanceof Refusal)) throw error;
    return { values: [], problems: [...error.problems] };
  }
}

describe('flags of the command line', () => {
  it('are read in any order', () => {
    expect(read('--width 12.5 --span 120')).toEqual({ values: [120, 12.5], problems: [] });
  });
  it.each([
    ['', 'missing'],
    ['--width 12', 'missing'],
    ['--span', 'unknown-key'],
    ['--span wide', 'wrong-type'],
    ['--span=', 'wrong-type'],
    ['--span -3', 'too-small'],
    ['--span=-3', 'too-small'],
    ['--span 0', 'too-small'],
    ['--span 3001', 'too-large-value'],
    ['--span 3 120', 'unknown-key'],
    ['--span 3 --widht 4', 'unknown-key'],
    ['--span 3 --toString 4', 'unknown-key'],
  ])('"%s" is refused as %s', (line, code) => {
    expect(read(line).problems.map((problem) => problem.code)).toEqual([code]);
  });
  it('name subject, expected, received, place and remedy', () => {
    expect(read('--span -3').problems.map(fileSentence)).toEqual([
      'span: expected a number above 0, at most 3000 m, received -3 m (--span). give --span as a number in m.',
    ]);
  });
});
