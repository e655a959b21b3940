import { solveBand } from './bandFactor.ts';
import type { LineBeam } from './lineBeam.ts';

/** What a couple on a beam does: moments sagging positive, kNm, just left and just right of each station, and how it turns, radians. */
export interface CoupleEffects {
  readonly leftKNm: Float64Array;
  readonly rightKNm: Float64Array;
  /** Positive where the beam falls to the right. */
  readonly turnRad: Float64Array;
}

/**
 * A couple of 1 kNm at a station, positive where it turns the beam to fall to the right: the moment leaps up by it there.
 * At hinges the turn is that just right of them.
 * @throws RangeError for a station that the beam has not
 */
export function coupleAt(beam: LineBeam, station: number): CoupleEffects {
  const { xM, freedoms, ends } = beam;
  const n = xM.length;
  if (!(station >= 0 && station < n))
    throw new RangeError(`station: expected 0 to ${n - 1}, received ${station}`);
  const { w, left, right, count } = freedoms;
  const u = new Float64Array(count);
  u[right[station]!] = 1;
  for (const freedom of beam.fixed) u[freedom] = 0;
  solveBand(beam.factors, count, u);
  const leftKNm = new Float64Array(n);
  const rightKNm = new Float64Array(n);
  const turnRad = new Float64Array(n);
  for (let e = 0; e < n - 1; e++) {
    const chord = (u[w[e + 1]!]! - u[w[e]!]!) / (xM[e + 1]! - xM[e]!);
    const a = u[right[e]!]! - chord;
    const b = u[left[e + 1]!]! - chord;
    rightKNm[e] = ends[3 * e]! * a + ends[3 * e + 1]! * b;
    leftKNm[e + 1] = -ends[3 * e + 1]! * a - ends[3 * e + 2]! * b;
  }
  for (let i = 0; i < n; i++) turnRad[i] = u[right[i]!]!;
  return { leftKNm, rightKNm, turnRad };
}
