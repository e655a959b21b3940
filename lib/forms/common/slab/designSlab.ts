import type { Check } from '../../../model/index.ts';
import { loadStandard, type LoadStandard } from '../../../actions/index.ts';
import { barDesignMPa, barKg } from '../bars.ts';
import { check } from '../checks.ts';
import type { SlabCase } from './slabCase.ts';
import { slabData } from './slabData.ts';
import { slabMoments, type SlabMoments } from './slabMoments.ts';

/** Thickness and bars of a deck slab. Moments are design values per metre of slab. */
export interface SlabDesign {
  readonly midM: number;
  readonly rootM: number;
  readonly edgeM: number;
  /** Concrete over deck area, m. */
  readonly meanM: number;
  /** Bars in the direction of the span, and across them, kg per m2 of deck. */
  readonly mainBarsKgM2: number;
  readonly crossBarsKgM2: number;
  readonly spanMomentKNm: number;
  readonly rootMomentKNm: number;
  readonly checks: readonly Check[];
}

/**
 * Designs a deck slab for its own weight, surfacing, edges and wheels: the least thickness in steps of 10 mm at which
 * the bars of one face stay within a practical ratio, and the bars. Haunches run over a quarter of the spacing.
 * spacingM 1 to 15, overhangM 0 to 6; a slab past the thickest practical one has a utilisation above 1.
 */
export function designSlab(slab: SlabCase): SlabDesign {
  const standard = loadStandard(slab.standard);
  const d = slabData;
  const step = d.stepM.value;
  const least = Math.max(d.leastThicknessM[slab.standard], slab.spacingM / d.spanOverThickness.value);
  const { spanMoments, overhangMoments, innerRootMoments, edgeM } = slabMoments(slab);

  const mid = thicknessFor(least, step, (t) => demand(spanMoments(t), t, slab, standard));
  const rootLeast = slab.overhangM > 0 ? Math.max(mid.thicknessM, edgeM) : mid.thicknessM;
  const overhang = thicknessFor(rootLeast, step, (t) => demand(overhangMoments(t), t, slab, standard));
  const inner = thicknessFor(rootLeast, step, (t) => demand(innerRootMoments(t), t, slab, standard));
  const root = overhang.thicknessM >= inner.thicknessM ? overhang : inner;
  const rootM = root.thicknessM;
  const midM = slab.uniform ? rootM : mid.thicknessM;

  const midBars = demand(spanMoments(midM), midM, slab, standard);
  const overhangBars = demand(overhangMoments(rootM), rootM, slab, standard);
  const innerBars = demand(innerRootMoments(rootM), rootM, slab, standard);
  const rootBars = overhangBars.areaM2 > innerBars.areaM2 ? overhangBars : innerBars;

  const width = slab.direction === 'across' ? slab.deck.widthM : 1;
  const inside = slab.direction === 'across' ? width - 2 * slab.overhangM : 1;
  const outside = width - inside;
  const meanM =
    (inside * (midM + (slab.uniform ? 0 : (rootM - midM) / 4)) + (outside * (rootM + edgeM)) / 2) / width;
  const bars = barMass(inside / width, midBars, rootBars, midM, rootM);
  return {
    midM,
    rootM,
    edgeM: slab.overhangM > 0 ? edgeM : midM,
    meanM,
    ...bars,
    spanMomentKNm: midBars.momentKNm,
    rootMomentKNm: rootBars.momentKNm,
    checks: [
      check(
        'slab-span',
        'slab between its supports: bars within the practical ratio',
        midBars.ratio,
        d.steelRatioMost.value,
        '1',
      ),
      check(
        'slab-root',
        'slab over its supports: bars within the practical ratio',
        rootBars.ratio,
        d.steelRatioMost.value,
        '1',
      ),
      check(
        'slab-thickness',
        'slab no thicker than practical',
        Math.max(midM, rootM),
        d.mostThicknessM.value,
        'm',
      ),
    ],
  };
}

interface BarDemand {
  readonly momentKNm: number;
  /** Bars needed per metre, m2/m. */
  readonly areaM2: number;
  readonly ratio: number;
}

const noTie = { serviceKNm: 0, ultimateKNm: 0 } as const;

/** Bars of one face at ultimate and in service: As = (M / z + N / 2) / f. */
function demand(moments: SlabMoments, thicknessM: number, slab: SlabCase, standard: LoadStandard): BarDemand {
  const { standard: id, tie = noTie } = slab;
  const { uls } = standard.factors;
  const ultimate =
    uls.permanent * moments.permanent +
    uls.superimposed * moments.superimposed +
    uls.traffic * moments.traffic;
  const service = moments.permanent + moments.superimposed + moments.traffic;
  const effective = thicknessM - slabData.barAxisM.value;
  const lever = slabData.leverRatio.value * effective;
  const areaM2 = Math.max(
    (ultimate / lever + tie.ultimateKNm / 2) / (barDesignMPa(id) * 1e3),
    (service / lever + tie.serviceKNm / 2) / (slabData.serviceStressMPa[id] * 1e3),
  );
  return { momentKNm: ultimate, areaM2, ratio: areaM2 / effective };
}

function thicknessFor(
  least: number,
  step: number,
  need: (t: number) => BarDemand,
): { readonly thicknessM: number } {
  const most = slabData.mostThicknessM.value;
  let t = Math.ceil(least / step - 1e-9) * step;
  while (t < most && need(t).ratio > slabData.steelRatioMost.value) t += step;
  return { thicknessM: Math.min(Math.max(t, least), Math.max(most, least)) };
}

/**
 * Bars of both faces, kg per m2 of deck: span bars between the lines, root bars over the overhang and a quarter of the
 * spacing on each side of a line, the least ratio elsewhere.
 */
export function barMass(
  insideShare: number,
  mid: Pick<BarDemand, 'areaM2'>,
  root: Pick<BarDemand, 'areaM2'>,
  midM: number,
  rootM: number,
): { readonly mainBarsKgM2: number; readonly crossBarsKgM2: number } {
  const least = slabData.steelRatioLeast.value;
  const midLeast = least * midM;
  const rootLeast = least * rootM;
  const midArea = Math.max(mid.areaM2, midLeast);
  const rootArea = Math.max(root.areaM2, rootLeast);
  const inside = midArea + 0.5 * rootArea + 0.5 * midLeast;
  const outside = rootArea + rootLeast;
  const cross = 2 * Math.max(slabData.distributionShare.value * midArea, midLeast);
  const laps = slabData.lapAndDetail.value;
  return {
    mainBarsKgM2: laps * barKg(insideShare * inside + (1 - insideShare) * outside),
    crossBarsKgM2: laps * barKg(cross),
  };
}
