import type { AppraisedOption } from '../model.ts';
import { supportChainages, supportName } from './alongOption.ts';
import type { Frame } from './frame.ts';
import { colours, pens } from './ink.ts';
import { label } from './label.ts';
import type { Piece } from './piece.ts';
import { el, g, num } from './piece.ts';

/** Radius of a bearing bubble, px. */
export const bubbleRadius = 11;

/**
 * Bubbles A, P1, P2 ... B in one row, each with a centre line down to its bearing. Where supports stand closer than a
 * bubble is wide the bubbles move apart and a bent line leads to the support.
 */
export function bubbles(
  option: AppraisedOption,
  frame: Frame,
  y: number,
  down: (chainageM: number) => number,
): Piece {
  const at = supportChainages(option);
  const names = at.map((_, index) => supportName(index, at.length));
  const seen = at
    .map((m, index) => ({ m, index }))
    .filter(({ m }) => m >= frame.fromM - 1e-6 && m <= frame.toM + 1e-6);
  // A bubble stands on the sheet, whatever room its support has beside it.
  const [least, most] = [frame.left + bubbleRadius + 1, frame.right - bubbleRadius - 1];
  const places: number[] = [];
  for (const { m } of seen) {
    const home = Math.max(least, Math.min(most, frame.x(m)));
    const last = places[places.length - 1];
    places.push(last === undefined ? home : Math.max(home, last + 2 * bubbleRadius + 2));
  }
  return g(
    { class: 'bubbles' },
    seen.map(({ m, index }, order) => {
      const x = frame.x(m);
      const bx = places[order] ?? x;
      const foot = y + bubbleRadius;
      const lead =
        bx === x
          ? `M${num(x)},${num(foot)}V${num(down(m))}`
          : `M${num(bx)},${num(foot)}l${num(x - bx)},8V${num(down(m))}`;
      return g(
        {},
        el('path', {
          d: lead,
          fill: 'none',
          stroke: colours.third,
          'stroke-width': pens.fine,
          'stroke-dasharray': '9 2.4 1.6 2.4',
        }),
        el('circle', {
          cx: bx,
          cy: y,
          r: bubbleRadius,
          fill: colours.sheet,
          stroke: colours.ink,
          'stroke-width': pens.thin,
        }),
        label(bx, y + 3.9, names[index] ?? '', { anchor: 'middle', weight: 600 }),
      );
    }),
  );
}
