import { fixed } from '../format.ts';
import { linearAxis } from '../drawing/axis.ts';
import { colours, letters, pens } from '../drawing/ink.ts';
import { label } from '../drawing/label.ts';
import type { Piece } from '../drawing/piece.ts';
import { el, g, num } from '../drawing/piece.ts';
import { sheet } from '../drawing/sheet.ts';
import { formInk } from '../forms/formInk.ts';
import { centreLine, gridUprights, levelLine } from './marks.ts';
import type { OptionsInput } from './rowHead.ts';
import { rowHead } from './rowHead.ts';
import type { Table, TableCell } from './table.ts';
import type { Measure } from './tradeOffs.ts';

export interface RangePanelsInput extends OptionsInput {
  readonly measures: readonly Measure[];
}

/** Small multiples: median as a mark, 10 to 90 % as a line, one axis per measure, centre line at the reference. */
export function rangePanels(input: RangePanelsInput): Piece {
  const { options, measures, widthPx, reference } = input;
  const ink = formInk(
    input.paper ?? 'colour',
    options.map((option) => option.form),
    input.prefix ?? 'ranges',
  );
  const left = 76;
  const perLine = widthPx < 680 ? 1 : measures.length;
  const pitch = 27;
  const block = options.length * pitch + 62;
  const columnWidth = (widthPx - left) / perLine;
  return sheet(
    widthPx,
    Math.ceil(measures.length / perLine) * block,
    measures.map((measure) => measure.name).join('; '),
    [
      ink.defs.length > 0 && el('defs', {}, ink.defs),
      measures.map((measure, index) => {
        const x0 = left + (index % perLine) * columnWidth;
        const y0 = Math.floor(index / perLine) * block;
        const head = y0 + 44;
        const bottom = head + options.length * pitch;
        const known = options.flatMap((option) => measure.values[option.number] ?? []);
        const axis = linearAxis(
          known.flatMap((spread) => [spread.p10, spread.p90]),
          x0 + 6,
          x0 + columnWidth - 56,
          columnWidth < 330 ? 4 : 5,
        );
        const base = reference === null ? undefined : measure.values[reference];
        return g(
          { class: 'panel' },
          label(x0, y0 + 14, measure.name, { size: letters.table, weight: 600 }),
          gridUprights(axis.ticks.map(axis.x), head - 4, bottom),
          axis.ticks.map((tick) =>
            label(axis.x(tick), head - 10, fixed(tick, tick % 1 === 0 ? 0 : 1), {
              anchor: 'middle',
              fill: colours.second,
            }),
          ),
          base !== undefined && centreLine(axis.x(base.p50), head - 4, bottom),
          options.map((option, row) => {
            const y = head + pitch * (row + 0.5);
            const spread = measure.values[option.number];
            const first = index % perLine === 0;
            return g(
              {},
              first && row > 0 && levelLine(0, widthPx, y - pitch / 2),
              first && rowHead(option, y, ink, reference),
              spread === undefined
                ? label(x0 + 6, y + 4, 'not worked out', { fill: colours.third })
                : g(
                    {},
                    el('path', {
                      d: `M${num(axis.x(spread.p10))},${num(y)}H${num(axis.x(spread.p90))}`,
                      stroke: ink.line(option.form),
                      'stroke-width': pens.medium,
                    }),
                    el('circle', {
                      cx: axis.x(spread.p50),
                      cy: y,
                      r: 3.8,
                      fill: ink.line(option.form),
                      stroke: colours.sheet,
                      'stroke-width': 1.35,
                    }),
                    label(axis.x(spread.p90) + 7, y + 4.5, fixed(spread.p50, measure.places), {
                      size: letters.table,
                      halo: true,
                      figure: measure.figures?.(option),
                    }),
                  ),
            );
          }),
        );
      }),
    ],
  );
}

/** The table behind the ranges. */
export const rangeTable = (input: RangePanelsInput): Table => ({
  caption: 'Medians with 10 and 90 per cent',
  head: ['option', ...input.measures.map((measure) => measure.name)],
  rows: input.options.map((option) => [
    String(option.number),
    ...input.measures.map((measure): TableCell => {
      const spread = measure.values[option.number];
      if (spread === undefined) return 'not worked out';
      const [p10, p50, p90] = [spread.p10, spread.p50, spread.p90].map((value) =>
        fixed(value, measure.places),
      );
      return { text: `${p50} (${p10} to ${p90})`, figure: measure.figures?.(option) };
    }),
  ]),
});
