import type { Problem, Study } from '../../lib/index.ts';
import { h } from '../html.ts';
import type { HtmlChild } from '../html.ts';
import type { Cell, Graph } from '../reactive/index.ts';
import { exchange } from './exchange.ts';
import type { Fields } from './fields.ts';
import { fieldsOf } from './fields.ts';
import type { StudyStore } from './store.ts';

/** A part of a page with fields in it. */
export interface StandingSpec {
  /** What the sentences hang on besides their figures: how many of a kind there are, what is known. Plain data. */
  readonly shape: (draft: Study) => unknown;
  /** Cells besides the draft that its shape hangs on. */
  readonly follows?: readonly Cell<unknown>[];
  readonly build: (draft: Study, fields: Fields) => HtmlChild;
  /** A problem in words. */
  readonly say: (problem: Problem) => string;
}

/** A part with fields that stands as it is while only figures change, and is built anew when the shape of the study does. */
export function standing(
  graph: Graph,
  store: StudyStore,
  { shape, follows = [], build, say }: StandingSpec,
): { readonly element: HTMLElement; readonly end: () => void } {
  const element = h('div', { class: 'standing' });
  let fields: Fields | undefined;
  /** Fields of earlier shapes of which one may still hold the focus: in step until it has gone. */
  const earlier: Fields[] = [];
  /** The shape it was built for; undefined while a field of an older one still holds the focus. */
  let built: string | undefined;
  let draft = store.valid();

  const show = (): void => {
    const now = JSON.stringify(shape(draft));
    if (now === built) return;
    if (fields !== undefined) earlier.push(fields);
    fields = fieldsOf(graph, store, say);
    const isWhole = exchange(element, h('div', {}, build(draft, fields)));
    built = isWhole ? now : undefined;
    if (isWhole) for (const one of earlier.splice(0)) one.end();
  };
  element.addEventListener('focusout', () => {
    // Once the focus has come to where it goes: that place has to be there still.
    if (built === undefined) setTimeout(show);
  });
  const stops = [
    graph.watch(store.draft, (state) => {
      if (state.state !== 'ready') return;
      draft = state.value;
      show();
    }),
    ...follows.map((cell) => graph.watch(cell, show)),
  ];
  return {
    element,
    end() {
      for (const stop of stops) stop();
      for (const one of [...earlier, fields]) one?.end();
    },
  };
}
