import { afterEach, beforeEach, describe, expect, expectTypeOf, it } from 'vitest';
import { graph } from '../../notebooks/reactive/index.ts';
import type { Progress } from '../../notebooks/reactive/index.ts';
import { breather } from '../../notebooks/worker/breather.ts';
import { client } from '../../notebooks/worker/client.ts';
import type { Client } from '../../notebooks/worker/client.ts';
import { serve } from '../../notebooks/worker/serve.ts';
import { transferables } from '../../notebooks/worker/transferables.ts';
import type { Steps } from '../../notebooks/worker/index.ts';

/** What the jobs below did, seen from the worker's side. */
const log = { steps: [] as string[], kept: new Float64Array(0) };

class Refusal extends RangeError {
  override name = 'RangeError';
  readonly problems = [{ code: 'too-small', path: ['brief', 'crossing'] }];
}

const jobs = {
  *count({ name, to }: { readonly name: string; readonly to: number }): Steps<number> {
    for (let done = 1; done <= to; done += 1) {
      log.steps.push(name);
      yield { done, of: to, what: name };
    }
    return to;
  },
  *draws(size: number): Steps<{ readonly draws: Float64Array; readonly again: Float64Array }> {
    yield { done: 0, of: 1, what: 'draws' };
    log.kept = new Float64Array(size).fill(7);
    return { draws: log.kept, again: log.kept };
  },
  *refuse(what: 'error' | 'word' | 'function'): Steps<never> {
    yield { done: 0, of: 1, what };
    if (what === 'error') throw new Refusal('span: expected more than 0 m, received -3 m');
    if (what === 'word') throw 'no'; // oxlint-disable-line typescript/only-throw-error -- anything may be thrown
    throw Object.assign(new Error('has a function'), { remedy: () => 0 });
  },
  *uncloneable(what: string): Steps<() => number> {
    yield { done: 0, of: 1, what };
    return () => 0;
  },
};

/** Node hands over up to a thousand waiting messages of one channel at a time, so `breather` is tested apart. */
const turnOfTheLoop = (): Promise<void> => new Promise((resolve) => setImmediate(resolve));

let channel: MessageChannel;
let page: Client<typeof jobs>;

beforeEach(() => {
  log.steps = [];
  channel = new MessageChannel();
  let ticks = 0;
  // Every look at the clock is a whole slice later, so there is one step between two breaths.
  serve(channel.port1, jobs, { now: () => (ticks += 8), breathe: turnOfTheLoop });
  page = client<typeof jobs>(channel.port2);
  channel.port1.start();
  channel.port2.start();
});

afterEach(() => {
  channel.port1.close();
});

/** Lets messages in both directions arrive. */
async function quiet(): Promise<void> {
  for (let i = 0; i < 20; i += 1) await turnOfTheLoop();
}

describe('client and serve', () => {
  it('call(job, arg) resolves to the result, telling how far the work has come', async () => {
    const told: Progress[] = [];
    const promise = page.call('count', { name: 'a', to: 3 }, { report: (progress) => told.push(progress) });
    expectTypeOf(promise).toEqualTypeOf<Promise<number>>();
    expect(await promise).toBe(3);
    expect(told).toEqual([1, 2, 3].map((done) => ({ done, of: 3, what: 'a' })));
  });

  it('call(job, arg, {signal}) rejects at once when aborted, and the work stops', async () => {
    const controller = new AbortController();
    const reason = new Error('a newer wish');
    const promise = page.call(
      'count',
      { name: 'a', to: 1e6 },
      {
        signal: controller.signal,
        report: ({ done }) => {
          if (done === 3) controller.abort(reason);
        },
      },
    );
    await expect(promise).rejects.toBe(reason);
    await quiet();
    const steps = log.steps.length;
    expect(steps).toBeLessThan(20);
    await quiet();
    expect(log.steps).toHaveLength(steps);
  });

  it('call(job, arg, {signal}) given up in the same turn does not take a single step', async () => {
    const controller = new AbortController();
    const promise = page.call('count', { name: 'a', to: 10 }, { signal: controller.signal });
    controller.abort();
    await expect(promise).rejects.toMatchObject({ name: 'AbortError' });
    await expect(page.call('count', { name: 'b', to: 10 }, { signal: controller.signal })).rejects.toThrow();
    await quiet();
    expect(log.steps).toEqual([]);
  });

  it('call(job, arg, {turn}) rests while there is work of an earlier turn, whoever came first', async () => {
    const later = page.call('count', { name: 'later', to: 90 }, { turn: 1 });
    await quiet();
    const begun = log.steps.length;
    expect(begun).toBeGreaterThan(0);
    expect(begun).toBeLessThan(90);
    const controller = new AbortController();
    const first = page.call('count', { name: 'first', to: 5 });
    const given = page.call('count', { name: 'given up', to: 1e6 }, { signal: controller.signal });
    await first;
    await quiet();
    // What was on its way when the others came may end its slice.
    expect(log.steps.slice(begun + 1)).not.toContain('later');
    controller.abort();
    await expect(given).rejects.toThrow();
    expect(await later).toBe(90);
    expect(log.steps.filter((name) => name === 'later')).toHaveLength(90);
  });

  it('hold(true) holds all work before its next slice, hold(false) lets it go on', async () => {
    const promise = page.call('count', { name: 'a', to: 30 });
    await turnOfTheLoop();
    page.hold(true);
    await quiet();
    const { length } = log.steps;
    expect(length).toBeLessThan(30);
    await quiet();
    expect(log.steps).toHaveLength(length);
    page.hold(false);
    expect(await promise).toBe(30);
  });

  it('call(job, arg, {signal}) is given up while it is held', async () => {
    const controller = new AbortController();
    page.hold(true);
    const promise = page.call('count', { name: 'a', to: 30 }, { signal: controller.signal });
    await quiet();
    controller.abort();
    await expect(promise).rejects.toMatchObject({ name: 'AbortError' });
    page.hold(false);
    await quiet();
    expect(log.steps).toEqual([]);
  });

  it('two calls are worked on by turns', async () => {
    const both = [page.call('count', { name: 'a', to: 20 }), page.call('count', { name: 'b', to: 20 })];
    expect(await Promise.all(both)).toEqual([20, 20]);
    expect(log.steps.slice(0, 10)).toContain('a');
    expect(log.steps.slice(0, 10)).toContain('b');
  });

  it('typed arrays move instead of being copied', async () => {
    const { draws, again } = await page.call('draws', 1000);
    expect(draws).toHaveLength(1000);
    expect(draws[999]).toBe(7);
    expect(again.buffer).toBe(draws.buffer);
    expect(log.kept).toHaveLength(0);
  });

  it('an error keeps its name, its message and its own fields', async () => {
    const error: unknown = await page.call('refuse', 'error').catch((caught: unknown) => caught);
    expect(error).toBeInstanceOf(RangeError);
    expect(error).toMatchObject({
      name: 'RangeError',
      message: 'span: expected more than 0 m, received -3 m',
      problems: [{ code: 'too-small', path: ['brief', 'crossing'] }],
    });
    await expect(page.call('refuse', 'word')).rejects.toBe('no');
  });

  it('what cannot be cloned arrives as an error in words', async () => {
    await expect(page.call('refuse', 'function')).rejects.toThrow('has a function');
    await expect(page.call('uncloneable', 'a function')).rejects.toThrow('could not be cloned');
  });

  it('an unknown job is refused with the list of known ones', async () => {
    const loose = client<Record<string, (arg: null) => Steps<unknown>>>(channel.port2);
    await expect(loose.call('guess', null)).rejects.toThrow("job 'guess': expected one of count, draws");
  });

  it('close(error) rejects what is waiting and what is asked later', async () => {
    const promise = page.call('count', { name: 'a', to: 1e6 }, { signal: new AbortController().signal });
    page.close(new Error('the worker stopped'));
    await expect(promise).rejects.toThrow('the worker stopped');
    await expect(page.call('draws', 1)).rejects.toThrow('the worker stopped');
  });

  it('wrong jobs and arguments do not compile', () => {
    const wrong = (): void => {
      // @ts-expect-error -- no such job
      void page.call('guess', 1);
      // @ts-expect-error -- a number is wanted
      void page.call('draws', 'many');
    };
    expectTypeOf(wrong).toBeFunction();
  });

  it('a slow cell runs on the worker: the newest input wins and the old work stops', async () => {
    const g = graph();
    const to = g.input('to', 1e6);
    const counted = g.slow(
      'counted',
      { to },
      (values, run) => page.call('count', { name: `to ${values.to}`, to: values.to }, run),
      {
        policy: 'latest',
      },
    );
    await quiet();
    expect(g.state(counted)).toMatchObject({ state: 'pending', progress: { of: 1e6 } });
    g.set(to, 5);
    await g.settled();
    expect(g.state(counted)).toEqual({ state: 'ready', value: 5 });
    const steps = log.steps.filter((name) => name === 'to 1000000').length;
    await quiet();
    expect(log.steps.filter((name) => name === 'to 1000000')).toHaveLength(steps);
    g.dispose();
  });
});

describe('breather', () => {
  it('breathe() resolves after the turn, in the order asked', async () => {
    const breathe = breather();
    const order: string[] = [];
    const breaths = ['a', 'b'].map((name) => breathe().then(() => order.push(name)));
    await Promise.resolve();
    expect(order).toEqual([]);
    await Promise.all(breaths);
    expect(order).toEqual(['a', 'b']);
  });
});

describe('transferables', () => {
  it('transferables(value) finds each buffer once, wherever it sits in plain data', () => {
    const a = new Float64Array(2);
    const b = new Uint8Array(a.buffer, 0, 4);
    const c = new ArrayBuffer(8);
    const round: Record<string, unknown> = {
      list: [a, { b }],
      map: new Map([[1, c]]),
      set: new Set([a]),
      none: null,
    };
    round.self = round;
    expect(transferables(round)).toEqual([a.buffer, c]);
    expect(transferables(12)).toEqual([]);
  });
});
