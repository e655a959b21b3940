import type { Hold } from './hold.ts';

/** What drawings have reached since something was taken hold of. */
const reached = new WeakMap<Hold, Map<string, readonly [low: number, high: number]>>();

/**
 * Range of a drawing while something is in hand: it grows, by whole steps, but does not shrink until that is let go, so
 * that what is not moved stands still under the pointer and need not be painted again.
 * @param drawing what the range is of, one name for each
 * @param step how much it grows at a time, in the unit of the range, > 0
 */
export function rangeWhileHeld(
  hold: Hold | null | undefined,
  drawing: string,
  [low, high]: readonly [low: number, high: number],
  step: number,
): readonly [low: number, high: number] {
  if (hold === null || hold === undefined) return [low, high];
  let drawings = reached.get(hold);
  if (drawings === undefined) reached.set(hold, (drawings = new Map<string, readonly [number, number]>()));
  const last = drawings.get(drawing) ?? [low, high];
  const beyond = (by: number): number => Math.max(0, Math.ceil(by / step)) * step;
  const now = [last[0] - beyond(last[0] - low), last[1] + beyond(high - last[1])] as const;
  drawings.set(drawing, now);
  return now;
}
