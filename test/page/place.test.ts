import { describe, expect, it } from 'vitest';
import { getAt, hasAt, isWithin, putAt } from '../../notebooks/page/place.ts';

const data = { brief: { obstacles: [{ name: 'rail' }, { name: 'river' }] }, books: { seed: 1 } };

describe('place', () => {
  it('getAt(root, path) reads through groups and lists, and hasAt tells whether it can', () => {
    expect(getAt(data, ['brief', 'obstacles', 1, 'name'])).toBe('river');
    expect(hasAt(data, ['brief', 'obstacles', 1, 'name'])).toBe(true);
    expect(hasAt(data, ['brief', 'obstacles', 2, 'name'])).toBe(false);
    expect(hasAt(data, ['books', 'seed', 'deeper'])).toBe(false);
  });

  it('putAt(root, path, value) changes that place and keeps the rest as it is', () => {
    const put = putAt(data, ['brief', 'obstacles', 0, 'name'], 'road');
    expect(put.brief.obstacles).toEqual([{ name: 'road' }, { name: 'river' }]);
    expect(put.brief.obstacles[1]).toBe(data.brief.obstacles[1]);
    expect(put.books).toBe(data.books);
    expect(data.brief.obstacles[0]?.name).toBe('rail');
  });

  it('getAt and putAt name the place that is not there', () => {
    expect(() => getAt(data, ['brief', 'waters', 0])).toThrow("place 'brief.waters'");
    expect(() => putAt(data, ['brief', 'obstacles', 7], 0)).toThrow("place 'brief.obstacles.7'");
  });

  it('isWithin(path, field) holds for the field and what lies inside it', () => {
    expect(isWithin(['a', 0, 'b'], ['a', 0])).toBe(true);
    expect(isWithin(['a', 0], ['a', 0])).toBe(true);
    expect(isWithin(['a'], ['a', 0])).toBe(false);
    expect(isWithin(['a', 1, 'b'], ['a', 0])).toBe(false);
  });
});
