import type { CostTable } from '../model/index.ts';
import { workOut, type Candidate, type Worked } from './candidate.ts';
import type { Counter } from './counter.ts';
import type { Frame } from './frame.ts';

/** Supports within this distance of those of a kept arrangement make no different arrangement, m. */
const NEAR_M = 4;
/** Cheapest estimates of each kind that are worked out to find the best of it. */
const WORKED = 4;

interface Kind {
  readonly kind: number;
  readonly best: Candidate;
  readonly worked: Worked;
}

/** Whether a candidate has its supports where an arrangement of as many units has them, nearly. */
function isNear(frame: Frame, { kind, worked }: Kind, candidate: Candidate): boolean {
  if (candidate.kind !== kind) return false;
  const { X } = frame;
  const { placed } = worked;
  const units = candidate.placed();
  return (
    units.length === placed.length &&
    units.every(({ at }, u) => {
      const other = placed[u]!.at;
      return at.length === other.length && at.every((i, s) => Math.abs(X[i]! - X[other[s]!]!) <= NEAR_M);
    })
  );
}

/** The best of one kind by its true cost; candidates come with rising estimates. */
function bestOf(candidates: readonly Candidate[], frame: Frame, table: CostTable): Kind {
  const tried = candidates
    .slice(0, WORKED)
    .map((best) => ({ kind: best.kind, best, worked: workOut(frame, table, best.placed()) }));
  return tried.reduce((a, b) => (b.worked.cost < a.worked.cost * (1 - 1e-9) ? b : a));
}

/**
 * The cheapest arrangement of each kind (number of supports and of pylons), the `keep` cheapest of those, cheapest
 * first. The rest is counted by reason.
 */
export function select(
  candidates: readonly Candidate[],
  keep: number,
  frame: Frame,
  table: CostTable,
  dropped: Counter,
): Worked[] {
  const kinds = new Map<number, Candidate[]>();
  for (const candidate of [...candidates].sort((a, b) => a.estimate - b.estimate)) {
    const same = kinds.get(candidate.kind);
    if (same === undefined) kinds.set(candidate.kind, [candidate]);
    else same.push(candidate);
  }
  // Kinds come with rising estimates, so the cheapest few by true cost are among the first twice as many.
  const best = [...kinds.values()].slice(0, 2 * keep).map((same) => bestOf(same, frame, table));
  const kept = best.sort((a, b) => a.worked.cost - b.worked.cost).slice(0, keep);
  const keptKinds = new Set(kept.map(({ kind }) => kind));
  for (const [kind, same] of kinds) {
    for (const candidate of same) {
      if (kept.some((other) => other.best === candidate)) continue;
      if (kept.some((other) => isNear(frame, other, candidate)))
        dropped.add(`within ${NEAR_M} m of one kept`);
      else if (keptKinds.has(kind)) dropped.add('dearer than one kept with as many supports');
      else dropped.add('dearer than those kept');
    }
  }
  return kept.map(({ worked }) => worked);
}
