import type { Site, WaterBody } from '../model.ts';
import { groundLevel } from './alongOption.ts';
import type { Frame } from './frame.ts';
import { colours, pens } from './ink.ts';
import type { Piece } from './piece.ts';
import { el, g, num, pathOf } from './piece.ts';

/** Repeatable irregularity between 0 and 1, so that hand-like hatching is the same on every sheet. */
const jitter = (index: number): number => ((Math.imul(index + 1, 2654435761) >>> 8) & 0xffff) / 0x10000;

type XY = readonly [number, number];

/** Ground line of the site inside a frame, px: every surveyed point, with the ends cut at the frame. */
export function groundPoints(site: Site, frame: Frame): XY[] {
  const first = site.groundX[0] ?? 0;
  const last = site.groundX[site.groundX.length - 1] ?? 0;
  const from = Math.max(frame.fromM, first);
  const to = Math.min(frame.toM, last);
  const inner = site.groundX.filter((x) => x > from && x < to);
  return [from, ...inner, to].map((x) => [frame.x(x), frame.y(groundLevel(site, x))] as const);
}

/** Straight-line reading of a pixel line at x, or NaN outside it. */
function lineAt(points: readonly XY[], x: number): number {
  for (let i = 1; i < points.length; i += 1) {
    const [x0, y0] = points[i - 1] ?? [0, 0];
    const [x1, y1] = points[i] ?? [0, 0];
    if (x >= x0 && x <= x1) return x1 > x0 ? y0 + ((y1 - y0) * (x - x0)) / (x1 - x0) : y0;
  }
  return NaN;
}

/** Groups of three strokes at 45° under the ground line, about 15 px apart. */
function groundHatch(points: readonly XY[], apart: number, stroke: number): string {
  const first = points[0]?.[0] ?? 0;
  const last = points[points.length - 1]?.[0] ?? 0;
  let d = '';
  let index = 0;
  for (let x = first + 6; x < last - 2; x += apart * (0.85 + 0.3 * jitter(index)), index += 1) {
    for (let k = 0; k < 3; k += 1) {
      const at = x + k * 3.1;
      const y = lineAt(points, at);
      if (!Number.isFinite(y)) continue;
      const long = stroke * (0.8 + 0.45 * jitter(index * 3 + k));
      d += `M${num(at)},${num(y + 1)}l${num(-long)},${num(long)}`;
    }
  }
  return d;
}

/** Cut ground: heavy line with hatching below; dashed level beyond the surveyed stretch. */
export function ground(
  site: Site,
  frame: Frame,
  style: { readonly pen?: number; readonly hatch?: boolean } = {},
): Piece {
  const points = groundPoints(site, frame);
  const pen = style.pen ?? pens.thick;
  return g(
    { class: 'ground', fill: 'none', stroke: colours.ink },
    style.hatch !== false &&
      el('path', { d: groundHatch(points, 15, 6), stroke: colours.third, 'stroke-width': pens.fine }),
    el('path', {
      'data-part': 'ground',
      d: pathOf(points),
      'stroke-width': pen,
      'stroke-linejoin': 'round',
    }),
  );
}

/** Stretches of a water body where its bed lies below a level: [from, to] chainages, m. */
function wetStretches(site: Site, levelM: number, fromM: number, toM: number): [number, number][] {
  const xs = [fromM, ...site.groundX.filter((x) => x > fromM && x < toM), toM];
  const out: [number, number][] = [];
  let open: number | null = groundLevel(site, fromM) < levelM ? fromM : null;
  for (let i = 1; i < xs.length; i += 1) {
    const a = xs[i - 1] ?? 0;
    const b = xs[i] ?? 0;
    const za = groundLevel(site, a);
    const zb = groundLevel(site, b);
    if (za < levelM === zb < levelM) continue;
    const at = a + ((b - a) * (levelM - za)) / (zb - za);
    if (zb < levelM) open = at;
    else if (open !== null) {
      out.push([open, at]);
      open = null;
    }
  }
  if (open !== null) out.push([open, toM]);
  return out.filter(([a, b]) => b - a > 0.2);
}

/** Surface, and three rows of broken lines that shorten with depth. No blue. */
function waterBody(site: Site, frame: Frame, water: WaterBody): Piece {
  const wet = wetStretches(
    site,
    water.levelM,
    Math.max(water.fromM, frame.fromM),
    Math.min(water.toM, frame.toM),
  );
  let surface = '';
  let strokes = '';
  wet.forEach(([from, to], stretch) => {
    const y = frame.y(water.levelM);
    surface += `M${num(frame.x(from))},${num(y)}H${num(frame.x(to))}`;
    for (let row = 1; row <= 3; row += 1) {
      const below = y + row * 3.8;
      const level = water.levelM - (row * 3.8) / frame.pxPerM;
      for (const [a, b] of wetStretches(site, level, from, to)) {
        let index = row * 7 + stretch * 31;
        for (let x = frame.x(a) + 5 + 16 * jitter(index); x < frame.x(b) - 6; index += 1) {
          const long = 10 + 14 * jitter(index);
          strokes += `M${num(x)},${num(below)}H${num(Math.min(x + long, frame.x(b) - 3))}`;
          x += long + 7 + 12 * jitter(index + 50);
        }
      }
    }
  });
  return g(
    { fill: 'none', stroke: colours.ink },
    el('path', { 'data-part': 'water', d: surface, 'stroke-width': pens.thin }),
    el('path', { d: strokes, 'stroke-width': pens.fine, stroke: colours.second }),
  );
}

/** All waters of a site. */
export const waters = (site: Site, frame: Frame): Piece =>
  g(
    { class: 'water' },
    site.waters.map((water) => waterBody(site, frame, water)),
  );

/** Stretches over which a design flood stands, m: where the ground lies below it near its river. */
export function floodStretches(
  site: Site,
  frame: Frame,
): {
  readonly levelM: number;
  readonly fromM: number;
  readonly toM: number;
  /** Index of its water. */
  readonly water: number;
}[] {
  return site.waters.flatMap((water, index) => {
    const levelM = water.floodLevelM;
    if (levelM === null) return [];
    return wetStretches(
      site,
      levelM,
      Math.max(frame.fromM, site.groundX[0] ?? 0),
      Math.min(frame.toM, site.groundX[site.groundX.length - 1] ?? 0),
    )
      .filter(([from, to]) => to > water.fromM && from < water.toM)
      .map(([fromM, toM]) => ({ levelM, fromM, toM, water: index }));
  });
}

/** Flood level, dashed. */
export const flood = (site: Site, frame: Frame): Piece =>
  el('path', {
    class: 'flood',
    d: floodStretches(site, frame)
      .map(({ levelM, fromM, toM }) => `M${num(frame.x(fromM))},${num(frame.y(levelM))}H${num(frame.x(toM))}`)
      .join(''),
    fill: 'none',
    stroke: colours.second,
    'stroke-width': pens.fine,
    'stroke-dasharray': '4.6 2.8',
  });

/** Track or carriageway where an obstacle of that kind crosses: sleepers and rails end-on, or a short surface line. */
export function crossedWays(site: Site, frame: Frame): Piece {
  return g(
    { class: 'ways', fill: 'none', stroke: colours.ink },
    site.zones
      .filter((zone) => zone.kind === 'railway' || zone.kind === 'road')
      .map((zone) => {
        const middle = (zone.fromM + zone.toM) / 2;
        const x = frame.x(middle);
        const y = frame.y(groundLevel(site, middle));
        if (zone.kind === 'railway') {
          const reach = Math.min(2.2, (zone.toM - zone.fromM) / 2) * frame.pxPerM;
          return el('path', {
            d: `M${num(x - reach)},${num(y - 1.4)}H${num(x + reach)}M${num(x - reach / 2)},${num(y - 1.4)}v-1.8M${num(x + reach / 2)},${num(y - 1.4)}v-1.8`,
            'stroke-width': pens.heavy,
          });
        }
        const reach = Math.min(5, (zone.toM - zone.fromM) / 2) * frame.pxPerM;
        return el('path', {
          d: `M${num(x - reach)},${num(y - 1.2)}H${num(x + reach)}`,
          'stroke-width': pens.heavy,
        });
      }),
  );
}
