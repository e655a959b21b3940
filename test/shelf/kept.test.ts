import { describe, expect, it } from 'vitest';
import example from '../../data/examples/low-ferry.json' with { type: 'json' };
import type { StoredStudy, StudyCupboard } from '../../notebooks/page/index.ts';
import { keptStudies, savedAtWords } from '../../notebooks/shelf/kept.ts';

const stored = (id: string, savedAt: string, text = JSON.stringify(example)): StoredStudy => ({
  id,
  title: `Study ${id}`,
  reference: id.toUpperCase(),
  text,
  savedAt,
  revision: 1,
});
const cupboard = (...all: StoredStudy[]): StudyCupboard => ({
  all: () => Promise.resolve(all),
  get: (id) => Promise.resolve(all.find((one) => one.id === id)),
  change: () => Promise.reject(new Error('the shelf only reads')),
  remove: () => Promise.reject(new Error('the shelf only reads')),
});

describe('keptStudies(cupboard)', () => {
  it('lists the newest first, each with its crossing', async () => {
    const kept = await keptStudies(
      cupboard(stored('a', '2026-02-03T10:00:00Z'), stored('b', '2026-02-12T10:00:00Z')),
    );
    expect(kept.map((one) => one.stored.id)).toEqual(['b', 'a']);
    for (const { read } of kept) expect(read.ok && read.site.lengthM).toBe(230);
  });

  it.each([
    ['damaged', '{"format":'],
    ['of a newer version', JSON.stringify({ ...example, version: 999 })],
    ['of something else', '{}'],
  ])('a text %s keeps its place, its text and the reason', async (_what, text) => {
    const [first, second] = await keptStudies(
      cupboard(stored('good', '2026-02-03T10:00:00Z'), stored('bad', '2026-02-12T10:00:00Z', text)),
    );
    expect(first!.stored).toMatchObject({ id: 'bad', text });
    expect(first!.read.ok).toBe(false);
    expect(!first!.read.ok && first!.read.problems.length).toBeGreaterThan(0);
    expect(second!.read.ok).toBe(true);
  });
});

describe('savedAtWords(savedAt, now)', () => {
  // Moments are built in the time of the device, as the words are.
  const at = (day: number, hour: number, minute: number): Date => new Date(2026, 1, day, hour, minute);
  it('says today by the clock of the device', () => {
    expect(savedAtWords(at(12, 9, 5).toISOString(), at(12, 23, 59))).toBe('today 09:05');
  });
  it('says the date of any other day', () => {
    expect(savedAtWords(at(3, 14, 30).toISOString(), at(12, 0, 0))).toBe('2026-02-03 14:30');
  });
});
