import type { Problem, Study } from '../../lib/index.ts';
import { h } from '../html.ts';
import type { HtmlChild } from '../html.ts';
import type { Graph } from '../reactive/index.ts';
import { exchange } from './exchange.ts';
import type { Fields } from './fields.ts';
import { fieldsOf } from './fields.ts';
import type { StudyStore } from './store.ts';

/** A part of a page with fields in it. */
export interface StandingSpec {
  /** What the sentences hang on besides their figures: how many of a kind there are, what is known. Plain data. */
  readonly shape: (draft: Study) => unknown;
  readonly build: (draft: Study, fields: Fields) => HtmlChild;
  /** A problem in words. */
  readonly say: (problem: Problem) => string;
}

/** A part with fields that stands as it is while only figures change, and is built anew when the shape of the study does. */
export function standing(
  graph: Graph,
  store: StudyStore,
  { shape, build, say }: StandingSpec,
): { readonly element: HTMLElement; readonly end: () => void } {
  const element = h('div', { class: 'standing' });
  let fields: Fields | undefined;
  /** The shape it was built for; undefined while a field of an older one still holds the focus. */
  let built: string | undefined;
  let draft = store.valid();

  const show = (): void => {
    const now = JSON.stringify(shape(draft));
    if (now === built) return;
    const before = fields;
    fields = fieldsOf(graph, store, say);
    const isWhole = exchange(element, h('div', {}, build(draft, fields)));
    before?.end();
    built = isWhole ? now : undefined;
  };
  element.addEventListener('focusout', () => {
    if (built === undefined) queueMicrotask(show);
  });
  const stop = graph.watch(store.draft, (state) => {
    if (state.state !== 'ready') return;
    draft = state.value;
    show();
  });
  return {
    element,
    end() {
      stop();
      fields?.end();
    },
  };
}
