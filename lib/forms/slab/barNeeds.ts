import { barDesignMPa } from '../common/bars.ts';
import { compressionDepth, strandDesignMPa, type CompressedFace } from '../concrete-box/bendingCapacity.ts';
import { serviceBars } from './crackedSection.ts';
import { slabDeckData } from './slabDeckData.ts';
import type { SlabModel } from './slabModel.ts';
import type { SlabTendons } from './findSlabTendons.ts';

/** Bars along one face of the deck. */
export interface FaceNeed {
  /** Width over which they lie, m, and size, m. */
  readonly widthM: number;
  readonly barM: number;
  readonly effectiveM: number;
  /** Area needed over the whole width at the stations, m2. */
  readonly areaM2: Float64Array;
  /** Greatest of them, where it is, and what would fit into the face, m2. */
  readonly peakM2: number;
  readonly station: number;
  readonly fitsM2: number;
  /** Design moment at the stations, kNm; 0 where the face is pressed. */
  readonly designKNm: Float64Array;
}

/** Design moments of the whole deck at the stations, tension of the named face positive, parasitic moment included, kNm. */
export function designMoments(
  model: SlabModel,
  face: 'low' | 'high',
  tendons: SlabTendons | null,
): Float64Array {
  const { uls } = model.standard.factors;
  const { most } = model.traffic;
  const traffic = face === 'low' ? most.momentMaxKNm : most.momentMinKNm;
  const sign = face === 'low' ? 1 : -1;
  return traffic.map((moment, i) => {
    const parasitic = tendons ? uls.prestress * tendons.forceKN * tendons.parasiticM[i]! : 0;
    return (
      sign *
      (uls.permanent * model.own.effects.momentKNm[i]! +
        uls.superimposed * model.superimposed.momentKNm[i]! +
        uls.traffic * moment +
        parasitic)
    );
  });
}

/** Face that is pressed while the other is in tension, at a station. */
export function pressedFace(model: SlabModel, face: 'low' | 'high', station: number): CompressedFace {
  const section = model.solidAt[station] ? model.solid : model.span;
  return face === 'low'
    ? { widthM: model.task.deck.widthM, flangeM: section.aboveM, websM: section.websM }
    : { widthM: model.outline.soffitM, flangeM: section.belowM, websM: section.websM };
}

/** Bars along one face for ultimate bending and, without prestress, for stress and cracks in service: the smallest size that fits. */
export function barNeeds(model: SlabModel, face: 'low' | 'high', tendons: SlabTendons | null): FaceNeed {
  const { bars } = slabDeckData;
  const widthM = face === 'low' ? model.outline.soffitM : model.task.deck.widthM;
  const designKNm = designMoments(model, face, tendons).map((moment) => Math.max(0, moment));
  let found: FaceNeed | null = null;
  for (const barM of bars.sizesM) {
    const effectiveM = model.task.depthM - bars.coverM - barM / 2;
    const areaM2 = designKNm.map((moment, i) =>
      moment > 0
        ? Math.max(
            ultimateBars(model, face, i, moment, effectiveM, tendons),
            tendons ? 0 : inService(model, face, i, { widthM, barM, effectiveM }),
          )
        : 0,
    );
    let station = 0;
    areaM2.forEach((area, i) => {
      if (area > areaM2[station]!) station = i;
    });
    const fitsM2 = (widthM * (Math.PI * barM ** 2)) / 4 / bars.closestM;
    found = { widthM, barM, effectiveM, areaM2, peakM2: areaM2[station]!, station, fitsM2, designKNm };
    const usual = (fitsM2 * bars.closestM) / bars.usualM;
    if (found.peakM2 <= usual) break;
  }
  return found!;
}

/** As = (M - P (dp - c)) / (fyd (ds - c)), c the middle of the stress block under both. */
function ultimateBars(
  model: SlabModel,
  face: 'low' | 'high',
  station: number,
  momentKNm: number,
  effectiveM: number,
  tendons: SlabTendons | null,
): number {
  const pressed = pressedFace(model, face, station);
  const strandKN = tendons ? tendons.areaM2 * tendons.share[station]! * strandDesignMPa(model) * 1e3 : 0;
  const level = tendons?.depthM[station] ?? 0;
  const strandDepthM = face === 'low' ? level : model.task.depthM - level;
  const strength = barDesignMPa(model.standardId) * 1e3;
  let areaM2 = 0;
  for (let pass = 0; pass < 6; pass++) {
    const c = Math.min(0.2 * effectiveM, compressionDepth(model, pressed, strandKN + areaM2 * strength));
    areaM2 = Math.max(0, (momentKNm - strandKN * (strandDepthM - c)) / (strength * (effectiveM - c)));
  }
  return areaM2;
}

function inService(
  model: SlabModel,
  face: 'low' | 'high',
  station: number,
  { widthM, barM, effectiveM }: Pick<FaceNeed, 'widthM' | 'barM' | 'effectiveM'>,
): number {
  const { most, service } = model.traffic;
  const sign = face === 'low' ? 1 : -1;
  const lasting = model.own.effects.momentKNm[station]! + model.superimposed.momentKNm[station]!;
  const pick = (traffic: typeof most): number =>
    (sign * (lasting + (face === 'low' ? traffic.momentMaxKNm : traffic.momentMinKNm)[station]!)) / widthM;
  return (
    widthM *
    serviceBars(
      { depthM: model.task.depthM, effectiveM, barM },
      { frequentKNm: pick(service), characteristicKNm: pick(most) },
      model.standardId,
      model.concrete,
    )
  );
}
