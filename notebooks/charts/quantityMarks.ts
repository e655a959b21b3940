import { fixed, significant } from '../format.ts';
import { ofOption } from '../drawing/asked.ts';
import { colours, letters, pens } from '../drawing/ink.ts';
import { label } from '../drawing/label.ts';
import { textWidth } from '../drawing/lettering.ts';
import type { Piece } from '../drawing/piece.ts';
import { el, g, num } from '../drawing/piece.ts';
import { sheet } from '../drawing/sheet.ts';
import { formInk } from '../forms/formInk.ts';
import { formLooks } from '../forms/formLook.ts';
import type { AppraisedOption, Quantities } from '../model.ts';
import { hatchedBand, levelLine } from './marks.ts';
import type { OptionsInput } from './rowHead.ts';
import { rowHead } from './rowHead.ts';
import type { Table, TableCell } from './table.ts';

/** Columns of the chart, per m2 of deck. */
const quantityColumns = ['concrete', 'steel', 'bars', 'strand'] as const;
export type QuantityColumn = (typeof quantityColumns)[number];

interface ColumnLook {
  readonly name: string;
  readonly unit: string;
  readonly places: number;
  /** What it is made of; more than one add up. */
  readonly fields: readonly (keyof Quantities)[];
}

const looks: Readonly<Record<QuantityColumn, ColumnLook>> = {
  concrete: { name: 'Concrete', unit: 'm³/m²', fields: ['concreteM3'], places: 2 },
  steel: { name: 'Structural steel', unit: 'kg/m²', fields: ['structuralSteelKg'], places: 0 },
  bars: { name: 'Reinforcement', unit: 'kg/m²', fields: ['reinforcementKg'], places: 0 },
  strand: {
    name: 'Prestress and stays',
    unit: 'kg/m²',
    fields: ['prestressKg', 'stayCableKg', 'mainCableKg'],
    places: 0,
  },
};

const valueOf = ({ fields }: ColumnLook, q: Quantities): number =>
  fields.reduce((sum, field) => sum + q[field], 0);

/** What has been published for a form at that span. */
export interface PublishedBand {
  readonly low: number;
  readonly high: number;
}

export interface QuantityMarksInput extends OptionsInput {
  /** Quantities shown; those of the superstructure and supports together where left out. */
  readonly perM2?: Readonly<Record<number, Quantities>>;
  /** Published band per option and column; absent where nothing was found. */
  readonly published?: Readonly<Record<number, Partial<Record<QuantityColumn, PublishedBand>>>>;
}

const quantitiesOf = (input: QuantityMarksInput, option: AppraisedOption): Quantities =>
  input.perM2?.[option.number] ?? option.perM2;

/** Quantities per m2 of deck: mark in front, published band hatched behind; outside the band is said. */
export function quantityMarks(input: QuantityMarksInput): Piece {
  const { options, widthPx, reference } = input;
  const ink = formInk(
    input.paper ?? 'colour',
    options.map((option) => option.form),
    input.prefix ?? 'quantities',
  );
  const narrow = widthPx < 680;
  const columns = quantityColumns.filter((column) =>
    options.some((option) => valueOf(looks[column], quantitiesOf(input, option)) > 0),
  );
  const pitch = 27;
  const rowsHigh = options.length * pitch;
  // On a hand-held screen the columns stand under one another.
  const perLine = narrow ? 1 : columns.length;
  const left = 76;
  const block = rowsHigh + 50;
  const columnWidth = (widthPx - left) / perLine;
  const height = Math.ceil(columns.length / perLine) * block;
  return sheet(widthPx, height, 'Quantities of each option per square metre of deck', [
    ink.defs.length > 0 && el('defs', {}, ink.defs),
    columns.map((column, index) => {
      const look = looks[column];
      const x0 = left + (index % perLine) * columnWidth;
      const y0 = Math.floor(index / perLine) * block;
      const head = y0 + 34;
      const bands = options.map((option) => input.published?.[option.number]?.[column]);
      const largest = Math.max(
        ...options.map((option) => valueOf(look, quantitiesOf(input, option))),
        ...bands.map((band) => band?.high ?? 0),
      );
      const room = columnWidth - textWidth('888 above', letters.table, 600) - 20;
      const x = (value: number): number => x0 + (value / largest) * room;
      return g(
        { class: 'column' },
        label(x0, y0 + 14, look.name, { size: letters.table, weight: 600 }),
        label(x0 + textWidth(look.name, letters.table, 600) + 8, y0 + 14, look.unit, {
          fill: colours.second,
        }),
        el('path', {
          d: `M${num(x0)},${num(head)}v${num(rowsHigh)}`,
          stroke: colours.rule,
          'stroke-width': pens.fine,
        }),
        options.map((option, row) => {
          const y = head + pitch * (row + 0.5);
          const value = valueOf(look, quantitiesOf(input, option));
          const band = bands[row];
          const first = index % perLine === 0;
          const asked = look.fields.filter((field) => quantitiesOf(input, option)[field] > 0);
          const outside =
            band === undefined || !(value > 0)
              ? ''
              : value > band.high
                ? 'above'
                : value < band.low
                  ? 'below'
                  : '';
          const text = fixed(value, look.places);
          const figureX = x(Math.max(value, outside === 'above' ? value : (band?.high ?? value))) + 9;
          return g(
            {},
            row > 0 && first && levelLine(0, widthPx, y - pitch / 2),
            first && rowHead(option, y, ink, reference),
            value > 0
              ? g(
                  {},
                  band !== undefined && hatchedBand(x(band.low), x(band.high), y - 6, y + 6),
                  el('circle', {
                    cx: x(value),
                    cy: y,
                    r: 3.8,
                    fill: ink.paper === 'black' ? colours.ink : ink.line(option.form),
                    stroke: colours.sheet,
                    'stroke-width': 1.35,
                    'paint-order': 'stroke',
                  }),
                  label(figureX, y + 4.5, text, {
                    size: letters.table,
                    weight: outside === '' ? 400 : 600,
                    figure: asked.map((field) => ofOption(option, `perM2/${field}`)),
                  }),
                  outside !== '' &&
                    label(figureX + textWidth(text, letters.table, 600) + 4, y + 4, outside, {
                      fill: ink.accent,
                    }),
                )
              : label(x0 + 5, y + 4, 'none', { fill: colours.third }),
          );
        }),
      );
    }),
  ]);
}

/** The table behind the quantities. */
export const quantityTable = (input: QuantityMarksInput): Table => ({
  caption: 'Quantities per m² of deck',
  head: [
    'option',
    'form',
    'concrete, m³/m²',
    'reinforcement, kg/m²',
    'prestress, kg/m²',
    'structural steel, kg/m²',
    'stays, kg/m²',
    'main cables, kg/m²',
  ],
  rows: input.options.map((option) => {
    const q = quantitiesOf(input, option);
    const cell = (field: keyof Quantities, text = significant(q[field], 3)): TableCell => ({
      text,
      figure: ofOption(option, `perM2/${field}`),
    });
    return [
      String(option.number),
      formLooks[option.form].name,
      cell('concreteM3', fixed(q.concreteM3, 2)),
      cell('reinforcementKg'),
      cell('prestressKg'),
      cell('structuralSteelKg'),
      cell('stayCableKg'),
      cell('mainCableKg'),
    ];
  }),
});
