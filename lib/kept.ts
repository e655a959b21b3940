/** Values kept under the text of everything they were made from. */
export interface Kept<T> {
  readonly get: (key: string) => T | undefined;
  /** Keeps a value and hands it back. */
  readonly put: (key: string, value: T) => T;
}

/** An empty store of at most `most` values; the oldest are forgotten first. */
export function kept<T>(most: number): Kept<T> {
  const known = new Map<string, T>();
  return {
    get: (key) => known.get(key),
    put(key, value) {
      if (known.size >= most) {
        const oldest = known.keys().next();
        if (!oldest.done) known.delete(oldest.value);
      }
      known.set(key, value);
      return value;
    },
  };
}

/** The value kept under a key; made and kept where there is none yet. */
export function remembered<T>(store: Kept<T>, key: string, make: () => T): T {
  return store.get(key) ?? store.put(key, make());
}
