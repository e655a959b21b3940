import { boxSection, type BoxSection } from './boxSection.ts';
import type { BoxModel } from './boxModel.ts';
import { betweenZeros, lagOf, type Lag } from './shearLag.ts';

/** Thicknesses that are sought, m. */
export interface Thicknesses {
  readonly webM: number;
  /** Web over the supports. */
  readonly supportWebM: number;
  readonly bottomM: number;
  /** Bottom slab over inner supports. */
  readonly pierBottomM: number;
}

/** The box along its length, at the stations of the beam. */
export interface SectionsAlong {
  readonly span: BoxSection;
  readonly pier: BoxSection;
  readonly webM: Float64Array;
  readonly bottomM: Float64Array;
  readonly areaM2: Float64Array;
  readonly inertiaM4: Float64Array;
  /** Top of slab to centroid, and centroid to soffit, m. */
  readonly topM: Float64Array;
  readonly lowM: Float64Array;
  /** What shear lag makes of the bending stress at the top and at the soffit. */
  readonly topLag: Float64Array;
  readonly lowLag: Float64Array;
}

/** Properties run straight from the span to the supports with the thicknesses. */
export function sectionsAlong(model: BoxModel, t: Thicknesses): SectionsAlong {
  const { layout, task, pierShare, supportShare } = model;
  const span = boxSection(layout, task.depthM, t.webM, t.bottomM);
  const pier = boxSection(layout, task.depthM, t.supportWebM, t.pierBottomM);
  const end = boxSection(layout, task.depthM, t.supportWebM, t.bottomM);
  const zeros = betweenZeros(task.spansM);
  // What a web is thicker over an abutment hardly moves it.
  const lags = { span: lagOf(layout, span, zeros.inSpanM), pier: lagOf(layout, pier, zeros.overPierM) };
  const n = pierShare.length;
  const between = (a: number, atPier: number, atEnd: number, i: number): number =>
    a + pierShare[i]! * (atPier - a) + (supportShare[i]! - pierShare[i]!) * (atEnd - a);
  const along = (pick: (section: BoxSection) => number): Float64Array => {
    const values = [pick(span), pick(pier), pick(end)] as const;
    return Float64Array.from({ length: n }, (_, i) => between(...values, i));
  };
  const lagAlong = (pick: (lag: Lag) => number): Float64Array => {
    const values = [pick(lags.span), pick(lags.pier), pick(lags.span)] as const;
    return Float64Array.from({ length: n }, (_, i) => between(...values, i));
  };
  return {
    span,
    pier,
    topLag: lagAlong(({ top }) => top),
    lowLag: lagAlong(({ low }) => low),
    webM: along((section) => section.webM),
    bottomM: along((section) => section.bottomM),
    areaM2: along((section) => section.areaM2),
    inertiaM4: along((section) => section.inertiaM4),
    topM: along((section) => section.topM),
    lowM: along((section) => section.lowM),
  };
}
