import type { FormInk } from '../forms/formInk.ts';
import type { AppraisedOption, Shape, Site } from '../model.ts';
import { siteOf } from '../model.ts';
import type { PlacedUnit } from './alongOption.ts';
import { PARAPET_M, placedUnits, readAt, roadBends, roadLevel, slabLevel } from './alongOption.ts';
import type { Frame } from './frame.ts';
import { colours, pens } from './ink.ts';
import type { Piece } from './piece.ts';
import { el, g, num, pathOf } from './piece.ts';
import { likeliest } from './substructure.ts';

type XY = readonly [number, number];

/** Thinner than this a face is drawn solid, px. */
const solidBelowPx = 2.2;

/** Height of a polygon's face, px: its area over its extent along the bridge. */
function faceThickness(points: readonly XY[]): number {
  let area = 0;
  let least = Infinity;
  let most = -Infinity;
  points.forEach(([x, y], index) => {
    const [nx, ny] = points[(index + 1) % points.length] ?? [x, y];
    area += x * ny - nx * y;
    least = Math.min(least, x);
    most = Math.max(most, x);
  });
  return most > least ? Math.abs(area / 2) / (most - least) : Infinity;
}

function shapePiece(
  shape: Shape,
  points: readonly XY[],
  holes: readonly (readonly XY[])[],
  placed: PlacedUnit,
  ink: FormInk,
  frame: Frame,
  plain: boolean,
): Piece {
  const line = ink.line(placed.unit.form);
  const isCable = shape.material === 'stay' || shape.material === 'strand';
  if (shape.kind === 'line') {
    const width = Math.max((shape.thicknessM ?? 0) * frame.pxPerM, isCable ? pens.fine : pens.thin);
    return el('path', {
      'data-part': shape.part,
      d: pathOf(points),
      fill: 'none',
      stroke: line,
      'stroke-width': width,
      'stroke-linejoin': 'round',
    });
  }
  const d = pathOf(points, true) + holes.map((hole) => pathOf(hole, true)).join('');
  const thin = faceThickness(points) < solidBelowPx;
  return el('path', {
    'data-part': shape.part,
    d,
    fill: thin || plain ? line : ink.face(placed.unit.form),
    'fill-rule': 'evenodd',
    stroke: line,
    'stroke-width': thin || plain ? 0.5 : pens.thin,
    'stroke-linejoin': 'round',
  });
}

/** A wall in one with the deck stands on its footing, which may reach higher than the wall was sized down to. */
function onFooting(site: Site, option: AppraisedOption, { fromM }: PlacedUnit, shape: Shape): readonly XY[] {
  if (!shape.part.endsWith(' wall')) return shape.points;
  const xs = shape.points.map(([x]) => fromM + x);
  const under = option.supports.find(
    ({ chainageM }) => chainageM >= Math.min(...xs) && chainageM <= Math.max(...xs),
  );
  const footing = under && likeliest(under)?.footing;
  if (!footing) return shape.points;
  return shape.points.map(
    ([x, z]) => [x, Math.max(z, footing.topLevelM - slabLevel(site, option, fromM + x))] as const,
  );
}

function unitPiece(
  site: Site,
  option: AppraisedOption,
  placed: PlacedUnit,
  ink: FormInk,
  frame: Frame,
  plain: boolean,
): Piece {
  const toSheet = ([x, z]: XY): XY => [
    frame.x(placed.fromM + x),
    frame.y(slabLevel(site, option, placed.fromM + x) + z),
  ];
  const { design } = placed;
  const bent = (points: readonly XY[], closed: boolean): readonly XY[] =>
    points.flatMap((point, i): readonly XY[] => {
      const next = points[(i + 1) % points.length];
      if (next === undefined || (!closed && i === points.length - 1)) return [point];
      const [x, z] = point;
      const bends = roadBends(option, placed.fromM + x, placed.fromM + next[0], frame.pxPerM);
      return [
        point,
        ...bends.map((at): XY => {
          const part = (at - placed.fromM - x) / (next[0] - x);
          return [at - placed.fromM, z + part * (next[1] - z)];
        }),
      ];
    });
  /** What is built along the road bends with it; cables are straight whatever the road does. */
  const laid = (shape: Shape, points: readonly XY[], closed: boolean): XY[] =>
    (shape.material === 'stay' || shape.material === 'strand' ? points : bent(points, closed)).map(toSheet);
  const outline = (shape: Shape): XY[] =>
    laid(shape, onFooting(site, option, placed, shape), shape.kind === 'polygon');
  const firm = design.elevation.filter(({ faint }) => faint !== true);
  // Members above or beside the deck stand behind it.
  const order = (shape: Shape): number => (shape.kind === 'line' ? 1 : 2);
  const shapes = firm.sort((a, b) => order(a) - order(b));
  // There are many faint lines, and all have one pen: as one path a drawing that follows a hand changes the quicker.
  const faint = plain ? [] : design.elevation.filter((shape) => shape.faint === true);
  return g(
    { 'data-form': placed.unit.form },
    shapes.map((shape) =>
      shapePiece(
        shape,
        outline(shape),
        (shape.holes ?? []).map((hole) => laid(shape, hole, true)),
        placed,
        ink,
        frame,
        plain,
      ),
    ),
    faint.length > 0 &&
      el('path', {
        d: faint.map((shape) => pathOf(outline(shape), shape.kind === 'polygon')).join(''),
        fill: 'none',
        stroke: ink.line(placed.unit.form),
        'stroke-width': 0.55,
      }),
  );
}

/** The underside as one firm line, from the depth along each unit. */
function soffitLine(
  site: Site,
  option: AppraisedOption,
  placed: PlacedUnit,
  ink: FormInk,
  frame: Frame,
): Piece {
  const { xM, depthM } = placed.design.depthAlong;
  const places = xM.flatMap((x, i) => [
    ...(i === 0
      ? []
      : roadBends(option, placed.fromM + (xM[i - 1] ?? x), placed.fromM + x, frame.pxPerM).map(
          (at) => at - placed.fromM,
        )),
    x,
  ]);
  const points = places.map(
    (x) =>
      [
        frame.x(placed.fromM + x),
        frame.y(slabLevel(site, option, placed.fromM + x) - readAt(xM, depthM, x)),
      ] as const,
  );
  return el('path', {
    'data-part': 'soffit',
    d: pathOf(points),
    fill: 'none',
    stroke: ink.line(placed.unit.form),
    'stroke-width': 1.7,
    'stroke-linejoin': 'round',
  });
}

export interface SuperstructureStyle {
  /** Solid decks without inner lines, for small scales. */
  readonly plain?: boolean;
  /** Posts of the parapet every so many metres; 0 leaves them out. */
  readonly postsM?: number;
}

/** Decks, trusses, arches, pylons and stays of all units, the soffit line, the road line and the parapet. */
export function superstructure(
  site: Site,
  option: AppraisedOption,
  frame: Frame,
  ink: FormInk,
  style: SuperstructureStyle = {},
): Piece {
  const units = placedUnits(option);
  const plain = style.plain === true;
  const { startM: from, endM: to } = siteOf(site, option.units);
  const road = (x: number, rise = 0): XY => [frame.x(x), frame.y(roadLevel(option, x) + rise)];
  const along = (fromM: number, toM: number, rise = 0): XY[] =>
    [fromM, ...roadBends(option, fromM, toM, frame.pxPerM), toM].map((x) => road(x, rise));
  const over = Math.min(6, (frame.toM - to) / 2);
  const posts = style.postsM ?? 0;
  let postLines = '';
  if (posts > 0) {
    for (let x = from; x <= to + 1e-6; x += posts)
      postLines += `M${num(frame.x(x))},${num(frame.y(roadLevel(option, x) + PARAPET_M))}V${num(frame.y(roadLevel(option, x)))}`;
  }
  return g(
    { class: 'superstructure' },
    units.map((placed) => unitPiece(site, option, placed, ink, frame, plain)),
    !plain && units.map((placed) => soffitLine(site, option, placed, ink, frame)),
    el('path', {
      'data-part': 'road',
      d: pathOf(along(from, to)),
      fill: 'none',
      stroke: colours.ink,
      'stroke-width': pens.fine,
    }),
    !plain &&
      el('path', {
        'data-part': 'parapet',
        d: pathOf(along(from - over, to + over, PARAPET_M)) + postLines,
        fill: 'none',
        stroke: colours.second,
        'stroke-width': pens.fine,
      }),
  );
}
