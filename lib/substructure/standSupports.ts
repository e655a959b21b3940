import type { Design, RoadProfile, Site, Support, Unit } from '../model/index.ts';
import { constructionDepth } from '../site/constructionDepth.ts';
import { groundAt, roadLevelAt, waterDepthAt } from '../site/index.ts';
import type { Hold } from './articulate.ts';
import { articulate } from './articulate.ts';
import { substructureData } from './data.ts';
import { depthOver } from './depthOver.ts';
import { integralEnds } from './integralEnds.ts';
import { pylonFoot } from './pylonFoot.ts';

import { standOneSupport } from './standOneSupport.ts';
import type { SupportAsk } from './supportAsk.ts';
import { upliftKN } from './supportLines.ts';

/** One unit as it meets one support. */
interface Meeting {
  readonly design: Design;
  readonly at: number;
  readonly hold: Hold;
}

/**
 * Stands every support of an option, in the order of chainage: where two units meet their reactions add up and a joint
 * takes the movements of both. `designs` has one design per unit, in order. `stand` is the one way a support is sized;
 * a caller that remembers supports puts its memory before it.
 * Throws a RangeError when units and designs do not belong together.
 */
export function standSupports(
  site: Site,
  units: readonly Unit[],
  designs: readonly Design[],
  profile: RoadProfile,
  stand: (site: Site, ask: SupportAsk) => Support = standOneSupport,
): Support[] {
  if (units.length === 0 || units.length !== designs.length) {
    throw new RangeError(
      `designs: expected one for each of ${units.length} units, received ${designs.length}`,
    );
  }
  const castIn = integralEnds(site, units, designs);
  const meetings = new Map<number, Meeting[]>();
  units.forEach((unit, k) => {
    const design = designs[k]!;
    const x = unit.supportsM;
    if (design.reactions.length !== x.length) {
      throw new RangeError(
        `unit ${k + 1}: expected a reaction at each of ${x.length} supports, received ${design.reactions.length}`,
      );
    }
    const height = x.map((c) => roadLevelAt(profile, c) - groundAt(site, c));
    const water = x.map((c) => waterDepthAt(site, c));
    const on = { site, unit, design, heightM: height, waterDepthM: water };
    articulate(on, castIn).forEach((hold, at) => {
      const list = meetings.get(x[at]!) ?? [];
      list.push({ design, at, hold });
      meetings.set(x[at]!, list);
    });
  });
  const chainages = [...meetings.keys()].sort((a, b) => a - b);
  return chainages.map((chainageM, index) => {
    const end = index === 0 || index === chainages.length - 1;
    const ask = askAt(site, profile, chainageM, index, end, meetings.get(chainageM)!);
    return stand(site, end && castIn ? withoutJoint(ask) : ask);
  });
}

/** What an inner pier of a unit that is cantilevered from it takes until its arms are joined: the bare deck, out of balance. */
function builtFrom(
  site: Site,
  meetings: readonly Meeting[],
  permanentKN: number,
): SupportAsk['building'] | null {
  const [only] = meetings;
  if (only === undefined || meetings.length > 1) return null;
  const { task, figures } = only.design;
  const momentKNm = figures['unbalancedMomentKNm'] ?? 0;
  if (!(momentKNm > 0)) return null;
  const tributaryM = (task.spansM[only.at - 1]! + task.spansM[only.at]!) / 2;
  return { momentKNm, verticalKN: Math.max(0, permanentKN - site.deck.superimposedKNm * tributaryM) };
}

/** What skew ends press on the bearings of a support: of an end span, which alone is twisted. */
function skewPressOn({ skewPressKN = 0, task }: Design, at: number): number {
  return at <= 1 || at >= task.spansM.length - 1 ? skewPressKN : 0;
}

/** An abutment with the deck cast into it. */
const withoutJoint = (ask: SupportAsk): SupportAsk => ({
  ...ask,
  castIn: true,
  bearings: 0,
  jointMovementMm: 0,
  bearingMovementMm: 0,
});

function askAt(
  site: Site,
  profile: RoadProfile,
  chainageM: number,
  index: number,
  end: boolean,
  meetings: readonly Meeting[],
): SupportAsk {
  const roadLevelM = roadLevelAt(profile, chainageM);
  const deepest = Math.max(...meetings.map(({ design, at }) => depthOver(design, at)));
  const reaction = (key: 'permanentKN' | 'trafficMaxKN' | 'trafficMinKN'): number =>
    meetings.reduce((sum, { design, at }) => sum + design.reactions[at]![key], 0);
  const corners = meetings.flatMap(({ design: { obtuseCorner } }) => obtuseCorner ?? []);
  const skewPressKN = meetings.reduce((sum, { design, at }) => sum + skewPressOn(design, at), 0);
  const carrier = meetings.find(({ design, at }) => design.task.pylons?.includes(at));
  const pylon = carrier ? { pylon: pylonFoot(carrier.design, roadLevelM - groundAt(site, chainageM)) } : {};
  const integral = meetings
    .flatMap(({ design, at }) => design.walls?.filter(({ support }) => support === at) ?? [])
    .at(0);
  const joint = integral === undefined && (end || meetings.length > 1);
  const loads = {
    permanentKN: reaction('permanentKN'),
    trafficKN: reaction('trafficMaxKN'),
    trafficLeastKN: reaction('trafficMinKN'),
  };
  const kind = end ? 'abutment' : carrier ? 'pylon' : upliftKN(loads) > 0 ? 'anchor-pier' : 'pier';
  const word = { abutment: 'abutment', pier: 'pier', pylon: 'pylon', 'anchor-pier': 'anchor pier' }[kind];
  const fixed = meetings.filter(({ hold }) => hold.fixed);
  const frame = end ? undefined : meetings.find(({ hold }) => hold.frame)?.hold.frame;
  const building = end ? null : builtFrom(site, meetings, loads.permanentKN);
  return {
    name: end ? `${index === 0 ? 'start' : 'end'} ${word}` : `${word} ${index}`,
    index,
    kind,
    chainageM,
    roadLevelM,
    soffitLevelM: roadLevelM - constructionDepth(site.deck, deepest),
    ...loads,
    ...(corners.length > 0 ? { obtuseCorner: Math.max(...corners) } : {}),
    ...(skewPressKN > 0 ? { skewPressKN } : {}),
    // Fixed points of two units add; sliding bearings of two units push apart, so the larger counts.
    alongKN: integral
      ? Math.max(...integral.loads.map(({ alongKN, struck }) => (struck ? 0 : Math.abs(alongKN))))
      : fixed.length > 0
        ? fixed.reduce((sum, { hold }) => sum + hold.alongKN, 0)
        : Math.max(...meetings.map(({ hold }) => hold.alongKN)),
    acrossKN: meetings.reduce((sum, { hold }) => sum + hold.acrossKN, 0),
    fixed: integral !== undefined || fixed.length > 0,
    heldAlongKN: meetings.reduce((sum, { hold }) => sum + hold.heldKN, 0),
    bearingMovementMm: integral ? 0 : Math.max(...meetings.map(({ hold }) => hold.movementMm)),
    bearings: integral || frame ? 0 : meetings.length * substructureData.bearings.perLine,
    jointMovementMm: joint ? meetings.reduce((sum, { hold }) => sum + hold.movementMm, 0) : 0,
    ...pylon,
    ...(building ? { building } : {}),
    ...(integral ? { integral } : {}),
    ...(frame ? { frame } : {}),
  };
}
