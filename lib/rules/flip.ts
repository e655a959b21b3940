import type { Facts, Flip } from '../model/index.ts';
import { factValue, truthOf } from './evaluate.ts';
import { fact as factById } from './book.ts';
import { factsIn, limitsOn } from './limitsOn.ts';
import type { Condition } from './rule.ts';

/** Removes the noise of binary fractions that stepping off a limit would leave (0.5 - 0.01 = 0.49). */
const tidy = (x: number): number => Number(x.toPrecision(12));

/**
 * How large a change is, for ranking changes of facts in different units: relative to the larger of the two values.
 */
const size = (from: number, to: number): number =>
  Math.abs(to - from) / Math.max(Math.abs(from), Math.abs(to));

/**
 * The nearest change of one known, finite, numeric fact after which `outcome` differs, all other facts staying.
 * Exact, because an outcome that is made of conditions can only change at their limits: each limit and the next value
 * on the fact's step to either side of it are tried.
 *
 * @param conditions every condition the outcome is made of
 * @param outcome what must change, e.g. the truth of a rule; compared with `===`. `undefined` never counts as a change
 * @returns undefined where no single fact changes it
 */
export function nearestChange(
  conditions: readonly Condition[],
  facts: Facts,
  outcome: (facts: Facts) => boolean | string | undefined,
): Flip | undefined {
  const now = outcome(facts);
  if (now === undefined) return undefined;
  let best: Flip | undefined;
  let least = Infinity;
  for (const id of new Set(conditions.flatMap(factsIn))) {
    const from = factValue(facts, id);
    if (typeof from !== 'number' || !Number.isFinite(from)) continue;
    const { step = 0, unit } = factById(id);
    const limits = new Set(conditions.flatMap((condition) => limitsOn(condition, id, facts)));
    const changes = [...limits]
      .flatMap((limit) => [limit, tidy(limit - step), tidy(limit + step)])
      .filter((to) => to !== from)
      .sort((a, b) => Math.abs(a - from) - Math.abs(b - from));
    const changed: Record<string, Facts[string]> = { ...facts };
    // Of one fact the nearest value, of several facts the one that changes by the least share of itself.
    const to = changes.find((value) => {
      changed[id] = value;
      const then = outcome(changed);
      return then !== undefined && then !== now;
    });
    if (to === undefined || !(size(from, to) < least)) continue;
    least = size(from, to);
    best = { fact: id, from, to, unit };
  }
  return best;
}

/**
 * The nearest single numeric change that turns a condition from true to false or back, through all, any and not.
 *
 * @returns undefined where the condition is unknown, or where no single known number can turn it
 */
export function flip(condition: Condition, facts: Facts): Flip | undefined {
  return nearestChange([condition], facts, (changed) => {
    const truth = truthOf(condition, changed);
    return truth === 'unknown' ? undefined : truth;
  });
}
