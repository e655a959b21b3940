import { beamMoments, noMoments } from './beamMoments.ts';
import { pretensioned } from './pretensioned.ts';
import { elementsPerSpan, type PrecastModel } from './precastModel.ts';
import { strandBending } from './strandBending.ts';
import { strandsAt, type StrandPlan, type StrandsThere } from './strandPlan.ts';

/** One side of a check where it is used most. */
export interface Use {
  demand: number;
  capacity: number;
  use: number;
}

/** Uses of the strands of one span. Stresses MPa, moments kNm. */
export interface SpanUse {
  readonly tension: Use;
  readonly compression: Use;
  readonly bending: Use;
  readonly releaseTop: Use;
  readonly releaseBottom: Use;
}

const moments = noMoments();
const there: StrandsThere = { areaM2: 0, zM: 0 };

function worse(use: Use, demand: number, capacity: number): void {
  const ratio = demand <= 0 ? 0 : capacity > 0 ? demand / capacity : Infinity;
  if (ratio <= use.use && use.capacity > 0) return;
  use.demand = demand;
  use.capacity = capacity;
  use.use = ratio;
}

const none = (): Use => ({ demand: 0, capacity: 0, use: 0 });

/**
 * Service and ultimate bending of a span, and its ends at release. Demand of the tension check is the stress that the
 * loads pull the soffit with, its capacity what strands and allowed tension take up.
 */
export function spanUse(model: PrecastModel, span: number, plan: StrandPlan): SpanUse {
  const tension = none();
  const compression = none();
  const bending = none();
  const { shape, composite, standardId } = model;
  const { service } = pretensioned;
  const wBottom = shape.inertiaM4 / shape.centroidM;
  const wTop = shape.inertiaM4 / (shape.depthM - shape.centroidM);
  for (let i = 1; i < elementsPerSpan; i++) {
    beamMoments(model, span, i, moments);
    strandsAt(model, plan, i / elementsPerSpan, there);
    const eM = shape.centroidM - there.zM;
    const forceMN = there.areaM2 * plan.stress.lastingMPa;
    const pulled = moments.simple / 1e3 / wBottom + moments.later / 1e3 / composite.wBottomM3;
    const pressed = service.spread[standardId] * forceMN * (1 / shape.areaM2 + eM / wBottom);
    worse(tension, pulled, pressed + service.tensionMPa[standardId]);
    const top =
      forceMN * (1 / shape.areaM2 - eM / wTop) +
      moments.simple / 1e3 / wTop +
      (moments.superimposed + moments.trafficMax) / 1e3 / composite.wBeamTopM3;
    worse(compression, top, service.compression[standardId] * model.beamConcrete.fckMPa);
    worse(bending, moments.design, strandBending(model, there.areaM2, there.zM));
  }
  return { tension, compression, bending, ...releaseUse(model, span, plan) };
}

/** Stresses at release on the bare beam, at the end of the transfer length and at the stations up to midspan. */
export function releaseUse(
  model: PrecastModel,
  span: number,
  plan: StrandPlan,
): Pick<SpanUse, 'releaseTop' | 'releaseBottom'> {
  const releaseTop = none();
  const releaseBottom = none();
  const { shape, standardId, releaseConcrete } = model;
  const { release, relief } = pretensioned;
  const spanM = model.task.spansM[span]!;
  const wBottom = shape.inertiaM4 / shape.centroidM;
  const wTop = shape.inertiaM4 / (shape.depthM - shape.centroidM);
  const strength = releaseConcrete.fckMPa;
  const transfer = relief.transferDiameters * relief.diameterM[standardId];
  for (let i = 0; i <= elementsPerSpan / 2; i++) {
    const x = Math.max(transfer, (i * spanM) / elementsPerSpan);
    const own = (model.ownKNm * x * (spanM - x)) / 2 / 1e3;
    strandsAt(model, plan, x / spanM, there);
    const eM = shape.centroidM - there.zM;
    const forceMN = there.areaM2 * plan.stress.transferMPa;
    const top = forceMN * (eM / wTop - 1 / shape.areaM2) - own / wTop;
    const bottom = forceMN * (1 / shape.areaM2 + eM / wBottom) - own / wBottom;
    worse(releaseTop, top, release.tensionRootMPa[standardId] * Math.sqrt(strength));
    worse(releaseBottom, bottom, release.compression[standardId] * strength);
  }
  return { releaseTop, releaseBottom };
}
