/** Shares of the greatest eccentricity at the low points of end spans and of inner spans, and over the piers. */
export type Drape = readonly [endSpan: number, innerSpan: number, pier: number];

const coarse = [0, 0.2, 0.4, 0.6, 0.8, 1] as const;
const firstStep = 0.1;
const startedStep = 0.05;
const finest = 0.02;
/** Of the grid so many drapes are gone on from. */
const regions = 4;

/** What is asked of a drape. */
export interface DrapeAsked {
  /** Force that a drape needs, kN, Infinity where none will do; one that is `enough` or more may be said as soon as that is known. */
  readonly need: (drape: Drape, enough: number) => number;
  /** Whether the concrete bears a drape with that force on the day of stressing. */
  readonly bears: (drape: Drape, forceKN: number) => boolean;
}

/** A drape with the force it needs, and whether the concrete bears that on the day of stressing. */
export interface LeastForce {
  readonly drape: Drape;
  readonly forceKN: number;
  readonly isBorne: boolean;
}

/**
 * Drape that needs the least force of those the concrete bears, of all where it bears none: the best of a coarse grid, each
 * followed by steps round it, halved where none is better. The force is the largest of ratios with the drape in the
 * denominators, so that its inverse is concave for a given fibre; the fibres judged go with the ducts, and there may be two
 * regions of low force.
 * @param start drape to begin with, null for the coarse grid
 * @param spans number of spans; shapes that the unit does not have stay at 1
 */
export function leastForce(asked: DrapeAsked, spans: number, start: Drape | null): LeastForce {
  const known = start && tried(asked, start);
  if (known?.isBorne === true) return descended(asked, spans, known, startedStep);
  const whole = [1] as const;
  let best: LeastForce[] = [];
  for (const a of coarse)
    for (const b of spans > 2 ? coarse : whole)
      for (const c of spans > 1 ? coarse : whole) {
        const least = best.length < regions ? undefined : best[best.length - 1];
        const next = tried(asked, [a, b, c], least);
        if (next) best = [...best, next].sort((x, y) => (isBetter(x, y) ? -1 : 1)).slice(0, regions);
      }
  return best
    .map((one) => descended(asked, spans, one, firstStep))
    .reduce((a, b) => (isBetter(b, a) ? b : a));
}

/** Steps from a drape to a better one beside it until there is none, then with half the step. */
function descended(asked: DrapeAsked, spans: number, from: LeastForce, firstStepOf: number): LeastForce {
  let best = from;
  for (let step = firstStepOf; step > finest;) {
    const before = best;
    const [a, b, c] = before.drape;
    for (const x of around(a, step))
      for (const y of spans > 2 ? around(b, step) : [b])
        for (const z of spans > 1 ? around(c, step) : [c])
          if (x !== a || y !== b || z !== c) best = tried(asked, [x, y, z], best) ?? best;
    if (best === before) step /= 2;
  }
  return best;
}

/** A drape tried; null where it is no better than one that is known. */
function tried(asked: DrapeAsked, drape: Drape): LeastForce;
function tried(asked: DrapeAsked, drape: Drape, known: LeastForce | undefined): LeastForce | null;
function tried({ need, bears }: DrapeAsked, drape: Drape, known?: LeastForce): LeastForce | null {
  const forceKN = need(drape, known?.isBorne === true ? known.forceKN : Infinity);
  if (known?.isBorne === true && !(forceKN < known.forceKN)) return null;
  const next = { drape, forceKN, isBorne: forceKN < Infinity && bears(drape, forceKN) };
  return known && !isBetter(next, known) ? null : next;
}

const isBetter = (a: LeastForce, b: LeastForce): boolean =>
  a.isBorne === b.isBorne ? a.forceKN < b.forceKN : a.isBorne;

/** Of ways to share strands out among the spans the one with the fewest along the deck of those that are borne, of all where none is. */
export function fewestStrands<T extends LeastForce & { readonly meanShare: number }>(ways: readonly T[]): T {
  const along = ({ isBorne, forceKN, meanShare, drape }: T): LeastForce => ({
    drape,
    isBorne,
    forceKN: forceKN * meanShare,
  });
  return ways.reduce((a, b) => (isBetter(along(b), along(a)) ? b : a));
}

/** A share and its neighbours within 0 and 1, each once. */
function around(share: number, step: number): number[] {
  return [...new Set([Math.max(0, share - step), share, Math.min(1, share + step)])];
}
