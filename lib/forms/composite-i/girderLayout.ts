import type { UnitTask } from '../../model/index.ts';
import { compositeData } from './compositeData.ts';

/** Where the girders of a deck stand. */
export interface GirderLayout {
  readonly count: number;
  readonly twin: boolean;
  readonly spacingM: number;
  readonly overhangM: number;
  /** From the middle of the deck, left to right, m. */
  readonly offsetsM: readonly number[];
}

/**
 * Girder lines of a deck: two with cross-girders up to `twin.mostWidthM`, more beyond, at twice the spacing where
 * substringers stand between them; `task.girders` overrides.
 * @throws RangeError when fewer than two girders or part of a girder are asked for, or substringers between two.
 */
export function girderLayout(
  task: Pick<UnitTask, 'deck'> & Partial<Pick<UnitTask, 'girders' | 'substringers'>>,
): GirderLayout {
  const { widthM } = task.deck;
  const { twin, multi } = compositeData;
  const asked = task.girders;
  if (asked !== undefined && !(Number.isInteger(asked) && asked >= 2))
    throw new RangeError(
      `girders: expected a whole number, 2 or more, received ${asked}; leave it out for the usual count`,
    );
  // Beams midway between the girders carry the slab as well.
  const mostSpacingM = (task.substringers ? 2 : 1) * multi.mostSpacingM;
  const many = Math.max(3, Math.ceil(widthM / mostSpacingM - 2 * multi.overhangOverSpacing - 1e-9) + 1);
  const count = asked ?? (widthM <= twin.mostWidthM ? 2 : many);
  if (task.substringers && count < 3)
    throw new RangeError(
      `substringers: expected three girders or more, received ${count}; ask for more girders or leave them out`,
    );
  const ratio = count === 2 ? twin.overhangOverSpacing : multi.overhangOverSpacing;
  const spacingM = widthM / (count - 1 + 2 * ratio);
  const overhangM = (widthM - (count - 1) * spacingM) / 2;
  const offsetsM = Array.from({ length: count }, (_, i) => (i - (count - 1) / 2) * spacingM);
  return { count, twin: count === 2, spacingM, overhangM, offsetsM };
}
