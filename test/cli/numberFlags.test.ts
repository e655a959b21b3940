import { describe, expect, it } from 'vitest';
import { numberFlags } from '../../lib/cli/numberFlags.ts';
import { sentences } from '../../lib/messages/index.ts';

const flags = { span: { unit: 'm', required: true }, width: { unit: 'm', required: false } };
const read = (line: string) => numberFlags(line.split(' ').filter(Boolean), flags);

describe('numberFlags(words, flags)', () => {
  it('reads pairs in any order', () => {
    expect(read('--width 12.5 --span 120')).toEqual({ ok: true, value: { span: 120, width: 12.5 } });
  });
  it.each([
    ['', 'missing'],
    ['--width 12', 'missing'],
    ['--span', 'wrong-type'],
    ['--span wide', 'wrong-type'],
    ['--span -3', 'too-small'],
    ['--span 0', 'too-small'],
    ['--span 3 --widht 4', 'unknown-key'],
    ['--span 3 120', 'unknown-key'],
    ['--span 3 --toString 4', 'unknown-key'],
  ])('refuses "%s" as %s', (line, code) => {
    const result = read(line);
    expect(result.ok ? [] : result.problems.map((problem) => problem.code)).toEqual([code]);
  });
  it('names subject, expected, received, place and remedy', () => {
    const result = read('--span -3');
    expect(result.ok ? [] : sentences(result.problems)).toEqual([
      'span: expected more than 0 m, received -3 m (--span). Enter a larger value.',
    ]);
  });
});
