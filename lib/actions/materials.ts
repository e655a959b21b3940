import { z } from 'zod';
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
const strengths = z.strictObject({ slab: positive, girder: positive, box: positive, substructure: positive });

const schema = z.strictObject({
  steel: z.strictObject({ S355: steel, S460: steel, GR50: steel }),
  steelDensityKgM3: positive,
  reinforcement: z.record(z.enum(standardIds), bars),
  strand: z.record(z.enum(standardIds), strand),
  stay: cable,
  mainCable: cable,
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
