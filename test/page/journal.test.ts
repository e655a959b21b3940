import { describe, expect, it } from 'vitest';
import { isOf, journal } from '../../notebooks/page/journal.ts';
import { onPaper, paperRoom } from '../../notebooks/page/printDrawing.ts';

function storage(most = Infinity) {
  const kept = new Map<string, string>();
  return {
    getItem: (key: string) => kept.get(key) ?? null,
    setItem(key: string, value: string) {
      if (value.length > most) throw new Error('full');
      kept.set(key, value);
    },
    removeItem: (key: string) => void kept.delete(key),
  };
}

describe('journal(storage)', () => {
  it('keeps what waits under its study until it is cleared', () => {
    const waiting = journal(storage());
    waiting.put('a', { text: 'x', revision: 3 });
    expect(waiting.get('a')).toEqual({ text: 'x', revision: 3 });
    expect(waiting.get('b')).toBeUndefined();
    waiting.clear('a');
    expect(waiting.get('a')).toBeUndefined();
  });

  it('leaves nothing older behind where there is no room, and reads nothing damaged', () => {
    const store = storage(40);
    const waiting = journal(store);
    waiting.put('a', { text: 'x', revision: 1 });
    waiting.put('a', { text: 'x'.repeat(50), revision: 1 });
    expect(waiting.get('a')).toBeUndefined();
    store.setItem('spanledger.unsaved.a', '{"text":1');
    expect(waiting.get('a')).toBeUndefined();
    store.setItem('spanledger.unsaved.a', '{"text":1,"revision":2}');
    expect(waiting.get('a')).toBeUndefined();
  });

  it('isOf(unsaved, revision) takes what a saving was made of, and nothing older', () => {
    const unsaved = { text: '', revision: 4 };
    expect([3, 4, 5, 6].map((revision) => isOf(unsaved, revision))).toEqual([true, true, true, false]);
  });
});

describe('onPaper(size, scale, paper, gaps)', () => {
  it('keeps a drawing that fits at its scale and reduces a wider one, saying so', () => {
    expect(onPaper({ widthPx: 980, heightPx: 400 }, 1000, 'Letter')).toEqual({
      reduced: 1,
      parts: [[0, 400]],
      words: '1:1000 on Letter; the scale bar rules',
    });
    const wide = onPaper({ widthPx: 2092, heightPx: 400 }, 500, 'A4');
    expect(wide.reduced).toBe(0.5);
    expect(wide.words).toBe('about 1:1000 on A4, reduced from 1:500; the scale bar rules');
  });

  it('cuts one higher than the page at its gaps, and loses nothing of it', () => {
    const { parts } = onPaper({ widthPx: 980, heightPx: 1500 }, 1000, 'A4', [300, 600, 900, 1200]);
    expect(parts).toEqual([
      [0, 600],
      [600, 1200],
      [1200, 1500],
    ]);
    const blind = onPaper({ widthPx: 980, heightPx: 1500 }, null, 'A4');
    expect(blind.parts.at(-1)![1]).toBe(1500);
    for (const [from, to] of blind.parts) expect(to - from).toBeLessThanOrEqual(paperRoom.A4.heightPx);
  });
});
