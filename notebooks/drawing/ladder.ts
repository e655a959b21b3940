import { chainage, level } from '../format.ts';
import { formInk } from '../forms/formInk.ts';
import type { AppraisedOption, Obstacle, Site } from '../model.ts';
import { depthAt, leastLimit, leastSoffit, lowestSoffit, placedUnits, roadLevel } from './alongOption.ts';
import type { Asked } from './asked.ts';
import { overOf } from './asked.ts';
import { uprightDimension } from './dimension.ts';
import type { Paper } from './ink.ts';
import { colours, letters, pens } from './ink.ts';
import { label } from './label.ts';
import { textWidth } from './lettering.ts';
import { levelMark } from './levelMark.ts';
import type { Piece } from './piece.ts';
import { el, g, num } from './piece.ts';
import { pxPerMetre } from './scale.ts';
import { scaleBar } from './scaleBar.ts';
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
function tightestOver(site: Site, option: AppraisedOption, obstacle: Obstacle): number {
  const fromM = obstacle.clearance?.fromM ?? obstacle.fromM;
  const toM = obstacle.clearance?.toM ?? obstacle.toM;
  let best = (fromM + toM) / 2;
  for (let step = 0; step <= 20; step += 1) {
    const at = fromM + ((toM - fromM) * step) / 20;
    if (lowestSoffit(site, option, at) < lowestSoffit(site, option, best) - 1e-6) best = at;
  }
  return best;
}

/** One step of the ladder: a dimension at its left with its words. */
interface Rung {
  readonly top: number;
  readonly bottom: number;
  readonly words: string;
  readonly colour: string;
  readonly figure?: Asked;
}

/** Dimensions one below the other; words of thin steps move down until they clear those above. */
function rungPieces(rungs: readonly Rung[], x: number): Piece[] {
  let lastBase = -Infinity;
  return rungs.map(({ top, bottom, words, colour, figure }) => {
    const base = Math.max((top + bottom) / 2 + 4, lastBase + 13);
    lastBase = base;
    return g(
      {},
      uprightDimension(x, top, bottom, '', { side: 'left', colour }),
      label(x - 6, base, words, { anchor: 'end', fill: colour, halo: true, figure }),
    );
  });
}

/** Levels and heights of the ladder, m, and their places, px (y...). */
interface Levels {
  readonly road: number;
  readonly soffit: number;
  readonly least: number;
  readonly depth: number;
  readonly surfacing: number;
  readonly spare: number;
  readonly fall: number;
  readonly yRoad: number;
  readonly ySlab: number;
  readonly yUnder: number;
  readonly ySoffit: number;
  readonly yLeast: number;
  readonly yDatum: number;
}

function ladderLevels(site: Site, option: AppraisedOption, at: number, top: number): Levels {
  const ppm = pxPerMetre(100);
  const road = roadLevel(option, at);
  const soffit = lowestSoffit(site, option, at);
  const least = leastSoffit(site, at);
  const depth = depthAt(option, at);
  const surfacing = site.deck.surfacingM;
  const ySlab = top + surfacing * ppm;
  const yUnder = ySlab + depth * ppm;
  const ySoffit = top + (road - soffit) * ppm;
  const yLeast = Number.isFinite(least) ? ySoffit + (soffit - least) * ppm : ySoffit;
  return {
    road,
    soffit,
    least,
    depth,
    surfacing,
    spare: soffit - least,
    fall: road - surfacing - depth - soffit,
    yRoad: top,
    ySlab,
    yUnder,
    ySoffit,
    yLeast,
    yDatum: Math.max(yLeast, ySoffit) + 96,
  };
}

/** Outline of the envelope down to its datum, broken once because its height is not drawn in full. */
function brokenEnvelope(
  left: number,
  right: number,
  yLeast: number,
  yDatum: number,
  chamfer: number,
): string {
  const b = yDatum - 40;
  const n = num;
  return (
    `M${n(left)},${n(yDatum)}V${n(b + 6)}l-4,-2l8,-4l-4,-2V${n(yLeast + chamfer)}L${n(left + chamfer * 0.7)},${n(yLeast)}` +
    `H${n(right - chamfer * 0.7)}L${n(right)},${n(yLeast + chamfer)}V${n(b - 2)}l4,2l-8,4l4,2V${n(yDatum)}`
  );
}

/**
 * Everything between an obstacle and the road as a ladder at 1:100, where least is left: road, surfacing, structure, fall
 * of the carriageway to its edge, spare, envelope (broken) and the level it is measured from.
 */
export function ladder(input: LadderInput): Piece {
  const { site, option, obstacle } = input;
  const at = tightestOver(site, option, obstacle);
  const unit = placedUnits(option).find(({ fromM, toM }) => at >= fromM - 1e-6 && at <= toM + 1e-6);
  const form = unit?.unit.form ?? option.form;
  const ink = formInk(input.paper ?? 'colour', [form], input.prefix ?? 'ladder');
  const v = ladderLevels(site, option, at, 26);
  const datum = obstacle.clearance?.datumLevelM ?? NaN;
  const rail = obstacle.kind === 'railway';
  const tooLow = v.spare < -0.005;
  const spareWords = tooLow ? `${level(-v.spare)} too low` : `${level(v.spare)} spare`;
  const rungs: Rung[] = [
    {
      top: v.yRoad,
      bottom: v.ySlab,
      words: `${level(v.surfacing)} surfacing`,
      colour: colours.ink,
      figure: 'site/deck/surfacingM',
    },
    {
      top: v.ySlab,
      bottom: v.yUnder,
      words: `${level(v.depth)} structure`,
      colour: colours.ink,
      figure: overOf(option, at, 'structureM'),
    },
    ...(v.fall > 0.005
      ? [
          {
            top: v.yUnder,
            bottom: v.ySoffit,
            words: `${level(v.fall)} crossfall`,
            colour: colours.ink,
            figure: overOf(option, at, 'fallM'),
          },
        ]
      : []),
    ...(Number.isFinite(v.spare)
      ? [
          {
            top: Math.min(v.ySoffit, v.yLeast),
            bottom: Math.max(v.ySoffit, v.yLeast),
            words: spareWords,
            colour: tooLow ? ink.accent : colours.ink,
            figure: overOf(option, at, 'spareM'),
          },
        ]
      : []),
    ...(Number.isFinite(datum)
      ? [{ top: v.yLeast, bottom: v.yDatum, words: level(v.least - datum), colour: ink.accent }]
      : []),
  ];
  const wide = Math.max(...rungs.map(({ words }) => textWidth(words, letters.drawing)));
  const left = Math.max(96, Math.ceil(wide) + 24);
  const right = left + 112;
  const middle = (left + right) / 2;
  const markX = right + 30;
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
  const datumWords = rail ? 'rail' : obstacle.kind === 'river' ? 'water' : obstacle.kind;
  return sheet(
    380,
    v.yDatum + 66,
    `Levels over ${obstacle.name} at chainage ${chainage(at)}: road ${level(v.road)}, lowest soffit ${level(v.soffit)}, lowest allowed ${level(v.least)}`,
    [
      ink.defs.length > 0 && el('defs', {}, ink.defs),
      el('path', {
        d: [v.yRoad, v.ySoffit, v.yLeast, v.yDatum]
          .map((y) => `M${num(right + 4)},${num(y)}H${num(markX + 8)}`)
          .join(''),
        stroke: colours.rule,
        'stroke-width': pens.fine,
      }),
      face(v.ySlab, v.yUnder, ink.face(form), ink.line(form)),
      face(v.yRoad, v.ySlab, colours.ink, 'none'),
      // The soffit falls with the carriageway: lowest at the edge.
      el('path', {
        d: `M${num(middle)},${num(v.yUnder)}L${num(right)},${num(v.ySoffit)}V${num(v.yUnder)}Z`,
        fill: ink.face(form),
        stroke: ink.line(form),
        'stroke-width': pens.thin,
      }),
      el('path', {
        d: `M${num(left)},${num(v.yUnder)}H${num(middle)}L${num(right)},${num(v.ySoffit)}`,
        fill: 'none',
        stroke: ink.line(form),
        'stroke-width': pens.heavy,
      }),
      el('path', {
        d: brokenEnvelope(left, right, v.yLeast, v.yDatum, rail ? 18 : 0),
        fill: 'none',
        stroke: ink.accent,
        'stroke-width': pens.thick,
      }),
      rail &&
        el('path', {
          d: `M${num(middle - 26)},${num(v.yDatum + 7)}h52M${num(middle - 15)},${num(v.yDatum)}v5M${num(middle + 15)},${num(v.yDatum)}v5`,
          stroke: colours.ink,
          'stroke-width': pens.heavy,
          fill: 'none',
        }),
      rungPieces(rungs, left - 18),
      levelMark(markX, v.yRoad, `${level(v.road)} road`, { asked: overOf(option, at, 'roadM') }),
      levelMark(markX, v.ySoffit, `${level(v.soffit)} lowest soffit`, {
        asked: overOf(option, at, 'soffitM'),
      }),
      Number.isFinite(v.least) &&
        label(markX + 12, Math.max(v.yLeast + 4, v.ySoffit + 12), `${level(v.least)} lowest allowed`, {
          fill: ink.accent,
          halo: true,
          figure: leastLimit(site, at),
        }),
      Number.isFinite(datum) && levelMark(markX, v.yDatum, `${level(datum)} ${datumWords}`),
      scaleBar(100, left, v.yDatum + 42, {
        what: 'broken at the envelope,',
        heights: false,
        widthPx: 200,
        rightPx: 380,
      }),
    ],
  );
}
