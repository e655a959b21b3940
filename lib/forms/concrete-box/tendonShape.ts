import { imposedCurvature, type LineBeam } from '../../mechanics/index.ts';
import { boxData } from './boxData.ts';
import { tendonShare } from './tendonShare.ts';

/**
 * Draped tendons as a sum of three shapes, each 1 where its eccentricity is named: low points of end spans, low points
 * of inner spans, high points over piers. Tendons end at the centroid over the abutments.
 */
export interface TendonShapes {
  readonly shapes: readonly [endLow: Float64Array, innerLow: Float64Array, pier: Float64Array];
  /** Parasitic moment of unit force on each shape of unit eccentricity (downward positive), m, sagging positive. */
  readonly parasitic: readonly [Float64Array, Float64Array, Float64Array];
  /** Strands as a share of those in the heaviest span, at the stations, and their mean over the length. */
  readonly share: Float64Array;
  readonly meanShare: number;
}

/**
 * Parabolas with a reverse curve over the piers. Shorter spans are draped less, with the square of the span, as their
 * loads ask for. `power` of the span by which strands are shared out, see `tendonShare`; `stiffness` is that of the beam at its
 * stations, 1 unless given.
 */
export function tendonShapes(
  spansM: readonly number[],
  beam: LineBeam,
  power = 0,
  stiffness?: Float64Array,
): TendonShapes {
  const n = beam.xM.length;
  const shapes = [new Float64Array(n), new Float64Array(n), new Float64Array(n)] as const;
  const last = spansM.length - 1;
  const isEnd = (span: number): boolean => span === 0 || span === last;
  const longest = [true, false].map((end) => Math.max(0, ...spansM.filter((_, i) => isEnd(i) === end)));
  spansM.forEach((spanM, span) => {
    const from = beam.supportAt[span]!;
    const to = beam.supportAt[span + 1]!;
    const drape = (spanM / longest[isEnd(span) ? 0 : 1]!) ** 2;
    const low = isEnd(span) ? shapes[0] : shapes[1];
    const lowAt = lowPoint(span, last);
    for (let i = from; i <= to; i++) {
      const along = (beam.xM[i]! - beam.xM[from]!) / spanM;
      const left = along <= lowAt;
      const reach = left ? lowAt : 1 - lowAt;
      const inner = left ? span > 0 : span < last;
      const support = supportWeight(
        (left ? along : 1 - along) / reach,
        inner ? boxData.profile.inflection / reach : 0,
      );
      low[i] = drape * (1 - support);
      if (inner) shapes[2][i] = support;
    }
  });
  const share = tendonShare(spansM, beam, power);
  let total = 0;
  for (let i = 1; i < n; i++) total += ((share[i - 1]! + share[i]!) / 2) * (beam.xM[i]! - beam.xM[i - 1]!);
  const curvature = new Float64Array(n);
  const parasitic = shapes.map((shape) => {
    for (let i = 0; i < n; i++) curvature[i] = (-share[i]! * shape[i]!) / (stiffness?.[i] ?? 1);
    return imposedCurvature(beam, curvature).momentKNm;
  });
  return {
    shapes,
    parasitic: [parasitic[0]!, parasitic[1]!, parasitic[2]!],
    share,
    meanShare: total / beam.lengthM,
  };
}

/** Where the low point lies, share of the span from its left support. */
function lowPoint(span: number, last: number): number {
  const { lowInEndSpan } = boxData.profile;
  if (last === 0 || (span > 0 && span < last)) return 0.5;
  return span === 0 ? lowInEndSpan : 1 - lowInEndSpan;
}

/** Weight of the support level part of the `way` from the support to the low point, with a reverse curve as far as `turn`. */
function supportWeight(way: number, turn: number): number {
  const u = Math.max(0, way);
  return u < turn ? 1 - (u * u) / turn : (1 - u) ** 2 / (1 - turn);
}
