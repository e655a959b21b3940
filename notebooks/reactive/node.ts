import { signal } from '@preact/signals-core';
import type { Signal } from '@preact/signals-core';
import type { Cell, Equal, Progress } from './cell.ts';
import { commonLife, isLived, joinLives, unborn } from './life.ts';
import type { Life } from './life.ts';
import { nothingYet } from './outcome.ts';
import type { Bad, Outcome } from './outcome.ts';

/** An outcome and the ages at which it is right. */
export interface Mark<T> {
  readonly outcome: Outcome<T>;
  readonly life: Life;
}

/** A cell as the graph sees it. */
export interface Node<T> extends Cell<T> {
  readonly uses: readonly Node<unknown>[];
  readonly mark: Signal<Mark<T>>;
  readonly progress: Signal<Progress | undefined>;
  /** Whether two values are the same to whoever uses the cell. */
  equal(a: T, b: T): boolean;
  /** Brings the cell to the age of what it uses: called once in every pass, in definition order. */
  readonly advance: () => void;
  /** Whether a run that has not been aborted is under way. */
  readonly isBusy: () => boolean;
  /** Aborts the run under way, if any. */
  readonly abort: () => void;
}

/** The parts every kind of cell starts with: no value yet, nothing under way, nothing to do in a pass. */
export function blankNode<T, K extends Cell<T>['kind']>(
  name: string,
  kind: K,
  uses: readonly Node<unknown>[],
  equal: Equal<T>,
): Node<T> & { readonly kind: K } {
  return {
    name,
    kind,
    uses,
    equal,
    mark: signal<Mark<T>>({ outcome: nothingYet, life: unborn }),
    progress: signal<Progress | undefined>(undefined),
    advance: () => undefined,
    isBusy: () => false,
    abort: () => undefined,
  };
}

/** What one pass finds above a cell: the outcomes of what it uses and the ages they have in common. */
export interface Above {
  readonly outcomes: readonly Outcome<unknown>[];
  readonly lives: readonly Life[];
  readonly life: Life;
}

/** Looks at what `uses` hold now. */
export function lookUp(uses: readonly Node<unknown>[]): Above {
  const marks = uses.map((node) => node.mark.peek());
  const lives = marks.map((mark) => mark.life);
  return { outcomes: marks.map((mark) => mark.outcome), lives, life: commonLife(lives) };
}

/** Whether a value made from the outcomes `used` answers to what is above now. */
export function isMadeFrom(used: readonly Outcome<unknown>[] | undefined, above: Above): boolean {
  return used !== undefined && used.every((outcome, i) => outcome === above.outcomes[i]);
}

/**
 * The life, after a look at what is above, of something made from the outcomes `used`. While those still stand it
 * lives as long as they have an age in common; otherwise it ended before the first of them was replaced.
 */
export function carriedLife(life: Life, used: readonly Outcome<unknown>[] | undefined, above: Above): Life {
  if (used === undefined) return life;
  if (isLived(above.life) && isMadeFrom(used, above)) return above.life;
  const ends = above.lives.map(({ since }, i) => (used[i] === above.outcomes[i] ? Infinity : since - 1));
  return { ...life, until: Math.min(life.until, ...ends) };
}

/** Puts outcome and life into the node; an outcome that stays keeps its age, and when both stay nobody is stirred. */
export function putMark<T>(node: Node<T>, outcome: Outcome<T>, life: Life): void {
  const before = node.mark.peek();
  const joined = before.outcome === outcome ? joinLives(before.life, life) : life;
  const { since, until, isPart = false } = before.life;
  const same = since === joined.since && until === joined.until && isPart === (joined.isPart ?? false);
  if (before.outcome !== outcome || !same) node.mark.value = { outcome, life: joined };
}

/** The failure above that passes on: that of the cell named first among those used. */
export function failureAbove(above: Above): Bad<unknown> | undefined {
  return above.outcomes.find((outcome) => outcome.kind === 'bad');
}

/** The good values above, under the names the run knows them by. */
export function valuesAbove(keys: readonly string[], above: Above): Record<string, unknown> {
  const values: Record<string, unknown> = {};
  above.outcomes.forEach((outcome, i) => {
    if (outcome.kind === 'good') values[keys[i]!] = outcome.value;
  });
  return values;
}
