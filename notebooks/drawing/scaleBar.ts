import { colours, letters, pens } from './ink.ts';
import { label } from './label.ts';
import { textWidth } from './lettering.ts';
import type { Piece } from './piece.ts';
import { el, g } from './piece.ts';
import type { Scale } from './scale.ts';
import { pxPerMetre } from './scale.ts';

/** Marks on the bar, m, for each scale: half, whole, then longer. */
const marks: Readonly<Record<Scale, readonly number[]>> = {
  100: [0, 1, 2, 5, 10],
  200: [0, 1, 2, 5, 10, 20],
  250: [0, 2, 4, 10, 20],
  500: [0, 5, 10, 20, 50],
  1000: [0, 10, 20, 50, 100],
  2000: [0, 20, 40, 100, 200],
  2500: [0, 20, 40, 100, 200],
  5000: [0, 50, 100, 200, 500],
  10000: [0, 100, 200, 500, 1000],
  20000: [0, 200, 500, 1000, 2000],
};

export interface ScaleBarStyle {
  /** What was drawn, e.g. 'elevation'; stands before the scale. */
  readonly what?: string;
  /** Right end of the sheet, px; words that would pass it stand under the bar. */
  readonly rightPx?: number;
  /** Longest bar, px. */
  readonly widthPx?: number;
  /** Sections say nothing of heights. */
  readonly heights?: boolean;
}

/** Scale bar at x, y px (y is the bar itself) with the scale in words: the bar rules when the sheet is reduced. */
export function scaleBar(scale: Scale, x: number, y: number, style: ScaleBarStyle = {}): Piece {
  const ppm = pxPerMetre(scale);
  const room = style.widthPx ?? 400;
  const places = marks[scale].filter((m, index) => index < 3 || m * ppm <= room);
  const end = places[places.length - 1] ?? 0;
  const words = `${style.what === undefined ? '' : `${style.what} `}1:${String(scale)} at A3${style.heights === false ? '' : ', heights not exaggerated'}`;
  const wordsX = x + end * ppm + textWidth(`${String(end)} m`, letters.drawing) + 24;
  const inside = wordsX + textWidth(words, letters.drawing) <= (style.rightPx ?? Infinity);
  return g(
    { class: 'scale-bar', 'data-scale': scale },
    places.slice(1).map((to, index) => {
      const from = places[index] ?? 0;
      return el('rect', {
        x: x + from * ppm,
        y: y - 1.6,
        width: (to - from) * ppm,
        height: 3.2,
        fill: index % 2 === 0 ? colours.ink : colours.sheet,
        stroke: colours.ink,
        'stroke-width': pens.fine,
      });
    }),
    places.map((m) =>
      label(x + m * ppm, y - 5, m === end ? `${String(m)} m` : String(m), {
        anchor: 'middle',
        fill: colours.second,
      }),
    ),
    inside
      ? label(wordsX, y + 3, words, { fill: colours.second })
      : label(x, y + 16, words, { fill: colours.second }),
  );
}
