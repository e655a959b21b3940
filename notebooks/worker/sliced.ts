import type { Progress } from '../reactive/index.ts';

/** Long work cut into steps: says after each how far it has come, and ends with its result. */
export type Steps<T> = Generator<Progress, T, unknown>;

/** Finishes the work in one go; throws what it throws. */
export function run<T>(steps: Steps<T>): T {
  for (;;) {
    const step = steps.next();
    if (step.done) return step.value;
  }
}

/** How `sliced` works: the clock and the pause come from outside. */
export interface Slicing {
  /** A clock in milliseconds that never runs backwards. */
  readonly now: () => number;
  /** Longest slice in milliseconds, exceeded by one step at most; 8 unless given. */
  readonly budgetMs?: number;
  /** Resolves after others, a message with an abort among them, have had their turn. */
  readonly breathe: () => Promise<void>;
  /** When aborted, the work stops before its next slice and the promise rejects with the signal's reason. */
  readonly signal?: AbortSignal;
  /** Told after every slice but the last how far the work has come; the share done never falls. */
  readonly report?: (progress: Progress) => void;
}

/** Finishes the work in slices, breathing before each one; rejects with what the work throws. */
export async function sliced<T>(steps: Steps<T>, slicing: Slicing): Promise<T> {
  const { now, budgetMs = 8, breathe, signal, report } = slicing;
  let told: Progress = { done: 0, of: 1, what: '' };
  for (;;) {
    await breathe();
    if (signal?.aborted) {
      // Lets the work's own `finally` tidy up; its return value is of no interest.
      steps.return(undefined as T);
      throw signal.reason;
    }
    const end = now() + budgetMs;
    let step = steps.next();
    while (!step.done && now() < end) step = steps.next();
    if (step.done) return step.value;
    told = furtherOn(told, step.value);
    report?.(told);
  }
}

/** The newer words with the greater share done: work that finds more to do stands still for a while. */
function furtherOn(told: Progress, next: Progress): Progress {
  return share(next) >= share(told) ? next : { ...told, what: next.what };
}

function share({ done, of }: Progress): number {
  return of > 0 ? done / of : 0;
}
