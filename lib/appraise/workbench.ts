import { meanRates, ratesFor, type Rates } from '../price/index.ts';
import { siteOf, survey } from '../site/index.ts';
import type { MeasuredLine, Site, Study, Unit } from '../model/index.ts';
import { tableShelf, type TableShelf } from './costTable.ts';
import { memory, siteMemory, type Memory, type SiteMemory } from './memory.ts';
import { sizer, type Sizer } from './sizer.ts';

/** What every option of a study is worked out with. */
export interface Workbench {
  readonly study: Study;
  readonly site: Site;
  readonly rates: Rates;
  readonly size: Sizer;
  /** Money of measured lines at mean rates. */
  readonly costOf: (lines: readonly MeasuredLine[]) => number;
  readonly tables: TableShelf;
  /** What is kept from one appraisal to the next: of anything, and of this site. */
  readonly kept: Memory;
  readonly keptHere: SiteMemory;
  /** Text of the books that rates are taken from. */
  readonly booksKey: string;
}

/**
 * Sets up what the options of a study are worked out with. Pass the memory of the last appraisal to work out nothing twice.
 *
 * @throws RangeError on a rate pack that is not on the shelf or a typed rate that does not rise
 */
export function workbench(study: Study, kept: Memory = memory()): Workbench {
  const { brief, books } = study;
  const site = survey(brief);
  const rates = ratesFor(books);
  const mean = meanRates(rates);
  const costOf = (lines: readonly MeasuredLine[]): number =>
    lines.reduce((sum, line) => sum + line.quantity * mean[line.item]!, 0);
  const size = sizer(kept.designs);
  const booksKey = JSON.stringify([books.ratePack, books.rates]);
  return {
    study,
    site,
    rates,
    size,
    costOf,
    tables: tableShelf({ site, size, costOf, rows: kept.rows, booksKey }, kept),
    kept,
    keptHere: siteMemory(kept, JSON.stringify({ ...brief, budget: null })),
    booksKey,
  };
}

/** The same for a row of units: on the site between their own abutments. */
export const benchFor = (bench: Workbench, units: readonly Unit[]): Workbench => ({
  ...bench,
  site: siteOf(bench.site, units),
});
