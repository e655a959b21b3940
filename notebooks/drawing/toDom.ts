import type { Piece } from './piece.ts';

const svgSpace = 'http://www.w3.org/2000/svg';

/** Counts drawings put into pages, so that the patterns and windows of one never stand in for those of another. */
let drawn = 0;

/** What an element of a page was made from: its piece, the nodes of the children, and the mark of its drawing. */
interface Made {
  readonly piece: Piece;
  readonly nodes: readonly ChildNode[];
  /** Ends the ids of its drawing; null outside a drawing. */
  readonly own: string | null;
}
const made = new WeakMap<Element, Made>();

/** The value of an attribute in the page: ids inside a drawing are its own. */
const valueIn = (own: string | null, name: string, value: string): string =>
  own === null
    ? value
    : name === 'id' || name === 'aria-describedby'
      ? value + own
      : value.replace(/^url\(#(.+)\)$/, `url(#$1${own})`);

function build(piece: Piece, document: Document, svg: string | null): Element {
  const own = svg ?? (piece.tag === 'svg' ? `-${String((drawn += 1))}` : null);
  const element =
    own === null ? document.createElement(piece.tag) : document.createElementNS(svgSpace, piece.tag);
  for (const [name, value] of Object.entries(piece.attrs))
    element.setAttribute(name, valueIn(own, name, value));
  const nodes = piece.children.map((child) => nodeFor(child, document, own));
  element.append(...nodes);
  made.set(element, { piece, nodes, own });
  return element;
}

const nodeFor = (child: Piece | string, document: Document, own: string | null): ChildNode =>
  typeof child === 'string' ? document.createTextNode(child) : build(child, document, own);

/**
 * Turns a piece into an element of the given document. Elements inside an `svg` are SVG elements, all others HTML; ids
 * inside a drawing are made its own.
 */
export const toDom = (piece: Piece, document: Document): Element => build(piece, document, null);

/** What a child of one drawing is recognised by in the next. */
const signOf = (child: Piece | string): string =>
  typeof child === 'string' ? '' : `${child.tag} ${child.attrs['data-key'] ?? child.attrs['class'] ?? ''}`;

const isText = (child: Piece | string): child is string => typeof child === 'string';

/** Whether two children have the same sign; quicker than writing both down. */
function haveOneSign(a: Piece | string, b: Piece | string): boolean {
  if (a === b) return true;
  if (isText(a) || isText(b)) return isText(a) && isText(b);
  const key = (piece: Piece): string | undefined => piece.attrs['data-key'] ?? piece.attrs['class'];
  return a.tag === b.tag && key(a) === key(b);
}

/** For each child of the next drawing the index of the one it takes over, or -1. */
function pairs(before: Piece['children'], next: Piece['children']): number[] {
  const free = new Map<string, number[]>();
  before.forEach((child, i) => {
    const sign = signOf(child);
    const list = free.get(sign);
    if (list === undefined) free.set(sign, [i]);
    else list.push(i);
  });
  return next.map((child) => free.get(signOf(child))?.shift() ?? -1);
}

function patchAttributes(element: Element, own: string | null, before: Piece, next: Piece): void {
  for (const name in before.attrs) {
    if (!(name in next.attrs)) element.removeAttribute(name);
  }
  for (const name in next.attrs) {
    const value = next.attrs[name]!;
    if (before.attrs[name] !== value) element.setAttribute(name, valueIn(own, name, value));
  }
}

/** The node of a child, made to show the next one. */
function patchNode(node: ChildNode, before: Piece | string, next: Piece | string): ChildNode {
  if (typeof next === 'string') {
    if (before !== next) (node as Text).data = next;
  } else patch(node as Element, made.get(node as Element)!, next);
  return node;
}

function patch(element: Element, { piece: before, nodes, own }: Made, next: Piece): void {
  if (before === next) return;
  patchAttributes(element, own, before, next);
  const [olds, news] = [before.children, next.children];
  // Most often nothing has come or gone.
  if (olds.length === news.length && olds.every((child, i) => haveOneSign(child, news[i]!))) {
    news.forEach((child, i) => patchNode(nodes[i]!, olds[i]!, child));
    made.set(element, { piece: next, nodes, own });
    return;
  }
  const { ownerDocument } = element;
  const taken = pairs(olds, news);
  const fresh = news.map((child, i): ChildNode => {
    const from = taken[i]!;
    const node = nodes[from];
    return node === undefined ? nodeFor(child, ownerDocument, own) : patchNode(node, olds[from]!, child);
  });
  const stays = new Set(fresh);
  for (const node of nodes) if (!stays.has(node)) node.remove();
  // From the end, so that what stands right already is not moved: a node that is moved loses the focus.
  fresh.reduceRight<ChildNode | null>((after, node) => {
    if (node.parentNode !== element || (after !== null && node.nextSibling !== after))
      element.insertBefore(node, after);
    return node;
  }, null);
  made.set(element, { piece: next, nodes: fresh, own });
}

/** The piece that an element made by `toDom` shows; undefined for other elements. */
export const pieceOf = (element: Element): Piece | undefined => made.get(element)?.piece;

/** Whether an element was made by `toDom` from a piece of the same kind, so that it can be redrawn. */
export function isDrawingOf(element: Element, next: Piece): boolean {
  const piece = made.get(element)?.piece;
  return piece !== undefined && signOf(piece) === signOf(next);
}

/**
 * Makes an element that `toDom` has made show another piece: what is the same stays as it is, the rest is changed in
 * place. Parts are recognised by tag and `data-key`, else `class`, in order. Reads nothing from the page.
 *
 * @returns false where the element was not made from a piece of that tag, and nothing was done
 */
export function redraw(element: Element, next: Piece): boolean {
  const own = made.get(element);
  if (own === undefined || own.piece.tag !== next.tag) return false;
  patch(element, own, next);
  return true;
}
