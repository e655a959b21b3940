import { formReach, laySteps, memory, proposeSteps, workOutSteps } from '../../lib/index.ts';
import type {
  FormId,
  FormReach,
  LaidRow,
  NoReach,
  Option,
  Outcome,
  PlainDeck,
  Share,
  Study,
  Steps,
} from '../../lib/index.ts';

/** Kept as long as the worker lives: the next study is nearly always the last one with one thing changed. */
const kept = memory();

/** The part of a study that is asked of one worker. */
interface Part {
  readonly study: Study;
}

/** What the workers of the notebook do; each takes a part of the same study. */
export const jobs = {
  /** Sizes a share of the rows of the cost tables of some forms. */
  lay: ({
    study,
    forms,
    share,
  }: Part & { readonly forms: readonly FormId[]; readonly share: Share }): Steps<LaidRow[]> =>
    laySteps(study, forms, share, kept),

  /** Searches some forms, with the rows that all have sized together. */
  propose({
    study,
    forms,
    rows,
  }: Part & { readonly forms: readonly FormId[]; readonly rows: readonly LaidRow[] }) {
    for (const [key, row] of rows) kept.rows.put(key, row);
    return proposeSteps(study, forms, kept);
  },

  /** Walks to the limiting span of a form with a deck. */
  reach: ({ form, deck }: { readonly form: FormId; readonly deck: PlainDeck }): Steps<FormReach | NoReach> =>
    formReach(form, deck),

  /** Works out some options. */
  *workOut({ study, options }: Part & { readonly options: readonly Option[] }): Steps<Outcome[]> {
    const outcomes = yield* workOutSteps(study, options, kept);
    // Totals move to the page; those in memory stay.
    return outcomes.map((outcome) =>
      'totals' in outcome ? { ...outcome, totals: outcome.totals.slice() } : outcome,
    );
  },
};
