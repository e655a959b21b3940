import type { Piece } from './piece.ts';

const svgSpace = 'http://www.w3.org/2000/svg';

/** Turns a piece into an element of the given document. Elements inside an `svg` are SVG elements, all others HTML. */
export function toDom(piece: Piece, document: Document, insideSvg = false): Element {
  const isSvg = insideSvg || piece.tag === 'svg';
  const element = isSvg ? document.createElementNS(svgSpace, piece.tag) : document.createElement(piece.tag);
  for (const [name, value] of Object.entries(piece.attrs)) element.setAttribute(name, value);
  for (const child of piece.children)
    element.append(typeof child === 'string' ? child : toDom(child, document, isSvg));
  return element;
}
