import { sumSection, type StretchSection } from './stretch.ts';
import { sumPlacings } from './sumPlacings.ts';
import { placingsOf, weighAxle, type AxleGroup, type Placings, type Track } from './track.ts';

/** Greatest and least effect of a group; both include 0, the group being off the structure. */
export interface Extremes {
  max: number;
  min: number;
}

/**
 * Runs a group over an influence line. Candidates are the swept placings, the vertex of the parabola through the best of
 * them and its neighbours, and every axle on the section itself, where the line has its peak or jump.
 * @param line element line on the stations of the track
 * @param section station of the section the line belongs to, or -1 for a line without peak or jump (reaction, deflection)
 * @param of what the line is made of, where it is that of a section of a stretch: a short cut to the same sums
 * @returns the placings, which hold the sums of this line until the next run
 */
export function runGroup(
  track: Track,
  group: AxleGroup,
  line: Float64Array,
  section: number,
  out: Extremes,
  of?: StretchSection,
): Placings {
  const placings = placingsOf(track, group);
  const { positive, negative, swept } = placings;
  if (of && group.whole) sumSection(track, group, line, of);
  else sumPlacings(placings, group, line, 0, swept);
  let top = 0;
  let bottom = 0;
  let most = positive[0]!;
  let least = negative[0]!;
  for (let k = 1; k < swept; k++) {
    const up = positive[k]!;
    const down = negative[k]!;
    if (up > most) {
      most = up;
      top = k;
    }
    if (down < least) {
      least = down;
      bottom = k;
    }
  }
  out.max = Math.max(0, most);
  out.min = Math.min(0, least);
  if (out.max > 0) out.max = Math.max(out.max, vertexValue(track, group, placings, line, top, 1));
  if (out.min < 0) out.min = Math.min(out.min, vertexValue(track, group, placings, line, bottom, -1));
  if (section >= 0) onSection(placings, group, line, section, track.xM.length, out);
  return placings;
}

/**
 * Position of the vertex of the parabola through placing k and its neighbours, m; the placing itself when they do not
 * bend the right way. `sign` is 1 for a maximum and -1 for a minimum.
 */
export function vertexM(placings: Placings, k: number, sign: 1 | -1): number {
  const { positionM: P, swept } = placings;
  const S = sign > 0 ? placings.positive : placings.negative;
  let before = k - 1;
  while (before >= 0 && P[k]! - P[before]! < 1e-6) before--;
  let after = k + 1;
  while (after < swept && P[after]! - P[k]! < 1e-6) after++;
  if (before < 0 || after >= swept) return P[k]!;
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
  k: number,
  sign: 1 | -1,
): number {
  const at = vertexM(placings, k, sign);
  return at === placings.positionM[k] ? 0 : effectAt(track, group, line, at, sign);
}

/** Each axle on the section: just right of it, as the placings read a jump, and just left of it. */
function onSection(
  placings: Placings,
  group: AxleGroup,
  line: Float64Array,
  section: number,
  stations: number,
  out: Extremes,
): void {
  const { positive, negative, onStation, swept } = placings;
  const whole = group.whole;
  const before = section > 0 ? line[4 * section - 2]! : line[0]!;
  const after = 4 * section < line.length ? line[4 * section]! : before;
  for (let i = 0; i < group.atM.length; i++) {
    const k = onStation[i * stations + section]!;
    if (k >= swept) sumPlacings(placings, group, line, k, k + 1);
    const load = group.loadKN[i]!;
    const toLeftMax = load * (whole ? before - after : Math.max(before, 0) - Math.max(after, 0));
    const toLeftMin = load * (whole ? before - after : Math.min(before, 0) - Math.min(after, 0));
    out.max = Math.max(out.max, positive[k]! + Math.max(0, toLeftMax));
    out.min = Math.min(out.min, negative[k]! + Math.min(0, toLeftMin));
  }
}
