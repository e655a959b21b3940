import type { Steps } from '../../../notebooks/worker/index.ts';
import { breather } from '../../../notebooks/worker/breather.ts';
import { serve } from '../../../notebooks/worker/serve.ts';

let stepsDone = 0;

/** Work whose steps each keep the worker busy for a while. */
export const jobs = {
  *busy({ steps, stepMs }: { readonly steps: number; readonly stepMs: number }): Steps<Float64Array> {
    for (let done = 1; done <= steps; done += 1) {
      const end = performance.now() + stepMs;
      while (performance.now() < end);
      stepsDone += 1;
      yield { done, of: steps, what: `step ${done}` };
    }
    return new Float64Array(steps);
  },
  /** How many steps of `busy` this worker has done so far. */
  *tally(what: string): Steps<number> {
    yield { done: 0, of: 1, what };
    return stepsDone;
  },
};

serve(self, jobs, { now: () => performance.now(), breathe: breather() });
