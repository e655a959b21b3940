import {
  described,
  type At,
  type Described,
  type Descriptor,
  type FormId,
  type Inputs,
  type Told,
} from '../../model/index.ts';

/** What a form says of one of its own figures. */
export interface Words<I extends Inputs> {
  readonly label: Told<string>;
  readonly unit: string;
  readonly method?: string;
  readonly formula: string;
  readonly inputs?: (at: At) => I;
  readonly compute?: Described<I>['compute'];
  readonly sources?: readonly string[];
}

/** What a form says of the two sides of a check: formulas, and the figures of the unit each hangs on. */
export interface CheckWords {
  readonly demand: string;
  readonly capacity: string;
  readonly demandFrom: (at: At) => readonly string[];
  readonly capacityFrom: (at: At) => readonly string[];
  readonly sources?: readonly string[];
}

/** Paths of spans of a unit. */
export const spansOf = (at: At): string[] =>
  at.design.task.spansM.map((_, i) => `${at.unit}/task/spansM/${i}`);

/** Paths of figures of a unit by name. */
export const figuresOf = (at: At, ...names: readonly string[]): string[] =>
  names.map((name) => `${at.unit}/figures/${name}`);

/** Paths of the measured lines of a unit whose words are among those given; all of them where none is. */
export const linesOf = (at: At, ...what: readonly string[]): string[] =>
  at.design.lines.flatMap((line, i) =>
    what.length === 0 || what.includes(line.what) ? [`${at.unit}/lines/${i}/quantity`] : [],
  );

/** Makers of the descriptors of one form: its named figures, its checks, its measured lines. */
export function formManual(form: FormId) {
  const isForm = (at: At): boolean => at.design.task.form === form;
  const unitWord = (at: At): string => (at.option.units.length > 1 ? `, unit ${at.index('unit') + 1}` : '');
  const labelled = (label: Told<string>) => (at: At) =>
    `${typeof label === 'function' ? label(at) : label}${unitWord(at)}`;
  const oneOf = <I extends Inputs>(path: string, is: (at: At) => boolean, words: Words<I>): Descriptor =>
    described<I>({
      path: `options/:option/designs/:unit/${path}`,
      when: (at) => isForm(at) && is(at),
      label: labelled(words.label),
      unit: words.unit,
      method: words.method ?? 'sizing',
      formula: words.formula,
      ...(words.inputs === undefined ? {} : { inputs: words.inputs }),
      ...(words.compute === undefined ? {} : { compute: words.compute }),
      ...(words.sources === undefined ? {} : { sources: words.sources }),
    });
  return {
    /** A named figure; a pattern takes those of every span or support. */
    figure: <const I extends Inputs>(name: string | RegExp, words: Words<I>): Descriptor =>
      typeof name === 'string'
        ? oneOf(`figures/${name}`, () => true, words)
        : oneOf('figures/:figure', (at) => name.test(at.name('figure')), words),
    /** A measured line by its words. */
    line: <const I extends Inputs>(what: string, words: Words<I>): Descriptor =>
      oneOf('lines/:line/quantity', (at) => at.design.lines[at.index('line')]?.what === what, words),
    /** Both sides of a check by its id. */
    check: (id: string, words: CheckWords): Descriptor[] =>
      (['demand', 'capacity'] as const).map((side) =>
        described({
          path: `options/:option/designs/:unit/checks/${id}/${side}`,
          when: isForm,
          label: (at) =>
            `${side}, ${at.design.checks.find((check) => check.id === id)!.label}${unitWord(at)}`,
          unit: (at) => at.design.checks.find((check) => check.id === id)!.unit.replace(/^1$/u, ''),
          method: 'check at its worst place',
          formula: words[side],
          inputs: (at) => ({ from: words[`${side}From`](at) }),
          ...(words.sources === undefined ? {} : { sources: words.sources }),
        }),
      ),
  };
}
