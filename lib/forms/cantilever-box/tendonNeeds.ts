import { barDesignMPa } from '../common/bars.ts';
import { compressionDepth, faceBarsM2, strandDesignMPa } from '../concrete-box/bendingCapacity.ts';
import { boxData } from '../concrete-box/boxData.ts';
import type { TendonStress } from '../concrete-box/tendonForce.ts';
import { cantileverData } from './cantileverData.ts';
import { parasiticKNm } from './parasitic.ts';
import { betweenZeros, workingWidthM } from '../concrete-box/shearLag.ts';
import type { CantileverModel } from './cantileverModel.ts';
import { restraintInUse } from './restraint.ts';
import type { HaunchedSections } from './sectionsAlong.ts';
import { creepShare, type StagedWeight } from './stages.ts';

/** Strands of both families at the stations, whole deck, with the parasitic moment of their lasting forces, kNm. */
export interface Strands {
  readonly top: Float64Array;
  readonly bottom: Float64Array;
  readonly parasiticTopKNm: Float64Array;
  readonly parasiticBottomKNm: Float64Array;
}

/** Stresses of the two families. */
export interface StrandStresses {
  readonly top: TendonStress;
  readonly bottom: TendonStress;
}

/** Forces of one strand in a state, kN, and the part of the parasitic moments of the lasting forces that acts in it. */
export interface StrandState {
  readonly topKN: number;
  readonly bottomKN: number;
  readonly topParasitic: number;
  readonly bottomParasitic: number;
}

/** Moments at the stations without prestress, kNm: extremes of the deck in use, in service with its weight. */
export interface UseMoments {
  readonly openMax: Float64Array;
  readonly openMin: Float64Array;
  readonly lastingMax: Float64Array;
  readonly lastingMin: Float64Array;
  /** What is laid and drives on the deck, factored. */
  readonly ultimateMax: Float64Array;
  readonly ultimateMin: Float64Array;
  /** Pull of shafts that hold the deck as it cools, and as it has shortened as well, kN; absent where none does. */
  readonly openPulledKN?: Float64Array;
  readonly lastingPulledKN?: Float64Array;
}

/** The deck just joined, and after creep and losses; tendons over the piers bend the joined deck only as it creeps. */
export function strandStates(
  model: CantileverModel,
  { top, bottom }: StrandStresses,
): { readonly open: StrandState; readonly lasting: StrandState } {
  const kN = model.strandM2 * 1e3;
  return {
    open: {
      topKN: top.initialMPa * kN,
      bottomKN: bottom.initialMPa * kN,
      topParasitic: 0,
      bottomParasitic: bottom.initialMPa / bottom.lastingMPa,
    },
    lasting: {
      topKN: top.lastingMPa * kN,
      bottomKN: bottom.lastingMPa * kN,
      topParasitic: creepShare,
      bottomParasitic: 1,
    },
  };
}

/** Strands with their parasitic moments: the joined deck bends under each family by its eccentricity over stiffness. */
export function withParasitic(
  model: CantileverModel,
  sections: HaunchedSections,
  stresses: StrandStresses,
  top: Float64Array,
  bottom: Float64Array,
): Strands {
  const kN = model.strandM2 * 1e3;
  const { coverM: topCover } = cantileverData.topTendons;
  const { coverM: lowCover } = cantileverData.bottomTendons;
  const n = top.length;
  const above = new Float64Array(n);
  const below = new Float64Array(n);
  for (let i = 0; i < n; i++) {
    above[i] =
      (top[i]! * stresses.top.lastingMPa * kN * (sections.topM[i]! - topCover)) / model.stiffness[i]!;
    below[i] =
      (-bottom[i]! * stresses.bottom.lastingMPa * kN * (sections.lowM[i]! - lowCover)) / model.stiffness[i]!;
  }
  return {
    top,
    bottom,
    parasiticTopKNm: parasiticKNm(model.beam, model.overSupports, above),
    parasiticBottomKNm: parasiticKNm(model.beam, model.overSupports, below),
  };
}

/**
 * Moments of the deck in use, from weight through its stages, superimposed load, traffic, temperature gradient, and the
 * restraint of shafts that it is cast in with.
 */
export function useMoments(
  model: CantileverModel,
  sections: HaunchedSections,
  weight: StagedWeight,
): UseMoments {
  const use = freeMoments(model, sections, weight);
  const held = restraintInUse(model, sections);
  if (held === null) return use;
  const both = (key: Exclude<keyof UseMoments, 'openPulledKN' | 'lastingPulledKN'>): Float64Array =>
    use[key].map((moment, i) => moment + held[key][i]!);
  return {
    ...held,
    openMax: both('openMax'),
    openMin: both('openMin'),
    lastingMax: both('lastingMax'),
    lastingMin: both('lastingMin'),
    ultimateMax: both('ultimateMax'),
    ultimateMin: both('ultimateMin'),
  };
}

/** The same of a deck that no shaft holds. */
function freeMoments(model: CantileverModel, sections: HaunchedSections, weight: StagedWeight): UseMoments {
  const { gradient } = boxData;
  const { uls } = model.standard.factors;
  const { service, most } = model.traffic;
  const stiff =
    gradient.withTraffic * gradient.expansion1PerK * model.concrete.ecmMPa * 1e3 * sections.midspan.inertiaM4;
  const n = sections.areaM2.length;
  const out = {
    openMax: new Float64Array(n),
    openMin: new Float64Array(n),
    lastingMax: new Float64Array(n),
    lastingMin: new Float64Array(n),
    ultimateMax: new Float64Array(n),
    ultimateMin: new Float64Array(n),
  };
  for (let i = 0; i < n; i++) {
    const sup = model.superimposed.momentKNm[i]!;
    // A warm top arches the deck: the piers hold it down and it sags.
    const arched = -model.warmKNm[i]! * stiff;
    const warm = arched * gradient.topWarmerK;
    const cool = -arched * gradient.topCoolerK;
    const max = sup + service.momentMaxKNm[i]! + Math.max(warm, cool);
    const min = sup + service.momentMinKNm[i]! + Math.min(warm, cool);
    const open = weight.openKNm[i]!;
    const lasting = weight.lastingKNm[i]!;
    out.openMax[i] = open + max;
    out.openMin[i] = open + min;
    out.lastingMax[i] = lasting + max;
    out.lastingMin[i] = lasting + min;
    const use = uls.superimposed * sup;
    out.ultimateMax[i] = use + uls.traffic * most.momentMaxKNm[i]!;
    out.ultimateMin[i] = use + uls.traffic * most.momentMinKNm[i]!;
  }
  return out;
}

/**
 * Design moments of the deck in use at a station, kNm, just joined or after creep: creep moves the moments of the weight and
 * those of the tendons over the piers together, so that the one is never taken with the other before it.
 */
export function ultimateInUse(
  model: CantileverModel,
  weight: StagedWeight,
  use: UseMoments,
  states: readonly StrandState[],
  { parasiticTopKNm, parasiticBottomKNm }: Pick<Strands, 'parasiticTopKNm' | 'parasiticBottomKNm'>,
  i: number,
): { readonly max: number; readonly min: number } {
  const { uls } = model.standard.factors;
  let max = -Infinity;
  let min = Infinity;
  states.forEach(({ topParasitic, bottomParasitic }, k) => {
    const own = (k === 0 ? weight.openKNm : weight.lastingKNm)[i]!;
    const tendons = topParasitic * parasiticTopKNm[i]! + bottomParasitic * parasiticBottomKNm[i]!;
    const lasting = uls.prestress * tendons;
    const sags = own > 0 ? uls.permanent : uls.permanentFavourable;
    const hogs = own < 0 ? uls.permanent : uls.permanentFavourable;
    max = Math.max(max, sags * own + lasting + use.ultimateMax[i]!);
    min = Math.min(min, hogs * own + lasting + use.ultimateMin[i]!);
  });
  return { max, min };
}

/**
 * Strands every station asks for, top then bottom, given the strands of the pass before: no tension over the piers while
 * cantilevering, decompression (or the tension allowed) in use before and after creep, ultimate bending in both.
 */
export function strandsNeeded(
  model: CantileverModel,
  sections: HaunchedSections,
  weight: StagedWeight,
  use: UseMoments,
  stresses: StrandStresses,
  before: Strands,
): [top: Float64Array, bottom: Float64Array] {
  const n = sections.areaM2.length;
  const top = new Float64Array(n);
  const bottom = new Float64Array(n);
  const spread = boxData.prestressSpread[model.standardId];
  const tension = boxData.serviceTensionMPa[model.standardId] * 1e3;
  const stageTension = cantileverData.stageTensionMPa.value * 1e3;
  const around = model.standardId === 'lm1' ? boxData.decompressedAroundDuctM.value : Infinity;
  const { open, lasting } = strandStates(model, stresses);
  const states = [open, lasting] as const;
  const maxima = [use.openMax, use.lastingMax] as const;
  const minima = [use.openMin, use.lastingMin] as const;
  const pulls = [use.openPulledKN, use.lastingPulledKN] as const;
  const { coverM: topCover } = cantileverData.topTendons;
  const { coverM: lowCover } = cantileverData.bottomTendons;
  const { uls } = model.standard.factors;
  const designKN = strandDesignMPa(model) * model.strandM2 * 1e3;
  const bars = barDesignMPa(model.standardId) * 1e3;
  const topBars = bars * faceBarsM2(model.task.deck.widthM);
  const flangeWidthM = workingWidthM(model.layout, betweenZeros(model.task.spansM).inSpanM);
  for (let i = 0; i < n; i++) {
    const area = sections.areaM2[i]!;
    const inertia = sections.inertiaM4[i]!;
    const et = sections.topM[i]! - topCover;
    const eb = sections.lowM[i]! - lowCover;
    const topLag = sections.topLag[i]!;
    const yt = (topLag * Math.min(sections.topM[i]!, et + around)) / inertia;
    const yb = (sections.lowLag[i]! * Math.min(sections.lowM[i]!, eb + around)) / inertia;
    const nt = before.top[i]!;
    const nb = before.bottom[i]!;
    const pt = before.parasiticTopKNm[i]!;
    const pb = before.parasiticBottomKNm[i]!;
    const stage = weight.cantileverKNm[i]!;
    if (stage < 0) {
      const y = (topLag * sections.topM[i]!) / inertia;
      const perKN = spread * (1 / area + et * y);
      top[i] = Math.max(0, (-stage * y - stageTension) / (perKN * open.topKN));
    }
    for (let k = 0; k < 2; k++) {
      const state = states[k]!;
      const max = maxima[k]![i]!;
      const min = minima[k]![i]!;
      const extra = spread * (state.topParasitic * pt + state.bottomParasitic * pb);
      const t = spread * nt * state.topKN;
      const b = spread * nb * state.bottomKN;
      const pull = (pulls[k]?.[i] ?? 0) / area;
      const topShort = pull - (b / area + (min + extra - b * eb) * yt + tension);
      top[i] = Math.max(top[i]!, topShort / (spread * state.topKN * (1 / area + et * yt)));
      const lowShort = pull + (max + extra + t * et) * yb - t / area - tension;
      bottom[i] = Math.max(bottom[i]!, lowShort / (spread * state.bottomKN * (1 / area + eb * yb)));
    }
    const depth = model.depthM[i]!;
    const websM = model.layout.webs * sections.webM[i]!;
    const lowBars = bars * faceBarsM2(sections.bottomWidthM[i]!);
    const ultimate = ultimateInUse(model, weight, use, states, before, i);
    const hog = Math.max(-ultimate.min, -uls.permanent * stage);
    if (hog > 0) {
      const face = { widthM: sections.bottomWidthM[i]!, flangeM: model.mostBottomM, websM };
      const c = compressionDepth(model, face, nt * designKN + topBars);
      const rest = hog - topBars * (depth - topCover / 2 - c);
      top[i] = Math.max(top[i]!, rest / (designKN * (depth - topCover - c)));
    }
    const sag = ultimate.max;
    if (sag > 0) {
      const face = { widthM: flangeWidthM, flangeM: model.layout.slab.meanM, websM };
      const c = compressionDepth(model, face, nb * designKN + lowBars);
      const rest = sag - lowBars * (depth - lowCover / 2 - c);
      bottom[i] = Math.max(bottom[i]!, rest / (designKN * (depth - lowCover - c)));
    }
  }
  return [top, bottom];
}
