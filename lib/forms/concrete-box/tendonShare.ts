import type { LineBeam } from '../../mechanics/index.ts';
import { boxData } from './boxData.ts';

/**
 * Strands along a unit as a share of those in its heaviest span, at the stations: spans take them by a power of their
 * length (an end span counts as a longer inner one), piers those of the heavier span beside them, and the strands that
 * are not needed end in the lighter span.
 * @param power 0 keeps every strand from end to end
 */
export function tendonShare(spansM: readonly number[], beam: LineBeam, power: number): Float64Array {
  const { leastShare, runsOnOver, endsByOver } = boxData.staggering;
  const lengths = alike(spansM);
  const longest = Math.max(...lengths);
  const shares = lengths.map((length) => Math.max(leastShare, (length / longest) ** power));
  const along = new Float64Array(beam.xM.length);
  spansM.forEach((spanM, span) => {
    const own = shares[span]!;
    const from = beam.supportAt[span]!;
    // What still runs on from the neighbour at a distance from the pier, as a share of the span.
    const rest = (neighbour: number | undefined, distance: number): number => {
      if (neighbour === undefined || !(neighbour > own)) return own;
      const gone = Math.min(1, Math.max(0, (distance - runsOnOver) / (endsByOver - runsOnOver)));
      return neighbour + gone * (own - neighbour);
    };
    for (let i = from; i <= beam.supportAt[span + 1]!; i++) {
      const x = (beam.xM[i]! - beam.xM[from]!) / spanM;
      along[i] = Math.max(rest(shares[span - 1], x), rest(shares[span + 1], 1 - x));
    }
  });
  return along;
}

/** Powers worth trying: one where the spans are alike, so that nothing is gained by ending strands. */
export function sharePowers(spansM: readonly number[]): readonly number[] {
  const lengths = alike(spansM);
  const spread = Math.min(...lengths) / Math.max(...lengths);
  return spread > boxData.staggering.alikeFrom ? [0] : [0, 1, 2];
}

/** Lengths of inner spans that bend alike, m. */
function alike(spansM: readonly number[]): number[] {
  const last = spansM.length - 1;
  if (last === 0) return [...spansM];
  return spansM.map((span, i) => (i === 0 || i === last ? span / boxData.staggering.endOverInner : span));
}
