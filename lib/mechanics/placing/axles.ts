import { placingsOf, weighAxle, type AxleGroup, type Placings, type Track } from './track.ts';

/** Greatest and least effect of a group; both include 0, the group being off the structure. */
export interface Extremes {
  max: number;
  min: number;
}

/**
 * Runs a group over an influence line. Candidates are all placings with an axle on a station (kinks of the line are
 * stations, so these hold every peaked maximum exactly) and, where the best lies on a smooth stretch, the vertex of
 * the parabola through it and its neighbours.
 * @param line element line on the stations of the track
 * @param jumpAt station where the line jumps (its own section, for a shear), or -1
 */
export function runGroup(
  track: Track,
  group: AxleGroup,
  line: Float64Array,
  jumpAt: number,
  out: Extremes,
): void {
  const placings = placingsOf(track, group);
  sumPlacings(placings, group, line);
  const { adverse, relieving } = placings;
  const top = highest(adverse);
  const bottom = lowest(relieving);
  out.max = Math.max(0, adverse[top]!, vertexValue(track, group, placings, line, adverse, top, 1));
  out.min = Math.min(0, relieving[bottom]!, vertexValue(track, group, placings, line, relieving, bottom, -1));
  if (jumpAt > 0) leftOfJump(placings, group, line, jumpAt, track.xM.length, out);
}

/** Fills `adverse` (positive) and `relieving` (negative) sums of every placing; a whole group has one sum in both. */
export function sumPlacings(placings: Placings, group: AxleGroup, line: Float64Array): void {
  const { count, entry, weight, adverse, relieving } = placings;
  const axles = group.atM.length;
  let at = 0;
  for (let k = 0; k < count; k++) {
    let positive = 0;
    let negative = 0;
    for (let i = 0; i < axles; i++, at++) {
      const e = entry[at]!;
      const w = 4 * at;
      const value =
        weight[w]! * line[e]! +
        weight[w + 1]! * line[e + 1]! +
        weight[w + 2]! * line[e + 2]! +
        weight[w + 3]! * line[e + 3]!;
      if (value > 0) positive += value;
      else negative += value;
    }
    if (group.whole) adverse[k] = relieving[k] = positive + negative;
    else {
      adverse[k] = positive;
      relieving[k] = negative;
    }
  }
}

/**
 * Position of the vertex of the parabola through placing k and its neighbours, m; the placing itself when they do not
 * bend the right way. `sign` is 1 for a maximum and -1 for a minimum.
 */
export function vertexM(placings: Placings, S: Float64Array, k: number, sign: 1 | -1): number {
  const { positionM: P, count } = placings;
  let before = k - 1;
  while (before >= 0 && P[k]! - P[before]! < 1e-6) before--;
  let after = k + 1;
  while (after < count && P[after]! - P[k]! < 1e-6) after++;
  if (before < 0 || after >= count) return P[k]!;
  const a = P[before]! - P[k]!;
  const b = P[after]! - P[k]!;
  const fa = S[before]! - S[k]!;
  const fb = S[after]! - S[k]!;
  const bend = (fa / a - fb / b) / (a - b);
  if (!(sign * bend < 0)) return P[k]!;
  const slope = fa / a - bend * a;
  return P[k]! + Math.min(b, Math.max(a, -slope / (2 * bend)));
}

const weights = new Float64Array(4);

/** Effect of a group whose first axle stands at `positionM`: the part of the given sign, or all of a whole group. */
export function effectAt(
  track: Track,
  group: AxleGroup,
  line: Float64Array,
  positionM: number,
  sign: 1 | -1,
): number {
  let sum = 0;
  for (let i = 0; i < group.atM.length; i++) {
    const e = weighAxle(track.xM, positionM + group.atM[i]!, group.loadKN[i]!, weights, 0);
    const value =
      weights[0]! * line[e]! +
      weights[1]! * line[e + 1]! +
      weights[2]! * line[e + 2]! +
      weights[3]! * line[e + 3]!;
    if (group.whole || sign * value > 0) sum += value;
  }
  return sum;
}

function vertexValue(
  track: Track,
  group: AxleGroup,
  placings: Placings,
  line: Float64Array,
  S: Float64Array,
  k: number,
  sign: 1 | -1,
): number {
  const at = vertexM(placings, S, k, sign);
  return at === placings.positionM[k] ? 0 : effectAt(track, group, line, at, sign);
}

/** A line that jumps is read just right of its station by the placings; here each axle in turn stands just left of it. */
function leftOfJump(
  placings: Placings,
  group: AxleGroup,
  line: Float64Array,
  station: number,
  stations: number,
  out: Extremes,
): void {
  const axles = group.atM.length;
  const left = line[4 * station - 2]!;
  const right = 4 * station < line.length ? line[4 * station]! : left;
  for (let i = 0; i < axles; i++) {
    const k = placings.onStation[i * stations + station]!;
    const load = group.loadKN[i]!;
    if (group.whole) {
      const value = placings.adverse[k]! + load * (left - right);
      out.max = Math.max(out.max, value);
      out.min = Math.min(out.min, value);
    } else {
      out.max = Math.max(out.max, placings.adverse[k]! + load * (Math.max(left, 0) - Math.max(right, 0)));
      out.min = Math.min(out.min, placings.relieving[k]! + load * (Math.min(left, 0) - Math.min(right, 0)));
    }
  }
}

function highest(S: Float64Array): number {
  let best = 0;
  for (let k = 1; k < S.length; k++) if (S[k]! > S[best]!) best = k;
  return best;
}

function lowest(S: Float64Array): number {
  let best = 0;
  for (let k = 1; k < S.length; k++) if (S[k]! < S[best]!) best = k;
  return best;
}
