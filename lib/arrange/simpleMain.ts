import { SLACK } from './limits.ts';
import type { MainSearch } from './mainSearch.ts';

/** Deck, fixed cost and supports of one simple span from position a to b; null outside its band. */
export function simpleCost(
  search: MainSearch,
  a: number,
  b: number,
): { readonly cost: number; readonly mainM: number } | null {
  const { X, limits, half } = search;
  if (a > search.latestLeft || b < search.earliestRight) return null;
  const mainM = X[b]! - X[a]!;
  if (!(mainM >= limits.minSpanM - SLACK && mainM <= limits.maxSpanM + SLACK)) return null;
  const piers = (a > 0 ? half(a, mainM) : 0) + (b < X.length - 1 ? half(b, mainM) : 0);
  return { cost: search.spanAlone(mainM) + piers, mainM };
}

/** Main units of one simple span: every pair of places whose span lies in the band, with every approach kept for them. */
export function simpleLayouts(search: MainSearch): void {
  const { left, right, toLeft, toRight } = search;
  for (const a of left) {
    if (search.isEnough()) return;
    for (const b of right) {
      if (b <= a) continue;
      const own = simpleCost(search, a, b);
      if (own === null) continue;
      const befores = toLeft[a]!;
      const afters = toRight[b]!;
      if (befores.length === 0 || afters.length === 0) {
        search.noApproach();
        continue;
      }
      const { mainM } = own;
      for (const before of befores) {
        for (const after of afters) {
          const cost = own.cost + before.cost + after.cost;
          if (!search.wants(0, before.spans + after.spans + 1, mainM, cost)) continue;
          search.offer({ at: [a, b], pylons: [], mainM, cost, before, after });
        }
      }
    }
  }
}
