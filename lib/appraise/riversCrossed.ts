import type { RiverCrossed, Site, WorkedOption } from '../model/index.ts';
import { riversAt } from '../river/index.ts';
import { headroomSpare } from '../site/index.ts';
import { depthAlong } from './workOption.ts';

/** Least height of the soffit of an option over the still flood of a water, m; null where its level is not known. */
function overFlood(site: Site, option: WorkedOption, water: number): number | null {
  const { river, name, fromM, toM, floodLevelM } = site.waters[water]!;
  if (floodLevelM === null) return null;
  const limit = {
    fromM: river?.floodFromM ?? fromM,
    toM: river?.floodToM ?? toM,
    levelM: floodLevelM,
    reason: name,
    kind: 'flood' as const,
  };
  const alone = { ...site, soffitLimits: [limit] };
  return headroomSpare(alone, option.profile, depthAlong(site, option.units, option.designs))?.spareM ?? null;
}

/** Every water whose flood reaches the crossing, as a worked option narrows it and passes over it. */
export function riversCrossed(site: Site, option: WorkedOption): RiverCrossed[] {
  return riversAt(site, option.supports).map((check) => {
    const over = overFlood(site, option, check.water);
    return {
      ...check,
      freeboardM: over === null || check.affluxM === null ? null : over - check.affluxM,
      freeboardNeededM: site.waters[check.water]!.river?.freeboardM ?? 0,
    };
  });
}
