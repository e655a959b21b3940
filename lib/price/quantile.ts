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
  const ends = new Uint32Array(BINS + 1);
  for (let k = 0; k < n; k++) {
    const bin = ((values[k]! - low) * perUnit) | 0;
    ends[bin] = ends[bin]! + 1;
  }
  for (let bin = 1; bin <= BINS; bin++) ends[bin] = ends[bin]! + ends[bin - 1]!;

  const places = [...new Set(ps.flatMap((p) => [Math.floor(p * (n - 1)), Math.ceil(p * (n - 1))]))];
  const binOf = (place: number): number => ends.findIndex((end) => place < end);
  const bins = new Map<number, number[]>(places.map((place) => [binOf(place), []]));
  const isAsked = new Uint8Array(BINS + 1);
  for (const bin of bins.keys()) isAsked[bin] = 1;
  for (let k = 0; k < n; k++) {
    const bin = ((values[k]! - low) * perUnit) | 0;
    if (isAsked[bin] === 1) bins.get(bin)!.push(values[k]!);
  }
  for (const inside of bins.values()) inside.sort((a, b) => a - b);

  const smallest = (place: number): number => {
    const bin = binOf(place);
    return bins.get(bin)![place - (bin > 0 ? ends[bin - 1]! : 0)]!;
  };
  return ps.map((p) => {
    const at = p * (n - 1);
    const below = smallest(Math.floor(at));
    return below + (at - Math.floor(at)) * (smallest(Math.ceil(at)) - below);
  });
}

/** One quantile; see `quantilesOf`. */
export const quantileOf = (values: Float64Array, p: number): number => quantilesOf(values, [p])[0]!;
