import type { UnitTask } from '../../model/index.ts';
import { boxData } from './boxData.ts';

/** Height of the soffit above ground under each span, m, and whether it was given. */
export interface HeightUnder {
  readonly known: boolean;
  readonly soffitM: readonly number[];
  /** Height of the road above ground, mean of the supports, m. */
  readonly meanM: number;
}

/** Mean of the two supports of each span less the depth; the assumed height where the task gives none. */
export function heightUnder(task: UnitTask): HeightUnder {
  const given = task.clearUnderM;
  const known = given !== undefined && given.length === task.spansM.length + 1;
  const road = known
    ? given
    : Array.from({ length: task.spansM.length + 1 }, () => boxData.assumedHeightM.value);
  return {
    known,
    soffitM: task.spansM.map((_, i) => Math.max(0, (road[i]! + road[i + 1]!) / 2 - task.depthM)),
    meanM: road.reduce((sum, height) => sum + height, 0) / road.length,
  };
}
