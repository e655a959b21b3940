import { assumedAgain, confirmed, isAssumed, type Problem, type Study } from '../../lib/index.ts';
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

type Bound = 'value' | 'input' | 'change' | 'drop' | 'key' | 'origin';

/** Where the origin of a field is read from; every field but start values counts as typed unless it says otherwise. */
export interface FieldOptions {
  /** Whether the field still holds a preset that is to be confirmed. */
  readonly isPreset?: (draft: unknown) => boolean;
}

/** A value of the study that is no single entry of it, e.g. a width between two chainages: how it is read and written. */
export interface Made<T> {
  /** Tells it from the other fields of the page. */
  readonly key: string;
  readonly get: (study: Study) => T;
  readonly put: (study: Study, value: T) => Study;
  /** Whether it can be read, e.g. from an entry of a list that may have become shorter; always unless given. */
  readonly has?: (study: Study) => boolean;
  /** Places whose problems are said beside it. */
  readonly owns?: readonly Path[];
  /** Places that it is made from; those whose problems are said beside it unless given. */
  readonly from?: (study: Study) => readonly Path[];
}

/** Where a field stands: an entry of the study, or a value made from several. */
export type FieldPlace<T> = Path | Made<T>;

export interface Fields {
  /** A figure of the study, in step with it both ways. */
  readonly figure: (place: FieldPlace<Figure>, spec: Omit<FigureSpec, Bound> & FieldOptions) => HTMLElement;
  /** A choice of the study, in step with it both ways. */
  readonly choice: <T extends string>(
    place: FieldPlace<T>,
    spec: Omit<ChoiceSpec<T>, Bound> & FieldOptions,
  ) => HTMLElement;
  /** Words of the study, in step with it both ways. */
  readonly words: (place: FieldPlace<string>, spec: Omit<WordsSpec, Bound> & FieldOptions) => HTMLElement;
  /**
   * Tells every draft to what is no field but follows the fields, e.g. a sum below them or a drawing over them.
   * @param owns places whose problems are said there: only those at exactly these places are told
   */
  readonly follow: (
    owns: readonly Path[],
    show: (draft: Study, problems: readonly Problem[]) => void,
  ) => void;
  /** Those problems that no field here says: to be said elsewhere on the page. */
  readonly unsaid: (problems: readonly Problem[]) => readonly Problem[];
  /** Takes all fields out of step. */
  readonly end: () => void;
}

/** An entry of the study as a value that is read and written. */
function entryAt<T>(place: FieldPlace<T>): Required<Made<T>> {
  if ('get' in place) {
    const { owns = [], from = () => owns } = place;
    return { has: () => true, ...place, owns, from };
  }
  return {
    key: place.join('.'),
    get: (study) => getAt(study, place) as T,
    put: (study, value) => putAt(study, place, value),
    has: (study) => hasAt(study, place),
    owns: [place],
    from: () => [place],
  };
}

/** The places that an entry is made from as the study names them: 'brief.deck.0.widthM'. */
const pathsOf = <T>({ from }: Required<Made<T>>, study: Study): string[] =>
  from(study).map((path) => path.join('.'));

const samePath = (one: Path, other: Path): boolean => one.length === other.length && isWithin(one, other);

/**
 * Fields tied to a store, for parts of a page that stand (a body that is not drawn anew): they show the draft, change
 * it as one step of undo a go, and say beside themselves what is wrong with it.
 * @param say a problem in words
 */
export function fieldsOf(graph: Graph, store: StudyStore, say: (problem: Problem) => string): Fields {
  const stops: (() => void)[] = [];
  /** Whether a problem is said by one of these fields. */
  const said: ((problem: Problem) => boolean)[] = [];

  const follow = (show: (draft: Study, problems: readonly Problem[]) => void): void => {
    stops.push(
      graph.view({ draft: store.draft, problems: store.problems }, (state) => {
        if (state.state === 'ready') show(state.value.draft, state.value.problems);
      }),
    );
  };

  interface Shown<T> {
    readonly set: (value: T, origin: Origin) => void;
    readonly refuse: (words: string | null, ways?: readonly Way[]) => void;
    /** A value as the field writes it. */
    readonly words: (value: T) => string;
  }
  const tie = <T>(entry: Required<Made<T>>, shown: Shown<T>, { isPreset }: FieldOptions): void => {
    const isMine = (problem: Problem): boolean => entry.owns.some((path) => isWithin(problem.path, path));
    said.push(isMine);
    let isRefused = false;
    const back = (draft: Study): Way[] => {
      if (!entry.has(store.valid())) return [];
      const good = entry.get(store.valid());
      // Said here, but caused by a change elsewhere.
      if (shown.words(good) === shown.words(entry.get(draft))) {
        return [{ words: 'Undo the last change', take: store.undo }];
      }
      const take = (): void => {
        const valid = store.valid();
        store.edit((study) => assumedAgain(entry.put(study, good), valid, pathsOf(entry, valid)), {
          what: 'going back',
        });
      };
      return [{ words: `Back to ${shown.words(good)}`, take }];
    };
    follow((draft, problems) => {
      if (!entry.has(draft)) return;
      const isStart = pathsOf(entry, draft).some((path) => isAssumed(draft, path));
      const origin = isStart ? 'assumed' : isPreset?.(draft) === true ? 'preset' : 'typed';
      shown.set(entry.get(draft), origin);
      const mine = problems.filter(isMine);
      if (mine.length > 0) {
        shown.refuse(`${mine.map(say).join(' ')} The last valid study is kept.`, back(draft));
      } else if (isRefused) shown.refuse(null);
      isRefused = mine.length > 0;
    });
  };
  const start = <T>(entry: Required<Made<T>>): T => {
    const state = graph.state(store.draft);
    return entry.get('value' in state ? state.value : store.valid());
  };
  const put =
    <T>({ key, put: change }: Required<Made<T>>, what: string) =>
    (value: T): void =>
      store.edit((study) => change(study, value), { coalesce: key, what });

  const confirm =
    <T>(entry: Required<Made<T>>, what: string) =>
    (): void =>
      store.edit((study) => confirmed(study, pathsOf(entry, study)), { what: `confirming ${what}` });

  return {
    figure(place, { isPreset, ...spec }) {
      const entry = entryAt(place);
      const figure = figureInput({
        confirm: confirm(entry, spec.label),
        ...spec,
        value: start(entry),
        key: entry.key,
        input: put(entry, spec.label),
        change: store.endStep,
        drop: store.dropStep,
      });
      const words = (value: Figure): string =>
        writeFigure(value === 'unknown' ? value : value * (spec.per ?? 1), spec);
      tie(entry, { ...figure, words }, isPreset === undefined ? {} : { isPreset });
      return figure.element;
    },
    choice<T extends string>(
      place: FieldPlace<T>,
      { isPreset, ...spec }: Omit<ChoiceSpec<T>, Bound> & FieldOptions,
    ) {
      const entry = entryAt(place);
      const edit = put(entry, spec.label);
      const choice = choiceInput<T>({
        confirm: confirm(entry, spec.label),
        ...spec,
        value: start(entry),
        key: entry.key,
        change(value) {
          edit(value);
          store.endStep();
        },
      });
      const words = (value: T): string => spec.choices.find((one) => one.value === value)?.words ?? value;
      tie(entry, { ...choice, words }, isPreset === undefined ? {} : { isPreset });
      return choice.element;
    },
    words(place, { isPreset, ...spec }) {
      const entry = entryAt(place);
      const edit = put(entry, spec.label);
      const words = wordsInput({
        confirm: confirm(entry, spec.label),
        ...spec,
        value: start(entry),
        key: entry.key,
        change(value) {
          edit(value);
          store.endStep();
        },
      });
      const quoted = (value: string): string => `'${value}'`;
      tie(entry, { ...words, words: quoted }, isPreset === undefined ? {} : { isPreset });
      return words.element;
    },
    follow(owns, show) {
      const isMine = ({ path }: Problem): boolean => owns.some((own) => samePath(path, own));
      said.push(isMine);
      follow((draft, problems) => show(draft, problems.filter(isMine)));
    },
    unsaid: (problems) => problems.filter((problem) => !said.some((says) => says(problem))),
    end() {
      for (const stop of stops.splice(0)) stop();
    },
  };
}
