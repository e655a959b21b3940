import { addEntry, factorSkyline, makeSkyline, solveSkyline, type Skyline } from './skyline.ts';

/** A plane frame of straight members rigidly joined. x to the right, z up, m; stiffnesses one a member. */
export interface FrameGeometry {
  readonly nodes: readonly (readonly [x: number, z: number])[];
  readonly members: readonly (readonly [start: number, end: number])[];
  readonly eaKN: ArrayLike<number>;
  readonly eiKNm2: ArrayLike<number>;
  readonly feet: readonly FrameFoot[];
}

/** How a node is held: kN/m along x and z, kNm per radian; Infinity holds it still, 0 leaves it free. */
export interface FrameFoot {
  readonly node: number;
  readonly alongKNPerM: number;
  readonly upKNPerM: number;
  readonly turnKNm: number;
}

/** A frame with its stiffness factored, for any number of load cases. */
export interface PlaneFrame {
  readonly geometry: FrameGeometry;
  readonly lengthM: Float64Array;
  /** Direction of each member. */
  readonly cos: Float64Array;
  readonly sin: Float64Array;
  /** Row of each degree of freedom (x, z and rotation of each node), -1 where it is held. */
  readonly row: Int32Array;
  readonly stiffness: Skyline;
}

/** One load case. */
export interface FrameLoad {
  /** Forces along x and z, kN, and moments, kNm (anticlockwise), three a node. */
  readonly nodal?: ArrayLike<number>;
  /** Free elongation of each member, m/m. */
  readonly strain?: ArrayLike<number>;
  /** Free curvature of each member, 1/m, positive where its right side (looking from start to end) grows longer. */
  readonly curvature1PerM?: ArrayLike<number>;
}

/** What a load case does. Bending is positive with tension on the right side of a member, looking from its start to its end. */
export interface FrameEffects {
  /** Tension positive, one a member, kN. */
  readonly normalKN: Float64Array;
  readonly startKNm: Float64Array;
  readonly endKNm: Float64Array;
  /** Rise of the moment along each member, kN. */
  readonly shearKN: Float64Array;
  /** Movements of the nodes: x, z, rotation. */
  readonly moved: Float64Array;
  /** Forces of each foot on the frame: along x, along z, moment (anticlockwise). */
  readonly feet: readonly (readonly [alongKN: number, upKN: number, momentKNm: number])[];
}

/**
 * Assembles and factors a frame: Euler members, axial stretch included, small movements.
 * @throws RangeError for a member without length or stiffness, or a frame that can move as a mechanism
 */
export function planeFrame(geometry: FrameGeometry): PlaneFrame {
  const { nodes, members, eaKN, eiKNm2, feet } = geometry;
  const held = new Uint8Array(3 * nodes.length);
  for (const { node, alongKNPerM, upKNPerM, turnKNm } of feet)
    [alongKNPerM, upKNPerM, turnKNm].forEach((k, d) => {
      if (k === Infinity) held[3 * node + d] = 1;
    });
  const row = new Int32Array(3 * nodes.length);
  let n = 0;
  for (let d = 0; d < row.length; d++) row[d] = held[d] ? -1 : n++;
  const lengthM = Float64Array.from(members, ([i, j]) =>
    Math.hypot(nodes[j]![0] - nodes[i]![0], nodes[j]![1] - nodes[i]![1]),
  );
  const cos = Float64Array.from(members, ([i, j], e) => (nodes[j]![0] - nodes[i]![0]) / lengthM[e]!);
  const sin = Float64Array.from(members, ([i, j], e) => (nodes[j]![1] - nodes[i]![1]) / lengthM[e]!);
  members.forEach((_, e) => {
    if (!(lengthM[e]! > 0 && eaKN[e]! > 0 && eiKNm2[e]! > 0))
      throw new RangeError(
        `member ${e + 1}: expected a length and stiffnesses above 0, received ${lengthM[e]} m, ${eaKN[e]} kN, ${eiKNm2[e]} kNm2`,
      );
  });
  const rowsOf = (e: number): number[] => dofs(members[e]!).map((d) => row[d]!);
  const stiffness = makeSkyline(
    n,
    members.map((_, e) => rowsOf(e).filter((r) => r >= 0)),
  );
  const k = new Float64Array(36);
  members.forEach((_, e) => {
    memberStiffness(geometry, lengthM[e]!, cos[e]!, sin[e]!, e, k);
    const rows = rowsOf(e);
    for (let a = 0; a < 6; a++)
      for (let b = 0; b <= a; b++)
        if (rows[a]! >= 0 && rows[b]! >= 0) addEntry(stiffness, rows[a]!, rows[b]!, k[6 * a + b]!);
  });
  for (const { node, alongKNPerM, upKNPerM, turnKNm } of feet)
    [alongKNPerM, upKNPerM, turnKNm].forEach((spring, d) => {
      const at = row[3 * node + d]!;
      if (at >= 0) addEntry(stiffness, at, at, spring);
    });
  if (factorSkyline(stiffness) >= 0)
    throw new RangeError('frame: expected feet that hold it still, received a mechanism; hold another node');
  return { geometry, lengthM, cos, sin, row, stiffness };
}

/** Works out one load case. */
export function frameEffects(frame: PlaneFrame, load: FrameLoad): FrameEffects {
  const { geometry, lengthM, cos, sin, row, stiffness } = frame;
  const { members, eaKN, eiKNm2, feet } = geometry;
  const { nodal, strain, curvature1PerM } = load;
  const forces = new Float64Array(row.length);
  if (nodal) for (let d = 0; d < row.length; d++) forces[d] = nodal[d]!;
  if (strain || curvature1PerM)
    for (let e = 0; e < members.length; e++) {
      // What a member that is kept from growing pushes its ends with.
      const force = eaKN[e]! * (strain?.[e] ?? 0);
      const moment = eiKNm2[e]! * (curvature1PerM?.[e] ?? 0);
      const i = 3 * members[e]![0];
      const j = 3 * members[e]![1];
      forces[i]! -= cos[e]! * force;
      forces[i + 1]! -= sin[e]! * force;
      forces[i + 2]! -= moment;
      forces[j]! += cos[e]! * force;
      forces[j + 1]! += sin[e]! * force;
      forces[j + 2]! += moment;
    }
  const b = new Float64Array(stiffness.n);
  for (let d = 0; d < row.length; d++) if (row[d]! >= 0) b[row[d]!] = forces[d]!;
  solveSkyline(stiffness, b);
  const moved = forces;
  for (let d = 0; d < row.length; d++) moved[d] = row[d]! >= 0 ? b[row[d]!]! : 0;
  const count = members.length;
  const normalKN = new Float64Array(count);
  const startKNm = new Float64Array(count);
  const endKNm = new Float64Array(count);
  const shearKN = new Float64Array(count);
  for (let e = 0; e < count; e++) {
    const i = 3 * members[e]![0];
    const j = 3 * members[e]![1];
    const L = lengthM[e]!;
    const alongX = moved[j]! - moved[i]!;
    const alongZ = moved[j + 1]! - moved[i + 1]!;
    const stretch = cos[e]! * alongX + sin[e]! * alongZ;
    const chord = (cos[e]! * alongZ - sin[e]! * alongX) / L;
    const turnI = moved[i + 2]! - chord;
    const turnJ = moved[j + 2]! - chord;
    const ei = eiKNm2[e]! / L;
    const free = curvature1PerM ? eiKNm2[e]! * curvature1PerM[e]! : 0;
    normalKN[e] = eaKN[e]! * (stretch / L - (strain ? strain[e]! : 0));
    // An anticlockwise end moment bends the start of a member against its right side and the end with it.
    startKNm[e] = -ei * (4 * turnI + 2 * turnJ) - free;
    endKNm[e] = ei * (2 * turnI + 4 * turnJ) - free;
    shearKN[e] = (endKNm[e]! - startKNm[e]!) / L;
  }
  return {
    normalKN,
    startKNm,
    endKNm,
    shearKN,
    moved,
    feet: feet.map(({ node }) => {
      const sum: [number, number, number] = [
        -(nodal?.[3 * node] ?? 0),
        -(nodal?.[3 * node + 1] ?? 0),
        -(nodal?.[3 * node + 2] ?? 0),
      ];
      for (let e = 0; e < count; e++) {
        const [i, j] = members[e]!;
        if (i !== node && j !== node) continue;
        const side = i === node ? 1 : -1;
        sum[0] += side * (-cos[e]! * normalKN[e]! - sin[e]! * shearKN[e]!);
        sum[1] += side * (-sin[e]! * normalKN[e]! + cos[e]! * shearKN[e]!);
        sum[2] += i === node ? -startKNm[e]! : endKNm[e]!;
      }
      return sum;
    }),
  };
}

const dofs = ([i, j]: readonly [number, number]): readonly number[] => [
  3 * i,
  3 * i + 1,
  3 * i + 2,
  3 * j,
  3 * j + 1,
  3 * j + 2,
];

/** Stiffness of a member in the axes of the frame, 6 x 6 by rows, lower half. */
function memberStiffness(
  { eaKN, eiKNm2 }: FrameGeometry,
  L: number,
  c: number,
  s: number,
  e: number,
  k: Float64Array,
): void {
  const a = eaKN[e]! / L;
  const v = (12 * eiKNm2[e]!) / L ** 3;
  const m = (6 * eiKNm2[e]!) / L ** 2;
  const t = (4 * eiKNm2[e]!) / L;
  const xx = a * c * c + v * s * s;
  const xz = (a - v) * c * s;
  const zz = a * s * s + v * c * c;
  const rows = [
    [xx],
    [xz, zz],
    [-m * s, m * c, t],
    [-xx, -xz, m * s, xx],
    [-xz, -zz, -m * c, xz, zz],
    [-m * s, m * c, t / 2, m * s, -m * c, t],
  ];
  rows.forEach((values, r) => {
    values.forEach((value, col) => {
      k[6 * r + col] = value;
    });
  });
}
