import { chainage, level } from '../format.ts';
import { formInk } from '../forms/formInk.ts';
import type { AppraisedOption, Site } from '../model.ts';
import { roadBends, roadLevel, supportChainages, supportName } from './alongOption.ts';
import { overOf } from './asked.ts';
import { barredWash } from './barred.ts';
import { datumBelow, datumBox, datumLine } from './datumLine.ts';
import { optionWords } from './elevation.ts';
import { frameOf, type Frame } from './frame.ts';
import type { Paper } from './ink.ts';
import { colours, letters, pens } from './ink.ts';
import { label } from './label.ts';
import { textWidth } from './lettering.ts';
import type { Piece } from './piece.ts';
import { el, g, num, pathOf } from './piece.ts';
import { placer, type Placer } from './placer.ts';
import { gradientRow, ROW_PX } from './roadGradients.ts';
import { roadNeeds, roadStretches, type RoadNeed } from './roadNeeds.ts';
import type { Scale } from './scale.ts';
import { scaleBar } from './scaleBar.ts';
import { sheet } from './sheet.ts';
import { groundPoints } from './terrain.ts';

export interface RoadProfileInput {
  readonly site: Site;
  readonly option: AppraisedOption;
  readonly widthPx: number;
  /** Scale of the chainage and the stretch shown, those of the drawing it stands under. */
  readonly scale: Scale;
  readonly shown: { readonly fromM: number; readonly toM: number };
  readonly paper?: Paper;
  readonly prefix?: string;
}

/** How many times heights may be exaggerated. */
const exaggerations = [1, 2, 5, 10] as const;
/** Most the levels may take on the sheet, px. */
const HEIGHT_PX = 190;

/** Why a level is needed, as it is written on its line. */
const needWords = ({ spareM }: RoadNeed, reason: string): string =>
  `${reason}, ${spareM < -0.005 ? `${level(-spareM)} too low` : `${level(spareM)} spare`}`;

/** The largest exaggeration of the series at which the levels stay within their room. */
function exaggerationFor(rangeM: number, pxPerM: number): number {
  const fits = exaggerations.filter((times) => rangeM * pxPerM * times <= HEIGHT_PX);
  return fits.at(-1) ?? 1;
}

/** Levels needed: a heavy line each, with what asks for it where there is room. */
function needPieces(
  site: Site,
  needs: readonly RoadNeed[],
  frame: Frame,
  accent: string,
  room: Placer,
): Piece {
  return g(
    { class: 'needs' },
    needs.map((need) => {
      const points = need.points.map(([at, m]) => [frame.x(at), frame.y(m)] as const);
      const words = needWords(need, site.soffitLimits[need.limit]?.reason ?? '');
      const wide = textWidth(words, letters.drawing);
      const middle = (points[0]![0] + points.at(-1)![0]) / 2;
      const low = Math.max(...points.map(([, y]) => y));
      const onSheet = (x: number): number => Math.min(Math.max(x, frame.left + 2), frame.right - wide - 2);
      const places = [14, 27, 40, 53, 66].flatMap((down) =>
        [middle - wide / 2, points[0]![0], points.at(-1)![0] - wide].map(
          (x) => [onSheet(x), low + down] as const,
        ),
      );
      const chosen =
        places[
          room.choose(places.map(([x, y]) => ({ left: x, right: x + wide, top: y - 9, bottom: y + 3 })))
        ];
      return g(
        { 'data-part': 'need', 'data-limit': need.limit },
        el('path', {
          'data-part': 'level needed',
          d: pathOf(points),
          fill: 'none',
          stroke: accent,
          'stroke-width': pens.heavy,
        }),
        chosen !== undefined && label(chosen[0], chosen[1], words, { fill: accent, halo: true }),
      );
    }),
  );
}

/** Where the ground runs out of the drawing below: how deep it goes, said beside its middle; null where all of it is drawn. */
function cutWords(
  site: Site,
  ground: readonly (readonly [x: number, y: number])[],
  datumY: number,
  room: Placer,
): Piece | null {
  const below = ground.filter(([, y]) => y > datumY).map(([x]) => x);
  if (below.length === 0) return null;
  const words = `ground down to ${level(Math.min(...site.groundZ))} is not drawn`;
  const wide = textWidth(words, letters.drawing);
  const middle = (Math.min(...below) + Math.max(...below)) / 2;
  const places = [5, 18, 31].map((up) => [middle - wide / 2, datumY - up] as const);
  const chosen =
    places[room.choose(places.map(([x, y]) => ({ left: x, right: x + wide, top: y - 9, bottom: y + 3 })))] ??
    places[0]!;
  return label(chosen[0], chosen[1], words, { fill: colours.second, halo: true });
}

/**
 * The road over an option along the chainage of the drawing it stands under: ground, the road as proposed and as it runs,
 * the level each headroom and flood needs for the depth, gradients and vertical curves. Heights are exaggerated by a round
 * figure, and it says so.
 */
export function roadProfile(input: RoadProfileInput): Piece {
  const { site, option, widthPx, scale, shown } = input;
  const ink = formInk(input.paper ?? 'colour', [], input.prefix ?? 'road');
  const needs = roadNeeds(site, option);
  const stretches = roadStretches(option, shown);
  const ends = [
    ...new Set([site.startM, site.endM, ...stretches.flatMap(({ fromM, toM }) => [fromM, toM])]),
  ].sort((a, b) => a - b);
  const within = ends.filter((at) => at > shown.fromM + 0.1 && at < shown.toM - 0.1);
  const levels = [
    ...needs.flatMap(({ points }) => points.map(([, m]) => m)),
    ...[...ends, ...stretches.flatMap(({ fromM, toM }) => [(fromM + toM) / 2])].map((at) =>
      roadLevel(option, at),
    ),
    site.road.startLevelM,
    site.road.endLevelM,
  ];
  const topM = Math.max(...levels) + 0.1;
  // The ground may lie far below: it is drawn as far as the room goes.
  const lowM = Math.min(...levels) - 0.1;
  const flat = frameOf(scale, shown, 0, { levelM: topM, y: 0 });
  const times = exaggerationFor(topM - lowM, flat.pxPerM);
  const top = 44;
  const y = (m: number): number => top + (topM - m) * flat.pxPerM * times;
  const frame: Frame = { ...flat, right: widthPx, pxPerM: flat.pxPerM, y };
  const tall: Frame = { ...frame, pxPerM: flat.pxPerM * times };
  const bed = Math.min(...site.groundZ);
  const bottom = Math.max(y(lowM) + 74, Math.min(y(bed) + 10, top + HEIGHT_PX));
  const datum = datumBelow(tall, bottom);
  const rowTop = datum.y;
  const room = placer({ left: 0, right: widthPx, top: 0, bottom: datum.y - 2 });
  room.take(datumBox(frame, datum), 3);
  const along = (fromM: number, toM: number): (readonly [number, number])[] =>
    [fromM, ...roadBends(option, fromM, toM, tall.pxPerM), toM].map(
      (at) => [frame.x(at), y(roadLevel(option, at))] as const,
    );
  const road = along(shown.fromM, shown.toM);
  const proposed = [
    [frame.x(site.startM), y(site.road.startLevelM)],
    [frame.x(site.endM), y(site.road.endLevelM)],
  ] as const;
  room.takeLine(road, 3, 3);
  const groundLine = groundPoints(site, tall);
  room.takeLine(
    groundLine.filter(([, at]) => at < datum.y),
    2,
    1,
  );
  const cut = cutWords(site, groundLine, datum.y, room);
  for (const { points } of needs)
    room.takeLine(
      points.map(([at, m]) => [frame.x(at), y(m)] as const),
      2,
      2,
    );
  const clip = `${input.prefix ?? 'road'}-window`;
  const supports = supportChainages(option);
  // Names that would touch the one before are left out; both abutments are always named.
  const named = new Set<number>([0, supports.length - 1]);
  let lastX = frame.x(site.startM);
  supports.forEach((at, index) => {
    if (!(frame.x(at) - lastX > 24 && frame.x(site.endM) - frame.x(at) > 24)) return;
    named.add(index);
    lastX = frame.x(at);
  });
  // Figures at the edge of the sheet and at the names of the rows step inside: they say their chainage.
  const stand = (at: number): number => Math.min(Math.max(frame.x(at), 48), widthPx - 18);
  // Chainages and levels stand where a figure has room beside the ones before; those of the abutments always.
  const placed: number[] = [];
  for (const at of [site.startM, site.endM, ...within]) {
    const isEnd = at === site.startM || at === site.endM;
    if (!isEnd && stand(at) !== frame.x(at)) continue;
    if (placed.every((other) => Math.abs(stand(other) - stand(at)) > 40)) placed.push(at);
  }
  const rowsAt = rowTop + ROW_PX;
  const height = rowsAt + 34 + 42;
  const rule = (at: number, pen: number, colour: string): Piece =>
    el('path', { d: `M0,${num(at)}H${num(widthPx)}`, stroke: colour, 'stroke-width': pen });
  return sheet(
    widthPx,
    height,
    `Road over ${optionWords(option)}, heights ${String(times)} times as large as lengths: ground, road, levels needed, gradients and curves`,
    [
      el(
        'defs',
        {},
        ink.defs,
        el('clipPath', { id: clip }, el('rect', { x: 0, y: 0, width: widthPx, height: datum.y })),
      ),
      label(0, 12, times === 1 ? 'heights not exaggerated' : `heights × ${String(times)}`, {
        weight: 600,
        size: letters.table,
      }),
      g(
        { 'clip-path': `url(#${clip})`, class: 'road-profile', 'data-heights': times },
        barredWash(site, frame, 20, datum.y),
        supports.map((at, index) =>
          g(
            {},
            el('path', {
              d: `M${num(frame.x(at))},30V${num(datum.y)}`,
              stroke: colours.rule,
              'stroke-width': pens.fine,
              'stroke-dasharray': '9 2.4 1.6 2.4',
            }),
            named.has(index) &&
              label(frame.x(at), 26, supportName(index, supports.length), {
                anchor: 'middle',
                fill: colours.second,
                halo: true,
              }),
          ),
        ),
        el('path', {
          'data-part': 'ground',
          d: pathOf(groundLine),
          fill: 'none',
          stroke: colours.ink,
          'stroke-width': pens.medium,
        }),
        el('path', {
          'data-part': 'road as proposed',
          d: pathOf(proposed),
          fill: 'none',
          stroke: colours.second,
          'stroke-width': pens.thin,
          'stroke-dasharray': '6 3.4',
        }),
        needPieces(site, needs, frame, ink.accent, room),
        cut,
        el('path', {
          'data-part': 'road',
          d: pathOf(road),
          fill: 'none',
          stroke: colours.ink,
          'stroke-width': pens.thick,
        }),
        stretches.slice(1).map(({ fromM }) =>
          el('circle', {
            cx: frame.x(fromM),
            cy: y(roadLevel(option, fromM)),
            r: 2.6,
            fill: colours.sheet,
            stroke: colours.ink,
            'stroke-width': pens.thin,
          }),
        ),
      ),
      datumLine(frame, datum, pens.medium),
      gradientRow(option, stretches, frame, rowTop),
      rule(rowsAt, pens.fine, colours.rule),
      label(2, rowsAt + 12, 'ch', { fill: colours.second }),
      label(2, rowsAt + 28, 'road', { fill: colours.second }),
      placed.map((at) => [
        el('path', {
          d: `M${num(frame.x(at))},${num(rowTop)}v${num(stand(at) > frame.x(at) ? 4 : ROW_PX)}`,
          stroke: colours.ink,
          'stroke-width': pens.thin,
        }),
        label(stand(at), rowsAt + 12, chainage(at), { anchor: 'middle' }),
        label(stand(at), rowsAt + 28, level(roadLevel(option, at)), {
          anchor: 'middle',
          figure: at >= site.startM && at <= site.endM ? overOf(option, at, 'roadM') : undefined,
        }),
      ]),
      rule(rowsAt + 34, pens.medium, colours.ink),
      scaleBar(scale, Math.max(frame.x(site.startM), 8), rowsAt + 34 + 26, {
        what: 'lengths',
        heights: false,
        rightPx: widthPx,
        widthPx: Math.min(400, widthPx * 0.6),
      }),
    ],
  );
}
