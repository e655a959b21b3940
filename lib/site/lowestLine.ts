/** One linear demand on the rises of the two ends: atStart x startRise + atEnd x endRise >= least. */
export interface Demand {
  readonly atStart: number;
  readonly atEnd: number;
  readonly least: number;
}

/** Rises of the two ends of the road, m. */
export interface Rises {
  readonly start: number;
  readonly end: number;
}

const TOLERANCE = 1e-9;

function meets(demands: readonly Demand[], rises: Rises): boolean {
  return demands.every((d) => d.atStart * rises.start + d.atEnd * rises.end >= d.least - TOLERANCE);
}

function crossing(a: Demand, b: Demand): Rises | null {
  const determinant = a.atStart * b.atEnd - a.atEnd * b.atStart;
  if (Math.abs(determinant) < 1e-12) return null;
  return {
    start: (a.least * b.atEnd - b.least * a.atEnd) / determinant,
    end: (a.atStart * b.least - b.atStart * a.least) / determinant,
  };
}

/**
 * The least rises that meet every demand: smallest sum, and of equal sums the most equal ends. Null when nothing does.
 * The demands bound the region (both rises at least 0 and at most what is allowed are among them), so the answer lies
 * where two of them meet; there are a few dozen at most, so every pair is tried.
 */
export function lowestLine(demands: readonly Demand[]): Rises | null {
  let best: Rises | null = null;
  let bestSum = Infinity;
  let bestSpread = Infinity;
  for (let i = 0; i < demands.length; i += 1) {
    for (let j = i + 1; j < demands.length; j += 1) {
      const rises = crossing(demands[i]!, demands[j]!);
      if (rises === null || !meets(demands, rises)) continue;
      const sum = rises.start + rises.end;
      const spread = Math.abs(rises.start - rises.end);
      if (sum < bestSum - TOLERANCE || (sum < bestSum + TOLERANCE && spread < bestSpread - TOLERANCE)) {
        best = rises;
        bestSum = sum;
        bestSpread = spread;
      }
    }
  }
  return best;
}
