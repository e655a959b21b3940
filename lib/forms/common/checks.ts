import type { Check } from '../../model/index.ts';

/**
 * One limit state. `demand` and `capacity` in `unit`; a capacity of 0 or less under a positive demand gives an
 * infinite utilisation, no demand gives 0.
 */
export function check(id: string, label: string, demand: number, capacity: number, unit: string): Check {
  const utilisation = demand <= 0 ? 0 : capacity > 0 ? demand / capacity : Infinity;
  return { id, label, demand, capacity, unit, utilisation };
}

/** The check with the highest utilisation; of equals the first. Throws a `RangeError` on an empty list. */
export function limiting(checks: readonly Check[]): Check {
  const [first, ...rest] = checks;
  if (first === undefined) throw new RangeError('limiting: expected at least one check, received none');
  return rest.reduce((worst, next) => (next.utilisation > worst.utilisation ? next : worst), first);
}
