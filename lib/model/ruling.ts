import type { FormId } from './ids.ts';

/** What a fact may hold; the word 'unknown' stands for what nobody knows yet, and stays unknown. */
export type FactValue = number | boolean | string;
export type Facts = Readonly<Record<string, FactValue>>;

export type Effect = 'out' | 'caution' | 'in favour' | 'to confirm';
export type AskedOf = 'form' | 'arrangement' | 'option';

/** What a rule says of a form, an arrangement or an option. */
export interface Ruling {
  readonly rule: string;
  readonly effect: Effect;
  readonly because: readonly string[];
  /** Citation as it is printed, e.g. 'Khan 2010, table 1.2 (read)'. */
  readonly source: string;
  readonly flip?: Flip;
}

/** The nearest change of one fact that would turn the ruling. */
export interface Flip {
  readonly fact: string;
  readonly from: number;
  readonly to: number;
  readonly unit: string;
}

/** A form or arrangement that was not worked out. */
export interface Dropped {
  readonly form: FormId;
  /** Number of an option kept by hand that cannot be worked out; absent where a whole form is dropped. */
  readonly option?: number;
  readonly because: readonly string[];
}
