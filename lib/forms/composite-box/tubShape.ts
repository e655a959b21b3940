import type { GirderLayout } from '../composite-i/girderLayout.ts';
import type { UnitTask } from '../../model/index.ts';
import { compositeBoxData } from './compositeBoxData.ts';

/** Boxes of a deck: each has two webs, which are the lines of the layout. */
export interface TubLayout extends GirderLayout {
  readonly boxes: number;
}

/** Cross-section of one steel tub. */
export interface TubShape {
  readonly topM: number;
  readonly bottomM: number;
  /** Height over both flanges, m. */
  readonly heightM: number;
  /** Horizontal over vertical of the webs, and length of a web over its height. */
  readonly slope: number;
  readonly slant: number;
}

/** One box up to its widest deck, else as many as it takes; webs at equal distances under the slab. */
export function tubLayout(task: UnitTask): TubLayout {
  const { mostWidthPerBoxM, overhangOverSpacing } = compositeBoxData.layout;
  const { widthM } = task.deck;
  const boxes = Math.max(1, Math.ceil(widthM / mostWidthPerBoxM - 1e-9));
  const count = 2 * boxes;
  const spacingM = widthM / (count - 1 + 2 * overhangOverSpacing);
  return {
    boxes,
    count,
    twin: false,
    spacingM,
    overhangM: overhangOverSpacing * spacingM,
    offsetsM: Array.from({ length: count }, (_, i) => (i - (count - 1) / 2) * spacingM),
  };
}

/**
 * Webs lean as far as the bottom plate stays wide enough, or by a share of that.
 * @param lean 0 (upright) to 1
 */
export function tubShape(layout: TubLayout, heightM: number, lean: number): TubShape {
  const { slope: most, bottomOverTop } = compositeBoxData.web;
  const topM = layout.spacingM;
  const slope = lean * Math.min(most, ((1 - bottomOverTop) * topM) / (2 * heightM));
  return { topM, bottomM: topM - 2 * slope * heightM, heightM, slope, slant: Math.hypot(1, slope) };
}
