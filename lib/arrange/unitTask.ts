import type { FormId } from '../model/index.ts';
import type { SupportCosts } from './curves.ts';
import type { Limits } from './limits.ts';

/** One continuous unit that starts at position 0 of `X` and ends at any of the positions firstEnd..lastEnd. */
export interface UnitTask {
  readonly form: FormId;
  /** Candidate positions, m, rising from 0. */
  readonly X: Float64Array;
  readonly firstEnd: number;
  readonly lastEnd: number;
  readonly limits: Limits;
  readonly supports: SupportCosts;
  /** Whether the support at the end is a pier, half of which the unit carries. */
  readonly endIsPier: boolean;
  /**
   * What a layout to an end may cost, money, and still be wanted: clearly dearer ones may be left out. Asked anew before
   * each governing span; Infinity where all are wanted and -Infinity where none is.
   */
  readonly wantedUpTo: (end: number) => number;
}
