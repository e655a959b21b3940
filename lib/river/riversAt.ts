import type { RiverCheck, Site, Support } from '../model/index.ts';
import { groundAt } from '../site/index.ts';
import { afflux } from './afflux.ts';
import { laceyWidth } from './lacey.ts';
import { floodsCrossing, riverFlows, type RiverFlow } from './riverFlow.ts';

/** A pier as the flood meets it: chainage and thickness along the road, m. */
export type PierInFlood = Pick<Support, 'chainageM' | 'kind' | 'shaft'>;

/** Piers that stand in the flood of a water. */
function piersIn(site: Site, water: number, supports: readonly PierInFlood[]): readonly PierInFlood[] {
  const { river, fromM, toM } = site.waters[water]!;
  return supports.filter(
    ({ chainageM, kind }) =>
      kind !== 'abutment' &&
      chainageM >= (river?.floodFromM ?? fromM) &&
      chainageM <= (river?.floodToM ?? toM),
  );
}

/**
 * What a bridge does to every water whose flood reaches the crossing: the opening it leaves square to the flow after the
 * approaches and the real thicknesses of its piers, the width of that opening beside the regime width, and the afflux.
 * Null where the flow or the flood level is not known.
 */
export function riversAt(site: Site, supports: readonly PierInFlood[]): RiverCheck[] {
  const flows = riverFlows(site);
  return site.waters.flatMap((body, water) => {
    if (!floodsCrossing(site, body)) return [];
    const flow = flows[water] ?? null;
    return [flow === null ? notKnown(site, water) : checked(site, flow, piersIn(site, water, supports))];
  });
}

const allowed = (site: Site, water: number): number | null =>
  site.waters[water]!.river?.allowedAffluxM ?? null;

const notKnown = (site: Site, water: number): RiverCheck => ({
  water,
  flowM3s: null,
  velocityMs: null,
  areaM2: null,
  bridgeAreaM2: null,
  openingM2: null,
  affluxM: null,
  allowedAffluxM: allowed(site, water),
  waterwayM: null,
  regimeWidthM: null,
  flowSpread: null,
});

function checked(site: Site, flow: RiverFlow, piers: readonly PierInFlood[]): RiverCheck {
  const { water, river, bridge, flowM3s, velocityMs, floodLevelM } = flow;
  const inWater = piers
    .map(({ chainageM, shaft }) => ({
      thicknessM: shaft.lengthM,
      depthM: floodLevelM - groundAt(site, chainageM),
    }))
    .filter(({ depthM }) => depthM > 0);
  const pierM2 = inWater.reduce((sum, { thicknessM, depthM }) => sum + thicknessM * depthM, 0);
  const pierM = inWater.reduce((sum, { thicknessM }) => sum + thicknessM, 0);
  const openingM2 = Math.max(0, bridge.areaM2 - pierM2);
  return {
    water,
    flowM3s,
    velocityMs,
    areaM2: river.areaM2,
    bridgeAreaM2: bridge.areaM2,
    openingM2,
    affluxM: afflux(velocityMs, river.areaM2, openingM2),
    allowedAffluxM: allowed(site, water),
    waterwayM: Math.max(0, bridge.widthM - pierM),
    regimeWidthM: laceyWidth(flowM3s),
    flowSpread: flow.spread,
  };
}
