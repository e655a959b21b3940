import type { CostTable } from '../model/index.ts';
import type { Approach } from './approaches.ts';
import type { Limits } from './limits.ts';
import type { SideRoom } from './sideRoom.ts';
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
  /** Last index at which the main span may begin and first at which it may end. */
  readonly latestLeft: number;
  readonly earliestRight: number;
  /** Indices of ends of the main unit that lie beyond its pylons. */
  readonly outerLeft: readonly number[];
  readonly outerRight: readonly number[];
  /** Approaches from either abutment to each index. */
  readonly toLeft: readonly (readonly Approach[])[];
  readonly toRight: readonly (readonly Approach[])[];
  readonly room: SideRoom;
  /** Deck and fixed cost of a main unit of one span, m. */
  readonly spanAlone: (mainM: number) => number;
  /** Deck, fixed cost and supports of a main unit alone and its main span, m; null where it may not stand so. */
  readonly ownCost: (
    at: readonly number[],
    pylons: readonly number[],
  ) => { readonly cost: number; readonly mainM: number } | null;
  /** Whether a layout would be the cheapest of its kind so far; asked before one is put together. */
  readonly wants: (pylons: number, spans: number, mainM: number, cost: number) => boolean;
  offer(layout: MainLayout): void;
  /** Whether as many have been found as were asked for. */
  readonly isEnough: () => boolean;
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
