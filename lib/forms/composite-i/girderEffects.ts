import { materials, trafficEnvelope, type TrafficEnvelope } from '../../actions/index.ts';
import {
  distributed,
  imposedCurvature,
  lineBeam,
  uniform,
  type Effects,
  type LineBeam,
} from '../../mechanics/index.ts';
import { steppedStiffness } from '../common/steppedStiffness.ts';
import { compositeData } from './compositeData.ts';
import { girderFigures, steelArea, type GirderFigures, type GirderTop } from './girderSection.ts';
import type { GirderModel } from './girderModel.ts';
import { platesAt, type PlateRun } from './plateRun.ts';

/** Characteristic effects on one girder by stage, at the stations of its beams. */
export interface GirderEffects {
  /** Steel and wet slab on the bare steel; working load of the casting on the same. */
  readonly steelStage: Effects;
  readonly casting: Effects;
  /** Superimposed load on the composite girder with lasting ratio of moduli. */
  readonly superimposed: Effects;
  /** Parasitic moments of shrinkage, and of a slab warmer than the steel by one kelvin. */
  readonly shrinkage: Effects;
  readonly warmth: Effects;
  /** Curvature of the girder as its uncracked slab shrinks, 1/m at the stations, sagging positive. */
  readonly shrunk1PerM: Float64Array;
  readonly traffic: TrafficEnvelope;
  /** Composite beam for short loads, for influence lines. */
  readonly shortBeam: LineBeam;
  /** Steel of one girder with its share of bracing, kg. */
  readonly steelKg: number;
}

/**
 * Works out the stages of an unpropped composite girder: steel alone, lasting loads, short loads. Stiffness follows the
 * plates; near inner supports the slab is cracked and only its bars count.
 * @param secondaryKgM stiffeners, bracing, studs and welds, kg per m of girder
 * @param known traffic moments of an earlier pass, taken over instead of placing the traffic again
 */
export function girderEffects(
  model: GirderModel,
  run: PlateRun,
  secondaryKgM: number,
  known?: TrafficEnvelope,
): GirderEffects {
  const { spansM } = model.task;
  const steelBeam = stageBeam(model, run, undefined);
  const lastingBeam = stageBeam(model, run, model.lasting);
  const shortBeam = stageBeam(model, run, model.short);

  const elements = model.elementM.length;
  const kgM = model.elementM.map((_, e) => materials.steelDensityKgM3 * steelArea(platesAt(run, e)));
  const steelKg = kgM.reduce((sum, kg, e) => sum + (kg + secondaryKgM) * model.elementM[e]!, 0);
  const loadKNm = new Float64Array(elements + 1);
  for (let i = 0; i <= elements; i++) {
    const left = kgM[Math.max(0, i - 1)]!;
    const right = kgM[Math.min(elements - 1, i)]!;
    loadKNm[i] = model.curve * ((left + right) / 2 + secondaryKgM) * gravity + model.slabKNm;
  }
  const { shrinkage, warmth } = curvatures(model, run);
  return {
    steelStage: distributed(steelBeam, loadKNm),
    casting: uniform(steelBeam, model.castingKNm),
    superimposed: uniform(lastingBeam, model.superimposedKNm),
    shrinkage: spansM.length > 1 ? imposedCurvature(lastingBeam, shrinkage) : uniform(lastingBeam, 0),
    warmth: spansM.length > 1 ? imposedCurvature(shortBeam, warmth) : uniform(shortBeam, 0),
    shrunk1PerM: shrinkage,
    traffic: known ?? trafficEnvelope(shortBeam, model.traffic, { deflection: false }),
    shortBeam,
    steelKg,
  };
}

const gravity = 9.81e-3;
const figures: GirderFigures = { areaM2: 0, centroidM: 0, inertiaM4: 0 };

/** Beam with the stiffness of one stage; no tops = bare steel. */
function stageBeam(model: GirderModel, run: PlateRun, tops: readonly GirderTop[] | undefined): LineBeam {
  const ei = model.elementM.map((_, e) => {
    const top = tops ? (model.isCracked[e] === 1 ? model.cracked[e]! : tops[e]!) : undefined;
    return model.modulusKNm2 * girderFigures(figures, platesAt(run, e), top).inertiaM4;
  });
  return lineBeam({
    spansM: model.task.spansM,
    eiKNm2: steppedStiffness(model.elementM, ei),
    stationsPerSpan: ei.length / model.task.spansM.length,
  });
}

/** Free curvatures at the stations: shrinkage of the uncracked slab, and slab and steel at different temperatures. */
function curvatures(model: GirderModel, run: PlateRun): { shrinkage: Float64Array; warmth: Float64Array } {
  const elements = model.elementM.length;
  const shrinkage = new Float64Array(elements + 1);
  const warmth = new Float64Array(elements + 1);
  for (let e = 0; e < elements; e++) {
    const perKelvin = compositeData.temperature.expansion1PerK / (run.heightM[e]! + model.slab.rootM);
    const force = model.shrinkageKN[e]!;
    let curvature = 0;
    if (force > 0) {
      const top = model.lasting[e]!;
      const { centroidM, inertiaM4 } = girderFigures(figures, platesAt(run, e), top);
      curvature = (force * (run.heightM[e]! + top.slabAboveM - centroidM)) / (model.modulusKNm2 * inertiaM4);
    }
    for (const i of [e, e + 1]) {
      const weight = i === 0 || i === elements ? 1 : 0.5;
      shrinkage[i]! += weight * curvature;
      // A warm top is longer and lifts the middle: negative where sagging is positive.
      warmth[i]! -= weight * perKelvin;
    }
  }
  return { shrinkage, warmth };
}
