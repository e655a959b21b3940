import { imposedCurvature, type LineBeam } from '../../mechanics/index.ts';

/** Moment over each support from a unit of curvature at each station (falling to 0 at the next ones), supports outermost. */
export type OverSupports = readonly Float64Array[];

/** The moments over the supports from curvature at each station, found once for a beam. */
export function overSupports(beam: LineBeam): OverSupports {
  const n = beam.xM.length;
  const out = beam.supportAt.map(() => new Float64Array(n));
  const kappa = new Float64Array(n);
  for (let i = 0; i < n; i++) {
    kappa.fill(0);
    kappa[i] = 1;
    const { momentKNm } = imposedCurvature(beam, kappa);
    beam.supportAt.forEach((station, j) => {
      out[j]![i] = momentKNm[station]!;
    });
  }
  return out;
}

/** Parasitic moment of a curvature at the stations (see `imposedCurvature`), kNm: straight between the supports. */
export function parasiticKNm(beam: LineBeam, over: OverSupports, kappa: Float64Array): Float64Array {
  const { xM, supportAt } = beam;
  const atSupports = over.map((line) => {
    let sum = 0;
    for (let i = 0; i < kappa.length; i++) sum += line[i]! * kappa[i]!;
    return sum;
  });
  const moment = new Float64Array(kappa.length);
  for (let span = 0; span < supportAt.length - 1; span++) {
    const from = supportAt[span]!;
    const to = supportAt[span + 1]!;
    const lengthM = xM[to]! - xM[from]!;
    for (let i = from; i <= to; i++) {
      const share = (xM[i]! - xM[from]!) / lengthM;
      moment[i] = atSupports[span]! + share * (atSupports[span + 1]! - atSupports[span]!);
    }
  }
  return moment;
}
