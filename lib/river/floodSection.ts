import type { Site } from '../model/index.ts';

/** What water of one level fills between two chainages, measured along the road. */
export interface FloodSection {
  readonly areaM2: number;
  /** Width of its surface, m. */
  readonly widthM: number;
  /** Integral of depth^(5/3) over the width, m^(8/3): how flow of one slope and roughness shares itself out (Manning). */
  readonly conveyance: number;
}

/** Integral of depth^power over a stretch on which the depth runs straight from `from` to `to`, both 0 or more. */
function powerOver(lengthM: number, from: number, to: number, power: number): number {
  const rise = to - from;
  if (Math.abs(rise) < 1e-9 * Math.max(1, from)) return lengthM * ((from + to) / 2) ** power;
  return (lengthM * (to ** (power + 1) - from ** (power + 1))) / ((power + 1) * rise);
}

/**
 * Section of the flood over the ground line between two chainages, m: exact on the straight lines between the surveyed
 * points. The ground runs level beyond the first and last point.
 */
export function floodSection(
  { groundX, groundZ }: Pick<Site, 'groundX' | 'groundZ'>,
  levelM: number,
  fromM: number,
  toM: number,
): FloodSection {
  let areaM2 = 0;
  let widthM = 0;
  let conveyance = 0;
  const stretch = (x0: number, z0: number, x1: number, z1: number): void => {
    const from = Math.max(fromM, x0);
    const to = Math.min(toM, x1);
    if (!(to > from)) return;
    const depth = (x: number): number => levelM - (z0 + ((z1 - z0) * (x - x0)) / (x1 - x0));
    let [left, right] = [depth(from), depth(to)];
    let length = to - from;
    if (left <= 0 && right <= 0) return;
    if (left < 0 || right < 0) {
      length *= Math.max(left, right) / Math.abs(left - right);
      [left, right] = [Math.max(0, left), Math.max(0, right)];
    }
    areaM2 += (length * (left + right)) / 2;
    widthM += length;
    conveyance += powerOver(length, left, right, 5 / 3);
  };
  const last = groundX.length - 1;
  if (fromM < groundX[0]!) stretch(fromM, groundZ[0]!, groundX[0]!, groundZ[0]!);
  for (let i = 0; i < last; i++) stretch(groundX[i]!, groundZ[i]!, groundX[i + 1]!, groundZ[i + 1]!);
  if (toM > groundX[last]!) stretch(groundX[last]!, groundZ[last]!, toM, groundZ[last]!);
  return { areaM2, widthM, conveyance };
}
