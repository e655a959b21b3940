import { SLACK } from './limits.ts';
import type { MainSearch } from './mainSearch.ts';

/** Main units of one simple span: every pair of places whose span lies in the band, with every approach kept for them. */
export function simpleLayouts(search: MainSearch): void {
  const { X, limits, left, right, toLeft, toRight, half, table, request } = search;
  const last = X.length - 1;
  const deck = new Map<number, number>();
  const deckOf = (spanM: number): number => {
    let cost = deck.get(spanM);
    if (cost === undefined) {
      cost = spanM * table.deckPerM(request.form, spanM, spanM) + table.unitFixed(request.form, spanM);
      deck.set(spanM, cost);
    }
    return cost;
  };
  for (const a of left) {
    for (const b of right) {
      const mainM = X[b]! - X[a]!;
      if (!(mainM >= limits.minSpanM - SLACK && mainM <= limits.maxSpanM + SLACK)) continue;
      const befores = toLeft[a]!;
      const afters = toRight[b]!;
      if (befores.length === 0 || afters.length === 0) {
        search.noApproach();
        continue;
      }
      const ends = (a > 0 ? half(a, mainM) : 0) + (b < last ? half(b, mainM) : 0);
      const own = deckOf(Math.round(mainM * 1000) / 1000) + ends;
      for (const before of befores) {
        for (const after of afters) {
          search.offer({
            at: [a, b],
            pylons: [],
            mainM,
            cost: own + before.cost + after.cost,
            before,
            after,
          });
        }
      }
    }
  }
}
