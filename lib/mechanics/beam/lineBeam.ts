import { bandWidth, factorBand, solveBand } from './bandFactor.ts';
import { beamMesh, type BeamGeometry } from './beamMesh.ts';

/**
 * A continuous beam on rigid and elastic supports, ready to be loaded. Stiffness is constant within an element
 * (the mean flexibility of the element, by Simpson), so the cubic of a Hermite element is exact between stations.
 */
export interface LineBeam {
  readonly spansM: readonly number[];
  readonly lengthM: number;
  /** Stations, m from the first support (negative on an overhang before it). */
  readonly xM: Float64Array;
  /** Station of each rigid support. */
  readonly supportAt: readonly number[];
  /** Station of each spring, in the order given. */
  readonly springAt: readonly number[];
  readonly springKNPerM: readonly number[];
  /** Bending stiffness of each element, kNm2. */
  readonly eiKNm2: Float64Array;
  /** Freedoms: deflection, rotation just left and just right of each station (equal unless hinged). */
  readonly freedoms: {
    readonly count: number;
    readonly w: Int32Array;
    readonly left: Int32Array;
    readonly right: Int32Array;
  };
  /** Band of the stiffness matrix before supports are fixed (for settlements), and its factors after. */
  readonly stiffness: Float64Array;
  readonly factors: Float64Array;
  /** Freedoms held at a prescribed value. */
  readonly fixed: readonly number[];
  /**
   * Influence line of every reaction, rigid supports first, then springs: four numbers an element (value and slope
   * at its left end, value and slope at its right end).
   */
  readonly reactionLines: readonly Float64Array[];
  /** The same for the moment at a start built in against rotation; null at an ordinary start. */
  readonly startMomentLine: Float64Array | null;
}

/**
 * Builds and factors a line beam by the displacement method with Hermite elements (any text on matrix analysis).
 * @throws RangeError for impossible geometry or stiffness, or when hinges make the beam a mechanism.
 */
export function lineBeam(geometry: BeamGeometry): LineBeam {
  const mesh = beamMesh(geometry);
  const { xM } = mesh;
  const n = xM.length;
  const freedoms = numberFreedoms(n, mesh.hingeAt);
  const eiKNm2 = elementStiffness(xM, geometry.eiKNm2);
  const springKNPerM = (geometry.springs ?? []).map((spring) => spring.kNPerM);

  const stiffness = new Float64Array(bandWidth * freedoms.count);
  assemble(stiffness, xM, eiKNm2, freedoms);
  mesh.springAt.forEach((station, i) => {
    const k = springKNPerM[i]!;
    if (!(k >= 0)) throw new RangeError(`springs[${i}].kNPerM: expected 0 or more, received ${k}`);
    stiffness[bandWidth * freedoms.w[station]!]! += k;
  });

  const fixed = mesh.supportAt.map((station) => freedoms.w[station]!);
  if (geometry.fixedEnds?.start) fixed.push(freedoms.right[0]!);
  if (geometry.fixedEnds?.end) fixed.push(freedoms.left[n - 1]!);
  const factors = Float64Array.from(stiffness);
  for (const freedom of fixed) isolate(factors, freedoms.count, freedom);
  if (factorBand(factors, freedoms.count) >= 0) {
    throw new RangeError('hinges: expected a beam that stands, received a mechanism; remove a hinge');
  }

  const beam = {
    spansM: [...geometry.spansM],
    lengthM: xM[n - 1]! - xM[0]!,
    xM,
    supportAt: mesh.supportAt,
    springAt: mesh.springAt,
    springKNPerM,
    eiKNm2,
    freedoms,
    stiffness,
    factors,
    fixed,
    reactionLines: [] as Float64Array[],
    startMomentLine: null as Float64Array | null,
  };
  const u = new Float64Array(freedoms.count);
  for (let j = 0; j < mesh.supportAt.length; j++) {
    u.fill(0);
    prescribe(beam, fixed[j]!, 1, u);
    solveBand(factors, freedoms.count, u);
    beam.reactionLines.push(elementLine(beam, u));
  }
  mesh.springAt.forEach((station, i) => {
    u.fill(0);
    u[freedoms.w[station]!] = springKNPerM[i]!;
    for (const freedom of fixed) u[freedom] = 0;
    solveBand(factors, freedoms.count, u);
    beam.reactionLines.push(elementLine(beam, u));
  });
  if (geometry.fixedEnds?.start) {
    u.fill(0);
    // Unit load and unit end rotation do the same work on each other (Betti), so the moment is minus the shape.
    prescribe(beam, freedoms.right[0]!, -1, u);
    solveBand(factors, freedoms.count, u);
    beam.startMomentLine = elementLine(beam, u);
  }
  return beam;
}

type Skeleton = Pick<LineBeam, 'xM' | 'freedoms' | 'stiffness' | 'fixed'>;

/** Adds to the right side `b` the effect of holding `freedom` at `value`. */
export function prescribe(beam: Skeleton, freedom: number, value: number, b: Float64Array): void {
  const { stiffness, freedoms } = beam;
  for (let d = 1; d < bandWidth; d++) {
    if (freedom + d < freedoms.count) b[freedom + d]! -= stiffness[bandWidth * (freedom + d) + d]! * value;
    if (freedom - d >= 0) b[freedom - d]! -= stiffness[bandWidth * freedom + d]! * value;
  }
  // Held neighbours take no load of their own.
  for (const held of beam.fixed) b[held] = 0;
  b[freedom] = value;
}

/** Deflected shape `u` as four numbers an element: value and slope at the left end, value and slope at the right end. */
export function elementLine(beam: Pick<LineBeam, 'xM' | 'freedoms'>, u: Float64Array): Float64Array {
  const elements = beam.xM.length - 1;
  const { w, left, right } = beam.freedoms;
  const line = new Float64Array(4 * elements);
  for (let e = 0; e < elements; e++) {
    line[4 * e] = u[w[e]!]!;
    line[4 * e + 1] = u[right[e]!]!;
    line[4 * e + 2] = u[w[e + 1]!]!;
    line[4 * e + 3] = u[left[e + 1]!]!;
  }
  return line;
}

/** A hinge splits the rotation; ordering left rotation, deflection, right rotation keeps the band at three. */
function numberFreedoms(n: number, hingeAt: readonly number[]): LineBeam['freedoms'] {
  const w = new Int32Array(n);
  const left = new Int32Array(n);
  const right = new Int32Array(n);
  let count = 0;
  for (let i = 0; i < n; i++) {
    if (hingeAt.includes(i) && i > 0 && i < n - 1) {
      left[i] = count++;
      w[i] = count++;
      right[i] = count++;
    } else {
      w[i] = count++;
      left[i] = right[i] = count++;
    }
  }
  return { count, w, left, right };
}

function elementStiffness(xM: Float64Array, ei: ((xM: number) => number) | undefined): Float64Array {
  const result = new Float64Array(xM.length - 1).fill(1);
  if (!ei) return result;
  const flexibilityAt = (x: number): number => {
    const value = ei(x);
    if (!(value > 0)) throw new RangeError(`eiKNm2: expected more than 0 at x = ${x} m, received ${value}`);
    return 1 / value;
  };
  for (let e = 0; e < result.length; e++) {
    const a = xM[e]!;
    const b = xM[e + 1]!;
    // Step just inside the element, so that a jump of stiffness at a station falls on the right side.
    const inset = 1e-9 * (b - a);
    const mean = (flexibilityAt(a + inset) + 4 * flexibilityAt((a + b) / 2) + flexibilityAt(b - inset)) / 6;
    result[e] = 1 / mean;
  }
  return result;
}

/** Stiffness of a prismatic element: EI/h3 [12, 6h, -12, 6h; 6h, 4h2, -6h, 2h2; ...]. */
function assemble(K: Float64Array, xM: Float64Array, ei: Float64Array, freedoms: LineBeam['freedoms']): void {
  const add = (i: number, j: number, value: number): void => {
    const row = Math.max(i, j);
    K[bandWidth * row + (row - Math.min(i, j))]! += value;
  };
  for (let e = 0; e < ei.length; e++) {
    const h = xM[e + 1]! - xM[e]!;
    const k = ei[e]! / h ** 3;
    const w0 = freedoms.w[e]!;
    const r0 = freedoms.right[e]!;
    const w1 = freedoms.w[e + 1]!;
    const r1 = freedoms.left[e + 1]!;
    add(w0, w0, 12 * k);
    add(r0, w0, 6 * h * k);
    add(r0, r0, 4 * h * h * k);
    add(w1, w0, -12 * k);
    add(w1, r0, -6 * h * k);
    add(w1, w1, 12 * k);
    add(r1, w0, 6 * h * k);
    add(r1, r0, 2 * h * h * k);
    add(r1, w1, -6 * h * k);
    add(r1, r1, 4 * h * h * k);
  }
}

/** Replaces a row and column by the identity, so that its unknown takes the value on the right side. */
function isolate(A: Float64Array, n: number, freedom: number): void {
  for (let d = 1; d < bandWidth; d++) {
    A[bandWidth * freedom + d] = 0;
    if (freedom + d < n) A[bandWidth * (freedom + d) + d] = 0;
  }
  A[bandWidth * freedom] = 1;
}
