import { scaleLog } from 'd3-scale';
import { fixed, length, reachText } from '../format.ts';
import { dataFigure, type Asked } from '../drawing/asked.ts';
import { colours, letters, pens } from '../drawing/ink.ts';
import type { Paper } from '../drawing/ink.ts';
import { label } from '../drawing/label.ts';
import { textWidth, wrapText } from '../drawing/lettering.ts';
import type { Piece } from '../drawing/piece.ts';
import { el, g, num } from '../drawing/piece.ts';
import { sheet } from '../drawing/sheet.ts';
import type { FormInk } from '../forms/formInk.ts';
import { formInk } from '../forms/formInk.ts';
import { formLooks } from '../forms/formLook.ts';
import { glyph } from '../forms/glyph.ts';
import type { FormId, Status } from '../model.ts';
import { familyOf } from '../model.ts';
import { gridUprights, levelLine, limitLine } from './marks.ts';
import type { Table } from './table.ts';

/** One form against span, m. */
export interface SpanRow {
  readonly form: FormId;
  /** Usual, economical range. */
  readonly usual: readonly [from: number, to: number];
  /** Possible range; the usual range where left out. */
  readonly possible?: readonly [from: number, to: number];
  /** 5, 50 and 95 % of built bridges, where known. */
  readonly statistics?: readonly [p5: number, p50: number, p95: number];
  /** How many bridges that counts. */
  readonly bridges?: number;
  readonly status: Status;
  /** The number that decides, in words. */
  readonly words: string;
  /** How far from another standing, in words. */
  readonly flip?: string;
  /** Where its figures come from, where they can be asked. */
  readonly figures?: SpanFigures;
  /** The span from which it carries no more with the deck in question, and the check that ends it. */
  readonly limit?: { readonly spanM: number; readonly words: string; readonly figure?: Asked };
}

/** Paths of the figures of a row; undefined for one that is no figure, e.g. the end of an axis. */
export interface SpanFigures {
  readonly usual: readonly [from: Asked, to: Asked];
  readonly possible: readonly [from: Asked, to: Asked];
  /** 5, 50 and 95 % of built bridges; empty where none are on record. */
  readonly statistics: readonly Asked[];
  readonly bridges: Asked;
}

export interface SpanChartInput {
  /** In the order in which forms are listed everywhere. */
  readonly rows: readonly SpanRow[];
  readonly askedM: number | null;
  /** Beside the asked span, e.g. '63 m asked: 60 clear, plus a pier'. */
  readonly askedWords?: string;
  /** Which figure the asked span is. */
  readonly askedFigure?: Asked;
  /** Firmer lines part families, or in, possible and out; families unless said. */
  readonly groups?: 'family' | 'status';
  /** Ends of the span axis, m; what the rows need unless given. */
  readonly axisM?: readonly [from: number, to: number];
  readonly widthPx: number;
  /** Room on a page, px: rows stand closer where they would need more, never closer than their words. */
  readonly heightPx?: number;
  readonly paper?: Paper;
  readonly prefix?: string;
}

/** Air in a row over and under its words, px, and the least of it on a full page. */
const AIR_PX = 9;
const LEAST_AIR_PX = 3;

/** Room under the rows for what thick, thin and grey mean, px. */
const FOOT_PX = 26;

/** Line of words in a row, px. */
const LINE_PX = 16;

const marked = [5, 10, 20, 50, 100, 200, 500, 1000, 2000];

/** Fewer bridges than this are no statistics yet: their line is dotted. */
const FEW_BRIDGES = 20;

/** Bars of one row: possible range thin, usual range thick, statistics as a grey line below with a tick at the median. */
function bars(row: SpanRow, y: number, x: (m: number) => number, ink: FormInk): Piece {
  const out = row.status === 'out';
  const line = out ? colours.rule : ink.line(row.form);
  const fill = out && ink.paper === 'colour' ? colours.rule : ink.bar(row.form);
  const [from, to] = row.possible ?? row.usual;
  const { figures } = row;
  const all = figures && [...figures.usual, ...figures.possible, ...figures.statistics];
  return g(
    { 'data-figure': dataFigure(all?.filter((path) => typeof path === 'string')) },
    el('path', {
      d: `M${num(x(from))},${num(y)}H${num(x(to))}`,
      stroke: line,
      'stroke-width': pens.thick,
      fill: 'none',
    }),
    el('rect', {
      x: x(row.usual[0]),
      y: y - 4,
      width: Math.max(1, x(row.usual[1]) - x(row.usual[0])),
      height: 8,
      fill,
      stroke: ink.barEdge(row.form),
      'stroke-width': pens.fine,
    }),
    row.statistics !== undefined &&
      el('path', {
        d: `M${num(x(row.statistics[0]))},${num(y + 7.5)}H${num(x(row.statistics[2]))}M${num(x(row.statistics[1]))},${num(y + 5)}v5`,
        stroke: colours.third,
        'stroke-width': pens.fine,
        'stroke-dasharray': row.bridges !== undefined && row.bridges < FEW_BRIDGES ? '2 2' : undefined,
        fill: 'none',
      }),
  );
}

const hasLimits = ({ rows }: SpanChartInput): boolean => rows.some(({ limit }) => limit !== undefined);

/** Half the height of the tick of a limiting span, px. */
const TICK_PX = 8;

/** The limiting span of a row: a heavy tick and the span beside it; the check that ends it is among the words of the row. */
function limitTick(
  { limit }: SpanRow,
  y: number,
  x: (m: number) => number,
  right: number,
  accent: string,
): Piece | null {
  if (limit === undefined) return null;
  const at = x(limit.spanM);
  const words = `${reachText(limit.spanM)} m`;
  const isTurned = at + 8 + textWidth(words, letters.drawing) > right;
  return g(
    { class: 'limit' },
    el('path', {
      d: `M${num(at)},${num(y - TICK_PX)}V${num(y + TICK_PX)}`,
      stroke: accent,
      'stroke-width': pens.heavy,
      fill: 'none',
    }),
    label(isTurned ? at - 5 : at + 5, y - 5, words, {
      fill: accent,
      anchor: isTurned ? 'end' : 'start',
      halo: true,
      figure: limit.figure,
    }),
  );
}

/** The ends a span axis needs to hold rows and the asked span, m. */
export function spanAxis(rows: readonly SpanRow[], askedM: number | null): readonly [number, number] {
  const known = rows
    .flatMap((row) => [...row.usual, ...(row.possible ?? []), ...(row.limit ? [row.limit.spanM] : [])])
    .concat(askedM === null ? [] : [askedM]);
  return [Math.min(5, ...known), Math.max(100, ...known) * 1.05];
}

interface RowLine {
  readonly text: string;
  readonly second: boolean;
  /** Right of the start of the words, px. */
  readonly dx: number;
  readonly line: number;
}

/**
 * The words of a row broken into lines; what it takes to stand otherwise follows in second ink, behind them where they
 * and it fit one line, else below, and below all what ends its spans with the deck in question.
 */
function linesOf({ words, flip, limit }: SpanRow, widthPx: number, size: number): readonly RowLine[] {
  const said = wrapText(words, widthPx, size);
  const lines: RowLine[] = said.map((text, line) => ({ text, second: false, dx: 0, line }));
  const below = (text: string): void => {
    const from = lineCount(lines);
    wrapText(text, widthPx, size).forEach((one, at) =>
      lines.push({ text: one, second: true, dx: 0, line: from + at }),
    );
  };
  if (flip !== undefined) {
    const before = `${words}; `;
    const dx = textWidth(before, size);
    if (said.length === 1 && dx + textWidth(flip, size) <= widthPx) {
      lines[0] = { text: before.trimEnd(), second: false, dx: 0, line: 0 };
      lines.push({ text: flip, second: true, dx, line: 0 });
    } else below(flip);
  }
  if (limit !== undefined) below(`carries no more from ${reachText(limit.spanM)}\u00a0m: ${limit.words}`);
  return lines;
}

const lineCount = (lines: readonly RowLine[]): number => Math.max(0, ...lines.map(({ line }) => line + 1));

/** Forms against span on a log axis, each in, possible or out in words with the number that decides. */
export function spanChart(input: SpanChartInput): Piece {
  const { rows, askedM, widthPx } = input;
  const ink = formInk(
    input.paper ?? 'colour',
    rows.map((row) => row.form),
    input.prefix ?? 'spans',
  );
  const narrow = widthPx < 680;
  const nameX = 42;
  const left = narrow ? Math.max(130, widthPx * 0.36) : Math.max(190, Math.min(232, widthPx * 0.235));
  const right = narrow ? widthPx - 62 : Math.min(left + 400, widthPx * 0.62);
  const statusX = narrow ? widthPx : right + 26;
  const wordsX = statusX + 62;
  const [low, high] = input.axisM ?? spanAxis(rows, askedM);
  const scale = scaleLog([low, high], [left, right]);
  const x = (m: number): number => scale(m);
  const ticks = marked
    .filter((m) => m >= low && m <= high)
    .filter((m) => !narrow || [5, 20, 100, 500, 2000].includes(m));
  const head = 32;
  const lettering = rows.map((row) =>
    narrow ? linesOf(row, widthPx - nameX, letters.drawing) : linesOf(row, widthPx - wordsX, letters.table),
  );
  const roomy = (input.heightPx ?? Infinity) - head - FOOT_PX;
  const words = lettering.reduce((sum, lines) => sum + lineCount(lines) * LINE_PX, 0);
  const air = Math.max(LEAST_AIR_PX, Math.min(AIR_PX, (roomy - words) / rows.length));
  const heights = lettering.map((lines) =>
    narrow ? 25 + lineCount(lines) * 13 : Math.max(LINE_PX + air, air + lineCount(lines) * LINE_PX),
  );
  const tops = heights.map((_, index) => head + heights.slice(0, index).reduce((sum, one) => sum + one, 0));
  const middleOf = (index: number): number =>
    (tops[index] ?? head) + (narrow ? 13 : (heights[index] ?? 25) / 2);
  const bottom = head + heights.reduce((sum, one) => sum + one, 0);
  const foot = bottom + FOOT_PX - 6;
  const hasStatistics = rows.some((row) => row.statistics !== undefined);

  return sheet(
    widthPx,
    foot + (narrow && hasStatistics ? 21 : 6),
    `Structural forms against span${askedM === null ? '' : `, ${length(askedM)} m asked`}`,
    [
      ink.defs.length > 0 && el('defs', {}, ink.defs),
      gridUprights(ticks.map(x), head - 6, bottom),
      ticks.map((m) => label(x(m), head - 10, fixed(m, 0), { anchor: 'middle', fill: colours.second })),
      !narrow && label(left - 12, head - 10, 'span, m', { anchor: 'end', fill: colours.second }),
      rows.map((row, index) => bars(row, middleOf(index), x, ink)),
      // Over the bars, under the lettering.
      askedM !== null &&
        limitLine(
          x(askedM),
          2,
          bottom,
          input.askedWords ?? `${length(askedM)} m asked`,
          ink.accent,
          widthPx,
          input.askedFigure,
        ),
      rows.map((row, index) => {
        const y = middleOf(index);
        const out = row.status === 'out';
        const ownInk = out ? colours.third : colours.ink;
        const before = rows[index - 1];
        const newGroup =
          before !== undefined &&
          (input.groups === 'status'
            ? before.status !== row.status
            : familyOf[before.form] !== familyOf[row.form]);
        const lines = lettering[index] ?? [];
        const wordsY = narrow ? y + 18 : y + 4.5 - (lineCount(lines) - 1) * 8;
        return g(
          { class: `form ${row.status}` },
          index > 0 && levelLine(0, widthPx, tops[index] ?? head, newGroup),
          glyph(row.form, 0, y - 8, out ? colours.rule : ink.line(row.form)),
          limitTick(row, y, x, right, ink.accent),
          label(nameX, y + 4.5, formLooks[row.form].short, { size: letters.table, fill: ownInk }),
          label(statusX, y + 4.5, row.status, {
            size: letters.table,
            weight: out ? 400 : 600,
            fill: ownInk,
            anchor: narrow ? 'end' : 'start',
          }),
          lines.map(({ text, second, dx, line }) =>
            label((narrow ? nameX : wordsX) + dx, wordsY + line * (narrow ? 13 : 16), text, {
              size: narrow ? letters.drawing : letters.table,
              fill: out ? colours.third : narrow || second ? colours.second : colours.ink,
              halo: narrow,
            }),
          ),
        );
      }),
      label(narrow ? 0 : left, foot, 'thick: usual range', { fill: colours.second }),
      label(narrow ? 110 : left + 108, foot, 'thin: possible', { fill: colours.second }),
      !narrow &&
        hasLimits(input) &&
        label(left + 440, foot, 'red: limiting span of this deck', { fill: colours.second }),
      hasStatistics &&
        label(narrow ? 0 : left + 222, foot + (narrow ? 15 : 0), 'grey: 5, 50 and 95 % of built bridges', {
          fill: colours.second,
        }),
    ],
  );
}

/** The table behind the span chart. */
export const spanTable = (input: SpanChartInput): Table => ({
  caption: 'Structural forms against span, m',
  head: [
    'form',
    'usual from',
    'to',
    'possible from',
    'to',
    'bridges built',
    '5 %',
    '50 %',
    '95 %',
    ...(hasLimits(input) ? ['limiting span', 'ended by'] : []),
    'standing',
    'because',
  ],
  rows: input.rows.map((row) => [
    formLooks[row.form].name,
    { text: length(row.usual[0]), figure: row.figures?.usual[0] },
    { text: length(row.usual[1]), figure: row.figures?.usual[1] },
    row.possible === undefined ? '' : { text: length(row.possible[0]), figure: row.figures?.possible[0] },
    row.possible === undefined ? '' : { text: length(row.possible[1]), figure: row.figures?.possible[1] },
    row.bridges === undefined ? '' : { text: fixed(row.bridges, 0), figure: row.figures?.bridges },
    ...(row.statistics?.map((span, i) => ({ text: length(span), figure: row.figures?.statistics[i] })) ?? [
      '',
      '',
      '',
    ]),
    ...(hasLimits(input)
      ? [
          row.limit ? { text: reachText(row.limit.spanM), figure: row.limit.figure } : '',
          row.limit?.words ?? '',
        ]
      : []),
    row.status,
    row.flip === undefined ? row.words : `${row.words}; ${row.flip}`,
  ]),
});
