import { formModule } from '../forms/index.ts';
import type { Design, Option, RoadProfile, Site, Unit, UnitTask, WorkedOption } from '../model/index.ts';
import { planProgramme } from '../programme/index.ts';
import {
  constructionDepth,
  groundAt,
  headroomSpare,
  profileFor,
  roadLevelAt,
  type DepthAlong,
} from '../site/index.ts';
import { expectedLines, standSupports } from '../substructure/index.ts';
import { measure } from '../takeoff/index.ts';
import { depthRange } from './depthRange.ts';
import { leastCostDepth } from './leastCostDepth.ts';
import type { Workbench } from './workbench.ts';

/** Spans of a unit, m. */
export function spansOf(unit: Unit): number[] {
  return unit.supportsM.slice(1).map((x, i) => x - unit.supportsM[i]!);
}

/** The unit a form was chosen for; a crossing of one unit has only that. */
export function mainUnit(units: readonly Unit[]): Unit {
  return units.find((unit) => unit.role === 'main') ?? units[0]!;
}

/** Construction depth along the crossing of designs that stand one after another. */
export function depthAlong(site: Site, units: readonly Unit[], designs: readonly Design[]): DepthAlong {
  const xM: number[] = [];
  const depthM: number[] = [];
  designs.forEach((design, k) => {
    design.depthAlong.xM.forEach((x, i) => {
      xM.push(units[k]!.supportsM[0]! + x);
      depthM.push(constructionDepth(site.deck, design.depthAlong.depthM[i]!));
    });
  });
  return { xM, depthM };
}

/** The lowest road line that clears everything, or where there is none the line that misses it by least. */
function profileOrNearest(site: Site, depth: DepthAlong | number): RoadProfile {
  const found = profileFor(site, depth);
  if (found.ok) return found.profile;
  const { kind, missedBy } = found.refusal;
  const eased: Site =
    kind === 'clearance'
      ? {
          ...site,
          soffitLimits: site.soffitLimits.map((l) => ({ ...l, levelM: l.levelM - missedBy - 1e-3 })),
        }
      : { ...site, road: { ...site.road, maxGradient: site.road.maxGradient + missedBy + 1e-6 } };
  const again = profileFor(eased, depth);
  if (!again.ok) throw new RangeError('road profile: expected a line once the limits are eased, found none');
  return again.profile;
}

/** Heights under the deck, m, are told apart to this: a unit is not sized anew for a centimetre of ground. */
const CLEAR_CLASS_M = 0.25;

function taskOf(
  bench: Workbench,
  option: Option,
  unit: Unit,
  depthM: number,
  profile: RoadProfile,
): UnitTask {
  const { site } = bench;
  const clear = (x: number): number =>
    Math.max(0, roadLevelAt(site, profile, x) - constructionDepth(site.deck, depthM) - groundAt(site, x));
  return {
    form: unit.form,
    method: unit.role === 'main' ? option.method : formModule(unit.form).methods[0],
    spansM: spansOf(unit),
    deck: site.deck,
    standard: site.standard,
    planRadiusM: site.planRadiusM ?? Infinity,
    depthM,
    ...(unit.pylons ? { pylons: unit.pylons } : {}),
    clearUnderM: unit.supportsM.map((x) => Math.round(clear(x) / CLEAR_CLASS_M) * CLEAR_CLASS_M),
  };
}

/** One option at one depth of its main unit: designs, road, supports, quantities, months, and its cost at mean rates. */
interface AtDepth {
  readonly designs: readonly Design[];
  readonly profile: RoadProfile;
  readonly supports: WorkedOption['supports'];
  readonly lines: WorkedOption['lines'];
  readonly months: WorkedOption['months'];
  readonly cost: number;
}

function workAt(bench: Workbench, option: Option, depthM: number): AtDepth {
  const { site, size, costOf } = bench;
  const table = bench.tables.tableFor(option);
  const depthOf = (unit: Unit): number =>
    unit.role === 'main' ? depthM : Math.round(table.depthM(unit.form, Math.max(...spansOf(unit))) * 20) / 20;
  // The road follows the depths, and the designs see the road only through the height under them.
  const guess: DepthAlong = {
    xM: option.units.flatMap((unit) => [unit.supportsM[0]!, unit.supportsM.at(-1)!]),
    depthM: option.units.flatMap((unit) =>
      [depthOf(unit), depthOf(unit)].map((d) => constructionDepth(site.deck, d)),
    ),
  };
  const before = profileOrNearest(site, guess);
  const designs = option.units.map((unit) => size(taskOf(bench, option, unit, depthOf(unit), before)));
  const profile = profileOrNearest(site, depthAlong(site, option.units, designs));
  const supports = standSupports(site, option.units, designs, profile);
  const programme = planProgramme(site, designs, supports);
  const lines = [...measure(site, designs, supports, profile), ...programme.lines];
  const foundations = supports.flatMap((support) => expectedLines({ ...support, lines: [] }));
  return {
    designs,
    profile,
    supports,
    lines,
    months: programme.months,
    cost: costOf(lines) + costOf(foundations),
  };
}

/** Depths tried before the two beside the best. */
const TRIALS = 4;

/**
 * Depths worth trying, m: from the least of the published band to somewhat over that of least deck cost. Clearance, road
 * and supports only ever ask for less depth than the deck alone.
 */
function depthsToTry(bench: Workbench, option: Option, main: Unit): readonly [least: number, most: number] {
  const spans = spansOf(main);
  const [least, most] = depthRange(main.form, option.method, spans, bench.site.deck);
  const deckAlone = bench.tables.tableFor(option).depthM(main.form, Math.max(...spans));
  return [least, Math.max(least, Math.min(most, OVER_DECK_ALONE * deckAlone))];
}

/** The table is read off straight lines and knows one pattern of spans: this much more is still looked at. */
const OVER_DECK_ALONE = 1.15;

/**
 * Works out one option: designs of its units, road profile, supports, take-off and programme. A depth that the option
 * leaves open is the shallowest within 1 % of the least cost of the whole crossing inside the published band.
 *
 * @throws RangeError where a form cannot be sized for what it is asked
 */
export function workOption(bench: Workbench, option: Option): WorkedOption {
  const { site } = bench;
  const main = mainUnit(option.units);
  const known = new Map<number, AtDepth>();
  const at = (depthM: number): AtDepth => {
    const found = known.get(depthM) ?? workAt(bench, option, depthM);
    known.set(depthM, found);
    return found;
  };
  const depthM =
    option.depthM ??
    leastCostDepth(
      depthsToTry(bench, option, main),
      (trial) => {
        const { cost, designs, profile } = at(trial);
        const spare = headroomSpare(site, profile, depthAlong(site, option.units, designs))?.spareM ?? 0;
        const utilisation = Math.max(...designs.map((design) => design.limitingCheck.utilisation));
        // A depth that fouls a clearance fits no better than one that is too weak.
        return { cost, utilisation: spare < -1e-6 ? Math.max(utilisation, 1) - spare : utilisation };
      },
      TRIALS,
    );
  const { designs, profile, supports, lines, months } = at(depthM);
  const design = designs[option.units.indexOf(main)]!;
  return {
    number: option.number,
    form: option.form,
    family: formModule(option.form).family,
    method: option.method,
    units: option.units,
    designs,
    depthM: design.depthM,
    profile,
    supports,
    lines,
    months,
  };
}

/** Spare headroom of a worked option, where something has to be kept clear under it. */
export function spareOf(site: Site, option: WorkedOption): ReturnType<typeof headroomSpare> {
  return headroomSpare(site, option.profile, depthAlong(site, option.units, option.designs));
}
