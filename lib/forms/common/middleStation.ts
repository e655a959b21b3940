import type { LineBeam } from '../../mechanics/index.ts';

/** Station of a beam that lies nearest to the middle of a span; of two equally near the first. */
export function middleStation(beam: Pick<LineBeam, 'xM' | 'supportAt'>, span: number): number {
  const from = beam.supportAt[span]!;
  const to = beam.supportAt[span + 1]!;
  const middleM = (beam.xM[from]! + beam.xM[to]!) / 2;
  let at = from;
  for (let i = from + 1; i <= to; i++)
    if (Math.abs(beam.xM[i]! - middleM) < Math.abs(beam.xM[at]! - middleM) - 1e-9) at = i;
  return at;
}
