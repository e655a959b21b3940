/** Tells of parts of the page whether they are on the screen or about to be. */
export interface Sight {
  /** Calls `seen` whenever that changes, soon after the call for the first time; returns the way to stop. */
  readonly watch: (part: Element, seen: (isNear: boolean) => void) => () => void;
}

/** How far outside the screen a part still counts as on it. */
const NEAR = '25%';

/** One observer for all parts of a page. */
export function sight(): Sight {
  const told = new WeakMap<Element, (isNear: boolean) => void>();
  const observer = new IntersectionObserver(
    (entries) => {
      // Of several words on one part the last holds.
      const last = new Map(entries.map(({ target, isIntersecting }) => [target, isIntersecting]));
      for (const [part, isNear] of last) told.get(part)?.(isNear);
    },
    { rootMargin: NEAR },
  );
  return {
    watch(part, seen) {
      told.set(part, seen);
      observer.observe(part);
      return () => observer.unobserve(part);
    },
  };
}
