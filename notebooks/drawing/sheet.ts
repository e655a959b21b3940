import { colours, letters } from './ink.ts';
import type { Child, Piece } from './piece.ts';
import { el } from './piece.ts';

/**
 * The bundled lettering, with what stands in for it where a program does not read the one in the file: faces that run a
 * little narrower, so that lettering which was placed by the widths of the bundled one still keeps apart.
 */
export const lettering = "'Overpass Variable', Overpass, Arial, Helvetica, 'Liberation Sans', sans-serif";

/**
 * A drawing where its sheet fits the room, px; else in a part that is pushed sideways, under the name `label`. `className`
 * is added to that part.
 */
export const inRoom = (drawing: Piece, roomPx: number, label: string, className = ''): Piece =>
  Number(drawing.attrs['width']) <= roomPx
    ? drawing
    : el(
        'div',
        { class: `pushed ${className}`.trimEnd(), tabindex: 0, role: 'region', 'aria-label': label },
        drawing,
      );

/**
 * Root of a drawing: true size in px (96 to the inch), named for readers who cannot see it.
 * @param told what it shows in words, with the id they go under
 * @param role `img` for a drawing as a whole; `group` where parts of it can be chosen
 */
export function sheet(
  width: number,
  height: number,
  name: string,
  children: readonly Child[],
  role: 'img' | 'group' = 'img',
  className = 'drawing',
  told?: { readonly id: string; readonly words: string },
): Piece {
  return el(
    'svg',
    {
      class: className,
      width,
      height,
      viewBox: `0 0 ${String(Math.round(width * 100) / 100)} ${String(Math.round(height * 100) / 100)}`,
      role,
      'aria-label': name,
      'aria-describedby': told?.id,
      'font-family': lettering,
      'font-size': letters.drawing,
      fill: colours.ink,
    },
    told !== undefined && el('desc', { id: told.id }, told.words),
    ...children,
  );
}
