import type { Site } from '../model/index.ts';
import { groundAt } from '../site/index.ts';
import { laceyDepth, siltFactorOf } from './lacey.ts';
import { riverFlows } from './riverFlow.ts';

/** The flood at one chainage. */
export interface FlowAt {
  /** Index of the water. */
  readonly water: number;
  /** Depth over the ground, m, and velocity there, m/s. */
  readonly depthM: number;
  readonly velocityMs: number;
  /** Lacey's depth of scour under the flood level for the flow here, m; null where the bed is not known. */
  readonly laceyM: number | null;
}

/** Silt factor of a water: as given, or from its grain; null where neither is known. */
export function siltFactor(site: Site, water: number): number | null {
  const given = site.waters[water]?.river;
  return given?.siltFactor ?? (given?.grainMm == null ? null : siltFactorOf(given.grainMm));
}

/**
 * The design flood at a chainage, null where none reaches or its flow is not known. The whole flow goes through between the
 * abutments and shares itself out as depth^(5/3) across the width (Manning, one slope and roughness); what the piers take of
 * the width goes into the afflux, not in here. Of two floods the faster counts.
 */
export function flowAt(site: Site, chainageM: number): FlowAt | null {
  let fastest: FlowAt | null = null;
  for (const flow of riverFlows(site)) {
    if (flow === null) continue;
    const given = site.waters[flow.water]!.river!;
    const depthM = flow.floodLevelM - groundAt(site, chainageM);
    if (chainageM < given.floodFromM || chainageM > given.floodToM || !(depthM > 0)) continue;
    if (!(flow.bridge.conveyance > 0)) continue;
    const flowM2s = (flow.flowM3s * depthM ** (5 / 3)) / flow.bridge.conveyance;
    const velocityMs = flowM2s / depthM;
    if (fastest !== null && velocityMs <= fastest.velocityMs) continue;
    const silt = siltFactor(site, flow.water);
    fastest = {
      water: flow.water,
      depthM,
      velocityMs,
      laceyM: silt === null ? null : laceyDepth(flowM2s, silt),
    };
  }
  return fastest;
}
