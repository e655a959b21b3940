import { onGrid, stepsPerM } from './depthGrid.ts';
import { carries, formModule } from '../forms/index.ts';
import type {
  Design,
  MadeOption,
  RoadProfile,
  ShaftUnder,
  Site,
  Unit,
  UnitTask,
  Variant,
  WorkedOption,
} from '../model/index.ts';
import { planProgramme } from '../programme/index.ts';
import {
  constructionDepth,
  easedProfile,
  groundAt,
  headroomSpare,
  roadLevelAt,
  type DepthAlong,
} from '../site/index.ts';
import {
  foundationsCost,
  placeText,
  settingAt,
  shaftsUnder,
  standOneSupport,
  standSupports,
  strikesAt,
} from '../substructure/index.ts';
import { measure } from '../takeoff/index.ts';
import { remembered } from '../kept.ts';
import { askedTask, spansOf } from './askedTask.ts';
import type { DepthTrial } from './leastCostDepth.ts';
import type { AtDepth } from './memory.ts';
import { profileOrNearest } from './profileOrNearest.ts';
import { quakeOn } from './quakeOn.ts';
import type { Workbench } from './workbench.ts';

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

/** Heights under the deck, m, are told apart to this: a unit is not sized anew for a centimetre of ground. */
const CLEAR_CLASS_M = 0.25;

/** Depth over the inner supports of a haunched unit at a depth at midspan, m. */
function haunchOf({ haunchRatio }: Variant = {}, depthM: number): Pick<UnitTask, 'haunch'> {
  if (haunchRatio === undefined) return {};
  return { haunch: { pierDepthM: onGrid(haunchRatio * depthM), law: 'parabolic' } };
}

function taskOf(
  bench: Workbench,
  option: MadeOption,
  unit: Unit,
  depthM: number,
  profile: RoadProfile,
): UnitTask {
  const { site } = bench;
  const module = formModule(unit.form);
  const clear = (x: number): number =>
    Math.max(0, roadLevelAt(profile, x) - constructionDepth(site.deck, depthM) - groundAt(site, x));
  return {
    ...askedTask(site, option, unit),
    depthM,
    ...(unit.role === 'main' ? haunchOf(option.variant, depthM) : {}),
    ...(module.ignoresHeight
      ? {}
      : { clearUnderM: unit.supportsM.map((x) => Math.round(clear(x) / CLEAR_CLASS_M) * CLEAR_CLASS_M) }),
    ...(module.wallsInOne ? strikesOn(site, unit) : {}),
    ...quakeOn(site, module),
  };
}

/** What may strike the walls between the spans of a unit; the fill stands behind those at its ends. */
function strikesOn(site: Site, { supportsM }: Unit): Pick<UnitTask, 'strikes'> {
  const strikes = supportsM.map((x, s) =>
    s === 0 || s === supportsM.length - 1 ? [] : strikesAt(settingAt(site, x)),
  );
  return strikes.some((at) => at.length > 0) ? { strikes } : {};
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

/** Depths that differ by less are one, m. */
const SAME_DEPTH_M = 1e-9;

/** What an option comes to at mean rates and the odds of the ground, money. */
const moneyOf = ({ costOf }: Workbench, { supports, lines }: AtDepth): number =>
  costOf(lines) + supports.reduce((sum, support) => sum + foundationsCost(support, costOf), 0);

/**
 * An option at given depths of its units, m, on the cheapest of its roads: the lowest that clears, and where a fixed end has
 * an existing road behind it of known gradient, the one with a crest as sharp as spares the curve there.
 */
function workAt(bench: Workbench, option: MadeOption, depthsM: readonly number[]): AtDepth {
  const lowest = workOn(bench, option, depthsM);
  return (['start', 'end'] as const)
    .filter((end) => easedProfile(bench.site, lowest.profile, end) !== null)
    .map((end) => workOn(bench, option, depthsM, end))
    .reduce((best, eased) => (moneyOf(bench, eased) < moneyOf(bench, best) ? eased : best), lowest);
}

/** An option at given depths of its units, m: designs, road, supports, quantities and months. */
function workOn(
  bench: Workbench,
  option: MadeOption,
  depthsM: readonly number[],
  easedFor?: RoadProfile['easedFor'],
): AtDepth {
  const { site, size } = bench;
  const roadOver = (depth: DepthAlong): RoadProfile => {
    const lowest = profileOrNearest(site, depth);
    return (easedFor && easedProfile(site, lowest, easedFor)) ?? lowest;
  };
  const { units } = option;
  // The road follows the depths, and the designs see the road only through the height under them.
  const guess: DepthAlong = {
    xM: units.flatMap((unit) => [unit.supportsM[0]!, unit.supportsM.at(-1)!]),
    depthM: depthsM.flatMap((d) => [constructionDepth(site.deck, d), constructionDepth(site.deck, d)]),
  };
  const before = roadOver(guess);
  const tasks = units.map((unit, k) => taskOf(bench, option, unit, depthsM[k]!, before));
  const stood = (designs: readonly Design[]): Pick<AtDepth, 'designs' | 'profile' | 'supports'> => {
    const isAsDeep = designs.every(({ depthAlong: { depthM } }, k) =>
      depthM.every((d) => Math.abs(d - depthsM[k]!) < SAME_DEPTH_M),
    );
    const profile = isAsDeep ? before : roadOver(depthAlong(site, units, designs));
    return { designs, profile, supports: standing(bench, units, designs, profile) };
  };
  const first = stood(tasks.map(size));
  // Shafts that a deck is cast in with hold it where it moves: it is sized once more over those that stand under it.
  const { designs, profile, supports } = first.designs.some(({ castIn }) => castIn)
    ? stood(tasks.map((task, k) => size(overShafts(task, shaftsUnder(units[k]!, first.supports)))))
    : first;
  const programme = planProgramme(site, designs, supports);
  const lines = [...measure(site, designs, supports, profile), ...programme.lines];
  return { designs, profile, supports, lines, months: programme.months };
}

const overShafts = (task: UnitTask, shafts: readonly ShaftUnder[]): UnitTask =>
  shafts.length > 0 ? { ...task, shafts } : task;

const keyOf = ({ form, method, units, variant = {} }: MadeOption, depthsM: readonly number[]): string =>
  JSON.stringify([form, method, units, depthsM, variant]);

/** The same, from memory where it has been worked out before. */
function atDepths(bench: Workbench, option: MadeOption, depthsM: readonly number[]): AtDepth {
  // Abutments are chosen by cost, so the books are part of what it is made from.
  const key = `${keyOf(option, depthsM)} ${bench.booksKey}`;
  return remembered(bench.keptHere.atDepth, key, () => workAt(bench, option, depthsM));
}

/** An approach that does not carry grows by this factor from one trial to the next, to so many times its first depth. */
const APPROACH = { stride: 1.06, most: 1.5 } as const;

/**
 * Depths of all units, m, when the main unit has the one given: approaches have theirs of least deck cost, read off the
 * table by their longest span, and more where their own pattern of spans asks for it.
 */
export function depthsOf(bench: Workbench, option: MadeOption, depthM: number): number[] {
  const { units } = option;
  const table = bench.tables.tableFor(option);
  const first = units.map((unit) =>
    unit.role === 'main' ? depthM : onGrid(table.depthM(unit.form, Math.max(...spansOf(unit)))),
  );
  const usesAt = (depthsM: readonly number[]): number[] =>
    atDepths(bench, option, depthsM).designs.map(({ limitingCheck }) => limitingCheck.utilisation);
  let depthsM = first;
  let uses = usesAt(first);
  for (;;) {
    const deeper = depthsM.map((d, k) => {
      if (units[k]!.role === 'main' || carries(uses[k]!)) return d;
      const next = onGrid(Math.max(APPROACH.stride * d, d + 1 / stepsPerM(d)));
      return next > APPROACH.most * first[k]! ? d : next;
    });
    if (deeper.every((d, k) => d === depthsM[k])) return depthsM;
    const then = usesAt(deeper);
    // What a deeper one does not help is not for want of depth.
    const helped = deeper.map((d, k) => (then[k]! < uses[k]! ? d : depthsM[k]!));
    if (helped.every((d, k) => d === depthsM[k])) return depthsM;
    depthsM = helped;
    uses = usesAt(depthsM);
  }
}

/** What an option made one way comes to at one depth of its main unit, m. */
export function trialAt(bench: Workbench, option: MadeOption, depthM: number): DepthTrial {
  const { site } = bench;
  const found = atDepths(bench, option, depthsOf(bench, option, depthM));
  const { designs, profile } = found;
  const spare = headroomSpare(site, profile, depthAlong(site, option.units, designs))?.spareM ?? 0;
  const utilisation = Math.max(...designs.map((design) => design.limitingCheck.utilisation));
  return {
    cost: moneyOf(bench, found),
    // A depth that fouls a clearance fits no better than one that is too weak.
    utilisation: spare < -1e-6 ? Math.max(utilisation, 1) - spare : utilisation,
  };
}

/** One option at depths that are given for each of its units, m; see `workOption`. */
export function workOptionAt(bench: Workbench, option: MadeOption, depthsM: readonly number[]): WorkedOption {
  const { number, form, method, units, variant = {} } = option;
  const found = atDepths(bench, option, depthsM);
  const { depthM } = found.designs[units.indexOf(mainUnit(units))]!;
  return { number, form, family: formModule(form).family, method, units, depthM, variant, ...found };
}

/** Spare headroom of a worked option, where something has to be kept clear under it. */
export function spareOf(site: Site, option: WorkedOption): ReturnType<typeof headroomSpare> {
  return headroomSpare(site, option.profile, depthAlong(site, option.units, option.designs));
}
