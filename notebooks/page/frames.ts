/** Work put off to the next frame of the screen: each job at most once a frame, in the order it was first asked for. */
export interface Frames {
  /** Asks for a job in the next frame; asking again before it has run changes nothing. */
  readonly request: (job: () => void) => void;
  /** Runs what waits now, e.g. before printing. */
  readonly flush: () => void;
}

/**
 * A queue of jobs for the next frame. A job asked for while the frame runs waits for the one after.
 * @param next calls back at the next frame; `drawing` of `screenFrames` on a page
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

/** Turns of one frame: what the hand does is taken up first, then everything is drawn that it has changed. */
export interface Turns {
  /** Calls back at the next frame, before anything is drawn. */
  readonly hand: (run: () => void) => void;
  /** Calls back when the next frame is drawn: from a turn of the hand still the same one. */
  readonly drawing: (run: () => void) => void;
}

/**
 * The two turns of each frame.
 * @param next calls back at the next frame; `requestAnimationFrame` on a page
 */
export function turns(next: (run: () => void) => void): Turns {
  const hands: (() => void)[] = [];
  const drawings: (() => void)[] = [];
  let due = false;
  const ask = (): void => {
    if (due) return;
    due = true;
    next(() => {
      for (const run of hands.splice(0)) run();
      due = false;
      for (const run of drawings.splice(0)) run();
    });
  };
  return {
    hand(run) {
      hands.push(run);
      ask();
    },
    drawing(run) {
      drawings.push(run);
      ask();
    },
  };
}

/** The frames of the screen this page is on. */
export const screenFrames = turns((run) => requestAnimationFrame(run));
