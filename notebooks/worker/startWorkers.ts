import { client, type Client } from './client.ts';
import type { jobs } from './jobs.ts';

/** A worker that has been started. */
export interface Started {
  readonly line: Client<typeof jobs>;
  /** Ends it; what it was working on rejects. */
  readonly end: () => void;
}

/** More workers than this have too little to do each. */
const MOST = 4;

/**
 * Starts as many workers as there is room for: one processor is left to the page and to the compiler, without which two
 * workers are slower than one.
 */
export function startWorkers(): readonly Started[] {
  const count = Math.min(MOST, Math.max(1, navigator.hardwareConcurrency - 1));
  return Array.from({ length: count }, () => {
    const worker = new Worker(new URL('./appraise.worker.ts', import.meta.url), { type: 'module' });
    const line = client<typeof jobs>(worker);
    worker.addEventListener('error', (event) =>
      line.close(new Error(`the worker stopped: ${event.message}`)),
    );
    return {
      line,
      end() {
        worker.terminate();
        line.close(new Error('the worker was ended'));
      },
    };
  });
}
