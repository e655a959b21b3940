import type { CostTable, Site } from '../model/index.ts';
import { workOut, type PlacedUnit, type Worked } from './candidate.ts';
import { faultsOf } from './faults.ts';
import type { Frame } from './frame.ts';
import type { ArrangeRequest } from './request.ts';

const ROUNDS = 8;
/** Arrangements with more supports are left as the search found them: it is near enough there and time is short. */
const MOST_SUPPORTS = 16;
const STEPS = [-8, -3, -1, 1, 3, 8];

function moved(placed: readonly PlacedUnit[], from: number, to: number): PlacedUnit[] {
  return placed.map((unit) => ({ ...unit, at: unit.at.map((i) => (i === from ? to : i)) }));
}

/** A support more in the span beyond a pylon, at position `i`; null where it does not fall into such a span. */
function anchored(placed: readonly PlacedUnit[], i: number): PlacedUnit[] | null {
  const u = placed.findIndex(({ at, pylons }) => pylons !== undefined && at[0]! < i && at.at(-1)! > i);
  const unit = placed[u];
  if (unit?.pylons === undefined) return null;
  const { at, pylons } = unit;
  const before = at.filter((j) => j < i).length;
  if (at.includes(i) || at.length - pylons.length > 2) return null;
  const main = pylons.length === 2 ? before === 2 : isMain(at, pylons[0]!, before);
  if (main) return null;
  const more = {
    ...unit,
    at: [...at.slice(0, before), i, ...at.slice(before)],
    pylons: pylons.map((p) => (p >= before ? p + 1 : p)),
  };
  return placed.map((other, o) => (o === u ? more : other));
}

/** Whether the gap that ends on support `before` is the longer side of a single pylon. */
function isMain(at: readonly number[], pylon: number, before: number): boolean {
  const left = at[pylon]! - at[0]!;
  const right = at.at(-1)! - at[pylon]!;
  return before <= pylon === left > right;
}

/**
 * Moves single supports, and tries an anchor pier in the span beyond a pylon, as long as the true cost on the table
 * falls: makes up for the split of support costs and the grid of governing spans in the search.
 */
export function polish(
  start: Worked,
  request: ArrangeRequest,
  frame: Frame,
  site: Site,
  table: CostTable,
): Worked {
  let best = start;
  const last = frame.X.length - 1;
  const attempt = (placed: readonly PlacedUnit[]): boolean => {
    const candidate = workOut(frame, table, placed);
    if (!(candidate.cost < best.cost * (1 - 1e-9)) || faultsOf(candidate.units, request, site).length > 0)
      return false;
    best = candidate;
    return true;
  };
  const inner = (): number[] =>
    [...new Set(best.placed.flatMap(({ at }) => at))].filter((i) => i > 0 && i < last);
  if (inner().length > MOST_SUPPORTS) return best;
  for (let round = 0; round < ROUNDS; round += 1) {
    let better = false;
    for (const i of inner()) {
      let at = i;
      for (const step of STEPS) {
        const to = at + step;
        const clash = inner().some((j) => j !== at && (j < at ? j >= to : j <= to));
        if (to < 1 || to >= last || clash) continue;
        if (attempt(moved(best.placed, at, to))) {
          at = to;
          better = true;
        }
      }
    }
    if (!better) break;
  }
  if (request.pattern.kind === 'pylon') {
    const stride = Math.max(1, Math.floor(last / 60));
    const found = best.placed;
    for (let i = stride; i < last; i += stride) {
      const placed = anchored(found, i);
      if (placed !== null) attempt(placed);
    }
  }
  return best;
}
