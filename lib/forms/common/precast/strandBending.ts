import { materials } from '../../../actions/index.ts';
import { pretensioned } from './pretensioned.ts';
import type { PrecastModel } from './precastModel.ts';

/**
 * Design moment of resistance of the composite beam in sagging, kNm: `areaM2` of strand at `zM` above the soffit against a
 * rectangular stress block in the slab and, past it, in the fill and top flange with the strength of the slab.
 * AASHTO LRFD 5.6.3 (stress of strand by its depth, factor 1.0); EN 1992-1-1 6.1 (strand at its design proof stress).
 */
export function strandBending(model: PrecastModel, areaM2: number, zM: number): number {
  const { composite, shape, slabConcrete, standardId } = model;
  const d = composite.topM - zM;
  if (!(areaM2 > 0 && d > 0)) return 0;
  const { ultimateMPa, proofMPa } = materials.strand[standardId];
  const { deepestBlock, stressFallK } = pretensioned.ultimate;
  let stressMPa = proofMPa / model.standard.resistance.prestress;
  let blockMPa = slabConcrete.fcdMPa;
  if (standardId === 'hl93') {
    blockMPa = 0.85 * slabConcrete.fckMPa;
    const depthShare = Math.min(0.85, Math.max(0.65, 0.85 - 0.05 * (slabConcrete.fckMPa / 6.894757 - 4)));
    const force = areaM2 * ultimateMPa;
    const axisM = force / (blockMPa * depthShare * composite.effectiveWidthM + (stressFallK * force) / d);
    stressMPa = ultimateMPa * (1 - (stressFallK * axisM) / d);
  }
  const slabMN = blockMPa * composite.effectiveWidthM * composite.slabM;
  const mostM = deepestBlock * d;
  const mostMN =
    mostM <= composite.slabM
      ? blockMPa * composite.effectiveWidthM * mostM
      : slabMN + blockMPa * shape.topWidthM * (mostM - composite.slabM);
  const forceMN = Math.min(areaM2 * stressMPa, mostMN);
  if (forceMN <= slabMN) return 1e3 * forceMN * (d - forceMN / (blockMPa * composite.effectiveWidthM) / 2);
  const below = forceMN - slabMN;
  const belowM = composite.slabM + below / (blockMPa * shape.topWidthM) / 2;
  return 1e3 * (slabMN * (d - composite.slabM / 2) + below * (d - belowM));
}
