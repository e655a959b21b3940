import { fixed } from '../format.ts';
import type { DeckStrip, StripKind } from '../model.ts';
import { colours, pens } from './ink.ts';
import { label } from './label.ts';
import type { Child, Piece } from './piece.ts';
import { el, g, num, pathOf } from './piece.ts';
import type { Scale } from './scale.ts';
import { pxPerMetre } from './scale.ts';
import { sheet } from './sheet.ts';

/** Heights of what stands on a deck, m, for drawing only. Common practice, no source. */
const heights = { kerb: 0.12, barrier: 0.8, parapet: 1.2, slab: 0.25 } as const;

const carriage: ReadonlySet<StripKind> = new Set<StripKind>(['lane', 'shoulder']);

export interface DeckStripsInput {
  /** Left to right looking up-chainage. */
  readonly strips: readonly Pick<DeckStrip, 'kind' | 'widthM'>[];
  readonly surfacingM: number;
  /** Fall of the carriageway to both sides, as a ratio. */
  readonly crossfall: number;
  readonly scale: Scale;
  /** Room at the left and right of the deck, px. */
  readonly marginPx: number;
}

/** Height of a deck drawing above its soffit line, px: what stands under it begins here. */
const deckFootPx = (scale: Scale): number => Math.ceil(18 + (heights.parapet + 0.75) * pxPerMetre(scale));

interface Place {
  readonly x: (xM: number) => number;
  /** Pixel down of a height over the crown of the road, m. */
  readonly y: (zM: number) => number;
  /** Height of the road surface over its crown, m: it falls to both sides and runs on level past its last lane. */
  readonly road: (xM: number) => number;
}

/** Post of a barrier or parapet with its rails, seen along the road. */
function rail(place: Place, xM: number, footM: number, kind: 'barrier' | 'parapet'): Piece {
  const top = footM + heights[kind];
  const x = place.x(xM);
  const rails = kind === 'barrier' ? [0.02, 0.35] : [0.02, 0.4, 0.78];
  return g(
    {},
    el('path', {
      d: `M${num(x)},${num(place.y(footM))}V${num(place.y(top))}`,
      stroke: colours.ink,
      'stroke-width': pens.medium,
    }),
    rails.map((down) =>
      el('path', {
        d: `M${num(x - 2)},${num(place.y(top - down) + 1)}h4`,
        stroke: colours.ink,
        'stroke-width': pens.heavy,
      }),
    ),
  );
}

/** One strip over its piece of slab: surfacing on the carriageway, raised build-up elsewhere, and what stands on it. */
function strip(place: Place, kind: StripKind, fromM: number, toM: number, surfacingM: number): Child {
  const { x, y, road } = place;
  if (carriage.has(kind)) {
    const d = pathOf(
      [
        [x(fromM), y(road(fromM))],
        [x(toM), y(road(toM))],
        [x(toM), y(road(toM) - surfacingM)],
        [x(fromM), y(road(fromM) - surfacingM)],
      ],
      true,
    );
    return el('path', { 'data-part': kind, d, fill: colours.ink });
  }
  const top = Math.max(road(fromM), road(toM)) + heights.kerb;
  const kerb = el('path', {
    'data-part': kind,
    d: pathOf(
      [
        [x(fromM), y(road(fromM) - surfacingM)],
        [x(fromM), y(top)],
        [x(toM), y(top)],
        [x(toM), y(road(toM) - surfacingM)],
      ],
      true,
    ),
    fill: colours.sheet,
    stroke: colours.ink,
    'stroke-width': pens.fine,
  });
  const isRailed = kind === 'barrier' || kind === 'parapet';
  return [kerb, isRailed && rail(place, (fromM + toM) / 2, top, kind)];
}

/** Crossfall beside the crown, over each half of the carriageway that has room for the words. */
function crossfalls(place: Place, crossfall: number, ends: readonly number[]): Child {
  const words = `${fixed(crossfall * 100, 1)} %`;
  return ends.slice(1).map((toM, i) => {
    const fromM = ends[i]!;
    const middle = (place.x(fromM) + place.x(toM)) / 2;
    if (place.x(toM) - place.x(fromM) < 44) return null;
    return label(middle, place.y(0) - 14, words, {
      anchor: 'middle',
      fill: colours.second,
      figure: 'practice/site/crossfall',
    });
  });
}

/**
 * The strips of a deck in cross-section, to scale: road surface with its crossfall, raised strips, barriers and parapets
 * over a slab whose underside is left open, because the brief does not decide the structure.
 */
export function deckStrips(input: DeckStripsInput): Piece {
  const { strips, surfacingM, crossfall, scale, marginPx } = input;
  const ppm = pxPerMetre(scale);
  const edges = [0];
  for (const { widthM } of strips) edges.push(edges.at(-1)! + widthM);
  const widthM = edges.at(-1)!;
  const onRoad = strips.flatMap(({ kind }, i) => (carriage.has(kind) ? [edges[i]!, edges[i + 1]!] : []));
  const [left, right] = [onRoad[0] ?? 0, onRoad.at(-1) ?? widthM];
  const crown = (left + right) / 2;
  const crownY = 18 + (heights.parapet + heights.kerb) * ppm;
  const place: Place = {
    x: (xM) => marginPx + xM * ppm,
    y: (zM) => crownY - zM * ppm,
    road: (xM) => -crossfall * Math.abs(Math.min(right, Math.max(left, xM)) - crown),
  };
  const under = (xM: number): readonly [number, number] => [
    place.x(xM),
    place.y(place.road(xM) - surfacingM),
  ];
  const soffit = (xM: number): readonly [number, number] => {
    const [x, y] = under(xM);
    return [x, y + heights.slab * ppm];
  };
  const bends = [0, left, crown, right, widthM];
  const name = `Deck, ${fixed(widthM, 2)} m wide: ${strips.map(({ kind, widthM: w }) => `${kind} ${fixed(w, 2)}`).join(', ')}`;
  return sheet(widthM * ppm + 2 * marginPx, deckFootPx(scale), name, [
    strips.map(({ kind }, i) => strip(place, kind, edges[i]!, edges[i + 1]!, surfacingM)),
    el('path', {
      d: pathOf([soffit(0), under(0), ...bends.slice(1, -1).map(under), under(widthM), soffit(widthM)]),
      fill: 'none',
      stroke: colours.ink,
      'stroke-width': pens.thin,
    }),
    el('path', {
      d: pathOf(bends.map(soffit)),
      fill: 'none',
      stroke: colours.third,
      'stroke-width': pens.fine,
      'stroke-dasharray': '5 3',
    }),
    crossfalls(place, crossfall, [left, crown, right]),
  ]);
}
