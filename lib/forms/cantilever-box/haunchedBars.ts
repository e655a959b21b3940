import { barKg } from '../common/bars.ts';
import { slabData } from '../common/slab/slabData.ts';
import { burstingBarsKg } from '../concrete-box/boxBars.ts';
import type { BoxBars } from '../concrete-box/boxBars.ts';
import { boxData } from '../concrete-box/boxData.ts';
import type { CantileverModel } from './cantileverModel.ts';
import type { SizedHaunched } from './sizeHaunched.ts';

/** Anchorages: two for every tendon, tendons of the usual largest size that segments are held by. */
export function anchorageCount(model: CantileverModel, box: SizedHaunched): number {
  const { sizes } = boxData.tendons;
  const usual = sizes[Math.floor(sizes.length / 2)]!.strands;
  const { beam, depthsM, task } = model;
  let strands = 0;
  for (const support of depthsM.keys()) strands += box.found.top[beam.supportAt[support]!]!;
  task.spansM.forEach((_, span) => {
    strands += Math.max(...box.found.bottom.subarray(beam.supportAt[span], beam.supportAt[span + 1]! + 1));
  });
  return 2 * Math.ceil(strands / usual);
}

/** Bars by force where there is one (slab, stirrups, anchorages) and the surface bars of every face elsewhere. */
export function haunchedBars(model: CantileverModel, box: SizedHaunched): BoxBars {
  const { layout, lengthM, task, beam, depthM } = model;
  const { sections, weight, webs } = box;
  const laps = slabData.lapAndDetail.value;
  const surface = boxData.surfaceBarsM2PerM.value;
  const faces = barKg(surface);
  const areaM2 = task.deck.widthM * lengthM;
  const lean = Math.hypot(1, layout.slope);
  let stirrupsKg = 0;
  let bottomKg = 0;
  let webAlongKg = 0;
  webs.forEach(({ stirrupsM2PerM }, e) => {
    const length = beam.xM[e + 1]! - beam.xM[e]!;
    const mean = (values: Float64Array): number => (values[e]! + values[e + 1]!) / 2;
    const deep = mean(depthM);
    stirrupsKg += layout.webs * barKg(stirrupsM2PerM, deep * lean) * length;
    webAlongKg += layout.webs * 2 * faces * Math.max(0, deep - layout.slab.rootM) * lean * length;
    bottomKg +=
      4 *
      Math.max(faces, barKg(slabData.steelRatioLeast.value * mean(sections.bottomM))) *
      mean(sections.bottomWidthM) *
      length;
  });
  const anchorKN =
    boxData.tendons.sizes[Math.floor(boxData.tendons.sizes.length / 2)]!.strands *
    model.strandM2 *
    box.found.stresses.top.jackMPa *
    1e3;
  const diaphragmM3 = weight.diaphragmM3.reduce((sum, m3) => sum + m3, 0);
  const parts = {
    topAcrossKg: layout.slab.mainBarsKgM2 * areaM2,
    topAlongKg: Math.max(layout.slab.crossBarsKgM2, laps * 2 * faces) * areaM2,
    bottomKg: laps * bottomKg,
    stirrupsKg: laps * stirrupsKg,
    webAlongKg: laps * webAlongKg,
    diaphragmKg: boxData.diaphragm.barsKgM3 * diaphragmM3,
    blisterKg:
      boxData.blisters.barsKgM3 * weight.blistersM3 + anchorageCount(model, box) * burstingBarsKg(anchorKN),
  };
  return { ...parts, totalKg: Object.values(parts).reduce((sum, kg) => sum + kg, 0) };
}
