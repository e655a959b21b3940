import type { UnitTask } from '../../../lib/model/index.ts';
import { plainDeck } from '../composite-i/cases.ts';

/** A steel box on a plain straight deck of 12 m unless changed. */
export function steelBoxTask(
  spansM: readonly number[],
  depthM: number,
  changes: Partial<UnitTask> & { readonly widthM?: number } = {},
): UnitTask {
  const { widthM = 12, ...rest } = changes;
  return {
    form: 'steel-box',
    spansM,
    deck: plainDeck(widthM),
    standard: 'lm1',
    planRadiusM: Infinity,
    method: 'balanced-cantilever',
    depthM,
    ...rest,
  };
}
