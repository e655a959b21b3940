import type { Asked } from './asked.ts';
import { dataFigure } from './asked.ts';
import { colours, letters } from './ink.ts';
import type { Piece } from './piece.ts';
import { el } from './piece.ts';

export interface LabelStyle {
  readonly size?: number;
  readonly weight?: 400 | 600;
  readonly fill?: string;
  readonly anchor?: 'start' | 'middle' | 'end';
  readonly italic?: boolean;
  /** White edge that keeps lettering clear of the lines behind it. */
  readonly halo?: boolean;
  readonly letterSpacing?: number;
  readonly class?: string;
  /** Turned about its foot, degrees clockwise. */
  readonly turn?: number;
  /** The figure of the study it prints, to be asked where it comes from. */
  readonly figure?: Asked;
}

/** A line of lettering whose baseline starts (or is centred, or ends) at x, y px. */
export function label(x: number, y: number, text: string, style: LabelStyle = {}): Piece {
  return el(
    'text',
    {
      x,
      y,
      'font-size': style.size === letters.drawing ? undefined : style.size,
      'font-weight': style.weight === 600 ? 600 : undefined,
      'font-style': style.italic === true ? 'italic' : undefined,
      'text-anchor': style.anchor === undefined || style.anchor === 'start' ? undefined : style.anchor,
      'letter-spacing': style.letterSpacing,
      fill: style.fill,
      stroke: style.halo === true ? colours.sheet : undefined,
      'stroke-width': style.halo === true ? 3 : undefined,
      'stroke-linejoin': style.halo === true ? 'round' : undefined,
      'paint-order': style.halo === true ? 'stroke' : undefined,
      class: style.class,
      'data-figure': dataFigure(style.figure),
      transform:
        style.turn === undefined
          ? undefined
          : `rotate(${String(style.turn)} ${String(Math.round(x * 100) / 100)} ${String(Math.round(y * 100) / 100)})`,
    },
    text,
  );
}
