import type { FormInk } from '../forms/formInk.ts';
import type { AppraisedOption } from '../model.ts';
import { colours, pens } from './ink.ts';
import type { Piece } from './piece.ts';
import { el, g, num } from './piece.ts';

/** Thin line 10 to 90 %, bar over the middle half, black tick at the median. */
export function interval(
  option: AppraisedOption,
  x: (money: number) => number,
  y: number,
  ink: FormInk,
  height = 6.4,
): Piece {
  const { p10, p50, p90 } = option.cost;
  const [q1, q3] = option.quartiles;
  const line = ink.line(option.form);
  return g(
    { class: 'interval' },
    el('path', {
      d: `M${num(x(p10))},${num(y)}H${num(x(p90))}M${num(x(p10))},${num(y - 3)}v6M${num(x(p90))},${num(y - 3)}v6`,
      stroke: line,
      'stroke-width': pens.medium,
      fill: 'none',
    }),
    el('rect', {
      x: x(q1),
      y: y - height / 2,
      width: Math.max(0.5, x(q3) - x(q1)),
      height,
      fill: ink.bar(option.form),
      stroke: ink.barEdge(option.form),
      'stroke-width': pens.fine,
    }),
    el('path', {
      d: `M${num(x(p50))},${num(y - height / 2 - 2.8)}v${num(height + 5.6)}`,
      stroke: colours.ink,
      'stroke-width': pens.thick,
    }),
  );
}
