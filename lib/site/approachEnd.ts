import type { Approach, RoadPiece, Site } from '../model/index.ts';
import { approachFill } from './approachFill.ts';
import { fixedApproach, movingApproach, type ApproachLine, type ApproachRules } from './approachLine.ts';
import { groundAt } from './lookups.ts';
import { roadEndsOf } from './standBetween.ts';

export type RoadEnd = 'start' | 'end';

/** One end of the road of a site, looking outward from the end of the crossing: from its abutment, unless that stands farther in. */
export interface ApproachEnd {
  readonly end: RoadEnd;
  readonly rules: ApproachRules;
  /** Distances at which the ground bends, m, rising. */
  readonly breaksM: readonly number[];
  /** Where its tie-in stays, m behind the abutment; null where it moves. */
  readonly tieInM: number | null;
  /** How far an approach may reach, m. */
  readonly reachM: number;
  /** The approach of the road as proposed, straight between its levels. */
  readonly proposed: Approach;
}

/** Whether an end of the road is tied to something that cannot move. */
export const isFixed = ({ road }: Pick<Site, 'road'>, end: RoadEnd): boolean =>
  road.fixedEnd === end || road.fixedEnd === 'both';

function layOut(site: Site, end: RoadEnd): ApproachEnd {
  const { road, roadCurves, groundX, groundZ } = site;
  const at = roadEndsOf(site)[`${end}M`];
  const side = end === 'start' ? -1 : 1;
  const beyond = groundX.map((x) => side * (x - at)).filter((out) => out > 0);
  const breaksM = side < 0 ? beyond.reverse() : beyond;
  const ground = (out: number): number => groundAt(site, at + side * out);
  const rules: ApproachRules = {
    gradient: road.maxGradient,
    ...roadCurves,
    groundAt: ground,
    lowestGroundM: Math.min(ground(0), ...breaksM.map(ground), groundZ[side < 0 ? 0 : groundZ.length - 1]!),
  };
  const proposedLine = movingApproach(road[`${end}LevelM`], outwardFall(end, proposedGradient(site)), rules);
  const length = road[`${end}ApproachM`];
  const stays = road[`${end}TieIn`] === 'fixed' && !isFixed(site, end);
  const tieInM = stays ? (length === 'unknown' ? proposedLine.lengthM : length) : null;
  const bare = {
    end,
    rules,
    breaksM,
    tieInM,
    reachM: !stays && length !== 'unknown' ? length : Infinity,
  };
  const line = approachFrom(bare, road[`${end}LevelM`], outwardFall(end, proposedGradient(site)));
  return { ...bare, proposed: measured(site, bare, line) };
}

/** Gradient of the road as proposed, straight between its levels. */
export function proposedGradient(site: Site): number {
  const { startM, endM } = roadEndsOf(site);
  return (site.road.endLevelM - site.road.startLevelM) / (endM - startM);
}

/** Fall outward at an abutment for a gradient along the chainage there. */
export const outwardFall = (end: RoadEnd, gradient: number): number =>
  end === 'start' ? gradient : -gradient;

const known = new WeakMap<Site, Readonly<Record<RoadEnd, ApproachEnd>>>();

/** Both ends of a site, worked out once. */
export function approachEnds(site: Site): Readonly<Record<RoadEnd, ApproachEnd>> {
  let ends = known.get(site);
  if (!ends) known.set(site, (ends = { start: layOut(site, 'start'), end: layOut(site, 'end') }));
  return ends;
}

/** The approach of a free end from the level and the outward fall at its abutment. */
export function approachFrom(
  { rules, tieInM, reachM }: Pick<ApproachEnd, 'rules' | 'tieInM' | 'reachM'>,
  levelM: number,
  fall: number,
): ApproachLine {
  if (tieInM !== null) return fixedApproach(levelM, fall, tieInM, rules);
  const line = movingApproach(levelM, fall, rules);
  return { ...line, fits: line.lengthM <= reachM + 1e-6 };
}

/** Fill and walls of an approach. */
export function measured(
  { deck, road }: Site,
  {
    rules,
    breaksM,
  }: { readonly rules: Pick<ApproachRules, 'groundAt'>; readonly breaksM: readonly number[] },
  { stretches }: Pick<ApproachLine, 'stretches'>,
): Approach {
  return approachFill(stretches, rules.groundAt, breaksM, {
    widthM: deck.widthM,
    sideSlope: road.fillSideSlope,
    sides: road.approachSides,
  });
}

/** An approach as pieces of the road, in order of chainage. */
export function approachPieces(
  site: Site,
  end: RoadEnd,
  { stretches }: Pick<ApproachLine, 'stretches'>,
): RoadPiece[] {
  const at = roadEndsOf(site)[`${end}M`];
  let innerM = 0;
  const pieces = stretches.map(({ lengthM, levelM, fall, bend1PerM }): RoadPiece => {
    const from = innerM;
    innerM += lengthM;
    const curvature1PerM = -bend1PerM || 0;
    if (end === 'end')
      return { fromM: at + from, toM: at + innerM, levelM, gradient: -fall || 0, curvature1PerM };
    return {
      fromM: at - innerM,
      toM: at - from,
      levelM: levelM - fall * lengthM - (bend1PerM * lengthM * lengthM) / 2,
      gradient: fall + bend1PerM * lengthM,
      curvature1PerM,
    };
  });
  return end === 'end' ? pieces : pieces.reverse();
}
