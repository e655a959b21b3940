import { existsSync, mkdirSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { resolve } from 'node:path';
import { expect } from 'vitest';
import type { Piece } from '../../notebooks/drawing/piece.ts';
import { toSvgFile } from '../../notebooks/drawing/toText.ts';

const folder = resolve(import.meta.dirname, 'golden');

/** Ids are numbered in the order in which they appear, so that a renamed prefix is no change. */
function withPlainIds(text: string): string {
  const names = new Map<string, string>();
  for (const [, id = ''] of text.matchAll(/ id="([^"]+)"/g))
    if (!names.has(id)) names.set(id, `id${String(names.size + 1)}`);
  return text
    .replace(
      / (id|aria-describedby)="([^"]+)"/g,
      (_, name: string, id: string) => ` ${name}="${names.get(id) ?? id}"`,
    )
    .replace(/url\(#([^)]+)\)/g, (_, id: string) => `url(#${names.get(id) ?? id})`);
}

/**
 * Compares a drawing with the file of its name in `golden/`, which anybody can open. A difference leaves
 * `NAME-changed.svg` beside it; looked at and found right, it is accepted with `GOLDEN=write npx vitest run test/drawings`.
 */
export function expectGolden(name: string, piece: Piece): void {
  const file = resolve(folder, `${name}.svg`);
  const changed = resolve(folder, `${name}-changed.svg`);
  const drawn = withPlainIds(toSvgFile(piece));
  if (process.env['GOLDEN'] === 'write') {
    mkdirSync(folder, { recursive: true });
    writeFileSync(file, drawn);
  }
  const kept = existsSync(file) ? readFileSync(file, 'utf8') : '';
  if (kept === drawn) {
    rmSync(changed, { force: true });
    return;
  }
  writeFileSync(changed, drawn);
  expect.fail(
    `${name}: the drawing differs from test/drawings/golden/${name}.svg; look at ${name}-changed.svg, then accept it with GOLDEN=write`,
  );
}

/** Every element of a piece, itself first. */
export function* elements(piece: Piece): Generator<Piece> {
  yield piece;
  for (const child of piece.children) if (typeof child !== 'string') yield* elements(child);
}

/** All lettering of a drawing, in order. */
export const wordsOf = (piece: Piece): string[] =>
  [...elements(piece)]
    .filter((one) => one.tag === 'text')
    .map((one) => one.children.filter((child) => typeof child === 'string').join(''));
