import { conclude, formsAsked, formsInParts, optionsOf } from '../../lib/index.ts';
import type {
  Appraisal,
  AppraisedOption,
  FormId,
  FormProposals,
  Option,
  Outcome,
  Study,
} from '../../lib/index.ts';
import type { Progress, SlowRun } from '../reactive/index.ts';
import type { Call, Client } from './client.ts';
import type { jobs } from './jobs.ts';
import { startWorkers } from './startWorkers.ts';

/** Appraises studies off the page's thread. */
export interface Appraiser {
  /**
   * The appraisal of a study; can be aborted, tells how far it has come, and hands on what there is of it so far where
   * somebody takes that. Fits the run of a slow cell.
   */
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

/** Rounds of work that a part of the forms takes: rows of the cost tables, arrangements, options. */
const ROUNDS = 3;

/** Adds up how far the shares of the work have come, each told under a name of its own and with its weight in the whole. */
function progressOf(report: SlowRun['report'] | undefined) {
  const told = new Map<string, number>();
  let said = '';
  return (name: string, weight: number, { done, of, what }: Progress): void => {
    told.set(name, of > 0 ? (weight * done) / of : 0);
    said = what === '' ? said : what;
    const sum = [...told.values()].reduce((all, share) => all + share, 0);
    report?.({ done: Math.round(100 * sum), of: 100, what: said });
  };
}

/**
 * Appraises with several workers: together they size the rows of the cost tables, then each searches its share of the
 * forms and works out its share of the options. An option keeps its worker, which remembers its designs.
 *
 * To whoever takes parts the forms come in parts. All are asked of the workers at once, in turns: what waits for others of
 * its part goes on with the next one meanwhile, so that the whole comes as soon as at one go.
 * The result is that of `appraise`, whoever did what.
 */
export function appraiseWith(workers: readonly Client<typeof jobs>[]): Appraiser['appraise'] {
  const of = workers.length;

  return async (study, { signal, report, handOn } = {}) => {
    const asked = formsAsked(study);
    const parts = handOn ? formsInParts(study) : [asked];
    const failed = new AbortController();
    const tell = progressOf(report);
    /** One round of a part: every worker does its share. */
    const round = async <T>(
      turn: number,
      number: number,
      ask: (worker: Client<typeof jobs>, share: number, call: Call) => Promise<T[]>,
    ): Promise<T[]> => {
      const weight = parts[turn]!.length / (asked.length * ROUNDS * of);
      const done = workers.map(async (worker, share) => {
        const name = [turn, number, share].join();
        const answer = await ask(worker, share, {
          turn,
          signal: signal ? AbortSignal.any([signal, failed.signal]) : failed.signal,
          report: (progress) => tell(name, weight, progress),
        });
        tell(name, weight, { done: 1, of: 1, what: '' });
        return answer;
      });
      return (await Promise.all(done)).flat();
    };
    const search = async (forms: readonly FormId[], turn: number): Promise<FormProposals[]> => {
      const rows = await round(turn, 0, (worker, share, call) =>
        worker.call('lay', { study, forms, share: { share, of } }, call),
      );
      const found = await round(turn, 1, (worker, share, call) =>
        worker.call('propose', { study, forms: forms.filter((_, i) => i % of === share), rows }, call),
      );
      return found.sort((a, b) => forms.indexOf(a.form) - forms.indexOf(b.form));
    };

    const searches = parts.map(search);
    // What fails is told where it is waited for.
    for (const one of searches) one.catch(() => undefined);
    const found: FormProposals[] = [];
    const outcomes: Outcome[] = [];
    const given = new Set<number>();
    try {
      for (const [turn, searching] of searches.entries()) {
        found.push(...(await searching));
        const registered = optionsOf(study, found);
        const options = registered.options.filter(({ number }) => !given.has(number));
        for (const { number } of options) given.add(number);
        outcomes.push(
          ...(await round(turn, 2, (worker, share, call) =>
            worker.call(
              'workOut',
              { study, options: options.filter(({ number }) => number % of === share) },
              call,
            ),
          )),
        );
        if (turn === parts.length - 1) return conclude(study, found, registered, outcomes);
        signal?.throwIfAborted();
        const part = conclude(study, found, registered, outcomes);
        if (part.options.length > 0) handOn?.(part);
      }
      throw new Error('appraisal: expected forms in at least one part, received none');
    } catch (error) {
      failed.abort(error);
      throw error;
    }
  };
}

/**
 * Starts the workers. Everything asked of them rejects once one has failed to load or they have been ended.
 */
export function appraiser(): Appraiser {
  const started = startWorkers();
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
      for (const one of started) one.end();
    },
  };
}
