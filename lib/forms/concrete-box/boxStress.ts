import type { TrafficEnvelope } from '../../actions/index.ts';
import { boxData } from './boxData.ts';
import type { OwnWeight } from './boxLoads.ts';
import type { BoxModel } from './boxModel.ts';
import type { Tendons } from './findTendons.ts';
import { freshTension, youngTensionMPa, type CastOf } from './freshTension.ts';
import type { SectionsAlong } from './sectionsAlong.ts';

/** Greatest stress of the concrete over its limit, with the stress, MPa. */
export interface StressUse {
  readonly use: number;
  readonly stressMPa: number;
  readonly limitMPa: number;
}

/** Compression by place: soffit over piers, soffit in spans, top of the deck. */
export interface Compressions {
  readonly pierSoffit: StressUse;
  readonly spanSoffit: StressUse;
  readonly top: StressUse;
  /** Tension of either face when the tendons have just been stressed, over the tensile strength of that day. */
  readonly freshTension: StressUse;
}

/** What stresses ask to know of a deck and of its tendons. */
export type StressModel = CastOf &
  Pick<BoxModel, 'superimposed' | 'pierShare'> & {
    readonly traffic: { readonly most: Pick<TrafficEnvelope, 'momentMaxKNm' | 'momentMinKNm'> };
  };
export type StressingTendons = Pick<
  Tendons,
  'share' | 'parasiticM' | 'eccentricityM' | 'forceKN' | 'initialKN' | 'straightKN' | 'straightInitialKN'
>;

/**
 * Stresses of the outer fibres under permanent load, with characteristic traffic, and when the tendons have just been
 * stressed with only the own weight acting, each against its share of the strength.
 */
export function boxCompressions(
  model: StressModel,
  sections: Pick<SectionsAlong, 'areaM2' | 'inertiaM4' | 'topM' | 'lowM' | 'topLag' | 'lowLag'>,
  own: Pick<OwnWeight, 'effects'>,
  tendons: StressingTendons,
): Compressions {
  const { permanent, total, transfer, strengthAtTransfer } = boxData.compression;
  const fck = model.concrete.fckMPa;
  const { most } = model.traffic;
  const limits = {
    permanent: permanent * fck,
    total: total * fck,
    transfer: transfer * strengthAtTransfer * fck,
  };
  const nil: StressUse = { use: 0, stressMPa: 0, limitMPa: limits.total };
  const young = youngTensionMPa(model);
  const freshMPa = freshTension(sections, own, tendons.straightInitialKN)(tendons, tendons.initialKN);
  const out = {
    pierSoffit: nil,
    spanSoffit: nil,
    top: nil,
    freshTension: { use: freshMPa / young, stressMPa: freshMPa, limitMPa: young },
  };
  const note = (place: keyof typeof out, stressKPa: number, limitMPa: number): void => {
    const use = stressKPa / 1e3 / limitMPa;
    if (use > out[place].use) out[place] = { use, stressMPa: stressKPa / 1e3, limitMPa };
  };
  for (let i = 0; i < sections.areaM2.length; i++) {
    const area = sections.areaM2[i]!;
    const lowW = sections.inertiaM4[i]! / (sections.lowM[i]! * sections.lowLag[i]!);
    const topW = sections.inertiaM4[i]! / (sections.topM[i]! * sections.topLag[i]!);
    const share = tendons.share[i]!;
    // What is left of a unit draped force as a moment about the centroid, sagging positive.
    const arm = tendons.parasiticM[i]! - share * tendons.eccentricityM[i]!;
    const g = own.effects.momentKNm[i]!;
    const lasting = g + model.superimposed.momentKNm[i]! + tendons.forceKN * arm;
    const axial = (share * tendons.forceKN + tendons.straightKN) / area;
    const fresh = g + tendons.initialKN * arm;
    const freshAxial = (share * tendons.initialKN + tendons.straightInitialKN) / area;
    const soffit = model.pierShare[i]! > 0 ? 'pierSoffit' : 'spanSoffit';
    note(soffit, axial - lasting / lowW, limits.permanent);
    note(soffit, axial - (lasting + most.momentMinKNm[i]!) / lowW, limits.total);
    note(soffit, freshAxial - fresh / lowW, limits.transfer);
    note('top', axial + lasting / topW, limits.permanent);
    note('top', axial + (lasting + most.momentMaxKNm[i]!) / topW, limits.total);
    note('top', freshAxial + fresh / topW, limits.transfer);
  }
  return out;
}
