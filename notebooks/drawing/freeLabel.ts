import type { Asked } from './asked.ts';
import type { Frame } from './frame.ts';
import { letters } from './ink.ts';
import { label } from './label.ts';
import { textWidth } from './lettering.ts';
import type { Placer } from './placer.ts';
import type { Piece } from './piece.ts';

/** Where lettering is put, and what is already taken. */
export interface Room {
  readonly frame: Frame;
  readonly placer: Placer;
  readonly accent: string;
}

/** Lettering with a white edge, put down where it covers least; null where all places cover more than `limit`, px2. */
export function freeLabel(
  room: Room,
  places: readonly (readonly [x: number, y: number])[],
  words: string,
  style: {
    readonly size?: number;
    readonly italic?: boolean;
    readonly fill?: string;
    readonly letterSpacing?: number;
    readonly anchor?: 'start' | 'middle' | 'end';
    readonly figure?: Asked;
  },
  limit = 160,
): Piece | null {
  const size = style.size ?? letters.drawing;
  const width = textWidth(words, size) + (style.letterSpacing ?? 0) * words.length;
  const shift = style.anchor === 'middle' ? width / 2 : style.anchor === 'end' ? width : 0;
  const boxes = places.map(([x, y]) => ({
    left: x - shift,
    right: x - shift + width,
    top: y - size * 0.78,
    bottom: y + size * 0.22,
  }));
  const chosen = places[room.placer.choose(boxes, limit)];
  return chosen === undefined ? null : label(chosen[0], chosen[1], words, { ...style, halo: true });
}
