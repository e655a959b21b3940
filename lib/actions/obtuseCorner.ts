import type { TrafficLoad } from './trafficLoad.ts';

/** Largest skew the factors hold for, degrees; beyond it they are taken at it (table 4.6.2.2.3c-1). */
export const MOST_SKEW_DEG = 60;

/** Tangent of a skew either way, degrees, within the range of the factors. */
export const skewTangent = (skewDeg: number): number =>
  Math.tan((Math.min(Math.abs(skewDeg), MOST_SKEW_DEG) * Math.PI) / 180);

/*
 * What shear from traffic grows by at the obtuse corner of a skew deck, by its kind: AASHTO LRFD table 4.6.2.2.3c-1 (from
 * memory). 1 on a square deck. The factors are those of the outer girder; all girders of a deck are made alike.
 */

/** Concrete slab on girders (types a, e and k): 1 + 0.2 (12 L ts3 / Kg)^0.3 tan. Span and slab in m, Kg in m4. */
export function girderCorner(
  { spanM, slabM, kgM4 }: { readonly spanM: number; readonly slabM: number; readonly kgM4: number },
  skewDeg: number,
): number {
  return 1 + 0.2 * ((spanM * slabM ** 3) / kgM4) ** 0.3 * skewTangent(skewDeg);
}

/** Slab on closed or open boxes that stand apart (types b and c): 1 + sqrt(L d / 12) / (6 S) tan, in ft and inches. */
export function spreadBoxCorner(
  { spanM, depthM, spacingM }: { readonly spanM: number; readonly depthM: number; readonly spacingM: number },
  skewDeg: number,
): number {
  return 1 + (Math.sqrt(spanM * depthM) / (6 * spacingM)) * skewTangent(skewDeg);
}

/** Boxes side by side (types f and g): 1 + L / (90 d) sqrt(tan). */
export function closeBeamCorner(
  { spanM, depthM }: { readonly spanM: number; readonly depthM: number },
  skewDeg: number,
): number {
  return 1 + (spanM / (90 * depthM)) * Math.sqrt(skewTangent(skewDeg));
}

/** Cellular deck cast in one (type d): 1 + (0.25 + L / (70 d)) tan. */
export function cellularCorner(
  { spanM, depthM }: { readonly spanM: number; readonly depthM: number },
  skewDeg: number,
): number {
  return 1 + (0.25 + spanM / (70 * depthM)) * skewTangent(skewDeg);
}

/** A load with what its shears grow by at an obtuse corner. */
export const atObtuseCorner = (load: TrafficLoad, factor: number): TrafficLoad =>
  factor === 1 ? load : { ...load, obtuse: factor };
