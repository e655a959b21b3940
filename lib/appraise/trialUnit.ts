import { formModule } from '../forms/index.ts';
import type { FormId, Pattern } from '../model/index.ts';
import { leastOfTwoSpans, sideRatioWindow } from '../rules/index.ts';

/** End over interior span of a trial unit: inside every published window. */
const TRIAL_END_RATIO = 0.78;

/** One span or two in one with their walls. */
export const isFrame = (pattern: Pattern): boolean =>
  pattern.kind === 'continuous' && (pattern.mostSpans ?? Infinity) <= 2;

/** The longer of two spans of a frame over a crossing where the shorter is the least of it that rules leave open, m. */
export const longestOfTwo = (form: FormId, lengthM: number): number => lengthM / (1 + leastOfTwoSpans(form));

/**
 * A unit of ordinary proportions for one governing span on a crossing: its spans, and its pylons where the form has them.
 * Of a frame the longer of two spans reaches no farther than where the shorter is the least of it: a longer one stands alone.
 */
export function trialUnit(
  form: FormId,
  spanM: number,
  pylons: 1 | 2,
  lengthM: number,
): { spansM: number[]; pylons?: number[] } {
  const pattern = formModule(form).pattern;
  if (pattern.kind === 'simple-main') return { spansM: [spanM] };
  if (pattern.kind === 'continuous' || pattern.kind === 'flanked') {
    if (isFrame(pattern)) return { spansM: spanM <= longestOfTwo(form, lengthM) ? [spanM, spanM] : [spanM] };
    return { spansM: [TRIAL_END_RATIO * spanM, spanM, TRIAL_END_RATIO * spanM] };
  }
  const [least, most] =
    sideRatioWindow(form, pylons) ?? (pylons === 1 ? pattern.onePylonBack : pattern.twoPylonSide);
  const side = ((least + most) / 2) * spanM;
  return pylons === 1
    ? { spansM: [spanM, side], pylons: [1] }
    : { spansM: [side, spanM, side], pylons: [1, 2] };
}
