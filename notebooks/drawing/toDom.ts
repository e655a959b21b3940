import type { Piece } from './piece.ts';

const svgSpace = 'http://www.w3.org/2000/svg';

/** Counts drawings put into pages, so that the patterns and windows of one never stand in for those of another. */
let drawn = 0;

function build(piece: Piece, document: Document, svg: string | null): Element {
  const own = svg ?? (piece.tag === 'svg' ? `-${String((drawn += 1))}` : null);
  const element =
    own === null ? document.createElement(piece.tag) : document.createElementNS(svgSpace, piece.tag);
  for (const [name, value] of Object.entries(piece.attrs)) {
    const renamed =
      own === null ? value : name === 'id' ? value + own : value.replace(/^url\(#(.+)\)$/, `url(#$1${own})`);
    element.setAttribute(name, renamed);
  }
  for (const child of piece.children)
    element.append(typeof child === 'string' ? child : build(child, document, own));
  return element;
}

/**
 * Turns a piece into an element of the given document. Elements inside an `svg` are SVG elements, all others HTML; ids
 * inside a drawing are made its own.
 */
export const toDom = (piece: Piece, document: Document): Element => build(piece, document, null);
