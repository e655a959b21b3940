/** Bins into which the values are counted: a few values fall into each. */
const BINS = 1024;

/**
 * Quantiles of draws at the shares `ps`, linear between order statistics at p (n - 1); 0 <= p <= 1. The values are counted
 * into bins and only those in the bins asked for are sorted, which is several times quicker than selection and exact.
 * Throws a RangeError on an empty array.
 */
export function quantilesOf(values: Float64Array, ps: readonly number[]): number[] {
  const n = values.length;
  if (n === 0) throw new RangeError('quantile: expected at least one draw, received none');
  let low = values[0]!;
  let high = low;
  for (let k = 1; k < n; k++) {
    const value = values[k]!;
    if (value < low) low = value;
    if (value > high) high = value;
  }
  // The largest value alone falls into one bin more.
  const perUnit = high > low ? BINS / (high - low) : 0;
  const binOf = new Uint16Array(n);
  const counts = new Uint32Array(BINS + 1);
  for (let k = 0; k < n; k++) {
    const bin = ((values[k]! - low) * perUnit) | 0;
    binOf[k] = bin;
    counts[bin] = counts[bin]! + 1;
  }

  /** The bin a place in the order falls into, and how many values are in the bins before it. */
  const binAt = (place: number): readonly [bin: number, before: number] => {
    let before = 0;
    let bin = 0;
    while (before + counts[bin]! <= place) before += counts[bin++]!;
    return [bin, before];
  };
  const inside = new Map<number, Float64Array>();
  const sorted = (bin: number): Float64Array => {
    let found = inside.get(bin);
    if (found === undefined) {
      found = new Float64Array(counts[bin]!);
      for (let k = 0, next = 0; next < found.length; k++) if (binOf[k] === bin) found[next++] = values[k]!;
      inside.set(bin, found.sort());
    }
    return found;
  };
  const smallest = (place: number): number => {
    const [bin, before] = binAt(place);
    return sorted(bin)[place - before]!;
  };
  return ps.map((p) => {
    const at = p * (n - 1);
    const below = smallest(Math.floor(at));
    return below + (at - Math.floor(at)) * (smallest(Math.ceil(at)) - below);
  });
}

/** One quantile; see `quantilesOf`. */
export const quantileOf = (values: Float64Array, p: number): number => quantilesOf(values, [p])[0]!;
