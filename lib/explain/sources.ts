import type { FigureSource } from '../model/index.ts';
import { bibliography } from '../rules/index.ts';

const byId = new Map(bibliography.map((entry) => [entry.id, entry]));

/** Standards as they are named in words: 'EN 1990 table A2.4(B)' names en-1990. */
const standard = /\b(?:EN|BS|AS|ISO|DIN) \d{3,5}(?:-\d+)*|AASHTO LRFD|AASHTO M ?\d+/gu;

/** The entry of the bibliography that words name: the part of a standard or, where that is not listed, the whole. */
function namedIn(words: string): string | null {
  for (const [name] of words.matchAll(standard)) {
    const id = name
      .toLowerCase()
      .replace(/m (?=\d)/u, 'm')
      .replaceAll(' ', '-');
    const found = [id, id.replace(/-\d+$/u, '')].find((one) => byId.has(one));
    if (found !== undefined) return found;
  }
  return /common practice/iu.test(words) ? 'common-practice' : null;
}

/**
 * A source from an id of the bibliography or from words that say where a figure comes from, e.g.
 * 'EN 1337-2 table 11 (from memory)'. Words count as read where they say so.
 */
export function sourceOf(idOrWords: string): FigureSource {
  const entry = byId.get(idOrWords);
  if (entry !== undefined) return { id: entry.id, text: entry.text, read: entry.read };
  return { id: namedIn(idOrWords), text: idOrWords, read: /\bread\b/iu.test(idOrWords) };
}
