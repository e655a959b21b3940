import { appraiseOption, type PricedAppraisal } from './appraise/appraiseOption.ts';
import { drawn } from './appraise/drawn.ts';
import { formFacts } from './appraise/facts.ts';
import type { Memory } from './appraise/memory.ts';
import { proposalsFor } from './appraise/proposals.ts';
import { numberOptions } from './appraise/register.ts';
import { finish, saying } from './appraise/work.ts';
import { workbench } from './appraise/workbench.ts';
import { stand } from './decide/index.ts';
import { formModule, sizeableForms } from './forms/index.ts';
import type { Appraisal, Arrangement, Dropped, DroppedCount, Study } from './model/index.ts';
import { rulingsFor, statusOf } from './rules/index.ts';
import { fingerprint } from './study/index.ts';

/** How far an appraisal has come: `done` of `of` steps, and what is being worked out. */
export interface Step {
  readonly done: number;
  readonly of: number;
  readonly what: string;
}

/**
 * Works out a whole study, from brief to standing, in steps that a worker may pause or drop between.
 *
 * Forms that a rule puts out are not searched unless the study asks for them. Everything proposed, kept or dropped is
 * in the result with its reasons. Pure: the same study gives the same appraisal; `kept` only saves time.
 *
 * @throws RangeError where rates, draws or a form cannot serve what the study asks
 */
export function* appraiseSteps(study: Study, kept?: Memory): Generator<Step, Appraisal, unknown> {
  const bench = workbench(study, kept);
  const { site } = bench;
  const asked = study.options.forms.length > 0 ? study.options.forms : sizeableForms;
  const proposals: Arrangement[] = [];
  const dropped: Dropped[] = [];
  const droppedCounts: DroppedCount[] = [];

  let done = 0;
  for (const form of asked) {
    const step = { done, of: 2 * asked.length + 1, what: `arranging ${formModule(form).name}` };
    yield step;
    done += 1;
    const rulings = rulingsFor('form', form, formFacts(site));
    if (statusOf(rulings) === 'out' && !study.options.workOutAnyway.includes(form)) {
      const out = rulings.filter((ruling) => ruling.effect === 'out');
      dropped.push({ form, because: out.flatMap((ruling) => ruling.because) });
      continue;
    }
    const found = yield* saying(step, proposalsFor(bench, form));
    proposals.push(...found.arrangements);
    droppedCounts.push(...found.counts);
    if (found.arrangements.length === 0) dropped.push({ form, because: found.because });
  }

  const { options, register, retired } = numberOptions(proposals, study.options);
  const forms = [...new Set(options.flatMap((option) => option.units.map((unit) => unit.form)))];
  const onDraws = drawn(bench, forms);
  const priced: PricedAppraisal[] = [];
  for (const option of options) {
    const step = {
      done,
      of: done + options.length - priced.length + 1,
      what: `working out option ${option.number}`,
    };
    yield step;
    done += 1;
    priced.push(yield* saying(step, appraiseOption(bench, onDraws, option)));
  }

  yield { done, of: done + 1, what: 'ranking' };
  const contenders = priced.map(({ option, totals }) => ({
    number: option.number,
    status: option.status,
    p50: option.cost.p50,
    totals,
  }));
  return {
    study: { title: study.title, version: study.version, fingerprint: fingerprint(study) },
    site,
    options: priced
      .map(({ option }) => option)
      .sort((a, b) => a.cost.p50 - b.cost.p50 || a.number - b.number),
    currency: study.books.currency,
    dropped,
    droppedCounts,
    register,
    retired,
    standing: stand(contenders, study.books, study.brief.budget),
  };
}

/** A whole study at one go; see `appraiseSteps`. */
export function appraise(study: Study, kept?: Memory): Appraisal {
  return finish(appraiseSteps(study, kept));
}
