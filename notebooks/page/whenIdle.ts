/** Told to a job run in an idle moment: how long it lasts, ms. */
export type TimeLeft = () => number;

/** Where a browser does not tell when it is idle: an idle moment is taken to come after `wait` and to last for `lasts`, ms. */
const GUESS = { wait: 50, lasts: 8 } as const;

/**
 * A browser may call no moment idle for as long as it takes the page for one that a finger is about to move: a job that has
 * waited so long, ms, is run all the same, with nothing left of its moment.
 */
const LATEST_MS = 250;

/** Runs a job once the page has nothing else to do, or has waited long for that, and tells it how much of that moment is left. */
export function whenIdle(job: (timeLeft: TimeLeft) => void): void {
  if ('requestIdleCallback' in window) {
    window.requestIdleCallback((moment) => job(() => moment.timeRemaining()), { timeout: LATEST_MS });
    return;
  }
  setTimeout(() => {
    const end = performance.now() + GUESS.lasts;
    job(() => end - performance.now());
  }, GUESS.wait);
}

/** Resolves once the page has nothing else to do; never after `signal` has been aborted. */
export const idle = (signal: AbortSignal): Promise<void> =>
  new Promise((resolve) => whenIdle(() => signal.aborted || resolve()));
