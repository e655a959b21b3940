import type { Check, DeckSpec, StandardId } from '../../../model/index.ts';
import { loadStandard, type LoadStandard } from '../../../actions/index.ts';
import { barDesignMPa, barKg } from '../bars.ts';
import { check } from '../checks.ts';
import { superimposedOn } from '../superimposed.ts';
import { slabData } from './slabData.ts';
import { overhangTraffic, spanTraffic } from './slabTraffic.ts';

/** A deck slab on parallel lines: girders or webs (it spans across the road) or cross-girders (along the road). */
export interface SlabCase {
  readonly standard: StandardId;
  readonly deck: DeckSpec;
  readonly direction: 'across' | 'along';
  /** Distance between the supporting lines, m. */
  readonly spacingM: number;
  /** Length beyond the outer line, m; 0 where there is none. Only with `across`. */
  readonly overhangM: number;
  /** True on more than two lines or on stiff webs; false on two girders free to turn. */
  readonly continuous: boolean;
  /** Same thickness from line to line and in the overhang (level soffit); otherwise thicker over the lines. */
  readonly uniform: boolean;
}

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

interface Moments {
  readonly permanent: number;
  readonly superimposed: number;
  readonly traffic: number;
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
  const surfacing = superimposedOn(slab.deck);
  const gamma = standard.unitWeights.concreteKNm3;
  const factor = slab.continuous ? d.continuity.value : 1;
  const span = slab.spacingM;
  const trafficSpan = spanTraffic(slab, standard);
  const trafficRoot = slab.overhangM > 0 ? overhangTraffic(slab, standard) : 0;

  const spanMoments = (t: number): Moments => ({
    permanent: (factor * gamma * t * span * span) / 8,
    superimposed: (factor * surfacing.surfacingKNm2 * span * span) / 8,
    traffic: factor * trafficSpan,
  });
  const arm = Math.max(0, slab.overhangM - edgeArmM);
  const edgeM = Math.max(d.leastEdgeM.value, d.leastThicknessM[slab.standard]);
  const overhangMoments = (t: number): Moments => ({
    permanent: gamma * slab.overhangM ** 2 * (edgeM / 2 + (t - edgeM) / 6),
    superimposed: (surfacing.surfacingKNm2 * slab.overhangM ** 2) / 2 + (surfacing.edgesKNm / 2) * arm,
    traffic: trafficRoot,
  });
  const innerRootMoments = (t: number): Moments =>
    slab.continuous ? spanMoments(t) : { permanent: 0, superimposed: 0, traffic: 0 };

  const mid = thicknessFor(least, step, (t) => demand(spanMoments(t), t, slab.standard, standard));
  const rootLeast = slab.overhangM > 0 ? Math.max(mid.thicknessM, edgeM) : mid.thicknessM;
  const overhang = thicknessFor(rootLeast, step, (t) =>
    demand(overhangMoments(t), t, slab.standard, standard),
  );
  const inner = thicknessFor(rootLeast, step, (t) => demand(innerRootMoments(t), t, slab.standard, standard));
  const root = overhang.thicknessM >= inner.thicknessM ? overhang : inner;
  const rootM = root.thicknessM;
  const midM = slab.uniform ? rootM : mid.thicknessM;

  const midBars = demand(spanMoments(midM), midM, slab.standard, standard);
  const overhangBars = demand(overhangMoments(rootM), rootM, slab.standard, standard);
  const innerBars = demand(innerRootMoments(rootM), rootM, slab.standard, standard);
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

/** Middle of a barrier from the edge of the deck, m. */
const edgeArmM = 0.25;

interface BarDemand {
  readonly momentKNm: number;
  /** Bars needed per metre, m2/m. */
  readonly areaM2: number;
  readonly ratio: number;
}

/** Bars of one face at ultimate and in service: As = M / (z f). */
function demand(moments: Moments, thicknessM: number, id: StandardId, standard: LoadStandard): BarDemand {
  const { uls } = standard.factors;
  const ultimate =
    uls.permanent * moments.permanent +
    uls.superimposed * moments.superimposed +
    uls.traffic * moments.traffic;
  const service = moments.permanent + moments.superimposed + moments.traffic;
  const effective = thicknessM - slabData.barAxisM.value;
  const lever = slabData.leverRatio.value * effective;
  const areaM2 = Math.max(
    ultimate / (lever * barDesignMPa(id) * 1e3),
    service / (lever * slabData.serviceStressMPa[id] * 1e3),
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
function barMass(
  insideShare: number,
  mid: BarDemand,
  root: BarDemand,
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
