import type { Obstacle } from '../../../lib/index.ts';
import { readFigure } from '../../page/figureText.ts';
import { obstacleKindChoices, supportChoices } from './briefChoices.ts';

/** What came out of pasted text: obstacles in the order of their lines, or why nothing was taken. */
export type PastedObstacles =
  | { readonly ok: true; readonly obstacles: readonly Obstacle[]; readonly remarks: readonly string[] }
  | { readonly ok: false; readonly why: string };

/** Most obstacles a study holds. */
const MOST = 1000;

/** Columns in the order of the table. */
const COLUMNS =
  'name, kind, from, to, supports, and for an envelope from, to, level it is measured from, height to be kept clear';

type Read<T> = { readonly ok: true; readonly value: T } | { readonly ok: false; readonly why: string };

function metres(text: string, what: string): Read<number> {
  const read = readFigure(text, { places: 2, unit: 'm' });
  if (!read.ok) return { ok: false, why: `${what}: ${read.why}` };
  return typeof read.value === 'number'
    ? { ok: true, value: read.value }
    : { ok: false, why: `${what}: a figure is needed` };
}

/** One of some choices by its words or its id; the first letters are enough where they are unmistakable. */
function chosen<T extends string>(
  text: string,
  choices: readonly { readonly value: T; readonly words: string }[],
  what: string,
): Read<T> {
  const typed = text.toLowerCase();
  const exact = choices.find(({ value, words }) => value === typed || words === typed);
  const like = choices.filter(({ words }) => words.startsWith(typed));
  const found = exact ?? (like.length === 1 ? like[0] : undefined);
  if (found !== undefined) return { ok: true, value: found.value };
  const known = choices.map(({ words }) => words).join(', ');
  return { ok: false, why: `${what} '${text}' is not known; expected one of ${known}` };
}

const cellsOf = (line: string): string[] =>
  (line.includes('\t') ? line.split('\t') : line.split(';')).map((cell) => cell.trim());

function readLine(line: string): Read<Obstacle> {
  const [name = '', kindText = '', ...rest] = cellsOf(line);
  const [fromText = '', toText = '', supportsText = '', ...envelope] = rest;
  if (toText === '') return { ok: false, why: `expected at least four columns: ${COLUMNS}` };
  if (name === '') return { ok: false, why: 'the name is missing' };
  const kind = chosen(kindText, obstacleKindChoices, 'kind');
  if (!kind.ok) return kind;
  const supports = supportsText === '' ? null : chosen(supportsText, supportChoices, 'supports');
  if (supports?.ok === false) return supports;
  const figures = [metres(fromText, 'from'), metres(toText, 'to')];
  const given = envelope.slice(0, 4);
  const hasEnvelope = given.some((cell) => cell !== '');
  const names = ['envelope from', 'envelope to', 'envelope above level', 'height to be kept clear'];
  if (hasEnvelope) figures.push(...names.map((what, i) => metres(given[i] ?? '', what)));
  const wrong = figures.find((one) => !one.ok);
  if (wrong?.ok === false) return wrong;
  const [fromM, toM, clearFromM, clearToM, datumLevelM, headroomM] = figures.map((one) =>
    one.ok ? one.value : NaN,
  );
  if (!(toM! > fromM!)) return { ok: false, why: `expected 'to' beyond ${fromM!}, found ${toM!}` };
  return {
    ok: true,
    value: {
      kind: kind.value,
      name: name.slice(0, 500),
      fromM: fromM!,
      toM: toM!,
      supports: supports?.value ?? 'none',
      pierPremium: 'unknown',
      clearance: hasEnvelope
        ? {
            fromM: clearFromM!,
            toM: clearToM!,
            datumLevelM: datumLevelM!,
            headroomM: headroomM!,
            // Whoever pastes it has not said that the authority has confirmed it.
            confirmed: false,
          }
        : null,
    },
  };
}

/**
 * Reads obstacles pasted from a spreadsheet, one a line, in columns parted by tabs or semicolons, in the order of the table:
 * name, kind, from, to, supports, envelope from, to, level and height; the last five may be left out. A first line without
 * figures is taken as headings. Anything else is refused with its line. Envelopes come as presets.
 */
export function pastedObstacles(text: string): PastedObstacles {
  const lines = text
    .split(/\r\n|\r|\n/u)
    .map((line, i) => ({ line, number: i + 1 }))
    .filter(({ line }) => line.trim() !== '');
  const [first] = lines;
  if (first === undefined) return { ok: false, why: 'there is no text to paste' };
  const remarks: string[] = [];
  if (!/\d/u.test(first.line)) {
    lines.shift();
    remarks.push('the headings were left out');
  }
  if (lines.length === 0) return { ok: false, why: 'there is no obstacle under the headings' };
  if (lines.length > MOST) return { ok: false, why: `at most ${MOST} obstacles, found ${lines.length}` };
  const obstacles: Obstacle[] = [];
  for (const { line, number } of lines) {
    const read = readLine(line);
    if (!read.ok) return { ok: false, why: `line ${number}: ${read.why}` };
    obstacles.push(read.value);
  }
  return { ok: true, obstacles, remarks };
}
