import type { AppraisedOption, Study } from '../../lib/index.ts';
import { supportChainages } from '../drawing/alongOption.ts';
import type { HandDesk, StudyStore } from '../page/index.ts';
import type { Graph } from '../reactive/index.ts';
import { handEdit, keptOf, withLock, type Changed } from './handEdits.ts';
import { withPierAdded, withPierRemoved, withSpanParted } from './pierCount.ts';
import type { StudyCells } from './studyCells.ts';

/** What the handles of the study's drawings do: each go at one is one step of undo. */
export function studyDesk(graph: Graph, store: StudyStore, cells: StudyCells): HandDesk {
  const { hold, reference } = cells;
  /** The option as it was when it was taken. */
  let option: AppraisedOption | null = null;
  const now = (): AppraisedOption | null => {
    const state = graph.state(reference);
    return 'value' in state ? state.value : null;
  };
  const end = (finish: () => void): void => {
    option = null;
    graph.batch(() => {
      graph.set(hold, null);
      finish();
    });
  };
  /** Number of a support or span in a key; NaN for the key of anything else. */
  const indexIn = (key: string, kind: 'pier' | 'span'): number => {
    const [of, index] = key.split('/');
    return of === kind ? Number(index) : NaN;
  };
  /** Makes a change in one step of undo; says why it cannot be made, or null. */
  const make = (what: string, changed: Changed): string | null => {
    if (!changed.ok) return changed.why;
    store.edit(() => changed.study, { what });
    return null;
  };
  const NOTHING = 'there is no option to change';
  /** The same to the reference. */
  const change = (what: string, by: (held: AppraisedOption) => Changed): string | null => {
    const held = now();
    return held === null ? NOTHING : make(what, by(held));
  };
  return {
    take(key, valueM) {
      option = now();
      graph.set(hold, { key, valueM, supportsM: option === null ? [] : supportChainages(option) });
    },
    move(key, value) {
      const edit = handEdit(key, option);
      if (edit === null) return;
      const moved = (study: Study): Study => {
        const changed = edit.put(study, value);
        return changed.ok ? changed.study : study;
      };
      store.edit(moved, { coalesce: `hand.${key}`, what: edit.what });
    },
    type(key, value) {
      const edit = handEdit(key, now());
      return edit === null ? NOTHING : make(edit.what, edit.put(store.valid(), value));
    },
    add: (bay, at) =>
      change('adding a pier', (held) =>
        withPierAdded(store.valid(), held, indexIn(bay, 'span'), at ?? undefined),
      ),
    remove: (key) =>
      change('removing a pier', (held) => withPierRemoved(store.valid(), held, indexIn(key, 'pier'))),
    part: (key, lengths) =>
      change('adding a pier', (held) => withSpanParted(store.valid(), held, indexIn(key, 'span'), lengths)),
    letGo: () => end(store.endStep),
    back: () => end(store.dropStep),
    lock(key) {
      const held = now();
      const index = Number(/^pier\/(\d+)$/u.exec(key)?.[1]);
      if (held === null || !(index > 0)) return;
      store.edit(
        (study) => {
          const isLocked = keptOf(study, held).locked?.includes(index) === true;
          return withLock(study, held, index, !isLocked);
        },
        { what: 'locking a pier' },
      );
    },
  };
}
