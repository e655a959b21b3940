import type { SpanCosts } from './curves.ts';
import { SLACK as sameShare } from './limits.ts';

/** Read once: the loop below compares millions of spans. */
const SLACK = sameShare;

/** Piers that layouts reach, rising and side by side: the loops that run over them read nothing else. */
export interface Places {
  count: number;
  /** Index among the candidate positions, and the position, m. */
  readonly at: Int32Array;
  readonly x: Float64Array;
  /** Cheapest way there with half the pier, and with what the other half costs before its span counts; its cost per metre. */
  readonly cost: Float64Array;
  readonly reached: Float64Array;
  readonly perM: Float64Array;
  /** Where that way comes from: a place among those one span before. */
  readonly from: Int32Array;
}

/** Room for at most `n` places. */
export function placesFor(n: number): Places {
  return {
    count: 0,
    at: new Int32Array(n),
    x: new Float64Array(n),
    cost: new Float64Array(n),
    reached: new Float64Array(n),
    perM: new Float64Array(n),
    from: new Int32Array(n),
  };
}

/** A way onto a position: from which place, and what it costs without the support there that does not grow with its span. */
export interface Onto {
  from: number;
  cost: number;
}

/** The cheapest span from any of the places low..high onto a position, left in `onto`; infinite where there is none. */
export function cheapestOnto(
  places: Places,
  low: number,
  high: number,
  deck: SpanCosts,
  position: number,
  halfPerM: number,
  onto: Onto,
): void {
  const { reached, x, perM } = places;
  let best = Infinity;
  let from = -1;
  for (let p = high; p >= low; p -= 1) {
    const s = position - x[p]!;
    const i = s | 0;
    const onDeck = deck[i]! + (s - i) * (deck[i + 1]! - deck[i]!);
    const v = reached[p]! + onDeck + (perM[p]! + halfPerM) * s;
    if (v < best && v < best - SLACK * v) {
      best = v;
      from = p;
    }
  }
  onto.from = from;
  onto.cost = best;
}
