/** Work that pauses where it may be interrupted, and ends with its result. */
export type Work<T> = Generator<undefined, T, unknown>;

/** Does the work at one go; throws what it throws. */
export function finish<T>(work: Generator<unknown, T, unknown>): T {
  for (;;) {
    const next = work.next();
    if (next.done) return next.value;
  }
}

/** The same work, saying at each pause the one thing that there is to say of it. */
export function* saying<S, T>(what: S, work: Work<T>): Generator<S, T, unknown> {
  for (;;) {
    const next = work.next();
    if (next.done) return next.value;
    yield what;
  }
}
