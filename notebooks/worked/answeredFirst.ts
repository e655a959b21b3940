import { fingerprint, type Appraisal } from '../../lib/index.ts';
import type { Appraiser } from '../worker/index.ts';

/** Signs that somebody is about to change something. */
const SIGNS = ['pointermove', 'pointerdown', 'keydown', 'wheel', 'focusin'] as const;

/** Does some work once at the first sign of a hand: a page that is only looked at, or lies open unseen, works nothing out. */
function atFirstSign(work: () => void): void {
  const once = (): void => {
    for (const sign of SIGNS) removeEventListener(sign, once);
    work();
  };
  for (const sign of SIGNS) addEventListener(sign, once, { passive: true });
}

/**
 * An appraiser that gives the answer which came with the pages to the first study it is asked, if that is the study which
 * the answer was worked out for; its workers begin when they are needed, so that the page has the processors to itself
 * while it opens. They work out that study all the same: the next one is nearly always this one with one thing changed.
 * When that is asked they leave off: they remember what they have found.
 */
export function answeredFirst(
  begin: () => Appraiser,
  came: Promise<Appraisal | null>,
  later: (work: () => void) => void = atFirstSign,
): Appraiser {
  let isFirst = true;
  let isHeld = false;
  let begun: Appraiser | undefined;
  const other = new AbortController();
  const workers = (): Appraiser => {
    if (begun === undefined) {
      begun = begin();
      begun.hold(isHeld);
    }
    return begun;
  };
  return {
    async appraise(study, run) {
      if (!isFirst) other.abort();
      const answer = isFirst ? await came.catch(() => null) : null;
      isFirst = false;
      run?.signal?.throwIfAborted();
      if (answer?.study.fingerprint !== fingerprint(study)) return workers().appraise(study, run);
      later(() => {
        const { signal } = other;
        if (!signal.aborted)
          void workers()
            .appraise(study, { signal })
            .catch(() => undefined);
      });
      return answer;
    },
    workOut: (study, options, run) => workers().workOut(study, options, run),
    hold(held) {
      isHeld = held;
      begun?.hold(held);
    },
    end: () => begun?.end(),
  };
}
