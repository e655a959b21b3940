import { addEntry, factorSkyline, makeSkyline, solveSkyline, type Skyline } from './skyline.ts';

/** A pin-jointed plane truss. Number the nodes along the truss: the work grows with how far apart joined nodes are numbered. */
export interface TrussGeometry {
  /** [x, z] of each node, m, z up. */
  readonly nodes: readonly (readonly [x: number, z: number])[];
  /** Nodes joined by each member. */
  readonly members: readonly (readonly [from: number, to: number])[];
  /** Area of each member, m2, > 0. */
  readonly areasM2: readonly number[];
  /** Which directions each support holds. */
  readonly supports: readonly { readonly node: number; readonly x: boolean; readonly z: boolean }[];
  /** Modulus, MPa; 210000 when absent. */
  readonly eMPa?: number;
}

/** A factored truss. */
export interface PlaneTruss {
  readonly geometry: TrussGeometry;
  readonly lengthM: Float64Array;
  /** Direction cosines of each member. */
  readonly cosX: Float64Array;
  readonly cosZ: Float64Array;
  /** EA / l of each member, kN/m. */
  readonly stiffness: Float64Array;
  readonly held: readonly number[];
  readonly factors: Skyline;
}

/** A load at a node: z positive downward, x positive to the right. */
export interface NodeLoad {
  readonly node: number;
  readonly zKN?: number;
  readonly xKN?: number;
}

export interface TrussEffects {
  /** Tension positive. */
  readonly memberKN: Float64Array;
  /** Downward positive, one a node. */
  readonly deflectionM: Float64Array;
  /** Upward positive, one a support. */
  readonly reactionKN: Float64Array;
}

/**
 * Builds and factors a truss by the displacement method.
 * @throws RangeError for a member without length or area, or a truss that does not stand
 */
export function planeTruss(geometry: TrussGeometry): PlaneTruss {
  const { nodes, members, areasM2 } = geometry;
  const e = geometry.eMPa ?? 210000;
  const m = members.length;
  const lengthM = new Float64Array(m);
  const cosX = new Float64Array(m);
  const cosZ = new Float64Array(m);
  const stiffness = new Float64Array(m);
  const rows = members.map(([i, j]) => [2 * i, 2 * i + 1, 2 * j, 2 * j + 1]);
  const K = makeSkyline(2 * nodes.length, rows);
  for (let k = 0; k < m; k++) {
    const [i, j] = members[k]!;
    const dx = nodes[j]![0] - nodes[i]![0];
    const dz = nodes[j]![1] - nodes[i]![1];
    const l = Math.hypot(dx, dz);
    const area = areasM2[k]!;
    if (!(l > 0)) throw new RangeError(`members[${k}]: expected a length above 0, received ${l} m`);
    if (!(area > 0)) throw new RangeError(`areasM2[${k}]: expected more than 0, received ${area}`);
    lengthM[k] = l;
    const c = (cosX[k] = dx / l);
    const s = (cosZ[k] = dz / l);
    const stiff = (stiffness[k] = (1000 * e * area) / l);
    const direction = [-c, -s, c, s];
    for (let a = 0; a < 4; a++) {
      for (let b = a; b < 4; b++)
        addEntry(K, rows[k]![a]!, rows[k]![b]!, stiff * direction[a]! * direction[b]!);
    }
  }
  const held = geometry.supports.flatMap((support) => [
    ...(support.x ? [2 * support.node] : []),
    ...(support.z ? [2 * support.node + 1] : []),
  ]);
  for (const row of held) hold(K, row);
  const failed = factorSkyline(K);
  if (failed >= 0) {
    throw new RangeError(
      `truss: expected one that stands, received a mechanism at node ${failed >> 1}; add a member or support`,
    );
  }
  return { geometry, lengthM, cosX, cosZ, stiffness, held, factors: K };
}

/** Member forces, deflections and reactions under loads at nodes. */
export function trussForces(truss: PlaneTruss, loads: readonly NodeLoad[]): TrussEffects {
  const { nodes, members, supports } = truss.geometry;
  const b = new Float64Array(2 * nodes.length);
  for (const load of loads) {
    b[2 * load.node]! += load.xKN ?? 0;
    b[2 * load.node + 1]! -= load.zKN ?? 0;
  }
  const applied = b.slice();
  for (const row of truss.held) b[row] = 0;
  solveSkyline(truss.factors, b);
  const memberKN = new Float64Array(members.length);
  // What members pull upward on each node.
  const pull = new Float64Array(nodes.length);
  for (let k = 0; k < members.length; k++) {
    const [i, j] = members[k]!;
    const force = memberForce(truss, k, b);
    memberKN[k] = force;
    pull[i]! += force * truss.cosZ[k]!;
    pull[j]! -= force * truss.cosZ[k]!;
  }
  return {
    memberKN,
    deflectionM: Float64Array.from(nodes, (_, node) => -b[2 * node + 1]!),
    reactionKN: Float64Array.from(supports, (support) =>
      support.z ? -pull[support.node]! - applied[2 * support.node + 1]! : 0,
    ),
  };
}

/**
 * Influence lines of all members and supports for a unit load that goes down along the loaded nodes.
 * @returns for each member (tension +) and each support (up +), one ordinate a loaded node
 */
export function trussInfluence(
  truss: PlaneTruss,
  loadedNodes: readonly number[],
): {
  readonly member: readonly Float64Array[];
  readonly reaction: readonly Float64Array[];
  readonly xM: Float64Array;
} {
  const { members, nodes, supports } = truss.geometry;
  const member = members.map(() => new Float64Array(loadedNodes.length));
  const reaction = supports.map(() => new Float64Array(loadedNodes.length));
  loadedNodes.forEach((node, at) => {
    const effects = trussForces(truss, [{ node, zKN: 1 }]);
    for (let k = 0; k < member.length; k++) member[k]![at] = effects.memberKN[k]!;
    for (let s = 0; s < reaction.length; s++) reaction[s]![at] = effects.reactionKN[s]!;
  });
  return { member, reaction, xM: Float64Array.from(loadedNodes, (node) => nodes[node]![0]) };
}

function memberForce(truss: PlaneTruss, k: number, u: Float64Array): number {
  const [i, j] = truss.geometry.members[k]!;
  const along = truss.cosX[k]! * (u[2 * j]! - u[2 * i]!) + truss.cosZ[k]! * (u[2 * j + 1]! - u[2 * i + 1]!);
  return truss.stiffness[k]! * along;
}

/** Replaces a row and column by the identity. */
function hold(K: Skyline, row: number): void {
  for (let i = K.first[row]!; i < row; i++) K.values[K.diagonal[row]! - (row - i)] = 0;
  for (let j = row + 1; j < K.n; j++) {
    if (K.first[j]! <= row) K.values[K.diagonal[j]! - (j - row)] = 0;
  }
  K.values[K.diagonal[row]!] = 1;
}
