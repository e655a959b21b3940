/**
 * Steps of plate thickness along a girder: the cheapest run of plates that is nowhere thinner than needed.
 *
 * A change of thickness costs a butt weld, counted as `changeKg` of steel; more changes save mass, fewer save welds.
 * Exact by dynamic programming over the elements.
 *
 * @param needM thickness needed in each element, m
 * @param lengthM length of each element, m
 * @param kgPerM3OfPlate mass per m of length and m of thickness: width x density, kg/m2
 * @param changeKg steel that a change of thickness is worth, kg
 * @param leastLengthM shortest plate worth handling, m
 * @param roundUp next plate thickness that is rolled, m
 * @returns thickness of each element, m
 */
export function plateSteps(
  needM: ArrayLike<number>,
  lengthM: ArrayLike<number>,
  kgPerM3OfPlate: number,
  changeKg: number,
  leastLengthM: number,
  roundUp: (thicknessM: number) => number,
): Float64Array {
  const n = needM.length;
  const rolled = new Float64Array(n).map((_, e) => roundUp(needM[e]!));
  const best = new Float64Array(n + 1).fill(Infinity);
  const from = new Int32Array(n + 1);
  best[0] = 0;
  const weighted = mirroredWeights(lengthM);
  for (let end = 1; end <= n; end++) {
    let thickest = 0;
    let length = 0;
    let weight = 0;
    for (let start = end - 1; start >= 0; start--) {
      thickest = Math.max(thickest, rolled[start]!);
      length += lengthM[start]!;
      weight += weighted[start]!;
      // A run shorter than a plate is allowed only where the whole girder is.
      if (length < leastLengthM && !(start === 0 && end === n)) continue;
      const cost = best[start]! + kgPerM3OfPlate * thickest * weight + (start > 0 ? changeKg : 0);
      if (cost < best[end]!) {
        best[end] = cost;
        from[end] = start;
      }
    }
  }
  const steps = new Float64Array(n);
  for (let end = n; end > 0;) {
    const start = from[end]!;
    let thickest = 0;
    for (let e = start; e < end; e++) thickest = Math.max(thickest, rolled[e]!);
    steps.fill(thickest, start, end);
    end = start;
  }
  return steps;
}

/** Lengths with a trace more weight away from the middle: of two equal solutions the same one is found from either end. */
function mirroredWeights(lengthM: ArrayLike<number>): Float64Array {
  let total = 0;
  for (let e = 0; e < lengthM.length; e++) total += lengthM[e]!;
  let x = 0;
  const weighted = new Float64Array(lengthM.length);
  for (let e = 0; e < weighted.length; e++) {
    const length = lengthM[e]!;
    const away = Math.abs(x + length / 2 - total / 2) / total;
    x += length;
    weighted[e] = length * (1 + 1e-7 * away);
  }
  return weighted;
}
