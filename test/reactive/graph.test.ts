import { readFileSync, readdirSync } from 'node:fs';
import { resolve } from 'node:path';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { graph } from '../../notebooks/reactive/index.ts';
import type { Cell, State } from '../../notebooks/reactive/index.ts';
import { manual, turn } from './manual.ts';

const half = ({ a }: { readonly a: number }): number => Math.floor(a / 2);

describe('names', () => {
  it('[G1] cell() refuses a name in use and names it', () => {
    const g = graph();
    g.input('width', 12);
    expect(() => g.input('width', 3)).toThrow("cell 'width': expected a new name");
    expect(() => g.cell('width', {}, () => 1)).toThrow("cell 'width': expected a new name");
    expect(() => g.slow('width', {}, () => 1, { policy: 'latest' })).toThrow("cell 'width'");
  });

  it('[G1] cell() refuses a cell of another graph, even of the same name', () => {
    const g = graph();
    const foreign = graph().input('width', 12);
    expect(() => g.cell('area', { foreign }, ({ foreign: a }) => a)).toThrow(
      "cell 'width': expected a cell of this",
    );
    g.input('width', 12);
    expect(() => g.cell('area', { foreign }, ({ foreign: a }) => a)).toThrow(
      "cell 'width': expected a cell of this",
    );
    expect(() => {
      g.set(foreign, 3);
    }).toThrow("cell 'width'");
    expect(() => g.state(foreign)).toThrow("cell 'width'");
  });

  it('[G1] uses() and usedBy() tell the direct neighbours, cells() the definition order', () => {
    const g = graph();
    const a = g.input('a', 1);
    const b = g.cell('b', { a }, half);
    const c = g.slow('c', { b, a }, ({ a: x }) => x, { policy: 'latest' });
    const d = g.cell('d', { c, twice: c }, ({ c: x }) => x);
    const names = (cells: readonly Cell<unknown>[]): string[] => cells.map((cell) => cell.name);
    expect(names(g.cells())).toEqual(['a', 'b', 'c', 'd']);
    expect(g.cells().map((cell) => cell.kind)).toEqual(['input', 'cell', 'slow', 'cell']);
    expect(names(g.uses(c))).toEqual(['b', 'a']);
    expect(names(g.usedBy(a))).toEqual(['b', 'c']);
    expect(names(g.usedBy(c))).toEqual(['d']);
    expect(g.uses(a)).toEqual([]);
    expect(g.usedBy(d)).toEqual([]);
  });

  it('[G1] a run that reads or changes the graph fails with a remedy, and the graph goes on', async () => {
    const g = graph();
    const a = g.input('a', 1);
    const peeks = g.cell('peeks', { a }, () => g.state(a));
    const sets = g.cell('sets', { a }, () => {
      g.set(a, 5);
    });
    const defines = g.cell('defines', { a }, () => g.input('late', 1));
    const ends = g.slow('ends', { a }, () => g.dispose(), { policy: 'latest' });
    const fine = g.cell('fine', { a }, half);
    await g.settled();
    for (const cell of [peeks, sets, defines, ends] as Cell<unknown>[]) {
      expect(g.state(cell)).toMatchObject({ state: 'failed', raisedBy: cell.name });
      const { error } = g.state(cell) as { error: Error };
      expect(error.message).toContain('not allowed inside a run');
    }
    expect(g.state(fine)).toEqual({ state: 'ready', value: 0 });
    expect(g.state(a)).toEqual({ state: 'ready', value: 1 });
  });

  it('[G1] a cell defined later joins the graph at its present age', async () => {
    const g = graph();
    const a = g.input('a', 1);
    await g.settled();
    g.batch(() => g.set(a, 4));
    const late = g.cell('late', { a }, half);
    const unit = g.input('unit', 3);
    const both = g.cell('both', { late, unit }, ({ late: x, unit: y }) => x * y);
    expect(g.state(late)).toEqual({ state: 'pending' });
    await g.settled();
    expect(g.state(both)).toEqual({ state: 'ready', value: 6 });
  });
});

describe('passes', () => {
  it('[G2] a change runs every dependant once, in definition order, and nothing else', async () => {
    const g = graph();
    const ran: string[] = [];
    const note = (name: string, value: number): number => {
      ran.push(name);
      return value;
    };
    const a = g.input('a', 1);
    const other = g.input('other', 1);
    const left = g.cell('left', { a }, ({ a: x }) => note('left', x + 1));
    const aside = g.cell('aside', { other }, ({ other: x }) => note('aside', x));
    const right = g.cell('right', { a }, ({ a: x }) => note('right', x * 10));
    const sum = g.cell('sum', { right, left, a }, (v) => note('sum', v.right + v.left + v.a));
    await g.settled();
    expect(ran).toEqual(['left', 'aside', 'right', 'sum']);
    ran.length = 0;
    g.batch(() => g.set(a, 2));
    expect(ran).toEqual(['left', 'right', 'sum']);
    expect(g.state(sum)).toEqual({ state: 'ready', value: 25 });
    expect(g.state(aside)).toEqual({ state: 'ready', value: 1 });
  });

  it('[G2] a slow cell starts at most one run in a pass', async () => {
    const g = graph();
    const { runs, start } = manual<object, number>();
    const a = g.input('a', 1);
    const b = g.input('b', 1);
    const c = g.cell('c', { a }, half);
    g.slow('d', { a, b, c }, start, { policy: 'latest' });
    await turn();
    g.batch(() => {
      g.set(a, 8);
      g.set(b, 8);
    });
    expect(runs.map((run) => run.values)).toEqual([
      { a: 1, b: 1, c: 0 },
      { a: 8, b: 8, c: 4 },
    ]);
  });

  it('[G3] a run waits while a slow cell above it is of an earlier age than the rest', async () => {
    const g = graph();
    const { runs, start } = manual<{ a: number }, number>();
    const seen: unknown[] = [];
    const a = g.input('a', 1);
    const b = g.slow('b', { a }, start, { policy: 'progress' });
    g.cell('mixed', { a, b }, (values) => {
      seen.push(values);
    });
    await turn();
    await runs[0]!.finish(10);
    g.batch(() => g.set(a, 2));
    g.batch(() => g.set(a, 3));
    await runs[1]!.finish(20);
    expect(runs).toHaveLength(3);
    await runs[2]!.finish(30);
    expect(seen).toEqual([
      { a: 1, b: 10 },
      { a: 3, b: 30 },
    ]);
  });

  it('[G3] two slow cells reach a cell below together, whichever ends first', async () => {
    const g = graph();
    const left = manual<object, string>();
    const right = manual<object, string>();
    const seen: unknown[] = [];
    const a = g.input('a', 1);
    const b = g.slow('b', { a }, left.start, { policy: 'latest' });
    const c = g.slow('c', { a }, right.start, { policy: 'latest' });
    g.cell('both', { b, c }, (values) => {
      seen.push(values);
    });
    await turn();
    await left.runs[0]!.finish('b1');
    await right.runs[0]!.finish('c1');
    g.batch(() => g.set(a, 2));
    await right.runs[1]!.finish('c2');
    g.batch(() => g.set(a, 3));
    await left.runs[2]!.finish('b3');
    await right.runs[2]!.finish('c3');
    expect(seen).toEqual([
      { b: 'b1', c: 'c1' },
      { b: 'b3', c: 'c3' },
    ]);
  });
});

describe('equal values', () => {
  it('[G4] an equal value stops there, and what is below is ready for the new age', async () => {
    const g = graph();
    const run = vi.fn(({ b }: { readonly b: number }) => b + 100);
    const a = g.input('a', 2);
    const b = g.cell('b', { a }, half);
    const c = g.cell('c', { b }, run);
    const sum = g.cell('sum', { a, c }, (v) => v.a + v.c);
    await g.settled();
    g.batch(() => g.set(a, 3));
    expect(run).toHaveBeenCalledTimes(1);
    expect(g.state(c)).toEqual({ state: 'ready', value: 101 });
    expect(g.state(sum)).toEqual({ state: 'ready', value: 104 });
    g.batch(() => g.set(a, 4));
    expect(run).toHaveBeenCalledTimes(2);
  });

  it('[G4] setting an input to an equal value makes no pass', async () => {
    const g = graph();
    const run = vi.fn(({ a }: { readonly a: number }) => a);
    const spans = vi.fn(() => 0);
    const a = g.input('a', NaN);
    const list = g.input('list', [60, 80, 60], { equal: (x, y) => x.join() === y.join() });
    g.cell('b', { a }, run);
    g.cell('c', { list }, spans);
    await g.settled();
    g.set(a, NaN);
    g.set(list, [60, 80, 60]);
    g.set(a, 3);
    g.set(a, NaN);
    await g.settled();
    expect(run).toHaveBeenCalledTimes(1);
    expect(spans).toHaveBeenCalledTimes(1);
  });

  it('[G4] a cell that declares its own equality stops equal objects', async () => {
    const g = graph();
    const run = vi.fn(() => 0);
    const a = g.input('a', 2);
    const b = g.cell('b', { a }, (v) => ({ half: half(v) }), { equal: (x, y) => x.half === y.half });
    g.cell('c', { b }, run);
    await g.settled();
    g.batch(() => g.set(a, 3));
    expect(run).toHaveBeenCalledTimes(1);
  });

  it('[G4] an equal value stops after a slow run as well, and slow cells below do not run again', async () => {
    const g = graph();
    const upper = manual<object, number>();
    const lower = manual<object, number>();
    const run = vi.fn(({ b }: { readonly b: number }) => b);
    const a = g.input('a', 1);
    const b = g.slow('b', { a }, upper.start, { policy: 'latest' });
    const c = g.cell('c', { b }, run);
    const d = g.slow('d', { b }, lower.start, { policy: 'latest' });
    await turn();
    await upper.runs[0]!.finish(7);
    await lower.runs[0]!.finish(70);
    g.batch(() => g.set(a, 2));
    expect([g.state(b), g.state(c), g.state(d)].map((s) => s.state)).toEqual([
      'pending',
      'pending',
      'pending',
    ]);
    await upper.runs[1]!.finish(7);
    expect(run).toHaveBeenCalledTimes(1);
    expect(lower.runs).toHaveLength(1);
    expect(g.state(c)).toEqual({ state: 'ready', value: 7 });
    expect(g.state(d)).toEqual({ state: 'ready', value: 70 });
  });

  it('[G4] a run under way keeps its purpose when what is above comes out equal', async () => {
    const g = graph();
    const upper = manual<object, number>();
    const lower = manual<object, number>();
    const a = g.input('a', 1);
    const b = g.slow('b', { a }, upper.start, { policy: 'latest' });
    const c = g.slow('c', { b }, lower.start, { policy: 'latest' });
    await turn();
    await upper.runs[0]!.finish(7);
    g.batch(() => g.set(a, 2));
    await upper.runs[1]!.finish(7);
    expect(lower.runs).toHaveLength(1);
    expect(lower.runs[0]!.run.signal.aborted).toBe(false);
    await lower.runs[0]!.finish(70);
    expect(g.state(c)).toEqual({ state: 'ready', value: 70 });
  });

  it('[G4] an equality that throws fails its cell, and throws at whoever sets an input', async () => {
    const g = graph();
    const wrong = new Error('not comparable');
    const refuse = (): boolean => {
      throw wrong;
    };
    const a = g.input('a', 1, { equal: refuse });
    const free = g.input('free', 1);
    const b = g.cell('b', { free }, ({ free: x }) => x, { equal: refuse });
    await g.settled();
    expect(() => {
      g.set(a, 2);
    }).toThrow(wrong);
    g.batch(() => g.set(free, 2));
    expect(g.state(b)).toEqual({ state: 'failed', error: wrong, raisedBy: 'b', value: 1 });
  });
});

describe('slow cells', () => {
  it('[G5] latest: a new run aborts the old one', async () => {
    const g = graph();
    const { runs, start } = manual<{ a: number }, number>();
    const a = g.input('a', 1);
    const b = g.slow('b', { a }, start, { policy: 'latest' });
    await turn();
    g.batch(() => g.set(a, 2));
    expect(runs.map((run) => run.run.signal.aborted)).toEqual([true, false]);
    await runs[1]!.finish(20);
    expect(g.state(b)).toEqual({ state: 'ready', value: 20 });
  });

  it('[G5] progress: the run under way finishes and only the newest wish is run after it', async () => {
    const g = graph();
    const { runs, start } = manual<{ a: number }, number>();
    const a = g.input('a', 1);
    const b = g.slow('b', { a }, start, { policy: 'progress' });
    await turn();
    for (const value of [2, 3, 4]) g.batch(() => g.set(a, value));
    expect(runs).toHaveLength(1);
    expect(runs[0]!.run.signal.aborted).toBe(false);
    await runs[0]!.finish(10);
    expect(g.state(b)).toEqual({ state: 'pending', value: 10 });
    expect(runs.map((run) => run.values.a)).toEqual([1, 4]);
    await runs[1]!.finish(40);
    expect(g.state(b)).toEqual({ state: 'ready', value: 40 });
    expect(runs).toHaveLength(2);
  });

  it.each(['latest', 'progress'] as const)(
    '[G5] %s: a failure above aborts the run under way',
    async (policy) => {
      const g = graph();
      const { runs, start } = manual<object, number>();
      const a = g.input('a', 1);
      const b = g.cell('b', { a }, ({ a: x }) => {
        if (x > 1) throw new RangeError('too wide');
        return x;
      });
      const c = g.slow('c', { b }, start, { policy });
      await turn();
      g.batch(() => g.set(a, 2));
      expect(runs[0]!.run.signal.aborted).toBe(true);
      expect(g.state(c)).toMatchObject({ state: 'failed', raisedBy: 'b' });
      await runs[0]!.finish(10);
      expect(g.state(c)).toMatchObject({ state: 'failed', raisedBy: 'b' });
    },
  );

  it('[G6] the value, the error and the progress of an aborted run are dropped', async () => {
    const g = graph();
    const { runs, start } = manual<{ a: number }, number>();
    const states: State<number>[] = [];
    const a = g.input('a', 1);
    const b = g.slow('b', { a }, start, { policy: 'latest' });
    g.watch(b, (state) => states.push(state));
    await turn();
    g.batch(() => g.set(a, 2));
    g.batch(() => g.set(a, 3));
    runs[0]!.run.report({ done: 1, of: 2, what: 'old' });
    await runs[0]!.finish(10);
    await runs[1]!.fail(new Error('aborted'));
    expect(states).toEqual([{ state: 'pending' }]);
    await runs[2]!.finish(30);
    expect(states).toEqual([{ state: 'pending' }, { state: 'ready', value: 30 }]);
  });

  it('[G6] settled() does not wait for an aborted run', async () => {
    const g = graph();
    const { runs, start } = manual<{ a: number }, number>();
    const a = g.input('a', 1);
    g.slow('b', { a }, start, { policy: 'latest' });
    await turn();
    g.batch(() => g.set(a, 2));
    const settled = vi.fn();
    void g.settled().then(settled);
    await turn();
    expect(settled).not.toHaveBeenCalled();
    await runs[1]!.finish(20);
    expect(settled).toHaveBeenCalledTimes(1);
  });

  it('[G14] report() is shown while the cell is pending and gone when it is ready', async () => {
    const g = graph();
    const { runs, start } = manual<{ a: number }, number>();
    const states: State<number>[] = [];
    const a = g.input('a', 1);
    const b = g.slow('b', { a }, start, { policy: 'latest' });
    await turn();
    await runs[0]!.finish(10);
    g.batch(() => g.set(a, 2));
    g.watch(b, (state) => states.push(state));
    runs[1]!.run.report({ done: 1, of: 4, what: 'spans' });
    await runs[1]!.finish(20);
    runs[1]!.run.report({ done: 4, of: 4, what: 'late' });
    expect(states).toEqual([
      { state: 'pending', value: 10 },
      { state: 'pending', value: 10, progress: { done: 1, of: 4, what: 'spans' } },
      { state: 'ready', value: 20 },
    ]);
  });

  it('[G14] a slow cell never has two live runs', async () => {
    const g = graph();
    let live = 0;
    let most = 0;
    const a = g.input('a', 0);
    for (const policy of ['latest', 'progress'] as const) {
      g.slow(
        policy,
        { a },
        async (_, { signal }) => {
          live += 1;
          most = Math.max(most, live);
          const end = (): number => (live -= 1);
          signal.addEventListener('abort', end);
          await turn();
          if (!signal.aborted) end();
        },
        { policy },
      );
    }
    for (let i = 1; i < 20; i += 1) {
      g.set(a, i);
      await Promise.resolve();
    }
    await g.settled();
    expect(most).toBe(2);
    expect(live).toBe(0);
  });

  it('[G14] a result for an age that has passed goes on to cells below, marked as pending', async () => {
    const g = graph();
    const { runs, start } = manual<{ a: number }, number>();
    const a = g.input('a', 1);
    const b = g.slow('b', { a }, start, { policy: 'progress' });
    const c = g.cell('c', { b }, ({ b: x }) => x + 1);
    await turn();
    g.batch(() => g.set(a, 2));
    await runs[0]!.finish(10);
    expect(g.state(c)).toEqual({ state: 'pending', value: 11 });
    await runs[1]!.finish(20);
    expect(g.state(c)).toEqual({ state: 'ready', value: 21 });
  });

  it('[G15] a part goes on to cells below, pending with them, until the run ends', async () => {
    const g = graph();
    const { runs, start } = manual<{ a: number }, number>();
    const a = g.input('a', 1);
    const b = g.slow('b', { a }, start, { policy: 'latest' });
    const c = g.cell('c', { b }, ({ b: x }) => x + 1);
    const settled = vi.fn<() => void>();
    await turn();
    runs[0]!.run.handOn(10);
    await turn();
    void g.settled().then(settled);
    expect(g.state(b)).toEqual({ state: 'pending', value: 10 });
    expect(g.state(c)).toEqual({ state: 'pending', value: 11 });
    runs[0]!.run.handOn(20);
    await turn();
    expect(g.state(c)).toEqual({ state: 'pending', value: 21 });
    expect(settled).not.toHaveBeenCalled();
    await runs[0]!.finish(30);
    expect(g.state(c)).toEqual({ state: 'ready', value: 31 });
    expect(settled).toHaveBeenCalledTimes(1);
  });

  it('[G15] a part meets another value of its age in one view, and neither an older nor a newer one', async () => {
    const g = graph();
    const { runs, start } = manual<{ a: number }, number>();
    const states: unknown[] = [];
    const a = g.input('a', 1);
    const b = g.slow('b', { a }, start, { policy: 'latest' });
    g.view({ a, b }, (state) => states.push(state));
    await turn();
    runs[0]!.run.handOn(10);
    await turn();
    g.batch(() => g.set(a, 2));
    runs[0]!.run.handOn(11);
    await turn();
    runs[1]!.run.handOn(20);
    await runs[1]!.finish(21);
    expect(states).toEqual([
      { state: 'pending' },
      { state: 'pending', value: { a: 1, b: 10 } },
      { state: 'pending', value: { a: 2, b: 20 } },
      { state: 'ready', value: { a: 2, b: 21 } },
    ]);
  });

  it('[G15] a result equal to its last part makes ready what was made from it, which does not run again', async () => {
    const g = graph();
    const { runs, start } = manual<{ a: number }, number>();
    const ran = vi.fn<(x: number) => number>((x) => x + 1);
    const a = g.input('a', 1);
    const b = g.slow('b', { a }, start, { policy: 'latest' });
    const c = g.cell('c', { b }, ({ b: x }) => ran(x));
    const d = g.slow('d', { c }, ({ c: x }) => 2 * x, { policy: 'latest' });
    await turn();
    runs[0]!.run.handOn(10);
    await turn();
    expect(g.state(d)).toEqual({ state: 'pending', value: 22 });
    await runs[0]!.finish(10);
    expect(g.state(c)).toEqual({ state: 'ready', value: 11 });
    expect(g.state(d)).toEqual({ state: 'ready', value: 22 });
    expect(ran).toHaveBeenCalledTimes(1);
  });

  it('[G15] a failure after a part keeps the part; a run that is started hands on at once', async () => {
    const g = graph();
    const a = g.input('a', 1);
    const b = g.slow(
      'b',
      { a },
      async ({ a: x }, { handOn }): Promise<number> => {
        handOn(10 * x);
        await turn();
        throw new Error('no more');
      },
      { policy: 'latest' },
    );
    await g.settled();
    expect(g.state(b)).toMatchObject({ state: 'failed', raisedBy: 'b', value: 10 });
    g.batch(() => g.set(a, 2));
    expect(g.state(b)).toEqual({ state: 'pending', value: 10 });
    await g.settled();
    expect(g.state(b)).toMatchObject({ state: 'failed', value: 20 });
  });

  it('[G15] what an aborted run left is never ready', async () => {
    const g = graph();
    const { runs, start } = manual<{ a: number }, number>();
    const a = g.input('a', 2);
    const b = g.cell('b', { a }, half);
    const c = g.slow('c', { b }, ({ b: x }, run) => start({ a: x }, run), { policy: 'latest' });
    await turn();
    runs[0]!.run.handOn(10);
    await turn();
    g.batch(() => g.set(a, 4));
    g.batch(() => g.set(a, 2));
    expect(g.state(c)).toEqual({ state: 'pending', value: 10 });
    expect(runs).toHaveLength(3);
    await runs[2]!.finish(11);
    expect(g.state(c)).toEqual({ state: 'ready', value: 11 });
  });
});

describe('states and failures', () => {
  it('[G7] pending passes on to everything below, keeping the last good values', async () => {
    const g = graph();
    const { runs, start } = manual<{ a: number }, number>();
    const a = g.input('a', 1);
    const b = g.slow('b', { a }, start, { policy: 'latest' });
    const c = g.cell('c', { b }, ({ b: x }) => x + 1);
    const d = g.cell('d', { a, c }, (v) => v.a + v.c);
    await turn();
    expect([b, c, d].map((cell) => g.state(cell))).toEqual(Array(3).fill({ state: 'pending' }));
    await runs[0]!.finish(10);
    expect(g.state(d)).toEqual({ state: 'ready', value: 12 });
    g.batch(() => g.set(a, 2));
    expect(g.state(a)).toEqual({ state: 'ready', value: 2 });
    expect(g.state(b)).toEqual({ state: 'pending', value: 10 });
    expect(g.state(c)).toEqual({ state: 'pending', value: 11 });
    expect(g.state(d)).toEqual({ state: 'pending', value: 12 });
  });

  it('[G7] a value of undefined is a value', async () => {
    const g = graph();
    const a = g.input('a', 1);
    const b = g.cell('b', { a }, () => undefined);
    await g.settled();
    expect(g.state(b)).toStrictEqual({ state: 'ready', value: undefined });
  });

  it('[G8] a failure reaches every cell below with the original error and its origin, and nothing runs there', async () => {
    const g = graph();
    const wrong = new RangeError('span: expected more than 0 m, received -3 m');
    const below = vi.fn(() => 0);
    const a = g.input('a', -3);
    const b = g.cell('b', { a }, () => {
      throw wrong;
    });
    const c = g.cell('c', { b }, below);
    const d = g.slow('d', { a, c }, below, { policy: 'latest' });
    await g.settled();
    for (const cell of [b, c, d]) {
      const state = g.state(cell);
      expect(state).toEqual({ state: 'failed', error: wrong, raisedBy: 'b' });
      expect((state as { error: unknown }).error).toBe(wrong);
    }
    expect(below).not.toHaveBeenCalled();
  });

  it('[G8] a slow run that throws or rejects fails its cell; whatever was thrown is kept as it is', async () => {
    const g = graph();
    const thrown = g.slow(
      'thrown',
      {},
      (): number => {
        throw new Error('at once');
      },
      { policy: 'latest' },
    );
    // oxlint-disable-next-line typescript/prefer-promise-reject-errors -- anything may be thrown
    const rejected = g.slow('rejected', {}, () => Promise.reject('a word'), { policy: 'progress' });
    await g.settled();
    expect(g.state(thrown)).toEqual({ state: 'failed', error: new Error('at once'), raisedBy: 'thrown' });
    expect(g.state(rejected)).toEqual({ state: 'failed', error: 'a word', raisedBy: 'rejected' });
  });

  it('[G8] of several failures the one named first among the cells used passes on', async () => {
    const g = graph();
    const fail = (): number => {
      throw new Error('no');
    };
    const first = g.cell('first', {}, fail);
    const second = g.cell('second', {}, fail);
    const both = g.cell('both', { second, first }, () => 0);
    await g.settled();
    expect(g.state(both)).toMatchObject({ raisedBy: 'second' });
  });

  it('[G8] a cell that answers with a promise fails and names the remedy', async () => {
    const g = graph();
    const a = g.cell('a', {}, () => Promise.resolve(1));
    await g.settled();
    const state = g.state(a);
    expect(state).toMatchObject({ state: 'failed', raisedBy: 'a' });
    expect(String((state as { error: unknown }).error)).toContain('define the cell with slow()');
  });

  it('[G9] a fixed input recovers everything below, also when the value is the last good one', async () => {
    const g = graph();
    const a = g.input('a', 4);
    const root = g.cell('root', { a }, ({ a: x }) => {
      if (!(x >= 0)) throw new RangeError('negative');
      return Math.sqrt(x);
    });
    const slow = g.slow('slow', { root }, ({ root: x }) => Promise.resolve(x * 10), { policy: 'latest' });
    const last = g.cell('last', { slow, a }, (v) => v.slow + v.a);
    await g.settled();
    g.set(a, -1);
    await g.settled();
    expect(g.state(last)).toMatchObject({ state: 'failed', raisedBy: 'root', value: 24 });
    expect(g.state(slow)).toMatchObject({ state: 'failed', raisedBy: 'root', value: 20 });
    g.set(a, 4);
    await g.settled();
    expect(g.state(root)).toEqual({ state: 'ready', value: 2 });
    expect(g.state(slow)).toEqual({ state: 'ready', value: 20 });
    expect(g.state(last)).toEqual({ state: 'ready', value: 24 });
  });

  it('[G9] while a failed cell is run again it is pending and shows its last good value', async () => {
    const g = graph();
    const { runs, start } = manual<{ a: number }, number>();
    const a = g.input('a', 1);
    const b = g.slow('b', { a }, start, { policy: 'latest' });
    await turn();
    await runs[0]!.finish(10);
    g.batch(() => g.set(a, 2));
    await runs[1]!.fail(new Error('no'));
    expect(g.state(b)).toMatchObject({ state: 'failed', value: 10 });
    g.batch(() => g.set(a, 3));
    expect(g.state(b)).toEqual({ state: 'pending', value: 10 });
  });
});

describe('turns', () => {
  it('[G10] settled() waits for a pass that is due and for chains of slow cells', async () => {
    const g = graph();
    const a = g.input('a', 1);
    const b = g.slow('b', { a }, ({ a: x }) => Promise.resolve(x + 1), { policy: 'latest' });
    const c = g.slow('c', { b }, async ({ b: x }) => (await turn(), x + 1), { policy: 'progress' });
    await g.settled();
    expect(g.state(c)).toEqual({ state: 'ready', value: 3 });
    g.set(a, 5);
    await g.settled();
    expect(g.state(c)).toEqual({ state: 'ready', value: 7 });
  });

  it('[G10] settled() resolves at once on a graph at rest, and does not reject over a failure', async () => {
    const g = graph();
    await g.settled();
    g.slow('bad', {}, () => Promise.reject(new Error('no')), { policy: 'latest' });
    await expect(g.settled()).resolves.toBeUndefined();
  });

  it('[G10] settled() waits for what a watch has set in answer', async () => {
    const g = graph();
    const a = g.input('a', 1);
    const b = g.slow('b', { a }, ({ a: x }) => Promise.resolve(x), { policy: 'latest' });
    const echo = g.input('echo', 0);
    const c = g.cell('c', { echo }, ({ echo: x }) => x * 10);
    g.watch(b, (state) => {
      if (state.state === 'ready') g.set(echo, state.value);
    });
    await g.settled();
    expect(g.state(c)).toEqual({ state: 'ready', value: 10 });
    g.set(a, 2);
    await g.settled();
    expect(g.state(c)).toEqual({ state: 'ready', value: 20 });
  });

  it('[G11] the source names no timer, frame, clock or page', () => {
    const folder = resolve(import.meta.dirname, '../../notebooks/reactive');
    const files = readdirSync(folder).filter((name) => name.endsWith('.ts'));
    expect(files.length).toBeGreaterThan(5);
    for (const file of files) {
      const source = readFileSync(resolve(folder, file), 'utf8');
      expect(source, file).not.toMatch(
        /setTimeout|setInterval|setImmediate|AnimationFrame|IdleCallback|\bDate\b|\bperformance\b|\bdocument\b|\bwindow\b/,
      );
    }
  });

  describe('without the means of a page', () => {
    afterEach(() => {
      vi.useRealTimers();
    });

    it('[G11] everything works while all timers and frames stand still', async () => {
      vi.useFakeTimers({
        toFake: ['setTimeout', 'setInterval', 'setImmediate', 'Date', 'performance', 'requestAnimationFrame'],
      });
      const g = graph();
      const a = g.input('a', 1);
      const b = g.slow('b', { a }, ({ a: x }) => Promise.resolve(x + 1), { policy: 'progress' });
      g.set(a, 3);
      await g.settled();
      expect(g.state(b)).toEqual({ state: 'ready', value: 4 });
      expect(vi.getTimerCount()).toBe(0);
    });
  });

  it('[G12] several set in one turn make one pass, at its end', async () => {
    const g = graph();
    const run = vi.fn((v: { readonly a: number; readonly b: number }) => v.a + v.b);
    const a = g.input('a', 1);
    const b = g.input('b', 1);
    const sum = g.cell('sum', { a, b }, run);
    await g.settled();
    g.set(a, 2);
    g.set(b, 2);
    g.set(a, 3);
    expect(g.state(sum)).toEqual({ state: 'ready', value: 2 });
    expect(run).toHaveBeenCalledTimes(1);
    await Promise.resolve();
    expect(run.mock.calls.slice(1)).toEqual([[{ a: 3, b: 2 }]]);
    expect(g.state(sum)).toEqual({ state: 'ready', value: 5 });
  });

  it('[G12] batch() makes the pass before it returns, once for nested batches, and hands back the answer', async () => {
    const g = graph();
    const run = vi.fn(({ a }: { readonly a: number }) => a);
    const a = g.input('a', 1);
    const b = g.cell('b', { a }, run);
    await g.settled();
    const answer = g.batch(() => {
      g.batch(() => g.set(a, 2));
      g.set(a, 3);
      expect(run).toHaveBeenCalledTimes(1);
      return 'done';
    });
    expect(answer).toBe('done');
    expect(g.state(b)).toEqual({ state: 'ready', value: 3 });
    await turn();
    expect(run).toHaveBeenCalledTimes(2);
  });

  it('[G12] a batch that throws still makes its pass and throws on', async () => {
    const g = graph();
    const a = g.input('a', 1);
    const b = g.cell('b', { a }, half);
    await g.settled();
    expect(() =>
      g.batch(() => {
        g.set(a, 6);
        throw new Error('stop');
      }),
    ).toThrow('stop');
    expect(g.state(b)).toEqual({ state: 'ready', value: 3 });
  });

  it('[G13] dispose() aborts every run, drops its result, stops watches and lets settled() go', async () => {
    const g = graph();
    const { runs, start } = manual<object, number>();
    const show = vi.fn();
    const a = g.input('a', 1);
    const b = g.slow('b', { a }, start, { policy: 'progress' });
    await turn();
    await runs[0]!.finish(10);
    g.batch(() => g.set(a, 2));
    g.watch(b, show);
    g.view({ a, b }, show);
    show.mockClear();
    runs[1]!.run.report({ done: 1, of: 2, what: 'spans' });
    expect(show).toHaveBeenCalledTimes(1);
    const settled = g.settled();
    g.set(a, 3);
    g.dispose();
    g.dispose();
    await settled;
    expect(runs[1]!.run.signal.aborted).toBe(true);
    await runs[1]!.finish(20);
    expect(runs).toHaveLength(2);
    expect(g.state(b)).toEqual({ state: 'pending', value: 10 });
    expect(g.state(a)).toEqual({ state: 'ready', value: 2 });
    expect(show).toHaveBeenCalledTimes(1);
  });

  it('[G13] after dispose() every change is an error that says so', () => {
    const g = graph();
    const a = g.input('a', 1);
    g.dispose();
    const changes = [
      () => g.set(a, 2),
      () => g.input('b', 1),
      () => g.cell('b', {}, () => 1),
      () => g.slow('b', {}, () => 1, { policy: 'latest' }),
      () => g.batch(() => 1),
      () => g.watch(a, () => undefined),
      () => g.view({ a }, () => undefined),
    ];
    for (const change of changes) expect(change).toThrow('expected a graph in use, received a disposed one');
  });
});

describe('watches and views', () => {
  it('[G7] watch() tells the state now and after every change, until it is stopped', async () => {
    const g = graph();
    const states: State<number>[] = [];
    const a = g.input('a', 2);
    const b = g.cell('b', { a }, half);
    const stop = g.watch(b, (state) => states.push(state));
    await g.settled();
    g.batch(() => g.set(a, 3));
    g.batch(() => g.set(a, 4));
    stop();
    stop();
    g.batch(() => g.set(a, 6));
    expect(states).toEqual([
      { state: 'pending' },
      { state: 'ready', value: 1 },
      { state: 'ready', value: 2 },
    ]);
  });

  it('[G7] a watch sees a complete pass, whatever it reads', async () => {
    const g = graph();
    const seen: unknown[] = [];
    const a = g.input('a', 1);
    const b = g.cell('b', { a }, ({ a: x }) => x * 10);
    await g.settled();
    g.watch(a, () => seen.push([g.state(a), g.state(b)]));
    g.batch(() => g.set(a, 2));
    expect(seen).toEqual([
      [
        { state: 'ready', value: 1 },
        { state: 'ready', value: 10 },
      ],
      [
        { state: 'ready', value: 2 },
        { state: 'ready', value: 20 },
      ],
    ]);
  });

  it('[G12] a watch that throws does so after the pass, and the graph is whole', async () => {
    const g = graph();
    const a = g.input('a', 1);
    const b = g.cell('b', { a }, half);
    const calm = vi.fn();
    await g.settled();
    g.watch(a, (state) => {
      if (state.value === 6) throw new Error('cannot draw');
    });
    g.watch(b, calm);
    expect(() => g.batch(() => g.set(a, 6))).toThrow('cannot draw');
    expect(g.state(b)).toEqual({ state: 'ready', value: 3 });
    expect(calm).toHaveBeenLastCalledWith({ state: 'ready', value: 3 });
    g.batch(() => g.set(a, 8));
    expect(g.state(b)).toEqual({ state: 'ready', value: 4 });
  });

  it('[G14] view() keeps the last values of one age, pending, until all have come to a newer one', async () => {
    const g = graph();
    const { runs, start } = manual<{ a: number }, number>();
    const states: unknown[] = [];
    const a = g.input('a', 1);
    const fast = g.cell('fast', { a }, ({ a: x }) => x * 2);
    const slow = g.slow('slow', { a }, start, { policy: 'progress' });
    await turn();
    await runs[0]!.finish(10);
    g.view({ fast, slow }, (state) => states.push(state));
    g.batch(() => g.set(a, 2));
    g.batch(() => g.set(a, 3));
    await runs[1]!.finish(20);
    await runs[2]!.finish(30);
    expect(states).toEqual([
      { state: 'ready', value: { fast: 2, slow: 10 } },
      { state: 'pending', value: { fast: 2, slow: 10 } },
      { state: 'ready', value: { fast: 6, slow: 30 } },
    ]);
  });

  it('[G14] view() of cells that answer to one slow cell shows newer partial results, marked as pending', async () => {
    const g = graph();
    const { runs, start } = manual<{ a: number }, number>();
    const states: unknown[] = [];
    const a = g.input('a', 1);
    const b = g.slow('b', { a }, start, { policy: 'progress' });
    const c = g.cell('c', { b }, ({ b: x }) => x + 1);
    g.view({ b, c }, (state) => states.push(state));
    await turn();
    g.batch(() => g.set(a, 2));
    await runs[0]!.finish(10);
    await runs[1]!.finish(20);
    expect(states).toEqual([
      { state: 'pending' },
      { state: 'pending', value: { b: 10, c: 11 } },
      { state: 'ready', value: { b: 20, c: 21 } },
    ]);
  });

  it('[G14] a partial result and a value that has stayed equal since meet in one view', async () => {
    const g = graph();
    const { runs, start } = manual<{ a: number }, number>();
    const states: unknown[] = [];
    const a = g.input('a', 2);
    const b = g.cell('b', { a }, half);
    const slow = g.slow('slow', { a }, start, { policy: 'progress' });
    g.view({ b, slow }, (state) => states.push(state));
    await turn();
    g.batch(() => g.set(a, 3));
    await runs[0]!.finish(20);
    expect(states).toEqual([{ state: 'pending' }, { state: 'pending', value: { b: 1, slow: 20 } }]);
  });

  it('[G14] a late partial result is not shown with one of the age after it', async () => {
    const g = graph();
    const early = manual<object, string>();
    const later = manual<object, string>();
    const states: unknown[] = [];
    const a = g.input('a', 0);
    const b = g.slow('b', { a }, early.start, { policy: 'progress' });
    const c = g.slow('c', { a }, later.start, { policy: 'progress' });
    g.view({ b, c }, (state) => states.push(state.value));
    await turn();
    await later.runs[0]!.finish('c0');
    g.batch(() => g.set(a, 1));
    g.batch(() => g.set(a, 2));
    await later.runs[1]!.finish('c1');
    await early.runs[0]!.finish('b0');
    await early.runs[1]!.finish('b2');
    await later.runs[2]!.finish('c2');
    expect(states.filter((value) => value !== undefined)).toEqual([{ b: 'b2', c: 'c2' }]);
  });

  it('[G14] a value equal again after ages nobody worked out is not shown with a result of those ages', async () => {
    const g = graph();
    const left = manual<object, string>();
    const right = manual<object, string>();
    const states: State<unknown>[] = [];
    const a = g.input('a', 0);
    const b = g.slow('b', { a }, left.start, { policy: 'latest' });
    const c = g.slow('c', { a }, right.start, { policy: 'progress' });
    g.view({ b, c }, (state) => states.push(state));
    await turn();
    await left.runs[0]!.finish('same');
    await right.runs[0]!.finish('c0');
    states.length = 0;
    g.batch(() => g.set(a, 1));
    g.batch(() => g.set(a, 2));
    await left.runs[2]!.finish('same');
    await right.runs[1]!.finish('c1');
    await right.runs[2]!.finish('c2');
    expect(states).toEqual([
      { state: 'pending', value: { b: 'same', c: 'c0' } },
      { state: 'ready', value: { b: 'same', c: 'c2' } },
    ]);
  });

  it('[G14] an equal partial result is not told again', async () => {
    const g = graph();
    const { runs, start } = manual<{ a: number }, number>();
    const states: unknown[] = [];
    const a = g.input('a', 1);
    const b = g.slow('b', { a }, start, { policy: 'progress' });
    g.watch(b, (state) => states.push(state));
    await turn();
    for (const value of [2, 3, 4]) {
      g.batch(() => g.set(a, value));
      await runs.at(-1)!.finish(10);
    }
    await runs.at(-1)!.finish(10);
    expect(states).toEqual([
      { state: 'pending' },
      { state: 'pending', value: 10 },
      { state: 'ready', value: 10 },
    ]);
  });

  it('[G14] view() fails with the cell that failed and keeps the last values', async () => {
    const g = graph();
    const states: State<unknown>[] = [];
    const a = g.input('a', 1);
    const b = g.cell('b', { a }, ({ a: x }) => {
      if (x === 2) throw new Error('no');
      return x;
    });
    await g.settled();
    const stop = g.view({ a, b }, (state) => states.push(state));
    g.batch(() => g.set(a, 2));
    g.batch(() => g.set(a, 3));
    stop();
    g.batch(() => g.set(a, 4));
    expect(states).toEqual([
      { state: 'ready', value: { a: 1, b: 1 } },
      { state: 'failed', error: new Error('no'), raisedBy: 'b', value: { a: 1, b: 1 } },
      { state: 'ready', value: { a: 3, b: 3 } },
    ]);
  });
});
