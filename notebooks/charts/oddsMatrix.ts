import { odds } from '../format.ts';
import { colours, letters, pens } from '../drawing/ink.ts';
import { label } from '../drawing/label.ts';
import type { Piece } from '../drawing/piece.ts';
import { el, g, num } from '../drawing/piece.ts';
import { sheet } from '../drawing/sheet.ts';
import { formInk } from '../forms/formInk.ts';
import { optionNumber } from '../forms/optionNumber.ts';
import type { AppraisedOption, Standing } from '../model.ts';
import type { OptionsInput } from './rowHead.ts';
import type { Table, TableCell } from './table.ts';

export interface OddsMatrixInput extends OptionsInput {
  readonly standing: Standing;
  /** Odds between which two options cannot be separated, e.g. [0.2, 0.8]. */
  readonly unseparated: readonly [low: number, high: number];
}

/** Strokes at 45° along the foot of a square: not settled. */
function footHatch(x: number, y: number, side: number): string {
  let d = '';
  for (let at = 2; at < side - 3; at += 4.2) {
    const long = Math.min(7, side - 3 - at);
    d += `M${num(x + at)},${num(y + side - 2)}l${num(long)},${num(-long)}`;
  }
  return d;
}

const oddsOf = (row: AppraisedOption, column: AppraisedOption): string =>
  `standing/odds/${String(row.number)}/${String(column.number)}`;

function square(
  input: OddsMatrixInput,
  row: AppraisedOption,
  column: AppraisedOption,
  x: number,
  y: number,
  side: number,
): Piece {
  if (row === column)
    return el('path', {
      d: `M${num(x + side / 2 - 7)},${num(y + side / 2 + 7)}l14,-14`,
      stroke: colours.rule,
      'stroke-width': pens.fine,
    });
  const share = input.standing.odds[row.number]?.[column.number] ?? NaN;
  const [low, high] = input.unseparated;
  const settledCheaper = share > high;
  const open = share >= low && share <= high;
  return g(
    {},
    settledCheaper &&
      el('rect', { x: x + 2, y: y + 2, width: side - 4, height: side - 4, fill: colours.grid }),
    open &&
      el('path', { d: footHatch(x, y, side), stroke: colours.rule, 'stroke-width': pens.fine, fill: 'none' }),
    label(x + side / 2, y + side / 2 + 4, odds(share), {
      size: side < 34 ? letters.drawing : letters.table,
      anchor: 'middle',
      weight: settledCheaper ? 600 : 400,
      fill: settledCheaper || open ? colours.ink : colours.third,
      halo: open,
      figure: Number.isFinite(share) ? oddsOf(row, column) : undefined,
    }),
  );
}

/** Places that follow one another without a gap, each run by its first and last. */
function inRow(places: readonly number[]): { readonly from: number; readonly to: number }[] {
  const runs: { from: number; to: number }[] = [];
  for (const place of [...places].sort((a, b) => a - b)) {
    const last = runs.at(-1);
    if (last?.to === place - 1) last.to = place;
    else runs.push({ from: place, to: place });
  }
  return runs;
}

/** Numbers are odds in per cent that the option at the left is the cheaper; heavy squares hold what cannot be separated. */
export function oddsMatrix(input: OddsMatrixInput): Piece {
  const { options, standing } = input;
  const ink = formInk(
    input.paper ?? 'colour',
    options.map((option) => option.form),
    input.prefix ?? 'odds',
  );
  const left = 52;
  const top = 46;
  // Smaller squares where the sheet is narrow; below 25 px they are pushed sideways instead.
  const side = Math.min(38, Math.max(25, (input.widthPx - left - 4) / Math.max(1, options.length)));
  const end = options.length * side;
  const at = new Map(options.map((option, index) => [option.number, index]));
  const mark = (option: AppraisedOption, x: number, y: number): Piece => {
    const filled = option.number === input.reference;
    return optionNumber(option.number, x, y, { colour: filled ? ink.accent : ink.line(option.form), filled });
  };
  const grid = Array.from(
    { length: options.length + 1 },
    (_, index) =>
      `M${num(left + index * side)},${num(top)}v${num(end)}M${num(left)},${num(top + index * side)}h${num(end)}`,
  ).join('');
  return sheet(left + end + 4, top + end + 4, 'Odds that one option is cheaper than another', [
    label(left + end / 2, 10, 'dearer', { anchor: 'middle', fill: colours.second }),
    label(12, top + end / 2, 'cheaper', { anchor: 'middle', fill: colours.second, turn: -90 }),
    options.map((option, index) =>
      g(
        {},
        mark(option, left + (index + 0.5) * side, top - 16),
        mark(option, left - 18, top + (index + 0.5) * side),
      ),
    ),
    el('path', { d: grid, stroke: colours.grid, 'stroke-width': pens.thin, fill: 'none' }),
    options.map((row, i) =>
      options.map((column, j) => square(input, row, column, left + j * side, top + i * side, side)),
    ),
    standing.groups
      .map((group) => group.flatMap((number) => at.get(number) ?? []))
      .filter((places) => places.length > 1)
      .map((places) => {
        // Options that a rule puts out may stand between them: those are not framed.
        const blocks = inRow(places);
        return blocks.flatMap((across) =>
          blocks.map((down) =>
            el('rect', {
              x: left + across.from * side,
              y: top + down.from * side,
              width: (across.to - across.from + 1) * side,
              height: (down.to - down.from + 1) * side,
              fill: 'none',
              stroke: colours.ink,
              'stroke-width': pens.thick,
            }),
          ),
        );
      }),
  ]);
}

/** The table behind the matrix. */
export const oddsTable = (input: OddsMatrixInput): Table => ({
  caption: 'Odds, per cent, that the option of the row is cheaper than that of the column',
  head: ['option', ...input.options.map((option) => String(option.number))],
  rows: input.options.map((row) => [
    String(row.number),
    ...input.options.map((column): TableCell => {
      const share = input.standing.odds[row.number]?.[column.number];
      return share === undefined ? '' : { text: odds(share), figure: oddsOf(row, column) };
    }),
  ]),
});
