import type { Study } from '../../lib/index.ts';
import { figureInput, type FigureRules, type StudyStore } from '../page/index.ts';
import type { Graph } from '../reactive/index.ts';

/** A figure of the page that is made from several fields of the study, e.g. a width from two chainages. */
export interface MadeFigure extends FigureRules {
  readonly label: string;
  readonly step?: number;
  readonly per?: number;
  readonly get: (study: Study) => number;
  readonly put: (study: Study, value: number) => Study;
}

/** The input of a made figure, in step with the study both ways; one go is one step of undo. */
export function madeFigure(graph: Graph, store: StudyStore, spec: MadeFigure): HTMLElement {
  const { get, put, ...rules } = spec;
  const input = figureInput({
    ...rules,
    value: get(store.valid()),
    key: spec.label,
    input: (value) => {
      if (value !== 'unknown') {
        store.edit((study) => put(study, value), { coalesce: spec.label, what: spec.label });
      }
    },
    change: store.endStep,
  });
  graph.watch(store.draft, (state) => {
    if (state.state === 'ready') input.set(get(state.value));
  });
  return input.element;
}
