import type { AppraisedOption } from '../../lib/index.ts';
import { supportChainages } from '../drawing/alongOption.ts';
import type { HandDesk, StudyStore } from '../page/index.ts';
import type { Graph } from '../reactive/index.ts';
import { handEdit, keptOf, withLock, withSpan } from './handEdits.ts';
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
  return {
    take(key, valueM) {
      option = now();
      graph.set(hold, { key, valueM, supportsM: option === null ? [] : supportChainages(option) });
    },
    move(key, value) {
      const edit = handEdit(key, option);
      if (edit === null) return;
      store.edit((study) => edit.put(study, value), { coalesce: `hand.${key}`, what: edit.what });
    },
    type(key, value) {
      const held = now();
      const edit = handEdit(key, held);
      if (edit === null) return 'there is no option to change';
      if (key.startsWith('span/') && held !== null) {
        const typed = withSpan(store.valid(), held, Number(key.slice(5)), value);
        if (!typed.ok) return typed.why;
      }
      store.edit((study) => edit.put(study, value), { what: edit.what });
      return null;
    },
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
