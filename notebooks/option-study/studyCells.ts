import { formFacts, guide, survey } from '../../lib/index.ts';
import type { Appraisal, AppraisedOption, RegisterEntry, Study } from '../../lib/index.ts';
import { share, type StudyStore } from '../page/index.ts';
import type { Graph } from '../reactive/index.ts';
import type { Appraiser } from '../worker/index.ts';

/** What the sections of the option study show, and how each hangs on the slices of the study. */
export type StudyCells = ReturnType<typeof studyCells>;

/**
 * The cells behind the page. The appraisal is worked out off the page's thread from the brief, the books and the
 * options; the reference is a view setting and works nothing out anew.
 *
 * Numbers given once are kept here for the life of the page and come back with `register()` when the study is saved.
 */
export function studyCells(graph: Graph, store: StudyStore, worker: Appraiser) {
  const { head, brief, books, options } = store.slices;
  let register: readonly RegisterEntry[] = store.valid().options.register;
  let before: Study | undefined;

  const site = graph.cell('site', { brief }, (v) => survey(v.brief), { equal: () => false });
  const asked = graph.cell('asked', { head, brief, books, options }, (v): Study => {
    before = share(before, {
      ...v.head,
      brief: v.brief,
      books: v.books,
      options: { ...v.options, reference: null, register: [] },
      priorities: { weights: {} },
      notes: [],
      decision: null,
    });
    return before;
  });
  const appraisal = graph.slow(
    'appraisal',
    { asked },
    async (v, run): Promise<Appraisal> => {
      const numbered = { ...v.asked, options: { ...v.asked.options, register } };
      const result = await worker.appraise(numbered, run);
      register = result.register;
      return result;
    },
    { policy: 'progress' },
  );
  const reference = graph.cell('reference', { options, appraisal }, (v): AppraisedOption | null => {
    const wanted = v.options.reference ?? v.appraisal.standing.leader;
    return v.appraisal.options.find((option) => option.number === wanted) ?? v.appraisal.options[0] ?? null;
  });
  const spanning = graph.cell('spanning', { site }, (v) => {
    const { mainSpanM } = formFacts(v.site);
    if (typeof mainSpanM !== 'number') return null;
    return guide({
      spanM: mainSpanM,
      widthM: v.site.deck.widthM,
      lengthM: v.site.lengthM,
      ...(v.site.planRadiusM !== null && Number.isFinite(v.site.planRadiusM)
        ? { radiusM: v.site.planRadiusM }
        : {}),
    });
  });
  return { brief, books, site, asked, appraisal, reference, spanning, register: () => register };
}
