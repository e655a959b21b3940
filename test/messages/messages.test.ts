import { describe, expect, it } from 'vitest';
import { fileSentence, placeOf, sentence, sentences } from '../../lib/messages/index.ts';
import type { Problem } from '../../lib/model/index.ts';
import { parseStudy, writeStudy } from '../../lib/study/index.ts';
import { lowFerry } from '../site/demoBrief.ts';

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
      'obstacle 2, clearance, headroom: expected more than 0 m, received -3 m. Enter a larger value.',
    );
  });

  it('fileSentence(problem) adds the place in the file', () => {
    expect(fileSentence(headroom)).toBe(
      'obstacle 2, clearance, headroom: expected more than 0 m, received -3 m (brief.obstacles[1].clearance.headroomM). Enter a larger value.',
    );
  });

  it('sentence(problem) falls back on the remedy of its kind and speaks of the study at the root', () => {
    expect(sentence({ code: 'not-json', path: [], expected: 'JSON text', received: 'x', remedy: '' })).toBe(
      'study: expected JSON text, received x. Open the file in a text editor and check brackets, commas and quotes, or save the study again.',
    );
  });

  it('sentence(problem) turns a field name into words, with its place in a list', () => {
    expect(sentence({ ...headroom, path: ['floodLevelM'] })).toMatch(/^flood level: /u);
    expect(sentence({ ...headroom, path: ['brief', 'deck', 2] })).toMatch(/^strip 3: /u);
    expect(sentence({ ...headroom, path: ['spam', 2] })).toMatch(/^spam, entry 3: /u);
    expect(sentence({ ...headroom, path: ['brief', 'crossing', 'startM'] })).toMatch(/^crossing, start: /u);
    expect(fileSentence({ ...headroom, path: ['--depth'] })).toMatch(/^depth: .*\(--depth\)/u);
  });

  it('sentence(problem) of a spoilt study holds no name of its file, whichever entry is spoilt', () => {
    type Plain = Readonly<Record<string, unknown>>;
    const study = JSON.parse(writeStudy(lowFerry())) as Plain;
    const isPart = (value: unknown): value is Plain => typeof value === 'object' && value !== null;
    const leaves = (value: unknown, path: readonly string[]): (readonly string[])[] =>
      isPart(value) ? Object.entries(value).flatMap(([key, part]) => leaves(part, [...path, key])) : [path];
    const spoil = (part: unknown, [key, ...rest]: readonly string[], by: unknown): unknown => {
      if (key === undefined) return by;
      const next = spoil((part as Plain)[key], rest, by);
      return Array.isArray(part)
        ? part.map((one: unknown, i) => (String(i) === key ? next : one))
        : { ...(part as Plain), [key]: next };
    };
    const places = leaves(study, []).filter(([top]) => top !== 'format');
    expect(places.length).toBeGreaterThan(100);
    let refused = 0;
    for (const place of places) {
      for (const by of [true, -9e8, []]) {
        const read = parseStudy(spoil(study, place, by));
        if (read.ok) continue;
        refused += 1;
        for (const one of sentences(read.problems)) expect(one).not.toMatch(/[a-z][A-Z]|\[|\w\.\w*[a-z]/u);
      }
    }
    expect(refused).toBeGreaterThan(places.length);
  });

  it('sentences(problems) keeps their order', () => {
    expect(sentences([headroom, { ...headroom, path: ['toM'] }]).map((s) => s.split(':')[0])).toEqual([
      'obstacle 2, clearance, headroom',
      'end',
    ]);
  });
});

describe('placeOf', () => {
  it('placeOf(path) joins keys with dots and indices in brackets', () => {
    expect(placeOf(['a', 0, 'b'])).toBe('a[0].b');
    expect(placeOf([])).toBe('');
  });
});
