import { barDesignMPa } from '../common/bars.ts';
import type { SlabTendons } from './findSlabTendons.ts';
import { slabDeckData } from './slabDeckData.ts';
import type { SlabModel } from './slabModel.ts';

/** Shear of the deck where it is used most, and its links. */
export interface SlabShear {
  readonly demandKN: number;
  /** With the most links that can be placed, or of the concrete alone where that is more, kN. */
  readonly capacityKN: number;
  /** Greatest shear over what the concrete alone carries. */
  readonly aloneUse: number;
  /** Links, m3 of steel, and the length of deck that has them, m. */
  readonly linksM3: number;
  readonly linkedM: number;
}

/** Bars along in the face that is in tension: area at the stations, m2, and their effective depth, m. */
export interface TensionBars {
  readonly low: Float64Array;
  readonly high: Float64Array;
  readonly effectiveM: number;
}

/**
 * Shear along the deck from an effective depth off the supports: the concrete alone, or links where that is not enough.
 * Inclined tendons and their parasitic moment are counted.
 */
export function slabShear(model: SlabModel, bars: TensionBars, tendons: SlabTendons | null): SlabShear {
  const { beam, supportsM, standard, traffic, own, superimposed, task } = model;
  const { uls } = standard.factors;
  const { xM } = beam;
  const { shear } = slabDeckData;
  const leverM = shear.leverRatio * bars.effectiveM;
  const linkMPa = barDesignMPa(model.standardId);
  let worst = { demandKN: 0, capacityKN: 1, use: 0 };
  let aloneUse = 0;
  let linksM3 = 0;
  let linkedM = 0;
  const mean = (a: number, b: number): number => (a + b) / 2;
  for (let e = 0; e < xM.length - 1; e++) {
    const lengthM = xM[e + 1]! - xM[e]!;
    const x = mean(xM[e]!, xM[e + 1]!);
    const near = Math.min(...supportsM.map((at) => Math.abs(x - at))) < bars.effectiveM;
    const lasting =
      uls.permanent * mean(own.effects.shearRightKN[e]!, own.effects.shearLeftKN[e + 1]!) +
      uls.superimposed * mean(superimposed.shearRightKN[e]!, superimposed.shearLeftKN[e + 1]!);
    const tendon = tendons ? tendonShear(tendons, e, lengthM) : 0;
    const up = lasting + uls.traffic * mean(traffic.most.shearMaxKN[e]!, traffic.most.shearMaxKN[e + 1]!);
    const down = lasting + uls.traffic * mean(traffic.most.shearMinKN[e]!, traffic.most.shearMinKN[e + 1]!);
    const demandKN = Math.max(up + uls.prestress * tendon, -(down + uls.prestress * tendon));
    const solid = model.solidAt[e]! || model.solidAt[e + 1]!;
    const widthM = solid ? model.outline.soffitM : model.span.websM;
    const areaM2 = (solid ? model.solid : model.span).areaM2;
    const tension = model.pierShare[e]! > 0 ? bars.high : bars.low;
    const steelM2 = mean(tension[e]!, tension[e + 1]!) + (tendons ? tendons.areaM2 * tendons.share[e]! : 0);
    const alone =
      1e3 *
      widthM *
      bars.effectiveM *
      concreteShearMPa(model, bars.effectiveM, steelM2 / (widthM * bars.effectiveM), {
        axialMPa: tendons ? (tendons.forceKN * tendons.share[e]!) / areaM2 / 1e3 : 0,
      });
    const perRatioKN = widthM * leverM * linkMPa * 1e3 * shear.designCot;
    const capacityKN = Math.max(alone, shear.linkRatioMost * perRatioKN);
    if (!near) {
      aloneUse = Math.max(aloneUse, demandKN / alone);
      const use = demandKN / capacityKN;
      if (use > worst.use) worst = { demandKN, capacityKN, use };
    }
    if (demandKN > alone && capacityKN > 0) {
      const ratio = Math.min(shear.linkRatioMost, Math.max(shear.linkRatioLeast, demandKN / perRatioKN));
      linksM3 += ratio * widthM * lengthM * task.depthM;
      linkedM += lengthM;
    }
  }
  return { demandKN: worst.demandKN, capacityKN: worst.capacityKN, aloneUse, linksM3, linkedM };
}

/** Shear of the tendons with their parasitic moment in an element, kN: slope of P (parasitic - e). */
function tendonShear(tendons: SlabTendons, e: number, lengthM: number): number {
  const arm = (i: number): number => tendons.parasiticM[i]! - tendons.share[i]! * tendons.eccentricityM[i]!;
  return (tendons.forceKN * (arm(e + 1) - arm(e))) / lengthM;
}

/**
 * Design shear stress that a slab carries without links, MPa.
 * @param ratio steel of the tension face over width and effective depth
 */
export function concreteShearMPa(
  model: Pick<SlabModel, 'standardId' | 'concrete'>,
  effectiveM: number,
  ratio: number,
  { axialMPa }: { readonly axialMPa: number },
): number {
  const { fckMPa, fcdMPa } = model.concrete;
  if (model.standardId === 'hl93') {
    const a = slabDeckData.shearAashto;
    const ksi = 6.894757;
    const sxe = Math.max(12, (slabDeckData.shear.leverRatio * effectiveM) / 0.0254);
    const beta = ((axialMPa > 0 ? a.prestressed : a.reinforced) * a.sizeTop) / (a.sizeBase + sxe);
    // Shear acts on the lever arm, stresses here are over the effective depth.
    return slabDeckData.shear.leverRatio * a.resistance * a.perRootKsi * beta * Math.sqrt(fckMPa / ksi) * ksi;
  }
  const { crd, crdDivisor, axial, least, mostAxialShare, mostRatio } = slabDeckData.shear;
  const k = Math.min(2, 1 + Math.sqrt(0.2 / effectiveM));
  const pressed = axial * Math.min(axialMPa, mostAxialShare * fcdMPa);
  const steel = (crd / crdDivisor) * k * Math.cbrt(100 * Math.min(mostRatio, ratio) * fckMPa);
  return Math.max(steel, least * k ** 1.5 * Math.sqrt(fckMPa)) + pressed;
}
