import { fixed } from '../format.ts';
import type { Paper } from '../drawing/ink.ts';
import { colours, letters, pens } from '../drawing/ink.ts';
import { label } from '../drawing/label.ts';
import { textWidth } from '../drawing/lettering.ts';
import type { Piece } from '../drawing/piece.ts';
import { el, g, num } from '../drawing/piece.ts';
import { sheet } from '../drawing/sheet.ts';
import { formInk } from '../forms/formInk.ts';
import type { Check, FormId } from '../model.ts';
import type { Table } from './table.ts';

export interface CheckBarsInput {
  readonly form: FormId;
  readonly checks: readonly Check[];
  readonly widthPx: number;
  readonly paper?: Paper;
  readonly prefix?: string;
}

const sentence = (words: string): string => words.charAt(0).toUpperCase() + words.slice(1);

/** Utilisation of each check as a line under its name, against the limit of 1.00; the highest is bold. */
export function checkBars(input: CheckBarsInput): Piece {
  const { form, checks, widthPx } = input;
  const ink = formInk(input.paper ?? 'colour', [form], input.prefix ?? 'checks');
  const figureRoom = 46;
  const most = Math.max(1.08, ...checks.map((check) => Math.min(check.utilisation, 2)));
  const x = (utilisation: number): number => (Math.min(utilisation, 2) / most) * (widthPx - figureRoom - 8);
  const pitch = 31;
  const highest = Math.max(...checks.map((check) => check.utilisation));
  const bottom = 6 + checks.length * pitch;
  return sheet(
    widthPx,
    bottom + 22,
    `Utilisation of ${String(checks.length)} checks against a limit of 1.00`,
    [
      checks.map((check, index) => {
        const y = 6 + index * pitch;
        const governs = check.utilisation === highest;
        const over = check.utilisation > 1.0005;
        return g(
          {},
          label(0, y + 13, sentence(check.label), { size: letters.table, weight: governs ? 600 : 400 }),
          label(widthPx, y + 13, fixed(check.utilisation, 2), {
            size: letters.table,
            anchor: 'end',
            weight: governs ? 600 : 400,
            fill: over ? ink.accent : colours.ink,
          }),
          el('path', {
            d: `M0,${num(y + 21)}H${num(widthPx - figureRoom)}`,
            stroke: colours.grid,
            'stroke-width': pens.fine,
          }),
          el('path', {
            d: `M0,${num(y + 21)}H${num(x(check.utilisation))}`,
            stroke: ink.line(form),
            'stroke-width': pens.heavy,
          }),
        );
      }),
      el('path', { d: `M${num(x(1))},4V${num(bottom)}`, stroke: ink.accent, 'stroke-width': pens.heavy }),
      label(
        Math.min(x(1), widthPx - textWidth('limit 1.00', letters.table, 600) / 2),
        bottom + 15,
        'limit 1.00',
        { size: letters.table, weight: 600, anchor: 'middle', fill: ink.accent },
      ),
    ],
  );
}

/** The table behind the checks. */
export const checkTable = (input: CheckBarsInput): Table => ({
  caption: 'Checks',
  head: ['check', 'demand', 'capacity', 'unit', 'utilisation'],
  rows: input.checks.map((check) => [
    check.label,
    fixed(check.demand, 1),
    fixed(check.capacity, 1),
    check.unit,
    fixed(check.utilisation, 2),
  ]),
});
