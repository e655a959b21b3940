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
  /**
   * Calls back when the next frame is drawn: from a turn of the hand still the same one, unless something follows the hand
   * and both would take too long.
   */
  readonly drawing: (run: () => void) => void;
  /** Calls back at the end of the next frame, whether anything was drawn in it or not: what follows the hand. */
  readonly ending: (run: () => void) => void;
}

/** A frame in which hand and drawing take longer than this together is parted in two, ms: with what the browser does besides, 30 a second. */
const LONGEST_MS = 28;

/** A hand that takes less than this is not worth a frame of its own, ms. */
const LEAST_HAND_MS = 8;

/** What the turns need to know of the screen. */
export interface Screen {
  /** Calls back at the next frame; `requestAnimationFrame` on a page. */
  readonly next: (run: () => void) => void;
  /** Calls back once this frame has been laid out and painted. */
  readonly shown: (run: () => void) => void;
  /** The time, ms. */
  readonly now: () => number;
}

/**
 * The turns of each frame. Where what the hand asks for and the drawing of it take longer than a frame should, each gets
 * a frame: what is in hand can follow the pointer at the end of both.
 */
export function turns({ next, shown, now }: Screen): Turns {
  const hands: (() => void)[] = [];
  const drawings: (() => void)[] = [];
  const endings: (() => void)[] = [];
  let due = false;
  /** The last turn of the hand took so long that the drawings have the next frame for themselves. */
  let owed = false;
  /** What the last drawings took until they were painted, ms. */
  let drawnInMs = 0;
  const run = (jobs: (() => void)[]): void => {
    for (const job of jobs.splice(0)) job();
  };
  const ask = (): void => {
    if (due) return;
    due = true;
    next(frame);
  };
  const frame = (): void => {
    if (owed) owed = false;
    else {
      const began = now();
      run(hands);
      const tookMs = now() - began;
      const isLong = tookMs > LEAST_HAND_MS && tookMs + drawnInMs > LONGEST_MS;
      owed = isLong && drawings.length > 0 && endings.length > 0;
    }
    due = false;
    if (!owed && drawings.length > 0) {
      const began = now();
      run(drawings);
      shown(() => (drawnInMs = now() - began));
    }
    run(endings);
    if (hands.length + drawings.length > 0) ask();
  };
  const asking =
    (jobs: (() => void)[]) =>
    (job: () => void): void => {
      jobs.push(job);
      ask();
    };
  return { hand: asking(hands), drawing: asking(drawings), ending: asking(endings) };
}

/** Calls back in a task of its own, after what the browser does in the present one: a frame ends with its painting. */
function afterThis(run: () => void): void {
  const { port1, port2 } = new MessageChannel();
  port1.onmessage = () => {
    port1.close();
    run();
  };
  port2.postMessage(null);
}

/** The frames of the screen this page is on. */
export const screenFrames = turns({
  next: (run) => requestAnimationFrame(run),
  shown: afterThis,
  now: () => performance.now(),
});
