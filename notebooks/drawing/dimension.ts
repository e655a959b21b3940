import type { Asked } from './asked.ts';
import { colours, letters, pens } from './ink.ts';
import { label } from './label.ts';
import type { Piece } from './piece.ts';
import { el, g, num } from './piece.ts';

/** Oblique tick at an end of a dimension, 3.2 px either way. */
const tick = (x: number, y: number): string =>
  `M${num(x - 3.2)},${num(y + 3.2)}L${num(x + 3.2)},${num(y - 3.2)}`;

export interface DimensionStyle {
  readonly colour?: string;
  readonly size?: number;
  readonly weight?: 400 | 600;
  readonly halo?: boolean;
}

/** Level dimension: thin line, oblique ticks, figure above. One figure for each stretch between neighbouring places, px. */
export function dimensionChain(
  places: readonly number[],
  y: number,
  figures: readonly string[],
  style: DimensionStyle & {
    readonly boldest?: number;
    /** Figure in the line instead of above it. */ readonly inLine?: boolean;
    /** Which figures of the study they are, in the same order. */ readonly asked?: readonly Asked[];
  } = {},
): Piece {
  const colour = style.colour ?? colours.ink;
  const first = places[0] ?? 0;
  const last = places[places.length - 1] ?? 0;
  return g(
    {},
    el('path', {
      d: `M${num(first)},${num(y)}H${num(last)}`,
      stroke: colour,
      'stroke-width': pens.fine,
      fill: 'none',
    }),
    el('path', {
      d: places.map((x) => tick(x, y)).join(''),
      stroke: colour,
      'stroke-width': pens.medium,
      fill: 'none',
    }),
    figures.map((figure, index) => {
      const from = places[index] ?? 0;
      const to = places[index + 1] ?? from;
      return label((from + to) / 2, style.inLine === true ? y + 4 : y - 4, figure, {
        anchor: 'middle',
        size: style.size ?? letters.drawing,
        weight: style.boldest === index ? 600 : (style.weight ?? 400),
        fill: colour,
        halo: style.halo === true,
        figure: style.asked?.[index],
      });
    }),
  );
}

/** Upright dimension between two places, with its figure at the right or left. */
export function uprightDimension(
  x: number,
  y0: number,
  y1: number,
  figure: string,
  style: DimensionStyle & { readonly side?: 'left' | 'right'; readonly asked?: Asked } = {},
): Piece {
  const colour = style.colour ?? colours.ink;
  const left = style.side === 'left';
  return g(
    {},
    el('path', {
      d: `M${num(x)},${num(y0)}V${num(y1)}`,
      stroke: colour,
      'stroke-width': pens.fine,
      fill: 'none',
    }),
    el('path', { d: tick(x, y0) + tick(x, y1), stroke: colour, 'stroke-width': pens.medium, fill: 'none' }),
    label(x + (left ? -6 : 6), (y0 + y1) / 2 + 4, figure, {
      anchor: left ? 'end' : 'start',
      size: style.size ?? letters.drawing,
      weight: style.weight ?? 400,
      fill: colour,
      halo: style.halo !== false,
      figure: style.asked,
    }),
  );
}
