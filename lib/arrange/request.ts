import type { Arrangement, DroppedCount, FormId, MethodId, Pattern } from '../model/index.ts';

/** Limits on the spans of one form. The caller reads them from the rules. */
export interface Windows {
  /** Band of the longest span of a unit, m. */
  readonly minSpanM: number;
  readonly maxSpanM: number;
  /**
   * End span over the interior span beside it; with two spans the shorter over the longer must reach the first figure.
   * Every continuous unit needs it; a main unit of one span or on pylons has none.
   */
  readonly endRatio?: readonly [least: number, most: number];
  /** Interior span over the longest span of the unit; the first figure of `endRatio` unless given. */
  readonly interiorLeast?: number;
  /** Fewest and most spans of a unit; any number unless given. */
  readonly leastSpans?: number;
  readonly mostSpans?: number;
  /** Least distance between two supports, m; first figure of `endRatio` x `minSpanM`, or without one `minSpanM`, unless given. */
  readonly minSpacingM?: number;
}

/** How many different arrangements are kept unless the request says otherwise. */
export const KEPT = 3;

/** What is to be arranged: one form with its method on one site. */
export interface ArrangeRequest {
  readonly form: FormId;
  readonly method: MethodId;
  readonly pattern: Pattern;
  readonly windows: Windows;
  /** Windows of the approach form; needed by every pattern but the continuous one. */
  readonly approach?: Windows;
  /** Half the width of a pier along the road with its working space: kept clear of hard zones, m. */
  readonly pierHalfWidthM: number;
  /** How many different arrangements to keep; 3 unless given. */
  readonly keep?: number;
}

/** One way to make an arrangement possible, smallest first in a list. */
export interface Relaxation {
  readonly what: 'zone' | 'longest-span' | 'shortest-span' | 'end-ratio';
  /** Name of the barred stretch, or the form whose window it is. */
  readonly name: string;
  readonly from: number;
  readonly to: number;
  readonly unit: 'm' | '-';
}

/** What the search found: kept arrangements cheapest first, the rest counted by reason. */
export interface ArrangeResult {
  readonly arrangements: readonly Arrangement[];
  readonly dropped: readonly DroppedCount[];
  /** Empty unless nothing fits. */
  readonly relaxations: readonly Relaxation[];
}
