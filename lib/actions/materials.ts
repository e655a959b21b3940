import { z } from '../zod.ts';
import file from '../../data/materials.json';
import { standardIds, type StandardId } from '../model/index.ts';
import { loadStandard } from './loadStandard.ts';

const positive = z.number().positive();
const steel = z.strictObject({
  eMPa: positive,
  source: z.string(),
  /** [up to thickness in mm, yield in MPa], thickness rising. */
  yield: z.array(z.tuple([positive, positive])).min(1),
});
const bars = z.strictObject({ yieldMPa: positive, eMPa: positive, source: z.string() });
const strand = z.strictObject({
  ultimateMPa: positive,
  proofMPa: positive,
  eMPa: positive,
  source: z.string(),
});
const cable = z.strictObject({
  ultimateMPa: positive,
  eMPa: positive,
  unitWeightKNm3: positive,
  source: z.string(),
});
const light = z.strictObject({
  source: z.string(),
  note: z.string(),
  referenceKgM3: positive,
  stiffnessPower: positive,
  tensionFixed: z.number().min(0).max(1),
  strutShare: positive,
  reinforcedMoreKgM3: positive,
});
const strengths = z.strictObject({ slab: positive, girder: positive, box: positive, substructure: positive });

const schema = z.strictObject({
  steel: z.strictObject({ S355: steel, S460: steel, GR50: steel }),
  steelDensityKgM3: positive,
  reinforcement: z.record(z.enum(standardIds), bars),
  strand: z.record(z.enum(standardIds), strand),
  stay: cable,
  mainCable: cable,
  /** Cylinder strengths that the laws of `concrete` are for. */
  concreteMPa: z.strictObject({ leastMPa: positive, mostMPa: positive, source: z.string() }),
  /** Oven-dry densities it may have, and what they do to weight, stiffness and strength under each standard. */
  lightConcrete: z.strictObject({ leastKgM3: positive, mostKgM3: positive, lm1: light, hl93: light }),
  /** Cylinder strengths taken when nothing is said, MPa. */
  concreteDefaultMPa: z.record(z.enum(standardIds), strengths),
});

/** Materials as read from `data/materials.json`. */
export const materials = schema.parse(file);

export type SteelGrade = keyof typeof materials.steel;

/** Steel used under a standard when nothing is said. */
export function usualSteel(id: StandardId): SteelGrade {
  return loadStandard(id).steelGrade;
}

/** Yield strength of a plate, MPa, by its thickness in mm (product standard). @throws RangeError beyond the thickest listed */
export function steelYield(grade: SteelGrade, thicknessMm: number): number {
  const steps = materials.steel[grade].yield;
  const step = steps.find(([upTo]) => thicknessMm <= upTo);
  if (!(thicknessMm > 0) || !step) {
    throw new RangeError(
      `thickness: expected more than 0 and up to ${steps[steps.length - 1]![0]} mm, received ${thicknessMm}`,
    );
  }
  return step[1];
}

/** Concrete by its characteristic cylinder strength. All MPa. */
export interface Concrete {
  readonly fckMPa: number;
  /** Design strength in compression of the stress block. */
  readonly fcdMPa: number;
  /** Mean tensile strength (EN) or modulus of rupture (AASHTO). */
  readonly fctmMPa: number;
  readonly ecmMPa: number;
  /** Shear that its struts (EN) or the concrete itself (AASHTO) carry against ordinary concrete of the same strength; 1 when absent. */
  readonly shearShare?: number;
}

/**
 * EN 1992-1-1 table 3.1: fctm = 0.30 fck^(2/3) to C50, then 2.12 ln(1 + fcm / 10); Ecm = 22 (fcm / 10)^0.3 GPa.
 * AASHTO LRFD 5.4.2: Ec = 33000 w^1.5 root f'c (ksi, kcf), fr = 0.24 root f'c (ksi). Both from memory.
 * @throws RangeError when the strength is not positive
 */
export function concrete(id: StandardId, fckMPa: number): Concrete {
  if (!(fckMPa > 0)) throw new RangeError(`concrete strength: expected more than 0 MPa, received ${fckMPa}`);
  const { resistance, unitWeights, concreteLaw } = loadStandard(id);
  const fcdMPa = (resistance.alphaConcrete * fckMPa) / resistance.concrete;
  if (concreteLaw === 'aashto') {
    const ksi = 6.894757;
    const root = Math.sqrt(fckMPa / ksi);
    const kcf = unitWeights.concreteKNm3 / 157.0875;
    return { fckMPa, fcdMPa, fctmMPa: 0.24 * root * ksi, ecmMPa: 33000 * kcf ** 1.5 * root * ksi };
  }
  const mean = fckMPa + 8;
  return {
    fckMPa,
    fcdMPa,
    fctmMPa: fckMPa <= 50 ? 0.3 * fckMPa ** (2 / 3) : 2.12 * Math.log(1 + mean / 10),
    ecmMPa: 22000 * (mean / 10) ** 0.3,
  };
}

/** Lightweight concrete: strength and stiffness as `Concrete`, and its weight with bars and tendons. */
export interface LightConcrete extends Concrete {
  readonly shearShare: number;
  readonly unitWeightKNm3: number;
}

/**
 * Lightweight concrete by its cylinder strength and oven-dry density: EN 1992-1-1 section 11 (eta_E, eta_1) or AASHTO LRFD
 * 5.4.2 (w^1.5, lambda), both from memory; see `data/materials.json`.
 * @param densityKgM3 oven-dry, 1400 to 2200 kg/m3
 * @throws RangeError for a density outside that range or a strength that is not positive
 */
export function lightConcrete(id: StandardId, fckMPa: number, densityKgM3: number): LightConcrete {
  const { leastKgM3, mostKgM3 } = materials.lightConcrete;
  if (!(densityKgM3 >= leastKgM3 && densityKgM3 <= mostKgM3))
    throw new RangeError(
      `lightweight concrete: expected ${leastKgM3} to ${mostKgM3} kg/m3 oven-dry, received ${densityKgM3}`,
    );
  const law = materials.lightConcrete[id];
  const ordinary = concrete(id, fckMPa);
  const ratio = densityKgM3 / law.referenceKgM3;
  const tension = Math.min(1, law.tensionFixed + (1 - law.tensionFixed) * ratio);
  const unitWeightKNm3 = ((densityKgM3 + law.reinforcedMoreKgM3) * 9.81) / 1e3;
  // AASHTO writes the modulus with the weight itself; ordinary concrete stands for the weight of the standard.
  const stiffness =
    id === 'hl93'
      ? (densityKgM3 / ((loadStandard(id).unitWeights.concreteKNm3 / 9.81) * 1e3)) ** law.stiffnessPower
      : ratio ** law.stiffnessPower;
  return {
    fckMPa,
    fcdMPa: ordinary.fcdMPa,
    fctmMPa: tension * ordinary.fctmMPa,
    ecmMPa: Math.min(1, stiffness) * ordinary.ecmMPa,
    shearShare: tension * law.strutShare,
    unitWeightKNm3,
  };
}
