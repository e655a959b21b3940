/**
 * The ages at which a value is right, both ends included. An age is the number of passes that changed an input;
 * `until` is Infinity while nothing above the value has changed since, and a life with `until < since` is empty.
 */
export interface Life {
  readonly since: number;
  readonly until: number;
  /** True for what a run has handed on before its end, and for all that is made of it: more of it is to come. */
  readonly isPart?: boolean;
}

/** The life of a cell that has never had a value. */
export const unborn: Life = { since: 0, until: -1 };

/** Whether there is an age in the life. */
export function isLived(life: Life): boolean {
  return life.until >= life.since;
}

/** Whether the value still answers to the newest inputs and is all there is; a cell for which that is not so is pending. */
export function isCurrent(life: Life): boolean {
  return life.until === Infinity && life.isPart !== true;
}

/** The same ages, as those of a part. */
export const asPart = (life: Life): Life => ({ ...life, isPart: true });

/** The ages shared by all the lives; every age when there is none. Empty when two of them never met. */
export function commonLife(lives: readonly Life[]): Life {
  let since = 0;
  let until = Infinity;
  let isPart = false;
  for (const life of lives) {
    since = Math.max(since, life.since);
    until = Math.min(until, life.until);
    isPart ||= life.isPart === true;
  }
  return { since, until, isPart };
}

/** The life of a value that was right during `before` and is right again during `now`: joined when they touch. */
export function joinLives(before: Life, now: Life): Life {
  const touching = isLived(before) && before.until + 1 >= now.since;
  return touching ? { ...now, since: Math.min(before.since, now.since) } : now;
}
