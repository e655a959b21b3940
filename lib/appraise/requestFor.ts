import type { ArrangeRequest, Windows } from '../arrange/index.ts';
import { formModule } from '../forms/index.ts';
import type { Site } from '../model/index.ts';
import { endRatioWindow } from '../rules/index.ts';
import { openSpans } from './openSpans.ts';
import type { FormAndMethod } from './trialRows.ts';

/** Half a pier along the road with its working space, kept clear of barred stretches, m. Common practice, no source. */
export const PIER_HALF_WIDTH_M = 1.5;
/** Where no rule speaks of end spans: from the uplift limit to equal spans. */
const ANY_END_RATIO = [0.5, 1] as const;

function windowsOf(form: FormAndMethod['form'], site: Site): Windows {
  const open = openSpans(form, site.lengthM);
  if (!open)
    throw new RangeError(`arrangement: ${form} has no span that fits a crossing of ${site.lengthM} m`);
  return {
    minSpanM: open[0],
    maxSpanM: open[1],
    endRatio: endRatioWindow(form) ?? ANY_END_RATIO,
  };
}

/** What the search is asked for one form and method: its pattern and the windows that the rules leave open. */
export function requestFor({ form, method }: FormAndMethod, site: Site): ArrangeRequest {
  const { pattern } = formModule(form);
  return {
    form,
    method,
    pattern,
    windows: windowsOf(form, site),
    ...(pattern.kind === 'continuous' ? {} : { approach: windowsOf(pattern.approach, site) }),
    pierHalfWidthM: PIER_HALF_WIDTH_M,
  };
}
