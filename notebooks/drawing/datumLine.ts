import { level } from '../format.ts';
import type { Frame } from './frame.ts';
import { colours, letters } from './ink.ts';
import { label } from './label.ts';
import { textWidth } from './lettering.ts';
import type { Piece } from './piece.ts';
import { el, g, num } from './piece.ts';
import type { Box } from './placer.ts';

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

const words = ({ levelM }: Datum): string => `datum ${level(levelM)}`;

/** Room that the words on the datum take, px. */
export const datumBox = (frame: Frame, datum: Datum): Box => ({
  left: frame.left,
  right: frame.left + 2 + textWidth(words(datum), letters.drawing),
  top: datum.y - 15,
  bottom: datum.y - 4,
});

/** Line at the datum from end to end of a drawing, with its level at the left. */
export const datumLine = (frame: Frame, datum: Datum, pen: number): Piece =>
  g(
    { class: 'datum' },
    el('path', {
      d: `M${num(frame.left)},${num(datum.y)}H${num(frame.right)}`,
      stroke: colours.ink,
      'stroke-width': pen,
    }),
    label(frame.left + 2, datum.y - 6, words(datum), { fill: colours.second, halo: true }),
  );
