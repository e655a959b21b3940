import { slabData } from '../slab/slabData.ts';
import { barDesignMPa } from '../bars.ts';
import { pretensioned } from './pretensioned.ts';
import type { PrecastModel } from './precastModel.ts';

/** Continuity over one inner support, of one beam. */
export interface PierContinuity {
  readonly hogDesignKNm: number;
  /** Bars in the slab over the pier and bottom bars between the beam ends, m2. */
  readonly topBarsM2: number;
  readonly bottomBarsM2: number;
  /** Top bars over the area of the slab. */
  readonly ratio: number;
  /** Compression of the bottom flange over its strength. */
  readonly pressed: number;
}

/**
 * Slab bars and bottom connection over inner support `pier` (1 is the first). Bars by ultimate and by crack width in
 * service under superimposed load, traffic and a cool top; the concrete between the beam ends is that of the slab. A
 * bottom connection holds 1.2 times the cracking moment against sagging from creep; beams some 90 days old at continuity.
 */
export function pierContinuity(model: PrecastModel, pier: number): PierContinuity {
  const { composite, shape, slabConcrete, standard, standardId } = model;
  const station = model.beam.supportAt[pier]!;
  const { uls } = standard.factors;
  const { topCoolerK, withTraffic } = pretensioned.temperature;
  const lasting = -model.superimposed.momentKNm[station]!;
  const traffic = -model.most.momentMinKNm[station]!;
  const cool = topCoolerK * withTraffic[standardId] * Math.abs(model.warmth.momentKNm[station]!);
  const hogDesignKNm = Math.max(0, uls.superimposed * lasting + uls.traffic * traffic);
  const d = composite.topM - pretensioned.continuity.barAxisM;
  const most = slabConcrete.fcdMPa * 1e3 * shape.bottomWidthM;
  const rest = d * d - (2 * hogDesignKNm) / most;
  const blockM = rest > 0 ? d - Math.sqrt(rest) : d;
  const lever = d - blockM / 2;
  const topBarsM2 = Math.max(
    hogDesignKNm / (lever * barDesignMPa(standardId) * 1e3),
    (lasting + traffic + cool) / (lever * slabData.serviceStressMPa[standardId] * 1e3),
  );
  const cracking = pretensioned.continuity.crackingTimes * slabConcrete.fctmMPa * 1e3 * composite.wBottomM3;
  const bottomBarsM2 = cracking / (0.9 * composite.topM * barDesignMPa(standardId) * 1e3);
  return {
    hogDesignKNm,
    topBarsM2,
    bottomBarsM2,
    ratio: topBarsM2 / (composite.effectiveWidthM * composite.slabM),
    pressed: blockM / (1.5 * shape.bottomFlangeM),
  };
}
