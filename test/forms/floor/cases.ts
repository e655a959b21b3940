import type { DeckSpec } from '../../../lib/model/index.ts';

/** A deck 12 m wide between two planes, two lanes and a footway; round figures of our own. */
export const floorDeck: DeckSpec = {
  widthM: 12,
  carriagewayM: 9,
  carriagewayOffsetM: 0,
  lanes: 2,
  footwayM: 2,
  surfacingM: 0.09,
  superimposedKNm: 40,
};
