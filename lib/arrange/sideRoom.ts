import type { Approach } from './approaches.ts';

/** Working room for sides with different numbers of approach spans: reused, for they are looked for thousands of times. */
export interface SideRoom {
  readonly spans: Int32Array;
  readonly costs: Float64Array;
  readonly ends: Int32Array;
  readonly approaches: Approach[];
}

/** Room for sides whose approaches have fewer than `most` spans. */
export const sideRoom = (most: number): SideRoom => ({
  spans: new Int32Array(most),
  costs: new Float64Array(most),
  ends: new Int32Array(most),
  approaches: [],
});
