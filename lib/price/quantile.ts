/**
 * Quantile of draws, linear between order statistics at p (n - 1). `scratch` is overwritten (its order changes); 0 <= p <= 1.
 * Throws a RangeError on an empty array.
 */
export function quantileOf(scratch: Float64Array, p: number): number {
  const n = scratch.length;
  if (n === 0) throw new RangeError('quantile: expected at least one draw, received none');
  const at = p * (n - 1);
  const i = Math.floor(at);
  select(scratch, i);
  const low = scratch[i]!;
  if (at === i) return low;
  let next = Infinity;
  for (let k = i + 1; k < n; k++) next = Math.min(next, scratch[k]!);
  return low + (at - i) * (next - low);
}

/** Puts the k-th smallest value at index k, smaller ones before it and larger ones behind (Hoare's selection, middle pivot). */
function select(values: Float64Array, k: number): void {
  let left = 0;
  let right = values.length - 1;
  while (left < right) {
    const pivot = values[(left + right) >> 1]!;
    let i = left;
    let j = right;
    while (i <= j) {
      while (values[i]! < pivot) i++;
      while (values[j]! > pivot) j--;
      if (i <= j) {
        const swap = values[i]!;
        values[i] = values[j]!;
        values[j] = swap;
        i++;
        j--;
      }
    }
    if (k <= j) right = j;
    else if (k >= i) left = i;
    else return;
  }
}
