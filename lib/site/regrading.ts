import type { Regrading, RoadPiece, Site } from '../model/index.ts';
import { approachEnds, approachPieces, isFixed, measured, outwardFall, type RoadEnd } from './approachEnd.ts';
import { regradedLine, turnedOver } from './regradedLine.ts';

/** Gradient of the existing road behind an end of the road; null where the end is free or nothing is known of it. */
export function heldGradient(site: Site, end: RoadEnd): number | null {
  const held = site.road[`${end}Gradient`];
  return isFixed(site, end) && typeof held === 'number' ? held : null;
}

/**
 * The existing road behind a fixed end as it is regraded for a gradient of the deck there, rising with the chainage, and
 * its pieces. What is filled or cut is measured against the existing road, with the width of the deck and the sides of the
 * approaches. Null where the gradient of the existing road is not known.
 */
export function regradingOf(
  site: Site,
  end: RoadEnd,
  deckGradient: number,
): { readonly regrading: Regrading; readonly pieces: readonly RoadPiece[] } | null {
  const held = heldGradient(site, end);
  if (held === null) return null;
  const levelM = site.road[`${end}LevelM`];
  const heldFall = outwardFall(end, held);
  const line = regradedLine(levelM, outwardFall(end, deckGradient), heldFall, approachEnds(site)[end].rules);
  const { stretches, lengthM, turn, radiusM, comesBack } = line;
  // The road is above the existing one all along where it falls less at first, and below it where it falls more.
  const isFill = turn > 0;
  const { fillM3: volumeM3, wallM2 } = measured(
    site,
    { rules: { groundAt: (out) => levelM - heldFall * out }, breaksM: [] },
    { stretches: isFill ? stretches : turnedOver(stretches, levelM, heldFall) },
  );
  const gradientChange = Math.abs(turn);
  const curveM = radiusM * gradientChange;
  const tangentM = curveM / 2;
  return {
    regrading: {
      kind: isFill ? 'crest' : 'sag',
      radiusM,
      gradientChange,
      curveM,
      tangentM,
      offsetM: (tangentM * gradientChange) / 4,
      apartM: tangentM * gradientChange,
      lengthM,
      comesBack,
      fillM3: isFill ? volumeM3 : 0,
      cutM3: isFill ? 0 : volumeM3,
      wallM2,
    },
    pieces: approachPieces(site, end, { stretches }),
  };
}
