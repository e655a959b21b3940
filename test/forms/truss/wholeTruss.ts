import type { TrussGeometry } from '../../../lib/forms/truss/trussGeometry.ts';
import { planeTruss, type PlaneTruss } from '../../../lib/mechanics/index.ts';

/** A whole truss for the displacement method, with where each member of the half stands in it. */
export interface WholeTruss {
  readonly truss: PlaneTruss;
  readonly memberAt: ReadonlyMap<number, number>;
  /** Nodes of the floor, from left to right. */
  readonly floorNodes: readonly number[];
}

/**
 * Rebuilds a truss from the half that the module lays out. Posts are left out: without a load of their own they only prop
 * the top chord, and would hang in the air as members of a pin-jointed truss.
 */
export function wholeTruss(geometry: TrussGeometry, areaM2: (member: number) => number): WholeTruss {
  const nodes: [number, number][] = [];
  const nodeAt = (x: number, z: number): number => {
    const known = nodes.findIndex(([a, b]) => Math.hypot(a - x, b - z) < 1e-6);
    if (known >= 0) return known;
    nodes.push([x, z]);
    return nodes.length - 1;
  };
  const members: [number, number][] = [];
  const areasM2: number[] = [];
  const memberAt = new Map<number, number>();
  const L = geometry.spanM;
  geometry.members.forEach(({ role, from, to, count }, i) => {
    if (role === 'post') return;
    memberAt.set(i, members.length);
    members.push([nodeAt(...from), nodeAt(...to)]);
    areasM2.push(areaM2(i));
    if (count === 2) {
      members.push([nodeAt(L - from[0], from[1]), nodeAt(L - to[0], to[1])]);
      areasM2.push(areaM2(i));
    }
  });
  const truss = planeTruss({
    nodes,
    members,
    areasM2,
    supports: [
      { node: nodeAt(0, 0), x: true, z: true },
      { node: nodeAt(L, 0), x: false, z: true },
    ],
  });
  return { truss, memberAt, floorNodes: [...geometry.nodesM].map((x) => nodeAt(x, 0)) };
}
