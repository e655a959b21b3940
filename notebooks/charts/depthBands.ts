import { scaleLog } from 'd3-scale';
import { fixed, level, significant } from '../format.ts';
import { colours, letters, pens } from '../drawing/ink.ts';
import type { Paper } from '../drawing/ink.ts';
import { label } from '../drawing/label.ts';
import { wrapText } from '../drawing/lettering.ts';
import type { Piece } from '../drawing/piece.ts';
import { el, g, num } from '../drawing/piece.ts';
import { sheet } from '../drawing/sheet.ts';
import type { FormInk } from '../forms/formInk.ts';
import { formInk } from '../forms/formInk.ts';
import { formLooks } from '../forms/formLook.ts';
import { glyph } from '../forms/glyph.ts';
import type { FormId } from '../model.ts';
import { logTicks } from './logTicks.ts';
import { gridUprights, levelLine } from './marks.ts';
import { referenceMarks, type ReferenceMark } from './referenceMarks.ts';
import type { Table } from './table.ts';

/** One published band of a form. */
export interface DepthBandRow {
  /** E.g. 'depth at the support'. */
  readonly what: string;
  readonly depthM: readonly [least: number, most: number];
  /** Ratio in words: '1/25 to 1/20 of the span'. */
  readonly ratio: string;
  /** Depth taken for a first answer, m, where there is one. */
  readonly takenM?: number;
  /** Whether it is what stands under the road at midspan; drawn solid, others open. */
  readonly isUnderRoad: boolean;
  readonly sources: readonly ReferenceMark[];
}

export interface DepthBandsInput {
  /** In the order in which forms are listed. */
  readonly forms: readonly { readonly form: FormId; readonly bands: readonly DepthBandRow[] }[];
  /** For the name of the chart, m. */
  readonly spanM: number;
  readonly widthPx: number;
  readonly paper?: Paper;
  readonly prefix?: string;
}

/** Two figures are all that a band of this kind bears. */
const range = ([least, most]: readonly [number, number]): string =>
  `${significant(least, 2)} to ${significant(most, 2)}`;

/** Bar of one band with a tick at the depth taken. */
function bandBar(form: FormId, band: DepthBandRow, y: number, x: (m: number) => number, ink: FormInk): Piece {
  const [least, most] = band.depthM;
  return g(
    {},
    el('rect', {
      x: x(least),
      y: y - 3.5,
      width: Math.max(1, x(most) - x(least)),
      height: 7,
      fill: band.isUnderRoad ? ink.bar(form) : colours.sheet,
      stroke: band.isUnderRoad ? ink.barEdge(form) : ink.line(form),
      'stroke-width': band.isUnderRoad ? pens.fine : pens.thin,
    }),
    band.takenM !== undefined &&
      el('path', {
        d: `M${num(x(band.takenM))},${num(y - 6)}v12`,
        stroke: colours.ink,
        'stroke-width': pens.thick,
        fill: 'none',
      }),
  );
}

const LINE_PX = 19;

/** Published depths of forms at one span, on one log axis of metres, with ratio and sources of each. */
export function depthBands(input: DepthBandsInput): Piece {
  const { forms, widthPx } = input;
  const ink = formInk(
    input.paper ?? 'colour',
    forms.map(({ form }) => form),
    input.prefix ?? 'depths',
  );
  const narrow = widthPx < 680;
  const nameX = 42;
  const whatX = narrow ? nameX : Math.min(172, widthPx * 0.18);
  const left = narrow ? 0 : whatX + 132;
  const right = narrow ? widthPx : widthPx * 0.56;
  const figureX = right + 24;
  const ratioX = figureX + 92;
  const sourcesX = ratioX + 210;
  const all = forms.flatMap(({ bands }) =>
    bands.flatMap(({ depthM, takenM }) => [...depthM, takenM ?? depthM[0]]),
  );
  const low = Math.min(0.5, ...all) * 0.9;
  const high = Math.max(5, ...all) * 1.1;
  const scale = scaleLog([low, high], [left, right]);
  const x = (m: number): number => scale(m);
  const ticks = logTicks(low, high, x, narrow ? 34 : 26);
  const head = 24;
  const bandHeight = (band: DepthBandRow): number => {
    const lines = narrow
      ? wrapText(band.ratio, widthPx, letters.drawing).length
      : wrapText(band.ratio, sourcesX - ratioX - 8, letters.table).length;
    return narrow ? 34 + lines * 13 : Math.max(LINE_PX, 4 + lines * 15);
  };
  const rows = forms.map(({ form, bands }) => ({ form, bands, heights: bands.map(bandHeight) }));
  const rowHeights = rows.map(
    ({ heights }) => heights.reduce((sum, one) => sum + one, narrow ? 28 : 8) + (narrow ? 4 : 0),
  );
  const bottom = head + rowHeights.reduce((sum, one) => sum + one, 0);

  return sheet(widthPx, bottom + 20, `Published depths of forms at a span of ${fixed(input.spanM, 0)} m`, [
    ink.defs.length > 0 && el('defs', {}, ink.defs),
    gridUprights(ticks.map(x), head - 6, bottom),
    ticks.map((m) =>
      label(x(m), head - 10, String(m), {
        anchor: narrow && x(m) < 14 ? 'start' : narrow && x(m) > widthPx - 14 ? 'end' : 'middle',
        fill: colours.second,
      }),
    ),
    !narrow && label(left - 12, head - 10, 'm', { anchor: 'end', fill: colours.second }),
    !narrow && label(sourcesX, head - 10, 'sources', { fill: colours.second }),
    rows.map(({ form, bands, heights }, index) => {
      const top = head + rowHeights.slice(0, index).reduce((sum, one) => sum + one, 0);
      const firstY = top + 4 + LINE_PX / 2;
      return g(
        { class: 'form' },
        index > 0 && levelLine(0, widthPx, top),
        glyph(form, 0, narrow ? top + 6 : firstY - 8, ink.line(form)),
        label(nameX, narrow ? top + 18.5 : firstY + 4.5, formLooks[form].short, { size: letters.table }),
        bands.map((band, at) => {
          const above = heights.slice(0, at).reduce((sum, one) => sum + one, 0);
          if (narrow) {
            const y = top + 40 + above;
            return g(
              {},
              label(0, y, band.what, { fill: colours.second, halo: true }),
              label(widthPx, y, `${range(band.depthM)} m`, {
                anchor: 'end',
                size: letters.table,
                weight: 600,
                halo: true,
              }),
              bandBar(form, band, y + 11, x, ink),
              wrapText(band.ratio, widthPx, letters.drawing).map((text, line) =>
                label(0, y + 27 + line * 13, text, { fill: colours.second, halo: true }),
              ),
            );
          }
          const y = firstY + above;
          return g(
            {},
            label(whatX, y + 4, band.what, { fill: colours.second, halo: true }),
            bandBar(form, band, y, x, ink),
            label(figureX, y + 4.5, range(band.depthM), { size: letters.table, weight: 600 }),
            wrapText(band.ratio, sourcesX - ratioX - 8, letters.table).map((text, line) =>
              label(ratioX, y + 4.5 + line * 15, text, { size: letters.table, fill: colours.second }),
            ),
            referenceMarks(band.sources, sourcesX, y + 4),
          );
        }),
      );
    }),
    label(narrow ? 0 : left, bottom + 15, 'solid: under the road at midspan', { fill: colours.second }),
    label(
      narrow ? 178 : left + 180,
      bottom + 15,
      narrow ? 'tick: a first answer' : 'open: at the support, beside or above the road',
      {
        fill: colours.second,
      },
    ),
    !narrow && label(left + 424, bottom + 15, 'tick: taken for a first answer', { fill: colours.second }),
  ]);
}

/** The table behind it. */
export const depthTable = (input: DepthBandsInput): Table => ({
  caption: `Published depths at a span of ${fixed(input.spanM, 0)} m`,
  head: ['form', 'what', 'from, m', 'to, m', 'ratio', 'taken, m'],
  rows: input.forms.flatMap(({ form, bands }) =>
    bands.map(({ what, depthM, ratio, takenM }) => [
      formLooks[form].name,
      what,
      level(depthM[0]),
      level(depthM[1]),
      ratio,
      takenM === undefined ? '' : level(takenM),
    ]),
  ),
});
