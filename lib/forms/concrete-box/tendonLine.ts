import { imposedCurvature } from '../../mechanics/index.ts';
import type { BoxModel } from './boxModel.ts';
import type { BoxSection } from './boxSection.ts';
import type { Drape } from './leastForce.ts';
import type { SectionsAlong } from './sectionsAlong.ts';
import type { TendonGroup } from './tendonGroup.ts';
import type { TendonShapes } from './tendonShape.ts';

/** Draped tendons along the deck, at the stations. */
export interface TendonLine {
  /** Below the top of the slab, m. */
  readonly depthM: Float64Array;
  /** Below the centroid, m. */
  readonly eccentricityM: Float64Array;
  /** Parasitic moment of unit force, m, sagging positive. */
  readonly parasiticM: Float64Array;
  /** Strands as a share of those in the heaviest span. */
  readonly share: Float64Array;
}

/**
 * Tendon level and parasitic moment for any drape: both are sums of the same shapes. The arrays are used again by the
 * next call.
 */
export function tendonLine(
  model: Pick<BoxModel, 'beam'> & { readonly stiffness?: Float64Array },
  sections: Pick<SectionsAlong, 'topM'> & { readonly span: Pick<BoxSection, 'topM' | 'lowM'> },
  group: Pick<TendonGroup, 'fromFaceM'>,
  { shapes, parasitic, share }: TendonShapes,
): (drape: Drape) => TendonLine {
  const { topM, lowM } = sections.span;
  const low = Math.max(0, lowM - group.fromFaceM);
  const high = -Math.max(0, topM - group.fromFaceM);
  // Where the bottom slab is thicker the centroid lies lower and the tendon higher above it.
  const shift = sections.topM.map((top) => topM - top);
  const shiftParasitic = imposedCurvature(
    model.beam,
    shift.map((value, i) => (-share[i]! * value) / (model.stiffness?.[i] ?? 1)),
  ).momentKNm;
  const n = shift.length;
  const depthM = new Float64Array(n);
  const eccentricityM = new Float64Array(n);
  const parasiticM = new Float64Array(n);
  return ([end, inner, pier]) => {
    const a = end * low;
    const b = inner * low;
    const c = pier * high;
    for (let i = 0; i < n; i++) {
      const e = a * shapes[0][i]! + b * shapes[1][i]! + c * shapes[2][i]!;
      depthM[i] = topM + e;
      eccentricityM[i] = e + shift[i]!;
      parasiticM[i] = a * parasitic[0][i]! + b * parasitic[1][i]! + c * parasitic[2][i]! + shiftParasitic[i]!;
    }
    return { depthM, eccentricityM, parasiticM, share };
  };
}
