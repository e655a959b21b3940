/** Shares of the greatest eccentricity at the low points of end spans and of inner spans, and over the piers. */
export type Drape = readonly [endSpan: number, innerSpan: number, pier: number];

const coarse = [0.2, 0.6, 1] as const;
const finest = 0.02;

/**
 * Drape that needs the least force: a coarse grid, then halved steps round the best. The force is the largest of ratios
 * with the drape in the denominators, so that its inverse is concave and there is one region of lowest force.
 * @param need force of a drape, Infinity where none will do
 * @param start drape to begin with, null for the coarse grid
 * @param spans number of spans; shapes that the unit does not have stay at 1
 */
export function leastForce(
  need: (drape: Drape) => number,
  spans: number,
  start: Drape | null,
): { readonly drape: Drape; readonly forceKN: number } {
  let best: Drape = start ?? [1, 1, 1];
  let least = need(best);
  const visit = (drape: Drape): void => {
    const force = need(drape);
    if (!(force < least)) return;
    least = force;
    best = drape;
  };
  const whole = [1] as const;
  const still = [0] as const;
  const grid = start === null || least === Infinity;
  if (grid)
    for (const a of coarse)
      for (const b of spans > 2 ? coarse : whole)
        for (const c of spans > 1 ? coarse : whole) visit([a, b, c]);
  for (let step = grid ? 0.2 : 0.05; step > finest; step /= 2) {
    const [a, b, c] = best;
    const steps = [-step, 0, step];
    for (const da of steps)
      for (const db of spans > 2 ? steps : still)
        for (const dc of spans > 1 ? steps : still) visit([within(a + da), within(b + db), within(c + dc)]);
  }
  return { drape: best, forceKN: least };
}

function within(share: number): number {
  return Math.min(1, Math.max(0, share));
}
