import { loadStandard } from '../actions/index.ts';
import { supportUpliftKN } from '../forms/index.ts';
import type { Design } from '../model/index.ts';

/**
 * A sentence for each support that the deck of a unit lifts from at the ultimate limit state: permanent load with the factor
 * that is worse for it, traffic where it lifts.
 */
export function liftedSupports({ task, reactions }: Pick<Design, 'task' | 'reactions'>): string[] {
  const { uls } = loadStandard(task.standard).factors;
  return reactions.flatMap((reaction, i) => {
    const upliftMN = supportUpliftKN(reaction, uls) / 1000;
    if (!(upliftMN > 0)) return [];
    const support =
      i === 0 ? 'The first support' : i === reactions.length - 1 ? 'The last support' : `Support ${i + 1}`;
    return [
      `${support} is pulled up by ${upliftMN.toFixed(2)} MN at the ultimate limit: tied down or weighted.`,
    ];
  });
}
