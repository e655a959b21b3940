import { level } from '../format.ts';
import { formInk } from '../forms/formInk.ts';
import type { AppraisedOption, Obstacle, Site } from '../model.ts';
import { depthAt, leastSoffit, placedUnits, roadLevel, soffitLevel } from './alongOption.ts';
import { uprightDimension } from './dimension.ts';
import type { Paper } from './ink.ts';
import { colours, pens } from './ink.ts';
import { label } from './label.ts';
import { levelMark } from './levelMark.ts';
import type { Piece } from './piece.ts';
import { el, g, num } from './piece.ts';
import { pxPerMetre } from './scale.ts';
import { sheet } from './sheet.ts';

export interface LadderInput {
  readonly site: Site;
  readonly option: AppraisedOption;
  /** The obstacle whose clearance decides. */
  readonly obstacle: Obstacle;
  readonly paper?: Paper;
  readonly prefix?: string;
}

/** Chainage over an obstacle's envelope at which least is left, m; its middle without an envelope. */
export function tightestOver(site: Site, option: AppraisedOption, obstacle: Obstacle): number {
  const fromM = obstacle.clearance?.fromM ?? obstacle.fromM;
  const toM = obstacle.clearance?.toM ?? obstacle.toM;
  let best = (fromM + toM) / 2;
  for (let step = 0; step <= 20; step += 1) {
    const at = fromM + ((toM - fromM) * step) / 20;
    if (soffitLevel(site, option, at) < soffitLevel(site, option, best) - 1e-6) best = at;
  }
  return best;
}

/** Everything between an obstacle and the road as a ladder at 1:100: road, surfacing, structure, spare, envelope (broken), datum. */
export function ladder(input: LadderInput): Piece {
  const { site, option, obstacle } = input;
  const at = tightestOver(site, option, obstacle);
  const unit = placedUnits(option).find(({ fromM, toM }) => at >= fromM - 1e-6 && at <= toM + 1e-6);
  const form = unit?.unit.form ?? option.form;
  const ink = formInk(input.paper ?? 'colour', [form], input.prefix ?? 'ladder');
  const ppm = pxPerMetre(100);
  const left = 96;
  const right = left + 112;
  const top = 26;
  const road = roadLevel(site, option, at);
  const soffit = soffitLevel(site, option, at);
  const least = leastSoffit(site, at);
  const spare = soffit - least;
  const datum = obstacle.clearance?.datumLevelM ?? NaN;
  const depth = depthAt(option, at);
  const surfacing = site.deck.surfacingM;
  const yRoad = top;
  const ySlab = yRoad + surfacing * ppm;
  const ySoffit = ySlab + depth * ppm;
  const yLeast = Number.isFinite(spare) ? ySoffit + spare * ppm : ySoffit;
  const yDatum = yLeast + 96;
  const broken = yLeast + 56;
  const markX = right + 30;
  // Levels that nearly meet are lettered one below the other.
  const apart = Math.max(0, 15 - Math.abs(yLeast - ySoffit));
  const face = (y0: number, y1: number, fill: string, stroke: string): Piece =>
    el('rect', {
      x: left,
      y: y0,
      width: right - left,
      height: Math.max(0, y1 - y0),
      fill,
      stroke,
      'stroke-width': pens.thin,
    });
  const chamfer = obstacle.kind === 'railway' ? 18 : 0;
  return sheet(
    380,
    yDatum + 30,
    `Levels over ${obstacle.name} at chainage ${at.toFixed(0)}: road ${level(road)}, soffit ${level(soffit)}, lowest allowed ${level(least)}`,
    [
      ink.defs.length > 0 && el('defs', {}, ink.defs),
      face(ySlab, ySoffit, ink.face(form), ink.line(form)),
      face(yRoad, ySlab, colours.ink, 'none'),
      el('path', {
        d: `M${num(left)},${num(ySoffit)}H${num(right)}`,
        stroke: ink.line(form),
        'stroke-width': pens.heavy,
      }),
      el('path', {
        d: `M${num(left)},${num(yDatum)}V${num(broken + 6)}l-4,-2l8,-4l-4,-2V${num(yLeast + chamfer)}L${num(left + chamfer * 0.7)},${num(yLeast)}H${num(right - chamfer * 0.7)}L${num(right)},${num(yLeast + chamfer)}V${num(broken - 2)}l4,2l-8,4l4,2V${num(yDatum)}`,
        fill: 'none',
        stroke: ink.accent,
        'stroke-width': pens.thick,
      }),
      obstacle.kind === 'railway' &&
        el('path', {
          d: `M${num((left + right) / 2 - 26)},${num(yDatum + 7)}h52M${num((left + right) / 2 - 15)},${num(yDatum)}v5M${num((left + right) / 2 + 15)},${num(yDatum)}v5`,
          stroke: colours.ink,
          'stroke-width': pens.heavy,
          fill: 'none',
        }),
      uprightDimension(left - 18, yRoad, ySlab, `${level(surfacing)} surfacing`, { side: 'left' }),
      uprightDimension(left - 18, ySlab, ySoffit, `${level(depth)} structure`, { side: 'left' }),
      spare > 0.005 &&
        uprightDimension(left - 18, ySoffit, yLeast, `${level(spare)} spare`, { side: 'left' }),
      Number.isFinite(datum) &&
        uprightDimension(left - 18, yLeast, yDatum, level(least - datum), {
          side: 'left',
          colour: ink.accent,
        }),
      g(
        {},
        el('path', {
          d: [yRoad, ySoffit, yLeast, yDatum]
            .map((y) => `M${num(right + 4)},${num(y)}H${num(markX + 8)}`)
            .join(''),
          stroke: colours.rule,
          'stroke-width': pens.fine,
        }),
        levelMark(markX, yRoad, `${level(road)} road`),
        levelMark(markX, ySoffit, `${level(soffit)} soffit`),
        Number.isFinite(least) &&
          label(markX + 12, yLeast + 12 + apart * 0.2, `${level(least)} lowest allowed`, {
            fill: ink.accent,
            halo: true,
          }),
        Number.isFinite(datum) &&
          levelMark(
            markX,
            yDatum,
            `${level(datum)} ${obstacle.kind === 'railway' ? 'rail' : obstacle.kind === 'river' ? 'water' : 'road below'}`,
          ),
      ),
    ],
  );
}
