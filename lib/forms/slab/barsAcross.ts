import { materials } from '../../actions/index.ts';
import { barDesignMPa } from '../common/bars.ts';
import { slabData } from '../common/slab/slabData.ts';
import type { SlabTendons } from './findSlabTendons.ts';
import { slabDeckData } from './slabDeckData.ts';
import type { SlabModel } from './slabModel.ts';

/** Bars across the deck, m2 per m of its length. */
export interface BarsAcross {
  readonly lowM2PerM: number;
  readonly highM2PerM: number;
  /** Design moment of the wheels across, kNm/m; 0 under AASHTO. */
  readonly designKNm: number;
  /** Most that one face takes, m2/m. */
  readonly fitsM2PerM: number;
}

/**
 * Bars across: by the wheels (LM1) or as a share of the steel along (AASHTO), at least a share of the bars along and the
 * least of a slab; at the top the least, or what the wings ask for.
 * @param alongM2PerM most bars along in the soffit, m2 per m of width
 */
export function barsAcross(model: SlabModel, alongM2PerM: number, tendons: SlabTendons | null): BarsAcross {
  const { depthM, spansM } = model.task;
  const { bars, acrossShare } = slabDeckData;
  const [size] = bars.sizesM.slice(-2);
  const effectiveM = depthM - slabData.barAxisM.value - 0.02;
  const leverM = slabData.leverRatio.value * effectiveM;
  const least = slabData.steelRatioLeast.value * depthM;
  const { acrossKNm } = model.strips;
  let need = slabData.distributionShare.value * alongM2PerM;
  let designKNm = 0;
  if (acrossKNm === null) {
    const root = Math.sqrt(Math.max(...spansM));
    const strandM2PerM = tendons ? tendons.areaM2 / model.outline.soffitM : 0;
    const raised = tendons ? tendons.stress.lastingMPa / acrossShare.prestressMPa : 1;
    const share = Math.min(acrossShare.most, (acrossShare.perRootM / root) * raised);
    need = share * (alongM2PerM + strandM2PerM);
  } else {
    designKNm = model.standard.factors.uls.traffic * acrossKNm;
    need = Math.max(
      need,
      designKNm / (leverM * barDesignMPa(model.standardId) * 1e3),
      acrossKNm / (leverM * slabData.serviceStressMPa[model.standardId] * 1e3),
    );
  }
  return {
    lowM2PerM: Math.max(least, need),
    highM2PerM: least,
    designKNm,
    fitsM2PerM: (Math.PI * size! ** 2) / 4 / bars.closestM,
  };
}

/** Steel of the bars across per m of deck, m3: both faces, and those of the wings run in over one and a half wings. */
export function acrossVolume(model: SlabModel, across: BarsAcross): number {
  const { outline, wingBarsM2PerM, task } = model;
  const wings = 2 * 2.5 * outline.wingM * Math.max(0, wingBarsM2PerM - across.highM2PerM);
  return across.lowM2PerM * outline.soffitM + across.highM2PerM * task.deck.widthM + wings;
}

/** Mass of a steel volume, kg, laps and details included. */
export function barMassKg(volumeM3: number): number {
  return slabData.lapAndDetail.value * materials.steelDensityKgM3 * volumeM3;
}
