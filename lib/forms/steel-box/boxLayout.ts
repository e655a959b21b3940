import type { DeckSpec } from '../../model/index.ts';
import { steelBoxData } from './steelBoxData.ts';

/** Webs under the deck plate. */
export interface BoxLayout {
  readonly cells: number;
  readonly webs: number;
  /** Between the tops of neighbouring webs, m. */
  readonly cellM: number;
  readonly overhangM: number;
  /** Between the tops of the outer webs, m. */
  readonly topM: number;
  /** Tops of the webs from the middle of the deck, m. */
  readonly offsetsM: readonly number[];
  /** Horizontal over vertical of the outer webs, and their length over their height. */
  readonly slope: number;
  readonly slant: number;
}

/**
 * One cell up to its widest, else as many as keep them within practice. Outer webs stand upright, or lean as far as the
 * bottom plate stays wide enough at `deepestM`, the greatest height of the box.
 */
export function boxLayout({ widthM }: DeckSpec, deepestM: number, upright: boolean): BoxLayout {
  const d = steelBoxData.layout;
  const overhangM = Math.min(d.mostOverhangM, d.overhangOverWidth * widthM);
  const topM = widthM - 2 * overhangM;
  const cells = topM <= d.mostOneCellM ? 1 : Math.ceil(topM / d.mostCellM - 1e-9);
  const cellM = topM / cells;
  // The outer webs lean within their own cells.
  const slope = upright
    ? 0
    : Math.min(d.webSlope, ((1 - d.bottomOverTop) * topM) / (2 * deepestM), (0.5 * cellM) / deepestM);
  return {
    cells,
    webs: cells + 1,
    cellM,
    overhangM,
    topM,
    offsetsM: Array.from({ length: cells + 1 }, (_, i) => (i - cells / 2) * cellM),
    slope,
    slant: Math.hypot(1, slope),
  };
}

/** Width of the bottom plate where the box is `heightM` high, m. */
export function bottomWidth({ topM, slope }: BoxLayout, heightM: number): number {
  return topM - 2 * slope * heightM;
}

/** Length of all webs across the section where the box is `heightM` high, m. */
export function websLength({ cells, slant }: BoxLayout, heightM: number): number {
  return (2 * slant + cells - 1) * heightM;
}
