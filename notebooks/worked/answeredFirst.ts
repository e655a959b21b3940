import { fingerprint, type Appraisal } from '../../lib/index.ts';
import type { ExampleName } from '../examples.ts';
import type { Appraiser } from '../worker/index.ts';
import { readAnswer } from './answerText.ts';

/** The answer to a worked example that came with the pages; null where none did. */
export async function answerOf(example: ExampleName): Promise<Appraisal | null> {
  const response = await fetch(`./worked/${example}.json`);
  return response.ok ? readAnswer(await response.text()) : null;
}

/** The page is drawn before the workers begin to work out what it shows already, ms. */
const AFTER_MS = 1000;
const whenDrawn = (work: () => void): void => void setTimeout(work, AFTER_MS);

/**
 * The same appraiser, which gives the answer that came with the pages to the first study it is asked, if that is the study
 * which the answer was worked out for. The workers work it out all the same: the next study is nearly always this one with
 * one thing changed. When that is asked they leave off: they remember what they have found.
 */
export function answeredFirst(
  workers: Appraiser,
  came: Promise<Appraisal | null>,
  later: (work: () => void) => void = whenDrawn,
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
