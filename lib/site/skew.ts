import type { Site } from '../model/index.ts';

/**
 * Cosine of a skew, degrees from square, either way: a length along the supports is its width square to the road over it.
 * 1 where the skew is not known (null): it is taken as square.
 */
export const cosineOfSkew = (skewDeg: number | null): number => Math.cos(((skewDeg ?? 0) * Math.PI) / 180);

/**
 * Length of a line of supports under the whole width of the deck, m: deck width / cos of the skew. Walls, crossheads and
 * joints are as long; spans are measured along the road, so they are skew spans already.
 */
export const alongSupportsM = ({
  deck,
  skewDeg,
}: Pick<Site, 'skewDeg'> & { readonly deck: Pick<Site['deck'], 'widthM'> }): number =>
  deck.widthM / cosineOfSkew(skewDeg);

/** Skew at which a study says what one would add while nobody knows it, degrees: between what is ignored and what is avoided (common practice, no source). */
export const TRIAL_SKEW_DEG = 30;
