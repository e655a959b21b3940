import { effectAt, vertexM } from './axles.ts';
import type { AxleGroup, Placings, Track } from './track.ts';

/**
 * Greatest effect of one sign of two equal groups in one lane, the first axle of the second at least `apartM` behind
 * the first axle of the first (length of the group + clear distance).
 * @param placings of this group as `runGroup` left them for this line
 * @param sign 1 for the greatest, -1 for the least
 * @returns the effect with its sign; 0 when two groups do nothing adverse
 */
export function runTwoGroups(
  track: Track,
  group: AxleGroup,
  placings: Placings,
  line: Float64Array,
  apartM: number,
  sign: 1 | -1,
): number {
  const S = sign > 0 ? placings.positive : placings.negative;
  const P = placings.positionM;
  let ahead = -1;
  let behind = 0;
  let bestAhead = -1;
  let bestBehind = 0;
  let best = 0;
  let next = 0;
  for (let k = 0; k < placings.swept; k++) {
    for (; next < placings.swept && P[next]! <= P[k]! - apartM + 1e-9; next++) {
      if (ahead < 0 || sign * S[next]! > sign * S[ahead]!) ahead = next;
    }
    if (ahead < 0) continue;
    behind = k;
    const both = sign * (S[ahead]! + S[behind]!);
    if (both > best) {
      best = both;
      bestAhead = ahead;
      bestBehind = behind;
    }
  }
  if (bestAhead < 0) return 0;
  // Between placings: each at the vertex of its own parabola, moved apart when they come too close.
  const front = vertexM(placings, bestAhead, sign);
  const back = vertexM(placings, bestBehind, sign);
  const pair = (a: number, b: number): number =>
    sign * (effectAt(track, group, line, a, sign) + effectAt(track, group, line, b, sign));
  best = Math.max(
    best,
    pair(front, Math.max(back, front + apartM)),
    pair(Math.min(front, back - apartM), back),
  );
  const middle = (P[bestAhead]! + P[bestBehind]!) / 2;
  const reach = apartM / 2;
  return sign * Math.max(best, pair(middle - reach, middle + reach), closest(pair, front, back, apartM));
}

/** Two groups at the least distance, moved together: golden section about where they were found. */
function closest(
  pair: (a: number, b: number) => number,
  front: number,
  back: number,
  apartM: number,
): number {
  if (back - front > apartM * 1.2) return 0;
  const golden = 0.6180339887498949;
  let low = front - 0.1 * apartM;
  let high = back - apartM + 0.1 * apartM;
  let a = high - golden * (high - low);
  let b = low + golden * (high - low);
  let fa = pair(a, a + apartM);
  let fb = pair(b, b + apartM);
  for (let i = 0; i < 14; i++) {
    if (fa > fb) {
      high = b;
      b = a;
      fb = fa;
      a = high - golden * (high - low);
      fa = pair(a, a + apartM);
    } else {
      low = a;
      a = b;
      fa = fb;
      b = low + golden * (high - low);
      fb = pair(b, b + apartM);
    }
  }
  return Math.max(fa, fb);
}
