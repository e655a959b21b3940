import fc from 'fast-check';
import { Matrix, solve } from 'ml-matrix';
import { describe, expect, it } from 'vitest';
import { planeTruss, trussForces, trussInfluence, type TrussGeometry } from '../../lib/mechanics/index.ts';

/** A Warren or Pratt-like truss of random panels, heights and areas, with one redundant diagonal in the first panel. */
const trusses = fc.record({
  panels: fc.integer({ min: 2, max: 9 }),
  panelM: fc.double({ min: 3, max: 12, noNaN: true }),
  heightsM: fc.array(fc.double({ min: 2, max: 14, noNaN: true }), { minLength: 10, maxLength: 10 }),
  areas: fc.array(fc.double({ min: 0.002, max: 0.2, noNaN: true }), { minLength: 60, maxLength: 60 }),
  loads: fc.array(fc.double({ min: -500, max: 2000, noNaN: true }), { minLength: 10, maxLength: 10 }),
  redundant: fc.boolean(),
});

type Random = typeof trusses extends fc.Arbitrary<infer T> ? T : never;

/** Bottom nodes are even, top nodes odd, so that joined nodes are numbered close together. */
function geometryOf(random: Random): TrussGeometry {
  const nodes: [number, number][] = [];
  const members: [number, number][] = [];
  for (let i = 0; i <= random.panels; i++) {
    nodes.push([i * random.panelM, 0], [i * random.panelM, random.heightsM[i]!]);
    members.push([2 * i, 2 * i + 1]);
    if (i === 0) continue;
    members.push([2 * i - 2, 2 * i], [2 * i - 1, 2 * i + 1], [2 * i - 1, 2 * i]);
    if (i === 1 && random.redundant) members.push([0, 3]);
  }
  return {
    nodes,
    members,
    areasM2: members.map((_, k) => random.areas[k]!),
    supports: [
      { node: 0, x: true, z: true },
      { node: 2 * random.panels, x: false, z: true },
    ],
  };
}

/** Member forces and reactions by a dense matrix of ml-matrix, assembled from member directions alone. */
function dense(geometry: TrussGeometry, down: readonly number[]): { members: number[]; reactions: number[] } {
  const n = 2 * geometry.nodes.length;
  // B turns displacements into elongations; K = Bt S B.
  const B = Matrix.zeros(geometry.members.length, n);
  const S = geometry.members.map(([i, j], k) => {
    const dx = geometry.nodes[j]![0] - geometry.nodes[i]![0];
    const dz = geometry.nodes[j]![1] - geometry.nodes[i]![1];
    const l = Math.hypot(dx, dz);
    B.set(k, 2 * i, -dx / l);
    B.set(k, 2 * i + 1, -dz / l);
    B.set(k, 2 * j, dx / l);
    B.set(k, 2 * j + 1, dz / l);
    return (2.1e8 * geometry.areasM2[k]!) / l;
  });
  const K = B.transpose().mmul(Matrix.diag(S)).mmul(B);
  const last = geometry.nodes.length - 2;
  const held = [0, 1, 2 * last + 1];
  const free = Array.from({ length: n }, (_, i) => i).filter((i) => !held.includes(i));
  const f = new Matrix(free.map((i) => [i % 2 === 1 ? -down[(i - 1) / 2]! : 0]));
  const x = solve(K.selection(free, free), f);
  const u = Matrix.zeros(n, 1);
  free.forEach((i, row) => u.set(i, 0, x.get(row, 0)));
  const elongations = B.mmul(u);
  const forces = K.mmul(u);
  return {
    members: S.map((stiffness, k) => stiffness * elongations.get(k, 0)),
    reactions: [1, 2 * last + 1].map((row) => forces.get(row, 0) + down[(row - 1) / 2]!),
  };
}

describe('planeTruss() beside dense matrices', () => {
  it('agrees on member forces and reactions of random trusses', () => {
    fc.assert(
      fc.property(trusses, (random) => {
        const geometry = geometryOf(random);
        const down = geometry.nodes.map((_, i) => (i % 2 === 0 ? random.loads[i / 2]! : 0));
        const ours = trussForces(
          planeTruss(geometry),
          down.map((zKN, node) => ({ node, zKN })),
        );
        const theirs = dense(geometry, down);
        const scale = Math.max(1, ...theirs.members.map(Math.abs));
        theirs.members.forEach((force, k) =>
          expect(Math.abs(force - ours.memberKN[k]!) / scale).toBeLessThan(1e-8),
        );
        theirs.reactions.forEach((force, k) =>
          expect(Math.abs(force - ours.reactionKN[k]!) / scale).toBeLessThan(1e-8),
        );
      }),
      { seed: 21, numRuns: 80 },
    );
  });

  it('adds influence lines up to the forces of any loading of the chord', () => {
    fc.assert(
      fc.property(trusses, (random) => {
        const geometry = geometryOf(random);
        const truss = planeTruss(geometry);
        const chord = geometry.nodes.flatMap((_, i) => (i % 2 === 0 ? [i] : []));
        const lines = trussInfluence(truss, chord);
        const forces = trussForces(
          truss,
          chord.map((node, i) => ({ node, zKN: random.loads[i]! })),
        ).memberKN;
        lines.member.forEach((line, k) => {
          const sum = line.reduce((total, ordinate, i) => total + ordinate * random.loads[i]!, 0);
          expect(sum).toBeCloseTo(forces[k]!, 5);
        });
      }),
      { seed: 22, numRuns: 40 },
    );
  });
});
