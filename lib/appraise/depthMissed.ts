import type { Design } from '../model/index.ts';

/** A depth made this near to that asked for is the same, m. */
const SAME_M = 0.005;

/**
 * A sentence where a unit could not be made with the depth its task asks for, as of beams that come in steps of depth; null
 * where it could.
 */
export function depthMissed({ task, depthM }: Pick<Design, 'task' | 'depthM'>): string | null {
  const missed = depthM.midspan - task.depthM;
  if (Math.abs(missed) <= SAME_M) return null;
  const [asked, made] = [task.depthM, depthM.midspan].map((one) => one.toFixed(2));
  return `A depth of ${asked} m was asked for; with the beams there are it is ${made} m.`;
}
