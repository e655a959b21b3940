import type { FormInk } from '../forms/formInk.ts';
import type { Design, FormId, SectionCut, Shape } from '../model.ts';
import { colours, pens } from './ink.ts';
import type { Piece } from './piece.ts';
import { el, g, num, pathOf } from './piece.ts';
import { extentOf, lowestOf } from './sectionGeometry.ts';

/** Where a section stands on its sheet. */
export interface SectionPlace {
  readonly x: (xM: number) => number;
  readonly y: (zM: number) => number;
  readonly ppm: number;
}

/** Stipple of cut concrete: dots and small stones, never in a regular row. */
function stipple(id: string, colour: string): Piece {
  const dots = [
    [2, 3],
    [9, 1.6],
    [14.6, 6.2],
    [5.4, 8.6],
    [11.4, 11.8],
    [1.8, 13.4],
    [17, 14.6],
    [7.6, 16.4],
    [16.2, 1.2],
  ] as const;
  return el(
    'pattern',
    { id, patternUnits: 'userSpaceOnUse', width: 19, height: 18 },
    el('path', {
      d: dots.map(([x, y]) => `M${num(x)},${num(y)}h.9`).join(''),
      stroke: colour,
      'stroke-width': 0.9,
      fill: 'none',
    }),
    el('path', {
      d: 'M12.4,15.4l2.4,.4l-1.2,-2.2ZM4.4,5.2l2.2,.3l-1,-2Z',
      fill: 'none',
      stroke: colour,
      'stroke-width': 0.55,
    }),
  );
}

function shapePiece(shape: Shape, place: SectionPlace, form: FormId, ink: FormInk, stippleId: string): Piece {
  const points = shape.points.map(([x, z]) => [place.x(x), place.y(z)] as const);
  const line = ink.line(form);
  if (shape.kind === 'line') {
    const furniture = shape.part === 'parapet' || shape.part === 'barrier';
    const width = Math.max((shape.thicknessM ?? 0) * place.ppm, shape.faint === true ? 0.55 : pens.thin);
    return el('path', {
      'data-part': shape.faint === true ? undefined : shape.part,
      d: pathOf(points),
      fill: 'none',
      stroke: furniture ? colours.ink : line,
      'stroke-width': shape.faint === true ? Math.min(width, pens.fine) : width,
      'stroke-linejoin': 'round',
    });
  }
  const d =
    pathOf(points, true) +
    (shape.holes ?? [])
      .map((hole) =>
        pathOf(
          hole.map(([x, z]) => [place.x(x), place.y(z)] as const),
          true,
        ),
      )
      .join('');
  if (shape.faint === true) return el('path', { d, fill: 'none', stroke: line, 'stroke-width': 0.55 });
  const part = { 'data-part': shape.part, d };
  if (shape.material === 'surfacing') return el('path', { ...part, fill: colours.ink, stroke: 'none' });
  if (shape.material === 'concrete') {
    const furniture = shape.part === 'edge strip';
    return g(
      {},
      el('path', {
        ...part,
        fill: furniture ? colours.sheet : ink.face(form),
        'fill-rule': 'evenodd',
        stroke: furniture ? colours.ink : line,
        'stroke-width': pens.thin,
        'stroke-linejoin': 'round',
      }),
      !furniture && el('path', { d, fill: `url(#${stippleId})`, 'fill-rule': 'evenodd', stroke: 'none' }),
    );
  }
  // Steel is solid; a closed member too large for that is shown by its walls.
  const box = extentOf([shape]);
  const large = Math.min(box.right - box.left, box.top - box.bottom) * place.ppm > 5;
  return el('path', {
    ...part,
    fill: large ? ink.face(form) : line,
    'fill-rule': 'evenodd',
    stroke: line,
    'stroke-width': large ? pens.medium : 0.5,
    'stroke-linejoin': 'round',
  });
}

/** Views that are not a cut through the deck. */
const isView = (cut: SectionCut): boolean => /pylon|tower|anchor/.test(cut.at);

/**
 * The cuts to show: one whole, or, where a deck is deeper at its piers, left half at the pier and right half at midspan.
 * @param at a cut or view by its name, e.g. 'pylon'; null where there is none of that name
 */
export function cutsShown(
  design: Design,
  at?: string,
): { readonly left: SectionCut; readonly right: SectionCut | null } | null {
  if (at !== undefined) {
    const named = design.sections.find((cut) => cut.at === at);
    return named === undefined ? null : { left: named, right: null };
  }
  const decks = design.sections.filter((cut) => !isView(cut));
  const first = decks[0] ?? design.sections[0];
  if (first === undefined) return null;
  const byDepth = [...decks].sort((a, b) => lowestOf(a.shapes) - lowestOf(b.shapes));
  const deep = byDepth[0] ?? first;
  const shallow = byDepth[byDepth.length - 1] ?? first;
  return lowestOf(shallow.shapes) - lowestOf(deep.shapes) > 0.05
    ? { left: deep, right: shallow }
    : { left: decks.find((cut) => cut.at === 'midspan') ?? first, right: null };
}

/** A section as cut, whole or in two halves about the centre line, between two levels of the sheet in px. */
export function cutPiece(
  design: Design,
  place: SectionPlace,
  ink: FormInk,
  prefix: string,
  top: number,
  bottom: number,
  at?: string,
): Piece | null {
  const cuts = cutsShown(design, at);
  if (cuts === null) return null;
  const { form } = design.task;
  const stippleId = `${prefix}-stipple-${form}`;
  const draw = (cut: SectionCut): Piece[] => {
    const order = (shape: Shape): number => (shape.faint === true ? 0 : shape.kind === 'polygon' ? 1 : 2);
    return [...cut.shapes]
      .sort((a, b) => order(a) - order(b))
      .map((shape) => shapePiece(shape, place, form, ink, stippleId));
  };
  const extent = extentOf(cuts.left.shapes);
  const half = (side: 'left' | 'right', cut: SectionCut): Piece => {
    const id = `${prefix}-${side}`;
    const from = side === 'left' ? place.x(extent.left) - 20 : place.x(0);
    const to = side === 'left' ? place.x(0) : place.x(extent.right) + 20;
    return g(
      { 'data-at': cut.at },
      el(
        'clipPath',
        { id },
        el('rect', { x: from, y: top - 10, width: to - from, height: bottom - top + 20 }),
      ),
      g({ 'clip-path': `url(#${id})` }, draw(cut)),
    );
  };
  return g(
    { class: 'cut' },
    el('defs', {}, stipple(stippleId, ink.paper === 'black' ? colours.third : ink.line(form))),
    cuts.right === null
      ? g({ 'data-at': cuts.left.at }, draw(cuts.left))
      : [half('left', cuts.left), half('right', cuts.right)],
    cuts.right !== null &&
      el('path', {
        d: `M${num(place.x(0))},${num(top - 6)}V${num(bottom + 6)}`,
        stroke: colours.ink,
        'stroke-width': pens.fine,
        'stroke-dasharray': '9 2.4 1.6 2.4',
      }),
  );
}
