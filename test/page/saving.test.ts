import { describe, expect, it } from 'vitest';
import example from '../../data/examples/low-ferry.json' with { type: 'json' };
import { parseStudy, readStudy, writeStudy } from '../../lib/index.ts';
import type { Result, Study } from '../../lib/index.ts';
import { fileName, savedWords, studyShelf } from '../../notebooks/page/saving.ts';
import type { StoredStudy, StudyCupboard } from '../../notebooks/page/saving.ts';
import { putAt } from '../../notebooks/page/place.ts';

const lowFerry = (): Study => {
  const read = parseStudy(structuredClone(example));
  if (!read.ok) throw new Error('the example is not valid');
  return read.value;
};

/** A cupboard in memory that counts what is written. */
function shelf() {
  const kept = new Map<string, StoredStudy>();
  let writes = 0;
  let minute = 0;
  const cupboard: StudyCupboard = {
    all: () => Promise.resolve([...kept.values()]),
    get: (id) => Promise.resolve(kept.get(id)),
    change(id, next) {
      const study = next(kept.get(id));
      if (study !== undefined) {
        kept.set(id, study);
        writes += 1;
      }
      return Promise.resolve();
    },
    remove(id) {
      kept.delete(id);
      return Promise.resolve();
    },
  };
  const now = (): Date => new Date(2026, 2, 5, 14, minute++);
  return {
    shelf: studyShelf(cupboard, { readStudy, writeStudy }, now),
    kept,
    writes: () => writes,
  };
}

const value = <T>(result: Result<T>): T => {
  if (!result.ok) throw new Error(result.problems.map(({ expected }) => expected).join());
  return result.value;
};
const codes = (result: Result<unknown>): string[] =>
  result.ok ? [] : result.problems.map(({ code }) => code);

describe('studyShelf', () => {
  it('save(id, study, 0) then load(id) gives the same study and the revision to go on from', async () => {
    const { shelf: studies } = shelf();
    const entry = value(await studies.save('a', lowFerry(), 0));
    const loaded = value(await studies.load('a'));
    expect(loaded.study).toEqual(lowFerry());
    expect(loaded.revision).toBe(entry.revision);
    value(await studies.save('a', { ...lowFerry(), title: 'Another' }, loaded.revision));
    expect(value(await studies.load('a')).study.title).toBe('Another');
  });

  it('list() shows the newest first, without the text', async () => {
    const { shelf: studies } = shelf();
    await studies.save('old', lowFerry(), 0);
    await studies.save('new', { ...lowFerry(), title: 'New' }, 0);
    const entries = await studies.list();
    expect(entries.map(({ id }) => id)).toEqual(['new', 'old']);
    expect(entries[0]).not.toHaveProperty('text');
    await studies.remove('new');
    expect(await studies.list()).toHaveLength(1);
  });

  it('save() of an invalid study writes nothing', async () => {
    const { shelf: studies, writes } = shelf();
    const entry = value(await studies.save('a', lowFerry(), 0));
    const broken = putAt(lowFerry(), ['brief', 'crossing', 'endM'], 0);
    expect((await studies.save('a', broken, entry.revision)).ok).toBe(false);
    expect(writes()).toBe(1);
    expect(value(await studies.load('a')).study).toEqual(lowFerry());
  });

  it('save() over a study of a newer version, or over a damaged one, writes nothing', async () => {
    const { shelf: studies, kept, writes } = shelf();
    value(await studies.save('a', lowFerry(), 0));
    const stored = kept.get('a')!;
    const newer = JSON.stringify({ ...(JSON.parse(stored.text) as object), version: 999 });
    for (const [text, code] of [
      [newer, 'newer-version'],
      [stored.text.slice(0, 200), 'not-json'],
    ] as const) {
      kept.set('a', { ...stored, text });
      expect(codes(await studies.save('a', lowFerry(), stored.revision))).toEqual([code]);
      expect(codes(await studies.load('a'))).toEqual([code]);
      expect(kept.get('a')?.text).toBe(text);
    }
    expect(writes()).toBe(1);
  });

  it('save() over a revision somebody else has saved meanwhile writes nothing', async () => {
    const { shelf: studies } = shelf();
    const mine = value(await studies.save('a', lowFerry(), 0));
    value(await studies.save('a', { ...lowFerry(), title: 'Theirs' }, mine.revision));
    const refused = await studies.save('a', { ...lowFerry(), title: 'Mine' }, mine.revision);
    expect(codes(refused)).toEqual(['refused']);
    expect(refused.ok ? '' : refused.problems[0]?.received).toBe('one saved elsewhere at 14:01');
    expect(codes(await studies.save('a', lowFerry(), 0))).toEqual(['refused']);
    expect(value(await studies.load('a')).study.title).toBe('Theirs');
  });

  it('load(id) of a study that is not there says so', async () => {
    const { shelf: studies } = shelf();
    expect(codes(await studies.load('none'))).toEqual(['refused']);
  });
});

describe('words of saving', () => {
  it('savedWords(moment) tells the time of the device', () => {
    expect(savedWords(new Date(2026, 0, 9, 14, 2).toISOString())).toBe('saved 14:02 on this device');
  });

  it('fileName(study) is plain letters, and never empty', () => {
    expect(fileName({ reference: 'WEN 07', title: 'Crossing at Älvö / B' })).toBe(
      'wen-07-crossing-at-alvo-b.spanledger.json',
    );
    expect(fileName({ reference: '', title: '?' })).toBe('study.spanledger.json');
  });
});
