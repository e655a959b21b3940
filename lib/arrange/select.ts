import type { CostTable } from '../model/index.ts';
import { pylonsOf, supportsOf, workOut, type Candidate, type Worked } from './candidate.ts';
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

/** Of kinds with rising costs, the first few, and the first two of every number of pylons. */
const worthLooking = (rising: readonly (readonly Candidate[])[], few: number): (readonly Candidate[])[] => {
  const seen = new Map<number, number>();
  return rising.filter(([first], i) => {
    const pylons = pylonsOf(first!.kind);
    const before = seen.get(pylons) ?? 0;
    seen.set(pylons, before + 1);
    return i < few || before < 2;
  });
};

/**
 * Of kinds with rising costs as many as are kept: the cheapest with each number of pylons, for what carries is seen only when
 * they are worked out, then the cheapest of all. No two have as many supports, by which options are known.
 */
function keptOf(rising: readonly Kind[], keep: number): Kind[] {
  const kept: Kind[] = [];
  const isFree = ({ kind }: Kind): boolean =>
    kept.every((other) => supportsOf(other.kind) !== supportsOf(kind));
  const pylons = new Set(rising.map(({ kind }) => pylonsOf(kind)));
  for (const count of pylons)
    kept.push(...rising.filter((one) => pylonsOf(one.kind) === count && isFree(one)).slice(0, 1));
  for (const one of rising) if (isFree(one)) kept.push(one);
  return kept.slice(0, keep);
}

/**
 * The cheapest arrangement of each kind (number of supports and of pylons), the `keep` of those that `keptOf`
 * chooses, cheapest first. The rest is counted by reason.
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
  const byCost = (one: Kind, other: Kind): number => one.worked.cost - other.worked.cost;
  const best = worthLooking([...kinds.values()], 2 * keep).map((same) => bestOf(same, frame, table));
  const kept = keptOf(best.sort(byCost), keep).sort(byCost);
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
