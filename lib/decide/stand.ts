import type { Books, Budget, Standing, Unknown } from '../model/index.ts';
import { because } from './because.ts';
import type { Contender } from './contender.ts';
import { groupsOf } from './groupsOf.ts';
import { oddsMatrix } from './oddsMatrix.ts';

/**
 * Where the options stand on cost: order by median, odds on common draws, groups of those that no rule puts out that cannot
 * be separated, chance within the budget, and the leader: the cheapest median among the options that no rule puts out. Nothing here looks at more than two
 * options at once, so adding or removing one never reorders the others.
 * Throws a RangeError when the options were not priced on the same number of draws or share a number.
 */
export function stand(
  options: readonly Contender[],
  books: Pick<Books, 'unseparated' | 'currency'>,
  budget: Budget | Unknown,
): Standing {
  check(options);
  const ordered = [...options].sort((a, b) => a.p50 - b.p50 || a.number - b.number);
  const odds = oddsMatrix(ordered);
  // An option that a rule puts out competes with none: it has odds, but stands in no group.
  const inPlay = ordered.filter(({ status }) => status !== 'out');
  const order = inPlay.map(({ number }) => number);
  const groups = groupsOf(order, odds, books.unseparated);
  const within: Record<number, number> = {};
  if (budget !== 'unknown') {
    for (const { number, totals } of ordered) within[number] = shareWithin(totals, budget.amount);
  }
  const leader = inPlay[0] ?? null;
  return {
    leader: leader?.number ?? null,
    groups,
    odds,
    within,
    because: because({ ordered, leader, odds, within, books, budget }),
  };
}

function check(options: readonly Contender[]): void {
  const draws = options[0]?.totals.length ?? 0;
  const seen = new Set<number>();
  for (const { number, totals, p50 } of options) {
    if (totals.length !== draws || draws === 0) {
      throw new RangeError(
        `option ${number}: expected ${draws} draws as the others, received ${totals.length}; price all on one set of draws`,
      );
    }
    if (!Number.isFinite(p50)) throw new RangeError(`option ${number}: expected a cost, received ${p50}`);
    if (seen.has(number))
      throw new RangeError(`option ${number}: expected each number once, received it twice`);
    seen.add(number);
  }
}

function shareWithin(totals: Float64Array, amount: number): number {
  let count = 0;
  for (const total of totals) if (total <= amount) count++;
  return count / totals.length;
}
