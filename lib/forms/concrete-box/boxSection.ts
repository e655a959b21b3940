import { outlineOf, type Outline } from './boxOutline.ts';
import type { BoxLayout } from './boxLayout.ts';
import { polygonProperties } from '../../mechanics/index.ts';

/** Section of the box at one place. Depths are measured down from the top of the slab. */
export interface BoxSection {
  readonly webM: number;
  readonly bottomM: number;
  readonly depthM: number;
  readonly areaM2: number;
  readonly inertiaM4: number;
  /** From the top of the slab to the centroid, and from there to the soffit, m. */
  readonly topM: number;
  readonly lowM: number;
  /** Width of the bottom slab over its webs, m. */
  readonly bottomWidthM: number;
  readonly outline: Outline;
}

/** Properties of the box with webs and bottom slab of given thickness. */
export function boxSection(layout: BoxLayout, depthM: number, webM: number, bottomM: number): BoxSection {
  const outline = outlineOf(layout, depthM, webM, bottomM);
  const { areaM2, centroidM, inertiaM4 } = polygonProperties(outline.outer, outline.cells);
  return {
    webM,
    bottomM,
    depthM,
    areaM2,
    inertiaM4,
    topM: -centroidM,
    lowM: depthM + centroidM,
    bottomWidthM: outline.bottomWidthM,
    outline,
  };
}
