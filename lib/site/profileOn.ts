import type { Approach, RoadProfile, Site } from '../model/index.ts';
import {
  approachEnds,
  approachFrom,
  approachPieces,
  isFixed,
  measured,
  outwardFall,
  proposedGradient,
  type RoadEnd,
} from './approachEnd.ts';
import { crestPieces, type Crest } from './crest.ts';
import { innerApproach, proposedApproaches, together } from './innerApproach.ts';
import { pieceGradientAt } from './roadLevelAt.ts';
import { regradingOf } from './regrading.ts';
import { roadEndsOf } from './standBetween.ts';

/** From end to end of the crossing, m. */
export function roadLength(site: Site): number {
  const { startM, endM } = roadEndsOf(site);
  return endM - startM;
}

/** The road on a crest with the approaches that belong to it. */
export function profileOn(site: Site, crest: Crest): RoadProfile {
  const { road } = site;
  const ends = approachEnds(site);
  const level = { start: crest.levelM, end: crest.endLevelM };
  const side = (end: RoadEnd) => {
    const gradient = end === 'start' ? crest.before : crest.after;
    if (isFixed(site, end)) {
      // A road that cannot move stays as it is beyond the crossing but for what leads its gradient back.
      const behind = regradingOf(site, end, gradient);
      const pieces = behind?.pieces ?? [];
      return { pieces, approach: ends[end].proposed, regrading: behind?.regrading };
    }
    const line = approachFrom(ends[end], level[end], outwardFall(end, gradient));
    const pieces = approachPieces(site, end, line);
    return { pieces, approach: measured(site, ends[end], line), regrading: undefined };
  };
  const start = side('start');
  const end = side('end');
  const middle = crestPieces(crest);
  const whole = (which: RoadEnd, { approach }: typeof start): Approach =>
    together(innerApproach(site, which, middle), approach);
  const approaches = { start: whole('start', start), end: whole('end', end) };
  const proposed = proposedApproaches(site);
  return {
    startLevelM: level.start,
    endLevelM: level.end,
    startRiseM: level.start - road.startLevelM,
    endRiseM: level.end - road.endLevelM,
    addedFillM3:
      approaches.start.fillM3 - proposed.start.fillM3 + (approaches.end.fillM3 - proposed.end.fillM3),
    gradient: (level.end - level.start) / roadLength(site),
    steepestGradient: Math.max(
      ...middle.flatMap((piece) => [piece.gradient, pieceGradientAt(piece, piece.toM)].map(Math.abs)),
    ),
    crestRadiusM: Number.isFinite(crest.radiusM) ? crest.radiusM : null,
    pieces: [...start.pieces, ...middle, ...end.pieces],
    approaches,
    ...(start.regrading || end.regrading
      ? {
          regrading: {
            ...(start.regrading && { start: start.regrading }),
            ...(end.regrading && { end: end.regrading }),
          },
        }
      : {}),
  };
}

/** The road as proposed: straight between its levels, whatever stands in its way. */
export function proposedProfile(site: Site): RoadProfile {
  const gradient = proposedGradient(site);
  const { startM, endM } = roadEndsOf(site);
  return profileOn(site, {
    startM,
    endM,
    levelM: site.road.startLevelM,
    endLevelM: site.road.endLevelM,
    fromM: startM,
    toM: endM,
    before: gradient,
    after: gradient,
    radiusM: Infinity,
  });
}
