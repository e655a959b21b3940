import type { Equal, Policy, SlowRun } from './cell.ts';
import { asPart, isLived } from './life.ts';
import type { Life } from './life.ts';
import { failure, outcomeOf } from './outcome.ts';
import type { Outcome } from './outcome.ts';
import type { Above, Node } from './node.ts';
import { blankNode, carriedLife, failureAbove, isMadeFrom, lookUp, putMark, valuesAbove } from './node.ts';

/** The one run under way: what it was made from, and the ages its result will answer to as far as is known. */
interface Job {
  readonly used: readonly Outcome<unknown>[];
  readonly controller: AbortController;
  life: Life;
}

export type AnySlowRun<T> = (values: Record<string, unknown>, run: SlowRun) => T | PromiseLike<T>;

/**
 * A cell worked out elsewhere, one run at a time. `resume` is the graph's way back in: it runs what it is given and
 * then makes a pass. Whether the cell is pending follows from the life of its value, never from a flag.
 */
export function slowNode<T>(
  name: string,
  uses: Readonly<Record<string, Node<unknown>>>,
  run: AnySlowRun<T>,
  { policy, equal }: { readonly policy: Policy; readonly equal: Equal<T> },
  resume: (publish: () => void) => void,
): Node<T> {
  const keys = Object.keys(uses);
  const node = blankNode(name, 'slow', Object.values(uses), equal);
  let used: readonly Outcome<unknown>[] | undefined;
  /** Whether the value is what a run has handed on before its end. */
  let isPart = false;
  let job: Job | undefined;

  const advance = (): void => {
    const above = lookUp(node.uses);
    const { outcome, life } = node.mark.peek();
    const carried = carriedLife(life, used, above);
    putMark(node, outcome, isPart ? asPart(carried) : carried);
    if (job) job.life = carriedLife(job.life, job.used, above);
    const isMade = !isPart && isMadeFrom(used, above);
    if (!isLived(above.life) || isMade || isMadeFrom(job?.used, above)) return;
    const failed = failureAbove(above);
    if (failed) {
      abort();
      used = above.outcomes;
      isPart = false;
      putMark(node, failure(outcome, failed.error, failed.raisedBy), above.life);
    } else if (!job || policy === 'latest') {
      abort();
      start(above);
    }
  };

  const start = (above: Above): void => {
    const mine: Job = { used: above.outcomes, controller: new AbortController(), life: above.life };
    job = mine;
    const put = (produce: () => T, life: Life): void => {
      used = mine.used;
      putMark(node, outcomeOf(name, node.mark.peek().outcome, produce, equal), life);
    };
    const finish = (produce: () => T): void => {
      if (job !== mine) return;
      resume(() => {
        endJob();
        isPart = false;
        put(produce, mine.life);
      });
    };
    const handed: SlowRun = {
      signal: mine.controller.signal,
      report: (progress) => {
        if (job === mine) node.progress.value = progress;
      },
      handOn(part) {
        // In a turn of its own: a run may hand something on while it is being started, inside a pass.
        queueMicrotask(() => {
          if (job !== mine) return;
          resume(() => {
            isPart = true;
            put(() => part as T, asPart(mine.life));
          });
        });
      },
    };
    new Promise<T>((resolve) => resolve(run(valuesAbove(keys, above), handed))).then(
      (value) => finish(() => value),
      (error: unknown) =>
        finish(() => {
          throw error;
        }),
    );
  };

  const endJob = (): void => {
    job = undefined;
    node.progress.value = undefined;
  };

  const abort = (): void => {
    const ending = job;
    endJob();
    ending?.controller.abort();
  };

  return { ...node, advance, abort, isBusy: () => job !== undefined };
}
