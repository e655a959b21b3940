import type { Problem } from '../../lib/index.ts';
import { isDragging } from './dragging.ts';
import { isOf, type Journal } from './journal.ts';
import { ownership, type Ownership } from './ownership.ts';
import { readTyped, writeTyped, type StudyFormat, type StudyShelf, type TypedStudy } from './saving.ts';

/** The study of a page as it is kept on the device: saved as it is typed, and changed by one tab at a time. */
export interface Keeping {
  readonly id: () => string;
  /** Whether this tab may change the study. */
  readonly mayChange: () => boolean;
  /** Something has changed: it is written down at once, or when a drag rests, and saved soon. */
  readonly changed: () => void;
  /**
   * Saves what waits and turns to another study, which is not on the device yet; says what has become of the one before.
   * Where that could not be saved it stays, and nothing is done.
   */
  readonly startAnew: (id: string) => Promise<'kept' | 'never changed' | 'not saved'>;
  readonly takeOver: () => void;
}

export interface KeepingSpec {
  readonly id: string;
  readonly revision: number;
  readonly shelf: StudyShelf;
  readonly journal: Journal;
  readonly format: StudyFormat;
  readonly locks: LockManager | undefined;
  /** The study as it is to be saved. */
  readonly study: () => TypedStudy;
  /** Shows a study that another tab has changed meanwhile. */
  readonly show: (typed: TypedStudy) => void;
  readonly saved: (savedAt: string, isFaulty: boolean) => void;
  readonly refused: (problems: readonly Problem[]) => void;
  /** Says whether this tab may change the study. */
  readonly owned: (isMine: boolean) => void;
}

/** Wait after the last change before it is saved, ms; and the longest a change waits to be written down outside a drag. */
const SAVE_AFTER_MS = 600;
const WRITE_AFTER_MS = 120;
/** What a tab that gives a study up takes to write down what it has not saved, ms. */
const HAND_OVER_MS = 200;

/** Keeps the study of a page. Writes what waits when the page is hidden or closed. */
export function keeping(spec: KeepingSpec): Keeping {
  const { shelf, journal, format } = spec;
  let { id, revision } = spec;
  let own: Ownership;
  let saving: ReturnType<typeof setTimeout> | undefined;
  let writing: ReturnType<typeof setTimeout> | undefined;
  let isDirty = false;
  let mayChange = false;
  let last: Promise<void> = Promise.resolve();

  const hasChanged = (): boolean => isDirty;

  const write = (): void => {
    clearTimeout(writing);
    writing = undefined;
    if (isDirty) journal.put(id, { ...writeTyped(format, spec.study()), revision });
  };
  const saveNow = async (): Promise<void> => {
    clearTimeout(saving);
    if (!isDirty || !own.isMine()) return;
    isDirty = false;
    const mine = id;
    const typed = spec.study();
    const result = await shelf.save(mine, typed, revision);
    if (mine !== id) return;
    if (!result.ok) {
      isDirty = true;
      spec.refused(result.problems);
      return;
    }
    revision = result.value.revision;
    // Given up meanwhile: what waits and what is said belong to the tab that has it now.
    if (!own.isMine()) return;
    // What has changed while it was saved starts from this revision.
    if (hasChanged()) write();
    else journal.clear(mine);
    spec.saved(result.value.savedAt, typed.draft !== null);
  };
  /** One saving after the other, also after one that failed. */
  const save = (): Promise<void> => (last = last.then(saveNow, saveNow));

  const allow = (may: boolean): void => {
    mayChange = may;
    spec.owned(may);
    // What was changed before the study was this tab's could not be saved yet.
    if (may && isDirty) void save();
  };

  /** What the tab that had the study has left. */
  const takeUp = async (): Promise<void> => {
    const waits = journal.get(id);
    const loaded = await shelf.load(id);
    if (loaded.ok) revision = loaded.value.revision;
    const unsaved = waits !== undefined && isOf(waits, revision) ? readTyped(format, waits) : null;
    if (unsaved?.ok === true) {
      spec.show(unsaved.value);
      isDirty = true;
    } else if (loaded.ok) spec.show(loaded.value);
  };
  const claim = (): void => {
    own = ownership(spec.locks, id, (how) => {
      if (how === 'first') return allow(true);
      allow(false);
      if (how === 'elsewhere') {
        // For the tab that has taken it over.
        write();
        isDirty = false;
        clearTimeout(saving);
      } else {
        setTimeout(() => void takeUp().then(() => allow(own.isMine())), HAND_OVER_MS);
      }
    });
  };
  claim();

  const leave = (): void => {
    if (own.isMine()) write();
    void save();
  };
  addEventListener('pagehide', leave);
  document.addEventListener('visibilitychange', () => {
    if (document.visibilityState === 'hidden') leave();
  });

  return {
    id: () => id,
    mayChange: () => mayChange,
    changed() {
      isDirty = true;
      // To write takes longer than to draw: while something is dragged it waits until that rests.
      if (isDragging()) {
        clearTimeout(writing);
        writing = undefined;
      }
      writing ??= setTimeout(write, WRITE_AFTER_MS);
      clearTimeout(saving);
      saving = setTimeout(() => void save(), SAVE_AFTER_MS);
    },
    async startAnew(next) {
      write();
      await save();
      if (hasChanged()) return 'not saved';
      const before = revision > 0 ? 'kept' : 'never changed';
      own.end();
      id = next;
      revision = 0;
      claim();
      return before;
    },
    takeOver: () => own.takeOver(),
  };
}
