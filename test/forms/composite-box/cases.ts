import type { UnitTask } from '../../../lib/model/index.ts';
import { plainDeck } from '../composite-i/cases.ts';

/** A composite box on a plain straight deck of 12 m unless changed. */
export function tubTask(
  spansM: readonly number[],
  depthM: number,
  changes: Partial<UnitTask> & { readonly widthM?: number } = {},
): UnitTask {
  const { widthM = 12, ...rest } = changes;
  return {
    form: 'composite-box',
    spansM,
    deck: plainDeck(widthM),
    standard: 'lm1',
    planRadiusM: Infinity,
    method: 'crane',
    depthM,
    ...rest,
  };
}
