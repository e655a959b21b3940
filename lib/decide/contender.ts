import type { Status } from '../model/index.ts';

/** What deciding reads of an option. `totals` are its costs on the common draws of the study. */
export interface Contender {
  readonly number: number;
  readonly status: Status;
  readonly p50: number;
  readonly totals: Float64Array;
}
