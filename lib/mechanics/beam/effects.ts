import { solveBand } from './bandFactor.ts';
import { prescribe, type LineBeam } from './lineBeam.ts';

/** Forces and movements of a beam under one loading, at its stations. */
export interface Effects {
  /** Sagging positive. */
  readonly momentKNm: Float64Array;
  /** Upward force on the left minus downward load on the left; just left and just right of each station. */
  readonly shearLeftKN: Float64Array;
  readonly shearRightKN: Float64Array;
  /** Upward positive, one for each rigid support. */
  readonly reactionKN: Float64Array;
  /** Upward positive, one for each spring. */
  readonly springKN: Float64Array;
  /** Downward positive. */
  readonly deflectionM: Float64Array;
}

/** One loading as the solver takes it. All arrays are owned by the caller. */
export interface Loading {
  /** End forces of every element with its ends held: moment and shear at the left end, moment and shear at the right end. */
  readonly heldEnds: Float64Array;
  /** Downward loads at stations, kN. */
  readonly stationKN?: Float64Array;
  /** Downward settlement of each rigid support, m. */
  readonly settlementM?: readonly number[];
}

/** Solves one loading and recovers forces from the element ends. */
export function effectsOf(beam: LineBeam, loading: Loading): Effects {
  const { xM, freedoms, ends } = beam;
  const n = xM.length;
  const held = loading.heldEnds;
  const { w, left, right } = freedoms;
  const u = new Float64Array(freedoms.count);
  for (let e = 0; e < n - 1; e++) {
    u[w[e]!]! += held[4 * e + 1]!;
    u[right[e]!]! -= held[4 * e]!;
    u[w[e + 1]!]! -= held[4 * e + 3]!;
    u[left[e + 1]!]! += held[4 * e + 2]!;
  }
  const stationKN = loading.stationKN;
  if (stationKN) for (let i = 0; i < n; i++) u[w[i]!]! += stationKN[i]!;
  for (const freedom of beam.fixed) u[freedom] = 0;
  if (loading.settlementM) settleSupports(beam, loading.settlementM, u);
  solveBand(beam.factors, freedoms.count, u);

  const momentKNm = new Float64Array(n);
  const shearLeftKN = new Float64Array(n);
  const shearRightKN = new Float64Array(n);
  const deflectionM = new Float64Array(n);
  for (let e = 0; e < n - 1; e++) {
    const h = xM[e + 1]! - xM[e]!;
    const w0 = u[w[e]!]!;
    const w1 = u[w[e + 1]!]!;
    const chord = (w1 - w0) / h;
    const turnLeft = u[right[e]!]! - chord;
    const turnRight = u[left[e + 1]!]! - chord;
    const free = ends[3 * e]! * turnLeft + ends[3 * e + 1]! * turnRight;
    const far = -ends[3 * e + 1]! * turnLeft - ends[3 * e + 2]! * turnRight;
    const shear = (far - free) / h;
    const momentLeft = free + held[4 * e]!;
    const momentRight = far + held[4 * e + 2]!;
    if (e === 0) momentKNm[0] = momentLeft;
    momentKNm[e + 1] = momentRight;
    shearRightKN[e] = shear + held[4 * e + 1]!;
    shearLeftKN[e + 1] = shear + held[4 * e + 3]!;
    deflectionM[e] = w0;
    deflectionM[e + 1] = w1;
  }
  const reactionKN = new Float64Array(beam.supportAt.length);
  beam.supportAt.forEach((i, j) => {
    reactionKN[j] = shearRightKN[i]! - shearLeftKN[i]! + (stationKN ? stationKN[i]! : 0);
  });
  const springKN = new Float64Array(beam.springAt.length);
  beam.springAt.forEach((i, s) => {
    springKN[s] = beam.springKNPerM[s]! * deflectionM[i]!;
  });
  return { momentKNm, shearLeftKN, shearRightKN, reactionKN, springKN, deflectionM };
}

function settleSupports(beam: LineBeam, settlementM: readonly number[], u: Float64Array): void {
  const before = u.slice();
  for (let j = 0; j < beam.supportAt.length; j++) {
    const value = settlementM[j] ?? 0;
    if (value !== 0) prescribe(beam, beam.fixed[j]!, value, u);
  }
  // `prescribe` clears held freedoms each time: write all settlements again at the end.
  for (const freedom of beam.fixed) u[freedom] = before[freedom]!;
  for (let j = 0; j < beam.supportAt.length; j++) u[beam.fixed[j]!] = settlementM[j] ?? 0;
}
