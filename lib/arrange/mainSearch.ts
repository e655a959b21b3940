import type { CostTable } from '../model/index.ts';
import type { Approach } from './approaches.ts';
import type { Limits } from './limits.ts';
import type { ArrangeRequest } from './request.ts';

/** What the layouts of a main unit are made from. */
export interface MainSearch {
  readonly request: ArrangeRequest;
  readonly limits: Limits;
  readonly X: Float64Array;
  readonly table: CostTable;
  /** Half the cost of a support of the main form, as in `HalfCosts`. */
  readonly half: (index: number, spanM: number) => number;
  /** Indices at which the main span may end on the left and on the right of what it goes over. */
  readonly left: readonly number[];
  readonly right: readonly number[];
  /** Indices of ends of the main unit that lie beyond its pylons. */
  readonly outerLeft: readonly number[];
  readonly outerRight: readonly number[];
  /** Approaches from either abutment to each index. */
  readonly toLeft: readonly (readonly Approach[])[];
  readonly toRight: readonly (readonly Approach[])[];
  offer(layout: MainLayout): void;
  noApproach(): void;
}

/** One main unit with its approaches. */
export interface MainLayout {
  readonly at: readonly number[];
  readonly pylons: readonly number[];
  readonly mainM: number;
  readonly cost: number;
  readonly before: Approach;
  readonly after: Approach;
}
