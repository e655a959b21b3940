import { fingerprint, type Appraisal } from '../../lib/index.ts';
import type { ExampleName } from '../examples.ts';
import type { Appraiser } from '../worker/index.ts';
import { readAnswer } from './answerText.ts';

/** The answer to a worked example that came with the pages; null where none did. */
export async function answerOf(example: ExampleName): Promise<Appraisal | null> {
  const response = await fetch(`./worked/${example}.json`);
  return response.ok ? readAnswer(await response.text()) : null;
}

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
 * The same appraiser, which gives the answer that came with the pages to the first study it is asked, if that is the study
 * which the answer was worked out for. The workers work it out all the same: the next study is nearly always this one with
 * one thing changed. When that is asked they leave off: they remember what they have found.
 */
export function answeredFirst(
  workers: Appraiser,
  came: Promise<Appraisal | null>,
  later: (work: () => void) => void = atFirstSign,
): Appraiser {
  let isFirst = true;
  const other = new AbortController();
  return {
    ...workers,
    async appraise(study, run) {
      if (!isFirst) other.abort();
      const answer = isFirst ? await came.catch(() => null) : null;
      isFirst = false;
      run?.signal?.throwIfAborted();
      if (answer?.study.fingerprint !== fingerprint(study)) return workers.appraise(study, run);
      later(() => {
        const { signal } = other;
        if (!signal.aborted) void workers.appraise(study, { signal }).catch(() => undefined);
      });
      return answer;
    },
  };
}
