import type { UnitTask } from '../../model/index.ts';
import { boxData } from './boxData.ts';

/** Height of the soffit above ground under each span, m, and whether it was given. */
export interface HeightUnder {
  readonly known: boolean;
  readonly soffitM: readonly number[];
  /** Height of the road above ground that is taken where nothing is given, m. */
  readonly assumedRoadM: number;
}

/** Mean of the two supports of each span; where the task gives none that of a road at the assumed height. */
export function heightUnder(task: UnitTask): HeightUnder {
  const given = task.clearUnderM;
  const known = given !== undefined && given.length === task.spansM.length + 1;
  const assumedRoadM = boxData.assumedHeightM.value;
  const assumedM = Math.max(0, assumedRoadM - task.depthM);
  return {
    known,
    assumedRoadM,
    soffitM: task.spansM.map((_, i) => (known ? (given[i]! + given[i + 1]!) / 2 : assumedM)),
  };
}
