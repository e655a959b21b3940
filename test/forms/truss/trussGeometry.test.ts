import { describe, expect, it } from 'vitest';
import { trussGeometry, type TrussGeometry } from '../../../lib/forms/truss/trussGeometry.ts';
import { planeTruss, trussInfluence } from '../../../lib/mechanics/index.ts';

/** The whole truss by the displacement method: nodes and members rebuilt from the half that the module lays out. */
function stiffnessLines(geometry: TrussGeometry): {
  readonly lines: Float64Array[];
  readonly at: Map<string, number>;
} {
  const nodes: [number, number][] = [];
  const nodeAt = (x: number, z: number): number => {
    const known = nodes.findIndex(([a, b]) => Math.hypot(a - x, b - z) < 1e-6);
    if (known >= 0) return known;
    nodes.push([x, z]);
    return nodes.length - 1;
  };
  const members: [number, number][] = [];
  const at = new Map<string, number>();
  const add = (key: string, a: readonly [number, number], b: readonly [number, number]): void => {
    at.set(key, members.length);
    members.push([nodeAt(...a), nodeAt(...b)]);
  };
  const L = geometry.spanM;
  geometry.members.forEach((member, i) => {
    // A post without a load line only props the top chord and would hang in the air as a member of a pin-jointed truss.
    if (member.role === 'post') return;
    add(`${i}`, member.from, member.to);
    if (member.count === 2)
      add(`${i} mirrored`, [L - member.from[0], member.from[1]], [L - member.to[0], member.to[1]]);
  });
  const truss = planeTruss({
    nodes,
    members,
    areasM2: members.map((_, i) => 0.02 + 0.001 * (i % 5)),
    supports: [
      { node: nodeAt(0, 0), x: true, z: true },
      { node: nodeAt(L, 0), x: false, z: true },
    ],
  });
  const loaded = [...geometry.nodesM].map((x) => nodeAt(x, 0));
  return { lines: [...trussInfluence(truss, loaded).member], at };
}

describe('trussGeometry(span, height, panels, hangers)', () => {
  it.each([
    [80, 10, 10, false],
    [63, 8, 9, false],
    [90, 12, 12, true],
    [100, 14, 10, true],
  ] as const)(
    '%d m span, %d m high, %d panels, hangers %s: sections give the same influence lines as stiffness',
    (span, height, panels, hangers) => {
      const geometry = trussGeometry(span, height, panels, hangers);
      const { lines, at } = stiffnessLines(geometry);
      geometry.members.forEach((member, i) => {
        const index = at.get(`${i}`);
        if (index === undefined) return;
        for (let j = 0; j <= panels; j++) expect(member.influence[j]).toBeCloseTo(lines[index]![j]!, 8);
      });
    },
  );

  it('a uniform load on every floor node gives the middle chord wL2/8h', () => {
    const geometry = trussGeometry(80, 10, 8, false);
    const top = geometry.members.find((member) => member.role === 'top-chord' && member.count === 1)!;
    const perNode = top.influence.reduce((sum, v) => sum + v, 0);
    // w = 1/p on p = 10 m: L2 / 8 p h = 80 x 80 / (8 x 10 x 10) = 8 kN for 1 kN a node.
    expect(perNode).toBeCloseTo(-8, 10);
  });

  it('refuses a height of 0 and odd panels with hangers', () => {
    expect(() => trussGeometry(80, 0, 8, false)).toThrow(RangeError);
    expect(() => trussGeometry(80, Number.NaN, 8, false)).toThrow(RangeError);
    expect(() => trussGeometry(80, 10, 9, true)).toThrow(/even number of panels/u);
  });
});
