import type { Equal } from './cell.ts';

/** What came of a run. Dependants compare outcomes by identity, so an unchanged value must keep its outcome. */
export type Outcome<T> =
  | { readonly kind: 'none' }
  | { readonly kind: 'good'; readonly value: T }
  | {
      readonly kind: 'bad';
      readonly error: unknown;
      readonly raisedBy: string;
      readonly lastGood: Good<T> | undefined;
    };

type Good<T> = Extract<Outcome<T>, { kind: 'good' }>;
export type Bad<T> = Extract<Outcome<T>, { kind: 'bad' }>;

export const nothingYet: Outcome<never> = { kind: 'none' };

/** The outcome that holds the value to show: the outcome itself when good, the last good one after a failure. */
export function lastGood<T>(outcome: Outcome<T>): Good<T> | undefined {
  if (outcome.kind === 'good') return outcome;
  return outcome.kind === 'bad' ? outcome.lastGood : undefined;
}

/** The outcome of a failure, raised in the cell called `raisedBy`, after `before`. */
export function failure<T>(before: Outcome<T>, error: unknown, raisedBy: string): Bad<T> {
  return { kind: 'bad', error, raisedBy, lastGood: lastGood(before) };
}

/** Runs `produce` for the cell called `name`; a value equal to the one before keeps the outcome before. */
export function outcomeOf<T>(
  name: string,
  before: Outcome<T>,
  produce: () => T,
  equal: Equal<T>,
): Outcome<T> {
  try {
    const value = produce();
    return before.kind === 'good' && equal(before.value, value) ? before : { kind: 'good', value };
  } catch (error) {
    return failure(before, error, name);
  }
}
