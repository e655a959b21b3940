import type { LineBeam } from '../beam/lineBeam.ts';
import { loadTrack, type Track } from './track.ts';

/** The track along a beam: beams of equal geometry have the same stations and share its placings. */
export function beamTrack(beam: LineBeam): Track {
  const { left, right } = beam.freedoms;
  return loadTrack(
    beam.xM,
    left.some((freedom, i) => freedom !== right[i]),
  );
}

/** Element line of ordinates that run straight between stations. */
export function straightLine(xM: ArrayLike<number>, ordinates: ArrayLike<number>): Float64Array {
  const line = new Float64Array(4 * (xM.length - 1));
  for (let e = 0; e < xM.length - 1; e++) {
    const slope = (ordinates[e + 1]! - ordinates[e]!) / (xM[e + 1]! - xM[e]!);
    line[4 * e] = ordinates[e]!;
    line[4 * e + 1] = slope;
    line[4 * e + 2] = ordinates[e + 1]!;
    line[4 * e + 3] = slope;
  }
  return line;
}
