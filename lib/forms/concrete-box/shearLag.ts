import { polygonProperties, type PolygonProperties } from '../../mechanics/index.ts';
import type { BoxLayout } from './boxLayout.ts';
import type { BoxSection } from './boxSection.ts';

/** What shear lag makes of the bending stress at the top and at the soffit, against a section that works in full: 1 or more. */
export interface Lag {
  readonly top: number;
  readonly low: number;
}

/** Lengths between points of no moment, m. */
export interface BetweenZeros {
  readonly inSpanM: number;
  readonly overPierM: number;
}

/**
 * Lengths between points of no moment about the longest span: 0.85 of an end span, 0.7 of an inner one, all of a single
 * one; over its piers 0.15 of both spans, the shorter of the two places (EN 1992-1-1 figure 5.2, from memory). Taken under
 * both standards.
 */
export function betweenZeros(spansM: readonly number[]): BetweenZeros {
  const last = spansM.length - 1;
  if (last === 0) return { inSpanM: spansM[0]!, overPierM: spansM[0]! };
  const longest = spansM.indexOf(Math.max(...spansM));
  const spanM = spansM[longest]!;
  const besides = [spansM[longest - 1], spansM[longest + 1]].filter((m) => m !== undefined);
  return {
    inSpanM: (longest === 0 || longest === last ? 0.85 : 0.7) * spanM,
    overPierM: 0.15 * (spanM + Math.min(...besides)),
  };
}

/** Part of a flange of a width, m, on one side of a web that works in bending, m: 0.2 b + 0.1 l0, at most 0.2 l0 and b (EN 1992-1-1 5.3.2.1, from memory). */
export function effectiveFlangeM(widthM: number, zerosM: number): number {
  return Math.min(widthM, 0.2 * widthM + 0.1 * zerosM, 0.2 * zerosM);
}

/** Middle of a slab between two webs that does not work, m; both of them have half of it. */
const idleBetweenM = (spacingM: number, zerosM: number): number =>
  spacingM - 2 * effectiveFlangeM(spacingM / 2, zerosM);

/** Width of the deck that works in bending, m: of its wings and of the slab of every cell. */
export function workingWidthM(layout: BoxLayout, zerosM: number): number {
  const { cells, spacingM } = layout;
  return 2 * reachM(layout, zerosM) - cells * idleBetweenM(spacingM, zerosM);
}

/** How far from the middle of the deck its wings work, m. */
function reachM({ cells, spacingM, overhangM, struts }: BoxLayout, zerosM: number): number {
  return (cells * spacingM) / 2 + effectiveFlangeM(overhangM + (struts?.outM ?? 0), zerosM);
}

/**
 * Shear lag of the flanges: bending finds the section without what does not work of its wings and of the slabs between its
 * webs, tendons press on all of it.
 */
export function lagOf(layout: BoxLayout, section: BoxSection, zerosM: number): Lag {
  const { areaM2, topM, inertiaM4, depthM, bottomM } = section;
  const { outer, cells, bottomWidthM } = section.outline;
  const wing = beyond(outer, reachM(layout, zerosM));
  const count = cells.length;
  const idle: Part[] = [
    // The outline begins at an edge of the deck.
    ...(wing.length > 2 ? [polygonProperties(wing), polygonProperties(wing)] : []),
    ...(count > 0
      ? [
          slab(count * idleBetweenM(layout.spacingM, zerosM), 0, layout.slab.midM),
          slab(count * idleBetweenM(bottomWidthM / count, zerosM), depthM - bottomM, depthM),
        ]
      : []),
  ].filter((part) => part.areaM2 > 1e-9);
  if (idle.length === 0) return { top: 1, low: 1 };
  const sum = (of: (part: Part) => number): number => idle.reduce((total, part) => total + of(part), 0);
  // About the top of the slab; centroids of parts lie below it, at negative heights.
  const leftM2 = areaM2 - sum((part) => part.areaM2);
  const axisM = (areaM2 * topM + sum((part) => part.areaM2 * part.centroidM)) / leftM2;
  const leftM4 =
    inertiaM4 +
    areaM2 * topM ** 2 -
    sum((part) => part.inertiaM4 + part.areaM2 * part.centroidM ** 2) -
    leftM2 * axisM ** 2;
  return {
    top: axisM / leftM4 / (topM / inertiaM4),
    low: (depthM - axisM) / leftM4 / (section.lowM / inertiaM4),
  };
}

type Part = Pick<PolygonProperties, 'areaM2' | 'centroidM' | 'inertiaM4'>;

/** A strip of slab between two depths below the top, m. */
function slab(widthM: number, fromM: number, toM: number): Part {
  const thickM = toM - fromM;
  return {
    areaM2: widthM * thickM,
    centroidM: -(fromM + toM) / 2,
    inertiaM4: (widthM * thickM ** 3) / 12,
  };
}

type Point = readonly [y: number, z: number];

/** The part of an outline further than `fromM` from the middle on one side (Sutherland and Hodgman clipping). */
function beyond(outline: readonly Point[], fromM: number): Point[] {
  const part: Point[] = [];
  let from = outline.at(-1)!;
  for (const to of outline) {
    const [before, here] = [from[0] - fromM, to[0] - fromM];
    if (before * here < 0) part.push([fromM, from[1] + (before / (before - here)) * (to[1] - from[1])]);
    if (here >= 0) part.push(to);
    from = to;
  }
  return part;
}
