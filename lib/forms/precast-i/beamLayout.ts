import type { UnitTask } from '../../model/index.ts';
import type { BeamLayout } from '../common/precast/beamChoice.ts';
import { countsWithin } from '../common/precast/countsWithin.ts';
import { precastData } from './precastData.ts';

/** `count` beams evenly across a deck, the overhang a share of the spacing. */
export function beamLayout(widthM: number, count: number): BeamLayout {
  const spacingM = widthM / (count - 1 + 2 * precastData.layout.overhangOverSpacing);
  return {
    count,
    spacingM,
    overhangM: (widthM - (count - 1) * spacingM) / 2,
    offsetsM: Array.from({ length: count }, (_, i) => (i - (count - 1) / 2) * spacingM),
  };
}

/** Numbers of beams that keep their spacing within practice, fewest first; see `countsWithin`. */
export function beamCounts(task: UnitTask): readonly number[] {
  const { leastSpacingM, mostSpacingM, overhangOverSpacing } = precastData.layout;
  return countsWithin(task, leastSpacingM, mostSpacingM, 2 * overhangOverSpacing);
}
