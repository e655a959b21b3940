import { elementsPerSpan, type PrecastModel } from './precastModel.ts';

/** Characteristic moments of one beam at a station, kNm, and what design makes of them. */
export interface BeamMoments {
  /** Own weight of the beam alone, and with wet slab and diaphragms, on a simple span. */
  own: number;
  simple: number;
  superimposed: number;
  trafficMax: number;
  /** Superimposed load and the service share of traffic. */
  later: number;
  /** Design moment in sagging. */
  design: number;
}

/** Fills `out` with the moments `i` stations into a span, i = 0 to `elementsPerSpan`. */
export function beamMoments(model: PrecastModel, span: number, i: number, out: BeamMoments): void {
  const spanM = model.task.spansM[span]!;
  const x = (spanM * i) / elementsPerSpan;
  const bend = (x * (spanM - x)) / 2;
  const { uls } = model.standard.factors;
  out.own = model.ownKNm * bend;
  out.simple = out.own + model.wetKNm * bend + diaphragmMoment(model, spanM, x);
  const alone = model.simple[span]!;
  out.superimposed = alone.superimposed.momentKNm[i]!;
  out.trafficMax = alone.most.momentMaxKNm[i]!;
  out.later = out.superimposed + alone.service.momentMaxKNm[i]!;
  out.design =
    uls.permanent * out.simple + uls.superimposed * out.superimposed + uls.traffic * out.trafficMax;
}

/** Diaphragms within a span. */
export function diaphragmsWithin({ kind }: PrecastModel, spanM: number): number {
  const { everyM } = kind.diaphragm;
  return everyM === undefined ? 0 : Math.ceil(spanM / everyM - 1e-9) - 1;
}

/** Moment of the diaphragms within a simple span at x, kNm. */
function diaphragmMoment(model: PrecastModel, spanM: number, x: number): number {
  const count = diaphragmsWithin(model, spanM);
  let moment = 0;
  for (let k = 1; k <= count; k++) {
    const a = (spanM * k) / (count + 1);
    const load = model.diaphragmKN;
    moment += x <= a ? (load * (spanM - a) * x) / spanM : (load * a * (spanM - x)) / spanM;
  }
  return moment;
}

/** An empty record for `beamMoments`. */
export function noMoments(): BeamMoments {
  return { own: 0, simple: 0, superimposed: 0, trafficMax: 0, later: 0, design: 0 };
}
