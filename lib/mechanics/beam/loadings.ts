import { effectsOf, type Effects } from './effects.ts';
import type { LineBeam } from './lineBeam.ts';

/** Uniform load, kN/m downward, on the whole beam or one value for each span; an overhang carries that of the span beside it. */
export function uniform(beam: LineBeam, wKNm: number | readonly number[]): Effects {
  const W = new Float64Array(beam.xM.length - 1);
  let span = 0;
  for (let e = 0; e < W.length; e++) {
    if (span < beam.spansM.length - 1 && e === beam.supportAt[span + 1]) span++;
    W[e] = typeof wKNm === 'number' ? wKNm : (wKNm[span] ?? 0);
  }
  return stepped(beam, W);
}

/** Load that is uniform within each element, kN/m downward: one value an element, stations less one. */
export function stepped(beam: LineBeam, wKNm: Float64Array): Effects {
  const { xM } = beam;
  if (wKNm.length !== xM.length - 1) {
    throw new RangeError(`wKNm: expected ${xM.length - 1} values, one an element, received ${wKNm.length}`);
  }
  const held = new Float64Array(4 * (xM.length - 1));
  for (let e = 0; e < wKNm.length; e++) holdLinear(held, e, xM[e + 1]! - xM[e]!, wKNm[e]!, wKNm[e]!);
  return effectsOf(beam, { heldEnds: held });
}

/** Load per metre given at the stations, kN/m downward, straight between them. */
export function distributed(beam: LineBeam, wKNm: Float64Array): Effects {
  const { xM } = beam;
  checkStations(beam, wKNm, 'wKNm');
  const held = new Float64Array(4 * (xM.length - 1));
  for (let e = 0; e < xM.length - 1; e++) holdLinear(held, e, xM[e + 1]! - xM[e]!, wKNm[e]!, wKNm[e + 1]!);
  return effectsOf(beam, { heldEnds: held });
}

/** Downward settlement of the rigid supports, m; missing entries are 0. */
export function settle(beam: LineBeam, settlementM: readonly number[]): Effects {
  return effectsOf(beam, { heldEnds: new Float64Array(4 * (beam.xM.length - 1)), settlementM });
}

/**
 * Curvature the beam would take if free (temperature gradient, shrinkage, tendons), 1/m at the stations, straight
 * between them, positive where it sags the beam. The moments are the parasitic ones: nil in a simple span.
 */
export function imposedCurvature(beam: LineBeam, kappa1PerM: Float64Array): Effects {
  const { xM, ends } = beam;
  checkStations(beam, kappa1PerM, 'kappa1PerM');
  const held = new Float64Array(4 * (xM.length - 1));
  for (let e = 0; e < xM.length - 1; e++) {
    // The free ends would turn by h (2 k0 + k1) / 6 and -h (k0 + 2 k1) / 6; holding them takes these moments.
    const h = xM[e + 1]! - xM[e]!;
    const turnLeft = (h * (2 * kappa1PerM[e]! + kappa1PerM[e + 1]!)) / 6;
    const turnRight = (-h * (kappa1PerM[e]! + 2 * kappa1PerM[e + 1]!)) / 6;
    const left = -(ends[3 * e]! * turnLeft + ends[3 * e + 1]! * turnRight);
    const right = ends[3 * e + 1]! * turnLeft + ends[3 * e + 2]! * turnRight;
    const shear = (right - left) / h;
    held[4 * e] = left;
    held[4 * e + 1] = shear;
    held[4 * e + 2] = right;
    held[4 * e + 3] = shear;
  }
  return effectsOf(beam, { heldEnds: held });
}

/** A downward load at a point. */
export interface PointLoad {
  readonly xM: number;
  readonly loadKN: number;
}

/** Point loads anywhere on the beam. @throws RangeError for a load off the beam. */
export function pointLoads(beam: LineBeam, loads: readonly PointLoad[]): Effects {
  const { xM } = beam;
  const held = new Float64Array(4 * (xM.length - 1));
  const stationKN = new Float64Array(xM.length);
  for (const load of loads) {
    const last = xM[xM.length - 1]!;
    if (!(load.xM >= xM[0]! && load.xM <= last)) {
      throw new RangeError(`point load: expected ${xM[0]} to ${last} m, received ${load.xM}`);
    }
    const e = elementAt(xM, load.xM);
    const h = xM[e + 1]! - xM[e]!;
    const a = load.xM - xM[e]!;
    const b = h - a;
    if (a < 1e-9 * h) stationKN[e]! += load.loadKN;
    else if (b < 1e-9 * h) stationKN[e + 1]! += load.loadKN;
    else {
      const shear = (load.loadKN * b * b * (3 * a + b)) / h ** 3;
      held[4 * e]! -= (load.loadKN * a * b * b) / (h * h);
      held[4 * e + 1]! += shear;
      held[4 * e + 2]! -= (load.loadKN * a * a * b) / (h * h);
      held[4 * e + 3]! += shear - load.loadKN;
    }
  }
  return effectsOf(beam, { heldEnds: held, stationKN });
}

/** Element that holds x: the last one that starts at or before it. */
export function elementAt(xM: ArrayLike<number>, x: number): number {
  let low = 0;
  let high = xM.length - 2;
  while (low < high) {
    const middle = (low + high + 1) >> 1;
    if (xM[middle]! <= x) low = middle;
    else high = middle - 1;
  }
  return low;
}

/** End forces of a held element under a load running straight from w0 to w1: moments h2(3w0+2w1)/60 and h2(2w0+3w1)/60. */
function holdLinear(held: Float64Array, e: number, h: number, w0: number, w1: number): void {
  held[4 * e]! -= (h * h * (3 * w0 + 2 * w1)) / 60;
  held[4 * e + 1]! += (h * (7 * w0 + 3 * w1)) / 20;
  held[4 * e + 2]! -= (h * h * (2 * w0 + 3 * w1)) / 60;
  held[4 * e + 3]! -= (h * (3 * w0 + 7 * w1)) / 20;
}

function checkStations(beam: LineBeam, values: Float64Array, name: string): void {
  if (values.length !== beam.xM.length) {
    throw new RangeError(
      `${name}: expected ${beam.xM.length} values, one a station, received ${values.length}`,
    );
  }
}
