import type { Asked } from './asked.ts';
import { colours, letters, pens } from './ink.ts';
import { label } from './label.ts';
import { textWidth } from './lettering.ts';
import type { Box } from './placer.ts';
import type { Piece } from './piece.ts';
import { el, g, num } from './piece.ts';

export interface LevelMarkStyle {
  readonly colour?: string;
  /** Which side of the triangle the shelf with the figure lies. */
  readonly side?: 'left' | 'right';
  /** Water: two short dashes under the triangle. */
  readonly water?: boolean;
  /** The figure of the study it states. */
  readonly asked?: Asked;
}

const half = 4.6;
const height = 7.4;

/** Room a level mark takes whose triangle stands at x, y px, down to the line it stands on. */
export function levelMarkBox(x: number, y: number, text: string, side: 'left' | 'right'): Box {
  const width = textWidth(text, letters.drawing) + 6;
  return side === 'right'
    ? { left: x - half, right: x + width + 1, top: y - height - 11, bottom: y - 3 }
    : { left: x - width - 1, right: x + half, top: y - height - 11, bottom: y - 3 };
}

/** Open triangle standing on a level, its figure on a shelf. */
export function levelMark(x: number, y: number, text: string, style: LevelMarkStyle = {}): Piece {
  const colour = style.colour ?? colours.ink;
  const left = style.side === 'left';
  const width = textWidth(text, letters.drawing) + 6;
  const shelf = left
    ? `M${num(x + half)},${num(y - height)}H${num(x - width)}`
    : `M${num(x - half)},${num(y - height)}H${num(x + width)}`;
  return g(
    { class: 'level-mark' },
    el('path', { d: shelf, stroke: colour, 'stroke-width': pens.fine, fill: 'none' }),
    el('path', {
      d: `M${num(x)},${num(y)}l${num(-half)},${num(-height)}h${num(2 * half)}Z`,
      stroke: colour,
      'stroke-width': pens.thin,
      fill: colours.sheet,
    }),
    style.water === true &&
      el('path', {
        d: `M${num(x - 3.6)},${num(y + 2.6)}h7.2M${num(x - 1.8)},${num(y + 5)}h3.6`,
        stroke: colour,
        'stroke-width': pens.thin,
      }),
    label(left ? x - 2 : x + 2, y - height - 3, text, {
      anchor: left ? 'end' : 'start',
      fill: colour,
      halo: true,
      figure: style.asked,
    }),
  );
}
