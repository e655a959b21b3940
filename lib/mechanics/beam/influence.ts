import { solveBand } from './bandFactor.ts';
import { elementLine, type LineBeam } from './lineBeam.ts';
import { reactionLines } from './reactionLines.ts';

/**
 * Influence lines for a unit load that goes down. Element lines hold four numbers an element (value and slope at its
 * left end, value and slope at its right end) and are exact cubics between; the exported station lines are their
 * values at the stations, and at a jump the value just right of the station.
 * Method: reactions by Mueller-Breslau, moments and shears from reactions by statics.
 */

/** Adds `factor` times the element line B to A. */
export function addLine(A: Float64Array, factor: number, B: Float64Array): void {
  for (let i = 0; i < A.length; i++) A[i] = A[i]! + factor * B[i]!;
}

/** Adds -(x_s - x)+, the moment at station s of a unit load to its left. */
function addLoadMoment(line: Float64Array, xM: Float64Array, station: number): void {
  const at = xM[station]!;
  for (let e = 0; e < station; e++) {
    line[4 * e]! -= at - xM[e]!;
    line[4 * e + 1]! += 1;
    line[4 * e + 2]! -= at - xM[e + 1]!;
    line[4 * e + 3]! += 1;
  }
}

/** Adds -1 to the left of station s, the shear there of a unit load to its left. */
function addLoadShear(line: Float64Array, station: number): void {
  for (let e = 0; e < station; e++) {
    line[4 * e]! -= 1;
    line[4 * e + 2]! -= 1;
  }
}

/** Element line of the moment at a station, kNm per kN. */
export function momentLine(beam: LineBeam, station: number): Float64Array {
  const { xM } = beam;
  const line = beam.startMomentLine ? beam.startMomentLine.slice() : emptyLine(beam);
  sources(beam).forEach((at, j) => {
    if (at < station) addLine(line, xM[station]! - xM[at]!, reactionLines(beam)[j]!);
  });
  addLoadMoment(line, xM, station);
  return line;
}

/** Element line of the shear just left or right of a station, kN per kN. */
export function shearLine(beam: LineBeam, station: number, side: 'left' | 'right'): Float64Array {
  const line = emptyLine(beam);
  sources(beam).forEach((at, j) => {
    if (at < station || (at === station && side === 'right')) addLine(line, 1, reactionLines(beam)[j]!);
  });
  addLoadShear(line, station);
  return line;
}

/** Element line of the deflection at a station, m per kN (Maxwell: the shape under a unit load there). */
export function deflectionLine(beam: LineBeam, station: number): Float64Array {
  const u = new Float64Array(beam.freedoms.count);
  u[beam.freedoms.w[station]!] = 1;
  for (const freedom of beam.fixed) u[freedom] = 0;
  solveBand(beam.factors, beam.freedoms.count, u);
  return elementLine(beam, u);
}

/** Station of every reaction in the order of `reactionLines`. */
export function sources(beam: LineBeam): readonly number[] {
  return [...beam.supportAt, ...beam.springAt];
}

/** Moment at a station, kNm, of a unit load (1 kN) at every station. */
export function momentInfluence(beam: LineBeam, station: number): Float64Array {
  const { xM, startMomentLine } = beam;
  const x = xM[checked(beam, station)]!;
  const values = startMomentLine ? atStations(startMomentLine) : new Float64Array(xM.length);
  const last = xM.length - 1;
  // As in `momentLine`, at the stations alone.
  sources(beam).forEach((at, j) => {
    if (at >= station) return;
    const arm = x - xM[at]!;
    const line = reactionLines(beam)[j]!;
    for (let e = 0; e < last; e++) values[e] = values[e]! + arm * line[4 * e]!;
    values[last] = values[last]! + arm * line[4 * last - 2]!;
  });
  for (let e = 0; e < station; e++) values[e] = values[e]! - (x - xM[e]!);
  return values;
}

/** Shear just left or right of a station, kN, of a unit load at every station (a load on the station itself stands right of it). */
export function shearInfluence(
  beam: LineBeam,
  station: number,
  side: 'left' | 'right' = 'right',
): Float64Array {
  return atStations(shearLine(beam, checked(beam, station), side));
}

/** Reaction of a rigid support, kN, of a unit load at every station. */
export function reactionInfluence(beam: LineBeam, support: number): Float64Array {
  const line = reactionLines(beam)[support];
  if (!line || support >= beam.supportAt.length) {
    throw new RangeError(`support: expected 0 to ${beam.supportAt.length - 1}, received ${support}`);
  }
  return atStations(line);
}

/** Force of an elastic support, kN, of a unit load at every station. */
export function springInfluence(beam: LineBeam, spring: number): Float64Array {
  const line = reactionLines(beam)[beam.supportAt.length + spring];
  if (!line) throw new RangeError(`spring: expected 0 to ${beam.springAt.length - 1}, received ${spring}`);
  return atStations(line);
}

/** Deflection at a station, m, of a unit load at every station. */
export function deflectionInfluence(beam: LineBeam, station: number): Float64Array {
  return atStations(deflectionLine(beam, checked(beam, station)));
}

function emptyLine(beam: LineBeam): Float64Array {
  return new Float64Array(4 * (beam.xM.length - 1));
}

function atStations(line: Float64Array): Float64Array {
  const elements = line.length / 4;
  const values = new Float64Array(elements + 1);
  for (let e = 0; e < elements; e++) values[e] = line[4 * e]!;
  values[elements] = line[4 * elements - 2]!;
  return values;
}

function checked(beam: LineBeam, station: number): number {
  if (!(station >= 0 && station < beam.xM.length)) {
    throw new RangeError(`station: expected 0 to ${beam.xM.length - 1}, received ${station}`);
  }
  return station;
}
