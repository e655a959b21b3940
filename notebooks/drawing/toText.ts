import type { Piece } from './piece.ts';

const escape = (text: string): string =>
  text.replace(/&/g, '&amp;').replace(/</g, '&lt;').replace(/>/g, '&gt;');
const escapeValue = (text: string): string => escape(text).replace(/"/g, '&quot;');

/** Elements whose text must not be broken over lines. */
const inline = new Set(['text', 'tspan', 'title', 'desc', 'style', 'td', 'th', 'caption', 'span', 'p']);

function write(piece: Piece, indent: string, out: string[]): void {
  const attrs = Object.entries(piece.attrs)
    .map(([name, value]) => ` ${name}="${escapeValue(value)}"`)
    .join('');
  if (piece.children.length === 0) {
    out.push(`${indent}<${piece.tag}${attrs}/>`);
  } else if (inline.has(piece.tag)) {
    const inner = piece.children.map((child) => {
      if (typeof child === 'string') return escape(child);
      const nested: string[] = [];
      write(child, '', nested);
      return nested.join('');
    });
    out.push(`${indent}<${piece.tag}${attrs}>${inner.join('')}</${piece.tag}>`);
  } else {
    out.push(`${indent}<${piece.tag}${attrs}>`);
    for (const child of piece.children) {
      if (typeof child === 'string') out.push(`${indent} ${escape(child)}`);
      else write(child, `${indent} `, out);
    }
    out.push(`${indent}</${piece.tag}>`);
  }
}

/** Markup of a piece, one element a line. */
export function toText(piece: Piece): string {
  const out: string[] = [];
  write(piece, '', out);
  return `${out.join('\n')}\n`;
}

/**
 * A drawing as a file of its own, in true size: width and height in millimetres of the sheet, so that 1:1000 prints as
 * 1:1000.
 * @param faces rules of style that bring the lettering along
 */
export function toSvgFile(piece: Piece, faces = ''): string {
  const mm = (px: string | undefined): string =>
    `${String(Math.round((Number(px ?? 0) * 25.4 * 1000) / 96) / 1000)}mm`;
  const alone: Piece = {
    tag: piece.tag,
    attrs: {
      xmlns: 'http://www.w3.org/2000/svg',
      ...piece.attrs,
      width: mm(piece.attrs['width']),
      height: mm(piece.attrs['height']),
    },
    children: [
      { tag: 'style', attrs: {}, children: [`${faces}text{font-variant-numeric:tabular-nums}`] },
      ...piece.children,
    ],
  };
  return `<?xml version="1.0" encoding="UTF-8"?>\n${toText(alone)}`;
}
