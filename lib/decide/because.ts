import type { Books, Budget, Unknown } from '../model/index.ts';
import type { Contender } from './contender.ts';
import { sayMoney, sayOdds } from './words.ts';

interface Case {
  readonly ordered: readonly Contender[];
  readonly leader: Contender | null;
  readonly odds: Readonly<Record<number, Readonly<Record<number, number>>>>;
  readonly within: Readonly<Record<number, number>>;
  readonly books: Pick<Books, 'unseparated' | 'currency'>;
  readonly budget: Budget | Unknown;
}

/** Reasons for the standing in plain sentences; figures to two significant figures, odds in steps of 5 %. */
export function because(given: Case): string[] {
  const { ordered, leader, odds, within, books, budget } = given;
  if (ordered.length === 0) return ['No option has been worked out.'];
  if (leader === null) return ['No option leads: every one is put out by a rule.'];
  const sentences: string[] = [];
  const money = (amount: number): string => sayMoney(amount, books.currency);
  sentences.push(
    `Option ${leader.number} has the lowest median cost of the options not ruled out, ${money(leader.p50)}.`,
  );
  const [low, high] = books.unseparated;
  const rivals = ordered.filter((option) => option !== leader && option.status !== 'out');
  for (const rival of rivals.slice(0, 3)) {
    const chance = odds[leader.number]![rival.number]!;
    const head = `It is cheaper than option ${rival.number} in ${sayOdds(chance)} of the draws`;
    sentences.push(
      chance >= low && chance <= high ? `${head}: the two cannot be separated on cost.` : `${head}.`,
    );
  }
  for (const cheaper of ordered.slice(0, ordered.indexOf(leader))) {
    sentences.push(
      `Option ${cheaper.number} has a lower median, ${money(cheaper.p50)}, but a rule puts it out.`,
    );
  }
  if (budget === 'unknown') sentences.push('No budget is given.');
  else {
    sentences.push(
      `The chance that it stays within the budget of ${money(budget.amount)} is ${sayOdds(within[leader.number]!)}.`,
    );
  }
  return sentences;
}
