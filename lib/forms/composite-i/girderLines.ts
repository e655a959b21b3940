import { materials } from '../../actions/index.ts';
import type { MeasuredLine } from '../../model/index.ts';
import { barKg } from '../common/bars.ts';
import { measured } from '../common/measured.ts';
import { slabData } from '../common/slab/slabData.ts';
import { compositeData } from './compositeData.ts';
import { pieceJoints } from './fieldSplices.ts';
import type { GirderModel } from './girderModel.ts';
import { runsOf } from './plateRun.ts';
import type { SizedGirder } from './sizeGirder.ts';

/** Measured lines of the superstructure: plates by part, secondary steel, paint, slab, bars and formwork. */
export function girderLines(model: GirderModel, girder: SizedGirder): MeasuredLine[] {
  const { layout, lengthM, task, slab } = model;
  const { run, secondary } = girder;
  const girders = `${layout.count} girders`;
  const density = materials.steelDensityKgM3;
  const steel = (kg: number, what: string, how: string): MeasuredLine =>
    measured('deck', 'plate-girder-steel', kg, what, how);
  const plates = (thicknessM: Float64Array, widthM: (e: number) => number): number =>
    layout.count * thicknessM.reduce((sum, t, e) => sum + density * t * widthM(e) * model.elementM[e]!, 0);
  const webHeight = (e: number): number => run.heightM[e]! - run.topM[e]! - run.bottomM[e]!;
  const steps = (thicknessM: Float64Array): string =>
    `${girders}, ${runsOf(thicknessM).length} plates each, ${density} kg/m3`;
  const inner = model.braceAtM.length - model.supportsM.length;
  const crosses = layout.twin
    ? `${inner} rolled beams ${secondary.crossName} mm deep and heavier ones at ${model.supportsM.length} supports`
    : `${secondary.crossName}, ${inner} rows in spans and ${model.supportsM.length} at supports`;

  const areaM2 = task.deck.widthM * lengthM;
  const slabM3 = slab.meanM * areaM2;
  const along = longitudinalBars(model);
  const paintM2 = paintedM2(model, girder);
  const formworkM2 = (task.deck.widthM - layout.count * run.topWidthM + 2 * slab.edgeM) * lengthM;
  return [
    steel(plates(run.webM, webHeight), 'webs', steps(run.webM)),
    steel(
      plates(run.topM, () => run.topWidthM),
      'top flanges',
      `${steps(run.topM)}, ${mm(run.topWidthM)} mm wide`,
    ),
    steel(
      plates(run.bottomM, () => run.bottomWidthM),
      'bottom flanges',
      `${steps(run.bottomM)}, ${mm(run.bottomWidthM)} mm wide`,
    ),
    steel(secondary.crossKg, layout.twin ? 'cross-girders' : 'bracing', crosses),
    ...(secondary.lateralKg > 0
      ? [
          steel(
            secondary.lateralKg,
            'bracing in plan',
            'crossed diagonals between two girders in long spans, wind before there is a slab',
          ),
        ]
      : []),
    ...(model.substringers
      ? [
          steel(
            secondary.substringersKg,
            'substringers',
            `${model.substringers.lines} lines, ${model.substringers.beam.massKgPerM.toFixed(0)} kg/m`,
          ),
        ]
      : []),
    steel(
      secondary.stiffenersKg + secondary.bearingStiffenersKg,
      'stiffeners',
      `posts at ${inner} rows of bracing and bearing stiffeners, by force`,
    ),
    steel(
      secondary.studsKg,
      'shear studs',
      `${secondary.studs} studs, ${compositeData.studs.kgEach} kg each`,
    ),
    steel(
      secondary.weldsKg,
      'welds and bolts',
      `${(compositeData.weldsAndBoltsShare.value * 100).toFixed(1)} % of the steel above`,
    ),
    ...(secondary.splicesKg > 0
      ? [
          steel(
            secondary.splicesKg,
            'field splices',
            `${pieceJoints(lengthM).length} joints in each girder, plates and bolts for the yield of flanges and web`,
          ),
        ]
      : []),
    measured(
      'deck',
      'paint',
      paintM2,
      'girders and bracing',
      'plate faces, and area by mass for rolled parts',
    ),
    measured('deck', 'deck-concrete', slabM3, 'deck slab', `mean thickness ${mm(slab.meanM)} mm`),
    measured(
      'deck',
      'reinforcement',
      slab.mainBarsKgM2 * areaM2,
      'transverse bars of the slab',
      'wheels, weight and edges across the deck, laps included',
    ),
    measured(
      'deck',
      'reinforcement',
      Math.max(along, slab.crossBarsKgM2 * areaM2),
      'longitudinal bars of the slab',
      'crack control over the piers and in the spans, laps included',
    ),
    measured('deck', 'slab-formwork', formworkM2, 'formwork of the slab', 'soffit between flanges and edges'),
  ];
}

/** Bars along the deck, kg: one ratio in the cracked stretches over inner supports, another elsewhere. */
export function longitudinalBars(model: GirderModel): number {
  const { barsOverPiers, barsInSpans } = compositeData;
  const section = model.task.deck.widthM * model.slab.meanM;
  let kg = 0;
  for (let e = 0; e < model.elementM.length; e++) {
    const ratio = (model.isCracked[e] === 1 ? barsOverPiers : barsInSpans)[model.standardId];
    kg += barKg(ratio * section, model.elementM[e]);
  }
  return slabData.lapAndDetail.value * kg;
}

/** Painted surface, m2: both faces of webs, flanges but for the top face under the slab, rolled parts by mass. */
function paintedM2(model: GirderModel, girder: SizedGirder): number {
  const { run, secondary } = girder;
  let perGirder = 0;
  for (let e = 0; e < model.elementM.length; e++) {
    const web = 2 * (run.heightM[e]! - run.topM[e]! - run.bottomM[e]!);
    const flanges = 2 * run.bottomWidthM + 2 * run.bottomM[e]! + run.topWidthM + 2 * run.topM[e]!;
    perGirder += (web + flanges - 2 * run.webM[e]!) * model.elementM[e]!;
  }
  const stringersM2 = model.substringers
    ? model.substringers.lines * model.substringers.beam.paintM2PerM * model.lengthM
    : 0;
  const secondaryT =
    (secondary.crossKg + secondary.lateralKg + secondary.stiffenersKg + secondary.bearingStiffenersKg) / 1000;
  return model.layout.count * perGirder + stringersM2 + compositeData.secondaryPaintM2PerT.value * secondaryT;
}

function mm(lengthM: number): string {
  return (lengthM * 1000).toFixed(0);
}
