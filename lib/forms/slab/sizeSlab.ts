import { bendingCapacity } from '../concrete-box/bendingCapacity.ts';
import { boxCompressions, type Compressions } from '../concrete-box/boxStress.ts';
import { barNeeds, pressedFace, type FaceNeed } from './barNeeds.ts';
import { acrossVolume, barMassKg, barsAcross, type BarsAcross } from './barsAcross.ts';
import { cornerBarsM3 } from './cornerBars.ts';
import { findSlabTendons, sectionsOf, type SlabTendons } from './findSlabTendons.ts';
import { placedBars, volumeAlong } from './placedBars.ts';
import { punching, type Punching } from './punching.ts';
import { slabDeckData } from './slabDeckData.ts';
import type { SlabModel } from './slabModel.ts';
import { slabShear, type SlabShear } from './slabShear.ts';

/** A slab deck with its steel. */
export interface SizedSlab {
  readonly tendons: SlabTendons | null;
  readonly compressions: Compressions | null;
  readonly low: FaceNeed;
  readonly high: FaceNeed;
  readonly lowPlaced: Float64Array;
  readonly highPlaced: Float64Array;
  /** Moment that each face can hold with the most bars that fit, where it is needed most, kNm. */
  readonly lowCapacityKNm: number;
  readonly highCapacityKNm: number;
  readonly across: BarsAcross;
  readonly shear: SlabShear;
  readonly punching: Punching | null;
  /** Bars by element, kg. */
  readonly barsKg: {
    readonly low: number;
    readonly high: number;
    readonly across: number;
    readonly links: number;
    /** At the obtuse corners of a skew slab. */
    readonly corners: number;
    readonly details: number;
  };
}

/** Strands added at a time where bars alone cannot hold the ultimate moment. */
const moreStrands = 1.06;

/** Tendons by service, bars by what is left at the ultimate limit (and by cracks where nothing is prestressed), then shear, punching and the bars across. */
export function sizeSlab(model: SlabModel): SizedSlab {
  let tendons = model.prestressed ? findSlabTendons(model) : null;
  let low = barNeeds(model, 'low', tendons);
  let high = barNeeds(model, 'high', tendons);
  while (
    tendons &&
    tendons.strands < tendons.mostStrands &&
    Math.max(low.peakM2 / low.fitsM2, high.peakM2 / high.fitsM2) > 1
  ) {
    const more: SlabTendons = findSlabTendons(model, Math.ceil(tendons.strands * moreStrands));
    if (!(more.strands > tendons.strands)) break;
    tendons = more;
    low = barNeeds(model, 'low', tendons);
    high = barNeeds(model, 'high', tendons);
  }
  const lowPlaced = placedBars(model, 'low', low);
  const highPlaced = placedBars(model, 'high', high);
  const across = barsAcross(model, Math.max(...lowPlaced) / low.widthM, tendons);
  const tension = { low: lowPlaced, high: highPlaced, effectiveM: Math.min(low.effectiveM, high.effectiveM) };
  const shear = slabShear(model, tension, tendons);
  const punched = punching(model, tension, Math.max(across.highM2PerM, model.wingBarsM2PerM), tendons);
  return {
    tendons,
    compressions: tendons ? boxCompressions(model, sectionsOf(model), model.own, tendons) : null,
    low,
    high,
    lowPlaced,
    highPlaced,
    lowCapacityKNm: capacity(model, 'low', low, tendons),
    highCapacityKNm: capacity(model, 'high', high, tendons),
    across,
    shear,
    punching: punched,
    barsKg: {
      low: barMassKg(volumeAlong(model, lowPlaced)),
      high: barMassKg(volumeAlong(model, highPlaced)),
      across: barMassKg(acrossVolume(model, across) * model.lengthM),
      links: barMassKg(shear.linksM3) + (punched?.linksKg ?? 0),
      corners: barMassKg(cornerBarsM3(model, low)),
      details: slabDeckData.surfaceBarsKgM3.value * model.concreteM3,
    },
  };
}

function capacity(
  model: SlabModel,
  face: 'low' | 'high',
  need: FaceNeed,
  tendons: SlabTendons | null,
): number {
  const i = peakStation(need);
  const level = tendons?.depthM[i] ?? 0;
  return bendingCapacity(
    model,
    {
      strandM2: tendons ? tendons.areaM2 * tendons.share[i]! : 0,
      strandDepthM: face === 'low' ? level : model.task.depthM - level,
      barM2: need.fitsM2,
      barDepthM: need.effectiveM,
    },
    pressedFace(model, face, i),
  );
}

/** Station of the greatest design moment of a face. */
export function peakStation({ designKNm }: FaceNeed): number {
  let at = 0;
  designKNm.forEach((moment, i) => {
    if (moment > designKNm[at]!) at = i;
  });
  return at;
}
