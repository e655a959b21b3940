import { fixed } from '../format.ts';
import { colours, letters, pens } from '../drawing/ink.ts';
import { label } from '../drawing/label.ts';
import { textWidth } from '../drawing/lettering.ts';
import type { Piece } from '../drawing/piece.ts';
import { el, num } from '../drawing/piece.ts';
import { sheet } from '../drawing/sheet.ts';
import type { FigureRules } from './figureText.ts';

/** A value at which something happens, e.g. an option drops out. */
export interface ScaleMark {
  readonly value: number;
  readonly words: string;
}

export interface FigureScale {
  /** Value before and value now, in the unit shown. */
  readonly before: number;
  readonly now: number;
  /** Worth of one step of the scale. */
  readonly step: number;
  readonly rules: FigureRules;
  readonly marks?: readonly ScaleMark[];
}

/** Length of a step on the scale, px. */
export const STEP_PX = 12;
/** Steps drawn beyond the two pointers. */
const MARGIN = 7;
/** Every so many steps a longer tick with its figure. */
const LONG = 5;
/** Where the scale stands below its top, px. */
const BASE = 22;

const tickLimit = (x: number): Piece =>
  el('path', { d: `M${num(x)},${num(BASE - 12)}v18`, stroke: colours.accent, 'stroke-width': pens.heavy });

/**
 * The scale under a held figure, its origin below the figure: solid pointer now, open pointer before; the scale stops
 * at a limit with an accent tick, and marks say in words what happens where.
 */
export function figureScale({ before, now, step, rules, marks = [] }: FigureScale): Piece {
  const x = (value: number): number => ((value - before) / step) * STEP_PX;
  const min = rules.min?.value ?? -Infinity;
  const max = rules.max?.value ?? Infinity;
  const first = Math.max(min, Math.min(before, now) - MARGIN * step);
  const last = Math.min(max, Math.max(before, now) + MARGIN * step);
  // Half a thousandth of a step makes up for what division loses.
  const from = Math.ceil(first / step - 0.0005);
  const to = Math.floor(last / step + 0.0005);
  const ticks = Array.from({ length: Math.max(0, to - from + 1) }, (_, i) => from + i);
  const long = ticks.filter((tick) => tick % LONG === 0);
  const places = Math.min(rules.places, Math.max(0, -Math.floor(Math.log10(step * LONG))));
  const shown = marks.filter(({ value }) => value > first && value < last);
  const pointer = (value: number, fill: string): Piece =>
    el('path', {
      d: `M${num(x(value))},${num(BASE - 5)}l-3.8,-7h7.6Z`,
      fill,
      stroke: colours.ink,
      'stroke-width': pens.thin,
    });
  const ends = shown.map(
    ({ words, value }) => textWidth(`${fixed(value, rules.places)}: ${words}`, letters.drawing) + 14,
  );
  return sheet(
    1,
    52,
    'scale',
    [
      // The scale lies over what stands below: a piece of clean sheet under it.
      el('rect', {
        x: x(first) - 18,
        y: 4,
        width: x(last) - x(first) + 36 + Math.max(0, ...ends),
        height: 46,
        fill: colours.sheet,
      }),
      el('path', {
        d: `M${num(x(first))},${num(BASE)}H${num(x(last))}`,
        stroke: colours.ink,
        'stroke-width': pens.thin,
      }),
      el('path', {
        d: ticks
          .map((tick) => {
            const size = tick % LONG === 0 ? 7 : 4;
            return `M${num(x(tick * step))},${num(BASE)}v${num(-size)}`;
          })
          .join(''),
        stroke: colours.ink,
        'stroke-width': pens.fine,
      }),
      long.map((tick) =>
        label(x(tick * step), BASE + 13, fixed(tick * step, places), { anchor: 'middle', halo: true }),
      ),
      first === min && tickLimit(x(min)),
      last === max && tickLimit(x(max)),
      shown.map(({ value, words }, i) => [
        el('path', {
          d: `M${num(x(value))},${num(BASE - 10)}v14`,
          stroke: colours.accent,
          'stroke-width': pens.medium,
        }),
        label(x(last) + 10, BASE + 4 + i * 14, `${fixed(value, rules.places)}: ${words}`, {
          fill: colours.accent,
          halo: true,
        }),
      ]),
      pointer(before, colours.sheet),
      pointer(now, colours.ink),
      now !== before &&
        label(0, BASE + 26, `was ${fixed(before, rules.places)}`, { anchor: 'middle', halo: true }),
    ],
    'img',
    'scale',
  );
}
