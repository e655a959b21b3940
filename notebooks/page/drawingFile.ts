import type { Piece } from '../drawing/piece.ts';
import { pieceOf } from '../drawing/toDom.ts';
import { toSvgFile } from '../drawing/toText.ts';
import { h } from '../html.ts';
import { saveFile } from './files.ts';
import { printDrawing } from './printDrawing.ts';

/** Parts of a drawing that are for the hand and not for paper. */
const forHands = /^(?:handles?|bays|feet|free)\b/u;

/** A drawing without its handles. */
export function withoutHandles(piece: Piece): Piece {
  return {
    ...piece,
    children: piece.children.flatMap((child) =>
      typeof child === 'string'
        ? child
        : forHands.test(child.attrs['class'] ?? '')
          ? []
          : withoutHandles(child),
    ),
  };
}

/** The drawings of a cell that stand for themselves: no glyphs in tables, no scales under figures. */
const drawingsOf = (cell: Element): SVGElement[] =>
  Array.from(cell.querySelectorAll<SVGElement>(':scope > .body svg.drawing')).filter(
    (drawing) => drawing.closest('table, .entry, .answer-chain') === null,
  );

/** What a file of a drawing is called: station and name of its cell. */
const nameOf = (cell: Element): string =>
  (cell.getAttribute('aria-label') ?? 'drawing').toLowerCase().replace(/[^a-z0-9]+/gu, '-');

function drawnIn(cell: Element): Piece[] {
  return drawingsOf(cell).flatMap((drawing) => {
    const piece = pieceOf(drawing);
    return piece === undefined ? [] : withoutHandles(piece);
  });
}

function saveDrawings(cell: Element): void {
  const pieces = drawnIn(cell);
  pieces.forEach((piece, i) => {
    const name = `${nameOf(cell)}${pieces.length > 1 ? `-${String(i + 1)}` : ''}`;
    saveFile(`${name}.svg`, toSvgFile(piece), 'image/svg+xml');
  });
}

const action = (words: string, of: string, act: () => void): HTMLElement =>
  h(
    'button',
    { type: 'button', class: 'action', 'aria-label': `${words}: drawing of ${of}`, onclick: act },
    words,
  );

/**
 * The line under a cell with drawings: saves them as SVG in true size, or prints them alone on A4 or Letter. Hidden while
 * the cell has none.
 * @param heading what is printed over a drawing besides the name of its cell, e.g. the title of the study
 */
export function drawingActions(cell: HTMLElement, heading: () => string): HTMLElement {
  const of = cell.getAttribute('aria-label') ?? '';
  const print = (paper: 'A4' | 'Letter') => (): void =>
    printDrawing(drawnIn(cell), { paper, heading: [heading(), of] });
  return h(
    'p',
    { class: 'drawing-actions' },
    'Drawing: ',
    action('save as SVG', of, () => saveDrawings(cell)),
    action('print on A4', of, print('A4')),
    action('on Letter', of, print('Letter')),
  );
}
