import type { Design } from '../model/index.ts';

/**
 * Longest side span over the main span with which the back-stays of a unit on two pylons stay taut under traffic on the side
 * span, from the check of a unit that is sized: about a pylon the weight of half the main span, less that of the side span r,
 * holds them (1/4 - r^2 over the square of the main span), traffic on the side span slackens them (r^2). Infinite where
 * nothing slackens.
 */
export function tautSide({ task, checks }: Pick<Design, 'task' | 'checks'>): number {
  const use = checks.find(({ id }) => id === 'back-stay-slack')?.utilisation ?? 0;
  const side = Math.max(task.spansM[0]!, task.spansM.at(-1)!) / Math.max(...task.spansM);
  const square = side * side;
  if (!(use > 0 && square < 0.25)) return Infinity;
  // use = traffic / weight x r^2 / (1/4 - r^2), which is 1 at the longest side span.
  const share = (use * (0.25 - square)) / square;
  return Math.sqrt(0.25 / (1 + share));
}
