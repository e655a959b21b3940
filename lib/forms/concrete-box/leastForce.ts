/** Shares of the greatest eccentricity at the low points of end spans and of inner spans, and over the piers. */
export type Drape = readonly [endSpan: number, innerSpan: number, pier: number];

const coarse = [0.2, 0.6, 1] as const;
const finest = 0.02;

/** A force that a drape needs; one that is `enough` or more may be said as soon as that is known. */
export type DrapeNeed = (drape: Drape, enough: number) => number;

/**
 * Drape that needs the least force: a coarse grid, then halved steps round the best. The force is the largest of ratios
 * with the drape in the denominators, so that its inverse is concave and there is one region of lowest force.
 * @param need force of a drape, Infinity where none will do
 * @param start drape to begin with, null for the coarse grid
 * @param spans number of spans; shapes that the unit does not have stay at 1
 */
export function leastForce(
  need: DrapeNeed,
  spans: number,
  start: Drape | null,
): { readonly drape: Drape; readonly forceKN: number } {
  let best: Drape = start ?? [1, 1, 1];
  let least = need(best, Infinity);
  const visit = (drape: Drape): void => {
    const force = need(drape, least);
    if (!(force < least)) return;
    least = force;
    best = drape;
  };
  const whole = [1] as const;
  const grid = start === null || least === Infinity;
  if (grid)
    for (const a of coarse)
      for (const b of spans > 2 ? coarse : whole)
        for (const c of spans > 1 ? coarse : whole) visit([a, b, c]);
  for (let step = grid ? 0.2 : 0.05; step > finest; step /= 2) {
    const [a, b, c] = best;
    const inner = spans > 2 ? around(b, step) : [b];
    const piers = spans > 1 ? around(c, step) : [c];
    for (const x of around(a, step))
      for (const y of inner) for (const z of piers) if (x !== a || y !== b || z !== c) visit([x, y, z]);
  }
  return { drape: best, forceKN: least };
}

/** A share and its neighbours within 0 and 1, each once. */
function around(share: number, step: number): number[] {
  return [...new Set([Math.max(0, share - step), share, Math.min(1, share + step)])];
}
