import { level } from '../format.ts';
import type { Frame } from './frame.ts';
import { colours } from './ink.ts';
import { label } from './label.ts';
import type { Piece } from './piece.ts';
import { el, g, num } from './piece.ts';

/** The level a drawing is measured from, and the pixel it lies at. */
export interface Datum {
  readonly levelM: number;
  readonly y: number;
}

/** The highest whole metre that lies at or below a pixel, so that the line drawn there is at its true height. */
export function datumBelow(frame: Frame, y: number): Datum {
  const levelM = Math.floor((frame.y(0) - y) / frame.pxPerM + 1e-9);
  return { levelM, y: frame.y(levelM) };
}

/** Line at the datum from end to end of a drawing, with its level at the left. */
export const datumLine = (frame: Frame, { levelM, y }: Datum, pen: number): Piece =>
  g(
    { class: 'datum' },
    el('path', {
      d: `M${num(frame.left)},${num(y)}H${num(frame.right)}`,
      stroke: colours.ink,
      'stroke-width': pen,
    }),
    label(frame.left + 2, y - 6, `datum ${level(levelM)}`, { fill: colours.second, halo: true }),
  );
