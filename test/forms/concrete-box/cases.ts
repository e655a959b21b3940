import type { StandardId, UnitTask } from '../../../lib/model/index.ts';
import { plainDeck } from '../composite-i/cases.ts';

export { plainDeck };

/** A unit of concrete box to size, cast on falsework on a plain deck of 12 m unless changed. */
export function boxTask(
  spansM: readonly number[],
  depthM: number,
  changes: Partial<UnitTask> & { readonly widthM?: number; readonly standard?: StandardId } = {},
): UnitTask {
  const { widthM = 12, ...rest } = changes;
  return {
    form: 'concrete-box',
    spansM,
    deck: plainDeck(widthM),
    standard: 'lm1',
    planRadiusM: Infinity,
    method: 'falsework',
    depthM,
    ...rest,
  };
}

/** Spans of a continuous unit of ordinary proportions: `count` spans, the end ones 0.78 of the others. */
export function usualSpans(mainM: number, count: number): number[] {
  if (count === 1) return [mainM];
  return Array.from({ length: count }, (_, i) => (i === 0 || i === count - 1 ? 0.78 * mainM : mainM));
}
