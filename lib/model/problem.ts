/** Bad input, as data. Sentences are made in `lib/messages`. */
export interface Problem {
  readonly code: ProblemCode;
  /** Where: keys and indices from the root of the study, or a command-line option. */
  readonly path: readonly (string | number)[];
  readonly expected: string;
  readonly received: string;
  readonly unit?: string;
  readonly remedy: string;
}

export type ProblemCode =
  | 'not-json'
  | 'too-large'
  | 'wrong-format'
  | 'newer-version'
  | 'missing'
  | 'wrong-type'
  | 'unknown-key'
  | 'not-in-list'
  | 'too-small'
  | 'too-large-value'
  | 'reversed'
  | 'outside'
  | 'does-not-sum'
  | 'refused';

/** Either the value or the problems that stopped it. */
export type Result<T> =
  | { readonly ok: true; readonly value: T }
  | { readonly ok: false; readonly problems: readonly Problem[] };
