import type { GirderPlates } from './girderSection.ts';

/** Plates of a girder from end to end, by element; widths are the same throughout, heights those of the model. */
export interface PlateRun {
  readonly heightM: Float64Array;
  readonly topWidthM: number;
  readonly bottomWidthM: number;
  readonly topM: Float64Array;
  readonly bottomM: Float64Array;
  readonly webM: Float64Array;
}

const scratch = { heightM: 0, topWidthM: 0, topM: 0, bottomWidthM: 0, bottomM: 0, webM: 0 };

/** Plates of element `e`. The object is reused: read it before asking again. */
export function platesAt(run: PlateRun, e: number): GirderPlates {
  scratch.heightM = run.heightM[e]!;
  scratch.topWidthM = run.topWidthM;
  scratch.bottomWidthM = run.bottomWidthM;
  scratch.topM = run.topM[e]!;
  scratch.bottomM = run.bottomM[e]!;
  scratch.webM = run.webM[e]!;
  return scratch;
}

/** Runs of equal thickness: [first element, element after the last, thickness m]. */
export function runsOf(thicknessM: Float64Array): [from: number, to: number, thicknessM: number][] {
  const runs: [number, number, number][] = [];
  let from = 0;
  for (let e = 1; e <= thicknessM.length; e++) {
    if (e < thicknessM.length && thicknessM[e] === thicknessM[from]) continue;
    runs.push([from, e, thicknessM[from]!]);
    from = e;
  }
  return runs;
}

/** True when two runs have the same plates everywhere. */
export function sameRun(a: PlateRun, b: PlateRun): boolean {
  const same = (p: Float64Array, q: Float64Array): boolean => p.every((value, e) => value === q[e]);
  return (
    a.topWidthM === b.topWidthM &&
    a.bottomWidthM === b.bottomWidthM &&
    same(a.topM, b.topM) &&
    same(a.bottomM, b.bottomM) &&
    same(a.webM, b.webM)
  );
}
