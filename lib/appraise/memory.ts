import type {
  Arrangement,
  Design,
  DroppedCount,
  MeasuredLine,
  Support,
  WorkedOption,
} from '../model/index.ts';
import type { Draws, PricedOption } from '../price/index.ts';
import { kept, remembered, type Kept } from '../kept.ts';

/** A trial unit of one governing span at its depth of least cost. */
export interface TrialRow {
  readonly depthM: number;
  /** Most depth of the band of its span, m. */
  readonly mostDepthM: number;
  /** Money per m of deck, by the share of the governing span that a span is of. */
  readonly perM: readonly number[];
  /** Money that does not grow with the deck, by number of pylons. */
  readonly fixed: readonly number[];
  /** How many times as long as itself the inner span is that an end span of the unit works like. */
  readonly endWorksAs: number;
  /** The same of a span that stands alone. */
  readonly aloneWorksAs: number;
  /** Longest side span over the main span between two pylons with which back-stays stay taut; infinite for other forms. */
  readonly tautSide: number;
  /** What a support carries for each metre of the spans beside it, permanent and traffic together, kN/m. */
  readonly loadKNm: number;
}

/** One option at given depths: what it is made of and what it would cost at mean rates hangs on nothing else. */
export type AtDepth = Pick<WorkedOption, 'designs' | 'profile' | 'supports' | 'lines' | 'months'>;

/** Best arrangements of one form, or why there are none. */
export interface Proposals {
  readonly arrangements: readonly Arrangement[];
  readonly counts: readonly DroppedCount[];
  /** Where there are none: the rules that put the form out, or the smallest relaxations, smallest first. */
  readonly because: readonly string[];
}

/** What was worked out for one brief, whatever its budget. */
export interface SiteMemory {
  /** By form and books. */
  readonly proposals: Kept<Proposals>;
  /** By arrangement, method, depths and books. */
  readonly atDepth: Kept<AtDepth>;
}

/** One set of draws and the rates put on it so far, by item and the points of the rate. */
interface DrawsMemory {
  readonly draws: Draws;
  readonly rates: Kept<Float64Array>;
}

/**
 * What one appraisal leaves for the next, which is nearly always the last one with one thing changed. All of it comes
 * from pure functions and is kept under everything it was made from, so it saves time and changes no result.
 */
export interface Memory {
  /** By task. */
  readonly designs: Kept<Design>;
  /** By form, method, span, deck and books. */
  readonly rows: Kept<TrialRow>;
  /** Measured lines of trial piers by the place they stand at; there, by load. */
  readonly piers: Kept<(readonly MeasuredLine[])[]>;
  /** By place and what is asked of them, abutments also by books. */
  readonly supports: Kept<Support>;
  /** By brief without its budget. */
  readonly sites: Kept<SiteMemory>;
  /** By number of the option, draws, rates and what is priced of it. */
  readonly priced: Kept<PricedOption>;
  /** By seed, number, length and odds of the ground. */
  readonly draws: Kept<DrawsMemory>;
}

/** A memory with nothing in it yet. */
export function memory(): Memory {
  return {
    designs: kept(4000),
    rows: kept(800),
    piers: kept(2000),
    supports: kept(2000),
    sites: kept(6),
    priced: kept(300),
    draws: kept(2),
  };
}

/** What is kept of one site: nothing yet where it is seen for the first time. */
export function siteMemory({ sites }: Memory, key: string): SiteMemory {
  return remembered(sites, key, () => ({ proposals: kept(100), atDepth: kept(400) }));
}
