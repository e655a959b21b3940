import { describe, expect, it } from 'vitest';
import { appraise, askedOf, fingerprint, type Appraisal, type Study } from '../../lib/index.ts';
import { workedExample } from '../../notebooks/examples.ts';
import { readAnswer, writeAnswer } from '../../notebooks/worked/answerText.ts';
import { answeredFirst } from '../../notebooks/worked/answeredFirst.ts';
import type { Appraiser } from '../../notebooks/worker/index.ts';

const study = askedOf({
  ...workedExample('low-ferry'),
  options: { ...workedExample('low-ferry').options, forms: ['composite-i'] },
});
const answer = appraise(study);

/** Workers that write down what they are asked and answer with another appraisal. */
function workers(): Appraiser & {
  readonly asked: Study[];
  readonly given: (AbortSignal | undefined)[];
} {
  const asked: Study[] = [];
  const given: (AbortSignal | undefined)[] = [];
  return {
    asked,
    given,
    appraise(one, run) {
      asked.push(one);
      given.push(run?.signal);
      return Promise.resolve({ ...answer, currency: 'worked out' });
    },
    workOut: () => Promise.resolve([]),
    hold: () => undefined,
    end: () => undefined,
  };
}

describe('readAnswer(writeAnswer(appraisal))', () => {
  it('is the appraisal, the radius of a straight among it', () => {
    expect(answer.site.planRadiusM).toBe(Infinity);
    // Text knows no negative zero, so texts are compared.
    const text = writeAnswer(answer);
    expect(readAnswer(text).site).toEqual(answer.site);
    expect(writeAnswer(readAnswer(text))).toBe(text);
  });
});

describe('answeredFirst(workers, answer)', () => {
  const currencies = async (one: Appraiser, ...studies: Study[]): Promise<string[]> => {
    const all: Appraisal[] = [];
    for (const each of studies) all.push(await one.appraise(each));
    return all.map(({ currency }) => currency);
  };
  const at = (work: () => void): void => work();
  const changed: Study = { ...study, brief: { ...study.brief, surfacingM: 0.1 } };

  it('gives the answer to the study it is of and lets the workers work it out as well', async () => {
    const behind = workers();
    expect(
      await currencies(
        answeredFirst(() => behind, Promise.resolve(answer), at),
        study,
      ),
    ).toEqual(['EUR']);
    expect(behind.asked.map(fingerprint)).toEqual([fingerprint(study)]);
  });
  it('asks the workers about any other study and about every later one', async () => {
    expect(await currencies(answeredFirst(workers, Promise.resolve(answer), at), changed, study)).toEqual([
      'worked out',
      'worked out',
    ]);
    expect(await currencies(answeredFirst(workers, Promise.resolve(answer), at), study, study)).toEqual([
      'EUR',
      'worked out',
    ]);
  });
  it('lets the workers leave off what was shown already once they are asked something else', async () => {
    const behind = workers();
    const first = answeredFirst(() => behind, Promise.resolve(answer), at);
    await first.appraise(study);
    expect(behind.given[0]?.aborted).toBe(false);
    await first.appraise(changed);
    expect(behind.given[0]?.aborted).toBe(true);
    expect(behind.given[1]).toBeUndefined();
  });
  it('asks the workers where no answer came', async () => {
    expect(await currencies(answeredFirst(workers, Promise.resolve(null)), study)).toEqual(['worked out']);
    const failed = Promise.reject(new Error('offline'));
    expect(await currencies(answeredFirst(workers, failed), study)).toEqual(['worked out']);
  });
});
