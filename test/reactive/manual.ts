import type { SlowRun } from '../../notebooks/reactive/index.ts';

/** One started run of a slow cell under the hand of a test. */
interface ManualRun<V, T> {
  readonly values: V;
  readonly run: SlowRun;
  readonly finish: (value: T) => Promise<void>;
  readonly fail: (error: Error) => Promise<void>;
}

/** A run function that answers only when the test says so, and the list of its runs so far. */
export function manual<V, T>() {
  const runs: ManualRun<V, T>[] = [];
  const start = (values: V, run: SlowRun): Promise<T> =>
    new Promise((resolve, reject) => {
      runs.push({
        values,
        run,
        finish: (value) => {
          resolve(value);
          return turn();
        },
        fail: (error) => {
          reject(error);
          return turn();
        },
      });
    });
  return { runs, start };
}

/** Lets everything already promised happen. */
export async function turn(): Promise<void> {
  for (let i = 0; i < 10; i += 1) await Promise.resolve();
}
