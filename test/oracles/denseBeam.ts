import { Matrix, solve } from 'ml-matrix';

/** A beam for the oracle: nodes in order, one element between neighbours, held and sprung nodes, loads at nodes and on elements. */
export interface DenseBeam {
  readonly xM: readonly number[];
  /** Stiffness of each element, kNm2. */
  readonly ei: readonly number[];
  readonly supports: readonly number[];
  readonly springs: readonly { readonly node: number; readonly kNPerM: number }[];
  readonly nodeKN: readonly number[];
  readonly elementKNm: readonly number[];
  readonly settlementM: readonly number[];
}

/** Solved with a dense matrix of two freedoms a node, supports by penalty-free partition. Down positive, sagging positive. */
export function denseBeam(beam: DenseBeam): { deflection: number[]; moment: number[]; reaction: number[] } {
  const n = beam.xM.length;
  const K = Matrix.zeros(2 * n, 2 * n);
  const f = Matrix.zeros(2 * n, 1);
  const local: number[][][] = [];
  for (let e = 0; e < n - 1; e++) {
    const h = beam.xM[e + 1]! - beam.xM[e]!;
    const c = beam.ei[e]! / h ** 3;
    const k = [
      [12, 6 * h, -12, 6 * h],
      [6 * h, 4 * h * h, -6 * h, 2 * h * h],
      [-12, -6 * h, 12, -6 * h],
      [6 * h, 2 * h * h, -6 * h, 4 * h * h],
    ].map((row) => row.map((value) => c * value));
    local.push(k);
    const w = beam.elementKNm[e]!;
    const load = [(w * h) / 2, (w * h * h) / 12, (w * h) / 2, (-w * h * h) / 12];
    for (let a = 0; a < 4; a++) {
      f.set(2 * e + a, 0, f.get(2 * e + a, 0) + load[a]!);
      for (let b = 0; b < 4; b++) K.set(2 * e + a, 2 * e + b, K.get(2 * e + a, 2 * e + b) + k[a]![b]!);
    }
  }
  beam.nodeKN.forEach((load, i) => f.set(2 * i, 0, f.get(2 * i, 0) + load));
  for (const spring of beam.springs) {
    K.set(2 * spring.node, 2 * spring.node, K.get(2 * spring.node, 2 * spring.node) + spring.kNPerM);
  }
  const held = new Map(beam.supports.map((node, j) => [2 * node, beam.settlementM[j] ?? 0]));
  const free = Array.from({ length: 2 * n }, (_, i) => i).filter((i) => !held.has(i));
  const u = new Array<number>(2 * n).fill(0);
  for (const [i, value] of held) u[i] = value;
  const A = K.selection(free, free);
  const b = Matrix.zeros(free.length, 1);
  free.forEach((i, row) => {
    let sum = f.get(i, 0);
    for (const [j, value] of held) sum -= K.get(i, j) * value;
    b.set(row, 0, sum);
  });
  const x = solve(A, b);
  free.forEach((i, row) => (u[i] = x.get(row, 0)));
  const moment = new Array<number>(n).fill(0);
  for (let e = 0; e < n - 1; e++) {
    const h = beam.xM[e + 1]! - beam.xM[e]!;
    const k = local[e]!;
    const w = beam.elementKNm[e]!;
    const end = (row: number): number => k[row]!.reduce((sum, value, j) => sum + value * u[2 * e + j]!, 0);
    // The moment an element takes at its left end turns it the way of its rotation: sagging; at its right end the other way.
    moment[e] = end(1) - (w * h * h) / 12;
    moment[e + 1] = -end(3) - (w * h * h) / 12;
  }
  const reaction = beam.supports.map((node) => {
    let sum = f.get(2 * node, 0);
    for (let j = 0; j < 2 * n; j++) sum -= K.get(2 * node, j) * u[j]!;
    return sum;
  });
  return { deflection: u.filter((_, i) => i % 2 === 0), moment, reaction };
}
