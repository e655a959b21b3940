import type { Effects, LineBeam } from '../../mechanics/index.ts';

/** Where a station quantity peaks within a span, by the parabola through its highest station and the two beside it. */
export function spanPeak(
  beam: LineBeam,
  values: Float64Array,
  span: number,
): { readonly value: number; readonly fromLeftM: number } {
  const from = beam.supportAt[span]!;
  const to = beam.supportAt[span + 1]!;
  let best = from + 1;
  for (let s = from + 1; s < to; s++) if (values[s]! > values[best]!) best = s;
  const h = beam.xM[best + 1]! - beam.xM[best]!;
  const before = values[best - 1]!;
  const at = values[best]!;
  const after = values[best + 1]!;
  const bend = before - 2 * at + after;
  const shift = bend < 0 ? (before - after) / (2 * bend) : 0;
  return {
    value: at + ((after - before) / 2) * shift + (bend / 2) * shift * shift,
    fromLeftM: beam.xM[best]! + shift * h - beam.xM[from]!,
  };
}

/** Points of contraflexure within a span, m from its left support, by the parabola through the stations about each. */
export function contraflexuresM(beam: LineBeam, effects: Effects, span: number): number[] {
  const from = beam.supportAt[span]!;
  const to = beam.supportAt[span + 1]!;
  const M = effects.momentKNm;
  const found: number[] = [];
  for (let s = from + 1; s < to - 1; s++) {
    if (M[s]! > 0 === M[s + 1]! > 0) continue;
    const h = beam.xM[s + 1]! - beam.xM[s]!;
    const curve = (M[s - 1]! - 2 * M[s]! + M[s + 1]!) / 2;
    const slope = M[s + 1]! - M[s]! - curve;
    const root = Math.sqrt(slope * slope - 4 * curve * M[s]!);
    const t = [(-slope + root) / (2 * curve), (-slope - root) / (2 * curve)].find((at) => at >= 0 && at <= 1);
    found.push(beam.xM[s]! - beam.xM[from]! + (t ?? 0) * h);
  }
  return found;
}
