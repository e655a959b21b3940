/** Work put off to the next frame of the screen: each job at most once a frame, in the order it was first asked for. */
export interface Frames {
  /** Asks for a job in the next frame; asking again before it has run changes nothing. */
  readonly request: (job: () => void) => void;
  /** Runs what waits now, e.g. before printing. */
  readonly flush: () => void;
}

/**
 * A queue of jobs for the next frame. A job asked for while the frame runs waits for the one after.
 * @param next calls back at the next frame; `requestAnimationFrame` on a page
 */
export function frames(next: (run: () => void) => void): Frames {
  let waiting = new Set<() => void>();
  let due = false;

  const flush = (): void => {
    due = false;
    const jobs = waiting;
    waiting = new Set();
    for (const job of jobs) job();
  };

  return {
    request(job) {
      waiting.add(job);
      if (due) return;
      due = true;
      next(() => {
        if (due) flush();
      });
    },
    flush,
  };
}
