import type { Windows } from './request.ts';

/** Windows with every default applied. */
export interface Limits {
  readonly minSpanM: number;
  readonly maxSpanM: number;
  readonly endLeast: number;
  readonly endMost: number;
  readonly interiorLeast: number;
  readonly minSpacingM: number;
  readonly leastSpans: number;
  readonly mostSpans: number;
}

/** Slack with which ratios and spans are compared. */
export const SLACK = 1e-9;

/** Window of a unit without end spans. */
const NO_END_SPANS = [1, 1] as const;

/** Applies the defaults of `Windows` once; throws RangeError on a band or ratio that is reversed or not positive. */
export function limitsOf(windows: Windows): Limits {
  const { minSpanM, maxSpanM, endRatio = NO_END_SPANS } = windows;
  const [endLeast, endMost] = endRatio;
  if (!(minSpanM > 0 && maxSpanM >= minSpanM))
    throw new RangeError(`span band: received ${minSpanM} to ${maxSpanM} m`);
  if (!(endLeast > 0 && endMost >= endLeast))
    throw new RangeError(`end ratio: received ${endLeast} to ${endMost}`);
  return {
    minSpanM,
    maxSpanM,
    endLeast,
    endMost,
    interiorLeast: windows.interiorLeast ?? Math.min(endLeast, 1),
    minSpacingM: windows.minSpacingM ?? Math.min(endLeast, 1) * minSpanM,
    leastSpans: windows.leastSpans ?? 1,
    mostSpans: windows.mostSpans ?? Infinity,
  };
}

export type Fault =
  | 'span outside the band of the form'
  | 'more spans than the form has'
  | 'no pier to build it from'
  | 'end span outside its window'
  | 'interior span too short for its neighbours';

/** What is wrong with the spans of one continuous unit, or null. */
export function spanFault(spans: readonly number[], limits: Limits): Fault | null {
  const last = spans.length - 1;
  let longest = -Infinity;
  let shortest = Infinity;
  let interior = Infinity;
  for (let s = 0; s <= last; s += 1) {
    const span = spans[s]!;
    longest = Math.max(longest, span);
    shortest = Math.min(shortest, span);
    if (s > 0 && s < last) interior = Math.min(interior, span);
  }
  const slack = SLACK * longest + 1e-6;
  if (spans.length > limits.mostSpans) return 'more spans than the form has';
  if (spans.length < limits.leastSpans) return 'no pier to build it from';
  if (!(longest >= limits.minSpanM - slack && longest <= limits.maxSpanM + slack))
    return 'span outside the band of the form';
  if (spans.length === 1) return null;
  if (!(shortest >= limits.minSpacingM - slack)) return 'span outside the band of the form';
  if (spans.length === 2) {
    return shortest >= limits.endLeast * longest - slack ? null : 'end span outside its window';
  }
  const isOutside = (end: number, beside: number): boolean =>
    !(end >= limits.endLeast * beside - slack && end <= limits.endMost * beside + slack);
  if (isOutside(spans[0]!, spans[1]!) || isOutside(spans[last]!, spans[last - 1]!))
    return 'end span outside its window';
  return interior >= limits.interiorLeast * longest - slack
    ? null
    : 'interior span too short for its neighbours';
}

/** Spans between rising positions, by their indices. */
export function spansAlong(X: Float64Array, at: readonly number[]): number[] {
  const spans: number[] = [];
  for (let s = 1; s < at.length; s += 1) spans.push(X[at[s]!]! - X[at[s - 1]!]!);
  return spans;
}
