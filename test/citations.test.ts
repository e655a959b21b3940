import { readdirSync, readFileSync } from 'node:fs';
import { join, relative } from 'node:path';
import { describe, expect, it } from 'vitest';
import { bibliography } from '../lib/rules/index.ts';

const root = join(import.meta.dirname, '..');
const ids = new Set(bibliography.map(({ id }) => id));

/** Data files that cite: everything but the bibliography and the studies people open. */
const files = readdirSync(join(root, 'data'), { recursive: true, withFileTypes: true })
  .filter((entry) => entry.isFile() && entry.name.endsWith('.json') && entry.name !== 'sources.json')
  .map((entry) => relative(root, join(entry.parentPath, entry.name)))
  .filter((path) => !path.startsWith(join('data', 'examples')))
  .sort();

function citationsIn(value: unknown): string[] {
  if (Array.isArray(value)) return value.flatMap(citationsIn);
  if (typeof value !== 'object' || value === null) return [];
  return Object.entries(value).flatMap(([key, inner]) =>
    key === 'source' || key === 'sources'
      ? [inner].flat().flatMap((one: unknown) => (typeof one === 'string' ? [one] : citationsIn(one)))
      : citationsIn(inner),
  );
}

const looksLikeId = (text: string): boolean => /^[a-z][a-z0-9]*([-.][a-z0-9]+)*$/u.test(text);

/** Standards a sentence names, as ids of the bibliography: 'EN 1993-1-9 table 8.4' -> en-1993-1-9. */
function standardsIn(text: string): string[] {
  const named = text.match(/\b(?:EN|BS|AS|ISO|DIN) \d{3,5}(?:-\d+)*|AASHTO LRFD|AASHTO M ?\d+/gu) ?? [];
  return named.map((name) =>
    name
      .toLowerCase()
      .replace(/m (?=\d)/u, 'm')
      .replace(/ /gu, '-'),
  );
}

/** The part of a standard or, where that is not listed, the whole of it: en-10025-2 -> en-10025. */
function resolved(id: string): string | undefined {
  if (ids.has(id)) return id;
  const whole = id.replace(/-\d+$/u, '');
  return whole !== id && ids.has(whole) ? whole : undefined;
}

/** Where a figure comes from has to be said: a source read or remembered, or no source at all. */
const provenance =
  /from memory|no source|invented|\bread\b|\bseen\b|worked out|derived|statics|by definition|preset|assumed|Rankine|^[\d\s.*/+()-]+$/iu;

const cited = new Map(
  files.map((file) => [file, citationsIn(JSON.parse(readFileSync(join(root, file), 'utf8')))]),
);

describe('citations of data/**', () => {
  it('are found in rules, standards and forms', () => {
    for (const part of ['rules', 'standards', 'forms'])
      expect(
        [...cited].some(([file, texts]) => file.startsWith(join('data', part)) && texts.length > 0),
        part,
      ).toBe(true);
  });

  it.each(files)('%s cites what the bibliography holds', (file) => {
    const orphans = (cited.get(file) ?? []).flatMap((text) =>
      looksLikeId(text)
        ? ids.has(text)
          ? []
          : [text]
        : standardsIn(text)
            .filter((id) => resolved(id) === undefined)
            .map((id) => `${id} in: ${text}`),
    );
    expect(orphans).toEqual([]);
  });

  it.each(files)('%s says of every figure where it comes from', (file) => {
    const silent = (cited.get(file) ?? []).filter((text) => !looksLikeId(text) && !provenance.test(text));
    expect(silent).toEqual([]);
  });

  it('the bibliography holds nothing that nobody cites', () => {
    const used = new Set(
      [...cited.values()]
        .flat()
        .flatMap((text) => (looksLikeId(text) ? [text] : standardsIn(text).map(resolved))),
    );
    expect([...ids].filter((id) => !used.has(id))).toEqual([]);
  });

  it('the bibliography has no id twice', () => {
    expect(bibliography).toHaveLength(ids.size);
  });
});
