import { money2, moneyUnit, odds, significant, spansText, currencySign, length } from '../format.ts';
import type { FormInk } from '../forms/formInk.ts';
import { formInk } from '../forms/formInk.ts';
import { glyph } from '../forms/glyph.ts';
import { optionNumber } from '../forms/optionNumber.ts';
import type { AppraisedOption, Site, Standing } from '../model.ts';
import { spansOf, supportChainages } from './alongOption.ts';
import type { Axis } from './axis.ts';
import { linearAxis, spreadValues } from './axis.ts';
import { barredBrackets, barredWash } from './clearances.ts';
import { dimensionChain } from './dimension.ts';
import { chainagesShown, crossingScale, elevationBody, levelRange, optionWords } from './elevation.ts';
import type { Frame } from './frame.ts';
import { frameOf } from './frame.ts';
import type { Paper } from './ink.ts';
import { colours, letters, pens } from './ink.ts';
import { interval } from './interval.ts';
import { label } from './label.ts';
import { textWidth } from './lettering.ts';
import { mainSpan, optionNote, optionTitle } from './optionWords.ts';
import type { Piece } from './piece.ts';
import { el, g, num } from './piece.ts';
import type { Scale } from './scale.ts';
import { scaleBar } from './scaleBar.ts';
import { sheet } from './sheet.ts';

export interface StackInput {
  readonly site: Site;
  /** In the order in which they are to stand. */
  readonly options: readonly AppraisedOption[];
  readonly standing: Standing;
  /** Money, or null where none is known. */
  readonly budget: number | null;
  readonly currency: string;
  /** Number of the reference option, or null. */
  readonly reference: number | null;
  readonly widthPx: number;
  readonly scale?: Scale;
  /** Words beside an option's spans; made from its depths and road level where left out. */
  readonly notes?: Readonly<Record<number, string>>;
  readonly paper?: Paper;
  readonly prefix?: string;
}

/** Room left of the sheet for the bar of the reference option, px; the drawing is that much wider than asked. */
export const stackOutset = 14;

/** Below this width the rows are laid out for a hand-held screen. */
export const narrowBelow = 680;

/** What all rows of one stack share. */
export interface StackSheet {
  readonly input: StackInput;
  readonly ink: FormInk;
  readonly scale: Scale;
  readonly shown: { readonly fromM: number; readonly toM: number };
  readonly axis: Axis;
  readonly unit: { readonly per: number; readonly label: string };
}

export interface StackRow {
  readonly piece: Piece;
  readonly bottom: number;
  readonly frame: Frame;
}

/** One row as something that can be chosen: number, form, spans and cost are its name. */
export function chosenRow(
  shared: StackSheet,
  option: AppraisedOption,
  top: number,
  bottom: number,
  children: readonly (Piece | null | false)[],
): Piece {
  const { input, unit } = shared;
  const reference = input.reference === option.number;
  const { p10, p50, p90 } = option.cost;
  const within = input.standing.within[option.number];
  const words = `${optionWords(option)}: ${money2(p50 / unit.per)} ${unit.label}, ${money2(p10 / unit.per)} to ${money2(p90 / unit.per)}${within === undefined ? '' : `, ${odds(within)} % within budget`}${option.status === 'out' ? ', out' : ''}`;
  return g(
    {
      class: reference ? 'row reference' : 'row',
      role: 'button',
      tabindex: 0,
      'aria-pressed': reference ? 'true' : 'false',
      'aria-label': words,
      'data-option': option.number,
    },
    el('rect', {
      class: 'frame',
      x: -4,
      y: top + 2,
      width: input.widthPx + 8,
      height: bottom - top - 4,
      fill: colours.sheet,
      'fill-opacity': 0,
      stroke: 'none',
    }),
    children,
    reference &&
      el('path', {
        d: `M${num(2.65 / 2 - stackOutset)},${num(top + 4)}V${num(bottom - 4)}`,
        stroke: shared.ink.accent,
        'stroke-width': pens.heavy,
      }),
  );
}

/** Number in its circle: filled for the reference, ring in the form's colour for the others, grey when out. */
export function rowNumber(
  shared: StackSheet,
  option: AppraisedOption,
  x: number,
  y: number,
  radius = 9.5,
): Piece {
  const filled = shared.input.reference === option.number;
  return optionNumber(option.number, x, y, {
    colour: filled ? shared.ink.accent : shared.ink.line(option.form),
    filled,
    radius,
  });
}

function title(shared: StackSheet, option: AppraisedOption, y: number, room: number): Piece {
  const { input } = shared;
  const reference = input.reference === option.number;
  const name = optionTitle(option);
  const spans = spansText(spansOf(option));
  const note = input.notes?.[option.number] ?? optionNote(input.site, option);
  const end = reference
    ? ['reference', shared.ink.accent]
    : option.status === 'out'
      ? ['out', colours.ink]
      : null;
  let x = 71;
  const parts: Piece[] = [];
  const put = (text: string, size: number, weight: 400 | 600, fill: string, must: boolean): void => {
    const width = textWidth(text, size, weight);
    if (!must && x + width > room) return;
    parts.push(label(x, y, text, { size, weight, fill }));
    x += width + 16;
  };
  put(name, letters.prose, reference ? 600 : 400, colours.ink, true);
  put(spans, letters.table, 400, colours.ink, true);
  const reserved = end === null ? 0 : textWidth(end[0] ?? '', letters.table, 600) + 16;
  if (x + textWidth(note, letters.table) + reserved <= room)
    put(note, letters.table, 400, colours.second, true);
  if (end !== null) put(end[0] ?? '', letters.table, 600, end[1] ?? colours.ink, true);
  return g(
    { class: 'title' },
    rowNumber(shared, option, 12, y - 5),
    glyph(option.form, 28, y - 13, shared.ink.line(option.form)),
    parts,
  );
}

/** P50 left, range, price per m2, interval on the common axis and the chance within the budget. */
function figures(shared: StackSheet, option: AppraisedOption, left: number, right: number, y: number): Piece {
  const { input, axis, unit, ink } = shared;
  const reference = input.reference === option.number;
  const { p10, p50, p90 } = option.cost;
  const within = input.standing.within[option.number];
  const price = `${significant(option.pricePerM2.withApproaches, 2)} ${currencySign(input.currency)}/m²`;
  return g(
    { class: 'figures' },
    label(left, y, money2(p50 / unit.per), {
      size: letters.section,
      weight: reference ? 600 : 400,
      halo: true,
    }),
    label(
      right - textWidth('88 888 €/m²', letters.table) - 4,
      y,
      `${money2(p10 / unit.per)} to ${money2(p90 / unit.per)}`,
      { size: letters.table, fill: colours.second, anchor: 'end', halo: true },
    ),
    label(right, y, price, { size: letters.table, fill: colours.second, anchor: 'end', halo: true }),
    el('path', {
      d: `M${num(left)},${num(y + 16)}H${num(right)}`,
      stroke: colours.grid,
      'stroke-width': pens.fine,
    }),
    interval(option, axis.x, y + 16, ink),
    within !== undefined &&
      label(right, y + 36, `${odds(within)} % chance within budget`, {
        fill: colours.second,
        anchor: 'end',
        halo: true,
      }),
  );
}

function wideRow(shared: StackSheet, option: AppraisedOption, top: number, bodyPx: number): StackRow {
  const { input, scale, ink } = shared;
  const { site } = input;
  const range = levelRange(site, option, scale < 2000);
  const titleY = top + 23;
  const frame = frameOf(scale, shared.shown, 0, { levelM: range.topM, y: titleY + 12 });
  const dimensionY = Math.max(frame.y(range.bottomM) + 6, titleY + 70);
  const bottom = dimensionY + 12;
  const chainages = supportChainages(option);
  const spans = spansOf(option);
  const deckY = frame.y(option.profile.startLevelM);
  const narrowest = Math.min(...spans) * frame.pxPerM;
  const figureY = Math.max(deckY + 10, titleY + 24);
  const piece = chosenRow(shared, option, top, bottom, [
    title(shared, option, titleY, bodyPx),
    elevationBody(site, option, frame, ink, range, { plain: scale >= 2000 }),
    dimensionChain(
      chainages.map(frame.x),
      dimensionY,
      spans.map((span) =>
        textWidth(length(span), 11) < narrowest || span * frame.pxPerM > 26 ? length(span) : '',
      ),
      {
        boldest: mainSpan(option),
        halo: true,
        size: narrowest > 30 ? letters.table : letters.drawing,
        colour: colours.ink,
      },
    ),
    figures(shared, option, bodyPx + 22, input.widthPx, Math.min(figureY, bottom - 42)),
  ]);
  return { piece, bottom, frame };
}

function axisHead(shared: StackSheet, y: number, right: number): Piece {
  const { axis, unit } = shared;
  return g(
    { class: 'axis' },
    axis.ticks.map(
      (tick) =>
        axis.x(tick) < right - 26 &&
        label(axis.x(tick), y, String(tick / unit.per), { anchor: 'middle', fill: colours.second }),
    ),
    label(right, y, unit.label, { anchor: 'end', fill: colours.second }),
  );
}

/** Line of the budget through everything, named at its head. */
export function budgetLine(shared: StackSheet, top: number, bottom: number, words: boolean): Piece | null {
  const { input, axis, unit, ink } = shared;
  if (input.budget === null) return null;
  const x = axis.x(input.budget);
  const text = `budget ${significant(input.budget / unit.per, 3)}`;
  const half = textWidth(text, letters.drawing, 600) / 2;
  return g(
    { class: 'budget' },
    el('path', {
      d: `M${num(x)},${num(top)}V${num(bottom)}`,
      stroke: ink.accent,
      'stroke-width': pens.heavy,
    }),
    words &&
      label(Math.min(x, input.widthPx - half), top - 5, text, {
        anchor: 'middle',
        weight: 600,
        fill: ink.accent,
      }),
  );
}

function wideStack(shared: StackSheet, bodyPx: number): Piece {
  const { input, ink, scale } = shared;
  const { site } = input;
  const head = 46;
  const rows: StackRow[] = [];
  let top = head;
  for (const option of input.options) {
    const row = wideRow(shared, option, top, bodyPx);
    rows.push(row);
    top = row.bottom + 6;
  }
  const bottom = top;
  const first = rows[0]?.frame ?? frameOf(scale, shared.shown, 0, { levelM: 0, y: head });
  const height = bottom + 40;
  return sheet(
    input.widthPx + stackOutset,
    height,
    `Elevations of ${String(input.options.length)} options on one chainage and one scale, with their cost; choose one to compare the others with it`,
    [
      ink.defs.length > 0 && el('defs', {}, ink.defs),
      g(
        { transform: `translate(${String(stackOutset)} 0)` },
        barredWash(site, first, head - 12, bottom),
        barredBrackets(site, first, head - 18, ink.accent),
        axisHead(shared, head - 6, input.widthPx),
        budgetLine(shared, head - 18, bottom, true),
        rows.map(
          ({ bottom: at }, index) =>
            index < rows.length - 1 &&
            el('path', {
              d: `M0,${num(at + 3)}H${num(input.widthPx)}`,
              stroke: colours.grid,
              'stroke-width': pens.thin,
            }),
        ),
        rows.map(({ piece }) => piece),
        scaleBar(scale, Math.max(first.x(site.startM), 8), bottom + 22, { widthPx: 400 }),
      ),
    ],
    'group',
    'drawing stack',
  );
}

/** One row for a hand-held screen: number, glyph, name and P50; solid deck; spans; interval; three figures. */
function narrowRow(shared: StackSheet, option: AppraisedOption, top: number): StackRow {
  const { input, scale, ink, axis, unit } = shared;
  const { site, widthPx } = input;
  const reference = input.reference === option.number;
  const range = levelRange(site, option, false);
  const titleY = top + 27;
  const frame = frameOf(scale, shared.shown, 0, { levelM: range.topM, y: titleY + 12 });
  const ground = frame.y(range.bottomM);
  const chainages = supportChainages(option);
  const spans = spansOf(option);
  const spanY = ground + 12;
  const intervalY = spanY + 18;
  const figureY = intervalY + 22;
  const bottom = figureY + 14;
  const { p10, p50, p90 } = option.cost;
  const within = input.standing.within[option.number];
  const name = optionTitle(option).split(',')[0] ?? '';
  const second: { size: number; fill: string } = { size: letters.table, fill: colours.second };
  const piece = chosenRow(shared, option, top, bottom, [
    rowNumber(shared, option, 12, titleY - 6, 11.5),
    glyph(option.form, 32, titleY - 14, ink.line(option.form)),
    label(72, titleY, name, { size: letters.prose, weight: reference ? 600 : 400 }),
    label(widthPx, titleY, money2(p50 / unit.per), {
      size: letters.section,
      weight: reference ? 600 : 400,
      anchor: 'end',
    }),
    barredWash(site, frame, titleY + 10, spanY + 4),
    elevationBody(site, option, frame, ink, range, { plain: true }),
    el('path', {
      d: chainages.map((at) => `M${num(frame.x(at))},${num(spanY - 8)}v9`).join(''),
      stroke: colours.third,
      'stroke-width': pens.thin,
    }),
    g(
      {},
      spans.map((span, index) => {
        const figure = length(span);
        return textWidth(figure, letters.drawing) + 3 < span * frame.pxPerM
          ? label(frame.x((chainages[index] ?? 0) + span / 2), spanY, figure, {
              anchor: 'middle',
              weight: index === mainSpan(option) ? 600 : 400,
            })
          : null;
      }),
    ),
    interval(option, axis.x, intervalY, ink),
    input.budget !== null &&
      el('path', {
        d: `M${num(axis.x(input.budget))},${num(intervalY - 9)}v18`,
        stroke: ink.accent,
        'stroke-width': pens.heavy,
      }),
    label(0, figureY, `${money2(p10 / unit.per)} to ${money2(p90 / unit.per)} ${unit.label}`, second),
    label(
      widthPx * 0.36,
      figureY,
      `${significant(option.pricePerM2.withApproaches, 2)} ${currencySign(input.currency)}/m²`,
      second,
    ),
    within !== undefined &&
      label(widthPx, figureY, `${odds(within)} % within budget`, { ...second, anchor: 'end' }),
  ]);
  return { piece, bottom, frame };
}

function narrowStack(shared: StackSheet): Piece {
  const { input, ink, scale, axis, unit } = shared;
  const rows: StackRow[] = [];
  let top = 18;
  for (const option of input.options) {
    const row = narrowRow(shared, option, top);
    rows.push(row);
    top = row.bottom + 4;
  }
  const budget =
    input.budget === null ? '' : `Red: budget ${significant(input.budget / unit.per, 3)} ${unit.label}. `;
  return sheet(
    input.widthPx + stackOutset,
    top + 30,
    `Elevations of ${String(input.options.length)} options on one scale, with their cost; choose one to compare the others with it`,
    [
      ink.defs.length > 0 && el('defs', {}, ink.defs),
      g(
        { transform: `translate(${String(stackOutset)} 0)` },
        input.budget !== null && label(Math.min(axis.x(input.budget) + 5, input.widthPx), 12, '', {}),
        rows.map(({ bottom }) =>
          el('path', {
            d: `M0,${num(bottom + 2)}H${num(input.widthPx)}`,
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

/**
 * The stack: one row per option on one chainage and one scale, with its cost on one common axis. A row is chosen by
 * click or key; `listenToStack` turns that into an event.
 */
export function stack(input: StackInput): Piece {
  const paper = input.paper ?? 'colour';
  const ink = formInk(
    paper,
    input.options.flatMap((option) => option.units.map((unit) => unit.form)),
    input.prefix ?? 'stack',
  );
  const narrow = input.widthPx < narrowBelow;
  const costPx = narrow ? 0 : Math.min(244, Math.max(200, input.widthPx * 0.2));
  const bodyPx = input.widthPx - costPx;
  const scale = input.scale ?? crossingScale(input.site, bodyPx, narrow ? 2 : 16);
  const largest = Math.max(0, ...input.options.map((option) => option.cost.p90));
  const values = spreadValues(
    input.options.map((option) => option.cost),
    input.budget === null ? [] : [input.budget],
  );
  const shared: StackSheet = {
    input,
    ink,
    scale,
    shown: chainagesShown(input.site, bodyPx, scale),
    axis: narrow
      ? linearAxis(values, 4, input.widthPx - 4)
      : linearAxis(values, bodyPx + 30, input.widthPx - 8, 7),
    unit: moneyUnit(input.currency, largest),
  };
  return narrow ? narrowStack(shared) : wideStack(shared, bodyPx);
}
