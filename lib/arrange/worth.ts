/** Costs of the best layouts by number of spans, from which the cost follows that is no longer worth following. */
export interface Worth {
  readonly add: (spans: number, cost: number) => void;
  readonly boundCost: () => number;
}

/** More kinds than are wanted are followed, and somewhat dearer ones: the true cost on the table may change their order. */
const MORE_KINDS = 2;
const MORE_COST = 1.02;

/** Nothing known yet; the layouts of `keep` numbers of spans are wanted. */
export function worthOf(keep: number): Worth {
  const best = new Map<number, number>();
  return {
    add: (spans, cost) => void best.set(spans, Math.min(cost, best.get(spans) ?? Infinity)),
    boundCost: () => {
      const costs = [...best.values()].sort((a, b) => a - b);
      return MORE_COST * (costs[keep + MORE_KINDS - 1] ?? Infinity);
    },
  };
}
