/** Bins into which the values are counted: a few values fall into each. */
const BINS = 1024;
/** Every so-manieth value is looked at for the range of the bins. */
const SAMPLED = 8;

/** Scratch: the bin of each value, where each bin begins in the order, the bins asked for, values at their places in the order. */
let binOf = new Uint16Array(0);
let order = new Float64Array(0);
const begins = new Int32Array(BINS + 2);
const next = new Int32Array(BINS + 2);
const asked = new Uint8Array(BINS + 1);

/**
 * Quantiles of draws at the shares `ps`, linear between order statistics at p (n - 1); 0 <= p <= 1. The values are counted
 * into bins and only those in the bins asked for are sorted, which is several times quicker than selection and exact.
 * Throws a RangeError on an empty array.
 */
export function quantilesOf(values: Float64Array, ps: readonly number[]): number[] {
  const n = values.length;
  if (n === 0) throw new RangeError('quantile: expected at least one draw, received none');
  if (binOf.length < n) {
    binOf = new Uint16Array(n);
    order = new Float64Array(n);
  }
  countIntoBins(values);
  asked.fill(0);
  for (const p of ps) {
    asked[binAt(Math.floor(p * (n - 1)))] = 1;
    asked[binAt(Math.ceil(p * (n - 1)))] = 1;
  }
  collectAsked(values);
  for (let bin = 0; bin <= BINS; bin++)
    if (asked[bin] === 1) order.subarray(begins[bin], begins[bin + 1]).sort();
  return ps.map((p) => {
    const at = p * (n - 1);
    const below = order[Math.floor(at)]!;
    return below + (at - Math.floor(at)) * (order[Math.ceil(at)]! - below);
  });
}

/** Bins reach over a sample of the values; what lies outside falls into the first and the last. */
function countIntoBins(values: Float64Array): void {
  let low = Infinity;
  let high = -Infinity;
  for (let k = 0; k < values.length; k += SAMPLED) {
    const value = values[k]!;
    if (value < low) low = value;
    if (value > high) high = value;
  }
  const perUnit = high > low ? BINS / (high - low) : 0;
  const [bins, counts] = [binOf, begins];
  counts.fill(0);
  for (let k = 0; k < values.length; k++) {
    const bin = Math.max(0, Math.min(BINS, (values[k]! - low) * perUnit)) | 0;
    bins[k] = bin;
    counts[bin + 1] = counts[bin + 1]! + 1;
  }
  for (let bin = 0; bin <= BINS; bin++) counts[bin + 1] = counts[bin + 1]! + counts[bin]!;
}

/** The bin that holds a place in the order. */
function binAt(place: number): number {
  let low = 0;
  let high = BINS;
  while (low < high) {
    const middle = (low + high) >> 1;
    if (begins[middle + 1]! > place) high = middle;
    else low = middle + 1;
  }
  return low;
}

/** Values of the bins asked for, each bin at its places in the order. */
function collectAsked(values: Float64Array): void {
  const [bins, sorted] = [binOf, order];
  next.set(begins);
  for (let k = 0; k < values.length; k++) {
    const bin = bins[k]!;
    if (asked[bin] === 1) sorted[next[bin]!++] = values[k]!;
  }
}

/** One quantile; see `quantilesOf`. */
export const quantileOf = (values: Float64Array, p: number): number => quantilesOf(values, [p])[0]!;
