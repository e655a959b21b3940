import { colours } from '../drawing/ink.ts';
import { label } from '../drawing/label.ts';
import type { Piece } from '../drawing/piece.ts';
import { el, g } from '../drawing/piece.ts';

/** Luminance of a colour, 0 to 1 (sRGB, as contrast is reckoned by WCAG 2). */
function luminance(colour: string): number {
  const [r = 0, green = 0, b = 0] = [1, 3, 5].map((at) => {
    const c = parseInt(colour.slice(at, at + 2), 16) / 255;
    return c <= 0.03928 ? c / 12.92 : ((c + 0.055) / 1.055) ** 2.4;
  });
  return 0.2126 * r + 0.7152 * green + 0.0722 * b;
}

/** Contrast of two colours, 1 to 21 (WCAG 2). */
export function contrast(a: string, b: string): number {
  const [dark, light] = [luminance(a), luminance(b)].sort((x, y) => x - y) as [number, number];
  return (light + 0.05) / (dark + 0.05);
}

export interface NumberStyle {
  /** Ring, and filling where filled. */
  readonly colour: string;
  readonly filled?: boolean;
  /** Number and ring greyed. */
  readonly faded?: boolean;
  readonly radius?: number;
}

/** An option's number in a circle like a grid bubble, centred at x, y px. */
export function optionNumber(number: number, x: number, y: number, style: NumberStyle): Piece {
  const radius = style.radius ?? 9.5;
  const filled = style.filled === true;
  const size = radius * (number > 9 ? 1.16 : 1.35);
  const fill = filled
    ? contrast(style.colour, colours.sheet) >= contrast(style.colour, colours.ink)
      ? colours.sheet
      : colours.ink
    : style.faded === true
      ? colours.third
      : colours.ink;
  return g(
    {},
    el('circle', {
      cx: x,
      cy: y,
      r: radius,
      fill: filled ? style.colour : colours.sheet,
      stroke: style.faded === true && !filled ? colours.third : style.colour,
      'stroke-width': 1.35,
    }),
    label(x, y + size * 0.355, String(number), { size, anchor: 'middle', weight: 600, fill }),
  );
}
