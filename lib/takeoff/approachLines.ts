import type { MeasuredLine, RoadProfile, Site } from '../model/index.ts';
import { addedFill, groundAt } from '../site/index.ts';

/**
 * Fill of the two approaches, m3: from the ground to the proposed road at each abutment, run out at the limiting gradient
 * over level ground, and what the option's own road line adds to it.
 */
export function approachLines(site: Site, profile: RoadProfile): MeasuredLine[] {
  const { road, deck } = site;
  const ends = [
    { name: 'start', heightM: road.startLevelM - groundAt(site, site.startM) },
    { name: 'end', heightM: road.endLevelM - groundAt(site, site.endM) },
  ];
  const lines: MeasuredLine[] = ends.map(({ name, heightM }) => ({
    part: 'approaches',
    item: 'fill',
    quantity: addedFill(deck.widthM, 0, heightM, road.fillSideSlope, road.maxGradient),
    what: `${name} approach`,
    how: `${Math.max(0, heightM).toFixed(1)} m high at the abutment, sides ${road.fillSideSlope} to 1, run out at ${(100 * road.maxGradient).toFixed(1)} %`,
  }));
  if (profile.addedFillM3 > 0) {
    lines.push({
      part: 'approaches',
      item: 'fill',
      quantity: profile.addedFillM3,
      what: 'raised approaches',
      how: `road ${profile.startRiseM.toFixed(2)} m and ${profile.endRiseM.toFixed(2)} m above its proposed levels`,
    });
  }
  return lines;
}
