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

/** Draped tendons for any drape: level and parasitic moment are sums of the same shapes. */
export interface TendonLines {
  /** Strands as a share of those in the heaviest span, at the stations. */
  readonly share: Float64Array;
  /** At one station: below the top of the slab, m, below the centroid, m, and parasitic moment of unit force, m. */
  readonly depthM: (drape: Drape, i: number) => number;
  readonly eccentricityM: (drape: Drape, i: number) => number;
  readonly parasiticM: (drape: Drape, i: number) => number;
  /** At all stations. The arrays are used again by the next call. */
  readonly along: (drape: Drape) => TendonLine;
}

/** The lines that tendons of one way of sharing strands out can take along a deck. */
export function tendonLines(
  model: Pick<BoxModel, 'beam'> & { readonly stiffness?: Float64Array },
  sections: Pick<SectionsAlong, 'topM'> & { readonly span: Pick<BoxSection, 'topM' | 'lowM'> },
  group: Pick<TendonGroup, 'fromFaceM'>,
  { shapes, parasitic, share }: TendonShapes,
): TendonLines {
  const { topM, lowM } = sections.span;
  const low = Math.max(0, lowM - group.fromFaceM);
  const high = -Math.max(0, topM - group.fromFaceM);
  // Where the bottom slab is thicker the centroid lies lower and the tendon higher above it.
  const shift = sections.topM.map((top) => topM - top);
  const shiftParasitic = imposedCurvature(
    model.beam,
    shift.map((value, i) => (-share[i]! * value) / (model.stiffness?.[i] ?? 1)),
  ).momentKNm;
  const [endLow, innerLow, pierHigh] = shapes;
  const [ofEnd, ofInner, ofPier] = parasitic;
  const n = shift.length;
  const line = {
    depthM: new Float64Array(n),
    eccentricityM: new Float64Array(n),
    parasiticM: new Float64Array(n),
    share,
  };
  /** Below the centroid of the section in the span, m. */
  const levelM = (drape: Drape, i: number): number =>
    drape[0] * low * endLow[i]! + drape[1] * low * innerLow[i]! + drape[2] * high * pierHigh[i]!;
  const depthM = (drape: Drape, i: number): number => topM + levelM(drape, i);
  const eccentricityM = (drape: Drape, i: number): number => levelM(drape, i) + shift[i]!;
  const parasiticM = (drape: Drape, i: number): number =>
    drape[0] * low * ofEnd[i]! +
    drape[1] * low * ofInner[i]! +
    drape[2] * high * ofPier[i]! +
    shiftParasitic[i]!;
  return {
    share,
    depthM,
    eccentricityM,
    parasiticM,
    along(drape) {
      for (let i = 0; i < n; i++) {
        line.depthM[i] = depthM(drape, i);
        line.eccentricityM[i] = eccentricityM(drape, i);
        line.parasiticM[i] = parasiticM(drape, i);
      }
      return line;
    },
  };
}
