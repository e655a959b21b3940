import { describe, expect, it } from 'vitest';
import { keptGaps } from '../../notebooks/shelf/keptGaps.ts';
import { emptyGaps } from '../../notebooks/shelf/newStudy.ts';

function storage(text?: string) {
  const kept = new Map<string, string>(text === undefined ? [] : [['spanledger.new-study', text]]);
  return {
    getItem: (key: string) => kept.get(key) ?? null,
    setItem: (key: string, value: string) => void kept.set(key, value),
    removeItem: (key: string) => void kept.delete(key),
  };
}

describe('keptGaps(storage)', () => {
  it('gives back what was filled, and nothing once it is cleared', () => {
    const place = storage();
    const filled = { ...emptyGaps, title: 'Mill Lane', lengthM: 48, crossed: 'road', lanes: 4 } as const;
    keptGaps(() => place).put(filled);
    expect(keptGaps(() => place).get()).toEqual(filled);
    keptGaps(() => place).clear();
    expect(keptGaps(() => place).get()).toEqual(emptyGaps);
  });

  it('leaves empty what cannot stand in its gap, and keeps the rest', () => {
    const text = JSON.stringify({
      title: 3,
      lanes: 'unknown',
      crossed: 'sea',
      loading: 'toString',
      widthM: null,
      barredM: 'wide',
      lengthM: 60,
      spam: 1,
    });
    expect(keptGaps(() => storage(text)).get()).toEqual({ ...emptyGaps, lengthM: 60 });
    for (const damaged of ['{', 'null', '3', '[]'])
      expect(keptGaps(() => storage(damaged)).get()).toEqual(emptyGaps);
  });

  it('does without where a browser keeps nothing', () => {
    const shut = keptGaps(() => {
      throw new Error('denied');
    });
    shut.put({ ...emptyGaps, lengthM: 60 });
    shut.clear();
    expect(shut.get()).toEqual(emptyGaps);
  });
});
