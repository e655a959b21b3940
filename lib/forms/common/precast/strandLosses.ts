import { materials } from '../../../actions/index.ts';
import { pretensioned } from './pretensioned.ts';
import type { PrecastModel } from './precastModel.ts';

/** Stress of the strands after release and after all losses, MPa. */
export interface StrandStress {
  readonly transferMPa: number;
  readonly lastingMPa: number;
  readonly elasticMPa: number;
}

/**
 * Losses of `count` strands at eccentricity `eM` under the beam centroid, at midspan of a span of `spanM`.
 *
 * Elastic shortening by the closed form of AASHTO LRFD C5.9.3.2.3a-1 on the gross section. Long-term: approximate estimate
 * of AASHTO LRFD 5.9.3.3, or shrinkage, creep and relaxation together by EN 1992-1-1 (5.46). All from memory; no gain from
 * the weight of the slab is counted under AASHTO.
 */
export function strandLosses(model: PrecastModel, count: number, eM: number, spanM: number): StrandStress {
  const { shape, jackMPa, releaseConcrete } = model;
  const strand = materials.strand[model.standardId];
  const areaM2 = count * model.strandM2;
  const own = (model.ownKNm * spanM ** 2) / 8 / 1e3;
  const stiff = shape.inertiaM4 + eM * eM * shape.areaM2;
  const ratio = strand.eMPa / releaseConcrete.ecmMPa;
  const elasticMPa =
    (areaM2 * jackMPa * stiff - eM * own * shape.areaM2) /
    (areaM2 * stiff + (shape.areaM2 * shape.inertiaM4) / ratio);
  const transferMPa = jackMPa - elasticMPa;
  const later =
    model.standardId === 'hl93'
      ? approximate(model, areaM2)
      : together(model, areaM2, eM, spanM, transferMPa, strand.eMPa);
  return { transferMPa, lastingMPa: transferMPa - later, elasticMPa };
}

const ksi = 6.894757;

function approximate(model: PrecastModel, areaM2: number): number {
  const { humidity, relaxationMPa } = pretensioned.longTerm;
  const moist = 1.7 - 0.01 * humidity;
  const strength = 5 / (1 + model.releaseConcrete.fckMPa / ksi);
  const creep = 10 * model.jackMPa * (areaM2 / model.shape.areaM2) * moist * strength;
  return creep + 12 * ksi * moist * strength + relaxationMPa;
}

function together(
  model: PrecastModel,
  areaM2: number,
  eM: number,
  spanM: number,
  transferMPa: number,
  eMPa: number,
): number {
  const { creep, shrinkage } = pretensioned.longTerm;
  const { shape, composite } = model;
  const force = areaM2 * transferMPa;
  const dead = ((model.ownKNm + model.wetKNm) * spanM ** 2) / 8 / 1e3;
  const added = (model.superimposedKNm * spanM ** 2) / 8 / 1e3;
  const strandM = shape.centroidM - eM;
  const pressed =
    force / shape.areaM2 +
    (force * eM - dead) * (eM / shape.inertiaM4) -
    (added * (composite.centroidM - strandM)) / composite.inertiaM4;
  const ratio = eMPa / model.beamConcrete.ecmMPa;
  const held =
    1 +
    ratio * (areaM2 / shape.areaM2) * (1 + (shape.areaM2 / shape.inertiaM4) * eM * eM) * (1 + 0.8 * creep);
  const relaxed = 0.8 * relaxation(transferMPa, materials.strand.lm1.ultimateMPa) * transferMPa;
  return (shrinkage * eMPa + relaxed + ratio * creep * Math.max(0, pressed)) / held;
}

/** Relaxation of class 2 strand after 500,000 hours, share of its stress: EN 1992-1-1 (3.29), from memory. */
function relaxation(stressMPa: number, ultimateMPa: number): number {
  const mu = stressMPa / ultimateMPa;
  return (
    0.66 * 100 * pretensioned.longTerm.relaxation1000 * Math.exp(9.1 * mu) * 500 ** (0.75 * (1 - mu)) * 1e-5
  );
}
