import { colours, letters, pens } from './ink.ts';
import type { Hold } from './hold.ts';
import { label } from './label.ts';
import { textWidth } from './lettering.ts';
import type { Shift } from './handlesApart.ts';
import { LEAST_TARGET_PX } from './handlesApart.ts';
import type { Piece } from './piece.ts';
import { el, g, num } from './piece.ts';

/** Something in a drawing that can be taken hold of. */
export interface HandleSpec {
  /** Tells it from the other handles of the drawing and says what it moves, e.g. 'pier/2'. */
  readonly key: string;
  /** What it is, for keys and readers: 'P2, chainage'. */
  readonly name: string;
  readonly valueM: number;
  readonly leastM: number;
  readonly mostM: number;
  /** Decimals its value is written with. */
  readonly places: number;
  /** Its value in words. */
  readonly words: string;
  /** What a pixel to the right and a pixel down are worth, m; 0 the way it does not move. */
  readonly perPx: readonly [across: number, down: number];
  readonly x: number;
  readonly y: number;
  readonly isLocked?: boolean;
  /** Where its words stand while it is in hand; beside it where left out, px. */
  readonly wordsAt?: readonly [x: number, y: number];
  /** Mark of what it was when it was taken, drawn while it is in hand. */
  readonly before?: Piece | null;
}

/** Half the side of the square that answers to a pointer, px. */
const REACH_PX = 13;

/** Size of the target of a handle, px. */
export const handlePx: readonly [width: number, height: number] = [2 * REACH_PX, 2 * REACH_PX];

const attrsOf = ({ key, name, valueM, leastM, mostM, places, words, perPx }: HandleSpec) => ({
  'data-key': key,
  'data-handle': key,
  'data-places': places,
  'data-across': String(perPx[0]),
  'data-down': String(perPx[1]),
  tabindex: 0,
  'aria-label': name,
  'aria-valuenow': String(valueM),
  'aria-valuemin': String(leastM),
  'aria-valuemax': String(mostM),
  'aria-valuetext': words,
});

/** Classes of a handle; what has no place of its own answers to keys alone. */
const classOf = (shift: Shift, ...names: readonly (string | false)[]): string =>
  ['handle', ...names, shift === null && 'keyed'].filter((name) => name !== false).join(' ');

/** Thin line from a handle that had to be moved to what it moves. */
const leader = ({ x, y }: HandleSpec, toX: number, toY: number): Piece | null =>
  Math.hypot(toX - x, toY - y) < REACH_PX / 2
    ? null
    : el('path', {
        d: `M${num(x)},${num(y)}L${num(toX)},${num(toY)}`,
        stroke: colours.second,
        'stroke-width': pens.fine,
      });

/** Words of a handle in hand: where they are wanted, else beside it, on the side that is on the sheet. */
function heldWords({ words, wordsAt }: HandleSpec, x: number, y: number, rightPx: number): Piece {
  const half = textWidth(words, letters.drawing, 600) / 2;
  if (wordsAt !== undefined) {
    const middle = Math.max(Math.min(wordsAt[0], rightPx - half), half);
    return label(middle, wordsAt[1], words, { weight: 600, halo: true, anchor: 'middle' });
  }
  const isRoom = x + 14 + 2 * half <= rightPx;
  return label(isRoom ? x + 14 : x - 14, y - 9, words, {
    weight: 600,
    halo: true,
    anchor: isRoom ? 'start' : 'end',
  });
}

/**
 * A handle: an open square of 6.2 px with a tick either side at 7.6, the way it moves; solid where it is locked. It is a
 * slider for keys and readers.
 * @param shift how far it stands from where it is wanted, px; null leaves it to keys alone
 * @param rightPx right end of the sheet
 */
export function handle(spec: HandleSpec, hold: Hold | null, shift: Shift, rightPx: number): Piece {
  const { key, perPx, isLocked = false } = spec;
  const [x, y] = [spec.x + (shift?.[0] ?? 0), spec.y + (shift?.[1] ?? 0)];
  const isUp = perPx[1] !== 0;
  const isHeld = hold?.key === key;
  const side = isHeld ? 7.6 : 6.2;
  return g(
    {
      class: classOf(shift, isUp ? 'updown' : isLocked && 'locked'),
      role: 'slider',
      'aria-orientation': isUp ? 'vertical' : undefined,
      ...attrsOf(spec),
    },
    isHeld && spec.before && g({ class: 'before' }, spec.before),
    leader(spec, x, y),
    el('rect', {
      class: 'grip',
      x: x - REACH_PX,
      y: y - REACH_PX,
      width: 2 * REACH_PX,
      height: 2 * REACH_PX,
      fill: colours.sheet,
      'fill-opacity': 0,
    }),
    el('rect', {
      class: 'square',
      x: x - side / 2,
      y: y - side / 2,
      width: side,
      height: side,
      fill: isLocked || isHeld ? colours.ink : colours.sheet,
      stroke: colours.ink,
      'stroke-width': pens.medium,
    }),
    !isLocked &&
      el('path', {
        d: isUp
          ? `M${num(x - 3)},${num(y - 7.6)}h6M${num(x - 3)},${num(y + 7.6)}h6`
          : `M${num(x - 7.6)},${num(y - 3)}v6M${num(x + 7.6)},${num(y - 3)}v6`,
        stroke: colours.ink,
        'stroke-width': pens.medium,
      }),
    isHeld && heldWords(spec, x, y, rightPx),
  );
}

/** A figure in a drawing that can be typed over, with the room it takes, px. */
export interface TypedSpec extends Omit<HandleSpec, 'perPx' | 'isLocked' | 'before' | 'wordsAt'> {
  readonly widthPx: number;
}

/** What the target of a figure is wider than its lettering, px. */
export const TYPED_AIR_PX = 6;

/** Size of the target of a figure that is typed over: its lettering with some air, never less than a target, px. */
export const typedPx = ({ widthPx }: TypedSpec): readonly [width: number, height: number] => [
  Math.max(widthPx + TYPED_AIR_PX, LEAST_TARGET_PX),
  LEAST_TARGET_PX,
];

/**
 * A figure that is typed over where it stands, or stepped with the arrow keys. Lies over its lettering.
 * @param shift null leaves it to keys alone
 */
export function typedFigure(spec: TypedSpec, shift: Shift): Piece {
  const { widthPx } = spec;
  const [x, y] = [spec.x + (shift?.[0] ?? 0), spec.y + (shift?.[1] ?? 0)];
  const [width, height] = typedPx(spec);
  return g(
    { class: classOf(shift, 'typed'), role: 'spinbutton', ...attrsOf({ ...spec, perPx: [0, 0] }) },
    el('rect', {
      class: 'grip',
      x: x - width / 2,
      y: y - height / 2,
      width,
      height,
      fill: colours.sheet,
      'fill-opacity': 0,
    }),
    el('path', {
      d: `M${num(spec.x - widthPx / 2)},${num(spec.y + 7)}h${num(widthPx)}`,
      stroke: colours.ink,
      'stroke-width': pens.thin,
    }),
  );
}
