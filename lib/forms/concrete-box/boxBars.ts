import { barKg } from '../common/bars.ts';
import { slabData } from '../common/slab/slabData.ts';
import { boxData } from './boxData.ts';
import type { BoxModel } from './boxModel.ts';
import type { SizedBox } from './sizeBox.ts';

/** Bars of the box by element of the section, kg, laps included. */
export interface BoxBars {
  readonly topAcrossKg: number;
  readonly topAlongKg: number;
  readonly bottomKg: number;
  readonly stirrupsKg: number;
  readonly webAlongKg: number;
  readonly diaphragmKg: number;
  readonly blisterKg: number;
  readonly totalKg: number;
}

/** Bars by force where there is one (slab, stirrups, anchorages) and the surface bars of every face elsewhere. */
export function boxBars(model: BoxModel, box: SizedBox): BoxBars {
  const { layout, lengthM, task, beam } = model;
  const { slab, webs } = layout;
  const laps = slabData.lapAndDetail.value;
  const surface = boxData.surfaceBarsM2PerM.value;
  const areaM2 = task.deck.widthM * lengthM;
  const faces = barKg(surface);
  const wallM = Math.max(0, task.depthM - slab.rootM) * Math.hypot(1, layout.slope);
  // A stirrup runs through both slabs and is anchored in them.
  const stirrupM = task.depthM * Math.hypot(1, layout.slope);
  let stirrupsKg = 0;
  box.webs.forEach(({ stirrupsM2PerM }, e) => {
    stirrupsKg += webs * barKg(stirrupsM2PerM, stirrupM) * (beam.xM[e + 1]! - beam.xM[e]!);
  });
  const bottomM = box.sections.span.bottomWidthM;
  const anchorages = anchorageCount(model, box);
  const anchorKN =
    (box.tendons.strandsPerWeb / box.tendons.group.tendonsPerWeb) *
    model.strandM2 *
    box.tendons.stress.jackMPa *
    1e3;
  const burstingKg = anchorages * burstingBarsKg(anchorKN);
  const diaphragmM3 = box.own.diaphragmM3.reduce((sum, m3) => sum + m3, 0);
  const parts = {
    topAcrossKg: slab.mainBarsKgM2 * areaM2,
    topAlongKg: Math.max(slab.crossBarsKgM2, laps * 2 * faces) * areaM2,
    bottomKg:
      laps *
      4 *
      Math.max(faces, barKg(slabData.steelRatioLeast.value * box.sections.span.bottomM)) *
      bottomM *
      lengthM,
    stirrupsKg: laps * stirrupsKg,
    webAlongKg: laps * webs * 2 * faces * wallM * lengthM,
    diaphragmKg: boxData.diaphragm.barsKgM3 * diaphragmM3,
    blisterKg: boxData.blisters.barsKgM3 * box.own.blistersM3 + burstingKg,
  };
  return { ...parts, totalKg: Object.values(parts).reduce((sum, kg) => sum + kg, 0) };
}

/** Bars behind one anchorage of a force, kg. */
export function burstingBarsKg(anchorKN: number): number {
  const { tieShare, stressMPa, lengthM } = boxData.bursting;
  return barKg((tieShare * anchorKN) / (stressMPa * 1e3), lengthM);
}

/** Anchorages of the draped tendons: two for every length of tendon, two spans long or the whole deck. */
function anchorageCount(model: BoxModel, box: SizedBox): number {
  const lengths = Math.max(1, Math.ceil(model.task.spansM.length / 2));
  return 2 * lengths * box.tendons.group.tendonsPerWeb * model.layout.webs;
}
