import { concrete, loadStandard, materials, type Concrete, type LoadStandard } from '../../actions/index.ts';
import { imposedCurvature, lineBeam, uniform, type Effects, type LineBeam } from '../../mechanics/index.ts';
import type { StandardId, UnitTask } from '../../model/index.ts';
import { slabData } from '../common/slab/slabData.ts';
import { overhangTraffic } from '../common/slab/slabTraffic.ts';
import { barDesignMPa } from '../common/bars.ts';
import { supportPositions } from '../common/supports.ts';
import { superimposedOn } from '../common/superimposed.ts';
import { deckTraffic, type DeckTraffic } from './deckTraffic.ts';
import { slabDeckData } from './slabDeckData.ts';
import { slabOutline, slabSections, wingLength, type SlabOutline, type SlabSection } from './slabSection.ts';
import { wheelStrips, type WheelStrips } from './wheelStrips.ts';

/** Everything about a slab deck but its steel: section, own weight, traffic. Moments are of the whole deck. */
export interface SlabModel {
  readonly task: UnitTask;
  readonly standardId: StandardId;
  readonly standard: LoadStandard;
  readonly concrete: Concrete;
  readonly prestressed: boolean;
  readonly supportsM: readonly number[];
  readonly lengthM: number;
  /** Constant stiffness 1. */
  readonly beam: LineBeam;
  readonly outline: SlabOutline;
  readonly span: SlabSection;
  readonly solid: SlabSection;
  /** 1 in the half span beside an inner support that hogs, 0 elsewhere; at the stations. */
  readonly pierShare: Float64Array;
  /** True at stations whose section is solid. */
  readonly solidAt: readonly boolean[];
  readonly voidedM: number;
  readonly concreteM3: number;
  readonly own: { readonly effects: Effects };
  readonly superimposed: Effects;
  /** Weight of the solid parts over the supports beyond that of the voided section, kN. */
  readonly solidKN: readonly number[];
  readonly strips: WheelStrips;
  readonly traffic: DeckTraffic;
  /** Parasitic moment of unit curvature that arches the deck upwards, on stiffness 1. */
  readonly archedKNm: Float64Array;
  /** Bars across at the top of the wings where they join the side, m2/m; 0 without wings. */
  readonly wingBarsM2PerM: number;
}

/** Lays out the slab and places its loads. */
export function slabModel(task: UnitTask): SlabModel {
  const { spansM, standard: standardId, depthM, deck } = task;
  const standard = loadStandard(standardId);
  const beam = lineBeam({ spansM });
  const supportsM = supportPositions(spansM);
  const lengthM = supportsM[supportsM.length - 1]!;
  const wing = wingRoot(task, standard);
  const outline = slabOutline(deck, depthM, wing.rootM);
  const { span, solid } = slabSections(outline, depthM);
  const gamma = standard.unitWeights.concreteKNm3;
  const solidLengths = solidOver(task, outline);
  const solidM = solidLengths.reduce((sum, length) => sum + length, 0);
  const voidedM = outline.voids.length > 0 ? Math.max(0, lengthM - solidM) : 0;
  const strips = wheelStrips(standardId, deck, zeroMomentsM(spansM, standard), depthM);
  const superimposed = uniform(beam, deck.superimposedKNm);
  const prestressed = Math.max(...spansM) > slabDeckData.reinforced.mostSpanM;
  const pierShare = new Float64Array(beam.xM.length);
  const own = uniform(beam, gamma * span.areaM2);
  own.momentKNm.forEach((moment, i) => {
    pierShare[i] = moment < -1e-9 ? 1 : 0;
  });
  const solidAt = Array.from(beam.xM, (x) =>
    supportsM.some((at, j) => Math.abs(x - at) <= solidLengths[j]! / (j > 0 && j < spansM.length ? 2 : 1)),
  );
  return {
    task,
    standardId,
    standard,
    concrete: concrete(standardId, materials.concreteDefaultMPa[standardId][prestressed ? 'box' : 'slab']),
    prestressed,
    supportsM,
    lengthM,
    beam,
    outline,
    span,
    solid,
    pierShare,
    solidAt,
    voidedM,
    concreteM3: solid.areaM2 * (lengthM - voidedM) + span.areaM2 * voidedM,
    own: { effects: own },
    superimposed,
    solidKN: solidLengths.map((length) => gamma * (solid.areaM2 - span.areaM2) * length),
    strips,
    traffic: deckTraffic(task, beam, strips),
    archedKNm: imposedCurvature(beam, new Float64Array(beam.xM.length).fill(-1)).momentKNm,
    wingBarsM2PerM: wing.barsM2PerM,
  };
}

/** Longest distance between zero moments of any span, m; AASHTO strips go by the span itself. */
function zeroMomentsM(spansM: readonly number[], standard: LoadStandard): number {
  const { endSpan, innerSpan } = slabDeckData.strip;
  const last = spansM.length - 1;
  if (last === 0 || standard.distributionFactors) return Math.max(...spansM);
  return Math.max(...spansM.map((span, i) => (i === 0 || i === last ? endSpan : innerSpan) * span));
}

/** Length of solid slab at each support of a voided deck, m; half of it at the ends. */
function solidOver({ spansM, depthM }: UnitTask, outline: SlabOutline): number[] {
  if (outline.voids.length === 0) return Array.from({ length: spansM.length + 1 }, () => 0);
  const each = slabDeckData.voids.solidOverDepth * depthM;
  return Array.from({ length: spansM.length + 1 }, (_, j) => (j > 0 && j < spansM.length ? 2 : 1) * each);
}

/** Least thickness at the root of the wings in steps of 10 mm at which their bars stay within a practical ratio. */
export function wingRoot(
  task: UnitTask,
  standard: LoadStandard,
): { readonly rootM: number; readonly barsM2PerM: number } {
  const { deck, depthM, standard: id } = task;
  const wingM = wingLength(deck, depthM);
  const { edgeM } = slabDeckData.wings;
  if (!(wingM > 0)) return { rootM: edgeM, barsM2PerM: 0 };
  const traffic = overhangTraffic(
    { standard: id, deck, direction: 'across', spacingM: deck.widthM - 2 * wingM, overhangM: wingM },
    standard,
  );
  const { surfacingKNm2, edgesKNm } = superimposedOn(deck);
  const { uls } = standard.factors;
  const bars = (rootM: number): { readonly areaM2: number; readonly ratio: number } => {
    const own = standard.unitWeights.concreteKNm3 * wingM ** 2 * (edgeM / 2 + (rootM - edgeM) / 6);
    const rest = (surfacingKNm2 * wingM ** 2) / 2 + (edgesKNm / 2) * Math.max(0, wingM - 0.25);
    const effectiveM = rootM - slabData.barAxisM.value;
    const leverM = slabData.leverRatio.value * effectiveM;
    const areaM2 = Math.max(
      (uls.permanent * own + uls.superimposed * rest + uls.traffic * traffic) /
        (leverM * barDesignMPa(id) * 1e3),
      (own + rest + traffic) / (leverM * slabData.serviceStressMPa[id] * 1e3),
    );
    return { areaM2, ratio: areaM2 / effectiveM };
  };
  const step = slabData.stepM.value;
  let rootM = edgeM;
  while (bars(rootM).ratio > slabData.steelRatioMost.value && rootM + step < depthM) rootM += step;
  return { rootM, barsM2PerM: bars(rootM).areaM2 };
}
