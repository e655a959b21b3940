import {
  described,
  type At,
  type Check,
  type Described,
  type Descriptor,
  type FormId,
  type Inputs,
  type Told,
} from '../../model/index.ts';

/** What a form says of a figure of its own whose formula is closed. */
export interface Words<I extends Inputs> {
  readonly label: Told<string>;
  readonly unit: string;
  readonly method: string;
  readonly formula: string;
  readonly inputs: (at: At) => I;
  readonly compute?: NonNullable<Described<I>['compute']>;
  readonly sources?: readonly string[];
}

/**
 * What a figure hangs on, in short: `spans`, figures of the unit by name (`pier*HogDesignKNm` is all of them), its
 * steel lines (`steel`), what is laid in its cells span by span (`ballast`), shafts it is cast in with (`shafts`), paths of the unit (`./task/depthM`; `./task/light?` only where the task has it), any other path;
 * `:standard` is the load standard.
 */
export type Short = string;

/** Paths of the spans of a unit. */
export const spansOf = (at: At): string[] =>
  at.design.task.spansM.map((_, i) => `${at.unit}/task/spansM/${i}`);

/** Paths of the measured lines of a unit that have one of the words given. */
export const linesOf = (at: At, ...what: readonly string[]): string[] =>
  at.design.lines.flatMap((line, i) => (what.includes(line.what) ? [`${at.unit}/lines/${i}/quantity`] : []));

/** Paths of the lines of structural steel of a unit. */
export const steelLinesOf = (at: At): string[] =>
  at.design.lines.flatMap((line, i) =>
    line.item.endsWith('-steel') ? [`${at.unit}/lines/${i}/quantity`] : [],
  );

/** Whether the task of a unit has what a path names, `./task/light/middleM`. */
function asked(at: At, short: Short): boolean {
  const steps = short.split('/').slice(2);
  return (
    steps.reduce<unknown>(
      (held, step) => (held as Record<string, unknown> | undefined)?.[step],
      at.design.task,
    ) !== undefined
  );
}

/** Paths of the figures a short name stands for. */
function pathsOf(at: At, short: Short): string[] {
  if (short === 'spans') return spansOf(at);
  if (short === 'steel') return steelLinesOf(at);
  if (short === 'ballast')
    return (at.design.task.ballastKNm ?? []).map((_, i) => `${at.unit}/task/ballastKNm/${i}`);
  if (short === 'shafts')
    return (at.design.task.shafts ?? []).flatMap((_, k) =>
      ['heightM', 'eiKNm2', 'shortenedM', 'cooledM'].map((field) => `${at.unit}/task/shafts/${k}/${field}`),
    );
  if (short.endsWith('?')) return asked(at, short.slice(0, -1)) ? pathsOf(at, short.slice(0, -1)) : [];
  if (short.startsWith('./')) return [`${at.unit}${short.slice(1)}`];
  if (short.includes('/')) return [short.replace(':standard', at.design.task.standard)];
  const [start = '', end] = short.split('*');
  const names =
    end === undefined
      ? [short]
      : Object.keys(at.design.figures).filter((name) => name.startsWith(start) && name.endsWith(end));
  return names.map((name) => `${at.unit}/figures/${name}`);
}

const from = (names: readonly Short[]) => (at: At) => ({ from: names.flatMap((name) => pathsOf(at, name)) });

/** Makers of the descriptors of one form: its named figures, its measured lines, its checks. */
export function formManual(form: FormId) {
  const isForm = (at: At): boolean => at.design.task.form === form;
  const ofUnit = (at: At): string => (at.option.units.length > 1 ? `, unit ${at.index('unit') + 1}` : '');
  const unit = 'options/:option/designs/:unit';
  const checkOf = (at: At, id: string): Check => at.design.checks.find((check) => check.id === id)!;

  const own = <I extends Inputs>(path: string, is: (at: At) => boolean, words: Words<I>): Descriptor =>
    described<I>({
      ...words,
      path: `${unit}/${path}`,
      when: (at) => isForm(at) && is(at),
      label: (at) => `${typeof words.label === 'function' ? words.label(at) : words.label}${ofUnit(at)}`,
    });
  return {
    /** A named figure; a pattern takes those of every span or support. */
    figure: <const I extends Inputs>(name: string | RegExp, words: Words<I>): Descriptor =>
      typeof name === 'string'
        ? own(`figures/${name}`, () => true, words)
        : own('figures/:figure', (at) => name.test(at.name('figure')), words),

    /** A named figure, or all of a pattern with `*`, that sizing finds: how, and what it hangs on. In labels `*` is the number. */
    sized: (
      name: string,
      label: string,
      unitOf: string,
      formula: string,
      ...names: readonly Short[]
    ): Descriptor => {
      const [start = '', end = ''] = name.split('*');
      const many = name.includes('*');
      const number = (at: At): string =>
        at.name('figure').slice(start.length, end === '' ? undefined : -end.length);
      return own(
        many ? 'figures/:figure' : `figures/${name}`,
        (at) =>
          !many ||
          (at.name('figure').startsWith(start) &&
            at.name('figure').endsWith(end) &&
            /^\d+$/u.test(number(at))),
        {
          label: (at) => (many ? label.replace('*', number(at)) : label),
          unit: unitOf,
          method: 'sizing',
          formula,
          inputs: (at) => from(names.map((one) => (many ? one.replace('#', number(at)) : one)))(at),
        },
      );
    },

    /** A measured line by its words. */
    line: <const I extends Inputs>(what: string, words: Words<I>): Descriptor =>
      own('lines/:line/quantity', (at) => at.design.lines[at.index('line')]?.what === what, words),

    /** Both sides of a check: formula first, then what it hangs on. */
    check: (
      id: string,
      demand: readonly [formula: string, ...Short[]],
      capacity: readonly [formula: string, ...Short[]],
      ...sources: readonly string[]
    ): Descriptor[] =>
      Object.entries({ demand, capacity }).map(([side, [formula, ...names]]) =>
        described({
          path: `${unit}/checks/${id}/${side}`,
          when: isForm,
          label: (at) => `${side}, ${checkOf(at, id).label}${ofUnit(at)}`,
          unit: (at) => checkOf(at, id).unit.replace(/^1$/u, ''),
          method: 'check at its worst place',
          formula,
          inputs: from(names),
          sources,
        }),
      ),
  };
}
