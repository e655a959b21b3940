import { fixed, odds } from '../format.ts';
import type { Asked } from '../drawing/asked.ts';
import { dataFigure, ofOption } from '../drawing/asked.ts';
import { linearAxis } from '../drawing/axis.ts';
import { colours, letters, pens } from '../drawing/ink.ts';
import { label } from '../drawing/label.ts';
import { textWidth } from '../drawing/lettering.ts';
import type { Piece } from '../drawing/piece.ts';
import { el, g, num } from '../drawing/piece.ts';
import { placer } from '../drawing/placer.ts';
import type { FormInk } from '../forms/formInk.ts';
import { optionNumber } from '../forms/optionNumber.ts';
import type { AppraisedOption, Spread } from '../model.ts';
import { dominatedSide, edgeOf, undominated } from './edge.ts';
import type { OptionsInput } from './rowHead.ts';
import type { PanelRoom, Place } from './standOff.ts';
import { standOff } from './standOff.ts';

/** One thing to weigh against cost; less is better. */
export interface Measure {
  /** E.g. 'Depth at the railway, m'. */
  readonly name: string;
  /** By option number; an option without a figure is left out of the panel. */
  readonly values: Readonly<Record<number, Spread>>;
  readonly places: number;
  /** Which figures of the study an option's value is or was made from. */
  readonly figures?: (option: AppraisedOption) => Asked;
  /** Share of draws in which each option is on the edge, where it was counted. */
  readonly onEdge?: Readonly<Record<number, number>>;
}

export interface TradeOffsInput extends OptionsInput {
  readonly measures: readonly Measure[];
  readonly budget: number | null;
  readonly currency: string;
  /** Height of a panel, px; 330 unless given. */
  readonly panelPx?: number;
}

/** Height of a panel on the screen, px. */
export const PANEL_PX = 330;

/** An option's number on its place or on a flag, where a dot keeps the place. */
function mark(
  place: Place,
  at: { readonly x: number; readonly y: number; readonly flag: boolean },
  filled: boolean,
  reference: boolean,
  ink: FormInk,
  figure: Asked,
): Piece {
  const colour = reference ? ink.accent : ink.line(place.option.form);
  const number = g(
    { 'data-figure': dataFigure(figure) },
    optionNumber(place.option.number, at.x, at.y, {
      colour,
      filled: filled || reference,
      faded: !filled && !reference,
    }),
  );
  if (!at.flag) return number;
  return g(
    {},
    el('path', {
      // As far as the middle of the number, which covers the rest.
      d: `M${num(place.x)},${num(place.y)}L${num(at.x)},${num(at.y)}`,
      fill: 'none',
      stroke: colours.second,
      'stroke-width': pens.fine,
    }),
    el('circle', {
      cx: place.x,
      cy: place.y,
      r: 3.4,
      fill: filled ? colour : colours.sheet,
      stroke: filled ? colours.sheet : colours.third,
      'stroke-width': 1.35,
    }),
    number,
  );
}

/** Name of the limit over its line or under it, at the right or as far left of that as it takes to cover no number. */
function limitName(
  text: string,
  y: number,
  { left, right, top, bottom }: PanelRoom,
  numbers: readonly { readonly x: number; readonly y: number; readonly reach: number }[],
  accent: string,
): Piece {
  const room = placer({ left, right, top, bottom });
  for (const { x, y: at, reach } of numbers)
    room.take({ left: x - reach, right: x + reach, top: at - reach, bottom: at + reach });
  const size = letters.table;
  const width = textWidth(text, size, 600);
  const places: { readonly x: number; readonly base: number }[] = [];
  for (let x = right - width; x >= left; x -= 12) places.push({ x, base: y - 5 }, { x, base: y + 14 });
  const chosen =
    places[
      room.choose(
        places.map(({ x, base }) => ({
          left: x,
          right: x + width,
          top: base - 0.7 * size,
          bottom: base + 1,
        })),
      )
    ] ?? places[0]!;
  return label(chosen.x + width, chosen.base, text, {
    anchor: 'end',
    size,
    weight: 600,
    fill: accent,
    halo: true,
  });
}

/** One measure against cost: dominated side, spreads, edge, limit and numbers. */
export function panel(
  input: TradeOffsInput,
  measure: Measure,
  ink: FormInk,
  left: number,
  right: number,
  top: number,
  y: (money: number) => number,
  limitWords: string | null,
): Piece {
  const known = input.options.filter((option) => measure.values[option.number] !== undefined);
  const spread = (option: AppraisedOption): Spread =>
    measure.values[option.number] ?? { p10: NaN, p50: NaN, p90: NaN };
  const { panelPx = PANEL_PX } = input;
  const bottom = top + panelPx;
  const axis = linearAxis(
    known.flatMap((option) => Object.values(spread(option)) as number[]),
    left + 10,
    right - 10,
    4,
  );
  const points = known.map((option) => ({
    number: option.number,
    x: spread(option).p50,
    y: option.cost.p50,
  }));
  const best = undominated(points);
  const toSheet = ([a, b]: readonly [number, number]): readonly [number, number] => [
    a === Infinity ? right : a === -Infinity ? left : axis.x(a),
    b === Infinity ? top : b === -Infinity ? bottom : y(b),
  ];
  const edge = edgeOf(points).map(toSheet);
  const side = dominatedSide(points).map(toSheet);
  const places: Place[] = known.map((option) => ({
    option,
    x: axis.x(spread(option).p50),
    y: y(option.cost.p50),
  }));
  const offs = standOff(places, input.reference, input.budget === null ? null : y(input.budget), {
    left,
    right,
    // Clear of the name of the panel.
    top: top + 8,
    bottom,
  });
  const numbers = places.flatMap(({ x, y: at, option }) => {
    const stand = offs.get(option.number) ?? { x, y: at };
    return [
      { x: stand.x, y: stand.y, reach: 11 },
      { x, y: at, reach: 4 },
    ];
  });
  const path = (run: readonly (readonly [number, number])[]): string =>
    run.length === 0 ? '' : `M${run.map(([a, b]) => `${num(a)},${num(b)}`).join('L')}`;
  let strokes = '';
  for (let at = left - panelPx; at < right; at += 8)
    strokes += `M${num(at)},${num(bottom)}l${num(panelPx)},${num(-panelPx)}`;
  const clip = `${input.prefix ?? 'trade'}-${String(Math.round(left))}-${String(Math.round(top))}`;
  return g(
    { class: 'panel' },
    label(left, top - 10, measure.name, { size: letters.table, weight: 600 }),
    el('clipPath', { id: clip }, el('path', { d: `${path(side)}Z` })),
    el('path', { d: `${path(side)}Z`, fill: colours.wash, stroke: 'none' }),
    el('path', {
      d: strokes,
      stroke: colours.grid,
      'stroke-width': pens.fine,
      fill: 'none',
      'clip-path': `url(#${clip})`,
    }),
    el('path', {
      d: `M${num(left)},${num(bottom)}H${num(right)}`,
      stroke: colours.ink,
      'stroke-width': pens.thin,
    }),
    axis.ticks.map((tick) =>
      g(
        {},
        el('path', {
          d: `M${num(axis.x(tick))},${num(bottom)}v4`,
          stroke: colours.ink,
          'stroke-width': pens.thin,
        }),
        label(axis.x(tick), bottom + 17, fixed(tick, tick % 1 === 0 ? 0 : 1), {
          anchor: 'middle',
          fill: colours.second,
        }),
      ),
    ),
    known.map((option) => {
      const on = best.has(option.number);
      const s = spread(option);
      return el('path', {
        d: `M${num(axis.x(s.p10))},${num(y(option.cost.p50))}H${num(axis.x(s.p90))}M${num(axis.x(s.p50))},${num(y(option.cost.p10))}V${num(y(option.cost.p90))}`,
        stroke: on ? ink.line(option.form) : colours.rule,
        'stroke-width': on ? pens.medium : pens.fine,
        fill: 'none',
      });
    }),
    el('path', { d: path(edge), fill: 'none', stroke: colours.ink, 'stroke-width': pens.thick }),
    input.budget !== null &&
      el('path', {
        d: `M${num(left)},${num(y(input.budget))}H${num(right)}`,
        stroke: ink.accent,
        'stroke-width': pens.heavy,
      }),
    places.map((place) => {
      const at = offs.get(place.option.number);
      return at === undefined
        ? null
        : mark(
            place,
            at,
            best.has(place.option.number),
            place.option.number === input.reference,
            ink,
            [measure.figures?.(place.option) ?? [], ofOption(place.option, 'cost/p50')].flat(),
          );
    }),
    input.budget !== null &&
      limitWords !== null &&
      limitName(limitWords, y(input.budget), { left, right, top, bottom }, numbers, ink.accent),
    measure.onEdge !== undefined &&
      edgeShares(input, measure.onEdge, best, ink, left, bottom + 38, right - left),
  );
}

/** Under a panel: in how many of the draws each option is on the edge, in steps of 5 %. */
function edgeShares(
  input: TradeOffsInput,
  shares: Readonly<Record<number, number>>,
  best: ReadonlySet<number>,
  ink: FormInk,
  left: number,
  top: number,
  room: number,
): Piece {
  const pitch = Math.min(43, room / Math.max(1, input.options.length));
  return g(
    { class: 'edge-shares' },
    label(left, top, 'on the edge, % of draws', { fill: colours.second }),
    input.options.map((option, index) => {
      const x = left + 10 + index * pitch;
      const reference = option.number === input.reference;
      const on = best.has(option.number);
      const share = shares[option.number];
      return g(
        {},
        optionNumber(option.number, x, top + 19, {
          colour: reference ? ink.accent : ink.line(option.form),
          filled: on || reference,
          faded: !on && !reference,
          radius: 8.4,
        }),
        share !== undefined &&
          label(x, top + 42, odds(share), {
            anchor: 'middle',
            weight: on ? 600 : 400,
            fill: on ? colours.ink : colours.third,
          }),
      );
    }),
  );
}
