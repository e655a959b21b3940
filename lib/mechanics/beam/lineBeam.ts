import { bandWidth, factorBand, solveBand } from './bandFactor.ts';
import { endStiffness, type EndStiffness } from './elementStiffness.ts';
import { beamMesh, type BeamGeometry } from './beamMesh.ts';

/**
 * A continuous beam on rigid and elastic supports, ready to be loaded. Elements take the stiffness along them by their
 * flexibilities, so that station values are exact for loads at stations; between stations lines follow the cubic through
 * the values and slopes at both ends, exact where the stiffness is constant.
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
  /** End stiffnesses of each element. */
  readonly ends: EndStiffness;
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
  /** Element line, see `reactionLines`, of the moment at a start built in against rotation; null at an ordinary start. */
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
  const ends = endStiffness(xM, geometry.eiKNm2);
  const springKNPerM = (geometry.springs ?? []).map((spring) => spring.kNPerM);

  const stiffness = new Float64Array(bandWidth * freedoms.count);
  assemble(stiffness, xM, ends, freedoms);
  mesh.springAt.forEach((station, i) => {
    const k = springKNPerM[i]!;
    if (!(k >= 0)) throw new RangeError(`springs[${i}].kNPerM: expected 0 or more, received ${k}`);
    stiffness[bandWidth * freedoms.w[station]!]! += k;
  });

  const fixed = mesh.supportAt.map((station) => freedoms.w[station]!);
  if (geometry.fixedEnds?.start) fixed.push(freedoms.right[0]!);
  if (geometry.fixedEnds?.end) fixed.push(freedoms.left[n - 1]!);
  const factors = stiffness.slice();
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
    ends,
    freedoms,
    stiffness,
    factors,
    fixed,
    startMomentLine: null as Float64Array | null,
  };
  if (geometry.fixedEnds?.start) {
    const u = new Float64Array(freedoms.count);
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

/** Adds each element: end rotations against the chord are r0 + (w0 - w1)/h and r1 + (w0 - w1)/h. */
function assemble(
  K: Float64Array,
  xM: Float64Array,
  ends: EndStiffness,
  freedoms: LineBeam['freedoms'],
): void {
  const add = (i: number, j: number, value: number): void => {
    const row = Math.max(i, j);
    K[bandWidth * row + (row - Math.min(i, j))]! += value;
  };
  for (let e = 0; e < xM.length - 1; e++) {
    const h = xM[e + 1]! - xM[e]!;
    const aa = ends[3 * e]!;
    const ab = ends[3 * e + 1]!;
    const bb = ends[3 * e + 2]!;
    const left = (aa + ab) / h;
    const right = (ab + bb) / h;
    const across = (left + right) / h;
    const w0 = freedoms.w[e]!;
    const r0 = freedoms.right[e]!;
    const w1 = freedoms.w[e + 1]!;
    const r1 = freedoms.left[e + 1]!;
    add(w0, w0, across);
    add(r0, w0, left);
    add(r0, r0, aa);
    add(w1, w0, -across);
    add(w1, r0, -left);
    add(w1, w1, across);
    add(r1, w0, right);
    add(r1, r0, ab);
    add(r1, w1, -right);
    add(r1, r1, bb);
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
