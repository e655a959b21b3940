import type { Piece } from '../drawing/piece.ts';
import { isDrawingOf, redraw } from '../drawing/toDom.ts';
import { h, type HtmlChild } from '../html.ts';
import { exchange } from './exchange.ts';

type Whole = Node | Piece | string;

function flat(child: HtmlChild, into: Whole[] = []): Whole[] {
  if (child === null || child === undefined || child === false) return into;
  if (Array.isArray(child)) for (const one of child as readonly HtmlChild[]) flat(one, into);
  else into.push(typeof child === 'number' ? String(child) : (child as Whole));
  return into;
}

const isPiece = (child: Whole): child is Piece => typeof child === 'object' && !(child instanceof Node);

/**
 * Makes `root` show other children. Drawings that stand in the same places as before are changed where they differ;
 * everything else is exchanged.
 * @returns false when something old had to stay: renew again once the focus has gone
 */
export function renew(root: Element, child: HtmlChild): boolean {
  const next = flat(child);
  const olds = Array.from(root.childNodes);
  const active = root.ownerDocument.activeElement;
  const fits =
    next.length === olds.length &&
    next.some(isPiece) &&
    next.every((one, i) => {
      const old = olds[i]!;
      if (!isPiece(one)) return !old.contains(active);
      return old instanceof Element && isDrawingOf(old, one);
    });
  if (!fits) return exchange(root, h('div', {}, next));
  return next.every((one, i) => {
    const old = olds[i]!;
    if (isPiece(one)) return redraw(old as Element, one);
    if (old !== one) old.replaceWith(one);
    return true;
  });
}
