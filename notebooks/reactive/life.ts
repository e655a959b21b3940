/**
 * The ages at which a value is right, both ends included. An age is the number of passes that changed an input;
 * `until` is Infinity while nothing above the value has changed since, and a life with `until < since` is empty.
 */
export interface Life {
  readonly since: number;
  readonly until: number;
}

/** The life of a cell that has never had a value. */
export const unborn: Life = { since: 0, until: -1 };

/** Whether there is an age in the life. */
export function isLived(life: Life): boolean {
  return life.until >= life.since;
}

/** Whether the value still answers to the newest inputs; a cell whose life is over is pending. */
export function isCurrent(life: Life): boolean {
  return life.until === Infinity;
}

/** The ages shared by all the lives; every age when there is none. Empty when two of them never met. */
export function commonLife(lives: readonly Life[]): Life {
  let since = 0;
  let until = Infinity;
  for (const life of lives) {
    since = Math.max(since, life.since);
    until = Math.min(until, life.until);
  }
  return { since, until };
}

/** The life of a value that was right during `before` and is right again during `now`: joined when they touch. */
export function joinLives(before: Life, now: Life): Life {
  const touching = isLived(before) && before.until + 1 >= now.since;
  return touching ? { since: Math.min(before.since, now.since), until: now.until } : now;
}
