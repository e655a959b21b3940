import { solveDense } from '../members/solveDense.ts';

/** A wall or plate of a thin-walled section. */
export interface Wall {
  readonly lengthM: number;
  readonly thicknessM: number;
}

/** St Venant constant of an open section of thin plates, sum of s t3 / 3, m4 (the ends of plates are neglected: up to +6 % at s = 10 t). */
export function openTorsion(plates: readonly Wall[]): number {
  return plates.reduce((sum, plate) => sum + (plate.lengthM * plate.thicknessM ** 3) / 3, 0);
}

/** Torsion constant of one closed cell, 4 A2 / sum (s / t), m4 (Bredt 1896). @throws RangeError without walls or area */
export function bredt(cellAreaM2: number, walls: readonly Wall[]): number {
  if (!(cellAreaM2 > 0)) throw new RangeError(`cellAreaM2: expected more than 0, received ${cellAreaM2}`);
  const path = walls.reduce((sum, wall) => sum + wall.lengthM / wall.thicknessM, 0);
  if (!(path > 0)) throw new RangeError('walls: expected one or more, received none');
  return (4 * cellAreaM2 ** 2) / path;
}

/** A cell of a multi-cell section, with the walls it does not share. */
export interface Cell {
  readonly areaM2: number;
  readonly ownWalls: readonly Wall[];
}

/** A wall between two cells. */
export interface SharedWall extends Wall {
  readonly between: readonly [number, number];
}

/**
 * Torsion constant and shear flows of a section of several cells: every cell turns by the same rate
 * (q_i sum(s/t) - sum over shared q_j s/t = 2 A_i G theta'), J = 2 sum A_i q_i per unit G theta'.
 * @returns constant m4 and the flow of each cell per unit torque, 1/m2
 */
export function multiCellTorsion(
  cells: readonly Cell[],
  shared: readonly SharedWall[],
): { constantM4: number; flowPerTorque: number[] } {
  const n = cells.length;
  const A = Array.from({ length: n }, () => new Array<number>(n).fill(0));
  cells.forEach((cell, i) => {
    for (const wall of cell.ownWalls) A[i]![i]! += wall.lengthM / wall.thicknessM;
  });
  for (const wall of shared) {
    const [i, j] = wall.between;
    const path = wall.lengthM / wall.thicknessM;
    A[i]![i]! += path;
    A[j]![j]! += path;
    A[i]![j]! -= path;
    A[j]![i]! -= path;
  }
  const flow = solveDense(
    A,
    cells.map((cell) => 2 * cell.areaM2),
  );
  const constantM4 = cells.reduce((sum, cell, i) => sum + 2 * cell.areaM2 * flow[i]!, 0);
  return { constantM4, flowPerTorque: flow.map((q) => q / constantM4) };
}

/** Rule for compact concrete sections, A4 / (40 Ip), m4 (Saint-Venant's approximation; 5 to 21 % high for I-girders). */
export function compactTorsion(areaM2: number, inertiaM4: number, inertiaYM4: number): number {
  return areaM2 ** 4 / (40 * (inertiaM4 + inertiaYM4));
}

/**
 * Torsion constant of a solid rectangle, a >= b: a b3 (1/3 - 0.21 (b/a) (1 - b4 / 12 a4)), m4
 * (Roark; within 0.5 % of the series).
 */
export function rectangleTorsion(sideM: number, otherSideM: number): number {
  const a = Math.max(sideM, otherSideM);
  const b = Math.min(sideM, otherSideM);
  return a * b ** 3 * (1 / 3 - 0.21 * (b / a) * (1 - b ** 4 / (12 * a ** 4)));
}
