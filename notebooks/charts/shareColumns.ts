import { fixed } from '../format.ts';
import { colours, letters, pens } from '../drawing/ink.ts';
import type { Paper } from '../drawing/ink.ts';
import { label } from '../drawing/label.ts';
import { textWidth } from '../drawing/lettering.ts';
import type { Piece } from '../drawing/piece.ts';
import { el, g, num } from '../drawing/piece.ts';
import { sheet } from '../drawing/sheet.ts';
import { formInk } from '../forms/formInk.ts';
import { glyph } from '../forms/glyph.ts';
import type { BuiltBucket, BuiltClass } from '../model.ts';
import { gridUprights, levelLine } from './marks.ts';
import type { Table } from './table.ts';

export interface ShareColumnsInput {
  readonly classes: readonly BuiltClass[];
  /** By rising span. */
  readonly buckets: readonly BuiltBucket[];
  /** The bucket of the asked span, framed; null where it lies beyond all. */
  readonly asked: BuiltBucket | null;
  readonly widthPx: number;
  readonly paper?: Paper;
  readonly prefix?: string;
}

const bucketWords = ({ fromM, toM }: BuiltBucket): string => `${fixed(fromM, 0)}–${fixed(toM, 0)} m`;

/** Shares as they are printed: whole per cent, '<1' for less than a half. */
const percentWords = (percent: number): string => (percent < 0.5 ? '<1' : fixed(percent, 0));

/** On a narrow sheet only the asked bucket and its neighbours are drawn. */
function shown({ buckets, asked, widthPx }: ShareColumnsInput): readonly BuiltBucket[] {
  if (widthPx >= 680) return buckets;
  const at = asked === null ? buckets.length - 1 : buckets.indexOf(asked);
  const from = Math.max(0, Math.min(at - 1, buckets.length - 3));
  return buckets.slice(from, from + 3);
}

/** Where names begin on a narrow sheet, right of their glyph, px. */
const NARROW_NAME_PX = 38;

/** Share of each recorded form among bridges of like span, one column per bucket of span. */
export function shareColumns(input: ShareColumnsInput): Piece {
  const { classes, asked, widthPx } = input;
  const narrow = widthPx < 680;
  const buckets = shown(input);
  const ink = formInk(
    input.paper ?? 'colour',
    classes.flatMap(({ form }) => form ?? []),
    input.prefix ?? 'shares',
  );
  // The columns stand clear of the longest name.
  const names = Math.max(...classes.map(({ words }) => textWidth(words, letters.drawing)));
  const left = narrow ? NARROW_NAME_PX + Math.ceil(names) + 8 : 210;
  const columnPx = (widthPx - left) / buckets.length;
  const barPx = columnPx - 28;
  const head = 40;
  const rowPx = 21;
  const bottom = head + classes.length * rowPx;
  const x = (index: number): number => left + index * columnPx;
  const framed = asked === null ? -1 : buckets.indexOf(asked);

  return sheet(widthPx, bottom + 8, 'Share of each form among bridges of like span, per cent', [
    ink.defs.length > 0 && el('defs', {}, ink.defs),
    gridUprights(
      buckets.map((_, index) => x(index)),
      head - 2,
      bottom,
    ),
    buckets.map((bucket, index) => {
      const isAsked = index === framed;
      return g(
        {},
        label(x(index) + 4, 15, bucketWords(bucket), {
          weight: isAsked ? 600 : 400,
          ...(narrow ? {} : { size: columnPx < 72 ? letters.drawing : letters.table }),
        }),
        label(x(index) + 4, 30, `${fixed(bucket.count, 0)}${narrow || index > 0 ? '' : ' bridges'}`, {
          fill: colours.second,
        }),
      );
    }),
    classes.map(({ id, words, form }, row) => {
      const y = head + (row + 0.5) * rowPx;
      return g(
        { class: 'form' },
        levelLine(0, widthPx, y - rowPx / 2),
        form !== null && glyph(form, 0, y - 8, ink.line(form)),
        label(narrow ? NARROW_NAME_PX : 42, y + 4, words, narrow ? {} : { size: letters.table }),
        buckets.map((bucket, index) => {
          const percent = bucket.percent[id];
          if (percent === undefined) return null;
          const isDoubted = bucket.doubted.includes(id);
          const width = Math.max(1, (percent / 100) * barPx);
          return g(
            {},
            el('rect', {
              x: x(index),
              y: y - 3.5,
              width,
              height: 7,
              fill: isDoubted ? colours.sheet : form === null ? colours.rule : ink.bar(form),
              stroke: isDoubted ? colours.third : form === null ? 'none' : ink.barEdge(form),
              'stroke-width': pens.fine,
            }),
            label(x(index) + width + 4, y + 4, percentWords(percent), {
              weight: index === framed ? 600 : 400,
              fill: isDoubted ? colours.third : colours.ink,
              halo: true,
            }),
          );
        }),
      );
    }),
    framed >= 0 &&
      el('path', {
        d: `M${num(x(framed) - 2)},2H${num(x(framed) + columnPx - 4)}V${num(bottom + 2)}H${num(x(framed) - 2)}Z`,
        stroke: ink.accent,
        'stroke-width': pens.medium,
        fill: 'none',
      }),
  ]);
}

/** The table behind it. */
export const shareTable = (input: ShareColumnsInput): Table => ({
  caption: 'Share of each form among bridges of like span, per cent',
  head: ['form', ...input.buckets.map(bucketWords)],
  rows: [
    ['bridges', ...input.buckets.map(({ count }) => fixed(count, 0))],
    ...input.classes.map(({ id, words }) => [
      words,
      ...input.buckets.map(({ percent, doubted }) => {
        const share = percent[id];
        return share === undefined ? '' : `${fixed(share, 1)}${doubted.includes(id) ? ' ?' : ''}`;
      }),
    ]),
  ],
});
