import { describe, expect, it } from 'vitest';
import { placeOf, sentence, sentences } from '../../lib/messages/index.ts';
import type { Problem } from '../../lib/model/index.ts';

const headroom: Problem = {
  code: 'too-small',
  path: ['brief', 'obstacles', 1, 'clearance', 'headroomM'],
  expected: 'more than 0',
  received: '-3',
  unit: 'm',
  remedy: 'Enter a larger value',
};

describe('sentence', () => {
  it('sentence(problem) names subject, expected, received, place and remedy', () => {
    expect(sentence(headroom)).toBe(
      'headroom: expected more than 0 m, received -3 m (brief.obstacles[1].clearance.headroomM). Enter a larger value.',
    );
  });

  it('sentence(problem) falls back on the remedy of its kind and speaks of the study at the root', () => {
    expect(sentence({ code: 'not-json', path: [], expected: 'JSON text', received: 'x', remedy: '' })).toBe(
      'study: expected JSON text, received x. Open the file in a text editor and check brackets, commas and quotes, or save the study again.',
    );
  });

  it('sentence(problem) turns a field name into words, with its place in a list', () => {
    expect(sentence({ ...headroom, path: ['floodLevelM'] })).toMatch(/^flood level: /u);
    expect(sentence({ ...headroom, path: ['deck', 2] })).toMatch(/^deck, entry 3: /u);
    expect(sentence({ ...headroom, path: ['--depth'] })).toMatch(/^depth: .*\(--depth\)/u);
  });

  it('sentences(problems) keeps their order', () => {
    expect(sentences([headroom, { ...headroom, path: ['toM'] }]).map((s) => s.split(':')[0])).toEqual([
      'headroom',
      'to',
    ]);
  });
});

describe('placeOf', () => {
  it('placeOf(path) joins keys with dots and indices in brackets', () => {
    expect(placeOf(['a', 0, 'b'])).toBe('a[0].b');
    expect(placeOf([])).toBe('');
  });
});
