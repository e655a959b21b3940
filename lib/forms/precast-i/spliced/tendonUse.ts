import { boxData } from '../../concrete-box/boxData.ts';
import { tendonStress } from '../../concrete-box/tendonForce.ts';
import { pretensioned } from '../../common/precast/pretensioned.ts';
import type { Use } from '../../common/precast/spanUse.ts';
import { strandBending } from '../../common/precast/strandBending.ts';
import type { SplicedModel, StraightStrands } from './splicedModel.ts';
import { splicedData } from './splicedData.ts';

/** Tendons of one beam: strands of both stages, those of the first, where they lie and how they are stressed. */
export interface Tendons {
  readonly strands: number;
  readonly first: number;
  readonly tendons: number;
  readonly lowM: number;
  readonly highM: number;
  readonly initialMPa: number;
  readonly lastingMPa: number;
}

/** How the beams are used at every stage; stresses MPa, moments kNm. */
export interface TendonUse {
  readonly firstCompression: Use;
  readonly firstTension: Use;
  readonly slabCompression: Use;
  readonly slabTension: Use;
  readonly secondCompression: Use;
  readonly serviceSoffit: Use;
  readonly serviceTop: Use;
  readonly serviceCompression: Use;
  readonly bending: Use;
}

/** Moment of the tendons at the stations, sagging positive: on the bare beam and on beam and slab, m per unit force. */
export interface TendonMoments {
  readonly bare: Float64Array;
  readonly whole: Float64Array;
  /** Parasitic part. */
  readonly bareParasitic: Float64Array;
  readonly wholeParasitic: Float64Array;
  /** Height above the soffit, m. */
  readonly zM: Float64Array;
}

/** Lays `strands` into tendons and stresses them; `share` of them before the slab. */
export function layTendons(model: SplicedModel, strands: number, share: number): Tendons {
  const { shape, composite } = model;
  const d = splicedData.tendons;
  const tendons = Math.ceil(strands / d.strands);
  const stack = ((tendons - 1) * d.pitchM) / 2;
  const lowM = d.axisM + stack;
  const highM = shape.depthM - d.axisM - stack;
  const sagM = model.task.spansM.length > 1 ? highM - lowM : shape.centroidM - lowM;
  const axialMPa = (strands * model.tendonM2 * 1200) / composite.areaM2;
  const stress = tendonStress(
    { standardId: model.standardId, task: model.task, lengthM: model.lengthM, concrete: model.beamConcrete },
    Math.max(0, sagM),
    axialMPa,
  );
  return {
    strands,
    first: share * strands,
    tendons,
    lowM,
    highM,
    initialMPa: stress.initialMPa,
    lastingMPa: stress.lastingMPa,
  };
}

/** Moments of tendons of unit force about the centroid of the bare beam and of beam and slab. */
export function tendonMoments(model: SplicedModel, { lowM, highM }: Tendons): TendonMoments {
  const { shapes, parasitic } = model.shapes;
  const n = model.beam.xM.length;
  const about = (centroidM: number): [Float64Array, Float64Array, Float64Array] => {
    const low = centroidM - lowM;
    const high = centroidM - highM;
    const total = new Float64Array(n);
    const second = new Float64Array(n);
    const z = new Float64Array(n);
    for (let i = 0; i < n; i++) {
      const e = low * (shapes[0][i]! + shapes[1][i]!) + high * shapes[2][i]!;
      second[i] = low * (parasitic[0][i]! + parasitic[1][i]!) + high * parasitic[2][i]!;
      total[i] = second[i]! - e;
      z[i] = centroidM - e;
    }
    return [total, second, z];
  };
  const [bare, bareParasitic, zM] = about(model.shape.centroidM);
  const [whole, wholeParasitic] = about(model.composite.centroidM);
  return { bare, whole, bareParasitic, wholeParasitic, zM };
}

const none = (): Use => ({ demand: 0, capacity: 0, use: 0 });

function worse(kept: Use, demand: number, capacity: number): void {
  const use = demand <= 0 ? 0 : capacity > 0 ? demand / capacity : Infinity;
  if (use < kept.use || (use === kept.use && kept.capacity > 0)) return;
  kept.demand = demand;
  kept.capacity = capacity;
  kept.use = use;
}

/**
 * Stresses of the beam at every stage, pressed positive: first tendons on the bare beam under its own weight (towers away),
 * wet slab on it, second tendons on beam and slab, service after losses; and bending at ultimate. In service the part of
 * the prestress that presses the fibre is taken at its lower value.
 */
export function tendonUse(
  model: SplicedModel,
  straight: StraightStrands,
  tendons: Tendons,
  moments: TendonMoments,
): TendonUse {
  const use: TendonUse = {
    firstCompression: none(),
    firstTension: none(),
    slabCompression: none(),
    slabTension: none(),
    secondCompression: none(),
    serviceSoffit: none(),
    serviceTop: none(),
    serviceCompression: none(),
    bending: none(),
  };
  const { shape, composite, standardId } = model;
  const { uls } = model.standard.factors;
  const stage = splicedData.stages.tensionMPa;
  const pressedMost = pretensioned.service.compression[standardId] * model.beamConcrete.fckMPa;
  const pulledMost = pretensioned.service.tensionMPa[standardId];
  const spread = boxData.prestressSpread[standardId];
  const wb = shape.inertiaM4 / shape.centroidM;
  const wt = shape.inertiaM4 / (shape.depthM - shape.centroidM);
  const wcb = composite.wBottomM3;
  const wct = composite.wBeamTopM3;
  const first = tendons.first * model.tendonM2;
  const second = (tendons.strands - tendons.first) * model.tendonM2;
  const bedMN = straight.count * model.strandM2 * straight.lastingMPa;
  const bedE = shape.centroidM - straight.zM;
  const bedB = bedMN * (1 / shape.areaM2 + bedE / wb);
  const bedT = bedMN * (1 / shape.areaM2 - bedE / wt);
  const start = tendons.initialMPa;
  const end = tendons.lastingMPa;
  const half = (start + end) / 2;
  for (const place of model.places) {
    const { own, wet, added, sag, hog, sagMost, hogMost } = place;
    const at = (values: Float64Array): number =>
      values[place.i]! + place.t * (values[place.i + 1]! - values[place.i]!);
    const bare = at(moments.bare);
    const whole = at(moments.whole);
    const soffitBed = place.bed * bedB;
    const topBed = place.bed * bedT;
    const b1 = 1 / shape.areaM2 - bare / wb;
    const t1 = 1 / shape.areaM2 + bare / wt;
    const b2 = 1 / composite.areaM2 - whole / wcb;
    const t2 = 1 / composite.areaM2 + whole / wct;
    const earlyB = soffitBed + first * start * b1 - own / wb;
    const earlyT = topBed + first * start * t1 + own / wt;
    worse(use.firstCompression, Math.max(earlyB, earlyT), pressedMost);
    worse(use.firstTension, -Math.min(earlyB, earlyT), stage);
    const pouredB = soffitBed + first * half * b1 - (own + wet) / wb;
    const pouredT = topBed + first * half * t1 + (own + wet) / wt;
    worse(use.slabCompression, Math.max(pouredB, pouredT), pressedMost);
    worse(use.slabTension, -Math.min(pouredB, pouredT), stage);
    worse(
      use.secondCompression,
      Math.max(pouredB + second * start * b2, pouredT + second * start * t2),
      pressedMost,
    );
    const soffit = first * end * b1 + second * end * b2;
    const top = first * end * t1 + second * end * t2;
    worse(
      use.serviceSoffit,
      (own + wet) / wb + sag / wcb,
      soffitBed + (soffit > 0 ? spread * soffit : soffit / spread) + pulledMost,
    );
    worse(
      use.serviceTop,
      -(own + wet) / wt - hog / wct,
      topBed + (top > 0 ? spread * top : top / spread) + pulledMost,
    );
    worse(
      use.serviceCompression,
      Math.max(
        soffitBed + soffit - (own + wet) / wb - hogMost / wcb,
        topBed + top + (own + wet) / wt + sagMost / wct,
      ),
      pressedMost,
    );
    const design =
      1e3 *
      (uls.permanent * (own + wet) +
        uls.superimposed * added +
        uls.traffic * (sagMost - added) +
        end * (first * at(moments.bareParasitic) + second * at(moments.wholeParasitic)));
    if (design > 0) {
      const tendonM2 = first + second;
      const bedM2 = place.bed * straight.count * model.strandM2;
      const zM = (tendonM2 * at(moments.zM) + bedM2 * straight.zM) / (tendonM2 + bedM2);
      worse(use.bending, design, strandBending(model, tendonM2 + bedM2, zM));
    }
  }
  return use;
}
