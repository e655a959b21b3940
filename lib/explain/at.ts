import type { Appraisal, AppraisedOption, At, Design, Site, Study, Support } from '../model/index.ts';
import type { Rates } from '../price/index.ts';
import { siteOf } from '../site/index.ts';

/** What is asked about: a study and the appraisal that was made of it. */
export interface Context {
  readonly study: Study;
  readonly appraisal: Appraisal;
  /** Rates of the study where they have been read already. */
  readonly rates?: Rates;
}

const byNumber = new WeakMap<Appraisal, ReadonlyMap<string, AppraisedOption>>();

/** The option of a number. @throws RangeError where the appraisal has none of that number */
function optionOf(appraisal: Appraisal, number: string): AppraisedOption {
  const known =
    byNumber.get(appraisal) ?? new Map(appraisal.options.map((option) => [String(option.number), option]));
  byNumber.set(appraisal, known);
  const option = known.get(number);
  if (option === undefined)
    throw new RangeError(`option: expected a number of the appraisal, received '${number}'`);
  return option;
}

function entry<T>(list: readonly T[], index: number, what: string): T {
  const found = list[index];
  if (found === undefined)
    throw new RangeError(`${what}: expected 0 to ${list.length - 1}, received ${index}`);
  return found;
}

/** Where a descriptor stands: `names` are what the names of its pattern matched in `path`. */
export function placeAt(context: Context, path: string, names: ReadonlyMap<string, string>): At {
  const { study, appraisal } = context;
  const name = (key: string): string => {
    const found = names.get(key);
    if (found === undefined) throw new RangeError(`${path}: expected a pattern with :${key}`);
    return found;
  };
  const index = (key: string): number => Number(name(key));
  return {
    study,
    appraisal,
    path,
    name,
    index,
    get site(): Site {
      return names.has('option') ? siteOf(appraisal.site, this.option.units) : appraisal.site;
    },
    get ends(): At['ends'] {
      const own = names.has('option') && this.option.startM !== undefined;
      const root = own ? this.root : 'site';
      return { start: `${root}/startM`, end: `${root}/endM`, length: `${root}/lengthM` };
    },
    get option(): AppraisedOption {
      return optionOf(appraisal, name('option'));
    },
    get root(): string {
      return `options/${name('option')}`;
    },
    get design(): Design {
      return entry(this.option.designs, index('unit'), 'unit');
    },
    get unit(): string {
      return `${this.root}/designs/${name('unit')}`;
    },
    get support(): Support {
      return entry(this.option.supports, index('support'), 'support');
    },
    get foot(): string {
      return `${this.root}/supports/${name('support')}`;
    },
  };
}
