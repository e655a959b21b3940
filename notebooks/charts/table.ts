import type { Asked } from '../drawing/asked.ts';
import { dataFigure } from '../drawing/asked.ts';
import type { Piece } from '../drawing/piece.ts';
import { el } from '../drawing/piece.ts';

/** Text of a cell, or text with the figure of the study it prints where that can be asked. */
export type TableCell = string | { readonly text: string; readonly figure?: Asked };

/** The table behind a chart: every figure it shows, as text. */
export interface Table {
  readonly caption: string;
  readonly head: readonly string[];
  readonly rows: readonly (readonly TableCell[])[];
}

/** A table as HTML; the first column heads its row, the others are figures. */
export function tablePiece(table: Table): Piece {
  return el(
    'table',
    { class: 'figures' },
    el('caption', {}, table.caption),
    el(
      'thead',
      {},
      el(
        'tr',
        {},
        table.head.map((text) => el('th', { scope: 'col' }, text)),
      ),
    ),
    el(
      'tbody',
      {},
      table.rows.map((row) =>
        el(
          'tr',
          {},
          row.map((cell, index) => {
            const { text, figure } = typeof cell === 'string' ? { text: cell, figure: undefined } : cell;
            return index === 0
              ? el('th', { scope: 'row', 'data-figure': dataFigure(figure) }, text)
              : el('td', { 'data-figure': dataFigure(figure) }, text);
          }),
        ),
      ),
    ),
  );
}

/** The same folded under its chart behind some words, with the way to take it away as a file (`saveTables` of the page). */
export const tableBehind = (table: Table, words = 'Table'): Piece =>
  el(
    'details',
    { class: 'behind' },
    el('summary', {}, words),
    tablePiece(table),
    el('button', { type: 'button', class: 'action csv' }, 'Save as CSV'),
  );
