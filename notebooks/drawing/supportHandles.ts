import { fixed, level } from '../format.ts';
import type { AppraisedOption, Site } from '../model.ts';
import { PIER_HALF_WIDTH_M, abutmentWindows } from '../model.ts';
import {
  groundLevel,
  placedUnits,
  roadLevel,
  soffitLevel,
  spansOf,
  supportChainages,
  supportName,
} from './alongOption.ts';
import type { Frame } from './frame.ts';
import { barredAt, freeStretches, type Stretch } from './freeStretches.ts';
import type { HandleSpec, TypedSpec } from './handle.ts';
import { TYPED_AIR_PX } from './handle.ts';
import type { Hold } from './hold.ts';
import { colours, letters, pens } from './ink.ts';
import { label } from './label.ts';
import { textWidth } from './lettering.ts';
import type { Piece } from './piece.ts';
import { el, g, num } from './piece.ts';

/** Two supports never come closer than this by hand, m. */
const APART_M = 2;

/** The option in hand and what is known of it. */
export interface InHand {
  readonly hold: Hold | null;
  /** Supports that are locked, by their place along the crossing. */
  readonly locked: readonly number[];
}

/** Key of the handle of a support: piers by their number, abutments by their end. */
const keyOf = (index: number, last: number): string =>
  index === 0 ? 'abutment/start' : index === last ? 'abutment/end' : `pier/${String(index)}`;

/**
 * Where a support may go, m: a pier between its neighbours, an abutment in its window and short of the first pier; null for
 * an abutment that the brief has fixed.
 */
function roomOf(site: Site, at: readonly number[], index: number): Stretch | null {
  const last = at.length - 1;
  const here = at[index] ?? NaN;
  const fromM = Math.min(here, (at[index - 1] ?? -Infinity) + APART_M);
  const toM = Math.max(here, (at[index + 1] ?? Infinity) - APART_M);
  if (index > 0 && index < last) return { fromM, toM };
  if (site.windows === undefined) return null;
  const { start, end } = abutmentWindows(site, PIER_HALF_WIDTH_M);
  const window = index === 0 ? start : end;
  if (window[1] - window[0] < APART_M / 2) return null;
  return index === 0
    ? { fromM: window[0], toM: Math.min(window[1], toM) }
    : { fromM: Math.max(window[0], fromM), toM: window[1] };
}

/** Handles of the supports that may move, piers halfway up the shaft. In hand: the old place dashed. */
function supportSpecs(
  site: Site,
  option: AppraisedOption,
  frame: Frame,
  { hold, locked }: InHand,
): HandleSpec[] {
  const at = supportChainages(option);
  return at.flatMap((chainageM, index) => {
    if (chainageM < frame.fromM || chainageM > frame.toM) return [];
    const support = option.supports.find((one) => Math.abs(one.chainageM - chainageM) < 0.06);
    const room = roomOf(site, at, index);
    if (support === undefined || room === null) return [];
    const [top, foot] = [frame.y(support.topLevelM), frame.y(support.groundLevelM)];
    const isLocked = locked.includes(index);
    return {
      key: keyOf(index, at.length - 1),
      name: `${supportName(index, at.length)}, chainage${isLocked ? ', locked' : ''}`,
      valueM: chainageM,
      leastM: room.fromM,
      mostM: room.toM,
      places: 1,
      words: `ch ${fixed(chainageM, 1)}`,
      perPx: [1 / frame.pxPerM, 0],
      x: frame.x(chainageM),
      y: (top + foot) / 2,
      isLocked,
      wordsAt: [frame.x(chainageM), top - 14 - frame.pxPerM * 3],
      before: el('path', {
        d: `M${num(frame.x(hold?.valueM ?? chainageM))},${num(top)}V${num(foot)}`,
        stroke: colours.second,
        'stroke-width': pens.thin,
        'stroke-dasharray': '5 3',
      }),
    };
  });
}

/** Below each support a circle where it is free to move, a solid triangle where it is locked; nothing where it is fixed. */
export function supportFeet(
  site: Site,
  option: AppraisedOption,
  frame: Frame,
  y: number,
  locked: readonly number[],
): Piece {
  const at = supportChainages(option);
  return g(
    { class: 'feet' },
    at.map((chainageM, index) => {
      if (roomOf(site, at, index) === null) return null;
      const x = frame.x(chainageM);
      return locked.includes(index)
        ? el('path', { d: `M${num(x)},${num(y - 4.6)}l4.4,7.6h-8.8Z`, fill: colours.ink })
        : el('circle', {
            cx: x,
            cy: y,
            r: 2.6,
            fill: colours.sheet,
            stroke: colours.ink,
            'stroke-width': pens.thin,
          });
    }),
  );
}

/** Where the support in hand may stand: a heavy bar for each free stretch, what is barred left out. */
export function freeBar(
  site: Site,
  option: AppraisedOption,
  frame: Frame,
  y: number,
  hold: Hold | null,
): Piece | null {
  const at = supportChainages(option);
  const index = at.findIndex((_, i) => keyOf(i, at.length - 1) === hold?.key);
  const room = index < 0 ? null : roomOf(site, at, index);
  if (room === null) return null;
  return g(
    { class: 'free' },
    freeStretches(site, room).map(({ fromM, toM }) =>
      el('path', {
        d: `M${num(frame.x(fromM))},${num(y - 3)}v6M${num(frame.x(fromM))},${num(y)}H${num(frame.x(toM))}M${num(frame.x(toM))},${num(y - 3)}v6`,
        fill: 'none',
        stroke: colours.ink,
        'stroke-width': pens.thick,
      }),
    ),
  );
}

/** Piers that stand where none may: crossed out in the accent, with the reason. */
export function barredPiers(site: Site, option: AppraisedOption, frame: Frame, accent: string): Piece | null {
  const at = supportChainages(option);
  if (at.slice(1, -1).every((chainageM) => barredAt(site, chainageM) === undefined)) return null;
  return g(
    { class: 'barred-piers' },
    at.slice(1, -1).map((chainageM, i) => {
      const barred = barredAt(site, chainageM);
      const support = option.supports[i + 1];
      if (barred === undefined || support === undefined) return null;
      const x = frame.x(chainageM);
      const y = frame.y(support.groundLevelM);
      const words = `${supportName(i + 1, at.length)} may not stand here: ${barred.name}`;
      const isRoom = x + 12 + textWidth(words, letters.drawing) < frame.right;
      return g(
        {},
        el('path', {
          d: `M${num(x - 6)},${num(y - 6)}l12,12m0,-12l-12,12`,
          fill: 'none',
          stroke: accent,
          'stroke-width': pens.thick,
        }),
        label(x + (isRoom ? 10 : -10), y - 8, words, {
          fill: accent,
          halo: true,
          anchor: isRoom ? 'start' : 'end',
        }),
      );
    }),
  );
}

/** Handle of the depth, on the soffit in the middle of the longest span of the main unit. */
function depthSpecs(site: Site, option: AppraisedOption, frame: Frame, hold: Hold | null): HandleSpec[] {
  const main = placedUnits(option).find(({ unit }) => unit.role === 'main');
  if (main === undefined) return [];
  const { supportsM } = main.unit;
  const spans = supportsM.slice(1).map((x, i) => x - supportsM[i]!);
  const longest = spans.indexOf(Math.max(...spans));
  // Off the middle, where the depth is written.
  const chainageM = supportsM[longest]! + 0.42 * spans[longest]!;
  const { depthM } = main.design.task;
  const x = frame.x(chainageM);
  const y = frame.y(soffitLevel(site, option, chainageM));
  if (!Number.isFinite(y)) return [];
  const was = y + ((hold?.valueM ?? depthM) - depthM) * frame.pxPerM;
  return [
    {
      key: 'depth',
      name: `depth at midspan of option ${String(option.number)}`,
      valueM: depthM,
      leastM: 0.2,
      mostM: Math.max(depthM, spans[longest]! / 4),
      places: 2,
      words: `${level(depthM)} deep`,
      perPx: [0, 1 / frame.pxPerM],
      x,
      y,
      before: el('path', {
        d: `M${num(x - 26)},${num(was)}h52`,
        stroke: colours.second,
        'stroke-width': pens.thin,
        'stroke-dasharray': '5 3',
      }),
    },
  ];
}

/** What each span has changed by since the pier was taken, in words; empty where it has not. */
export function spanChanges(option: AppraisedOption, hold: Hold | null): string[] {
  const before = hold?.supportsM ?? [];
  return spansOf(option).map((span, i) => {
    if (before.length !== supportChainages(option).length) return '';
    const change = span - ((before[i + 1] ?? NaN) - (before[i] ?? NaN));
    return Math.abs(change) < 0.05 ? '' : ` (${change < 0 ? '−' : '+'}${Math.abs(change).toFixed(1)})`;
  });
}

/** A span with what it has changed by where there is room for both; nothing where it would touch its neighbours. */
export function withChange(figure: string, change: string, roomPx: number): string {
  const whole = figure + change;
  if (textWidth(whole, letters.table) + 6 < roomPx) return whole;
  return textWidth(figure, letters.drawing) + 3 < roomPx || roomPx > 26 ? figure : '';
}

/**
 * Where a pier can be put with a double click: a bay for each span, from its road down to the ground. They catch no pointer
 * themselves, so that figures and handles over them answer as ever.
 */
export function pierBays(site: Site, option: AppraisedOption, frame: Frame): Piece {
  const at = supportChainages(option);
  return g(
    { class: 'bays', 'pointer-events': 'none' },
    at.slice(1).map((toM, i) => {
      const fromM = at[i]!;
      if (toM <= frame.fromM || fromM >= frame.toM) return null;
      const top = Math.min(frame.y(roadLevel(option, fromM)), frame.y(roadLevel(option, toM))) - 8;
      const foot = Math.max(frame.y(groundLevel(site, fromM)), frame.y(groundLevel(site, toM))) + 4;
      return el('rect', {
        'data-bay': `span/${String(i)}`,
        'data-from': String(fromM),
        'data-to': String(toM),
        x: frame.x(fromM),
        y: top,
        width: (toM - fromM) * frame.pxPerM,
        height: Math.max(foot - top, 20),
        fill: 'none',
      });
    }),
  );
}

/** The spans of an option as figures that are typed over in their dimension line, their middle at y. */
function spanSpecs(option: AppraisedOption, frame: Frame, y: number): TypedSpec[] {
  const at = supportChainages(option);
  return spansOf(option).flatMap((spanM, i) => {
    const middleM = (at[i]! + at[i + 1]!) / 2;
    if (middleM < frame.fromM || middleM > frame.toM) return [];
    return {
      key: `span/${String(i)}`,
      name: `span ${String(i + 1)}`,
      valueM: spanM,
      leastM: APART_M,
      mostM: at.at(-1)! - at[0]!,
      places: 1,
      words: `${fixed(spanM, 1)} m`,
      x: frame.x(middleM),
      y,
      // No more than its span, from which its neighbours begin.
      widthPx: Math.min(textWidth(fixed(spanM, 1), letters.table), spanM * frame.pxPerM - TYPED_AIR_PX),
    };
  });
}

/**
 * What of an option can be taken hold of in its elevation: spans in their dimension line, their middle at `spanY`, supports
 * that may move, and depth.
 */
export const optionHandles = (
  site: Site,
  option: AppraisedOption,
  frame: Frame,
  spanY: number,
  hands: InHand,
): (HandleSpec | TypedSpec)[] => [
  ...spanSpecs(option, frame, spanY),
  ...supportSpecs(site, option, frame, hands),
  ...depthSpecs(site, option, frame, hands.hold),
];
