import type { Facts, RiverCrossed, Site, WorkedOption } from '../model/index.ts';
import { siltFactor } from '../river/index.ts';
import { riversCrossed } from './riversCrossed.ts';

type Known = Record<string, Facts[string]>;

/** The river of most concern by a measure of it: one that cannot be told comes before all that can. */
function worst(
  rivers: readonly RiverCrossed[],
  excess: (river: RiverCrossed) => number | null,
): RiverCrossed | undefined {
  const by = (river: RiverCrossed): number => excess(river) ?? Infinity;
  return rivers.reduce<RiverCrossed | undefined>(
    (most, river) => (most === undefined || by(river) > by(most) ? river : most),
    undefined,
  );
}

const less = (a: number | null, b: number | null): number | null => (a === null || b === null ? null : a - b);

/** The rivers by which the rules judge: of most afflux over what is allowed, of least freeboard, of narrowest opening. */
export function governingRivers(rivers: readonly RiverCrossed[]): {
  readonly afflux: RiverCrossed | undefined;
  readonly freeboard: RiverCrossed | undefined;
  readonly waterway: RiverCrossed | undefined;
} {
  return {
    afflux: worst(rivers, ({ affluxM, allowedAffluxM }) => less(affluxM, allowedAffluxM)),
    freeboard: worst(rivers, ({ freeboardM, freeboardNeededM }) => less(freeboardNeededM, freeboardM)),
    waterway: worst(rivers, ({ waterwayM, regimeWidthM }) => less(regimeWidthM, waterwayM)),
  };
}

/** What the scour of the supports in a flood was found from, the least that is known of any of its rivers. */
function scourBasis(site: Site, rivers: readonly RiverCrossed[]): string {
  if (rivers.some(({ flowM3s }) => flowM3s === null)) return 'preset depths';
  return rivers.some(({ water }) => siltFactor(site, water) === null) ? 'flow alone' : 'flow and bed';
}

/** What is known of the rivers under a worked option. */
export function riverFacts(site: Site, option: WorkedOption): Known {
  const rivers = riversCrossed(site, option);
  const { afflux, freeboard, waterway } = governingRivers(rivers);
  if (afflux === undefined) return { riversCrossed: 0 };
  return {
    riversCrossed: rivers.length,
    floodLevelsKnown: rivers.every(({ water }) => site.waters[water]!.floodLevelM !== null),
    floodFlowM3s: afflux.flowM3s ?? 'unknown',
    affluxM: afflux.affluxM ?? 'unknown',
    allowedAffluxM: afflux.allowedAffluxM ?? 'unknown',
    freeboardM: freeboard?.freeboardM ?? 'unknown',
    freeboardNeededM: freeboard?.freeboardNeededM ?? 'unknown',
    waterwayM: waterway?.waterwayM ?? 'unknown',
    regimeWidthM: waterway?.regimeWidthM ?? 'unknown',
    flowSpread: Math.max(1, ...rivers.map(({ flowSpread }) => flowSpread ?? 1)),
    scourBasis: scourBasis(site, rivers),
  };
}
