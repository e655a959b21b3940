/** Lines added in one pass over the draws: what is added to is read and written once for four. */
const TOGETHER = 4;

/**
 * Adds the sum of quantities times their rates to T, in each draw times a factor: T + factor (q1 R1 + q2 R2 + ...).
 * `factor` null = 1. All arrays hold one value a draw; there are as many rates as quantities.
 */
export function addLines(
  T: Float64Array,
  factor: Float64Array | null,
  quantities: readonly number[],
  rates: readonly Float64Array[],
): void {
  const n = T.length;
  let at = 0;
  for (; at + TOGETHER <= rates.length; at += TOGETHER) {
    const [a, b, c, d] = quantities.slice(at, at + TOGETHER) as Four<number>;
    const [A, B, C, D] = rates.slice(at, at + TOGETHER) as Four<Float64Array>;
    if (factor === null) {
      for (let k = 0; k < n; k++) T[k] = T[k]! + (a * A[k]! + b * B[k]! + c * C[k]! + d * D[k]!);
    } else {
      for (let k = 0; k < n; k++)
        T[k] = T[k]! + factor[k]! * (a * A[k]! + b * B[k]! + c * C[k]! + d * D[k]!);
    }
  }
  for (; at < rates.length; at++) {
    const [a, A] = [quantities[at]!, rates[at]!];
    if (factor === null) for (let k = 0; k < n; k++) T[k] = T[k]! + a * A[k]!;
    else for (let k = 0; k < n; k++) T[k] = T[k]! + factor[k]! * a * A[k]!;
  }
}

/** The same in the draws listed in `where` alone. */
export function addLinesIn(
  where: Uint32Array,
  T: Float64Array,
  factor: Float64Array,
  quantities: readonly number[],
  rates: readonly Float64Array[],
): void {
  const n = where.length;
  let at = 0;
  for (; at + TOGETHER <= rates.length; at += TOGETHER) {
    const [a, b, c, d] = quantities.slice(at, at + TOGETHER) as Four<number>;
    const [A, B, C, D] = rates.slice(at, at + TOGETHER) as Four<Float64Array>;
    for (let i = 0; i < n; i++) {
      const k = where[i]!;
      T[k] = T[k]! + factor[k]! * (a * A[k]! + b * B[k]! + c * C[k]! + d * D[k]!);
    }
  }
  for (; at < rates.length; at++) {
    const [a, A] = [quantities[at]!, rates[at]!];
    for (let i = 0; i < n; i++) {
      const k = where[i]!;
      T[k] = T[k]! + factor[k]! * a * A[k]!;
    }
  }
}

type Four<T> = [T, T, T, T];
