import { fixed, money2, moneyUnit, signed } from '../format.ts';
import { ofOption } from '../drawing/asked.ts';
import { colours, letters, pens } from '../drawing/ink.ts';
import { label } from '../drawing/label.ts';
import { textWidth } from '../drawing/lettering.ts';
import type { Piece } from '../drawing/piece.ts';
import { el, g, num } from '../drawing/piece.ts';
import { sheet } from '../drawing/sheet.ts';
import { formInk } from '../forms/formInk.ts';
import { formLooks } from '../forms/formLook.ts';
import type { AppraisedOption, BillPart } from '../model.ts';
import { billParts } from '../model.ts';
import { centreLine, levelLine } from './marks.ts';
import type { OptionsInput } from './rowHead.ts';
import { rowHead } from './rowHead.ts';
import type { Table, TableCell } from './table.ts';

export interface CostByPartInput extends OptionsInput {
  readonly currency: string;
}

/** Column heads. */
export const partNames: Readonly<Record<BillPart, string>> = {
  deck: 'Deck',
  'bearings-joints': 'Bearings, joints',
  pylons: 'Pylons',
  piers: 'Piers',
  foundations: 'Foundations',
  abutments: 'Abutments',
  approaches: 'Approaches',
  'river-works': 'River works',
  'temporary-works': 'Temporary works',
  'traffic-management': 'Traffic',
  preliminaries: 'Preliminaries',
};

const partOf = (option: AppraisedOption, part: BillPart): number =>
  option.parts.filter((one) => one.part === part).reduce((sum, one) => sum + one.p50, 0);

const partPath = (option: AppraisedOption, part: BillPart): string => ofOption(option, `parts/${part}/p50`);

/** Parts that cost anything in any option, in the order of the bill. */
const partsUsed = (options: readonly AppraisedOption[]): BillPart[] =>
  billParts.filter((part) => options.some((option) => partOf(option, part) > 0));

/** Head words broken so that a column is no wider than its longest word or bar. */
const headLines = (part: BillPart): string[] => partNames[part].split(' ');

/** One place below ten; what rounds to nothing is said to be less than a tenth. */
const partFigure = (value: number): string => (value < 0.05 ? '<0.1' : fixed(value, value < 9.95 ? 1 : 0));

interface Column {
  readonly part: BillPart;
  readonly x: number;
  readonly width: number;
}

/**
 * Columns on one scale: each as wide as its longest bar with its figure, or its head. The scale is the largest at which
 * all of them fit.
 */
function layOut(
  parts: readonly BillPart[],
  options: readonly AppraisedOption[],
  left: number,
  right: number,
  per: number,
): { readonly columns: Column[]; readonly pxPer: number } {
  const gap = 14;
  const figure = textWidth('88.8', letters.drawing) + 6;
  const longest = parts.map((part) => Math.max(...options.map((option) => partOf(option, part))) / per);
  const heads = parts.map((part) =>
    Math.max(...headLines(part).map((word) => textWidth(word, letters.drawing))),
  );
  const widths = (pxPer: number): number[] =>
    parts.map((_, index) => Math.max((longest[index] ?? 0) * pxPer + figure, heads[index] ?? 0) + gap);
  let low = 0;
  let high =
    (right - left) /
    Math.max(
      1e-9,
      longest.reduce((sum, one) => sum + one, 0),
    );
  for (let step = 0; step < 40; step += 1) {
    const middle = (low + high) / 2;
    if (widths(middle).reduce((sum, one) => sum + one, 0) <= right - left) low = middle;
    else high = middle;
  }
  let x = left;
  const columns = widths(low).map((width, index) => {
    const column = { part: parts[index] ?? 'deck', x, width };
    x += width;
    return column;
  });
  return { columns, pxPer: low };
}

/** Below this the columns have no room for their heads; the chart is then pushed sideways, px. */
const leastWidthPx = 960;

/** One small bar per part, one scale for all columns, centre line at the reference. Never one stacked bar. */
export function costByPart(input: CostByPartInput): Piece {
  const { options, reference } = input;
  const widthPx = Math.max(input.widthPx, leastWidthPx);
  const ink = formInk(
    input.paper ?? 'colour',
    options.map((option) => option.form),
    input.prefix ?? 'parts',
  );
  const unit = moneyUnit(input.currency, Math.max(0, ...options.map((option) => option.cost.p90)));
  const parts = partsUsed(options);
  const pitch = 27;
  const head = 36;
  const left = 72;
  const right = widthPx - 118;
  const { columns, pxPer } = layOut(parts, options, left, right, unit.per);
  const bottom = head + options.length * pitch;
  const base = options.find((option) => option.number === reference);
  const yOf = (index: number): number => head + pitch * (index + 0.5);
  const steps = [0.1, 0.2, 0.5, 1, 2, 5, 10, 20, 50, 100, 200, 500];
  const step =
    [...steps].reverse().find((value) => value * 3 * pxPer <= Math.max(90, (columns[0]?.width ?? 90) - 20)) ??
    0.1;
  const togetherX = widthPx - 64;
  return sheet(widthPx, bottom + 34, 'Cost of each option by part of the crossing, on one scale', [
    ink.defs.length > 0 && el('defs', {}, ink.defs),
    columns.map(({ part, x }) => {
      const lines = headLines(part);
      return g(
        {},
        lines.map((word, index) =>
          label(x, head - 8 - (lines.length - 1 - index) * 13, word, { fill: colours.second }),
        ),
        el('path', {
          d: `M${num(x)},${num(head)}V${num(bottom)}`,
          stroke: colours.rule,
          'stroke-width': pens.fine,
        }),
      );
    }),
    label(togetherX, head - 8, 'together', { anchor: 'end', fill: colours.second, weight: 600 }),
    base !== undefined &&
      label(widthPx, head - 8, `against ${String(base.number)}`, { anchor: 'end', fill: colours.second }),
    options.map((option, index) => {
      const y = yOf(index);
      return g(
        { class: 'option' },
        index > 0 && levelLine(0, widthPx, y - pitch / 2),
        rowHead(option, y, ink, reference),
        columns.map(({ part, x }) => {
          const value = partOf(option, part) / unit.per;
          if (!(value > 0)) return label(x + 4, y + 4, 'none', { fill: colours.third });
          const differs =
            base !== undefined &&
            base !== option &&
            Math.abs(value - partOf(base, part) / unit.per) > 0.15 * Math.max(value, 0.05) + 0.05;
          const end = x + Math.max(value, base === undefined ? 0 : partOf(base, part) / unit.per) * pxPer;
          return g(
            {},
            el('rect', {
              x,
              y: y - 5,
              width: Math.max(0.7, value * pxPer),
              height: 10,
              fill: ink.bar(option.form),
              stroke: ink.barEdge(option.form),
              'stroke-width': pens.fine,
            }),
            label(end + 4, y + 4, partFigure(value), {
              weight: differs ? 600 : 400,
              fill: differs ? colours.ink : colours.second,
              figure: partPath(option, part),
            }),
          );
        }),
        label(togetherX, y + 5, money2(option.cost.p50 / unit.per), {
          anchor: 'end',
          size: letters.prose,
          weight: option === base ? 600 : 400,
          figure: ofOption(option, 'cost/p50'),
        }),
        base !== undefined &&
          (option === base
            ? label(widthPx, y + 4.5, 'reference', { anchor: 'end', fill: ink.accent, size: letters.table })
            : label(widthPx, y + 4.5, signed((option.cost.p50 - base.cost.p50) / unit.per, 1), {
                anchor: 'end',
                size: letters.table,
                figure: [ofOption(option, 'cost/p50'), ofOption(base, 'cost/p50')],
              })),
      );
    }),
    base !== undefined &&
      columns.map(({ part, x }) =>
        partOf(base, part) > 0
          ? centreLine(x + (partOf(base, part) / unit.per) * pxPer, head + 1, bottom)
          : null,
      ),
    g(
      {},
      [0, 1, 2].map((index) =>
        el('rect', {
          x: left + index * step * pxPer,
          y: bottom + 14,
          width: step * pxPer,
          height: 3.2,
          fill: index % 2 === 0 ? colours.ink : colours.sheet,
          stroke: colours.ink,
          'stroke-width': pens.fine,
        }),
      ),
      [0, 1, 2, 3].map((index) =>
        label(
          left + index * step * pxPer,
          bottom + 11,
          `${fixed(index * step, step < 1 && index > 0 ? 1 : 0)}${index === 3 ? ` ${unit.label}` : ''}`,
          { anchor: index === 3 ? 'start' : 'middle', fill: colours.second },
        ),
      ),
      label(
        left + 3 * step * pxPer + 64,
        bottom + 18,
        `one scale for all columns${base === undefined ? '' : `; centre line: option ${String(base.number)}`}`,
        { fill: colours.second },
      ),
    ),
  ]);
}

/** The table behind the cost by part. */
export function partTable(input: CostByPartInput): Table {
  const unit = moneyUnit(input.currency, Math.max(0, ...input.options.map((option) => option.cost.p90)));
  const parts = partsUsed(input.options);
  return {
    caption: `Cost by part at the median, ${unit.label}; medians of parts need not sum to the median of the whole`,
    head: ['option', 'form', ...parts.map((part) => partNames[part].toLowerCase()), 'together'],
    rows: input.options.map((option) => [
      String(option.number),
      formLooks[option.form].name,
      ...parts.map((part): TableCell => {
        const value = partOf(option, part);
        const text = fixed(value / unit.per, 2);
        return value > 0 ? { text, figure: partPath(option, part) } : text;
      }),
      { text: money2(option.cost.p50 / unit.per), figure: ofOption(option, 'cost/p50') },
    ]),
  };
}
