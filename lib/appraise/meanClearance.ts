import type { Site } from '../model/index.ts';
import { constructionDepth, groundAt, roadLevelAt } from '../site/index.ts';
import { profileOrNearest } from './profileOrNearest.ts';

/** Depth of an ordinary deck, m: the road is laid over it before anything is sized. */
export const ORDINARY_DEPTH_M = 2;
/** Heights are told apart to this, m, so that a metre of ground does not size every trial anew. */
const CLASS_M = 2;
/** Places along the crossing at which the height is read. */
const PLACES = 40;

/** Mean height from ground or bed to the soffit of an ordinary deck along a crossing, m: what falsework and towers stand in. */
export function meanClearance(site: Site): number {
  const depthM = constructionDepth(site.deck, ORDINARY_DEPTH_M);
  const road = profileOrNearest(site, depthM);
  let sum = 0;
  for (let i = 0; i < PLACES; i += 1) {
    const x = site.startM + ((i + 0.5) * site.lengthM) / PLACES;
    sum += Math.max(0, roadLevelAt(road, x) - depthM - groundAt(site, x));
  }
  return Math.round(sum / PLACES / CLASS_M) * CLASS_M;
}
