import type { Approach, RoadPiece, Site } from '../model/index.ts';
import { approachEnds, measured, proposedGradient, type RoadEnd } from './approachEnd.ts';
import type { Outward } from './approachLine.ts';
import { groundAt } from './lookups.ts';
import { pieceGradientAt, pieceLevelAt } from './roadLevelAt.ts';
import { roadEndsOf } from './standBetween.ts';

const NONE: Approach = { lengthM: 0, fillM3: 0, wallM2: 0 };

/** Two stretches of an approach, one behind the other. */
export const together = (inner: Approach, beyond: Approach): Approach =>
  inner === NONE
    ? beyond
    : {
        lengthM: inner.lengthM + beyond.lengthM,
        fillM3: inner.fillM3 + beyond.fillM3,
        wallM2: inner.wallM2 + beyond.wallM2,
      };

/** A piece of the road between two of its chainages, looking outward from the inner one. */
function outward(piece: RoadPiece, end: RoadEnd, fromM: number, toM: number): Outward {
  const innerM = end === 'start' ? toM : fromM;
  const rising = pieceGradientAt(piece, innerM);
  return {
    lengthM: toM - fromM,
    levelM: pieceLevelAt(piece, innerM),
    fall: end === 'start' ? rising : -rising,
    bend1PerM: -piece.curvature1PerM,
  };
}

/**
 * What the road of the crossing takes between an abutment that stands inside it and the end of the crossing: nothing where
 * it stands at the end. `pieces` are those of the road from end to end of the crossing, in order.
 */
export function innerApproach(site: Site, end: RoadEnd, pieces: readonly RoadPiece[]): Approach {
  const ends = roadEndsOf(site);
  const [fromM, toM] = end === 'start' ? [ends.startM, site.startM] : [site.endM, ends.endM];
  if (!(toM > fromM)) return NONE;
  const cut = pieces.flatMap((piece) => {
    const from = Math.max(fromM, piece.fromM);
    const to = Math.min(toM, piece.toM);
    return to > from ? [outward(piece, end, from, to)] : [];
  });
  const abutmentM = end === 'start' ? toM : fromM;
  const side = end === 'start' ? -1 : 1;
  const out = site.groundX.map((x) => side * (x - abutmentM)).filter((at) => at > 0);
  return measured(
    site,
    {
      rules: { groundAt: (at) => groundAt(site, abutmentM + side * at) },
      breaksM: out.sort((a, b) => a - b),
    },
    { stretches: end === 'start' ? cut.reverse() : cut },
  );
}

/** Both approaches of the road as proposed, straight between its levels, from the abutments outward. */
export function proposedApproaches(site: Site): Readonly<Record<RoadEnd, Approach>> {
  const beyond = approachEnds(site);
  const { startM, endM } = roadEndsOf(site);
  const straight: RoadPiece = {
    fromM: startM,
    toM: endM,
    levelM: site.road.startLevelM,
    gradient: proposedGradient(site),
    curvature1PerM: 0,
  };
  const whole = (end: RoadEnd): Approach =>
    together(innerApproach(site, end, [straight]), beyond[end].proposed);
  return { start: whole('start'), end: whole('end') };
}
