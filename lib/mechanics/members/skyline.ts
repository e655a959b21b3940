/** A symmetric positive definite matrix kept by columns from the first entry that is not nil (skyline). */
export interface Skyline {
  readonly n: number;
  /** First row of each column. */
  readonly first: Int32Array;
  /** Where the diagonal of each column stands in `values`; entry (i, j) with i <= j is values[diagonal[j] - (j - i)]. */
  readonly diagonal: Int32Array;
  readonly values: Float64Array;
}

/** An empty matrix with room for every entry named by pairs of rows that meet in a member. */
export function makeSkyline(n: number, meetings: Iterable<readonly number[]>): Skyline {
  const first = Int32Array.from({ length: n }, (_, i) => i);
  for (const rows of meetings) {
    const least = Math.min(...rows);
    for (const row of rows) if (least < first[row]!) first[row] = least;
  }
  const diagonal = new Int32Array(n);
  let at = -1;
  for (let j = 0; j < n; j++) {
    at += j - first[j]! + 1;
    diagonal[j] = at;
  }
  return { n, first, diagonal, values: new Float64Array(at + 1) };
}

export function addEntry(K: Skyline, i: number, j: number, value: number): void {
  const row = Math.min(i, j);
  const column = Math.max(i, j);
  K.values[K.diagonal[column]! - (column - row)]! += value;
}

/** Factors in place into Lt D L by columns. @returns the first column whose pivot is not positive, or -1 */
export function factorSkyline(K: Skyline): number {
  const { n, first, diagonal, values } = K;
  for (let j = 0; j < n; j++) {
    const base = diagonal[j]! - j;
    const original = values[diagonal[j]!]!;
    for (let i = first[j]! + 1; i < j; i++) {
      const other = diagonal[i]! - i;
      let sum = values[base + i]!;
      for (let k = Math.max(first[i]!, first[j]!); k < i; k++) sum -= values[other + k]! * values[base + k]!;
      values[base + i] = sum;
    }
    let pivot = original;
    for (let k = first[j]!; k < j; k++) {
      const scaled = values[base + k]!;
      const ratio = scaled / values[diagonal[k]!]!;
      pivot -= scaled * ratio;
      values[base + k] = ratio;
    }
    if (!(pivot > 1e-11 * original)) return j;
    values[diagonal[j]!] = pivot;
  }
  return -1;
}

/** Solves in place with the factors of `factorSkyline`. */
export function solveSkyline(K: Skyline, b: Float64Array): void {
  const { n, first, diagonal, values } = K;
  for (let j = 0; j < n; j++) {
    const base = diagonal[j]! - j;
    let sum = b[j]!;
    for (let k = first[j]!; k < j; k++) sum -= values[base + k]! * b[k]!;
    b[j] = sum;
  }
  for (let j = 0; j < n; j++) b[j] = b[j]! / values[diagonal[j]!]!;
  for (let j = n - 1; j > 0; j--) {
    const base = diagonal[j]! - j;
    const x = b[j]!;
    for (let k = first[j]!; k < j; k++) b[k] = b[k]! - values[base + k]! * x;
  }
}
