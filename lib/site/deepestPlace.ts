import type { Site } from '../model/index.ts';

/** Ground within so much of the lowest counts as the floor of a valley, m. */
const FLOOR_M = 0.5;

/**
 * Chainage, m, of the middle of the lowest ground between the abutments: of the widest stretch of it, of two alike of the
 * one nearer to the middle of the crossing, and of two alike in that too the middle itself.
 */
export function deepestPlace({
  groundX,
  groundZ,
  startM,
  endM,
}: Pick<Site, 'groundX' | 'groundZ' | 'startM' | 'endM'>): number {
  const middleM = (startM + endM) / 2;
  const points = groundX.map((x, i) => ({ x, z: groundZ[i]! })).filter(({ x }) => x > startM && x < endM);
  if (points.length === 0) return middleM;
  const floorM = Math.min(...points.map(({ z }) => z)) + FLOOR_M;
  const floors: { fromM: number; toM: number }[] = [];
  let isOn = false;
  for (const { x, z } of points) {
    if (z <= floorM && isOn) floors.at(-1)!.toM = x;
    else if (z <= floorM) floors.push({ fromM: x, toM: x });
    isOn = z <= floorM;
  }
  const widthM = Math.max(...floors.map(({ fromM, toM }) => toM - fromM));
  const away = floors
    .filter(({ fromM, toM }) => toM - fromM > widthM - FLOOR_M)
    .map(({ fromM, toM }) => (fromM + toM) / 2 - middleM)
    .sort((a, b) => Math.abs(a) - Math.abs(b));
  const isEven = away.length > 1 && Math.abs(away[0]! + away[1]!) < FLOOR_M;
  return isEven ? middleM : middleM + away[0]!;
}
