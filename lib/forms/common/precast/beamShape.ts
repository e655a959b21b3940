import { polygonProperties, type SectionPoint } from '../../../mechanics/index.ts';
import type { StandardId } from '../../../model/index.ts';
import { strandRows, type StrandRow } from './strandRows.ts';

/** Outline of a precast beam and what its checks read of it. Lengths m, y from its middle, z up from the soffit. */
export interface BeamOutline {
  readonly name: string;
  readonly depthM: number;
  /** All webs together. */
  readonly webM: number;
  /** Concrete at the top, all flanges together, and the pieces of it that the fill lies on. */
  readonly topWidthM: number;
  readonly seats: readonly (readonly [fromM: number, toM: number])[];
  /** Over the top, gaps between flanges included. */
  readonly acrossM: number;
  readonly bottomWidthM: number;
  /** Height of the full bottom flange, m. */
  readonly bottomFlangeM: number;
  readonly points: readonly SectionPoint[];
  readonly holes: readonly (readonly SectionPoint[])[];
  /** Axis of a strand from the faces of holes, m, where it may be nearer than to the outside. */
  readonly voidAxisM?: number;
}

/** A precast beam: outline, section and where its strands fit. */
export interface BeamShape extends BeamOutline {
  readonly areaM2: number;
  readonly centroidM: number;
  readonly inertiaM4: number;
  readonly inertiaYM4: number;
  readonly perimeterM: number;
  /** Rows from the bottom up. */
  readonly rows: readonly StrandRow[];
}

/** Section and strand grid of an outline. @throws RangeError for an outline without area */
export function beamShape(outline: BeamOutline, standard: StandardId): BeamShape {
  return {
    ...outline,
    ...polygonProperties(outline.points, outline.holes),
    rows: strandRows(outline, standard),
  };
}

/**
 * Shapes of one market by depth: the deepest no deeper than `mostM`; the shallowest there is where none fits.
 * `shapes` shallowest first.
 */
export function deepestWithin(shapes: readonly BeamShape[], mostM: number): readonly BeamShape[] {
  const fitting = shapes.filter(({ depthM }) => depthM <= mostM + 1e-6);
  const depthM = fitting.length > 0 ? fitting[fitting.length - 1]!.depthM : shapes[0]!.depthM;
  return shapes.filter((shape) => Math.abs(shape.depthM - depthM) < 1e-6);
}
