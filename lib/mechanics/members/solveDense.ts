/**
 * Solves a small dense system by elimination with row exchange; A and b are left as they were.
 * @throws RangeError when the matrix is singular
 */
export function solveDense(A: readonly (readonly number[])[], b: readonly number[]): number[] {
  const n = b.length;
  const M = A.map((row, i) => [...row, b[i]!]);
  for (let c = 0; c < n; c++) {
    let pivot = c;
    for (let r = c + 1; r < n; r++) if (Math.abs(M[r]![c]!) > Math.abs(M[pivot]![c]!)) pivot = r;
    [M[c], M[pivot]] = [M[pivot]!, M[c]!];
    const lead = M[c]![c]!;
    if (!(Math.abs(lead) > 1e-14))
      throw new RangeError('system: expected one solution, received a singular matrix');
    for (let r = c + 1; r < n; r++) {
      const factor = M[r]![c]! / lead;
      if (factor === 0) continue;
      for (let k = c; k <= n; k++) M[r]![k]! -= factor * M[c]![k]!;
    }
  }
  const x = new Array<number>(n).fill(0);
  for (let r = n - 1; r >= 0; r--) {
    let sum = M[r]![n]!;
    for (let k = r + 1; k < n; k++) sum -= M[r]![k]! * x[k]!;
    x[r] = sum / M[r]![r]!;
  }
  return x;
}
