import { scaleLog } from 'd3-scale';
import { fixed, length } from '../format.ts';
import { colours, letters, pens } from '../drawing/ink.ts';
import type { Paper } from '../drawing/ink.ts';
import { label } from '../drawing/label.ts';
import { wrapText } from '../drawing/lettering.ts';
import type { Piece } from '../drawing/piece.ts';
import { el, g, num } from '../drawing/piece.ts';
import { sheet } from '../drawing/sheet.ts';
import { formInk } from '../forms/formInk.ts';
import { formLooks } from '../forms/formLook.ts';
import { glyph } from '../forms/glyph.ts';
import type { FormId } from '../model.ts';
import { familyOf } from '../model.ts';
import { gridUprights, levelLine, limitLine } from './marks.ts';
import { referenceMarks, type ReferenceMark } from './referenceMarks.ts';
import type { Table } from './table.ts';

/** What one source says of a form; an end it leaves open is null. */
interface SourceSpan {
  readonly fromM: number | null;
  readonly toM: number | null;
  /** What exactly it speaks of. */
  readonly of?: string;
  readonly source: ReferenceMark;
}

export interface SourceSpansInput {
  readonly forms: readonly {
    readonly form: FormId;
    /** What the rules take as usual, m. */
    readonly usual: readonly [from: number, to: number];
    readonly spans: readonly SourceSpan[];
  }[];
  readonly askedM: number;
  /** Ends of the span axis, m: the same for charts that stand below each other. */
  readonly axisM: readonly [from: number, to: number];
  readonly widthPx: number;
  readonly paper?: Paper;
  readonly prefix?: string;
}

/** An open end is dotted for this long, px. */
const OPEN_PX = 20;

/** '18 to 91 m', 'to 49 m', 'from 37 m'. */
const spanWords = ({ fromM, toM }: SourceSpan): string =>
  fromM === null
    ? `to ${length(toM ?? Number.NaN)} m`
    : toM === null
      ? `from ${length(fromM)} m`
      : `${length(fromM)} to ${length(toM)} m`;

/** A line from end to end with a tick at each that is known; dashed where it is from memory. */
function spanLine(span: SourceSpan, y: number, x: (m: number) => number, colour: string): Piece {
  const { fromM, toM } = span;
  const known = [fromM, toM].filter((end) => end !== null).map(x);
  const [a = 0, b = a] = known;
  const open =
    fromM === null
      ? `M${num(a - OPEN_PX)},${num(y)}H${num(a)}`
      : toM === null
        ? `M${num(a)},${num(y)}h${num(OPEN_PX)}`
        : '';
  return g(
    {},
    known.length === 2 &&
      el('path', {
        d: `M${num(a)},${num(y)}H${num(b)}`,
        stroke: colour,
        'stroke-width': pens.medium,
        'stroke-dasharray': span.source.read ? undefined : '5 3',
        fill: 'none',
      }),
    open !== '' &&
      el('path', {
        d: open,
        stroke: colour,
        'stroke-width': pens.medium,
        'stroke-dasharray': '1.6 2.4',
        fill: 'none',
      }),
    el('path', {
      d: known.map((end) => `M${num(end)},${num(y - 3)}v6`).join(''),
      stroke: colour,
      'stroke-width': pens.medium,
      fill: 'none',
    }),
  );
}

/** The ends a span axis needs to hold what sources say, the rules and the asked span, m. */
export function sourceAxis(
  forms: SourceSpansInput['forms'],
  askedM: number,
): readonly [from: number, to: number] {
  const ends = forms.flatMap(({ usual, spans }) => [
    ...usual,
    ...spans.flatMap(({ fromM, toM }) => [fromM, toM].filter((end) => end !== null)),
  ]);
  return [Math.min(5, askedM, ...ends), Math.max(askedM, ...ends) * 1.05];
}

const HEAD_PX = 32;

/** Where everything stands, px. */
function layoutOf({ forms, axisM, widthPx }: SourceSpansInput) {
  const narrow = widthPx < 680;
  const left = narrow ? 0 : Math.min(190, widthPx * 0.2);
  const right = narrow ? widthPx : widthPx * 0.64;
  const numberX = narrow ? 0 : right + 18;
  const wordsX = numberX + (narrow ? 22 : 26);
  const size = narrow ? letters.drawing : letters.table;
  const scale = scaleLog(axisM, [left, right]);
  const words = forms.map(({ spans }) =>
    spans.map((span) => `${spanWords(span)}${span.of === undefined ? '' : `, ${span.of}`}`),
  );
  const lineHeights = words.map((lines) =>
    lines.map((text) => (narrow ? 27 : Math.max(15, wrapText(text, widthPx - wordsX, size).length * 15))),
  );
  const rowHeights = lineHeights.map((lines) => lines.reduce((sum, one) => sum + one, narrow ? 42 : 14));
  const tops = rowHeights.map(
    (_, at) => HEAD_PX + rowHeights.slice(0, at).reduce((sum, one) => sum + one, 0),
  );
  return {
    narrow,
    left,
    numberX,
    wordsX,
    size,
    x: (m: number): number => scale(m),
    words,
    lineHeights,
    rowHeights,
    tops,
    bottom: HEAD_PX + rowHeights.reduce((sum, one) => sum + one, 0),
  };
}

/** The asked span alone, to take the place of another in a chart of the same axis and width. */
export function askedLine(input: SourceSpansInput): Piece {
  const { x, bottom } = layoutOf(input);
  const { accent } = formInk(input.paper ?? 'colour', [], '');
  return limitLine(x(input.askedM), 2, bottom, `${length(input.askedM)} m asked`, accent, input.widthPx);
}

/** Each source's span of each form, one line each, over the range that the rules take as usual. */
export function sourceSpans(input: SourceSpansInput): Piece {
  const { forms, widthPx } = input;
  const ink = formInk(
    input.paper ?? 'colour',
    forms.map(({ form }) => form),
    input.prefix ?? 'sources',
  );
  const { narrow, left, numberX, wordsX, size, x, words, lineHeights, rowHeights, tops, bottom } =
    layoutOf(input);
  const ticks = [5, 10, 20, 50, 100, 200, 500, 1000, 2000].filter(
    (m) => m >= input.axisM[0] && m <= input.axisM[1] && (!narrow || (m !== 10 && m !== 1000)),
  );

  return sheet(widthPx, bottom + 20, 'What single sources say of the span of each form', [
    ink.defs.length > 0 && el('defs', {}, ink.defs),
    forms.map(({ form, usual }, index) =>
      el('rect', {
        x: x(usual[0]),
        y: (tops[index] ?? HEAD_PX) + (narrow ? 25 : 4),
        width: x(usual[1]) - x(usual[0]),
        height: narrow ? 8 : (rowHeights[index] ?? 0) - 8,
        fill: ink.face(form),
        stroke: ink.barEdge(form),
        'stroke-width': pens.fine,
      }),
    ),
    gridUprights(ticks.map(x), HEAD_PX - 6, bottom),
    ticks.map((m) =>
      label(x(m), HEAD_PX - 10, fixed(m, 0), {
        anchor: narrow && x(m) < 10 ? 'start' : narrow && x(m) > widthPx - 14 ? 'end' : 'middle',
        fill: colours.second,
      }),
    ),
    askedLine(input),
    forms.map(({ form, spans }, index) => {
      const top = tops[index] ?? HEAD_PX;
      const heights = lineHeights[index] ?? [];
      const before = forms[index - 1];
      return g(
        { class: 'form' },
        before !== undefined && levelLine(0, widthPx, top, familyOf[before.form] !== familyOf[form]),
        glyph(form, 0, top + 6, ink.line(form)),
        label(42, top + 18.5, formLooks[form].short, { size: letters.table, halo: narrow }),
        spans.map((span, at) => {
          const y = top + (narrow ? 42 : 14.5) + heights.slice(0, at).reduce((sum, one) => sum + one, 0);
          const text = words[index]?.[at] ?? '';
          return g(
            {},
            spanLine(span, y, x, ink.line(form)),
            referenceMarks([span.source], numberX, narrow ? y + 15 : y + 4),
            narrow
              ? label(wordsX, y + 15, text, { fill: colours.second, halo: true })
              : wrapText(text, widthPx - wordsX, size).map((line, row) =>
                  label(wordsX, y + 4.5 + row * 15, line, { size, fill: colours.second }),
                ),
          );
        }),
      );
    }),
    label(narrow ? 0 : left, bottom + 15, 'tint: usual by the rules', { fill: colours.second }),
    label(narrow ? 134 : left + 150, bottom + 15, 'line: read', { fill: colours.second }),
    label(narrow ? 196 : left + 226, bottom + 15, 'dashed: from memory', { fill: colours.second }),
  ]);
}

/** The table behind it. */
export const sourceSpansTable = (input: SourceSpansInput): Table => ({
  caption: 'What single sources say of spans, m',
  head: ['form', 'source', 'from', 'to', 'of', 'read'],
  rows: input.forms.flatMap(({ form, spans }) =>
    spans.map(({ fromM, toM, of, source }) => [
      formLooks[form].name,
      String(source.number),
      fromM === null ? '' : length(fromM),
      toM === null ? '' : length(toM),
      of ?? '',
      source.read ? 'read' : 'from memory',
    ]),
  ),
});
