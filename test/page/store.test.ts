import { describe, expect, it } from 'vitest';
import example from '../../data/examples/low-ferry.json' with { type: 'json' };
import { confirmed, parseStudy } from '../../lib/index.ts';
import type { Study } from '../../lib/index.ts';
import { studyStore } from '../../notebooks/page/store.ts';
import { putAt } from '../../notebooks/page/place.ts';
import { graph } from '../../notebooks/reactive/index.ts';
import type { Cell } from '../../notebooks/reactive/index.ts';

const lowFerry = (): Study => {
  const read = parseStudy(structuredClone(example));
  if (!read.ok) throw new Error('the example is not valid');
  return read.value;
};
const problemsOf = (study: Study) => {
  const read = parseStudy(study);
  return read.ok ? [] : read.problems;
};

function opened() {
  const g = graph();
  const store = studyStore(g, lowFerry(), problemsOf);
  const value = <T>(cell: Cell<T>): T => {
    const state = g.state(cell);
    if (state.state !== 'ready') throw new Error(`${cell.name} is ${state.state}`);
    return state.value;
  };
  const endTo = (endM: number, coalesce?: string): void =>
    store.edit((study) => putAt(study, ['brief', 'crossing', 'endM'], endM), {
      what: 'end',
      ...(coalesce !== undefined && { coalesce }),
    });
  const endM = (): number => value(store.slices.brief).crossing.endM;
  return { g, store, value, endTo, endM };
}

describe('studyStore', () => {
  it('edit(change) changes the slice it touches and keeps the others the same values', () => {
    const { store, value, endTo, endM } = opened();
    const before = { ...store.slices };
    const books = value(before.books);
    const options = value(before.options);
    const obstacles = value(before.brief).obstacles;
    endTo(1475);
    expect(endM()).toBe(1475);
    expect(value(store.slices.books)).toBe(books);
    expect(value(store.slices.options)).toBe(options);
    expect(value(store.slices.brief).obstacles).toBe(obstacles);
  });

  it('names the slices that keep an older value while what is typed is refused, and none once it is not', () => {
    const { store, value, endTo } = opened();
    expect(value(store.held)).toEqual([]);
    endTo(1100);
    expect(value(store.held)).toEqual(['brief']);
    // Good in itself, but kept back with what is refused.
    store.edit((study) => putAt(study, ['books', 'seed'], 7));
    store.edit((study) => putAt(study, ['title'], 'Another title'));
    expect(value(store.held)).toEqual(['head', 'brief', 'books']);
    endTo(1475);
    expect(value(store.held)).toEqual([]);
    store.undo();
    expect(value(store.held)).toEqual(['brief']);
  });

  it('dropStep() takes back the step under way as if it had never been begun, and nothing else', () => {
    const { store, value, endTo, endM } = opened();
    const start = endM();
    endTo(1475);
    endTo(1480, 'hand');
    endTo(1485, 'hand');
    store.dropStep();
    expect(endM()).toBe(1475);
    expect(value(store.history)).toEqual({ undo: 'end', redo: null });
    store.dropStep();
    expect(endM()).toBe(1475);
    store.undo();
    expect(endM()).toBe(start);
    expect(value(store.history).undo).toBeNull();
  });

  it('edit(change) runs only the cells below the slice that has changed', () => {
    const { g, store, endTo } = opened();
    const runs = { brief: 0, books: 0, head: 0 };
    const { brief, books, head } = store.slices;
    g.cell('below brief', { brief }, () => (runs.brief += 1));
    g.cell('below books', { books }, () => (runs.books += 1));
    g.cell('below head', { head }, () => (runs.head += 1));
    g.batch(() => undefined);
    expect(runs).toEqual({ brief: 1, books: 1, head: 1 });
    endTo(1475);
    expect(runs).toEqual({ brief: 2, books: 1, head: 1 });
    store.edit((study) => ({ ...study, title: 'Another' }));
    expect(runs).toEqual({ brief: 2, books: 1, head: 2 });
  });

  it('edit(change) that says the same is no step, even as a copy', () => {
    const { store, value } = opened();
    const draft = value(store.draft);
    store.edit((study) => structuredClone(study));
    expect(value(store.draft)).toBe(draft);
    expect(value(store.history)).toEqual({ undo: null, redo: null });
  });

  it('edit(change, {coalesce}) makes one step of a drag, and endStep() parts it from the next', () => {
    const { store, endTo, endM } = opened();
    for (let end = 1471; end <= 1480; end += 1) endTo(end, 'end');
    store.endStep();
    for (let end = 1479; end >= 1475; end -= 1) endTo(end, 'end');
    store.endStep();
    expect(endM()).toBe(1475);
    store.undo();
    expect(endM()).toBe(1480);
    store.undo();
    expect(endM()).toBe(1470);
    store.redo();
    store.redo();
    expect(endM()).toBe(1475);
  });

  it('edit(change, {coalesce}) that moves to where it is already changes no slice', () => {
    const { store, value, endTo } = opened();
    endTo(1475, 'end');
    const [draft, brief] = [value(store.draft), value(store.slices.brief)];
    endTo(1475, 'end');
    expect(value(store.draft)).toBe(draft);
    expect(value(store.slices.brief)).toBe(brief);
    store.undo();
    expect(value(store.slices.brief).crossing.endM).toBe(1470);
  });

  it('edit(change) of a start value takes its mark off, and undo brings both back', () => {
    const { store, value } = opened();
    const assumed = ['brief.crossing.endM', 'brief.loading'];
    store.open({ ...lowFerry(), assumed });
    const endTo = (endM: number): void =>
      store.edit((study) => putAt(study, ['brief', 'crossing', 'endM'], endM), { coalesce: 'end' });
    endTo(1475);
    endTo(1480);
    expect(value(store.slices.head).assumed).toEqual(['brief.loading']);
    // Dragged back to where it began nobody has said anything.
    endTo(1470);
    expect(value(store.draft).assumed).toEqual(assumed);
    store.endStep();
    expect(value(store.history).undo).toBeNull();
    endTo(1475);
    store.endStep();
    store.edit((study) => confirmed(study, ['brief.loading']), { what: 'confirming load standard' });
    expect(value(store.draft).assumed).toEqual([]);
    expect(value(store.history).undo).toBe('confirming load standard');
    store.undo();
    expect(value(store.draft).assumed).toEqual(['brief.loading']);
    store.undo();
    expect(value(store.draft).assumed).toEqual(assumed);
    expect(value(store.slices.brief).crossing.endM).toBe(1470);
  });

  it('edit(change) that opens another study takes its start values with it', () => {
    const { store, value } = opened();
    store.open({ ...lowFerry(), assumed: ['brief.loading'] });
    const other = { ...lowFerry(), title: 'Another', assumed: ['brief.surfacingM'] };
    store.edit(() => other);
    expect(value(store.draft).assumed).toEqual(['brief.surfacingM']);
  });

  it('endStep() forgets a drag that came back to where it began', () => {
    const { store, value, endTo } = opened();
    const draft = value(store.draft);
    endTo(1480, 'end');
    endTo(1470, 'end');
    store.endStep();
    expect(value(store.draft)).toBe(draft);
    expect(value(store.history)).toEqual({ undo: null, redo: null });
  });

  it('undo() and redo() stop at the ends, tell what they would do, and an edit ends what could be redone', () => {
    const { store, value, endTo, endM } = opened();
    endTo(1475);
    store.edit((study) => ({ ...study, title: 'Another' }), { what: 'title' });
    expect(value(store.history)).toEqual({ undo: 'title', redo: null });
    store.undo();
    expect(value(store.history)).toEqual({ undo: 'end', redo: 'title' });
    store.undo();
    store.undo();
    expect(endM()).toBe(1470);
    store.redo();
    expect(endM()).toBe(1475);
    endTo(1476);
    expect(value(store.history).redo).toBeNull();
    store.redo();
    expect(endM()).toBe(1476);
  });

  it('undo() gives the very study back that was there before', () => {
    const { store, value, endTo } = opened();
    const draft = value(store.draft);
    endTo(1475);
    store.undo();
    expect(value(store.draft)).toBe(draft);
    expect(store.valid()).toBe(draft);
  });

  it('edit(change) to an invalid study keeps the last valid one, says what is wrong, and recovers', () => {
    const { store, value, endTo, endM } = opened();
    endTo(1200);
    expect(value(store.draft).brief.crossing.endM).toBe(1200);
    expect(endM()).toBe(1470);
    expect(store.valid().brief.crossing.endM).toBe(1470);
    expect(value(store.problems).map(({ path }) => path.join('.'))).toContain('brief.crossing.endM');
    // Another part may be changed meanwhile; it counts as soon as the whole is valid again.
    store.edit((study) => ({ ...study, title: 'Another' }));
    expect(value(store.slices.head).title).not.toBe('Another');
    endTo(1475);
    expect(value(store.problems)).toEqual([]);
    expect(endM()).toBe(1475);
    expect(value(store.slices.head).title).toBe('Another');
  });

  it('undo() leads out of an invalid draft', () => {
    const { store, value, endTo, endM } = opened();
    endTo(1200);
    store.undo();
    expect(value(store.problems)).toEqual([]);
    expect(endM()).toBe(1470);
  });

  it('open(study, typed) shows what was typed with its problems over the valid study, and undo takes it back', () => {
    const { store, value, endM } = opened();
    const study = { ...lowFerry(), title: 'Another' };
    const typed = putAt(study, ['brief', 'crossing', 'endM'], -5);
    store.open(study, typed);
    expect(value(store.draft)).toEqual(typed);
    expect(value(store.problems).map(({ path }) => path.join('.'))).toContain('brief.crossing.endM');
    expect([store.valid(), endM()]).toEqual([study, study.brief.crossing.endM]);
    store.undo();
    expect(value(store.draft)).toEqual(study);
    expect(value(store.problems)).toEqual([]);
    store.redo();
    expect(value(store.draft)).toEqual(typed);
  });

  it('open(study) forgets the history, and refuses a study that is not valid', () => {
    const { store, value, endTo } = opened();
    endTo(1475);
    store.open({ ...lowFerry(), title: 'Another' });
    expect(value(store.slices.head).title).toBe('Another');
    expect(value(store.history)).toEqual({ undo: null, redo: null });
    const broken = putAt(lowFerry(), ['brief', 'crossing', 'endM'], 0);
    expect(() => store.open(broken)).toThrow('brief.crossing.endM');
    expect(() => studyStore(graph(), broken, problemsOf)).toThrow('expected a valid one');
  });
});
