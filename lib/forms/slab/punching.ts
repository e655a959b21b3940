import type { SlabTendons } from './findSlabTendons.ts';
import { slabDeckData } from './slabDeckData.ts';
import type { SlabModel } from './slabModel.ts';
import { concreteShearMPa, type TensionBars } from './slabShear.ts';

/** Punching over the bearings of the worst inner support. */
export interface Punching {
  /** Bearings side by side on an inner support. */
  readonly bearings: number;
  readonly demandKN: number;
  /** With links where the concrete alone is not enough, kN. */
  readonly capacityKN: number;
  readonly linksKg: number;
}

/**
 * Fewest bearings at which the concrete alone holds; at the closest spacing, links. Null for a single span: the bearings
 * of the ends carry less and stand under a diaphragm strip.
 */
export function punching(
  model: SlabModel,
  bars: TensionBars,
  acrossM2PerM: number,
  tendons: SlabTendons | null,
): Punching | null {
  const inner = model.supportsM.length - 2;
  if (inner < 1) return null;
  const d = slabDeckData.punching;
  const { uls } = model.standard.factors;
  let total = 0;
  let station = 0;
  for (let j = 1; j <= inner; j++) {
    const force =
      uls.permanent * (model.own.effects.reactionKN[j]! + model.solidKN[j]!) +
      uls.superimposed * model.superimposed.reactionKN[j]! +
      uls.traffic * model.traffic.reactionMaxKN[j]!;
    if (force > total) {
      total = force;
      station = model.beam.supportAt[j]!;
    }
  }
  const effectiveM = bars.effectiveM;
  const along = bars.high[station]! / model.task.deck.widthM / effectiveM;
  const across = acrossM2PerM / effectiveM;
  const ratio = Math.sqrt(along * across);
  const axialMPa = tendons ? tendons.forceKN / model.solid.areaM2 / 1e3 : 0;
  const aloneKN =
    1e3 * perimeterM(model, effectiveM) * effectiveM * stressMPa(model, effectiveM, ratio, axialMPa);
  const demand = (bearings: number): number => (d.eccentricity * d.unevenShare * total) / bearings;
  const { soffitM } = model.outline;
  const fewest = Math.max(2, Math.ceil(soffitM / d.usualM));
  const most = Math.max(fewest, Math.floor(soffitM / d.closestM));
  let bearings = fewest;
  while (bearings < most && demand(bearings) > aloneKN) bearings++;
  const demandKN = demand(bearings);
  const linked = demandKN > aloneKN;
  return {
    bearings,
    demandKN,
    capacityKN: linked ? d.linkedOverPlain * aloneKN : aloneKN,
    linksKg: linked ? d.linkKgPerKN * demandKN * bearings * inner : 0,
  };
}

/** Control perimeter round a square plate: at 2 d with round corners, or at d / 2 under AASHTO. */
function perimeterM(model: SlabModel, effectiveM: number): number {
  const { plateM } = slabDeckData.punching;
  return model.standardId === 'hl93' ? 4 * (plateM + effectiveM) : 4 * plateM + 2 * Math.PI * 2 * effectiveM;
}

function stressMPa(model: SlabModel, effectiveM: number, ratio: number, axialMPa: number): number {
  if (model.standardId !== 'hl93') {
    // Half of the stress along counts: only one direction is prestressed.
    return concreteShearMPa(model, effectiveM, ratio, { axialMPa: axialMPa / 2 });
  }
  const ksi = 6.894757;
  return (
    slabDeckData.shearAashto.resistance *
    slabDeckData.punching.aashtoPerRootKsi *
    Math.sqrt(model.concrete.fckMPa / ksi) *
    ksi
  );
}
