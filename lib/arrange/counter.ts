import type { DroppedCount, FormId } from '../model/index.ts';

/** Counts dropped arrangements by reason, in the order in which reasons first come up. */
export interface Counter {
  add(reason: string, count?: number): void;
  list(form: FormId): DroppedCount[];
}

/** An empty counter. */
export function counter(): Counter {
  const counts = new Map<string, number>();
  return {
    add: (reason, count = 1) => void counts.set(reason, (counts.get(reason) ?? 0) + count),
    list: (form) => [...counts].map(([reason, count]) => ({ form, reason, count })),
  };
}
