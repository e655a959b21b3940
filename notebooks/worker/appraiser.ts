import type { SlowRun } from '../reactive/index.ts';
import { client } from './client.ts';
import type { jobs } from './jobs.ts';
import type { ArgOf, ResultOf } from './messages.ts';

type Jobs = typeof jobs;

/** Appraises studies off the page's thread. */
export interface Appraiser {
  /** The appraisal of a study; can be aborted, tells how far it has come. Fits the run of a slow cell. */
  readonly appraise: (
    study: ArgOf<Jobs['appraise']>,
    run?: Partial<SlowRun>,
  ) => Promise<ResultOf<Jobs['appraise']>>;
  /** Ends the worker; what it was working on rejects. */
  readonly end: () => void;
}

/** Starts the worker. Everything asked of it rejects once it has failed to load or has been ended. */
export function appraiser(): Appraiser {
  const worker = new Worker(new URL('./appraise.worker.ts', import.meta.url), { type: 'module' });
  const { call, close } = client<Jobs>(worker);
  worker.addEventListener('error', (event) => close(new Error(`the worker stopped: ${event.message}`)));
  return {
    appraise: (study, run) => call('appraise', study, run),
    end: () => {
      worker.terminate();
      close(new Error('the worker was ended'));
    },
  };
}
