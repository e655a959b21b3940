import type { StandardId } from '../../model/index.ts';
import {
  bareGirder,
  girderFigures,
  steelArea,
  type GirderPlates,
  type GirderTop,
} from '../composite-i/girderSection.ts';
import { fatigueLimitMPa, type FatigueDetail } from './fatigue.ts';
import { floorData } from './floorData.ts';

/** Loading of one simple-span beam under a slab. Moments are the greatest along the beam; all are design (ultimate) values. */
export interface FloorBeamDemand {
  readonly spanM: number;
  /** Steel depth available, m. */
  readonly depthM: number;
  readonly slabM: number;
  /** Width of slab that acts with the beam, m. */
  readonly slabWidthM: number;
  /** Wet slab, formwork and the steel itself on the bare beam. */
  readonly castingKNm: number;
  /** The lasting part of it: slab and steel. */
  readonly slabKNm: number;
  readonly superimposedKNm: number;
  readonly trafficKNm: number;
  readonly shearKN: number;
  /** Equivalent moment range of the fatigue lorry, kNm. */
  readonly fatigueKNm: number;
  readonly trafficCharacteristicKNm: number;
  /** What is welded to the bottom flange where it bends most. */
  readonly detail: FatigueDetail;
}

export interface FloorBeam {
  readonly plates: GirderPlates;
  /** Mass of plates with detail share, kg/m. */
  readonly massKgPerM: number;
  /** Painted surface, m2/m. */
  readonly paintM2PerM: number;
  readonly utilisation: number;
  /** Inertia with the slab, short loads, and of the steel alone, m4. */
  readonly shortInertiaM4: number;
  readonly steelInertiaM4: number;
  /** Traffic moment it was asked to carry, characteristic, kNm. */
  readonly trafficCharacteristicKNm: number;
  readonly governs: 'casting' | 'bottom flange' | 'fatigue' | 'deflection' | 'shear' | 'minimum';
}

const modulusMPa = 210000;
const density = 7850;

/**
 * Lightest welded composite I-beam of a given depth by staged elastic stresses: bare steel while the slab is wet,
 * long-term section for superimposed load, short-term section for traffic, each at design value; with bottom-flange
 * fatigue, deflection and shear in a stocky web. Flange plates in steps of 2 mm; where the thickest flange is not
 * enough the beam comes back with a utilisation above 1.
 * @param yieldMPa by plate thickness, mm
 * @param concreteMPa modulus of the slab concrete, MPa
 */
export function floorBeam(
  demand: FloorBeamDemand,
  standard: StandardId,
  yieldMPa: (thicknessMm: number) => number,
  concreteMPa: number,
): FloorBeam {
  const d = floorData;
  const h = demand.depthM;
  const range = fatigueLimitMPa(standard, demand.detail);
  const flangeM = Math.min(d.flangeWidthM.most, Math.max(d.flangeWidthM.least, d.flangeWidthM.overDepth * h));
  const shearMPa = yieldMPa(d.leastWebMm.value) / Math.sqrt(3);
  const webMm = Math.max(
    d.leastWebMm.value,
    roundUp((1000 * h) / d.webSlenderness.value),
    roundUp(demand.shearKN / (0.9 * h * shearMPa)),
  );
  const n0 = modulusMPa / concreteMPa;
  const slab = (ratio: number): GirderTop => ({
    slabAreaM2: (demand.slabWidthM * demand.slabM) / ratio,
    slabInertiaM4: (demand.slabWidthM * demand.slabM ** 3) / 12 / ratio,
    slabAboveM: demand.slabM / 2,
    barAreaM2: 0,
    barAboveM: 0,
  });
  const short = slab(n0);
  const long = slab(n0 * d.modularLong.value);
  const out = { areaM2: 0, centroidM: 0, inertiaM4: 0 };
  const platesOf = (topMm: number, bottomMm: number): GirderPlates => ({
    heightM: h,
    topWidthM: flangeM,
    topM: topMm / 1000,
    bottomWidthM: flangeM * 1.2,
    bottomM: bottomMm / 1000,
    webM: webMm / 1000,
  });
  /** Bottom modulus and inertia of a stage. */
  const stage = (plates: GirderPlates, top: GirderTop): { w: number; i: number; topW: number } => {
    girderFigures(out, plates, top);
    return {
      w: out.inertiaM4 / out.centroidM,
      i: out.inertiaM4,
      topW: out.inertiaM4 / Math.max(1e-9, h - out.centroidM),
    };
  };
  const uses = (
    topMm: number,
    bottomMm: number,
  ): { casting: number; list: [FloorBeam['governs'], number][] } => {
    const plates = platesOf(topMm, bottomMm);
    const bare = stage(plates, bareGirder);
    const lasting = stage(plates, long);
    const lively = stage(plates, short);
    const fyTop = yieldMPa(topMm) * 1000;
    const fyBottom = yieldMPa(bottomMm) * 1000;
    const casting = demand.castingKNm / bare.topW / (fyTop * d.castingStress.value);
    const bottom =
      (demand.slabKNm / bare.w + demand.superimposedKNm / lasting.w + demand.trafficKNm / lively.w) /
      fyBottom;
    const deflection =
      (5 * demand.trafficCharacteristicKNm * demand.spanM ** 2) /
      (48 * modulusMPa * 1000 * lively.i) /
      (d.deflectionOverSpan.value * demand.spanM);
    const fatigue = demand.fatigueKNm / lively.w / (range * 1000);
    return {
      casting,
      list: [
        ['bottom flange', bottom],
        ['fatigue', fatigue],
        ['deflection', deflection],
      ],
    };
  };

  let topMm = d.leastFlangeMm.value;
  let bottomMm = d.leastFlangeMm.value;
  const most = d.mostFlangeMm.value;
  for (let pass = 0; pass < 60; pass++) {
    const { casting, list } = uses(topMm, bottomMm);
    const worst = Math.max(...list.map(([, use]) => use));
    if (casting > 1 && topMm < most) topMm = Math.min(most, topMm + stepFor(casting));
    else if (worst > 1 && bottomMm < most) bottomMm = Math.min(most, bottomMm + stepFor(worst));
    else break;
  }
  const plates = platesOf(topMm, bottomMm);
  const { casting, list } = uses(topMm, bottomMm);
  const shear = demand.shearKN / (0.9 * plates.webM * 1000 * h * shearMPa);
  let worst: [FloorBeam['governs'], number] = ['minimum', 0];
  for (const use of [...list, ['casting', casting], ['shear', shear]] as [FloorBeam['governs'], number][])
    if (use[1] > worst[1]) worst = use;
  return {
    plates,
    massKgPerM: steelArea(plates) * density * (1 + d.detailShare.value),
    paintM2PerM: 2 * h + 2 * plates.bottomWidthM + plates.topWidthM,
    utilisation: worst[1],
    shortInertiaM4: stage(plates, short).i,
    steelInertiaM4: stage(plates, bareGirder).i,
    trafficCharacteristicKNm: demand.trafficCharacteristicKNm,
    governs: worst[0],
  };
}

/** Coarse steps while far away, 2 mm at the end. */
function stepFor(utilisation: number): number {
  return utilisation > 1.4 ? 8 : utilisation > 1.15 ? 4 : 2;
}

function roundUp(thicknessMm: number): number {
  return Math.ceil(thicknessMm / 2 - 1e-9) * 2;
}
