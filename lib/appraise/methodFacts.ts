import type { Brief, DeckStrip, Design, Facts, Site, Unit, WorkedOption } from '../model/index.ts';
import { headroomSpare } from '../site/index.ts';
import { girderLines } from '../takeoff/index.ts';
import { erectionData } from './erectionData.ts';
import { launchYardNeeded } from './launchYardNeeded.ts';
import { pickRadius } from './pickRadius.ts';
import { spansOf } from './askedTask.ts';
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

/** What the deck is of, as far as a launch goes. */
const launchedOf = ({ task: { form } }: Design): 'steel' | 'concrete' =>
  form === 'concrete-box' ? 'concrete' : 'steel';

/** Load moment of the worst pick, tm, over the share of its chart that a crane is used to. */
export const pickMoment = (massT: number, radiusM: number): number =>
  (massT * radiusM) / erectionData.crane.chartShare;

/** Half a deck that carries lanes between two barriers, m. */
export function halfDeckNeeded(lanes: number): number {
  const { laneM, barrierM } = erectionData.halves;
  return lanes * laneM + 2 * barrierM;
}

/** Ultimate width of a deck less its width now, m. */
export const widening = (deck: readonly DeckStrip[]): number =>
  deck.reduce((sum, { widthM, ultimateWidthM }) => sum + Math.max(0, ultimateWidthM - widthM), 0);

/**
 * Spans whose middle lies farther from all waters, at their ordinary levels, than a crane on a barge reaches, m. Chainages
 * of the supports in order; two units that meet have theirs twice.
 */
export const spansOffWater = (
  waters: readonly { readonly fromM: number; readonly toM: number }[],
  supportsM: readonly number[],
  reachM: number,
): number =>
  supportsM.slice(1).filter((toM, i) => {
    const middleM = (supportsM[i]! + toM) / 2;
    const isOff = waters.every((water) => Math.max(water.fromM - middleM, middleM - water.toM) > reachM);
    return toM > supportsM[i]! && isOff;
  }).length;

/** Plant and place: what the method needs beside the bridge against what the brief says there is. */
function plantFacts(site: Site, { method, units, designs }: WorkedOption, { access }: Brief): Known {
  const main = mainUnit(units);
  const pieces = designs.map(({ heaviestPiece }) => heaviestPiece?.massT ?? 0);
  const radii = units.map((unit) => pickRadius(site, unit));
  const worst = units.reduce(
    (most, _, u) => (pieces[u]! * radii[u]! > pieces[most]! * radii[most]! ? u : most),
    0,
  );
  return {
    unitSpans: spansOf(main).length,
    launchYardM: access.launchYardM,
    launchYardNeededM:
      method === 'launch' ? launchYardNeeded(spansOf(main), launchedOf(designs[units.indexOf(main)]!)) : 0,
    craneMomentKnown: access.craneMomentTm !== 'unknown',
    craneMomentTm: access.craneMomentTm,
    pickRadiusM: radii[worst]!,
    pickMomentTm: pickMoment(pieces[worst]!, radii[worst]!),
  };
}

/** What else the bridge is asked for: traffic beside the works, a gas main, a wider deck one day. */
function demandFacts(site: Site, { units, designs }: WorkedOption, { demands, deck }: Brief): Known {
  const lines = girderLines(designs[units.indexOf(mainUnit(units))]!);
  return {
    lanesKept: demands.lanesKept,
    gasMain: demands.gasMain,
    halfDeckM: site.deck.widthM / 2,
    halfDeckNeededM: halfDeckNeeded(demands.lanesKept),
    wideningM: widening(deck),
    ...(lines === undefined ? {} : { girderLines: lines.count }),
  };
}

/** What can be brought to the site and what stands beside it, and the headroom over roads and railways under the main unit of a worked option. */
export function methodFacts(site: Site, option: WorkedOption, brief: Brief): Known {
  const limits = site.soffitLimits.filter(
    (limit) => (limit.kind === 'road' || limit.kind === 'railway') && crosses(mainUnit(option.units))(limit),
  );
  const spare = headroomSpare(
    { ...site, soffitLimits: limits },
    option.profile,
    depthAlong(site, option.units, option.designs),
  );
  return {
    craneOnSite: brief.access.crane,
    bargeOnSite: brief.access.barge,
    spansOffWater: spansOffWater(
      site.waters,
      option.units.flatMap(({ supportsM }) => supportsM),
      erectionData.crane.afloatReachM,
    ),
    ...plantFacts(site, option, brief),
    ...demandFacts(site, option, brief),
    ...(spare ? { trafficSpareM: spare.spareM } : {}),
  };
}
