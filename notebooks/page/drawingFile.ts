import { el, type Piece } from '../drawing/piece.ts';
import { pieceOf } from '../drawing/toDom.ts';
import { toSvgFile } from '../drawing/toText.ts';
import { h } from '../html.ts';
import { fileNameOf, saveFile } from './files.ts';
import { lettersInFile } from './lettersInFile.ts';
import { printDrawing } from './printDrawing.ts';

/** Parts of a drawing that are for the hand and not for paper. */
const forHands = /^(?:handles?|bays|feet|free)\b/u;

/** A drawing without its handles. */
function withoutHandles(piece: Piece): Piece {
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

/** Height of a line under a drawing, and how far above its end the words stand, px. */
const LINE_PX = 20;
const FOOT_PX = 6;

/** A drawing with a line of words under it. */
function withLine(piece: Piece, words: string): Piece {
  const [widthPx, heightPx] = [Number(piece.attrs['width']), Number(piece.attrs['height']) + LINE_PX];
  return {
    ...piece,
    attrs: {
      ...piece.attrs,
      height: String(heightPx),
      viewBox: `0 0 ${String(widthPx)} ${String(heightPx)}`,
    },
    children: [...piece.children, el('text', { x: 2, y: heightPx - FOOT_PX }, words)],
  };
}

function drawnIn(cell: Element): Piece[] {
  return drawingsOf(cell).flatMap((drawing) => {
    const piece = pieceOf(drawing);
    return piece === undefined ? [] : withoutHandles(piece);
  });
}

async function saveDrawings(cell: Element, drawn: readonly Piece[], unfinished: string): Promise<void> {
  const pieces = unfinished === '' ? drawn : drawn.map((piece) => withLine(piece, unfinished));
  // It is called by station and name of its cell.
  const called = fileNameOf(cell.getAttribute('aria-label') ?? 'drawing', unfinished);
  for (const [i, piece] of pieces.entries()) {
    const name = `${called}${pieces.length > 1 ? `-${String(i + 1)}` : ''}`;
    saveFile(`${name}.svg`, toSvgFile(piece, await lettersInFile(piece)), 'image/svg+xml');
  }
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
 * @param onFullSheet has the cell drawn as on a full sheet while something is taken from it
 * @param unfinished what is said with it before everything on the page is there; '' once it is
 */
export function drawingActions(
  cell: HTMLElement,
  heading: () => string,
  onFullSheet: (take: () => Piece[]) => Piece[],
  unfinished: () => string,
): HTMLElement {
  const of = cell.getAttribute('aria-label') ?? '';
  const pieces = (): Piece[] => onFullSheet(() => drawnIn(cell));
  const print = (paper: 'A4' | 'Letter') => (): void =>
    printDrawing(pieces(), { paper, heading: [heading(), of], unfinished: unfinished() });
  return h(
    'p',
    { class: 'drawing-actions' },
    'Drawing: ',
    action('save as SVG', of, () => void saveDrawings(cell, pieces(), unfinished())),
    action('print on A4', of, print('A4')),
    action('on Letter', of, print('Letter')),
  );
}
