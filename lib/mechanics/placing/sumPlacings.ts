import type { AxleGroup, Placings } from './track.ts';

/**
 * Sums of the axles that add and of those that take away in placings `from` to before `to`; of a whole group all axles in
 * both.
 * @param line element line on the stations of the track
 */
export function sumPlacings(
  placings: Placings,
  { atM, whole }: AxleGroup,
  line: Float64Array,
  from: number,
  to: number,
): void {
  const axles = atM.length;
  const { entry, weight, positive, negative } = placings;
  let at = from * axles;
  for (let k = from; k < to; k++) {
    let all = 0;
    let adds = 0;
    for (let i = 0; i < axles; i++, at++) {
      const e = entry[at]!;
      const w = 4 * at;
      const value =
        weight[w]! * line[e]! +
        weight[w + 1]! * line[e + 1]! +
        weight[w + 2]! * line[e + 2]! +
        weight[w + 3]! * line[e + 3]!;
      all += value;
      if (value > 0) adds += value;
    }
    positive[k] = whole ? all : adds;
    if (!whole) negative[k] = all - adds;
  }
}
