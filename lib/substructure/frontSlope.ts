import type { Site } from '../model/index.ts';
import { alongSupportsM, cosineOfSkew } from '../site/index.ts';
import { substructureData } from './data.ts';

/**
 * How far the fill spills before a spill-through abutment along the road, m: berm and side slope from the foot of its beam to
 * the ground, both square to the line of supports.
 */
export function slopeReach(site: Site, beamFootM: number, groundLevelM: number): number {
  const squareM =
    substructureData.abutment.bermM + site.road.fillSideSlope * Math.max(0, beamFootM - groundLevelM);
  return squareM / cosineOfSkew(site.skewDeg);
}

/**
 * How far fill may spill before an abutment, m: to the nearest stretch barred to supports, clearance, water or flood. The
 * slope goes into the crossing, from the start upwards, from the end downwards.
 */
export function slopeRoom(site: Site, chainageM: number): number {
  const atStart = Math.abs(chainageM - site.startM) <= Math.abs(chainageM - site.endM);
  const away = ({ fromM, toM }: { readonly fromM: number; readonly toM: number }): number => {
    if (atStart) return toM <= chainageM ? Infinity : Math.max(0, fromM - chainageM);
    return fromM >= chainageM ? Infinity : Math.max(0, chainageM - toM);
  };
  return Math.min(site.lengthM, ...[...site.zones, ...site.soffitLimits, ...site.waters].map(away));
}

/**
 * Fill before a spill-through abutment, m3: prism under the slope as wide as the deck is along the supports, and a piece of a
 * cone at each side, a quarter where they are square; on a skew what one side gains the other loses.
 */
export function frontFill(site: Site, beamFootM: number, groundLevelM: number): number {
  const h = Math.max(0, beamFootM - groundLevelM);
  const { fillSideSlope: s } = site.road;
  return (
    alongSupportsM(site) * (substructureData.abutment.bermM * h + (s * h * h) / 2) +
    (Math.PI * s * s * h ** 3) / 6
  );
}
