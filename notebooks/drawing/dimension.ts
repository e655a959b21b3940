import type { Asked } from './asked.ts';
import { colours, letters, pens } from './ink.ts';
import { label, type LabelStyle } from './label.ts';
import { textWidth } from './lettering.ts';
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

/** Room left free on either side of a figure in its line, px. */
const CLEAR_PX = 4;

/** Level line from one end to the other, broken where a figure stands in it; none where the figure takes all its stretch. */
function lineRoundFigures(
  places: readonly number[],
  y: number,
  figures: readonly string[],
  { size = letters.drawing, weight = 400 }: DimensionStyle,
): string {
  const breaks = figures.map((figure, i) => {
    const [from = 0, to = from] = [places[i], places[i + 1]];
    const half = textWidth(figure, size, weight) / 2 + CLEAR_PX;
    const middle = (from + to) / 2;
    return 2 * half < to - from
      ? `H${num(middle - half)}M${num(middle + half)},${num(y)}`
      : `M${num(to)},${num(y)}`;
  });
  return `M${num(places[0] ?? 0)},${num(y)}${breaks.join('')}H${num(places.at(-1) ?? 0)}`;
}

/** Level dimension: thin line, oblique ticks, figure above. One figure for each stretch between neighbouring places, px. */
export function dimensionChain(
  places: readonly number[],
  y: number,
  figures: readonly string[],
  style: DimensionStyle & {
    readonly boldest?: number;
    /** Figure in the line, which is broken for it, instead of above it. */ readonly inLine?: boolean;
    /** Which figures of the study they are, in the same order. */ readonly asked?: readonly Asked[];
  } = {},
): Piece {
  const colour = style.colour ?? colours.ink;
  const first = places[0] ?? 0;
  const last = places[places.length - 1] ?? 0;
  return g(
    {},
    el('path', {
      d:
        style.inLine === true
          ? lineRoundFigures(places, y, figures, style)
          : `M${num(first)},${num(y)}H${num(last)}`,
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

/** A figure of a drawing with what it states. */
export interface Figure {
  readonly words: string;
  readonly colour: string;
  readonly asked: Asked;
}

/** A figure about a height y, or two, one under the other. */
export const figureLines = (
  x: number,
  y: number,
  [first, under]: readonly [Figure, Figure | undefined],
  style: LabelStyle,
): Piece[] => {
  const line = (baseline: number, { words, colour, asked }: Figure): Piece =>
    label(x, baseline, words, { ...style, fill: colour, figure: asked });
  return under === undefined ? [line(y + 4, first)] : [line(y - 2, first), line(y + 10, under)];
};

/** Upright dimension between two places, with its figure at the right or left, and a second one under it where given. */
export function uprightDimension(
  x: number,
  y0: number,
  y1: number,
  words: string,
  style: DimensionStyle & {
    readonly side?: 'left' | 'right';
    readonly asked?: Asked;
    readonly under?: Figure | undefined;
  } = {},
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
    figureLines(x + (left ? -6 : 6), (y0 + y1) / 2, [{ words, colour, asked: style.asked }, style.under], {
      anchor: left ? 'end' : 'start',
      size: style.size ?? letters.drawing,
      weight: style.weight ?? 400,
      halo: style.halo !== false,
    }),
  );
}
