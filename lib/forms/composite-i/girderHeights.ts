import type { UnitTask } from '../../model/index.ts';
import { compositeData } from './compositeData.ts';
import { elementsPerSpan } from './elementsPerSpan.ts';

/** Height of a girder over both flanges along the unit, m. */
export interface GirderHeights {
  readonly haunched: boolean;
  readonly atStationM: Float64Array;
  /** Mean over each element. */
  readonly ofElementM: Float64Array;
}

/**
 * Constant height, or deeper towards the inner supports: a parabola over half of the longer span beside the pier or a
 * straight haunch over a part of it, at most over the whole of an end span.
 * @param midspanM height where there is no haunch
 * @param slabM slab over the girder, which the depths of the task count
 * @throws RangeError for a pier depth under the midspan depth
 */
export function girderHeights(
  task: UnitTask,
  supportsM: readonly number[],
  midspanM: number,
  slabM: number,
): GirderHeights {
  const { spansM, haunch } = task;
  const stations = spansM.length * elementsPerSpan + 1;
  const atStationM = new Float64Array(stations).fill(midspanM);
  const haunched = haunch !== undefined && spansM.length > 1 && haunch.pierDepthM > task.depthM;
  if (haunch !== undefined && !(haunch.pierDepthM >= task.depthM))
    throw new RangeError(
      `haunch.pierDepthM: expected at least the midspan depth ${task.depthM} m, received ${haunch.pierDepthM} m; give a deeper pier or no haunch`,
    );
  if (haunched) {
    const { over, power } = compositeData.haunch[haunch.law];
    const rise = haunch.pierDepthM - slabM - midspanM;
    for (let s = 0; s < stations; s++) {
      const span = Math.min(spansM.length - 1, Math.floor(s / elementsPerSpan));
      const x = supportsM[span]! + ((s - span * elementsPerSpan) * spansM[span]!) / elementsPerSpan;
      for (const pier of [span, span + 1]) {
        if (pier === 0 || pier === spansM.length) continue;
        const lengthM = Math.min(spansM[span]!, over * Math.max(spansM[pier - 1]!, spansM[pier]!));
        const way = Math.abs(x - supportsM[pier]!) / lengthM;
        if (way < 1) atStationM[s] = Math.max(atStationM[s]!, midspanM + rise * (1 - way) ** power);
      }
    }
  }
  return {
    haunched,
    atStationM,
    ofElementM: Float64Array.from(
      { length: stations - 1 },
      (_, e) => (atStationM[e]! + atStationM[e + 1]!) / 2,
    ),
  };
}
