import { trafficOnDeck, trafficOnInfluence } from '../../../actions/index.ts';
import { beamTrack, reactionInfluence } from '../../../mechanics/index.ts';
import type { MeasuredLine, SupportReaction } from '../../../model/index.ts';
import { quantityOf } from '../measured.ts';
import { beamMoments, diaphragmsWithin, noMoments } from './beamMoments.ts';
import { beamSolidsM3 } from './beamSolids.ts';
import { liftingSafety } from './liftingStability.ts';
import { heaviestBeam } from './precastChecks.ts';
import { diaphragmM3 } from './precastLines.ts';
import { elementsPerSpan, type PrecastModel } from './precastModel.ts';
import type { SizedBeams } from './sizeBeams.ts';

/**
 * Characteristic reactions of the whole deck: beams, slab and diaphragms as simple spans, superimposed load and traffic on
 * the continuous deck.
 */
export function precastReactions(model: PrecastModel): SupportReaction[] {
  const { task, layout, shape, slab, beam, standard, most, traffic } = model;
  const gamma = standard.unitWeights.concreteKNm3;
  const ownKNm =
    gamma * (layout.count * (shape.areaM2 + model.haunchM * shape.topWidthM) + slab.meanM * task.deck.widthM);
  const one = diaphragmM3(model);
  const half = task.spansM.map(
    (spanM) =>
      (ownKNm * spanM) / 2 +
      (gamma * one.withinM3 * diaphragmsWithin(model, spanM)) / 2 +
      (gamma * layout.count * beamSolidsM3(model, spanM)) / 2,
  );
  const deck = trafficOnDeck(task.standard, task.deck);
  const track = beamTrack(beam);
  const last = task.spansM.length;
  // A skew heaps the load on the obtuse corners; the whole deck weighs what it weighs.
  const inShear = traffic.shearRatio * (traffic.obtuse ?? 1);
  return model.supportsM.map((_, j) => {
    const line = reactionInfluence(beam, j);
    const whole = trafficOnInfluence(deck, track, line);
    const single = trafficOnInfluence(traffic, track, line);
    const ratio = (all: number, part: number): number => (part === 0 ? 0 : all / part / inShear);
    const diaphragm = gamma * (j === 0 || j === last ? one.endM3 : one.pierM3);
    return {
      permanentKN:
        (half[j - 1] ?? 0) +
        (half[j] ?? 0) +
        diaphragm +
        (layout.count * model.superimposed.reactionKN[j]!) / model.curve,
      trafficMaxKN: most.reactionMaxKN[j]! * ratio(whole.max, single.max),
      trafficMinKN: most.reactionMinKN[j]! * ratio(whole.min, single.min),
    };
  });
}

/** Own weight (beam, slab, diaphragms) of the characteristic moment at the middle of the longest span, 0 to 1. */
export function ownWeightShare(model: PrecastModel): number {
  const { spansM } = model.task;
  const moments = noMoments();
  beamMoments(model, spansM.indexOf(Math.max(...spansM)), elementsPerSpan / 2, moments);
  return moments.simple / (moments.simple + moments.superimposed + moments.trafficMax);
}

/** Figures that beams in one piece and spliced ones have alike, of one beam unless the name says otherwise. */
export function beamFigures(
  model: PrecastModel,
  { shears, piers }: Pick<SizedBeams, 'shears' | 'piers'>,
  lines: readonly MeasuredLine[],
): Record<string, number> {
  const { task, layout, shape, composite, slab } = model;
  const areaM2 = model.lengthM * task.deck.widthM;
  const byPlace: [name: string, value: number][] = [
    ...shears.map(({ mostKN }, span): [string, number] => [`span${span + 1}ShearDesignKN`, mostKN]),
    ...piers.flatMap(({ hogDesignKNm, topBarsM2 }, i): [string, number][] => [
      [`pier${i + 1}HogDesignKNm`, hogDesignKNm],
      [`pier${i + 1}BarsM2`, topBarsM2],
    ]),
  ];
  return {
    beamLines: layout.count,
    spacingM: layout.spacingM,
    overhangM: layout.overhangM,
    beamHeightM: shape.depthM,
    beamAreaM2: shape.areaM2,
    beamInertiaM4: shape.inertiaM4,
    webM: shape.webM,
    topFlangeWidthM: shape.topWidthM,
    bottomFlangeWidthM: shape.bottomWidthM,
    fillM: model.haunchM,
    slabM: slab.midM,
    compositeInertiaM4: composite.inertiaM4,
    compositeCentroidM: composite.centroidM,
    curvatureFactor: model.curve,
    laneVehicles: model.traffic.vehicleFactor,
    trafficUniformKNm: model.traffic.udlKNm,
    ownKNm: model.ownKNm,
    wetKNm: model.wetKNm,
    superimposedKNm: model.superimposedKNm,
    liftingSafety: liftingSafety(model, heaviestBeam(model).lengthM),
    concreteM3M2: (quantityOf(lines, 'precast-concrete') + quantityOf(lines, 'deck-concrete')) / areaM2,
    strandKgM2: (quantityOf(lines, 'pretensioned-strand') + quantityOf(lines, 'prestress')) / areaM2,
    barsKgM2: quantityOf(lines, 'reinforcement') / areaM2,
    ...Object.fromEntries(byPlace),
  };
}

/** Named figures of section, statics and strands, of one beam unless the name says otherwise. */
export function precastFigures(
  model: PrecastModel,
  beams: SizedBeams,
  lines: readonly MeasuredLine[],
): Record<string, number> {
  const { task } = model;
  const figures: Record<string, number> = {
    ...beamFigures(model, beams, lines),
    ...(model.torsion
      ? { torqueArmM: model.torsion.armM, cellM2: model.torsion.cellM2, shearRatio: model.traffic.shearRatio }
      : {}),
  };
  const moments = noMoments();
  task.spansM.forEach((_, span) => {
    const { plan } = beams.strands[span]!;
    const name = `span${span + 1}`;
    beamMoments(model, span, elementsPerSpan / 2, moments);
    figures[`${name}Strands`] = plan.count;
    figures[`${name}TopStrands`] = plan.top;
    figures[`${name}RelievedStrands`] = plan.relieved;
    figures[`${name}StrandHeightM`] = plan.midM;
    figures[`${name}LossesMPa`] = model.jackMPa - plan.stress.lastingMPa;
    figures[`${name}SimpleKNm`] = moments.simple;
    figures[`${name}SuperimposedKNm`] = moments.superimposed;
    figures[`${name}TrafficKNm`] = moments.trafficMax;
    figures[`${name}DesignKNm`] = moments.design;
  });
  return figures;
}
