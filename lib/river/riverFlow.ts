import type { Site, WaterBody } from '../model/index.ts';
import { cosineOfSkew } from '../site/index.ts';
import { floodSection, type FloodSection } from './floodSection.ts';

/** The design flood of one water where it meets the crossing, square to its flow. Areas in m2, widths in m. */
export interface RiverFlow {
  /** Index among the waters of the site. */
  readonly water: number;
  readonly floodLevelM: number;
  /** The whole river before the bridge stands. */
  readonly river: FloodSection;
  /** What of it lies between the abutments. */
  readonly bridge: FloodSection;
  /** Flow, m3/s: the greater of the two ways it is known; and its mean velocity in the whole river, m/s. */
  readonly flowM3s: number;
  readonly velocityMs: number;
  /** Flow by its own and by velocity x area, greater over smaller; 1 where only one is known. */
  readonly spread: number;
}

/** Shortens a section along the road to one square to the flow, along which the piers stand. */
function square(section: FloodSection, cosSkew: number): FloodSection {
  return {
    areaM2: section.areaM2 * cosSkew,
    widthM: section.widthM * cosSkew,
    conveyance: section.conveyance * cosSkew,
  };
}

/** Whether the flood of a water reaches between the abutments. */
export function floodsCrossing({ startM, endM }: Site, { river, fromM, toM }: WaterBody): boolean {
  return (river?.floodFromM ?? fromM) < endM && (river?.floodToM ?? toM) > startM;
}

function flowOf(site: Site, body: WaterBody, water: number): RiverFlow | null {
  const { floodLevelM, river: given } = body;
  if (given === undefined || floodLevelM === null || !floodsCrossing(site, body)) return null;
  if (given.flowM3s === null && given.velocityMs === null) return null;
  const cos = cosineOfSkew(site.skewDeg);
  const river = square(floodSection(site, floodLevelM, given.floodFromM, given.floodToM), cos);
  if (!(river.areaM2 > 0)) return null;
  const from = Math.max(given.floodFromM, site.startM);
  const to = Math.min(given.floodToM, site.endM);
  const bridge = square(floodSection(site, floodLevelM, from, to), cos);
  const byVelocity = (given.velocityMs ?? 0) * river.areaM2;
  const ways = [given.flowM3s ?? 0, byVelocity].filter((flow) => flow > 0);
  const flowM3s = Math.max(...ways);
  return {
    water,
    floodLevelM,
    river,
    bridge,
    flowM3s,
    velocityMs: flowM3s / river.areaM2,
    spread: flowM3s / Math.min(...ways),
  };
}

const known = new WeakMap<Site, readonly (RiverFlow | null)[]>();

/**
 * The design flood of every water of a site, null where its level, or both its flow and its velocity, are unknown or it does
 * not reach the crossing. Flow is found from velocity x area under the flood level and the other way round; where both are
 * given the greater counts.
 */
export function riverFlows(site: Site): readonly (RiverFlow | null)[] {
  const found = known.get(site) ?? site.waters.map((body, water) => flowOf(site, body, water));
  known.set(site, found);
  return found;
}
