import { appraiseKept, askedOf, depthTrials, formFacts, guide, memory, survey } from '../../lib/index.ts';
import type { Appraisal, AppraisedOption, RegisterEntry, Study } from '../../lib/index.ts';
import type { Hold } from '../drawing/hold.ts';
import type { InHand } from '../drawing/supportHandles.ts';
import { idle, share, untilDragRests, whenIdle, type StudyStore } from '../page/index.ts';
import type { Graph } from '../reactive/index.ts';
import type { Appraiser } from '../worker/index.ts';
import { rehearsal } from './rehearsal.ts';

/** What the sections of the option study show, and how each hangs on the slices of the study. */
export type StudyCells = ReturnType<typeof studyCells>;

/** An appraisal and the study it answers. */
interface Answer {
  readonly asked: Study;
  readonly appraisal: Appraisal;
}

/** The reference option for the study as it is now. */
export interface AsItStands {
  /** Null before the first appraisal, and where it cannot be worked out for this study. */
  readonly option: AppraisedOption | null;
  /** Why it may not stand as it is. */
  readonly faults: readonly string[];
  /** True while the search has not answered: arrangement and depths are those it had before. */
  readonly isFrozen: boolean;
}

/** The options of the last appraisal, the reference among them as it is now. */
export interface Stacked {
  readonly appraisal: Appraisal;
  readonly options: readonly AppraisedOption[];
  readonly reference: AppraisedOption | null;
  /** Number of the option whose odds are not known any more; null where all are. */
  readonly movedNumber: number | null;
}

const nobody: AsItStands = { option: null, faults: [], isFrozen: false };

/** The option asked for, or the leader, or the cheapest where no rule lets any in. */
function referenceIn({ options, standing }: Appraisal, asked: number | null): AppraisedOption | undefined {
  const wanted = asked ?? standing.leader;
  return options.find((option) => option.number === wanted) ?? options[0];
}

/**
 * The cells behind the page. The appraisal is worked out off the page's thread from the brief, the books and the
 * options, the first one in parts, so that a ranking of some forms stands while the others are searched; the reference is a view setting and works nothing out anew. Until the appraisal of an edit has come the reference
 * is worked out on the page's own thread as it stood, so that its drawing, headroom, price and check follow a drag.
 *
 * Numbers given once are kept here for the life of the page and come back with `register()` when the study is saved.
 */
export function studyCells(graph: Graph, store: StudyStore, worker: Appraiser) {
  const { head, brief, books, options } = store.slices;
  let register: readonly RegisterEntry[] = store.valid().options.register;
  let before: Study | undefined;

  const site = graph.cell('site', { brief }, (v) => survey(v.brief), { equal: () => false });
  const asked = graph.cell('asked', { head, brief, books, options }, (v): Study => {
    const { head, brief, books, options } = v;
    before = share(before, askedOf({ ...store.valid(), ...head, brief, books, options }));
    return before;
  });
  const last = graph.input<Answer | null>('last answer', null);
  let answer: Answer | null = null;
  const appraisal = graph.slow(
    'appraisal',
    { asked },
    async (v, run): Promise<Appraisal> => {
      await untilDragRests(run.signal);
      const numbered = { ...v.asked, options: { ...v.asked.options, register } };
      const taken = (result: Appraisal): Appraisal => {
        register = result.register;
        answer = { asked: v.asked, appraisal: result };
        return result;
      };
      // Where all forms stand already, those of an answer in parts would be gone for a while.
      const inParts = answer === null || answer.appraisal.toCome.length > 0;
      const { signal, report } = run;
      const handOn = (part: unknown): void => run.handOn(taken(part as Appraisal));
      return taken(await worker.appraise(numbered, { signal, report, ...(inParts && { handOn }) }));
    },
    { policy: 'latest' },
  );
  graph.watch(appraisal, (state) => {
    if ('value' in state && state.value === answer?.appraisal) graph.set(last, answer);
  });
  const kept = memory();
  /** Options kept by hand as they were last worked out: one that cannot be worked out any more is not lost. */
  const seen = new Map<number, AppraisedOption>();
  const held = (study: Study, { appraisal }: Answer, number: number | null): AppraisedOption | undefined => {
    for (const option of appraisal.options) seen.set(option.number, option);
    const isKept = study.options.kept.some((one) => one.number === number);
    const found = appraisal.options.some((option) => option.number === number);
    return isKept && !found && number !== null ? seen.get(number) : referenceIn(appraisal, number);
  };
  const asItStands = graph.cell('as it stands', { options, asked, last }, (v): AsItStands => {
    if (v.last === null) return nobody;
    const before = held(v.asked, v.last, v.options.reference);
    if (before === undefined) return nobody;
    if (v.last.asked === v.asked && v.last.appraisal.options.includes(before))
      return { option: before, faults: before.faults, isFrozen: false };
    return { ...appraiseKept(v.asked, before, kept), isFrozen: true };
  });
  const reference = graph.cell('reference', { asItStands }, (v) => v.asItStands.option);
  let depths: readonly AppraisedOption[] = [];
  /** The reference at depths about its own; those of the study before while a new one is being worked out. */
  const byDepth = graph.slow(
    'cost by depth',
    { options, asked, last },
    async (v, run): Promise<readonly AppraisedOption[]> => {
      const option = v.last && referenceIn(v.last.appraisal, v.options.reference);
      if (!option || v.last.asked !== v.asked || v.last.appraisal.toCome.length > 0) return depths;
      // What everything else hangs on is drawn first.
      await untilDragRests(run.signal);
      await idle(run.signal);
      depths = await worker.workOut(v.asked, depthTrials(v.asked, option), run);
      return depths;
    },
    { policy: 'latest' },
  );
  const rehearse = rehearsal((study, option) => appraiseKept(study, option, kept));
  // Not before everything else is there.
  graph.watch(byDepth, (state) => {
    if (state.state !== 'ready') return;
    whenIdle(() => {
      const [given, now, views] = [graph.state(last), graph.state(asked), graph.state(options)];
      if (given.state !== 'ready' || now.state !== 'ready' || views.state !== 'ready') return;
      // While there is no answer yet the reference has just been worked out like this anyway.
      if (given.value?.asked !== now.value || given.value.appraisal.toCome.length > 0) return;
      const study = now.value;
      const option = held(study, given.value, views.value.reference);
      const isStill = (): boolean => {
        const then = graph.state(asked);
        return then.state === 'ready' && then.value === study;
      };
      if (option !== undefined) rehearse(study, option, isStill);
    });
  });
  const hold = graph.input<Hold | null>('hold', null);
  const hands = graph.cell('hands', { hold, options, reference }, (v): InHand => {
    const own = v.options.kept.find(({ number }) => number === v.reference?.number);
    return { hold: v.hold, locked: own?.locked ?? [] };
  });
  const stacked = graph.cell('stacked', { last, asked, asItStands }, (v): Stacked | null => {
    if (v.last === null) return null;
    const { appraisal, options } = { ...v.last, options: v.last.appraisal.options };
    const { option, isFrozen } = v.asItStands;
    // On another site the others are not comparable: the old stack stays until it is worked out.
    const isSameSite = v.last.asked.brief === v.asked.brief;
    if (option === null || !isFrozen || !isSameSite) {
      const reference = held(v.asked, v.last, v.asked.options.reference ?? option?.number ?? null);
      return { appraisal, options, reference: reference ?? null, movedNumber: null };
    }
    const now = options.map((one) => (one.number === option.number ? option : one));
    return { appraisal, options: now, reference: option, movedNumber: option.number };
  });
  /** What can span the main span; waits while a figure is dragged, whose drawings have the time to themselves. */
  const spanning = graph.slow(
    'spanning',
    { site },
    async (v, run) => {
      const { mainSpanM } = formFacts(v.site);
      if (typeof mainSpanM !== 'number') return null;
      await untilDragRests(run.signal);
      return guide({
        spanM: mainSpanM,
        widthM: v.site.deck.widthM,
        lengthM: v.site.lengthM,
        ...(v.site.planRadiusM !== null && Number.isFinite(v.site.planRadiusM)
          ? { radiusM: v.site.planRadiusM }
          : {}),
      });
    },
    { policy: 'latest' },
  );
  return {
    head,
    brief,
    books,
    options,
    site,
    asked,
    appraisal,
    asItStands,
    reference,
    byDepth,
    hold,
    hands,
    stacked,
    spanning,
    register: () => register,
  };
}
