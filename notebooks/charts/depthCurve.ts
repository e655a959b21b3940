import { curveMonotoneX, line as lineOf } from 'd3-shape';
import { fixed, level, money2, moneyUnit } from '../format.ts';
import { linearAxis } from '../drawing/axis.ts';
import type { Asked } from '../drawing/asked.ts';
import type { Paper } from '../drawing/ink.ts';
import { colours, letters, pens } from '../drawing/ink.ts';
import { label } from '../drawing/label.ts';
import { textWidth } from '../drawing/lettering.ts';
import type { Piece } from '../drawing/piece.ts';
import { el, g, num } from '../drawing/piece.ts';
import { sheet } from '../drawing/sheet.ts';
import { formInk } from '../forms/formInk.ts';
import type { FormId } from '../model.ts';
import type { Table } from './table.ts';

/** A depth at midspan, m, and the cost of the whole crossing with it, each with where it comes from where that can be asked. */
interface DepthPoint {
  readonly depthM: number;
  readonly cost: number;
  readonly figures?: { readonly depthM: Asked; readonly cost: Asked };
}

export interface DepthCurveInput {
  readonly form: FormId;
  /** Cost of the whole crossing at each depth at midspan that was worked out, rising. */
  readonly points: readonly DepthPoint[];
  /** Depth the option has now, m. */
  readonly depthM: number;
  /** Depths at which something ends: a check is full, the road begins to rise. */
  readonly limits: readonly { readonly depthM: number; readonly words: string }[];
  readonly currency: string;
  readonly widthPx: number;
  readonly paper?: Paper;
  readonly prefix?: string;
}

/** Stretch of depths about the least cost over which cost stays within a share of it, m; null without points. */
export function flatStretch(
  points: DepthCurveInput['points'],
  share = 0.01,
): readonly [number, number] | null {
  if (points.length === 0) return null;
  const least = points.reduce((best, one) => (one.cost < best.cost ? one : best));
  const most = least.cost * (1 + share);
  const at = points.indexOf(least);
  const cross = (
    inside: { depthM: number; cost: number },
    outside: { depthM: number; cost: number } | undefined,
  ): number =>
    outside === undefined
      ? inside.depthM
      : inside.depthM +
        ((outside.depthM - inside.depthM) * (most - inside.cost)) / (outside.cost - inside.cost);
  let low = at;
  while (low > 0 && (points[low - 1]?.cost ?? Infinity) <= most) low -= 1;
  let high = at;
  while (high < points.length - 1 && (points[high + 1]?.cost ?? Infinity) <= most) high += 1;
  const first = points[low] ?? least;
  const last = points[high] ?? least;
  return [cross(first, points[low - 1]), cross(last, points[high + 1])];
}

/** Places of a depth as it is drawn: depths that print alike are one. */
const TOLD_APART = 100;

/**
 * The points with each depth once, the cheapest of it: beams that come in steps make several depths asked for into one.
 * Rising by depth.
 */
export function oncePerDepth<T extends DepthCurveInput['points'][number]>(
  points: readonly T[],
): readonly T[] {
  const once = new Map<number, T>();
  for (const point of points) {
    const depth = Math.round(point.depthM * TOLD_APART);
    const known = once.get(depth);
    if (known === undefined || point.cost < known.cost) once.set(depth, point);
  }
  return [...once.values()].sort((a, b) => a.depthM - b.depthM);
}

/** By how much more than the least a cost is, %. */
const overLeast = (cost: number, least: number): number => 100 * (cost / least - 1);

/** Cost of the crossing over its least, in percent, against depth, with the stretch within 1 % of the least washed and the limits named. */
export function depthCurve(input: DepthCurveInput): Piece {
  const { form, points, widthPx } = input;
  const ink = formInk(input.paper ?? 'colour', [form], input.prefix ?? 'depth');
  const unit = moneyUnit(input.currency, Math.max(0, ...points.map((point) => point.cost)));
  const left = 40;
  const narrow = widthPx < 480;
  const right = widthPx - (narrow ? 12 : 96);
  const top = 40;
  const bottom = top + 190;
  const axis = linearAxis(
    [...points.map((point) => point.depthM), ...input.limits.map((limit) => limit.depthM)],
    left,
    right,
    6,
  );
  // Differences between depths are surer than the cost itself, and finer than two figures of it.
  const least = Math.min(...points.map((point) => point.cost));
  const over = linearAxis(
    points.map((point) => overLeast(point.cost, least)),
    bottom - 40,
    top + 4,
    5,
  );
  // Steps of 0.05 m need a second place.
  const places = axis.ticks.every((tick) => Math.abs(10 * tick - Math.round(10 * tick)) < 1e-6) ? 1 : 2;
  const axisName = 'depth at midspan, m';
  const nameFrom = widthPx - textWidth(axisName, letters.drawing);
  const path = lineOf<{ depthM: number; cost: number }>(
    (point) => axis.x(point.depthM),
    (point) => over.x(overLeast(point.cost, least)),
  )
    .curve(curveMonotoneX)
    .digits(2);
  const flat = flatStretch(points);
  const own = points.reduce<DepthPoint | undefined>(
    (best, one) =>
      best === undefined || Math.abs(one.depthM - input.depthM) < Math.abs(best.depthM - input.depthM)
        ? one
        : best,
    undefined,
  );
  const last = points[points.length - 1];
  return sheet(widthPx, bottom + (narrow ? 38 : 34), 'Cost of the whole crossing against depth at midspan', [
    flat !== null &&
      g(
        {},
        el('rect', {
          x: axis.x(flat[0]),
          y: top,
          width: axis.x(flat[1]) - axis.x(flat[0]),
          height: bottom - top,
          fill: colours.wash,
        }),
        el('path', {
          d: `M${num(axis.x(flat[0]))},${num(bottom - 8)}v5H${num(axis.x(flat[1]))}v-5`,
          fill: 'none',
          stroke: colours.ink,
          'stroke-width': pens.medium,
        }),
        label(
          (axis.x(flat[0]) + axis.x(flat[1])) / 2,
          bottom - 12,
          `within 1 %: ${level(flat[0])} to ${level(flat[1])} m`,
          { anchor: 'middle', weight: 600, halo: true },
        ),
      ),
    el('path', {
      d: over.ticks.map((tick) => `M${num(left)},${num(over.x(tick))}H${num(right)}`).join(''),
      stroke: colours.grid,
      'stroke-width': pens.fine,
    }),
    over.ticks.map((tick) =>
      label(left - 8, over.x(tick) + 4, String(Number(tick.toPrecision(2))), {
        anchor: 'end',
        fill: colours.second,
      }),
    ),
    points.length > 0 &&
      label(0, top - 22, `% over the least, ${money2(least / unit.per)} ${unit.label} for the crossing`, {
        fill: colours.second,
      }),
    el('path', {
      d: `M${num(left)},${num(bottom)}H${num(right)}${axis.ticks.map((tick) => `M${num(axis.x(tick))},${num(bottom)}v4`).join('')}`,
      stroke: colours.ink,
      'stroke-width': pens.thin,
    }),
    axis.ticks.map(
      (tick) =>
        (narrow || axis.x(tick) + 14 < nameFrom) &&
        label(axis.x(tick), bottom + 17, tick.toFixed(places), { anchor: 'middle', fill: colours.second }),
    ),
    label(widthPx, bottom + (narrow ? 31 : 17), axisName, {
      anchor: 'end',
      fill: colours.second,
      halo: true,
    }),
    el('path', {
      d: path(points) ?? '',
      fill: 'none',
      stroke: ink.line(form),
      'stroke-width': pens.thick,
      'stroke-linejoin': 'round',
    }),
    last !== undefined &&
      !narrow &&
      label(axis.x(last.depthM) + 6, over.x(overLeast(last.cost, least)) + 4, 'whole crossing', {
        size: letters.table,
        weight: 600,
      }),
    input.limits.map((limit, index) => {
      const words = `${level(limit.depthM)}: ${limit.words}`;
      const x = axis.x(limit.depthM);
      const turned = x + 6 + textWidth(words, letters.drawing) > widthPx;
      return g(
        {},
        el('path', {
          d: `M${num(x)},${num(top - 8)}V${num(bottom)}`,
          stroke: ink.accent,
          'stroke-width': pens.heavy,
        }),
        label(turned ? x - 5 : x + 5, top + 1 + index * 14, words, {
          fill: ink.accent,
          anchor: turned ? 'end' : 'start',
          halo: true,
        }),
      );
    }),
    own !== undefined &&
      g(
        {},
        el('circle', {
          cx: axis.x(input.depthM),
          cy: over.x(overLeast(own.cost, least)),
          r: 5,
          fill: colours.ink,
          stroke: colours.sheet,
          'stroke-width': 1.35,
        }),
        label(axis.x(input.depthM), over.x(overLeast(own.cost, least)) - 11, level(input.depthM), {
          anchor: 'middle',
          size: letters.table,
          weight: 600,
          halo: true,
          figure: own.figures?.depthM,
        }),
      ),
  ]);
}

/** The table behind the curve. */
export function depthTable(input: DepthCurveInput): Table {
  const least = Math.min(...input.points.map(({ cost }) => cost));
  const unit = moneyUnit(input.currency, Math.max(0, ...input.points.map((point) => point.cost)));
  return {
    caption: 'Cost of the whole crossing against depth at midspan',
    head: ['depth, m', unit.label, '% over the least'],
    rows: input.points.map(({ depthM, cost, figures }) => [
      { text: level(depthM), figure: figures?.depthM },
      { text: money2(cost / unit.per), figure: figures?.cost },
      fixed(overLeast(cost, least), 1),
    ]),
  };
}
