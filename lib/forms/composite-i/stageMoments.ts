import { compositeData } from './compositeData.ts';
import type { GirderEffects } from './girderEffects.ts';
import type { GirderModel } from './girderModel.ts';

/** Moments of one girder at its stations, kNm, by the section that carries them. */
export interface StageMoments {
  /** Design: steel alone with the slab cast, steel alone at the end, lasting, short sagging and short hogging. */
  readonly cast: Float64Array;
  readonly steel: Float64Array;
  readonly lasting: Float64Array;
  readonly sag: Float64Array;
  readonly hog: Float64Array;
  /** Parasitic moment of shrinkage, taken where it is adverse. */
  readonly shrinkage: Float64Array;
  /** The same at characteristic level: steel, lasting, greatest traffic. */
  readonly steelChar: Float64Array;
  readonly lastingChar: Float64Array;
  readonly trafficChar: Float64Array;
}

/** Puts the partial factors of the standard on the stages. */
export function stageMoments(model: GirderModel, effects: GirderEffects): StageMoments {
  const { uls } = model.standard.factors;
  const { topWarmerK, topCoolerK, withTraffic } = compositeData.temperature;
  const temperature = withTraffic[model.standardId];
  const steelChar = effects.steelStage.momentKNm;
  const lastingChar = effects.superimposed.momentKNm;
  const warmth = effects.warmth.momentKNm;
  const { momentMaxKNm, momentMinKNm } = effects.traffic;
  return {
    cast: steelChar.map(
      (m, i) => uls.permanent * m + compositeData.casting.loadFactor * effects.casting.momentKNm[i]!,
    ),
    steel: steelChar.map((m) => uls.permanent * m),
    lasting: lastingChar.map((m) => uls.superimposed * m),
    sag: momentMaxKNm.map((m, i) => uls.traffic * m + temperature * topWarmerK * Math.max(0, warmth[i]!)),
    hog: momentMinKNm.map((m, i) => uls.traffic * m - temperature * topCoolerK * Math.max(0, warmth[i]!)),
    shrinkage: effects.shrinkage.momentKNm,
    steelChar,
    lastingChar,
    trafficChar: momentMaxKNm,
  };
}

/** Greatest design moments over the stages at a station, kNm: sagging and hogging totals. */
export function totalSag(moments: StageMoments, i: number): number {
  return moments.steel[i]! + moments.lasting[i]! + moments.sag[i]!;
}
export function totalHog(moments: StageMoments, i: number): number {
  return moments.steel[i]! + moments.lasting[i]! + moments.shrinkage[i]! + moments.hog[i]!;
}
