import { afterEdit, type Problem, type Study } from '../../lib/index.ts';
import type { Graph, Input } from '../reactive/index.ts';
import { share } from './share.ts';

/** What heads a study and is no slice of its own. */
export type Head = Pick<Study, 'format' | 'version' | 'title' | 'reference' | 'notice' | 'assumed'>;

/** The last valid study, slice by slice, as inputs of the graph; a slice that says the same stays the same value. */
export interface Slices {
  readonly head: Input<Head>;
  readonly brief: Input<Study['brief']>;
  readonly books: Input<Study['books']>;
  readonly options: Input<Study['options']>;
  readonly priorities: Input<Study['priorities']>;
  readonly notes: Input<Study['notes']>;
  readonly decision: Input<Study['decision']>;
}

/** What undo and redo would take back or bring again, in words; null when there is nothing. */
export interface History {
  readonly undo: string | null;
  readonly redo: string | null;
}

export interface EditWords {
  /** Edits that follow each other under one key are one step of undo, until `endStep` or another edit. */
  readonly coalesce?: string;
  /** What was done, after the word Undo: 'clear opening'. */
  readonly what?: string;
}

export interface StudyStore {
  readonly slices: Slices;
  /** The study as typed, valid or not: what fields show. */
  readonly draft: Input<Study>;
  /** What is wrong with the draft; while there is anything, the slices keep the last valid study. */
  readonly problems: Input<readonly Problem[]>;
  readonly history: Input<History>;
  /** Names of the slices that keep an older value than was typed; none while the draft is valid. */
  readonly held: Input<readonly string[]>;
  /** Changes the draft by a pure function; a change that says the same is none. */
  readonly edit: (change: (study: Study) => Study, words?: EditWords) => void;
  /** Ends the step under way, e.g. on release of a drag; a step that came back to its start is forgotten. */
  readonly endStep: () => void;
  /** Takes back the step under way as if it had never been begun, e.g. on Escape; without one it does nothing. */
  readonly dropStep: () => void;
  readonly undo: () => void;
  readonly redo: () => void;
  /**
   * Puts another study in its place and forgets the history. Throws when it is not valid: check it first.
   * @param typed the study as typed over it, with what is refused in it: the one step that can be undone
   */
  readonly open: (study: Study, typed?: Study) => void;
  /** The last valid study. */
  readonly valid: () => Study;
}

interface Step {
  readonly before: Study;
  readonly after: Study;
  readonly key: string | undefined;
  readonly what: string;
}

const headOf = ({ format, version, title, reference, notice, assumed }: Study): Head => ({
  format,
  version,
  title,
  reference,
  notice,
  assumed,
});

/**
 * The study of a page, kept in a graph: the draft, the last valid study in slices, what is wrong, and a history of
 * everything. Its inputs are named 'head', 'brief', 'books', 'options', 'priorities', 'notes', 'decision', 'draft',
 * 'problems', 'held' and 'history', and are defined here, so it comes before the cells of the page.
 * @param check what is wrong with a study that follows on the last valid one, itself where it is opened; nothing when it is valid
 * @param mayChange whether the study may be changed here; while it may not, edits, undo and redo do nothing
 * @throws when the study it starts with is not valid
 */
export function studyStore(
  graph: Graph,
  study: Study,
  check: (study: Study, before: Study) => readonly Problem[],
  mayChange: () => boolean = () => true,
): StudyStore {
  const checkOpening = (opened: Study): void => {
    const [first] = check(opened, opened);
    if (first === undefined) return;
    throw new Error(
      `study: expected a valid one, received one with ${first.path.join('.')} ${first.received}; check it before opening`,
    );
  };
  checkOpening(study);

  let valid = study;
  let draft = study;
  let head = headOf(study);
  let problems: readonly Problem[] = [];
  let held: readonly string[] = [];
  let done: Step[] = [];
  let undone: Step[] = [];
  let isOpen = false;

  const slices: Slices = {
    head: graph.input('head', head),
    brief: graph.input('brief', study.brief),
    books: graph.input('books', study.books),
    options: graph.input('options', study.options),
    priorities: graph.input('priorities', study.priorities),
    notes: graph.input('notes', study.notes),
    decision: graph.input('decision', study.decision),
  };
  const inputs = {
    draft: graph.input('draft', draft),
    problems: graph.input('problems', problems),
    held: graph.input('held', held),
    history: graph.input<History>('history', { undo: null, redo: null }),
  };

  /** The slices in which the draft says something else than the last valid study. */
  const heldNow = (): string[] => {
    if (problems.length === 0) return [];
    const names = ['brief', 'books', 'options', 'priorities', 'notes', 'decision'] as const;
    const parts = names.filter((name) => draft[name] !== valid[name]);
    return share(head, headOf(draft)) === head ? parts : ['head', ...parts];
  };

  const tell = (): void => {
    const undo = done.at(-1)?.what ?? null;
    const redo = undone.at(-1)?.what ?? null;
    graph.batch(() => {
      if (problems.length === 0) {
        valid = draft;
        head = share(head, headOf(valid));
        graph.set(slices.head, head);
        graph.set(slices.brief, valid.brief);
        graph.set(slices.books, valid.books);
        graph.set(slices.options, valid.options);
        graph.set(slices.priorities, valid.priorities);
        graph.set(slices.notes, valid.notes);
        graph.set(slices.decision, valid.decision);
      }
      graph.set(inputs.draft, draft);
      graph.set(inputs.problems, problems);
      held = share(held, heldNow());
      graph.set(inputs.held, held);
      const { history } = inputs;
      const told = graph.state(history);
      const same = told.state === 'ready' && told.value.undo === undo && told.value.redo === redo;
      if (!same) graph.set(history, { undo, redo });
    });
  };

  const take = (next: Study, before = valid): void => {
    draft = next;
    problems = share(problems, check(draft, before));
    tell();
  };

  const endStep = (): void => {
    isOpen = false;
    const last = done.at(-1);
    if (last === undefined || last.before !== last.after) return;
    done.pop();
    tell();
  };

  return {
    slices,
    ...inputs,

    edit(change, { coalesce, what = 'last change' } = {}) {
      if (!mayChange()) return;
      const last = done.at(-1);
      const joins = isOpen && coalesce !== undefined && last?.key === coalesce;
      if (!joins) endStep();
      const edited = change(draft);
      // What follows from edits by themselves is found anew from where the step began.
      const begun = joins ? last.before : draft;
      const changed = share(
        draft,
        afterEdit(begun, {
          ...edited,
          ...(edited.assumed === draft.assumed && { assumed: begun.assumed }),
          ...(edited.decision === draft.decision && { decision: begun.decision }),
        }),
      );
      if (changed === draft) return;
      // A step that comes back to its start is that start itself, so that ending it can tell.
      const next = joins ? share(last.before, changed) : changed;
      if (joins) done[done.length - 1] = { ...last, after: next };
      else done.push({ before: draft, after: next, key: coalesce, what });
      isOpen = coalesce !== undefined;
      undone = [];
      take(next);
    },

    endStep,

    dropStep() {
      const last = done.at(-1);
      if (!isOpen || last === undefined) return;
      isOpen = false;
      done.pop();
      take(last.before);
    },

    undo() {
      if (!mayChange()) return;
      endStep();
      const step = done.pop();
      if (step === undefined) return;
      undone.push(step);
      take(step.before);
    },

    redo() {
      if (!mayChange()) return;
      endStep();
      const step = undone.pop();
      if (step === undefined) return;
      done.push(step);
      take(step.after);
    },

    open(opened, typed = opened) {
      checkOpening(opened);
      isOpen = false;
      done = [];
      undone = [];
      const next = share(draft, opened);
      take(next, next);
      const over = share(next, typed);
      if (over === next) return;
      done = [
        { before: next, after: over, key: undefined, what: 'what was typed since the last valid study' },
      ];
      take(over);
    },

    valid: () => valid,
  };
}
