import { capitalised, significant, use } from '../format.ts';
import type { Asked } from '../drawing/asked.ts';
import type { Paper } from '../drawing/ink.ts';
import { colours, letters, pens } from '../drawing/ink.ts';
import { label } from '../drawing/label.ts';
import { textWidth, wrapText } from '../drawing/lettering.ts';
import type { Piece } from '../drawing/piece.ts';
import { el, g, num } from '../drawing/piece.ts';
import { sheet } from '../drawing/sheet.ts';
import { formInk } from '../forms/formInk.ts';
import type { Check, FormId } from '../model.ts';
import type { Table } from './table.ts';

export interface CheckBarsInput {
  readonly form: FormId;
  readonly checks: readonly Check[];
  /** Path of the design they belong to, e.g. 'options/1/designs/0'. */
  readonly design?: string;
  readonly widthPx: number;
  readonly paper?: Paper;
  readonly prefix?: string;
}

/** A figure of one check. */
const ofCheck = (
  { design }: CheckBarsInput,
  check: Check,
  field: 'demand' | 'capacity' | 'utilisation',
): Asked => (design === undefined ? undefined : `${design}/checks/${check.id}/${field}`);

/** Utilisation of each check as a line under its name, against the limit of 1.00; the highest is bold. */
export function checkBars(input: CheckBarsInput): Piece {
  const { form, checks, widthPx } = input;
  const ink = formInk(input.paper ?? 'colour', [form], input.prefix ?? 'checks');
  const figureRoom = 46;
  const most = Math.max(1.08, ...checks.map((check) => Math.min(check.utilisation, 2)));
  const x = (utilisation: number): number => (Math.min(utilisation, 2) / most) * (widthPx - figureRoom - 8);
  const highest = Math.max(...checks.map((check) => check.utilisation));
  const rows = checks.map((check) => {
    const governs = check.utilisation === highest;
    return {
      check,
      governs,
      lines: wrapText(capitalised(check.label), x(1) - 8, letters.table, governs ? 600 : 400),
    };
  });
  let bottom = 6;
  const tops = rows.map(({ lines }) => {
    const top = bottom;
    bottom += 15 + lines.length * 16;
    return top;
  });
  const words = 'limit 1.00';
  return sheet(
    widthPx,
    bottom + 22,
    `Utilisation of ${String(checks.length)} checks against a limit of 1.00`,
    [
      el('path', { d: `M${num(x(1))},4V${num(bottom)}`, stroke: ink.accent, 'stroke-width': pens.heavy }),
      rows.map(({ check, governs, lines }, index) => {
        const top = tops[index] ?? 0;
        const lineY = top + lines.length * 16 + 5;
        const weight = governs ? 600 : 400;
        const over = check.utilisation > 1.0005;
        return g(
          {},
          lines.map((text, at) =>
            label(0, top + 13 + at * 16, text, { size: letters.table, weight, halo: true }),
          ),
          label(widthPx, top + 13, use(check.utilisation), {
            size: letters.table,
            anchor: 'end',
            weight,
            fill: over ? ink.accent : colours.ink,
            figure: ofCheck(input, check, 'utilisation'),
          }),
          el('path', {
            d: `M0,${num(lineY)}H${num(widthPx - figureRoom)}`,
            stroke: colours.grid,
            'stroke-width': pens.fine,
          }),
          el('path', {
            d: `M0,${num(lineY)}H${num(x(check.utilisation))}`,
            stroke: ink.line(form),
            'stroke-width': pens.heavy,
          }),
        );
      }),
      label(Math.min(x(1), widthPx - textWidth(words, letters.table, 600) / 2), bottom + 15, words, {
        size: letters.table,
        weight: 600,
        anchor: 'middle',
        fill: ink.accent,
      }),
    ],
  );
}

/** The table behind the checks. */
export const checkTable = (input: CheckBarsInput): Table => ({
  caption: 'Checks',
  head: ['check', 'demand', 'capacity', 'unit', 'utilisation'],
  rows: input.checks.map((check) => [
    check.label,
    { text: significant(check.demand, 3), figure: ofCheck(input, check, 'demand') },
    { text: significant(check.capacity, 3), figure: ofCheck(input, check, 'capacity') },
    check.unit,
    { text: use(check.utilisation), figure: ofCheck(input, check, 'utilisation') },
  ]),
});
