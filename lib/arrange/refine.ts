import type { Approach } from './approaches.ts';
import type { MainLayout, MainSearch } from './mainSearch.ts';

/** Layouts that are refined: the cheapest of this many kinds. */
const KINDS = 24;
const ROUNDS = 6;

const withSpans = (list: readonly Approach[], spans: number): Approach | undefined =>
  list.find((approach) => approach.spans === spans);

/** Layouts to refine: the cheapest of each kind (pylons, spans of either approach), the cheapest kinds first. */
function bestOfKinds(layouts: Iterable<MainLayout>): MainLayout[] {
  const kinds = new Map<string, MainLayout>();
  for (const layout of layouts) {
    const kind = `${layout.pylons.join()} ${layout.before.spans} ${layout.after.spans}`;
    const known = kinds.get(kind);
    if (known === undefined || layout.cost < known.cost * (1 - 1e-9)) kinds.set(kind, layout);
  }
  return [...kinds.values()].sort((a, b) => a.cost - b.cost).slice(0, KINDS);
}

/** The same layout with its supports moved, or null where it cannot stand or is no cheaper. */
function cheaper(search: MainSearch, layout: MainLayout, at: readonly number[]): MainLayout | null {
  const before = withSpans(search.toLeft[at[0]!] ?? [], layout.before.spans);
  const after = withSpans(search.toRight[at.at(-1)!] ?? [], layout.after.spans);
  if (before === undefined || after === undefined) return null;
  const own = search.ownCost(at, layout.pylons);
  const cost = own === null ? Infinity : own.cost + before.cost + after.cost;
  if (own === null || !(cost < layout.cost * (1 - 1e-9))) return null;
  return { ...layout, at, mainM: own.mainM, cost, before, after };
}

/** Supports of a row that move together, first and last: each alone, neighbours, all. */
function movers(count: number): (readonly [first: number, last: number])[] {
  const list: (readonly [number, number])[] = [];
  for (let s = 0; s < count; s += 1) list.push([s, s]);
  for (let s = 1; s < count; s += 1) list.push([s - 1, s]);
  if (count > 2) list.push([0, count - 1]);
  return list;
}

const rises = (at: readonly number[]): boolean => at.every((i, s) => s === 0 || i > at[s - 1]!);

/**
 * Where places were tried with gaps of `stride` positions, moves the supports of the best layouts in steps that halve
 * down to one position as long as that makes them cheaper, and offers the result.
 */
export function refine(search: MainSearch, layouts: Iterable<MainLayout>, stride: number): void {
  if (stride < 2) return;
  for (const start of bestOfKinds(layouts)) {
    let best = start;
    const together = movers(start.at.length);
    for (let step = Math.ceil(stride / 2); ; step = Math.ceil(step / 2)) {
      for (let round = 0; round < ROUNDS; round += 1) {
        let better: MainLayout | null = null;
        for (const by of [-step, step]) {
          for (const [first, last] of together) {
            const at = best.at.map((i, s) => (s >= first && s <= last ? i + by : i));
            if (rises(at)) better = cheaper(search, better ?? best, at) ?? better;
          }
        }
        if (better === null) break;
        best = better;
      }
      if (step === 1) break;
    }
    if (best !== start) search.offer(best);
  }
}
