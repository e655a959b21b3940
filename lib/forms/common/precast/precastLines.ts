import type { MeasuredLine } from '../../../model/index.ts';
import { barDesignMPa, barKg } from '../bars.ts';
import { measured } from '../measured.ts';
import { slabData } from '../slab/slabData.ts';
import { diaphragmsWithin } from './beamMoments.ts';
import { pretensioned } from './pretensioned.ts';
import { beamSolidsM3 } from './beamSolids.ts';
import type { PrecastModel } from './precastModel.ts';
import type { SizedBeams } from './sizeBeams.ts';
import type { StrandPlan } from './strandPlan.ts';

/** Diaphragms cast between the beams, m3: at ends, at each inner support, within the spans. */
export interface Diaphragms {
  readonly endM3: number;
  readonly pierM3: number;
  readonly withinM3: number;
}

/** Concrete of one diaphragm of each kind over the width of the deck, m3. */
export function diaphragmM3(model: PrecastModel): Diaphragms {
  const { diaphragm, crossWalls } = model.kind;
  const { supportM2, withinM2 } = crossWalls(model);
  return {
    endM3: diaphragm.endM * supportM2,
    // Over a pier the space between the beam ends is cast as well.
    pierM3: diaphragm.pierM * supportM2,
    withinM3: diaphragm.withinM * withinM2,
  };
}

/** What is measured of sized beams: strands by span, links, bars over the piers. */
export interface MeasuredBeams extends Pick<SizedBeams, 'shears' | 'piers'> {
  readonly strands: readonly { readonly plan: Pick<StrandPlan, 'count'> }[];
}

/** Measured lines of the superstructure; `formworkM2` is that of the slab. */
export function precastLines(model: PrecastModel, beams: MeasuredBeams, formworkM2: number): MeasuredLine[] {
  const { task, layout, shape, slab, lengthM, haunchM } = model;
  const { spansM } = task;
  const areaM2 = lengthM * task.deck.widthM;
  const beamM3 = layout.count * shape.areaM2 * lengthM;
  const solidM3 = layout.count * spansM.reduce((sum, spanM) => sum + beamSolidsM3(model, spanM), 0);
  const slabM3 = slab.meanM * areaM2;
  const fillM3 = layout.count * haunchM * shape.topWidthM * lengthM;
  const one = diaphragmM3(model);
  const within = spansM.reduce((sum, spanM) => sum + diaphragmsWithin(model, spanM), 0);
  const diaphragms = 2 * one.endM3 + (spansM.length - 1) * one.pierM3 + within * one.withinM3;
  const strandKg = spansM.reduce(
    (sum, spanM, i) => sum + barKg(beams.strands[i]!.plan.count * model.strandM2, spanM),
    0,
  );
  const linkHeightM = shape.depthM + slab.midM - 0.08;
  const linksKg = beams.shears.reduce((sum, { linksM2 }) => sum + barKg(linksM2, linkHeightM), 0);
  const { continuity, beamBars } = pretensioned;
  const { diaphragm } = model.kind;
  const topKg = beams.piers.reduce(
    (sum, { topBarsM2 }, i) =>
      sum + barKg(topBarsM2, continuity.lengthOverSpan * (spansM[i]! + spansM[i + 1]!)),
    0,
  );
  const bottomKg = beams.piers.reduce(
    (sum, { bottomBarsM2 }) => sum + barKg(bottomBarsM2, continuity.connectionLengthM),
    0,
  );
  const torsionKg = layout.count * torsionBarsKg(model, beams);
  const laps = slabData.lapAndDetail.value;
  const mm = (value: number): string => (value * 1000).toFixed(0);
  const counts = [...new Set(beams.strands.map(({ plan }) => plan.count))].join(', ');
  const bars = (kg: number, what: string, how: string): MeasuredLine =>
    measured('deck', 'reinforcement', kg, what, how);
  return [
    measured(
      'deck',
      'precast-concrete',
      beamM3,
      'precast beams',
      `${layout.count} lines of ${shape.name}, ${shape.areaM2.toFixed(3)} m2`,
    ),
    ...(solidM3 > 0
      ? [measured('deck', 'precast-concrete', solidM3, 'solid ends and walls of the beams', 'cast with them')]
      : []),
    measured(
      'deck',
      'pretensioned-strand',
      layout.count * strandKg,
      'strand in beams',
      `${counts} strands of ${(model.strandM2 * 1e6).toFixed(0)} mm2 in each beam, span by span`,
    ),
    measured(
      'deck',
      'deck-concrete',
      slabM3 + fillM3,
      'deck slab',
      `thickness ${mm(slab.midM)} mm, fill ${mm(haunchM)} mm over the beams`,
    ),
    measured(
      'deck',
      'deck-concrete',
      diaphragms,
      'diaphragms',
      `at ${spansM.length + 1} supports and ${within} within spans`,
    ),
    bars(layout.count * (laps * linksKg), 'links of the beams', 'by shear, least elsewhere; laps included'),
    ...(torsionKg > 0
      ? [bars(laps * torsionKg, 'bars along for torsion', 'torque of the closed cell, EN 1992-1-1 6.3.2 (3)')]
      : []),
    bars(beamBars.alongKgM3 * beamM3, 'bars along the beams', `${beamBars.alongKgM3} kg/m3`),
    bars(
      slab.mainBarsKgM2 * areaM2,
      'transverse bars of the slab',
      'wheels, weight and edges across the deck, laps included',
    ),
    bars(
      slab.crossBarsKgM2 * areaM2,
      'longitudinal bars of the slab',
      'share of the transverse bars, laps included',
    ),
    bars(layout.count * laps * topKg, 'bars over the piers', 'hogging of the continuous beam'),
    bars(layout.count * laps * bottomKg, 'connection at beam ends', 'sagging from creep at the piers'),
    bars(diaphragm.barsKgM3 * diaphragms, 'bars of the diaphragms', `${diaphragm.barsKgM3} kg/m3`),
    measured(
      'deck',
      'slab-formwork',
      formworkM2,
      'formwork of the slab',
      'soffit between top flanges, overhangs and edges',
    ),
  ];
}

/**
 * Bars along one line of beams for torsion, kg: T u / (2 A fyd) at struts of 45 degrees by the greatest torque of the ends of
 * each span, three quarters of it on average (strand carries its part of the chord in bending only).
 */
function torsionBarsKg(
  { torsion, task, standard, standardId }: PrecastModel,
  { shears }: MeasuredBeams,
): number {
  if (!torsion) return 0;
  const fy = barDesignMPa(standardId) * 1e3;
  return task.spansM.reduce((sum, spanM, span) => {
    const torqueKNm = standard.factors.uls.traffic * torsion.armM * shears[span]!.trafficKN;
    return sum + barKg((0.75 * torqueKNm * torsion.aroundM) / (2 * torsion.cellM2 * fy), spanM);
  }, 0);
}
