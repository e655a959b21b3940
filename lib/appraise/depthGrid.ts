/** Depths are drawn to 50 mm: 20 steps to the metre. */
const STEPS = 20;
/** Thin slabs are drawn to 10 mm: in steps of 50 mm a published band of theirs would hold a depth or none. */
const THIN_STEPS = 100;
/** Deepest of them, m. */
const THIN_M = 0.5;

/** Steps to the metre in which depths up to one, m, are drawn. */
export function stepsPerM(deepestM: number): number {
  return deepestM <= THIN_M ? THIN_STEPS : STEPS;
}

/** The depth that is drawn for one, m. */
export function onGrid(depthM: number): number {
  const steps = stepsPerM(depthM);
  return Math.round(depthM * steps) / steps;
}
