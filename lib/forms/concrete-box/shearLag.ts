import { polygonProperties } from '../../mechanics/index.ts';
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

/** Part of a wing that works in bending, m: 0.2 b + 0.1 l0, at most 0.2 l0 and b (EN 1992-1-1 5.3.2.1, from memory). */
export function effectiveWingM(wingM: number, zerosM: number): number {
  return Math.min(wingM, 0.2 * wingM + 0.1 * zerosM, 0.2 * zerosM);
}

/** Whether the wings reach far beyond the webs because something carries them. */
function isWide({ struts, ribs }: BoxLayout): boolean {
  return struts !== undefined || ribs !== undefined;
}

/** Width of the deck that works in bending, m; all of it where the wings are plain. */
export function workingWidthM(layout: BoxLayout, zerosM: number): number {
  const { cells, spacingM, overhangM, struts } = layout;
  const wingM = overhangM + (struts?.outM ?? 0);
  return cells * spacingM + 2 * (isWide(layout) ? effectiveWingM(wingM, zerosM) : wingM);
}

/**
 * Shear lag of wings on struts or ribs, which reach far beyond their webs: bending finds the section without what does not work of
 * them, tendons press on all of it. Plain wings are short and count in full.
 */
export function lagOf(layout: BoxLayout, section: BoxSection, zerosM: number): Lag {
  const halfM = workingWidthM(layout, zerosM) / 2;
  const { outer } = section.outline;
  // The outline begins at an edge of the deck.
  if (!isWide(layout) || halfM > -outer[0]![0] - 1e-9) return { top: 1, low: 1 };
  const idle = polygonProperties(beyond(outer, halfM));
  const { areaM2, topM, inertiaM4 } = section;
  // Both edges, about the top of the slab.
  const leftM2 = areaM2 - 2 * idle.areaM2;
  const axisM = (areaM2 * topM + 2 * idle.areaM2 * idle.centroidM) / leftM2;
  const leftM4 =
    inertiaM4 +
    areaM2 * topM ** 2 -
    2 * (idle.inertiaM4 + idle.areaM2 * idle.centroidM ** 2) -
    leftM2 * axisM ** 2;
  return {
    top: axisM / leftM4 / (topM / inertiaM4),
    low: (section.depthM - axisM) / leftM4 / (section.lowM / inertiaM4),
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
