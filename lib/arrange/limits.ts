import type { Windows } from './request.ts';

/** Windows with every default applied. */
export interface Limits {
  readonly minSpanM: number;
  readonly maxSpanM: number;
  readonly endLeast: number;
  readonly endMost: number;
  readonly interiorLeast: number;
  readonly minSpacingM: number;
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
    mostSpans: windows.mostSpans ?? Infinity,
  };
}

export type Fault =
  | 'span outside the band of the form'
  | 'more spans than the form has'
  | 'end span outside its window'
  | 'interior span too short for its neighbours';

/** What is wrong with the spans of one continuous unit, or null. */
export function spanFault(spans: readonly number[], limits: Limits): Fault | null {
  const longest = Math.max(...spans);
  const slack = SLACK * longest + 1e-6;
  const shortest = Math.min(...spans);
  if (spans.length > limits.mostSpans) return 'more spans than the form has';
  if (!(longest >= limits.minSpanM - slack && longest <= limits.maxSpanM + slack))
    return 'span outside the band of the form';
  if (spans.length === 1) return null;
  if (!(shortest >= limits.minSpacingM - slack)) return 'span outside the band of the form';
  if (spans.length === 2) {
    return shortest >= limits.endLeast * longest - slack ? null : 'end span outside its window';
  }
  for (const [end, beside] of [
    [spans[0]!, spans[1]!],
    [spans.at(-1)!, spans.at(-2)!],
  ] as const) {
    if (!(end >= limits.endLeast * beside - slack && end <= limits.endMost * beside + slack)) {
      return 'end span outside its window';
    }
  }
  const interior = spans.slice(1, -1);
  return Math.min(...interior) >= limits.interiorLeast * longest - slack
    ? null
    : 'interior span too short for its neighbours';
}
