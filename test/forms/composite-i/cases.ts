import type { DeckSpec, StandardId, UnitTask } from '../../../lib/model/index.ts';

/** An ordinary deck of a width: kerbs half a metre inside, lanes of 3.5 m, 90 mm of surfacing and two barriers. */
export function plainDeck(widthM: number): DeckSpec {
  const carriagewayM = widthM - 1;
  return {
    widthM,
    carriagewayM,
    carriagewayOffsetM: 0,
    lanes: Math.max(1, Math.floor(carriagewayM / 3.5)),
    footwayM: 0,
    surfacingM: 0.09,
    superimposedKNm: 0.09 * 23.5 * carriagewayM + 10,
  };
}

/** A unit of composite girders to size. */
export function girderTask(
  spansM: readonly number[],
  depthM: number,
  changes: Partial<UnitTask> & { readonly widthM?: number; readonly standard?: StandardId } = {},
): UnitTask {
  const { widthM = 12, ...rest } = changes;
  return {
    form: 'composite-i',
    spansM,
    deck: plainDeck(widthM),
    standard: 'lm1',
    planRadiusM: Infinity,
    method: 'crane',
    depthM,
    ...rest,
  };
}
