import { colours, pens } from './ink.ts';
import type { Hold } from './hold.ts';
import { label } from './label.ts';
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

/**
 * A handle: an open square of 6.2 px with a tick either side at 7.6, the way it moves; solid where it is locked. It is a
 * slider for keys and readers.
 */
export function handle(spec: HandleSpec, hold: Hold | null): Piece {
  const { key, x, y, perPx, isLocked = false } = spec;
  const isUp = perPx[1] !== 0;
  const isHeld = hold?.key === key;
  const side = isHeld ? 7.6 : 6.2;
  return g(
    {
      class: isUp ? 'handle updown' : isLocked ? 'handle locked' : 'handle',
      role: 'slider',
      'aria-orientation': isUp ? 'vertical' : undefined,
      ...attrsOf(spec),
    },
    isHeld && spec.before,
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
    isHeld &&
      label(...(spec.wordsAt ?? ([x + 14, y - 9] as const)), spec.words, {
        weight: 600,
        halo: true,
        anchor: spec.wordsAt === undefined ? 'start' : 'middle',
      }),
  );
}

/** A figure in a drawing that can be typed over, with the room it takes, px. */
export interface TypedSpec extends Omit<HandleSpec, 'perPx' | 'isLocked' | 'before' | 'wordsAt'> {
  readonly widthPx: number;
}

/** A figure that is typed over where it stands, or stepped with the arrow keys. Lies over its lettering. */
export function typedFigure(spec: TypedSpec): Piece {
  const { x, y, widthPx } = spec;
  return g(
    { class: 'handle typed', role: 'spinbutton', ...attrsOf({ ...spec, perPx: [0, 0] }) },
    el('rect', {
      class: 'grip',
      x: x - widthPx / 2 - 3,
      y: y - 9,
      width: widthPx + 6,
      height: 18,
      fill: colours.sheet,
      'fill-opacity': 0,
    }),
    el('path', {
      d: `M${num(x - widthPx / 2)},${num(y + 7)}h${num(widthPx)}`,
      stroke: colours.ink,
      'stroke-width': pens.thin,
    }),
  );
}
