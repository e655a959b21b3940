import type { Check, UnitTask } from '../../model/index.ts';
import { check } from '../common/checks.ts';
import { aheadM } from '../common/skewPlanes.ts';
import { skewWords } from '../common/skewWords.ts';
import { sizeFloor, type Floor, type FloorCase } from '../floor/sizeFloor.ts';
import type { SizedPylon } from './sizePylon.ts';

/*
 * A hung deck on a skew: pylons, stays and cross-girders stand square to the road, for planes whose stays meet at unlike
 * places would turn the deck about its axis. Only its ends follow the supports. A pylon that is turned to the obstacle is
 * not worked out.
 */

/** Floor whose cross-girders stand at the skew ends of the deck; null on square supports. */
export function skewEndFloor(task: Pick<UnitTask, 'skewDeg'>, square: FloorCase): Floor | null {
  const { skewDeg = 0 } = task;
  return skewDeg === 0 ? null : sizeFloor({ ...square, skewDeg });
}

/** Steel that the two end cross-girders along the supports have over two square ones, kg; their bearings carry it. */
export function skewEndKg(square: Floor, end: Floor | null): number {
  if (end === null) return 0;
  return 2 * (end.crossGirder.massKgPerM * end.crossM - square.crossGirder.massKgPerM * square.crossM);
}

/** End cross-girders, taken with a whole bay on them; none on square supports. */
export function skewEndCheck(end: Floor | null): Check[] {
  if (end === null) return [];
  const { governs, utilisation } = end.crossGirder;
  return [check('end-cross-girder', `cross-girders at the skew ends, ${governs}`, utilisation, 1, '1')];
}

/**
 * What square pylons on a skew crossing cost: between them an obstacle that runs past at the skew needs more length of
 * road, by the width over their legs x tan of the skew. Nothing on square supports.
 */
export function skewWarnings(
  { skewDeg = 0 }: Pick<UnitTask, 'skewDeg'>,
  bridge: { readonly planesM: number; readonly pylons: readonly SizedPylon[]; readonly mainSpanM: number },
): string[] {
  if (skewDeg === 0) return [];
  const { planesM, pylons, mainSpanM } = bridge;
  const overLegsM = planesM + Math.max(...pylons.map(({ widthM }) => widthM));
  const longerM = aheadM(overLegsM, skewDeg);
  return [
    `${skewWords(skewDeg)}: pylons, stays and cross-girders are square to the road, only the ends of the deck follow the supports. Legs ${overLegsM.toFixed(1)} m over all clear an obstacle on this skew by a main span ${longerM.toFixed(1)} m longer than their axis asks for (${((100 * longerM) / mainSpanM).toFixed(0)} % of it); where the span was set along the axis, add it. One edge girder ends ${aheadM(planesM, skewDeg).toFixed(1)} m before the other: the end bays are sized by their mean.`,
  ];
}
