import type { ProfilePoint } from '../../../lib/index.ts';
import { readFigure } from '../../page/figureText.ts';

/** What came out of pasted text: points in order of chainage, or why nothing was taken. */
export type PastedProfile =
  | { readonly ok: true; readonly points: readonly ProfilePoint[]; readonly remarks: readonly string[] }
  | { readonly ok: false; readonly why: string };

/** Most points a study holds. */
const MOST = 20_000;
/** Chainages and levels beyond these are slips: the same limits as in the study file, m. */
const FAR_M = 1e7;
const LEVELS_M = [-12_000, 9_000] as const;

const refused = (why: string): PastedProfile => ({ ok: false, why });

/** Columns of a line: parted by tabs, else by semicolons, else by spaces where that gives two. */
function columns(line: string): string[] {
  const parts = line.includes('\t') ? line.split('\t') : line.includes(';') ? line.split(';') : null;
  const cells = parts ?? line.trim().split(/\s+/u);
  return cells.map((cell) => cell.trim()).filter((cell, i, all) => cell !== '' || i < all.length - 1);
}

/** A chainage as typed: a figure, or kilometres and metres as '1+240.5'. */
function readChainage(text: string): ReturnType<typeof readFigure> {
  const posted = /^(\d+)\+(\d{3}(?:[.,]\d*)?)$/u.exec(text);
  return posted === null
    ? readFigure(text, { places: 2, unit: 'm' })
    : { ok: true, value: Number(posted[1]) * 1000 + Number(posted[2]!.replace(',', '.')) };
}

type ReadLine =
  | { readonly ok: true; readonly point: ProfilePoint }
  | { readonly ok: false; readonly why: string };

function readLine(line: string): ReadLine {
  const cells = columns(line);
  if (cells.length !== 2) {
    const found = cells.length === 1 ? 'one column' : `${cells.length} columns`;
    return { ok: false, why: `expected two columns, chainage and level, found ${found}` };
  }
  const chainage = readChainage(cells[0]!);
  if (!chainage.ok) return { ok: false, why: `chainage: ${chainage.why}` };
  const level = readFigure(cells[1]!, { places: 2, unit: 'm' });
  if (!level.ok) return { ok: false, why: `level: ${level.why}` };
  const [chainageM, levelM] = [Number(chainage.value), Number(level.value)];
  if (!(Math.abs(chainageM) <= FAR_M)) return { ok: false, why: `no chainage is as far off as ${cells[0]!}` };
  if (!(levelM >= LEVELS_M[0] && levelM <= LEVELS_M[1])) {
    return { ok: false, why: `${cells[1]!} is no level of ground; are the columns exchanged?` };
  }
  return { ok: true, point: { chainageM, levelM } };
}

const hasFigure = (line: string): boolean => /\d/u.test(line);

/**
 * Reads a ground line pasted from a spreadsheet: two columns, chainage and level in m, one point a line. A first line
 * without any figure is taken as headings, empty lines are passed over, a survey from the far end is turned round; a
 * comma or a point may part the decimals. Anything else that is not two figures a line, rising, is refused with the line.
 */
export function pastedProfile(text: string): PastedProfile {
  const lines = text
    .split(/\r\n|\r|\n/u)
    .map((line, i) => ({ line, number: i + 1 }))
    .filter(({ line }) => line.trim() !== '');
  const [first] = lines;
  if (first === undefined) return refused('there is no text to paste');
  const remarks: string[] = [];
  if (!hasFigure(first.line)) {
    lines.shift();
    remarks.push('the headings were left out');
  }
  if (lines.length > MOST) return refused(`at most ${MOST} points, found ${lines.length}`);
  const points: ProfilePoint[] = [];
  for (const { line, number } of lines) {
    const read = readLine(line);
    if (!read.ok) return refused(`line ${number}: ${read.why}`);
    points.push(read.point);
  }
  if (points.length < 2) {
    return refused(`a ground line needs at least two points, found ${points.length === 1 ? 'one' : 'none'}`);
  }
  const numbers = lines.map(({ number }) => number);
  if (points[0]!.chainageM > points.at(-1)!.chainageM) {
    points.reverse();
    numbers.reverse();
    remarks.push('the points were turned round to rising chainages');
  }
  const stuck = points.findIndex((point, i) => i > 0 && !(point.chainageM > points[i - 1]!.chainageM));
  if (stuck > 0) {
    const [before, at] = [points[stuck - 1]!.chainageM, points[stuck]!.chainageM];
    const why = at === before ? `chainage ${at} stands there twice` : `chainage ${at} comes after ${before}`;
    return refused(`line ${numbers[stuck]!}: ${why}; put the points in order of chainage`);
  }
  return { ok: true, points, remarks };
}
