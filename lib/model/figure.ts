import type { Appraisal, AppraisedOption, Spread, Support } from './appraisal.ts';
import type { Design } from './design.ts';
import type { Site } from './site.ts';
import type { Study } from './study.ts';

/** Worked out here, typed into the study, taken from the shelf and to be confirmed, or not known. */
export type FigureKind = 'computed' | 'typed' | 'preset' | 'unknown';

export type FigureValue = number | string | boolean | null;

/** What a figure was worked out from; its path can be asked in turn. */
export interface FigureInput {
  readonly label: string;
  readonly path: string;
  readonly value: FigureValue;
  readonly unit: string;
  readonly kind: FigureKind;
}

/** Where a figure or its formula comes from: an entry of the bibliography, or words where it has none (`id` null). */
export interface FigureSource {
  readonly id: string | null;
  readonly text: string;
  /** True where the work itself was read, false where it is from memory or practice. */
  readonly read: boolean;
}

/** A figure of a study with where it comes from and what hangs on it. */
export interface Figure {
  /** Address from the root, e.g. `options/3/cost/p50`; options go by their number, not by their rank. */
  readonly path: string;
  readonly label: string;
  readonly value: FigureValue;
  readonly unit: string;
  readonly range?: Spread;
  readonly kind: FigureKind;
  readonly because: {
    /** How it was found, in two or three words: 'product', 'count of draws', 'beam statics'. */
    readonly method: string;
    /** The same in trade notation. */
    readonly formula: string;
    readonly inputs: readonly FigureInput[];
    readonly sources: readonly FigureSource[];
  };
  /** Paths of the figures that have this one among their inputs. */
  readonly usedBy: readonly string[];
}

/** Where a descriptor stands: the study, what came of it, and what the names in its path stand for. */
export interface At {
  readonly study: Study;
  readonly appraisal: Appraisal;
  /** The path that was asked. */
  readonly path: string;
  /** What a name of the pattern stands for: `:part` -> 'deck'. */
  name(key: string): string;
  /** The same as a place in a list. */
  index(key: string): number;
  /** The site as the option of `:option` meets it, between its own abutments; that of the study where no option is named. */
  readonly site: Site;
  /** Paths of the chainages of its abutments and of the length between them. */
  readonly ends: { readonly start: string; readonly end: string; readonly length: string };
  /** Option of `:option`, and its path, e.g. `options/3`. */
  readonly option: AppraisedOption;
  readonly root: string;
  /** Sized unit of `:unit`, and its path, e.g. `options/3/designs/0`. */
  readonly design: Design;
  readonly unit: string;
  /** Support of `:support`, and its path, e.g. `options/3/supports/2`. */
  readonly support: Support;
  readonly foot: string;
}

/** Paths a figure was worked out from, by a name each for the formula; lists for sums and the like. */
export type Inputs = Readonly<Record<string, string | readonly string[]>>;

/** Values of inputs under their names. Switches count as 1 and 0; what is not a number comes as NaN. */
export type Values<I extends Inputs> = {
  readonly [K in keyof I]: I[K] extends string ? number : readonly number[];
};

/** The same for every figure of a pattern, or told for each. */
export type Told<T> = T | ((at: At) => T);

/** Manual of one field. Descriptors stand beside their stage and say nothing that the stage does not do. */
export interface Described<I extends Inputs> {
  /** Path; `:name` stands for one step, a last `*` for any number of steps. */
  readonly path: string;
  /** Where one path means different things: the figures this descriptor is for. */
  readonly when?: (at: At) => boolean;
  readonly label: Told<string>;
  readonly unit: Told<string>;
  /** Computed unless said. */
  readonly kind?: Told<FigureKind>;
  readonly method: Told<string>;
  readonly formula: Told<string>;
  /** Value where the result does not hold it; without it and without a held value the formula is worked out. */
  readonly value?: (at: At) => FigureValue;
  readonly range?: (at: At) => Spread;
  readonly inputs?: (at: At) => I;
  /** The figure from its inputs alone, where its formula is closed. */
  readonly compute?: (values: Values<I>, at: At) => number;
  /** Ids of the bibliography, or words. */
  readonly sources?: Told<readonly string[]>;
}

/** A descriptor whose inputs have been named. */
export type Descriptor = Described<Inputs>;

/** A descriptor, its formula checked against the names of its inputs. */
export function described<const I extends Inputs>(descriptor: Described<I>): Descriptor {
  return descriptor as unknown as Descriptor;
}

/** A figure of practice that stands in the code beside what uses it; `name` is its place under `practice`. */
export function practice(
  name: string,
  value: number,
  label: string,
  unit: string,
  source: string,
): Descriptor {
  return {
    path: `practice/${name}`,
    label,
    unit,
    kind: 'preset',
    method: 'figure of practice',
    formula: 'taken as it is',
    value: () => value,
    sources: [source],
  };
}
