import type { AppraisedOption, Foundation, Site, Support } from '../model.ts';
import { groundLevel, placedUnits, roadBends, roadLevel, slabLevel, soffitLevel } from './alongOption.ts';
import type { Frame } from './frame.ts';
import { colours, pens } from './ink.ts';
import type { Piece } from './piece.ts';
import { el, g, num, pathOf } from './piece.ts';

/** The foundation of the likeliest ground class; null when none is given. */
export function likeliest(support: Support): Foundation | null {
  return support.foundations.reduce<Foundation | null>(
    (best, one) => (best === null || one.odds > best.odds ? one : best),
    null,
  );
}

/** Level of the underside of a foundation: pile toe, or underside of the footing, m. */
export const toeLevel = (foundation: Foundation): number =>
  foundation.piles === null
    ? foundation.footing.topLevelM - foundation.footing.depthM
    : foundation.piles.toeLevelM;

/** How far the other ground classes put the underside from the likeliest one, m; 0 with one class only. */
export function toeSpread(support: Support): number {
  const main = likeliest(support);
  if (main === null) return 0;
  return Math.max(0, ...support.foundations.map((one) => Math.abs(toeLevel(one) - toeLevel(main))));
}

const box = (frame: Frame, left: number, right: number, top: number, bottom: number): string =>
  `M${num(frame.x(left))},${num(frame.y(top))}H${num(frame.x(right))}V${num(frame.y(bottom))}H${num(frame.x(left))}Z`;

/** Piles seen in elevation: as many as stand in one row along the road. */
export function pileRow(foundation: Foundation): number {
  const piles = foundation.piles;
  if (piles === null) return 0;
  const { lengthM, widthM } = foundation.footing;
  const along = Math.round(Math.sqrt((piles.count * lengthM) / Math.max(widthM, 0.1)));
  const fits = Math.max(1, Math.floor(lengthM / (piles.diameterM * 1.25)));
  return Math.max(1, Math.min(along, fits, piles.count));
}

export interface SubstructureStyle {
  /** Piles are cut with a break line below this level, m. */
  readonly cutBelowM?: number;
  /** Narrow sheets leave foundations out. */
  readonly foundations?: boolean;
}

function foundationPiece(foundation: Foundation, atM: number, frame: Frame, style: SubstructureStyle): Piece {
  const { footing, piles } = foundation;
  const underside = footing.topLevelM - footing.depthM;
  const cut = style.cutBelowM ?? -Infinity;
  const parts: Piece[] = [];
  if (piles !== null) {
    const count = pileRow(foundation);
    const pitch = count > 1 ? (footing.lengthM - piles.diameterM * 1.5) / (count - 1) : 0;
    const toe = Math.max(piles.toeLevelM, cut);
    const isCut = toe > piles.toeLevelM + 0.01;
    let bodies = '';
    let centres = '';
    let toes = '';
    for (let i = 0; i < count; i += 1) {
      const x = atM + (i - (count - 1) / 2) * pitch;
      const left = frame.x(x - piles.diameterM / 2);
      const right = frame.x(x + piles.diameterM / 2);
      const top = frame.y(underside);
      const bottom = frame.y(toe);
      bodies += `M${num(left)},${num(top)}V${num(bottom)}M${num(right)},${num(top)}V${num(bottom)}`;
      toes += isCut
        ? `M${num(left - 1.5)},${num(bottom + 1)}l${num((right - left + 3) / 2 - 1)},0l1,-2.4l1,2.4h${num((right - left + 3) / 2 - 1)}`
        : `M${num(left)},${num(bottom)}H${num(right)}`;
      centres += `M${num((left + right) / 2)},${num(top + 2)}V${num(bottom + 4)}`;
    }
    const half = (pitch * (count - 1) + piles.diameterM) / 2;
    parts.push(
      el('path', {
        d: box(frame, atM - half, atM + half, underside, toe),
        fill: colours.sheet,
        stroke: 'none',
      }),
      el('path', {
        d: centres,
        stroke: colours.third,
        'stroke-width': 0.5,
        'stroke-dasharray': '5 1.6 1.2 1.6',
      }),
      el('path', {
        'data-part': isCut ? 'piles, cut' : 'piles',
        d: bodies + toes,
        'stroke-width': pens.fine,
      }),
    );
  }
  parts.push(
    el('path', {
      'data-part': 'footing',
      d: box(frame, atM - footing.lengthM / 2, atM + footing.lengthM / 2, footing.topLevelM, underside),
      fill: colours.sheet,
      'stroke-width': pens.thin,
    }),
  );
  return g({}, parts);
}

/** Level down to which the structure itself reaches at a support, m: the foot of a pylon leg or of a wall drawn with its deck; Infinity where none is. */
function drawnDownTo(site: Site, option: AppraisedOption, chainageM: number): number {
  let lowest = Infinity;
  for (const { design, fromM } of placedUnits(option)) {
    for (const shape of design.elevation) {
      if (!/^(pylon|tower|middle wall)/u.test(shape.part)) continue;
      const xs = shape.points.map(([x]) => fromM + x);
      if (Math.min(...xs) - 0.5 > chainageM || Math.max(...xs) + 0.5 < chainageM) continue;
      lowest = Math.min(
        lowest,
        slabLevel(site, option, chainageM) + Math.min(...shape.points.map(([, z]) => z)),
      );
    }
  }
  return lowest;
}

function pier(
  site: Site,
  option: AppraisedOption,
  support: Support,
  frame: Frame,
  style: SubstructureStyle,
): Piece {
  const foundation = likeliest(support);
  const at = support.chainageM;
  const half = support.shaft.lengthM / 2;
  const foot =
    style.foundations === false
      ? support.groundLevelM
      : (foundation?.footing.topLevelM ?? support.groundLevelM);
  const soffit = soffitLevel(site, option, at);
  const legFoot = drawnDownTo(site, option, at);
  const isLeg = Number.isFinite(legFoot);
  const top = Math.min(support.topLevelM, legFoot);
  const gap = Number.isFinite(soffit) && !isLeg ? soffit - support.topLevelM : 0;
  const bearing = Math.min(half, 0.6);
  return g(
    { 'data-support': option.supports.indexOf(support) },
    style.foundations !== false && foundation !== null && foundationPiece(foundation, at, frame, style),
    top > foot + 0.02 &&
      el('path', {
        'data-part': 'shaft',
        d: box(frame, at - half, at + half, top, foot),
        fill: colours.sheet,
        'stroke-width': pens.thin,
      }),
    gap > 0.05 &&
      gap < 3 &&
      el('path', {
        'data-part': 'bearing',
        d: box(frame, at - bearing, at + bearing, soffit, support.topLevelM),
        fill: colours.ink,
        stroke: 'none',
      }),
  );
}

/** Broken level strokes 5.2 px apart between the road and the ground behind an abutment: fill as it is laid. */
function fillStrokes(site: Site, option: AppraisedOption, frame: Frame, fromM: number, toM: number): string {
  const step = 1 / frame.pxPerM;
  const top = Math.max(roadLevel(option, fromM), roadLevel(option, toM));
  const least = Math.min(...site.groundZ);
  let d = '';
  let row = 0;
  for (let level = top - 5.2 / frame.pxPerM; level > least; level -= 5.2 / frame.pxPerM, row += 1) {
    let open = NaN;
    for (let x = fromM + (row % 2) * 4 * step; x <= toM + step; x += step) {
      const inside = x <= toM && level < roadLevel(option, x) - 0.3 && level > groundLevel(site, x) + 0.2;
      if (inside && !(open <= x)) open = x;
      const long = 12 * step;
      if ((!inside || x - open >= long) && open <= x) {
        if (x - open > 3 * step) d += `M${num(frame.x(open))},${num(frame.y(level))}H${num(frame.x(x))}`;
        open = NaN;
        if (inside) x += 5 * step;
      }
    }
  }
  return d;
}

/** Level of the foot of a wall that is drawn with its deck; null where the end of the deck rests on an abutment. */
function footOfWall(site: Site, option: AppraisedOption, chainageM: number): number | null {
  for (const { design, unit } of placedUnits(option)) {
    const wall = design.walls?.find((one) => unit.supportsM[one.support] === chainageM);
    if (wall) return slabLevel(site, option, chainageM) - wall.heightM;
  }
  return null;
}

function abutment(
  site: Site,
  option: AppraisedOption,
  support: Support,
  frame: Frame,
  style: SubstructureStyle,
  side: -1 | 1,
): Piece {
  const foundation = likeliest(support);
  const at = support.chainageM;
  const thick = Math.max(support.shaft.lengthM, 0.8);
  const foot = foundation?.footing.topLevelM ?? support.groundLevelM;
  const seat = support.topLevelM;
  const road = roadLevel(option, at);
  // Away from the bridge is `side`; the back wall stands behind the bearings, the wing reaches back to where its slope meets the road.
  const wallFoot = footOfWall(site, option, at);
  const front = at - side * (wallFoot === null ? Math.min(0.8, thick / 2) : thick / 2);
  const back = front + side * thick;
  const wall = back - side * 0.5;
  const height = Math.max(0, road - Math.max(support.groundLevelM, foot));
  const wing = side * Math.min(Math.max(height, 2), 9);
  const points = (
    [
      [front, foot],
      [front, seat],
      [wall, seat],
      [wall, road],
      [back, road],
      [back, foot],
    ] as const
  ).map(([x, z]) => [frame.x(x), frame.y(z)] as const);
  const soffit = soffitLevel(site, option, at);
  const end =
    side < 0
      ? Math.max(frame.fromM, site.groundX[0] ?? frame.fromM)
      : Math.min(frame.toM, site.groundX[site.groundX.length - 1] ?? frame.toM);
  const edge = side < 0 ? frame.fromM : frame.toM;
  const from = Math.min(back, end);
  const to = Math.max(back, end);
  return g(
    { 'data-support': option.supports.indexOf(support) },
    style.foundations !== false &&
      to > from &&
      el('path', {
        d: fillStrokes(site, option, frame, from, to),
        stroke: colours.third,
        'stroke-width': pens.fine,
      }),
    style.foundations !== false &&
      foundation !== null &&
      foundationPiece(foundation, (front + back) / 2, frame, style),
    el('path', {
      d: pathOf([
        [frame.x(back + wing), frame.y(road - 0.1)],
        [frame.x(back + wing), frame.y(road - 0.7)],
        [frame.x(back), frame.y(road - Math.min(height, 9))],
      ]),
      stroke: colours.second,
      'stroke-width': pens.fine,
    }),
    wallFoot === null &&
      el('path', {
        'data-part': 'abutment',
        d: pathOf(points, true),
        fill: colours.sheet,
        'stroke-width': pens.thin,
      }),
    // A wall in one with the deck is drawn with it; what goes on below its foot is drawn here.
    wallFoot !== null &&
      style.foundations !== false &&
      wallFoot > foot + 0.02 &&
      el('path', {
        'data-part': 'wall',
        d: box(frame, Math.min(front, back), Math.max(front, back), wallFoot, foot),
        fill: colours.sheet,
        'stroke-width': pens.thin,
      }),
    wallFoot === null &&
      soffit > seat + 0.05 &&
      el('path', {
        'data-part': 'bearing',
        d: box(frame, at - 0.4, at + 0.4, soffit, seat),
        fill: colours.ink,
        stroke: 'none',
      }),
    // The road goes on behind the abutment, on the fill or on the ground.
    el('path', {
      d: pathOf(
        [back, ...roadBends(option, back, edge, frame.pxPerM), edge].map((x) => [
          frame.x(x),
          frame.y(x === back ? road : roadLevel(option, x)),
        ]),
      ),
      'stroke-width': pens.medium,
    }),
  );
}

/** Piers, abutments and their likeliest foundations. Pylons above the road belong to the superstructure. */
export function substructure(
  site: Site,
  option: AppraisedOption,
  frame: Frame,
  style: SubstructureStyle = {},
): Piece {
  return g(
    { class: 'substructure', fill: 'none', stroke: colours.ink },
    option.supports.map((support, index) =>
      support.chainageM < frame.fromM || support.chainageM > frame.toM
        ? null
        : support.kind === 'abutment'
          ? abutment(site, option, support, frame, style, index === 0 ? -1 : 1)
          : pier(site, option, support, frame, style),
    ),
  );
}
