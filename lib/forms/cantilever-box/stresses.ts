import { boxData } from '../concrete-box/boxData.ts';
import type { StressUse } from '../concrete-box/boxStress.ts';
import { cantileverData } from './cantileverData.ts';
import type { CantileverModel } from './cantileverModel.ts';
import type { FoundStrands } from './findStrands.ts';
import type { HaunchedSections } from './sectionsAlong.ts';
import type { StagedWeight } from './stages.ts';
import { strandStates } from './tendonNeeds.ts';

/** Greatest compressions over their limits, and that of the soffit at every station. */
export interface HaunchedStresses {
  readonly pierSoffit: StressUse;
  readonly spanSoffit: StressUse;
  readonly top: StressUse;
  readonly soffitUse: Float64Array;
}

/**
 * Compression of the outer fibres: free cantilever with its travellers, the deck just joined, after creep and losses;
 * permanent load against its share of the strength, with characteristic traffic against the other.
 */
export function haunchedStresses(
  model: CantileverModel,
  sections: HaunchedSections,
  weight: StagedWeight,
  found: FoundStrands,
): HaunchedStresses {
  const { permanent, total } = boxData.compression;
  const fck = model.concrete.fckMPa;
  const { most: traffic } = model.traffic;
  const { open, lasting } = strandStates(model, found.stresses);
  const n = sections.areaM2.length;
  const soffitUse = new Float64Array(n);
  const nil: StressUse = { use: 0, stressMPa: 0, limitMPa: total * fck };
  const out = { pierSoffit: nil, spanSoffit: nil, top: nil };
  const note = (place: keyof typeof out, stressKPa: number, share: number): number => {
    const use = stressKPa / 1e3 / (share * fck);
    if (use > out[place].use) out[place] = { use, stressMPa: stressKPa / 1e3, limitMPa: share * fck };
    return use;
  };
  const states = [open, lasting] as const;
  const owns = [weight.openKNm, weight.lastingKNm] as const;
  for (let i = 0; i < n; i++) {
    const area = sections.areaM2[i]!;
    const lowW = sections.inertiaM4[i]! / (sections.lowM[i]! * sections.lowLag[i]!);
    const topW = sections.inertiaM4[i]! / (sections.topM[i]! * sections.topLag[i]!);
    const et = sections.topM[i]! - cantileverData.topTendons.coverM;
    const eb = sections.lowM[i]! - cantileverData.bottomTendons.coverM;
    const soffit = model.armAt[i]! >= 0 && model.way[i]! < 0.5 ? 'pierSoffit' : 'spanSoffit';
    let most = 0;
    const stage = weight.cantileverKNm[i]!;
    if (stage < 0) {
      const kN = found.top[i]! * open.topKN;
      const moment = stage + kN * et;
      most = note(soffit, kN / area - moment / lowW, total);
      note('top', kN / area + moment / topW, total);
    }
    for (let k = 0; k < 2; k++) {
      const state = states[k]!;
      const t = found.top[i]! * state.topKN;
      const b = found.bottom[i]! * state.bottomKN;
      const moment =
        owns[k]![i]! +
        model.superimposed.momentKNm[i]! +
        t * et -
        b * eb +
        state.topParasitic * found.parasiticTopKNm[i]! +
        state.bottomParasitic * found.parasiticBottomKNm[i]!;
      const axial = (t + b) / area;
      most = Math.max(
        most,
        note(soffit, axial - moment / lowW, permanent),
        note(soffit, axial - (moment + traffic.momentMinKNm[i]!) / lowW, total),
      );
      note('top', axial + moment / topW, permanent);
      note('top', axial + (moment + traffic.momentMaxKNm[i]!) / topW, total);
    }
    soffitUse[i] = most;
  }
  return { ...out, soffitUse };
}
