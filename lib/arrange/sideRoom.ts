import type { Approach } from './approaches.ts';

/** Most ends that are kept on one side. */
const KEPT = 3;

/** Ends of the span beyond a pylon, each with its approach: cheapest first, with different numbers of approach spans. */
export interface SideEnds {
  count: number;
  readonly end: Int32Array;
  readonly cost: Float64Array;
  readonly approach: Approach[];
}

/** Working room for both sides of a main unit: reused, for they are looked for thousands of times. */
export interface SideRoom {
  readonly left: SideEnds;
  readonly right: SideEnds;
  /** The cheapest by number of approach spans; infinite where there is none. */
  readonly costs: Float64Array;
  readonly ends: Int32Array;
  readonly approaches: Approach[];
}

const sideEnds = (): SideEnds => ({
  count: 0,
  end: new Int32Array(KEPT),
  cost: new Float64Array(KEPT),
  approach: [],
});

/** Room for sides whose approaches have fewer than `most` spans. */
export const sideRoom = (most: number): SideRoom => ({
  left: sideEnds(),
  right: sideEnds(),
  costs: new Float64Array(most).fill(Infinity),
  ends: new Int32Array(most),
  approaches: [],
});

/** Moves the cheapest from the room, between two numbers of approach spans, to one of its sides; empties the room. */
export function takeCheapest(room: SideRoom, side: SideEnds, fewest: number, most: number): void {
  const { costs, ends, approaches } = room;
  side.count = 0;
  while (side.count < KEPT) {
    let best = fewest;
    for (let spans = fewest + 1; spans <= most; spans += 1) if (costs[spans]! < costs[best]!) best = spans;
    if (!(costs[best]! < Infinity)) break;
    side.end[side.count] = ends[best]!;
    side.cost[side.count] = costs[best]!;
    side.approach[side.count] = approaches[best]!;
    side.count += 1;
    costs[best] = Infinity;
  }
  costs.fill(Infinity, fewest, most + 1);
}
