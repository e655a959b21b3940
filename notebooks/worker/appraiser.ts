import { conclude, formsAsked, optionsOf } from '../../lib/index.ts';
import type { Appraisal, AppraisedOption, Option, Study } from '../../lib/index.ts';
import type { Progress, SlowRun } from '../reactive/index.ts';
import { client, type Client } from './client.ts';
import type { jobs } from './jobs.ts';

/** Appraises studies off the page's thread. */
export interface Appraiser {
  /** The appraisal of a study; can be aborted, tells how far it has come. Fits the run of a slow cell. */
  readonly appraise: (study: Study, run?: Partial<SlowRun>) => Promise<Appraisal>;
  /** Options of a study as they are given, worked out and priced, in their order; without those that cannot be. */
  readonly workOut: (
    study: Study,
    options: readonly Option[],
    run?: Partial<SlowRun>,
  ) => Promise<AppraisedOption[]>;
  /** Holds what the workers are doing, or lets it go on. */
  readonly hold: (isHeld: boolean) => void;
  /** Ends the workers; what they were working on rejects. */
  readonly end: () => void;
}

/** More workers than this have too little to do each. */
const MOST = 4;

/** How far one of the rounds of an appraisal has come, of several workers together. */
function progressOf(round: number, rounds: number, parts: readonly (Progress | undefined)[]): Progress {
  const share = parts.reduce((sum, part) => sum + (part && part.of > 0 ? part.done / part.of : 0), 0);
  const what = parts.findLast((part) => part !== undefined)?.what ?? '';
  return { done: Math.round((100 * (round + share / parts.length)) / rounds), of: 100, what };
}

/**
 * Appraises with several workers: together they size the rows of the cost tables, then each searches its share of the
 * forms and works out its share of the options. An option keeps its worker, which remembers its designs.
 * The result is that of `appraise`, whoever did what.
 */
export function appraiseWith(workers: readonly Client<typeof jobs>[]): Appraiser['appraise'] {
  const of = workers.length;

  return async (study, { signal, report } = {}) => {
    const forms = formsAsked(study);
    /** One round: every worker does its part; the first failure gives up the others. */
    const round = async <T>(
      number: number,
      part: (worker: Client<typeof jobs>, share: number, run: Partial<SlowRun>) => Promise<T[]>,
    ): Promise<T[]> => {
      const failed = new AbortController();
      const told: (Progress | undefined)[] = workers.map(() => undefined);
      const done = workers.map((worker, share) =>
        part(worker, share, {
          signal: signal ? AbortSignal.any([signal, failed.signal]) : failed.signal,
          report(progress) {
            told[share] = progress;
            report?.(progressOf(number, 3, told));
          },
        }),
      );
      try {
        return (await Promise.all(done)).flat();
      } catch (error) {
        failed.abort(error);
        throw error;
      }
    };

    const rows = await round(0, (worker, share, run) =>
      worker.call('lay', { study, share: { share, of } }, run),
    );
    const found = await round(1, (worker, share, run) =>
      worker.call('propose', { study, forms: forms.filter((_, i) => i % of === share), rows }, run),
    );
    found.sort((a, b) => forms.indexOf(a.form) - forms.indexOf(b.form));
    const registered = optionsOf(study, found);
    const outcomes = await round(2, (worker, share, run) =>
      worker.call(
        'workOut',
        { study, options: registered.options.filter(({ number }) => number % of === share) },
        run,
      ),
    );
    return conclude(study, found, registered, outcomes);
  };
}

/**
 * Starts the workers: one processor is left to the page and to the compiler, without which two workers are slower than one.
 * Everything asked of them rejects once one has failed to load or they have been ended.
 */
export function appraiser(): Appraiser {
  const count = Math.min(MOST, Math.max(1, navigator.hardwareConcurrency - 1));
  const started = Array.from({ length: count }, () => {
    const worker = new Worker(new URL('./appraise.worker.ts', import.meta.url), { type: 'module' });
    const line = client<typeof jobs>(worker);
    worker.addEventListener('error', (event) =>
      line.close(new Error(`the worker stopped: ${event.message}`)),
    );
    return { worker, line };
  });
  return {
    appraise: appraiseWith(started.map(({ line }) => line)),
    async workOut(study, options, run) {
      const shares = started.map(({ line }, share) =>
        line.call('workOut', { study, options: options.filter((_, i) => i % started.length === share) }, run),
      );
      const done = await Promise.all(shares);
      const outcomes = options.map((_, i) => done[i % started.length]![Math.floor(i / started.length)]!);
      return outcomes.flatMap((outcome) => ('totals' in outcome ? [outcome.option] : []));
    },
    hold(isHeld) {
      for (const { line } of started) line.hold(isHeld);
    },
    end() {
      for (const { worker, line } of started) {
        worker.terminate();
        line.close(new Error('the worker was ended'));
      }
    },
  };
}
