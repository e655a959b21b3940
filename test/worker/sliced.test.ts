import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { run, sliced } from '../../notebooks/worker/index.ts';
import type { Steps } from '../../notebooks/worker/index.ts';
import type { Progress } from '../../notebooks/reactive/index.ts';

/** Work of one step per duration, on a clock that only the work moves; notes what happened to it. */
function work(durationsMs: readonly number[]) {
  const log = { timeMs: 0, stepsDone: 0, tidied: false };
  function* steps(): Steps<number> {
    try {
      for (const [i, ms] of durationsMs.entries()) {
        log.timeMs += ms;
        log.stepsDone += 1;
        yield { done: i + 1, of: durationsMs.length, what: `step ${i + 1}` };
      }
      return log.stepsDone * 10;
    } finally {
      log.tidied = true;
    }
  }
  return { log, steps, now: () => log.timeMs };
}

const breathe = (): Promise<void> => Promise.resolve();

describe('run', () => {
  it('run(steps) finishes in one go with the result', () => {
    const { steps, log } = work([1, 2, 3]);
    expect(run(steps())).toBe(30);
    expect(log).toEqual({ timeMs: 6, stepsDone: 3, tidied: true });
  });

  it('run(steps) throws what the work throws', () => {
    const wrong = new RangeError('no crossing');

    function* steps(): Steps<number> {
      throw wrong;
    }
    expect(() => run(steps())).toThrow(wrong);
  });
});

describe('sliced', () => {
  it('sliced(steps) comes to the same result as run(steps), for any durations', async () => {
    await fc.assert(
      fc.asyncProperty(fc.array(fc.integer({ min: 0, max: 20 })), async (durations) => {
        const { steps, now } = work(durations);
        expect(await sliced(steps(), { now, breathe })).toBe(run(work(durations).steps()));
      }),
      { seed: 1, numRuns: 100 },
    );
  });

  it('sliced(steps, {budgetMs}) exceeds no slice by more than its last step', async () => {
    await fc.assert(
      fc.asyncProperty(
        fc.array(fc.integer({ min: 0, max: 20 }), { minLength: 1 }),
        fc.integer({ min: 1, max: 12 }),
        async (durations, budgetMs) => {
          const { steps, now } = work(durations);
          const breaths: number[] = [];
          const count = (): Promise<void> => {
            breaths.push(now());
            return breathe();
          };
          await sliced(steps(), { now, budgetMs, breathe: count });
          const slices = [...breaths.slice(1), now()].map((end, i) => end - breaths[i]!);
          expect(Math.max(...slices)).toBeLessThan(budgetMs + Math.max(...durations, 1));
          for (const slice of slices.slice(0, -1)) expect(slice).toBeGreaterThanOrEqual(budgetMs);
        },
      ),
      { seed: 2, numRuns: 100 },
    );
  });

  it('sliced(steps) breathes about every 8 ms unless told otherwise', async () => {
    const { steps, now } = work(Array<number>(16).fill(2));
    const told: Progress[] = [];
    await sliced(steps(), { now, breathe, report: (progress) => told.push(progress) });
    expect(told.map((progress) => progress.done)).toEqual([4, 8, 12, 16]);
    expect(told[0]).toEqual({ done: 4, of: 16, what: 'step 4' });
  });

  it('sliced(steps, {signal}) does no step after an abort, tidies up and rejects with the reason', async () => {
    const { steps, now, log } = work(Array<number>(100).fill(2));
    const controller = new AbortController();
    const reason = new Error('a newer wish');
    const promise = sliced(steps(), {
      now,
      breathe,
      signal: controller.signal,
      report: ({ done }) => {
        if (done === 8) controller.abort(reason);
      },
    });
    await expect(promise).rejects.toBe(reason);
    expect(log).toEqual({ timeMs: 16, stepsDone: 8, tidied: true });
  });

  it('sliced(steps, {signal}) does nothing when aborted before its first slice', async () => {
    const { steps, now, log } = work([1]);
    await expect(sliced(steps(), { now, breathe, signal: AbortSignal.abort('late') })).rejects.toBe('late');
    expect(log.stepsDone).toBe(0);
  });

  it('sliced(steps, {report}) never lets the share done fall, and passes new words on', async () => {
    const said: Progress[] = [
      { done: 1, of: 4, what: 'spans' },
      { done: 2, of: 4, what: 'depths' },
      { done: 2, of: 10, what: 'more forms found' },
      { done: 4, of: 10, what: 'sizing' },
      { done: 6, of: 10, what: 'prices' },
      { done: 0, of: 0, what: 'nothing' },
    ];
    function* steps(): Steps<string> {
      yield* said;
      return 'done';
    }
    const told: Progress[] = [];
    let timeMs = 0;
    const now = (): number => (timeMs += 10);
    await sliced(steps(), { now, breathe, report: (progress) => told.push(progress) });
    expect(told).toEqual([
      { done: 1, of: 4, what: 'spans' },
      { done: 2, of: 4, what: 'depths' },
      { done: 2, of: 4, what: 'more forms found' },
      { done: 2, of: 4, what: 'sizing' },
      { done: 6, of: 10, what: 'prices' },
      { done: 6, of: 10, what: 'nothing' },
    ]);
  });

  it('sliced(steps) rejects with what the work throws', async () => {
    const wrong = new RangeError('no crossing');
    function* steps(): Steps<number> {
      yield { done: 0, of: 1, what: 'site' };
      throw wrong;
    }
    await expect(sliced(steps(), { now: () => 0, breathe })).rejects.toBe(wrong);
  });
});
