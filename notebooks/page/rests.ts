import type { TimeLeft } from './whenIdle.ts';

/** Drawings off the screen, which rest until the page has nothing better to do. */
export interface Rests {
  /** Lets a job rest until then; asking again before it has run changes nothing. Its place is that on the page, rising. */
  readonly put: (job: () => void, place: number) => void;
  /** It need not be run any more. */
  readonly drop: (job: () => void) => void;
  /** What is at this place is being looked at: what is next to it comes first. */
  readonly look: (place: number) => void;
}

/** What is needed from outside: times and the state of the page. */
export interface RestsPlace {
  /** Whether nothing is dragged and nothing that many wait for is being worked out. */
  readonly isFree: () => boolean;
  /** Runs a job in the next idle moment; `whenIdle` on a page. */
  readonly whenIdle: (job: (timeLeft: TimeLeft) => void) => void;
  /** Runs a job after so many ms; `setTimeout` on a page. */
  readonly later: (job: () => void, ms: number) => void;
}

/** One more job is begun in an idle moment while this much of it is left, ms. */
const ENOUGH_MS = 6;

/** While the page is not free it is asked again after so long, ms. */
const ASK_AGAIN_MS = 60;

/** Jobs for idle moments, those next to the eye first. One that fails does not keep the others. */
export function rests({ isFree, whenIdle, later }: RestsPlace): Rests {
  const jobs = new Map<() => void, number>();
  let eye = 0;
  let isDue = false;

  const ask = (): void => {
    if (isDue || jobs.size === 0) return;
    isDue = true;
    if (isFree()) whenIdle(run);
    else later(again, ASK_AGAIN_MS);
  };
  const again = (): void => {
    isDue = false;
    ask();
  };
  const nearest = (): (() => void) | undefined => {
    const away = (job: readonly [unknown, place: number]): number => Math.abs(job[1] - eye);
    let found: readonly [() => void, number] | undefined;
    for (const job of jobs) if (found === undefined || away(job) < away(found)) found = job;
    return found?.[0];
  };
  const run = (timeLeft: TimeLeft): void => {
    try {
      while (isFree()) {
        const job = nearest();
        if (job === undefined) break;
        jobs.delete(job);
        job();
        if (timeLeft() < ENOUGH_MS) break;
      }
    } finally {
      again();
    }
  };

  return {
    put(job, place) {
      jobs.set(job, place);
      ask();
    },
    drop: (job) => void jobs.delete(job),
    look: (place) => void (eye = place),
  };
}
