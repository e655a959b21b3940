import { describe, expect, it } from 'vitest';
import { methodIds, standardIds } from '../../lib/index.ts';
import { valueWords } from '../../notebooks/page/figureValue.ts';

const said = (path: string, value: string): string => valueWords({ path, value, unit: '' });

describe('valueWords of what a study holds under names of its own', () => {
  it('says load standards, barred stretches and methods in words of the trade', () => {
    expect(said('brief/loading', 'hl93')).toBe('AASHTO HL-93');
    expect(said('brief/obstacles/0/supports', 'hard')).toBe('barred');
    expect(said('brief/road/fixedEnd', 'none')).toBe('neither end');
    expect(said('options/3/facts/method', 'balanced-cantilever')).toBe('balanced cantilevering');
  });

  it('has words for every method and load standard', () => {
    for (const id of methodIds) expect(said('options/1/facts/method', id)).toMatch(/\w(?:ing| )/u);
    for (const id of standardIds) expect(said('brief/loading', id)).not.toBe(id);
  });

  it('leaves words as they are', () => {
    expect(said('options/1/supports/1/abutment/wall', 'bank seat')).toBe('bank seat');
  });
});
