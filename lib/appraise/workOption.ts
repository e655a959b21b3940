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
import { expectedLines, placeText, standOneSupport, standSupports } from '../substructure/index.ts';
import { measure } from '../takeoff/index.ts';
import { depthRange } from './depthRange.ts';
import { remembered } from '../kept.ts';
import { leastCostDepth } from './leastCostDepth.ts';
import type { AtDepth } from './memory.ts';
import type { Work } from './work.ts';
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
  const module = formModule(unit.form);
  const clear = (x: number): number =>
    Math.max(0, roadLevelAt(profile, x) - constructionDepth(site.deck, depthM) - groundAt(site, x));
  return {
    form: unit.form,
    method: unit.role === 'main' ? option.method : module.methods[0],
    spansM: spansOf(unit),
    deck: site.deck,
    standard: site.standard,
    planRadiusM: site.planRadiusM ?? Infinity,
    depthM,
    ...(unit.pylons ? { pylons: unit.pylons } : {}),
    ...(module.ignoresHeight
      ? {}
      : { clearUnderM: unit.supportsM.map((x) => Math.round(clear(x) / CLEAR_CLASS_M) * CLEAR_CLASS_M) }),
  };
}

/**
 * Supports of an option, each taken from memory where one has stood on the same place under the same loads.
 */
function standing(
  bench: Workbench,
  units: readonly Unit[],
  designs: readonly Design[],
  profile: RoadProfile,
) {
  return standSupports(bench.site, units, designs, profile, (site, ask) =>
    remembered(
      bench.kept.supports,
      `${placeText(site, ask.chainageM)} ${JSON.stringify(ask)} ${ask.kind === 'abutment' ? bench.booksKey : ''}`,
      () => standOneSupport(site, ask, bench.costOf),
    ),
  );
}

/** An option at given depths of its units, m: designs, road, supports, quantities and months. */
function workAt(bench: Workbench, option: Option, depthsM: readonly number[]): AtDepth {
  const { site, size } = bench;
  const { units } = option;
  // The road follows the depths, and the designs see the road only through the height under them.
  const guess: DepthAlong = {
    xM: units.flatMap((unit) => [unit.supportsM[0]!, unit.supportsM.at(-1)!]),
    depthM: depthsM.flatMap((d) => [constructionDepth(site.deck, d), constructionDepth(site.deck, d)]),
  };
  const before = profileOrNearest(site, guess);
  const designs = units.map((unit, k) => size(taskOf(bench, option, unit, depthsM[k]!, before)));
  const profile = profileOrNearest(site, depthAlong(site, units, designs));
  const supports = standing(bench, units, designs, profile);
  const programme = planProgramme(site, designs, supports);
  const lines = [...measure(site, designs, supports, profile), ...programme.lines];
  return { designs, profile, supports, lines, months: programme.months };
}

const keyOf = ({ form, method, units }: Option, depthsM: readonly number[]): string =>
  JSON.stringify([form, method, units, depthsM]);

/** The same, from memory where it has been worked out before. */
function atDepths(bench: Workbench, option: Option, depthsM: readonly number[]): AtDepth {
  // Abutments are chosen by cost, so the books are part of what it is made from.
  const key = `${keyOf(option, depthsM)} ${bench.booksKey}`;
  return remembered(bench.keptHere.atDepth, key, () => workAt(bench, option, depthsM));
}

/** The table is read off straight lines and knows one pattern of spans: this much more is still looked at. */
const OVER_DECK_ALONE = 1.15;

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

/** Depths of all units, m, when the main unit has the one given: approaches have theirs of least deck cost. */
function depthsOf(bench: Workbench, option: Option, depthM: number): number[] {
  const table = bench.tables.tableFor(option);
  return option.units.map((unit) =>
    unit.role === 'main' ? depthM : Math.round(table.depthM(unit.form, Math.max(...spansOf(unit))) * 20) / 20,
  );
}

/** Depth of the main unit, m: the shallowest within 1 % of the least cost of the whole crossing at mean rates. */
function* bestDepth(bench: Workbench, option: Option, main: Unit): Work<number> {
  const { site, costOf } = bench;
  return yield* leastCostDepth(
    depthsToTry(bench, option, main),
    (trial) => {
      const { designs, profile, supports, lines } = atDepths(bench, option, depthsOf(bench, option, trial));
      const foundations = supports.flatMap((support) => expectedLines({ ...support, lines: [] }));
      const spare = headroomSpare(site, profile, depthAlong(site, option.units, designs))?.spareM ?? 0;
      const utilisation = Math.max(...designs.map((design) => design.limitingCheck.utilisation));
      return {
        cost: costOf(lines) + costOf(foundations),
        // A depth that fouls a clearance fits no better than one that is too weak.
        utilisation: spare < -1e-6 ? Math.max(utilisation, 1) - spare : utilisation,
      };
    },
    bench.tables.tableFor(option).depthM(main.form, Math.max(...spansOf(main))),
  );
}

/**
 * Works out one option: designs of its units, road profile, supports, take-off and programme. A depth that the option
 * leaves open is the shallowest within 1 % of the least cost of the whole crossing inside the published band. Pauses
 * after each depth tried.
 *
 * @throws RangeError where a form cannot be sized for what it is asked
 */
export function* workOption(bench: Workbench, option: Option): Work<Worked> {
  const main = mainUnit(option.units);
  const depthM = option.depthM ?? (yield* bestDepth(bench, option, main));
  return workOptionAt(bench, option, depthsOf(bench, option, depthM));
}

/** A worked option and the text of what it was worked out from on its site. */
export interface Worked {
  readonly option: WorkedOption;
  readonly key: string;
}

/** One option at depths that are given for each of its units, m; see `workOption`. */
export function workOptionAt(bench: Workbench, option: Option, depthsM: readonly number[]): Worked {
  const { number, form, method, units } = option;
  const found = atDepths(bench, option, depthsM);
  const { depthM } = found.designs[units.indexOf(mainUnit(units))]!;
  return {
    option: { number, form, family: formModule(form).family, method, units, depthM, ...found },
    key: keyOf(option, depthsM),
  };
}

/** Spare headroom of a worked option, where something has to be kept clear under it. */
export function spareOf(site: Site, option: WorkedOption): ReturnType<typeof headroomSpare> {
  return headroomSpare(site, option.profile, depthAlong(site, option.units, option.designs));
}
