import type { Piece } from '../drawing/piece.ts';
import { el } from '../drawing/piece.ts';

/** The table behind a chart: every figure it shows, as text. */
export interface Table {
  readonly caption: string;
  readonly head: readonly string[];
  readonly rows: readonly (readonly string[])[];
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
          row.map((text, index) => (index === 0 ? el('th', { scope: 'row' }, text) : el('td', {}, text))),
        ),
      ),
    ),
  );
}

/** The same folded under its chart. */
export const tableBehind = (table: Table): Piece =>
  el('details', { class: 'behind' }, el('summary', {}, 'Table'), tablePiece(table));
