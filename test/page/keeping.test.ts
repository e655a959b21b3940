import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { readDraft, readStudy, writeStudy, type Study } from '../../lib/index.ts';
import { journal } from '../../notebooks/page/journal.ts';
import { keeping } from '../../notebooks/page/keeping.ts';
import { studyShelf, type StoredStudy } from '../../notebooks/page/saving.ts';
import { lowFerry } from '../appraise/studies.ts';

/** Locks that are given when the test says so, and taken away again. */
function locksByHand() {
  let give: (() => void) | undefined;
  let take: (() => void) | undefined;
  return {
    give: () => give?.(),
    take: () => take?.(),
    locks: {
      request: (_name: string, ...rest: unknown[]) =>
        new Promise((_, reject) => {
          const hold = rest.at(-1) as (lock: object) => unknown;
          give ??= () => void hold({});
          take ??= () => reject(new Error('stolen'));
        }),
    } as unknown as LockManager,
  };
}

/** A device of one study, whose savings end when the test says so. */
function device() {
  const kept = new Map<string, StoredStudy>();
  const entries = new Map<string, string>();
  let finish: (() => void) | undefined;
  let isHeld = false;
  return {
    kept,
    hold: () => (isHeld = true),
    finish: () => finish?.(),
    unsaved: journal({
      getItem: (key) => entries.get(key) ?? null,
      setItem: (key, value) => void entries.set(key, value),
      removeItem: (key) => void entries.delete(key),
    }),
    shelf: studyShelf(
      {
        all: () => Promise.resolve([...kept.values()]),
        get: (id) => Promise.resolve(kept.get(id)),
        async change(id, next) {
          if (isHeld) await new Promise<void>((resolve) => (finish = resolve));
          const stored = next(kept.get(id));
          if (stored) kept.set(id, stored);
        },
        remove: (id) => Promise.resolve(void kept.delete(id)),
      },
      { readStudy, readDraft, writeStudy },
      () => new Date(0),
    ),
  };
}

/** Keeps the worked example and writes down what its page says. */
function keep(
  study: Study,
  locks: LockManager,
  { shelf, unsaved }: ReturnType<typeof device>,
  draft: Study | null = null,
) {
  const said: string[] = [];
  const kept = keeping({
    id: 'one',
    revision: 0,
    shelf,
    journal: unsaved,
    format: { readStudy, readDraft, writeStudy },
    locks,
    study: () => ({ study, draft }),
    show: () => undefined,
    saved: (_, isFaulty) => said.push(isFaulty ? 'saved with faults' : 'saved'),
    refused: (problems) => said.push(`refused ${problems.length}`),
    owned: (isMine) => said.push(isMine ? 'mine' : 'read only'),
  });
  return { kept, said };
}

describe('keeping', () => {
  beforeEach(() => {
    vi.useFakeTimers();
    vi.stubGlobal('addEventListener', () => undefined);
    vi.stubGlobal('document', {
      addEventListener: () => undefined,
      visibilityState: 'visible',
      documentElement: { classList: { contains: () => false } },
    });
  });
  afterEach(() => {
    vi.unstubAllGlobals();
    vi.useRealTimers();
  });

  it('changed() before the study is this tab’s is saved once it is', async () => {
    const { locks, give } = locksByHand();
    const where = device();
    const { kept, said } = keep(lowFerry(), locks, where);
    kept.changed();
    await vi.advanceTimersByTimeAsync(5000);
    expect(where.kept.size).toBe(0);
    give();
    await vi.advanceTimersByTimeAsync(0);
    expect(said).toEqual(['mine', 'saved']);
    expect(where.kept.get('one')?.revision).toBe(1);
  });

  it('a study with something refused in it is written down and saved as typed, and says so', async () => {
    const { locks, give } = locksByHand();
    const where = device();
    const study = lowFerry();
    const draft = { ...study, title: '' };
    const { kept, said } = keep(study, locks, where, draft);
    give();
    kept.changed();
    await vi.advanceTimersByTimeAsync(200);
    expect(where.unsaved.get('one')).toEqual({
      text: writeStudy(study),
      draft: writeStudy(draft),
      revision: 0,
    });
    await vi.advanceTimersByTimeAsync(1000);
    expect(said).toEqual(['mine', 'saved with faults']);
    expect(where.kept.get('one')).toMatchObject({ text: writeStudy(study), draft: writeStudy(draft) });
  });

  it('startAnew(id) saves what waits before it turns to another study, and says whether the first is kept', async () => {
    const { locks, give } = locksByHand();
    const where = device();
    const { kept } = keep(lowFerry(), locks, where);
    give();
    kept.changed();
    expect(await kept.startAnew('two')).toBe('kept');
    expect(kept.id()).toBe('two');
    expect(where.kept.get('one')?.text).toBe(writeStudy(lowFerry()));
    expect(await kept.startAnew('three')).toBe('never changed');
    expect([...where.kept.keys()]).toEqual(['one']);
  });

  it('startAnew(id) stays with a study that cannot be saved', async () => {
    const { locks, give } = locksByHand();
    const where = device();
    const { kept, said } = keep(lowFerry(), locks, where);
    give();
    // Saved elsewhere meanwhile.
    await where.shelf.save('one', { study: { ...lowFerry(), title: 'Elsewhere' }, draft: null }, 0);
    kept.changed();
    expect(await kept.startAnew('two')).toBe('not saved');
    expect(kept.id()).toBe('one');
    expect(said).toEqual(['mine', 'refused 1']);
    expect(where.unsaved.get('one')?.text).toBe(writeStudy(lowFerry()));
  });

  it('a saving that ends after another tab has taken the study over says nothing', async () => {
    const { locks, give, take } = locksByHand();
    const where = device();
    const { kept, said } = keep(lowFerry(), locks, where);
    give();
    where.hold();
    kept.changed();
    await vi.advanceTimersByTimeAsync(1000);
    take();
    await vi.advanceTimersByTimeAsync(0);
    where.finish();
    await vi.advanceTimersByTimeAsync(1000);
    expect(said).toEqual(['mine', 'read only']);
    expect(where.kept.get('one')?.revision).toBe(1);
  });
});
