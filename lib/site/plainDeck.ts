import type { DeckStrip } from '../model/index.ts';

/** Barriers take what the carriageway leaves of the width, half on each side, m (common practice, no source). */
export const BARRIERS_M = 1;
/** No traffic lane is marked narrower, m (common practice, no source). */
export const LEAST_LANE_M = 2.5;
/** Surfacing of a deck of which nothing more is known, m (common practice, no source). */
export const SURFACING_M = 0.09;

/**
 * Strips of a deck of which only widths are known: lanes of one width between barriers.
 * @param widthM between the outer edges, m
 * @param carriagewayM between the barriers, m
 */
export function plainStrips(widthM: number, carriagewayM: number, lanes: number): readonly DeckStrip[] {
  const barrierM = (widthM - carriagewayM) / 2;
  const laneM = carriagewayM / lanes;
  const edge: DeckStrip = { kind: 'barrier', widthM: barrierM, ultimateWidthM: barrierM };
  const lane: DeckStrip = { kind: 'lane', widthM: laneM, ultimateWidthM: laneM };
  return [edge, ...Array.from({ length: lanes }, () => lane), edge];
}
