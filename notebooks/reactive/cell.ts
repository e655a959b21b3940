/** Carries the type of a cell's value; it exists for the compiler only. */
declare const valueType: unique symbol;

/** A cell of the graph as its users see it: a name, a kind and the type of its value. */
export interface Cell<out T> {
  readonly name: string;
  readonly kind: 'input' | 'cell' | 'slow';
  readonly [valueType]?: T;
}

/** A cell whose value is set from outside. */
export interface Input<out T> extends Cell<T> {
  readonly kind: 'input';
}

/** What a cell uses, by the name its run knows it under. */
export type Uses = Readonly<Record<string, Cell<unknown>>>;

/** The values of those cells, under the same names. */
export type Values<U extends Uses> = { readonly [K in keyof U]: U[K] extends Cell<infer T> ? T : never };

/** How far a slow run has come: `done` of `of` steps, and what it is doing in words. */
export interface Progress {
  readonly done: number;
  readonly of: number;
  readonly what: string;
}

/**
 * What a cell has to show. A pending cell keeps its last good value, if it ever had one, and a slow one tells how far
 * its run has come; a failed cell keeps the original error, the name of the cell that raised it, and the last good value.
 */
export type State<T> =
  | { readonly state: 'pending'; readonly value?: T; readonly progress?: Progress }
  | { readonly state: 'ready'; readonly value: T }
  | { readonly state: 'failed'; readonly error: unknown; readonly raisedBy: string; readonly value?: T };

/** Whether two values are the same to whoever uses them. */
export type Equal<T> = (a: T, b: T) => boolean;

/** What a slow run is handed besides its values. */
export interface SlowRun {
  /** Aborted as soon as nobody waits for the result any more. */
  readonly signal: AbortSignal;
  /** Tells how far the run has come; words after the abort are ignored. */
  readonly report: (progress: Progress) => void;
  /**
   * Hands on what there is of the result so far, a value of the type that the run ends with, which the compiler cannot tell
   * here; the cell stays pending. After the end or the abort it is ignored.
   */
  readonly handOn: (part: unknown) => void;
}

/** `latest`: a new run aborts the old one. `progress`: the running one finishes and only the newest waits. */
export type Policy = 'latest' | 'progress';
