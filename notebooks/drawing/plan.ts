import { fixed, length } from '../format.ts';
import { formInk, type FormInk } from '../forms/formInk.ts';
import type { AppraisedOption, Foundation, Site, Support, Zone } from '../model.ts';
import { chainagesShown, optionWords, scaleOnSheet } from './elevation.ts';
import { frameOf } from './frame.ts';
import type { Paper } from './ink.ts';
import { colours, letters, pens } from './ink.ts';
import { label } from './label.ts';
import { textWidth } from './lettering.ts';
import type { Piece } from './piece.ts';
import { el, g, num } from './piece.ts';
import type { Scale } from './scale.ts';
import { scaleBar } from './scaleBar.ts';
import { sheet } from './sheet.ts';
import { likeliest, pileRow } from './substructure.ts';

export interface PlanInput {
  readonly site: Site;
  /** Drawn with this option, or the bare strip. */
  readonly option: AppraisedOption | null;
  readonly widthPx: number;
  readonly scale?: Scale;
  readonly paper?: Paper;
  readonly bar?: boolean;
  readonly prefix?: string;
}

/** Ground shown beside the widest thing that stands in the strip, m. */
const BESIDE_M = 9;
/** Footings and piles are drawn where a metre is more than this, px: at 1:2500 and larger. */
const FOUNDED_PX = 1;
/** Track: gauge and length of a sleeper, m. */
const GAUGE_M = 1.5;
const SLEEPER_M = 2.6;

/**
 * Where things lie in plan: chainage runs to the right, distance from the road's centre line upwards to the left of the
 * road; ways and waters cross at the skew.
 */
interface Strip {
  readonly ppm: number;
  readonly x: (chainageM: number) => number;
  readonly y: (acrossM: number) => number;
  readonly halfM: number;
  /** Cosine of the skew: how far across the road a metre along the line of supports reaches. */
  readonly cosSkew: number;
  /** Pixel of a chainage at a distance from the centre line, along a line parallel to what is crossed. */
  readonly skewed: (chainageM: number, acrossM: number) => readonly [number, number];
}

/** A line across the strip, parallel to what is crossed. */
function across(strip: Strip, chainageM: number, halfM = strip.halfM): string {
  const [x0, y0] = strip.skewed(chainageM, -halfM);
  const [x1, y1] = strip.skewed(chainageM, halfM);
  return `M${num(x0)},${num(y0)}L${num(x1)},${num(y1)}`;
}

/** Outline of a body that lies across the road at the skew, m along and across. */
function body(strip: Strip, atM: number, alongM: number, acrossM: number, offsetM = 0): string {
  const corners: [number, number][] = [
    [atM - alongM / 2, offsetM - acrossM / 2],
    [atM + alongM / 2, offsetM - acrossM / 2],
    [atM + alongM / 2, offsetM + acrossM / 2],
    [atM - alongM / 2, offsetM + acrossM / 2],
  ];
  return `M${corners.map(([x, y]) => strip.skewed(x, y).map(num).join(',')).join('L')}Z`;
}

/** Outline of a body with its faces along the line of supports: sizes square to that line and along it, m. */
function standing(strip: Strip, atM: number, thickM: number, longM: number, offsetM = 0): string {
  const { cosSkew } = strip;
  return body(strip, atM, thickM / cosSkew, longM * cosSkew, offsetM * cosSkew);
}

/** Short strokes on the water side of a bank, longer and shorter by turns. */
function hachures(strip: Strip, bankM: number, towards: 1 | -1): string {
  let d = '';
  let index = 0;
  for (let y = -strip.halfM + 0.6; y < strip.halfM; y += 4.2 / strip.ppm, index += 1) {
    const [x0, y0] = strip.skewed(bankM, y);
    d += `M${num(x0)},${num(y0)}h${num(towards * (index % 2 === 0 ? 7 : 3.5))}`;
  }
  return d;
}

/** Broken lines of water between two banks. */
function waterLines(strip: Strip, fromM: number, toM: number): string {
  let d = '';
  const rows = 5;
  for (let row = 0; row < rows; row += 1) {
    const y = strip.halfM * ((2 * (row + 0.5)) / rows - 1);
    const wide = (toM - fromM) * strip.ppm;
    const [left] = strip.skewed(fromM, y);
    for (let x = 14 + ((row * 23) % 31); x < wide - 24; x += 46) {
      d += `M${num(left + x)},${num(strip.y(y))}h${num(Math.min(17, wide - 14 - x))}`;
    }
  }
  return d;
}

/** Rails and sleepers of one track at the middle of its stretch. */
function track(strip: Strip, middleM: number): Piece {
  let sleepers = '';
  for (let y = -strip.halfM; y < strip.halfM; y += 4.8 / strip.ppm) {
    const [x, at] = strip.skewed(middleM, y);
    sleepers += `M${num(x - (SLEEPER_M / 2) * strip.ppm)},${num(at)}h${num(SLEEPER_M * strip.ppm)}`;
  }
  return g(
    {},
    el('path', { d: sleepers, stroke: colours.third, 'stroke-width': pens.fine }),
    el('path', {
      d: across(strip, middleM - GAUGE_M / 2) + across(strip, middleM + GAUGE_M / 2),
      'stroke-width': pens.thin,
    }),
  );
}

/** What is crossed, by its kind. */
function zonePiece(strip: Strip, zone: Zone): Piece | null {
  const { fromM, toM, kind } = zone;
  const middleM = (fromM + toM) / 2;
  const edges = across(strip, fromM) + across(strip, toM);
  switch (kind) {
    case 'railway':
      return g(
        {},
        el('path', { d: edges, 'stroke-width': pens.fine, 'stroke-dasharray': '4.6 2.8' }),
        track(strip, middleM),
      );
    case 'river':
      return g(
        {},
        el('path', { d: edges, 'stroke-width': pens.thin }),
        el('path', {
          d: hachures(strip, fromM, 1) + hachures(strip, toM, -1),
          'stroke-width': pens.fine,
          stroke: colours.third,
        }),
        el('path', { d: waterLines(strip, fromM, toM), 'stroke-width': pens.fine, stroke: colours.second }),
      );
    case 'road':
      return g(
        {},
        el('path', { d: edges, 'stroke-width': pens.thin }),
        el('path', { d: across(strip, middleM), 'stroke-width': pens.fine, 'stroke-dasharray': '11 8' }),
      );
    default:
      return el('path', { d: edges, 'stroke-width': pens.fine, 'stroke-dasharray': '2 2.4' });
  }
}

/** Piles of a group where they stand under their cap, each with its cross. */
function piles(strip: Strip, atM: number, foundation: Foundation): Piece | null {
  if (foundation.piles === null) return null;
  const { count, diameterM } = foundation.piles;
  const { lengthM, widthM } = foundation.footing;
  const along = pileRow(foundation);
  const rows = Math.ceil(count / along);
  const pitch = (sizeM: number, n: number): number => (n > 1 ? (sizeM - 1.5 * diameterM) / (n - 1) : 0);
  const circles: Piece[] = [];
  let crosses = '';
  for (let i = 0; i < count; i += 1) {
    const x = atM + (((i % along) - (along - 1) / 2) * pitch(lengthM, along)) / strip.cosSkew;
    const y = (Math.floor(i / along) - (rows - 1) / 2) * pitch(widthM, rows) * strip.cosSkew;
    const [cx, cy] = strip.skewed(x, y);
    const r = (diameterM / 2) * strip.ppm;
    circles.push(el('circle', { cx, cy, r }));
    crosses += `M${num(cx - r - 1)},${num(cy)}h${num(2 * r + 2)}M${num(cx)},${num(cy - r - 1)}v${num(2 * r + 2)}`;
  }
  return g(
    { 'stroke-width': pens.fine },
    g({ 'stroke-dasharray': '2 1.4' }, circles),
    // Smaller than this a cross is a smudge.
    strip.ppm * diameterM > 6 && el('path', { d: crosses, stroke: colours.third, 'stroke-width': 0.5 }),
  );
}

/** Shaft or wall of a support, its footing and its piles under the deck. */
function supportPiece(strip: Strip, support: Support): Piece {
  const foundation = likeliest(support);
  const { chainageM: at, shaft } = support;
  const pitch = shaft.columns > 1 ? shaft.widthM / shaft.columns : 0;
  const columns = Array.from({ length: Math.max(1, shaft.columns) }, (_, i) =>
    standing(
      strip,
      at,
      shaft.lengthM,
      shaft.columns > 1 ? Math.min(shaft.lengthM, pitch * 0.8) : shaft.widthM,
      (i - (Math.max(1, shaft.columns) - 1) / 2) * pitch,
    ),
  );
  return g(
    { fill: 'none' },
    strip.ppm > FOUNDED_PX &&
      foundation !== null &&
      el('path', {
        d: standing(strip, at, foundation.footing.lengthM, foundation.footing.widthM),
        'stroke-width': pens.fine,
        'stroke-dasharray': '4.6 2.8',
      }),
    strip.ppm > FOUNDED_PX && foundation !== null && piles(strip, at, foundation),
    el('path', { d: columns.join(''), 'stroke-width': pens.thin, 'stroke-dasharray': '4.6 2.8' }),
  );
}

/** Deck face with its edges, joints between units and the long dash-dot of its centre line. */
function deckPiece(site: Site, option: AppraisedOption, strip: Strip, ink: FormInk): Piece {
  const half = site.deck.widthM / 2;
  const faces = option.units.map((unit) => {
    const left = unit.supportsM[0]!;
    const right = unit.supportsM.at(-1)!;
    return el('path', {
      d: body(strip, (left + right) / 2, right - left, 2 * half),
      fill: ink.face(unit.form),
      'fill-opacity': 0.82,
      stroke: ink.line(unit.form),
      'stroke-width': pens.medium,
    });
  });
  return g({}, faces);
}

/** Names of what is crossed, the widest first; one that would touch another is left out. */
function zoneNames(zones: readonly Zone[], xOf: (zone: Zone) => number, ppm: number, y: number): Piece[] {
  const wide = ({ fromM, toM }: Zone): number => (toM - fromM) * ppm;
  const taken: { readonly from: number; readonly to: number }[] = [];
  return [...zones]
    .sort((a, b) => wide(b) - wide(a))
    .flatMap((zone) => {
      const half = textWidth(zone.name, letters.drawing) / 2;
      const x = xOf(zone);
      if (2 * half >= wide(zone) + 60) return [];
      if (taken.some(({ from, to }) => x - half < to + 6 && x + half > from - 6)) return [];
      taken.push({ from: x - half, to: x + half });
      return [label(x, y, zone.name, { anchor: 'middle', italic: true, halo: true })];
    });
}

/**
 * Plan of the strip on the chainage of the elevation, to the same scale in both directions: what is crossed, deck,
 * piers, footings and piles. A curved road is drawn straightened along its centre line.
 */
export function plan(input: PlanInput): Piece {
  const { site, option, widthPx } = input;
  const prefix = input.prefix ?? 'plan';
  const scale = input.scale ?? scaleOnSheet(site, widthPx);
  const frame = frameOf(scale, chainagesShown(site, widthPx, scale), 0, { levelM: 0, y: 0 });
  const ppm = frame.pxPerM;
  const footings = option?.supports.map((support) => likeliest(support)?.footing.widthM ?? 0) ?? [];
  const halfM = Math.max(site.deck.widthM, ...footings) / 2 + BESIDE_M;
  const top = 20;
  const centre = top + halfM * ppm;
  const bottom = centre + halfM * ppm;
  const lean = Math.tan(((site.skewDeg ?? 0) * Math.PI) / 180);
  const y = (acrossM: number): number => centre - acrossM * ppm;
  const strip: Strip = {
    ppm,
    x: frame.x,
    y,
    halfM,
    cosSkew: Math.cos(Math.atan(lean)),
    skewed: (chainageM, acrossM) => [frame.x(chainageM + acrossM * lean), y(acrossM)],
  };
  const ink = formInk(input.paper ?? 'colour', option?.units.map((unit) => unit.form) ?? [], prefix);
  const clip = `${prefix}-strip`;
  const radius = site.planRadiusM;
  const curved = radius !== null && Number.isFinite(radius);
  const words = [
    ...(site.skewDeg === null
      ? ['skew not known']
      : site.skewDeg === 0
        ? []
        : [`${fixed(site.skewDeg, 0)}° off square`]),
    ...(curved ? [`R ${fixed(radius, 0)} m, straightened along the centre line`] : []),
    ...(radius === null ? ['plan radius not known'] : []),
  ].join('; ');
  const withBar = input.bar === true;
  const shown = site.zones.filter((zone) => zone.toM > frame.fromM && zone.fromM < frame.toM);
  return sheet(
    widthPx,
    bottom + (withBar ? 50 : 8),
    `Plan of the crossing${option === null ? '' : ` with ${optionWords(option)}`}, 1 to ${String(scale)}`,
    [
      el(
        'defs',
        {},
        ink.defs,
        el('clipPath', { id: clip }, el('rect', { x: 0, y: top, width: widthPx, height: bottom - top })),
      ),
      g(
        { 'clip-path': `url(#${clip})`, fill: 'none', stroke: colours.ink },
        shown
          .filter(({ hard }) => hard)
          .map((zone) =>
            el('path', {
              d: body(strip, (zone.fromM + zone.toM) / 2, zone.toM - zone.fromM, 2 * halfM),
              fill: colours.wash,
              stroke: 'none',
            }),
          ),
        shown.map((zone) => zonePiece(strip, zone)),
        option !== null && deckPiece(site, option, strip, ink),
        option?.supports.map((support) => supportPiece(strip, support)),
        el('path', {
          d: `M0,${num(centre)}H${num(widthPx)}`,
          'stroke-width': pens.fine,
          'stroke-dasharray': '14 2.8 2 2.8',
        }),
      ),
      zoneNames(shown, (zone) => frame.x((zone.fromM + zone.toM) / 2 - halfM * lean * 0.9), ppm, bottom - 5),
      option === null
        ? null
        : label(frame.x(site.startM) + 6, y(site.deck.widthM / 2) - 5, `${length(site.deck.widthM)} m`, {
            halo: true,
            figure: 'site/deck/widthM',
          }),
      words !== '' && label(0, 11, words, { fill: colours.second }),
      withBar &&
        scaleBar(scale, Math.max(frame.x(site.startM), 8), bottom + 26, {
          rightPx: widthPx,
          widthPx: Math.min(400, widthPx * 0.7),
          heights: false,
        }),
    ],
  );
}
