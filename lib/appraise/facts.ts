import type {
  AppraisedOption,
  Facts,
  MethodId,
  Option,
  RoadProfile,
  Site,
  Study,
  Unit,
  WorkedOption,
} from '../model/index.ts';
import { cannotCarry, formModule } from '../forms/index.ts';
import {
  cosineOfSkew,
  TRIAL_SKEW_DEG,
  roadLevelAt,
  constructionDepth,
  groundAt,
  waterDepthAt,
} from '../site/index.ts';
import { quantitiesOf } from '../takeoff/index.ts';
import { PIER_HALF_WIDTH_M } from './requestFor.ts';
import { curveFacts } from './curveFacts.ts';
import { ORDINARY_DEPTH_M } from './meanClearance.ts';
import { crossedFacts, methodFacts } from './methodFacts.ts';
import { profileOrNearest } from './profileOrNearest.ts';
import { regradingFacts } from './regradingFacts.ts';
import { riverFacts } from './riverFacts.ts';
import { supportFacts } from './supportFacts.ts';
import { spansOf } from './askedTask.ts';
import { mainUnit } from './workOption.ts';

type Known = Record<string, Facts[string]>;

/** Places closer than this are the same, m. */
const SAME_M = 1e-5;

/** What is known of a form before anything is arranged: the span it must reach, the deck, the line of the road. */
export function formFacts(site: Site): Facts {
  return {
    // Both piers stand clear of the barred stretch.
    mainSpanM: site.mainOpening ? site.mainOpening.widthM + 2 * PIER_HALF_WIDTH_M : 'unknown',
    deckWidthM: site.deck.widthM,
    planRadiusM: site.planRadiusM ?? 'unknown',
    skewDeg: site.skewDeg === null ? 'unknown' : Math.abs(site.skewDeg),
  };
}

/** The smaller end span over the span beside it; with two spans the shorter over the longer. */
function endSpanRatio(spans: readonly number[]): number {
  if (spans.length === 2) return Math.min(...spans) / Math.max(...spans);
  return Math.min(spans[0]! / spans[1]!, spans.at(-1)! / spans.at(-2)!);
}

/** Side spans of a hung unit over its main span: from each outer pylon to the end of the unit. */
function sideSpanRatio(unit: Unit, pylons: readonly number[]): number {
  const x = unit.supportsM;
  const main = Math.max(...spansOf(unit));
  const before = x[pylons[0]!]! - x[0]!;
  const after = x.at(-1)! - x[pylons.at(-1)!]!;
  if (pylons.length > 1) return Math.min(before, after) / main;
  return Math.min(before, after) / Math.max(before, after);
}

/** What an ordinary skew would add to a line of supports, m, where nobody knows it and something is crossed; else 0. */
const openSkewM = ({ skewDeg, zones, waters, deck: { widthM } }: Site): number =>
  skewDeg === null && zones.length + waters.length > 0 ? widthM / cosineOfSkew(TRIAL_SKEW_DEG) - widthM : 0;

/** Whether falsework of the main unit would stand over a railway or in water. */
function falseworkOver(site: Site, main: Unit): Known {
  const from = main.supportsM[0]!;
  const to = main.supportsM.at(-1)!;
  const crosses = (stretch: { fromM: number; toM: number }): boolean =>
    stretch.fromM < to && stretch.toM > from;
  return {
    falseworkOverRailway: site.zones.some((zone) => zone.kind === 'railway' && crosses(zone)),
    falseworkOverWater: site.waters.some(crosses),
  };
}

/** The road over an arrangement and how deep its deck is at midspan, m. */
interface Over {
  readonly profile: RoadProfile;
  readonly depthM: number;
}

/** Before anything is sized: the road that clears what is crossed with an ordinary deck. */
const ordinaryOver = (site: Site): Over => ({
  profile: profileOrNearest(site, constructionDepth(site.deck, ORDINARY_DEPTH_M)),
  depthM: ORDINARY_DEPTH_M,
});

/** How high the main unit is put together: greatest height to its soffit from the ground, or from what a crane stands on. */
function buildingHeights(site: Site, method: MethodId, main: Unit, { profile, depthM }: Over): Known {
  const [from, to] = [main.supportsM[0]!, main.supportsM.at(-1)!];
  const points = [...site.groundX.filter((x) => x > from && x < to), from, to];
  const above = (floor: (x: number) => number): number =>
    Math.max(...points.map((x) => roadLevelAt(profile, x) - constructionDepth(site.deck, depthM) - floor(x)));
  return {
    falseworkHeightM: method === 'falsework' ? above((x) => groundAt(site, x)) : 0,
    liftHeightM: method === 'crane' ? above((x) => groundAt(site, x) + waterDepthAt(site, x)) : 0,
  };
}

/** Temporary towers may be moved along by so much, m. Common practice, no source. */
const TOWER_MOVES_M = 2;

/** Temporary towers of the main unit that would stand where no support may. */
function towersBarred(site: Site, method: MethodId, main: Unit): number {
  const towers = formModule(main.form).temporaryTowersM?.({ method, spansM: spansOf(main) }) ?? [];
  const isBarred = (x: number): boolean =>
    site.zones.some(({ hard, fromM, toM }) => hard && x > fromM + TOWER_MOVES_M && x < toM - TOWER_MOVES_M);
  return towers.filter((x) => isBarred(main.supportsM[0]! + x)).length;
}

/** Longest stretch of water under the main unit over its length. */
function waterUnderRatio(site: Site, { supportsM }: Unit): number {
  const [from, to] = [supportsM[0]!, supportsM.at(-1)!];
  const wet = site.waters.map(({ fromM, toM }) => Math.min(to, toM) - Math.max(from, fromM));
  return Math.max(0, ...wet) / (to - from);
}

/** What is known of where the supports stand, and of the heights over them: under an ordinary deck unless it is given. */
export function arrangementFacts(
  site: Site,
  option: Pick<Option, 'units' | 'method'>,
  over: Over = ordinaryOver(site),
): Facts {
  const main = mainUnit(option.units);
  const spans = spansOf(main);
  const all = [...new Set(option.units.flatMap((unit) => unit.supportsM))];
  /** Inner supports inside a hard stretch, half a pier counted with them, or with their axis inside a soft one. */
  const standingIn = (isHard: boolean): number => {
    const beside = isHard ? PIER_HALF_WIDTH_M : 0;
    const holds = (zone: Site['zones'][number], x: number): boolean =>
      zone.hard === isHard && x > zone.fromM - beside + SAME_M && x < zone.toM + beside - SAME_M;
    return all.slice(1, -1).filter((x) => site.zones.some((zone) => holds(zone, x))).length;
  };
  const inner = all.slice(1, -1);
  return {
    ...formFacts(site),
    ...curveFacts(site, spans),
    mainSpanM: Math.max(...spans),
    continuity: spans.length > 1 ? 'continuous' : 'simple',
    method: option.method,
    unitLengthM: main.supportsM.at(-1)! - main.supportsM[0]!,
    supportsInRiver: inner.filter((x) => waterDepthAt(site, x) > 0).length,
    supportsBarred: standingIn(true),
    supportsSoft: standingIn(false),
    // A study has one radius for the whole crossing.
    radiusConstant: site.planRadiusM === null ? 'unknown' : true,
    ...crossedFacts(site, option.units, option.method),
    openSkewM: openSkewM(site),
    ...buildingHeights(site, option.method, main, over),
    towersBarred: towersBarred(site, option.method, main),
    waterUnderRatio: waterUnderRatio(site, main),
    ...(option.method === 'falsework' ? falseworkOver(site, main) : {}),
    ...(main.pylons ? { pylons: main.pylons.length, sideSpanRatio: sideSpanRatio(main, main.pylons) } : {}),
    ...(spans.length > 1 && !main.pylons ? { endSpanRatio: endSpanRatio(spans) } : {}),
  };
}

/** Characteristic uplift at the ends of any unit, kN; 0 where all stay pressed. */
function upliftKN(option: WorkedOption): number {
  const ends = option.designs.flatMap(({ reactions }) => [reactions[0]!, reactions.at(-1)!]);
  return Math.max(0, ...ends.map((end) => -(end.permanentKN + Math.min(0, end.trafficMinKN))));
}

/** Highest utilisation of any check; one that stands at its limit to the last digit is at it. */
function highestUse(designs: WorkedOption['designs']): number {
  const failed = cannotCarry(designs);
  return failed?.utilisation ?? Math.min(1, Math.max(...designs.map((d) => d.limitingCheck.utilisation)));
}

/** Everything known of a worked and priced option. `budgetChance` is unknown without a budget. */
export function optionFacts(
  study: Study,
  site: Site,
  option: WorkedOption,
  headroom: AppraisedOption['headroom'],
  budgetChance: number | 'unknown',
): Facts {
  const main = mainUnit(option.units);
  const design = option.designs[option.units.indexOf(main)]!;
  const { figures } = design;
  const { access, obstacles } = study.brief;
  const pieces = option.designs.flatMap(({ heaviestPiece }) => (heaviestPiece ? [heaviestPiece] : []));
  const clearances = obstacles.flatMap(({ clearance }) => (clearance ? [clearance] : []));
  const known: Known = {
    ...arrangementFacts(site, option, { profile: option.profile, depthM: option.depthM.midspan }),
    ...supportFacts(site, option),
    ...riverFacts(site, option),
    ...methodFacts(site, option, study.brief),
    ...regradingFacts(site, option),
    haunched: design.depthM.support !== design.depthM.midspan,
    prestressed: quantitiesOf(design.lines).prestressKg > 0,
    supportDepthM: design.depthM.support,
    midspanDepthM: design.depthM.midspan,
    limitingUtilisation: highestUse(option.designs),
    clearanceConfirmed: clearances.every((clearance) => clearance.confirmed),
    upliftKN: upliftKN(option),
    pieceLengthM: Math.max(0, ...pieces.map((piece) => piece.lengthM)),
    pieceMassT: Math.max(0, ...pieces.map((piece) => piece.massT)),
    haulLengthM: access.haulLengthM,
    haulMassT: access.haulMassT,
    budgetChance,
    roadRiseM: Math.max(option.profile.startRiseM, option.profile.endRiseM),
    roadMayRiseM: site.road.mayRiseM,
    gradient: option.profile.steepestGradient,
    maxGradient: site.road.maxGradient,
  };
  if (headroom) known['headroomSpareM'] = headroom.spareM;
  for (const id of ['trussHeightM', 'edgeGirderM', 'pylonHeightM', 'boxInnerHeightM'] as const) {
    if (figures[id] !== undefined) known[id] = figures[id];
  }
  // One pylon holds a main span from one end: as tall as one of two pylons of a span twice as long.
  if (main.pylons?.length === 1 && figures['pylonHeightM'] !== undefined) {
    known['pylonHeightRatio'] = figures['pylonHeightM'] / (2 * Math.max(...spansOf(main)));
  }
  return known;
}
