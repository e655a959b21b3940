/**
 * Which support of a unit holds the deck along the road: the one nearest the middle of the unit; of two equally near the
 * one with the lower pier, then the one in shallower water, then the first. Chainages, heights and water depths in metres.
 */
export function fixedSupport(
  supportsM: readonly number[],
  heightM: readonly number[],
  waterDepthM: readonly number[],
): number {
  const middle = (supportsM[0]! + supportsM.at(-1)!) / 2;
  let best = 0;
  for (let i = 1; i < supportsM.length; i++) {
    const nearer = Math.abs(supportsM[best]! - middle) - Math.abs(supportsM[i]! - middle);
    const lower = heightM[best]! - heightM[i]!;
    const drier = waterDepthM[best]! - waterDepthM[i]!;
    const gain = [nearer, lower, drier].find((difference) => Math.abs(difference) > alike) ?? 0;
    if (gain > 0) best = i;
  }
  return best;
}

/** Differences below this are no reason to prefer one support, m. */
const alike = 1e-6;
