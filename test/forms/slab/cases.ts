import type { DeckSpec, UnitTask } from '../../../lib/model/index.ts';

/** Deck 12 m wide, 11 m between kerbs, 90 mm of surfacing, two concrete barriers; round figures of our own. */
export const deck: DeckSpec = {
  widthM: 12,
  carriagewayM: 11,
  carriagewayOffsetM: 0,
  lanes: 2,
  footwayM: 0,
  surfacingM: 0.09,
  superimposedKNm: 33,
};

/** A slab on a straight road. */
export function slabTask(
  spansM: readonly number[],
  depthM: number,
  change: Partial<UnitTask> = {},
): UnitTask {
  return {
    form: 'slab',
    spansM,
    depthM,
    deck,
    standard: 'lm1',
    planRadiusM: Infinity,
    method: 'falsework',
    ...change,
  };
}
