import type { StandardId, UnitTask } from '../../../lib/model/index.ts';
import { plainDeck } from '../composite-i/cases.ts';

/** A cantilevered unit to size on a plain deck of 12 m unless changed; depth at midspan. */
export function cantileverTask(
  spansM: readonly number[],
  depthM: number,
  changes: Partial<UnitTask> & { readonly widthM?: number; readonly standard?: StandardId } = {},
): UnitTask {
  const { widthM = 12, ...rest } = changes;
  return {
    form: 'cantilever-box',
    spansM,
    deck: plainDeck(widthM),
    standard: 'lm1',
    planRadiusM: Infinity,
    method: 'balanced-cantilever',
    depthM,
    ...rest,
  };
}

/** Spans of ordinary proportions for cantilevering: end spans 0.62 of the others. */
export function cantileverSpans(mainM: number, count = 3): number[] {
  return Array.from({ length: count }, (_, i) => (i === 0 || i === count - 1 ? 0.62 * mainM : mainM));
}
