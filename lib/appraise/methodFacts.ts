import type { Access, Facts, Site, Unit, WorkedOption } from '../model/index.ts';
import { headroomSpare } from '../site/index.ts';
import { depthAlong, mainUnit } from './workOption.ts';

type Known = Record<string, Facts[string]>;

const crosses =
  (unit: Unit) =>
  (stretch: { readonly fromM: number; readonly toM: number }): boolean =>
    stretch.fromM < unit.supportsM.at(-1)! && stretch.toM > unit.supportsM[0]!;

/** What traffic an arrangement passes over, as far as its method and its possessions go. */
export function crossedFacts(site: Site, units: readonly Unit[], method: string): Known {
  const main = crosses(mainUnit(units));
  return {
    railwayCrossed: site.zones.some(({ kind }) => kind === 'railway'),
    ...(method === 'falsework'
      ? { falseworkOverRoad: site.zones.some((zone) => zone.kind === 'road' && main(zone)) }
      : {}),
  };
}

/** What can be brought to the site, and the headroom over roads and railways under the main unit of a worked option. */
export function methodFacts(site: Site, option: WorkedOption, access: Access): Known {
  const limits = site.soffitLimits.filter(
    (limit) => (limit.kind === 'road' || limit.kind === 'railway') && crosses(mainUnit(option.units))(limit),
  );
  const spare = headroomSpare(
    { ...site, soffitLimits: limits },
    option.profile,
    depthAlong(site, option.units, option.designs),
  );
  return {
    craneOnSite: access.crane,
    bargeOnSite: access.barge,
    ...(spare ? { trafficSpareM: spare.spareM } : {}),
  };
}
