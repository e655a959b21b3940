import { stand } from '../decide/index.ts';
import { formsAsked } from './formsAsked.ts';
import type { Appraisal, Study } from '../model/index.ts';
import { survey } from '../site/index.ts';
import { fingerprint } from '../study/index.ts';
import type { FormProposals, Outcome } from './parts.ts';
import { numberOptions, type Registered } from './register.ts';

/** The options of a study with their numbers: those kept by hand, and what was proposed for each form in order. */
export const optionsOf = (study: Study, found: readonly FormProposals[]): Registered =>
  numberOptions(
    found.flatMap(({ arrangements }) => arrangements),
    study.options,
    survey(study.brief),
  );

/**
 * Puts the parts of an appraisal together: every option by cost, everything dropped with its reasons, and where the
 * options stand. Forms asked for that nothing was found of yet are still to come.
 */
export function conclude(
  study: Study,
  found: readonly FormProposals[],
  { register, retired, unworkable }: Registered,
  outcomes: readonly Outcome[],
): Appraisal {
  const toCome = formsAsked(study).filter((asked) => found.every(({ form }) => form !== asked));
  /** Numbers of forms still to come may be proposed again. */
  const isOpen = (number: number): boolean =>
    register.some((entry) => entry.number === number && toCome.includes(entry.form));
  const priced = outcomes.filter((outcome) => 'totals' in outcome);
  const contenders = priced.map(({ option: { number, status, cost }, totals }) => ({
    number,
    status,
    p50: cost.p50,
    totals,
  }));
  return {
    study: { title: study.title, version: study.version, fingerprint: fingerprint(study) },
    site: survey(study.brief),
    options: priced
      .map(({ option }) => option)
      .sort((a, b) => a.cost.p50 - b.cost.p50 || a.number - b.number),
    currency: study.books.currency,
    dropped: [
      ...found.flatMap(({ form, arrangements, because }) =>
        arrangements.length === 0 ? [{ form, because }] : [],
      ),
      ...unworkable,
      ...outcomes.filter((outcome) => 'because' in outcome),
    ],
    droppedCounts: found.flatMap(({ counts }) => counts),
    register,
    retired: retired.filter((number) => !isOpen(number)),
    forms: found.map(({ form }) => form),
    toCome,
    standing: stand(contenders, study.books, study.brief.budget),
  };
}
