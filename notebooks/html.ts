import type { Piece } from './drawing/piece.ts';
import { toDom } from './drawing/toDom.ts';

type Listener = (event: Event) => void;
export type HtmlChild = Node | Piece | string | number | null | undefined | false | readonly HtmlChild[];
export type HtmlAttrs = Readonly<Record<string, string | number | boolean | null | undefined | Listener>>;

/** A word that begins with the letter of its shape, as in 'I-girders', is not parted at its hyphen. */
const SHAPED = /(\bI-\p{Ll}+)/u;

/** Puts text down; in a list of choices nothing but text may stand. */
function write(parent: Element, text: string): void {
  if (parent.localName === 'option' || !SHAPED.test(text)) return parent.append(text);
  for (const [i, part] of text.split(SHAPED).entries())
    if (i % 2 === 1) parent.append(h('span', { class: 'glue' }, document.createTextNode(part)));
    else if (part !== '') parent.append(part);
}

function append(parent: Element, child: HtmlChild): void {
  if (child === null || child === undefined || child === false) return;
  if (Array.isArray(child)) for (const one of child as readonly HtmlChild[]) append(parent, one);
  else if (typeof child === 'string') write(parent, child);
  else if (typeof child === 'number') parent.append(String(child));
  else if (child instanceof Node) parent.append(child);
  else parent.append(toDom(child as Piece, document));
}

/**
 * Makes an HTML element. Attributes that start with `on` and hold a function become listeners (`onclick`); `class`, `id`,
 * `data-...`, `aria-...` are set as they are; false, null and undefined leave an attribute out. Children may be elements,
 * pieces of drawing, text, figures or lists of them. There is no `style`: the page's policy forbids it.
 */
export function h<K extends keyof HTMLElementTagNameMap>(
  tag: K,
  attrs: HtmlAttrs = {},
  ...children: HtmlChild[]
): HTMLElementTagNameMap[K] {
  const element = document.createElement(tag);
  for (const [name, value] of Object.entries(attrs)) {
    if (value === null || value === undefined || value === false) continue;
    if (typeof value === 'function') element.addEventListener(name.replace(/^on/, ''), value);
    else element.setAttribute(name, value === true ? '' : String(value));
  }
  for (const child of children) append(element, child);
  return element;
}
