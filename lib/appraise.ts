import { conclude, optionsOf } from './appraise/conclude.ts';
import { memory, type Memory } from './appraise/memory.ts';
import { formsAsked } from './appraise/formsAsked.ts';
import { proposeSteps, workOutSteps, type Step, type Steps } from './appraise/parts.ts';
import { finish } from './appraise/work.ts';
import type { Appraisal, Study } from './model/index.ts';

/** The steps of one of two equal halves of the work. */
function* half<T>(which: 0 | 1, steps: Steps<T>): Steps<T> {
  for (;;) {
    const next = steps.next();
    if (next.done) return next.value;
    const { done, of, what }: Step = next.value;
    yield { done: which * of + done, of: 2 * of, what };
  }
}

/**
 * Works out a whole study, from brief to standing, in steps that a worker may pause or drop between.
 *
 * Forms that a rule puts out are not searched unless the study asks for them. Everything proposed, kept or dropped is
 * in the result with its reasons. Pure: the same study gives the same appraisal; `kept` only saves time.
 *
 * @throws RangeError where rates, draws or a form cannot serve what the study asks
 */
export function* appraiseSteps(study: Study, kept: Memory = memory()): Steps<Appraisal> {
  const found = yield* half(0, proposeSteps(study, formsAsked(study), kept));
  const registered = optionsOf(study, found);
  const outcomes = yield* half(1, workOutSteps(study, registered.options, kept));
  return conclude(study, found, registered, outcomes);
}

/** A whole study at one go; see `appraiseSteps`. */
export function appraise(study: Study, kept?: Memory): Appraisal {
  return finish(appraiseSteps(study, kept));
}
