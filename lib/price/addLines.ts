/** Lines that add to one thing in the same draws by the same factor. */
export interface Sum {
  /** What they add to, one value a draw. */
  readonly to: Float64Array;
  /** What their sum is multiplied by in each draw. */
  readonly factor: Float64Array;
  /** The draws they count in, rising; null = all. */
  readonly draws: Uint32Array | null;
  readonly quantities: readonly number[];
  /** Money per unit in each draw, one for each quantity. */
  readonly rates: readonly Float64Array[];
}

/** Lines added in one pass over the draws: what is added to is read and written once for four. */
const TOGETHER = 4;

type Four<T> = [T, T, T, T];

/** Adds the lines in the draws from `from` to before `to`: factor (q1 R1 + q2 R2 + ...) in each. */
export function addLines({ to: T, factor, draws, quantities, rates }: Sum, from: number, to: number): void {
  const first = draws && placeOf(draws, from);
  const last = draws && placeOf(draws, to);
  for (let at = 0; at < rates.length; at += TOGETHER) {
    const some = rates.slice(at, at + TOGETHER);
    const of = quantities.slice(at, at + TOGETHER);
    // What is short of four is filled up with nothing.
    while (some.length < TOGETHER) {
      some.push(some[0]!);
      of.push(0);
    }
    if (draws) addIn(T, factor, draws, of as Four<number>, some as Four<Float64Array>, first!, last!);
    else addAll(T, factor, of as Four<number>, some as Four<Float64Array>, from, to);
  }
}

function addAll(
  T: Float64Array,
  factor: Float64Array,
  [a, b, c, d]: Four<number>,
  [A, B, C, D]: Four<Float64Array>,
  from: number,
  to: number,
): void {
  for (let k = from; k < to; k++) T[k] = T[k]! + factor[k]! * (a * A[k]! + b * B[k]! + c * C[k]! + d * D[k]!);
}

function addIn(
  T: Float64Array,
  factor: Float64Array,
  draws: Uint32Array,
  [a, b, c, d]: Four<number>,
  [A, B, C, D]: Four<Float64Array>,
  first: number,
  last: number,
): void {
  for (let i = first; i < last; i++) {
    const k = draws[i]!;
    T[k] = T[k]! + factor[k]! * (a * A[k]! + b * B[k]! + c * C[k]! + d * D[k]!);
  }
}

/** How many of rising numbers are below one. */
function placeOf(rising: Uint32Array, number: number): number {
  let low = 0;
  let high = rising.length;
  while (low < high) {
    const middle = (low + high) >> 1;
    if (rising[middle]! < number) low = middle + 1;
    else high = middle;
  }
  return low;
}
