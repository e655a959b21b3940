import type { Asked } from '../drawing/asked.ts';
import { colours, letters, pens } from '../drawing/ink.ts';
import { label } from '../drawing/label.ts';
import { textWidth } from '../drawing/lettering.ts';
import type { Piece } from '../drawing/piece.ts';
import { el, g, num } from '../drawing/piece.ts';

/** Upright grid lines. */
export const gridUprights = (places: readonly number[], top: number, bottom: number): Piece =>
  el('path', {
    d: places.map((x) => `M${num(x)},${num(top)}V${num(bottom)}`).join(''),
    stroke: colours.grid,
    'stroke-width': pens.fine,
    fill: 'none',
  });

/** Level grid line, and the firmer one between families or groups. */
export const levelLine = (left: number, right: number, y: number, firm = false): Piece =>
  el('path', {
    d: `M${num(left)},${num(y)}H${num(right)}`,
    stroke: firm ? colours.rule : colours.grid,
    'stroke-width': pens.fine,
    fill: 'none',
  });

/** A limit: the heaviest line, full height, with its name and figure at its head. */
export function limitLine(
  x: number,
  top: number,
  bottom: number,
  words: string,
  accent: string,
  right: number,
  figure?: Asked,
): Piece {
  const fits = (said: string): boolean => textWidth(said, letters.table, 600) + 6 <= Math.max(right - x, x);
  // On a narrow sheet only what stands before the colon.
  const written = fits(words) ? words : (words.split(':')[0] ?? words);
  const turned = x + 6 + textWidth(written, letters.table, 600) > right;
  return g(
    { class: 'limit' },
    el('path', {
      d: `M${num(x)},${num(top)}V${num(bottom)}`,
      stroke: accent,
      'stroke-width': pens.heavy,
      fill: 'none',
    }),
    label(turned ? x - 5 : x + 5, top + 9, written, {
      size: letters.table,
      weight: 600,
      fill: accent,
      anchor: turned ? 'end' : 'start',
      halo: true,
      figure,
    }),
  );
}

/** The reference: a centre line, long dash and dot. */
export const centreLine = (x: number, top: number, bottom: number): Piece =>
  el('path', {
    d: `M${num(x)},${num(top)}V${num(bottom)}`,
    stroke: colours.ink,
    'stroke-width': pens.thin,
    'stroke-dasharray': '9 2.4 1.6 2.4',
    fill: 'none',
  });

/** Hatched band behind a mark: what has been published. */
export function hatchedBand(left: number, right: number, top: number, bottom: number): Piece {
  let strokes = '';
  const height = bottom - top;
  // Each stroke rises to the right at 45° and is cut at the edges of the band.
  for (let x = left - height + 3; x < right; x += 4.2) {
    const x0 = Math.max(left, x);
    const x1 = Math.min(right, x + height);
    if (x1 > x0) strokes += `M${num(x0)},${num(bottom - (x0 - x))}L${num(x1)},${num(bottom - (x1 - x))}`;
  }
  return g(
    { class: 'published' },
    el('rect', {
      x: left,
      y: top,
      width: Math.max(1, right - left),
      height,
      fill: colours.sheet,
      stroke: colours.rule,
      'stroke-width': pens.fine,
    }),
    el('path', { d: strokes, stroke: colours.rule, 'stroke-width': pens.fine, fill: 'none' }),
  );
}
