import { describe, expect, it } from 'vitest';
import example from '../../data/examples/low-ferry.json' with { type: 'json' };
import { parseStudy, readDraft, readStudy, writeStudy } from '../../lib/index.ts';
import type { Result, Study } from '../../lib/index.ts';
import { fileName, savedWords, studyShelf } from '../../notebooks/page/saving.ts';
import type { StoredStudy, StudyCupboard, TypedStudy } from '../../notebooks/page/saving.ts';
import { putAt } from '../../notebooks/page/place.ts';

const lowFerry = (): Study => {
  const read = parseStudy(structuredClone(example));
  if (!read.ok) throw new Error('the example is not valid');
  return read.value;
};

const typed = (study: Study, draft: Study | null = null): TypedStudy => ({ study, draft });

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
    shelf: studyShelf(cupboard, { readStudy, readDraft, writeStudy }, now),
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
    const entry = value(await studies.save('a', typed(lowFerry()), 0));
    const loaded = value(await studies.load('a'));
    expect(loaded.study).toEqual(lowFerry());
    expect(loaded.revision).toBe(entry.revision);
    value(await studies.save('a', typed({ ...lowFerry(), title: 'Another' }), loaded.revision));
    expect(value(await studies.load('a')).study.title).toBe('Another');
  });

  it('keeps the study as typed beside the last valid one, also where an entry is out of all limits', async () => {
    const { shelf: studies } = shelf();
    const study = lowFerry();
    const reversed = putAt(study, ['brief', 'obstacles', 0, 'fromM'], 9e6);
    const draft = putAt(reversed, ['brief', 'road', 'maxGradient'], 7);
    expect(readStudy(writeStudy(draft)).ok).toBe(false);
    const entry = value(await studies.save('a', typed(study, draft), 0));
    expect(value(await studies.load('a'))).toEqual({ study, draft, revision: entry.revision });
    value(await studies.save('a', typed(study), entry.revision));
    expect(value(await studies.load('a')).draft).toBeNull();
  });

  it('keeps what is refused in a row that the valid study does not have', async () => {
    const { shelf: studies } = shelf();
    const { brief, options } = lowFerry();
    const study: Study = { ...lowFerry(), brief: { ...brief, obstacles: [], waters: [], budget: 'unknown' } };
    const obstacle = { ...brief.obstacles[0]!, name: '', fromM: 2e7, pierPremium: -5 };
    const over = { fromM: 1300, toM: 1310, datumLevelM: 20_000, headroomM: 0, confirmed: false };
    const units = [{ form: 'concrete-box', role: 'main', supportsM: [1240, 1470] }] as const;
    const kept = {
      number: 0,
      form: 'concrete-box',
      method: 'falsework',
      units,
      depthM: -1,
      variant: { haunchRatio: 9, castInPiers: 0, strengthMPa: 900, ballastKNm: [-3] },
    } as const;
    const draft: Study = {
      ...study,
      brief: {
        ...study.brief,
        obstacles: [{ ...obstacle, clearance: over }],
        waters: [{ ...brief.waters[0]!, freeboardM: 90, vesselSpeedMs: 0, floodReturnYears: 0 }],
        budget: { amount: 0, priceDate: 'hello', includes: '' },
      },
      options: { ...options, kept: [kept] },
    };
    expect(readStudy(writeStudy(draft)).ok).toBe(false);
    value(await studies.save('a', typed(study, draft), 0));
    expect(value(await studies.load('a'))).toMatchObject({ study, draft });
  });

  it('a draft that cannot be read is left out, and the valid study stands', async () => {
    const { shelf: studies, kept } = shelf();
    value(await studies.save('a', typed(lowFerry(), { ...lowFerry(), title: 'Typed' }), 0));
    expect(value(await studies.load('a')).draft?.title).toBe('Typed');
    for (const draft of ['{', '[]', '{"format":"spanledger-study","version":1}']) {
      kept.set('a', { ...kept.get('a')!, draft });
      expect(value(await studies.load('a'))).toMatchObject({ study: lowFerry(), draft: null });
    }
  });

  it('list() shows the newest first, without the text', async () => {
    const { shelf: studies } = shelf();
    await studies.save('old', typed(lowFerry()), 0);
    await studies.save('new', typed({ ...lowFerry(), title: 'New' }), 0);
    const entries = await studies.list();
    expect(entries.map(({ id }) => id)).toEqual(['new', 'old']);
    expect(entries[0]).not.toHaveProperty('text');
    await studies.remove('new');
    expect(await studies.list()).toHaveLength(1);
  });

  it('save() of an invalid study writes nothing', async () => {
    const { shelf: studies, writes } = shelf();
    const entry = value(await studies.save('a', typed(lowFerry()), 0));
    const broken = putAt(lowFerry(), ['brief', 'crossing', 'endM'], 0);
    expect((await studies.save('a', typed(broken), entry.revision)).ok).toBe(false);
    expect(writes()).toBe(1);
    expect(value(await studies.load('a')).study).toEqual(lowFerry());
  });

  it('save() over a study of a newer version, or over a damaged one, writes nothing', async () => {
    const { shelf: studies, kept, writes } = shelf();
    value(await studies.save('a', typed(lowFerry()), 0));
    const stored = kept.get('a')!;
    const newer = JSON.stringify({ ...(JSON.parse(stored.text) as object), version: 999 });
    for (const [text, code] of [
      [newer, 'newer-version'],
      [stored.text.slice(0, 200), 'not-json'],
    ] as const) {
      kept.set('a', { ...stored, text });
      expect(codes(await studies.save('a', typed(lowFerry()), stored.revision))).toEqual([code]);
      expect(codes(await studies.load('a'))).toEqual([code]);
      expect(kept.get('a')?.text).toBe(text);
    }
    expect(writes()).toBe(1);
  });

  it('save() over a revision somebody else has saved meanwhile writes nothing', async () => {
    const { shelf: studies } = shelf();
    const mine = value(await studies.save('a', typed(lowFerry()), 0));
    value(await studies.save('a', typed({ ...lowFerry(), title: 'Theirs' }), mine.revision));
    const refused = await studies.save('a', typed({ ...lowFerry(), title: 'Mine' }), mine.revision);
    expect(codes(refused)).toEqual(['refused']);
    expect(refused.ok ? '' : refused.problems[0]?.received).toBe('one saved elsewhere at 14:01');
    expect(codes(await studies.save('a', typed(lowFerry()), 0))).toEqual(['refused']);
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
