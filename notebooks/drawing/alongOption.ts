import type { AppraisedOption, Design, Site, Unit, WorkedOption } from '../model.ts';
import { constructionDepth, roadLevelAt } from '../model.ts';
import { ofOption } from './asked.ts';

/** Straight-line reading of a table at x; the end values hold outside it. Empty tables give NaN. */
export function readAt(xs: readonly number[], ys: readonly number[], x: number): number {
  const last = xs.length - 1;
  if (last < 0) return NaN;
  if (x <= (xs[0] ?? 0)) return ys[0] ?? NaN;
  for (let i = 1; i <= last; i += 1) {
    const right = xs[i] ?? 0;
    if (x <= right) {
      const left = xs[i - 1] ?? 0;
      const part = right > left ? (x - left) / (right - left) : 1;
      return (ys[i - 1] ?? NaN) * (1 - part) + (ys[i] ?? NaN) * part;
    }
  }
  return ys[last] ?? NaN;
}

/** Level of the ground or bed at a chainage, m. */
export const groundLevel = (site: Site, chainageM: number): number =>
  readAt(site.groundX, site.groundZ, chainageM);

/** Finished road level, m, on the bridge and on its approaches. */
export const roadLevel = (option: WorkedOption, chainageM: number): number =>
  roadLevelAt(option.profile, chainageM);

/** How far a straight stroke may lie beside a curve of the road, px. */
const besideCurvePx = 0.02;

/**
 * Chainages between two others, they excluded, at which a line that follows the road has to bend so that straight strokes
 * stay on its curves: none where it runs straight. In the order of the two.
 */
export function roadBends(option: WorkedOption, fromM: number, toM: number, pxPerM: number): number[] {
  const low = Math.min(fromM, toM);
  const high = Math.max(fromM, toM);
  const out: number[] = [];
  for (const { fromM: start, toM: end, curvature1PerM } of option.profile.pieces) {
    const left = Math.max(low, start);
    const right = Math.min(high, end);
    if (!(right > left)) continue;
    if (start > low && start < high) out.push(start);
    if (curvature1PerM !== 0) {
      const step = Math.sqrt((8 * besideCurvePx) / (Math.abs(curvature1PerM) * pxPerM));
      const parts = Math.ceil((right - left) / step);
      for (let i = 1; i < parts; i += 1) out.push(left + ((right - left) * i) / parts);
    }
    if (end > low && end < high) out.push(end);
  }
  const rising = out.filter((at, index) => index === 0 || at - (out[index - 1] ?? 0) > 1e-6);
  return toM < fromM ? rising.reverse() : rising;
}

/** Highest level of the road between the abutments, m. */
export function roadTop(site: Site, option: WorkedOption): number {
  let top = Math.max(option.profile.startLevelM, option.profile.endLevelM);
  for (const { fromM, toM, gradient, curvature1PerM } of option.profile.pieces) {
    if (toM <= site.startM || fromM >= site.endM || curvature1PerM === 0) continue;
    const turns = fromM - gradient / curvature1PerM;
    if (turns > fromM && turns < toM) top = Math.max(top, roadLevel(option, turns));
  }
  return top;
}

/** Top of the structural slab on the road line, m. */
export const slabLevel = (site: Site, option: WorkedOption, chainageM: number): number =>
  roadLevel(option, chainageM) - site.deck.surfacingM;

/** Units with their designs and the chainage at which their x starts. */
export interface PlacedUnit {
  readonly unit: Unit;
  readonly design: Design;
  readonly fromM: number;
  readonly toM: number;
}

/** Units of an option in order of chainage. A unit without a design is left out. */
export function placedUnits(option: WorkedOption): PlacedUnit[] {
  return option.units.flatMap((unit, index) => {
    const design = option.designs[index];
    const fromM = unit.supportsM[0];
    const toM = unit.supportsM[unit.supportsM.length - 1];
    return design === undefined || fromM === undefined || toM === undefined
      ? []
      : [{ unit, design, fromM, toM }];
  });
}

/** Structural depth at a chainage, m; NaN off the bridge. Where two units meet the deeper one holds. */
export function depthAt(option: WorkedOption, chainageM: number): number {
  let depth = NaN;
  for (const { design, fromM, toM } of placedUnits(option)) {
    if (chainageM < fromM - 1e-6 || chainageM > toM + 1e-6) continue;
    const here = readAt(design.depthAlong.xM, design.depthAlong.depthM, chainageM - fromM);
    if (!(depth >= here)) depth = here;
  }
  return depth;
}

/** Level of the underside as it is drawn on the road line, m; NaN off the bridge. */
export const soffitLevel = (site: Site, option: WorkedOption, chainageM: number): number =>
  slabLevel(site, option, chainageM) - depthAt(option, chainageM);

/** Level of the lowest soffit at a chainage, m, at the edge to which the carriageway falls; NaN off the bridge. */
export const lowestSoffit = (site: Site, option: WorkedOption, chainageM: number): number =>
  roadLevel(option, chainageM) - constructionDepth(site.deck, depthAt(option, chainageM));

/** Highest of the lowest soffits allowed at a chainage, m; NaN where nothing limits it. */
export function leastSoffit(site: Site, chainageM: number): number {
  let least = NaN;
  for (const limit of site.soffitLimits) {
    if (chainageM < limit.fromM || chainageM > limit.toM) continue;
    if (!(least >= limit.levelM)) least = limit.levelM;
  }
  return least;
}

/** Path of the limit behind `leastSoffit`; undefined where nothing limits it. */
export function leastLimit(site: Site, chainageM: number): string | undefined {
  const least = leastSoffit(site, chainageM);
  const index = site.soffitLimits.findIndex(
    ({ fromM, toM, levelM }) => levelM === least && chainageM >= fromM && chainageM <= toM,
  );
  return index < 0 ? undefined : `site/soffitLimits/${String(index)}/levelM`;
}

/** Chainages of all supports in order, each once, m. */
export function supportChainages(option: WorkedOption): number[] {
  const all = option.units.flatMap((unit) => unit.supportsM).sort((a, b) => a - b);
  return all.filter((at, index) => index === 0 || at - (all[index - 1] ?? 0) > 0.05);
}

/** Spans of the whole option, m. */
export function spansOf(option: WorkedOption): number[] {
  const at = supportChainages(option);
  return at.slice(1).map((chainageM, index) => chainageM - (at[index] ?? 0));
}

/** Paths of the spans of `spansOf`, undefined where two units share one. */
export function spanPaths(option: AppraisedOption): (string | undefined)[] {
  const at = supportChainages(option);
  return at.slice(1).map((toM, index) => {
    const fromM = at[index] ?? NaN;
    const near = (a: number | undefined, b: number): boolean => Math.abs((a ?? NaN) - b) <= 0.05;
    for (const [u, { supportsM }] of option.units.entries()) {
      const span = supportsM.findIndex((x, s) => near(x, fromM) && near(supportsM[s + 1], toM));
      if (span >= 0) return ofOption(option, `designs/${String(u)}/task/spansM/${String(span)}`);
    }
    return undefined;
  });
}

/** Names on the bearing bubbles: A, P1, P2 ... B. */
export const supportName = (index: number, count: number): string =>
  index === 0 ? 'A' : index === count - 1 ? 'B' : `P${String(index)}`;

/** Height of the parapet as it is drawn, over the road, m. */
export const PARAPET_M = 1.1;

/** Highest and lowest level of anything an option draws above its foundations, m. */
export function structureTop(site: Site, option: AppraisedOption): number {
  let top = roadTop(site, option) + PARAPET_M;
  for (const { design, fromM } of placedUnits(option)) {
    for (const shape of design.elevation) {
      for (const [x, z] of shape.points) top = Math.max(top, slabLevel(site, option, fromM + x) + z);
    }
  }
  return top;
}
