import { sumPlacings } from './sumPlacings.ts';
import { placingsOf, type AxleGroup, type Placings, type Track } from './track.ts';

/**
 * Lines of all sections between one reaction and the next. With Q the sum of the reactions to the left and T their moment
 * about the start of the beam, the line of a section at x is arm Q - turn T to its right and arm (Q - 1) - turn (T - x) to its
 * left: its moment with arm = x and turn = 1, its shear with arm = 1 and turn = 0.
 */
export interface Stretch {
  readonly right: { readonly Q: Float64Array; readonly T: Float64Array };
  readonly left: { readonly Q: Float64Array; readonly T: Float64Array };
  /** Sums of whole groups on these four lines, by group. */
  readonly sums: Map<AxleGroup, StretchSums>;
}

interface StretchSums {
  readonly rightQ: Float64Array;
  readonly rightT: Float64Array;
  readonly leftQ: Float64Array;
  readonly leftT: Float64Array;
}

/** A section of a stretch: its station and what its line is made of. */
export interface StretchSection {
  readonly stretch: Stretch;
  readonly station: number;
  readonly arm: number;
  readonly turn: number;
}

/** A stretch of a beam from its element lines Q and T, which are taken over as they are now. */
export function stretchOf(xM: ArrayLike<number>, Q: Float64Array, T: Float64Array): Stretch {
  const left = { Q: Q.slice(), T: T.slice() };
  for (let e = 0; e < xM.length - 1; e++) {
    left.Q[4 * e]! -= 1;
    left.Q[4 * e + 2]! -= 1;
    left.T[4 * e]! -= xM[e]!;
    left.T[4 * e + 1]! -= 1;
    left.T[4 * e + 2]! -= xM[e + 1]!;
    left.T[4 * e + 3]! -= 1;
  }
  return { right: { Q: Q.slice(), T: T.slice() }, left, sums: new Map() };
}

/** Writes the element line of a section. */
export function sectionLine({ stretch, station, arm, turn }: StretchSection, line: Float64Array): void {
  const { left, right } = stretch;
  if (arm === 1 && turn === 0) {
    line.set(right.Q);
    line.set(left.Q.subarray(0, 4 * station));
    return;
  }
  combine(line, left.Q, left.T, arm, turn, 0, 4 * station);
  combine(line, right.Q, right.T, arm, turn, 4 * station, line.length);
}

function combine(
  line: Float64Array,
  Q: Float64Array,
  T: Float64Array,
  arm: number,
  turn: number,
  from: number,
  to: number,
): void {
  for (let i = from; i < to; i++) line[i] = arm * Q[i]! - turn * T[i]!;
}

/** Placings whose axles are nearer to the section than this, m, are summed on its line. */
const NEAR_M = 1e-6;

/**
 * Sums of a whole group in its swept placings on the line of a section: read off the sums on Q and T where all axles are on
 * one side of it, summed anew only where they straddle it.
 */
export function sumSection(
  track: Track,
  group: AxleGroup,
  line: Float64Array,
  { stretch, station, arm, turn }: StretchSection,
): void {
  const placings = placingsOf(track, group);
  const { positionM, positive, swept } = placings;
  const { rightQ, rightT, leftQ, leftT } = sumsOf(stretch, group, placings);
  const x = track.xM[station]!;
  const lengthM = group.atM[group.atM.length - 1]!;
  let from = 0;
  while (from < swept && positionM[from]! + lengthM < x - NEAR_M) from++;
  let to = from;
  while (to < swept && positionM[to]! <= x + NEAR_M) to++;
  combine(positive, leftQ, leftT, arm, turn, 0, from);
  sumPlacings(placings, group, line, from, to);
  combine(positive, rightQ, rightT, arm, turn, to, swept);
}

function sumsOf({ sums, left, right }: Stretch, group: AxleGroup, placings: Placings): StretchSums {
  const known = sums.get(group);
  if (known) return known;
  const on = (line: Float64Array): Float64Array => {
    sumPlacings(placings, group, line, 0, placings.swept);
    return placings.positive.slice(0, placings.swept);
  };
  const made = { rightQ: on(right.Q), rightT: on(right.T), leftQ: on(left.Q), leftT: on(left.T) };
  sums.set(group, made);
  return made;
}
