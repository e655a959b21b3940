import { client } from '../../../notebooks/worker/client.ts';
import type { jobs } from './count.worker.ts';

const worker = new Worker(new URL('./count.worker.ts', import.meta.url), { type: 'module' });
const { call } = client<typeof jobs>(worker);

/** What the test asks of the page; times in milliseconds. */
export const ask = {
  /** Progress told and result of 40 steps of 1 ms. */
  async whole() {
    const told: number[] = [];
    const result = await call('busy', { steps: 40, stepMs: 1 }, { report: ({ done }) => told.push(done) });
    return { told, length: result.length };
  },

  /** How long other work waits behind a long piece that has just been given up, and whether that goes on. */
  async afterAbort() {
    const controller = new AbortController();
    let words = 0;
    const long = call(
      'busy',
      { steps: 20_000, stepMs: 1 },
      { signal: controller.signal, report: () => (words += 1) },
    ).catch((error: unknown) => (error as Error).name);
    while (words < 3) await call('tally', '');
    const abortedAt = performance.now();
    controller.abort();
    const before = await call('tally', '');
    const waitedMs = performance.now() - abortedAt;
    await call('busy', { steps: 40, stepMs: 1 });
    return { reason: await long, waitedMs, before, stepsAfter: (await call('tally', '')) - before };
  },
};

Object.assign(window, { ask });
