/** Entries a matrix row keeps: the diagonal and three below it, enough for a chain of beam elements. */
export const bandWidth = 4;

/**
 * Factors a symmetric positive definite band matrix into L D Lt, in place.
 * `A` holds n rows of `bandWidth`: A[4 i + d] is the entry (i, i - d). Afterwards d = 0 holds D and d > 0 holds L.
 * @returns the row of the first pivot that is not positive, or -1 when all are (the structure stands).
 */
export function factorBand(A: Float64Array, n: number): number {
  for (let i = 0; i < n; i++) {
    const diagonal = A[bandWidth * i]!;
    let pivot = diagonal;
    for (let d = Math.min(bandWidth - 1, i); d > 0; d--) {
      const j = i - d;
      let sum = A[bandWidth * i + d]!;
      for (let k = Math.max(0, i - bandWidth + 1); k < j; k++) {
        // Entries of row i are still L times D here; row j is already L alone.
        sum -= A[bandWidth * i + (i - k)]! * A[bandWidth * j + (j - k)]!;
      }
      A[bandWidth * i + d] = sum;
    }
    for (let d = Math.min(bandWidth - 1, i); d > 0; d--) {
      const scaled = A[bandWidth * i + d]!;
      const ratio = scaled / A[bandWidth * (i - d)]!;
      pivot -= scaled * ratio;
      A[bandWidth * i + d] = ratio;
    }
    if (!(pivot > 1e-13 * diagonal)) return i;
    A[bandWidth * i] = pivot;
  }
  return -1;
}

/** Solves L D Lt x = b in place with the factors of `factorBand`; `b` has n entries from `offset`. */
export function solveBand(F: Float64Array, n: number, b: Float64Array): void {
  for (let i = 0; i < n; i++) {
    let sum = b[i]!;
    const row = bandWidth * i;
    if (i > 2) sum -= F[row + 3]! * b[i - 3]!;
    if (i > 1) sum -= F[row + 2]! * b[i - 2]!;
    if (i > 0) sum -= F[row + 1]! * b[i - 1]!;
    b[i] = sum;
  }
  for (let i = 0; i < n; i++) b[i] = b[i]! / F[bandWidth * i]!;
  for (let i = n - 1; i > 0; i--) {
    const x = b[i]!;
    const row = bandWidth * i;
    b[i - 1] = b[i - 1]! - F[row + 1]! * x;
    if (i > 1) b[i - 2] = b[i - 2]! - F[row + 2]! * x;
    if (i > 2) b[i - 3] = b[i - 3]! - F[row + 3]! * x;
  }
}
