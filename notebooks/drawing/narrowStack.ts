import { currencySign, length, money2, odds, plain, significant } from '../format.ts';
import { glyph } from '../forms/glyph.ts';
import type { AppraisedOption } from '../model.ts';
import { spanPaths, spansOf, supportChainages } from './alongOption.ts';
import { ofOption, perM2Of, rangeOf, withinOf } from './asked.ts';
import { barredWash } from './barred.ts';
import { elevationBody, levelRange } from './elevation.ts';
import { frameOf } from './frame.ts';
import { colours, letters, pens } from './ink.ts';
import { interval } from './interval.ts';
import { label } from './label.ts';
import { formBuilt, mainSpan } from './optionWords.ts';
import type { Piece } from './piece.ts';
import { el, g, num } from './piece.ts';
import { sheet } from './sheet.ts';
import type { StackRow, StackSheet } from './stackSheet.ts';
import { chosenRow, rowHandles, rowNumber, stackOutset } from './stackSheet.ts';
import { barredPiers, freeBar, spanChanges, supportFeet, withChange } from './supportHandles.ts';

/** One row for a hand-held screen: number, glyph, name and P50; solid deck; spans; interval; three figures. */
function narrowRow(shared: StackSheet, option: AppraisedOption, top: number): StackRow {
  const { input, scale, ink, axis, unit } = shared;
  const { site, widthPx } = input;
  const reference = input.reference === option.number;
  const range = levelRange(site, option, false);
  const titleY = 27;
  const frame = frameOf(scale, shared.shown, 0, { levelM: range.topM, y: titleY + 12 });
  const ground = frame.y(range.bottomM);
  const chainages = supportChainages(option);
  const spans = spansOf(option);
  const asked = spanPaths(option);
  const spanY = ground + 12;
  const intervalY = spanY + 18;
  const figureY = intervalY + 22;
  const height = figureY + 14;
  const { p10, p50, p90 } = option.cost;
  const within = input.standing.within[option.number];
  const name = formBuilt(option);
  const second: { size: number; fill: string } = { size: letters.table, fill: colours.second };
  const hands = reference ? input.hands : undefined;
  const changes = spanChanges(option, hands?.hold ?? null);
  const children = [
    rowNumber(shared, option, 12, titleY - 6, 11.5),
    glyph(option.form, 32, titleY - 14, ink.line(option.form)),
    label(72, titleY, name, { size: letters.prose, weight: reference ? 600 : 400 }),
    label(widthPx, titleY, money2(p50 / unit.per), {
      size: letters.section,
      weight: reference ? 600 : 400,
      anchor: 'end',
      figure: ofOption(option, 'cost/p50'),
    }),
    barredWash(site, frame, titleY + 10, spanY + 4),
    elevationBody(site, option, frame, ink, range, { plain: true }),
    barredPiers(site, option, frame, ink.accent),
    el('path', {
      d: chainages.map((at) => `M${num(frame.x(at))},${num(spanY - 8)}v9`).join(''),
      stroke: colours.third,
      'stroke-width': pens.thin,
    }),
    g(
      {},
      spans.map((span, index) => {
        const figure = withChange(length(span), changes[index] ?? '', span * frame.pxPerM);
        return figure !== ''
          ? label(frame.x((chainages[index] ?? 0) + span / 2), spanY, figure, {
              anchor: 'middle',
              weight: index === mainSpan(option) ? 600 : 400,
              figure: asked[index],
            })
          : null;
      }),
    ),
    hands !== undefined && supportFeet(site, option, frame, spanY + 1, hands.locked),
    hands !== undefined && freeBar(site, option, frame, spanY + 8, hands.hold),
    interval(option, axis.x, intervalY, ink),
    input.budget !== null &&
      el('path', {
        d: `M${num(axis.x(input.budget))},${num(intervalY - 9)}v18`,
        stroke: ink.accent,
        'stroke-width': pens.heavy,
      }),
    label(0, figureY, `${money2(p10 / unit.per)} to ${money2(p90 / unit.per)} ${unit.label}`, {
      ...second,
      figure: rangeOf(option, 'cost'),
    }),
    label(
      widthPx * 0.36,
      figureY,
      `${significant(option.pricePerM2.withApproaches, 2)} ${currencySign(input.currency)}/m²`,
      { ...second, figure: perM2Of(option) },
    ),
    within !== undefined &&
      label(widthPx, figureY, `${odds(within)} % within budget`, {
        ...second,
        anchor: 'end',
        figure: withinOf(option),
      }),
  ];
  const taken =
    hands === undefined
      ? []
      : rowHandles(shared, option, frame, spanY - 4, hands, { rightPx: shared.sheetPx, height });
  const piece = chosenRow(shared, option, top, height, children, taken);
  return { piece, bottom: top + height, frame };
}

/** All rows under one another for a hand-held screen. */
export function narrowStack(shared: StackSheet): Piece {
  const { input, ink, scale, unit } = shared;
  const rows: StackRow[] = [];
  let top = 18;
  for (const option of input.options) {
    const row = narrowRow(shared, option, top);
    rows.push(row);
    top = row.bottom + 4;
  }
  const budget =
    input.budget === null ? '' : `Heavy tick: budget ${plain(input.budget / unit.per)} ${unit.label}. `;
  return sheet(
    shared.sheetPx + stackOutset,
    top + 30,
    `Elevations of ${String(input.options.length)} options on one scale, with their cost; choose one to compare the others with it`,
    [
      ink.defs.length > 0 && el('defs', {}, ink.defs),
      g(
        { transform: `translate(${String(stackOutset)} 0)` },
        rows.map(({ bottom }) =>
          el('path', {
            d: `M0,${num(bottom + 2)}H${num(shared.sheetPx)}`,
            stroke: colours.grid,
            'stroke-width': pens.thin,
          }),
        ),
        rows.map(({ piece }) => piece),
        label(0, top + 18, `${budget}1:${String(scale)}, heights not exaggerated.`, { fill: colours.second }),
      ),
    ],
    'group',
    'drawing stack narrow',
  );
}
