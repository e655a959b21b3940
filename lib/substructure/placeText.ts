import type { Site } from '../model/index.ts';
import { slopeRoom } from './frontSlope.ts';
import { groundUnder } from './groundUnder.ts';
import { settingAt } from './setting.ts';

/**
 * Everything of a site that a support at one chainage is sized by, as text: two places with the same text give the same
 * support for the same loads and levels, whatever else has changed on the site.
 */
export function placeText(site: Site, chainageM: number): string {
  return JSON.stringify([
    settingAt(site, chainageM),
    groundUnder(site, chainageM),
    site.deck,
    site.road.fillSideSlope,
    site.skewDeg,
    // Only an abutment has a slope before it.
    chainageM === site.startM || chainageM === site.endM ? slopeRoom(site, chainageM) : null,
  ]);
}
