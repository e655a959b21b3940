import type { UnitTask } from '../../model/index.ts';
import { compositeData } from './compositeData.ts';

/** Equal bays in every span; bays that reach into the cracked region of an inner support are halved for slender flanges. */
export function braces(task: UnitTask, supportsM: readonly number[], flangeM: number): number[] {
  const { mostM, mostOverFlangeWidthAtPiers } = compositeData.bracing;
  const share = compositeData.crackedShare.value;
  const last = task.spansM.length - 1;
  const braces = [0];
  task.spansM.forEach((spanM, span) => {
    const bays = Math.max(2, Math.ceil(spanM / mostM - 1e-9));
    const bay = spanM / bays;
    const start = supportsM[span]!;
    for (let b = 0; b < bays; b++) {
      const near =
        (span > 0 && b * bay < share * spanM - 1e-9) ||
        (span < last && (b + 1) * bay > (1 - share) * spanM + 1e-9);
      if (near && bay > mostOverFlangeWidthAtPiers * flangeM) braces.push(start + (b + 0.5) * bay);
      braces.push(b === bays - 1 ? supportsM[span + 1]! : start + (b + 1) * bay);
    }
  });
  return braces;
}

/** Length of the bay that each element lies in, m. */
export function bays(elementM: Float64Array, braceAtM: readonly number[]): Float64Array {
  let bay = 1;
  let start = 0;
  return elementM.map((lengthM) => {
    const middle = start + lengthM / 2;
    start += lengthM;
    while (bay < braceAtM.length - 1 && braceAtM[bay]! < middle) bay++;
    return braceAtM[bay]! - braceAtM[bay - 1]!;
  });
}
