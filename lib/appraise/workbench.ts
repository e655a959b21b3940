import { meanRates, ratesFor, type Rates } from '../price/index.ts';
import { survey } from '../site/index.ts';
import type { MeasuredLine, Site, Study } from '../model/index.ts';
import { tableShelf, type TableShelf } from './costTable.ts';
import { sizer, type Sizer } from './sizer.ts';

/** What every option of a study is worked out with. */
export interface Workbench {
  readonly study: Study;
  readonly site: Site;
  readonly rates: Rates;
  /** Remembers designs from one appraisal to the next. */
  readonly size: Sizer;
  /** Money of measured lines at mean rates. */
  readonly costOf: (lines: readonly MeasuredLine[]) => number;
  readonly tables: TableShelf;
}

/**
 * Sets up what the options of a study are worked out with. Pass the sizer of the last appraisal to size nothing twice.
 *
 * @throws RangeError on a rate pack that is not on the shelf or a typed rate that does not rise
 */
export function workbench(study: Study, size: Sizer = sizer()): Workbench {
  const site = survey(study.brief);
  const rates = ratesFor(study.books);
  const mean = meanRates(rates);
  const costOf = (lines: readonly MeasuredLine[]): number =>
    lines.reduce((sum, line) => sum + line.quantity * mean[line.item]!, 0);
  return { study, site, rates, size, costOf, tables: tableShelf(site, size, costOf) };
}
