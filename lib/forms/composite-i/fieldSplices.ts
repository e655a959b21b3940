import { materials } from '../../actions/index.ts';
import { compositeData } from './compositeData.ts';
import type { GirderModel } from './girderModel.ts';
import type { PlateRun } from './plateRun.ts';

/** Joints of the pieces of one girder, m from its first support: pieces of equal length, at most the usual one. */
export function pieceJoints(lengthM: number): number[] {
  const pieces = Math.max(1, Math.ceil(lengthM / compositeData.pieceLengthM.value - 1e-9));
  return Array.from({ length: pieces - 1 }, (_, p) => ((p + 1) * lengthM) / pieces);
}

/**
 * Splice of a flange that carries the yield of its plate, kg with bolts: plates on both faces, together as thick as the
 * flange, long enough for the bolts on each side of the joint.
 */
export function flangeSpliceKg(widthM: number, thicknessM: number, yieldMPa: number): number {
  const { boltKN, boltKg, pitchM, gaugeM, edgeM } = compositeData.fieldSplice;
  const across = Math.max(2, Math.floor((widthM - 2 * edgeM) / gaugeM) + 1);
  const rows = Math.ceil((widthM * thicknessM * yieldMPa * 1e3) / boltKN / across);
  const lengthM = 2 * ((rows - 1) * pitchM + 2 * edgeM);
  return materials.steelDensityKgM3 * widthM * thicknessM * lengthM + 2 * rows * across * boltKg;
}

/** Splice of a web that carries a shear, kg with bolts: two plates over its height, bolts in columns on each side. */
export function webSpliceKg(heightM: number, thicknessM: number, shearKN: number): number {
  const { boltKN, boltKg, pitchM, gaugeM, edgeM, webPlateLeastM, webColumns } = compositeData.fieldSplice;
  const high = heightM - 2 * edgeM;
  const inColumn = Math.floor((high - 2 * edgeM) / gaugeM) + 1;
  const columns = Math.max(webColumns, Math.ceil(shearKN / boltKN / inColumn));
  const lengthM = 2 * ((columns - 1) * pitchM + 2 * edgeM);
  const plateM = Math.max(webPlateLeastM, thicknessM / 2);
  return 2 * materials.steelDensityKgM3 * high * plateM * lengthM + 2 * columns * inColumn * boltKg;
}

/** Bolted field splices of one girder, kg; 0 where girders are welded on site. Webs are spliced for their yield in shear. */
export function fieldSplicesKg(model: GirderModel, run: PlateRun): number {
  if (!compositeData.fieldSplice.bolted[model.standardId]) return 0;
  const { elementM, lengthM, yieldMPa } = model;
  let kg = 0;
  let e = 0;
  let start = 0;
  for (const at of pieceJoints(lengthM)) {
    while (e < elementM.length - 1 && start + elementM[e]! < at) start += elementM[e++]!;
    const [topM, bottomM, webM] = [run.topM[e]!, run.bottomM[e]!, run.webM[e]!];
    const highM = run.heightM[e]! - topM - bottomM;
    kg +=
      flangeSpliceKg(run.topWidthM, topM, yieldMPa(topM)) +
      flangeSpliceKg(run.bottomWidthM, bottomM, yieldMPa(bottomM)) +
      webSpliceKg(highM, webM, shearYieldKN(highM, webM, yieldMPa(webM)));
  }
  return kg;
}

const shearYieldKN = (heightM: number, thicknessM: number, yieldMPa: number): number =>
  (heightM * thicknessM * yieldMPa * 1e3) / Math.sqrt(3);
