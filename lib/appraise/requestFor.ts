import type { ArrangeRequest, Windows } from '../arrange/index.ts';
import { formModule } from '../forms/index.ts';
import type { FormId, MethodId, Pattern, Site, Unit } from '../model/index.ts';
import { endRatioWindow, leastOfTwoSpans, spanWindow } from '../rules/index.ts';
import { openSpans } from './openSpans.ts';
import type { FormAndMethod } from './trialRows.ts';

/** Half a pier along the road with its working space, kept clear of barred stretches, m. Common practice, no source. */
export const PIER_HALF_WIDTH_M = 1.5;
/** Least distance between two supports of a hung unit over its shortest main span. Common practice, no source. */
const HUNG_SPACING = 0.5;

/** That of a pattern: no more than the shortest side span it is laid out with. */
const hungSpacing = ({ twoPylonSide }: Extract<Pattern, { kind: 'pylon' }>): number =>
  Math.min(HUNG_SPACING, twoPylonSide[0]);

/** Band of the longest span of a unit on a crossing. */
function spanBand(form: FormId, site: Site): Pick<Windows, 'minSpanM' | 'maxSpanM'> {
  // Where the shortest is longer than the crossing nothing is found, and what stands there is told so.
  const [least, most] = openSpans(form, site.lengthM) ?? spanWindow(form).possible;
  return { minSpanM: least, maxSpanM: most };
}

/** Arms are built out from a pier: a deck made so has two spans at least. By definition of the method. */
const LEAST_SPANS: Partial<Record<MethodId, number>> = { 'balanced-cantilever': 2 };

function continuousWindows(form: FormId, site: Site): Windows {
  const { pattern } = formModule(form);
  const mostSpans = pattern.kind === 'continuous' ? pattern.mostSpans : undefined;
  // Of two spans each is an end span, and the shorter is never more than the longer.
  const endRatio = mostSpans === 2 ? ([leastOfTwoSpans(form), 1] as const) : endRatioWindow(form);
  if (endRatio === null) throw new RangeError(`no end span window in the rules of ${form}`);
  return { ...spanBand(form, site), endRatio, ...(mostSpans === undefined ? {} : { mostSpans }) };
}

/**
 * What the search is asked for one form and method: a pattern of the form and the windows that the rules leave open.
 * @throws RangeError where the rules of a continuous form say nothing of end spans: a fault of the book
 */
export function requestFor(
  { form, method }: FormAndMethod,
  site: Site,
  pattern: Pattern = formModule(form).pattern,
): ArrangeRequest {
  const base = { form, method, pattern, pierHalfWidthM: PIER_HALF_WIDTH_M };
  if (pattern.kind === 'continuous') {
    const leastSpans = LEAST_SPANS[method];
    return {
      ...base,
      windows: { ...continuousWindows(form, site), ...(leastSpans === undefined ? {} : { leastSpans }) },
    };
  }
  if (pattern.kind === 'flanked') {
    return {
      ...base,
      windows: continuousWindows(form, site),
      approach: continuousWindows(pattern.approach, site),
    };
  }
  const band = spanBand(form, site);
  return {
    ...base,
    // The main unit has no end spans; pylons have ratios of their own in the pattern.
    windows: pattern.kind === 'pylon' ? { ...band, minSpacingM: hungSpacing(pattern) * band.minSpanM } : band,
    approach: continuousWindows(pattern.approach, site),
  };
}

/** The pattern of a row of units of a form: that of the form, or of its others the one that has such approaches. */
export function patternOf(form: FormId, units: readonly Unit[]): Pattern {
  const { pattern, alsoPatterns = [] } = formModule(form);
  const approach = units.find(({ role }) => role === 'approach');
  if (approach === undefined) return pattern;
  return alsoPatterns.find((also) => also.approach === approach.form) ?? alsoPatterns[0] ?? pattern;
}
