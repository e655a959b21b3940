import type { UnitTask } from '../../model/index.ts';
import { skewWords } from './skewWords.ts';
import { cosineOfSkew } from '../../site/skew.ts';

/*
 * Two main planes on skew supports. Cross-girders run along the supports, so that the points they join lie equally far from
 * the bearings of either plane: the planes bend alike and share the lanes as on a square deck. What grows is what runs
 * across: cross-girders, end frames or portals, bracing.
 */

/** Length of a cross-girder along the supports, m: distance of the planes / cos of the skew. */
export const alongSkewM = (planesM: number, skewDeg = 0): number => planesM / cosineOfSkew(skewDeg);

/** How far the bearings of one plane stand ahead of those of the other, m: distance of the planes x tan of the skew. */
export const aheadM = (planesM: number, skewDeg = 0): number =>
  planesM * Math.tan((Math.abs(skewDeg) * Math.PI) / 180);

/**
 * What the engineer has to know of two planes on skew supports: how their floor runs, what square cross-girders would meet
 * instead, and what is left out. Nothing on square supports.
 * @param deflectionM of midspan under traffic, m; a plane bends like a half sine over its span
 */
export function skewPlanesWarnings(
  { skewDeg = 0, spansM }: Pick<UnitTask, 'skewDeg' | 'spansM'>,
  planesM: number,
  deflectionM: number,
): string[] {
  if (skewDeg === 0) return [];
  const ahead = aheadM(planesM, skewDeg);
  const spanM = Math.max(...spansM);
  // Half a sine over the span, its rise over the offset: at most the whole deflection.
  const apartM = deflectionM * Math.sin(Math.PI * Math.min(ahead / spanM, 0.5));
  return [
    `${skewWords(skewDeg)}: cross-girders run along the supports, ${alongSkewM(planesM, skewDeg).toFixed(1)} m long; one plane stands ${ahead.toFixed(1)} m ahead of the other. Cross-girders square to the road would join points that part by ${(1000 * apartM).toFixed(0)} mm under traffic near the supports. What the floor carries to the obtuse corners by its own stiffness is left out: analyse it as a grillage.`,
  ];
}
