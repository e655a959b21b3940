/** A span that is taken to lie beyond a leap lies this share of itself beyond it. */
const BEYOND = 1e-6;

/**
 * Spans at which a form is really sized, m, rising: both ends of its band and both sides of every leap within it, and the
 * rest evenly by ratio between those, the widest gap first. Cost goes with a power of the span between them, so no gap
 * may hold a leap.
 *
 * @param band least and most span, m, 0 < least <= most
 * @param leapsM spans at which a unit is made otherwise just above than it is up to there, m
 * @param count spans in all; more where the leaps alone take more
 */
export function trialSpans(
  [least, most]: readonly [least: number, most: number],
  leapsM: readonly number[],
  count: number,
): number[] {
  const inside = leapsM.filter((at) => at > least && at < most).sort((a, b) => a - b);
  const stretches = [...inside, most].map((to, i) => ({
    from: i === 0 ? least : inside[i - 1]! * (1 + BEYOND),
    to,
    gaps: 1,
  }));
  const ratio = ({ from, to, gaps }: (typeof stretches)[number]): number => Math.log(to / from) / gaps;
  for (let left = count - 2 * stretches.length; left > 0; left -= 1)
    stretches.reduce((widest, one) => (ratio(one) > ratio(widest) ? one : widest)).gaps += 1;
  return stretches.flatMap(({ from, to, gaps }) =>
    Array.from({ length: gaps + 1 }, (_, i) => (i === gaps ? to : from * Math.pow(to / from, i / gaps))),
  );
}
