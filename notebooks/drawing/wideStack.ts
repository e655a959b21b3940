import { currencySign, length, money2, odds, plain, significant, spansText } from '../format.ts';
import { glyph } from '../forms/glyph.ts';
import type { AppraisedOption } from '../model.ts';
import { spanPaths, spansOf, supportChainages } from './alongOption.ts';
import { ofOption, perM2Of, rangeOf, withinOf, type Asked } from './asked.ts';
import { barredBrackets, barredWash } from './barred.ts';
import { dimensionChain } from './dimension.ts';
import { elevationBody, levelRange } from './elevation.ts';
import { frameOf, type Frame } from './frame.ts';
import { colours, letters, pens } from './ink.ts';
import { interval } from './interval.ts';
import { isSame } from './isSame.ts';
import { label } from './label.ts';
import { textWidth } from './lettering.ts';
import { mainSpan, optionNote, optionTitle } from './optionWords.ts';
import type { Piece } from './piece.ts';
import { el, g, num } from './piece.ts';
import { barredPiers, freeBar, spanChanges, supportFeet, withChange, type InHand } from './supportHandles.ts';
import { pxPerMetre } from './scale.ts';
import { scaleBar } from './scaleBar.ts';
import { sheet } from './sheet.ts';
import type { StackRow, StackSheet } from './stackSheet.ts';
import { chosenRow, rowHandles, rowNumber, stackOutset } from './stackSheet.ts';
import { rangeWhileHeld } from './whileHeld.ts';

function title(shared: StackSheet, option: AppraisedOption, y: number, room: number): Piece {
  const { input } = shared;
  const reference = input.reference === option.number;
  const name = optionTitle(option);
  const spans = spansText(spansOf(option));
  const note = input.notes?.[option.number] ?? optionNote(input.site, option);
  const end = reference
    ? [option.status === 'out' ? 'reference, out' : 'reference', shared.ink.accent]
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

/** P50 and range over the interval on the common axis, price per m2 and the chance within the budget under it. */
function figures(shared: StackSheet, option: AppraisedOption, left: number, right: number, y: number): Piece {
  const { input, axis, unit, ink } = shared;
  const reference = input.reference === option.number;
  const { p10, p50, p90 } = option.cost;
  const within = input.standing.within[option.number];
  const limit = input.budget === null ? NaN : axis.x(input.budget);
  const second = { fill: colours.second, halo: true } as const;
  // Words step aside where the budget line would run through them: to its right where there is room, else to its left;
  // where there is none either side, fewer of them.
  const atRight = (
    texts: readonly string[],
    baseline: number,
    size: number,
    from: number,
    figure: Asked,
  ): Piece => {
    const placed = texts.flatMap((text) => {
      const width = textWidth(text, size);
      const isFree = (x: number): boolean =>
        x >= from && x + width <= right + 0.5 && !(limit > x - 5 && limit < x + width + 5);
      const x = [right - width, limit + 6, limit - 6 - width].find(isFree);
      return x === undefined ? [] : [{ x, text }];
    })[0];
    const text = texts[0]!;
    const { x, text: words } = placed ?? { x: right - textWidth(text, size), text };
    return label(x, baseline, words, { size, ...second, figure });
  };
  const price = `${significant(option.pricePerM2.withApproaches, 2)} ${currencySign(input.currency)}/m²`;
  return g(
    { class: 'figures' },
    label(left, y, money2(p50 / unit.per), {
      size: letters.section,
      weight: reference ? 600 : 400,
      halo: true,
      figure: ofOption(option, 'cost/p50'),
    }),
    atRight(
      [`${money2(p10 / unit.per)} to ${money2(p90 / unit.per)}`],
      y,
      letters.table,
      left + 44,
      rangeOf(option, 'cost'),
    ),
    el('path', {
      d: `M${num(left)},${num(y + 16)}H${num(right)}`,
      stroke: colours.grid,
      'stroke-width': pens.fine,
    }),
    interval(option, axis.x, y + 16, ink),
    label(left, y + 37, price, { size: letters.table, ...second, figure: perM2Of(option) }),
    within !== undefined &&
      atRight(
        [`${odds(within)} % within budget`, `${odds(within)} % within`, `${odds(within)} %`],
        y + 37,
        letters.drawing,
        left + textWidth(price, letters.table) + 10,
        withinOf(option),
      ),
  );
}

/** What of a row does not hang on the costs of the others, and where the rest of it goes, px. */
interface Arranged {
  readonly frame: Frame;
  readonly drawn: readonly Piece[];
  readonly dimensionY: number;
  readonly figureY: number;
  readonly height: number;
}

/** Rows as they were last drawn, by stack and number, with everything they were drawn from. */
const drawnLast = new Map<string, { readonly from: readonly unknown[]; readonly arranged: Arranged }>();

/**
 * Name, elevation and spans of an option in its row: those drawn last where nothing they are drawn from has changed. While
 * something is dragged that holds for all but the reference, and with its answer for all that have come out the same; a
 * piece that is the same is passed over when the page is changed.
 */
function arranged(shared: StackSheet, option: AppraisedOption, bodyPx: number, hands?: InHand): Arranged {
  const { input, scale, shown, isTall } = shared;
  const { site, paper, prefix } = input;
  const isReference = input.reference === option.number;
  const note = input.notes?.[option.number];
  const from = [paper, scale, isTall, bodyPx, isReference, note, hands, shown, site, option];
  const key = `${prefix ?? ''} ${String(option.number)}`;
  const last = drawnLast.get(key);
  const isAsBefore = last?.from.every((part, i) => isSame(part, from[i])) === true;
  const now = isAsBefore ? last.arranged : arrange(shared, option, bodyPx, hands);
  // What is the very same next time is found the quicker.
  drawnLast.set(key, { from, arranged: now });
  return now;
}

function arrange(
  shared: StackSheet,
  option: AppraisedOption,
  bodyPx: number,
  hands: InHand | undefined,
): Arranged {
  const { input, scale, ink } = shared;
  const { site } = input;
  const range = levelRange(site, option, scale < 2000);
  const [bottomM, topM] = rangeWhileHeld(
    hands?.hold,
    `levels ${input.prefix ?? ''}`,
    [range.bottomM, range.topM],
    HALF_LINE_PX / pxPerMetre(scale),
  );
  const titleY = TITLE_PX;
  const { isTall } = shared;
  const frame = frameOf(scale, shared.shown, 0, {
    levelM: topM,
    y: titleY + (isTall ? COST_PX : 12),
  });
  const dimensionY = Math.max(frame.y(bottomM) + DIMENSION_PX, titleY + 70);
  // On the half lines of the page: a pile that grows by little does not move all that stands below.
  const height = Math.ceil((dimensionY + 12) / HALF_LINE_PX) * HALF_LINE_PX;
  const chainages = supportChainages(option);
  const spans = spansOf(option);
  const deckY = frame.y(option.profile.startLevelM);
  const narrowest = Math.min(...spans) * frame.pxPerM;
  const changes = spanChanges(option, hands?.hold ?? null);
  const written = (span: number, i: number): string =>
    withChange(length(span), changes[i] ?? '', span * frame.pxPerM);
  const figureY = isTall ? titleY : Math.min(Math.max(deckY + 10, titleY + 24), height - 42);
  const drawn = [
    title(shared, option, titleY, bodyPx),
    elevationBody(site, option, frame, ink, range, { plain: scale >= 2000 }),
    dimensionChain(chainages.map(frame.x), dimensionY, spans.map(written), {
      boldest: mainSpan(option),
      halo: true,
      size: narrowest > 30 ? letters.table : letters.drawing,
      colour: colours.ink,
      asked: spanPaths(option),
    }),
    barredPiers(site, option, frame, ink.accent),
  ].filter((piece) => piece !== null);
  return { frame, drawn, dimensionY, figureY, height };
}

/** Whole rows as they were last drawn, with the costs of the others and the place they were drawn for. */
const rowLast = new WeakMap<Arranged, { readonly from: readonly unknown[]; readonly row: StackRow }>();

/** A row whose top is at `top`: that drawn last where neither the option nor its place nor the axis of cost has changed. */
function wideRow(shared: StackSheet, option: AppraisedOption, top: number, bodyPx: number): StackRow {
  const { input, sheetPx, axis, unit } = shared;
  const { budget, currency, standing, widthPx } = input;
  const hands = input.reference === option.number ? input.hands : undefined;
  const own = arranged(shared, option, bodyPx, hands);
  const within = standing.within[option.number];
  const costs = [unit.per, unit.label, axis.from, axis.to, budget, currency, within];
  const from = [top, bodyPx, widthPx, sheetPx, ...costs];
  const last = rowLast.get(own);
  if (last?.from.every((part, i) => part === from[i]) === true) return last.row;
  const row = drawRow(shared, option, top, bodyPx, own, hands);
  rowLast.set(own, { from, row });
  return row;
}

function drawRow(
  shared: StackSheet,
  option: AppraisedOption,
  top: number,
  bodyPx: number,
  { frame, drawn, dimensionY, figureY, height }: Arranged,
  hands: InHand | undefined,
): StackRow {
  const { input } = shared;
  const { site } = input;
  const children = [
    ...drawn,
    figures(shared, option, bodyPx + 22, input.widthPx, figureY),
    shared.isTall && budgetLine(shared, figureY - 16, figureY + 26, false),
    hands !== undefined && supportFeet(site, option, frame, dimensionY, hands.locked),
    hands !== undefined && freeBar(site, option, frame, dimensionY + 8, hands.hold),
  ];
  const rightPx = shared.isTall ? shared.sheetPx : bodyPx;
  const taken =
    hands === undefined ? [] : rowHandles(shared, option, frame, dimensionY - 8, hands, { rightPx, height });
  const piece = chosenRow(shared, option, top, height, children, taken);
  return { piece, bottom: top + height, frame };
}

function axisHead(shared: StackSheet, y: number, right: number): Piece {
  const { axis, input, unit } = shared;
  // A figure under the line of the budget could not be read.
  const limit = input.budget === null ? NaN : axis.x(input.budget);
  const unitPx = textWidth(unit.label, letters.drawing);
  const unitAt = limit > right - unitPx - 5 && limit < right + 5 ? limit - 5 : right;
  return g(
    { class: 'axis' },
    axis.ticks.map(
      (tick) =>
        axis.x(tick) < unitAt - 26 &&
        !(Math.abs(axis.x(tick) - limit) < 9) &&
        label(axis.x(tick), y, String(tick / unit.per), { anchor: 'middle', fill: colours.second }),
    ),
    label(unitAt, y, unit.label, { anchor: 'end', fill: colours.second }),
  );
}

/** Line of the budget through everything, named at its head. */
function budgetLine(shared: StackSheet, top: number, bottom: number, words: boolean): Piece | null {
  const { input, axis, unit, ink } = shared;
  if (input.budget === null) return null;
  const x = axis.x(input.budget);
  const text = `budget ${plain(input.budget / unit.per)}`;
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

/** Half a line of the prose, px. */
const HALF_LINE_PX = 12;

/** From the top of a row down to the foot of its name, px. */
const TITLE_PX = 23;

/** From the foot of an elevation down to its dimension line: the figures over that stand clear of the ground, px. */
const DIMENSION_PX = 14;

/** From the name of an option down to its elevation where its costs stand over that, px. */
const COST_PX = 46;

/** Room over the first row for brackets and axis, and under the last for the scale bar, px. */
export const stackHead = 46;
export const stackFoot = 40;

/** Height of an option's row with the space to the next, px. */
export const rowHeight = (shared: StackSheet, option: AppraisedOption, bodyPx: number): number =>
  wideRow(shared, option, 0, bodyPx).bottom + 6;

/** All rows beside one another on a full sheet: elevations left, costs right. */
export function wideStack(shared: StackSheet, bodyPx: number): Piece {
  const { input, ink, scale } = shared;
  const { site } = input;
  const head = stackHead;
  const rows: StackRow[] = [];
  let top = head;
  for (const option of input.options) {
    const row = wideRow(shared, option, top, bodyPx);
    rows.push(row);
    top = row.bottom + 6;
  }
  const bottom = top;
  const first = rows[0]?.frame ?? frameOf(scale, shared.shown, 0, { levelM: 0, y: head });
  const height = bottom + stackFoot;
  return sheet(
    shared.sheetPx + stackOutset,
    height,
    `Elevations of ${String(input.options.length)} options on one chainage and one scale, with their cost; choose one to compare the others with it`,
    [
      ink.defs.length > 0 && el('defs', {}, ink.defs),
      g(
        { transform: `translate(${String(stackOutset)} 0)` },
        barredWash(site, first, head - 12, bottom),
        barredBrackets(site, first, head - 18, ink.accent),
        axisHead(shared, head - 6, input.widthPx),
        budgetLine(shared, head - 18, shared.isTall ? head - 2 : bottom, true),
        rows.map(
          ({ bottom: at }, index) =>
            index < rows.length - 1 &&
            el('path', {
              d: `M0,${num(at + 3)}H${num(shared.sheetPx)}`,
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
