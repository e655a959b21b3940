import type { Site, Zone } from '../model/index.ts';
import { flowAt, scourAt, type FlowAt } from '../river/index.ts';
import { groundAt, softZonesAt, waterDepthAt } from '../site/index.ts';
import { substructureData } from './data.ts';
import { seismicLoad, type SeismicLoad } from './seismicLoad.ts';

/** What a support meets at one chainage. Levels and depths in metres. */
export interface Setting {
  readonly groundLevelM: number;
  /** Depth of water at ordinary level; 0 on land. */
  readonly waterDepthM: number;
  /** Ordinary water level where it can reach an excavation: in the water and on the flood plain; null elsewhere. */
  readonly waterLevelM: number | null;
  /** Depth of the flood over the ground; 0 where none reaches. */
  readonly floodDepthM: number;
  /** The design flood here where its flow is known; null elsewhere. */
  readonly flow: FlowAt | null;
  /** Nearest traffic that could strike a support here, with the force at its height, kN and m; null where none is near. */
  readonly impact: { readonly forceKN: number; readonly heightM: number } | null;
  /** Largest vessel that could strike a support here, its force, kN, at the ordinary water level; null where none can. */
  readonly vesselKN: number | null;
  /** Spectral and ground acceleration to design for, shares of gravity; null where none is known. */
  readonly seismic: SeismicLoad | null;
  /** Stretches here in which supports had better not stand. */
  readonly soft: readonly Zone[];
}

/**
 * Reads the site at one chainage.
 * A flood reaches every place where a flood clearance applies and the ground lies below the flood level, and the
 * water itself. Impact is the largest force of the roads and railways within reach (EN 1991-1-7, see the data file).
 */
export function settingAt(site: Site, chainageM: number): Setting {
  const groundLevelM = groundAt(site, chainageM);
  const waterDepthM = Math.max(0, waterDepthAt(site, chainageM));
  const onPlain = site.soffitLimits.some((limit) => limit.kind === 'flood' && covers(limit, chainageM));
  let waterLevelM: number | null = waterDepthM > 0 ? groundLevelM + waterDepthM : null;
  let floodDepthM = waterDepthM;
  for (const water of site.waters) {
    const here = covers(water, chainageM);
    if (!here && !onPlain) continue;
    if (waterLevelM === null) waterLevelM = water.levelM;
    if (water.floodLevelM !== null) floodDepthM = Math.max(floodDepthM, water.floodLevelM - groundLevelM);
  }
  return {
    groundLevelM,
    waterDepthM,
    waterLevelM,
    floodDepthM,
    flow: flowAt(site, chainageM),
    impact: impactNear(site, chainageM),
    vesselKN: vesselAt(site, chainageM),
    seismic: seismicLoad(site),
    soft: softZonesAt(site, chainageM),
  };
}

function impactNear(site: Site, chainageM: number): Setting['impact'] {
  let worst: Setting['impact'] = null;
  for (const zone of site.zones) {
    if (zone.kind !== 'road' && zone.kind !== 'railway') continue;
    const { reachM, forceKN, heightM } = substructureData.impact[zone.kind];
    if (chainageM < zone.fromM - reachM || chainageM > zone.toM + reachM) continue;
    if (worst === null || forceKN > worst.forceKN) worst = { forceKN, heightM };
  }
  return worst;
}

/** Force of the largest vessel of the waters a support stands in, kN: 120 V sqrt(DWT), m/s and t; null where none passes. */
export function vesselAt(site: Site, chainageM: number): number | null {
  const { factor, presetSpeedMs } = substructureData.vessel;
  const forces = site.waters.flatMap((water) => {
    const { vesselDwtT = null, vesselSpeedMs = null } = water.river ?? {};
    const wet = covers(water, chainageM) && groundAt(site, chainageM) < water.levelM;
    if (!wet || vesselDwtT === null || !(vesselDwtT > 0)) return [];
    return [factor * (vesselSpeedMs ?? presetSpeedMs) * Math.sqrt(vesselDwtT)];
  });
  return forces.length > 0 ? Math.max(...forces) : null;
}

const covers = (stretch: { fromM: number; toM: number }, x: number): boolean =>
  x >= stretch.fromM && x <= stretch.toM;

/**
 * Depth of scour below the bed or ground, m, at a pier of a thickness across the flow, m, or at a wall (thickness 0).
 * Where the flow of the flood is known by HEC-18 and Lacey (`lib/river`); else preset general scour plus the hole at a pier,
 * 1.5 b tanh(y / b) for flood depth y and thickness b (Breusers, Nicollet and Shen 1977, from memory). 0 where no flood reaches.
 */
export function scourDepth(setting: Setting, thicknessM: number): number {
  if (!(setting.floodDepthM > 0)) return 0;
  const { generalRiverM, generalPlainM, localFactor } = substructureData.scour;
  const general = setting.waterDepthM > 0 ? generalRiverM : generalPlainM;
  if (setting.flow !== null) return scourAt(setting.flow, thicknessM, general);
  const local = thicknessM > 0 ? localFactor * thicknessM * Math.tanh(setting.floodDepthM / thicknessM) : 0;
  return general + local;
}
