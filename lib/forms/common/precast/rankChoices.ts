import { loadStandard, materials, trafficOnDeck, type TrafficLoad } from '../../../actions/index.ts';
import type { UnitTask } from '../../../model/index.ts';
import type { BeamChoice } from './beamChoice.ts';
import { heaviestVehicleKN } from './heaviestVehicle.ts';
import { pretensioned } from './pretensioned.ts';
import { mostStrands, strandCentroidM } from './strandRows.ts';

/** A choice with what it is expected to cost, in m3 of concrete per m of deck with strand counted as concrete. */
export interface RankedChoice extends BeamChoice {
  readonly proxyM3PerM: number;
}

/** Choices cheapest first, by concrete and an estimate of the strand. */
export function rankChoices(task: UnitTask, choices: readonly BeamChoice[]): RankedChoice[] {
  const deck = trafficOnDeck(task.standard, task.deck);
  return choices
    .map((choice): RankedChoice => ({ ...choice, proxyM3PerM: proxy(task, choice, deck) }))
    .sort((a, b) => a.proxyM3PerM - b.proxyM3PerM);
}

/**
 * Concrete of beams and slab and an estimate of the strand, m3 per m of deck: force P (1/A + e/W) on the beam for the
 * soffit under all permanent load and an even share of the traffic in service, at 0.6 of the strength of the strand.
 */
function proxy(task: UnitTask, { layout, slab, shape }: BeamChoice, deck: TrafficLoad): number {
  const standard = loadStandard(task.standard);
  const gamma = standard.unitWeights.concreteKNm3;
  const spanM = Math.max(...task.spansM);
  const { vehicle, uniform } = standard.factors.sls;
  const alone = gamma * (shape.areaM2 + (slab.meanM * task.deck.widthM) / layout.count);
  const later =
    (task.deck.superimposedKNm +
      uniform * deck.udlKNm +
      (2 * vehicle * deck.vehicleFactor * heaviestVehicleKN(standard)) / spanM) /
    layout.count;
  const wBottom = shape.inertiaM4 / shape.centroidM;
  // The slab about doubles the inertia and lifts the centroid: later loads count about two thirds at the soffit.
  const stress = ((alone + (2 / 3) * later) * spanM ** 2) / 8 / 1e3 / wBottom;
  const count = Math.min(mostStrands(shape.rows), 40);
  const eM = shape.centroidM - strandCentroidM(shape.rows, count);
  const forceMN = stress / (1 / shape.areaM2 + eM / wBottom);
  const strandM2 = forceMN / (0.6 * materials.strand[task.standard].ultimateMPa);
  const strandKgM = materials.steelDensityKgM3 * strandM2 * layout.count;
  return (
    layout.count * shape.areaM2 + slab.meanM * task.deck.widthM + strandKgM / pretensioned.proxy.strandKgPerM3
  );
}
