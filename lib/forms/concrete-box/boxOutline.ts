import { boxData } from './boxData.ts';
import type { BoxLayout } from './boxLayout.ts';

type Point = readonly [y: number, z: number];

/** Outline of a box: y across from the middle, z up from the top of the slab (down is negative), m. */
export interface Outline {
  readonly outer: readonly Point[];
  /** One void per cell; none where the depth leaves no room for them. */
  readonly cells: readonly (readonly Point[])[];
  readonly bottomWidthM: number;
  /** Height of the voids, m. */
  readonly innerM: number;
}

/** A void lower than this cannot be formed and counts as solid, m. */
const leastVoidM = 0.2;

/**
 * Outline with level top and soffit, overhangs tapering to the edge, haunches of the top slab over a quarter of the web
 * spacing and chamfers at the bottom. `webM` is measured square to the web.
 */
export function outlineOf(layout: BoxLayout, depthM: number, webM: number, bottomM: number): Outline {
  const { slab, spacingM, webs, cells, slope, overhangM, struts } = layout;
  const half = (cells * spacingM) / 2;
  const edge = half + (struts?.outM ?? 0) + overhangM;
  const lean = webM * Math.hypot(1, slope);
  // Axis of web w at a depth; only the outer webs lean.
  const axis = (w: number, depth: number): number => {
    const y = -half + w * spacingM;
    if (w === 0) return y + slope * depth;
    return w === webs - 1 ? y - slope * depth : y;
  };
  const wide = (w: number): number => (w === 0 || w === webs - 1 ? lean : webM) / 2;
  const outside = half + lean / 2;
  const soffit = outside - slope * depthM;
  const rootAt = outside - slope * slab.rootM;
  const wing: Point[] = [[edge, 0], [edge, -slab.edgeM], ...underWing(layout, rootAt), [rootAt, -slab.rootM]];
  const outer: Point[] = [
    ...wing.map(([y, z]): Point => [-y, z]),
    [-soffit, -depthM],
    [soffit, -depthM],
    ...wing.reverse(),
  ];
  const innerM = depthM - slab.midM - bottomM;
  const floor = depthM - bottomM;
  const holes: Point[][] = [];
  if (floor - slab.rootM >= leastVoidM) {
    const chamfer = Math.min(boxData.chamferM.value, (floor - slab.rootM) / 2);
    for (let c = 0; c < cells; c++) {
      const left = (depth: number): number => axis(c, depth) + wide(c);
      const right = (depth: number): number => axis(c + 1, depth) - wide(c + 1);
      const taper = Math.max(
        0,
        Math.min(spacingM / 4 - webM / 2, (right(slab.rootM) - left(slab.rootM)) / 2),
      );
      const hole: Point[] = [
        [left(slab.rootM), -slab.rootM],
        [left(floor - chamfer), -(floor - chamfer)],
        [left(floor) + chamfer, -floor],
        [right(floor) - chamfer, -floor],
        [right(floor - chamfer), -(floor - chamfer)],
        [right(slab.rootM), -slab.rootM],
      ];
      if (slab.midM < slab.rootM)
        hole.push([right(slab.rootM) - taper, -slab.midM], [left(slab.rootM) + taper, -slab.midM]);
      holes.push(hole);
    }
  }
  return { outer, cells: holes, bottomWidthM: 2 * soffit, innerM };
}

/** Soffit of a wing on struts from its overhang to the web: the thickening along the heads, and the slab between them and the web. */
function underWing({ slab, struts, spacingM, cells }: BoxLayout, rootAtM: number): Point[] {
  if (!struts) return [];
  const { outM, beamM, beamWidthM } = struts;
  const headM = (cells * spacingM) / 2 + outM;
  const [outside, inside] = [headM + beamWidthM / 2, headM - beamWidthM / 2];
  const taperM = Math.max(0, Math.min(outM / 4, (inside - rootAtM) / 2));
  return [
    [outside, -slab.rootM],
    [outside, -beamM],
    [inside, -beamM],
    [inside, -slab.rootM],
    [inside - taperM, -slab.midM],
    [rootAtM + taperM, -slab.midM],
  ];
}
