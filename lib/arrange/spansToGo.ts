import { SLACK } from './limits.ts';
import type { UnitTask } from './unitTask.ts';

/** More spans than any layout has. */
const NEVER = 0x3fffffff;

/**
 * Fills `toGo` with the fewest spans from every position to an end with one governing span, whatever they cost: what
 * cannot be reached any more need not be followed. `queue` is working room.
 */
export function spansToGo(task: UnitTask, G: number, toGo: Int32Array, queue: Int32Array): void {
  const { X, limits, firstEnd, lastEnd } = task;
  const least = Math.max(limits.minSpacingM, limits.interiorLeast * G);
  // No narrower than the comparisons of the search itself.
  const slack = 2 * SLACK;
  let near = X.length;
  let nearEnd = X.length;
  let far = X.length - 1;
  // Positions between `near` and `far` that no nearer one undercuts, farthest first.
  let head = 0;
  let tail = 0;
  for (let z = X.length - 1; z >= 0; z -= 1) {
    // The first span of a unit may be as short as its last.
    const shortest = z === 0 ? limits.minSpacingM : least;
    while (near > z + 1 && X[near - 1]! >= X[z]! + shortest - slack) {
      near -= 1;
      while (tail > head && toGo[queue[tail - 1]!]! >= toGo[near]!) tail -= 1;
      queue[tail] = near;
      tail += 1;
    }
    while (nearEnd > z + 1 && X[nearEnd - 1]! >= X[z]! + limits.minSpacingM - slack) nearEnd -= 1;
    while (X[far]! > X[z]! + G + slack) far -= 1;
    while (head < tail && queue[head]! > far) head += 1;
    const isLast = Math.max(nearEnd, firstEnd) <= Math.min(far, lastEnd);
    toGo[z] = isLast ? 1 : head < tail ? Math.min(NEVER, 1 + toGo[queue[head]!]!) : NEVER;
  }
}
