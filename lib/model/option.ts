import type { FormId, MethodId } from './ids.ts';
import type { AskedVariant, Variant } from './variant.ts';
import type { Unit } from './study.ts';

/** An option: form, arrangement, depth and method of construction. */
export interface Option {
  readonly number: number;
  readonly form: FormId;
  readonly method: MethodId;
  readonly units: readonly Unit[];
  /** Structural depth at midspan of the main unit, m; null until it has been found. */
  readonly depthM: number | null;
  /** How the main unit is asked to be made; absent = least crossing cost. */
  readonly variant?: AskedVariant;
  readonly origin: 'proposed' | 'kept';
}

/** An option of which it is settled how its main unit is made; plain where nothing is said. */
export interface MadeOption extends Option {
  readonly variant?: Variant;
}

/** An arrangement as the search returns it. */
export interface Arrangement {
  readonly form: FormId;
  readonly method: MethodId;
  readonly units: readonly Unit[];
  /** Estimated cost on the cost table, money: for ordering only. */
  readonly tableCost: number;
}

/** Arrangements not kept, counted by reason. */
export interface DroppedCount {
  readonly form: FormId;
  readonly reason: string;
  readonly count: number;
}

/** What the search knows of cost: made by `appraise` from the real stages, never by `arrange`. */
export interface CostTable {
  /** Deck cost, money per m of deck, of one span of this form when the governing span of its unit is `governingM`; a longer one governs itself. */
  deckPerM(form: FormId, spanM: number, governingM: number): number;
  /**
   * How many times as long as itself the inner span is that an end span of a continuous unit of this form works like:
   * `deckPerM` is asked for that length. 1 where absent.
   */
  endWorksAs?(form: FormId, governingM: number): number;
  /** The same of the one span of a unit that has no other. 1 where absent. */
  aloneWorksAs?(form: FormId, governingM: number): number;
  /** Span over the widest barred stretch, m; 0 where nothing is barred. Even inner spans are not preferred where absent. */
  readonly forcedSpanM?: number;
  /** Structural depth at midspan, m, for a governing span. */
  depthM(form: FormId, governingM: number): number;
  /** Fixed cost of a unit of this form (pylons, set-up of its method), money; `pylons` is 0 unless given. */
  unitFixed(form: FormId, governingM: number, pylons?: number): number;
  /** Cost of one intermediate support with its foundation, bearings included, money. */
  support(form: FormId, chainageM: number, spanLeftM: number, spanRightM: number): number;
}
