/** Bins into which the values are counted: a few values fall into each. */
const BINS = 1024;
/** Every so-manieth value is looked at for the range of the bins. */
const SAMPLED = 8;

/**
 * Quantiles of draws at the shares `ps`, linear between order statistics at p (n - 1); 0 <= p <= 1. The values are counted
 * into bins and only those in the bins asked for are sorted, which is several times quicker than selection and exact.
 * Throws a RangeError on an empty array.
 */
export function quantilesOf(values: Float64Array, ps: readonly number[]): number[] {
  const n = values.length;
  if (n === 0) throw new RangeError('quantile: expected at least one draw, received none');
  // Bins reach over a sample of the values; what lies outside falls into the first and the last.
  let low = Infinity;
  let high = -Infinity;
  for (let k = 0; k < n; k += SAMPLED) {
    low = Math.min(low, values[k]!);
    high = Math.max(high, values[k]!);
  }
  const perUnit = high > low ? BINS / (high - low) : 0;
  const binOf = new Uint16Array(n);
  // Where each bin begins in the order; while counting, one place further on.
  const begins = new Int32Array(BINS + 2);
  for (let k = 0; k < n; k++) {
    const bin = Math.max(0, Math.min(BINS, (values[k]! - low) * perUnit)) | 0;
    binOf[k] = bin;
    begins[bin + 1] = begins[bin + 1]! + 1;
  }
  for (let bin = 0; bin <= BINS; bin++) begins[bin + 1] = begins[bin + 1]! + begins[bin]!;

  const asked = new Uint8Array(BINS + 1);
  const places = ps.map((p) => p * (n - 1));
  let bin = 0;
  for (const place of places.flatMap((at) => [Math.floor(at), Math.ceil(at)]).sort((a, b) => a - b)) {
    while (begins[bin + 1]! <= place) bin++;
    asked[bin] = 1;
  }
  const order = new Float64Array(n);
  const next = begins.slice();
  for (let k = 0; k < n; k++) {
    const of = binOf[k]!;
    if (asked[of] === 1) order[next[of]!++] = values[k]!;
  }
  for (let of = 0; of <= BINS; of++) if (asked[of] === 1) order.subarray(begins[of], begins[of + 1]).sort();
  return places.map((at) => {
    const below = order[Math.floor(at)]!;
    return below + (at - Math.floor(at)) * (order[Math.ceil(at)]! - below);
  });
}

/** One quantile; see `quantilesOf`. */
export const quantileOf = (values: Float64Array, p: number): number => quantilesOf(values, [p])[0]!;
