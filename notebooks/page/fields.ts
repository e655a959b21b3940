import type { Problem } from '../../lib/index.ts';
import type { Graph } from '../reactive/index.ts';
import type { ChoiceSpec } from './choiceInput.ts';
import { choiceInput } from './choiceInput.ts';
import { figureInput } from './figureInput.ts';
import type { FigureSpec, Origin } from './figureSpec.ts';
import type { Figure } from './figureText.ts';
import { writeFigure } from './figureText.ts';
import type { Path } from './place.ts';
import { getAt, hasAt, isWithin, putAt } from './place.ts';
import type { Way } from './refusal.ts';
import type { StudyStore } from './store.ts';
import type { WordsSpec } from './wordsInput.ts';
import { wordsInput } from './wordsInput.ts';

type Bound = 'value' | 'input' | 'change' | 'key' | 'origin';

/** Where the origin of a field is read from; every field counts as typed unless it says otherwise. */
export interface FieldOptions {
  /** Whether the field still holds a preset that is to be confirmed. */
  readonly isPreset?: (draft: unknown) => boolean;
}

export interface Fields {
  /** A figure of the study at a path, in step with it both ways. */
  readonly figure: (path: Path, spec: Omit<FigureSpec, Bound> & FieldOptions) => HTMLElement;
  /** A choice of the study at a path, in step with it both ways. */
  readonly choice: <T extends string>(
    path: Path,
    spec: Omit<ChoiceSpec<T>, Bound> & FieldOptions,
  ) => HTMLElement;
  /** Words of the study at a path, in step with it both ways. */
  readonly words: (path: Path, spec: Omit<WordsSpec, Bound> & FieldOptions) => HTMLElement;
  /** Those problems that no field here says: to be said elsewhere on the page. */
  readonly unsaid: (problems: readonly Problem[]) => readonly Problem[];
  /** Takes all fields out of step. */
  readonly end: () => void;
}

/**
 * Fields tied to a store, for parts of a page that stand (a body that is not drawn anew): they show the draft, change
 * it as one step of undo a go, and say beside themselves what is wrong with it.
 * @param say a problem in words
 */
export function fieldsOf(graph: Graph, store: StudyStore, say: (problem: Problem) => string): Fields {
  const stops: (() => void)[] = [];

  const tied: Path[] = [];

  interface Shown {
    readonly set: (value: never, origin: Origin) => void;
    readonly refuse: (words: string | null, ways?: readonly Way[]) => void;
    /** A value as the field writes it. */
    readonly words: (value: never) => string;
  }
  const tie = (path: Path, shown: Shown, { isPreset }: FieldOptions): void => {
    tied.push(path);
    let isRefused = false;
    const back = (): Way[] => {
      if (!hasAt(store.valid(), path)) return [];
      const good = getAt(store.valid(), path);
      const take = (): void => {
        store.edit((study) => putAt(study, path, good), { what: 'going back' });
      };
      return [{ words: `Back to ${shown.words(good as never)}`, take }];
    };
    stops.push(
      graph.view({ draft: store.draft, problems: store.problems }, (state) => {
        if (state.state !== 'ready' || !hasAt(state.value.draft, path)) return;
        const { draft, problems } = state.value;
        shown.set(getAt(draft, path) as never, isPreset?.(draft) === true ? 'preset' : 'typed');
        const mine = problems.filter((problem) => isWithin(problem.path, path));
        if (mine.length > 0) {
          shown.refuse(`${mine.map(say).join(' ')} The last valid study is kept.`, back());
        } else if (isRefused) shown.refuse(null);
        isRefused = mine.length > 0;
      }),
    );
  };
  const start = (path: Path): unknown => {
    const state = graph.state(store.draft);
    return getAt('value' in state ? state.value : undefined, path);
  };
  const put =
    (path: Path, what: string) =>
    (value: number | string): void =>
      store.edit((study) => putAt(study, path, value), { coalesce: path.join('.'), what });

  return {
    figure(path, { isPreset, ...spec }) {
      const figure = figureInput({
        ...spec,
        value: start(path) as Figure,
        key: path.join('.'),
        input: put(path, spec.label),
        change: store.endStep,
      });
      const words = (value: Figure): string =>
        writeFigure(value === 'unknown' ? value : value * (spec.per ?? 1), spec);
      tie(path, { ...figure, words }, isPreset === undefined ? {} : { isPreset });
      return figure.element;
    },
    choice(path, { isPreset, ...spec }) {
      const edit = put(path, spec.label);
      const choice = choiceInput({
        ...spec,
        value: start(path) as (typeof spec.choices)[number]['value'],
        key: path.join('.'),
        change(value) {
          edit(value);
          store.endStep();
        },
      });
      const words = (value: string): string =>
        spec.choices.find((one) => one.value === value)?.words ?? value;
      tie(path, { ...choice, words }, isPreset === undefined ? {} : { isPreset });
      return choice.element;
    },
    words(path, { isPreset, ...spec }) {
      const edit = put(path, spec.label);
      const words = wordsInput({
        ...spec,
        value: start(path) as string,
        key: path.join('.'),
        change(value) {
          edit(value);
          store.endStep();
        },
      });
      tie(
        path,
        { ...words, words: (value: string) => `'${value}'` },
        isPreset === undefined ? {} : { isPreset },
      );
      return words.element;
    },
    unsaid: (problems) => problems.filter((problem) => !tied.some((path) => isWithin(problem.path, path))),
    end() {
      for (const stop of stops.splice(0)) stop();
    },
  };
}
